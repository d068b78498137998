// SPDX-License-Identifier: MPL-2.0
#pragma once

// Heat capacities as sums of powers of temperature, one row a phase.

#include "core/materials/stretches.h"

#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace core::materials {

/// ∫T^(q-1) dT for 0 < low <= high: (high^q - low^q) / q, ln(high / low) at q = 0.
/// Method: low^q · expm1(q·ln(high / low)) / q, which goes over into the logarithm without a step;
/// for whole q from -5 to 5 high - low times the divided difference.
/// Accuracy: 2·|q| + 1 units in the last place for these, else 3 + |q·ln low| + |q·ln(high / low)|,
/// tests/core/materials/correlation_test.cpp.
double integral_of_power(double q, double low, double high);

/// Coefficient · T^exponent, T in kelvin, the coefficient in SI units of a heat capacity.
struct Term {
    double exponent, coefficient;
};

/// One phase between two temperatures: cp(T) = Σ a·T^n. A `spread` is the enthalpy of a change that
/// takes place evenly all the way from `from` to `to`, as freezing does in the range between
/// solidus and liquidus: it adds spread / (to - from) to what a kelvin takes up, and
/// spread · ln(T2 / T1) / (to - from) to the entropy. It is no part of the heat capacity.
class CorrelationPiece {
public:
    CorrelationPiece(double from, double to, std::vector<Term> terms, double spread)
        : from_(from), to_(to), spread_(spread), terms_(std::move(terms)) {}

    double from() const { return from_; }
    double to() const { return to_; }
    double spread() const { return spread_; }
    std::span<const Term> terms() const { return terms_; }

    double heat_capacity(double t) const;
    double slope(double t) const { return heat_capacity(t) + spread_ / (to_ - from_); }
    /// ∫cp dT and ∫cp/T dT with what the spread takes up, for from() <= low <= high <= to().
    double enthalpy(double low, double high) const;
    double entropy(double low, double high) const;

private:
    double from_, to_, spread_;
    std::vector<Term> terms_;
};

/// A row as a sheet gives it, in SI units.
struct CorrelationRow {
    double from, to;
    std::vector<Term> terms;
    double transition = 0; ///< enthalpy at `to`, from this phase into the next row's
    double spread = 0;
    std::string phase = {}; ///< `cr`, `l`, `cr, α`; empty where none is named
};

/// Refuses rows with a gap, overlapping or falling ones, no rows or more than 100, blank cells
/// (NaN), exponents beyond ±99, more than 30 terms, a transition of the last row, which would lead
/// nowhere (#VALUE!); a heat capacity that is not above zero all the way from `from` to `to`, and
/// enthalpies of transitions below zero (#NUM!).
Stretches<CorrelationPiece> correlation(std::span<const CorrelationRow> rows);

/// Whether Σ a·T^n is above zero in all of an interval: halved until Taylor's formula with its
/// remainder says so for every part. A sum that touches zero is not. Bounds: 4000 parts.
bool is_positive(std::span<const Term> terms, double low, double high);

} // namespace core::materials
