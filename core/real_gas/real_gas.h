// SPDX-License-Identifier: MPL-2.0
#pragma once

// Real gases by an equation of state: what they depart from the ideal gas by, and changes of state.
// Valid: fluids with critical constants, 1 K to 10,000 K, up to 1 GPa; vapours and gases well, liquids
// in entropy and enthalpy fairly; the virial equation up to half the critical density.
// Accuracy: published departures to 0.1 %, tests/core/real_gas; against measured fluids a few per cent of
// the departure, more for polar fluids and near the critical point, which is remarked.
// Steps: the constants with their references, reduced variables, parameters of the equation, Z and both
// departures.

#include "core/conditions.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/real_gas/fluid.h"
#include "core/temperature.h"

#include <cstdint>
#include <string_view>

namespace core::real_gas {

enum class Equation : std::uint8_t { peng_robinson, soave, virial };

/// `Peng-Robinson`, `Soave` or `virial`, in any case. Refuses others (#VALUE!).
Equation read_equation(std::string_view text);

/// S - S(ideal gas) at the same temperature and pressure.
MolarEntropy entropy_departure(Fluid const& fluid, Temperature temperature,
                               Positive<Pressure> pressure, Equation equation,
                               Notes const& notes = silent);
/// H - H(ideal gas), likewise.
MolarEnergy enthalpy_departure(Fluid const& fluid, Temperature temperature,
                               Positive<Pressure> pressure, Equation equation,
                               Notes const& notes = silent);
/// Z = p·V/(R·T) of the stable phase.
Dimensionless compressibility_factor(Fluid const& fluid, Temperature temperature,
                                     Positive<Pressure> pressure, Equation equation,
                                     Notes const& notes = silent);

/// ∫cp/T dT - R·ln(p2/p1) of the ideal gas, plus the departure at the end, less that at the start.
MolarEntropy entropy_between(Fluid const& fluid, Temperature temperature_1,
                             Positive<Pressure> pressure_1, Temperature temperature_2,
                             Positive<Pressure> pressure_2, Equation equation,
                             Notes const& notes = silent);
/// ∫cp dT of the ideal gas with departures likewise.
MolarEnergy enthalpy_between(Fluid const& fluid, Temperature temperature_1,
                             Positive<Pressure> pressure_1, Temperature temperature_2,
                             Positive<Pressure> pressure_2, Equation equation,
                             Notes const& notes = silent);

} // namespace core::real_gas
