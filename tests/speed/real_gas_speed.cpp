// SPDX-License-Identifier: MPL-2.0
#include "core/constants.h"
#include "core/ratio.h"
#include "core/real_gas/real_gas.h"
#include "tests/speed/medians.h"

#include <cmath>

namespace {

using namespace core;
using namespace core::real_gas;

constexpr int points = 1000;
const Fluid carbon_dioxide = read_fluid("CO2");
const double r = gas_constant.value();

double temperature_of(int i) { return 330 + 0.1 * i; }
double pressure_of(int i) { return 20e5 + 4e3 * i; }

void step(benchmark::State& state) {
    for (auto _ : state)
        for (int i = 0; i < points; ++i)
            benchmark::DoNotOptimize(
                entropy_between(carbon_dioxide, Temperature::kelvin(300),
                                {Pressure::from_value(1e5)}, Temperature::kelvin(temperature_of(i)),
                                {Pressure::from_value(pressure_of(i))}, Equation::peng_robinson));
}

/// Real root of the cubic by Cardano and the entropy it gives, as one writes it for one substance.
double by_hand_departure(double t, double p) {
    constexpr double tc = 304.128, pc = 7377300,
                     m = 0.37464 + 1.54226 * 0.2239 - 0.26992 * 0.2239 * 0.2239;
    constexpr double sqrt2 = 1.4142135623730951;
    const double ac = 0.4572355289213822 * r * tc * r * tc / pc,
                 b = 0.07779607390388846 * r * tc / pc;
    const double root_tr = std::sqrt(t / tc), root_alpha = 1 + m * (1 - root_tr);
    const double a = ac * root_alpha * root_alpha, da = -ac * root_alpha * m * root_tr / t;
    const double A = a * p / (r * t * r * t), B = b * p / (r * t);
    const double c2 = B - 1, c1 = A - 3 * B * B - 2 * B, c0 = -(A * B - B * B - B * B * B);
    const double third = c2 / 3, P = c1 / 3 - third * third,
                 Q = -(c0 - c1 * third + 2 * third * third * third) / 2, D = Q * Q + P * P * P;
    double z;
    if (D >= 0) {
        const double u = std::cbrt(Q + std::copysign(std::sqrt(D), Q));
        z = u - P / u - third;
    } else {
        z = 2 * std::sqrt(-P) * std::cos(std::acos(Q / std::sqrt(-P * P * P)) / 3) - third;
    }
    return r * std::log(z - B) +
           da / (b * 2 * sqrt2) * std::log((z + (1 + sqrt2) * B) / (z + (1 - sqrt2) * B));
}

/// Two ideal evaluations and a cubic solve at the end; at the start too, or known from before.
template<bool both>
void with_solves(benchmark::State& state) {
    substances::Gas const& gas = carbon_dioxide.ideal_gas();
    const double known = by_hand_departure(300, 1e5);
    for (auto _ : state)
        for (int i = 0; i < points; ++i) {
            double t = temperature_of(i), p = pressure_of(i), t1 = 300, p1 = 1e5;
            benchmark::DoNotOptimize(t1);
            benchmark::DoNotOptimize(p1);
            const double ideal = gas.entropy(Temperature::kelvin(t)).value() -
                                 gas.entropy(Temperature::kelvin(t1)).value() - r * ln_ratio(p, p1);
            const double start = both ? by_hand_departure(t1, p1) : known;
            benchmark::DoNotOptimize(ideal + by_hand_departure(t, p) - start);
        }
}
void by_hand_one_solve(benchmark::State& state) { with_solves<false>(state); }
void by_hand_two_solves(benchmark::State& state) { with_solves<true>(state); }

BENCHMARK(step);
BENCHMARK(by_hand_one_solve);
BENCHMARK(by_hand_two_solves);

} // namespace

int main(int argc, char** argv) {
    const speed::Medians medians(argc, argv);
    medians.ratio("entropy between two states / one cubic solve, two ideal evaluations", "step",
                  "by_hand_one_solve", 1.5);
    medians.ratio("    / two cubic solves, as a step has two ends", "step", "by_hand_two_solves",
                  1.5);
}
