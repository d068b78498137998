// SPDX-License-Identifier: MPL-2.0
#pragma once

// Water and steam in flow.

#include "core/steam/state.h"

#include <vector>

namespace core::steam {

/// Physical exergy of a flowing state: h - h0 - T0 · (s - s0).
/// Source: Rant 1956, Kotas, The Exergy Method of Thermal Plant Analysis (1985), chapter 2 (from memory).
SpecificEnergy exergy(State const& state, State const& surroundings, Notes const& notes = silent);

/// Isentropic efficiency of an adiabatic machine, told apart by the pressures: (h1 - h2)/(h1 - h2s) of a
/// turbine, (h2s - h1)/(h2 - h1) of a pump or compressor; wet ends included.
/// Refuses equal pressures, an end of less entropy than the beginning, and an enthalpy that goes the
/// wrong way (#NUM!).
Dimensionless efficiency_isentropic(State const& begin, State const& end,
                                    Notes const& notes = silent);

/// A point of the saturation curve.
struct SaturationPoint {
    Temperature temperature;
    Pressure pressure;
    SpecificEnergy liquid_enthalpy, vapour_enthalpy;
    SpecificEntropy liquid_entropy, vapour_entropy;
};

/// From the triple point to the critical point, equally spaced in temperature.
/// Refuses fewer than 2 or more than 10,000 points (#NUM!).
std::vector<SaturationPoint> saturation_curve(std::size_t points);

} // namespace core::steam
