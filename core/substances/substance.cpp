// SPDX-License-Identifier: MPL-2.0
#include "core/substances/substance.h"

#include "core/failure.h"
#include "core/written.h"

#include <algorithm>

namespace core::substances {

namespace {

/// Room for what a conversion of units rounds away at the end of a range.
constexpr double rounding = 1e-12;

bool is_below(double t, double from) { return t < from * (1 - rounding); }
bool is_above(double t, double to) { return t > to * (1 + rounding); }

std::string range(double from, double to) {
    return "from " + written(from) + " to " + written(to) + " K";
}

[[noreturn]] void refuse_range(double t, std::string const& what, double from, double to) {
    refuse_impossible(written(t) + " K",
                      "a temperature " + range(from, to) + ", where " + what + " is tabulated",
                      "stay inside the range; nothing is extrapolated");
}

std::string name_of(PhaseRow const& row) {
    return std::string(substance_rows()[row.substance].formula) + '(' + std::string(row.name) + ')';
}

/// The interval of the phase that holds the temperature, which must lie inside the phase.
Interval const& interval_at(PhaseRow const& row, double t) {
    const auto own = intervals().subspan(row.first_interval, row.interval_count);
    if (is_below(t, own.front().from) || is_above(t, own.back().to))
        refuse_range(t, name_of(row), own.front().from, own.back().to);
    std::size_t i = 0;
    while (i + 1 < own.size() && t > own[i].to) ++i;
    return own[i];
}

double kelvin(Temperature t) { return absolute(t).value(); }

double clamped(Interval const& i, Temperature t) { return std::clamp(kelvin(t), i.from, i.to); }

} // namespace

MolarMass Phase::molar_mass() const {
    return MolarMass::from_value(substance_rows()[row_->substance].molar_mass);
}

Temperature Phase::from() const {
    return Temperature::kelvin(intervals()[row_->first_interval].from);
}

Temperature Phase::to() const {
    return Temperature::kelvin(intervals()[row_->first_interval + row_->interval_count - 1u].to);
}

MolarHeatCapacity Phase::heat_capacity(Temperature t) const {
    Interval const& i = interval_at(*row_, kelvin(t));
    return MolarHeatCapacity::from_value(heat_capacity_of(i, clamped(i, t)));
}

MolarEnergy Phase::enthalpy(Temperature t) const {
    Interval const& i = interval_at(*row_, kelvin(t));
    return MolarEnergy::from_value(enthalpy_of(i, clamped(i, t)));
}

MolarEntropy Phase::entropy(Temperature t) const {
    Interval const& i = interval_at(*row_, kelvin(t));
    return MolarEntropy::from_value(entropy_of(i, clamped(i, t)));
}

MolarEnergy Phase::gibbs(Temperature t) const { return enthalpy(t) - absolute(t) * entropy(t); }

std::string Substance::written() const {
    const bool isomer = std::any_of(formulas().begin(), formulas().end(), [&](Key const& key) {
        return key.ambiguous && key.spelling == formula();
    });
    std::string text(isomer ? name() : formula());
    if (!view_->state.empty()) text += '(' + std::string(view_->state) + ')';
    return text;
}

std::span<const AtomRow> Substance::atoms() const {
    return atom_rows().subspan(row().first_atom, row().atom_count);
}

bool Substance::is_gas() const {
    const auto all = rungs();
    return phase_of(all.front()).aggregation() == Aggregation::gas;
}

std::string_view Substance::reason_gas_is_apart() const {
    return row().vapour == Vapour::apart ? row().vapour_reason : std::string_view();
}

std::span<const PhaseRow> Substance::phases() const {
    return phase_rows().subspan(row().first_phase, row().phase_count);
}

std::size_t Substance::rung_at(Temperature temperature) const {
    const double t = kelvin(temperature);
    const auto all = rungs();
    if (is_below(t, all.front().from) || is_above(t, all.back().to))
        refuse_range(t, written(), all.front().from, all.back().to);
    std::size_t i = 0;
    while (i + 1 < all.size() && t > all[i].to) ++i;
    if (all[i].gap && is_below(t, all[i].from))
        refuse_impossible(core::written(temperature),
                          "a temperature where " + written() + " is tabulated, not in the gap " +
                              range(all[i - 1].to, all[i].from),
                          "stay on one side of the gap");
    return i;
}

Phase Substance::phase_at(Temperature t) const { return phase_of(rungs()[rung_at(t)]); }

MolarHeatCapacity Substance::heat_capacity(Temperature t) const {
    Rung const& rung = rungs()[rung_at(t)];
    return MolarHeatCapacity::from_value(heat_capacity_of(interval_of(rung), inside(rung, t)));
}

MolarEnergy Substance::enthalpy(Temperature t) const {
    Rung const& rung = rungs()[rung_at(t)];
    return MolarEnergy::from_value(enthalpy_of(interval_of(rung), inside(rung, t)));
}

MolarEntropy Substance::entropy(Temperature t) const {
    Rung const& rung = rungs()[rung_at(t)];
    return MolarEntropy::from_value(entropy_of(interval_of(rung), inside(rung, t)));
}

MolarEnergy Substance::gibbs(Temperature t) const { return enthalpy(t) - absolute(t) * entropy(t); }

bool Substance::is_gas_in_the_open(Temperature t) const {
    const Substance in_any_state(views()[row().first_view]);
    if (in_any_state.rungs().empty()) return false; // condensed, though only its gas is tabulated
    return in_any_state.phase_at(std::clamp(t, in_any_state.from(), in_any_state.to()))
               .aggregation() == Aggregation::gas;
}

MolarEntropy Substance::entropy_uncertainty(Temperature t) const {
    const Phase phase = phase_at(t);
    if (phase.aggregation() == Aggregation::gas) return phase.entropy_uncertainty();
    const Substance in_any_state(views()[row().first_view]);
    for (Substance const& each : {*this, in_any_state})
        for (Rung const& rung : each.rungs())
            if (rung.from <= 298.15 && rung.to >= 298.15)
                return phase_of(rung).entropy_uncertainty();
    return {};
}

} // namespace core::substances
