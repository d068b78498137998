// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

// What is refused, with which error, and whether the reason helps: cell language §8.

namespace {

using tests::call, tests::text, tests::Range;

struct Refusal {
    const char* function;
    std::vector<Range> arguments; ///< without show, which is filled in to ask why
    std::size_t show;             ///< where show stands
    const char* error;
    std::vector<const char*> reasons; ///< pieces of the sentence
};

void expect(Refusal refusal) {
    refusal.arguments.resize(refusal.show + 1);
    const std::string got = text(call(refusal.function, refusal.arguments));
    EXPECT_EQ(got, refusal.error) << refusal.function;
    refusal.arguments[refusal.show] = "why";
    const std::string why = text(call(refusal.function, refusal.arguments));
    EXPECT_TRUE(why.starts_with(refusal.function)) << why;
    EXPECT_NE(why.find("To mend it, "), std::string::npos) << why;
    for (const char* piece : refusal.reasons)
        EXPECT_NE(why.find(piece), std::string::npos) << "expected: " << piece << "\nin: " << why;
}

TEST(Refusals, OfABlankCell) {
    expect({"ENTROPY.FUSION", {0.0, "1668 °C"}, 3, "#VALUE!", {"what", "blank cell"}});
}
TEST(Refusals, OfCoulombs) {
    expect({"ENTROPY.FUSION", {"18.7 kJ/mol", "25 C"}, 3, "#VALUE!", {"temperature", "°C"}});
}
TEST(Refusals, OfTwoSolidi) {
    expect({"ENTROPY.ISOBARIC",
            {"4.18 kJ/kg·K", "20 °C", "30 °C"},
            4,
            "#VALUE!",
            {"heat_capacity", "kJ/(kg·K)"}});
}
TEST(Refusals, OfGaugePressure) {
    expect(
        {"ENTROPY.ISOTHERMAL", {"5 barg", "1 bar"}, 4, "#VALUE!", {"from", "PRESSURE.ABSOLUTE"}});
}
TEST(Refusals, OfAnAmbiguousComma) {
    expect({"ENTROPY.FUSION", {"1,234 kJ", "300 K"}, 3, "#VALUE!", {"what", "1234"}});
}
TEST(Refusals, ButADecimalCommaIsRead) {
    EXPECT_DOUBLE_EQ(tests::number(call("ENTROPY.FUSION", {"7,3 kJ/mol", "1000 K"})), 7.3);
}

TEST(Refusals, OfTheSlipOfAddingACelsiusZero) {
    // Dividing by 1668 + 298 gives 9.51; whatever is written, that number cannot come out.
    expect({"ENTROPY.FUSION",
            {"18.7 kJ/mol", 1668.0},
            3,
            "#VALUE!",
            {"temperature", "without a unit"}});
    expect({"ENTROPY.FUSION",
            {"18.7 kJ/mol", 1966.0},
            3,
            "#VALUE!",
            {"temperature", "without a unit"}});
    expect({"ENTROPY.FUSION",
            {"18.7 kJ/mol", "1668 Δ°C"},
            3,
            "#VALUE!",
            {"temperature", "difference"}});
    EXPECT_NEAR(tests::number(call("ENTROPY.FUSION", {"18.7 kJ/mol", "1668 °C"})), 9.633, 5e-4);
}

TEST(Refusals, OfATemperatureBelowAbsoluteZero) {
    expect(
        {"ENTROPY.FUSION", {"18.7 kJ/mol", "-300 °C"}, 3, "#NUM!", {"temperature", "above 0 K"}});
}
TEST(Refusals, OfZeroKelvin) {
    expect({"ENTROPY.FUSION", {"18.7 kJ/mol", "0 K"}, 3, "#NUM!", {"temperature", "above 0 K"}});
}
TEST(Refusals, OfANegativeEnthalpy) {
    expect({"ENTROPY.FUSION", {"-18.7 kJ/mol", "1668 °C"}, 3, "#NUM!", {"what", "above 0"}});
}
TEST(Refusals, OfAMissingArgument) {
    expect({"ENTROPY.FUSION", {"18.7 kJ/mol"}, 3, "#VALUE!", {"temperature", "nothing"}});
}
TEST(Refusals, OfAnotherDimension) {
    expect(
        {"ENTROPY.FUSION", {"18.7 kJ/mol", "5 bar"}, 3, "#VALUE!", {"temperature", "a pressure"}});
}
TEST(Refusals, OfMixedDimensions) {
    expect({"ENTROPY.ISOTHERMAL", {"1 bar", "2 L"}, 4, "#VALUE!", {"to", "pressure"}});
}
TEST(Refusals, OfAnAmountOnTheOtherBasis) {
    expect({"ENTROPY.FUSION", {"18.7 kJ/mol", "1668 °C", "3 kg"}, 3, "#VALUE!", {"amount", "mol"}});
}
TEST(Refusals, OfAnAmountOfTheWhole) {
    expect({"ENTROPY.FUSION",
            {"18.7 kJ", "1668 °C", "3 kg"},
            3,
            "#VALUE!",
            {"amount", "leave the amount out"}});
}
TEST(Refusals, OfANegativeAmount) {
    expect({"ENTROPY.FUSION",
            {"18.7 kJ/mol", "1668 °C", "-3 mol"},
            3,
            "#NUM!",
            {"amount", "0 or more"}});
}
TEST(Refusals, OfExponentOne) {
    expect({"ENTROPY.POLYTROPIC",
            {"29.1 J/(mol·K)", 1.0, "300 K", "400 K"},
            5,
            "#NUM!",
            {"ENTROPY.ISOTHERMAL"}});
}
TEST(Refusals, OfAnEfficiencyAboveOne) {
    expect({"TEMPERATURE.ADIABATIC",
            {"29.1 J/(mol·K)", "300 K", "1 bar", "7 bar", 1.2},
            5,
            "#NUM!",
            {"efficiency", "up to 1"}});
}
TEST(Refusals, OfAPercentNumberWithoutItsUnit) {
    expect({"TEMPERATURE.ADIABATIC",
            {"29.1 J/(mol·K)", "300 K", "1 bar", "7 bar", 80.0},
            5,
            "#NUM!",
            {"efficiency"}});
}
TEST(Refusals, OfFractionsThatDoNotSumToOne) {
    expect({"ENTROPY.MIXING", {Range::column({0.79, 0.2})}, 2, "#VALUE!", {"sum"}});
}
TEST(Refusals, OfMassesWithoutSubstances) {
    expect({"ENTROPY.MIXING", {Range::column({"kg", 1.0, 2.0})}, 2, "#VALUE!", {"substances"}});
}
TEST(Refusals, OfAnUnknownElement) { expect({"MOLAR.MASS", {"Xx2O"}, 1, "#VALUE!", {"Xx"}}); }
TEST(Refusals, OfNegativeGeneration) {
    expect({"WORK.LOST", {"-1 W/K", "300 K"}, 2, "#NUM!", {"generated"}});
}
TEST(Refusals, OfHeatsWithoutTemperatures) {
    expect({"ENTROPY.GENERATED",
            {Range::column({"J/K", 1.0}), Range::column({"J", 1.0, 2.0})},
            3,
            "#VALUE!",
            {"temperatures"}});
}
TEST(Refusals, OfAbsoluteWhereGaugeIsAsked) {
    expect({"PRESSURE.ABSOLUTE", {"5 bar", "1 bar"}, 2, "#VALUE!", {"gauge", "(g)"}});
}
TEST(Refusals, OfAColdHotReservoir) {
    expect({"CARNOT.EFFICIENCY", {"300 K", "400 K"}, 2, "#NUM!", {}});
}
TEST(Refusals, OfTwoUnitsInOneCell) {
    expect({"ENTROPY.FUSION",
            {Range::row({"7.3 kJ/mol", "kJ/mol"}), "300 K"},
            3,
            "#VALUE!",
            {"number alone"}});
}
TEST(Refusals, OfAShapelessBlock) {
    expect({"ENTROPY.FUSION",
            {Range::table({{1.0, 2.0, 3.0, 4.0}, {1.0, 2.0, 3.0, 4.0}}), "300 K"},
            3,
            "#VALUE!",
            {"2 × 4"}});
}

TEST(Spellings, OfOneTemperatureGiveTheSameBits) {
    const double expected = tests::number(call("ENTROPY.FUSION", {"18.7 kJ/mol", "298.15 K"}));
    const std::vector<Range> spellings{"25 °C",
                                       "77 °F",
                                       "536.67 °R",
                                       "298150 mK",
                                       "0.29815 kK",
                                       "2.9815e2 K",
                                       "29815e-2 K",
                                       "25 degC",
                                       "298,15 K",
                                       "25.00 ℃",
                                       Range::row({25.0, "°C"}),
                                       Range::column({"T / °F", 77.0})};
    for (Range const& spelling : spellings)
        EXPECT_EQ(tests::number(call("ENTROPY.FUSION", {"18.7 kJ/mol", spelling})), expected);
}

} // namespace
