// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/given.h"

namespace registration {

/// Whether a substance is told by its molar mass: a formula never begins with a digit.
bool tells_molar_mass(Given const&);

/// The molar mass that a substance argument tells: of its formula, or the value itself.
double molar_mass_of(Given const&, std::size_t row);

} // namespace registration
