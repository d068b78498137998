// SPDX-License-Identifier: MPL-2.0
#pragma once

// A strict reader of the CSV tables that are turned into arrays when the project is built: lines
// `# ...`, a row of column names, rows of values as comma-separated text with quotes where a value
// holds a comma.

#include <fstream>
#include <stdexcept>
#include <string>
#include <string_view>
#include <vector>

namespace tables {

using Fields = std::vector<std::string>;

inline Fields split(std::string const& line) {
    Fields fields(1);
    bool quoted = false;
    for (char c : line) {
        if (c == '"')
            quoted = !quoted;
        else if (c == ',' && !quoted)
            fields.emplace_back();
        else
            fields.back() += c;
    }
    if (quoted) throw std::runtime_error("an open quote: " + line);
    return fields;
}

/// The rows of a file, whose columns must be exactly these in this order.
inline std::vector<Fields> read_rows(std::string const& file, Fields const& columns) {
    std::ifstream in(file);
    std::vector<Fields> rows;
    bool headed = false;
    for (std::string line; std::getline(in, line);) {
        if (line.starts_with('#')) continue;
        Fields fields = split(line);
        if (!headed && fields != columns) throw std::runtime_error(file + ": unknown columns");
        if (fields.size() != columns.size())
            throw std::runtime_error(file + ": fields too many or too few: " + line);
        if (headed) rows.push_back(std::move(fields));
        headed = true;
    }
    if (rows.empty()) throw std::runtime_error(file + ": no rows");
    return rows;
}

/// The whole field as a number.
inline double number(std::string const& field) {
    std::size_t used = 0;
    const double value = std::stod(field, &used);
    if (used != field.size()) throw std::runtime_error("no number: " + field);
    return value;
}

} // namespace tables
