// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <cmath>

// Own materials as a worksheet gives them: a block, or the text that MATERIAL.OF makes of it. The
// curves are tested in tests/core/materials; constant and linear heat capacities are exact there.

namespace {

using tests::call, tests::number, tests::text, tests::Range;

/// cp = 400 + 0.5 · (T - 300 K) J/(kg·K), in the units people use.
Range table() {
    return Range::table(
        {{"T / °C", "cp / (kJ/(kg·K))"}, {26.85, 0.4}, {126.85, 0.45}, {226.85, 0.5}});
}
Range with_melting() {
    return Range::table(
        {{"from / K", "to / K", "T^0 / (J/(kg·K))", "transition / (kJ/kg)", "phase"},
         {300.0, 800.0, 900.0, 390.0, "cr"},
         {800.0, 1200.0, 1100.0, Range::blank(), "l"}});
}
Range with_spread() {
    return Range::table({{"from / K", "to / K", "T^0 / (J/(kg·K))", "spread / (kJ/kg)"},
                         {300.0, 800.0, 900.0, Range::blank()},
                         {800.0, 850.0, 1000.0, 380.0},
                         {850.0, 1200.0, 1100.0, Range::blank()}});
}

void expect_why(const char* function, std::vector<Range> const& arguments, std::string_view part) {
    const std::string reason = text(call(function, arguments));
    EXPECT_NE(reason.find(part), std::string::npos) << reason;
}

TEST(OwnMaterials, ByATableInAnyUnits) {
    EXPECT_NEAR(number(call("ENTHALPY.HEATING", {table(), "300 K", "500 K"})),
                400 * 200 + 0.25 * 200 * 200, 1e-6);
    // ∫(250 + T/2)/T dT = 250 ln(T2/T1) + (T2 - T1)/2
    EXPECT_NEAR(number(call("ENTROPY.HEATING", {table(), "300 K", "500 K"})),
                250 * std::log(500.0 / 300) + 100, 1e-9);
    EXPECT_NEAR(number(call("HEAT.CAPACITY", {table(), "127 °C", "kJ/(kg·K)"})), 0.450075, 1e-12);
}

TEST(OwnMaterials, TakeAmountsOnTheirBasis) {
    EXPECT_NEAR(number(call("ENTHALPY.HEATING", {table(), "300 K", "500 K", "2 t", "MJ"})), 180,
                1e-9);
    EXPECT_EQ(text(call("ENTHALPY.HEATING", {table(), "300 K", "500 K", "2 mol"})), "#VALUE!");
}

TEST(OwnMaterials, TakeAmountsOnTheOtherBasisByTheirMolarMass) {
    const std::string one_cell = text(call("MATERIAL.OF", {table(), "a", "50 g/mol"}));
    EXPECT_NEAR(
        number(call("ENTHALPY.HEATING", {one_cell.c_str(), "300 K", "500 K", "40 mol", "kJ"})), 180,
        1e-9);
    EXPECT_NEAR(number(call("HEAT.CAPACITY", {one_cell.c_str(), "300 K", "J/(mol·K)"})), 20, 1e-9);
}

TEST(OwnMaterials, PassTransitionsAndSpreads) {
    EXPECT_NEAR(number(call("ENTROPY.HEATING", {with_melting(), "300 K", "1000 K"})),
                900 * std::log(800.0 / 300) + 390e3 / 800 + 1100 * std::log(1000.0 / 800), 1e-9);
    EXPECT_NEAR(number(call("ENTHALPY.HEATING", {with_spread(), "300 K", "1000 K"})),
                900 * 500 + 1000 * 50 + 380e3 + 1100 * 150, 1e-6);
    const std::string steps =
        text(call("ENTROPY.HEATING", {with_melting(), "300 K", "1000 K", Range(), "steps"}));
    EXPECT_NE(steps.find("800"), std::string::npos) << steps;
    EXPECT_EQ(text(call("HEAT.CAPACITY", {with_spread(), "820 K", "why"})).substr(0, 2), "ok");
}

TEST(OwnMaterials, AsOneCellGiveTheSameBits) {
    for (const Range& block : {table(), with_melting(), with_spread()}) {
        const Range cell(text(call("MATERIAL.OF", {block, "plate 7"})).c_str());
        EXPECT_EQ(number(call("ENTROPY.HEATING", {cell, "310 K", "490 K"})),
                  number(call("ENTROPY.HEATING", {block, "310 K", "490 K"})));
    }
}

TEST(OwnMaterials, EndWhereTheirHeatSays) {
    EXPECT_EQ(number(call("TEMPERATURE.HEATED", {with_melting(), "300 K", "500 kJ/kg"})), 800);
    EXPECT_NEAR(number(call("TEMPERATURE.HEATED", {with_melting(), "300 K", "9 MJ", "20 kg"})), 800,
                1e-9);
    // 400 · ΔT + ΔT² / 4 = 40 kJ/kg
    EXPECT_NEAR(number(call("TEMPERATURE.HEATED", {table(), "300 K", "40 kJ/kg"})),
                300 + (std::sqrt(200e3) - 400) * 2, 1e-9);
    EXPECT_EQ(text(call("TEMPERATURE.HEATED", {table(), "300 K", "100 kJ/kg"})), "#NUM!");
}

TEST(OwnMaterials, MeetSubstancesInAQuench) {
    const Range cell(text(call("MATERIAL.OF", {table()})).c_str());
    std::vector<Range> materials{Range(text(call("MATERIAL.OF", {table()})).c_str()),
                                 "4.18 kJ/(kg·K)"};
    const double end = number(
        call("TEMPERATURE.EQUALIZED", {Range::column(materials), Range::column({"kg", 5.0, 10.0}),
                                       Range::column({"K", 490.0, 310.0})}));
    const double given_off =
        -number(call("ENTHALPY.HEATING", {cell, "490 K", Range::row({end, "K"}), "5 kg"}));
    EXPECT_NEAR(given_off, 41800 * (end - 310), 1e-6 * given_off);
}

TEST(OwnMaterials, AreRefusedWithTheirReason) {
    const auto why = [](Range block, const char* from, const char* to) {
        return text(call("ENTROPY.HEATING", {std::move(block), from, to, Range(), "why"}));
    };
    EXPECT_EQ(text(call("ENTROPY.HEATING", {table(), "300 K", "600 K"})), "#NUM!");
    EXPECT_NE(why(table(), "300 K", "600 K").find("500 K"), std::string::npos)
        << why(table(), "300 K", "600 K");
    const Range falling =
        Range::table({{"T / K", "cp / (J/(kg·K))"}, {400.0, 400.0}, {300.0, 500.0}});
    EXPECT_EQ(text(call("ENTROPY.HEATING", {falling, "300 K", "400 K"})), "#VALUE!");
    EXPECT_NE(why(falling, "300 K", "400 K").find("substance"), std::string::npos)
        << why(falling, "300 K", "400 K");
    const Range negative =
        Range::table({{"T / K", "cp / (J/(kg·K))"}, {300.0, 400.0}, {400.0, -500.0}});
    EXPECT_EQ(text(call("ENTROPY.HEATING", {negative, "300 K", "400 K"})), "#NUM!");
    const Range words =
        Range::table({{"T / K", "cp / (J/(kg·K))"}, {300.0, 400.0}, {400.0, "about 500"}});
    EXPECT_EQ(text(call("ENTROPY.HEATING", {words, "300 K", "400 K"})), "#VALUE!");
    EXPECT_EQ(text(call("ENTROPY.HEATING", {"material | nonsense", "300 K", "400 K"})), "#VALUE!");
}

TEST(OwnMaterials, MoveTheResultByTheUncertaintiesBesideTheirNumbers) {
    // ∫cp dT of two rows is (T2 - T1)·(cp1 + cp2)/2, so that each row moves it by half.
    const Range block = Range::table(
        {{"T / K", "cp / (J/(kg·K))", "u"}, {300.0, 400.0, 8.0}, {400.0, 440.0, "2 %"}});
    EXPECT_NEAR(number(call("ENTHALPY.HEATING", {block, "300 K", "400 K", Range(), "uncertainty"})),
                100 * std::hypot(4, 4.4), 1e-6);
    const std::string one_cell = text(call("MATERIAL.OF", {block, "steel"}));
    EXPECT_NE(one_cell.find("| u: 8 8.8"), std::string::npos) << one_cell;
    EXPECT_NEAR(number(call("ENTHALPY.HEATING",
                            {one_cell.c_str(), "300 K", "400 K", Range(), "uncertainty"})),
                100 * std::hypot(4, 4.4), 1e-6);
    // Q = 42 kJ/kg heats from 300 K to 400 K; dT = dQ / cp2.
    EXPECT_NEAR(
        number(call("TEMPERATURE.HEATED", {block, "300 K", "41 kJ/kg", Range(), "uncertainty"})),
        100 * std::hypot(4, 4.4) / 440, 0.05);
    expect_why("ENTHALPY.HEATING",
               {Range::table(
                    {{"T / K", "cp / (J/(kg·K))", "u"}, {300.0, 400.0, -8.0}, {400.0, 440.0, 1.0}}),
                "300 K", "400 K", Range(), "why"},
               "0 or more");
}

TEST(OwnMaterials, AndConstantsInBodiesMoveTheEndByTheirUncertainties) {
    // T = (c1 T1 + c2 T2) / (c1 + c2); dT/dc1 = (T1 - T) / (c1 + c2).
    const double u = number(
        call("TEMPERATURE.EQUALIZED",
             {Range::column({"1 kJ/(kg·K) ± 0.01 kJ/(kg·K)", "1 kJ/(kg·K)"}),
              Range::column({"kg", 1.0, 1.0}), Range::column({"K", 400.0, 300.0}), "uncertainty"}));
    EXPECT_NEAR(u, 0.01 * 50 / 2, 1e-4);
    const char* steel = "material \"a\" | T / K: 250 500 | cp / (J/(kg·K)): 1000 1000 | u: 10 0";
    EXPECT_GT(number(call("ENTROPY.EQUALIZING",
                          {Range::column({steel, "1 kJ/(kg·K)"}), Range::column({"kg", 1.0, 1.0}),
                           Range::column({"K", 400.0, 300.0}), "uncertainty"})),
              0);
}

TEST(OwnMaterials, AreDrawnAsCurvesAndMelt) {
    const auto curve = call("CURVE.HEATING", {with_melting(), "300 K", "1000 K", 3.0});
    EXPECT_EQ(curve.rows, 1u + 3 + 2);
    EXPECT_EQ(curve.columns, 4u);
    const auto in_kilojoules =
        call("CURVE.HEATING",
             {with_melting(), "300 K", "1000 K", 3.0,
              Range::row({"T / °C", "cp / (kJ/(kg·K))", "h / (kJ/kg)", "s / (kJ/(kg·K))"})});
    EXPECT_EQ(in_kilojoules.rows, 6u);
    expect_why("FRACTION.PHASE", {with_melting(), "300 K", "500 kJ/kg", Range(), "ice", "why"},
               "ice");
    // 450 kJ/kg to 800 K, then 195 of 390 kJ/kg
    EXPECT_NEAR(
        number(call("FRACTION.PHASE", {with_melting(), "300 K", "645 kJ/kg", Range(), "l"})), 0.5,
        1e-12);
    EXPECT_NEAR(number(call("FRACTION.PHASE", {with_melting(), "300 K", "1290 kJ", "2 kg", "l"})),
                0.5, 1e-12);
}

TEST(OwnMaterials, ThatCannotBeReadTellTheirOwnReasonFirst) {
    expect_why(
        "ENTHALPY.HEATING",
        {Range::table(
             {{"T / °C", "cp / (J/(kg·K))", "u"}, {20.0, 460.0, 5.0}, {500.0, 640.0, "8 J"}}),
         "20 °C", "500 °C", "3 kg", "why"},
        "8 J");
}

} // namespace
