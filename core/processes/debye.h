// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/notes.h"
#include "core/quantities.h"
#include "core/temperature.h"

namespace core::processes {

/// Third Debye function D(y) = 3 / y^3 · ∫ t^3 / (e^t - 1) dt from 0 to y, for y above 0.
/// Source: P. Debye, Ann. Phys. 344 (1912) 789; sums for large y as in Abramowitz & Stegun 27.1.
/// Accuracy: 3 units in the last place, tests/core/processes/debye_test.cpp.
double debye_function(double y);

/// Entropy of a mole of atoms in a Debye crystal: R · (4 · D(θ/T) - 3 · ln(1 - exp(-θ/T))).
/// Source: P. Debye, Ann. Phys. 344 (1912) 789.
/// Valid: lattice vibrations at constant volume only; no electrons, no magnetism, no expansion.
/// Accuracy: 3 units in the last place, tests/core/processes/debye_test.cpp.
MolarEntropy debye_entropy(Temperature debye_temperature, Temperature temperature,
                           Notes const& notes = silent);

} // namespace core::processes
