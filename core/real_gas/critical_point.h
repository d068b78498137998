// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <span>
#include <string_view>

namespace core::real_gas {

/// What the equations of state need of a fluid, in SI units.
/// Source: core/real_gas/tables/SOURCES.md; the primary reference with each.
struct CriticalPoint {
    std::string_view name, formula;
    double molar_mass;
    double temperature, pressure, acentric_factor;
    std::string_view reference;
};

std::span<const CriticalPoint> critical_points();

/// The fluid of this name or formula, or null: names in any case, with blanks and hyphens or not, `n-`
/// before a chain or not; formulas as written, null where isomers share one.
CriticalPoint const* find_critical_point(std::string_view text);

} // namespace core::real_gas
