// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/need.h"

#include <vector>

namespace registration {

/// The numbers with a standard uncertainty inside an argument that is no column of numbers: parts of
/// a mixture, rows of a material, quantities among texts or activities.
std::vector<Place> uncertain_places(Need const&, Given const&);

} // namespace registration
