// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/substance.h"
#include "core/temperature.h"

namespace core::substances {

/// A first-order transition at 1 bar: ΔS is the difference of the entropies of both phases.
struct Transition {
    Phase below, above;
    Temperature temperature;
    MolarEnergy enthalpy;
    MolarEntropy entropy;
};

/// Melting. Refuses a substance of which no crystal turns into a liquid in the tables (#NUM!).
Transition fusion(Substance const& substance, Notes const& notes = silent);

/// Boiling at 1 bar. Refuses a substance that does not boil in the tables, and one that sublimes.
Transition vaporization(Substance const& substance, Notes const& notes = silent);

/// The transition nearest to a temperature; of two equally near ones the lower.
Transition transition_near(Substance const& substance, Temperature temperature,
                           Notes const& notes = silent);

/// Whether the upper of two neighbouring rungs is the vapour of the lower.
inline bool is_boiling(Rung const& below, Rung const& above) {
    return phase_of(above).aggregation() == Aggregation::gas &&
           phase_of(below).aggregation() != Aggregation::gas;
}

/// Whether entropy jumps between two neighbouring rungs by more than rounding: magnetic and other
/// second-order changes have none (0.0032 J/(mol·K) at most in the data, 0.11 the least else).
bool is_first_order(Rung const& below, Rung const& above);

} // namespace core::substances
