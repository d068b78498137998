// SPDX-License-Identifier: MPL-2.0
#include "core/substances/heating.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/ratio.h"
#include "core/substances/transition.h"
#include "core/written.h"

#include <algorithm>
#include <cmath>
#include <span>
#include <string>
#include <string_view>

namespace core::substances {

namespace {

constexpr double near_transition = 1;

std::string name(Rung const& rung) { return std::string(phase_of(rung).name()); }

/// What is summed up on the way, heat or entropy.
struct Heat {
    using Quantity = MolarEnergy;
    static constexpr char const* integral = "∫cp dT = ";
    static double between(Interval const& i, double a, double b) {
        return enthalpy_between(i, a, b);
    }
    static double jump(Rung const& rung) { return rung.enthalpy_jump; }
    static double across(Rung const& rung) { return rung.enthalpy_across; }
};
struct EntropyTakenUp {
    using Quantity = MolarEntropy;
    static constexpr char const* integral = "∫cp/T dT = ";
    static double between(Interval const& i, double a, double b) {
        return entropy_between(i, a, b);
    }
    static double jump(Rung const& rung) { return rung.entropy_jump; }
    static double across(Rung const& rung) { return rung.entropy_across; }
};

template<class Taken>
void tell_stretch(Rung const& rung, double begin, double end, double part, Notes const& notes) {
    notes.step([&] {
        return name(rung) + " from " + written(begin) + " to " + written(end) +
               " K: " + Taken::integral + written(Taken::Quantity::from_value(part));
    });
}

void tell_transition(Rung const& below, Rung const& above, Notes const& notes) {
    notes.step([&] {
        return name(below) + " → " + name(above) + " at " + written(above.from) +
               " K: ΔH = " + written(MolarEnergy::from_value(above.enthalpy_jump)) +
               ", ΔS = " + written(MolarEntropy::from_value(above.entropy_jump));
    });
}

[[noreturn]] void refuse_gap(Substance const& substance, Rung const& below, Rung const& above) {
    refuse_impossible(substance.written(),
                      "a heating without the gap from " + written(below.to) + " to " +
                          written(above.from) + " K, where nothing is tabulated",
                      "stay on one side of the gap");
}

/// Two temperatures on the rungs of a substance, the lower one first.
struct Path {
    Path(Substance const& s, Temperature low, Temperature high)
        : substance(s), rungs(s.rungs()), first(s.rung_at(low)), last(s.rung_at(high)),
          begin(inside(rungs[first], low)), end(inside(rungs[last], high)) {}

    Substance substance;
    std::span<const Rung> rungs;
    std::size_t first, last;
    double begin, end;
};

/// Σ over the rungs of a path.
template<class Taken>
double taken_up(Path const& path) {
    Rung const *first = &path.rungs[path.first], *last = &path.rungs[path.last];
    if (first == last) return Taken::between(interval_of(*last), path.begin, path.end);
    double sum = Taken::between(interval_of(*first), path.begin, first->to);
    for (Rung const* rung = first + 1; rung <= last; ++rung) {
        if (rung->gap) refuse_gap(path.substance, *(rung - 1), *rung);
        sum += Taken::jump(*rung);
        if (rung != last) sum += Taken::across(*rung);
    }
    return sum + Taken::between(interval_of(*last), last->from, path.end);
}

/// The same, a step for each stretch of one phase and each transition.
template<class Taken>
void tell_stretches(Path const& path, Notes const& notes) {
    double part = 0, phase_begin = path.begin, begin = path.begin;
    for (std::size_t i = path.first; i <= path.last; ++i) {
        Rung const& rung = path.rungs[i];
        const double end = i == path.last ? path.end : rung.to;
        part += Taken::between(interval_of(rung), begin, end);
        begin = end;
        if (i < path.last && rung.phase == path.rungs[i + 1].phase) {
            part += Taken::jump(path.rungs[i + 1]);
            continue;
        }
        tell_stretch<Taken>(rung, phase_begin, end, part, notes);
        if (i < path.last) tell_transition(rung, path.rungs[i + 1], notes);
        part = 0;
        phase_begin = end;
    }
}

void remark_boilings(Path const& path, Notes const& notes) {
    for (std::size_t i = path.first; i < path.last; ++i)
        if (Rung const& below = path.rungs[i], &above = path.rungs[i + 1]; is_boiling(below, above))
            notes.remark([&] {
                return "passes from " + name(below) + " to g at " + written(above.from) +
                       " K, at 1 bar";
            });
}

void remark_notes(Path const& path, Notes const& notes) {
    for (std::size_t i = path.first; i <= path.last; ++i) {
        PhaseRow const& phase = detail::phase_data[path.rungs[i].phase];
        const bool told = i > path.first && path.rungs[i - 1].phase == path.rungs[i].phase;
        if (told || phase.note.empty()) continue;
        notes.remark([&] {
            return path.substance.written() + ", " + std::string(phase.name) + ": " +
                   std::string(phase.note);
        });
    }
    if (phase_of(path.rungs[path.last]).aggregation() != Aggregation::liquid) return;
    const std::string_view reason = path.substance.reason_gas_is_apart();
    if (reason.empty()) return;
    notes.remark([&] { return "boiling is not modelled: " + std::string(reason); });
}

void remark_near(Path const& path, std::size_t rung, double t, Notes const& notes) {
    // Only the ends of this rung and of its neighbours can be near.
    for (std::size_t i = std::max<std::size_t>(rung, 2) - 1;
         i < std::min(rung + 3, path.rungs.size()); ++i) {
        Rung const &below = path.rungs[i - 1], &above = path.rungs[i];
        if (below.phase == above.phase || above.gap) continue;
        if (std::abs(t - above.from) > near_transition) continue;
        notes.remark([&] {
            return written(t) + " K is within 1 K of " + name(below) + " → " + name(above) +
                   " at " + written(above.from) + " K; taken as " + name(path.rungs[rung]);
        });
    }
}

void remark_path(Path const& path, Notes const& notes) {
    remark_boilings(path, notes);
    remark_notes(path, notes);
    remark_near(path, path.first, path.begin, notes);
    if (path.begin != path.end) remark_near(path, path.last, path.end, notes);
}

template<class Taken>
typename Taken::Quantity heated(Substance const& substance, Temperature from, Temperature to,
                                Notes const& notes) {
    const bool cooling = to < from;
    const Path path(substance, cooling ? to : from, cooling ? from : to);
    const double sum = taken_up<Taken>(path);
    const auto result = Taken::Quantity::from_value(cooling ? -sum : sum);
    if (notes.hears_steps()) tell_stretches<Taken>(path, notes);
    notes.step(
        [&] { return (cooling ? "sum, negative for cooling: " : "sum: ") + written(result); });
    if (notes.hears_remarks()) remark_path(path, notes);
    return result;
}

} // namespace

MolarEntropy entropy_of_heating(Substance const& substance, Temperature from, Temperature to,
                                Notes const& notes) {
    return heated<EntropyTakenUp>(substance, from, to, notes);
}

MolarEnergy enthalpy_of_heating(Substance const& substance, Temperature from, Temperature to,
                                Notes const& notes) {
    return heated<Heat>(substance, from, to, notes);
}

void remark_state(Substance const& substance, Temperature t, Notes const& notes) {
    if (notes.hears_remarks()) remark_path(Path(substance, t, t), notes);
}

void tell_uncertainty(Substance const& substance, Temperature t, Notes const& notes) {
    if (!notes.hears_steps()) return;
    const MolarEntropy u = substance.entropy_uncertainty(t);
    if (u.value() > 0)
        notes.step([&] {
            return substance.written() + ": u = " + written(u) +
                   " of the entropy at 298.15 K, half of what CODATA Key Values for Thermodynamics "
                   "(1989) prints for 95 %";
        });
}

MolarHeatCapacity heat_capacity(Substance const& substance, Temperature temperature,
                                Notes const& notes) {
    const MolarHeatCapacity cp = substance.heat_capacity(temperature);
    notes.step([&] { return "phase: " + std::string(substance.phase_at(temperature).name()); });
    remark_state(substance, temperature, notes);
    return cp;
}

MolarEntropy entropy_standard(Substance const& substance, Temperature temperature,
                              std::optional<Positive<Pressure>> pressure, Notes const& notes) {
    const Phase phase = substance.phase_at(temperature);
    const MolarEntropy at_one_bar = substance.entropy(temperature);
    notes.step([&] { return std::string(phase.name()) + " at 1 bar: " + written(at_one_bar); });
    remark_state(substance, temperature, notes);
    tell_uncertainty(substance, temperature, notes);
    notes.uncertainty([&] { return substance.entropy_uncertainty(temperature).value(); });
    if (!pressure) return at_one_bar;
    if (phase.aggregation() != Aggregation::gas)
        refuse_unfit(written(pressure->value),
                     "no pressure for " + substance.written() + " in its phase " +
                         std::string(phase.name()) + ", as only the entropy of a gas depends on it",
                     "leave the pressure out, or write `(g)` where the gas is meant");
    if (!substance.is_gas())
        notes.remark([&] {
            return substance.written() + " is taken as the gas, its stable phase at 1 bar and " +
                   written(temperature);
        });
    const MolarEntropy term = gas_constant * ln_ratio(pressure->value, standard_pressure);
    notes.step([&] { return "R · ln(p / 1 bar) = " + written(term); });
    return at_one_bar - term;
}

} // namespace core::substances
