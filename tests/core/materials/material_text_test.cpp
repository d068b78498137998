// SPDX-License-Identifier: MPL-2.0
#include "core/materials/material_text.h"

#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <limits>

namespace {

using namespace core;
using namespace core::materials;
using random_states::between;

TEST(MaterialText, IsReadableByPeople) {
    EXPECT_EQ(write_material({"steel A",
                              {{.heading = "T / °C", .numbers = {300, 400, 500.5}},
                               {.heading = "cp / (kJ/(kg·K))", .numbers = {460, 480, 0.1}}}}),
              "material \"steel A\" | T / °C: 300 400 500.5 | cp / (kJ/(kg·K)): 460 480 0.1");
    constexpr double blank = std::numeric_limits<double>::quiet_NaN();
    EXPECT_EQ(
        write_material({"",
                        {{.heading = "molar mass / (kg/mol)", .numbers = {0.02698}},
                         {.heading = "from / K", .numbers = {300, blank, 900, 950}},
                         {.heading = "to / K", .numbers = {900, blank, 950, 1e4}},
                         {.heading = "T^0 / (J/(mol·K))", .numbers = {25, blank, 30, 31}},
                         {.heading = "u", .numbers = {0.5, blank, blank, 1}},
                         {.heading = "T^-0.5", .numbers = {1e-10, blank, 0, 0}},
                         {.heading = "transition / (J/mol)", .numbers = {9000, blank, blank, 0}},
                         {.heading = "phase", .words = {"cr, α", "", "", "l"}}}}),
        "material | molar mass / (kg/mol): 0.02698 | from / K: 300 900 950 | to / K: 900 950 10000 "
        "| T^0 / (J/(mol·K)): 25 30 31 | u: 0.5 0 1 | T^-0.5: 1e-10 0 0 | transition / (J/mol): "
        "9000 0 0 | phase: \"cr, α\" \"\" \"l\"");
}

TEST(MaterialText, IsReadInTheUnitsItStates) {
    const OwnMaterial m =
        read_material("material\"x\"|cp / (kJ/(kg·K)):0.46  0.48|T / °C: -1e2 25   "
                      "|  molar mass / (g/mol): 55.845");
    EXPECT_EQ(m.name(), "x");
}

bool same(Description const& a, Description const& b) {
    return a.name == b.name &&
           std::ranges::equal(a.columns, b.columns, [](auto const& x, auto const& y) {
               return x.heading == y.heading && x.numbers == y.numbers && x.words == y.words;
           });
}

std::string_view any_heat_capacity_unit() {
    return *rc::gen::elementOf(
        std::vector<std::string_view>{"(J/(mol·K))", "(J/(kg·K))", "J/K", "(cal_th/(g·K))"});
}

RC_GTEST_PROP(MaterialText, OfATableReadsBackToTheSameBits, ()) {
    std::vector<double> t{between(1, 500)}, cp{between(1e-3, 1e6)};
    for (int rows = *rc::gen::inRange(1, 50); rows > 0; --rows) {
        const bool jump =
            t.size() > 1 && rows > 1 && t[t.size() - 2] != t.back() && *rc::gen::inRange(0, 4) == 0;
        t.push_back(jump ? t.back() : t.back() + between(1e-3, 300));
        cp.push_back(between(1e-3, 1e6));
    }
    const std::string heading = "cp / " + std::string(any_heat_capacity_unit());
    Description d{"", {{.heading = "T / K", .numbers = t}, {.heading = heading, .numbers = cp}}};
    if (*rc::gen::arbitrary<bool>()) d.name = "Gußstück | № 7: a";
    if (*rc::gen::arbitrary<bool>()) d.columns.push_back({.heading = "u", .numbers = cp});
    if (*rc::gen::arbitrary<bool>())
        d.columns.push_back({.heading = "molar mass / (kg/mol)", .numbers = {between(1e-3, 1)}});
    const std::string text = write_material(d);
    RC_ASSERT(same(read_description(text), d));
    const OwnMaterial m = made_of(d), again = read_material(text);
    RC_ASSERT(again.heating(m.from(), m.to()).entropy == m.heating(m.from(), m.to()).entropy);
}

RC_GTEST_PROP(MaterialText, OfACorrelationReadsBackToTheSameBits, ()) {
    const std::vector<std::string> exponents{"0", "1", "-2", "-0.5", "0.37", "-1e-7"};
    const auto count = static_cast<std::size_t>(*rc::gen::inRange(1, 6));
    std::vector<double> from{between(10, 500)}, to, latent, spread;
    std::vector<std::string_view> phases;
    for (std::size_t row = 0; row < count; ++row) {
        to.push_back(from.back() * (1 + between(1e-2, 2)));
        if (row + 1 < count) from.push_back(to.back());
        latent.push_back(row + 1 < count ? between(1e-3, 1e6) : 0);
        spread.push_back(between(1e-3, 1e6));
        phases.push_back(*rc::gen::elementOf(std::vector<std::string_view>{"", "cr, α", "l"}));
    }
    std::vector<std::string> headings;
    for (auto const& n : exponents) headings.push_back("T^" + n + " / (J/(mol·K))");
    Description d{"",
                  {{.heading = "from / K", .numbers = from},
                   {.heading = "to / K", .numbers = to},
                   {.heading = "transition / (J/mol)", .numbers = latent},
                   {.heading = "spread / (J/mol)", .numbers = spread},
                   {.heading = "phase", .words = phases}}};
    for (auto const& heading : headings) {
        std::vector<double> a;
        for (std::size_t row = 0; row < count; ++row) a.push_back(between(1e-12, 1e3));
        d.columns.push_back({.heading = heading, .numbers = a});
    }
    const std::string text = write_material(d);
    RC_ASSERT(same(read_description(text), d));
    const OwnMaterial m = made_of(d), again = read_material(text);
    RC_ASSERT(again.heating(m.from(), m.to()).entropy == m.heating(m.from(), m.to()).entropy);
}

TEST(MaterialText, IsKnownByItsLeadingWord) {
    EXPECT_TRUE(is_material_text("material | T / K: 1"));
    EXPECT_TRUE(is_material_text("material"));
    EXPECT_FALSE(is_material_text("materials"));
    EXPECT_FALSE(is_material_text("Fe"));
    EXPECT_FALSE(is_material_text(""));
}

TEST(MaterialText, IsRefusedWithItsReasonWhereItIsMalformed) {
    const auto reading = [](std::string text) { return [=] { read_material(text); }; };
    expect_refusal(unfit, "Fe", "begins with `material`", reading("Fe"));
    expect_refusal(unfit, "", "a measured table", reading("material"));
    expect_refusal(unfit, "\"steel", "closes", reading("material \"steel"));
    expect_refusal(unfit, "T / K: 300", "`|` before", reading("material T / K: 300"));
    expect_refusal(unfit, "x", "`|` before", reading("material \"steel\" x"));
    expect_refusal(unfit, "T / K", "a heading with `:`", reading("material | T / K"));
    expect_refusal(unfit, "T / K 300", "a heading with `:`",
                   reading("material | T / K 300 | cp / (J/K): 2"));
    expect_refusal(unfit, "the end of the text", "a heading with `:`", reading("material |"));
    for (const char* number : {"3oo", "1,5", "300K", "nan", "inf", "1e999", "--3", "+3", "0x10"})
        expect_refusal(unfit, number, "a number with a decimal point",
                       reading("material | T / K: 300 " + std::string(number)));
    expect_refusal(unfit, "with 2 rows", "one length",
                   reading("material | T / K: 300 400 500 | cp / (J/K): 2 3"));
    expect_refusal(unfit, "then 300 K in row 2", "rise",
                   reading("material | T / K: 400 300 | cp / (J/K): 2 3"));
    expect_refusal(impossible, "-3", "above 0",
                   reading("material | T / K: 300 400 | cp / (J/K): 2 -3"));
    expect_refusal(unfit, "molar mass", "one molar mass",
                   reading("material | molar mass / (kg/mol): 1 2 | T / K: 3 4 | cp / (J/K): 2 3"));
    expect_refusal(
        unfit, "molar mass", "one molar mass",
        reading("material | molar mass / (kg/mol): \"a\" | T / K: 3 4 | cp / (J/K): 2 3"));
    expect_refusal(unfit, "", "32000 bytes",
                   reading("material | T / K:" + std::string(32'000, ' ')));
}

TEST(MaterialText, IsNotWrittenLongerThanItCanBeRead) {
    std::vector<double> t, cp;
    for (int i = 0; i < 3000; ++i) {
        t.push_back(300 + i / 3.0);
        cp.push_back(25);
    }
    expect_refusal(unfit, "a text of", "32000 bytes", [&] {
        write_material(
            {"", {{.heading = "T / K", .numbers = t}, {.heading = "cp / (J/K)", .numbers = cp}}});
    });
}

TEST(MaterialText, IsNotWrittenWithWhatWouldEndATextInside) {
    expect_refusal(unfit, "T: K", "a text without any of", [] {
        write_material({"", {{.heading = "T: K", .numbers = {1.0}}}});
    });
    expect_refusal(unfit, "cr\"", "a text without any of", [] {
        write_material({"", {{.heading = "phase", .words = {"cr\""}}}});
    });
}

/// Any bytes, or pieces of the language in any order.
std::string any_text() {
    static const std::vector<std::string> pieces{" | T / K: 300 400 500",
                                                 " | cp / (J/(kg·K)): 1 2 3",
                                                 " | from / K: 300 400",
                                                 " | to / K: 400 500",
                                                 " | T^0 / (J/(mol·K)): 20 30",
                                                 " | T^-0.5: 1 2",
                                                 " | T⁻²: 0 1",
                                                 " | T^(",
                                                 " | T^1e5: 2 3",
                                                 " | transition / (J/mol): 1000 0",
                                                 " | spread / (J/mol): 0 5",
                                                 " | phase: \"cr\" \"l\"",
                                                 " | molar mass / (g/mol): 3",
                                                 " \"a name\"",
                                                 "|",
                                                 ":",
                                                 "\"",
                                                 " ",
                                                 "1e308",
                                                 "-1",
                                                 "0",
                                                 "nan",
                                                 "\xff",
                                                 "T / °C",
                                                 "½"};
    std::string text = "material";
    for (auto const& piece :
         *rc::gen::container<std::vector<std::string>>(rc::gen::elementOf(pieces)))
        text += piece;
    if (*rc::gen::inRange(0, 3) == 0) {
        auto const bytes = *rc::gen::arbitrary<std::vector<char>>();
        text.append(bytes.begin(), bytes.end());
    }
    return text;
}

RC_GTEST_PROP(MaterialText, OfAnyKindIsReadOrRefused, ()) {
    const std::string text = any_text();
    RC_LOG() << text << '\n';
    try {
        const OwnMaterial m = read_material(text);
        const Change change = m.heating(m.from(), m.to());
        RC_ASSERT(std::isfinite(change.enthalpy) && std::isfinite(change.entropy));
        const Description d = read_description(text);
        RC_ASSERT(same(read_description(write_material(d)), d));
    } catch (Failure const& failure) {
        RC_ASSERT(!failure.needed.empty());
        RC_ASSERT(!failure.repair.empty());
    }
}

} // namespace
