// SPDX-License-Identifier: MPL-2.0
#include "core/mixing/disorder.h"

#include "core/failure.h"
#include "core/ratio.h"
#include "core/sum.h"
#include "core/written.h"

#include <algorithm>
#include <cmath>

namespace core::mixing {

Disorder disorder(std::span<const double> amounts) {
    const auto largest = std::max_element(amounts.begin(), amounts.end());
    Sum others, all;
    for (auto n = amounts.begin(); n != amounts.end(); ++n) {
        all.add(*n);
        if (n != largest) others.add(*n);
    }
    Sum n_ln_n;
    for (auto n = amounts.begin(); n != amounts.end(); ++n)
        if (*n > 0)
            n_ln_n.add(
                *n * (n == largest ? std::log1p(others.value() / *n) : ln_ratio(all.value(), *n)));
    return {all.value(), n_ln_n.value()};
}

void check_sum(double sum, char const* what) {
    // The share above 1e-6 is for rounding: 0.333333 three times must pass.
    if (std::abs(sum - 1) <= 1e-6 * (1 + 1e-9)) return;
    refuse_unfit(what + written(sum), "fractions that sum to 1 within 1e-6",
                 "complete or round the fractions, or give amounts instead");
}

} // namespace core::mixing
