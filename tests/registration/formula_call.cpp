// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_call.h"

#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "registration/results.h"

#include <bit>
#include <charconv>
#include <stdexcept>

namespace tests {

using registration::Answer, registration::Block, registration::Cell;

Range Range::text_cell(const char* text) {
    Range range;
    range.texts_.push_back(std::make_shared<const std::string>(text));
    range.cells_.push_back({Cell::Kind::text, 0, *range.texts_.back()});
    range.rows_ = range.columns_ = 1;
    return range;
}

Range Range::number_cell(double number) {
    Range range;
    range.cells_.push_back({Cell::Kind::number, number, {}});
    range.rows_ = range.columns_ = 1;
    return range;
}

Range Range::blank() {
    Range range;
    range.cells_.push_back({});
    range.rows_ = range.columns_ = 1;
    return range;
}

Range::Range(std::vector<std::vector<Range>> rows)
    : rows_(rows.size()), columns_(rows.front().size()) {
    for (auto& row : rows) {
        if (row.size() != columns_) throw std::logic_error("ragged range in a test");
        for (Range& cell : row) {
            cells_.push_back(cell.cells_.front());
            texts_.insert(texts_.end(), cell.texts_.begin(), cell.texts_.end());
        }
    }
}

Range Range::column(std::vector<Range> cells) {
    std::vector<std::vector<Range>> rows;
    for (Range& cell : cells) rows.push_back({std::move(cell)});
    return Range(std::move(rows));
}

Range Range::row(std::vector<Range> cells) {
    return Range(std::vector<std::vector<Range>>{std::move(cells)});
}

Range Range::repeated(std::size_t rows) const {
    if (cells_.size() != 1) return *this;
    return column(std::vector<Range>(rows, *this));
}

Answer call(std::string_view function, std::vector<Range> const& arguments) {
    registration::Entry const* entry = registration::catalogue::find(function);
    if (!entry) throw std::logic_error("no such function: " + std::string(function));
    if (arguments.size() > entry->argument_count())
        throw std::logic_error("too many arguments for " + std::string(function));
    std::vector<Block> blocks;
    for (Range const& range : arguments) blocks.push_back(range.block());
    blocks.resize(entry->argument_count());
    return registration::call(*entry, blocks);
}

namespace {

/// Takes a formula apart; only what the documented examples use.
class Reader {
public:
    Reader(std::string_view text, std::size_t rows) : text_(text), rows_(rows) {}

    Answer run() {
        const std::size_t bracket = text_.find('(');
        const std::string_view name = text_.substr(0, bracket);
        at_ = bracket + 1;
        std::vector<Range> arguments;
        for (bool more = peek() != ')'; more;) {
            arguments.push_back(argument().repeated(rows_));
            more = peek() == ';';
            if (more) ++at_;
        }
        if (peek() != ')' || at_ + 1 != text_.size())
            throw std::logic_error("cannot read the formula " + std::string(text_));
        return call(name, arguments);
    }

private:
    char peek() {
        while (at_ < text_.size() && text_[at_] == ' ') ++at_;
        return at_ < text_.size() ? text_[at_] : '\0';
    }

    Range argument() {
        if (peek() == ';' || peek() == ')') return Range();
        return peek() == '{' ? array() : cell();
    }

    Range cell() {
        if (peek() != '"') return number();
        const std::size_t end = text_.find('"', ++at_);
        const std::string content(text_.substr(at_, end - at_));
        at_ = end + 1;
        return Range(content.c_str());
    }

    Range number() {
        double value = 0;
        const auto [end, error] =
            std::from_chars(text_.data() + at_, text_.data() + text_.size(), value);
        if (error != std::errc{})
            throw std::logic_error("cannot read a number in " + std::string(text_));
        at_ = static_cast<std::size_t>(end - text_.data());
        return Range(value);
    }

    Range array() {
        std::vector<std::vector<Range>> rows(1);
        do {
            ++at_;
            rows.back().push_back(cell());
            if (peek() == '|') rows.emplace_back();
        } while (peek() == ';' || peek() == '|');
        ++at_;
        return Range::table(std::move(rows));
    }

    std::string_view text_;
    std::size_t rows_;
    std::size_t at_ = 0;
};

std::string error_name(double number) {
    switch (std::bit_cast<std::uint64_t>(number) & 0xFFFF) {
    case 519:
        return "#VALUE!";
    case 503:
        return "#NUM!";
    case 523:
        return "Err:523";
    default:
        return "an error without a code";
    }
}

} // namespace

Answer call_formula(std::string_view formula) { return Reader(formula, 1).run(); }

Answer call_formula_in_rows(std::string_view formula, std::size_t rows) {
    return Reader(formula, rows).run();
}

double number(Answer const& answer) {
    if (answer.kind != Answer::Kind::numbers)
        throw std::logic_error("a text where a number was expected: " + answer.texts.at(0));
    return answer.numbers.at(0);
}

std::string text(Answer const& answer, std::size_t cell) {
    for (auto const& error : answer.errors)
        if (error.cell == cell) return error_name(error.number);
    for (const std::size_t blank : answer.blanks)
        if (blank == cell) return "";
    if (answer.kind == Answer::Kind::texts) return answer.texts.at(cell);
    const double value = answer.numbers.at(cell);
    return value == value ? core::text::write_number(static_cast<long double>(value), 15)
                          : error_name(value);
}

} // namespace tests
