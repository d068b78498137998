// SPDX-License-Identifier: MPL-2.0
#include "registration/given.h"

#include <algorithm>
#include <limits>

namespace registration {

void Given::read() const {
    if (asked_) return;
    asked_ = true;
    try {
        read_numbers(block_, numbers_);
    } catch (core::Failure& failure) {
        unreadable_ = std::move(failure);
    }
}

Numbers const& Given::numbers() const {
    read();
    if (unreadable_) throw core::Failure(*unreadable_);
    return numbers_;
}

Numbers const* Given::if_numbers() const {
    read();
    return unreadable_ ? nullptr : &numbers_;
}

core::Table Given::table() const {
    if (table_.empty())
        for (std::size_t i = 0; i < block_.size(); ++i)
            table_.push_back(block_.cells[i].kind == Cell::Kind::number
                                 ? block_.cells[i].number
                                 : std::numeric_limits<double>::quiet_NaN());
    return {table_.data(), block_.rows, block_.columns};
}

core::Formulas Given::texts() const {
    if (texts_.empty())
        for (std::size_t row = 0; row < block_.size(); ++row)
            if (!std::ranges::binary_search(dropped_, row))
                texts_.push_back(block_.cells[row].text);
    return texts_;
}

bool Given::blank(std::size_t row) const {
    if (Numbers const* numbers = if_numbers())
        return std::ranges::binary_search(numbers->blanks, row);
    return cell(row).kind == Cell::Kind::blank;
}

void Given::drop(std::span<const std::size_t> rows) {
    dropped_.assign(rows.begin(), rows.end());
    if (!if_numbers()) return;
    const auto keep = [&](auto& values) {
        std::size_t to = 0;
        for (std::size_t row = 0; row < values.size(); ++row)
            if (!std::ranges::binary_search(dropped_, row)) values[to++] = values[row];
        values.resize(to);
    };
    keep(numbers_.si);
    keep(numbers_.u);
    numbers_.blanks.clear();
}

void Given::move_all(double times) {
    Numbers const& stated = numbers();
    moved_.assign(stated.si.begin(), stated.si.end());
    for (std::size_t row = 0; row < stated.u.size(); ++row) moved_[row] += times * stated.u[row];
}

void Given::move_one(std::size_t row, double times) {
    Numbers const& stated = numbers();
    if (moved_.empty()) moved_.assign(stated.si.begin(), stated.si.end());
    moved_[row] = stated.si[row] + times * stated.u[row];
}

} // namespace registration
