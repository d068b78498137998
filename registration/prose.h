// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/evaluation.h"

#include <string>
#include <vector>

/// The views of a result that are meant to be read: steps, source, why.
namespace registration {

/// The derivation of one row: formula in symbols, each input as read and in SI, what the function
/// tells on its way, substitution, result.
std::string steps(Evaluation const&, Results const&, Results const& per_amount, std::size_t row,
                  std::vector<std::string> const& noted);

/// Where the relation and the figures come from, and where it holds.
std::string source(Evaluation const&, std::size_t row);

/// `ok`, with what should be known about the result.
std::string why(std::vector<std::string> const& remarks);

/// The reason of an error: function, argument, what was given, what is needed, one repair.
std::string why(Entry const&, core::Failure const&);

} // namespace registration
