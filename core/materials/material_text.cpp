// SPDX-License-Identifier: MPL-2.0
#include "core/materials/material_text.h"

#include "core/text/characters.h"

#include <algorithm>
#include <charconv>
#include <cmath>
#include <system_error>
#include <vector>

namespace core::materials {

namespace {

constexpr std::string_view leading_word = "material";

std::string number(double value) {
    char text[32];
    return std::string(text, std::to_chars(text, text + sizeof text, value).ptr);
}

/// The parser: one function a rule of the grammar in the header.
class Reader {
public:
    explicit Reader(std::string_view text) : rest_(text.substr(leading_word.size())) {}

    std::string_view read_name() {
        pass_blanks();
        return here() == '"' ? string() : std::string_view();
    }

    std::vector<HeadedColumn> read_columns() {
        std::vector<HeadedColumn> columns;
        for (pass_blanks(); !rest_.empty(); pass_blanks()) {
            if (here() != '|') refuse("`|` before the next column");
            rest_.remove_prefix(1);
            columns.push_back(column());
        }
        return columns;
    }

private:
    char here() const { return rest_.empty() ? '\0' : rest_.front(); }
    void pass_blanks() {
        while (here() == ' ') rest_.remove_prefix(1);
    }

    std::string_view take(std::size_t count) {
        const std::string_view taken = rest_.substr(0, count);
        rest_.remove_prefix(taken.size());
        return taken;
    }

    HeadedColumn column() {
        pass_blanks();
        const std::size_t colon = rest_.find_first_of(":|\"");
        if (colon == std::string_view::npos || rest_[colon] != ':')
            refuse("a heading with `:` behind it");
        HeadedColumn column{take(colon)};
        rest_.remove_prefix(1);
        for (pass_blanks(); !rest_.empty() && here() != '|'; pass_blanks())
            if (here() == '"')
                column.words.push_back(string());
            else
                column.numbers.push_back(value());
        return column;
    }

    std::string_view string() {
        const std::size_t close = rest_.find('"', 1);
        if (close == std::string_view::npos) refuse("a `\"` that closes");
        return take(close + 1).substr(1, close - 1);
    }

    double value() {
        const std::size_t end = std::min(rest_.find_first_of(" |\""), rest_.size());
        const std::string_view digits = rest_.substr(0, end);
        double number = 0;
        const auto read = std::from_chars(digits.data(), digits.data() + digits.size(), number);
        const bool whole = read.ec == std::errc{} && read.ptr == digits.data() + digits.size();
        if (!whole || !std::isfinite(number)) refuse("a number with a decimal point");
        take(end);
        return number;
    }

    [[noreturn]] void refuse(const char* needed) const {
        refuse_unfit(rest_.empty() ? "the end of the text" : text::shown(rest_, 30),
                     std::string("in the text of a material: ") + needed,
                     "take the text as MATERIAL.OF wrote it");
    }

    std::string_view rest_;
};

} // namespace

bool is_material_text(std::string_view text) {
    if (!text.starts_with(leading_word)) return false;
    text.remove_prefix(leading_word.size());
    return text.empty() || text.front() == ' ' || text.front() == '|' || text.front() == '"';
}

Description read_description(std::string_view text) {
    if (!is_material_text(text))
        refuse_unfit(text::shown(text), "a text that begins with `material`",
                     "take the text as MATERIAL.OF wrote it");
    if (text.size() > longest_material_text)
        refuse_unfit(text::shown(text), "the text of a material of no more than 32000 bytes",
                     "give the block of cells instead");
    Reader reader(text);
    Description description{reader.read_name()};
    description.columns = reader.read_columns();
    return description;
}

OwnMaterial made_of(Description const& description, Notes const& notes) {
    OwnMaterial material = read_columns(description.columns, notes);
    material.set_name(description.name);
    return material;
}

namespace {

std::size_t length(HeadedColumn const& column) {
    return std::max(column.numbers.size(), column.words.size());
}

bool is_blank(HeadedColumn const& column, std::size_t row) {
    return column.words.empty() ? row >= column.numbers.size() || std::isnan(column.numbers[row])
                                : column.words[row].empty();
}

/// Whether a row holds nothing; a molar mass is of no row.
bool is_blank(Description const& description, std::size_t row) {
    return std::ranges::all_of(description.columns,
                               [&](HeadedColumn const& column) { return is_blank(column, row); });
}

/// Without the characters that would end a text here.
void check_writable(std::string_view text, const char* ends) {
    if (text.find_first_of(ends) != std::string_view::npos)
        refuse_unfit(text::shown(text),
                     std::string("a text without any of `") + ends + "`, which part a material",
                     "leave the character out");
}

std::string cell(HeadedColumn const& column, std::size_t row) {
    if (column.words.empty()) return number(is_blank(column, row) ? 0 : column.numbers[row]);
    check_writable(column.words[row], "\"");
    return '"' + std::string(column.words[row]) + '"';
}

} // namespace

std::string write_material(Description const& description) {
    std::string text(leading_word);
    if (!description.name.empty()) text += " \"" + std::string(description.name) + '"';
    for (HeadedColumn const& column : description.columns) {
        check_writable(column.heading, ":|\"");
        text.append(" | ").append(column.heading) += ':';
        for (std::size_t row = 0; row < length(column); ++row)
            if (!is_blank(description, row)) text += ' ' + cell(column, row);
    }
    if (text.size() > longest_material_text)
        refuse_unfit("a text of " + std::to_string(text.size()) + " bytes",
                     "a material whose text has no more than 32000 bytes",
                     "give the block of cells itself where the material is needed");
    return text;
}

} // namespace core::materials
