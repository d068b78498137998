// SPDX-License-Identifier: MPL-2.0
#include "core/substances/formula.h"

#include "core/failure.h"
#include "core/substances/formula_text.h"
#include "core/written.h"

#include <algorithm>
#include <charconv>
#include <cstddef>

// The grammar, after formula_text.h has folded the text to ASCII:
//
//   formula  = group { dot [ count { blank } ] group }
//   group    = unit { unit }
//   unit     = ( symbol | bracket ) [ count ]
//   bracket  = "(" group ")" | "[" group "]"
//   symbol   = capital [ small ]
//   count    = digits [ "." digits ]              above 0, no idle zeros in front
//   dot      = "*"                                folded from "·"
//            | "."                                before a symbol or bracket only
//
// A full stop between digits is a decimal point. Where a count behind a symbol or bracket may as
// well have been meant to end at the dot of an addition compound, `Al2O3.2SiO2`, the text is
// refused: a wrong mass must not come out silently.

namespace core::substances {

namespace {

constexpr int deepest = 8;
constexpr double largest_count = 1e6;

bool is_capital(char c) { return c >= 'A' && c <= 'Z'; }
bool is_small(char c) { return c >= 'a' && c <= 'z'; }
bool is_digit(char c) { return c >= '0' && c <= '9'; }

/// The first element whose symbol begins with the same letter; for J and Q there is none.
Element const* nearest_element(std::string_view spelling) {
    const std::span<const Element> all = elements();
    const auto found = std::find_if(all.begin(), all.end(), [&](Element const& element) {
        return element.symbol[0] == spelling[0];
    });
    return found == all.end() ? nullptr : &*found;
}

class Reader {
public:
    Reader(std::string_view text, std::string_view as_given) : text_(text), as_given_(as_given) {}

    std::vector<Part> formula() {
        std::vector<Part> parts = group();
        while (!at_end()) {
            if (!take_dot()) unexpected();
            const double times = coefficient();
            add(parts, group(), times);
        }
        return parts;
    }

private:
    std::vector<Part> group() {
        if (is_digit(peek()))
            refuse("a formula without a number in front",
                   "leave the number out and multiply the result");
        std::vector<Part> parts;
        do unit(parts);
        while (is_capital(peek()) || is_opening(peek()));
        return parts;
    }

    void unit(std::vector<Part>& parts) {
        if (is_opening(peek())) {
            const std::vector<Part> inside = bracket();
            add(parts, inside, optional_count());
        } else {
            Element const& element = symbol();
            add(parts, {{&element, 1}}, optional_count());
        }
    }

    std::vector<Part> bracket() {
        if (++depth_ > deepest)
            refuse("brackets at most " + std::to_string(deepest) + " deep", "simplify the formula");
        const char closing = text_[at_++] == '(' ? ')' : ']';
        std::vector<Part> inside = group();
        if (peek() != closing) refuse_bracket(closing);
        ++at_;
        --depth_;
        return inside;
    }

    [[noreturn]] void refuse_bracket(char closing) {
        if (!at_end() && !is_closing(peek())) unexpected();
        refuse(std::string("a `") + closing + "` for each opening bracket",
               "complete the brackets");
    }

    Element const& symbol() {
        if (!is_capital(peek())) unexpected();
        const std::size_t length = at_ + 1 < text_.size() && is_small(text_[at_ + 1]) ? 2 : 1;
        const std::string_view spelling = text_.substr(at_, length);
        Element const* element = find_element(spelling);
        if (element == nullptr) unknown(spelling);
        at_ += length;
        return *element;
    }

    [[noreturn]] void unknown(std::string_view spelling) {
        // `NaCL`: a capital that belongs to the letter before it.
        if (at_ > 0 && spelling.size() == 1 && is_capital(text_[at_ - 1])) {
            const std::string pair{text_[at_ - 1], to_small(spelling[0])};
            if (find_element(pair) != nullptr) no_element(spelling, "write `" + pair + '`');
        }
        Element const* near = nearest_element(spelling);
        no_element(spelling, near == nullptr ? "check the spelling"
                                             : "check the spelling; the nearest element is `" +
                                                   std::string(near->symbol) + '`');
    }

    [[noreturn]] void no_element(std::string_view spelling, std::string repair) {
        refuse("symbols of elements, which `" + std::string(spelling) + "` is not",
               std::move(repair));
    }

    double optional_count() {
        if (!is_digit(peek())) return 1;
        const std::string_view digits = number();
        check_point(digits);
        return count(digits);
    }

    double coefficient() {
        if (!is_digit(peek())) return 1;
        const double value = count(number());
        while (peek() == ' ') ++at_;
        return value;
    }

    /// Digits with a decimal point or without.
    std::string_view number() {
        const std::size_t begin = at_;
        skip_digits();
        if (peek() == '.' && at_ + 1 < text_.size() && is_digit(text_[at_ + 1])) {
            ++at_;
            skip_digits();
        }
        return text_.substr(begin, at_ - begin);
    }

    double count(std::string_view digits) {
        double value = 0;
        std::from_chars(digits.data(), digits.data() + digits.size(), value);
        const bool idle_zero = digits.size() > 1 && digits[0] == '0' && digits[1] != '.';
        if (idle_zero || !(value > 0) || value > largest_count)
            refuse("counts from above 0 to 1000000",
                   "check the count `" + std::string(digits) + '`');
        return value;
    }

    /// A point in a count is a decimal point beyond doubt where the formula ends with it, `CeO1.9`,
    /// where the count is below 2, `Fe0.947O`, where three decimals or a zero stand behind it.
    void check_point(std::string_view digits) {
        const std::size_t point = digits.find('.');
        if (point == std::string_view::npos) return;
        const std::string_view decimals = digits.substr(point + 1);
        const bool goes_on = is_capital(peek()) || is_opening(peek());
        const bool below_two = point == 1 && digits[0] < '2';
        if (peek() != '.' && (!goes_on || below_two || decimals.size() >= 3 || decimals[0] == '0'))
            return;
        refuse("a formula that can be read in one way only",
               "write `·` or `*` between the parts of an addition compound, or a count with three "
               "decimals");
    }

    bool take_dot() {
        const bool stop = peek() == '.' && at_ + 1 < text_.size() &&
                          (is_capital(text_[at_ + 1]) || is_opening(text_[at_ + 1]));
        if (peek() != '*' && !stop) return false;
        ++at_;
        return true;
    }

    void add(std::vector<Part>& parts, std::vector<Part> const& more, double times) {
        for (auto [element, count] : more) {
            auto same = std::find_if(parts.begin(), parts.end(),
                                     [e = element](Part const& p) { return p.element == e; });
            if (same == parts.end()) same = parts.insert(parts.end(), {element, 0});
            same->count += count * times;
            if (same->count > largest_count)
                refuse("at most 1000000 atoms of an element", "check the counts");
        }
    }

    [[noreturn]] void unexpected() {
        if (at_end()) refuse("a complete formula", "complete the formula, as in `CuSO4·5H2O`");
        if (is_small(peek()))
            refuse("symbols of elements, which begin with a capital",
                   "write it as a formula, as in `Fe2O3`");
        refuse(std::string("a chemical formula, in which `") + peek() + "` has no place here",
               "write it as in `CuSO4·5H2O` or `Fe0.947O`");
    }

    [[noreturn]] void refuse(std::string needed, std::string repair) {
        refuse_unfit(std::string(as_given_), std::move(needed), std::move(repair));
    }

    static bool is_opening(char c) { return c == '(' || c == '['; }
    static bool is_closing(char c) { return c == ')' || c == ']'; }
    bool at_end() const { return at_ == text_.size(); }
    char peek() const { return at_end() ? '\0' : text_[at_]; }
    void skip_digits() {
        while (is_digit(peek())) ++at_;
    }

    std::string_view text_, as_given_;
    std::size_t at_ = 0;
    int depth_ = 0;
};

/// AutoCorrect lowers the second of two capitals that begin a word: `HCl` becomes `Hcl`.
std::string raise_second(std::string text) {
    if (text.size() > 1 && is_capital(text[0]) && is_small(text[1]))
        text[1] = static_cast<char>(text[1] - 'a' + 'A');
    return text;
}

/// `iron` or `Iron` for `Fe`.
void refuse_name(std::string_view text) {
    for (Element const& element : elements())
        if (std::equal(text.begin(), text.end(), element.name.begin(), element.name.end(),
                       [](char a, char b) { return to_small(a) == b; }))
            refuse_unfit(std::string(text), "a chemical formula",
                         "write `" + std::string(element.symbol) + '`');
}

} // namespace

Composition read_formula(std::string_view formula) {
    const std::string folded = fold_formula(formula);
    refuse_name(folded);
    try {
        return {Reader(folded, formula).formula(), {}};
    } catch (Failure const&) {
        const std::string raised = raise_second(folded);
        if (raised == folded) throw;
        try {
            return {Reader(raised, formula).formula(),
                    '`' + std::string(formula) + "` read as `" + raised + '`'};
        } catch (Failure const&) {
        }
        throw;
    }
}

MolarMass molar_mass(std::string_view formula, Notes const& notes) {
    const Composition composition = read_formula(formula);
    if (!composition.note.empty()) notes.remark([&] { return composition.note; });
    long double sum = 0;
    for (auto const& [element, count] : composition.parts) {
        if (element->ten_thousandths == 0)
            refuse_impossible(std::string(formula),
                              "elements with a standard atomic weight, which " +
                                  std::string(element->name) +
                                  " has not, as no mixture of its isotopes is found everywhere",
                              "give the molar mass of the isotope at hand as a quantity");
        sum += static_cast<long double>(count) * element->ten_thousandths;
        notes.step([&, e = element, n = count] {
            return std::string(e->symbol) + ": " + written(n) + " · " +
                   written(e->ten_thousandths / 1e4) + " g/mol";
        });
    }
    return MolarMass::from_value(static_cast<double>(sum / 1e7L));
}

} // namespace core::substances
