// SPDX-License-Identifier: MPL-2.0

// The result of a relation stands on the basis of its argument.

#include "core/processes/phase_change.h"

using namespace core;

#ifdef FORBIDDEN
MolarEntropy melting(Temperature t) {
    return processes::transition<Specific>({SpecificEnergy::from_value(1)}, t);
}
#else
SpecificEntropy melting(Temperature t) {
    return processes::transition<Specific>({SpecificEnergy::from_value(1)}, t);
}
#endif
