// SPDX-License-Identifier: MPL-2.0
#include "core/text/known_units.h"

#include "core/text/quantity.h"

#include <gtest/gtest.h>

#include <set>
#include <string>

// Units that are looked up are those that are read.

namespace {

using namespace core::text;

TEST(KnownUnits, AreTheUnitsThatAreRead) {
    for (std::string_view const text : known_units()) {
        SCOPED_TRACE(text);
        Unit const* known = find_known_unit(text);
        ASSERT_NE(known, nullptr);
        // A space in front is not known, so this is read.
        Unit const read = read_unit(" " + std::string(text));
        EXPECT_EQ(known->numerator, read.numerator);
        EXPECT_EQ(known->denominator, read.denominator);
        EXPECT_EQ(known->zero_numerator, read.zero_numerator);
        EXPECT_EQ(known->zero_denominator, read.zero_denominator);
        EXPECT_EQ(known->dimension, read.dimension);
        EXPECT_EQ(known->reading, read.reading);
        EXPECT_EQ(known->share, read.share);
    }
}

TEST(KnownUnits, StandOnceEach) {
    EXPECT_EQ(std::set<std::string_view>(known_units().begin(), known_units().end()).size(),
              known_units().size());
}

TEST(KnownUnits, AreNothingElse) {
    for (const char* text : {"", "k", "kJ/mol ", "kJ/kg·K", "C", "kJ/(mol·K)·x"})
        EXPECT_EQ(find_known_unit(text), nullptr) << text;
}

TEST(KnownUnits, KeepTheUnitAsWritten) {
    const std::string_view text = "7.3 kJ/mol";
    const Quantity read = read_quantity(text);
    EXPECT_EQ(read.written_unit, "kJ/mol");
    EXPECT_EQ(read.written_unit.data(), text.data() + 4);
    EXPECT_EQ(read_quantity("7.3 kJ/mol ± 1 %").u, 73);
}

} // namespace
