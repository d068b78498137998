// SPDX-License-Identifier: MPL-2.0
#include "core/balance/second_law.h"
#include "core/processes/ideal_gas.h"
#include "core/substances/gas.h"

#include <gtest/gtest.h>

#include <array>
#include <cmath>
#include <random>
#include <string>

// A million steps that can happen, and their mirrors, which cannot: what any plant is made of, judged by
// the balance. No step may come out below zero beyond rounding, no mirror may pass.

namespace {

using namespace core;
using namespace core::balance;

Temperature kelvin(double t) { return Temperature::kelvin(t); }
Positive<Pressure> pascal(double p) { return {Pressure::from_value(p)}; }

/// Changes of entropy, heats and boundary temperatures of one step; unused heats are zero.
struct Step {
    std::array<double, 2> changes{};
    double heat = 0, boundary = 300;

    Verdict verdict(double sign) const {
        const std::array<double, 2> signed_changes{sign * changes[0], sign * changes[1]};
        const double signed_heat = sign * heat;
        return second_law_verdict<Total>(
            Column<Uncertain<Entropy>>{signed_changes.data(), nullptr, 2},
            Column<Uncertain<Energy>>{&signed_heat, nullptr, 1},
            Column<Uncertain<Temperature>>{&boundary, nullptr, 1}, std::nullopt);
    }
};

class Plant {
public:
    Step step() {
        switch (engine_() % 6) {
        case 0:
            return heating();
        case 1:
            return mixing();
        case 2:
            return throttling();
        case 3:
            return heat_exchange();
        case 4:
            return machine_of_constant_gas();
        default:
            return machine_of_real_mixture();
        }
    }

private:
    double between(double low, double high) {
        return low * std::pow(high / low, static_cast<double>(engine_()) / 4294967295.0);
    }
    double temperature() { return between(220, 1500); }

    /// A body heated across a boundary at least as hot as it becomes, or cooled across one as cold.
    Step heating() {
        const double c = between(0.1, 1e5), from = temperature(), to = temperature();
        const double boundary = to > from ? to * between(1, 2) : to / between(1, 2);
        return {{c * std::log(to / from), 0}, c * (to - from), boundary};
    }
    /// Two ideal gases mixed at one temperature and pressure.
    Step mixing() {
        const double n = between(1e-3, 1e3), x = between(1e-6, 0.999999), r = gas_constant.value();
        return {{-n * r * x * std::log(x), -n * r * (1 - x) * std::log1p(-x)}};
    }
    /// An ideal gas let down without work and heat.
    Step throttling() {
        const double p = between(1e3, 1e8), n = between(1e-3, 1e3), t = temperature();
        return {
            {n * processes::entropy_of_gas({MolarEntropy::from_value(between(21, 100))}, kelvin(t),
                                           pascal(p), kelvin(t), pascal(p / between(1, 1e3)))
                     .value(),
             0}};
    }
    /// Two streams in counterflow, temperatures not crossing at either end.
    Step heat_exchange() {
        const double a = temperature(), b = temperature(), hot = std::max(a, b),
                     cold = std::min(a, b);
        const double hot_rate = between(0.1, 100), cold_rate = between(0.1, 100);
        const double most = std::min(hot_rate, cold_rate) * (hot - cold);
        const double heat = most * between(1e-6, 1);
        return {{hot_rate * std::log1p(-heat / hot_rate / hot),
                 cold_rate * std::log1p(heat / cold_rate / cold)}};
    }
    /// A compressor or turbine of efficiency below 1, by the relation of constant heat capacity.
    Step machine_of_constant_gas() {
        const Positive<MolarHeatCapacity> cp{MolarEntropy::from_value(between(25, 60))};
        const double t = temperature(), p1 = between(1e4, 1e7), p2 = between(1e4, 1e7);
        const Temperature end = processes::temperature_adiabatic(
            cp, kelvin(t), pascal(p1), pascal(p2), Efficiency{between(0.3, 0.999)});
        return {
            {processes::adiabatic_generation(cp, kelvin(t), pascal(p1), end, pascal(p2)).value(),
             0}};
    }
    /// The same of a gas of the tables.
    Step machine_of_real_mixture() {
        substances::Gas const& gas = gases_[engine_() % gases_.size()];
        const double t = between(350, 900), p1 = between(1e5, 1e6), p2 = p1 * between(0.2, 5);
        const Temperature end = substances::temperature_adiabatic(
            gas, kelvin(t), pascal(p1), pascal(p2), Efficiency{between(0.5, 0.999)});
        return {
            {substances::adiabatic_generation(gas, kelvin(t), pascal(p1), end, pascal(p2)).value(),
             0}};
    }

    std::mt19937 engine_{20261201};
    std::array<substances::Gas, 3> gases_{substances::read_gas("N2"), substances::read_gas("CO2"),
                                          substances::read_gas("0.79 N2 + 0.21 O2")};
};

TEST(SecondLaw, PassesAMillionStepsAndNoneOfTheirMirrors) {
    Plant plant;
    int irreversible = 0;
    for (int i = 0; i < 1'000'000; ++i) {
        const Step step = plant.step();
        const Verdict forward = step.verdict(1);
        ASSERT_NE(forward, Verdict::impossible) << i;
        if (forward != Verdict::irreversible) continue;
        ++irreversible;
        ASSERT_EQ(step.verdict(-1), Verdict::impossible) << i;
    }
    EXPECT_GT(irreversible, 990'000);
}

} // namespace
