// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/steam/state.h"

#include <cstdint>
#include <string_view>

namespace core::steam {

/// One of two quantities that fix a state; which it is follows from its dimension.
struct Coordinate {
    enum class Kind : std::uint8_t { temperature, pressure, enthalpy, entropy, volume, dryness };

    Kind kind;
    double si;
};

/// The dryness that words name, in any case, as AutoCorrect raises first letters: `saturated liquid` 0,
/// `saturated vapour` 1. Refuses others (#VALUE!).
Coordinate read_dryness(std::string_view words);

/// The state that both fix, in either order. Refuses pairs that fix none or that the formulation cannot
/// be asked for, saying which decide (#VALUE!); values that cannot be (#NUM!).
State state_at(Coordinate first, Coordinate second, Notes const& notes = silent);

} // namespace core::steam
