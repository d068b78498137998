// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/conditions.h"
#include "core/quantities.h"
#include "core/temperature.h"

namespace core::processes {

/// Refuses what is neither a compressor nor a turbine, for whatever gas: equal pressures, or a
/// temperature that goes the wrong way (#NUM!).
void check_machine(Temperature temperature_1, Positive<Pressure> pressure_1,
                   Temperature temperature_2, Positive<Pressure> pressure_2);

} // namespace core::processes
