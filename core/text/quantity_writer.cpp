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

Unit kelvin_of(Unit unit) {
    unit.numerator = unit.denominator = unit.zero_denominator = 1;
    unit.zero_numerator = 0;
    unit.reading = Reading::plain;
    return unit;
}

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

/// The digits of both numbers in one power of ten: `(1.234×10⁻⁷ ± 0.012×10⁻⁷)`.
std::string rounded_with_spread(long double value, long double u, std::string_view unit_text) {
    constexpr int most_digits = 17;
    Decimal spread = rounded_to_digits(u, 2);
    int const coarsest =
        value == 0 ? spread.exponent : leading_place(rounded_to_digits(value, 2)) - most_digits + 1;
    int const place = std::max(spread.exponent, coarsest);
    if (place != spread.exponent) spread = rounded_to_place(u, place);
    Decimal const rounded = rounded_to_place(value, place);
    int const lead = std::max(leading_place(rounded), leading_place(spread));
    if (lead < widest_for_people && lead >= -4)
        return with_spread(written(rounded, widest_for_people), written(spread, widest_for_people),
                           unit_text);
    auto const scaled = [&](Decimal number) {
        number.exponent -= lead;
        return written(number, widest_for_people);
    };
    std::string const power = written({1, lead, false}, 0, PowerOfTen::superscript).substr(1);
    return with_spread(scaled(rounded) + power, scaled(spread) + power, unit_text);
}

} // namespace

std::string write_number(long double value, int digits) {
    Decimal const rounded = rounded_to_digits(value, std::clamp(digits, 1, 19));
    return written(without_trailing_zeros(rounded), widest_exactly);
}

std::string write_exactly(double si, double u, Unit const& unit, std::string_view unit_text) {
    auto const number =
        exact_decimal(decimal_from_si(si, unit), si, [&](Decimal d) { return in_si(d, unit); });
    // Near 0 K a number in °C has no digits left for the value: only kelvins can say it.
    if (!number) return write_exactly(si, u, kelvin_of(unit), si_unit(unit.dimension));
    std::string const value = written_exactly(*number);
    if (u == 0) return with_unit(value, unit_text);
    if (unit.reading == Reading::point)
        return with_unit(value, unit_text) + " ± " + written_exactly(shortest_decimal(u)) + " K";
    return with_spread(value, written_exactly(exact_span(u, unit)), unit_text);
}

std::string write_for_people(double si, double u, Unit const& unit, std::string_view unit_text,
                             int digits) {
    long double const value = decimal_from_si(si, unit);
    if (u > 0) return rounded_with_spread(value, decimal_from_si(u, as_span(unit)), unit_text);
    Decimal const rounded = rounded_to_digits(value, std::clamp(digits, 1, 19));
    return with_unit(written(rounded, widest_for_people, PowerOfTen::superscript), unit_text);
}

} // namespace core::text
