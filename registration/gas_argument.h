// SPDX-License-Identifier: MPL-2.0
#pragma once

// Gases as arguments: a text, `N2`, `0.79 N2 + 0.21 O2`; or a block
//
//     gas | mol%            substances in the first column, in the second fractions or amounts in
//     N2  | 78.1            the unit of the heading (mol%, vol%, wt%, mol, kg, mol/s, kg/h ...),
//     O2  | rest            without a heading row mole fractions or quantities with their units;
//                           `rest` is what fractions lack of 1. A third column `u` holds
//                           standard uncertainties. The block may lie across as well.
//
// A gas of constant heat capacity is `air, cp = 1.005 kJ/(kg·K)`: any of these texts with a heat
// capacity at constant pressure behind it, molar or specific.

#include "core/notes.h"
#include "core/quantities.h"
#include "core/real_gas/fluid.h"
#include "core/substances/gas.h"
#include "registration/given.h"

#include <string_view>
#include <vector>

namespace registration {

/// Whether an argument means to be a mixture in a block, which then is one gas for all rows.
bool means_mixture(Given const&);

/// The gas of a row. Throws Failure: what cannot be read, fractions that do not sum to 1 within
/// 1e-6, `rest` among amounts or twice (unfit), amounts below zero (impossible).
core::substances::Gas read_gas_argument(Given const&, std::size_t row, core::Notes const& notes);

/// The same with critical constants; fluids that have these alone are read from text.
core::real_gas::Fluid read_fluid_argument(Given const&, std::size_t row, core::Notes const& notes);

/// A gas or mixture for its molar mass, with a heat capacity that does not change.
struct ConstantGas {
    core::substances::Gas gas;
    core::MolarHeatCapacity heat_capacity;
    core::Dimension stated; ///< of the heat capacity as written, molar or specific
};

/// Whether a text states a heat capacity behind a gas.
bool means_constant_gas(std::string_view text);

/// Refuses heat capacities that are neither molar nor specific (unfit) or not above 0 (impossible).
ConstantGas read_constant_gas(Given const&, std::size_t row, core::Notes const& notes);

/// The numbers of a mixture or of constant gases that carry a standard uncertainty.
std::vector<Place> uncertain_places_of_gas(Given const&);

} // namespace registration
