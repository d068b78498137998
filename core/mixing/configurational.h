// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/column.h"
#include "core/notes.h"
#include "core/quantities.h"

#include <optional>

namespace core::mixing {

/// Refuses stated site fractions of which a column does not sum to 1 within 1e-6 (#VALUE!).
void check_columns_sum_to_one(Table fractions);

/// Configurational entropy of an alloy or compound with sublattices, per mole of formula units:
/// -R · Σ(a · Σ(x · ln(x))), the fractions x of a sublattice in one column, blank cells left out;
/// `sites` holds the multiplicity a of each sublattice, 1 if left out.
/// Source: Boltzmann 1877; for sublattices the ideal term of M. Hillert, L.-I. Staffansson,
/// Acta Chem. Scand. 24 (1970) 3618 (from memory).
/// Valid: random mixing within each sublattice.
/// Method: fractions are normalised inside, column by column.
MolarEntropy configurational_entropy(Table fractions, std::optional<Column<Dimensionless>> sites,
                                     Notes const& notes = silent);

} // namespace core::mixing
