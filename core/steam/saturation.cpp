// SPDX-License-Identifier: MPL-2.0
#include "core/steam/saturation.h"

#include "core/steam/solve.h"
#include "core/steam/terms.h"

#include <algorithm>
#include <cmath>

namespace core::steam {
namespace {

constexpr double n(auto const& table, std::size_t i) { return table[i - 1].n; }

/// (∂p/∂ρ) of equation 28 with its own derivative by differences, for the turning points.
double slope_3(double density, double t) { return pressure_3(density, t).slope; }

/// Where the isotherm turns between a density at which pressure rises with it and one at which it
/// falls.
double turning_point(double t, double rising, double falling) {
    for (int step = 0; step < 60 && std::abs(rising - falling) > 1e-12 * rising; ++step) {
        const double middle = (rising + falling) / 2;
        (slope_3(middle, t) > 0 ? rising : falling) = middle;
    }
    return rising;
}

// Densities beyond those of region 3, at which its isotherms rise.
constexpr double least_density = 50, greatest_density = 900;

} // namespace

double saturation_pressure_at(double t) {
    constexpr auto const& a = tables::saturation;
    const double theta = t + n(a, 9) / (t - n(a, 10));
    const double A = (theta + n(a, 1)) * theta + n(a, 2);
    const double B = (n(a, 3) * theta + n(a, 4)) * theta + n(a, 5);
    const double C = (n(a, 6) * theta + n(a, 7)) * theta + n(a, 8);
    const double root = 2 * C / (-B + std::sqrt(B * B - 4 * A * C));
    return 1e6 * root * root * root * root;
}

double saturation_temperature_at(double p) {
    constexpr auto const& a = tables::saturation;
    const double beta = std::sqrt(std::sqrt(p / 1e6));
    const double E = (beta + n(a, 3)) * beta + n(a, 6);
    const double F = (n(a, 1) * beta + n(a, 4)) * beta + n(a, 7);
    const double G = (n(a, 2) * beta + n(a, 5)) * beta + n(a, 8);
    const double D = 2 * G / (-F - std::sqrt(F * F - 4 * E * G));
    const double sum = n(a, 10) + D;
    return (sum - std::sqrt(sum * sum - 4 * (n(a, 9) + n(a, 10) * D))) / 2;
}

double boundary_pressure_2_3(double t) {
    constexpr auto const& a = tables::boundary_2_3;
    return 1e6 * (n(a, 1) + (n(a, 2) + n(a, 3) * t) * t);
}

double boundary_temperature_2_3(double p) {
    constexpr auto const& a = tables::boundary_2_3;
    return n(a, 4) + std::sqrt((p / 1e6 - n(a, 5)) / n(a, 3));
}

double density_3(double t, double p, Side side) {
    double low = least_density, high = greatest_density;
    if (t < critical_temperature && slope_3(critical_density, t) < 0) {
        if (side == Side::liquid)
            low = turning_point(t, high, critical_density);
        else
            high = turning_point(t, low, critical_density);
        if (side == Side::liquid && pressure_3(low, t).p >= p) return low;
        if (side == Side::vapour && pressure_3(high, t).p <= p) return high;
    }
    const auto miss = [&](double density) {
        const PressureOfDensity at = pressure_3(density, t);
        return ValueAndSlope{at.p - p, at.slope};
    };
    return solve(miss, Goes::up, low, high, side == Side::liquid ? std::max(low, 600.0) : low + 50);
}

SaturatedPair saturated_pair(double t, double p) {
    if (t <= boundary_temperature_1_3) return {region_1(t, p), region_2(t, p)};
    SaturatedPair pair{region_3(density_3(t, p, Side::liquid), t),
                       region_3(density_3(t, p, Side::vapour), t)};
    pair.liquid.p = pair.vapour.p = p;
    return pair;
}

} // namespace core::steam
