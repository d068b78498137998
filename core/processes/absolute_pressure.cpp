// SPDX-License-Identifier: MPL-2.0
#include "core/processes/absolute_pressure.h"

#include "core/failure.h"
#include "core/written.h"

namespace core::processes {

Pressure absolute_pressure(GaugePressure gauge, Positive<Pressure> atmospheric) {
    const Pressure sum = gauge.value + atmospheric.value;
    if (sum > Pressure{}) return sum;
    refuse_impossible("a gauge pressure of " + written(gauge.value) + " in an atmosphere of " +
                          written(atmospheric.value),
                      "a sum above 0, as no vacuum goes below it",
                      "check the sign and the unit of the gauge pressure");
}

} // namespace core::processes
