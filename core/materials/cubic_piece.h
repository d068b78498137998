// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <array>

namespace core::materials {

/// A cubic heat capacity over one interval of temperature, held by its Bernstein ordinates: cp(T) =
/// Σ binomial(3, k) · (1 - s)^(3-k) · s^k · b_k with s = (T - from) / (to - from).
/// Where the curve is monotone and its ends are above zero all four are, and so are those of every
/// part of it (P. de Casteljau's subdivision), so that nothing cancels in any of the integrals.
/// Accuracy: 1e-14 relative, from pieces of a millikelvin to pieces of many times their lower end,
/// tests/core/materials/measured_table_test.cpp.
class CubicPiece {
public:
    using Ordinates = std::array<double, 4>;

    CubicPiece(double from, double to, Ordinates const& ordinates)
        : from_(from), to_(to), ordinates_(ordinates) {}

    double from() const { return from_; }
    double to() const { return to_; }

    double heat_capacity(double t) const;
    /// What a kelvin takes up; here the heat capacity.
    double slope(double t) const { return heat_capacity(t); }
    /// ∫cp dT and ∫cp/T dT for from() <= low <= high <= to().
    double enthalpy(double low, double high) const;
    double entropy(double low, double high) const;

private:
    Ordinates part(double low, double high) const;

    double from_, to_;
    Ordinates ordinates_;
};

} // namespace core::materials
