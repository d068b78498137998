// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <cstdint>
#include <span>
#include <string_view>

namespace core::substances {

/// A chemical element with its abridged standard atomic weight. The weight is kept as the digits
/// are printed, a whole number of 1e-4; 0 where no standard weight exists.
struct Element {
    std::string_view symbol, name;
    std::int32_t ten_thousandths;
};

/// All named elements in the order of their atomic number.
/// Source: T. Prohaska et al., Pure Appl. Chem. 94 (2022) 573, Table 1, abridged values.
/// Valid: terrestrial material of ordinary origin.
std::span<const Element> elements();

/// The element of a symbol, or null.
Element const* find_element(std::string_view symbol);

} // namespace core::substances
