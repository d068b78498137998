// SPDX-License-Identifier: MPL-2.0
#pragma once

// Ideal mixing of gases, liquids or crystals at one temperature and pressure.
// Notation: n amounts, x mole fractions, m masses, w mass fractions, M molar masses, T0 temperature
// of the surroundings.
// Source: Gibbs 1876; entropy of ideal mixing -R · Σ n ln x.
// Valid: no heat and no volume of mixing; parts that differ (mixing a gas with itself changes
// nothing).
// Method: fractions are normalised inside, so that a fraction moved for its uncertainty stays part
// of a whole; whether the stated ones sum to 1 is checked once, by check_sum_to_one. x = 0 adds
// nothing. ln x goes through log1p of the other amounts where x is near 1.

#include "core/column.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/temperature.h"

#include <string_view>
#include <vector>

namespace core::mixing {

/// Refuses stated fractions whose sum is not 1 within 1e-6 (#VALUE!).
void check_sum_to_one(Column<Dimensionless> fractions);

/// Entropy of mixing amounts: -R · Σ(n · ln(x)). Basis Total for amounts, Rate for molar flows,
/// Molar for mole fractions, where the result is per mole of mixture.
template<class Basis>
On<Entropy, Basis> entropy_of_mixing(Column<On<AmountOfSubstance, Basis>> amounts,
                                     Notes const& notes = silent);

/// The same from masses of named substances, n = m / M. Basis Total for masses, Rate for mass
/// flows, Specific for mass fractions, where the result is per kilogram of mixture.
template<class Basis>
On<Entropy, Basis> entropy_of_mixing_masses(Column<On<Mass, Basis>> masses, Formulas substances,
                                            Notes const& notes = silent);

/// Least work that separates a mixture into its pure parts: T0 · ΔS of mixing.
template<class Basis>
On<Energy, Basis> work_of_separation(Column<On<AmountOfSubstance, Basis>> amounts,
                                     Temperature surroundings, Notes const& notes = silent);

/// The same from masses of named substances.
template<class Basis>
On<Energy, Basis> work_of_separating_masses(Column<On<Mass, Basis>> masses,
                                            Temperature surroundings, Formulas substances,
                                            Notes const& notes = silent);

/// Mole fractions from mass fractions: x = (w / M) / Σ(w / M).
std::vector<double> mole_fractions(Column<Dimensionless> mass_fractions, Formulas substances,
                                   Notes const& notes = silent);

} // namespace core::mixing
