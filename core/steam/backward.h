// SPDX-License-Identifier: MPL-2.0
#pragma once

// The backward equations of the formulation: a temperature from pressure and enthalpy or entropy, good
// to 25 mK. Here they only start what then satisfies the basic equations. Numbers of SI units.
// Source: R7-97(2012), equations 11, 13, 20 to 27; SR3-03(2014), equations 1 to 8.

namespace core::steam::backward {

double temperature_1_ph(double p, double h);
double temperature_1_ps(double p, double s);
/// By the subregion 2a, 2b or 2c that the pair lies in.
double temperature_2_ph(double p, double h);
double temperature_2_ps(double p, double s);
/// By the subregion 3a or 3b.
double temperature_3_ph(double p, double h);
double temperature_3_ps(double p, double s);
double volume_3_ph(double p, double h);
double volume_3_ps(double p, double s);

/// Equation 20 and its inverse, equation 21: the boundary between 2b and 2c.
double boundary_pressure_2b_2c(double h);
double boundary_enthalpy_2b_2c(double p);
/// The boundary between 3a and 3b. Source: SR3-03(2014), equation 1.
double boundary_enthalpy_3a_3b(double p);
/// Its entropy is that of the critical point.
inline constexpr double boundary_entropy_3a_3b = 4412.02148223476;

} // namespace core::steam::backward
