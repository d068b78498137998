// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/text/unit.h"
#include "registration/given.h"

#include <cstdint>
#include <string>

namespace registration {

/// What one parameter of an overload asks of its argument; derived from the parameter's type
/// (argument.h), never written by hand.
struct Need {
    enum class Kind : std::uint8_t {
        quantity,     ///< numbers of the dimension below
        any_quantity, ///< numbers of whatever dimension
        text,         ///< a text in every row: a formula, a unit
        named,        ///< a substance only for its molar mass, which may stand in its place
        substance,    ///< a substance of the tables
        gas,          ///< a gas of the tables or a mixture of such
        fluid,        ///< the same with critical constants
        constant_gas, ///< the same with a constant heat capacity of the dimension below, or of any
        steam, ///< a quantity that with another fixes a state of water, or its dryness in words
        steam_word, ///< the word `steam`
        equation,   ///< a reaction equation
        material,   ///< an own material of the basis below
        cell,       ///< a cell as it stands
        left_out,   ///< nothing, where other forms of the function take a value
        table,      ///< a rectangle of plain numbers
    };

    Kind kind = Kind::quantity;
    core::Dimension dimension{};
    Reading reading = Reading::plain;
    Share share = Share::none;
    bool optional = false;
    bool whole = false;         ///< all rows are one argument of one result
    const char* condition = ""; ///< "above 0", for the wizard and for `why`

    /// Whether two parameters take the same arguments.
    friend constexpr bool same(Need const& a, Need const& b) {
        return a.kind == b.kind && a.dimension == b.dimension && a.reading == b.reading &&
               a.share == b.share;
    }
};

/// Whether an argument is looked at as numbers: a quantity; a substance told by its molar mass; a
/// coordinate of steam that is not told in words.
bool is_numeric(Need const&, Given const&);

/// Whether numbers can be a coordinate of steam: a temperature, an absolute pressure, an enthalpy, entropy
/// or volume per mass, a dryness.
bool is_coordinate(Numbers const&);

/// Whether an argument that is no column of numbers is one thing for all rows: one cell, a
/// mixture or a material in a block.
bool stands_for_all_rows(Need const&, Given const&);

/// Whether the argument, as it stands, can be what the parameter needs.
bool accepts(Need const&, Given const&);

/// The same as a sentence part: what is wrong with it. Call only where accepts() is false.
core::Failure misfit(Need const&, Given const&);

/// What is needed, in words: `a temperature`, `a molar energy, J/mol`, `a chemical formula`.
std::string described(Need const&);

} // namespace registration
