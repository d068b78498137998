// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <benchmark/benchmark.h>

#include <cstdio>
#include <map>
#include <string>
#include <vector>

// Speed as ratios of medians measured in one run; nothing here decides whether a test passes.

namespace speed {

/// Runs every registered benchmark a few times and keeps the median of each.
class Medians {
public:
    Medians(int argc, char** argv) {
        // There must be some runs to take the median of.
        std::vector<char*> arguments(argv, argv + argc);
        std::string repetitions = "--benchmark_repetitions=5",
                    aggregates = "--benchmark_report_aggregates_only=true";
        arguments.insert(arguments.begin() + 1, {repetitions.data(), aggregates.data()});
        int count = static_cast<int>(arguments.size());
        benchmark::Initialize(&count, arguments.data());
        Reporter reporter(seconds_);
        benchmark::RunSpecifiedBenchmarks(&reporter);
    }

    double seconds(const char* name) const {
        const auto found = seconds_.find(name);
        return found == seconds_.end() ? 0 : found->second;
    }
    void ratio(const char* what, const char* a, const char* b, double aim) const {
        std::printf("%-66s %6.2f   aim %.2f\n", what, seconds(a) / seconds(b), aim);
    }
    void ratio(const char* what, const char* a, const char* b) const {
        std::printf("%-66s %6.2f\n", what, seconds(a) / seconds(b));
    }
    void time(const char* what, const char* name, double aim) const {
        std::printf("%-66s %6.3f µs aim %.3f\n", what, seconds(name) * 1e6, aim);
    }
    void time(const char* what, const char* name) const {
        std::printf("%-66s %6.3f µs\n", what, seconds(name) * 1e6);
    }

private:
    using Seconds = std::map<std::string, double>;

    class Reporter : public benchmark::ConsoleReporter {
    public:
        explicit Reporter(Seconds& seconds) : seconds_(seconds) {}
        void ReportRuns(std::vector<Run> const& runs) override {
            ConsoleReporter::ReportRuns(runs);
            for (Run const& run : runs)
                if (run.aggregate_name == "median")
                    seconds_[run.run_name.function_name] = run.GetAdjustedRealTime() * 1e-9;
        }

    private:
        Seconds& seconds_;
    };

    Seconds seconds_;
};

} // namespace speed
