// SPDX-License-Identifier: MPL-2.0
#include "core/materials/heating_curve.h"
#include "core/substances/heating_curve.h"
#include "core/substances/transition.h"
#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/material_arguments.h"
#include "registration/substance_arguments.h"

#include <algorithm>
#include <array>
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

/// The columns of a heating curve: headings, units, and what turns an amount into a mass.
class Columns {
public:
    /// `molar_mass` is 0 where none is known; `heat_capacity` says what the curve is counted per.
    Columns(std::optional<CurveHeadings> headings, core::Dimension heat_capacity, double molar_mass)
        : molar_mass_(molar_mass), dimensions_{core::Dimension::of_temperature, heat_capacity,
                                               heat_capacity * core::Dimension::of_temperature,
                                               heat_capacity} {
        headings_ = headings ? std::move(*headings) : in_si();
        if (headings_.texts.size() != curve_columns)
            core::refuse_unfit(std::to_string(headings_.texts.size()) + " headings",
                               "four headings: T, cp, enthalpy, entropy",
                               "select four heading cells");
        for (std::string const& text : headings_.texts) curve_.add(text);
    }

    void add(std::initializer_list<double> values) {
        std::size_t column = 0;
        for (const double value : values) {
            curve_.add(in_column(column, value));
            ++column;
        }
    }
    Array made() { return std::move(curve_); }

private:
    CurveHeadings in_si() const {
        const std::string capacity = core::text::si_unit(dimensions_[1]);
        const std::string energy = core::text::si_unit(dimensions_[2]);
        const auto bracketed = [](std::string const& unit) {
            return unit.find_first_of("/·") == std::string::npos ? unit : "(" + unit + ")";
        };
        CurveHeadings headings{{"T / K", "cp / " + bracketed(capacity), "ΔH / " + bracketed(energy),
                                "ΔS / " + bracketed(capacity)},
                               {}};
        for (std::string const& text : headings.texts)
            headings.units.push_back(core::text::read_heading(text).unit);
        return headings;
    }

    /// A value in the unit asked for, on the other basis by the molar mass.
    double in_column(std::size_t column, double si) const {
        constexpr core::Dimension molar_mass = core::dimension<core::MolarMass>;
        const Unit& unit = headings_.units[column];
        if (unit.dimension == dimensions_[column]) return unit.from_si(si);
        if (column > 0 && molar_mass_ > 0 && unit.dimension * molar_mass == dimensions_[column])
            return unit.from_si(si / molar_mass_);
        if (column > 0 && molar_mass_ > 0 && unit.dimension == dimensions_[column] * molar_mass)
            return unit.from_si(si * molar_mass_);
        constexpr const char* needed[curve_columns] = {"a temperature", "a heat capacity",
                                                       "an enthalpy", "an entropy"};
        core::refuse_unfit("the heading of column " + std::to_string(column + 1) + ", `" +
                               headings_.texts[column] + "`",
                           std::string(needed[column]) + ", for example in " +
                               core::text::si_unit(dimensions_[column]),
                           "give four headings: T, cp, enthalpy, entropy");
    }

    double molar_mass_;
    std::array<core::Dimension, curve_columns> dimensions_;
    CurveHeadings headings_;
    Array curve_{curve_columns};
};

std::size_t whole_number_of(double points) {
    if (!(points >= 2 && points <= 10'000 && points == std::floor(points)))
        core::refuse_impossible(
            core::text::write_number(static_cast<long double>(points), 6) + " points",
            "a whole number of points from 2 to 10000", "choose as many points as the chart needs");
    return static_cast<std::size_t>(points);
}

Array curve_heating(Substance const& substance, Temperature from, Temperature to, double points,
                    std::optional<CurveHeadings> headings) {
    const std::size_t count = whole_number_of(points);
    Columns columns(std::move(headings), core::dimension<core::MolarHeatCapacity>,
                    substance.molar_mass().value());
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
    const std::size_t count = whole_number_of(points);
    const auto molar_mass = own.material->molar_mass();
    Columns columns(std::move(headings), heat_capacity_on(own.material->basis()),
                    molar_mass ? molar_mass->value() : 0);
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

} // namespace catalogue
} // namespace registration
