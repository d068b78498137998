// SPDX-License-Identifier: MPL-2.0
#pragma once

// The entropy balance of a system: what it gained, less what heat brought in, was generated.
// Notation: ΔS entropy changes; Q heats into the system; T temperatures of the boundary there.

#include "core/column.h"
#include "core/conditions.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/temperature.h"

#include <cstdint>
#include <optional>

namespace core::balance {

/// Entropy generated: Σ(ΔS) - Σ(Q / T), the signed number always; a deficit beyond rounding is
/// remarked. `heats` and `temperatures` are given together, one for one, or not at all.
/// Source: Clausius 1865; the sum over a system's boundary of δQ/T never exceeds its ΔS.
/// Accuracy: compensated sum (Neumaier 1974), a few roundings of the largest term.
template<class Basis>
On<Entropy, Basis> entropy_generated(Column<On<Entropy, Basis>> changes,
                                     std::optional<Column<On<Energy, Basis>>> heats,
                                     std::optional<Column<Temperature>> temperatures,
                                     Notes const& notes = silent);

/// What the second law says of a stated balance.
enum class Verdict : std::uint8_t { irreversible, reversible_within_the_tolerance, impossible };

/// Judges the balance of entropy_generated. Within the margin of zero the step is reversible as far
/// as can be told, above it irreversible, below it impossible.
/// The margin is rounding, 1e-12 of the sum of magnitudes; plus twice the combined standard
/// uncertainty, u² = Σ u(ΔS)² + Σ (u(Q)/T)² + Σ (Q·u(T)/T²)²; plus the tolerance.
/// Source of the uncertainty: JCGM 100:2008, 5.1.2 (inputs independent); coverage factor 2, 6.3.3.
template<class Basis>
Verdict second_law_verdict(Column<Uncertain<On<Entropy, Basis>>> changes,
                           std::optional<Column<Uncertain<On<Energy, Basis>>>> heats,
                           std::optional<Column<Uncertain<Temperature>>> temperatures,
                           std::optional<NonNegative<On<Entropy, Basis>>> tolerance,
                           Notes const& notes = silent);

} // namespace core::balance
