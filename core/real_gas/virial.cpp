// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/virial.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/written.h"

#include <cmath>

namespace core::real_gas {
namespace {

const double r = gas_constant.value();

struct Pair {
    double temperature, pressure, acentric_factor;
};

double critical_z(CriticalPoint const& c) { return 0.291 - 0.080 * c.acentric_factor; }

double critical_volume(CriticalPoint const& c) {
    return critical_z(c) * r * c.temperature / c.pressure;
}

Pair combined(CriticalPoint const& i, CriticalPoint const& j) {
    if (&i == &j) return {i.temperature, i.pressure, i.acentric_factor};
    const double t = std::sqrt(i.temperature * j.temperature);
    const double side = (std::cbrt(critical_volume(i)) + std::cbrt(critical_volume(j))) / 2;
    const double z = (critical_z(i) + critical_z(j)) / 2;
    return {t, z * r * t / (side * side * side), (i.acentric_factor + j.acentric_factor) / 2};
}

Virial of_pair(Pair const& c, double t) {
    const double tr = t / c.temperature, scale = r * c.temperature / c.pressure;
    const double p0 = 0.422 / std::pow(tr, 1.6), p1 = 0.172 / std::pow(tr, 4.2);
    return {scale * (0.083 - p0 + c.acentric_factor * (0.139 - p1)),
            scale / t * (1.6 * p0 + c.acentric_factor * 4.2 * p1)};
}

double critical_volume(Fluid const& fluid) {
    double v = 0;
    for (auto const& [critical, x] : fluid.parts()) v += x * critical_volume(critical);
    return v;
}

} // namespace

Virial second_virial(Fluid const& fluid, double t) {
    Virial sum{0, 0};
    for (Part const& i : fluid.parts())
        for (Part const& j : fluid.parts()) {
            const Virial b = of_pair(combined(i.critical, j.critical), t);
            sum.b += i.fraction * j.fraction * b.b;
            sum.db_dt += i.fraction * j.fraction * b.db_dt;
        }
    return sum;
}

Departure virial_departure(Fluid const& fluid, double t, double p) {
    const Virial of = second_virial(fluid, t);
    const double z = 1 + of.b * p / (r * t), volume = z * r * t / p;
    if (!(volume >= 2 * critical_volume(fluid)))
        refuse_impossible(written(t) + " K and " + written(p) + " Pa, with Z = " + written(z),
                          "a gas of half the critical density at most, where two virial terms hold",
                          "use `Peng-Robinson` or `Soave`");
    return {.z = z,
            .enthalpy = p * (of.b - t * of.db_dt),
            .entropy = -p * of.db_dt,
            .ln_fugacity_coefficient = of.b * p / (r * t)};
}

} // namespace core::real_gas
