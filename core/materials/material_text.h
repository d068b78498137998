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
// and no groups. The writer leaves headings and units as they are and gives as many digits, 17 at
// most, as read back to the same bits. Bounds: 32,000 bytes, 40 columns.

#include "core/materials/headed_columns.h"
#include "core/materials/own_material.h"

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace core::materials {

inline constexpr std::size_t longest_material_text = 32'000;

/// Whether a text means to be a material: it begins with the word `material`.
bool is_material_text(std::string_view text);

/// What a material is described by, before it is one.
struct Description {
    std::string_view name = {};
    std::vector<HeadedColumn> columns = {};
};

/// Refuses what the grammar does not allow (#VALUE!).
Description read_description(std::string_view text);

/// Makes the material. Refuses what the columns do not allow (#VALUE!), and what the curves refuse.
OwnMaterial made_of(Description const&, Notes const& notes = silent);

inline OwnMaterial read_material(std::string_view text, Notes const& notes = silent) {
    return made_of(read_description(text), notes);
}

/// Writes the columns as they are, without rows that are blank throughout; a blank cell among others
/// is written as 0, which means none where a column may have blanks.
/// Refuses what could not be read back: headings with `:`, `|` or `"`, and a text longer than the
/// bound (#VALUE!).
std::string write_material(Description const&);

} // namespace core::materials
