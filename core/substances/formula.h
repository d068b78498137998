// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/atomic_weights.h"

#include <string>
#include <string_view>
#include <vector>

namespace core::substances {

/// An element of a formula and how often it stands in it.
struct Part {
    Element const* element;
    double count;
};

/// A chemical formula taken apart: every element once, in the order it first appears.
struct Composition {
    std::vector<Part> parts;
    std::string note; ///< what the reader mended (a capital lowered by AutoCorrect), else empty
};

/// Reads a chemical formula: `Fe2O3`, `Fe0.947O`, `Ca(OH)2`, `[Cu(NH3)4]SO4`, `CuSO4·5H2O`, `H₂O`,
/// with a state of matter behind it or without, `H2O(g)`. The grammar stands in formula.cpp.
/// Throws Failure (unfit) with one repair.
/// Bounds: 200 characters, 8 brackets deep, counts from above 0 to 1e6.
Composition read_formula(std::string_view formula);

/// Molar mass of a formula: Σ(count · atomic weight).
/// Source: abridged standard atomic weights 2021, see atomic_weights.h.
/// Accuracy: that of the abridged weights; the sum is rounded to double once.
MolarMass molar_mass(std::string_view formula, Notes const& notes = silent);

} // namespace core::substances
