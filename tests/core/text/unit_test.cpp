// SPDX-License-Identifier: MPL-2.0
#include "core/text/unit.h"

#include "core/failure.h"
#include "core/quantities.h"
#include "core/text/unit_refusals.h"
#include "core/text/unit_table.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/text/exact_fraction.h"
#include "tests/published/table.h"

#include <cstdio>
#include <memory>
#include <set>
#include <sstream>

namespace {

using namespace core;
using namespace core::text;

std::vector<published::Row> published_units() {
    return published::read_table(PUBLISHED_DIR "/units.csv",
                                 {"symbol", "name", "dimension", "SI_unit", "factor_to_SI",
                                  "exact_fraction", "source", "spelling", "gnu_units"},
                                 183);
}

exact::Fraction factor(published::Row const& row) {
    std::string const& ratio = row.text("exact_fraction");
    return exact::fraction(ratio.empty() ? row.text("factor_to_SI") : ratio);
}

TEST(Unit, EveryPublishedFactorIsExactToTheLastBit) {
    int checked = 0;
    for (auto const& row : published_units()) {
        std::string const& spelling = row.text("spelling");
        if (spelling.empty()) continue;
        Unit const unit = read_unit(spelling);
        EXPECT_LE(exact::ulps(unit.span_to_si(1), factor(row)), 0.5) << spelling;
        std::string const& si = row.text("SI_unit");
        EXPECT_EQ(unit.dimension, read_unit(si).dimension) << spelling;
        EXPECT_EQ(read_unit(si).to_si(1), 1) << si;
        ++checked;
    }
    EXPECT_EQ(checked, 175);
}

TEST(Unit, WhatIsLeftOutIsRefused) {
    int refused = 0;
    for (auto const& row : published_units()) {
        if (!row.text("spelling").empty()) continue;
        EXPECT_THROW(read_unit(row.text("symbol")), Failure) << row.text("symbol");
        ++refused;
    }
    EXPECT_EQ(refused, 8);
}

TEST(Unit, EveryRowOfTheTableIsPublished) {
    std::set<std::string, std::less<>> spellings;
    for (auto const& row : published_units()) spellings.insert(row.text("spelling"));
    for (UnitRow const& row : unit_rows()) {
        EXPECT_TRUE(spellings.contains(row.symbol)) << row.symbol;
        EXPECT_FALSE(citation(row.source).empty());
        EXPECT_FALSE(row.name.empty());
    }
}

TEST(Unit, EveryFactorIsAQuotientOfWholeNumbers) {
    for (UnitRow const& row : unit_rows()) {
        Unit const& u = row.unit;
        for (long double const n :
             {u.numerator, u.denominator, u.zero_numerator, u.zero_denominator})
            EXPECT_EQ(n, std::trunc(n)) << row.symbol;
    }
}

/// What a program prints.
std::string output_of(std::string const& command) {
    std::unique_ptr<FILE, int (*)(FILE*)> const pipe(popen(command.c_str(), "r"), pclose);
    std::string text;
    char buffer[4096];
    while (pipe && std::fgets(buffer, sizeof buffer, pipe.get())) text += buffer;
    return text;
}

// An independent route: GNU units. It multiplies doubles, each definition some ten times, which may
// cost it 10 · 2^-53.
TEST(Unit, FactorsAgreeWithGnuUnits) {
    std::string pairs;
    std::vector<std::string> spellings;
    for (auto const& row : published_units()) {
        if (row.text("gnu_units").empty()) continue;
        spellings.push_back(row.text("spelling"));
        pairs += " '" + row.text("gnu_units") + "' '" + row.text("SI_unit") + "'";
    }
    std::istringstream results(output_of("printf '%s\\n'" + pairs + " | units -q -t -o '%.17g'"));
    ASSERT_EQ(spellings.size(), 174u);
    for (std::string const& spelling : spellings) {
        double theirs = 0;
        ASSERT_TRUE(results >> theirs) << "no answer from GNU units for " << spelling;
        double const ours = read_unit(spelling).span_to_si(1);
        EXPECT_NEAR(ours / theirs, 1, 10 * 1.2e-16) << spelling;
    }
}

TEST(Unit, NoRefusedNameIsReadable) {
    for (std::string_view const name :
         {"C",      "F",       "R",   "Nm",  "Nm3", "Sm3",  "scf",   "cal", "kcal",
          "Btu",    "BTU",     "ton", "gal", "eu",  "MBtu", "therm", "cfm", "gpm",
          "hr",     "sec",     "lbs", "kp",  "PS",  "toe",  "tTNT",  "gr",  "slug",
          "cal_15", "Btu_59F", "deg", "°",   "°K",  "kPag"}) {
        ASSERT_NE(find_refused_name(name), nullptr) << name;
        EXPECT_FALSE(find_symbol(name)) << name;
        EXPECT_THROW(read_unit(name), Failure) << name;
    }
}

// An exact name wins over a prefix with a symbol. These are all the names where both are possible.
TEST(Unit, PrefixesAreAmbiguousNowhereElse) {
    std::set<std::string> ambiguous;
    for (UnitRow const& row : unit_rows())
        for (Prefix const& prefix : prefixes()) {
            bool const taken = row.prefixes == Prefixes::all ||
                               (row.prefixes == Prefixes::multiples && prefix.exponent >= 3);
            std::string const name = std::string(prefix.symbol).append(row.symbol);
            if (!taken) continue;
            Symbol const found = find_symbol(name);
            ASSERT_TRUE(found) << name;
            if (found.row != &row || found.exponent != prefix.exponent) ambiguous.insert(name);
        }
    EXPECT_EQ(ambiguous, std::set<std::string>{"kg"}); // the same unit by both ways
}

TEST(Unit, ExactNamesWinOverPrefixes) {
    EXPECT_EQ(read_unit("min").to_si(1), 60);
    EXPECT_EQ(read_unit("ft").to_si(1), 0.3048);
    EXPECT_EQ(read_unit("at").to_si(1), 98066.5);
    EXPECT_EQ(read_unit("h").to_si(1), 3600);
    EXPECT_EQ(read_unit("hPa").to_si(1), 100);
    EXPECT_EQ(read_unit("d").to_si(1), 86400);
    EXPECT_EQ(read_unit("dam").to_si(1), 10);
    EXPECT_EQ(read_unit("mmol").to_si(1), 0.001);
    EXPECT_EQ(read_unit("Pa").dimension, dimension<Pressure>);
    EXPECT_EQ(read_unit("mmH2O").dimension, dimension<Pressure>);
}

TEST(Unit, ReadsPowersInEveryForm) {
    for (std::string_view const text : {"m3", "m^3", "m³", "m^+3", "(m)3", "m·m2", "m*m*m", "m⁺³"})
        EXPECT_EQ(read_unit(text).dimension, dimension<Volume>) << text;
    for (std::string_view const text : {"K-1", "K^-1", "K⁻¹", "1/K", "1 / K", "(K)^-1", "K−1"})
        EXPECT_EQ(read_unit(text).dimension, dimension<Expansivity>) << text;
    EXPECT_EQ(read_unit("cm^-2").to_si(1), 10000);
    EXPECT_EQ(read_unit("m^0").dimension, Dimension{});
    EXPECT_EQ(read_unit("kg^99").dimension, power(Dimension::of_mass, 99));
}

TEST(Unit, BoundsEveryPower) {
    for (std::string_view const text :
         {"kg^100", "kg100", "kg^-100", "kg¹⁰⁰", "J^60", "(m^50)^2", "m^99·m", "kg^99999999999999"})
        expect_refusal(unfit, std::string(text), "±99", [&] { read_unit(text); });
    expect_refusal(unfit, "Ym", "ordinary size", [] { read_unit("(Ym/m)^99"); });
}

TEST(Unit, BoundsLengthAndDepth) {
    EXPECT_EQ(read_unit("((((((((K))))))))").to_si(1), 1);
    expect_refusal(unfit, "K", "8 levels", [] { read_unit("(((((((((K)))))))))"); });
    expect_refusal(unfit, "K", "256 bytes", [] { read_unit("K" + std::string(256, ' ')); });
    expect_refusal(unfit, "(((", "8 levels", [] { read_unit(std::string(256, '(')); });
}

TEST(Unit, TellsPointsDifferencesAndGaugesApart) {
    for (std::string_view const text : {"°C", "degC", "℃", "°F", "degF", "℉", "(°C)", " °C "})
        EXPECT_EQ(read_unit(text).reading, Reading::point) << text;
    for (std::string_view const text : {"Δ°C", "∆°C", "ΔK", "Δ°F", "Δ°R", "ΔdegC", "Δ℃"})
        EXPECT_EQ(read_unit(text).reading, Reading::difference) << text;
    for (std::string_view const text :
         {"bar(g)", "barg", "bar (g)", "psig", "kPa(g)", "MPa (g)", "mbarg", "kgf/cm²(g)", "at(g)"})
        EXPECT_EQ(read_unit(text).reading, Reading::gauge) << text;
    for (std::string_view const text : {"K", "°R", "bar(a)", "bara", "psia", "psi", "kPa(a)",
                                        "1/°C", "J/(g·°C)", "J/Δ°C", "°C^1", "kgf/cm² (a)"})
        EXPECT_EQ(read_unit(text).reading, Reading::plain) << text;
}

TEST(Unit, ADegreeInsideAProductIsADifference) {
    EXPECT_EQ(read_unit("J/(g·°C)").to_si(1), 1000);
    EXPECT_EQ(read_unit("J/(mol·°F)").to_si(1), 1.8);
    EXPECT_EQ(read_unit("1/Δ°F").to_si(5), 9);
}

TEST(Unit, AGaugePressureStandsAlone) {
    for (std::string_view const text : {"barg·m³", "m³·barg", "J/barg", "psig·ft³", "barg^2"})
        expect_refusal(unfit, std::string(text), "absolute pressure", [&] { read_unit(text); });
    for (std::string_view const text : {"mol (g)", "J/mol(g)", "°C(g)", "barg(g)", "K (a)"})
        expect_refusal(unfit, std::string(text), "without a mark", [&] { read_unit(text); });
}

TEST(Unit, SharesKeepTheirKind) {
    EXPECT_EQ(read_unit("%").share, Share::none);
    EXPECT_EQ(read_unit("mol%").share, Share::mole);
    EXPECT_EQ(read_unit("mol %").share, Share::mole);
    EXPECT_EQ(read_unit("vol%").share, Share::volume);
    EXPECT_EQ(read_unit("wt%").share, Share::mass);
    for (std::string_view const text : {"mol%", "ppm", "%"}) EXPECT_LT(read_unit(text).to_si(1), 1);
    for (std::string_view const text : {"%/K", "kJ/mol %", "kJ·%", "mol%^2", "1/%", "ppm·K"})
        expect_refusal(unfit, std::string(text), "alone", [&] { read_unit(text); });
}

TEST(Unit, MendsWhatAutoCorrectLowered) {
    std::string note;
    EXPECT_EQ(read_unit("Mpa", note).to_si(1), 1e6);
    EXPECT_EQ(note, "`Mpa` was read as `MPa`");
    note.clear();
    EXPECT_EQ(read_unit("Mwh/Mpa", note).to_si(1), 3600);
    EXPECT_EQ(note, "`Mwh` was read as `MWh`; `Mpa` was read as `MPa`");
    note.clear();
    read_unit("Mm", note); // a name as it stands: nothing to mend
    EXPECT_EQ(note, "");
    EXPECT_EQ(read_unit("Tr").to_si(1), read_unit("TR").to_si(1));
    EXPECT_THROW(read_unit("Kpa"), Failure); // KPa is no name
    EXPECT_THROW(read_unit("mpA"), Failure);
}

TEST(Unit, ConvertsTheNumberOfACellAsItsText) {
    double const kelvin = 298.15;
    EXPECT_EQ(read_unit("°C").to_si(25.0), kelvin);
    EXPECT_EQ(read_unit("°F").to_si(77.0), kelvin);
    EXPECT_EQ(read_unit("°R").to_si(536.67), kelvin);
    EXPECT_EQ(read_unit("mK").to_si(298150.0), kelvin);
    EXPECT_EQ(read_unit("kK").to_si(0.29815), kelvin);
    EXPECT_EQ(read_unit("K").to_si(kelvin), kelvin);
    EXPECT_EQ(read_unit("°C").from_si(kelvin), 25.0);
    EXPECT_EQ(read_unit("°F").from_si(kelvin), 77.0);
    EXPECT_EQ(read_unit("°C").from_si(300), 26.85);
    EXPECT_EQ(read_unit("°F").span_to_si(9), 5);
    EXPECT_EQ(read_unit("°F").span_from_si(5), 9);
}

TEST(Unit, PassesNumbersThatAreNone) {
    EXPECT_TRUE(std::isnan(read_unit("°C").to_si(NAN)));
    EXPECT_TRUE(std::isinf(read_unit("kJ").to_si(INFINITY)));
    EXPECT_TRUE(std::isnan(read_unit("°C").from_si(NAN)));
    EXPECT_TRUE(std::isinf(read_unit("kJ").to_si(1e308)));
}

} // namespace
