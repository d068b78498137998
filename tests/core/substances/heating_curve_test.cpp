// SPDX-License-Identifier: MPL-2.0
#include "core/substances/heating_curve.h"

#include "core/substances/heating.h"
#include "core/substances/transition.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/substances/quadrature.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <tuple>

namespace {

using namespace core;
using namespace core::substances;

Temperature kelvin(double value) { return Temperature::kelvin(value); }

TEST(HeatingCurve, HasTwoMorePointsAtEveryTransition) {
    const Substance iron = find_substance("Fe");
    const auto curve = heating_curve(iron, kelvin(300), kelvin(1900), 17);
    ASSERT_EQ(curve.size(), 17u + 2 * 3);
    const auto upright = std::count_if(curve.begin() + 1, curve.end(), [&](CurvePoint const& p) {
        return p.temperature == (&p - 1)->temperature && p.enthalpy > (&p - 1)->enthalpy;
    });
    EXPECT_EQ(upright, 3);
    EXPECT_EQ(curve.front().enthalpy.value(), 0);
    EXPECT_EQ(curve.back().entropy, entropy_of_heating(iron, kelvin(300), kelvin(1900)));
}

TEST(HeatingCurve, RisesAllTheWay) {
    const Substance water = find_substance("H2O");
    const auto curve = heating_curve(water, kelvin(250), kelvin(500), 26);
    ASSERT_EQ(curve.size(), 26u + 2 * 2);
    for (std::size_t i = 1; i < curve.size(); ++i) {
        EXPECT_GT(curve[i].enthalpy, curve[i - 1].enthalpy);
        EXPECT_GE(curve[i].temperature, curve[i - 1].temperature);
    }
}

// After a transition the state is the one just above it.
TEST(HeatingCurve, StepsToThePhaseAbove) {
    const Substance water = find_substance("H2O");
    const auto curve = heating_curve(water, kelvin(300), kelvin(400), 2);
    ASSERT_EQ(curve.size(), 4u);
    EXPECT_EQ(curve[1].temperature, curve[2].temperature);
    EXPECT_NEAR(curve[2].heat_capacity.value(),
                water.heat_capacity(kelvin(absolute(curve[2].temperature).value() + 1e-6)).value(),
                1e-6);
    EXPECT_NEAR((curve[2].entropy - curve[1].entropy).value(), vaporization(water).entropy.value(),
                1e-12);
}

TEST(HeatingCurve, AgreesWithQuadratureAtEveryPoint) {
    for (auto [text, from, to] : {std::tuple{"Fe", 298.15, 2000.0},
                                  {"SiO2", 250.0, 2500.0},
                                  {"H2O", 250.0, 500.0},
                                  {"NiO", 300.0, 1500.0}}) {
        const Substance s = find_substance(text);
        const auto curve = heating_curve(s, kelvin(from), kelvin(to), 9);
        for (std::size_t i = 1; i < curve.size(); ++i) {
            // At a transition the lower of the two points; the step itself stands in other tests.
            if (curve[i].temperature == curve[i - 1].temperature) continue;
            const double t = absolute(curve[i].temperature).value();
            EXPECT_NEAR(
                static_cast<double>(curve[i].entropy.value() / quadrature::heating(s, from, t, 1)),
                1, 1e-12)
                << text << ' ' << t;
            EXPECT_NEAR(
                static_cast<double>(curve[i].enthalpy.value() / quadrature::heating(s, from, t, 0)),
                1, 1e-12)
                << text << ' ' << t;
        }
    }
}

TEST(HeatingCurve, IsRefusedDownwards) {
    expect_refusal(impossible, "from 400 K to 300 K", "an end above the start",
                   [] { heating_curve(find_substance("N2"), kelvin(400), kelvin(300), 2); });
}

} // namespace
