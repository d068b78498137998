// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

// Gases as a worksheet gives them: text, a block of a mixture, a heat capacity behind a name.

namespace {

using tests::call, tests::number, tests::text, tests::Range;

double entropy_of(Range gas, const char* unit = "J/(mol·K)") {
    return number(call("ENTROPY.GAS", {gas, "300 K", "1 bar", "600 K", "5 bar", Range(), unit}));
}
std::string why(Range gas) {
    return text(call("ENTROPY.GAS", {gas, "300 K", "1 bar", "600 K", "5 bar", Range(), "why"}));
}
void expect_why(Range gas, std::string_view part) {
    const std::string reason = why(gas);
    EXPECT_NE(reason.find(part), std::string::npos) << reason;
}

const char* const as_text = "0.79 N2 + 0.21 O2";
const double expected = entropy_of(as_text);

TEST(GasBlocks, OfMoleFractionsAreTheMixtureOfTheText) {
    EXPECT_NEAR(entropy_of(Range::table({{"N2", 0.79}, {"O2", 0.21}})), expected, 1e-12);
    EXPECT_NEAR(entropy_of(Range::table({{"gas", "mol%"}, {"N2", 79.0}, {"O2", 21.0}})), expected,
                1e-12);
    EXPECT_NEAR(entropy_of(Range::table({{"gas", "vol%"}, {"N2", 79.0}, {"O2", "rest"}})), expected,
                1e-12);
    EXPECT_NEAR(entropy_of(Range::table({{"N2", "79 mol%"}, {"O2", "rest"}})), expected, 1e-12);
    EXPECT_NEAR(entropy_of(Range::table({{"N2", "O2"}, {0.79, 0.21}})), expected, 1e-12);
    EXPECT_NEAR(
        entropy_of(Range::table({{"N2", 0.79}, {Range::blank(), Range::blank()}, {"O2", 0.21}})),
        expected, 1e-12);
}

TEST(GasBlocks, OfAmountsAndMassesAreTurnedIntoMoleFractions) {
    EXPECT_NEAR(entropy_of(Range::table({{"gas", "n / kmol"}, {"N2", 7.9}, {"O2", 2.1}})), expected,
                1e-12);
    EXPECT_NEAR(entropy_of(Range::table({{"gas", "mol/s"}, {"N2", 7.9}, {"O2", 2.1}})), expected,
                1e-12);
    // M = 28.014 and 31.998 g/mol, IUPAC 2021 abridged
    const double nitrogen = 0.79 * 28.014, oxygen = 0.21 * 31.998;
    EXPECT_NEAR(entropy_of(Range::table({{"gas", "kg/h"}, {"N2", nitrogen}, {"O2", oxygen}})),
                expected, 1e-12);
    const double share = 100 * nitrogen / (nitrogen + oxygen);
    EXPECT_NEAR(entropy_of(Range::table({{"gas", "wt%"}, {"N2", share}, {"O2", "rest"}})), expected,
                1e-12);
}

TEST(GasBlocks, StandForAllRowsAndTellTheirMolarMass) {
    const Range block = Range::table({{"N2", 0.79}, {"O2", 0.21}});
    const auto column = call("ENTROPY.GAS", {block, Range::column({"K", 300.0, 400.0, 500.0}),
                                             "1 bar", "600 K", "5 bar"});
    EXPECT_EQ(column.rows, 3u);
    EXPECT_NEAR(column.numbers[0], expected, 1e-12);
    const double molar_mass = 0.79 * 0.028014 + 0.21 * 0.031998;
    EXPECT_NEAR(entropy_of(block, "J/(kg·K)"), expected / molar_mass, 1e-9);
    EXPECT_NEAR(
        number(call("ENTROPY.GAS", {block, "300 K", "1 bar", "600 K", "5 bar", "2 kg", "J/K"})),
        2 * expected / molar_mass, 1e-9);
}

TEST(GasBlocks, HaveAbsoluteEntropies) {
    EXPECT_NEAR(
        number(call("ENTROPY.STANDARD",
                    {Range::table({{"gas", "mol%"}, {"N2", 79.0}, {"O2", "rest"}}), "300 K"})),
        number(call("ENTROPY.STANDARD", {as_text, "300 K"})), 1e-12);
}

TEST(GasBlocks, AreRefusedWithTheirReason) {
    expect_why(Range::table({{"N2", 0.79}, {"O2", 0.2}}), "sum to 1");
    expect_why(Range::table({{"N2", "rest"}, {"O2", "rest"}}), "`rest` twice");
    expect_why(Range::table({{"gas", "kg"}, {"N2", 3.0}, {"O2", "rest"}}), "`rest` among amounts");
    expect_why(Range::table({{"N2", 0.79}, {"N2", 0.21}}), "each gas once");
    expect_why(Range::table({{"N2", 1.2}, {"O2", -0.2}}), "0 or more");
    expect_why(Range::table({{"N2", 79.0}, {"O2", "rest"}}), "head percentages");
    expect_why(Range::table({{"gas", "bar"}, {"N2", 0.8}, {"O2", 0.2}}), "fractions or amounts");
    expect_why(Range::table({{"N2", "79 mol%"}, {"O2", "1 kg"}}), "one kind");
    expect_why(Range::table({{"N2", 0.79}, {"Xx", 0.21}}), "Xx");
    expect_why(Range::table({{"gas", "mol%"}, {"N2", Range::blank()}, {"O2", 21.0}}),
               "without a fraction");
    expect_why(Range::table({{"gas", "mol%", "x"}, {"N2", 79.0, 1.0}, {"O2", 21.0, 1.0}}),
               "under `u`");
    expect_why(Range::table({{"gas", "mol%", "u"}, {"N2", 79.0, -1.0}, {"O2", 21.0, 0.1}}), "u");
}

TEST(GasBlocks, MoveTheResultByTheirUncertainties) {
    // A fraction moved by u takes the others along: x1 = (0.79 ± 0.01) / (1 ± 0.01).
    const Range block =
        Range::table({{"gas", "mol%", "u"}, {"N2", 79.0, 1.0}, {"O2", 21.0, Range::blank()}});
    const double u = number(
        call("ENTROPY.GAS", {block, "300 K", "1 bar", "600 K", "5 bar", Range(), "uncertainty"}));
    const double nitrogen = entropy_of("N2"), oxygen = entropy_of("O2");
    const auto of = [&](double x) { return x * nitrogen + (1 - x) * oxygen; };
    EXPECT_NEAR(u, std::abs(of(0.80 / 1.01) - of(0.78 / 0.99)) / 2, 1e-9);
    EXPECT_GT(
        number(call("ENTROPY.GAS", {Range::table({{"N2", "(79 ± 1) mol%"}, {"O2", "21 mol%"}}),
                                    "300 K", "1 bar", "600 K", "5 bar", Range(), "uncertainty"})),
        0);
}

double molar_mass_of_air() { return entropy_of("air") / entropy_of("air", "J/(kg·K)"); }

TEST(ConstantGases, GiveResultsOnTheBasisOfTheirHeatCapacity) {
    const double molar_mass = molar_mass_of_air();
    const double by_hand = 1005 * std::log(2.0) - 8.31446261815324 / molar_mass * std::log(5.0);
    EXPECT_NEAR(entropy_of("air, cp = 1.005 kJ/(kg·K)", "J/(kg·K)"), by_hand, 1e-9);
    const auto plain =
        call("ENTROPY.GAS", {"air, cp = 1.005 kJ/(kg·K)", "300 K", "1 bar", "600 K", "5 bar"});
    EXPECT_NEAR(number(plain), by_hand, 1e-9);
    EXPECT_NEAR(entropy_of("air, cp=1,0050 kJ/(kg·K)", "J/(mol·K)"), by_hand * molar_mass, 1e-9);
    EXPECT_NEAR(entropy_of("N2, cp = 29.1 J/(mol·K)"), entropy_of("29.1 J/(mol·K)"), 1e-12);
    EXPECT_NEAR(number(call("ENTROPY.GAS", {"air, cp = 1.005 kJ/(kg·K)", "300 K", "1 bar", "600 K",
                                            "5 bar", "3 kmol", "J/K"})),
                by_hand * molar_mass * 3000, 1e-6);
    EXPECT_NEAR(number(call("ENTHALPY.GAS", {"0.79 N2 + 0.21 O2, cp = 1 kJ/(kg·K)", "300 K",
                                             "1 bar", "400 K", "5 bar"})),
                1e5, 1e-9);
}

TEST(ConstantGases, StandWhereverAGasDoes) {
    const char* air = "air, cp = 1.005 kJ/(kg·K)";
    const double molar_mass = molar_mass_of_air();
    const std::string cp = std::to_string(1005 * molar_mass) + " J/(mol·K)";
    const auto agree = [&](const char* function, std::vector<Range> rest, double factor) {
        std::vector<Range> named{air}, plain{cp.c_str()};
        named.insert(named.end(), rest.begin(), rest.end());
        plain.insert(plain.end(), rest.begin(), rest.end());
        EXPECT_NEAR(number(call(function, named)), number(call(function, plain)) * factor,
                    1e-5 * std::abs(number(call(function, named))))
            << function;
    };
    const std::vector<Range> states{"300 K", "1 bar", "600 K", "5 bar"};
    agree("ENTROPY.ADIABATIC", states, 1 / molar_mass);
    agree("ENTHALPY.GAS", states, 1 / molar_mass);
    agree("ENTROPY.POLYTROPIC", {1.3, "300 K", "400 K"}, 1 / molar_mass);
    agree("TEMPERATURE.ADIABATIC", {"300 K", "1 bar", "5 bar"}, 1);
    agree("TEMPERATURE.ADIABATIC", {"300 K", "1 bar", "5 bar", 0.8}, 1);
    agree("EFFICIENCY.ISENTROPIC", states, 1);
}

TEST(ConstantGases, CarryTheUncertaintyOfTheirHeatCapacity) {
    const double u =
        number(call("ENTHALPY.GAS", {"air, cp = 1.005 kJ/(kg·K) ± 0.01 kJ/(kg·K)", "300 K", "1 bar",
                                     "400 K", "5 bar", Range(), "uncertainty"}));
    EXPECT_NEAR(u, 1000, 1e-6);
}

TEST(ConstantGases, AreRefusedWithTheirReason) {
    expect_why("air, cp = 5 bar", "molar or specific heat capacity");
    expect_why("air, cp = -1 kJ/(kg·K)", "above 0");
    expect_why("air, cp = 1.005", "molar or specific");
    expect_why("air, cv = 0.718 kJ/(kg·K)", "constant pressure");
    expect_why("air, cp = 1.005 kJ/kg/K", "`1.005 kJ/(kg·K)`");
    expect_why("Xx, cp = 1.005 kJ/(kg·K)", "Xx");
    expect_why("1.005 kJ/(kg·K)", "heat capacity");
}

TEST(PublishedUncertainties, TakePartInAbsoluteEntropies) {
    // CODATA 1989: S°(N2) = 191.609 ± 0.004, S°(Al2O3) = 50.92 ± 0.10, S°(Al) = 28.30 ± 0.10,
    // S°(O2) = 205.152 ± 0.005 J/(mol·K), printed for 95 %.
    EXPECT_DOUBLE_EQ(number(call("ENTROPY.STANDARD", {"Al", "298.15 K", Range(), "uncertainty"})),
                     0.05);
    EXPECT_DOUBLE_EQ(number(call("ENTROPY.STANDARD", {"Al", "1200 K", Range(), "uncertainty"})),
                     0.05);
    EXPECT_NEAR(
        number(call("ENTROPY.REACTION", {"2 Al + 3/2 O2 -> Al2O3", "298.15 K", "uncertainty"})),
        std::sqrt(0.1 * 0.1 + std::pow(1.5 * 0.0025, 2) + 0.05 * 0.05), 1e-12);
    EXPECT_EQ(number(call("ENTROPY.HEATING", {"Al", "298.15 K", "600 K", Range(), "uncertainty"})),
              0);
    EXPECT_EQ(number(call("ENTROPY.STANDARD", {"CH4", "298.15 K", Range(), "uncertainty"})), 0);
    const auto column = call("ENTROPY.STANDARD", {Range::column({"Al", "Xx", "N2"}), "298.15 K",
                                                  Range(), "uncertainty"});
    EXPECT_DOUBLE_EQ(column.numbers[0], 0.05);
    EXPECT_DOUBLE_EQ(column.numbers[2], 0.002);
}

TEST(PublishedUncertainties, CombineWithThoseOfInputs) {
    const double u =
        number(call("ENTROPY.STANDARD", {"Al", "298.15 K ± 2 K", Range(), "uncertainty"}));
    const double cp = number(call("HEAT.CAPACITY", {"Al", "298.15 K"}));
    EXPECT_NEAR(u, std::hypot(0.05, cp / 298.15 * 2), 1e-4);
}

TEST(RealGases, TakeTextsBlocksAndAWordForTheEquation) {
    const Range block = Range::table({{"gas", "mol%"}, {"CH4", 90.0}, {"C2H6", "rest"}});
    const auto departure = [](Range gas, Range equation) {
        return number(call("ENTROPY.DEPARTURE", {gas, "300 K", "60 bar", equation}));
    };
    EXPECT_NEAR(departure(block, Range()), departure("0.9 CH4 + 0.1 C2H6", "peng-robinson"), 1e-12);
    EXPECT_NE(departure(block, "Soave"), departure(block, Range()));
    EXPECT_LT(departure("R134a", Range()), 0);
    EXPECT_LT(departure("0.5 CO2 + 0.5 R134a", Range()), 0);
    const auto reason = [](std::vector<Range> arguments) {
        arguments.resize(4);
        arguments.push_back("why");
        return text(call("ENTROPY.DEPARTURE", arguments));
    };
    EXPECT_NE(reason({"CO2", "300 K", "60 bar", "ideal"}).find("virial"), std::string::npos);
    EXPECT_NE(reason({"CO2", "300 K", "5 bar(g)"}).find("PRESSURE.ABSOLUTE"), std::string::npos);
    EXPECT_NE(reason({"Fe(g)", "3000 K", "1 bar"}).find("critical constants"), std::string::npos);
    EXPECT_NE(reason({"NH3", "400 K", "10 bar"}).find("polar"), std::string::npos);
    const double u = number(call("ENTROPY.REALGAS", {"CO2", "300 K", "1 bar", "350 K ± 1 K",
                                                     "60 bar", "2 kg", Range(), "uncertainty"}));
    EXPECT_GT(u, 0);
    EXPECT_NEAR(
        number(call("ENTROPY.REALGAS", {"CO2", "300 K", "1 bar", "350 K", "60 bar", "1 kg"})),
        number(call("ENTROPY.REALGAS", {"CO2", "300 K", "1 bar", "350 K", "60 bar"})) / 0.044009,
        1e-6);
}

TEST(Streams, HaveExergyInEveryForm) {
    const auto exergy = [](Range what, Range t, Range p, Range t0, Range p0) {
        return number(call("EXERGY.STREAM", {what, t, p, t0, p0}));
    };
    const double thermal = 500 - 290 - 290 * std::log(500.0 / 290);
    EXPECT_NEAR(exergy("4.18 kJ/(kg·K)", "500 K", Range(), "290 K", Range()), 4180 * thermal, 1e-6);
    EXPECT_NEAR(exergy("4 kW/K", "500 K", Range(), "290 K", Range()), 4000 * thermal, 1e-6);
    EXPECT_NEAR(exergy("air, cp = 1 kJ/(kg·K)", "500 K", "1 bar", "290 K", "1 bar"), 1000 * thermal,
                1e-6);
    const double air = exergy("air", "500 K", "7 bar", "290 K", "1 bar");
    EXPECT_NEAR(air,
                number(call("ENTHALPY.GAS", {"air", "290 K", "1 bar", "500 K", "7 bar"})) -
                    290 * number(call("ENTROPY.GAS", {"air", "290 K", "1 bar", "500 K", "7 bar"})),
                1e-9);
    EXPECT_GT(exergy("Al", "1000 K", Range(), "290 K", Range()), 0);
    const Range steel =
        Range::table({{"T / K", "cp / (J/(kg·K))"}, {250.0, 450.0}, {900.0, 450.0}});
    EXPECT_NEAR(exergy(steel, "500 K", Range(), "290 K", Range()), 450 * thermal, 1e-6);
    EXPECT_EQ(text(call("EXERGY.STREAM", {"4 kW/K", "500 K", "2 bar", "290 K", "1 bar"})),
              "#VALUE!");
    EXPECT_EQ(text(call("EXERGY.STREAM", {"air, cp = 1 kJ/(kg·K)", "500 K", Range(), "290 K"})),
              "#VALUE!");
}

} // namespace
