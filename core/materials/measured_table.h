// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/materials/cubic_piece.h"
#include "core/materials/stretches.h"

#include <span>

namespace core::materials {

/// A measured heat capacity as a curve: temperatures in kelvin that rise, heat capacities in SI
/// units above zero. Two rows at one temperature state a jump; each side of it is a curve of its
/// own.
/// Method: a cubic between any two rows, smooth in its slope, rising where the rows rise, falling
/// where they fall, and never beyond either row. Slopes are the weighted harmonic means of the
/// slopes of the chords beside a row, at the ends of a curve three-point formulas; two rows make a
/// straight line.
/// Source: F. N. Fritsch, J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300, equations 5 and 6.
/// Refuses temperatures that fall, a third row at one temperature, a jump without a curve on both
/// sides, fewer than two rows, more than 10,000, blank cells (NaN) (#VALUE!); heat capacities that
/// are not above zero (#NUM!).
Stretches<CubicPiece> measured_table(std::span<const double> temperatures,
                                     std::span<const double> heat_capacities);

} // namespace core::materials
