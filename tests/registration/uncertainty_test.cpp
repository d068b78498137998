// SPDX-License-Identifier: MPL-2.0
#include "registration/call.h"
#include "registration/catalogue/catalogue.h"
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <array>
#include <cmath>
#include <cstdio>
#include <regex>
#include <string>
#include <vector>

// Combined standard uncertainty, JCGM 100:2008.

namespace {

using namespace registration;
using tests::call_formula, tests::number, tests::Range, tests::text;

/// JCGM 100:2008, H.1: length of an end gauge at 20 °C compared with a standard,
/// l = ls + d - ls · (δα · θ + αs · δθ), equation (H.3).
core::Length gauge_length(core::Length standard, core::Length difference,
                          core::Expansivity expansivity_difference,
                          core::TemperatureDifference deviation, core::Expansivity expansivity,
                          core::TemperatureDifference temperature_difference) {
    return standard + difference -
           standard * (expansivity_difference * deviation + expansivity * temperature_difference);
}

constexpr Entry gauge =
    describe({.name = "GAUGE.LENGTH",
              .arguments = {{{.name = "ls", .symbol = "ls"},
                             {.name = "d", .symbol = "d"},
                             {.name = "dalpha", .symbol = "δα"},
                             {.name = "theta", .symbol = "θ"},
                             {.name = "alpha", .symbol = "αs"},
                             {.name = "dtheta", .symbol = "δθ"},
                             show}},
              .forms = {form<gauge_length>("l = ls + d - ls · (δα · θ + αs · δθ)")}});

Answer gauge_call(const char* view) {
    const std::array<Range, 7> arguments{"50000623 nm ± 25 nm",
                                         "215 nm ± 9.7 nm",
                                         "0 1/K ± 0.58e-6 1/K",
                                         "-0.1 K ± 0.41 K",
                                         "11.5e-6 1/K ± 1.2e-6 1/K",
                                         "0 K ± 0.029 K",
                                         view};
    std::array<Block, 7> blocks{};
    for (std::size_t i = 0; i < blocks.size(); ++i) blocks[i] = arguments[i].block();
    return registration::call(gauge, blocks);
}

TEST(Uncertainty, ReproducesTheEndGaugeOfTheGuide) {
    // Source: JCGM 100:2008, H.1.7 (result 50 000 838 nm) and Table H.1 (combined 32 nm, first
    // order; 31.71 nm when recomputed with all digits). The value of u(αs) does not enter, since δθ
    // is 0. Tolerances: half of the last printed digit; 0.01 nm for the recomputed one.
    EXPECT_NEAR(number(gauge_call("nm")), 50000838, 0.5);
    const double u = number(gauge_call("uncertainty in nm"));
    EXPECT_NEAR(u, 32, 0.5);
    EXPECT_NEAR(u, 31.71, 0.01);
}

TEST(Uncertainty, AddsInQuadrature) {
    // 0.2/18.7 and 5/1941.15 relative; the exact first-order sum; second order is below 1e-5 of it.
    const double u = number(tests::call(
        "ENTROPY.FUSION", {"18.7 kJ/mol ± 0.2 kJ/mol", "1941.15 K ± 5 K", Range(), "uncertainty"}));
    const double s = 18700 / 1941.15;
    EXPECT_NEAR(u, s * std::hypot(0.2 / 18.7, 5 / 1941.15), 1e-5 * u);
}

TEST(Uncertainty, ComesFromTheAmountToo) {
    const double u = number(
        tests::call("ENTROPY.FUSION", {"18.7 kJ/mol", "1000 K", "10 mol ± 1 mol", "uncertainty"}));
    EXPECT_NEAR(u, 18.7, 1e-10);
}

TEST(Uncertainty, IsNoneWhereNoInputStatesOne) {
    EXPECT_EQ(
        number(tests::call("ENTROPY.FUSION", {"18.7 kJ/mol", "1000 K", Range(), "uncertainty"})),
        0);
}

TEST(Uncertainty, OfAWholeColumnMovesOneRowAtATime) {
    const Range changes = Range::table({{"J/K", "u"}, {10.0, 0.3}, {-4.0, 0.4}});
    EXPECT_NEAR(
        number(tests::call("ENTROPY.GENERATED", {changes, Range(), Range(), "uncertainty"})), 0.5,
        1e-12);
}

TEST(Uncertainty, OfAFractionMovesTheOthersWithIt) {
    // S = -R Σ x ln x normalised: dS/dx1 at constant ratio of the others = -R (ln x1 + S/R).
    const Range fractions = Range::table({{"1", "u"}, {0.79, 0.01}, {0.21, Range::blank()}});
    const double s = 4.273273525197419, R = 8.31446261815324;
    const double slope = -R * (std::log(0.79) + s / R);
    EXPECT_NEAR(number(tests::call("ENTROPY.MIXING", {fractions, Range(), "uncertainty"})),
                std::fabs(slope) * 0.01, 2e-3 * std::fabs(slope) * 0.01);
}

TEST(Uncertainty, TakesTheOtherSideWhereOneIsRefused) {
    const std::vector<Range> arguments{"29.1 J/(mol·K)", "20 °C",           "1 bar",
                                       "7 bar",          "(0.99 ± 0.02) 1", "uncertainty"};
    const double u = number(tests::call("TEMPERATURE.ADIABATIC", arguments));
    EXPECT_GT(u, 0);
    std::vector<Range> why = arguments;
    why.back() = "why";
    EXPECT_NE(text(tests::call("TEMPERATURE.ADIABATIC", why)).find("one side"), std::string::npos);
}

TEST(Uncertainty, IsAnErrorWhereBothSidesAreRefused) {
    EXPECT_EQ(text(tests::call("TEMPERATURE.ADIABATIC", {"29.1 J/(mol·K)", "20 °C", "1 bar",
                                                         "7 bar", "(0.5 ± 2) 1", "uncertainty"})),
              "#NUM!");
}

TEST(Uncertainty, DecidesTheVerdict) {
    EXPECT_EQ(text(tests::call("SECONDLAW.VERDICT", {Range::column({"J/K", 1.0, -1.1})})),
              "impossible");
    const Range uncertain = Range::table({{"J/K", "u"}, {1.0, 0.04}, {-1.1, 0.04}});
    EXPECT_EQ(text(tests::call("SECONDLAW.VERDICT", {uncertain})),
              "reversible within the tolerance");
}

TEST(Uncertainty, IsBoundedInItsWork) {
    std::vector<std::vector<Range>> rows{{"J/K", "u"}};
    for (int i = 0; i < 1001; ++i) rows.push_back({1.0, 0.1});
    EXPECT_EQ(text(tests::call("ENTROPY.GENERATED",
                               {Range::table(rows), Range(), Range(), "uncertainty"})),
              "#NUM!");
    rows.pop_back();
    EXPECT_NEAR(number(tests::call("ENTROPY.GENERATED",
                                   {Range::table(rows), Range(), Range(), "uncertainty"})),
                0.1 * std::sqrt(1000.0), 1e-9);
}

/// A formula in which one quantity in quotes can be written otherwise.
struct Quoted {
    std::size_t at, length; ///< of the number inside the formula
    double value;
    std::string unit;
};

/// Every `"300 K"` of a formula, but not what stands inside braces.
std::vector<Quoted> quantities_of(std::string const& formula) {
    static const std::regex quantity("\"([0-9.]+) ([^\"]+)\"");
    std::vector<Quoted> found;
    for (auto it = std::sregex_iterator(formula.begin(), formula.end(), quantity);
         it != std::sregex_iterator(); ++it) {
        const auto at = static_cast<std::size_t>(it->position(1));
        const auto open = formula.rfind('{', at), close = formula.rfind('}', at);
        if (open != std::string::npos && (close == std::string::npos || close < open)) continue;
        const std::string unit = (*it)[2];
        if (unit.find('+') == std::string::npos && unit.find("->") == std::string::npos)
            found.push_back(
                {at, static_cast<std::size_t>(it->length(1)), std::stod((*it)[1]), unit});
    }
    return found;
}

std::string with_number(std::string formula, Quoted const& q, double value) {
    char text[40];
    std::snprintf(text, sizeof text, "%.15g", value);
    return formula.replace(q.at, q.length, text);
}

/// The same with u = 1e-4 of its number behind each quantity, and `show` asking for the uncertainty.
std::string with_uncertainties(std::string formula, std::vector<Quoted> const& all,
                               registration::Entry const& entry) {
    for (auto q = all.rbegin(); q != all.rend(); ++q) {
        char text[60];
        const std::string unit = q->unit == "°C" ? "K" : q->unit;
        std::snprintf(text, sizeof text, " ± %.15g %s", q->value * 1e-4, unit.c_str());
        formula.insert(q->at + q->length + 1 + q->unit.size(), text);
    }
    const std::size_t shows = entry.argument_count();
    std::size_t arguments = 1, depth = 0;
    bool quoted = false;
    for (const char c : formula) {
        quoted = quoted != (c == '"');
        depth += !quoted && c == '{';
        depth -= !quoted && c == '}';
        arguments += !quoted && depth == 0 && c == ';';
    }
    std::string show = "\"uncertainty\"";
    if (arguments == shows) { // a unit stands there already
        const std::size_t last = formula.rfind("; \"");
        show = "\"uncertainty in " + formula.substr(last + 3, formula.rfind('"') - last - 3) + '"';
        return formula.substr(0, last + 2) + show + ")";
    }
    formula.pop_back();
    for (; arguments < shows; ++arguments) formula += ";";
    return formula + show + ")";
}

// Every documented example that gives a number, iterated ones too: each quantity is given u = 1e-4 of
// itself, and the combined uncertainty is compared with the differences of two calls a quantity.
TEST(Uncertainty, GoesThroughEveryFunctionOfTheCatalogue) {
    std::size_t checked = 0;
    for (auto const& section : registration::catalogue::sections())
        for (registration::Entry const& entry : section.entries)
            for (auto const& example : entry.examples) {
                if (!example.formula || example.text ||
                    entry.position(registration::Argument::Role::show) == entry.argument_count())
                    continue;
                const std::string formula = example.formula;
                const auto all = quantities_of(formula);
                if (all.empty() || formula.starts_with("MOLAR") || formula.starts_with("QUANTITY"))
                    continue;
                // What published data leave of themselves, without a word in the formula.
                const double of_data = number(call_formula(with_uncertainties(formula, {}, entry)));
                double variance = of_data * of_data;
                for (Quoted const& q : all) {
                    const double step = q.value * 1e-4;
                    const double up = number(call_formula(with_number(formula, q, q.value + step))),
                                 down =
                                     number(call_formula(with_number(formula, q, q.value - step)));
                    variance += (up - down) * (up - down) / 4;
                }
                const std::string asked = with_uncertainties(formula, all, entry);
                const double u = number(call_formula(asked));
                EXPECT_NEAR(u, std::sqrt(variance), 1e-6 * std::sqrt(variance) + 1e-12) << asked;
                ++checked;
            }
    EXPECT_GE(checked, 40u);
}

} // namespace
