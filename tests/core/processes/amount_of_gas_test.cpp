// SPDX-License-Identifier: MPL-2.0
#include "core/processes/amount_of_gas.h"

#include <gtest/gtest.h>

namespace {

using namespace core;
using processes::amount_of_gas;

// Molar volume of an ideal gas at 273.15 K: 22.710 954 64e-3 m³/mol at 100 kPa and
// 22.413 969 54e-3 m³/mol at 101.325 kPa. Source: CODATA 2018 recommended values.
TEST(AmountOfGas, AgreesWithTheMolarVolumeOfCodata) {
    const Temperature t = Temperature::kelvin(273.15);
    EXPECT_NEAR(amount_of_gas<Total>({Volume::from_value(22.71095464e-3)}, t,
                                     {Pressure::from_value(100000)})
                    .value(),
                1, 5e-10);
    EXPECT_NEAR(amount_of_gas<Rate>({VolumeFlow::from_value(22.41396954e-3)}, t,
                                    {Pressure::from_value(101325)})
                    .value(),
                1, 5e-10);
}

} // namespace
