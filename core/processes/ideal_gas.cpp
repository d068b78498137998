// SPDX-License-Identifier: MPL-2.0
#include "core/processes/ideal_gas.h"

#include "core/failure.h"
#include "core/processes/machine.h"
#include "core/written.h"

#include <algorithm>
#include <cmath>
#include <string>

namespace core::processes {

namespace {

using GasHeatCapacity = Positive<MolarHeatCapacity>;

[[noreturn, gnu::cold, gnu::noinline]] void refuse_as_gas(GasHeatCapacity cp) {
    refuse_impossible("cp = " + written(cp.value),
                      "a heat capacity at constant pressure above R = " + written(gas_constant) +
                          ", as every gas has",
                      "check the unit of the heat capacity and that it is the one at constant "
                      "pressure");
}

void check_gas(GasHeatCapacity cp) {
    if (!(cp.value > gas_constant)) refuse_as_gas(cp);
}

/// The two terms of the entropy between two states, cp · ln(T2 / T1) and R · ln(p2 / p1).
struct Terms {
    MolarEntropy heating, compression;

    MolarEntropy entropy() const { return heating - compression; }
    /// Below zero by more than the terms are rounded.
    bool deficit() const {
        return entropy().value() <
               -1e-12 * (std::abs(heating.value()) + std::abs(compression.value()));
    }
};

Terms terms(GasHeatCapacity cp, Temperature t1, Positive<Pressure> p1, Temperature t2,
            Positive<Pressure> p2) {
    check_gas(cp);
    return {cp.value * ln_ratio(t2, t1), gas_constant * ln_ratio(p2.value, p1.value)};
}

/// Apart, so that the relations stay small where nobody listens.
[[gnu::cold, gnu::noinline]] void tell_terms(Terms const& t, Notes const& notes) {
    notes.step([&] { return "cp · ln(T2 / T1) = " + written(t.heating); });
    notes.step([&] { return "R · ln(p2 / p1) = " + written(t.compression); });
}

void note_terms(Terms const& t, Notes const& notes) {
    if (notes.hears_steps()) tell_terms(t, notes);
}

/// (R / cp) · ln(p2 / p1), which is ln(T2s / T1).
double isentropic_exponent(GasHeatCapacity cp, Positive<Pressure> p1, Positive<Pressure> p2) {
    return static_cast<double>(gas_constant / cp.value) * ln_ratio(p2.value, p1.value);
}

} // namespace

MolarEntropy polytropic(GasHeatCapacity heat_capacity, double exponent, Temperature from,
                        Temperature to, Notes const& notes) {
    check_gas(heat_capacity);
    if (exponent == 1)
        refuse_impossible("exponent = 1", "an exponent other than 1, at which nothing is heated",
                          "use ENTROPY.ISOTHERMAL with the two volumes or pressures");
    const double ln_pressures = exponent / (exponent - 1) * ln_ratio(to, from);
    notes.step(
        [&] { return "p2 / p1 = (T2 / T1)^(k / (k - 1)) = " + written(std::exp(ln_pressures)); });
    const Terms t{heat_capacity.value * ln_ratio(to, from), gas_constant * ln_pressures};
    note_terms(t, notes);
    return t.entropy();
}

MolarEntropy entropy_of_gas(GasHeatCapacity heat_capacity, Temperature temperature_1,
                            Positive<Pressure> pressure_1, Temperature temperature_2,
                            Positive<Pressure> pressure_2, Notes const& notes) {
    const Terms t = terms(heat_capacity, temperature_1, pressure_1, temperature_2, pressure_2);
    note_terms(t, notes);
    return t.entropy();
}

MolarEnergy enthalpy_of_gas(GasHeatCapacity heat_capacity, Temperature temperature_1,
                            Positive<Pressure>, Temperature temperature_2, Positive<Pressure>) {
    check_gas(heat_capacity);
    return heat_capacity.value * (temperature_2 - temperature_1);
}

MolarEntropy adiabatic_generation(GasHeatCapacity heat_capacity, Temperature temperature_1,
                                  Positive<Pressure> pressure_1, Temperature temperature_2,
                                  Positive<Pressure> pressure_2, Notes const& notes) {
    const Terms t = terms(heat_capacity, temperature_1, pressure_1, temperature_2, pressure_2);
    note_terms(t, notes);
    if (t.deficit())
        notes.remark([] {
            return std::string("a deficit: no adiabatic step leads from the first state to the "
                               "second (second law); heat was given off, or a figure is wrong");
        });
    return t.entropy();
}

Temperature temperature_adiabatic(GasHeatCapacity heat_capacity, Temperature temperature_1,
                                  Positive<Pressure> pressure_1, Positive<Pressure> pressure_2,
                                  std::optional<Efficiency> efficiency, Notes const& notes) {
    check_gas(heat_capacity);
    const double eta = efficiency ? efficiency->value : 1;
    const double exponent = isentropic_exponent(heat_capacity, pressure_1, pressure_2);
    notes.step([&] {
        return "T2s = T1 · (p2 / p1)^(R / cp) = " +
               written(absolute(temperature_1) * std::exp(exponent));
    });
    // Both forms add terms of one sign only, so that nothing cancels, however large the ratio.
    const double ratio =
        exponent > 0 ? 1 + std::expm1(exponent) / eta : (1 - eta) + eta * std::exp(exponent);
    return Temperature::kelvin((absolute(temperature_1) * ratio).value());
}

Dimensionless efficiency_isentropic(GasHeatCapacity heat_capacity, Temperature temperature_1,
                                    Positive<Pressure> pressure_1, Temperature temperature_2,
                                    Positive<Pressure> pressure_2, Notes const& notes) {
    check_gas(heat_capacity);
    check_machine(temperature_1, pressure_1, temperature_2, pressure_2);
    const TemperatureDifference ideal =
        absolute(temperature_1) *
        std::expm1(isentropic_exponent(heat_capacity, pressure_1, pressure_2));
    const TemperatureDifference ideal_end = absolute(temperature_1) + ideal;
    notes.step([&] { return "T2s = T1 · (p2 / p1)^(R / cp) = " + written(ideal_end); });
    if (terms(heat_capacity, temperature_1, pressure_1, temperature_2, pressure_2).deficit())
        refuse_impossible("T2 = " + written(temperature_2) + " where the ideal step ends at " +
                              written(ideal_end),
                          "an efficiency of 1 at most (second law)",
                          "check the temperatures and pressures, and that no heat was exchanged");
    const TemperatureDifference real = temperature_2 - temperature_1;
    const double eta = pressure_2.value > pressure_1.value ? ideal / real : real / ideal;
    return std::min(eta, 1.0);
}

} // namespace core::processes
