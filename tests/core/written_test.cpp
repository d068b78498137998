// SPDX-License-Identifier: MPL-2.0
#include "core/written.h"

#include <gtest/gtest.h>

namespace {

using namespace core;

TEST(Written, HasTenDigitsAtMost) {
    EXPECT_EQ(written(300.0), "300");
    EXPECT_EQ(written(-0.25), "-0.25");
    EXPECT_EQ(written(1.0 / 3), "0.3333333333");
    EXPECT_EQ(written(1e15), "1e+15");
    EXPECT_EQ(written(0.1 + 0.2), "0.3");
}

TEST(Written, NamesTheUnit) {
    EXPECT_EQ(written(Pressure::from_value(1e5)), "100000 Pa");
    EXPECT_EQ(written(MolarEntropy::from_value(9.633)), "9.633 J/(mol·K)");
    EXPECT_EQ(written(Temperature::kelvin(298.15)), "298.15 K");
    EXPECT_EQ(written(Dimensionless::from_value(0.5)), "0.5");
}

} // namespace
