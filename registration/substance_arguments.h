// SPDX-License-Identifier: MPL-2.0
#pragma once

// Arguments that name substances: read from text, once a column where one text stands for all rows.

#include "core/notes.h"
#include "core/substances/gas.h"
#include "core/substances/reaction.h"
#include "core/substances/substance.h"
#include "registration/argument.h"

#include <optional>

namespace registration {

/// A parameter that `read` makes of the text in a row.
template<class T, auto read, Need::Kind kind_of_need>
struct text_argument : Unchecked {
    static constexpr Need need{.kind = kind_of_need};

    class Rows {
    public:
        Rows(Given const& given, int index, core::Notes const& notes)
            : given_(&given), index_(index) {
            if (given.cell_count() == 1) only_ = made(given.cell(0), notes);
        }
        T operator[](std::size_t row) const {
            return only_ ? *only_ : made(given_->cell(row), core::silent);
        }

    private:
        T made(Cell const& cell, core::Notes const& notes) const {
            try {
                return read(cell.text, notes);
            } catch (core::Failure& failure) {
                failure.argument = index_;
                throw;
            }
        }
        Given const* given_;
        int index_;
        std::optional<T> only_;
    };
};

template<>
struct argument<core::substances::Substance>
    : text_argument<core::substances::Substance, core::substances::find_substance,
                    Need::Kind::substance> {};
template<>
struct argument<core::substances::Gas>
    : text_argument<core::substances::Gas, core::substances::read_gas, Need::Kind::gas> {};
template<>
struct argument<core::substances::Reaction>
    : text_argument<core::substances::Reaction, core::substances::read_reaction,
                    Need::Kind::equation> {};

} // namespace registration
