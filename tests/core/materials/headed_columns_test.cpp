// SPDX-License-Identifier: MPL-2.0
#include "core/materials/headed_columns.h"

#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>

namespace {

using namespace core;
using namespace core::materials;

using Columns = std::vector<HeadedColumn>;
const double blank = std::numeric_limits<double>::quiet_NaN();

OwnMaterial read(Columns const& columns) { return read_columns(columns); }

TEST(HeadedColumns, OfAMeasuredTableInAnyUnits) {
    const OwnMaterial si =
        read({{"T / K", {298.15, 373.15, 473.15}}, {"cp / (J/(kg·K))", {418.4, 502.08, 543.92}}});
    EXPECT_EQ(si.basis(), Basis::specific);
    for (auto const& m :
         {read({{"T / °C", {25, 100, 200}}, {"cp / (kJ/(kg K))", {0.4184, 0.50208, 0.54392}}}),
          read({{"T (°F)", {77, 212, 392}}, {"cp in cal_th/(g·K)", {0.1, 0.12, 0.13}}}),
          read({{"cp [J/(g·K)]", {0.4184, 0.50208, 0.54392}}, {"°C", {25, 100, 200}}})}) {
        EXPECT_EQ(m.temperatures()[0], 298.15);
        EXPECT_EQ(m.temperatures()[2], 473.15);
        EXPECT_EQ(m.heat_capacity(400), si.heat_capacity(400));
        EXPECT_EQ(m.heating(300, 450).entropy, si.heating(300, 450).entropy);
    }
    EXPECT_EQ(read({{"T / K", {300, 400}}, {"J/(mol·K)", {25, 26}}}).basis(), Basis::molar);
    EXPECT_EQ(read({{"T / K", {300, 400}}, {"C / (kJ/K)", {25, 26}}}).basis(), Basis::total);
}

TEST(HeadedColumns, LeavesOutRowsThatAreBlankThroughout) {
    const OwnMaterial m =
        read({{"T / K", {300, blank, 400, blank}}, {"J/(mol·K)", {25, blank, 26, blank}}});
    EXPECT_EQ(m.temperatures().size(), 2u);
    expect_refusal(unfit, "a blank cell in row 2", "every row", [] {
        read({{"T / K", {300, 350, 400}}, {"J/(mol·K)", {25, blank, 26}}});
    });
}

// 25 J/(mol K) + 1e-2·T - 2e5·T^-2 below 900 K, in the units people give.
TEST(HeadedColumns, OfACorrelationInAnyUnits) {
    const OwnMaterial si = OwnMaterial::correlated(
        Basis::molar, {{300, 900, {{0, 25}, {1, 1e-2}, {-2, -2e5}}, 9000, 0, "cr"},
                       {900, 1200, {{0, 31}}, 0, 500, "l"}});
    const Columns columns{{"from / K", {300, 900}},
                          {"to / K", {900, 1200}},
                          {"T^0 / (J/(mol·K))", {25, 31}},
                          {"T^1", {1e-2, 0}},
                          {"T^-2", {-2e5, 0}},
                          {"transition / (kJ/mol)", {9, blank}},
                          {"spread / (J/mol)", {blank, 500}},
                          {"phase", {}, {"cr", "l"}}};
    const Columns others{
        {"phase", {}, {"cr", "l"}},          {"T⁻²", {-2e2, 0}},
        {"T^(1) / (J/(mol·K²))", {1e-2, 0}}, {"T^0,0 (kJ/(mol·K))", {0.025, 0.031}},
        {"spread / (kJ/mol)", {0, 0.5}},     {"transition (J/mol)", {9000, 0}},
        {"to / °C", {626.85, 926.85}},       {"from / °C", {26.85, 626.85}}};
    for (auto const& given : {columns, others}) {
        const OwnMaterial m = read(given);
        EXPECT_EQ(m.basis(), Basis::molar);
        EXPECT_NEAR(m.heating(310, 1100).enthalpy, si.heating(310, 1100).enthalpy, 1e-10);
        EXPECT_NEAR(m.heating(310, 1100).entropy, si.heating(310, 1100).entropy, 1e-13);
        EXPECT_EQ(m.transition(900).enthalpy, 9000);
        EXPECT_EQ(m.rows()[1].spread, 500);
        EXPECT_EQ(m.rows()[0].phase, "cr");
    }
}

TEST(HeadedColumns, ReadsExponentsAsRealNumbers) {
    const OwnMaterial m = read({{"from / K", {300}},
                                {"to / K", {900}},
                                {"T^-0.5 / (J/(mol·K))", {400}},
                                {"T^½", {1}},
                                {"T^−1", {100}}});
    ASSERT_EQ(m.rows()[0].terms.size(), 3u);
    EXPECT_EQ(m.rows()[0].terms[0].exponent, -0.5);
    EXPECT_EQ(m.rows()[0].terms[1].exponent, 0.5);
    EXPECT_EQ(m.rows()[0].terms[2].exponent, -1);
    EXPECT_NEAR(m.heat_capacity(400), 20 + 20 + 0.25, 1e-13);
}

TEST(HeadedColumns, RefusesWhatIsNoMaterial) {
    const auto make = [](Columns columns) { return [=] { read(columns); }; };
    const HeadedColumn t{"T / °C", {25, 100}}, cp{"cp / (J/(kg·K))", {450, 460}};
    const HeadedColumn from{"from / K", {300}}, to{"to / K", {900}};
    const HeadedColumn constant{"T^0 / (J/(mol·K))", {25}};
    expect_refusal(unfit, "no column headed `cp", "a measured table", make({t}));
    expect_refusal(unfit, "no column headed `T", "a measured table", make({cp}));
    expect_refusal(unfit, "no column headed", "a measured table", make({}));
    expect_refusal(unfit, "T / °F", "once", make({t, {"T / °F", {25, 100}}, cp}));
    expect_refusal(unfit, "p / bar", "headings of", make({t, cp, {"p / bar", {1, 2}}}));
    expect_refusal(unfit, "T / Δ°C", "not differences", make({{"T / Δ°C", {25, 100}}, cp}));
    expect_refusal(unfit, "with 1 rows", "one length, here 2", make({t, {"J/(kg·K)", {450}}}));
    expect_refusal(unfit, "transition", "one column of temperatures",
                   make({t, cp, {"transition / (J/kg)", {0, 0}}}));
    expect_refusal(unfit, "phase", "texts under `phase`",
                   make({from, to, constant, {"phase", {1}}}));
    expect_refusal(unfit, "from / K", "texts under `phase`",
                   make({{"from / K", {}, {"300"}}, to, constant}));
    expect_refusal(unfit, "no column headed `to", "a correlation", make({from, constant}));
    expect_refusal(unfit, "no column headed `from", "a correlation", make({to, constant}));
    expect_refusal(unfit, "no power of T", "unit", make({from, to, {"T^0", {25}}}));
    expect_refusal(unfit, "no power of T", "unit", make({from, to}));
    expect_refusal(unfit, "T^x", "a number behind", make({from, to, {"T^x", {25}}}));
    expect_refusal(unfit, "T^(1", "closing", make({from, to, {"T^(1", {25}}}));
    expect_refusal(unfit, "T^0", "once", make({from, to, constant, {"T^0.0", {25}}}));
    expect_refusal(unfit, "T^1 / K", "unit of a heat capacity",
                   make({from, to, constant, {"T^1 / K", {25}}}));
    expect_refusal(unfit, "T^0.5 / (J/(mol·K²))", "unit of a heat capacity",
                   make({from, to, constant, {"T^0.5 / (J/(mol·K²))", {25}}}));
    expect_refusal(unfit, "T^1 / (J/(kg·K))", "all molar",
                   make({from, to, constant, {"T^1 / (J/(kg·K))", {25}}}));
    expect_refusal(unfit, "spread / (kJ/kg)", "a molar energy",
                   make({from, to, constant, {"spread / (kJ/kg)", {25}}}));
    expect_refusal(unfit, "from / bar", "temperature", make({{"from / bar", {300}}, to, constant}));
    expect_refusal(unfit, "T / K", "headings of", make({from, to, constant, {"T / K", {1}}}));
    expect_refusal(unfit, "41 columns", "40", make(Columns(41, t)));
    expect_refusal(impossible, "from 300 to 900 K, 0 to 0", "above 0", [&] {
        read({from, to, {"T^0 / (J/(mol·K))", {0}}});
    });
}

TEST(HeadedColumns, TakeUncertaintiesBesideTheirNumbers) {
    const std::vector<HeadedColumn> with{{.heading = "T / K", .numbers = {300, 400}},
                                         {.heading = "cp / (J/(kg·K))", .numbers = {460, 480}},
                                         {.heading = "u", .numbers = {5, 6}}};
    const std::vector<HeadedColumn> without(with.begin(), with.end() - 1);
    EXPECT_EQ(read_columns(with).heating(300, 400).entropy,
              read_columns(without).heating(300, 400).entropy);
    auto wrong = with;
    wrong[2].numbers[1] = -6;
    expect_refusal(unfit, "u = -6", "0 or more", [&] { read_columns(wrong); });
    wrong = {with[2], with[0], with[1]};
    expect_refusal(unfit, "a column headed `u`", "the column before it",
                   [&] { read_columns(wrong); });
    wrong = {with[0], with[1], with[2], with[2]};
    expect_refusal(unfit, "a column headed `u`", "the column before it",
                   [&] { read_columns(wrong); });
}

} // namespace
