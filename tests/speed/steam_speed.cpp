// SPDX-License-Identifier: MPL-2.0
#include "core/steam/equations.h"
#include "core/steam/inverse.h"
#include "core/steam/terms.h"
#include "tests/speed/medians.h"

#include <cmath>

namespace {

using namespace core::steam;

constexpr int points = 1000;

/// Σ n·x^I·y^J and its derivative by y as a program writes them that reads the release line by line.
struct Sum {
    double value = 0, by_y = 0;
};
template<auto const& table, std::size_t first = 0>
Sum with_pow(double x, double y) {
    Sum sum;
    for (std::size_t k = first; k < table.size(); ++k) {
        Term const& term = table[k];
        sum.value += term.n * std::pow(x, term.i) * std::pow(y, term.j);
        sum.by_y += term.n * std::pow(x, term.i) * term.j * std::pow(y, term.j - 1);
    }
    return sum;
}

constexpr double r = specific_gas_constant;

double pow_entropy_1(double t, double p) {
    const double tau = 1386 / t;
    const Sum q = with_pow<tables::region_1>(7.1 - p / 16.53e6, tau - 1.222);
    return r * (tau * q.by_y - q.value);
}
double pow_entropy_2(double t, double p) {
    const double pi = p / 1e6, tau = 540 / t;
    const Sum o = with_pow<tables::region_2_ideal>(1, tau),
              q = with_pow<tables::region_2_residual>(pi, tau - 0.5);
    return r * (tau * (o.by_y + q.by_y) - (std::log(pi) + o.value + q.value));
}
double pow_entropy_3(double density, double t) {
    const double delta = density / 322, tau = 647.096 / t;
    const Sum q = with_pow<tables::region_3, 1>(delta, tau);
    return r * (tau * q.by_y - tables::region_3[0].n * std::log(delta) - q.value);
}
double pow_entropy_5(double t, double p) {
    const double pi = p / 1e6, tau = 1000 / t;
    const Sum o = with_pow<tables::region_5_ideal>(1, tau),
              q = with_pow<tables::region_5_residual>(pi, tau);
    return r * (tau * (o.by_y + q.by_y) - (std::log(pi) + o.value + q.value));
}

template<auto entropy>
void run(benchmark::State& state, double x, double x_step, double y) {
    for (auto _ : state)
        for (int i = 0; i < points; ++i) benchmark::DoNotOptimize(entropy(x + x_step * i, y));
}

void written_out_1(benchmark::State& state) { run<entropy_1>(state, 300, 0.2, 20e6); }
void pow_1(benchmark::State& state) { run<pow_entropy_1>(state, 300, 0.2, 20e6); }
void written_out_2(benchmark::State& state) { run<entropy_2>(state, 500, 0.5, 1e6); }
void pow_2(benchmark::State& state) { run<pow_entropy_2>(state, 500, 0.5, 1e6); }
void written_out_3(benchmark::State& state) { run<entropy_3>(state, 200, 0.3, 660); }
void pow_3(benchmark::State& state) { run<pow_entropy_3>(state, 200, 0.3, 660); }
void written_out_5(benchmark::State& state) { run<entropy_5>(state, 1100, 1, 1e6); }
void pow_5(benchmark::State& state) { run<pow_entropy_5>(state, 1100, 1, 1e6); }

double temperature_of(double s, double p) { return on_isobar(p, Quantity::entropy, s).t; }

void temperature_1(benchmark::State& state) { run<temperature_of>(state, 1000, 2, 20e6); }
void temperature_2(benchmark::State& state) { run<temperature_of>(state, 6700, 2, 1e6); }
void temperature_wet(benchmark::State& state) { run<temperature_of>(state, 2500, 3, 1e6); }

BENCHMARK(written_out_1);
BENCHMARK(pow_1);
BENCHMARK(written_out_2);
BENCHMARK(pow_2);
BENCHMARK(written_out_3);
BENCHMARK(pow_3);
BENCHMARK(written_out_5);
BENCHMARK(pow_5);
BENCHMARK(temperature_1);
BENCHMARK(temperature_2);
BENCHMARK(temperature_wet);

} // namespace

int main(int argc, char** argv) {
    const speed::Medians medians(argc, argv);
    medians.ratio("s(T,p) of region 1 with std::pow / written out", "pow_1", "written_out_1", 5);
    medians.ratio("s(T,p) of region 2 with std::pow / written out", "pow_2", "written_out_2", 5);
    medians.ratio("s(ρ,T) of region 3 with std::pow / written out", "pow_3", "written_out_3", 5);
    medians.ratio("s(T,p) of region 5 with std::pow / written out", "pow_5", "written_out_5", 5);
    medians.ratio("T(p,s) / s(T,p), liquid", "temperature_1", "written_out_1");
    medians.ratio("T(p,s) / s(T,p), vapour", "temperature_2", "written_out_2");
    medians.ratio("T(p,s) of wet steam / s(T,p) of vapour", "temperature_wet", "written_out_2");
}
