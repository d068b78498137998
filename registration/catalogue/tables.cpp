// SPDX-License-Identifier: MPL-2.0
#include "core/substances/heating_curve.h"
#include "core/substances/transition.h"
#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/substance_arguments.h"

#include <algorithm>
#include <cctype>
#include <cmath>

namespace registration {

/// The headings that a curve's columns are asked for with; SI where there are none.
struct CurveHeadings {
    std::vector<std::string> texts;
    std::vector<Unit> units;
};
template<>
struct argument<CurveHeadings> : Unchecked {
    static constexpr Need need{
        .kind = Need::Kind::cell, .whole = true, .condition = "a row of headings"};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        CurveHeadings operator[](std::size_t) const {
            CurveHeadings headings;
            for (std::size_t at = 0; at < given_->cell_count(); ++at) {
                const std::string_view text = given_->cell(at).text;
                headings.texts.emplace_back(text);
                headings.units.push_back(core::text::read_heading(text).unit);
            }
            return headings;
        }
        Given const* given_;
    };
};

namespace catalogue {
namespace {

using namespace core::substances;
using core::Temperature;

std::string lowered(std::string_view text) {
    std::string small(text);
    std::ranges::transform(small, small.begin(),
                           [](unsigned char c) { return static_cast<char>(std::tolower(c)); });
    return small;
}

bool has_all_words(std::string const& text, std::string_view words) {
    while (!words.empty()) {
        const std::size_t end = std::min(words.find(' '), words.size());
        if (text.find(words.substr(0, end)) == std::string::npos) return false;
        words.remove_prefix(std::min(end + 1, words.size()));
    }
    return true;
}

std::string phase_names(Substance const& substance) {
    std::string text;
    for (PhaseRow const& phase : substance.phases())
        text.append(text.empty() ? "" : "; ").append(phase.name);
    return text;
}

/// Formula and every name that finds the substance or a phase of it, in small letters.
std::string searched(std::size_t substance) {
    std::string text = lowered(substance_rows()[substance].formula);
    for (Key const& key : names())
        if (views()[key.view].substance == substance)
            text.append(" ").append(lowered(key.spelling));
    return text;
}

Array substance_list(std::optional<std::string_view> words) {
    Array list(5);
    for (const char* heading : {"formula", "name", "phases", "from / K", "to / K"})
        list.add(std::string(heading));
    const std::string wanted = lowered(words.value_or(""));
    for (std::size_t at = 0; at < substance_rows().size(); ++at) {
        SubstanceRow const& row = substance_rows()[at];
        if (!has_all_words(searched(at), wanted)) continue;
        const Substance substance(views()[row.first_view]);
        list.add(std::string(row.formula));
        list.add(std::string(row.name));
        list.add(phase_names(substance));
        list.add(absolute(substance.from()).value());
        list.add(absolute(substance.to()).value());
    }
    return list;
}

/// One row a phase of the ladder; the transition is the one that leads into it.
void add_phase(Array& table, std::span<const Rung> rungs, std::size_t first, std::size_t last) {
    const Phase phase = phase_of(rungs[first]);
    table.add(std::string(phase.name()));
    table.add(rungs[first].from);
    table.add(rungs[last].to);
    if (first > 0 && is_first_order(rungs[first - 1], rungs[first])) {
        table.add(rungs[first].enthalpy_jump / 1000);
        table.add(rungs[first].entropy_jump);
    } else {
        table.add_blank();
        table.add_blank();
    }
    table.add(std::string(phase.source()));
}

Array substance_phases(Substance const& substance) {
    Array table(6);
    for (const char* heading :
         {"phase", "from / K", "to / K", "ΔH / (kJ/mol)", "ΔS / (J/(mol·K))", "source"})
        table.add(std::string(heading));
    const std::span<const Rung> rungs = substance.rungs();
    for (std::size_t first = 0; first < rungs.size();) {
        std::size_t last = first;
        while (last + 1 < rungs.size() && rungs[last + 1].phase == rungs[first].phase) ++last;
        add_phase(table, rungs, first, last);
        first = last + 1;
    }
    return table;
}

constexpr std::size_t curve_columns = 4;

/// A column of a curve in the unit asked for; per mass by the molar mass.
double in_column(std::size_t column, double si, Unit const& unit, double molar_mass) {
    constexpr core::Dimension molar[curve_columns] = {
        core::Dimension::of_temperature, core::dimension<core::MolarHeatCapacity>,
        core::dimension<core::MolarEnergy>, core::dimension<core::MolarEntropy>};
    if (unit.dimension == molar[column]) return unit.from_si(si);
    if (column > 0 && unit.dimension * core::dimension<core::MolarMass> == molar[column])
        return unit.from_si(si / molar_mass);
    constexpr const char* needed[curve_columns] = {
        "a temperature", "a heat capacity per mole or mass", "an enthalpy per mole or mass",
        "an entropy per mole or mass"};
    core::refuse_unfit("the heading of column " + std::to_string(column + 1), needed[column],
                       "give four headings: T, cp, enthalpy, entropy");
}

Array curve_heating(Substance const& substance, Temperature from, Temperature to, double points,
                    std::optional<CurveHeadings> headings) {
    if (!(points >= 2 && points <= 10'000 && points == std::floor(points)))
        core::refuse_impossible(
            core::text::write_number(static_cast<long double>(points), 6) + " points",
            "a whole number of points from 2 to 10000", "choose as many points as the chart needs");
    if (!headings)
        headings =
            CurveHeadings{{"T / K", "cp / (J/(mol·K))", "ΔH / (J/mol)", "ΔS / (J/(mol·K))"}, {}};
    for (std::size_t at = headings->units.size(); at < headings->texts.size(); ++at)
        headings->units.push_back(core::text::read_heading(headings->texts[at]).unit);
    if (headings->texts.size() != curve_columns)
        core::refuse_unfit(std::to_string(headings->texts.size()) + " headings",
                           "four headings: T, cp, enthalpy, entropy", "select four heading cells");
    Array curve(curve_columns);
    for (std::string const& text : headings->texts) curve.add(text);
    const double molar_mass = substance.molar_mass().value();
    for (CurvePoint const& point :
         heating_curve(substance, from, to, static_cast<std::size_t>(points))) {
        const double values[curve_columns] = {absolute(point.temperature).value(),
                                              point.heat_capacity.value(), point.enthalpy.value(),
                                              point.entropy.value()};
        for (std::size_t column = 0; column < curve_columns; ++column)
            curve.add(in_column(column, values[column], headings->units[column], molar_mass));
    }
    return curve;
}

constexpr Entry entries[] = {
    describe(
        {.name = "SUBSTANCE.LIST",
         .says = "What is in the tables: an array of formulas, names, phases and ranges.",
         .arguments =
             {{{.name = "words",
                .symbol = "words",
                .says = "words or parts of a formula that a row must hold; all rows if left out",
                .example = "oxide"}}},
         .forms = {form<substance_list>("the rows of the tables", report)}}),
    describe(
        {.name = "SUBSTANCE.PHASES",
         .says = "The phases of a substance at 1 bar: an array of ranges, the transitions into "
                 "them, and sources.",
         .arguments = {{substance}},
         .forms = {form<substance_phases>("the phases from low to high temperature", report)}}),
    describe({.name = "CURVE.HEATING",
              .says = "A heating curve for a chart: an array of temperature, heat capacity, "
                      "enthalpy and entropy counted from the start, upright steps at transitions.",
              .arguments = {{substance,
                             from_temperature,
                             to_temperature,
                             {.name = "points",
                              .symbol = "points",
                              .says = "how many equally spaced temperatures, 2 to 10000",
                              .example = "50"},
                             {.name = "units",
                              .symbol = "units",
                              .says = "a row of four headings with the units; K and SI if left out",
                              .example = "B4:E4"}}},
              .forms = {form<curve_heating>("T, cp, ∫cp dT, ∫cp/T dT, transitions included", report,
                                            "1 bar, the stable phase at each temperature")}}),
};

} // namespace

std::span<const Entry> tables() { return entries; }

} // namespace catalogue
} // namespace registration
