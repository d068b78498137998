// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <cmath>

// Functions of substances as a worksheet calls them. The physics is tested in tests/core/substances;
// here it is the amounts, bases, columns, arrays and refusals around it.

namespace {

using registration::Answer;
using tests::call, tests::number, tests::text, tests::Range;

double heating(Range amount, Range show) {
    return number(
        call("ENTROPY.HEATING", {"iron", "25 °C", "1600 °C", std::move(amount), std::move(show)}));
}

TEST(Substances, TakeAmountsInMassAndMoles) {
    const double molar = heating(Range(), Range());
    EXPECT_NEAR(heating("2 mol", Range()), 2 * molar, 1e-12 * molar);
    EXPECT_NEAR(heating("1 kg", Range()), molar / 0.055845,
                1e-9 * molar / 0.055845); // Fe 55.845 g/mol
    EXPECT_NEAR(heating(Range(), "kJ/(kg·K)"), molar / 55.845, 1e-12 * molar);
    EXPECT_NEAR(heating("3 t/h", "kW/K"), molar / 0.055845 * 3000 / 3600 / 1000, 1e-9 * molar);
}

TEST(Substances, ReadNamesAndFormulasAlike) {
    EXPECT_EQ(heating(Range(), Range()),
              number(call("ENTROPY.HEATING", {"Fe", "298.15 K", "1873.15 K"})));
}

TEST(Substances, ColumnsLookAtTheSubstanceOnceOrRowByRow) {
    const Range temperatures = Range::column({"T / K", 500.0, 5000000.0, 1500.0});
    const Answer one = call("HEAT.CAPACITY", {"N2", temperatures});
    ASSERT_EQ(one.rows, 3u);
    EXPECT_EQ(text(one, 1), "#NUM!");
    EXPECT_EQ(one.numbers[2], number(call("HEAT.CAPACITY", {"N2", "1500 K"})));
    const Answer each = call("HEAT.CAPACITY", {Range::column({"N2", "Xx", "iron"}), "500 K"});
    ASSERT_EQ(each.rows, 3u);
    EXPECT_EQ(each.numbers[0], one.numbers[0]);
    EXPECT_EQ(text(each, 1), "#VALUE!");
}

TEST(Substances, ABadOneSpoilsNoNeighbourWhereMolesAndMassesMeet) {
    const Range column = Range::column({"Xx", "Fe", "Al"});
    const auto heated = [&](Range amount, Range show) {
        return call("ENTROPY.HEATING",
                    {column, "25 °C", "600 °C", std::move(amount), std::move(show)});
    };
    for (const Answer& answer : {heated("2 kg", Range()), heated(Range(), "kJ/(kg·K)"),
                                 heated(Range(), "uncertainty in kJ/(kg·K)"),
                                 heated("2 kg", "text"), heated(Range(), "text in kJ/(kg·K)")}) {
        ASSERT_EQ(answer.rows, 3u);
        EXPECT_EQ(text(answer, 0), "#VALUE!");
        EXPECT_FALSE(text(answer, 1).starts_with("#")) << text(answer, 1);
        EXPECT_FALSE(text(answer, 2).starts_with("#")) << text(answer, 2);
    }
    for (const char* view : {"steps", "why", "source"}) {
        const Answer answer = heated("2 kg", view);
        ASSERT_EQ(answer.rows, 3u) << view;
        EXPECT_FALSE(text(answer, 2).starts_with("#")) << view;
    }
}

TEST(Substances, ABlankRowStaysBlankOnAnotherBasis) {
    const Answer answer =
        call("HEAT.CAPACITY", {Range::column({"Fe", Range::blank(), "Al"}),
                               Range::column({"500 K", Range::blank(), "500 K"}), "kJ/(kg·K)"});
    ASSERT_EQ(answer.rows, 3u);
    EXPECT_EQ(text(answer, 1), "");
    EXPECT_GT(answer.numbers[2], 0.9);
}

TEST(Substances, StepsListTheStretches) {
    const std::string steps =
        text(call("ENTROPY.HEATING", {"Al", "25 °C", "720 °C", Range(), "steps"}));
    for (const char* piece : {"cr", "933.61 K", "10699.99", "l"})
        EXPECT_NE(steps.find(piece), std::string::npos) << steps;
}

TEST(Substances, SourceNamesReportAndYear) {
    EXPECT_NE(text(call("ENTROPY.STANDARD", {"Al2O3", "25 °C", Range(), "source"}))
                  .find("NASA/TP-2002-211556"),
              std::string::npos);
}

TEST(Substances, RefuseSteamAndTheUnknown) {
    EXPECT_EQ(text(call("ENTROPY.STANDARD", {"steam", "400 K"})), "#VALUE!");
    const std::string why = text(call("ENTROPY.STANDARD", {"Alumnia", "400 K", Range(), "why"}));
    EXPECT_NE(why.find("alumina"), std::string::npos) << why;
}

TEST(Substances, RefuseWhatLiesOutsideTheData) {
    EXPECT_EQ(text(call("ENTROPY.HEATING", {"N2", "100 K", "400 K"})), "#NUM!");
    EXPECT_NE(text(call("ENTROPY.HEATING", {"N2", "100 K", "400 K", Range(), "why"})).find("200"),
              std::string::npos);
}

TEST(Substances, KeepEnthalpyFormsBesideThem) {
    EXPECT_NEAR(number(call("ENTROPY.FUSION", {"Al"})), 11.4609,
                5e-5); // NASA/TP-2002-211556: 10 700 J/mol at 933.61 K
    EXPECT_NEAR(number(call("ENTROPY.FUSION", {"Al", Range(), "1 kg"})), 11.4609 / 0.026982, 2e-3);
    EXPECT_DOUBLE_EQ(number(call("ENTROPY.FUSION", {"10.7 kJ/mol", "933.61 K"})), 10700 / 933.61);
    EXPECT_EQ(text(call("ENTROPY.FUSION", {"Al", "933.61 K"})), "#VALUE!");
}

TEST(Gases, OfTheTablesStandWhereAHeatCapacityStands) {
    const double air =
        number(call("ENTROPY.GAS", {"0.79 N2 + 0.21 O2", "300 K", "1 bar", "600 K", "5 bar"}));
    const double constant =
        number(call("ENTROPY.GAS", {"29.7 J/(mol·K)", "300 K", "1 bar", "600 K", "5 bar"}));
    EXPECT_NEAR(air, constant,
                0.15); // mean cp of air between 300 K and 600 K is near 29.7 J/(mol·K)
    EXPECT_NEAR(number(call("ENTROPY.GAS", {"N2", "300 K", "1 bar", "300 K", "2 bar", "1 kg"})),
                -8.31446261815324 * std::log(2) / 0.028014, 1e-6);
    EXPECT_EQ(text(call("ENTROPY.GAS", {"0.79 N2 + 0.2 O2", "300 K", "1 bar", "600 K", "5 bar"})),
              "#VALUE!");
}

TEST(Gases, RemarkWhatIsNoGasInTheOpen) {
    const auto why = [](const char* gas) {
        return text(call("ENTROPY.GAS", {gas, "300 K", "1 bar", "600 K", "5 bar", Range(), "why"}));
    };
    EXPECT_EQ(why("0.79 N2 + 0.21 O2"), "ok");
    EXPECT_EQ(why("H2O(g)"), "ok");
    EXPECT_NE(why("Fe").find("condensed"), std::string::npos);
    EXPECT_NE(why("methanol").find("condensed"), std::string::npos);
}

TEST(Gases, EndWhereTheirEfficiencySays) {
    const Range end = Range(
        text(call("TEMPERATURE.ADIABATIC", {"air", "20 °C", "1 bar", "7 bar", 0.8, "quantity"}))
            .c_str());
    EXPECT_NEAR(number(call("EFFICIENCY.ISENTROPIC", {"air", "20 °C", "1 bar", end, "7 bar"})), 0.8,
                1e-12);
}

TEST(HeatedBodies, EndOnAPlateauWithAShare) {
    const double to_melting = number(call("ENTHALPY.HEATING", {"Al", "25 °C", "933.61 K"}));
    const Range heat = Range::row({to_melting + 0.25 * 10700, "J/mol"});
    EXPECT_EQ(number(call("TEMPERATURE.HEATED", {"Al", "25 °C", heat})), 933.61);
    EXPECT_NEAR(number(call("FRACTION.PHASE", {"Al", "25 °C", heat, Range(), "l"})), 0.25,
                1e-6); // 10 700 J/mol is printed, 10 699.9998 computed
    EXPECT_NEAR(number(call("FRACTION.PHASE", {"Al", "25 °C", heat, Range(), "cr"})), 0.75, 1e-6);
    EXPECT_EQ(text(call("FRACTION.PHASE", {"Al", "25 °C", heat, Range(), "cr, δ"})), "#VALUE!");
}

TEST(HeatedBodies, TakeHeatPerMassAndOfTheWhole) {
    const double molar = number(call("TEMPERATURE.HEATED", {"Fe", "25 °C", "20 kJ/mol"}));
    EXPECT_NEAR(number(call("TEMPERATURE.HEATED", {"Fe", "25 °C", "40 kJ", "2 mol"})), molar, 1e-9);
    EXPECT_NEAR(number(call("TEMPERATURE.HEATED",
                            {"Fe", "25 °C", Range::row({20000 / 0.055845, "J"}), "1 kg"})),
                molar, 1e-9);
    EXPECT_NEAR(
        number(call("TEMPERATURE.HEATED", {"Fe", "25 °C", Range::row({20000 / 0.055845, "J/kg"})})),
        molar, 1e-9);
    EXPECT_EQ(text(call("TEMPERATURE.HEATED", {"Fe", "25 °C", "40 kJ"})), "#VALUE!");
    EXPECT_EQ(text(call("TEMPERATURE.HEATED", {"Fe", "25 °C", "40 kJ/mol", "2 mol"})), "#VALUE!");
}

TEST(HeatedBodies, ComeToOneTemperature) {
    const Range materials = Range::column({"Fe", "4.18 kJ/(kg·K)"});
    const Range masses = Range::column({"kg", 5.0, 40.0}),
                start = Range::column({"°C", 850.0, 20.0});
    const double end = number(call("TEMPERATURE.EQUALIZED", {materials, masses, start}));
    EXPECT_GT(end, 293.15);
    EXPECT_LT(end, 373.15);
    const double given_off =
        -number(call("ENTHALPY.HEATING", {"Fe", "850 °C", Range::row({end, "K"}), "5 kg"}));
    EXPECT_NEAR(given_off, 40 * 4180 * (end - 293.15), 1e-6 * given_off);
    const double change =
        number(call("ENTROPY.HEATING", {"Fe", "850 °C", Range::row({end, "K"}), "5 kg"})) +
        40 * 4180 * std::log(end / 293.15);
    EXPECT_NEAR(number(call("ENTROPY.EQUALIZING", {materials, masses, start})), change,
                1e-9 * change);
    EXPECT_EQ(
        text(call("TEMPERATURE.EQUALIZED", {materials, Range::column({"mol", 5.0, 40.0}), start})),
        "#VALUE!");
}

TEST(Reactions, RefuseWhatIsNotBalanced) {
    const std::string why = text(call("ENTROPY.REACTION", {"Al + O2 -> Al2O3", "298.15 K", "why"}));
    EXPECT_NE(why.find("Al"), std::string::npos) << why;
    EXPECT_EQ(text(call("ENTROPY.REACTION", {"Al + O2 -> Al2O3", "298.15 K"})), "#VALUE!");
}

TEST(Reactions, TakeActivitiesInOrder) {
    const double standard = number(call("GIBBS.REACTION", {"CO + 1/2 O2 -> CO2", "1000 K"}));
    const Range activities = Range::column({"0.2 bar", Range::blank(), "0.1 bar"});
    const double rt = 8.31446261815324 * 1000;
    EXPECT_NEAR(number(call("GIBBS.REACTION", {"CO + 1/2 O2 -> CO2", "1000 K", activities})),
                standard + rt * (std::log(0.1) - std::log(0.2)), 1e-6);
    EXPECT_EQ(text(call("GIBBS.REACTION",
                        {"CO + 1/2 O2 -> CO2", "1000 K", Range::column({"0.2 bar", "0.1 bar"})})),
              "#VALUE!");
    EXPECT_EQ(text(call("GIBBS.REACTION", {"CO + 1/2 O2 -> CO2", "1000 K",
                                           Range::column({0.2, "1 bar", "0.1 bar"})})),
              "#VALUE!");
}

TEST(Arrays, ListTheTables) {
    const Answer all = call("SUBSTANCE.LIST", {});
    EXPECT_EQ(all.columns, 5u);
    EXPECT_GT(all.rows, 300u);
    const Answer some = call("SUBSTANCE.LIST", {"Al2O3"});
    EXPECT_GT(some.rows, 1u);
    EXPECT_LT(some.rows, 10u);
    EXPECT_EQ(some.texts[0], "formula");
    EXPECT_GT(call("SUBSTANCE.LIST", {"quartz"}).rows, 1u) << "a name of one phase";
    EXPECT_EQ(call("SUBSTANCE.LIST", {"no such thing"}).rows, 1u);
}

TEST(Arrays, ShowThePhasesOfIron) {
    const Answer phases = call("SUBSTANCE.PHASES", {"iron"});
    ASSERT_EQ(phases.columns, 6u);
    bool melts = false;
    for (std::size_t row = 1; row < phases.rows; ++row)
        if (phases.texts[row * 6] == "l") {
            melts = true;
            EXPECT_NEAR(phases.numbers[row * 6 + 1], 1809, 1e-9);
        }
    EXPECT_TRUE(melts);
}

TEST(Arrays, CurveHasUprightSteps) {
    const Answer curve = call("CURVE.HEATING", {"Al", "800 K", "1000 K", 5.0});
    ASSERT_EQ(curve.columns, 4u);
    ASSERT_EQ(curve.rows, 1u + 5u + 2u);
    std::size_t at = 1;
    while (curve.numbers[at * 4] != 933.61) ++at;
    EXPECT_EQ(curve.numbers[(at + 1) * 4], 933.61);
    EXPECT_NEAR(curve.numbers[(at + 1) * 4 + 2] - curve.numbers[at * 4 + 2], 10700, 1);
    EXPECT_EQ(curve.numbers[(curve.rows - 1) * 4 + 3],
              number(call("ENTROPY.HEATING", {"Al", "800 K", "1000 K"})));
    const Range units =
        Range::row({"T / °C", "cp / (kJ/(kg·K))", "h / (kJ/kg)", "s / (kJ/(kg·K))"});
    const Answer per_mass = call("CURVE.HEATING", {"Al", "800 K", "1000 K", 5.0, units});
    EXPECT_EQ(per_mass.texts[0], "T / °C");
    EXPECT_NEAR(per_mass.numbers[4], 526.85, 1e-9);
    EXPECT_NEAR(per_mass.numbers[4 * 7 + 2], curve.numbers[4 * 7 + 2] / 26.982, 1e-6);
    EXPECT_EQ(text(call("CURVE.HEATING", {"Al", "800 K", "1000 K", 1.0})), "#NUM!");
}

TEST(Substances, NameReportAndPageOfTheirFigures) {
    const auto source = [](const char* function, std::vector<Range> arguments) {
        arguments.push_back("source");
        return text(call(function, arguments));
    };
    const auto expect = [](std::string const& whole, std::string_view part) {
        EXPECT_NE(whole.find(part), std::string::npos) << whole;
    };
    const std::string iron = source("ENTROPY.HEATING", {"Fe", "300 K", "1900 K", Range()});
    expect(iron, "Fe, cr, γ: NASA/TP-2002-211556, App. D, p. ");
    expect(iron, "Fe, l: NASA/TP-2002-211556, App. D, p. ");
    expect(source("HEAT.CAPACITY", {"ZnO", "300 K"}), "ZnO, cr: USGS Bulletin 2131");
    expect(source("ENTROPY.REACTION", {"CO + 1/2 O2 -> CO2", "300 K"}), "O2, g: NASA");
    expect(source("ENTROPY.DEPARTURE", {"CO2", "300 K", "1 bar", Range()}), "Span");
    expect(text(call("ENTROPY.STANDARD", {"Al", "300 K", Range(), "steps"})), "CODATA");
}

} // namespace
