// SPDX-License-Identifier: MPL-2.0
#include "core/balance/available_work.h"

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

Temperature kelvin(double value) { return Temperature::kelvin(value); }

TEST(ExergyOfHeat, IsNegativeBelowTheSurroundings) {
    EXPECT_EQ(exergy_of_heat<Rate>(Power::from_value(1000), kelvin(240), kelvin(300)),
              Power::from_value(-250));
    EXPECT_EQ(exergy_of_heat<Specific>(SpecificEnergy::from_value(5), kelvin(300), kelvin(300)),
              SpecificEnergy{});
}

RC_GTEST_PROP(ExergyOfHeat, KeepsItsDigitsNearTheSurroundings, ()) {
    const double t0 = random_states::between(200, 400);
    const double t = t0 * (1 + random_states::between(1e-15, 10));
    const double exergy =
        exergy_of_heat<Total>(Energy::from_value(1234), kelvin(t), kelvin(t0)).value();
    RC_ASSERT(accuracy::ulps(exergy, 1234 * (1 - Exact(t0) / t)) <= 2.0);
}

RC_GTEST_PROP(ExergyOfHeat, LosesWhatEntropyGeneratedCosts, ()) {
    const Temperature hot = random_states::temperature(), cold = random_states::temperature();
    RC_PRE(hot > cold);
    const Temperature t0 = kelvin(random_states::between(200, 400));
    const Energy q = Energy::from_value(random_states::between(1, 1e6));
    const Energy lost = lost_work<Total>({q / absolute(cold) - q / absolute(hot)}, t0);
    const Energy difference =
        exergy_of_heat<Total>(q, hot, t0) - exergy_of_heat<Total>(q, cold, t0);
    RC_ASSERT(std::abs((lost - difference) / q) <= 1e-14 * (1 + absolute(t0) / absolute(cold)));
}

TEST(Carnot, AgreesWithItsDefinitions) {
    EXPECT_DOUBLE_EQ(carnot_efficiency(kelvin(600), kelvin(300)), 0.5);
    EXPECT_DOUBLE_EQ(carnot_cooling(kelvin(300), kelvin(250)), 5);
    EXPECT_DOUBLE_EQ(carnot_heating(kelvin(300), kelvin(250)), 6);
    EXPECT_EQ(carnot_efficiency(kelvin(300), kelvin(300)), 0);
}

RC_GTEST_PROP(Carnot, KeepsItsDigitsWhereTheTemperaturesAreNear, ()) {
    const double cold = random_states::between(1, 3000);
    const double hot = cold * (1 + random_states::between(1e-15, 1e-2));
    RC_PRE(hot > cold);
    const Exact h = hot, c = cold;
    RC_ASSERT(accuracy::ulps(carnot_efficiency(kelvin(hot), kelvin(cold)), (h - c) / h) <= 1.0);
    RC_ASSERT(accuracy::ulps(carnot_cooling(kelvin(hot), kelvin(cold)), c / (h - c)) <= 1.0);
    RC_ASSERT(accuracy::ulps(carnot_heating(kelvin(hot), kelvin(cold)), h / (h - c)) <= 1.0);
}

TEST(Carnot, RefusesReservoirsThatAreExchanged) {
    for (auto relation : {carnot_efficiency, carnot_cooling, carnot_heating})
        expect_refusal(impossible, "hot = 300 K and cold = 310 K", "a hot reservoir",
                       [&] { relation(kelvin(300), kelvin(310)); });
}

TEST(Carnot, RefusesACoefficientBetweenEqualTemperatures) {
    for (auto relation : {carnot_cooling, carnot_heating})
        expect_refusal(impossible, "hot = 300 K and cold = 300 K", "a coefficient",
                       [&] { relation(kelvin(300), kelvin(300)); });
}

} // namespace
