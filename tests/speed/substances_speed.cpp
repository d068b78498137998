// SPDX-License-Identifier: MPL-2.0
#include "core/substances/heating.h"
#include "registration/call.h"
#include "registration/catalogue/catalogue.h"
#include "tests/speed/medians.h"

#include <array>
#include <vector>

namespace {

using namespace core;
using namespace core::substances;
using registration::Block, registration::Cell, registration::Entry;

constexpr std::size_t rows = 100'000;

Temperature kelvin(double value) { return Temperature::kelvin(value); }

const Substance iron = find_substance("Fe");

// Both move, so that no part of the sums is the same in the next row.
double start_of(std::size_t row) { return 298.15 + 0.001 * static_cast<double>(row); }
double end_of(std::size_t row) { return 1810 + 0.01 * static_cast<double>(row); }

/// Iron from 298.15 K into the liquid: α → γ → δ → l, three transitions and two joints.
void heating_rows(benchmark::State& state) {
    for (auto _ : state)
        for (std::size_t row = 0; row < rows; ++row)
            benchmark::DoNotOptimize(
                entropy_of_heating(iron, kelvin(start_of(row)), kelvin(end_of(row))));
}

/// The same sum as one writes it by hand: the first piece and the last in closed form, what lies
/// between them already added up, the coefficients at hand.
void heating_by_hand_rows(benchmark::State& state) {
    const auto rungs = iron.rungs();
    std::size_t first = iron.rung_at(kelvin(start_of(0))), last = iron.rung_at(kelvin(2000));
    double between = 0;
    for (std::size_t i = first + 1; i <= last; ++i) {
        between += rungs[i].entropy_jump;
        if (i < last) between += rungs[i].entropy_across;
    }
    const Interval below = interval_of(rungs[first]), above = interval_of(rungs[last]);
    const double begin = rungs[first].to, end = rungs[last].from;
    for (auto _ : state)
        for (std::size_t row = 0; row < rows; ++row)
            benchmark::DoNotOptimize(entropy_between(below, start_of(row), begin) + between +
                                     entropy_between(above, end, end_of(row)));
}

/// Finding a substance: what stands first, in the middle and last in the sorted tables.
template<std::size_t at>
void look_up(benchmark::State& state) {
    const auto keys = formulas();
    const std::string_view text = keys[at * (keys.size() - 1) / 2].spelling;
    for (auto _ : state) benchmark::DoNotOptimize(find_substance(text));
}
void look_up_first(benchmark::State& state) { look_up<0>(state); }
void look_up_middle(benchmark::State& state) { look_up<1>(state); }
void look_up_last(benchmark::State& state) { look_up<2>(state); }
void look_up_by_name(benchmark::State& state) {
    for (auto _ : state) benchmark::DoNotOptimize(find_substance("water"));
}

/// The comparisons of a search by halves among so many keys, and nothing else.
template<std::size_t count>
void halve(benchmark::State& state) {
    const auto keys = formulas().first(count);
    for (auto _ : state)
        for (Key const& key : keys) {
            const auto found = std::ranges::lower_bound(keys, key.spelling, {}, &Key::spelling);
            benchmark::DoNotOptimize(found);
        }
}
void halve_64(benchmark::State& state) { halve<64>(state); }
void halve_256(benchmark::State& state) { halve<256>(state); }

void column_call(benchmark::State& state) {
    Entry const& entry = *registration::catalogue::find("ENTROPY.HEATING");
    std::vector<Cell> starts{{Cell::Kind::text, 0, "K"}}, ends = starts;
    for (std::size_t row = 0; row < rows; ++row) {
        starts.push_back({Cell::Kind::number, start_of(row), {}});
        ends.push_back({Cell::Kind::number, end_of(row), {}});
    }
    const Cell substance{Cell::Kind::text, 0, "Fe"};
    const std::array<Block, 5> blocks{Block{&substance, 1, 1}, Block{starts.data(), rows + 1, 1},
                                      Block{ends.data(), rows + 1, 1}};
    for (auto _ : state) benchmark::DoNotOptimize(registration::call(entry, blocks));
}

BENCHMARK(heating_rows);
BENCHMARK(heating_by_hand_rows);
BENCHMARK(look_up_first);
BENCHMARK(look_up_middle);
BENCHMARK(look_up_last);
BENCHMARK(look_up_by_name);
BENCHMARK(halve_64);
BENCHMARK(halve_256);
BENCHMARK(column_call);

} // namespace

int main(int argc, char** argv) {
    const speed::Medians medians(argc, argv);
    medians.ratio("ENTROPY.HEATING through three transitions / the sums by hand", "heating_rows",
                  "heating_by_hand_rows", 2);
    medians.time("a look-up, first formula of the table", "look_up_first");
    medians.ratio("a look-up, middle formula / first", "look_up_middle", "look_up_first", 1);
    medians.ratio("a look-up, last formula / first", "look_up_last", "look_up_first", 1);
    medians.ratio("a look-up, common name / first formula", "look_up_by_name", "look_up_first", 1);
    std::printf("%-66s %6.2f   aim %.2f\n",
                "a search among 256 keys / among 64, where a walk would give 4",
                medians.seconds("halve_256") / medians.seconds("halve_64") / 4, 1.33);
    medians.ratio("row of a column call / core: one look-up for 100,000 rows", "column_call",
                  "heating_rows", 1.5);
}
