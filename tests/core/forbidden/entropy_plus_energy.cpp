// SPDX-License-Identifier: MPL-2.0

// Energy and entropy have no sum.

#include "core/quantities.h"

using namespace core;

#ifdef FORBIDDEN
Energy sum(Energy q, Entropy s) { return q + s; }
#else
Energy sum(Energy q, Entropy s, TemperatureDifference t) { return q + s * t; }
#endif
