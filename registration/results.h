// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/failure.h"
#include "registration/array.h"
#include "registration/numbers.h"

#include <boost/container/small_vector.hpp>

#include <algorithm>
#include <bit>
#include <cstdint>
#include <string>
#include <vector>

namespace registration {

/// A failure as the office shows it: a NaN whose low word is the office's error code.
inline double error_number(core::Failure::Kind kind) {
    constexpr std::uint64_t not_a_number = 0x7FF8000000000000;
    constexpr std::uint64_t code[] = {519, 503, 523}; // #VALUE!, #NUM!, no convergence
    return std::bit_cast<double>(not_a_number | code[static_cast<std::size_t>(kind)]);
}

/// What an overload gives back, derived from its return type (argument.h).
struct Outcome {
    enum class Kind : std::uint8_t { number, text, array };

    Kind kind = Kind::number;
    core::Dimension dimension{};
    Reading reading = Reading::plain;
    bool follows_first = false; ///< of the dimension and reading of the first argument
    bool column = false;        ///< a whole column from one run
};

/// The results of one call, a row each.
class Results {
public:
    Results(Outcome what, std::size_t rows, bool explain) : outcome(what), explain_(explain) {
        if (what.kind == Outcome::Kind::number)
            numbers.resize(rows, 0.0);
        else
            texts.resize(rows);
    }

    std::size_t count() const {
        return outcome.kind == Outcome::Kind::number ? numbers.size() : texts.size();
    }

    void put(std::size_t row, double value) {
        if (!(value - value == 0)) return overflow(row);
        numbers[row] = value;
    }
    void put(Array made) { arrays.push_back(std::move(made)); }
    void put(std::size_t row, std::string text) { texts[row] = std::move(text); }
    void put_all(std::vector<double> const& values) {
        numbers.resize(values.size());
        for (std::size_t row = 0; row < values.size(); ++row) put(row, values[row]);
    }
    void fail(std::size_t row, core::Failure failure) {
        if (outcome.kind != Outcome::Kind::number)
            failures_in_texts.push_back({row, failure.kind});
        else
            numbers[row] = error_number(failure.kind);
        if (explain_) faults.push_back({row, std::move(failure)});
    }
    bool failed(std::size_t row) const {
        if (outcome.kind == Outcome::Kind::number) return numbers[row] != numbers[row];
        return std::ranges::binary_search(failures_in_texts, row, {}, &FailedText::row);
    }

    struct FailedText {
        std::size_t row;
        core::Failure::Kind kind;
    };

    Outcome outcome;
    boost::container::small_vector<double, 1> numbers;
    std::vector<std::string> texts;
    std::vector<Array> arrays; ///< one, where the outcome is an array and it was made
    std::vector<FailedText> failures_in_texts;
    std::vector<RowFault> faults; ///< filled only where the reasons were asked for

    /// Why a row failed, or null; once the results are complete, faults rise by row.
    core::Failure const* fault(std::size_t row) const {
        const auto found = std::ranges::lower_bound(faults, row, {}, &RowFault::row);
        return found != faults.end() && found->row == row ? &found->failure : nullptr;
    }

private:
    void overflow(std::size_t row) {
        fail(row, core::Failure(core::Failure::Kind::impossible, "inputs as they stand",
                                "a result that can be held as a number",
                                "check the magnitude and the unit of each input"));
    }

    bool explain_;
};

} // namespace registration
