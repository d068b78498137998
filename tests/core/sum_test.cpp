// SPDX-License-Identifier: MPL-2.0
#include "core/sum.h"

#include <gtest/gtest.h>

namespace {

TEST(Sum, KeepsWhatEachAdditionRoundsAway) {
    core::Sum sum;
    for (double term : {1.0, 1e100, 1.0, -1e100}) sum.add(term);
    EXPECT_EQ(sum.value(), 2);
}

TEST(Sum, OfNothingIsZero) { EXPECT_EQ(core::Sum{}.value(), 0); }

} // namespace
