// SPDX-License-Identifier: MPL-2.0
#pragma once

// Water and steam: a state fixed by two quantities.
// Source: International Association for the Properties of Water and Steam, R7-97(2012), and SR3-03(2014)
// for where the search in region 3 starts.
// Valid: 273.15 K to 1073.15 K up to 100 MPa, to 2273.15 K up to 50 MPa; stable water and steam and
// their mixtures, no ice.
// Accuracy: verification values of the releases to every printed digit; the quantities that fix a state
// are given back to 1e-9 relative; tests/core/steam. Between regions the release allows steps, of
// enthalpy 0.2 kJ/kg at most.
// Steps: the region, the numbers of its equations and the reduced variables. Remarks: the phase taken
// within 1 K of saturation.

#include "core/conditions.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/steam/inverse.h"
#include "core/temperature.h"

#include <optional>

namespace core::steam {

/// What a mole of water weighs in the formulation, 18.015268 g. Source: R7-97(2012), section 1.
inline constexpr MolarMass molar_mass = MolarMass::from_value(18.015268e-3);

struct State {
    Region region;
    Temperature temperature;
    Pressure pressure;
    SpecificVolume volume;
    SpecificEnergy energy, enthalpy;
    SpecificEntropy entropy;
    std::optional<double> dryness; ///< mass fraction of vapour, in two phases only
};

/// Refuses what lies within 0.05 K of saturation, where these two do not tell the phase (#VALUE!); like
/// all that follow, what lies outside the range (#NUM!).
State at_temperature_and_pressure(Temperature, Positive<Pressure>, Notes const& notes = silent);
State at_pressure_and_enthalpy(Positive<Pressure>, SpecificEnergy, Notes const& notes = silent);
State at_pressure_and_entropy(Positive<Pressure>, SpecificEntropy, Notes const& notes = silent);
State at_enthalpy_and_entropy(SpecificEnergy, SpecificEntropy, Notes const& notes = silent);
/// Refuses an entropy that cold water has at several pressures (#VALUE!).
State at_temperature_and_entropy(Temperature, SpecificEntropy, Notes const& notes = silent);
/// Refuses a volume that cold water has at two temperatures (#VALUE!).
State at_pressure_and_volume(Positive<Pressure>, Positive<SpecificVolume>,
                             Notes const& notes = silent);
State at_temperature_and_volume(Temperature, Positive<SpecificVolume>, Notes const& notes = silent);
/// Refuses temperatures and pressures without saturation (#NUM!).
State at_temperature_and_dryness(Temperature, Fraction, Notes const& notes = silent);
State at_pressure_and_dryness(Positive<Pressure>, Fraction, Notes const& notes = silent);

/// s'' - s' at saturation.
SpecificEntropy entropy_of_vaporization(Temperature, Notes const& notes = silent);

/// Refuses a state of one phase, saying by how many kelvin (#NUM!).
Dimensionless dryness(State const&);

} // namespace core::steam
