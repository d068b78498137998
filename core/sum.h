// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <cmath>

namespace core {

/// A compensated sum: what each addition rounds away is collected and added at the end.
/// Source: A. Neumaier, Z. Angew. Math. Mech. 54 (1974) 39.
/// Accuracy: one rounding of the sum, plus n·2^-106 of the sum of magnitudes, for n terms.
class Sum {
public:
    void add(double term) {
        const double sum = sum_ + term;
        lost_ += std::abs(sum_) >= std::abs(term) ? (sum_ - sum) + term : (term - sum) + sum_;
        sum_ = sum;
    }
    double value() const { return sum_ + lost_; }

private:
    double sum_ = 0, lost_ = 0;
};

} // namespace core
