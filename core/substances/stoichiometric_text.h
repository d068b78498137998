// SPDX-License-Identifier: MPL-2.0
#pragma once

// terms       = term { "+" term }
// term        = [ coefficient [ "·" | "*" ] ] substance
// coefficient = digits [ "." digits ] | "." digits | digits "/" digits | digits [ ½ | ¼ | ¾ ]
//             | ½ | ¼ | ¾
//
// A plus sign parts terms where a blank stands before it or a term has ended; directly behind a
// formula and before a blank, an arrow or the end it would be a charge, `Na+`, and is refused.

#include <string>
#include <string_view>
#include <vector>

namespace core::substances {

struct Term {
    double coefficient; ///< 1 where none is written
    std::string_view substance;
};

/// Reads the terms of a side of a reaction or of a mixture. `whole` is what stands in the sheet,
/// for refusals (#VALUE!). Bounds: coefficients from above 0 to 1e6, 100 terms.
std::vector<Term> read_terms(std::string_view text, std::string_view whole);

} // namespace core::substances
