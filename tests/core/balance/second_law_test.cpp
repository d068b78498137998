// SPDX-License-Identifier: MPL-2.0
#include "core/balance/second_law.h"

#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <array>
#include <cmath>

namespace {

using namespace core;
using namespace core::balance;

using Values = std::vector<double>;

template<class Q>
Column<Q> column(Values const& values) {
    return {values.data(), values.size()};
}
template<class Q>
Column<Uncertain<Q>> column(Values const& values, Values const& u) {
    return {values.data(), u.empty() ? nullptr : u.data(), values.size()};
}

Entropy generated(Values const& changes, Values const& heats, Values const& temperatures,
                  Notes const& notes = silent) {
    return entropy_generated<Total>(column<Entropy>(changes), column<Energy>(heats),
                                    column<Temperature>(temperatures), notes);
}

TEST(EntropyGenerated, SubtractsWhatHeatBroughtIn) {
    EXPECT_EQ(generated({5, -1}, {600, -300}, {300, 300}), Entropy::from_value(3));
    EXPECT_EQ(entropy_generated<Rate>(column<EntropyFlow>({2, 3}), std::nullopt, std::nullopt),
              EntropyFlow::from_value(5));
}

TEST(EntropyGenerated, RemarksADeficitOnly) {
    std::vector<std::string> remarks;
    const Notes notes(nullptr, &remarks);
    generated({2}, {600}, {300}, notes);
    generated({0.1, 0.2}, {90}, {300}, notes); // 0.30000000000000004 - 0.3
    generated({0.3}, {30, 60}, {300, 300}, notes);
    EXPECT_TRUE(remarks.empty());
    EXPECT_LT(generated({1}, {600}, {300}, notes), Entropy{});
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_NE(remarks[0].find("a deficit"), std::string::npos);
}

RC_GTEST_PROP(EntropyGenerated, DoesNotDependOnTheOrder, ()) {
    Values changes;
    for (int i = 0; i < 20; ++i)
        changes.push_back(random_states::between(1e-8, 1e8) * (i % 2 == 0 ? 1 : -1));
    Values reversed(changes.rbegin(), changes.rend());
    RC_ASSERT(generated(changes, {}, {}) == generated(reversed, {}, {}));
}

TEST(EntropyGenerated, TellsEachTerm) {
    std::vector<std::string> steps;
    generated({5}, {600}, {300}, Notes(&steps, nullptr));
    EXPECT_EQ(steps,
              (std::vector<std::string>{"ΔS1 = 5 J/K", "Σ(ΔS) = 5 J/K",
                                        "Q1 / T1 = 600 J / 300 K = 2 J/K", "Σ(Q / T) = 2 J/K"}));
}

TEST(EntropyGenerated, RefusesHeatsWithoutTheirTemperatures) {
    expect_refusal(unfit, "1 heat and 2 temperatures", "one temperature", [] {
        generated({1}, {100}, {300, 400});
    });
    expect_refusal(unfit, "2 heats and 0 temperatures", "one temperature", [] {
        entropy_generated<Total>(column<Entropy>({1}), column<Energy>({1, 2}), std::nullopt);
    });
}

TEST(EntropyGenerated, RefusesATemperatureAtAbsoluteZero) {
    expect_refusal(impossible, "", "a temperature above 0 K", [] { generated({1}, {100}, {0}); });
}

struct Stated {
    Values changes{}, changes_u{}, heats{}, heats_u{}, temperatures{}, temperatures_u{};
};

Verdict verdict(Stated const& s, std::optional<double> tolerance = std::nullopt,
                Notes const& notes = silent) {
    std::optional<NonNegative<Entropy>> allowed;
    if (tolerance) allowed = NonNegative<Entropy>{Entropy::from_value(*tolerance)};
    return second_law_verdict<Total>(
        column<Entropy>(s.changes, s.changes_u), column<Energy>(s.heats, s.heats_u),
        column<Temperature>(s.temperatures, s.temperatures_u), allowed, notes);
}

TEST(SecondLawVerdict, TellsTheThreeCases) {
    EXPECT_EQ(verdict({.changes = {2.5}, .heats = {600}, .temperatures = {300}}),
              Verdict::irreversible);
    EXPECT_EQ(verdict({.changes = {2}, .heats = {600}, .temperatures = {300}}),
              Verdict::reversible_within_the_tolerance);
    EXPECT_EQ(verdict({.changes = {1.5}, .heats = {600}, .temperatures = {300}}),
              Verdict::impossible);
}

TEST(SecondLawVerdict, TakesRoundingForReversible) {
    EXPECT_EQ(verdict({.changes = {0.1, 0.2}, .heats = {90}, .temperatures = {300}}),
              Verdict::reversible_within_the_tolerance);
    EXPECT_EQ(verdict({.changes = {1 + 1e-10}, .heats = {300}, .temperatures = {300}}),
              Verdict::irreversible);
}

// u² = 0.3² + (60/300)² + (600·7.5/300²)², so that 2·u = 0.7226 J/K.
TEST(SecondLawVerdict, AllowsTwiceTheCombinedUncertainty) {
    const double u = std::sqrt(0.3 * 0.3 + 0.2 * 0.2 + 0.05 * 0.05);
    for (auto [excess, expected] : {std::pair{1.99 * u, Verdict::reversible_within_the_tolerance},
                                    std::pair{2.01 * u, Verdict::irreversible},
                                    std::pair{-1.99 * u, Verdict::reversible_within_the_tolerance},
                                    std::pair{-2.01 * u, Verdict::impossible}})
        EXPECT_EQ(verdict({.changes = {2 + excess},
                           .changes_u = {0.3},
                           .heats = {600},
                           .heats_u = {60},
                           .temperatures = {300},
                           .temperatures_u = {7.5}}),
                  expected)
            << excess;
}

TEST(SecondLawVerdict, AddsTheTolerance) {
    const Stated s{.changes = {1.9}, .heats = {600}, .temperatures = {300}};
    EXPECT_EQ(verdict(s, 0.05), Verdict::impossible);
    EXPECT_EQ(verdict(s, 0.15), Verdict::reversible_within_the_tolerance);
}

TEST(SecondLawVerdict, TellsItsMargin) {
    std::vector<std::string> steps;
    verdict({.changes = {2.5}, .changes_u = {0.1}, .heats = {600}, .temperatures = {300}}, 0.25,
            Notes(&steps, nullptr));
    ASSERT_EQ(steps.size(), 7u);
    EXPECT_EQ(steps[4], "Sgen = Σ(ΔS) - Σ(Q / T) = 0.5 J/K");
    EXPECT_EQ(steps[5], "u(Sgen) = 0.1 J/K, combined standard uncertainty");
    EXPECT_EQ(steps[6], "margin = 1e-12 · Σ|terms| + 2 · u(Sgen) + tolerance = 0.45 J/K");
}

TEST(SecondLawVerdict, ServesEveryBasis) {
    const Values changes{1};
    EXPECT_EQ(second_law_verdict<Molar>(column<MolarEntropy>(changes, {}), std::nullopt,
                                        std::nullopt, std::nullopt),
              Verdict::irreversible);
    EXPECT_EQ(second_law_verdict<Specific>(column<SpecificEntropy>(changes, {}), std::nullopt,
                                           std::nullopt, std::nullopt),
              Verdict::irreversible);
}

} // namespace
