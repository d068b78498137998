// SPDX-License-Identifier: MPL-2.0

// A gauge pressure is no pressure before the atmosphere is added.

#include "core/conditions.h"

using namespace core;

#ifdef FORBIDDEN
Pressure convert(GaugePressure p) { return p; }
#else
Pressure convert(GaugePressure p, Pressure atmospheric) { return p.value + atmospheric; }
#endif
