// SPDX-License-Identifier: MPL-2.0
#pragma once

// A strict reader of the published values in this folder. A file begins with lines `# ...` that
// name its source; then stand one row of column names and the rows of values, as comma-separated
// text.

#include <cstddef>
#include <filesystem>
#include <iosfwd>
#include <map>
#include <string>
#include <string_view>
#include <vector>

namespace published {

class Row {
public:
    explicit Row(std::map<std::string, std::string, std::less<>> fields)
        : fields_(std::move(fields)) {}

    std::string const& text(std::string_view column) const;
    /// The field as a number; throws where anything but a number stands there.
    double number(std::string_view column) const;
    /// Numbers with one blank between each.
    std::vector<double> numbers(std::string_view column) const;

private:
    std::map<std::string, std::string, std::less<>> fields_;
};

/// Reads a table. Throws std::runtime_error where its columns are not exactly those expected, in
/// their order; where its number of rows is not the one expected; where a row has fields too many
/// or too few; and where no head line names a source.
std::vector<Row> read_table(std::istream& in, std::vector<std::string> const& columns,
                            std::size_t rows);
std::vector<Row> read_table(std::filesystem::path const& file,
                            std::vector<std::string> const& columns, std::size_t rows);

} // namespace published
