// SPDX-License-Identifier: MPL-2.0
#include "core/text/decimal.h"

#include <array>
#include <bit>
#include <charconv>
#include <cmath>
#include <limits>
#include <optional>

namespace core::text {
namespace {

__extension__ typedef unsigned __int128 Wide;

constexpr std::array<double, 23> small_powers_of_ten = [] {
    std::array<double, 23> powers{};
    double power = 1;
    for (double& p : powers) p = power, power *= 10;
    return powers;
}();

/// 10^exponent; exact up to 10^27, to 2^-61 beyond.
long double power_of_ten(int exponent) {
    long double power = 1, square = 10;
    for (unsigned e = static_cast<unsigned>(exponent); e != 0; e >>= 1, square *= square)
        if (e & 1u) power *= square;
    return power;
}

// 1. Small whole numbers: every product below 2^53 is exact in a double, and so the one division
// is the one rounding. This is nearly every number that people write.
std::optional<double> from_small_numbers(Decimal number, Unit const& unit) {
    constexpr double limit = 9007199254740992.0; // 2^53
    if (number.significand >= (std::uint64_t{1} << 53) || std::abs(number.exponent) > 22) return {};
    double above = static_cast<double>(number.significand), below = 1;
    (number.exponent < 0 ? below : above) *=
        small_powers_of_ten[static_cast<std::size_t>(std::abs(number.exponent))];
    if (number.negative) above = -above;
    if (unit.zero_numerator != 0) {
        double const zero = static_cast<double>(unit.zero_numerator) * below;
        above *= static_cast<double>(unit.zero_denominator);
        below *= static_cast<double>(unit.zero_denominator);
        if (std::fabs(above) >= limit || zero >= limit) return {};
        above += zero;
    }
    above *= static_cast<double>(unit.numerator);
    below *= static_cast<double>(unit.denominator);
    if (std::fabs(above) >= limit || below >= limit) return {};
    return above / below;
}

/// factor · 2^shift, exactly: the shape of every finite long double above 0.
struct Binary {
    std::uint64_t factor;
    int shift;
};

Binary exactly(long double whole) {
    int exponent = 0;
    auto const mantissa = static_cast<std::uint64_t>(std::ldexp(std::frexp(whole, &exponent), 64));
    int const zeros = std::countr_zero(mantissa);
    return {mantissa >> zeros, exponent - 64 + zeros};
}

/// A whole number below 2^126 times 2^shift; `fits` turns false for good when it would not.
class WideProduct {
public:
    explicit WideProduct(Wide start) : whole_(start) {}
    WideProduct& operator*=(std::uint64_t factor) {
        fits_ =
            !__builtin_mul_overflow(whole_, Wide{factor}, &whole_) && whole_ >> 126 == 0 && fits_;
        return *this;
    }
    WideProduct& operator*=(Binary factor) {
        shift_ += factor.shift;
        return *this *= factor.factor;
    }
    /// Times 10^exponent, as 5^exponent and a shift.
    void times_power_of_ten(int exponent) {
        shift_ += exponent;
        for (int e = 0; e < exponent && fits_; ++e) *this *= 5;
    }
    void times_whole_power_of_ten(int exponent) {
        for (int e = 0; e < exponent && fits_; ++e) *this *= 10;
    }
    bool fits() const { return fits_; }
    int shift() const { return shift_; }
    Wide whole() const { return whole_; }

private:
    Wide whole_;
    int shift_ = 0;
    bool fits_ = true;
};

int bits(Wide n) {
    auto const high = static_cast<std::uint64_t>(n >> 64);
    return high != 0 ? 128 - std::countl_zero(high)
                     : 64 - std::countl_zero(static_cast<std::uint64_t>(n));
}

/// (above / below) · 2^shift rounded once: long division to 63 binary places, the last of which
/// keeps whether anything was left over, far below the 53 places of a double.
double rounded_ratio(Wide above, Wide below, int shift) {
    if (above == 0) return 0;
    int const up = 126 - bits(above), down = 126 - bits(below);
    above <<= up;
    below <<= down;
    std::uint64_t quotient = above >= below;
    if (quotient != 0) above -= below;
    for (int place = 0; place < 63; ++place) {
        above <<= 1;
        quotient <<= 1;
        if (above >= below) {
            above -= below;
            quotient |= 1;
        }
    }
    if (above != 0) quotient |= 1;
    return std::ldexp(static_cast<double>(quotient), shift - up + down - 63);
}

// 2. Whole numbers of up to 126 bits.
std::optional<double> from_wide_numbers(Decimal number, Unit const& unit) {
    if (std::abs(number.exponent) > 54) return {};
    WideProduct above(number.significand), below(1);
    bool negative = number.negative;
    if (unit.zero_numerator == 0) {
        (number.exponent < 0 ? below : above).times_power_of_ten(std::abs(number.exponent));
    } else {
        WideProduct zero(static_cast<std::uint64_t>(unit.zero_numerator));
        above.times_whole_power_of_ten(number.exponent);
        below.times_whole_power_of_ten(-number.exponent);
        zero.times_whole_power_of_ten(-number.exponent);
        above *= static_cast<std::uint64_t>(unit.zero_denominator);
        below *= static_cast<std::uint64_t>(unit.zero_denominator);
        if (!above.fits() || !below.fits() || !zero.fits()) return {};
        bool const below_zero = negative && above.whole() > zero.whole();
        above = WideProduct(!negative    ? above.whole() + zero.whole()
                            : below_zero ? above.whole() - zero.whole()
                                         : zero.whole() - above.whole());
        negative = below_zero;
    }
    above *= exactly(unit.numerator);
    below *= exactly(unit.denominator);
    if (!above.fits() || !below.fits()) return {};
    double const ratio = rounded_ratio(above.whole(), below.whole(), above.shift() - below.shift());
    return negative ? -ratio : ratio;
}

long double signed_significand(Decimal number) {
    auto const significand = static_cast<long double>(number.significand);
    return number.negative ? -significand : significand;
}

// 3. Whatever is left, in the 64 binary places of long double.
double from_long_doubles(Decimal number, Unit const& unit) {
    long double value = signed_significand(number);
    int const exponent = std::min(std::abs(number.exponent), 4900);
    value = number.exponent < 0 ? value / power_of_ten(exponent) : value * power_of_ten(exponent);
    if (unit.zero_numerator != 0) value += unit.zero_numerator / unit.zero_denominator;
    return static_cast<double>(value * unit.numerator / unit.denominator);
}

Unit without_zero(Unit unit) {
    unit.zero_numerator = 0;
    unit.zero_denominator = 1;
    return unit;
}

Decimal parsed(const char* at, const char* end) {
    Decimal number;
    bool fraction = false;
    for (; at != end && *at != 'e'; ++at) {
        if (*at == '-') number.negative = true;
        if (*at == '.') fraction = true;
        if (*at < '0' || *at > '9') continue;
        number.significand = number.significand * 10 + static_cast<std::uint64_t>(*at - '0');
        number.exponent -= fraction;
    }
    int power = 0;
    if (at != end) std::from_chars(at + (at[1] == '+' ? 2 : 1), end, power);
    number.exponent += power;
    return number;
}

/// What people type has few places. A decimal of 15 digits at most is the only one of that length
/// that a double can stand for, and whole / 10^places is rounded once: equality shows that it is it.
std::optional<Decimal> short_decimal(double number) {
    constexpr double limit = 9007199254740992.0; // 2^53
    constexpr int places = 6;
    double const size = std::fabs(number);
    if (size < limit && std::trunc(size) == size)
        return Decimal{static_cast<std::uint64_t>(size), 0, std::signbit(number)};
    double const scaled = size * small_powers_of_ten[places];
    if (!(scaled < 1e15)) return {};
    auto const whole = static_cast<std::uint64_t>(scaled + 0.5);
    if (static_cast<double>(whole) / small_powers_of_ten[places] != size) return {};
    return without_trailing_zeros({whole, -places, std::signbit(number)});
}

std::string exponent_text(int exponent, PowerOfTen style) {
    if (style == PowerOfTen::ascii) return "e" + std::to_string(exponent);
    constexpr std::array<const char*, 10> digits{"⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"};
    std::string text = exponent < 0 ? "×10⁻" : "×10";
    for (char const c : std::to_string(std::abs(exponent)))
        text += digits[static_cast<std::size_t>(c - '0')];
    return text;
}

} // namespace

Decimal shortest_decimal(double number) {
    if (auto const decimal = short_decimal(number)) return *decimal;
    std::array<char, 32> text{};
    auto const written = std::to_chars(text.data(), text.data() + text.size(), number,
                                       std::chars_format::scientific);
    return parsed(text.data(), written.ptr);
}

double nearest_double(Decimal number) {
    std::string const text =
        std::to_string(number.significand) + "e" + std::to_string(number.exponent);
    double value = 0;
    if (std::from_chars(text.data(), text.data() + text.size(), value).ec != std::errc{})
        value = number.exponent > 0 ? std::numeric_limits<double>::infinity() : 0.0;
    return number.negative ? -value : value;
}

double in_si(Decimal number, Unit const& unit) {
    if (auto const value = from_small_numbers(number, unit)) return *value;
    if (auto const value = from_wide_numbers(number, unit)) return *value;
    return unit.is_coherent() ? nearest_double(number) : from_long_doubles(number, unit);
}

double span_in_si(Decimal number, Unit const& unit) {
    return unit.zero_numerator == 0 ? in_si(number, unit) : in_si(number, without_zero(unit));
}

double Unit::to_si(double number) const {
    if (is_coherent() || !std::isfinite(number)) return number;
    return in_si(shortest_decimal(number), *this);
}

double Unit::span_to_si(double number) const {
    if (numerator == denominator || !std::isfinite(number)) return number;
    return span_in_si(shortest_decimal(number), *this);
}

long double decimal_from_si(double si, Unit const& unit) {
    if (!std::isfinite(si)) return si;
    Decimal const value = shortest_decimal(si);
    long double above = signed_significand(value) * unit.denominator, below = unit.numerator;
    int const exponent = std::min(std::abs(value.exponent), 4900);
    (value.exponent < 0 ? below : above) *= power_of_ten(exponent);
    if (unit.zero_numerator == 0) return above / below;
    return (above * unit.zero_denominator - unit.zero_numerator * below) /
           (below * unit.zero_denominator);
}

double Unit::from_si(double si) const {
    if (is_coherent() || !std::isfinite(si)) return si;
    if (short_decimal(si)) return static_cast<double>(decimal_from_si(si, *this));
    // A computed number stands for no decimal: straight through, rounded once.
    long double const value = static_cast<long double>(si) * denominator / numerator;
    return static_cast<double>(value - zero_numerator / zero_denominator);
}

long double Unit::exactly_from_si(double si) const {
    return is_coherent() ? si : decimal_from_si(si, *this);
}

double Unit::span_from_si(double si) const {
    return static_cast<double>(without_zero(*this).exactly_from_si(si));
}

Decimal rounded_to_place(long double number, int place) {
    long double const magnitude = std::fabs(number);
    long double const scale = power_of_ten(std::min(std::abs(place), 4900));
    long double const scaled = place < 0 ? magnitude * scale : magnitude / scale;
    constexpr long double most = 1e19L;
    if (!(scaled < most)) return rounded_to_digits(number, 19);
    return {static_cast<std::uint64_t>(std::round(scaled)), place, std::signbit(number)};
}

Decimal rounded_to_digits(long double number, int digits) {
    if (number == 0 || !std::isfinite(number)) return {};
    auto const most = static_cast<std::uint64_t>(power_of_ten(digits));
    int place = static_cast<int>(std::floor(std::log10(std::fabs(number)))) - digits + 1;
    // The logarithm may be off by one at a power of ten, and rounding may carry into one.
    Decimal result = rounded_to_place(number, place);
    if (result.significand >= most) result = rounded_to_place(number, ++place);
    if (result.significand < most / 10) result = rounded_to_place(number, --place);
    return result;
}

Decimal without_trailing_zeros(Decimal number) {
    if (number.significand == 0) return {};
    while (number.significand % 10 == 0) {
        number.significand /= 10;
        ++number.exponent;
    }
    return number;
}

int leading_place(Decimal number) {
    int place = number.exponent;
    for (std::uint64_t rest = number.significand / 10; rest != 0; rest /= 10) ++place;
    return place;
}

std::string written_plainly(Decimal number) {
    std::string digits = std::to_string(number.significand);
    std::string const sign = number.negative && number.significand != 0 ? "-" : "";
    if (number.exponent >= 0) {
        bool const is_zero = number.significand == 0;
        return sign + digits.append(is_zero ? 0 : static_cast<std::size_t>(number.exponent), '0');
    }
    auto const decimals = static_cast<std::size_t>(-number.exponent);
    if (digits.size() <= decimals) digits.insert(0, decimals + 1 - digits.size(), '0');
    return sign + digits.insert(digits.size() - decimals, ".");
}

std::string written(Decimal number, int widest, PowerOfTen style) {
    int const lead = leading_place(number);
    bool const plain = number.significand == 0 || (lead < widest && lead >= -4);
    if (plain) return written_plainly(number);
    number.exponent -= lead;
    return written_plainly(number) + exponent_text(lead, style);
}

} // namespace core::text
