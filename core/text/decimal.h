// SPDX-License-Identifier: MPL-2.0
#pragma once

// Numbers as people write them. A unit is a fraction of whole numbers and a written number is a
// whole number times a power of ten, so a value in SI units is one exact fraction: it is worked out
// in whole numbers and rounded once, by the last division. 298.15 K, 25 °C, 77 °F and 298150 mK
// are then the same double, which products of rounded factors would not give.

#include "core/text/unit.h"

#include <cstdint>
#include <string>

namespace core::text {

/// A number as written: ± significand · 10^exponent.
struct Decimal {
    std::uint64_t significand = 0;
    int exponent = 0;
    bool negative = false;
};

/// The decimal of fewest digits that reads back to this finite number.
Decimal shortest_decimal(double number);

/// The nearest double of a decimal, or infinity.
double nearest_double(Decimal number);

/// The value in SI units of a number in `unit`, rounded once; infinite where it overflows.
/// Fractions whose whole numbers exceed 126 bits are worked out in long double instead. Accuracy:
/// half a unit in the last place, 0.502 in that case.
double in_si(Decimal number, Unit const& unit);

/// A difference or an uncertainty in SI units: in_si without the zero point.
double span_in_si(Decimal number, Unit const& unit);

/// The number in `unit` of a value in SI units, from the decimal of fewest digits that `si` stands
/// for, so that 298.15 K rounds as 298.15 and not as the double just below it.
long double decimal_from_si(double si, Unit const& unit);

/// Rounds to `digits` significant digits, 1 to 19. Accuracy: the last of 18 digits.
Decimal rounded_to_digits(long double number, int digits);

/// Rounds to a multiple of 10^place; no more than 19 digits are kept.
Decimal rounded_to_place(long double number, int place);

/// Takes zeros off the end of the significand.
Decimal without_trailing_zeros(Decimal number);

/// The exponent of the leading digit: 2 for 298.15.
int leading_place(Decimal number);

/// Writes all digits of the significand without a power of ten: `298.150`.
std::string written_plainly(Decimal number);

enum class PowerOfTen { ascii, superscript };

/// Writes all digits of the significand, trailing zeros too: `298.150`, `1.5e-7`, `1.5×10⁻⁷`.
/// Scientific from a leading place of `widest` on and below 10^-4.
std::string written(Decimal number, int widest, PowerOfTen = PowerOfTen::ascii);

} // namespace core::text
