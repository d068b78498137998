// SPDX-License-Identifier: MPL-2.0

// A number, which may be in degrees Celsius, is no temperature before its scale is named.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
Temperature room() { return 25.0; }
#else
Temperature room() { return Temperature::kelvin(298.15); }
#endif
