// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/cubic.h"

#include "core/constants.h"
#include "core/failure.h"

#include <algorithm>
#include <cmath>
#include <numbers>

namespace core::real_gas {
namespace {

const double r = gas_constant.value();

/// Volume at the critical point in multiples of b, 3.95 by Peng and Robinson, 3.85 by Soave: below the
/// critical temperature, what is denser is a liquid.
constexpr double critical_volumes = 3.9;

double pseudocritical_temperature(Fluid const& fluid) {
    double t = 0;
    for (auto const& [critical, x] : fluid.parts()) t += x * critical.temperature;
    return t;
}

/// Z³ + c2·Z² + c1·Z + c0.
struct Polynomial {
    double c2, c1, c0;
    double value(double z) const { return ((z + c2) * z + c1) * z + c0; }
    double slope(double z) const { return (3 * z + 2 * c2) * z + c1; }
};

Polynomial polynomial(CubicForm const& form, double A, double B) {
    const double sum = form.epsilon + form.sigma, product = form.epsilon * form.sigma;
    return {(sum - 1) * B - 1, A + (product - sum) * B * B - sum * B,
            -(product * B * B * (1 + B) + A * B)};
}

/// A root to the last digits, from one that has most of them.
double polished(Polynomial const& f, double z) {
    double miss = f.value(z);
    for (int step = 0; step < 3 && miss != 0; ++step) {
        const double next = z - miss / f.slope(z), next_miss = f.value(next);
        if (!(std::abs(next_miss) < std::abs(miss))) break;
        z = next;
        miss = next_miss;
    }
    return z;
}

void add(Roots& found, Polynomial const& f, double z, double B) {
    z = polished(f, z);
    if (!(z > B)) return;
    std::size_t at = found.count++;
    for (; at > 0 && found.z[at - 1] > z; --at) found.z[at] = found.z[at - 1];
    found.z[at] = z;
}

/// m of α, by component.
double m_of(CubicForm const& form, double omega) {
    return form.m[0] + (form.m[1] + form.m[2] * omega) * omega;
}

/// √α and its derivative by temperature.
struct RootOfAlpha {
    double value, by_t;
};
RootOfAlpha root_of_alpha(CubicForm const& form, CriticalPoint const& critical, double t) {
    const double tr = t / critical.temperature;
    if (form.alpha_exponent != 0) {
        const double root = std::pow(tr, form.alpha_exponent / 2);
        return {root, form.alpha_exponent / 2 * root / t};
    }
    const double m = m_of(form, critical.acentric_factor), root_tr = std::sqrt(tr);
    return {1 + m * (1 - root_tr), -m * root_tr / (2 * t)};
}

Departure at_root(CubicForm const& form, Attraction const& of, double t, double p, double z) {
    const double B = of.b * p / (r * t), span = form.sigma - form.epsilon;
    // At σ = ε the integral is its limit.
    const double integral = span == 0
                                ? B / (z + form.epsilon * B)
                                : std::log((z + form.sigma * B) / (z + form.epsilon * B)) / span;
    const double q = of.a / (of.b * r * t);
    return {.z = z,
            .enthalpy = r * t * (z - 1) + (t * of.da_dt - of.a) / of.b * integral,
            .entropy = r * std::log(z - B) + of.da_dt / of.b * integral,
            .ln_fugacity_coefficient = z - 1 - std::log(z - B) - q * integral};
}

} // namespace

CubicForm const& peng_robinson() {
    static const CubicForm form = [] {
        // The root of 1 + 3·x + ... of the conditions at the critical point, in closed form.
        const double six = 6 * std::numbers::sqrt2;
        const double x = (-1 + std::cbrt(six + 8) - std::cbrt(six - 8)) / 3;
        return CubicForm{1 - std::numbers::sqrt2,
                         1 + std::numbers::sqrt2,
                         8 * (5 * x + 1) / (49 - 37 * x),
                         x / (x + 3),
                         {0.37464, 1.54226, -0.26992}};
    }();
    return form;
}

CubicForm const& soave() {
    static const CubicForm form{
        0, 1, 1 / (9 * (std::cbrt(2.0) - 1)), (std::cbrt(2.0) - 1) / 3, {0.480, 1.574, -0.176}};
    return form;
}

Attraction attraction(CubicForm const& form, Fluid const& fluid, double t) {
    double root_a = 0, slope = 0, b = 0;
    for (auto const& [critical, x] : fluid.parts()) {
        const double rtc = r * critical.temperature;
        const double root = std::sqrt(form.omega_a / critical.pressure) * rtc;
        const RootOfAlpha alpha = root_of_alpha(form, critical, t);
        root_a += x * root * alpha.value;
        slope += x * root * alpha.by_t;
        b += x * form.omega_b * rtc / critical.pressure;
    }
    return {root_a * root_a, 2 * root_a * slope, b};
}

Roots roots(CubicForm const& form, double A, double B) {
    const Polynomial f = polynomial(form, A, B);
    // Z = y - c2/3 turns it into y³ + 3·P·y - 2·Q.
    const double third = f.c2 / 3, P = f.c1 / 3 - third * third,
                 Q = -(f.c0 - f.c1 * third + 2 * third * third * third) / 2;
    const double discriminant = Q * Q + P * P * P;
    Roots found;
    if (discriminant >= 0) {
        const double u = std::cbrt(Q + std::copysign(std::sqrt(discriminant), Q));
        add(found, f, (u == 0 ? 0 : u - P / u) - third, B);
        return found;
    }
    const double size = std::sqrt(-P),
                 angle = std::acos(std::clamp(Q / (size * size * size), -1.0, 1.0)) / 3;
    for (int k = 0; k < 3; ++k)
        add(found, f, 2 * size * std::cos(angle - 2 * std::numbers::pi * k / 3) - third, B);
    return found;
}

Departure departure(CubicForm const& form, Fluid const& fluid, double t, double p) {
    const Attraction of = attraction(form, fluid, t);
    const double rt = r * t;
    const Roots found = roots(form, of.a * p / (rt * rt), of.b * p / rt);
    if (found.count == 0)
        throw Failure(Failure::Kind::unconverged, fluid.written(), "a root of the cubic equation",
                      "check temperature and pressure");
    Departure stable = at_root(form, of, t, p, found.z[0]);
    if (found.count > 1) {
        const Departure greatest = at_root(form, of, t, p, found.z[found.count - 1]);
        if (greatest.ln_fugacity_coefficient <= stable.ln_fugacity_coefficient) stable = greatest;
    }
    stable.liquid =
        t < pseudocritical_temperature(fluid) && stable.z * rt / p < critical_volumes * of.b;
    return stable;
}

} // namespace core::real_gas
