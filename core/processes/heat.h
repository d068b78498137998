// SPDX-License-Identifier: MPL-2.0
#pragma once

// Notation: Q heat crossing a boundary, T temperature of the boundary, E energy radiated.

#include "core/conditions.h"
#include "core/notes.h"
#include "core/quantities.h"
#include "core/ratio.h"
#include "core/temperature.h"
#include "core/written.h"

#include <cmath>

namespace core::processes {

/// Arithmetic over logarithmic mean of two temperatures that are near: artanh(w) / w
/// = 1 + w²/3 + w⁴/5 + ... with w = (T2 - T1) / (T2 + T1), |w| at most 1/8.
inline double ratio_of_means(double w) {
    double series = 0;
    for (int n = 19; n >= 1; n -= 2) series = series * w * w + 1.0 / n;
    return series;
}

/// Entropy that heat carries across a boundary at one temperature: Q / T.
/// Source: Clausius 1865, dS = δQ/T.
/// Valid: T is the temperature where the heat passes; the sign of Q is kept.
template<class Basis>
On<Entropy, Basis> heat_transfer(On<Energy, Basis> heat, Temperature temperature) {
    return heat / absolute(temperature);
}

/// The same where the boundary glides from T1 to T2 while equal parts of Q pass at equal steps
/// of T: Q · ln(T2 / T1) / (T2 - T1), exact as T2 → T1.
/// Source: the integral of dS = δQ/T with δQ = Q · dT / (T2 - T1).
/// Method: near temperatures through their arithmetic mean, with no quotient of small numbers.
/// Accuracy: 2 units in the last place as T2 → T1, 3.5 elsewhere, heat_test.cpp.
template<class Basis>
On<Entropy, Basis> gliding_heat_transfer(On<Energy, Basis> heat, Temperature temperature,
                                         Temperature end_temperature, Notes const& notes = silent) {
    const TemperatureDifference rise = end_temperature - temperature;
    const TemperatureDifference mean = 0.5 * (absolute(temperature) + absolute(end_temperature));
    const double w = 0.5 * rise / mean;
    const bool near = std::abs(w) <= 0.125;
    const double logarithm = ln_ratio(end_temperature, temperature);
    notes.step([&] {
        return "(T2 - T1) / ln(T2 / T1) = " +
               written(near ? mean / ratio_of_means(w) : rise / logarithm);
    });
    return near ? heat * ratio_of_means(w) / mean : heat * logarithm / rise;
}

/// Entropy of the radiation that leaves a black surface: 4 · E / (3 · T).
/// Source: Planck, Theorie der Wärmestrahlung (1906): energy density a·T^4 has entropy density
/// 4/3 · a·T^3, and both leave at the same speed.
/// Valid: all radiation of a black surface, one way; in net exchange a body changes by Q / T.
template<class Basis>
On<Entropy, Basis> blackbody_radiation(NonNegative<On<Energy, Basis>> emitted,
                                       Temperature temperature) {
    return 4.0 * emitted.value / (3.0 * absolute(temperature));
}

} // namespace core::processes
