// SPDX-License-Identifier: MPL-2.0
#pragma once

// What can be heated and cooled at 1 bar: a substance of the tables, a constant heat capacity, a
// material that a sheet describes. Numbers are SI per unit of what the material is counted in, mole
// or kilogram; whoever multiplies them by an amount sees to it that both agree.

#include "core/conditions.h"
#include "core/quantities.h"
#include "core/substances/substance.h"
#include "core/temperature.h"

#include <string>
#include <vector>

namespace core::substances {

class Material {
public:
    /// Heat and entropy taken up.
    struct Change {
        double enthalpy = 0, entropy = 0;
    };

    virtual ~Material() = default;

    /// The range of temperature in kelvin, both ends included.
    virtual double from() const = 0;
    virtual double to() const = 0;
    /// Between two temperatures of the range; a transition exactly at either end is not made at it,
    /// so that the state there is the one of the low-temperature phase.
    virtual Change heating(double from, double to) const = 0;
    /// Of the transition exactly at a temperature; zero where there is none.
    virtual Change transition(double at) const = 0;
    /// Every temperature inside the range at which a transition happens or the equation changes,
    /// from low to high. Between two of them heat grows with temperature without a step.
    virtual std::vector<double> breakpoints() const = 0;
    virtual std::string written() const = 0;
};

/// A substance of the tables, counted in moles. A gap in its data bounds its range, on the side on
/// which `around` lies.
class SubstanceMaterial final : public Material {
public:
    SubstanceMaterial(Substance const& substance, Temperature around);

    double from() const override;
    double to() const override;
    Change heating(double from, double to) const override;
    Change transition(double at) const override;
    std::vector<double> breakpoints() const override;
    std::string written() const override { return substance_.written(); }

private:
    Substance substance_;
    std::span<const Rung> rungs_;
};

/// A heat capacity that does not change, on any basis: Q = c·ΔT, ΔS = c·ln(T2/T1).
class ConstantMaterial final : public Material {
public:
    /// The heat capacity in SI units, above zero.
    explicit ConstantMaterial(double heat_capacity) : heat_capacity_(heat_capacity) {}

    double from() const override { return 1e-3; }
    double to() const override { return 1e9; }
    Change heating(double from, double to) const override;
    Change transition(double) const override { return {}; }
    std::vector<double> breakpoints() const override { return {}; }
    std::string written() const override { return "a constant heat capacity"; }

private:
    double heat_capacity_;
};

} // namespace core::substances
