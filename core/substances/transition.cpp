// SPDX-License-Identifier: MPL-2.0
#include "core/substances/transition.h"

#include "core/failure.h"
#include "core/substances/heating.h"
#include "core/written.h"

#include <cmath>
#include <limits>

namespace core::substances {

namespace {

Transition transition_at(std::span<const Rung> rungs, std::size_t above) {
    return {phase_of(rungs[above - 1]), phase_of(rungs[above]),
            Temperature::kelvin(rungs[above].from),
            MolarEnergy::from_value(rungs[above].enthalpy_jump),
            MolarEntropy::from_value(rungs[above].entropy_jump)};
}

Transition told(Substance const& substance, Transition const& t, Notes const& notes) {
    notes.step([&] {
        return std::string(t.below.name()) + " → " + std::string(t.above.name()) +
               ": T = " + written(t.temperature) + ", ΔH = " + written(t.enthalpy);
    });
    for (Phase phase : {t.below, t.above})
        if (!phase.note().empty())
            notes.remark([&] {
                return substance.written() + ", " + std::string(phase.name()) + ": " +
                       std::string(phase.note());
            });
    return t;
}

/// The first transition between these kinds of phases; a count of rungs where there is none.
std::size_t find(std::span<const Rung> rungs, Aggregation below, Aggregation above) {
    for (std::size_t i = 1; i < rungs.size(); ++i)
        if (is_first_order(rungs[i - 1], rungs[i]) &&
            phase_of(rungs[i - 1]).aggregation() == below &&
            phase_of(rungs[i]).aggregation() == above)
            return i;
    return rungs.size();
}

} // namespace

bool is_first_order(Rung const& below, Rung const& above) {
    return below.phase != above.phase && !above.gap && above.entropy_jump > 0.01;
}

Transition fusion(Substance const& substance, Notes const& notes) {
    const auto rungs = substance.rungs();
    const std::size_t at = find(rungs, Aggregation::crystal, Aggregation::liquid);
    if (at == rungs.size())
        refuse_impossible(substance.written(), "a substance whose melting is in the tables",
                          "give the enthalpy of fusion and the melting temperature");
    return told(substance, transition_at(rungs, at), notes);
}

Transition vaporization(Substance const& substance, Notes const& notes) {
    const auto rungs = substance.rungs();
    const std::size_t at = find(rungs, Aggregation::liquid, Aggregation::gas);
    if (at < rungs.size()) return told(substance, transition_at(rungs, at), notes);
    const std::string_view reason = substance.reason_gas_is_apart();
    const bool sublimes = find(rungs, Aggregation::crystal, Aggregation::gas) < rungs.size();
    refuse_impossible(substance.written() + (reason.empty() ? "" : ": " + std::string(reason)),
                      sublimes ? "a liquid that boils at 1 bar, where this crystal sublimes"
                               : "a substance whose boiling is in the tables",
                      sublimes ? "use ENTROPY.TRANSITION"
                               : "give the enthalpy of vaporization and the boiling temperature");
}

Transition transition_near(Substance const& substance, Temperature temperature,
                           Notes const& notes) {
    const auto rungs = substance.rungs();
    std::size_t nearest = rungs.size();
    double least = std::numeric_limits<double>::infinity();
    for (std::size_t i = 1; i < rungs.size(); ++i) {
        const double distance = std::abs(rungs[i].from - absolute(temperature).value());
        if (!is_first_order(rungs[i - 1], rungs[i]) || distance >= least) continue;
        least = distance;
        nearest = i;
    }
    if (nearest == rungs.size())
        refuse_impossible(substance.written(), "a substance with a transition in the tables",
                          "give the enthalpy and the temperature of the transition");
    return told(substance, transition_at(rungs, nearest), notes);
}

} // namespace core::substances
