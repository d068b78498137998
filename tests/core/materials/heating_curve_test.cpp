// SPDX-License-Identifier: MPL-2.0
#include "core/materials/heating_curve.h"

#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::materials;

Temperature kelvin(double value) { return Temperature::kelvin(value); }

/// 900 J/(kg·K) up to 800 K, there 390 kJ/kg, then 1100 J/(kg·K).
OwnMaterial melting() {
    return OwnMaterial::correlated(Basis::specific, {{300, 800, {{0, 900}}, 390e3, 0, "cr"},
                                                     {800, 1200, {{0, 1100}}, 0, 0, "l"}});
}

TEST(HeatingCurveOfOwnMaterials, StepsUprightAtATransition) {
    const auto curve = heating_curve(melting(), kelvin(300), kelvin(1000), 4);
    ASSERT_EQ(curve.size(), 6u);
    CurvePoint const &below = curve[3], &above = curve[4];
    EXPECT_EQ(below.temperature, 800);
    EXPECT_EQ(above.temperature, 800);
    EXPECT_DOUBLE_EQ(below.heat_capacity, 900);
    EXPECT_DOUBLE_EQ(above.heat_capacity, 1100);
    EXPECT_DOUBLE_EQ(below.enthalpy, 450e3);
    EXPECT_DOUBLE_EQ(above.enthalpy, 840e3);
    EXPECT_DOUBLE_EQ(above.entropy - below.entropy, 390e3 / 800);
    EXPECT_DOUBLE_EQ(curve.back().enthalpy, 840e3 + 1100 * 200);
    EXPECT_NEAR(curve.back().entropy,
                900 * std::log(800.0 / 300) + 390e3 / 800 + 1100 * std::log(1000.0 / 800), 1e-9);
}

TEST(HeatingCurveOfOwnMaterials, StepsUprightAtAJumpOfTheHeatCapacity) {
    const OwnMaterial table =
        OwnMaterial::measured(Basis::molar, {300, 400, 400, 500}, {20, 22, 30, 30});
    const auto curve = heating_curve(table, kelvin(300), kelvin(500), 2);
    ASSERT_EQ(curve.size(), 4u);
    EXPECT_DOUBLE_EQ(curve[1].heat_capacity, 22);
    EXPECT_NEAR(curve[2].heat_capacity, 30, 1e-9);
    EXPECT_EQ(curve[1].enthalpy, curve[2].enthalpy);
}

TEST(HeatingCurveOfOwnMaterials, RefusesWhatIsNoCurve) {
    expect_refusal(impossible, "from 1000 K", "above the start",
                   [] { heating_curve(melting(), kelvin(1000), kelvin(300), 5); });
    expect_refusal(impossible, "1 points", "2 to 10000",
                   [] { heating_curve(melting(), kelvin(300), kelvin(400), 1); });
    expect_refusal(impossible, "1300 K", "",
                   [] { heating_curve(melting(), kelvin(300), kelvin(1300), 5); });
}

} // namespace
