// SPDX-License-Identifier: MPL-2.0
#include "core/text/number.h"

#include "core/failure.h"

#include <algorithm>

namespace core::text {
namespace {

constexpr int largest_exponent = 99999;

bool is_separator(char32_t c) { return c == U'.' || c == U','; }
bool is_vulgar(char32_t c) { return c == one_quarter || c == one_half || c == three_quarters; }

bool is_sign(char32_t c) { return c == U'+' || c == U'-'; }

bool take_sign(Cursor& at) {
    bool const negative = *at == U'-';
    if (is_sign(*at)) at.advance();
    return negative;
}

/// Gathers digits, 19 of them at most; the rest only count.
class Digits {
public:
    explicit Digits(Decimal& number) : number_(number) {}
    void put(char32_t digit, bool decimal) {
        constexpr std::uint64_t full = 1'000'000'000'000'000'000; // one more digit fits
        if (number_.significand < full) {
            number_.significand = number_.significand * 10 + (digit - U'0');
            number_.exponent -= decimal;
        } else {
            number_.exponent += !decimal;
        }
    }
    int take(Cursor& at, bool decimal) {
        int count = 0;
        for (; is_digit(*at); at.advance(), ++count) put(*at, decimal);
        return count;
    }
    /// Takes groups of exactly three digits, each behind one space.
    int take_groups(Cursor& at, bool decimal) {
        int count = 0;
        while (*at == U' ') {
            Cursor ahead = at;
            ahead.advance();
            if (!is_digit(*ahead) || !has_three_digits(ahead)) break;
            at = ahead;
            count += take(at, decimal);
        }
        return count;
    }

private:
    static bool has_three_digits(Cursor at) {
        for (int i = 0; i < 3; ++i, at.advance())
            if (!is_digit(*at)) return false;
        return !is_digit(*at);
    }
    Decimal& number_;
};

int read_digits_as_int(Cursor& at, char32_t zero) {
    int value = 0;
    for (; *at >= zero && *at <= zero + 9; at.advance())
        value = std::min(value * 10 + static_cast<int>(*at - zero), largest_exponent);
    return value;
}

/// `e3`, `E-3`, attached to the number.
bool take_letter_exponent(Cursor& at, int& exponent) {
    if (*at != U'e' && *at != U'E') return false;
    Cursor ahead = at;
    ahead.advance();
    bool const negative = take_sign(ahead);
    if (!is_digit(*ahead)) return false;
    exponent = read_digits_as_int(ahead, U'0');
    if (negative) exponent = -exponent;
    at = ahead;
    return true;
}

/// `×10^3`, ` · 10⁻³`.
void take_power_of_ten(Cursor& at, int& exponent) {
    if (*at != U' ' && *at != U'x' && !is_product_sign(*at)) return;
    Cursor ahead = at;
    ahead.skip_spaces();
    if (!is_product_sign(*ahead) && *ahead != U'x') return;
    ahead.advance();
    ahead.skip_spaces();
    if (!ahead.take(U'1') || !ahead.take(U'0')) return;
    bool const raised = ahead.take(U'^');
    if (!raised && !is_superscript(*ahead)) return;
    char32_t const zero = raised ? U'0' : superscript_zero;
    bool const negative = *ahead == (raised ? U'-' : superscript_minus);
    if (negative || *ahead == (raised ? U'+' : superscript_plus)) ahead.advance();
    if (*ahead < zero || *ahead > zero + 9) return;
    exponent = read_digits_as_int(ahead, zero);
    if (negative) exponent = -exponent;
    at = ahead;
}

/// `(2)` right behind the last digit, in units of its place.
void take_concise_spread(Cursor& at, int place, Number& number) {
    if (*at != U'(' || !is_digit(at.following())) return;
    Cursor ahead = at;
    ahead.advance();
    Decimal spread{0, place, false};
    Digits(spread).take(ahead, false);
    if (!ahead.take(U')')) return;
    number.spread = spread;
    number.has_spread = true;
    at = ahead;
}

void take_vulgar(Cursor& at, Decimal& number) {
    constexpr std::uint64_t longest_whole = 10'000'000'000'000'000;
    if (!is_vulgar(*at) || number.significand >= longest_whole) return;
    unsigned const hundredths = *at == one_quarter ? 25 : *at == one_half ? 50 : 75;
    number.significand = number.significand * 100 + hundredths;
    number.exponent -= 2;
    number = without_trailing_zeros(number);
    at.advance();
}

/// `1,234` or `1.234,5`: both ways to read it, or the one that is left, go into the repair.
[[noreturn]] void refuse_separators(std::string_view whole, const char* start) {
    Cursor at(whole);
    while (at.position() != start) at.advance();
    take_sign(at);
    std::string without(start, at.position());
    std::string with_last_decimal;
    char32_t separator = 0;
    bool mixed = false, one = true;
    for (; is_digit(*at) || (is_separator(*at) && is_digit(at.following())); at.advance()) {
        if (is_digit(*at)) {
            append(without, *at);
            if (!with_last_decimal.empty()) append(with_last_decimal, *at);
            continue;
        }
        one = separator == 0;
        mixed = !one && (mixed || *at != separator);
        separator = *at;
        with_last_decimal = without + ".";
    }
    std::string const before(whole.data(), start);
    std::string const rest(at.position(), whole.data() + whole.size());
    std::string const grouped = before + without + rest;
    std::string const decimal = before + with_last_decimal + rest;
    refuse_unfit(shown(whole),
                 "a number whose decimal sign cannot be taken for a thousands separator",
                 one ? write_instead(decimal) + " or " + quoted(grouped)
                     : write_instead(mixed ? decimal : grouped));
}

} // namespace

bool starts_number(Cursor const& at) {
    if (is_digit(*at) || is_vulgar(*at)) return true;
    if (!is_sign(*at) && !is_separator(*at)) return false;
    Cursor ahead = at;
    if (is_sign(*ahead)) ahead.advance();
    return is_digit(*ahead) || is_vulgar(*ahead) ||
           (is_separator(*ahead) && is_digit(ahead.following()));
}

Number read_number(Cursor& at) {
    const char* const start = at.position();
    Number number;
    number.value.negative = take_sign(at);
    Digits digits(number.value);
    bool const leading_zero = *at == U'0';
    int const first = digits.take(at, false);
    bool const could_group = first >= 1 && first <= 3 && !leading_zero;
    int const grouped = could_group ? digits.take_groups(at, false) : 0;

    int decimals = 0;
    if (*at == U'.' || (*at == U',' && is_digit(at.following()))) {
        bool const comma = *at == U',';
        at.advance();
        decimals = digits.take(at, true);
        if (decimals == 3) decimals += digits.take_groups(at, true);
        if (is_separator(*at) && is_digit(at.following())) refuse_separators(at.whole(), start);
        if (comma && decimals == 3 && could_group && grouped == 0)
            refuse_separators(at.whole(), start);
    } else if (grouped == 0) {
        take_vulgar(at, number.value);
        if (number.value.exponent < 0) return number;
    }
    take_concise_spread(at, -decimals, number);
    int exponent = 0;
    if (!take_letter_exponent(at, exponent)) take_power_of_ten(at, exponent);
    number.value.exponent += exponent;
    number.spread.exponent += exponent;
    return number;
}

} // namespace core::text
