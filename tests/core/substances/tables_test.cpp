// SPDX-License-Identifier: MPL-2.0
#include "core/substances/substance.h"
#include "core/substances/table.h"

#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <vector>

namespace {

using namespace core::substances;
using published::Row;

// Independent route: the strict reader of the tests, against arrays written by make_tables.
const std::vector<std::string> species_columns{"phase_id",
                                               "substance",
                                               "phase_label",
                                               "phase_kind",
                                               "composition",
                                               "dHf298_J_per_mol",
                                               "interval_index",
                                               "interval_count",
                                               "T_low_K",
                                               "T_high_K",
                                               "a1",
                                               "a2",
                                               "a3",
                                               "a4",
                                               "a5",
                                               "a6",
                                               "a7",
                                               "b1",
                                               "b2",
                                               "report_page",
                                               "reference_code",
                                               "note"};
const std::vector<std::string> oxide_columns{"phase",
                                             "formula",
                                             "composition",
                                             "dHf298_J_per_mol",
                                             "S298_J_per_molK",
                                             "T_low_K",
                                             "T_high_K",
                                             "A1_J_per_molK",
                                             "A2_J_per_molK2",
                                             "A3_J_K_per_mol",
                                             "A4_J_per_molK05",
                                             "A5_J_per_molK3",
                                             "Cp298_J_per_molK",
                                             "page"};

std::vector<Row> species() {
    return published::read_table(TABLES_DIR "/species.csv", species_columns, 993);
}
std::vector<Row> oxides() {
    return published::read_table(TABLES_DIR "/oxides.csv", oxide_columns, 11);
}

PhaseRow const& phase(std::string const& id) {
    const auto all = phase_rows();
    const auto found =
        std::find_if(all.begin(), all.end(), [&](PhaseRow const& p) { return p.id == id; });
    if (found == all.end()) throw std::runtime_error("no phase " + id);
    return *found;
}

TEST(SubstanceTables, HoldEveryRowOfTheReport) {
    for (Row const& row : species()) {
        PhaseRow const& p = phase(row.text("phase_id"));
        ASSERT_EQ(p.interval_count, row.number("interval_count"));
        Interval const& i =
            intervals()[p.first_interval + std::size_t(row.number("interval_index")) - 1];
        const std::array<double, 13> held{i.from, i.to, i.a1, i.a2, i.a3,   i.a4,          i.a5,
                                          i.a6,   i.a7, i.b1, i.b2, i.root, i.gas_constant};
        std::array<double, 13> printed{};
        printed[12] = 8.314510;
        std::transform(species_columns.begin() + 8, species_columns.begin() + 19, printed.begin(),
                       [&](auto const& column) { return row.number(column); });
        EXPECT_EQ(held, printed) << p.id;
        EXPECT_EQ(p.enthalpy_of_formation, row.number("dHf298_J_per_mol"));
        EXPECT_EQ(p.note, row.text("note"));
        EXPECT_NE(p.source.find("p. " + row.text("report_page")), std::string_view::npos);
        EXPECT_EQ(p.aggregation == Aggregation::gas, row.text("phase_kind") == "gas");
        EXPECT_EQ(p.aggregation == Aggregation::liquid, row.text("phase_kind") == "liquid");
    }
}

// A key value's uncertainty is used only where the report has its entropy within it.
TEST(SubstanceTables, HoldTheUncertaintiesOfTheEntropiesTheyBelongTo) {
    std::size_t held = 0;
    for (Row const& row : published::read_table(
             TABLES_DIR "/entropy_uncertainties.csv",
             {"phase_id", "S298_J_per_molK", "printed_uncertainty_J_per_molK", "obtained_how"},
             43)) {
        PhaseRow const& p = phase(row.text("phase_id"));
        EXPECT_EQ(p.entropy_u, row.number("printed_uncertainty_J_per_molK") / 2) << p.id;
        EXPECT_NEAR(Phase(p).entropy(core::Temperature::kelvin(298.15)).value(),
                    row.number("S298_J_per_molK"), row.number("printed_uncertainty_J_per_molK"))
            << p.id;
    }
    for (PhaseRow const& p : phase_rows()) held += p.entropy_u > 0;
    EXPECT_EQ(held, 43u);
}

TEST(SubstanceTables, HoldTheOxides) {
    std::size_t beside = 0;
    for (Row const& row : oxides()) {
        if (row.text("formula") == "Fe0.947O") {
            ++beside;
            continue;
        }
        PhaseRow const& p = phase(row.text("formula") + "(cr)");
        const auto own = intervals().subspan(p.first_interval, p.interval_count);
        const auto i = std::find_if(own.begin(), own.end(), [&](Interval const& each) {
            return each.from == row.number("T_low_K");
        });
        ASSERT_NE(i, own.end());
        const std::array<double, 8> held{i->to,   i->a3, i->a4,           i->a1,
                                         i->root, i->a5, i->gas_constant, i->a2};
        const std::array<double, 8> printed{row.number("T_high_K"),
                                            row.number("A1_J_per_molK"),
                                            row.number("A2_J_per_molK2"),
                                            row.number("A3_J_K_per_mol"),
                                            row.number("A4_J_per_molK05"),
                                            row.number("A5_J_per_molK3"),
                                            1,
                                            0};
        EXPECT_EQ(held, printed) << p.id;
    }
    EXPECT_EQ(beside, 1u);
}

TEST(SubstanceTables, UseEveryRowOnce) {
    EXPECT_EQ(table_counts().species_rows, 993u);
    EXPECT_EQ(table_counts().oxide_rows, 11u);
    EXPECT_EQ(table_counts().oxide_rows_beside, 1u);
    std::vector<int> uses(intervals().size());
    for (PhaseRow const& p : phase_rows())
        for (std::size_t i = 0; i < p.interval_count; ++i) ++uses.at(p.first_interval + i);
    EXPECT_EQ(std::count(uses.begin(), uses.end(), 1), 1003);
    std::size_t phases = 0;
    for (std::size_t s = 0; s < substance_rows().size(); ++s) {
        EXPECT_EQ(substance_rows()[s].first_phase, phases);
        phases += substance_rows()[s].phase_count;
        for (std::size_t p = substance_rows()[s].first_phase; p < phases; ++p)
            EXPECT_EQ(phase_rows()[p].substance, s);
    }
    EXPECT_EQ(phases, phase_rows().size());
}

TEST(SubstanceTables, AreSortedForTheSearch) {
    for (auto keys : {names(), formulas()})
        EXPECT_TRUE(std::is_sorted(keys.begin(), keys.end(), [](Key const& a, Key const& b) {
            return a.spelling < b.spelling;
        }));
}

// Printed Cp of the oxides at 298.15 K to two decimals; PROVENANCE of the rows in SOURCES.md.
TEST(SubstanceTables, GiveThePrintedHeatCapacitiesOfTheOxides) {
    for (Row const& row : oxides()) {
        if (row.text("Cp298_J_per_molK").empty()) continue;
        const Interval i{298.15,
                         row.number("T_high_K"),
                         1,
                         row.number("A3_J_K_per_mol"),
                         0,
                         row.number("A4_J_per_molK05"),
                         row.number("A1_J_per_molK"),
                         row.number("A2_J_per_molK2"),
                         row.number("A5_J_per_molK3"),
                         0,
                         0,
                         0,
                         0};
        EXPECT_NEAR(heat_capacity_of(i, 298.15), row.number("Cp298_J_per_molK"), 0.006)
            << row.text("formula");
    }
}

// Between the intervals of a phase the report leaves steps; the largest are those known.
TEST(SubstanceTables, JoinTheirIntervals) {
    for (PhaseRow const& p : phase_rows())
        for (std::size_t n = p.first_interval + 1u;
             n < p.first_interval + std::size_t(p.interval_count); ++n) {
            Interval const &below = intervals()[n - 1], &above = intervals()[n];
            const double t = above.from;
            const bool known = p.id == "TiB2(cr)" || p.id == "Al4C3(cr)";
            EXPECT_NEAR(enthalpy_of(below, t), enthalpy_of(above, t), known ? 3 : 1) << p.id;
            EXPECT_NEAR(entropy_of(below, t), entropy_of(above, t), 0.002) << p.id;
            // NiO has its magnetic peak there: USGS Bulletin 2131 prints 69.15 at its foot.
            EXPECT_NEAR(heat_capacity_of(below, t), heat_capacity_of(above, t),
                        p.id == "NiO(cr)" ? 10.1 : 0.11)
                << p.id;
        }
}

} // namespace
