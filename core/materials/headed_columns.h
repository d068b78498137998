// SPDX-License-Identifier: MPL-2.0
#pragma once

// Own materials as columns under headings, which is how a block of cells states them and how their
// text does (material_text.h).
//
//   measured table   a temperature, a heat capacity:  T / °C | cp / (J/(kg·K))
//   correlation      from / K | to / K | T^0 / (J/(mol·K)) | T^1 | T^-0.5 | ...
//                    [ transition / (kJ/mol) ] [ spread / (kJ/mol) ] [ phase ]
//
// Columns stand in any order and in any units. `T^n` is the number of kelvin to that power, n any
// real number; a power without a unit has that of the first power in the unit of a heat capacity;
// `T^1 / (J/(mol·K²))` is read too. The heat capacities say whether everything is molar, specific
// or of the whole. A `transition` happens at the row's upper end, a `spread` is taken up evenly on
// the row's way; blank cells there are none. A column headed `u` holds the standard uncertainties of
// the column before it, in its unit; it changes nothing here (whoever moves a number by its own).

#include "core/materials/own_material.h"
#include "core/notes.h"

#include <span>
#include <string_view>
#include <vector>

namespace core::materials {

struct HeadedColumn {
    std::string_view heading;
    std::vector<double> numbers = {};         ///< in the unit of the heading, NaN for a blank cell
    std::vector<std::string_view> words = {}; ///< in their place under `phase`
};

/// Whether a column holds the uncertainties of the one before it.
bool holds_uncertainties(HeadedColumn const&);

/// Makes the material. Rows blank in every column are left out.
/// Refuses headings that are unknown, stand twice or are missing, units of the wrong dimension or
/// of different bases, columns of different lengths, uncertainties below zero or without numbers
/// before them (#VALUE!), and what the curves refuse.
/// Bounds: 40 columns.
OwnMaterial read_columns(std::span<const HeadedColumn> columns, Notes const& notes = silent);

} // namespace core::materials
