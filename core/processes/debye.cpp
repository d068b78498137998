// SPDX-License-Identifier: MPL-2.0
#include "core/processes/debye.h"

#include "core/constants.h"
#include "core/written.h"

#include <boost/math/quadrature/gauss.hpp>

#include <cmath>
#include <numbers>

namespace core::processes {

namespace {

/// Where the two ways of the integral meet; at 5 both have all digits.
constexpr double changeover = 5;

/// 3 · ∫ u² · yu / (e^(yu) - 1) du from 0 to 1. The integrand is positive and its nearest pole lies
/// at ±2πi / y, so that a Gauss-Legendre rule of 20 points converges beyond the digits of a double.
double by_quadrature(double y) {
    const auto integrand = [y](double u) {
        const double t = y * u;
        return 3 * u * u * (t == 0 ? 1 : t / std::expm1(t));
    };
    return boost::math::quadrature::gauss<double, 20>::integrate(integrand, 0.0, 1.0);
}

/// π⁴ / (5 y³) - 3 · Σ e^(-ky) · (1/k + 3/(k²y) + 6/(k³y²) + 6/(k⁴y³)): the whole integral less its
/// tail, in which 1 / (e^t - 1) is a geometric series (Abramowitz & Stegun 27.1.2).
double by_sum(double y) {
    constexpr double pi_squared = std::numbers::pi * std::numbers::pi;
    double tail = 0;
    for (int k = 1; k * y < 45; ++k) { // e^-45 is below the last digit of 1 / y³ there
        const double z = k * y;
        tail += std::exp(-z) / k * (1 + 3 / z * (1 + 2 / z * (1 + 1 / z)));
    }
    return pi_squared * pi_squared / 5 / y / y / y - 3 * tail;
}

} // namespace

double debye_function(double y) { return y < changeover ? by_quadrature(y) : by_sum(y); }

MolarEntropy debye_entropy(Temperature debye_temperature, Temperature temperature,
                           Notes const& notes) {
    const double y = absolute(debye_temperature) / absolute(temperature);
    const double d = debye_function(y);
    notes.step([&] { return "D(θ/T) = D(" + written(y) + ") = " + written(d); });
    // 1 - e^(-y) is small at high temperature, e^(-y) at low: each needs its own logarithm.
    const double ln_occupied = y < 1 ? std::log(-std::expm1(-y)) : std::log1p(-std::exp(-y));
    return gas_constant * (4 * d - 3 * ln_occupied);
}

} // namespace core::processes
