// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <cstddef>
#include <string>
#include <utility>
#include <vector>

namespace registration {

/// A result of several columns, filled row by row: a cell is a text, a number, or blank.
class Array {
public:
    explicit Array(std::size_t columns) : columns_(columns) {}

    void add(double number) {
        numbers.push_back(number), texts.emplace_back(), blanks.push_back(false);
    }
    void add(std::string text) {
        numbers.push_back(0), blanks.push_back(text.empty());
        texts.push_back(std::move(text));
    }
    void add_blank() { add(std::string()); }

    std::size_t columns() const { return columns_; }
    std::size_t rows() const { return numbers.size() / columns_; }

    std::vector<double> numbers;
    std::vector<std::string> texts; ///< empty where the cell is a number or blank
    std::vector<bool> blanks;

private:
    std::size_t columns_;
};

} // namespace registration
