// SPDX-License-Identifier: MPL-2.0
#include "core/processes/ideal_gas.h"
#include "core/processes/phase_change.h"
#include "core/text/quantity.h"
#include "registration/call.h"
#include "registration/catalogue/catalogue.h"
#include "tests/speed/medians.h"

#include <array>
#include <cmath>
#include <string>
#include <vector>

// Speed as ratios measured in one run; nothing here decides whether a test passes.

namespace {

using namespace core;
using registration::Block, registration::Cell, registration::Entry;

constexpr std::size_t rows = 100'000;

std::vector<double> ramp(double from, double step) {
    std::vector<double> values(rows);
    for (std::size_t i = 0; i < rows; ++i) values[i] = from + step * static_cast<double>(i);
    return values;
}

const std::vector<double> heats = ramp(1e4, 0.1), temperatures = ramp(300, 0.01),
                          ends = ramp(600, 0.01), pressures = ramp(1e5, 1),
                          end_pressures = ramp(5e5, 3);

double raw_fusion(double heat, double temperature) { return heat / temperature; }
double raw_gas(double cp, double T1, double p1, double T2, double p2) {
    return cp * ln_ratio(T2, T1) - gas_constant.value() * ln_ratio(p2, p1);
}

void raw_fusion_rows(benchmark::State& state) {
    for (auto _ : state)
        for (std::size_t i = 0; i < rows; ++i)
            benchmark::DoNotOptimize(raw_fusion(heats[i], temperatures[i]));
}
void typed_fusion_rows(benchmark::State& state) {
    for (auto _ : state)
        for (std::size_t i = 0; i < rows; ++i)
            benchmark::DoNotOptimize(processes::transition<Molar>(
                {MolarEnergy::from_value(heats[i])}, Temperature::kelvin(temperatures[i])));
}
void raw_gas_rows(benchmark::State& state) {
    for (auto _ : state)
        for (std::size_t i = 0; i < rows; ++i)
            benchmark::DoNotOptimize(
                raw_gas(29.1, temperatures[i], pressures[i], ends[i], end_pressures[i]));
}
void typed_gas_rows(benchmark::State& state) {
    for (auto _ : state)
        for (std::size_t i = 0; i < rows; ++i)
            benchmark::DoNotOptimize(processes::entropy_of_gas(
                {MolarEntropy::from_value(29.1)}, Temperature::kelvin(temperatures[i]),
                {Pressure::from_value(pressures[i])}, Temperature::kelvin(ends[i]),
                {Pressure::from_value(end_pressures[i])}));
}

void read_text(benchmark::State& state) {
    for (auto _ : state) benchmark::DoNotOptimize(text::read_quantity("7.3 kJ/mol"));
}

void whole_call(benchmark::State& state) {
    Entry const& entry = *registration::catalogue::find("ENTROPY.FUSION");
    const std::array<Cell, 6> cells{
        Cell{Cell::Kind::number, 7.3, {}}, Cell{Cell::Kind::text, 0, "kJ/mol"}, Cell{},
        Cell{Cell::Kind::number, 600, {}}, Cell{Cell::Kind::text, 0, "K"},      Cell{}};
    const Cell show{Cell::Kind::text, 0, "J/(mol·K)"};
    const std::array<Block, 4> blocks{Block{&cells[0], 1, 3}, Block{&cells[3], 1, 3}, Block{},
                                      Block{&show, 1, 1}};
    for (auto _ : state) benchmark::DoNotOptimize(registration::call(entry, blocks));
}

std::vector<Cell> headed(const char* unit, std::vector<double> const& values) {
    std::vector<Cell> cells{{Cell::Kind::text, 0, unit}};
    for (const double value : values) cells.push_back({Cell::Kind::number, value, {}});
    return cells;
}

void column_call(benchmark::State& state) {
    Entry const& entry = *registration::catalogue::find("ENTROPY.FUSION");
    const std::vector<Cell> heat = headed("J/mol", heats), temperature = headed("K", temperatures);
    const std::array<Block, 4> blocks{Block{heat.data(), rows + 1, 1},
                                      Block{temperature.data(), rows + 1, 1}, Block{}, Block{}};
    for (auto _ : state) benchmark::DoNotOptimize(registration::call(entry, blocks));
}

void gas_column_call(benchmark::State& state) {
    Entry const& entry = *registration::catalogue::find("ENTROPY.GAS");
    const std::vector<Cell> first = headed("K", temperatures), second = headed("K", ends);
    const Cell cp{Cell::Kind::text, 0, "29.1 J/(mol·K)"}, p1{Cell::Kind::text, 0, "1 bar"},
        p2{Cell::Kind::text, 0, "5 bar"};
    const std::array<Block, 7> blocks{Block{&cp, 1, 1}, Block{first.data(), rows + 1, 1},
                                      Block{&p1, 1, 1}, Block{second.data(), rows + 1, 1},
                                      Block{&p2, 1, 1}};
    for (auto _ : state) benchmark::DoNotOptimize(registration::call(entry, blocks));
}

BENCHMARK(raw_fusion_rows);
BENCHMARK(typed_fusion_rows);
BENCHMARK(raw_gas_rows);
BENCHMARK(typed_gas_rows);
BENCHMARK(read_text);
BENCHMARK(whole_call);
BENCHMARK(column_call);
BENCHMARK(gas_column_call);

} // namespace

int main(int argc, char** argv) {
    const speed::Medians medians(argc, argv);
    medians.ratio("typed core / raw doubles, ΔH / T", "typed_fusion_rows", "raw_fusion_rows", 1);
    medians.ratio("typed core / raw doubles, entropy of a gas", "typed_gas_rows", "raw_gas_rows",
                  1);
    medians.time("one text quantity read", "read_text", 0.1);
    medians.time("one whole call, value | unit twice and a show", "whole_call", 0.1);
    medians.ratio("row of a column call / core, ΔH / T (one division)", "column_call",
                  "typed_fusion_rows", 1.5);
    medians.ratio("row of a column call / core, entropy of a gas", "gas_column_call",
                  "typed_gas_rows", 1.5);
}
