// SPDX-License-Identifier: MPL-2.0
#include "registration/numbers.h"

#include "core/text/quantity.h"

#include <cmath>
#include <limits>
#include <optional>

// The block forms of the cell language. A block is recognised by its first rows, upright first,
// then across; after that each form has one loop.

namespace registration {
namespace {

using core::Failure;
using core::text::read_heading;
using core::text::read_quantity;
using core::text::read_uncertainty;
using core::text::read_unit;

constexpr double nothing = std::numeric_limits<double>::quiet_NaN();

enum class Layout : std::uint8_t {
    bare,   ///< plain numbers
    texts,  ///< a text quantity in every row
    pairs,  ///< value | unit (| u) in every row
    headed, ///< a unit over numbers, beside them a column headed u or not
};

struct Form {
    Grid grid;
    Layout layout;
    std::size_t first() const { return layout == Layout::headed ? 1 : 0; }
    std::size_t count() const { return grid.rows() - first(); }
};

bool is_number(Cell const& cell) { return cell.kind == Cell::Kind::number; }
bool is_text(Cell const& cell) { return cell.kind == Cell::Kind::text; }
bool is_blank(Cell const& cell) { return cell.kind == Cell::Kind::blank; }

/// A number that stands in a cell as text, `7,3` or `½`.
bool is_written_number(Cell const& cell) {
    if (!is_text(cell) || cell.text.size() > 64) return false;
    try {
        return read_quantity(cell.text).bare;
    } catch (Failure const&) {
        return false;
    }
}

bool is_quantity(std::string_view text) {
    try {
        return !read_quantity(text).bare;
    } catch (Failure const&) {
        return false;
    }
}

std::size_t first_filled(Grid const& grid, std::size_t column, std::size_t from) {
    while (from < grid.rows() && is_blank(grid.at(from, column))) ++from;
    return from;
}

/// The heading of an uncertainty column is `u`, or `u / kJ` with a unit of its own.
bool heads_uncertainty(Cell const& cell) {
    if (!is_text(cell)) return false;
    if (cell.text == "u") return true;
    return cell.text.size() > 1 && cell.text[0] == 'u' &&
           (cell.text[1] == ' ' || cell.text[1] == '(');
}

bool is_headed(Grid const& grid) {
    if (grid.rows() < 2 || !is_text(grid.at(0, 0))) return false;
    const std::size_t next = first_filled(grid, 0, 1);
    if (next == grid.rows()) return !is_quantity(grid.at(0, 0).text);
    return is_number(grid.at(next, 0)) || is_written_number(grid.at(next, 0));
}

bool is_unit(Cell const& cell) {
    if (!is_text(cell)) return false;
    try {
        read_unit(cell.text);
        return true;
    } catch (Failure const&) {
        return false;
    }
}

/// A number beside a text; or a text beside a unit, which the reading of the row then refuses.
bool is_pairs(Grid const& grid) {
    for (std::size_t row = 0; row < grid.rows(); ++row) {
        Cell const &value = grid.at(row, 0), &unit = grid.at(row, 1);
        if (is_blank(value) && is_blank(unit)) continue;
        return is_text(value) && !is_written_number(value) ? is_unit(unit) : is_text(unit);
    }
    return false;
}

std::optional<Layout> layout_of(Grid const& grid) {
    const std::size_t columns = grid.columns();
    if (columns == 1) {
        const std::size_t first = first_filled(grid, 0, 0);
        if (first == grid.rows()) return Layout::bare;
        if (is_number(grid.at(first, 0))) {
            const bool pair_across = grid.rows() >= 2 && grid.rows() <= 3 &&
                                     is_text(grid.at(1, 0)) &&
                                     !is_written_number(grid.at(1, 0)); // [7.3; kJ/mol]
            if (pair_across) return std::nullopt;
            return Layout::bare;
        }
        return is_headed(grid) ? Layout::headed : Layout::texts;
    }
    if (columns == 2 && is_headed(grid) && heads_uncertainty(grid.at(0, 1))) return Layout::headed;
    if ((columns == 2 || columns == 3) && is_pairs(grid)) return Layout::pairs;
    return std::nullopt;
}

Form recognise(Block block) {
    for (const bool across : {false, true}) {
        if (across && block.single()) break;
        if (!across && block.rows == 1 && block.columns > 3) continue;
        const Grid grid{block, across};
        if (const auto layout = layout_of(grid)) return {grid, *layout};
    }
    core::refuse_unfit(
        "a block of " + std::to_string(block.rows) + " × " + std::to_string(block.columns) +
            " cells",
        "a value and its unit, a column under a heading with its unit, or rows of value | unit | u",
        "select the cells of one quantity only");
}

/// Fills one Numbers row by row and sees that the rows agree with one another.
class Filling {
public:
    Filling(Numbers& numbers, std::size_t count) : numbers_(numbers) {
        numbers_.si.resize(count, nothing);
    }

    void blank(std::size_t row) { numbers_.blanks.push_back(row); }
    void fault(std::size_t row, Failure failure) {
        numbers_.faults.push_back({row, std::move(failure)});
    }
    void put(std::size_t row, double si) { numbers_.si[row] = si; }
    void put_uncertainty(std::size_t row, double u) {
        if (u == 0) return;
        if (numbers_.u.empty()) numbers_.u.resize(numbers_.si.size(), 0.0);
        numbers_.u[row] = u;
    }
    void note(std::string text) {
        if (!text.empty() && numbers_.notes.size() < 20) numbers_.notes.push_back(std::move(text));
    }

    /// The first unit decides; a later one of another kind is refused.
    void agree(Unit const& unit, std::string_view text) {
        if (!decided_) return decide(unit);
        if (unit.dimension != numbers_.dimension || unit.share != numbers_.share)
            core::refuse_unfit(std::string(text),
                               "the dimension of the first row, " +
                                   core::text::name_of(numbers_.dimension),
                               "give the row in a unit of the same kind as the first");
        if (unit.reading == numbers_.reading) return;
        if (unit.reading == Reading::plain && numbers_.reading != Reading::gauge) return;
        if (numbers_.reading == Reading::plain && unit.reading != Reading::gauge) {
            numbers_.reading = unit.reading;
            return;
        }
        core::refuse_unfit(std::string(text),
                           "rows that are all absolute or all differences or all gauge",
                           "write the row as the first one is written");
    }

private:
    void decide(Unit const& unit) {
        decided_ = true;
        numbers_.dimension = unit.dimension;
        numbers_.reading = unit.reading;
        numbers_.share = unit.share;
    }

    Numbers& numbers_;
    bool decided_ = false;
};

/// The number of a cell in the given unit, with the uncertainty written into the cell itself.
struct Value {
    double si, u;
};
Value value_of(Cell const& cell, Unit const& unit) {
    if (is_number(cell)) return {unit.to_si(cell.number), 0};
    if (is_blank(cell))
        core::refuse_unfit("a blank cell beside a unit", "a number",
                           "fill the cell or clear its unit as well");
    const auto read = read_quantity(cell.text);
    if (!read.bare)
        core::refuse_unfit(std::string(cell.text),
                           "a number alone, since the unit stands beside or above it",
                           "write the number without a unit");
    return {unit.to_si(read.si), unit.span_to_si(read.u)};
}

double uncertainty_of(Cell const& cell, double si, Unit const& unit) {
    if (is_blank(cell)) return 0;
    if (is_text(cell)) return read_uncertainty(cell.text, si, unit);
    if (!(cell.number >= 0))
        core::refuse_unfit("u = " +
                               core::text::write_number(static_cast<long double>(cell.number), 6),
                           "a standard uncertainty of 0 or more",
                           "give u as a positive number in the unit of its value");
    return unit.span_to_si(cell.number);
}

void fill_bare(Form const& form, Filling& filling) {
    filling.agree(Unit{}, "");
    for (std::size_t row = 0; row < form.count(); ++row) {
        Cell const& cell = form.grid.at(row, 0);
        if (is_blank(cell))
            filling.blank(row);
        else
            try {
                const Value value = value_of(cell, Unit{});
                filling.put(row, value.si);
                filling.put_uncertainty(row, value.u);
            } catch (Failure& failure) {
                filling.fault(row, std::move(failure));
            }
    }
}

void fill_texts(Form const& form, Filling& filling, bool& bare) {
    for (std::size_t row = 0; row < form.count(); ++row) {
        Cell const& cell = form.grid.at(row, 0);
        if (is_blank(cell))
            filling.blank(row);
        else
            try {
                if (is_number(cell))
                    core::refuse_unfit(
                        core::text::write_number(static_cast<long double>(cell.number), 6),
                        "a quantity with its unit, as the other rows have",
                        "write the unit behind the number");
                auto read = read_quantity(cell.text);
                filling.agree(read.unit, cell.text);
                if (read.bare) bare = true;
                filling.put(row, read.si);
                filling.put_uncertainty(row, read.u);
                filling.note(std::move(read.note));
            } catch (Failure& failure) {
                if (form.grid.block.single()) throw;
                filling.fault(row, std::move(failure));
            }
    }
}

void fill_pairs(Form const& form, Filling& filling) {
    Grid const& grid = form.grid;
    std::string_view last_text;
    Unit unit;
    for (std::size_t row = 0; row < form.count(); ++row) {
        Cell const& cell = grid.at(row, 1);
        if (is_blank(grid.at(row, 0)) && is_blank(cell)) {
            filling.blank(row);
            continue;
        }
        try {
            if (!is_text(cell))
                core::refuse_unfit(is_blank(cell) ? "no unit" : "a number where the unit belongs",
                                   "a unit beside the number",
                                   "write the unit in the cell beside the number");
            if (cell.text != last_text) {
                unit = read_unit(cell.text);
                last_text = cell.text;
            }
            const Value value = value_of(grid.at(row, 0), unit);
            filling.agree(unit, cell.text);
            const double u =
                grid.columns() == 3 ? uncertainty_of(grid.at(row, 2), value.si, unit) : 0;
            filling.put(row, value.si);
            filling.put_uncertainty(row, u > 0 ? u : value.u);
        } catch (Failure& failure) {
            if (form.count() == 1) throw;
            filling.fault(row, std::move(failure));
        }
    }
}

void fill_headed(Form const& form, Filling& filling) {
    Grid const& grid = form.grid;
    const auto heading = read_heading(grid.at(0, 0).text);
    filling.agree(heading.unit, heading.text);
    const bool with_u = grid.columns() == 2;
    Unit u_unit = heading.unit;
    if (with_u && grid.at(0, 1).text != "u") u_unit = read_heading(grid.at(0, 1).text).unit;
    if (u_unit.dimension != heading.unit.dimension)
        core::refuse_unfit(std::string(grid.at(0, 1).text),
                           "uncertainties of the dimension of their values",
                           "head the column `u`, and give it in the unit of the values");
    const bool coherent = heading.unit.is_coherent();
    for (std::size_t row = 0; row < form.count(); ++row) {
        Cell const& cell = grid.at(row + 1, 0);
        if (is_number(cell) && !with_u) { // nearly every row of nearly every column
            filling.put(row, coherent ? cell.number : heading.unit.to_si(cell.number));
            continue;
        }
        if (is_blank(cell) && (!with_u || is_blank(grid.at(row + 1, 1)))) {
            filling.blank(row);
            continue;
        }
        try {
            const Value value = value_of(cell, heading.unit);
            const double u = with_u ? uncertainty_of(grid.at(row + 1, 1), value.si, u_unit) : 0;
            filling.put(row, value.si);
            filling.put_uncertainty(row, u > 0 ? u : value.u);
        } catch (Failure& failure) {
            filling.fault(row, std::move(failure));
        }
    }
}

} // namespace

void read_numbers(Block block, Numbers& numbers) {
    if (block.single() && is_number(block.at(0, 0)) && block.at(0, 0).number == 0)
        core::refuse_unfit(
            "a blank cell, or the bare number 0", "a value that is seen to be meant",
            "fill the cell, or write a zero that is meant as the text \"0\" or with its unit");
    const Form form = recognise(block);
    numbers.across = form.grid.across && form.count() > 1;
    numbers.listed = form.count() > 1;
    Filling filling(numbers, form.count());
    switch (form.layout) {
    case Layout::bare:
        numbers.bare = true;
        fill_bare(form, filling);
        break;
    case Layout::texts:
        fill_texts(form, filling, numbers.bare);
        break;
    case Layout::pairs:
        fill_pairs(form, filling);
        break;
    case Layout::headed:
        fill_headed(form, filling);
        break;
    }
}

std::string_view written_unit(Block block, std::size_t row) {
    const Form form = recognise(block);
    if (form.layout == Layout::pairs && row < form.count()) return form.grid.at(row, 1).text;
    if (form.layout == Layout::headed) return read_heading(form.grid.at(0, 0).text).text;
    if (form.layout == Layout::texts && row < form.count() && is_text(form.grid.at(row, 0)))
        return read_quantity(form.grid.at(row, 0).text).written_unit;
    return {};
}

std::string written(Block block, std::size_t row) {
    const Form form = recognise(block);
    if (row >= form.count()) return {};
    Cell const& cell = form.grid.at(row + form.first(), 0);
    std::string text = is_number(cell)
                           ? core::text::write_number(static_cast<long double>(cell.number), 15)
                           : std::string(cell.text);
    if (form.layout == Layout::pairs || form.layout == Layout::headed)
        text.append(" ").append(written_unit(block, row));
    return text;
}

} // namespace registration
