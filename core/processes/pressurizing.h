// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/conditions.h"
#include "core/quantities.h"

namespace core::processes {

/// Entropy of a liquid or solid pressed isothermally from p1 to p2: -V · β · (p2 - p1).
/// Source: Maxwell relation (∂S/∂p)_T = -(∂V/∂T)_p = -V·β.
/// Valid: V and β nearly constant over the pressures; β may be negative (water below 4 °C).
template<class Basis>
On<Entropy, Basis> pressurizing(Positive<On<Volume, Basis>> volume, Expansivity expansivity,
                                Positive<Pressure> from, Positive<Pressure> to) {
    return -(volume.value * expansivity * (to.value - from.value));
}

} // namespace core::processes
