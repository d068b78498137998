// SPDX-License-Identifier: MPL-2.0
#pragma once

// Integrals in 50 digits by an independent route: Gauss-Legendre quadrature of the heat capacity
// itself, over ln T, in parts so narrow that 40 points leave nothing.

#include "tests/core/accuracy.h"

#include <boost/math/quadrature/gauss.hpp>

#include <cmath>

namespace exact_curve {

using accuracy::Exact;

struct Integrals {
    Exact enthalpy = 0, entropy = 0;

    Integrals& operator+=(Integrals const& other) {
        enthalpy += other.enthalpy;
        entropy += other.entropy;
        return *this;
    }
};

/// ∫cp dT and ∫cp/T dT of a heat capacity that is analytic from `low` to `high`.
template<class HeatCapacity>
Integrals integrals(HeatCapacity&& cp, Exact const& low, Exact const& high) {
    using Rule = boost::math::quadrature::gauss<Exact, 40>;
    const Exact ln = log(Exact(high / low));
    const int parts = 1 + static_cast<int>(ln * 4);
    Integrals sum;
    for (int i = 0; i < parts; ++i) {
        const Exact begin = i == 0 ? low : Exact(low * exp(Exact(ln * i / parts)));
        const Exact end = i + 1 == parts ? high : Exact(low * exp(Exact(ln * (i + 1) / parts)));
        const Exact width = log(Exact(end / begin));
        const auto at = [&](Exact const& x) { return Exact(begin * exp(x)); };
        sum.entropy +=
            Rule::integrate([&](Exact const& x) { return Exact(cp(at(x))); }, Exact(0), width);
        sum.enthalpy += Rule::integrate([&](Exact const& x) { return Exact(cp(at(x)) * at(x)); },
                                        Exact(0), width);
    }
    return sum;
}

/// How far a result is from the exact value, over that value.
inline double relative(double result, Exact const& exact) {
    if (exact == 0) return std::abs(result);
    return static_cast<double>(abs(Exact((result - exact) / exact)));
}

} // namespace exact_curve
