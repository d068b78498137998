// SPDX-License-Identifier: MPL-2.0
#include "core/substances/heating.h"

#include "core/substances/transition.h"
#include "tests/core/accuracy.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"
#include "tests/core/substances/quadrature.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <iomanip>
#include <iostream>

namespace {

using namespace core;
using namespace core::substances;
using accuracy::Exact, quadrature::heating;

Temperature kelvin(double value) { return Temperature::kelvin(value); }

/// Any substance that needs no state, and two temperatures of its range without a gap between.
struct Case {
    Substance substance;
    Temperature from, to;
};

Case any_case() {
    const auto rows = substance_rows();
    for (;;) {
        const auto row = *rc::gen::inRange<std::size_t>(0, rows.size());
        View const& view = views()[rows[row].first_view];
        if (view.rung_count == 0) continue;
        const Substance s(view);
        if (s.formula() == "Mg(OH)2") continue;
        const double low = absolute(s.from()).value(), high = absolute(s.to()).value();
        return {s, kelvin(random_states::between(low, high)),
                kelvin(random_states::between(low, high))};
    }
}

// The terms of liquid water, the worst, are 1e7 J/(mol K) and 3e9 J/mol and cancel to 1e2 and 3e5;
// a few of their roundings are left. The differences inside a stretch cancel less.
constexpr double entropy_rounding = 5e-9, enthalpy_rounding = 2e-6, stretch_rounding = 1e-9;

RC_GTEST_PROP(Heating, IsTheDifferenceOfTheStandardEntropies, ()) {
    const auto [s, from, to] = any_case();
    const double heated = entropy_of_heating(s, from, to).value();
    const double difference = (entropy_standard(s, to) - entropy_standard(s, from)).value();
    RC_ASSERT(std::abs(heated - difference) <= entropy_rounding);
    const double heat = enthalpy_of_heating(s, from, to).value();
    RC_ASSERT(std::abs(heat - (s.enthalpy(to) - s.enthalpy(from)).value()) <= enthalpy_rounding);
}

RC_GTEST_PROP(Heating, AndCoolingBackGiveZero, ()) {
    const auto [s, from, to] = any_case();
    RC_ASSERT(entropy_of_heating(s, from, to) + entropy_of_heating(s, to, from) == MolarEntropy{});
    RC_ASSERT(enthalpy_of_heating(s, from, to) + enthalpy_of_heating(s, to, from) == MolarEnergy{});
    RC_ASSERT(entropy_of_heating(s, from, from) == MolarEntropy{});
}

RC_GTEST_PROP(Heating, DoesNotDependOnAStopOnTheWay, ()) {
    const auto [s, from, to] = any_case();
    const double share = random_states::between(1e-6, 1);
    const Temperature stop =
        kelvin(absolute(from).value() * (1 - share) + absolute(to).value() * share);
    const double whole = entropy_of_heating(s, from, to).value();
    const double parts =
        (entropy_of_heating(s, from, stop) + entropy_of_heating(s, stop, to)).value();
    RC_ASSERT(std::abs(whole - parts) <= stretch_rounding);
}

// The Gibbs energy goes on without a step through a transition: ΔH = T·ΔS, but for 1 J/mol that
// the report leaves, and 7 J/mol in TiB2.
TEST(Heating, MeetsEveryTransitionAtEquilibrium) {
    for (SubstanceRow const& row : substance_rows()) {
        const View& view = views()[row.first_view];
        if (view.rung_count == 0) continue;
        const auto all = Substance(view).rungs();
        for (std::size_t i = 1; i < all.size(); ++i)
            EXPECT_NEAR(all[i].enthalpy_jump, all[i].from * all[i].entropy_jump,
                        row.formula == "TiB2" ? 7 : 1)
                << row.formula << ' ' << all[i].from;
    }
}

TEST(Heating, AgreesWithQuadrature) {
    for (auto [text, from, to] : {std::tuple{"Fe", 298.15, 2000.0},
                                  {"SiO2", 250.0, 1500.0},
                                  {"H2O", 280.0, 500.0},
                                  {"N2", 300.0, 2500.0},
                                  {"TiO2", 300.0, 480.0},
                                  {"Fe3O4", 300.0, 1200.0},
                                  {"FeS", 200.0, 1600.0},
                                  {"ZnO", 300.0, 1700.0},
                                  {"NiO", 300.0, 1500.0},
                                  {"Al", 500.0, 500.001}}) {
        const Substance s = find_substance(text);
        const Exact entropy = heating(s, from, to, 1), heat = heating(s, from, to, 0);
        EXPECT_NEAR(
            static_cast<double>(entropy_of_heating(s, kelvin(from), kelvin(to)).value() / entropy),
            1, 1e-12)
            << text;
        EXPECT_NEAR(
            static_cast<double>(enthalpy_of_heating(s, kelvin(from), kelvin(to)).value() / heat), 1,
            1e-12)
            << text;
    }
}

TEST(Heating, TellsItsStretchesAndTransitions) {
    std::vector<std::string> steps, remarks;
    entropy_of_heating(find_substance("Fe"), kelvin(300), kelvin(1900), Notes(&steps, &remarks));
    ASSERT_EQ(steps.size(), 10u);
    EXPECT_TRUE(steps[0].starts_with("cr, α from 300 to 1042 K: ∫cp/T dT = ")) << steps[0];
    EXPECT_TRUE(
        steps[3].starts_with("cr, α → cr, γ at 1184 K: ΔH = 899.9918813 J/mol, ΔS = 0.76018"))
        << steps[3];
    EXPECT_TRUE(steps.back().starts_with("sum: ")) << steps.back();
}

TEST(Heating, RemarksBoilingAndNearTransitions) {
    std::vector<std::string> remarks;
    entropy_of_heating(find_substance("H2O"), kelvin(300), kelvin(500), Notes(nullptr, &remarks));
    ASSERT_FALSE(remarks.empty());
    EXPECT_NE(remarks[0].find("passes from l to g at 373.1"), std::string::npos) << remarks[0];
    remarks.clear();
    heat_capacity(find_substance("Al"), kelvin(933), Notes(nullptr, &remarks));
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_NE(remarks[0].find("within 1 K of cr → l at 933.61 K; taken as cr"), std::string::npos);
    remarks.clear();
    heat_capacity(find_substance("H2O"), kelvin(372.5), Notes(nullptr, &remarks));
    ASSERT_FALSE(remarks.empty());
    EXPECT_NE(remarks.back().find("within 1 K of l → g"), std::string::npos);
    remarks.clear();
    entropy_standard(find_substance("S"), kelvin(900), std::nullopt, Notes(nullptr, &remarks));
    ASSERT_FALSE(remarks.empty());
    EXPECT_NE(remarks.back().find("boiling is not modelled"), std::string::npos);
}

TEST(Heating, IsRefusedOutsideTheRange) {
    expect_refusal(impossible, "7000 K", "from 1809 to 6000 K",
                   [] { entropy_of_heating(find_substance("Fe(l)"), kelvin(1900), kelvin(7000)); });
    expect_refusal(impossible, "Mg(OH)2", "without the gap", [] {
        enthalpy_of_heating(find_substance("Mg(OH)2"), kelvin(300), kelvin(1200));
    });
}

TEST(StandardEntropy, OfAGasFallsWithThePressure) {
    const Substance n2 = find_substance("N2");
    const Positive<Pressure> ten{Pressure::from_value(1e6)};
    const double at_one = entropy_standard(n2, kelvin(500)).value();
    EXPECT_NEAR(entropy_standard(n2, kelvin(500), ten).value(),
                at_one - 8.31446261815324 * std::log(10.0), 1e-12);
    expect_refusal(unfit, "1000000 Pa", "only the entropy of a gas",
                   [&] { entropy_standard(find_substance("Fe"), kelvin(500), ten); });
}

Transition transition_of(published::Row const& row) {
    const Substance s = find_substance(row.text("substance"));
    if (row.text("kind") == "fusion") return fusion(s);
    if (row.text("kind") == "vaporization") return vaporization(s);
    return transition_near(s, kelvin(row.number("temperature")));
}

TEST(Transitions, AgreeWithAnotherEvaluationButForTheListedDepartures) {
    for (auto const& row : published::read_table(PUBLISHED_DIR "/transitions_of_substances.csv",
                                                 {"quantity", "substance", "kind", "temperature",
                                                  "value", "tolerance", "departure", "table"},
                                                 93)) {
        const Transition t = transition_of(row);
        const double value =
            row.text("quantity") == "entropy" ? t.entropy.value() : t.enthalpy.value() / 1000;
        EXPECT_NEAR(value - row.number("value"), row.number("departure"), row.number("tolerance"))
            << row.text("substance") << ' ' << row.text("kind") << ' ' << row.text("quantity");
    }
}

// ITS-90 fixed points and boiling points of handbooks. The report puts melting where its sources
// did, on older scales; what matters here is that the size of the difference is known.
TEST(Transitions, LieNearTheFixedPoints) {
    std::ostringstream table;
    for (auto const& row :
         published::read_table(PUBLISHED_DIR "/transition_temperatures.csv",
                               {"substance", "kind", "temperature", "tolerance", "source"}, 27)) {
        const Transition t = transition_of(row);
        const double found = absolute(t.temperature).value();
        EXPECT_NEAR(found, row.number("temperature"), row.number("tolerance"))
            << row.text("substance") << ' ' << row.text("kind");
        table << std::setw(6) << row.text("substance") << std::setw(14) << row.text("kind")
              << std::setw(10) << row.number("temperature") << std::setw(10) << found
              << std::setw(9) << std::setprecision(3) << found - row.number("temperature")
              << std::setprecision(6) << '\n';
    }
    std::cout << "substance, transition, published K, here K, difference K\n" << table.str();
}

TEST(Transitions, AreRefusedWhereThereAreNone) {
    expect_refusal(impossible, "CaCO3(cr)", "whose melting",
                   [] { fusion(find_substance("CaCO3(cr)")); });
    expect_refusal(impossible, "S8", "whose boiling", [] { vaporization(find_substance("S")); });
    expect_refusal(impossible, "UF6", "this crystal sublimes",
                   [] { vaporization(find_substance("UF6")); });
    expect_refusal(impossible, "N2", "with a transition",
                   [] { transition_near(find_substance("N2"), kelvin(300)); });
}

} // namespace
