// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/quantities.h"
#include "core/temperature.h"

#include <cmath>

namespace core {

/// ln(a / b) of two values above zero, accurate where they nearly agree.
/// Method: for b/2 <= a <= 2b the difference a - b is exact (P. H. Sterbenz, Floating-Point
/// Computation, 1974), and log1p of it over b loses nothing; elsewhere the logarithm is away from
/// zero and the rounding of the quotient is harmless.
/// Accuracy: 1.5 units in the last place, tests/core/ratio_test.cpp.
inline double ln_ratio(double a, double b) {
    if (a >= b / 2 && a / 2 <= b) return std::log1p((a - b) / b);
    const double ratio = a / b;
    return std::isnormal(ratio) ? std::log(ratio) : std::log(a) - std::log(b);
}

template<class Quantity>
double ln_ratio(Quantity a, Quantity b) {
    return ln_ratio(a.value(), b.value());
}

inline double ln_ratio(Temperature a, Temperature b) { return ln_ratio(absolute(a), absolute(b)); }

} // namespace core
