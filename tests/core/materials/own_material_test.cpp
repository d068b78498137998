// SPDX-License-Identifier: MPL-2.0
#include "core/materials/own_material.h"

#include "core/substances/end_states.h"
#include "core/substances/heating.h"
#include "core/substances/transition.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace {

using namespace core;
using namespace core::materials;
using random_states::between;
using substances::Body;

Temperature kelvin(double value) { return Temperature::kelvin(value); }
double kelvin(Temperature t) { return absolute(t).value(); }

CorrelationRow row(double from, double to, double cp, double transition, double spread,
                   std::string phase) {
    return {from, to, {{0, cp}}, transition, spread, std::move(phase)};
}

/// An invented alloy: a change of its crystal at 600 K, a freezing range from 800 to 900 K, boiling.
OwnMaterial alloy() {
    return OwnMaterial::correlated(
        Basis::specific, {row(300, 600, 400, 12'000, 0, "cr, α"), row(600, 800, 500, 0, 0, "cr, β"),
                          row(800, 900, 550, 0, 200'000, ""), row(900, 1500, 600, 3e6, 0, "l"),
                          row(1500, 2000, 300, 0, 0, "g")});
}

/// A correlation or a table with random values; transitions, spreads and jumps among them.
OwnMaterial random_material(Basis basis = Basis::specific) {
    double t = between(50, 400);
    if (*rc::gen::arbitrary<bool>()) {
        std::vector<CorrelationRow> rows;
        const int count = *rc::gen::inRange(1, 5);
        for (int i = 0; i < count; ++i) {
            const double to = t * (1 + between(1e-2, 2));
            const double cp = between(10, 1000);
            rows.push_back({t, to, {{0, cp}, {1, cp / t}, {-0.5, cp * std::sqrt(t)}}, 0, 0, ""});
            if (i + 1 < count && *rc::gen::arbitrary<bool>())
                rows.back().transition = between(10, 1e6);
            if (*rc::gen::arbitrary<bool>()) rows.back().spread = between(10, 1e6);
            t = to;
        }
        return OwnMaterial::correlated(basis, rows);
    }
    std::vector<double> at{t}, cp{between(10, 1000)};
    const int count = *rc::gen::inRange(2, 30);
    for (int i = 1; i < count; ++i) {
        const bool jump = i > 1 && i + 2 < count && at[at.size() - 2] != at.back() &&
                          *rc::gen::inRange(0, 5) == 0;
        at.push_back(jump ? at.back() : at.back() + between(0.1, 300));
        cp.push_back(between(10, 1000));
    }
    return OwnMaterial::measured(basis, at, cp);
}

double any_temperature(substances::Material const& m) {
    return std::min(m.to(), m.from() + (m.to() - m.from()) * *rc::gen::inRange(0, 1001) / 1000.0);
}

RC_GTEST_PROP(OwnMaterial, DoesNotDependOnAStopOnTheWay, ()) {
    const OwnMaterial m = random_material();
    const double a = any_temperature(m), b = any_temperature(m), stop = any_temperature(m);
    const Change whole = m.heating(a, b), first = m.heating(a, stop), second = m.heating(stop, b);
    RC_ASSERT(std::abs(whole.enthalpy - first.enthalpy - second.enthalpy) <=
              1e-14 * (std::abs(first.enthalpy) + std::abs(second.enthalpy)));
    RC_ASSERT(std::abs(whole.entropy - first.entropy - second.entropy) <=
              1e-14 * (std::abs(first.entropy) + std::abs(second.entropy)));
}

RC_GTEST_PROP(OwnMaterial, HeatedAndCooledBackIsAsBefore, ()) {
    const OwnMaterial m = random_material();
    const double a = any_temperature(m), b = any_temperature(m);
    const Change there = m.heating(a, b), back = m.heating(b, a);
    RC_ASSERT(there.enthalpy + back.enthalpy == 0);
    RC_ASSERT(there.entropy + back.entropy == 0);
    RC_ASSERT((b - a) * there.enthalpy >= 0);
}

// The end of heating by the search for one material, and by the one for several bodies, which does
// not know this one.
RC_GTEST_PROP(OwnMaterial, EndsHeatingWhereTheSearchForBodiesEndsIt, ()) {
    const OwnMaterial m = random_material();
    const double from = any_temperature(m);
    const double least = m.heating(from, m.from()).enthalpy,
                 most = m.heating(from, m.to()).enthalpy;
    const double heat = least + (most - least) * *rc::gen::inRange(1, 1000) / 1000.0;
    const Body body{&m, 1, kelvin(from)};
    const EndState end = m.end_of_heating(from, heat);
    const EndState other = substances::end_of_heating({&body, 1}, heat);
    const double t = kelvin(end.temperature);
    const double scale = std::abs(least) + std::abs(most);
    RC_ASSERT(std::abs(t - kelvin(other.temperature)) <=
              1e-12 * t + 1e-14 * scale / m.heat_capacity(t));
    const double taken_up = m.heating(from, t).enthalpy + end.share * m.transition(t).enthalpy;
    // A rounding of the temperature is worth cp·T·2e-16, of the spread ten times that at most.
    RC_ASSERT(std::abs(taken_up - heat) <= 1e-14 * scale + 1e-14 * m.heat_capacity(t) * t);
}

RC_GTEST_PROP(Equalizing, OfOwnMaterialsKeepsTheEnergyAndGeneratesEntropy, ()) {
    const OwnMaterial one = random_material(), two = random_material();
    const substances::ConstantMaterial three(between(10, 1000));
    const double low = std::max(one.from(), two.from()), high = std::min(one.to(), two.to());
    RC_PRE(low < high);
    const auto shared = [&] { return low + (high - low) * *rc::gen::inRange(0, 1000) / 1000.0; };
    const double t1 = shared(), t2 = shared(), t3 = shared();
    const Body bodies[] = {{&one, between(0.1, 10), kelvin(t1)},
                           {&two, between(0.1, 10), kelvin(t2)},
                           {&three, between(0.1, 10), kelvin(t3)}};
    const EndState end = substances::end_of_heating(bodies, 0);
    const double t = kelvin(end.temperature);
    double energy = 0, entropy = 0, exchanged = 0, turned_over = 0, step = 0;
    // What 1e-15 of the end temperature is worth, to which it is found, unless a transition holds it.
    const double below = std::max(low, t * (1 - 1e-15)), above = std::min(high, t * (1 + 1e-15));
    for (Body const& body : bodies) {
        const Change change = body.material->heating(kelvin(body.temperature), t);
        const Change made = body.material->transition(t);
        const double heat = body.amount * (change.enthalpy + end.share * made.enthalpy);
        energy += heat;
        exchanged += std::abs(heat);
        const double part = body.amount * (change.entropy + end.share * made.entropy);
        entropy += part;
        turned_over += std::abs(part);
        if (end.share == 0) step += body.amount * body.material->heating(below, above).enthalpy;
    }
    RC_ASSERT(std::abs(energy) <= 1e-12 * exchanged + step);
    RC_ASSERT(t >= std::min({t1, t2, t3}) && t <= std::max({t1, t2, t3}));
    // ΔS - ΔH/t is ∫cp·(1/T - 1/t) dT of every body, which is above zero whatever t may be.
    RC_ASSERT(entropy - energy / t >= -1e-14 * (turned_over + exchanged / t));
    RC_ASSERT(std::abs(entropy - substances::entropy_of_equalizing(bodies).value()) <=
              1e-12 * turned_over);
}

// Iron of the tables beside an own alloy: the heat that it gives off is taken up.
TEST(Equalizing, MixesTabulatedAndOwnMaterials) {
    const auto iron = substances::find_substance("Fe");
    const substances::SubstanceMaterial hot(iron, kelvin(1500));
    const OwnMaterial cold = alloy();
    const Body bodies[] = {{&hot, 10, kelvin(1500)}, {&cold, 1, kelvin(300)}};
    const double t = kelvin(substances::temperature_equalized(bodies));
    EXPECT_NEAR(10 * substances::enthalpy_of_heating(iron, kelvin(1500), kelvin(t)).value(),
                -cold.heating(300, t).enthalpy, 1e-6);
    EXPECT_GT(substances::entropy_of_equalizing(bodies).value(), 0);
}

// 1 kg of the alloy at 900 K, all liquid, with 1 kg of a constant 500 J/(kg·K) at 700 K: the alloy
// gives off (550 + 2000)·(900 - T), the other takes up 500·(T - 700).
TEST(Equalizing, EndsInAFreezingRange) {
    const OwnMaterial melt = alloy();
    const substances::ConstantMaterial mould(500);
    const Body bodies[] = {{&melt, 1, kelvin(900)}, {&mould, 1, kelvin(700)}};
    const double t = (2550.0 * 900 + 500 * 700) / 3050;
    EXPECT_NEAR(kelvin(substances::temperature_equalized(bodies)), t, 1e-11);
    EXPECT_NEAR(substances::entropy_of_equalizing(bodies).value(),
                2550 * std::log(t / 900) + 500 * std::log(t / 700), 1e-11);
}

TEST(FractionOfPhase, OfTheRowsOfAMaterial) {
    const OwnMaterial m = alloy();
    const auto fraction = [&](double heat, const char* phase) {
        return fraction_of_phase<Specific>(m, kelvin(300), SpecificEnergy::from_value(heat), phase)
            .value();
    };
    EXPECT_EQ(fraction(60'000, "cr, α"), 1);
    EXPECT_EQ(fraction(120'000 + 3000, "cr, β"), 0.25);
    EXPECT_EQ(fraction(120'000 + 3000, "cr, α"), 0.75);
    EXPECT_EQ(fraction(120'000 + 3000, "cr"), 1);
    EXPECT_EQ(fraction(120'000 + 3000, "l"), 0);
    const double solidus = 120'000 + 12'000 + 100'000;
    EXPECT_NEAR(fraction(solidus + 0.3 * 255'000, "l"), 0.3, 1e-14);
    EXPECT_NEAR(fraction(solidus + 0.3 * 255'000, "cr"), 0.7, 1e-14);
    EXPECT_EQ(fraction(solidus + 0.3 * 255'000, "g"), 0);
    const double boiling = solidus + 255'000 + 360'000;
    EXPECT_NEAR(fraction(boiling + 1.5e6, "g"), 0.5, 1e-14);
    EXPECT_NEAR(fraction(boiling + 1.5e6, "l"), 0.5, 1e-14);
    expect_refusal(unfit, "solid", "`cr, α`, `cr, β`, `l`, `g`", [&] { fraction(0, "solid"); });
    const OwnMaterial unnamed =
        OwnMaterial::correlated(Basis::specific, {row(300, 600, 400, 0, 0, "")});
    expect_refusal(unfit, "l", "name their phases", [&] {
        static_cast<void>(unnamed.fraction_of_phase("l", {kelvin(400), 0}));
    });
    const OwnMaterial half_named = OwnMaterial::correlated(
        Basis::specific, {row(300, 600, 400, 0, 0, "cr"), row(600, 700, 400, 0, 1e5, "")});
    EXPECT_EQ(half_named.fraction_of_phase("cr", {kelvin(400), 0}), 1);
    expect_refusal(unfit, "the row from 600 K", "named phases", [&] {
        static_cast<void>(half_named.fraction_of_phase("cr", {kelvin(650), 0}));
    });
}

// Over the whole way the shares of all phases sum to 1.
RC_GTEST_PROP(FractionOfPhase, SharesSumToOne, ()) {
    const OwnMaterial m = alloy();
    const double most = m.heating(300, 2000).enthalpy;
    const EndState end = m.end_of_heating(300, most * *rc::gen::inRange(0, 10'001) / 1e4);
    double sum = 0;
    for (const char* phase : {"cr, α", "cr, β", "l", "g"}) {
        const double share = m.fraction_of_phase(phase, end);
        RC_ASSERT(share >= 0 && share <= 1);
        sum += share;
    }
    RC_ASSERT(std::abs(sum - 1) <= 4e-16);
}

TEST(Heating, OfAnOwnMaterialTellsItsStretches) {
    std::vector<std::string> steps, remarks;
    const Notes notes(&steps, &remarks);
    const SpecificEntropy s =
        entropy_of_heating<Specific>(alloy(), kelvin(500), kelvin(850), notes);
    EXPECT_NEAR(s.value(),
                400 * std::log(1.2) + 20 + 500 * std::log(800.0 / 600) +
                    2550 * std::log(850.0 / 800),
                1e-12);
    EXPECT_EQ(steps, (std::vector<std::string>{
                         "from 500 to 600 K: ∫cp/T dT = 72.92862272 J/(kg·K)",
                         "transition at 600 K: ΔH = 12000 J/kg, ΔS = ΔH / T = 20 J/(kg·K)",
                         "from 600 to 800 K: ∫cp/T dT = 143.8410362 J/(kg·K)",
                         "from 800 to 850 K: ∫cp/T dT = 154.5927856 J/(kg·K), with its part of "
                         "the latent heat of the row, 200000 J/kg",
                         "sum: 391.3624446 J/(kg·K)"}));
    EXPECT_TRUE(remarks.empty());
    steps.clear();
    EXPECT_EQ(enthalpy_of_heating<Specific>(alloy(), kelvin(600.5), kelvin(599.5), notes).value(),
              -200 - 12'000 - 250);
    EXPECT_EQ(steps.back(), "sum, negative for cooling: -12450 J/kg");
    EXPECT_EQ(remarks,
              (std::vector<std::string>{
                  "600.5 K is within 1 K of the transition at 600 K; taken as the phase above",
                  "599.5 K is within 1 K of the transition at 600 K; taken as the phase below"}));
}

// What the steps list adds up, over materials of every kind.
RC_GTEST_PROP(Heating, StretchesAddUp, ()) {
    const OwnMaterial m = random_material();
    const double a = any_temperature(m), b = any_temperature(m);
    std::vector<std::string> steps;
    const double s =
        entropy_of_heating<Specific>(m, kelvin(a), kelvin(b), Notes(&steps, nullptr)).value();
    double sum = 0;
    for (std::string const& step : steps) {
        if (step.starts_with("sum")) continue;
        sum += std::stod(step.substr(step.rfind(step.starts_with("from") ? "dT = " : "T = ") +
                                     (step.starts_with("from") ? 5 : 4)));
    }
    RC_ASSERT(std::abs(sum - std::abs(s)) <= 1e-8 * std::abs(s) + 1e-8);
}

TEST(HeatCapacity, LeavesOutTheLatentHeatOfASpread) {
    std::vector<std::string> remarks;
    EXPECT_EQ(heat_capacity<Specific>(alloy(), kelvin(850), Notes(nullptr, &remarks)).value(), 550);
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_EQ(remarks[0], "without the latent heat of the row, 200000 J/kg, which is taken up "
                          "evenly on its way");
}

TEST(TemperatureHeated, TellsThatItEndsInATransition) {
    std::vector<std::string> remarks;
    EXPECT_EQ(temperature_heated<Specific>(alloy(), kelvin(600), SpecificEnergy::from_value(3000),
                                           Notes(nullptr, &remarks)),
              kelvin(600));
    EXPECT_EQ(remarks, std::vector<std::string>{
                           "ends in the transition at 600 K, of which the share 0.25 is made"});
}

TEST(OwnMaterial, IsCountedOnOneBasis) {
    expect_refusal(unfit, "specific, J/(kg·K)", "molar",
                   [] { entropy_of_heating<Molar>(alloy(), kelvin(300), kelvin(400)); });
    const auto whole = OwnMaterial::measured(Basis::total, {300, 400}, {5e6, 5e6});
    EXPECT_EQ(enthalpy_of_heating<Total>(whole, kelvin(300), kelvin(350)).value(), 2.5e8);
}

TEST(OwnMaterial, IsNamedWithoutMishap) {
    OwnMaterial m = alloy();
    EXPECT_EQ(m.written(), "the material from 300 to 2000 K");
    m.set_name("ladle lining № 4");
    EXPECT_EQ(m.written(), "ladle lining № 4");
    expect_refusal(unfit, "a\"b", "a name", [&] { m.set_name("a\"b"); });
    expect_refusal(unfit, "a", "a name", [&] { m.set_name("a\nb"); });
    expect_refusal(unfit, "x", "100 bytes", [&] { m.set_name(std::string(101, 'x')); });
    expect_refusal(impossible, "0", "above 0", [&] { m.set_molar_mass(MolarMass{}); });
}

// Newton's steps end in 200 even where a peak stands on a plain.
RC_GTEST_PROP(RisingRoot, ConvergesOnSteepCurves, ()) {
    std::vector<double> t{300}, cp{1e-3};
    for (int i = 0; i < 8; ++i) {
        t.push_back(t.back() + between(1e-3, 1000));
        cp.push_back(between(1e-6, 1e9));
    }
    const OwnMaterial m = OwnMaterial::measured(Basis::specific, t, cp);
    const double most = m.heating(m.from(), m.to()).enthalpy;
    const double heat = most * between(1e-15, 1);
    const double end = kelvin(m.end_of_heating(m.from(), heat).temperature);
    const double rounding = 1e-14 * most + 4e-16 * end * m.heat_capacity(end) * 10;
    RC_ASSERT(std::abs(m.heating(m.from(), end).enthalpy - heat) <= rounding);
}

} // namespace
