// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <span>

namespace core::mixing {

/// A total N of amounts n, and Σ(n · ln(N / n)): the entropy of mixing them in units of R.
struct Disorder {
    double total, n_ln_n;
};

/// Method: at most one n exceeds the sum of all others; its ln(N / n) is taken as log1p of that sum
/// over n, so that traces in a nearly pure substance lose no digits.
/// Accuracy: 2 units in the last place, tests/core/mixing/ideal_mixing_test.cpp.
Disorder disorder(std::span<const double> amounts);

/// Refuses a sum of stated fractions that is not 1 within 1e-6 (#VALUE!). `what` begins the
/// sentence: `fractions that sum to `.
void check_sum(double sum, char const* what);

} // namespace core::mixing
