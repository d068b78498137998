// SPDX-License-Identifier: MPL-2.0
#pragma once

// Random states for properties, over the ranges a sheet may hold; spread evenly over the logarithm.

#include "core/conditions.h"
#include "core/constants.h"
#include "core/quantities.h"
#include "core/temperature.h"

#include <rapidcheck.h>

#include <cmath>

namespace random_states {

/// From `low` to `high`, evenly over the logarithm.
inline double between(double low, double high) {
    const int step = *rc::gen::inRange(0, 1'000'001);
    return low * std::pow(high / low, step / 1e6);
}

inline core::Temperature temperature() { return core::Temperature::kelvin(between(20, 5000)); }

inline core::Positive<core::Pressure> pressure() {
    return {core::Pressure::from_value(between(1e2, 1e8))};
}

/// Of a gas: 2.5 R for atoms up to 40 R for large molecules.
inline core::Positive<core::MolarHeatCapacity> gas_heat_capacity() {
    return {core::gas_constant * between(2.5, 40)};
}

} // namespace random_states
