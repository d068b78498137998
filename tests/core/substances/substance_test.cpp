// SPDX-License-Identifier: MPL-2.0
#include "core/substances/substance.h"

#include "tests/core/expect_refusal.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace {

using namespace core;
using namespace core::substances;

constexpr double reference = 298.15;

Temperature kelvin(double value) { return Temperature::kelvin(value); }

std::string stable(std::string_view substance, double t) {
    return std::string(find_substance(substance).phase_at(kelvin(t)).name());
}

TEST(Substance, HasTheListedPhaseAt298K) {
    const auto rows = published::read_table(PUBLISHED_DIR "/stable_phases.csv",
                                            {"formula", "name", "phase"}, 330);
    for (std::size_t s = 0; s < rows.size(); ++s) {
        SubstanceRow const& row = substance_rows()[s];
        ASSERT_EQ(row.formula, rows[s].text("formula"));
        View const& view = views()[row.first_view];
        if (rows[s].text("phase") == "refused") {
            EXPECT_EQ(view.rung_count, 0) << row.formula;
            continue;
        }
        ASSERT_GT(view.rung_count, 0) << row.formula;
        EXPECT_EQ(Substance(view).phase_at(kelvin(reference)).name(), rows[s].text("phase"))
            << row.formula;
    }
}

TEST(Substance, IsFoundByFormulaAndName) {
    const Substance iron = find_substance("Fe");
    for (auto text : {"iron", "Iron", "IRON", " Fe ", "iron "})
        EXPECT_EQ(find_substance(text), iron);
    EXPECT_EQ(find_substance("H2O"), find_substance("water"));
    EXPECT_EQ(find_substance("H₂O(g)"), find_substance("water(g)"));
    EXPECT_EQ(find_substance("H2O (g)"), find_substance("H2O(g)"));
    EXPECT_EQ(find_substance("Fe0.947O"), find_substance("wüstite"));
    EXPECT_EQ(find_substance("Fe(cr, γ)"), find_substance("Fe(cr,gamma)"));
    EXPECT_EQ(find_substance("Fe(γ)"), find_substance("Fe(gamma)"));
    EXPECT_EQ(find_substance("C(graphite)"), find_substance("C(cr, graphite)"));
    EXPECT_EQ(find_substance("SiO2(quartz)"), find_substance("quartz"));
    EXPECT_EQ(find_substance("NaCl(s)"), find_substance("NaCl(cr)"));
    EXPECT_EQ(find_substance("Fe(CO)5(g)").written(), "Fe(CO)5(g)");
    EXPECT_EQ(find_substance("isobutane").written(), "isobutane");
    EXPECT_EQ(find_substance("CO").name(), "carbon monoxide");
    EXPECT_EQ(find_substance("Co").name(), "cobalt");
    EXPECT_EQ(find_substance("TiN").name(), "titanium nitride");
    EXPECT_EQ(find_substance("Tin").name(), "tin");
}

TEST(Substance, IsMendedWhereAutoCorrectLoweredACapital) {
    std::vector<std::string> remarks;
    EXPECT_EQ(find_substance("Hcl", Notes(nullptr, &remarks)), find_substance("HCl"));
    EXPECT_EQ(remarks, std::vector<std::string>{"`Hcl` read as `HCl`"});
}

std::string repair(std::string_view text) {
    try {
        find_substance(text);
        return "found";
    } catch (Failure const& failure) {
        EXPECT_EQ(failure.kind, unfit) << text;
        return failure.repair + " | " + failure.needed;
    }
}

void expect_repair(std::string_view text, std::string_view words) {
    EXPECT_NE(repair(text).find(words), std::string::npos) << text << ": " << repair(text);
}

TEST(Substance, IsRefusedWithTheNearest) {
    expect_repair("ironn", "`iron`");
    expect_repair("methan", "`methane`");
    expect_repair("aluminia", "`alumina`");
    expect_repair("fe2O3", "`Fe2O3`");
    expect_repair("C2H6O", "`ethanol`");
    expect_repair("Fe3C", "material of its own");
    expect_repair("steam", "ENTROPY.STEAM");
    expect_repair("C4H10", "`butane` or `isobutane`");
    expect_repair("methanol", "write `methanol(g)`");
    expect_repair("CCl4", "boils at 349.8 K");
    expect_repair("Fe(cr, ε)", "`cr, γ`");
    expect_repair("CH4(l)", "`g`");
    expect_repair("", "SUBSTANCE.LIST");
    expect_repair("Na+", "charge");
    expect_repair("NaCl(aq)", "`cr`");
    expect_repair(std::string(900, 'x'), "shorten");
}

TEST(Substance, TakesTheGasOnlyWhereItsMoleculesAreThoseOfTheFormula) {
    EXPECT_EQ(stable("H2O", 373), "l");
    EXPECT_EQ(stable("H2O", 374), "g");
    EXPECT_EQ(stable("TiCl4", 400), "l");
    EXPECT_EQ(stable("TiCl4", 420), "g");
    EXPECT_EQ(stable("SnCl4", 380), "l");
    EXPECT_EQ(stable("SnCl4", 390), "g");
    EXPECT_EQ(stable("UF6", 329), "cr");
    EXPECT_EQ(stable("UF6", 331), "g");
    EXPECT_EQ(stable("FeCl3", reference), "cr");
    EXPECT_EQ(stable("FeCl3", 1500), "l");
    EXPECT_EQ(stable("S", 1000), "l");
    EXPECT_EQ(stable("H2SO4", 700), "l");
}

// Below the liquid of these only a gas is tabulated, which is not stable there.
TEST(Substance, IsNoGasBelowItsLiquid) {
    for (auto [substance, t] : {std::pair{"H2SO4", 250.0}, {"TiCl4", 240.0}, {"SnCl4", 230.0}})
        expect_refusal(impossible, std::to_string(int(t)), "is tabulated",
                       [s = substance, at = t] { find_substance(s).entropy(kelvin(at)); });
}

TEST(Substance, IsTheLowerPhaseExactlyAtATransition) {
    EXPECT_EQ(stable("Fe", 1184), "cr, α");
    EXPECT_EQ(stable("Fe", std::nextafter(1184.0, 2000.0)), "cr, γ");
    EXPECT_EQ(stable("Fe", 1809), "cr, δ");
    EXPECT_EQ(stable("SiO2", 848), "cr, α-quartz");
}

TEST(Substance, CountsTheEndsOfItsRangeAsInside) {
    const Substance quartz = find_substance("quartz");
    EXPECT_EQ(absolute(quartz.to()).value(), 1200);
    EXPECT_NO_THROW(quartz.entropy(kelvin(1200 * (1 + 1e-15))));
    EXPECT_NO_THROW(quartz.entropy(kelvin(200 * (1 - 1e-15))));
    expect_refusal(impossible, "1201 K", "from 200 to 1200 K",
                   [&] { quartz.enthalpy(kelvin(1201)); });
    expect_refusal(impossible, "199 K", "from 200 to 1200 K",
                   [&] { quartz.heat_capacity(kelvin(199)); });
    expect_refusal(impossible, "1050 K", "not in the gap from 1000 to 1100 K",
                   [] { find_substance("Mg(OH)2").entropy(kelvin(1050)); });
}

// From the abridged weights of 2021: 55.845, 15.999, 1.008 g/mol; the others as the report prints
// them, whose oxygen weighs 15.9994 g/mol.
TEST(Substance, HasAMolarMass) {
    EXPECT_DOUBLE_EQ(find_substance("Fe2O3").molar_mass().value(), 0.159687);
    EXPECT_DOUBLE_EQ(find_substance("H2O").molar_mass().value(), 0.018015);
    EXPECT_NEAR(find_substance("Fe0.947O").molar_mass().value(), 0.06888461, 5e-7);
    EXPECT_NEAR(find_substance("air").molar_mass().value(), 0.0289651, 1e-6);
    EXPECT_NEAR(find_substance("heavy water(g)").molar_mass().value(), 0.0200276, 1e-6);
}

TEST(Substance, HasTheStableAmongItsCondensedPhases) {
    for (SubstanceRow const& row : substance_rows()) {
        View const& view = views()[row.first_view];
        if (view.rung_count == 0) continue;
        const Substance s(view);
        for (Rung const& rung : s.rungs()) {
            const double t = (rung.from + rung.to) / 2;
            const double least = s.gibbs(kelvin(t)).value();
            for (PhaseRow const& other : s.phases()) {
                const Phase phase(other);
                if (phase.aggregation() == Aggregation::gas && row.vapour != Vapour::boils)
                    continue;
                if (t < absolute(phase.from()).value() || t > absolute(phase.to()).value())
                    continue;
                // A liquid extrapolated far beyond its boiling point is no rival of the gas.
                if (phase_of(rung).aggregation() == Aggregation::gas) continue;
                EXPECT_GE(phase.gibbs(kelvin(t)).value(), least - 1) << row.formula << ' ' << t;
            }
        }
    }
}

} // namespace
