// SPDX-License-Identifier: MPL-2.0
#include "core/balance/stream_exergy.h"

#include "core/constants.h"
#include "tests/core/accuracy.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::balance;
using accuracy::Exact;

Temperature kelvin(double t) { return Temperature::kelvin(t); }
Positive<Pressure> pascal(double p) { return {Pressure::from_value(p)}; }

RC_GTEST_PROP(StreamExergy, KeepsItsDigitsNearTheSurroundings, ()) {
    const double t0 = random_states::between(200, 400);
    const double t =
        t0 * (1 + (*rc::gen::arbitrary<bool>() ? 1 : -0.5) * random_states::between(1e-9, 1));
    const Exact d = (Exact(t) - Exact(t0)) / Exact(t0);
    const Exact exact = d - log1p(d);
    RC_ASSERT(std::abs(static_cast<double>(exergy_share(kelvin(t), kelvin(t0)) / exact) - 1) <
              1e-6);
    RC_ASSERT(exergy_share(kelvin(t), kelvin(t0)) >= 0);
}

TEST(StreamExergy, IsZeroInTheSurroundingsAndNeverLess) {
    const auto air = substances::read_gas("air");
    EXPECT_EQ(exergy_of_gas(air, kelvin(288), pascal(1e5), kelvin(288), pascal(1e5)).value(), 0);
    for (const double t : {220.0, 280.0, 300.0, 900.0})
        EXPECT_GT(exergy_of_gas(air, kelvin(t), pascal(1e5), kelvin(288), pascal(1e5)).value(), 0);
    // R·T0·ln(p/p0) at the temperature of the surroundings
    EXPECT_NEAR(exergy_of_gas(air, kelvin(288), pascal(7e5), kelvin(288), pascal(1e5)).value(),
                gas_constant.value() * 288 * std::log(7.0), 1e-9);
}

TEST(StreamExergy, OfWhatCondensesOnTheWayIsRefused) {
    const auto exergy = [](const char* text) {
        return [=] {
            exergy_of_gas(substances::read_gas(text), kelvin(400), pascal(1e5), kelvin(290),
                          pascal(1e5));
        };
    };
    expect_refusal(impossible, "H2O(g) in surroundings of 290 K", "a gas", exergy("water"));
    expect_refusal(impossible, "CH3OH(g)", "a gas", exergy("CH3OH(g)"));
    EXPECT_NO_THROW(exergy("CO2")());
    EXPECT_NO_THROW(exergy("0.9 N2 + 0.1 H2O(g)")());
}

// Three routes to the exergy of a constant heat capacity: closed form, own material, ideal gas at p0.
TEST(StreamExergy, DoesNotDependOnTheRoute) {
    const auto own =
        materials::OwnMaterial::measured(materials::Basis::molar, {250, 900}, {30, 30});
    const double expected = 30 * (700 - 290 - 290 * std::log(700.0 / 290));
    const Positive<MolarHeatCapacity> c{MolarHeatCapacity::from_value(30)};
    EXPECT_NEAR(exergy_of_incompressible<Molar>(c, kelvin(700), kelvin(290)).value(), expected,
                1e-9);
    EXPECT_NEAR(exergy_of_material<Molar>(own, kelvin(700), kelvin(290)).value(), expected, 1e-9);
    EXPECT_NEAR(exergy_of_ideal_gas(c, kelvin(700), pascal(1e5), kelvin(290), pascal(1e5)).value(),
                expected, 1e-9);
}

// Aluminium melted: ΔH - T0·ΔS with both from the tables, evaluated by their own functions.
TEST(StreamExergy, PassesTransitions) {
    const auto aluminium = substances::find_substance("Al");
    const double e = exergy_of_substance(aluminium, kelvin(1000), kelvin(290)).value();
    const double solid = exergy_of_substance(aluminium, kelvin(933), kelvin(290)).value();
    EXPECT_GT(e - solid, 10700 * (1 - 290 / 933.6)); // at least that of the heat of fusion
}

} // namespace
