// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

// Columns: cell language §3. One bad row never spoils its neighbours.

namespace {

using registration::Answer;
using tests::call, tests::text, tests::Range;

Range heat() { return Range::column({"ΔH / (kJ/mol)", 18.7, 13.8, 7.03}); }
Range melting() { return Range::column({"T / K", 1941.15, 1811.0, 505.08}); }

void expect_fusion(Answer const& answer, std::size_t row, double heat, double temperature) {
    EXPECT_DOUBLE_EQ(answer.numbers.at(row), heat * 1000 / temperature);
}

TEST(Columns, UnderHeadingsGiveARowEach) {
    const Answer answer = call("ENTROPY.FUSION", {heat(), melting()});
    ASSERT_EQ(answer.rows, 3u);
    ASSERT_EQ(answer.columns, 1u);
    expect_fusion(answer, 0, 18.7, 1941.15);
    expect_fusion(answer, 2, 7.03, 505.08);
}

TEST(Columns, WorkForEveryFunction) {
    std::size_t seen = 0;
    for (auto const& section : registration::catalogue::sections())
        for (auto const& entry : section.entries)
            for (auto const& example : entry.examples) {
                // `show` is one cell, so examples with one are left to the tests of show.
                if (!example.formula ||
                    std::string_view(example.formula).find('{') != std::string_view::npos)
                    continue;
                const std::size_t given = static_cast<std::size_t>(std::ranges::count(
                                              std::string_view(example.formula), ';')) +
                                          1;
                if (entry.argument_count() == 0 ||
                    given > entry.position(registration::Argument::Role::show))
                    continue;
                SCOPED_TRACE(example.formula);
                ++seen;
                const std::string single = text(tests::call_formula(example.formula));
                const Answer answer = tests::call_formula_in_rows(example.formula, 3);
                ASSERT_EQ(answer.rows, 3u);
                for (std::size_t row = 0; row < 3; ++row) EXPECT_EQ(text(answer, row), single);
            }
    EXPECT_GE(seen, 27u);
}

TEST(Columns, MayBeRowsOfValueAndUnit) {
    const Range pairs = Range::table({{18.7, "kJ/mol"}, {13800.0, "J/mol"}, {7.03, "kJ/mol"}});
    const Answer answer = call("ENTROPY.FUSION", {pairs, melting()});
    ASSERT_EQ(answer.rows, 3u);
    expect_fusion(answer, 1, 13.8, 1811);
}

TEST(Columns, MayBeTextsInEveryRow) {
    const Answer answer =
        call("ENTROPY.FUSION",
             {Range::column({"18.7 kJ/mol", "13.8 kJ/mol", "7.03 kJ/mol"}), melting()});
    ASSERT_EQ(answer.rows, 3u);
    expect_fusion(answer, 2, 7.03, 505.08);
}

TEST(Columns, LieAcrossToo) {
    const Answer answer = call(
        "ENTROPY.FUSION", {Range::row({"kJ/mol", 18.7, 13.8}), Range::row({"K", 1941.15, 1811.0})});
    EXPECT_EQ(answer.rows, 1u);
    ASSERT_EQ(answer.columns, 2u);
    expect_fusion(answer, 1, 13.8, 1811);
}

TEST(Columns, RepeatASingleQuantity) {
    const Answer answer = call("ENTROPY.FUSION", {heat(), "1000 K"});
    ASSERT_EQ(answer.rows, 3u);
    expect_fusion(answer, 1, 13.8, 1000);
}

TEST(Columns, KeepABadRowToItself) {
    const Range temperatures = Range::column({"T / K", 1941.15, -5.0, 505.08});
    const Answer answer = call("ENTROPY.FUSION", {heat(), temperatures});
    ASSERT_EQ(answer.rows, 3u);
    expect_fusion(answer, 0, 18.7, 1941.15);
    EXPECT_EQ(text(answer, 1), "#NUM!");
    expect_fusion(answer, 2, 7.03, 505.08);
}

TEST(Columns, KeepAnUnreadableRowToItself) {
    const Range texts = Range::column({"18.7 kJ/mol", "13.8 kJ/mol/K/s", "7.03 kJ/mol"});
    const Answer answer = call("ENTROPY.FUSION", {texts, melting()});
    EXPECT_EQ(text(answer, 1), "#VALUE!");
    expect_fusion(answer, 2, 7.03, 505.08);
}

TEST(Columns, RefuseARowOfAnotherDimensionAlone) {
    const Answer answer = call(
        "ENTROPY.FUSION", {Range::column({"18.7 kJ/mol", "13.8 bar", "7.03 kJ/mol"}), melting()});
    EXPECT_EQ(text(answer, 1), "#VALUE!");
    expect_fusion(answer, 0, 18.7, 1941.15);
}

TEST(Columns, LeaveABlankRowBlank) {
    const Range heats = Range::column({"kJ/mol", 18.7, Range::blank(), 7.03});
    const Range temperatures = Range::column({"K", 1941.15, Range::blank(), 505.08});
    const Answer answer = call("ENTROPY.FUSION", {heats, temperatures});
    ASSERT_EQ(answer.blanks.size(), 1u);
    EXPECT_EQ(answer.blanks[0], 1u);
    expect_fusion(answer, 2, 7.03, 505.08);
}

TEST(Columns, RefuseARowThatIsBlankInSomeOnly) {
    const Range temperatures = Range::column({"K", 1941.15, Range::blank(), 505.08});
    const Answer answer = call("ENTROPY.FUSION", {heat(), temperatures});
    EXPECT_EQ(text(answer, 1), "#VALUE!");
    const Answer why = call("ENTROPY.FUSION", {heat(), temperatures, Range(), "why"});
    EXPECT_NE(text(why, 1).find("blank in some columns"), std::string::npos) << text(why, 1);
    EXPECT_EQ(text(why, 0), "ok");
}

TEST(Columns, RefuseOtherLengthsAndDirections) {
    EXPECT_EQ(text(call("ENTROPY.FUSION", {heat(), Range::column({"K", 1941.15, 1811.0})})),
              "#VALUE!");
    EXPECT_EQ(text(call("ENTROPY.FUSION", {heat(), Range::row({"K", 1941.15, 1811.0, 505.08})})),
              "#VALUE!");
}

TEST(Columns, CarryTheirUncertainties) {
    const Range heats = Range::table({{"ΔH / (kJ/mol)", "u"}, {18.7, 0.2}, {13.8, "1 %"}});
    const Answer answer = call("ENTROPY.FUSION", {heats, "1000 K", Range(), "uncertainty"});
    ASSERT_EQ(answer.rows, 2u);
    EXPECT_NEAR(answer.numbers[0], 0.2, 1e-12);
    EXPECT_NEAR(answer.numbers[1], 0.138, 1e-12);
}

TEST(Columns, AsOneArgumentGiveOneResult) {
    const Answer answer =
        call("ENTROPY.MIXING", {Range::column({"mol", 2.0, Range::blank(), 3.0, Range::blank()})});
    ASSERT_EQ(answer.numbers.size(), 1u);
    EXPECT_NEAR(answer.numbers[0], 27.978651734647293, 1e-12);
}

TEST(Columns, ThatBelongTogetherKeepTheirRows) {
    const Range substances = Range::column({"N2", Range::blank(), "O2"});
    const Range masses = Range::column({"kg", 0.767, Range::blank(), 0.233});
    EXPECT_GT(tests::number(call("ENTROPY.MIXING", {masses, substances})), 0);
    const Range shifted = Range::column({Range::blank(), "N2", "O2"});
    EXPECT_EQ(text(call("ENTROPY.MIXING", {masses, shifted})), "#VALUE!");
}

TEST(Columns, OfFractionsKeepTheirBlankRows) {
    const Answer answer =
        call("FRACTION.MOLE", {Range::column({"kg", 28.014, Range::blank(), 2.016}),
                               Range::column({"N2", Range::blank(), "H2"})});
    ASSERT_EQ(answer.rows, 3u);
    EXPECT_NEAR(answer.numbers[0], 0.5, 1e-12);
    EXPECT_EQ(text(answer, 1), "");
    EXPECT_NEAR(answer.numbers[2], 0.5, 1e-12);
}

TEST(Columns, OfABalanceMayHaveTwoLengths) {
    const Range changes = Range::column({"W/K", 1.5, -0.2, 0.7});
    const Range heats = Range::column({"kW", 1.0, -0.6});
    const Range boundaries = Range::column({"°C", 226.85, 26.85});
    EXPECT_NEAR(tests::number(call("ENTROPY.GENERATED", {changes, heats, boundaries})),
                2.0 - (1000 / 500.0 - 600 / 300.0), 1e-12);
}

TEST(Columns, OfOneRowUnderAHeadingAreASingleQuantity) {
    const Answer answer = call("ENTROPY.FUSION", {Range::column({"kJ/mol", 18.7}), melting()});
    EXPECT_EQ(answer.rows, 3u);
}

TEST(Columns, OfSubstancesKeepABadOneToItself) {
    const Range gases = Range::column({"N2", "Xx", "O2"});
    const Answer answer = call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar", "3 kg", gases});
    ASSERT_EQ(answer.rows, 3u);
    EXPECT_LT(answer.numbers[0], 0);
    EXPECT_EQ(text(answer, 1), "#VALUE!");
    EXPECT_LT(answer.numbers[2], 0);
}

TEST(Columns, OfMolarMassesServeAsSubstances) {
    const double of_formula =
        tests::number(call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar", "3 kg", "N2"}));
    for (const Range& mass : {Range::row({28.014, "g/mol"}), Range::column({"M / (g/mol)", 28.014}),
                              Range("28.014 g/mol")})
        EXPECT_DOUBLE_EQ(
            tests::number(call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar", "3 kg", mass})),
            of_formula);
}

TEST(Columns, StayFastWhereEveryRowIsBad) {
    std::vector<Range> cells{"K"};
    for (int i = 0; i < 20000; ++i) cells.push_back(-1.0);
    const Answer answer = call("ENTROPY.FUSION", {"1 kJ/mol", Range::column(std::move(cells))});
    ASSERT_EQ(answer.rows, 20000u);
    EXPECT_EQ(text(answer, 19999), "#NUM!");
}

} // namespace
