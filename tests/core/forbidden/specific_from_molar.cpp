// SPDX-License-Identifier: MPL-2.0

// An energy per mole is no energy per kilogram.

#include "core/quantities.h"

using namespace core;

#ifdef FORBIDDEN
SpecificEnergy convert(MolarEnergy h) { return h; }
#else
SpecificEnergy convert(MolarEnergy h, MolarMass m) { return h / m; }
#endif
