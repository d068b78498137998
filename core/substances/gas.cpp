// SPDX-License-Identifier: MPL-2.0
#include "core/substances/gas.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/processes/machine.h"
#include "core/ratio.h"
#include "core/substances/heating.h"
#include "core/substances/stoichiometric_text.h"
#include "core/text/characters.h"
#include "core/written.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>
#include <cstdint>

namespace core::substances {

namespace {

constexpr std::size_t longest = 1000, most_components = 50;
constexpr double fractions_tolerance = 1e-6;
constexpr std::uintmax_t most_steps = 100;

double kelvin(Temperature t) { return absolute(t).value(); }

/// Σ x of a function of each component.
template<class Function>
auto mean(std::span<const Component> components, Function function) {
    decltype(function(components.front().substance)) sum{};
    for (auto const& [substance, fraction] : components) sum += fraction * function(substance);
    return sum;
}

void check_range(Gas const& gas, Temperature t) {
    if (kelvin(t) >= kelvin(gas.from()) * (1 - 1e-12) &&
        kelvin(t) <= kelvin(gas.to()) * (1 + 1e-12))
        return;
    refuse_impossible(written(t),
                      "a temperature from " + written(gas.from()) + " to " + written(gas.to()) +
                          ", where " + gas.written() + " is tabulated",
                      "stay inside the range; nothing is extrapolated");
}

/// The temperature at which a rising function passes through zero, inside the range of the gas.
template<class Function>
Temperature root(Gas const& gas, Function function) {
    const double low = kelvin(gas.from()), high = kelvin(gas.to());
    const double at_low = function(low), at_high = function(high);
    if (at_low > 0 || at_high < 0)
        refuse_impossible(at_low > 0 ? "an end below " + written(low) + " K"
                                     : "an end above " + written(high) + " K",
                          "an end where " + gas.written() + " is tabulated",
                          "check the pressures; nothing is extrapolated");
    if (at_low == 0) return Temperature::kelvin(low);
    if (at_high == 0) return Temperature::kelvin(high);
    std::uintmax_t steps = most_steps;
    const auto bracket = boost::math::tools::toms748_solve(
        function, low, high, at_low, at_high, boost::math::tools::eps_tolerance<double>(50), steps);
    if (steps >= most_steps)
        throw Failure(Failure::Kind::unconverged, gas.written(),
                      "an iteration that converges in 100 steps", "check the pressures");
    return Temperature::kelvin((bracket.first + bracket.second) / 2);
}

/// The two terms of the entropy between two states.
struct Terms {
    MolarEntropy heating, compression;

    MolarEntropy entropy() const { return heating - compression; }
    /// Below zero by more than the terms are rounded.
    bool deficit() const {
        return entropy().value() <
               -1e-12 * (std::abs(heating.value()) + std::abs(compression.value()));
    }
};

Terms terms(Gas const& gas, Temperature t1, Positive<Pressure> p1, Temperature t2,
            Positive<Pressure> p2, Notes const& notes) {
    const Terms t{gas.entropy_between(t1, t2), gas_constant * ln_ratio(p2.value, p1.value)};
    notes.step([&] { return "∫cp/T dT = " + written(t.heating); });
    notes.step([&] { return "R · ln(p2 / p1) = " + written(t.compression); });
    return t;
}

Temperature ideal_end(Gas const& gas, Temperature t1, Positive<Pressure> p1, Positive<Pressure> p2,
                      Notes const& notes) {
    check_range(gas, t1);
    const double compression = (gas_constant * ln_ratio(p2.value, p1.value)).value();
    const Temperature end = compression == 0 ? t1 : root(gas, [&](double t) {
        return gas.entropy_between(t1, Temperature::kelvin(t)).value() - compression;
    });
    notes.step([&] { return "T2s = " + written(end); });
    return end;
}

/// -R Σ x ln x.
MolarEntropy of_mixing(std::span<const Component> components) {
    double sum = 0;
    for (auto const& component : components)
        if (component.fraction > 0) sum -= component.fraction * std::log(component.fraction);
    return gas_constant * sum;
}

[[noreturn]] void refuse(std::string_view text, std::string needed, std::string repair) {
    refuse_unfit(text::shown(text), std::move(needed), std::move(repair));
}

/// Whether a substance named without a state is none in the open at room temperature; where only
/// its gas is tabulated, finding it without a state is refused for that very reason.
bool is_condensed(std::string_view text) {
    try {
        const Phase stable = find_substance(text).phase_at(Temperature::kelvin(298.15));
        return stable.aggregation() != Aggregation::gas;
    } catch (Failure const&) {
        return true;
    }
}

} // namespace

Gas::Gas(std::vector<Component> components) : components_(std::move(components)) {
    double sum = 0;
    for (Component const& each : components_) sum += each.fraction;
    if (components_.empty() || !(std::abs(sum - 1) <= fractions_tolerance))
        refuse_unfit("a sum of " + core::written(sum), "mole fractions that sum to 1 within 1e-6",
                     "check the fractions");
    for (Component& each : components_) each.fraction /= sum;
}

std::string Gas::written() const {
    if (components_.size() == 1) return components_.front().substance.written();
    std::string text;
    for (auto const& [substance, fraction] : components_)
        text += (text.empty() ? "" : " + ") + core::written(fraction) + ' ' + substance.written();
    return text;
}

MolarMass Gas::molar_mass() const {
    return mean(components_, [](Substance const& s) { return s.molar_mass(); });
}

Temperature Gas::from() const {
    Temperature most = components_.front().substance.from();
    for (auto const& each : components_) most = std::max(most, each.substance.from());
    return most;
}

Temperature Gas::to() const {
    Temperature least = components_.front().substance.to();
    for (auto const& each : components_) least = std::min(least, each.substance.to());
    return least;
}

MolarHeatCapacity Gas::heat_capacity(Temperature t) const {
    check_range(*this, t);
    return mean(components_, [&](Substance const& s) { return s.heat_capacity(t); });
}

MolarEnergy Gas::enthalpy(Temperature t) const {
    check_range(*this, t);
    return mean(components_, [&](Substance const& s) { return s.enthalpy(t); });
}

MolarEntropy Gas::entropy(Temperature t) const {
    check_range(*this, t);
    return mean(components_, [&](Substance const& s) { return s.entropy(t); }) +
           of_mixing(components_);
}

MolarEnergy Gas::enthalpy_between(Temperature from, Temperature to) const {
    check_range(*this, from);
    check_range(*this, to);
    return mean(components_, [&](Substance const& s) { return enthalpy_of_heating(s, from, to); });
}

MolarEntropy Gas::entropy_between(Temperature from, Temperature to) const {
    check_range(*this, from);
    check_range(*this, to);
    return mean(components_, [&](Substance const& s) { return entropy_of_heating(s, from, to); });
}

Substance read_component(std::string_view name, Notes const& notes) {
    const Substance gas = find_gas(name, notes);
    if (!gas.is_gas())
        refuse(name, "gases only, where `" + gas.written() + "` is none", "leave the state out");
    if (notes.hears_remarks() && is_condensed(name))
        notes.remark([&] {
            return gas.written() +
                   " is taken as an ideal gas; at 298.15 K and 1 bar it is condensed";
        });
    return gas;
}

void check_each_once(std::span<const Component> components) {
    for (std::size_t i = 0; i < components.size(); ++i)
        for (std::size_t j = 0; j < i; ++j)
            if (components[i].substance == components[j].substance)
                refuse(components[i].substance.written(), "each gas once",
                       "put the fractions of it together");
}

Gas read_gas(std::string_view text, Notes const& notes) {
    if (text.size() > longest) refuse({}, "a gas of at most 1000 characters", "shorten it");
    const std::vector<Term> terms = read_terms(text, text);
    if (terms.size() > most_components) refuse(text, "at most 50 components", "shorten it");
    std::vector<Component> components;
    for (Term const& term : terms)
        components.push_back({read_component(term.substance, notes), term.coefficient});
    check_each_once(components);
    return Gas(std::move(components));
}

MolarEntropy entropy_of_gas(Gas const& gas, Temperature temperature_1,
                            Positive<Pressure> pressure_1, Temperature temperature_2,
                            Positive<Pressure> pressure_2, Notes const& notes) {
    return terms(gas, temperature_1, pressure_1, temperature_2, pressure_2, notes).entropy();
}

MolarEnergy enthalpy_of_gas(Gas const& gas, Temperature temperature_1, Positive<Pressure>,
                            Temperature temperature_2, Positive<Pressure>) {
    return gas.enthalpy_between(temperature_1, temperature_2);
}

MolarEntropy entropy_standard_of_gas(Gas const& gas, Temperature temperature,
                                     std::optional<Positive<Pressure>> pressure,
                                     Notes const& notes) {
    const MolarEntropy at_one_bar = gas.entropy(temperature);
    for (Component const& each : gas.components()) {
        tell_uncertainty(each.substance, temperature, notes);
        notes.uncertainty([&] {
            return each.fraction * each.substance.entropy_uncertainty(temperature).value();
        });
    }
    notes.step([&] { return "at 1 bar: " + written(at_one_bar); });
    notes.step([&] { return "of it -R · Σ x · ln x = " + written(of_mixing(gas.components())); });
    if (!pressure) return at_one_bar;
    const MolarEntropy term = gas_constant * ln_ratio(pressure->value, standard_pressure);
    notes.step([&] { return "R · ln(p / 1 bar) = " + written(term); });
    return at_one_bar - term;
}

MolarEntropy adiabatic_generation(Gas const& gas, Temperature temperature_1,
                                  Positive<Pressure> pressure_1, Temperature temperature_2,
                                  Positive<Pressure> pressure_2, Notes const& notes) {
    const Terms t = terms(gas, temperature_1, pressure_1, temperature_2, pressure_2, notes);
    if (t.deficit())
        notes.remark([] {
            return std::string("a deficit: no adiabatic step leads from the first state to the "
                               "second (second law); heat was given off, or a figure is wrong");
        });
    return t.entropy();
}

MolarEntropy polytropic(Gas const& gas, double exponent, Temperature from, Temperature to,
                        Notes const& notes) {
    if (exponent == 1)
        refuse_impossible("exponent = 1", "an exponent other than 1, at which nothing is heated",
                          "use ENTROPY.ISOTHERMAL with the two volumes or pressures");
    const double ln_pressures = exponent / (exponent - 1) * ln_ratio(to, from);
    notes.step(
        [&] { return "p2 / p1 = (T2 / T1)^(k / (k - 1)) = " + written(std::exp(ln_pressures)); });
    const MolarEntropy heating = gas.entropy_between(from, to);
    notes.step([&] { return "∫cp/T dT = " + written(heating); });
    return heating - gas_constant * ln_pressures;
}

Temperature temperature_adiabatic(Gas const& gas, Temperature temperature_1,
                                  Positive<Pressure> pressure_1, Positive<Pressure> pressure_2,
                                  std::optional<Efficiency> efficiency, Notes const& notes) {
    const Temperature ideal = ideal_end(gas, temperature_1, pressure_1, pressure_2, notes);
    const double eta = efficiency ? efficiency->value : 1;
    if (eta == 1) return ideal;
    const double step = gas.enthalpy_between(temperature_1, ideal).value();
    const double real = step > 0 ? step / eta : step * eta;
    notes.step([&] { return "h2 - h1 = " + written(MolarEnergy::from_value(real)); });
    if (real == 0) return temperature_1;
    return root(gas, [&](double t) {
        return gas.enthalpy_between(temperature_1, Temperature::kelvin(t)).value() - real;
    });
}

Dimensionless efficiency_isentropic(Gas const& gas, Temperature temperature_1,
                                    Positive<Pressure> pressure_1, Temperature temperature_2,
                                    Positive<Pressure> pressure_2, Notes const& notes) {
    processes::check_machine(temperature_1, pressure_1, temperature_2, pressure_2);
    const Temperature end = ideal_end(gas, temperature_1, pressure_1, pressure_2, notes);
    if (terms(gas, temperature_1, pressure_1, temperature_2, pressure_2, notes).deficit())
        refuse_impossible("T2 = " + written(temperature_2) + " where the ideal step ends at " +
                              written(end),
                          "an efficiency of 1 at most (second law)",
                          "check the temperatures and pressures, and that no heat was exchanged");
    const MolarEnergy ideal = gas.enthalpy_between(temperature_1, end);
    const MolarEnergy real = gas.enthalpy_between(temperature_1, temperature_2);
    notes.step([&] { return "ideal step: " + written(ideal) + ", real step: " + written(real); });
    const double eta = pressure_2.value > pressure_1.value ? ideal / real : real / ideal;
    return std::min(eta, 1.0);
}

} // namespace core::substances
