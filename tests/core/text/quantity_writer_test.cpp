// SPDX-License-Identifier: MPL-2.0
#include "core/text/quantity.h"

#include <gtest/gtest.h>

#include <clocale>
#include <limits>

namespace {

using namespace core::text;

std::string exactly(double si, double u, std::string_view unit) {
    return write_exactly(si, u, unit.empty() ? Unit{} : read_unit(unit), unit);
}
std::string for_people(double si, double u, std::string_view unit, int digits = 4) {
    return write_for_people(si, u, unit.empty() ? Unit{} : read_unit(unit), unit, digits);
}

TEST(WriteExactly, GivesTheShortestTextThatReadsBack) {
    EXPECT_EQ(exactly(9.6334634, 0, "J/(mol·K)"), "9.6334634 J/(mol·K)");
    EXPECT_EQ(exactly(7300, 200, "kJ/mol"), "(7.3 ± 0.2) kJ/mol");
    EXPECT_EQ(exactly(298.15, 0, "°C"), "25 °C");
    EXPECT_EQ(exactly(298.15, 0, "°F"), "77 °F");
    EXPECT_EQ(exactly(298.15, 0.5, "°C"), "25 °C ± 0.5 K");
    EXPECT_EQ(exactly(298.15, 0.5, "K"), "(298.15 ± 0.5) K");
    EXPECT_EQ(exactly(0.1 + 0.2, 0, "K"), "0.30000000000000004 K");
    EXPECT_EQ(exactly(0.79, 0.02, ""), "0.79 ± 0.02");
    EXPECT_EQ(exactly(0.12, 0.01, "%"), "(12 ± 1) %");
    EXPECT_EQ(exactly(1e-30, 0, "J"), "1e-30 J");
    EXPECT_EQ(exactly(1.5e22, 0, "J"), "1.5e22 J");
    EXPECT_EQ(exactly(-7300, 0, "kJ"), "-7.3 kJ");
    EXPECT_EQ(exactly(0, 0, "kJ"), "0 kJ");
    EXPECT_EQ(exactly(500000, 10000, "bar(g)"), "(5 ± 0.1) bar(g)");
}

TEST(WriteExactly, FallsBackOnKelvinWhereCelsiusHasNoDigitsLeft) {
    EXPECT_EQ(exactly(1e-20, 0, "°C"), "1e-20 K");
    EXPECT_EQ(exactly(1e-20, 1e-21, "°F"), "1e-20 K ± 1e-21 K");
}

TEST(WriteForPeople, GivesTwoDigitsOfTheUncertainty) {
    EXPECT_EQ(for_people(10.5712, 0.1, "J/(mol·K)"), "(10.57 ± 0.10) J/(mol·K)");
    EXPECT_EQ(for_people(7312, 213, "kJ/mol"), "(7.31 ± 0.21) kJ/mol");
    EXPECT_EQ(for_people(10.5712, 0.0996, "J/(mol·K)"), "(10.57 ± 0.10) J/(mol·K)");
    EXPECT_EQ(for_people(1234, 123, "J"), "(1230 ± 120) J");
    EXPECT_EQ(for_people(12, 123, "J"), "(10 ± 120) J");
    EXPECT_EQ(for_people(0, 0.5, "J"), "(0.00 ± 0.50) J");
    EXPECT_EQ(for_people(298.15, 0.5, "°C"), "(25.00 ± 0.50) °C");
    EXPECT_EQ(for_people(298.15, 0.5, "°F"), "(77.00 ± 0.90) °F");
    EXPECT_EQ(for_people(0.79, 0.02, ""), "0.790 ± 0.020");
    EXPECT_EQ(for_people(1.2345e-7, 1.2e-9, "m³"), "(1.235×10⁻⁷ ± 0.012×10⁻⁷) m³");
    EXPECT_EQ(for_people(300, 1e-20, "K"), "(300 ± 1.0×10⁻²⁰) K");
    EXPECT_EQ(for_people(1e-28, 4e-33, "J"), "(1.000000×10⁻²⁸ ± 0.000040×10⁻²⁸) J");
    EXPECT_EQ(for_people(1.2345e9, 1.2e7, "J"), "(1.235×10⁹ ± 0.012×10⁹) J");
}

TEST(WriteForPeople, GivesTheDigitsAskedFor) {
    EXPECT_EQ(for_people(9.6334634, 0, "J/(mol·K)"), "9.633 J/(mol·K)");
    EXPECT_EQ(for_people(9.6334634, 0, "J/(mol·K)", 2), "9.6 J/(mol·K)");
    EXPECT_EQ(for_people(298.15, 0, "K"), "298.2 K"); // the double lies just below 298.15
    EXPECT_EQ(for_people(298.15, 0, "°C"), "25.00 °C");
    EXPECT_EQ(for_people(0.5, 0, ""), "0.5000");
    EXPECT_EQ(for_people(101325, 0, "Pa"), "101300 Pa");
    EXPECT_EQ(for_people(1234567, 0, "J"), "1.235×10⁶ J");
    EXPECT_EQ(for_people(1.38e-23, 0, "J/K", 3), "1.38×10⁻²³ J/K");
    EXPECT_EQ(for_people(-0.001234567, 0, "J"), "-0.001235 J");
    EXPECT_EQ(for_people(0, 0, "J"), "0 J");
    EXPECT_EQ(for_people(9.9999, 0, "J", 3), "10.0 J");
    EXPECT_EQ(for_people(99999, 0, "J", 3), "100000 J");
}

TEST(WriteNumber, WritesDecimalsWithAPoint) {
    EXPECT_EQ(write_number(298.15L, 15), "298.15");
    EXPECT_EQ(write_number(9.6334634L, 4), "9.633");
    EXPECT_EQ(write_number(0, 4), "0");
    EXPECT_EQ(write_number(-2.5L, 4), "-2.5");
    EXPECT_EQ(write_number(1e-7L, 4), "1e-7");
    EXPECT_EQ(write_number(1.5e20L, 4), "1.5e20");
    EXPECT_EQ(write_number(0.1L, 17), "0.1");
    EXPECT_EQ(write_number(123456, 3), "123000");
    EXPECT_EQ(write_number(1, 0), "1");
    EXPECT_EQ(write_number(2.0L / 3, 40), "0.6666666666666666667");
}

TEST(WriteNumber, WritesNoDigitsOfWhatIsNone) {
    EXPECT_EQ(write_number(std::numeric_limits<long double>::quiet_NaN(), 4), "not a number");
    EXPECT_EQ(write_number(std::numeric_limits<long double>::infinity(), 4), "infinite");
    EXPECT_EQ(write_number(-std::numeric_limits<long double>::infinity(), 4), "-infinite");
    EXPECT_EQ(exactly(std::numeric_limits<double>::infinity(), 0, "°C"), "infinite °C");
    EXPECT_EQ(for_people(std::numeric_limits<double>::quiet_NaN(), 0, "kJ"), "not a number kJ");
}

TEST(WriteNumber, AsksNoLocale) {
    const char* const german = std::setlocale(LC_ALL, "de_DE.UTF-8");
    EXPECT_EQ(write_number(2.5L, 4), "2.5");
    EXPECT_EQ(exactly(7312.5, 0, "kJ"), "7.3125 kJ");
    EXPECT_EQ(read_quantity("7.3125 kJ").si, 7312.5);
    EXPECT_EQ(read_quantity("1e-200 K").si, 1e-200);
    if (german != nullptr) std::setlocale(LC_ALL, "C");
}

} // namespace
