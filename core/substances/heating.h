// SPDX-License-Identifier: MPL-2.0
#pragma once

// Heating at 1 bar with variable heat capacity, through every transition on the way.
// Notation: cp molar heat capacity, T temperature, ΔH and ΔS of a transition, R gas constant.
// Steps: each stretch of one phase, each transition, and the sum. Remarks: boiling passed, an end
// within 1 K of a transition, oddities of the data.

#include "core/conditions.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/substance.h"
#include "core/temperature.h"

#include <optional>

namespace core::substances {

/// Entropy taken up by heating from T1 to T2: Σ ∫cp/T dT + Σ ΔS; cooling is the negative.
/// Method: in closed form, interval by interval, from the differences of the terms, so that close
/// temperatures keep their digits.
/// Accuracy: 1e-12 against quadrature in 50 digits, tests/core/substances/heating_test.cpp.
MolarEntropy entropy_of_heating(Substance const& substance, Temperature from, Temperature to,
                                Notes const& notes = silent);

/// Heat taken up on the way: Σ ∫cp dT + Σ ΔH; cooling is the negative.
MolarEnergy enthalpy_of_heating(Substance const& substance, Temperature from, Temperature to,
                                Notes const& notes = silent);

/// Heat capacity at 1 bar of the stable phase.
MolarHeatCapacity heat_capacity(Substance const& substance, Temperature temperature,
                                Notes const& notes = silent);

/// Absolute entropy at 1 bar; of a gas at another pressure less R · ln(p / 1 bar).
/// Refuses a pressure for a condensed phase (#VALUE!).
MolarEntropy entropy_standard(Substance const& substance, Temperature temperature,
                              std::optional<Positive<Pressure>> pressure = std::nullopt,
                              Notes const& notes = silent);

/// Tells the published uncertainty of the absolute entropy, where there is one.
void tell_uncertainty(Substance const& substance, Temperature temperature, Notes const& notes);

/// Makes the remarks that hold for a state of the substance.
void remark_state(Substance const& substance, Temperature temperature, Notes const& notes);

} // namespace core::substances
