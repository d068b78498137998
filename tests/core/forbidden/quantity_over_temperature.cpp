// SPDX-License-Identifier: MPL-2.0

// A quotient takes a temperature through absolute() only.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
Entropy quotient(Energy q, Temperature t) { return q / t; }
#else
Entropy quotient(Energy q, Temperature t) { return q / absolute(t); }
#endif
