// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/quantities.h"
#include "core/substances/substance.h"
#include "core/temperature.h"

#include <vector>

namespace core::substances {

/// A point of a heating curve: enthalpy and entropy counted from its start.
struct CurvePoint {
    Temperature temperature;
    MolarHeatCapacity heat_capacity;
    MolarEnergy enthalpy;
    MolarEntropy entropy;
};

/// Refuses `to` not above `from`, fewer than 2 or more than 10,000 points (#NUM!).
void check_curve(Temperature from, Temperature to, std::size_t points);

/// Heating at 1 bar from one temperature to a higher one: `points` equally spaced temperatures, and
/// at every first-order transition between them two more, below and above, so that a chart has an
/// upright step there.
/// Refuses `to` not above `from`, fewer than 2 or more than 10,000 points, and what lies outside the
/// data (#NUM!).
/// Accuracy: that of enthalpy_of_heating and entropy_of_heating, of which every point is made.
std::vector<CurvePoint> heating_curve(Substance const& substance, Temperature from, Temperature to,
                                      std::size_t points);

} // namespace core::substances
