// SPDX-License-Identifier: MPL-2.0
#include "registration/own_material.h"

#include "core/text/quantity.h"

#include <limits>

namespace registration {
namespace {

using core::materials::Description;
using core::materials::HeadedColumn;

constexpr double nothing = std::numeric_limits<double>::quiet_NaN();

/// `2 %` or `0.4 (k=2)` as a number in the unit of the value's heading.
double uncertainty_of(Cell const& cell, HeadedColumn const& values, std::size_t row) {
    const Unit unit = core::text::read_heading(values.heading).unit;
    const double si = unit.to_si(values.numbers.at(row));
    return core::text::read_uncertainty(cell.text, si, unit) / unit.span_to_si(1);
}

double number_of(Cell const& cell, HeadedColumn const& column, HeadedColumn const* before) {
    if (cell.kind == Cell::Kind::number) return cell.number;
    if (cell.kind == Cell::Kind::blank) return nothing;
    const std::size_t row = column.numbers.size();
    if (holds_uncertainties(column) && before && row < before->numbers.size())
        return uncertainty_of(cell, *before, row);
    core::refuse_unfit(std::string(cell.text) + " under the heading " + std::string(column.heading),
                       "numbers, in the unit of the heading", "write the number alone");
}

/// Words stand under `phase` only, numbers under every other heading.
HeadedColumn column_of(Block block, std::size_t at, HeadedColumn const* before) {
    HeadedColumn column{.heading = block.at(0, at).text};
    for (std::size_t row = 1; row < block.rows; ++row)
        if (column.heading == "phase")
            column.words.push_back(block.at(row, at).text);
        else
            column.numbers.push_back(number_of(block.at(row, at), column, before));
    return column;
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

Description read_description(Given const& given) {
    const Block block = given.block();
    if (block.single()) return core::materials::read_description(block.at(0, 0).text);
    Description description;
    for (std::size_t at = 0; at < block.columns; ++at)
        description.columns.push_back(
            column_of(block, at, at > 0 ? &description.columns.back() : nullptr));
    return description;
}

std::shared_ptr<const core::materials::OwnMaterial> read_own_material(Given const& given,
                                                                      core::Notes const& notes) {
    const auto made = [&](core::Notes const& hearing) {
        Description description = read_description(given);
        move(description, given.moved_place());
        return std::make_shared<const core::materials::OwnMaterial>(made_of(description, hearing));
    };
    if (given.moved_place()) return made(core::silent);
    KeptMaterial& kept = given.kept_material();
    if (!kept.material) kept.material = made({nullptr, &kept.remarks});
    for (std::string const& remark : kept.remarks) notes.remark([&] { return remark; });
    return kept.material;
}

std::vector<Place> uncertain_places(Description const& description, std::size_t cell) {
    std::vector<Place> places;
    for (std::size_t at = 1; at < description.columns.size(); ++at) {
        if (!holds_uncertainties(description.columns[at])) continue;
        auto const& u = description.columns[at].numbers;
        for (std::size_t row = 0; row < u.size(); ++row)
            if (u[row] > 0) places.push_back({cell, at - 1, row, u[row]});
    }
    return places;
}

void move(Description& description, std::optional<MovedPlace> const& moved, std::size_t cell) {
    if (!moved || moved->place.cell != cell) return;
    description.columns[moved->place.column].numbers[moved->place.row] +=
        moved->times * moved->place.u;
}

} // namespace registration
