// SPDX-License-Identifier: MPL-2.0
#include "core/substances/formula_text.h"

#include "core/failure.h"

#include <algorithm>
#include <array>
#include <cstddef>

namespace core::substances {

namespace {

constexpr std::size_t longest = 200;

struct Fold {
    std::string_view from, to;
};

constexpr std::array<Fold, 16> folds{{{"·", "*"},
                                      {"•", "*"},
                                      {"⋅", "*"},
                                      {"∙", "*"},
                                      {"₀", "0"},
                                      {"₁", "1"},
                                      {"₂", "2"},
                                      {"₃", "3"},
                                      {"₄", "4"},
                                      {"₅", "5"},
                                      {"₆", "6"},
                                      {"₇", "7"},
                                      {"₈", "8"},
                                      {"₉", "9"},
                                      {"\u00A0", " "},
                                      {"\u202F", " "}}};

/// Signs and superscripts, by which charges are written.
constexpr std::array<std::string_view, 10> charges{"+", "-", "−", "^", "⁺",
                                                   "⁻", "¹", "²", "³", "⁴"};

/// States of matter by their IUPAC symbols (Green Book, 3rd ed. 2007, 2.10.1) that leave the molar
/// mass what it is.
constexpr std::array<std::string_view, 6> states{"g", "l", "s", "cr", "am", "vit"};

[[noreturn]] void refuse(std::string_view formula, char const* needed, char const* repair) {
    refuse_unfit(std::string(formula), needed, repair);
}

std::string_view without_state(std::string_view formula) {
    if (formula.empty() || formula.back() != ')') return formula;
    const std::size_t open = formula.rfind('(');
    if (open == std::string_view::npos || open == 0) return formula;
    const std::string_view inside = formula.substr(open + 1, formula.size() - open - 2);
    const std::string_view state = inside.substr(0, inside.find(','));
    if (state == "aq") refuse(formula, "a pure substance, not a dissolved one", "leave `(aq)` out");
    if (std::find(states.begin(), states.end(), state) == states.end()) return formula;
    return formula.substr(0, formula.find_last_not_of(' ', open - 1) + 1);
}

constexpr bool is_plain(char c) {
    return (c >= '0' && c <= '9') || (to_small(c) >= 'a' && to_small(c) <= 'z');
}

/// The character that begins here, and what stands for it in the grammar.
Fold next(std::string_view rest, std::string_view formula) {
    if (is_plain(rest[0])) return {rest.substr(0, 1), rest.substr(0, 1)};
    if (rest[0] == ',')
        refuse(formula, "counts with a decimal point", "write a point instead of the comma");
    for (std::string_view charge : charges)
        if (rest.starts_with(charge))
            refuse(formula, "a formula without a charge", "leave the charge out");
    for (Fold const& fold : folds)
        if (rest.starts_with(fold.from)) return fold;
    if (rest.starts_with("½")) return {rest.substr(0, std::string_view("½").size()), "½"};
    if (static_cast<unsigned char>(rest[0]) > 126 || static_cast<unsigned char>(rest[0]) < 32)
        refuse(formula, "a chemical formula", "write it in letters, digits, brackets and `·`");
    return {rest.substr(0, 1), rest.substr(0, 1)};
}

} // namespace

std::string fold_formula(std::string_view formula) {
    if (formula.size() > 4 * longest)
        refuse({}, "a formula of at most 200 characters", "shorten it");
    std::string folded;
    std::string_view rest = without_state(formula);
    while (!rest.empty()) {
        const auto [from, to] = next(rest, formula);
        rest.remove_prefix(from.size());
        const bool behind_dot = !folded.empty() && folded.back() == '*';
        if (to == "*") folded.erase(folded.find_last_not_of(' ') + 1);
        if (to == " " && behind_dot) continue;
        if (to == "½" && !behind_dot)
            refuse(formula, "`½` behind a `·` only", "write the count as 0.5");
        folded += to == "½" ? std::string_view("0.5") : to;
    }
    if (folded.size() > longest) refuse({}, "a formula of at most 200 characters", "shorten it");
    return folded;
}

} // namespace core::substances
