// SPDX-License-Identifier: MPL-2.0
#include "core/processes/pressurizing.h"

#include <gtest/gtest.h>

namespace {

using namespace core;
using processes::pressurizing;

Positive<Pressure> megapascal(double value) { return {Pressure::from_value(value * 1e6)}; }
Expansivity per_kelvin(double value) { return Expansivity::from_value(value); }

// Water from 3 MPa to 80 MPa at 300 K. Entropies 0.392294792 and 0.368563852 kJ/(kg K) and specific
// volume 0.00100215168 m³/kg: IAPWS R7-97(2012) Table 5. Volume expansivity at 300 K and low
// pressure 2.76e-4 /K: from memory, a common handbook value. Tolerance 15 %: over these pressures V
// falls by 3 % and β rises by about 15 %, and the relation takes both as constant.
TEST(Pressurizing, AgreesWithWater) {
    const SpecificEntropy change =
        pressurizing<Specific>({SpecificVolume::from_value(0.00100215168)}, per_kelvin(2.76e-4),
                               megapascal(3), megapascal(80));
    const double expected = 368.563852 - 392.294792;
    EXPECT_NEAR(change.value(), expected, 0.15 * std::abs(expected));
}

TEST(Pressurizing, FollowsTheBasisOfTheVolume) {
    EXPECT_DOUBLE_EQ(pressurizing<Total>({Volume::from_value(2)}, per_kelvin(1e-4), megapascal(1),
                                         megapascal(11))
                         .value(),
                     -2000);
    EXPECT_DOUBLE_EQ(pressurizing<Molar>({MolarVolume::from_value(2)}, per_kelvin(-1e-4),
                                         megapascal(1), megapascal(11))
                         .value(),
                     2000);
}

TEST(Pressurizing, OfNoStepIsZero) {
    EXPECT_EQ(pressurizing<Total>({Volume::from_value(2)}, per_kelvin(1e-4), megapascal(5),
                                  megapascal(5)),
              Entropy{});
}

} // namespace
