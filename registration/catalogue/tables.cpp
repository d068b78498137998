// SPDX-License-Identifier: MPL-2.0
#include "core/materials/heating_curve.h"
#include "core/substances/heating_curve.h"
#include "core/substances/transition.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/curve_columns.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/material_arguments.h"
#include "registration/substance_arguments.h"

#include <algorithm>
#include <cctype>

namespace registration::catalogue {
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

/// The columns of a heating curve, by what the heat capacity is counted per.
std::vector<CurveColumn> heating_columns(core::Dimension heat_capacity) {
    return {{"T", core::Dimension::of_temperature, "a temperature"},
            {"cp", heat_capacity, "a heat capacity"},
            {"ΔH", heat_capacity * core::Dimension::of_temperature, "an enthalpy"},
            {"ΔS", heat_capacity, "an entropy"}};
}

Array curve_heating(Substance const& substance, Temperature from, Temperature to, double points,
                    std::optional<CurveHeadings> headings) {
    const std::size_t count = number_of_points(points);
    CurveColumns columns(heating_columns(core::dimension<core::MolarHeatCapacity>),
                         std::move(headings), substance.molar_mass().value());
    for (CurvePoint const& point : heating_curve(substance, from, to, count))
        columns.add({absolute(point.temperature).value(), point.heat_capacity.value(),
                     point.enthalpy.value(), point.entropy.value()});
    return columns.made();
}

core::Dimension heat_capacity_on(core::materials::Basis basis) {
    switch (basis) {
    case core::materials::Basis::molar:
        return core::dimension<core::MolarHeatCapacity>;
    case core::materials::Basis::specific:
        return core::dimension<core::SpecificHeatCapacity>;
    case core::materials::Basis::total:
        break;
    }
    return core::dimension<core::HeatCapacity>;
}

Array own_curve_heating(AnyOwnMaterial const& own, Temperature from, Temperature to, double points,
                        std::optional<CurveHeadings> headings) {
    const std::size_t count = number_of_points(points);
    const auto molar_mass = own.material->molar_mass();
    CurveColumns columns(heating_columns(heat_capacity_on(own.material->basis())),
                         std::move(headings), molar_mass ? molar_mass->value() : 0);
    for (auto const& point : core::materials::heating_curve(*own.material, from, to, count))
        columns.add({point.temperature, point.heat_capacity, point.enthalpy, point.entropy});
    return columns.made();
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
    describe(
        {.name = "CURVE.HEATING",
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
                                       "1 bar, the stable phase at each temperature"),
                   form<own_curve_heating>("T, cp, ∫cp dT, ∫cp/T dT, rows and transitions included",
                                           "the material as described in the sheet",
                                           "the range of the material; nothing is extrapolated")}}),
};

} // namespace

std::span<const Entry> tables() { return entries; }

} // namespace registration::catalogue
