// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/need.h"

#include <string>
#include <vector>

namespace registration {

/// Where the figures behind an argument stand, a line each: report and page of every phase of the
/// substances it names in a row, the reference of critical constants. Empty for an argument that brings
/// its own figures.
std::vector<std::string> figures_behind(Need const&, Given const&, std::size_t row);

} // namespace registration
