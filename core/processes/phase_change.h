// SPDX-License-Identifier: MPL-2.0
#pragma once

// Notation: ΔH enthalpy of the transition, T its temperature, ΔS its entropy.

#include "core/conditions.h"
#include "core/quantities.h"
#include "core/temperature.h"

namespace core::processes {

/// Entropy of a first-order transition at equilibrium: ΔS = ΔH / T.
/// Source: both phases have the same Gibbs energy there, ΔG = ΔH - T·ΔS = 0.
/// Valid: melting, boiling and change of crystal at the equilibrium temperature of the pressure
/// that ΔH belongs to; not for undercooled melts or superheated crystals.
/// Accuracy: one rounding.
template<class Basis>
On<Entropy, Basis> transition(Positive<On<Energy, Basis>> enthalpy, Temperature temperature) {
    return enthalpy.value / absolute(temperature);
}

} // namespace core::processes
