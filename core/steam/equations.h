// SPDX-License-Identifier: MPL-2.0
#pragma once

// The basic equations of the IAPWS Industrial Formulation 1997, in numbers of SI units: t in K, p in
// Pa, v in m³/kg, h in J/kg, s in J/(kg·K), density in kg/m³.
// Source: IAPWS R7-97(2012), equations 7, 15 to 17, 18, 28, 32 to 34, tables 2 to 38.
// Notation of the release: γ = g/(R·T), φ = f/(R·T), π, τ, δ reduced pressure, inverse temperature and
// density. Accuracy: every digit of the release's verification tables, tests/core/steam.

namespace core::steam {

/// Specific gas constant of the formulation, J/(kg·K).
inline constexpr double specific_gas_constant = 461.526;

/// A state of one phase with what its inversion needs.
struct Properties {
    double t, p, v, h, s;
    double heat_capacity; ///< at constant pressure, (∂h/∂T) = T·(∂s/∂T)
    double expansion;     ///< (∂v/∂T) at constant pressure
    double compression;   ///< (∂v/∂p) at constant temperature, below 0
};

/// Liquid up to 623.15 K. Equation 7.
Properties region_1(double t, double p);
/// Vapour up to 1073.15 K. Equations 15 to 17.
Properties region_2(double t, double p);
/// Vapour below saturation that has not yet condensed, up to 10 MPa. Equations 16 to 19.
Properties metastable_vapour(double t, double p);
/// Up to 2273.15 K. Equations 32 to 34.
Properties region_5(double t, double p);

/// Around the critical point by density. Equation 28.
Properties region_3(double density, double t);
/// Pressure and (∂p/∂ρ) alone.
struct PressureOfDensity {
    double p, slope;
};
PressureOfDensity pressure_3(double density, double t);

/// Entropy alone, as fast as it can be had.
double entropy_1(double t, double p);
double entropy_2(double t, double p);
double entropy_3(double density, double t);
double entropy_5(double t, double p);

/// Reduced variables, for the steps.
namespace reduced {
inline double pressure_1(double p) { return p / 16.53e6; }
inline double pressure_2(double p) { return p / 1e6; } ///< of region 5 as well
inline double temperature_1(double t) { return 1386 / t; }
inline double temperature_2(double t) { return 540 / t; }
inline double temperature_3(double t) { return 647.096 / t; }
inline double temperature_5(double t) { return 1000 / t; }
inline double density_3(double density) { return density / 322; }
} // namespace reduced

} // namespace core::steam
