// SPDX-License-Identifier: MPL-2.0
#pragma once

// States from quantities the basic equations do not take, in SI numbers. Along an isobar or an isotherm
// regions follow each other; the stretch on which the quantity lies is closed in until the basic
// equation gives it. Backward equations only start the search.

#include "core/steam/equations.h"
#include "core/steam/saturation.h"

#include <cstdint>
#include <optional>

namespace core::steam {

/// Numbers as in the release.
enum class Region : std::uint8_t { liquid = 1, vapour = 2, dense = 3, two_phase = 4, hot = 5 };

/// The lowest pressure that states are looked for at, Pa. The formulation itself goes down to 0.
inline constexpr double lowest_pressure = 1e-3;

/// A state, wet ones by their two phases.
struct Found {
    Region region;
    double t, p, v, h, s;
    std::optional<double> dryness = {};
};

enum class Quantity : std::uint8_t { enthalpy, entropy, volume };

Found at_point(Region, double t, double p, Side = Side::liquid);
Found mixed(double t, double p, double dryness);

/// Refuses what lies outside the formulation (#NUM!) and a volume of cold water that two temperatures
/// have (#VALUE!). Accuracy: 1e-9 relative, tests/core/steam/state_test.cpp.
Found on_isobar(double p, Quantity, double target);
/// By entropy or volume. Refuses an entropy of cold water that several pressures have (#VALUE!).
Found on_isotherm(double t, Quantity, double target);
Found on_isentrope(double s, double enthalpy);

} // namespace core::steam
