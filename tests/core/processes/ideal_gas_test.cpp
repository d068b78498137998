// SPDX-License-Identifier: MPL-2.0
#include "core/processes/ideal_gas.h"

#include "tests/core/accuracy.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::processes;
using accuracy::Exact;

Positive<MolarHeatCapacity> times_gas_constant(double factor) { return {gas_constant * factor}; }
Positive<Pressure> pascal(double value) { return {Pressure::from_value(value)}; }
Temperature kelvin(double value) { return Temperature::kelvin(value); }

double magnitude(double a, double b) { return std::abs(a) + std::abs(b); }

TEST(EntropyOfGas, AgreesWithNormalShocks) {
    for (auto const& row : published::read_table(
             PUBLISHED_DIR "/normal_shock.csv",
             {"mach_number", "temperature_ratio", "pressure_ratio", "value", "unit", "tolerance"},
             3)) {
        const MolarEntropy rise = entropy_of_gas(times_gas_constant(3.5), kelvin(300), pascal(1e5),
                                                 kelvin(300 * row.number("temperature_ratio")),
                                                 pascal(1e5 * row.number("pressure_ratio")));
        EXPECT_NEAR(rise / gas_constant, row.number("value"), row.number("tolerance"));
    }
}

TEST(EntropyOfGas, AgreesWithATextbookOnAir) {
    const auto rows =
        published::read_table(PUBLISHED_DIR "/air_constant_heat_capacity.csv",
                              {"quantity", "heat_capacity", "temperature_1", "pressure_1",
                               "temperature_2", "pressure_2", "value", "unit", "tolerance"},
                              2);
    auto const& entropy = rows.at(0);
    ASSERT_EQ(entropy.text("quantity"), "entropy over R");
    EXPECT_NEAR(entropy_of_gas(
                    times_gas_constant(entropy.number("heat_capacity")),
                    kelvin(entropy.number("temperature_1")), pascal(entropy.number("pressure_1")),
                    kelvin(entropy.number("temperature_2")), pascal(entropy.number("pressure_2"))) /
                    gas_constant,
                entropy.number("value"), entropy.number("tolerance"));
    auto const& end = rows.at(1);
    ASSERT_EQ(end.text("quantity"), "end temperature");
    EXPECT_NEAR(absolute(temperature_adiabatic(times_gas_constant(end.number("heat_capacity")),
                                               kelvin(end.number("temperature_1")),
                                               pascal(end.number("pressure_1")),
                                               pascal(end.number("pressure_2")), std::nullopt))
                    .value(),
                end.number("value"), end.number("tolerance"));
}

RC_GTEST_PROP(EntropyOfGas, DoesNotDependOnThePath, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature a = random_states::temperature(), b = random_states::temperature(),
                      c = random_states::temperature();
    const auto pa = random_states::pressure(), pb = random_states::pressure(),
               pc = random_states::pressure();
    const double direct = entropy_of_gas(cp, a, pa, c, pc).value();
    const double first = entropy_of_gas(cp, a, pa, b, pb).value();
    const double second = entropy_of_gas(cp, b, pb, c, pc).value();
    RC_ASSERT(std::abs(direct - first - second) <= 1e-13 * (1e3 + magnitude(first, second)));
}

RC_GTEST_PROP(EntropyOfGas, ChangesItsSignOnTheWayBack, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature a = random_states::temperature(), b = random_states::temperature();
    const auto p = random_states::pressure(), q = random_states::pressure();
    RC_ASSERT(std::abs((entropy_of_gas(cp, a, p, b, q) + entropy_of_gas(cp, b, q, a, p)).value()) <=
              1e-13 * 1e3);
}

RC_GTEST_PROP(EntropyOfGas, IsIsobaricAtOnePressureAndIsothermalAtOneTemperature, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature a = random_states::temperature(), b = random_states::temperature();
    const auto p = random_states::pressure(), q = random_states::pressure();
    RC_ASSERT(entropy_of_gas(cp, a, p, b, p) == isobaric<Molar>(cp, a, b));
    const double isothermal = isothermal_by_pressure(p, q).value();
    RC_ASSERT(std::abs(entropy_of_gas(cp, a, p, a, q).value() - isothermal) <=
              1e-15 * std::abs(isothermal)); // 2 units of at most 2^-52 each
}

RC_GTEST_PROP(EntropyOfGas, EqualsHeatingAtConstantVolumeAndExpansion, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature a = random_states::temperature(), b = random_states::temperature();
    const auto p = random_states::pressure();
    const double ratio = random_states::between(0.01, 100); // V2 / V1
    const auto q = pascal((p.value * (absolute(b) / absolute(a)) / ratio).value());
    const MolarEntropy by_volume =
        isochoric<Molar>({cp.value - gas_constant}, a, b) +
        isothermal_by_volume<Total>({Volume::from_value(1)}, {Volume::from_value(ratio)});
    RC_ASSERT(std::abs((entropy_of_gas(cp, a, p, b, q) - by_volume).value()) <= 1e-13 * 1e3);
}

RC_GTEST_PROP(Isobaric, KeepsItsDigitsForSmallSteps, ()) {
    const double from = random_states::between(10, 5000);
    const double to = from * (1 + random_states::between(1e-15, 1e-3));
    const double step =
        isobaric<Specific>({SpecificHeatCapacity::from_value(4184)}, kelvin(from), kelvin(to))
            .value();
    RC_ASSERT(accuracy::ulps(step, 4184 * log(Exact(to) / Exact(from))) <= 2.5);
}

TEST(Isothermal, TakesVolumesOnAnyBasis) {
    const double expected = 8.31446261815324 * std::log(2.0);
    EXPECT_DOUBLE_EQ(
        isothermal_by_volume<Molar>({MolarVolume::from_value(1)}, {MolarVolume::from_value(2)})
            .value(),
        expected);
    EXPECT_DOUBLE_EQ(
        isothermal_by_volume<Rate>({VolumeFlow::from_value(1)}, {VolumeFlow::from_value(2)})
            .value(),
        expected);
}

RC_GTEST_PROP(Polytropic, EqualsTheStatesAtItsEnds, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const double k = *rc::gen::element(-3.0, 0.0, 0.7, 0.99, 1.01, 1.3, 1.4, 5.0);
    const Temperature a = random_states::temperature();
    const Temperature b = kelvin(absolute(a).value() * random_states::between(0.97, 1.03));
    const auto p = random_states::pressure();
    const double pressure_ratio = std::pow(absolute(b) / absolute(a), k / (k - 1));
    const MolarEntropy expected =
        entropy_of_gas(cp, a, p, b, pascal(p.value.value() * pressure_ratio));
    RC_ASSERT(std::abs((polytropic(cp, k, a, b) - expected).value()) <= 1e-11);
}

TEST(Polytropic, IsIsobaricAtZeroAndIsentropicAtTheRatioOfHeatCapacities) {
    const auto cp = times_gas_constant(3.5);
    EXPECT_EQ(polytropic(cp, 0, kelvin(300), kelvin(400)),
              isobaric<Molar>(cp, kelvin(300), kelvin(400)));
    EXPECT_NEAR(polytropic(cp, 1.4, kelvin(300), kelvin(400)).value(), 0, 1e-14);
}

TEST(Polytropic, RefusesTheIsothermalExponent) {
    expect_refusal(impossible, "exponent = 1", "an exponent other than 1",
                   [] { polytropic(times_gas_constant(3.5), 1, kelvin(300), kelvin(400)); });
}

TEST(IdealGas, RefusesAHeatCapacityThatNoGasHas) {
    expect_refusal(impossible, "cp = 8.314462618 J", "above R", [] {
        entropy_of_gas(times_gas_constant(1), kelvin(300), pascal(1), kelvin(400), pascal(2));
    });
    expect_refusal(impossible, "cp = ", "above R", [] {
        enthalpy_of_gas(times_gas_constant(0.5), kelvin(300), pascal(1), kelvin(400), pascal(2));
    });
}

TEST(EnthalpyOfGas, DoesNotAskThePressures) {
    const auto cp = times_gas_constant(4);
    EXPECT_EQ(enthalpy_of_gas(cp, kelvin(300), pascal(1e5), kelvin(350), pascal(1e7)),
              cp.value * (kelvin(350) - kelvin(300)));
}

TEST(AdiabaticGeneration, RemarksADeficitOnly) {
    std::vector<std::string> remarks;
    const Notes notes(nullptr, &remarks);
    const auto cp = times_gas_constant(3.5);
    const Temperature ideal =
        temperature_adiabatic(cp, kelvin(300), pascal(1e5), pascal(1e6), std::nullopt);
    adiabatic_generation(cp, kelvin(300), pascal(1e5), ideal, pascal(1e6), notes);
    adiabatic_generation(cp, kelvin(300), pascal(1e5), kelvin(620), pascal(1e6), notes);
    EXPECT_TRUE(remarks.empty());
    EXPECT_LT(adiabatic_generation(cp, kelvin(300), pascal(1e5), kelvin(570), pascal(1e6), notes),
              MolarEntropy{});
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_NE(remarks[0].find("a deficit"), std::string::npos);
}

RC_GTEST_PROP(TemperatureAdiabatic, KeepsTheEntropyWhereItIsIdeal, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature t1 = random_states::temperature();
    const auto p1 = random_states::pressure(), p2 = random_states::pressure();
    const Temperature t2 = temperature_adiabatic(cp, t1, p1, p2, std::nullopt);
    RC_ASSERT(std::abs(entropy_of_gas(cp, t1, p1, t2, p2).value()) <= 1e-13 * 1e3);
}

RC_GTEST_PROP(TemperatureAdiabatic, IsUndoneByTheEfficiency, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature t1 = random_states::temperature();
    const auto p1 = random_states::pressure();
    const auto p2 = pascal(p1.value.value() * *rc::gen::element(0.01, 0.3, 0.9, 1.1, 4.0, 60.0));
    const double eta = random_states::between(0.05, 1);
    const Temperature t2 = temperature_adiabatic(cp, t1, p1, p2, Efficiency{eta});
    RC_ASSERT(std::abs(efficiency_isentropic(cp, t1, p1, t2, p2) - eta) <= 1e-11);
    RC_ASSERT(adiabatic_generation(cp, t1, p1, t2, p2).value() >= -1e-13 * 1e3);
}

RC_GTEST_PROP(EfficiencyIsentropic, IsRefusedExactlyWhereEntropyWouldVanish, ()) {
    const auto cp = random_states::gas_heat_capacity();
    const Temperature t1 = random_states::temperature();
    const auto p1 = random_states::pressure(), p2 = random_states::pressure();
    RC_PRE(std::abs(std::log(p2.value / p1.value)) > 0.01);
    const Temperature ideal = temperature_adiabatic(cp, t1, p1, p2, std::nullopt);
    const double rise = absolute(ideal).value() - absolute(t1).value();
    const double eta = *rc::gen::element(0.5, 0.9, 0.999, 1.001, 1.1, 1.5);
    const double t2 = absolute(t1).value() + (rise > 0 ? rise / eta : rise * eta);
    RC_PRE(t2 > 0);
    bool refused = false;
    try {
        (void)efficiency_isentropic(cp, t1, p1, kelvin(t2), p2);
    } catch (Failure const& failure) {
        refused = failure.kind == impossible;
    }
    RC_ASSERT(refused == (eta > 1));
    RC_ASSERT(refused == (adiabatic_generation(cp, t1, p1, kelvin(t2), p2) < MolarEntropy{}));
}

RC_GTEST_PROP(TemperatureAdiabatic, KeepsItsDigits, ()) {
    const double ratio = *rc::gen::element(1e-6, 0.1, 0.999999999, 1.0000000001, 3.0, 1e6);
    const double eta = random_states::between(0.1, 1);
    const double cp = 3.5 * 8.31446261815324;
    const Exact rise = expm1(Exact(8.31446261815324) / Exact(cp) * log(Exact(1e5 * ratio) / 1e5));
    const Exact exact = 300 * (1 + (rise > 0 ? Exact(rise / eta) : Exact(rise * eta)));
    const Temperature t2 = temperature_adiabatic({MolarHeatCapacity::from_value(cp)}, kelvin(300),
                                                 pascal(1e5), pascal(1e5 * ratio), Efficiency{eta});
    RC_ASSERT(accuracy::ulps(absolute(t2).value(), exact) <= 6.0);
}

TEST(TemperatureAdiabatic, StaysWhereThePressureStays) {
    EXPECT_EQ(temperature_adiabatic(times_gas_constant(3.5), kelvin(300), pascal(1e5), pascal(1e5),
                                    Efficiency{0.7}),
              kelvin(300));
}

TEST(TemperatureAdiabatic, TellsTheIdealEnd) {
    std::vector<std::string> steps;
    temperature_adiabatic(times_gas_constant(3.5), kelvin(300), pascal(1e5), pascal(1e6),
                          Efficiency{0.8}, Notes(&steps, nullptr));
    EXPECT_EQ(steps, std::vector<std::string>{"T2s = T1 · (p2 / p1)^(R / cp) = 579.2093187 K"});
}

TEST(EfficiencyIsentropic, RefusesWhatIsNoMachine) {
    const auto cp = times_gas_constant(3.5);
    expect_refusal(impossible, "p1 = p2 = 100000 Pa", "two different pressures", [&] {
        efficiency_isentropic(cp, kelvin(300), pascal(1e5), kelvin(400), pascal(1e5));
    });
    expect_refusal(
        impossible, "T1 = 300 K and T2 = 290 K where the pressure rises", "above the first",
        [&] { efficiency_isentropic(cp, kelvin(300), pascal(1e5), kelvin(290), pascal(1e6)); });
    expect_refusal(
        impossible, "T1 = 300 K and T2 = 300 K where the pressure falls", "below the first",
        [&] { efficiency_isentropic(cp, kelvin(300), pascal(1e6), kelvin(300), pascal(1e5)); });
    expect_refusal(
        impossible, "T2 = 570 K where the ideal step ends at 579.2093187 K",
        "an efficiency of 1 at most",
        [&] { efficiency_isentropic(cp, kelvin(300), pascal(1e5), kelvin(570), pascal(1e6)); });
}

} // namespace
