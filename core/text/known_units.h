// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/text/unit.h"

#include <span>
#include <string_view>

namespace core::text {

/// The unit of an expression that sheets hold most often, spelled exactly so: a look-up instead of a
/// reading. Null for every other text, which is then read; both ways give the same unit
/// (tests/core/text/known_units_test.cpp).
Unit const* find_known_unit(std::string_view text);

/// The expressions that are known.
std::span<const std::string_view> known_units();

} // namespace core::text
