// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <string>
#include <string_view>

namespace core::substances {

constexpr char to_small(char c) {
    return c >= 'A' && c <= 'Z' ? static_cast<char>(c - 'A' + 'a') : c;
}

/// Folds what a sheet may hold to the ASCII of the grammar in formula.cpp: subscript digits to
/// digits, every raised dot to `*` without blanks around it, `½` behind a dot to 0.5; a state of
/// matter at the end, `(g)`, `(cr, α)`, is cut off.
/// Throws Failure (unfit) for charges, for what is dissolved, and for characters of no formula.
std::string fold_formula(std::string_view formula);

} // namespace core::substances
