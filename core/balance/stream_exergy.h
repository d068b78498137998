// SPDX-License-Identifier: MPL-2.0
#pragma once

// Physical exergy of streams against surroundings of T0 and p0: e = h - h0 - T0·(s - s0), the most work
// a stream gives on its way to equilibrium of temperature and pressure; composition does not matter.
// Source: Z. Rant, Forschung Ing.-Wes. 22 (1956) 36; T. J. Kotas, The Exergy Method of Thermal Plant
// Analysis (1985), chapter 2 (both from memory).

#include "core/conditions.h"
#include "core/materials/own_material.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/ratio.h"
#include "core/substances/gas.h"
#include "core/substances/substance.h"
#include "core/temperature.h"
#include "core/written.h"

namespace core::balance {

/// d - ln(1 + d) with d = (T - T0)/T0: what a constant heat capacity times T0 gives.
/// Accuracy: keeps its digits near T0, where it goes to zero with the square of d.
double exergy_share(Temperature temperature, Temperature surroundings);

/// Incompressible, of constant heat capacity: c·(T - T0 - T0·ln(T/T0)).
template<class Basis>
On<Energy, Basis> exergy_of_incompressible(Positive<On<HeatCapacity, Basis>> heat_capacity,
                                           Temperature temperature, Temperature surroundings,
                                           Notes const& notes = silent) {
    notes.step([&] {
        return "h - h0 = cp · (T - T0) = " +
               written(heat_capacity.value * (temperature - surroundings)) +
               ", s - s0 = cp · ln(T / T0) = " +
               written(heat_capacity.value * ln_ratio(temperature, surroundings));
    });
    return heat_capacity.value * absolute(surroundings) * exergy_share(temperature, surroundings);
}

/// Ideal gas of constant heat capacity: cp·(T - T0 - T0·ln(T/T0)) + R·T0·ln(p/p0).
MolarEnergy exergy_of_ideal_gas(Positive<MolarHeatCapacity> heat_capacity, Temperature temperature,
                                Positive<Pressure> pressure, Temperature surroundings,
                                Positive<Pressure> surroundings_pressure,
                                Notes const& notes = silent);

/// Ideal gas or mixture of the tables. Refuses a single substance that is condensed in the surroundings:
/// the way there would lead through condensation (#NUM!).
MolarEnergy exergy_of_gas(substances::Gas const& gas, Temperature temperature,
                          Positive<Pressure> pressure, Temperature surroundings,
                          Positive<Pressure> surroundings_pressure, Notes const& notes = silent);

/// Substance of the tables at 1 bar, transitions included.
MolarEnergy exergy_of_substance(substances::Substance const& substance, Temperature temperature,
                                Temperature surroundings, Notes const& notes = silent);

/// Own material, transitions included.
template<class Basis>
On<Energy, Basis> exergy_of_material(materials::OwnMaterial const& material,
                                     Temperature temperature, Temperature surroundings,
                                     Notes const& notes = silent) {
    const auto heat =
        materials::enthalpy_of_heating<Basis>(material, surroundings, temperature, notes);
    const auto entropy =
        materials::entropy_of_heating<Basis>(material, surroundings, temperature, notes);
    return heat - absolute(surroundings) * entropy;
}

} // namespace core::balance
