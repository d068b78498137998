// SPDX-License-Identifier: MPL-2.0
#include "core/materials/material_text.h"

#include "core/materials/headed_columns.h"
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

OwnMaterial read_material(std::string_view text, Notes const& notes) {
    if (!is_material_text(text))
        refuse_unfit(text::shown(text), "a text that begins with `material`",
                     "take the text as MATERIAL.OF wrote it");
    if (text.size() > longest_material_text)
        refuse_unfit(text::shown(text), "the text of a material of no more than 32000 bytes",
                     "give the block of cells instead");
    Reader reader(text);
    const std::string_view name = reader.read_name();
    OwnMaterial material = materials::read_columns(reader.read_columns(), notes);
    material.set_name(name);
    return material;
}

namespace {

class Writer {
public:
    explicit Writer(OwnMaterial const& material) : material_(material), text_(leading_word) {}

    std::string write() {
        if (!material_.name().empty()) text_ += " \"" + std::string(material_.name()) + '"';
        if (const auto mass = material_.molar_mass())
            column("molar mass / (kg/mol)", std::vector{mass->value()});
        if (material_.rows().empty())
            write_table();
        else
            write_rows();
        return std::move(text_);
    }

private:
    std::string_view heat_capacity_unit() const {
        constexpr std::string_view units[] = {"(J/(mol·K))", "(J/(kg·K))", "(J/K)"};
        return units[static_cast<std::size_t>(material_.basis())];
    }
    std::string_view energy_unit() const {
        constexpr std::string_view units[] = {"(J/mol)", "(J/kg)", "J"};
        return units[static_cast<std::size_t>(material_.basis())];
    }

    template<class Values>
    void column(std::string const& heading, Values const& values) {
        text_ += " | " + heading + ':';
        for (const double value : values) text_ += ' ' + number(value);
    }

    /// A column of what `of` takes from each row.
    template<class Of>
    void row_column(std::string const& heading, Of&& of) {
        std::vector<double> values;
        for (CorrelationRow const& row : material_.rows()) values.push_back(of(row));
        column(heading, values);
    }

    template<class Of>
    void latent_column(std::string const& label, Of&& of) {
        const auto rows = material_.rows();
        if (std::all_of(rows.begin(), rows.end(), [&](auto const& row) { return of(row) == 0; }))
            return;
        row_column(label + " / " + std::string(energy_unit()), of);
    }

    void write_table() {
        column("T / K", material_.temperatures());
        column("cp / " + std::string(heat_capacity_unit()), material_.heat_capacities());
    }

    void write_rows() {
        row_column("from / K", [](auto const& row) { return row.from; });
        row_column("to / K", [](auto const& row) { return row.to; });
        for (const double exponent : exponents())
            row_column("T^" + number(exponent) + " / " + std::string(heat_capacity_unit()),
                       [&](auto const& row) { return coefficient(row, exponent); });
        latent_column("transition", [](auto const& row) { return row.transition; });
        latent_column("spread", [](auto const& row) { return row.spread; });
        write_phases();
    }

    /// Every exponent once, in the order in which the rows have them.
    std::vector<double> exponents() const {
        std::vector<double> all;
        for (CorrelationRow const& row : material_.rows())
            for (Term const& term : row.terms)
                if (std::find(all.begin(), all.end(), term.exponent) == all.end())
                    all.push_back(term.exponent);
        return all;
    }

    static double coefficient(CorrelationRow const& row, double exponent) {
        double sum = 0;
        for (Term const& term : row.terms)
            if (term.exponent == exponent) sum += term.coefficient;
        return sum;
    }

    void write_phases() {
        const auto rows = material_.rows();
        if (std::all_of(rows.begin(), rows.end(),
                        [](auto const& row) { return row.phase.empty(); }))
            return;
        text_ += " | phase:";
        for (CorrelationRow const& row : rows) text_ += " \"" + row.phase + '"';
    }

    OwnMaterial const& material_;
    std::string text_;
};

} // namespace

std::string write_material(OwnMaterial const& material) {
    std::string text = Writer(material).write();
    if (text.size() > longest_material_text)
        refuse_unfit("a text of " + std::to_string(text.size()) + " bytes",
                     "a material whose text has no more than 32000 bytes",
                     "give the block of cells itself where the material is needed");
    return text;
}

} // namespace core::materials
