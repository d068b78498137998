// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/critical_point.h"

#include <algorithm>
#include <array>
#include <cctype>
#include <string>

namespace core::real_gas {
namespace {

#include "critical_constants.inc"

bool is_part_of_name(unsigned char c) { return std::isalnum(c) || c == ',' || c >= 0x80; }

/// `n-Butane`, `butane` and `Butane` are one name.
std::string normal(std::string_view text) {
    if (text.starts_with("n-")) text.remove_prefix(2);
    std::string name;
    for (const char c : text)
        if (const auto letter = static_cast<unsigned char>(c); is_part_of_name(letter))
            name += static_cast<char>(std::tolower(letter));
    return name;
}

CriticalPoint const* by_formula(std::string_view formula) {
    CriticalPoint const* found = nullptr;
    for (CriticalPoint const& each : critical_table) {
        if (each.formula != formula) continue;
        if (found) return nullptr; // isomers
        found = &each;
    }
    return found;
}

} // namespace

std::span<const CriticalPoint> critical_points() { return critical_table; }

CriticalPoint const* find_critical_point(std::string_view text) {
    const std::string name = normal(text);
    const auto named = std::ranges::find_if(
        critical_table, [&](CriticalPoint const& each) { return normal(each.name) == name; });
    return named != critical_table.end() ? &*named : by_formula(text);
}

} // namespace core::real_gas
