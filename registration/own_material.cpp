// SPDX-License-Identifier: MPL-2.0
#include "registration/own_material.h"

#include "core/materials/headed_columns.h"
#include "core/materials/material_text.h"

#include <limits>

namespace registration {
namespace {

using core::materials::HeadedColumn;

/// Words stand under `phase` only, numbers under every other heading.
HeadedColumn column_of(Block block, std::size_t column) {
    HeadedColumn read{.heading = block.at(0, column).text};
    const bool phases = read.heading == "phase";
    for (std::size_t row = 1; row < block.rows; ++row) {
        Cell const& cell = block.at(row, column);
        if (phases) {
            read.words.push_back(cell.text);
        } else if (cell.kind == Cell::Kind::text) {
            core::refuse_unfit(std::string(cell.text) + " under the heading " +
                                   std::string(read.heading),
                               "numbers, in the unit of the heading", "write the number alone");
        } else {
            const bool filled = cell.kind == Cell::Kind::number;
            read.numbers.push_back(filled ? cell.number : std::numeric_limits<double>::quiet_NaN());
        }
    }
    return read;
}

} // namespace

bool means_own_material(Given const& given) {
    if (given.missing()) return false;
    const Block block = given.block();
    if (block.single())
        return block.at(0, 0).kind == Cell::Kind::text &&
               core::materials::is_material_text(block.at(0, 0).text);
    if (block.rows < 2 || block.columns < 2) return false;
    for (std::size_t column = 0; column < block.columns; ++column)
        if (block.at(0, column).kind != Cell::Kind::text) return false;
    return block.at(1, 0).kind == Cell::Kind::number;
}

core::materials::OwnMaterial read_own_material(Given const& given, core::Notes const& notes) {
    const Block block = given.block();
    if (block.single()) return core::materials::read_material(block.at(0, 0).text, notes);
    std::vector<HeadedColumn> columns;
    for (std::size_t column = 0; column < block.columns; ++column)
        columns.push_back(column_of(block, column));
    return core::materials::read_columns(columns, notes);
}

} // namespace registration
