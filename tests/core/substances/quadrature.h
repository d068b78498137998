// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/substances/substance.h"
#include "tests/core/accuracy.h"

#include <boost/math/quadrature/gauss_kronrod.hpp>

#include <algorithm>

namespace quadrature {

using namespace core::substances;
using accuracy::Exact;

/// Independent route: quadrature of cp/T and cp in 50 digits with 61 nodes, phase by phase.
inline Exact heating(Substance const& s, double from, double to, int power) {
    Exact sum = 0;
    for (Rung const& r : s.rungs()) {
        const double a = std::max(from, r.from), b = std::min(to, r.to);
        if (r.from > from && r.from < to) sum += power == 1 ? r.entropy_jump : r.enthalpy_jump;
        if (a >= b) continue;
        Interval const& i = interval_of(r);
        sum += boost::math::quadrature::gauss_kronrod<Exact, 61>::integrate(
            [&](Exact const& t) -> Exact {
                const Exact cp = i.gas_constant *
                                 (i.a1 / (t * t) + i.a2 / t + i.root / sqrt(t) + i.a3 + i.a4 * t +
                                  i.a5 * t * t + i.a6 * t * t * t + i.a7 * t * t * t * t);
                return power == 1 ? Exact(cp / t) : cp;
            },
            Exact(a), Exact(b), 8, Exact("1e-25"));
    }
    return sum;
}

} // namespace quadrature
