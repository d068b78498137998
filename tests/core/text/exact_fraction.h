// SPDX-License-Identifier: MPL-2.0
#pragma once

// Exact fractions as a second route for everything that core/text rounds once.

#include <boost/multiprecision/cpp_int.hpp>

#include <cmath>
#include <limits>
#include <string>

namespace exact {

using Whole = boost::multiprecision::cpp_int;
using Fraction = boost::multiprecision::cpp_rational;

inline Whole power_of_ten(int exponent) {
    return boost::multiprecision::pow(Whole(10), static_cast<unsigned>(exponent));
}

/// `0.45359237`, `1e-7` or `5/9`.
inline Fraction fraction(std::string const& text) {
    if (auto const solidus = text.find('/'); solidus != std::string::npos)
        return fraction(text.substr(0, solidus)) / fraction(text.substr(solidus + 1));
    std::string digits = text;
    int exponent = 0;
    if (auto const e = digits.find('e'); e != std::string::npos) {
        exponent = std::stoi(digits.substr(e + 1));
        digits.erase(e);
    }
    if (auto const point = digits.find('.'); point != std::string::npos) {
        exponent -= static_cast<int>(digits.size() - point - 1);
        digits.erase(point, 1);
    }
    bool const negative = digits.starts_with('-');
    auto const first = digits.find_first_not_of("-0"); // a leading 0 would mean octal
    Fraction value(first == std::string::npos ? Whole(0) : Whole(digits.substr(first)));
    if (exponent < 0)
        value /= power_of_ten(-exponent);
    else
        value *= power_of_ten(exponent);
    return negative ? Fraction(-value) : value;
}

/// How far a double is from an exact value, in units of the last place: no more than 0.5 where it
/// is the nearest one.
inline double ulps(double value, Fraction const& exact_value) {
    double const next = std::nextafter(std::fabs(value), std::numeric_limits<double>::infinity());
    Fraction const ulp = Fraction(next) - Fraction(std::fabs(value));
    return static_cast<double>(abs(Fraction(value) - exact_value) / ulp);
}

} // namespace exact
