// SPDX-License-Identifier: MPL-2.0
#include "core/ratio.h"

#include "tests/core/accuracy.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace {

using accuracy::Exact;
using accuracy::ulps;

double error_of(double a, double b) { return ulps(core::ln_ratio(a, b), log(Exact(a) / Exact(b))); }

RC_GTEST_PROP(LnRatio, KeepsItsDigitsForAnyTwoValues, ()) {
    RC_ASSERT(error_of(random_states::between(1e-12, 1e12), random_states::between(1e-12, 1e12)) <=
              1.5);
}

RC_GTEST_PROP(LnRatio, KeepsItsDigitsForValuesThatNearlyAgree, ()) {
    const double b = random_states::between(1, 1e6);
    const double a = b * (1 + random_states::between(1e-14, 0.9));
    RC_ASSERT(error_of(a, b) <= 1.5);
    RC_ASSERT(error_of(b, a) <= 1.5);
}

RC_GTEST_PROP(LnRatio, ChangesItsSignWhenExchanged, ()) {
    const double a = random_states::between(1e-6, 1e6), b = random_states::between(1e-6, 1e6);
    // Two results, 1.5 units of at most 2^-52 each.
    RC_ASSERT(std::abs(core::ln_ratio(a, b) + core::ln_ratio(b, a)) <=
              7e-16 * std::abs(core::ln_ratio(a, b)));
}

TEST(LnRatio, HasNoValueItCannotReach) {
    EXPECT_EQ(core::ln_ratio(3.0, 3.0), 0);
    EXPECT_NEAR(core::ln_ratio(1e300, 1e-300), 600 * std::log(10.0), 1e-12);
    EXPECT_NEAR(core::ln_ratio(1e-300, 1e300), -600 * std::log(10.0), 1e-12);
}

} // namespace
