// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/need.h"

namespace registration {

/// Whether a substance is told by its molar mass: a formula never begins with a digit.
bool tells_molar_mass(Given const&);

/// Whether an argument of this kind tells what a mole weighs.
bool knows_molar_mass(Need::Kind);

/// What a mole of the substance, gas or mixture in a row weighs.
double molar_mass_of(Need::Kind, Given const&, std::size_t row);

} // namespace registration
