// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/materials/own_material.h"
#include "core/temperature.h"

#include <vector>

namespace core::materials {

/// A point of a heating curve in SI units of the material: enthalpy and entropy counted from the
/// start.
struct CurvePoint {
    double temperature, heat_capacity, enthalpy, entropy;
};

/// Heating from one temperature to a higher one: `points` equally spaced temperatures, and two more
/// at every transition, jump and joint of rows between them, below and above, so that a chart has an
/// upright step there.
/// Refuses `to` not above `from`, fewer than 2 or more than 10,000 points, and what lies outside the
/// material (#NUM!).
std::vector<CurvePoint> heating_curve(OwnMaterial const& material, Temperature from, Temperature to,
                                      std::size_t points);

} // namespace core::materials
