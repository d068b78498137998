// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <functional>
#include <map>
#include <string>
#include <string_view>
#include <vector>

namespace tests {

/// Evaluates the right side of a catalogue formula: words, numbers, `+ - · / ^`, brackets, `ln`,
/// `exp` and `Σ(…)` over columns. A symbol is a column, of one row where it is single.
double evaluate(std::string_view formula,
                std::map<std::string, std::vector<double>, std::less<>> const& symbols);

} // namespace tests
