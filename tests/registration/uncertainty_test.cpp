// SPDX-License-Identifier: MPL-2.0
#include "registration/call.h"
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <array>
#include <cmath>

// Combined standard uncertainty, JCGM 100:2008.

namespace {

using namespace registration;
using tests::number, tests::Range, tests::text;

/// JCGM 100:2008, H.1: length of an end gauge at 20 °C compared with a standard,
/// l = ls + d - ls · (δα · θ + αs · δθ), equation (H.3).
core::Length gauge_length(core::Length standard, core::Length difference,
                          core::Expansivity expansivity_difference,
                          core::TemperatureDifference deviation, core::Expansivity expansivity,
                          core::TemperatureDifference temperature_difference) {
    return standard + difference -
           standard * (expansivity_difference * deviation + expansivity * temperature_difference);
}

constexpr Entry gauge =
    describe({.name = "GAUGE.LENGTH",
              .arguments = {{{.name = "ls", .symbol = "ls"},
                             {.name = "d", .symbol = "d"},
                             {.name = "dalpha", .symbol = "δα"},
                             {.name = "theta", .symbol = "θ"},
                             {.name = "alpha", .symbol = "αs"},
                             {.name = "dtheta", .symbol = "δθ"},
                             show}},
              .forms = {form<gauge_length>("l = ls + d - ls · (δα · θ + αs · δθ)")}});

Answer gauge_call(const char* view) {
    const std::array<Range, 7> arguments{"50000623 nm ± 25 nm",
                                         "215 nm ± 9.7 nm",
                                         "0 1/K ± 0.58e-6 1/K",
                                         "-0.1 K ± 0.41 K",
                                         "11.5e-6 1/K ± 1.2e-6 1/K",
                                         "0 K ± 0.029 K",
                                         view};
    std::array<Block, 7> blocks{};
    for (std::size_t i = 0; i < blocks.size(); ++i) blocks[i] = arguments[i].block();
    return registration::call(gauge, blocks);
}

TEST(Uncertainty, ReproducesTheEndGaugeOfTheGuide) {
    // Source: JCGM 100:2008, H.1.7 (result 50 000 838 nm) and Table H.1 (combined 32 nm, first
    // order; 31.71 nm when recomputed with all digits). The value of u(αs) does not enter, since δθ
    // is 0. Tolerances: half of the last printed digit; 0.01 nm for the recomputed one.
    EXPECT_NEAR(number(gauge_call("nm")), 50000838, 0.5);
    const double u = number(gauge_call("uncertainty in nm"));
    EXPECT_NEAR(u, 32, 0.5);
    EXPECT_NEAR(u, 31.71, 0.01);
}

TEST(Uncertainty, AddsInQuadrature) {
    // 0.2/18.7 and 5/1941.15 relative; the exact first-order sum; second order is below 1e-5 of it.
    const double u = number(tests::call(
        "ENTROPY.FUSION", {"18.7 kJ/mol ± 0.2 kJ/mol", "1941.15 K ± 5 K", Range(), "uncertainty"}));
    const double s = 18700 / 1941.15;
    EXPECT_NEAR(u, s * std::hypot(0.2 / 18.7, 5 / 1941.15), 1e-5 * u);
}

TEST(Uncertainty, ComesFromTheAmountToo) {
    const double u = number(
        tests::call("ENTROPY.FUSION", {"18.7 kJ/mol", "1000 K", "10 mol ± 1 mol", "uncertainty"}));
    EXPECT_NEAR(u, 18.7, 1e-10);
}

TEST(Uncertainty, IsNoneWhereNoInputStatesOne) {
    EXPECT_EQ(
        number(tests::call("ENTROPY.FUSION", {"18.7 kJ/mol", "1000 K", Range(), "uncertainty"})),
        0);
}

TEST(Uncertainty, OfAWholeColumnMovesOneRowAtATime) {
    const Range changes = Range::table({{"J/K", "u"}, {10.0, 0.3}, {-4.0, 0.4}});
    EXPECT_NEAR(
        number(tests::call("ENTROPY.GENERATED", {changes, Range(), Range(), "uncertainty"})), 0.5,
        1e-12);
}

TEST(Uncertainty, OfAFractionMovesTheOthersWithIt) {
    // S = -R Σ x ln x normalised: dS/dx1 at constant ratio of the others = -R (ln x1 + S/R).
    const Range fractions = Range::table({{"1", "u"}, {0.79, 0.01}, {0.21, Range::blank()}});
    const double s = 4.273273525197419, R = 8.31446261815324;
    const double slope = -R * (std::log(0.79) + s / R);
    EXPECT_NEAR(number(tests::call("ENTROPY.MIXING", {fractions, Range(), "uncertainty"})),
                std::fabs(slope) * 0.01, 2e-3 * std::fabs(slope) * 0.01);
}

TEST(Uncertainty, TakesTheOtherSideWhereOneIsRefused) {
    const std::vector<Range> arguments{"29.1 J/(mol·K)", "20 °C",           "1 bar",
                                       "7 bar",          "(0.99 ± 0.02) 1", "uncertainty"};
    const double u = number(tests::call("TEMPERATURE.ADIABATIC", arguments));
    EXPECT_GT(u, 0);
    std::vector<Range> why = arguments;
    why.back() = "why";
    EXPECT_NE(text(tests::call("TEMPERATURE.ADIABATIC", why)).find("one side"), std::string::npos);
}

TEST(Uncertainty, IsAnErrorWhereBothSidesAreRefused) {
    EXPECT_EQ(text(tests::call("TEMPERATURE.ADIABATIC", {"29.1 J/(mol·K)", "20 °C", "1 bar",
                                                         "7 bar", "(0.5 ± 2) 1", "uncertainty"})),
              "#NUM!");
}

TEST(Uncertainty, DecidesTheVerdict) {
    EXPECT_EQ(text(tests::call("SECONDLAW.VERDICT", {Range::column({"J/K", 1.0, -1.1})})),
              "impossible");
    const Range uncertain = Range::table({{"J/K", "u"}, {1.0, 0.04}, {-1.1, 0.04}});
    EXPECT_EQ(text(tests::call("SECONDLAW.VERDICT", {uncertain})),
              "reversible within the tolerance");
}

TEST(Uncertainty, IsBoundedInItsWork) {
    std::vector<std::vector<Range>> rows{{"J/K", "u"}};
    for (int i = 0; i < 1001; ++i) rows.push_back({1.0, 0.1});
    EXPECT_EQ(text(tests::call("ENTROPY.GENERATED",
                               {Range::table(rows), Range(), Range(), "uncertainty"})),
              "#NUM!");
    rows.pop_back();
    EXPECT_NEAR(number(tests::call("ENTROPY.GENERATED",
                                   {Range::table(rows), Range(), Range(), "uncertainty"})),
                0.1 * std::sqrt(1000.0), 1e-9);
}

} // namespace
