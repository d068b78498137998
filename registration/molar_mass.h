// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/need.h"

namespace registration {

/// Whether a substance is told by its molar mass: a formula never begins with a digit.
bool tells_molar_mass(Given const&);

/// Whether an argument tells what a mole weighs: those that name substances, and own materials of which
/// it is stated.
bool knows_molar_mass(Need const&, Given const&);

/// What a mole of the substance, gas or mixture in a row weighs.
double molar_mass_of(Need::Kind, Given const&, std::size_t row);

} // namespace registration
