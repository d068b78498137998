// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/conditions.h"
#include "core/quantities.h"

namespace core::processes {

/// Absolute pressure behind a gauge reading: gauge + atmospheric.
/// Refuses a sum that is not above 0: no vacuum is deeper than the atmosphere is high.
Pressure absolute_pressure(GaugePressure gauge, Positive<Pressure> atmospheric);

} // namespace core::processes
