// SPDX-License-Identifier: MPL-2.0
#include "core/processes/absolute_pressure.h"

#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

namespace {

using namespace core;
using processes::absolute_pressure;

Pressure kilopascal(double value) { return Pressure::from_value(value * 1000); }

TEST(AbsolutePressure, CountsFromTheAtmosphere) {
    EXPECT_EQ(absolute_pressure({kilopascal(700)}, {kilopascal(101)}), kilopascal(801));
    EXPECT_EQ(absolute_pressure({kilopascal(-100)}, {kilopascal(101)}), kilopascal(1));
}

TEST(AbsolutePressure, RefusesWhatLiesBelowVacuum) {
    for (double gauge : {-101.0, -150.0})
        expect_refusal(impossible, "in an atmosphere of 101000 Pa", "a sum above 0",
                       [&] { absolute_pressure({kilopascal(gauge)}, {kilopascal(101)}); });
}

} // namespace
