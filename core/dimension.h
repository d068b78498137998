// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <cstdint>

namespace core {

/// The dimension of a quantity whose type is known only at run time: exponents of the five SI base
/// quantities this subject needs. Compile-time dimensions are Boost.Units types (quantities.h).
struct Dimension {
    std::int8_t length = 0, mass = 0, time = 0, temperature = 0, amount = 0;

    friend constexpr bool operator==(Dimension, Dimension) = default;
    friend constexpr Dimension operator*(Dimension a, Dimension b) {
        return {sum(a.length, b.length), sum(a.mass, b.mass), sum(a.time, b.time),
                sum(a.temperature, b.temperature), sum(a.amount, b.amount)};
    }
    friend constexpr Dimension power(Dimension d, int exponent) {
        return {scaled(d.length, exponent), scaled(d.mass, exponent), scaled(d.time, exponent),
                scaled(d.temperature, exponent), scaled(d.amount, exponent)};
    }
    friend constexpr Dimension operator/(Dimension a, Dimension b) { return a * power(b, -1); }

    static const Dimension of_length, of_mass, of_time, of_temperature, of_amount;

private:
    static constexpr std::int8_t sum(int a, int b) { return static_cast<std::int8_t>(a + b); }
    static constexpr std::int8_t scaled(int a, int b) { return static_cast<std::int8_t>(a * b); }
};

inline constexpr Dimension Dimension::of_length{.length = 1};
inline constexpr Dimension Dimension::of_mass{.mass = 1};
inline constexpr Dimension Dimension::of_time{.time = 1};
inline constexpr Dimension Dimension::of_temperature{.temperature = 1};
inline constexpr Dimension Dimension::of_amount{.amount = 1};

} // namespace core
