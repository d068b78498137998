// SPDX-License-Identifier: MPL-2.0
#include "core/steam/machine.h"

#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::steam;

State at(double t, double p) {
    return at_temperature_and_pressure(Temperature::kelvin(t), {Pressure::from_value(p)});
}

TEST(SteamMachines, HaveTheEfficiencyTheyAreMadeWith) {
    const State begin = at(773.15, 8e6);
    for (const double eta : {0.5, 0.85, 1.0}) {
        const State ideal = at_pressure_and_entropy({Pressure::from_value(1e4)}, begin.entropy);
        ASSERT_TRUE(ideal.dryness); // a wet end
        const SpecificEnergy h = begin.enthalpy + eta * (ideal.enthalpy - begin.enthalpy);
        const State end = at_pressure_and_enthalpy({Pressure::from_value(1e4)}, h);
        EXPECT_NEAR(efficiency_isentropic(begin, end), eta, 1e-9);
    }
    const State cold = at(313.15, 1e4);
    for (const double eta : {0.4, 0.75, 1.0}) {
        const State ideal = at_pressure_and_entropy({Pressure::from_value(8e6)}, cold.entropy);
        const SpecificEnergy h = cold.enthalpy + (ideal.enthalpy - cold.enthalpy) / eta;
        const State end = at_pressure_and_enthalpy({Pressure::from_value(8e6)}, h);
        EXPECT_NEAR(efficiency_isentropic(cold, end), eta, 1e-7);
    }
}

TEST(SteamMachines, ThatCannotBeAreRefused) {
    const State begin = at(773.15, 8e6);
    expect_refusal(impossible, "both pressures", "other than",
                   [&] { efficiency_isentropic(begin, at(700, 8e6)); });
    expect_refusal(impossible, "s2 - s1", "second law",
                   [&] { efficiency_isentropic(begin, at(320, 5e6)); });
    expect_refusal(impossible, "h2 - h1", "falls in a turbine",
                   [&] { efficiency_isentropic(begin, at(900, 1e5)); });
}

// Against the surroundings a state has no less exergy than nothing: h - h0 - T0·(s - s0) >= 0 for the
// flowing state at the pressure of the surroundings, with its least at their temperature.
TEST(SteamExergy, IsLeastInTheSurroundings) {
    const State surroundings = at(288.15, 1.01325e5);
    EXPECT_EQ(exergy(surroundings, surroundings).value(), 0);
    for (const double t : {275.0, 300.0, 350.0, 400.0, 900.0})
        EXPECT_GT(exergy(at(t, 1.01325e5), surroundings).value(), 0) << t;
    const State live = at(773.15, 8e6);
    EXPECT_NEAR(exergy(live, surroundings).value(),
                (live.enthalpy - surroundings.enthalpy).value() -
                    288.15 * (live.entropy - surroundings.entropy).value(),
                1e-6);
}

TEST(SaturationCurve, RunsFromTheTripleToTheCriticalPoint) {
    const auto curve = saturation_curve(101);
    ASSERT_EQ(curve.size(), 101u);
    EXPECT_NEAR(curve.front().pressure.value(), 611.657, 0.01); // R7-97, section 5
    EXPECT_NEAR(curve.front().liquid_entropy.value(), 0, 1e-3);
    EXPECT_EQ(curve.back().pressure.value(), 22.064e6);
    EXPECT_EQ(curve.back().liquid_entropy, curve.back().vapour_entropy);
    for (std::size_t i = 1; i < curve.size(); ++i) {
        EXPECT_GT(curve[i].pressure, curve[i - 1].pressure);
        EXPECT_GE(curve[i].vapour_entropy, curve[i].liquid_entropy);
        EXPECT_GT(curve[i].liquid_entropy, curve[i - 1].liquid_entropy);
        EXPECT_LT(curve[i].vapour_entropy, curve[i - 1].vapour_entropy);
    }
    expect_refusal(impossible, "1 points", "2 to 10000", [] { saturation_curve(1); });
}

} // namespace
