// SPDX-License-Identifier: MPL-2.0
#pragma once

// Own materials as arguments: a block of cells under headings, or the one-cell text of MATERIAL.OF.

#include "core/materials/material_text.h"
#include "core/notes.h"
#include "registration/given.h"

#include <memory>
#include <vector>

namespace registration {

/// Whether an argument means to be an own material: a text that begins with the word, or a block
/// whose first row are headings over numbers.
bool means_own_material(Given const&);

/// What a block or one cell of text says, the uncertainties of texts such as `2 %` worked out.
/// Throws Failure (unfit) where it is neither.
core::materials::Description read_description(Given const&);

/// The material, read once a call; while one of its numbers is moved, anew.
std::shared_ptr<const core::materials::OwnMaterial> read_own_material(Given const&,
                                                                      core::Notes const& notes);

/// The numbers of a material that have a standard uncertainty beside them, as of the cell with this
/// index among the texts of the argument.
std::vector<Place> uncertain_places(core::materials::Description const&, std::size_t cell = 0);

/// Moves one number of a material, where it is of this cell.
void move(core::materials::Description&, std::optional<MovedPlace> const&, std::size_t cell = 0);

} // namespace registration
