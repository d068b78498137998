// SPDX-License-Identifier: MPL-2.0
#pragma once

// Saturation and the boundary between regions 2 and 3, in SI numbers: t in K, p in Pa.

#include "core/steam/equations.h"

namespace core::steam {

// Source: R7-97(2012), sections 2, 3 and 8.
inline constexpr double critical_temperature = 647.096, critical_pressure = 22.064e6,
                        critical_density = 322;
inline constexpr double triple_temperature = 273.16;
/// The limits of the formulation.
inline constexpr double lowest_temperature = 273.15, highest_temperature = 2273.15,
                        highest_temperature_2 = 1073.15, highest_pressure = 100e6,
                        highest_pressure_5 = 50e6;
/// Between regions 1 and 3.
inline constexpr double boundary_temperature_1_3 = 623.15;
/// Where the boundary between regions 2 and 3 ends, at 100 MPa.
inline constexpr double highest_temperature_3 = 863.15;

/// Equation 30, 273.15 K to the critical temperature.
double saturation_pressure_at(double t);
/// Equation 31, the exact inverse of equation 30.
double saturation_temperature_at(double p);
/// Equation 5, 623.15 to 863.15 K.
double boundary_pressure_2_3(double t);
/// Equation 6, its inverse.
double boundary_temperature_2_3(double p);

/// Where a density of region 3 is looked for: on the side of the liquid or of the vapour, which below
/// the critical temperature are apart.
enum class Side { liquid, vapour };

/// Density of region 3 from temperature and pressure: the root of equation 28 on its side.
/// Method: Newton's method between bounds, bisecting where it would leave them. Where the isotherm
/// does not reach the pressure on that side, its turning point is taken: within 1e-3 K of the
/// critical temperature equation 30 lies above it by rounding.
double density_3(double t, double p, Side side);

/// Both phases at saturation.
struct SaturatedPair {
    Properties liquid, vapour;
};
/// From equations 7 and 16 up to 623.15 K, from equation 28 above; at the pressure of equation 30.
SaturatedPair saturated_pair(double t, double p);

} // namespace core::steam
