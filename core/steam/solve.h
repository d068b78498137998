// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/failure.h"

#include <cmath>

namespace core::steam {

/// A function's value and its derivative.
struct ValueAndSlope {
    double value, slope;
};

/// Which way a function goes between the bounds.
enum class Goes { up, down };

/// The zero of a monotonic function between two bounds, by Newton's method from a start; a step that
/// would leave the bounds, or that does not halve the last one, halves them instead. A zero that rounding
/// has put outside the bounds is found at the nearer one.
/// Ends where a step no longer changes the number (near the critical point a thousandth of a millikelvin
/// changes an enthalpy's ninth digit), after 100 steps at the latest (Err:523).
template<class Function>
double solve(Function function, Goes goes, double low, double high, double start) {
    double x = start > low && start < high ? start : low + (high - low) / 2;
    double last_step = high - low;
    for (int steps = 0; steps < 100; ++steps) {
        const ValueAndSlope at = function(x);
        if (at.value == 0) return x;
        ((at.value > 0) == (goes == Goes::up) ? high : low) = x;
        double next = x - at.value / at.slope;
        if (!(next > low && next < high) || std::abs(next - x) > last_step / 2)
            next = low + (high - low) / 2;
        last_step = std::abs(next - x);
        if (last_step <= 1e-15 * std::abs(x) || next == low || next == high) return next;
        x = next;
    }
    throw Failure(Failure::Kind::unconverged, "a state of water", "an iteration that converges",
                  "give the state by temperature and pressure");
}

} // namespace core::steam
