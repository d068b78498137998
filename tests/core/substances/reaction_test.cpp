// SPDX-License-Identifier: MPL-2.0
#include "core/substances/reaction.h"

#include "tests/core/expect_refusal.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <cmath>
#include <string>
#include <vector>

namespace {

using namespace core;
using namespace core::substances;

Temperature kelvin(double value) { return Temperature::kelvin(value); }

/// `-2 Al, -1.5 O2, 1 Al2O3`.
std::string taken_apart(std::string_view equation) {
    std::string text;
    for (auto const& [substance, number] : read_reaction(equation).participants) {
        char digits[32];
        std::snprintf(digits, sizeof digits, "%g ", number);
        text += (text.empty() ? "" : ", ") + (digits + substance.written());
    }
    return text;
}

TEST(Reaction, IsTakenApart) {
    for (auto text : {"2 Al + 3/2 O2 -> Al2O3", "2Al+1.5O2=Al2O3", "2 Al + 1½ O2 → Al2O3",
                      "2 aluminium + 3/2 oxygen -> alumina", "2·Al + 3/2·O2 -> Al₂O₃"})
        EXPECT_EQ(taken_apart(text), "-2 Al, -1.5 O2, 1 Al2O3") << text;
    EXPECT_EQ(taken_apart("H2 + ½ O2 -> H2O(g)"), "-1 H2, -0.5 O2, 1 H2O(g)");
    EXPECT_EQ(taken_apart("CaCO3(cr) = CaO + CO2"), "-1 CaCO3(cr), 1 CaO, 1 CO2");
    EXPECT_EQ(taken_apart("H2O(l) -> H2O(g)"), "-1 H2O(l), 1 H2O(g)");
    EXPECT_EQ(taken_apart("1-butene -> isobutene"), "-1 1-butene, 1 isobutene");
    EXPECT_EQ(taken_apart("2 1-butene -> 2 isobutene"), "-2 1-butene, 2 isobutene");
}

void expect_unfit(std::string_view equation, std::string const& needed) {
    expect_refusal(unfit, "", needed, [&] { read_reaction(equation); });
}

TEST(Reaction, IsRefusedWhereItDoesNotBalance) {
    expect_unfit("Al + O2 -> Al2O3", "O: 1 more on the right, Al: 1 more on the right");
    expect_unfit("2 H2 + O2 -> H2O", "H: 2 more on the left, O: 1 more on the left");
    expect_unfit("C + O2 -> CO", "O: 1 more on the left");
    expect_unfit("1.333 Al + O2 -> 0.667 Al2O3", "Al: ");
}

TEST(Reaction, IsRefusedWhereItIsNone) {
    expect_unfit("2 Al + 3/2 O2", "an arrow");
    expect_unfit("Al -> O2 -> Al2O3", "one arrow");
    expect_unfit("-> Al2O3", "a substance between");
    expect_unfit("Al + -> Al2O3", "a substance between");
    expect_unfit("Na+ + Cl -> NaCl", "a substance between");
    expect_unfit("Cl2 -> 2 Cl-", "without a charge");
    expect_unfit("Fe + Xx -> FeXx", "substance of the tables");
    expect_unfit("O2 + O2 -> 2 O2", "each substance once");
    expect_unfit("0 Al + O2 -> O2", "above 0");
    expect_unfit("3/0 O2 -> O3", "fraction");
    expect_unfit("1,5 O2 -> O3", "decimal point");
    expect_unfit(std::string(1001, 'A'), "1000 characters");
    expect_unfit("", "an arrow");
}

// Tolerance: twice the standard uncertainty of the sum; of the energies, 0.1 kJ/mol, the least that
// the key values of these oxides state.
TEST(Reaction, AgreesWithTheKeyValues) {
    for (auto const& row :
         published::read_table(PUBLISHED_DIR "/reactions_codata.csv",
                               {"equation", "entropy", "u", "enthalpy", "gibbs"}, 10)) {
        const Reaction r = read_reaction(row.text("equation"));
        EXPECT_NEAR(entropy_of_reaction(r, kelvin(298.15)).value(), row.number("entropy"),
                    2 * row.number("u"))
            << row.text("equation");
        EXPECT_NEAR(enthalpy_of_reaction(r, kelvin(298.15)).value() / 1000, row.number("enthalpy"),
                    0.1)
            << row.text("equation");
        EXPECT_NEAR(gibbs_of_reaction(r, kelvin(298.15), {}).value() / 1000, row.number("gibbs"),
                    0.1)
            << row.text("equation");
    }
}

TEST(Reaction, AgreesWithPublishedGibbsEnergiesOfFormation) {
    for (auto const& row : published::read_table(
             PUBLISHED_DIR "/gibbs_of_formation_janaf.csv",
             {"equation", "temperature", "value", "tolerance", "departure", "table"}, 10)) {
        const double g = gibbs_of_reaction(read_reaction(row.text("equation")),
                                           kelvin(row.number("temperature")), {})
                             .value();
        EXPECT_NEAR(g / 1000 - row.number("value"), row.number("departure"),
                    row.number("tolerance"))
            << row.text("equation") << ' ' << row.number("temperature");
    }
}

TEST(Reaction, KeepsGibbsEqualToEnthalpyLessEntropy) {
    for (auto equation : {"C + CO2 -> 2 CO", "2 Al + 3/2 O2 -> Al2O3", "ZnO + C -> Zn + CO"})
        for (double t : {300.0, 700.0, 1200.0, 1799.0}) {
            const Reaction r = read_reaction(equation);
            const double h = enthalpy_of_reaction(r, kelvin(t)).value();
            const double s = entropy_of_reaction(r, kelvin(t)).value();
            EXPECT_NEAR(gibbs_of_reaction(r, kelvin(t), {}).value(), h - t * s, 1e-6) << equation;
        }
}

TEST(Reaction, TakesActivitiesInOrder) {
    const Reaction r = read_reaction("C + CO2 -> 2 CO");
    const Temperature t = kelvin(1000);
    const double standard = gibbs_of_reaction(r, t, {}).value();
    const double rt = 8.31446261815324 * 1000;
    const std::vector<Activity> a{{std::nullopt, 0.5},
                                  {Pressure::from_value(2e5), std::nullopt},
                                  {Pressure::from_value(1e4), std::nullopt}};
    EXPECT_NEAR(gibbs_of_reaction(r, t, a).value(),
                standard + rt * (2 * std::log(0.1) - std::log(0.5) - std::log(2.0)), 1e-8);
    const std::vector<Activity> none(3);
    EXPECT_EQ(gibbs_of_reaction(r, t, none).value(), standard);
    const double k = equilibrium_constant(r, t).value();
    EXPECT_NEAR(std::log(k), -standard / rt, 1e-13);
    // At p(CO)² / p(CO2) = K nothing is left to drive the reaction.
    const std::vector<Activity> at_equilibrium{
        {}, {Pressure::from_value(1e5), {}}, {Pressure::from_value(1e5 * std::sqrt(k)), {}}};
    EXPECT_NEAR(gibbs_of_reaction(r, t, at_equilibrium).value(), 0, 1e-8);
}

TEST(Reaction, RefusesActivitiesThatDoNotFit) {
    const Reaction r = read_reaction("C + CO2 -> 2 CO");
    const auto with = [&](std::vector<Activity> a) { gibbs_of_reaction(r, kelvin(1000), a); };
    const Activity blank, number{{}, 0.5}, bar{Pressure::from_value(1e5), {}};
    expect_refusal(unfit, "2 activities", "3, one a substance", [&] { with({blank, bar}); });
    expect_refusal(unfit, "CO2 with a number", "pressure of CO2", [&] {
        with({blank, number, bar});
    });
    expect_refusal(unfit, "C with a pressure", "an activity of C", [&] { with({bar, bar, bar}); });
    expect_refusal(impossible, "C at 0", "above 0", [&] { with({{{}, 0.0}, bar, bar}); });
}

TEST(Reaction, IsRefusedOutsideTheCommonRange) {
    const Reaction r = read_reaction("ZnO + C -> Zn + CO");
    expect_refusal(impossible, "250 K", "298.15 K to 1800 K",
                   [&] { entropy_of_reaction(r, kelvin(250)); });
    expect_refusal(impossible, "log10 K = ", "between 1e-307", [] {
        equilibrium_constant(read_reaction("4 Al + 3 O2 -> 2 Al2O3"), kelvin(200));
    });
}

double equilibrium(std::string_view equation) {
    return absolute(equilibrium_temperature(read_reaction(equation), {}, {})).value();
}

// From rows of the JANAF tables at 1000 K: ΔG = 2(-200.275) + 395.886 = -4.664 kJ/mol, and with
// ΔS = 2·234.538 - 269.299 - 24.457 = 175.3 J/(mol K) (entropies from memory) ΔG = 0 at 973.4 K.
// Tolerance: 0.3 kJ/mol of two evaluations over ΔS.
TEST(EquilibriumTemperature, OfTheGasificationOfCarbon) {
    EXPECT_NEAR(equilibrium("C + CO2 -> 2 CO"), 973.4, 1.7);
}

// From log10 Kf = 2.867 at 298.15 K and -0.501 at 500 K, JANAF table H-083, ln K linear in 1/T:
// 454.3 K. Tolerance: the curvature, ΔCp = -20 J/(mol K) over 200 K, moves the root by some 3 K.
TEST(EquilibriumTemperature, OfTheFormationOfAmmonia) {
    EXPECT_NEAR(equilibrium("1/2 N2 + 3/2 H2 -> NH3"), 454.3, 4);
}

TEST(EquilibriumTemperature, OfABoilingIsTheBoilingPoint) {
    EXPECT_NEAR(equilibrium("H2O(l) -> H2O(g)"), 373.195, 0.001);
}

TEST(EquilibriumTemperature, IsZeroOfTheGibbsEnergy) {
    for (auto equation :
         {"CaCO3 -> CaO + CO2", "C + CO2 -> 2 CO", "MgCO3 -> MgO + CO2", "CO + H2O(g) -> CO2 + H2",
          "2 HgO -> 2 Hg(g) + O2", "ZnO + C -> Zn + CO"}) {
        const Reaction r = read_reaction(equation);
        const Temperature t = equilibrium_temperature(r, {}, {});
        EXPECT_NEAR(gibbs_of_reaction(r, t, {}).value(), 0, 1e-6) << equation;
    }
}

TEST(EquilibriumTemperature, IsRefusedWithoutARootOrWithSeveral) {
    expect_refusal(impossible, "Al2O3", "below zero throughout",
                   [] { equilibrium("2 Al + 3/2 O2 -> Al2O3(cr)"); });
    expect_refusal(impossible, "CO2", "between 300 K and 400 K", [] {
        equilibrium_temperature(read_reaction("C + CO2 -> 2 CO"), kelvin(300), kelvin(400));
    });
    expect_refusal(impossible, "500 K to 400 K", "from low to high", [] {
        equilibrium_temperature(read_reaction("C + CO2 -> 2 CO"), kelvin(500), kelvin(400));
    });
}

} // namespace
