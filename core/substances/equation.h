// SPDX-License-Identifier: MPL-2.0
#pragma once

// The equations of one phase at 1 bar over one interval of temperature, for any kind of real
// number: the core works in double, the table writer in long double, the tests in 50 digits.
// Notation: T temperature in K; Cp, H, S molar heat capacity, enthalpy and entropy in SI units; R
// the gas constant that belongs to the coefficients.

#include <cmath>

namespace core::substances {

/// One row of the tables, coefficients as printed; `root` stands before T^-0.5.
///   Cp/R = a1 T^-2 + a2 T^-1 + root T^-0.5 + a3 + a4 T + a5 T^2 + a6 T^3 + a7 T^4
///   H/R  = -a1 T^-1 + a2 ln T + 2 root T^0.5 + a3 T + a4 T^2/2 + ... + a7 T^5/5 + b1
///   S/R  = -a1 T^-2/2 - a2 T^-1 - 2 root T^-0.5 + a3 ln T + a4 T + ... + a7 T^4/4 + b2
/// Source: NASA/TP-2002-211556, Appendix A, with root = 0 and R = 8.314510 J/(mol K); the form of
/// USGS Bulletin 2131 is that with a2 = a6 = a7 = 0 and R = 1.
struct Interval {
    double from, to;
    double gas_constant;
    double a1, a2, root, a3, a4, a5, a6, a7, b1, b2;
};

namespace detail {

/// Multiplied by instead of divided by, which takes a fifth of the time.
template<class Real>
inline const Real one_third = Real(1) / 3;
template<class Real>
inline const Real one_fifth = Real(1) / 5;
template<>
inline constexpr double one_third<double> = 1.0 / 3;
template<>
inline constexpr double one_fifth<double> = 1.0 / 5;

/// c0 + c1 t + c2 t^2 + c3 t^3 + c4 t^4 by Horner's rule.
template<class Real>
Real polynomial(Real const& t, Real c0, Real c1, Real c2, Real c3, Real c4) {
    return c0 + t * (c1 + t * (c2 + t * (c3 + t * c4)));
}

/// (p(x) - p(y)) / (x - y) of c1 t + c2 t^2 + ... + c5 t^5, without the subtraction.
template<class Real>
Real divided_difference(Real const& x, Real const& y, Real c1, Real c2, Real c3, Real c4, Real c5) {
    const Real p4 = c4 + x * c5, p3 = c3 + x * p4, p2 = c2 + x * p3, p1 = c1 + x * p2;
    return p1 + y * (p2 + y * (p3 + y * (p4 + y * c5)));
}

/// ln(b / a), accurate where they nearly agree (core/ratio.h says why).
template<class Real>
Real ln_quotient(Real const& b, Real const& a) {
    using std::log, std::log1p;
    if (b >= a / 2 && b / 2 <= a) return log1p((b - a) / a);
    return log(Real(b / a));
}

} // namespace detail

template<class Real>
Real heat_capacity_of(Interval const& i, Real const& t) {
    using std::sqrt;
    Real sum = (i.a1 / t + i.a2) / t + detail::polynomial<Real>(t, i.a3, i.a4, i.a5, i.a6, i.a7);
    if (i.root != 0) sum += i.root / sqrt(t);
    return i.gas_constant * sum;
}

template<class Real>
Real enthalpy_of(Interval const& i, Real const& t) {
    using std::log, std::sqrt;
    Real sum = i.b1 - i.a1 / t +
               t * detail::polynomial<Real>(t, i.a3, Real(i.a4) / 2, Real(i.a5) / 3, Real(i.a6) / 4,
                                            Real(i.a7) / 5);
    if (i.a2 != 0) sum += i.a2 * log(t);
    if (i.root != 0) sum += 2 * i.root * sqrt(t);
    return i.gas_constant * sum;
}

template<class Real>
Real entropy_of(Interval const& i, Real const& t) {
    using std::log, std::sqrt;
    Real sum = i.b2 - (i.a1 / (2 * t) + i.a2) / t + i.a3 * log(t) +
               t * detail::polynomial<Real>(t, i.a4, Real(i.a5) / 2, Real(i.a6) / 3, Real(i.a7) / 4,
                                            Real(0));
    if (i.root != 0) sum -= 2 * i.root / sqrt(t);
    return i.gas_constant * sum;
}

template<class Real>
Real gibbs_of(Interval const& i, Real const& t) {
    return enthalpy_of(i, t) - t * entropy_of(i, t);
}

/// ∫Cp dT from t1 to t2 inside the interval. Every term is a multiple of t2 - t1 or of ln(t2/t1),
/// so that ends close together keep their digits.
template<class Real>
Real enthalpy_between(Interval const& i, Real const& t1, Real const& t2) {
    using std::sqrt;
    Real slope = i.a1 / (t1 * t2) +
                 detail::divided_difference<Real>(t2, t1, i.a3, Real(i.a4) / 2,
                                                  i.a5 * detail::one_third<Real>, Real(i.a6) / 4,
                                                  i.a7 * detail::one_fifth<Real>);
    if (i.root != 0) slope += 2 * i.root / (sqrt(t1) + sqrt(t2));
    Real sum = (t2 - t1) * slope;
    if (i.a2 != 0) sum += i.a2 * detail::ln_quotient(t2, t1);
    return i.gas_constant * sum;
}

/// ∫Cp/T dT from t1 to t2 inside the interval.
template<class Real>
Real entropy_between(Interval const& i, Real const& t1, Real const& t2) {
    using std::sqrt;
    const Real product = t1 * t2;
    Real slope =
        (i.a1 * (t1 + t2) / (2 * product) + i.a2) / product +
        detail::divided_difference<Real>(t2, t1, i.a4, Real(i.a5) / 2,
                                         i.a6 * detail::one_third<Real>, Real(i.a7) / 4, Real(0));
    if (i.root != 0) slope += 2 * i.root / (sqrt(product) * (sqrt(t1) + sqrt(t2)));
    return i.gas_constant * ((t2 - t1) * slope + i.a3 * detail::ln_quotient(t2, t1));
}

} // namespace core::substances
