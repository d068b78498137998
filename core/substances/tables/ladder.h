// SPDX-License-Identifier: MPL-2.0
#pragma once

// Which phase follows which as the temperature rises at 1 bar.

#include "core/substances/tables/model.h"

#include <algorithm>
#include <cstdint>
#include <limits>

namespace tables {

namespace detail {

inline long double gibbs(Tables const& t, std::size_t phase, long double at) {
    Phase const& p = t.phases[phase];
    std::size_t i = p.first_interval;
    while (i + 1 < p.first_interval + p.interval_count && at > t.intervals[i].to) ++i;
    return gibbs_of<long double>(t.intervals[i], at);
}

/// Where the second phase, higher at `low`, comes to lie as low as the first.
inline double equal_gibbs(Tables const& t, std::size_t first, std::size_t second, long double low,
                          long double high) {
    for (int step = 0; step < 200; ++step) {
        const long double middle = (low + high) / 2;
        (gibbs(t, second, middle) > gibbs(t, first, middle) ? low : high) = middle;
    }
    return static_cast<double>(high);
}

inline double from(Tables const& t, std::size_t phase) {
    return t.intervals[t.phases[phase].first_interval].from;
}
inline double to(Tables const& t, std::size_t phase) {
    Phase const& p = t.phases[phase];
    return t.intervals[p.first_interval + p.interval_count - 1].to;
}

/// Where a condensed phase gives way to the next one: the table's temperature where the ranges
/// meet, equal Gibbs energies where they overlap.
inline double transition(Tables const& t, std::size_t low, std::size_t high) {
    if (to(t, low) <= from(t, high)) return to(t, low);
    const double begin = from(t, high), end = to(t, low);
    if (gibbs(t, high, begin) <= gibbs(t, low, begin)) return begin;
    if (gibbs(t, high, end) >= gibbs(t, low, end)) return end;
    return equal_gibbs(t, low, high, begin, end);
}

inline void append_rungs(Tables const& t, std::vector<Rung>& rungs, std::size_t phase, double begin,
                         double end) {
    Phase const& p = t.phases[phase];
    for (std::size_t i = p.first_interval; i < p.first_interval + p.interval_count; ++i) {
        Rung r{
            std::max(begin, t.intervals[i].from), std::min(end, t.intervals[i].to),  0,    0, 0, 0,
            static_cast<std::uint16_t>(i),        static_cast<std::uint16_t>(phase), false};
        if (!(r.from < r.to)) continue;
        if (!rungs.empty()) {
            Interval const &below = t.intervals[rungs.back().interval], &here = t.intervals[i];
            const long double at = r.from;
            r.gap = rungs.back().to < r.from;
            if (!r.gap) {
                r.enthalpy_jump =
                    static_cast<double>(enthalpy_of(here, at) - enthalpy_of(below, at));
                r.entropy_jump = static_cast<double>(entropy_of(here, at) - entropy_of(below, at));
            }
        }
        rungs.push_back(r);
    }
}

/// The first temperature of a rung, in steps of 10 K and at its end, at which the gas lies lower.
/// The end alone would not do: a liquid extrapolated far beyond its boiling point may win again.
inline double gas_lies_lower(Tables const& t, Rung const& r, std::size_t gas) {
    for (double at = std::max(r.from, from(t, gas)); at <= r.to; at += 10)
        if (gibbs(t, gas, at) < gibbs(t, r.phase, at)) return at;
    return gibbs(t, gas, r.to) < gibbs(t, r.phase, r.to) ? r.to : 0;
}

} // namespace detail

/// The rungs of some phases of one substance. A phase gives way to the next one where the ranges
/// meet, or where the Gibbs energies agree if they overlap.
inline std::vector<Rung> ladder(Tables const& t, std::vector<std::size_t> phases) {
    std::stable_sort(phases.begin(), phases.end(),
                     [&](auto a, auto b) { return detail::from(t, a) < detail::from(t, b); });
    std::vector<Rung> rungs;
    double begin = 0;
    for (std::size_t i = 0; i < phases.size(); ++i) {
        const double end = i + 1 < phases.size() ? detail::transition(t, phases[i], phases[i + 1])
                                                 : detail::to(t, phases[i]);
        detail::append_rungs(t, rungs, phases[i], begin, end);
        begin = std::max(end, i + 1 < phases.size() ? detail::from(t, phases[i + 1]) : end);
        if (i + 1 < phases.size() && end > detail::from(t, phases[i + 1])) begin = end;
    }
    return rungs;
}

/// Cuts the ladder of the condensed phases where the gas comes to have the least Gibbs energy.
/// Stops where it never does; `key` names the substance in the message.
inline std::vector<Rung> with_boiling(Tables const& t, std::vector<Rung> const& condensed,
                                      std::size_t gas, std::string const& key) {
    std::vector<Rung> rungs;
    for (Rung r : condensed) {
        rungs.push_back(r);
        const double end = detail::gas_lies_lower(t, r, gas);
        if (end == 0) continue;
        if (!(end > r.from)) stop(key + " is a gas from the beginning of a rung");
        rungs.back().to = detail::equal_gibbs(t, r.phase, gas, std::max(r.from, end - 10), end);
        detail::append_rungs(t, rungs, gas, rungs.back().to,
                             std::numeric_limits<double>::infinity());
        return rungs;
    }
    stop(key + " does not boil in its range");
}

} // namespace tables
