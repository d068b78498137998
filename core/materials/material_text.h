// SPDX-License-Identifier: MPL-2.0
#pragma once

// A material as one line of text, which MATERIAL.OF writes into a cell and every function reads:
//
//   material "steel A" | T / K: 300 400 500 | cp / (J/(kg·K)): 460 480 500.25
//
//   material = "material" [ string ] { "|" column }
//   column   = heading ":" { number | string }       headings as in headed_columns.h, and
//                                                    `molar mass / (kg/mol)` with one number
//   string   = '"' { any character but '"' } '"'     under `phase`, and the name
//   number   = [ "-" ] digits [ "." digits ] [ "e" [sign] digits ]
//
// Blanks may stand between any two of these and must between numbers. Numbers have a decimal point
// and no groups. The writer gives SI units and as many digits, 17 at most, as read back to the same
// bits. Bounds: 32,000 bytes, 40 columns.

#include "core/materials/own_material.h"

#include <string>
#include <string_view>

namespace core::materials {

inline constexpr std::size_t longest_material_text = 32'000;

/// Whether a text means to be a material: it begins with the word `material`.
bool is_material_text(std::string_view text);

/// Refuses what the grammar or the columns do not allow (#VALUE!), and what the curves refuse.
OwnMaterial read_material(std::string_view text, Notes const& notes = silent);

/// Refuses a material whose text would be longer than the bound (#VALUE!).
std::string write_material(OwnMaterial const&);

} // namespace core::materials
