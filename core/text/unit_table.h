// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/text/unit.h"

#include <cstdint>
#include <span>
#include <string_view>

namespace core::text {

/// Where a definition comes from.
enum class Definition : std::uint8_t {
    si_brochure, ///< BIPM, SI Brochure, 9th edition (2019), tables 2, 4, 7 and 8
    sp811,       ///< NIST Special Publication 811 (2008), appendix B.8
    trade,       ///< usage of the trade; the factor is that of the unit it is derived from
};
std::string_view citation(Definition);

/// Which SI prefixes a symbol takes. Only those in use: `ft` shall not be a femtotonne by rule, nor
/// `pt` a picotonne.
enum class Prefixes : std::uint8_t { none, multiples, all };

struct UnitRow {
    std::string_view symbol;
    std::string_view name;
    Unit unit;
    Definition source = Definition::sp811;
    Prefixes prefixes = Prefixes::none;
    bool fraction = false; ///< %, ppm, mol%: stands alone, never inside a product
};

struct Prefix {
    std::string_view symbol;
    std::string_view name;
    int exponent;
};

std::span<UnitRow const> unit_rows();
std::span<Prefix const> prefixes();

/// A symbol as found: a row, and the power of ten of its prefix.
struct Symbol {
    UnitRow const* row = nullptr;
    int exponent = 0;
    explicit operator bool() const { return row != nullptr; }
};

/// Finds an exact name, else an SI prefix with a symbol that takes it. Exact names win: `min` is
/// the minute. Constant time, through a hash table made by the compiler.
Symbol find_symbol(std::string_view name);

} // namespace core::text
