// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <cstddef>
#include <cstdint>
#include <span>
#include <string_view>

namespace registration {

/// One cell as the office hands it over. A blank cell inside a range is blank; a single blank cell
/// arrives as the number 0, which is why a bare single 0 is never taken for a number.
struct Cell {
    enum class Kind : std::uint8_t { blank, number, text };

    Kind kind = Kind::blank;
    double number = 0;
    std::string_view text{}; ///< UTF-8, trimmed, never empty where kind is text
};

/// One argument as handed over: a rectangle of cells, row by row. A left-out argument has no cells.
struct Block {
    const Cell* cells = nullptr;
    std::size_t rows = 0, columns = 0;

    bool missing() const { return cells == nullptr; }
    std::size_t size() const { return rows * columns; }
    bool single() const { return size() == 1; }
    Cell const& at(std::size_t row, std::size_t column) const {
        return cells[row * columns + column];
    }
};

/// A block seen upright: across, its rows are the sheet's columns.
struct Grid {
    Block block;
    bool across;

    std::size_t rows() const { return across ? block.columns : block.rows; }
    std::size_t columns() const { return across ? block.rows : block.columns; }
    Cell const& at(std::size_t row, std::size_t column) const {
        return across ? block.at(column, row) : block.at(row, column);
    }
};

} // namespace registration
