// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/call.h"

#include <memory>
#include <string>
#include <string_view>
#include <vector>

namespace tests {

/// One argument of a call as a test writes it: a text, a number, a range, or nothing. It owns what
/// the block points at.
class Range {
public:
    Range() = default; ///< left out
    Range(const char* text) : Range(std::vector<std::vector<Range>>{{text_cell(text)}}) {}
    Range(double number) : Range(std::vector<std::vector<Range>>{{number_cell(number)}}) {}
    static Range blank(); ///< a blank cell inside a range
    static Range column(std::vector<Range> cells);
    static Range row(std::vector<Range> cells);
    static Range table(std::vector<std::vector<Range>> rows) { return Range(std::move(rows)); }

    /// The same cell in every row of a column; a range or a left-out argument stays what it is.
    Range repeated(std::size_t rows) const;

    registration::Block block() const {
        return {cells_.empty() ? nullptr : cells_.data(), rows_, columns_};
    }

private:
    explicit Range(std::vector<std::vector<Range>> rows);
    static Range text_cell(const char*);
    static Range number_cell(double);

    std::size_t rows_ = 0, columns_ = 0;
    std::vector<registration::Cell> cells_;
    std::vector<std::shared_ptr<const std::string>> texts_;
};

/// Calls a catalogued function by its name.
registration::Answer call(std::string_view function, std::vector<Range> const& arguments);

/// Calls `ENTROPY.FUSION("18.7 kJ/mol"; "1668 °C")` as a cell would: texts, numbers, inline arrays
/// with `;` between columns and `|` between rows, left-out arguments, no nesting.
registration::Answer call_formula(std::string_view formula);

/// The same with every single text or number repeated `rows` times down a column; ranges, the
/// arguments of whole columns, stay as they are.
registration::Answer call_formula_in_rows(std::string_view formula, std::size_t rows);

/// The one number or text of an answer; an error reads as "#VALUE!", "#NUM!" or "Err:523".
double number(registration::Answer const&);
std::string text(registration::Answer const&, std::size_t cell = 0);

} // namespace tests
