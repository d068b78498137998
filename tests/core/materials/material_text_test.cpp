// SPDX-License-Identifier: MPL-2.0
#include "core/materials/material_text.h"

#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace {

using namespace core;
using namespace core::materials;
using random_states::between;

TEST(MaterialText, IsReadableByPeople) {
    OwnMaterial steel = OwnMaterial::measured(Basis::specific, {300, 400, 500.5}, {460, 480, 0.1});
    steel.set_name("steel A");
    EXPECT_EQ(write_material(steel),
              "material \"steel A\" | T / K: 300 400 500.5 | cp / (J/(kg·K)): 460 480 0.1");
    OwnMaterial alloy = OwnMaterial::correlated(
        Basis::molar, {{300, 900, {{0, 25}, {-0.5, 1e-10}}, 9000, 0, "cr, α"},
                       {900, 950, {{0, 30}}, 0, 500, ""},
                       {950, 1e4, {{0, 31}, {1, 2}}, 0, 0, "l"}});
    alloy.set_molar_mass(MolarMass::from_value(0.02698));
    EXPECT_EQ(write_material(alloy),
              "material | molar mass / (kg/mol): 0.02698 | from / K: 300 900 950 | to / K: 900 950 "
              "10000 | T^0 / (J/(mol·K)): 25 30 31 | T^-0.5 / (J/(mol·K)): 1e-10 0 0 | T^1 / "
              "(J/(mol·K)): 0 0 2 | transition / (J/mol): 9000 0 0 | spread / (J/mol): 0 500 0 | "
              "phase: \"cr, α\" \"\" \"l\"");
    const OwnMaterial whole = OwnMaterial::correlated(
        Basis::total, {{300, 900, {{0, 25}}, 9000, 0, ""}, {900, 950, {{0, 30}}, 0, 0, ""}});
    EXPECT_EQ(write_material(whole),
              "material | from / K: 300 900 | to / K: 900 950 | T^0 / (J/K): "
              "25 30 | transition / J: 9000 0");
}

TEST(MaterialText, IsReadInTheUnitsItStates) {
    const OwnMaterial m =
        read_material("material\"x\"|cp / (kJ/(kg·K)):0.46  0.48|T / °C: -1e2 25   "
                      "|  molar mass / (g/mol): 55.845");
    EXPECT_EQ(m.name(), "x");
}

bool same(OwnMaterial const& a, OwnMaterial const& b) {
    const auto rows_agree = [](CorrelationRow const& x, CorrelationRow const& y) {
        return x.from == y.from && x.to == y.to && x.transition == y.transition &&
               x.spread == y.spread && x.phase == y.phase &&
               std::equal(x.terms.begin(), x.terms.end(), y.terms.begin(), y.terms.end(),
                          [](Term const& s, Term const& t) {
                              return s.exponent == t.exponent && s.coefficient == t.coefficient;
                          });
    };
    return a.basis() == b.basis() && a.name() == b.name() && a.molar_mass() == b.molar_mass() &&
           std::equal(a.temperatures().begin(), a.temperatures().end(), b.temperatures().begin(),
                      b.temperatures().end()) &&
           std::equal(a.heat_capacities().begin(), a.heat_capacities().end(),
                      b.heat_capacities().begin(), b.heat_capacities().end()) &&
           std::equal(a.rows().begin(), a.rows().end(), b.rows().begin(), b.rows().end(),
                      rows_agree);
}

Basis any_basis() {
    return *rc::gen::elementOf(std::vector{Basis::molar, Basis::specific, Basis::total});
}

RC_GTEST_PROP(MaterialText, OfATableReadsBackToTheSameBits, ()) {
    std::vector<double> t{between(1, 500)}, cp{between(1e-3, 1e6)};
    for (int rows = *rc::gen::inRange(1, 50); rows > 0; --rows) {
        const bool jump =
            t.size() > 1 && rows > 1 && t[t.size() - 2] != t.back() && *rc::gen::inRange(0, 4) == 0;
        t.push_back(jump ? t.back() : t.back() + between(1e-3, 300));
        cp.push_back(between(1e-3, 1e6));
    }
    OwnMaterial m = OwnMaterial::measured(any_basis(), t, cp);
    if (*rc::gen::arbitrary<bool>()) m.set_name("Gußstück | № 7: a");
    if (*rc::gen::arbitrary<bool>()) m.set_molar_mass(MolarMass::from_value(between(1e-3, 1)));
    const OwnMaterial again = read_material(write_material(m));
    RC_ASSERT(same(m, again));
    RC_ASSERT(write_material(again) == write_material(m));
    RC_ASSERT(again.heating(m.from(), m.to()).entropy == m.heating(m.from(), m.to()).entropy);
}

RC_GTEST_PROP(MaterialText, OfACorrelationReadsBackToTheSameBits, ()) {
    std::vector<CorrelationRow> rows;
    double from = between(10, 500);
    const std::vector<double> exponents{0, 1, -2, -0.5, between(0.1, 3), -between(1e-7, 2)};
    for (int count = *rc::gen::inRange(1, 6); count > 0; --count) {
        CorrelationRow row{from, from * (1 + between(1e-2, 2)), {}, 0, 0, ""};
        for (const double n : exponents) row.terms.push_back({n, between(1e-12, 1e3)});
        if (count > 1) row.transition = between(1e-3, 1e6);
        row.spread = between(1e-3, 1e6);
        row.phase = *rc::gen::elementOf(std::vector<std::string>{"", "cr", "cr, α", "l"});
        from = row.to;
        rows.push_back(row);
    }
    const OwnMaterial m = OwnMaterial::correlated(any_basis(), rows);
    const OwnMaterial again = read_material(write_material(m));
    RC_ASSERT(same(m, again));
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
    expect_refusal(unfit, "a text of", "32000 bytes",
                   [&] { write_material(OwnMaterial::measured(Basis::molar, t, cp)); });
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
        RC_ASSERT(same(read_material(write_material(m)), m));
    } catch (Failure const& failure) {
        RC_ASSERT(!failure.needed.empty());
        RC_ASSERT(!failure.repair.empty());
    }
}

} // namespace
