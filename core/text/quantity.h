// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/text/unit.h"

#include <string>
#include <string_view>

namespace core::text {

/// A quantity as it was read from text. `u` is the standard uncertainty in SI units, 0 where none
/// is stated. A number without a unit has `bare` set and stands for a dimensionless quantity.
struct Quantity {
    double si = 0, u = 0;
    Unit unit{};
    std::string_view written_unit{}; ///< inside the text that was read
    bool bare = false;
    std::string note{}; ///< what the reader mended (a capital lowered by AutoCorrect), else empty
};

/// Reads `7.3 kJ/mol`, `7.3(2) kJ/mol`, `(10.57 ± 0.10) J/(mol·K)`, `25 °C ± 0.5 K (k=2)`, `½`, `12
/// %`. The grammar stands in quantity.cpp; the language is the same on every desk, the locale is
/// never asked. Throws Failure (unfit) with one repair.
Quantity read_quantity(std::string_view text);

/// Reads a cell of a `u` column against the value it belongs to: a number with or without a unit,
/// `2 %`, `0.4 (k=2)`. Returns the standard uncertainty in SI units.
double read_uncertainty(std::string_view text, double value_si, Unit const& unit);

/// A number in plain decimal or scientific writing with a decimal point, `digits` significant.
std::string write_number(long double value, int digits);

/// For machines: the shortest text that reads back to the same bits of value and uncertainty.
/// `unit_text` must be the text `unit` was read from; empty for a plain number.
std::string write_exactly(double si, double u, Unit const& unit, std::string_view unit_text);

/// For people: `(10.57 ± 0.10) J/(mol·K)` with two significant digits of the uncertainty, or
/// `9.633 J/(mol·K)` with `digits` significant digits where u is 0.
std::string write_for_people(double si, double u, Unit const& unit, std::string_view unit_text,
                             int digits = 4);

} // namespace core::text
