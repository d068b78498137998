// SPDX-License-Identifier: MPL-2.0
#include "core/materials/correlation.h"

#include "core/substances/substance.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/materials/exact_curve.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <limits>

namespace {

using namespace core;
using namespace core::materials;
using accuracy::Exact;
using exact_curve::Integrals;
using exact_curve::relative;
using random_states::between;

/// (high^q - low^q) / q, or the logarithm.
Exact exact_power(double q, double low, double high) {
    const Exact ln = log(Exact(Exact(high) / low)), exponent = q;
    // At exponents below 1e-20 the difference of the powers has lost the 50 digits.
    if (std::abs(q) < 1e-20) return ln * (1 + exponent * log(Exact(Exact(high) * low)) / 2);
    return (pow(Exact(high), exponent) - pow(Exact(low), exponent)) / q;
}

double signed_between(double low, double high) {
    return *rc::gen::arbitrary<bool>() ? between(low, high) : -between(low, high);
}

// What the docstring allows. Whole exponents make 4·|q| + 2 roundings, each of half a unit; elsewhere
// q's own rounding counts ln low times.
double allowed(double q, double low, double high) {
    if (q == std::round(q) && std::abs(q) <= 5 && q != 0) return 2.3e-16 * (2 * std::abs(q) + 1);
    return 2.3e-16 * (3 + std::abs(q * std::log(low)) + std::abs(q * std::log(high / low)));
}

RC_GTEST_PROP(IntegralOfPower, HasAllDigitsAtEveryExponent, ()) {
    const double low = between(1, 3000), high = low * (1 + between(1e-12, 10));
    const double q = signed_between(1e-3, 20);
    RC_ASSERT(relative(integral_of_power(q, low, high), exact_power(q, low, high)) <=
              allowed(q, low, high));
}

RC_GTEST_PROP(IntegralOfPower, GoesOverIntoTheLogarithm, ()) {
    const double low = between(1, 3000), high = low * (1 + between(1e-12, 10));
    for (const double q : {signed_between(1e-300, 1e-3), 0.0, 1e-16, -1e-16})
        RC_ASSERT(relative(integral_of_power(q, low, high), exact_power(q, low, high)) <=
                  allowed(q, low, high));
}

RC_GTEST_PROP(IntegralOfPower, OfWholeExponentsHasAllDigits, ()) {
    const double low = between(1, 3000), high = low * (1 + between(1e-12, 10));
    for (int q = -7; q <= 7; ++q)
        RC_ASSERT(relative(integral_of_power(q, low, high), exact_power(q, low, high)) <=
                  allowed(q, low, high));
}

TEST(IntegralOfPower, OfTheWholeExponents) {
    EXPECT_EQ(integral_of_power(1, 300, 1000), 700);
    EXPECT_NEAR(integral_of_power(2, 300, 1000), 455'000, 1e-9);
    EXPECT_NEAR(integral_of_power(-1, 300, 1000), 1.0 / 300 - 1.0 / 1000, 1e-17);
    EXPECT_EQ(integral_of_power(0, 300, 1000), std::log(1000.0 / 300));
    EXPECT_EQ(integral_of_power(-7.5, 300, 300), 0);
}

CorrelationRow row(double from, double to, std::vector<Term> terms, double transition = 0,
                   double spread = 0) {
    return {from, to, std::move(terms), transition, spread, ""};
}

/// A heat capacity of a few terms of either sign, above zero by its constant.
CorrelationRow random_row(double from, double to) {
    CorrelationRow made = row(from, to, {});
    double sum = 0;
    const int count = *rc::gen::inRange(1, 6);
    for (int i = 0; i < count; ++i) {
        const double exponent = *rc::gen::inRange(-60, 61) / 20.0;
        const double size = signed_between(0.01, 50);
        made.terms.push_back({exponent, size / std::pow(exponent > 0 ? to : from, exponent)});
        sum += std::abs(size);
    }
    made.terms.push_back({0, sum + between(1, 50)});
    if (*rc::gen::arbitrary<bool>()) made.spread = between(1, 1e5);
    return made;
}

Integrals exact_integrals(CorrelationRow const& row, double low, double high) {
    const auto slope = [&](Exact const& t) {
        Exact sum = Exact(row.spread) / (Exact(row.to) - row.from);
        for (Term const& term : row.terms) sum += term.coefficient * pow(t, Exact(term.exponent));
        return sum;
    };
    return exact_curve::integrals(slope, low, high);
}

// The terms are at most five times their sum here, and each has the rounding of its own power.
RC_GTEST_PROP(Correlation, AgreesWithQuadrature, ()) {
    const double from = between(10, 2000), to = from * (1 + between(1e-4, 5));
    const CorrelationRow given = random_row(from, to);
    const auto made = correlation(std::vector{given});
    const double a = std::min(to, from + (to - from) * between(1e-6, 1));
    const double b = std::min(to, a + (to - a) * between(1e-6, 1));
    RC_PRE(a < b);
    const Change change = made.heating(a, b);
    const Integrals exact = exact_integrals(given, a, b);
    RC_ASSERT(relative(change.enthalpy, exact.enthalpy) <= 1e-13);
    RC_ASSERT(relative(change.entropy, exact.entropy) <= 1e-13);
}

/// The equation of a tabulated interval as a row.
CorrelationRow as_row(substances::Interval const& i) {
    CorrelationRow made = row(i.from, i.to, {});
    const Term terms[] = {{-2, i.a1}, {-1, i.a2}, {-0.5, i.root}, {0, i.a3},
                          {1, i.a4},  {2, i.a5},  {3, i.a6},      {4, i.a7}};
    for (Term const& term : terms)
        if (term.coefficient != 0)
            made.terms.push_back({term.exponent, term.coefficient * i.gas_constant});
    return made;
}

/// Σ |a|·T^n, which is what rounding acts on.
double magnitude(CorrelationRow const& row, double t) {
    double sum = 0;
    for (Term const& term : row.terms)
        sum += std::abs(term.coefficient) * std::pow(t, term.exponent);
    return sum;
}

// Every phase of the published tables, written as a correlation, against the tables' own formulas.
TEST(Correlation, OfEveryTabulatedPhaseIsThatPhase) {
    int checked = 0;
    for (substances::SubstanceRow const& substance : substances::substance_rows()) {
        substances::View const& view = substances::views()[substance.first_view];
        for (substances::Rung const& rung : substances::Substance(view).rungs()) {
            const CorrelationRow given = as_row(substances::interval_of(rung));
            if (!(given.to > given.from)) continue;
            const auto made = correlation(std::vector{given});
            const double a = given.from + 0.1 * (given.to - given.from);
            const double b = given.from + 0.8 * (given.to - given.from);
            const double scale = std::max(magnitude(given, a), magnitude(given, b));
            EXPECT_NEAR(made.heat_capacity(b), heat_capacity_of(substances::interval_of(rung), b),
                        2e-15 * scale);
            const Change change = made.heating(a, b);
            EXPECT_NEAR(change.enthalpy, enthalpy_between(substances::interval_of(rung), a, b),
                        1e-14 * scale * (b - a))
                << substance.formula;
            EXPECT_NEAR(change.entropy, entropy_between(substances::interval_of(rung), a, b),
                        1e-14 * scale * std::log(b / a))
                << substance.formula;
            ++checked;
        }
    }
    EXPECT_GT(checked, 300);
}

// An invented metal: 25 J/(mol K) up to 900 K, there 9 kJ/mol, above it 30 J/(mol K).
std::vector<CorrelationRow> two_phases() {
    return {row(300, 900, {{0, 25}}, 9000), row(900, 1200, {{0, 30}})};
}

TEST(Correlation, PassesATransition) {
    const auto made = correlation(two_phases());
    EXPECT_EQ(made.heating(300, 900).enthalpy, 25 * 600);
    EXPECT_EQ(made.heating(300, 1000).enthalpy, 25 * 600 + 9000 + 3000);
    EXPECT_EQ(made.heating(1000, 300).enthalpy, -(25 * 600 + 9000 + 3000));
    EXPECT_EQ(made.heating(900, 1000).enthalpy, 9000 + 3000);
    EXPECT_EQ(made.heating(1000, 900).enthalpy, -9000 - 3000);
    EXPECT_EQ(made.heating(900, 900).enthalpy, 0);
    EXPECT_NEAR(made.heating(300, 1000).entropy, 25 * std::log(3.0) + 10 + 30 * std::log(10.0 / 9),
                1e-14 * 40);
    EXPECT_EQ(made.heat_capacity(900), 25);
    EXPECT_EQ(made.heat_capacity(std::nextafter(900, 901)), 30);
    EXPECT_EQ(made.transition(900).enthalpy, 9000);
    EXPECT_EQ(made.transition(900).entropy, 10);
    EXPECT_EQ(made.transition(899).enthalpy, 0);
    EXPECT_EQ(made.transition(1200).enthalpy, 0);
}

TEST(Correlation, TakesUpASpreadEvenly) {
    const auto made = correlation(std::vector{row(800, 900, {{0, 30}}, 0, 10'000)});
    EXPECT_EQ(made.heat_capacity(850), 30);
    EXPECT_EQ(made.heating(800, 900).enthalpy, 3000 + 10'000);
    EXPECT_EQ(made.heating(820, 845).enthalpy, 750 + 2500);
    EXPECT_NEAR(made.heating(820, 845).entropy, (30 + 100) * std::log(845.0 / 820), 1e-14 * 4);
}

TEST(Correlation, EndsOnAPlateauExactly) {
    const auto made = correlation(two_phases());
    const auto end = [&](double from, double heat) {
        const EndState state = made.end_of_heating(from, heat);
        return std::pair(absolute(state.temperature).value(), state.share);
    };
    EXPECT_EQ(end(300, 15'000), std::pair(900.0, 0.0));
    EXPECT_EQ(end(300, 15'000 + 2250), std::pair(900.0, 0.25));
    EXPECT_EQ(end(300, 15'000 + 9000), std::pair(900.0, 1.0));
    EXPECT_EQ(end(900, 4500), std::pair(900.0, 0.5));
    EXPECT_EQ(end(1000, -3000), std::pair(900.0, 1.0));
    EXPECT_EQ(end(1000, -3000 - 6750), std::pair(900.0, 0.25));
    EXPECT_EQ(end(1000, -3000 - 9000), std::pair(900.0, 0.0));
    EXPECT_EQ(end(300, 15'000 + 9000 + 3000), std::pair(1000.0, 0.0));
    EXPECT_EQ(end(300, 15'000 + 9000 + 9000), std::pair(1200.0, 0.0));
    EXPECT_EQ(end(1200, -33'000), std::pair(300.0, 0.0));
    EXPECT_EQ(end(500, 0), std::pair(500.0, 0.0));
    EXPECT_EQ(end(900, 0), std::pair(900.0, 0.0));
    expect_refusal(impossible, "an end above 1200 K", "300 to 1200 K",
                   [&] { made.end_of_heating(300, 33'001); });
    expect_refusal(impossible, "an end below 300 K", "300 to 1200 K",
                   [&] { made.end_of_heating(300, -1); });
    expect_refusal(impossible, "", "finite", [&] { made.end_of_heating(300, std::nan("")); });
}

RC_GTEST_PROP(Correlation, EndsHeatingWhereTheHeatLeads, ()) {
    std::vector<CorrelationRow> rows;
    double from = between(10, 500);
    const int count = *rc::gen::inRange(1, 6);
    for (int i = 0; i < count; ++i) {
        const double to = from * (1 + between(1e-3, 2));
        rows.push_back(random_row(from, to));
        if (i + 1 < count && *rc::gen::arbitrary<bool>()) rows.back().transition = between(1, 1e6);
        from = to;
    }
    const auto made = correlation(rows);
    const double width = made.to() - made.from();
    const double a = std::min(made.to(), made.from() + width * between(1e-5, 1));
    const double b = std::min(made.to(), made.from() + width * between(1e-5, 1));
    const double heat = made.heating(a, b).enthalpy;
    const double end = absolute(made.end_of_heating(a, heat).temperature).value();
    // The heat is known to a rounding of itself.
    RC_ASSERT(std::abs(end - b) <=
              1e-14 * std::abs(heat) / made.heat_capacity(b) + 1e-12 * std::abs(b));
}

TEST(IsPositive, TellsASumThatDipsBelowZeroFromOneThatDoesNot) {
    // (T/500 - 1)² ± 1e-4 touches -1e-4 or 1e-4 at 500 K.
    const auto parabola = [](double rest) {
        return std::vector<Term>{{0, 1 + rest}, {1, -2 / 500.0}, {2, 1 / 250'000.0}};
    };
    EXPECT_TRUE(is_positive(parabola(1e-4), 300, 1000));
    EXPECT_FALSE(is_positive(parabola(-1e-4), 300, 1000));
    EXPECT_FALSE(is_positive(parabola(0), 300, 1000));
    EXPECT_TRUE(is_positive(parabola(0), 510, 1000));
    EXPECT_FALSE(is_positive(std::vector<Term>{{0, 0}}, 300, 1000));
    EXPECT_FALSE(is_positive(std::vector<Term>{{99, -1}, {98, 1}}, 300, 1e9));
}

TEST(Correlation, RefusesRowsThatAreNone) {
    const double blank = std::numeric_limits<double>::quiet_NaN();
    const auto make = [](std::vector<CorrelationRow> rows) { return [=] { correlation(rows); }; };
    const std::vector<Term> cp{{0, 25}};
    expect_refusal(unfit, "0 rows", "1 to 100", make({}));
    expect_refusal(unfit, "101 rows", "1 to 100",
                   make(std::vector<CorrelationRow>(101, row(300, 400, cp))));
    expect_refusal(unfit, "from 300 to 400 K, then the row from 410 to 500 K", "without a gap",
                   make({row(300, 400, cp), row(410, 500, cp)}));
    expect_refusal(unfit, "then the row from 390 to 500 K", "do not overlap",
                   make({row(300, 400, cp), row(390, 500, cp)}));
    expect_refusal(unfit, "then the row from 300 to 400 K", "do not overlap",
                   make({row(400, 500, cp), row(300, 400, cp)}));
    expect_refusal(unfit, "the row from 400 to 300 K", "above their `from`",
                   make({row(400, 300, cp)}));
    expect_refusal(unfit, "the row from 400 to 400 K", "above their `from`",
                   make({row(400, 400, cp)}));
    expect_refusal(unfit, "a blank cell in row 1", "in every row", make({row(300, blank, cp)}));
    expect_refusal(unfit, "a blank coefficient", "every power",
                   make({row(300, 400, {{0, 25}, {1, blank}})}));
    expect_refusal(unfit, "T^100", "-99 to 99", make({row(300, 400, {{100, 25}})}));
    expect_refusal(unfit, "0 powers", "1 to 30", make({row(300, 400, {})}));
    expect_refusal(unfit, "31 powers", "1 to 30",
                   make({row(300, 400, std::vector<Term>(31, {0, 1}))}));
    expect_refusal(unfit, "a transition at 400 K", "phase that the transition leads to",
                   make({row(300, 400, cp, 1000)}));
    expect_refusal(impossible, "-1000 in", "0 or above",
                   make({row(300, 400, cp, -1000), row(400, 500, cp)}));
    expect_refusal(impossible, "-5 in", "0 or above", make({row(300, 400, cp, 0, -5)}));
    expect_refusal(impossible, "row from -1 to 400 K", "above 0 K", make({row(-1, 400, cp)}));
    expect_refusal(impossible, "the row from 300 to 400 K, -10 to", "above 0",
                   make({row(300, 400, {{0, -40}, {1, 0.1}})}));
    expect_refusal(impossible, "", "above 0", make({row(300, 400, {{0, 35}, {1, -0.1}})}));
    CorrelationRow quoted = row(300, 400, cp);
    quoted.phase = "c\"r";
    expect_refusal(unfit, "c\"r", "a phase", make({quoted}));
}

// Rows whose ends differ by the rounding of a conversion meet.
TEST(Correlation, MeetsAcrossARounding) {
    const double joint = 660.32 + 273.15;
    const auto made = correlation(std::vector{row(300, std::nextafter(joint, 0), {{0, 25}}, 9000),
                                              row(std::nextafter(joint, 1e9), 1200, {{0, 30}})});
    EXPECT_EQ(made.size(), 2u);
    EXPECT_EQ(made[1].from(), made[0].to());
}

} // namespace
