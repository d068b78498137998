// SPDX-License-Identifier: MPL-2.0
#pragma once

// Cubic equations of state of the form p = R·T/(V - b) - a(T)/((V + ε·b)·(V + σ·b)), in SI numbers.
// Notation: A = a·p/(R·T)², B = b·p/(R·T), Z = p·V/(R·T), φ fugacity coefficient.
// Mixtures: van der Waals one-fluid rules, a = (Σ x·√a)², b = Σ x·b, interaction parameters zero.

#include "core/real_gas/fluid.h"

#include <array>

namespace core::real_gas {

/// What tells one cubic equation from another.
struct CubicForm {
    double epsilon, sigma;
    double omega_a, omega_b;   ///< a = Ωa·(R·Tc)²/pc·α, b = Ωb·R·Tc/pc
    std::array<double, 3> m;   ///< m = m0 + m1·ω + m2·ω² in α = (1 + m·(1 - √Tr))²
    double alpha_exponent = 0; ///< where not 0, α = Tr^exponent instead
};

/// Source: D. Y. Peng, D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59. Ωa, Ωb from the conditions
/// at the critical point, unrounded.
CubicForm const& peng_robinson();
/// Source: G. Soave, Chem. Eng. Sci. 27 (1972) 1197; constants likewise.
CubicForm const& soave();

/// a, its derivative by temperature, and b of a fluid.
struct Attraction {
    double a, da_dt, b;
};
Attraction attraction(CubicForm const&, Fluid const&, double t);

/// Real roots of Z above B, least first.
/// Method: closed form (Cardano, Viète), each root polished by Newton's method on the polynomial.
struct Roots {
    std::array<double, 3> z{};
    std::size_t count = 0;
};
Roots roots(CubicForm const&, double A, double B);

/// What an equation of state says of a fluid at a temperature and pressure.
struct Departure {
    double z;
    double enthalpy; ///< real minus ideal gas, J/mol
    double entropy;  ///< the same, J/(mol·K)
    double ln_fugacity_coefficient;
    bool liquid = false; ///< below the critical temperature and denser than there
};
/// Of the root with the least fugacity.
Departure departure(CubicForm const&, Fluid const&, double t, double p);

} // namespace core::real_gas
