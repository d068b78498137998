// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/dimension.h"

#include <cstdint>
#include <string>
#include <string_view>

namespace core::text {

/// How a number of a dimension is to be understood: °C alone is a point, Δ°C a difference, bar(g) a
/// gauge pressure. Kelvin, and every compound unit, is plain.
enum class Reading : std::uint8_t { plain, point, difference, gauge };

/// What a fraction is a fraction of. Shares of different kinds are never interchangeable.
enum class Share : std::uint8_t { none, mole, volume, mass };

/// A unit: SI value = (number + zero_numerator / zero_denominator) · numerator / denominator.
/// The four are whole numbers wherever the definition allows, so that to_si rounds once and every
/// exact spelling of one value gives the same bits.
struct Unit {
    long double numerator = 1, denominator = 1;
    long double zero_numerator = 0, zero_denominator = 1;
    Dimension dimension{};
    Reading reading = Reading::plain;
    Share share = Share::none;

    /// Whether numbers in this unit are SI values as they stand.
    bool is_coherent() const { return numerator == denominator && zero_numerator == 0; }
    double to_si(double number) const;
    double from_si(double si) const;
    /// For writing: more places than a double has.
    long double exactly_from_si(double si) const;
    /// A difference or an uncertainty: without the zero point.
    double span_to_si(double number) const;
    double span_from_si(double si) const;
};

/// Reads a whole text as a unit expression, `kJ/(kg·K)`. Throws Failure (unfit) with the repaired
/// text where there is one. `note` says what the reader mended, else it stays as it is.
Unit read_unit(std::string_view text);
Unit read_unit(std::string_view text, std::string& note);

/// A heading, a `show` or a unit cell: a unit expression, or a label with one (`T / °C`, `p in
/// bar`,
/// `[kJ/mol]`, `Heat (kJ)`, `h / (kJ/kg)`).
struct Heading {
    std::string_view label; ///< empty where there is none
    std::string_view text;  ///< the unit as written, inside the text that was read
    Unit unit;
    std::string note{}; ///< what the reader mended (a capital lowered by AutoCorrect), else empty
};
Heading read_heading(std::string_view text);

/// The coherent SI unit of a dimension as it is written out: `J/(mol·K)`; empty for a number. `Δ`
/// readings and points are both K.
std::string si_unit(Dimension);

/// What quantity has this dimension, in words: `a molar entropy`, `a pressure`; where no name is
/// customary, `a quantity in kg·m⁻¹`.
std::string name_of(Dimension);

} // namespace core::text
