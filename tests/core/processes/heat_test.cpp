// SPDX-License-Identifier: MPL-2.0
#include "core/processes/heat.h"

#include "tests/core/accuracy.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace {

using namespace core;
using accuracy::Exact;
using processes::blackbody_radiation;
using processes::gliding_heat_transfer;
using processes::heat_transfer;

double gliding(double heat, double from, double to) {
    return gliding_heat_transfer<Total>(Energy::from_value(heat), Temperature::kelvin(from),
                                        Temperature::kelvin(to))
        .value();
}

Exact exact_gliding(double heat, double from, double to) {
    const Exact t1 = from, t2 = to;
    return t1 == t2 ? Exact(heat) / t1 : Exact(heat) * log(t2 / t1) / (t2 - t1);
}

TEST(HeatTransfer, DividesByTheTemperatureOfTheBoundary) {
    EXPECT_EQ(heat_transfer<Total>(Energy::from_value(-1000), Temperature::kelvin(500)),
              Entropy::from_value(-2));
    EXPECT_EQ(heat_transfer<Rate>(Power::from_value(1000), Temperature::kelvin(500)),
              EntropyFlow::from_value(2));
}

RC_GTEST_PROP(GlidingHeatTransfer, KeepsItsDigitsBetweenAnyTwoTemperatures, ()) {
    const double from = random_states::between(1, 1e4), to = random_states::between(1, 1e4);
    RC_ASSERT(accuracy::ulps(gliding(1234.5, from, to), exact_gliding(1234.5, from, to)) <= 3.5);
}

RC_GTEST_PROP(GlidingHeatTransfer, KeepsItsDigitsAsTheEndApproachesTheBeginning, ()) {
    const double from = random_states::between(1, 1e4);
    const double near = from * (1 + random_states::between(1e-16, 0.3));
    RC_ASSERT(accuracy::ulps(gliding(-77, from, near), exact_gliding(-77, from, near)) <= 3.5);
    const double limit = from * (1 + random_states::between(1e-16, 1e-8));
    RC_ASSERT(accuracy::ulps(gliding(-77, from, limit), exact_gliding(-77, from, limit)) <= 2.0);
}

TEST(GlidingHeatTransfer, MeetsTheConstantTemperatureWithoutAJump) {
    const double t = 300, next = std::nextafter(t, 301.0);
    EXPECT_EQ(gliding(900, t, t), 3);
    EXPECT_NEAR(gliding(900, t, next), 3, 5e-16 * 3);
    EXPECT_EQ(gliding(900, t, next), gliding(900, next, t));
}

TEST(GlidingHeatTransfer, TellsTheMeanTemperature) {
    std::vector<std::string> steps;
    gliding_heat_transfer<Total>(Energy::from_value(1), Temperature::kelvin(300),
                                 Temperature::kelvin(300), Notes(&steps, nullptr));
    EXPECT_EQ(steps, std::vector<std::string>{"(T2 - T1) / ln(T2 / T1) = 300 K"});
}

TEST(BlackbodyRadiation, CarriesFourThirdsOfItsEnergyOverTheTemperature) {
    EXPECT_DOUBLE_EQ(
        blackbody_radiation<Flux>({Irradiance::from_value(459.3)}, Temperature::kelvin(300))
            .value(),
        4 * 459.3 / 900);
    EXPECT_EQ(blackbody_radiation<Total>({Energy{}}, Temperature::kelvin(300)), Entropy{});
}

// Independent route: entropy density over energy density of a photon gas, from Planck's law by
// quadrature of both integrals, is 4 / (3 T) as well.
TEST(BlackbodyRadiation, AgreesWithThePhotonGas) {
    double energy = 0, entropy = 0;
    for (int i = 1; i < 60000; ++i) {
        const double x = i * 1e-3, n = 1 / std::expm1(x);
        energy += x * x * x * n;
        entropy += x * x * ((1 + n) * std::log1p(n) - n * std::log(n));
    }
    const double t = 1000;
    EXPECT_NEAR(
        blackbody_radiation<Rate>({Power::from_value(energy)}, Temperature::kelvin(t)).value(),
        entropy / t, 1e-6 * entropy / t);
}

} // namespace
