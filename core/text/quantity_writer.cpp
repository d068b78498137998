// SPDX-License-Identifier: MPL-2.0

// Numbers are written digit by digit from whole numbers, with a point and without asking a locale.

#include "core/text/decimal.h"
#include "core/text/quantity.h"

#include <algorithm>
#include <cmath>
#include <optional>

namespace core::text {
namespace {

constexpr int widest_exactly = 15; // digits before the point until powers of ten are written
constexpr int widest_for_people = 6;

/// The fewest digits, from 15 on, that `read` turns into the same double again.
template<class Read>
std::optional<Decimal> exact_decimal(long double number, double si, Read&& read) {
    for (int digits = 15; digits <= 19; ++digits) {
        Decimal const candidate = without_trailing_zeros(rounded_to_digits(number, digits));
        if (read(candidate) == si) return candidate;
    }
    return {};
}

/// What stands in place of digits; null for a finite number.
const char* word_for(long double number) {
    if (std::isnan(number)) return "not a number";
    if (std::isinf(number)) return number < 0 ? "-infinite" : "infinite";
    return nullptr;
}

bool states_spread(double u) { return u > 0 && std::isfinite(u); }

Unit as_span(Unit unit) {
    unit.zero_numerator = 0;
    return unit;
}

std::string with_unit(std::string number, std::string_view unit_text) {
    if (!unit_text.empty()) number.append(" ").append(unit_text);
    return number;
}

std::string with_spread(std::string const& value, std::string const& spread,
                        std::string_view unit_text) {
    std::string const both = value + " ± " + spread;
    return unit_text.empty() ? both : "(" + both + ") " + std::string(unit_text);
}

std::string written_exactly(Decimal number) { return written(number, widest_exactly); }

Decimal exact_span(double u, Unit const& unit) {
    auto const found = exact_decimal(decimal_from_si(u, as_span(unit)), u,
                                     [&](Decimal d) { return span_in_si(d, unit); });
    return found ? *found : shortest_decimal(u);
}

/// `25 °C ± 0.5 K`: behind a value that has its unit, the uncertainty in the SI unit.
std::string with_si_spread(std::string text, double u, Dimension dimension) {
    if (!states_spread(u)) return text;
    return text + " ± " + with_unit(written_exactly(shortest_decimal(u)), si_unit(dimension));
}

std::string for_people(Decimal number) {
    return written(number, widest_for_people, PowerOfTen::superscript);
}

/// Both numbers in one power of ten: `(1.234×10⁻⁷ ± 0.012×10⁻⁷)`.
std::string in_one_power_of_ten(Decimal value, Decimal spread, std::string_view unit_text) {
    int const lead = std::max(leading_place(value), leading_place(spread));
    bool const plain = lead < widest_for_people && lead >= -4;
    std::string const power =
        plain ? "" : written({1, lead, false}, 0, PowerOfTen::superscript).substr(1);
    auto const scaled = [&](Decimal number) {
        if (!plain) number.exponent -= lead;
        return written_plainly(number) + power;
    };
    return with_spread(scaled(value), scaled(spread), unit_text);
}

std::string rounded_with_spread(long double value, long double u, std::string_view unit_text) {
    constexpr int most_digits = 17;
    Decimal const spread = rounded_to_digits(u, 2);
    Decimal const most = rounded_to_digits(value, most_digits);
    if (value != 0 && most.exponent > spread.exponent) // all digits of the value are sure
        return with_spread(for_people(without_trailing_zeros(most)), for_people(spread), unit_text);
    return in_one_power_of_ten(rounded_to_place(value, spread.exponent), spread, unit_text);
}

} // namespace

std::string write_number(long double value, int digits) {
    if (const char* const word = word_for(value)) return word;
    Decimal const rounded = rounded_to_digits(value, std::clamp(digits, 1, 19));
    return written(without_trailing_zeros(rounded), widest_exactly);
}

std::string write_exactly(double si, double u, Unit const& unit, std::string_view unit_text) {
    if (const char* const word = word_for(si)) return with_unit(word, unit_text);
    auto const number =
        exact_decimal(decimal_from_si(si, unit), si, [&](Decimal d) { return in_si(d, unit); });
    // Near 0 K a number in °C has no digits left for the value: only kelvins can say it.
    if (!number) {
        std::string const value = written_exactly(shortest_decimal(si));
        return with_si_spread(with_unit(value, si_unit(unit.dimension)), u, unit.dimension);
    }
    std::string const value = written_exactly(*number);
    if (unit.reading == Reading::point)
        return with_si_spread(with_unit(value, unit_text), u, unit.dimension);
    if (!states_spread(u)) return with_unit(value, unit_text);
    return with_spread(value, written_exactly(exact_span(u, unit)), unit_text);
}

std::string write_for_people(double si, double u, Unit const& unit, std::string_view unit_text,
                             int digits) {
    long double const value = decimal_from_si(si, unit);
    if (const char* const word = word_for(value)) return with_unit(word, unit_text);
    if (states_spread(u))
        return rounded_with_spread(value, decimal_from_si(u, as_span(unit)), unit_text);
    Decimal const rounded = rounded_to_digits(value, std::clamp(digits, 1, 19));
    return with_unit(for_people(rounded), unit_text);
}

} // namespace core::text
