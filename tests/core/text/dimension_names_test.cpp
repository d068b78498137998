// SPDX-License-Identifier: MPL-2.0
#include "core/quantities.h"
#include "core/text/unit.h"

#include <gtest/gtest.h>

namespace {

using namespace core;
using core::text::name_of, core::text::read_unit, core::text::si_unit;

TEST(DimensionNames, AreTheCoherentUnitsOfTheSubject) {
    EXPECT_EQ(si_unit(dimension<MolarEntropy>), "J/(mol·K)");
    EXPECT_EQ(si_unit(dimension<SpecificEntropy>), "J/(kg·K)");
    EXPECT_EQ(si_unit(dimension<Entropy>), "J/K");
    EXPECT_EQ(si_unit(dimension<EntropyFlow>), "W/K");
    EXPECT_EQ(si_unit(dimension<EntropyFlux>), "W/(m²·K)");
    EXPECT_EQ(si_unit(dimension<TemperatureDifference>), "K");
    EXPECT_EQ(si_unit(dimension<Dimensionless>), "");
    EXPECT_EQ(si_unit(dimension<Expansivity>), "1/K");
    EXPECT_EQ(name_of(dimension<Pressure>), "a pressure");
    EXPECT_EQ(name_of(dimension<MolarEntropy>), "a molar entropy or molar heat capacity");
    EXPECT_EQ(name_of(dimension<Dimensionless>), "a number without a unit");
}

TEST(DimensionNames, FallBackOnBaseUnits) {
    Dimension const odd = Dimension::of_mass / Dimension::of_length;
    EXPECT_EQ(si_unit(odd), "kg·m⁻¹");
    EXPECT_EQ(name_of(odd), "a quantity in kg·m⁻¹");
    EXPECT_EQ(si_unit(power(Dimension::of_amount, -12)), "mol⁻¹²");
}

// Every exponent from -3 to 3: what is written out reads back as the same dimension, coherently.
TEST(DimensionNames, ReadBack) {
    auto const exponent = [](int digit) { return static_cast<std::int8_t>(digit - 3); };
    for (int i = 0; i < 7 * 7 * 7 * 7 * 7; ++i) {
        Dimension const d{exponent(i % 7), exponent(i / 7 % 7), exponent(i / 49 % 7),
                          exponent(i / 343 % 7), exponent(i / 2401)};
        if (d == Dimension{}) continue;
        auto const unit = read_unit(si_unit(d));
        ASSERT_EQ(unit.dimension, d) << si_unit(d);
        ASSERT_EQ(unit.to_si(1), 1) << si_unit(d);
        ASSERT_FALSE(name_of(d).empty());
    }
}

} // namespace
