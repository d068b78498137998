// SPDX-License-Identifier: MPL-2.0

// A difference of temperatures is no temperature.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
Temperature end(Temperature a, Temperature b) { return b - a; }
#else
TemperatureDifference rise(Temperature a, Temperature b) { return b - a; }
#endif
