// SPDX-License-Identifier: MPL-2.0

// A temperature is a point: it enters a product through absolute() only.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
MolarEnergy product(MolarEntropy s, Temperature t) { return s * t; }
#else
MolarEnergy product(MolarEntropy s, Temperature t) { return s * absolute(t); }
#endif
