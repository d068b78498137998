// SPDX-License-Identifier: MPL-2.0
#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

// The views of a result: cell language §6.

namespace {

using registration::Answer;
using tests::call, tests::number, tests::text, tests::Range;

Answer fusion(Range show) {
    return call("ENTROPY.FUSION", {"18.7(2) kJ/mol", "1668 °C", Range(), std::move(show)});
}

TEST(Show, LeftOutGivesCoherentSI) { EXPECT_DOUBLE_EQ(number(fusion(Range())), 18700 / 1941.15); }

TEST(Show, ConvertsToTheUnitAskedFor) {
    EXPECT_DOUBLE_EQ(number(fusion("kJ/(mol·K)")), 18.7 / 1941.15);
    EXPECT_DOUBLE_EQ(number(fusion("cal_th/(mol·K)")), 18700 / 1941.15 / 4.184);
}

TEST(Show, TakesAHeading) { EXPECT_DOUBLE_EQ(number(fusion("ΔS / (kJ/(mol·K))")), 18.7 / 1941.15); }

TEST(Show, RefusesAUnitOfAnotherDimension) {
    EXPECT_EQ(text(fusion("kJ/K")), "#VALUE!");
    EXPECT_EQ(text(fusion("bar")), "#VALUE!");
}

TEST(Show, TellsWhyAUnitIsRefused) {
    EXPECT_NE(text(fusion("why in kJ/mol·K")).find("kJ/(mol·K)"), std::string::npos)
        << text(fusion("why in kJ/mol·K"));
    EXPECT_NE(text(fusion("why in bar")).find("molar entropy"), std::string::npos)
        << text(fusion("why in bar"));
}

TEST(Show, RefusesABlankCellAndANumber) {
    EXPECT_EQ(text(fusion(0.0)), "#VALUE!");
    EXPECT_EQ(text(fusion(Range::column({"K", "K"}))), "#VALUE!");
}

TEST(Show, QuantityReadsBackToTheLastBit) {
    for (const char* show : {"quantity", "quantity in kJ/(mol·K)", "quantity in cal_th/(mol·K)",
                             "quantity in Btu_IT/(lbmol·°R)"}) {
        const auto read = core::text::read_quantity(text(fusion(show)));
        EXPECT_EQ(read.si, number(fusion(Range()))) << show;
        EXPECT_EQ(read.u, number(fusion("uncertainty"))) << show;
    }
}

TEST(Show, QuantityOfATemperatureIsAPoint) {
    const std::vector<Range> step{"29.1 J/(mol·K)", "20 °C", "1 bar",
                                  "7 bar",          Range(), "quantity in °C"};
    const auto read = core::text::read_quantity(text(call("TEMPERATURE.ADIABATIC", step)));
    EXPECT_EQ(read.si,
              number(call("TEMPERATURE.ADIABATIC", {"29.1 J/(mol·K)", "20 °C", "1 bar", "7 bar"})));
}

TEST(Show, TextIsForPeople) {
    EXPECT_EQ(text(fusion("text")), "(9.63 ± 0.10) J/(mol·K)");
    EXPECT_EQ(text(call("ENTROPY.FUSION", {"18.7 kJ/mol", "1668 °C", Range(), "text"})),
              "9.633 J/(mol·K)");
    EXPECT_EQ(
        text(call("ENTROPY.FUSION", {"18.7 kJ/mol", "1668 °C", Range(), "text in cal_th/(mol·K)"})),
        "2.302 cal_th/(mol·K)");
}

TEST(Show, UncertaintyComesInTheUnitAskedFor) {
    EXPECT_NEAR(number(fusion("uncertainty")), 200 / 1941.15, 1e-13);
    EXPECT_NEAR(number(fusion("uncertainty in kJ/(mol·K)")), 0.2 / 1941.15, 1e-16);
}

TEST(Show, StepsCanBeReadAloud) {
    EXPECT_EQ(
        text(fusion("steps")),
        "ENTROPY.FUSION: Entropy of fusion: enthalpy of fusion over the melting temperature.\n"
        "ΔS = ΔH / T\n"
        "ΔH = 18.7(2) kJ/mol = 18700 J/mol, u = 200 J/mol\n"
        "T = 1668 °C = 1941.15 K\n"
        "ΔS = 18700 J/mol / 1941.15 K\n"
        "ΔS = 9.633464699 J/(mol·K)");
}

TEST(Show, StepsTellTheAmount) {
    const std::string steps =
        text(call("ENTROPY.FUSION", {"397 kJ/kg", "660.3 °C", "2 t", "steps"}));
    EXPECT_NE(steps.find("n = 2 t = 2000 kg"), std::string::npos) << steps;
    EXPECT_NE(steps.find("J/K"), std::string::npos) << steps;
}

TEST(Show, SourceNamesOne) {
    EXPECT_NE(text(fusion("source")).find("Gibbs 1876"), std::string::npos);
}

TEST(Show, WhySaysOkWithNotes) {
    EXPECT_EQ(text(fusion("why")), "ok");
    const std::string deficit = text(call("ENTROPY.ADIABATIC", {"29.1 J/(mol·K)", "20 °C", "1 bar",
                                                                "400 K", "7 bar", Range(), "why"}));
    EXPECT_EQ(deficit.substr(0, 2), "ok");
    EXPECT_GT(deficit.size(), 10u);
}

TEST(Show, UnitOfATextIsRefused) {
    const Range changes = Range::column({"J/K", 1.0, 2.0});
    EXPECT_EQ(text(call("SECONDLAW.VERDICT", {changes, Range(), Range(), Range(), "J/K"})),
              "#VALUE!");
    EXPECT_EQ(text(call("SECONDLAW.VERDICT", {changes, Range(), Range(), Range(), "uncertainty"})),
              "#VALUE!");
    EXPECT_EQ(text(call("SECONDLAW.VERDICT", {changes, Range(), Range(), Range(), "text"})),
              "irreversible");
}

TEST(Show, ConvertsBetweenBasesWhereTheSubstanceIsKnown) {
    const double molar = number(call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar"}));
    EXPECT_NEAR(number(call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar", Range(), "N2", "J/(kg·K)"})),
                molar / 0.028014, 1e-9);
    EXPECT_EQ(text(call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar", Range(), Range(), "J/(kg·K)"})),
              "#VALUE!");
    EXPECT_NEAR(number(call("ENTROPY.ISOTHERMAL", {"1 bar", "2 bar", "3 kg", "28.9652 g/mol"})),
                molar * 3 / 0.0289652, 1e-9);
}

TEST(Show, EveryViewWorksForEveryFunction) {
    std::size_t seen = 0;
    for (auto const& section : registration::catalogue::sections())
        for (auto const& entry : section.entries) {
            if (entry.position(registration::Argument::Role::show) == entry.argument_count())
                continue;
            ++seen;
            for (const char* view : {"quantity", "text", "uncertainty", "steps", "source", "why"}) {
                std::string formula = entry.examples[0].formula;
                formula.pop_back();
                std::size_t given = 0;
                // QUANTITY.CONVERT has its show in the middle, and the example fills it.
                const std::size_t position = entry.position(registration::Argument::Role::show);
                int depth = 0;
                bool quoted = false;
                std::size_t cut = std::string::npos;
                for (std::size_t i = formula.find('(') + 1; i < formula.size(); ++i) {
                    if (formula[i] == '"') quoted = !quoted;
                    if (quoted) continue;
                    depth += formula[i] == '{';
                    depth -= formula[i] == '}';
                    if (formula[i] == ';' && depth == 0 && ++given == position) cut = i;
                }
                if (cut != std::string::npos) formula.resize(cut), given = position - 1;
                for (; given < position; ++given) formula += ";";
                formula += "\"" + std::string(view) + "\")";
                const Answer answer = tests::call_formula(formula);
                const bool text_result =
                    entry.forms[0].overloads[0].outcome.kind == registration::Outcome::Kind::text;
                const bool refused = text_result && (std::string_view(view) == "quantity" ||
                                                     std::string_view(view) == "uncertainty");
                const std::string got = text(answer);
                EXPECT_EQ(got.starts_with("#"), refused) << formula << " gave " << got;
                if (std::string_view(view) == "why") {
                    EXPECT_TRUE(got.starts_with("ok")) << formula << " gave " << got;
                }
            }
        }
    EXPECT_GE(seen, 30u);
}

} // namespace
