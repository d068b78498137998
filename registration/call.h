// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/cell.h"
#include "registration/entry.h"

#include <boost/container/small_vector.hpp>

#include <cstddef>
#include <span>
#include <string>
#include <vector>

namespace registration {

/// What a call hands back to the office: a rectangle of numbers or of texts, row by row. A number
/// may be an error (error_number in results.h); a blank row of the input is a blank row here.
struct Answer {
    enum class Kind : std::uint8_t { numbers, texts, cells };

    Kind kind = Kind::numbers;
    std::size_t rows = 1, columns = 1;
    boost::container::small_vector<double, 1> numbers; ///< one a cell, where kind is numbers
    std::vector<std::string> texts;                    ///< one a cell, where kind is texts
    /// Where kind is cells, a cell is its text, or its number where the text is empty.
    std::vector<std::size_t> blanks; ///< cells to be left empty, rising
    /// Cells of a text answer that are errors after all.
    struct Error {
        std::size_t cell;
        double number;
    };
    std::vector<Error> errors; ///< rising by cell
};

/// Calls a catalogued function as a worksheet does. There are as many blocks as the entry has
/// arguments; a left-out one is a missing block. Never throws but std::bad_alloc.
Answer call(Entry const&, std::span<const Block>);

} // namespace registration
