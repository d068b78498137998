// SPDX-License-Identifier: MPL-2.0
#include "core/steam/backward.h"

#include "core/steam/terms.h"

#include <cmath>

namespace core::steam::backward {
namespace {

template<auto const& table>
double sum(double x, double y) {
    return sum_of<table, Order::value>(x, y).value;
}

constexpr double n(auto const& table, std::size_t i) { return table[i - 1].n; }

double mpa(double p) { return p / 1e6; }

bool is_3a_by_enthalpy(double p, double h) { return h <= boundary_enthalpy_3a_3b(p); }

} // namespace

double temperature_1_ph(double p, double h) {
    return sum<tables::temperature_1_ph>(mpa(p), h / 2500e3 + 1);
}

double temperature_1_ps(double p, double s) {
    return sum<tables::temperature_1_ps>(mpa(p), s / 1e3 + 2);
}

double temperature_2_ph(double p, double h) {
    const double pi = mpa(p), eta = h / 2000e3;
    if (pi <= 4) return sum<tables::temperature_2a_ph>(pi, eta - 2.1);
    if (h >= boundary_enthalpy_2b_2c(p)) return sum<tables::temperature_2b_ph>(pi - 2, eta - 2.6);
    return sum<tables::temperature_2c_ph>(pi + 25, eta - 1.8);
}

namespace {

/// Table 25 has quarters of whole exponents: a power of the fourth root of π.
double temperature_2a_ps(double pi, double sigma) {
    return sum<tables::temperature_2a_ps>(std::sqrt(std::sqrt(pi)), sigma - 2);
}

} // namespace

double temperature_2_ps(double p, double s) {
    const double pi = mpa(p);
    if (pi <= 4) return temperature_2a_ps(pi, s / 2000);
    if (s >= 5850) return sum<tables::temperature_2b_ps>(pi, 10 - s / 785.3);
    return sum<tables::temperature_2c_ps>(pi, 2 - s / 2925.1);
}

double temperature_3_ph(double p, double h) {
    const double pi = p / 100e6;
    if (is_3a_by_enthalpy(p, h))
        return 760 * sum<tables::temperature_3a_ph>(pi + 0.240, h / 2300e3 - 0.615);
    return 860 * sum<tables::temperature_3b_ph>(pi + 0.298, h / 2800e3 - 0.720);
}

double volume_3_ph(double p, double h) {
    const double pi = p / 100e6;
    if (is_3a_by_enthalpy(p, h))
        return 0.0028 * sum<tables::volume_3a_ph>(pi + 0.128, h / 2100e3 - 0.727);
    return 0.0088 * sum<tables::volume_3b_ph>(pi + 0.0661, h / 2800e3 - 0.720);
}

double temperature_3_ps(double p, double s) {
    const double pi = p / 100e6;
    if (s <= boundary_entropy_3a_3b)
        return 760 * sum<tables::temperature_3a_ps>(pi + 0.240, s / 4400 - 0.703);
    return 860 * sum<tables::temperature_3b_ps>(pi + 0.760, s / 5300 - 0.818);
}

double volume_3_ps(double p, double s) {
    const double pi = p / 100e6;
    if (s <= boundary_entropy_3a_3b)
        return 0.0028 * sum<tables::volume_3a_ps>(pi + 0.187, s / 4400 - 0.755);
    return 0.0088 * sum<tables::volume_3b_ps>(pi + 0.298, s / 5300 - 0.816);
}

double boundary_pressure_2b_2c(double h) {
    constexpr auto const& a = tables::boundary_2b_2c;
    const double eta = h / 1e3;
    return 1e6 * (n(a, 1) + (n(a, 2) + n(a, 3) * eta) * eta);
}

double boundary_enthalpy_2b_2c(double p) {
    constexpr auto const& a = tables::boundary_2b_2c;
    return 1e3 * (n(a, 4) + std::sqrt((mpa(p) - n(a, 5)) / n(a, 3)));
}

double boundary_enthalpy_3a_3b(double p) {
    const double pi = mpa(p);
    return 1e3 * (2014.64004206875 +
                  (3.74696550136983 + (-2.19921901054187e-2 + 8.75131686009950e-5 * pi) * pi) * pi);
}

} // namespace core::steam::backward
