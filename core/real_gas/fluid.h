// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/quantities.h"
#include "core/real_gas/critical_point.h"
#include "core/substances/gas.h"

#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace core::real_gas {

/// A component of a fluid and its mole fraction.
struct Part {
    CriticalPoint critical;
    double fraction;
};

/// A fluid or mixture with critical constants, and with the ideal gas of the tables where all of its
/// components are tabulated.
class Fluid {
public:
    /// Refuses a gas of which the project has no critical constants (#VALUE!).
    explicit Fluid(substances::Gas gas);
    /// By constants alone: one fluid, or parts whose fractions sum to 1.
    explicit Fluid(CriticalPoint const& critical) : parts_{{critical, 1}} {}
    explicit Fluid(std::vector<Part> parts) : parts_(std::move(parts)) {}

    std::span<const Part> parts() const { return parts_; }
    std::string written() const;
    MolarMass molar_mass() const;
    /// Refuses a fluid without a tabulated heat capacity (#VALUE!).
    substances::Gas const& ideal_gas() const;

private:
    std::vector<Part> parts_;
    std::optional<substances::Gas> ideal_;
};

/// Reads one fluid, `CO2`, `propane`, `R134a`, or a mixture, `0.9 CH4 + 0.1 C2H6`, as
/// substances::read_gas does. Refuses fluids without critical constants (#VALUE!).
Fluid read_fluid(std::string_view text);

} // namespace core::real_gas
