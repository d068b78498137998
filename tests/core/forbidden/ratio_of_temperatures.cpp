// SPDX-License-Identifier: MPL-2.0

// A ratio of temperatures is taken of absolute() values, in sight.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
double ratio(Temperature a, Temperature b) { return a / b; }
#else
double ratio(Temperature a, Temperature b) { return absolute(a) / absolute(b); }
#endif
