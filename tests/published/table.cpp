// SPDX-License-Identifier: MPL-2.0
#include "tests/published/table.h"

#include <charconv>
#include <fstream>
#include <istream>
#include <stdexcept>

namespace published {

namespace {

[[noreturn]] void fail(std::string const& reason) { throw std::runtime_error(reason); }

double to_number(std::string_view text) {
    double value = 0;
    const auto end = std::from_chars(text.data(), text.data() + text.size(), value);
    if (end.ec != std::errc{} || end.ptr != text.data() + text.size())
        fail("not a number: " + std::string(text));
    return value;
}

/// Splits a line at its commas; a field in double quotes may hold commas.
std::vector<std::string> fields_of(std::string_view line) {
    std::vector<std::string> fields(1);
    bool quoted = false;
    for (char c : line) {
        if (c == '"')
            quoted = !quoted;
        else if (c == ',' && !quoted)
            fields.emplace_back();
        else
            fields.back() += c;
    }
    if (quoted) fail("a quote that is not closed: " + std::string(line));
    return fields;
}

/// Passes the head lines and returns the row of column names behind them.
std::string pass_head(std::istream& in) {
    bool source = false;
    std::string line;
    while (std::getline(in, line) && line.starts_with('#'))
        source = source || line.starts_with("# Source: ");
    if (!source) fail("no source named");
    return line;
}

Row to_row(std::vector<std::string> const& columns, std::string const& line) {
    const std::vector<std::string> fields = fields_of(line);
    if (fields.size() != columns.size()) fail("fields too many or too few: " + line);
    std::map<std::string, std::string, std::less<>> row;
    for (std::size_t i = 0; i < fields.size(); ++i) row.emplace(columns[i], fields[i]);
    return Row(std::move(row));
}

} // namespace

std::string const& Row::text(std::string_view column) const {
    const auto field = fields_.find(column);
    if (field == fields_.end()) fail("no such column: " + std::string(column));
    return field->second;
}

double Row::number(std::string_view column) const { return to_number(text(column)); }

std::vector<double> Row::numbers(std::string_view column) const {
    std::vector<double> numbers;
    std::string_view rest = text(column);
    while (!rest.empty()) {
        const std::size_t blank = std::min(rest.find(' '), rest.size());
        numbers.push_back(to_number(rest.substr(0, blank)));
        rest.remove_prefix(std::min(blank + 1, rest.size()));
    }
    return numbers;
}

std::vector<Row> read_table(std::istream& in, std::vector<std::string> const& columns,
                            std::size_t rows) {
    if (fields_of(pass_head(in)) != columns) fail("other columns than expected");
    std::vector<Row> table;
    for (std::string line; std::getline(in, line);) table.push_back(to_row(columns, line));
    if (table.size() != rows)
        fail("rows read: " + std::to_string(table.size()) + ", expected: " + std::to_string(rows));
    return table;
}

std::vector<Row> read_table(std::filesystem::path const& file,
                            std::vector<std::string> const& columns, std::size_t rows) {
    std::ifstream in(file);
    if (!in) fail("cannot open " + file.string());
    return read_table(in, columns, rows);
}

} // namespace published
