// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/conditions.h"
#include "core/constants.h"
#include "core/quantities.h"
#include "core/temperature.h"

namespace core::processes {

/// Amount of an ideal gas in a volume, or its flow in a volume flow: p · V / (R · T).
/// Valid: where p·V = n·R·T holds; volumes "normal" or "standard" need their T and p stated, for
/// usage differs (0 °C or 15 °C or 60 °F; 101.325 kPa or 1 bar).
template<class Basis>
On<AmountOfSubstance, Basis> amount_of_gas(Positive<On<Volume, Basis>> volume,
                                           Temperature temperature, Positive<Pressure> pressure) {
    return pressure.value * volume.value / (gas_constant * absolute(temperature));
}

} // namespace core::processes
