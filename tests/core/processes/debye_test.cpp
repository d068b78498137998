// SPDX-License-Identifier: MPL-2.0
#include "core/processes/debye.h"

#include "core/constants.h"
#include "tests/core/accuracy.h"
#include "tests/published/table.h"

#include <boost/math/quadrature/gauss_kronrod.hpp>
#include <gtest/gtest.h>

#include <numbers>

namespace {

using namespace core;
using accuracy::Exact;
using processes::debye_entropy;
using processes::debye_function;

/// The defining integral with 50 digits. Beyond 120 its integrand is below 1e-46.
Exact exact_debye_function(double y) {
    const auto integrand = [](Exact const& t) -> Exact {
        return t == 0 ? Exact(0) : Exact(t * t * t / expm1(t));
    };
    Exact integral = 0;
    const Exact end = std::min(y, 120.0);
    constexpr int pieces = 24;
    for (int i = 0; i < pieces; ++i)
        integral += boost::math::quadrature::gauss_kronrod<Exact, 61>::integrate(
            integrand, end * i / pieces, end * (i + 1) / pieces, 0);
    return 3 * integral / (Exact(y) * y * y);
}

Exact exact_entropy(double y) {
    return Exact(gas_constant.value()) * (4 * exact_debye_function(y) - 3 * log1p(-exp(-Exact(y))));
}

MolarEntropy at(double y) { return debye_entropy(Temperature::kelvin(y), Temperature::kelvin(1)); }

constexpr double from_hot_to_cold[] = {1e-9, 1e-3, 0.1,  0.5,  0.99,     1.0,  1.01,     2.0,
                                       3.0,  4.0,  4.5,  4.9,  4.999999, 5.0,  5.000001, 5.5,
                                       6.0,  8.0,  12.0, 20.0, 44.0,     46.0, 100.0,    1000.0};

TEST(DebyeFunction, AgreesWithTheHandbook) {
    for (auto const& row : published::read_table(PUBLISHED_DIR "/debye_function.csv",
                                                 {"y", "value", "unit", "tolerance"}, 5))
        EXPECT_NEAR(debye_function(row.number("y")), row.number("value"), row.number("tolerance"));
}

TEST(DebyeFunction, HasAllDigitsOfItsIntegral) {
    for (double y : from_hot_to_cold)
        EXPECT_LE(accuracy::ulps(debye_function(y), exact_debye_function(y)), 3) << y;
}

TEST(DebyeEntropy, HasAllDigits) {
    for (double y : from_hot_to_cold)
        EXPECT_LE(accuracy::ulps(at(y).value(), exact_entropy(y)), 3) << y;
}

TEST(DebyeEntropy, FollowsTheCubeOfTheTemperatureWhenCold) {
    constexpr double pi = std::numbers::pi;
    for (double y : {60.0, 500.0, 1e6})
        EXPECT_NEAR(at(y) / gas_constant * y * y * y, 4 * pi * pi * pi * pi / 5, 1e-12);
}

// Dulong and Petit: the heat capacity becomes 3 R, so that S = R · (4 - 3 ln(θ/T)), next term
// y²/40·3.
TEST(DebyeEntropy, FollowsTheLogarithmOfTheTemperatureWhenHot) {
    for (double y : {1e-6, 1e-4, 1e-3})
        EXPECT_NEAR(at(y) / gas_constant, 4 - 3 * std::log(y), y * y);
}

TEST(DebyeEntropy, RisesWithTheTemperature) {
    for (double t = 10; t < 2000; t *= 1.05)
        EXPECT_LT(debye_entropy(Temperature::kelvin(400), Temperature::kelvin(t)),
                  debye_entropy(Temperature::kelvin(400), Temperature::kelvin(t * 1.05)));
}

TEST(DebyeEntropy, TellsTheDebyeFunction) {
    std::vector<std::string> steps;
    debye_entropy(Temperature::kelvin(300), Temperature::kelvin(300), Notes(&steps, nullptr));
    EXPECT_EQ(steps, std::vector<std::string>{"D(θ/T) = D(1) = 0.6744155641"});
}

} // namespace
