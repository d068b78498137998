// SPDX-License-Identifier: MPL-2.0
#include "core/substances/stoichiometric_text.h"

#include "core/failure.h"
#include "core/text/characters.h"

#include <array>
#include <charconv>
#include <cstddef>

namespace core::substances {

namespace {

constexpr double largest_coefficient = 1e6;
constexpr std::size_t most_terms = 100;

struct Spelling {
    std::string_view text;
    double value;
};
constexpr std::array<Spelling, 6> fractions{
    {{"½", 0.5}, {"¼", 0.25}, {"¾", 0.75}, {"⅓", 1.0 / 3}, {"⅔", 2.0 / 3}, {"⅕", 0.2}}};
constexpr std::array<std::string_view, 4> blanks{" ", "\t", "\u00A0", "\u202F"};
constexpr std::array<std::string_view, 3> products{"·", "*", "⋅"};

[[noreturn]] void refuse(std::string_view whole, std::string needed, std::string repair) {
    refuse_unfit(text::shown(whole), std::move(needed), std::move(repair));
}

template<std::size_t N>
bool take_any(std::string_view& text, std::array<std::string_view, N> const& choices) {
    for (std::string_view choice : choices)
        if (text.starts_with(choice)) {
            text.remove_prefix(choice.size());
            return true;
        }
    return false;
}

void skip_blanks(std::string_view& text) {
    while (take_any(text, blanks)) {
    }
}

void drop_blanks_behind(std::string_view& text) {
    for (bool any = true; any;) {
        any = false;
        for (std::string_view blank : blanks)
            if (text.ends_with(blank)) {
                text.remove_suffix(blank.size());
                any = true;
            }
    }
}

bool is_digit(char c) { return c >= '0' && c <= '9'; }

/// Digits with a decimal point or without, or nothing. from_chars never asks the locale.
bool take_number(std::string_view& text, double& value) {
    std::size_t length = 0;
    while (length < text.size() && (is_digit(text[length]) || text[length] == '.')) ++length;
    const auto end =
        std::from_chars(text.data(), text.data() + length, value, std::chars_format::fixed);
    if (length == 0 || end.ec != std::errc() || end.ptr != text.data() + length) return false;
    text.remove_prefix(length);
    return true;
}

double vulgar_fraction(std::string_view& text) {
    for (Spelling const& fraction : fractions)
        if (text.starts_with(fraction.text)) {
            text.remove_prefix(fraction.text.size());
            return fraction.value;
        }
    return 0;
}

/// Whether a number stands at the beginning of a name: `1-butene`, `1,3-butadiene`.
bool goes_on_as_name(std::string_view rest) {
    return rest.starts_with('-') ||
           (rest.size() > 2 && rest[0] == ',' && is_digit(rest[1]) && rest[2] == '-');
}

/// The coefficient a term begins with, 1 where none does.
double take_coefficient(std::string_view& text, std::string_view whole) {
    std::string_view rest = text;
    double value = 0;
    const bool number = take_number(rest, value);
    if (number && goes_on_as_name(rest)) return 1;
    if (number && rest.starts_with(','))
        refuse(whole, "coefficients with a decimal point", "write a point instead of the comma");
    if (number && rest.starts_with('/')) {
        rest.remove_prefix(1);
        double below = 0;
        if (!take_number(rest, below) || below == 0)
            refuse(whole, "a fraction such as `3/2`", "complete the fraction");
        value /= below;
    } else {
        const double part = vulgar_fraction(rest);
        if (!number && part == 0) return 1;
        value += part;
    }
    if (!(value > 0) || value > largest_coefficient)
        refuse(whole, "coefficients from above 0 to 1000000", "check the coefficients");
    skip_blanks(rest);
    take_any(rest, products);
    text = rest;
    return value;
}

Term read_term(std::string_view text, std::string_view whole) {
    skip_blanks(text);
    drop_blanks_behind(text);
    const double coefficient = take_coefficient(text, whole);
    skip_blanks(text);
    if (text.empty())
        refuse(whole, "a substance between two plus signs and at each end",
               "write it as in `2 Al + 3/2 O2 -> Al2O3`, without charges");
    return {coefficient, text};
}

/// Where the term ends: at a plus sign outside brackets.
std::size_t end_of_term(std::string_view text) {
    int depth = 0;
    for (std::size_t at = 0; at < text.size(); ++at) {
        if (text[at] == '(' || text[at] == '[') ++depth;
        if (text[at] == ')' || text[at] == ']') --depth;
        if (text[at] == '+' && depth <= 0) return at;
    }
    return text.size();
}

} // namespace

std::vector<Term> read_terms(std::string_view text, std::string_view whole) {
    std::vector<Term> terms;
    for (;;) {
        const std::size_t end = end_of_term(text);
        terms.push_back(read_term(text.substr(0, end), whole));
        if (end == text.size()) return terms;
        if (terms.size() == most_terms) refuse(whole, "at most 100 substances", "shorten it");
        text.remove_prefix(end + 1);
    }
}

} // namespace core::substances
