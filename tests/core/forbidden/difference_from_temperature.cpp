// SPDX-License-Identifier: MPL-2.0

// A temperature is no difference of temperatures.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
TemperatureDifference rise(Temperature t) { return t; }
#else
TemperatureDifference rise(Temperature t, Temperature from) { return t - from; }
#endif
