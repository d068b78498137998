// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/materials/own_material.h"
#include "core/notes.h"
#include "registration/given.h"

namespace registration {

/// Whether an argument means to be an own material: a text that begins with the word, or a block
/// whose first row are headings over numbers.
bool means_own_material(Given const&);

/// Reads either form. Throws Failure (unfit) where it is neither.
core::materials::OwnMaterial read_own_material(Given const&, core::Notes const& notes);

} // namespace registration
