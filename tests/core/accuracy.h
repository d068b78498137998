// SPDX-License-Identifier: MPL-2.0
#pragma once

// Measuring results of the core against 50 digits.

#include <boost/multiprecision/cpp_bin_float.hpp>

#include <cmath>
#include <limits>

namespace accuracy {

using Exact = boost::multiprecision::cpp_bin_float_50;

/// How far a result is from the exact value, in units of the last place of the exact value.
inline double ulps(double result, Exact const& exact) {
    const double nearest = std::abs(static_cast<double>(exact));
    const double ulp = std::nextafter(nearest, std::numeric_limits<double>::infinity()) - nearest;
    return static_cast<double>(abs(Exact(result) - exact) / ulp);
}

} // namespace accuracy
