// SPDX-License-Identifier: MPL-2.0
#pragma once

// A material that a sheet describes, by a measured table or a correlation.
// Notation: cp heat capacity, T temperature, ΔH and ΔS of a transition.
// Steps: each stretch between transitions, each transition, and the sum. Remarks: an end within
// 1 K of a transition, latent heat that is no part of a heat capacity.

#include "core/materials/correlation.h"
#include "core/materials/measured_table.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/material.h"

#include <cstdint>
#include <optional>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

namespace core::materials {

/// What the heat capacity is counted per: mole, kilogram, or the whole body.
enum class Basis : std::uint8_t { molar, specific, total };

template<class B>
inline constexpr Basis basis_of = B{};
template<>
inline constexpr Basis basis_of<Molar> = Basis::molar;
template<>
inline constexpr Basis basis_of<Specific> = Basis::specific;
template<>
inline constexpr Basis basis_of<Total> = Basis::total;

/// `molar, J/(mol·K)`, for messages.
std::string described(Basis);

class OwnMaterial final : public substances::Material {
public:
    /// By a measured table, without transitions; jumps of the heat capacity are none.
    /// Refuses what measured_table refuses.
    static OwnMaterial measured(Basis, std::vector<double> temperatures,
                                std::vector<double> heat_capacities);
    /// By a correlation. Refuses what correlation refuses.
    static OwnMaterial correlated(Basis, std::vector<CorrelationRow> rows);

    Basis basis() const { return basis_; }
    std::string_view name() const { return name_; }
    std::optional<MolarMass> molar_mass() const { return molar_mass_; }
    /// Refuses more than 100 bytes, control characters and `"` in a name (#VALUE!).
    void set_name(std::string_view name);
    /// Refuses what is not above zero (#NUM!).
    void set_molar_mass(MolarMass);

    double from() const override;
    double to() const override;
    /// Refuses temperatures outside the range (#NUM!).
    Change heating(double from, double to) const override;
    Change transition(double at) const override;
    std::vector<double> breakpoints() const override;
    std::string written() const override;

    /// Either of the two alone.
    double enthalpy(double from, double to) const;
    double entropy(double from, double to) const;
    /// Without the latent heat of a spread.
    double heat_capacity(double t) const;
    /// Where heating from a temperature ends that takes up this heat.
    EndState end_of_heating(double from, double heat) const;

    /// The rows as given; those of the other kind are empty.
    std::span<const double> temperatures() const { return temperatures_; }
    std::span<const double> heat_capacities() const { return heat_capacities_; }
    std::span<const CorrelationRow> rows() const { return rows_; }

    /// The share of a phase at an end of heating: named in full, `cr, α`, or `cr` for all crystals.
    /// In a row with a spread that names no phase the share of the phase above grows evenly.
    /// Refuses a phase that no row names, and a spread between phases that are not named (#VALUE!).
    double fraction_of_phase(std::string_view phase, EndState) const;

    /// The temperatures that part what `steps` lists, rising: range ends, jumps, joints of rows.
    std::span<const double> joints() const { return joints_; }

    /// The spread that lies at a temperature, or zero.
    double spread_at(double t) const;

private:
    using Curve = std::variant<Stretches<CubicPiece>, Stretches<CorrelationPiece>>;

    OwnMaterial(Basis basis, Curve curve) : basis_(basis), curve_(std::move(curve)) {}
    void find_joints();

    Basis basis_;
    Curve curve_;
    std::vector<double> temperatures_ = {}, heat_capacities_ = {};
    std::vector<CorrelationRow> rows_ = {};
    std::vector<double> joints_ = {};
    std::string name_ = {};
    std::optional<MolarMass> molar_mass_ = {};
};

/// Refuses a material counted otherwise (#VALUE!).
void require(OwnMaterial const&, Basis);

/// ∫cp dT and ∫cp/T dT with every transition passed, told to `notes`; in SI units of the material.
double heat_taken_up(OwnMaterial const&, Temperature from, Temperature to, Notes const&);
double entropy_taken_up(OwnMaterial const&, Temperature from, Temperature to, Notes const&);
double heat_capacity_at(OwnMaterial const&, Temperature, Notes const&);
EndState end_of_heating(OwnMaterial const&, Temperature from, double heat, Notes const&);

/// Entropy taken up by heating: Σ ∫cp/T dT + Σ ΔH/T; cooling is the negative.
/// Accuracy: 1e-13 against quadrature in 50 digits, times what the terms of a correlation exceed
/// their sum by; tests/core/materials/measured_table_test.cpp, correlation_test.cpp.
template<class B>
On<Entropy, B> entropy_of_heating(OwnMaterial const& material, Temperature from, Temperature to,
                                  Notes const& notes = silent) {
    require(material, basis_of<B>);
    return On<Entropy, B>::from_value(entropy_taken_up(material, from, to, notes));
}

/// Heat taken up on the way: Σ ∫cp dT + Σ ΔH; cooling is the negative.
template<class B>
On<Energy, B> enthalpy_of_heating(OwnMaterial const& material, Temperature from, Temperature to,
                                  Notes const& notes = silent) {
    require(material, basis_of<B>);
    return On<Energy, B>::from_value(heat_taken_up(material, from, to, notes));
}

/// Heat capacity, without the latent heat of a spread, which is remarked.
template<class B>
On<HeatCapacity, B> heat_capacity(OwnMaterial const& material, Temperature temperature,
                                  Notes const& notes = silent) {
    require(material, basis_of<B>);
    return On<HeatCapacity, B>::from_value(heat_capacity_at(material, temperature, notes));
}

/// Where heating ends that takes up this heat, below zero for cooling.
template<class B>
Temperature temperature_heated(OwnMaterial const& material, Temperature from, On<Energy, B> heat,
                               Notes const& notes = silent) {
    require(material, basis_of<B>);
    return end_of_heating(material, from, heat.value(), notes).temperature;
}

/// The share that is then of a phase, 0 to 1.
template<class B>
Dimensionless fraction_of_phase(OwnMaterial const& material, Temperature from, On<Energy, B> heat,
                                std::string_view phase, Notes const& notes = silent) {
    require(material, basis_of<B>);
    return material.fraction_of_phase(phase, end_of_heating(material, from, heat.value(), notes));
}

} // namespace core::materials
