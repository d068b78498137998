// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <cstdint>
#include <exception>
#include <string>
#include <utility>

namespace core {

/// Why no result can be given. The one exception type of the project: the office shows its kind as
/// an error code, and `"why"` its sentence. It never leaves the add-in as an exception.
struct Failure : std::exception {
    enum class Kind : std::uint8_t {
        unfit,       ///< #VALUE!: missing, unreadable, wrong dimension or shape, does not fit
        impossible,  ///< #NUM!: readable but physically impossible, degenerate or out of range
        unconverged, ///< Err:523: an iteration did not converge
    };

    Failure(Kind what_kind, std::string what_given, std::string what_needed,
            std::string what_repairs)
        : kind(what_kind), given(std::move(what_given)), needed(std::move(what_needed)),
          repair(std::move(what_repairs)) {}

    const char* what() const noexcept override { return needed.c_str(); }

    Kind kind;
    int argument = -1;  ///< position in the call, once it is known; -1 for the call as a whole
    std::string given;  ///< what stands in the sheet, as read: `25 °C`
    std::string needed; ///< what is needed, as a phrase: `a temperature above 0 K`
    std::string repair; ///< one repair, as an imperative sentence without a full stop
};

/// Throws away what is readable but cannot be: #NUM!.
[[noreturn]] inline void refuse_impossible(std::string given, std::string needed,
                                           std::string repair) {
    throw Failure(Failure::Kind::impossible, std::move(given), std::move(needed),
                  std::move(repair));
}

/// Throws away what does not fit: #VALUE!.
[[noreturn]] inline void refuse_unfit(std::string given, std::string needed, std::string repair) {
    throw Failure(Failure::Kind::unfit, std::move(given), std::move(needed), std::move(repair));
}

} // namespace core
