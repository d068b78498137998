// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/failure.h"
#include "core/text/unit.h"
#include "registration/cell.h"

#include <boost/container/small_vector.hpp>

#include <cstddef>
#include <string>
#include <string_view>
#include <vector>

namespace registration {

using core::text::Reading;
using core::text::Share;
using core::text::Unit;

/// A row that could not be used, and why.
struct RowFault {
    std::size_t row;
    core::Failure failure;
};

/// An argument read as quantities: a column of SI numbers with their standard uncertainties. A
/// single value is a column of one. All rows have one dimension; a row that has not is a fault, a
/// row without any content is blank.
struct Numbers {
    boost::container::small_vector<double, 1> si;
    boost::container::small_vector<double, 1> u; ///< empty where no row states one
    core::Dimension dimension{};
    Reading reading = Reading::plain;
    Share share = Share::none;
    bool bare = false;   ///< plain numbers, no unit stated
    bool across = false; ///< stands in a row of the sheet, not in a column
    bool listed = false; ///< a column by its form, even where it has one row
    std::vector<RowFault> faults;
    std::vector<std::size_t> blanks; ///< rising
    std::vector<std::string> notes;  ///< what the reader mended

    std::size_t count() const { return si.size(); }
    bool uncertain() const { return !u.empty(); }
};

/// Reads a block in any of the forms of the cell language: text, value | unit (| u), unit over
/// value, headed column (and u), rows of value | unit (| u), texts, plain numbers; the same across.
/// Fills fresh Numbers; throws Failure (unfit) where the block as a whole cannot be read.
void read_numbers(Block, Numbers&);

/// How the quantity in a row stands in the sheet, `7.3 kJ/mol` (u left to the caller).
std::string written(Block, std::size_t row);

/// The unit text a row is given in, empty for plain numbers.
std::string_view written_unit(Block, std::size_t row);

} // namespace registration
