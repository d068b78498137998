// SPDX-License-Identifier: MPL-2.0
#include "core/materials/measured_table.h"

#include "tests/core/expect_refusal.h"
#include "tests/core/materials/exact_curve.h"
#include "tests/core/random_states.h"
#include "tests/published/table.h"

#include <boost/math/interpolators/pchip.hpp>
#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <limits>
#include <vector>

namespace {

using namespace core;
using namespace core::materials;
using accuracy::Exact;
using exact_curve::Integrals;
using exact_curve::relative;
using random_states::between;

using Values = std::vector<double>;

TEST(MeasuredTable, OfAConstantIsExact) {
    const auto table = measured_table(Values{200, 250, 400, 900}, Values{25, 25, 25, 25});
    EXPECT_EQ(table.heat_capacity(301.7), 25);
    EXPECT_EQ(table.heating(200, 900).enthalpy, 25.0 * 700);
    EXPECT_NEAR(table.heating(230, 870).entropy, 25 * std::log(870.0 / 230), 1e-13);
}

// cp = a + b·T: ∫cp dT = a·ΔT + b·ΔT²/2 and ∫cp/T dT = a·ln + b·ΔT, whatever the rows.
TEST(MeasuredTable, OfALineIsTheLine) {
    const auto cp = [](double t) { return 20 + 0.0078125 * t; };
    const Values t{288, 300, 320, 512, 1024, 1536};
    Values values;
    for (const double at : t) values.push_back(cp(at));
    for (auto const& table : {measured_table(t, values),
                              measured_table(Values{288, 1536}, Values{cp(288), cp(1536)})}) {
        EXPECT_NEAR(table.heat_capacity(777), cp(777), 1e-14 * 30);
        const Change change = table.heating(299, 1300);
        EXPECT_NEAR(change.enthalpy, 20 * 1001 + 0.00390625 * (1300.0 * 1300 - 299.0 * 299), 1e-11);
        EXPECT_NEAR(change.entropy, 20 * std::log(1300.0 / 299) + 0.0078125 * 1001, 1e-13);
    }
}

/// A table of random widths, from millikelvins to thousands of kelvin, and random heat capacities
/// over many powers of ten.
struct RandomTable {
    Values t, cp;

    explicit RandomTable(int rows, double steepest = 100) {
        t.push_back(between(5, 500));
        cp.push_back(between(0.1, 1000));
        while (static_cast<int>(t.size()) < rows) {
            t.push_back(t.back() + between(1e-3, 1000));
            cp.push_back(cp.back() * between(1 / steepest, steepest));
        }
    }
    Stretches<CubicPiece> table() const { return measured_table(t, cp); }
    double any_temperature() const {
        const double share = *rc::gen::inRange(0, 1001) / 1e3;
        return std::min(t.back(), t.front() + share * (t.back() - t.front()));
    }
};

/// The slope of the parabola through three rows, kept to the sign of the chord and to three times
/// it, as the source has it for the ends.
Exact end_slope(Exact h1, Exact s1, Exact h2, Exact s2) {
    const Exact slope = ((2 * h1 + h2) * s1 - h1 * s2) / (h1 + h2);
    if (slope * s1 <= 0) return 0;
    if (s1 * s2 <= 0 && abs(slope) > 3 * abs(s1)) return 3 * s1;
    return slope;
}

/// The same curve in 50 digits, by Boost.Math's own interpolator.
boost::math::interpolators::pchip<std::vector<Exact>> exact_interpolant(RandomTable const& rows) {
    std::vector<Exact> t(rows.t.begin(), rows.t.end()), cp(rows.cp.begin(), rows.cp.end());
    std::vector<Exact> h, s;
    for (std::size_t i = 1; i < t.size(); ++i) {
        h.push_back(t[i] - t[i - 1]);
        s.push_back((cp[i] - cp[i - 1]) / h.back());
    }
    const std::size_t n = s.size() - 1;
    const Exact left = end_slope(h[0], s[0], h[1], s[1]);
    const Exact right = end_slope(h[n], s[n], h[n - 1], s[n - 1]);
    return {std::move(t), std::move(cp), left, right};
}

Integrals exact_integrals(RandomTable const& rows, double from, double to) {
    const auto cp = exact_interpolant(rows);
    Integrals sum;
    double begin = from;
    for (const double node : rows.t) {
        if (node <= from || node >= to) continue;
        sum += exact_curve::integrals(cp, begin, node);
        begin = node;
    }
    return sum += exact_curve::integrals(cp, begin, to);
}

// Rows whose heat capacities differ by up to a factor of 3 lose no more than some roundings.
RC_GTEST_PROP(MeasuredTable, IsTheInterpolantInFiftyDigits, ()) {
    const RandomTable rows(*rc::gen::inRange(4, 9), 3);
    const auto table = rows.table();
    const auto exact = exact_interpolant(rows);
    const double t = rows.any_temperature();
    RC_ASSERT(relative(table.heat_capacity(t), exact(t)) <= 1e-14);
}

RC_GTEST_PROP(MeasuredTable, AgreesWithQuadrature, ()) {
    const RandomTable rows(*rc::gen::inRange(4, 7), 3);
    const auto table = rows.table();
    const double a = rows.any_temperature(), b = rows.any_temperature();
    RC_PRE(a != b);
    const Change change = table.heating(std::min(a, b), std::max(a, b));
    const Integrals exact = exact_integrals(rows, std::min(a, b), std::max(a, b));
    RC_ASSERT(relative(change.enthalpy, exact.enthalpy) <= 1e-13);
    RC_ASSERT(relative(change.entropy, exact.entropy) <= 1e-13);
}

// One piece alone, from the narrowest part of it to the whole, against its own cubic.
RC_GTEST_PROP(CubicPiece, KeepsItsDigitsAtEveryWidth, ()) {
    const double from = between(1, 2000), to = from + between(1e-3, 1e4);
    const double a = between(1e-3, 1e3), b = between(1e-3, 1e3);
    const double r = *rc::gen::inRange(0, 101) / 100.0, s = *rc::gen::inRange(0, 101) / 100.0;
    const CubicPiece piece(from, to, {a, a + r * (b - a), b - s * (b - a), b});
    const auto cp = [&](Exact const& t) {
        const Exact x = (t - from) / (Exact(to) - from), y = 1 - x;
        return Exact(y * y * y * a + 3 * y * y * x * (a + r * (b - a)) +
                     3 * y * x * x * (b - s * (b - a)) + x * x * x * b);
    };
    const double low = std::min(to, from + (to - from) * between(1e-6, 1));
    const double high = std::min(to, low + (to - low) * between(1e-6, 1));
    for (auto const& [l, h] : {std::pair{from, to}, std::pair{low, high}}) {
        if (l >= h) continue;
        const Integrals exact = exact_curve::integrals(cp, l, h);
        RC_ASSERT(relative(piece.enthalpy(l, h), exact.enthalpy) <= 1e-14);
        RC_ASSERT(relative(piece.entropy(l, h), exact.entropy) <= 1e-14);
    }
}

RC_GTEST_PROP(MeasuredTable, NeitherOvershootsNorTurnsBetweenRows, ()) {
    const RandomTable rows(*rc::gen::inRange(2, 9));
    const auto table = rows.table();
    for (std::size_t i = 1; i < rows.t.size(); ++i) {
        const double a = rows.cp[i - 1], b = rows.cp[i];
        double last = a;
        for (int k = 1; k <= 50; ++k) {
            const double t =
                std::min(rows.t[i], rows.t[i - 1] + (rows.t[i] - rows.t[i - 1]) * k / 50);
            const double cp = table.heat_capacity(t);
            RC_ASSERT(cp >= std::min(a, b) * (1 - 1e-14) && cp <= std::max(a, b) * (1 + 1e-14));
            RC_ASSERT((a <= b ? cp - last : last - cp) >= -1e-14 * last);
            last = cp;
        }
    }
}

RC_GTEST_PROP(MeasuredTable, GoesThroughItsRows, ()) {
    const RandomTable rows(*rc::gen::inRange(2, 9));
    const auto table = rows.table();
    for (std::size_t i = 0; i < rows.t.size(); ++i)
        RC_ASSERT(relative(table.heat_capacity(rows.t[i]), rows.cp[i]) <= 4e-16);
}

RC_GTEST_PROP(MeasuredTable, DoesNotDependOnAStopOnTheWay, ()) {
    const RandomTable rows(*rc::gen::inRange(2, 9));
    const auto table = rows.table();
    const double a = rows.any_temperature(), b = rows.any_temperature(),
                 stop = rows.any_temperature();
    const Change whole = table.heating(a, b), first = table.heating(a, stop),
                 second = table.heating(stop, b);
    RC_ASSERT(std::abs(whole.enthalpy - first.enthalpy - second.enthalpy) <=
              1e-14 * (std::abs(first.enthalpy) + std::abs(second.enthalpy)));
    RC_ASSERT(std::abs(whole.entropy - first.entropy - second.entropy) <=
              1e-14 * (std::abs(first.entropy) + std::abs(second.entropy)));
    const Change back = table.heating(b, a);
    RC_ASSERT(whole.enthalpy + back.enthalpy == 0);
    RC_ASSERT(whole.entropy + back.entropy == 0);
}

// Ten thousand rows, and two temperatures close to the top: what lies below must not be felt.
TEST(MeasuredTable, KeepsTheDigitsOfASpanFarFromItsBeginning) {
    Values t, cp;
    for (int i = 0; i < 10'000; ++i) {
        t.push_back(300 + i * 0.1);
        cp.push_back(20 + t.back() / 64);
    }
    const auto table = measured_table(t, cp);
    const double low = t[9990] + 0.03, high = t[9993] + 0.07;
    const Exact width = Exact(high) - low;
    const Exact enthalpy = 20 * width + width * (Exact(high) + low) / 128;
    const Exact entropy = 20 * log(Exact(Exact(high) / low)) + width / 64;
    EXPECT_LE(relative(table.heating(low, high).enthalpy, enthalpy), 1e-13);
    EXPECT_LE(relative(table.heating(low, high).entropy, entropy), 1e-13);
}

// Two rows at 500 K: each side is a curve of its own, the temperature itself belongs to the lower.
TEST(MeasuredTable, StatesAJumpByTwoRows) {
    const auto table = measured_table(Values{300, 500, 500, 700}, Values{25, 30, 40, 42});
    EXPECT_EQ(table.heat_capacity(500), 30);
    EXPECT_EQ(table.heat_capacity(std::nextafter(500, 501)), 40);
    EXPECT_NEAR(table.heat_capacity(600), 41, 1e-14);
    EXPECT_NEAR(table.heating(300, 700).enthalpy, 27.5 * 200 + 41 * 200, 1e-11);
    EXPECT_EQ(table.transition(500).enthalpy, 0);
    EXPECT_NEAR(table.heating(300, 700).entropy,
                (25 - 7.5) * std::log(5.0 / 3) + 5 + (40 - 5) * std::log(1.4) + 2, 1e-13);
}

// Corundum: the heat capacities of a published table give its own entropies and enthalpies.
TEST(MeasuredTable, OfCorundumGivesTheEntropyPrintedBesideIt) {
    const auto rows =
        published::read_table(PUBLISHED_DIR "/corundum_heat_capacity.csv",
                              {"quantity", "temperature", "value", "tolerance", "obtained"}, 16);
    Values t, cp;
    for (auto const& row : rows)
        if (row.text("quantity") == "heat capacity") {
            t.push_back(row.number("temperature"));
            cp.push_back(row.number("value"));
        }
    const auto table = measured_table(t, cp);
    int checked = 0;
    for (auto const& row : rows) {
        if (row.text("quantity") == "heat capacity") continue;
        const Change change = table.heating(298.15, row.number("temperature"));
        EXPECT_NEAR(row.text("quantity") == "entropy" ? change.entropy : change.enthalpy,
                    row.number("value"), row.number("tolerance"));
        ++checked;
    }
    EXPECT_EQ(checked, 3);
}

TEST(MeasuredTable, ExtrapolatesNothing) {
    const auto table = measured_table(Values{300, 400}, Values{25, 26});
    expect_refusal(impossible, "299.9 K", "from 300 to 400 K", [&] { table.heat_capacity(299.9); });
    expect_refusal(impossible, "400.1 K", "from 300 to 400 K", [&] { table.heating(350, 400.1); });
    expect_refusal(impossible, "nan", "from 300", [&] { table.heating(350, std::nan("")); });
    EXPECT_EQ(table.heat_capacity(400 * (1 + 1e-15)), 26);
    EXPECT_EQ(table.heating(300 * (1 - 1e-15), 400 * (1 + 1e-15)).enthalpy, 25.5 * 100);
}

TEST(MeasuredTable, RefusesRowsThatAreNoTable) {
    const double blank = std::numeric_limits<double>::quiet_NaN();
    const auto make = [](Values t, Values cp) { return [=] { measured_table(t, cp); }; };
    expect_refusal(unfit, "400 K, then 350 K in row 3", "rise",
                   make({300, 400, 350}, {25, 26, 27}));
    expect_refusal(unfit, "1 rows", "at least two", make({300}, {25}));
    expect_refusal(unfit, "0 rows", "at least two", make({}, {}));
    expect_refusal(unfit, "3 temperatures and 2", "for every", make({300, 400, 500}, {25, 26}));
    expect_refusal(unfit, "a blank cell in row 2", "in every row",
                   make({300, 400, 500}, {25, blank, 27}));
    expect_refusal(unfit, "a blank cell in row 2", "in every row",
                   make({300, blank, 500}, {25, 26, 27}));
    expect_refusal(unfit, "a third row at 400 K", "at most two",
                   make({300, 400, 400, 400, 500}, {25, 26, 27, 28, 29}));
    expect_refusal(unfit, "a jump at 300 K", "at least two rows on either side",
                   make({300, 300, 400}, {25, 26, 27}));
    expect_refusal(unfit, "a jump at 400 K", "at least two rows on either side",
                   make({300, 400, 400}, {25, 26, 27}));
    expect_refusal(impossible, "a heat capacity of 0 in row 2", "above 0",
                   make({300, 400}, {25, 0}));
    expect_refusal(impossible, "a heat capacity of -3 in row 1", "above 0",
                   make({300, 400}, {-3, 25}));
    expect_refusal(impossible, "-5 K in row 1", "above 0 K", make({-5, 400}, {25, 26}));
    expect_refusal(impossible, "", "can be written", make({300, 400}, {1e308, 1e308}));
    expect_refusal(unfit, "10001 rows", "10000", [] {
        Values t, cp(10'001, 25);
        for (int i = 0; i < 10'001; ++i) t.push_back(300 + i);
        measured_table(t, cp);
    });
}

RC_GTEST_PROP(MeasuredTable, EndsHeatingWhereTheHeatLeads, ()) {
    const RandomTable rows(*rc::gen::inRange(2, 30));
    const auto table = rows.table();
    const double a = rows.any_temperature(), b = rows.any_temperature();
    const EndState end = table.end_of_heating(a, table.heating(a, b).enthalpy);
    // The heat is known to a rounding of itself; what that is in kelvin, the slope says.
    const double rounding =
        2e-15 * std::abs(table.heating(a, b).enthalpy) / table.heat_capacity(b) + 1e-13 * b;
    RC_ASSERT(std::abs(absolute(end.temperature).value() - b) <= rounding);
    RC_ASSERT(end.share == 0);
}

} // namespace
