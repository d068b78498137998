// SPDX-License-Identifier: MPL-2.0
#include "core/substances/end_states.h"

#include "core/substances/heating.h"
#include "core/substances/transition.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::substances;

Temperature kelvin(double value) { return Temperature::kelvin(value); }
double kelvin(Temperature t) { return absolute(t).value(); }
MolarEnergy joules(double value) { return MolarEnergy::from_value(value); }

Substance any_substance() {
    for (;;) {
        const auto row = *rc::gen::inRange<std::size_t>(0, substance_rows().size());
        View const& view = views()[substance_rows()[row].first_view];
        if (view.rung_count > 0 && substance_rows()[row].formula != "Mg(OH)2")
            return Substance(view);
    }
}

Temperature any_temperature(Substance const& s) {
    return kelvin(random_states::between(kelvin(s.from()), kelvin(s.to())));
}

// Liquid water keeps 2e-6 J/mol of its heat, other substances much more; over a heat capacity of
// 10 J/(mol K) at least that is 2e-7 K.
constexpr double temperature_rounding = 4e-7;

RC_GTEST_PROP(EndOfHeating, IsWhereTheHeatLeads, ()) {
    const Substance s = any_substance();
    const Temperature from = any_temperature(s), to = any_temperature(s);
    const Temperature end = temperature_heated(s, from, enthalpy_of_heating(s, from, to));
    RC_ASSERT(std::abs(kelvin(end) - kelvin(to)) <= temperature_rounding);
}

RC_GTEST_PROP(EndOfHeating, StaysAtATransitionUntilItIsMade, ()) {
    const Substance s = any_substance();
    const auto rungs = s.rungs();
    const Temperature from = any_temperature(s);
    const double share = random_states::between(0.01, 0.99);
    for (std::size_t i = 1; i < rungs.size(); ++i) {
        if (!is_first_order(rungs[i - 1], rungs[i])) continue;
        const Temperature t = kelvin(rungs[i].from);
        const MolarEnergy heat =
            enthalpy_of_heating(s, from, t) + joules(share * rungs[i].enthalpy_jump);
        RC_ASSERT(temperature_heated(s, from, heat) == t);
        const std::string_view name = phase_of(rungs[i]).name();
        const double rounding = 1e-5 / rungs[i].enthalpy_jump + 1e-12;
        if (phase_of(rungs[i - 1]).name() != name) // SnS is cr on both sides of 875 K
            RC_ASSERT(std::abs(fraction_of_phase(s, from, heat, name).value() - share) <= rounding);
    }
}

TEST(EndOfHeating, ReachesBothEndsOfEveryRange) {
    for (SubstanceRow const& row : substance_rows()) {
        View const& view = views()[row.first_view];
        if (view.rung_count == 0 || row.formula == "Mg(OH)2") continue;
        const Substance s(view);
        const MolarEnergy whole = enthalpy_of_heating(s, s.from(), s.to());
        EXPECT_NEAR(kelvin(temperature_heated(s, s.from(), whole)), kelvin(s.to()),
                    temperature_rounding * 10)
            << row.formula;
        EXPECT_NEAR(kelvin(temperature_heated(s, s.to(), -whole)), kelvin(s.from()),
                    temperature_rounding * 10)
            << row.formula;
        expect_refusal(impossible, "an end above", "tabulated",
                       [&] { temperature_heated(s, s.from(), whole * 1.001); });
        expect_refusal(impossible, "an end below", "tabulated",
                       [&] { temperature_heated(s, s.to(), whole * -1.001); });
    }
}

// Heat grows with temperature everywhere, which the search relies on.
TEST(EndOfHeating, RestsOnHeatCapacitiesAboveZero) {
    for (PhaseRow const& row : phase_rows()) {
        const Phase phase(row);
        const double from = kelvin(phase.from()), to = kelvin(phase.to());
        for (int i = 0; i <= 200; ++i) {
            const double t = std::min(to, from + (to - from) * i / 200);
            EXPECT_GT(phase.heat_capacity(kelvin(t)).value(), 0) << row.id << ' ' << t;
        }
    }
}

TEST(EndOfHeating, StopsAtAGap) {
    const Substance s = find_substance("Mg(OH)2");
    expect_refusal(impossible, "an end above 1000 K", "tabulated",
                   [&] { temperature_heated(s, kelvin(900), joules(1e5)); });
    expect_refusal(impossible, "an end below 1100 K", "tabulated",
                   [&] { temperature_heated(s, kelvin(1200), joules(-1e5)); });
}

TEST(FractionOfPhase, CountsAllCrystalsOrOne) {
    const Substance iron = find_substance("Fe");
    const Temperature melting = kelvin(1809), from = kelvin(300);
    const MolarEnergy half = enthalpy_of_heating(iron, from, melting) + fusion(iron).enthalpy * 0.5;
    EXPECT_NEAR(fraction_of_phase(iron, from, half, "l").value(), 0.5, 1e-9);
    EXPECT_NEAR(fraction_of_phase(iron, from, half, "cr").value(), 0.5, 1e-9);
    EXPECT_NEAR(fraction_of_phase(iron, from, half, "cr, δ").value(), 0.5, 1e-9);
    EXPECT_EQ(fraction_of_phase(iron, from, half, "cr, γ").value(), 0);
    EXPECT_EQ(fraction_of_phase(iron, from, half, "g").value(), 0);
    EXPECT_EQ(fraction_of_phase(iron, from, joules(100), "cr, α").value(), 1);
    expect_refusal(unfit, "solid", "`cr, γ`",
                   [&] { fraction_of_phase(iron, from, half, "solid"); });
}

// T = Σ c·T / Σ c and Σ c·ln(T/Ti), the closed form of constant heat capacities.
RC_GTEST_PROP(Equalizing, FollowsTheClosedFormOfConstantHeatCapacities, ()) {
    const double c1 = random_states::between(1, 1e4), c2 = random_states::between(1, 1e4);
    const double t1 = random_states::between(20, 3000), t2 = random_states::between(20, 3000);
    const ConstantMaterial one(c1), two(c2);
    const Body bodies[] = {{&one, 2, kelvin(t1)}, {&two, 3, kelvin(t2)}};
    const double t = (2 * c1 * t1 + 3 * c2 * t2) / (2 * c1 + 3 * c2);
    RC_ASSERT(std::abs(kelvin(temperature_equalized(bodies)) - t) <= 1e-12 * t);
    const double s = 2 * c1 * std::log(t / t1) + 3 * c2 * std::log(t / t2);
    const double magnitude = 2 * c1 * std::abs(std::log(t / t1)) + 1e-9;
    RC_ASSERT(std::abs(entropy_of_equalizing(bodies).value() - s) <= 1e-9 * magnitude + 1e-9);
}

RC_GTEST_PROP(Equalizing, KeepsTheEnergyAndGeneratesEntropy, ()) {
    const Substance a = any_substance(), b = any_substance();
    const Temperature ta = any_temperature(a), tb = any_temperature(b);
    const double low = std::max(kelvin(a.from()), kelvin(b.from()));
    const double high = std::min(kelvin(a.to()), kelvin(b.to()));
    RC_PRE(kelvin(ta) >= low && kelvin(ta) <= high && kelvin(tb) >= low && kelvin(tb) <= high);
    const SubstanceMaterial one(a, ta), two(b, tb);
    const Body bodies[] = {{&one, 3, ta}, {&two, 1, tb}};
    const EndState end = end_of_heating(bodies, 0);
    double energy = 0, scale = 1;
    for (Body const& body : bodies) {
        const double part =
            body.amount *
            (body.material->heating(kelvin(body.temperature), kelvin(end.temperature)).enthalpy +
             end.share * body.material->transition(kelvin(end.temperature)).enthalpy);
        energy += part;
        scale = std::max(scale, std::abs(part));
    }
    RC_ASSERT(std::abs(energy) <= 1e-8 * scale + 1e-2);
    RC_ASSERT(end.temperature >= std::min(ta, tb) && end.temperature <= std::max(ta, tb));
    RC_ASSERT(entropy_of_equalizing(bodies).value() >= -1e-5);
}

// Ice at its melting point into water at 20 °C: what melts is Q / ΔH. By the table's own figures,
// independent of the search: 1 mol of water gives off ∫cp dT from 293.15 to 273.15 K.
TEST(Equalizing, EndsInsideATransition) {
    const Substance water = find_substance("H2O");
    const SubstanceMaterial ice(water, kelvin(273.15)), warm(water, kelvin(293.15));
    const Body bodies[] = {{&ice, 1, kelvin(273.15)}, {&warm, 1, kelvin(293.15)}};
    const double given = 75.5 * 20, melting = 6010; // J/mol, common practice, no source
    std::vector<std::string> remarks;
    EXPECT_EQ(kelvin(temperature_equalized(bodies, Notes(nullptr, &remarks))), 273.15);
    ASSERT_EQ(remarks.size(), 1u);
    // Both bodies are one substance: the warm one is liquid, so of 2 mol ΔH the share is made.
    const EndState end = end_of_heating(bodies, 0);
    EXPECT_NEAR(2 * end.share, 1 + given / melting, 0.01);
    EXPECT_GT(entropy_of_equalizing(bodies).value(), 0);
}

TEST(Equalizing, OfEqualTemperaturesGeneratesNothing) {
    const SubstanceMaterial iron(find_substance("Fe"), kelvin(500)),
        copper(find_substance("Cu"), kelvin(500));
    const Body bodies[] = {{&iron, 1, kelvin(500)}, {&copper, 2, kelvin(500)}};
    EXPECT_EQ(kelvin(temperature_equalized(bodies)), 500);
    EXPECT_EQ(entropy_of_equalizing(bodies).value(), 0);
}

TEST(Equalizing, IsRefusedWhereItCannotBe) {
    expect_refusal(unfit, "", "at least one", [] { temperature_equalized({}); });
    const SubstanceMaterial iron(find_substance("Fe"), kelvin(500));
    const Body none[] = {{&iron, 0, kelvin(500)}};
    expect_refusal(impossible, "Fe: 0", "amounts above 0", [&] { temperature_equalized(none); });
    const SubstanceMaterial gas(find_substance("Fe(l)"), kelvin(2000)),
        ice(find_substance("H2O(cr)"), kelvin(250));
    const Body apart[] = {{&gas, 1, kelvin(2000)}, {&ice, 1, kelvin(250)}};
    expect_refusal(impossible, "", "share a range", [&] { temperature_equalized(apart); });
}

} // namespace
