// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <string_view>

namespace core::text {

/// A name that people do write and that is not read: ambiguous, a full name, or no unit at all.
struct RefusedName {
    std::string_view name;
    std::string_view reason;      ///< a phrase that goes on after the name: `is the coulomb`
    std::string_view replacement; ///< what takes its place in the text, where there is one thing
    std::string_view repair;      ///< an imperative sentence, where there is not
};

/// Null where nothing is known about the name.
RefusedName const* find_refused_name(std::string_view name);

/// Refuses a name that stands at `name` inside `whole`, folded to `folded`: with what is known
/// about it, with the symbol of a unit written in full, or with the nearest known spellings.
[[noreturn]] void refuse_name(std::string_view whole, std::string_view name,
                              std::string_view folded);

} // namespace core::text
