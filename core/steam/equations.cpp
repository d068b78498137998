// SPDX-License-Identifier: MPL-2.0
#include "core/steam/equations.h"

#include "core/steam/terms.h"

#include <cmath>

namespace core::steam {
namespace {

constexpr double r = specific_gas_constant;

/// γ and its derivatives by π and τ.
struct Gibbs {
    double value, pi, tau, pi_pi, pi_tau, tau_tau;
};

/// Relations of release table 3: v = (R·T/p)·π·γπ and so on.
Properties of_gibbs(double t, double p, double pi, double tau, Gibbs const& g) {
    const double rt = r * t;
    return {.t = t,
            .p = p,
            .v = rt / p * pi * g.pi,
            .h = rt * tau * g.tau,
            .s = r * (tau * g.tau - g.value),
            .heat_capacity = -r * tau * tau * g.tau_tau,
            .expansion = r / p * pi * (g.pi - tau * g.pi_tau),
            .compression = rt / (p * p) * pi * pi * g.pi_pi};
}

/// γ of an ideal gas, ln π + Σ n·τ^J, and of what it lacks, Σ n·π^I·(τ - shift)^J.
template<auto const& ideal, auto const& residual>
Gibbs gibbs_of_vapour(double pi, double tau, double shift) {
    const Partials o = sum_of<ideal, Order::second>(1, tau);
    const Partials q = sum_of<residual, Order::second>(pi, tau - shift);
    return {std::log(pi) + o.value + q.value,
            1 / pi + q.x,
            o.y + q.y,
            -1 / (pi * pi) + q.xx,
            q.xy,
            o.yy + q.yy};
}

template<auto const& ideal, auto const& residual>
Properties vapour(double t, double p, double tau, double shift) {
    const double pi = reduced::pressure_2(p);
    return of_gibbs(t, p, pi, tau, gibbs_of_vapour<ideal, residual>(pi, tau, shift));
}

template<auto const& ideal, auto const& residual>
double entropy_of_vapour(double pi, double tau, double shift) {
    const Partials o = sum_of<ideal, Order::first>(1, tau);
    const Partials q = sum_of<residual, Order::first>(pi, tau - shift);
    return r * (tau * (o.y + q.y) - (std::log(pi) + o.value + q.value));
}

} // namespace

Properties region_1(double t, double p) {
    const double pi = reduced::pressure_1(p), tau = reduced::temperature_1(t);
    const Partials q = sum_of<tables::region_1, Order::second>(7.1 - pi, tau - 1.222);
    return of_gibbs(t, p, pi, tau, {q.value, -q.x, q.y, q.xx, -q.xy, q.yy});
}

double entropy_1(double t, double p) {
    const double tau = reduced::temperature_1(t);
    const Partials q =
        sum_of<tables::region_1, Order::first>(7.1 - reduced::pressure_1(p), tau - 1.222);
    return r * (tau * q.y - q.value);
}

Properties region_2(double t, double p) {
    return vapour<tables::region_2_ideal, tables::region_2_residual>(
        t, p, reduced::temperature_2(t), 0.5);
}

double entropy_2(double t, double p) {
    return entropy_of_vapour<tables::region_2_ideal, tables::region_2_residual>(
        reduced::pressure_2(p), reduced::temperature_2(t), 0.5);
}

Properties metastable_vapour(double t, double p) {
    return vapour<tables::metastable_ideal, tables::metastable_residual>(
        t, p, reduced::temperature_2(t), 0.5);
}

Properties region_5(double t, double p) {
    return vapour<tables::region_5_ideal, tables::region_5_residual>(t, p,
                                                                     reduced::temperature_5(t), 0);
}

double entropy_5(double t, double p) {
    return entropy_of_vapour<tables::region_5_ideal, tables::region_5_residual>(
        reduced::pressure_2(p), reduced::temperature_5(t), 0);
}

// φ = n1·ln δ + Σ n·δ^I·τ^J from the second row on; relations of release table 31.
Properties region_3(double density, double t) {
    const double delta = reduced::density_3(density), tau = reduced::temperature_3(t);
    const Partials q = sum_of<tables::region_3, Order::second, 1>(delta, tau);
    constexpr double n1 = tables::region_3[0].n;
    const double phi = n1 * std::log(delta) + q.value;
    const double by_delta = n1 / delta + q.x, twice_by_delta = -n1 / (delta * delta) + q.xx;
    const double dp_dt = density * r * delta * (by_delta - tau * q.xy); // at constant density
    const double dp_ddensity = r * t * delta * (2 * by_delta + delta * twice_by_delta);
    const double v = 1 / density, compression = -v * v / dp_ddensity,
                 expansion = -dp_dt * compression;
    return {.t = t,
            .p = density * r * t * delta * by_delta,
            .v = v,
            .h = r * t * (tau * q.y + delta * by_delta),
            .s = r * (tau * q.y - phi),
            .heat_capacity = -r * tau * tau * q.yy + t * dp_dt * expansion,
            .expansion = expansion,
            .compression = compression};
}

double entropy_3(double density, double t) {
    const double delta = reduced::density_3(density), tau = reduced::temperature_3(t);
    const Partials q = sum_of<tables::region_3, Order::first, 1>(delta, tau);
    return r * (tau * q.y - tables::region_3[0].n * std::log(delta) - q.value);
}

PressureOfDensity pressure_3(double density, double t) {
    const double delta = reduced::density_3(density);
    const Partials q = sum_of<tables::region_3, Order::second, 1>(delta, reduced::temperature_3(t));
    constexpr double n1 = tables::region_3[0].n;
    const double by_delta = n1 / delta + q.x, twice_by_delta = -n1 / (delta * delta) + q.xx;
    return {density * r * t * delta * by_delta,
            r * t * delta * (2 * by_delta + delta * twice_by_delta)};
}

} // namespace core::steam
