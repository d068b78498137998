// SPDX-License-Identifier: MPL-2.0

// Arguments in the wrong order are different types.

#include "core/processes/phase_change.h"

using namespace core;

#ifdef FORBIDDEN
Entropy melting(Positive<Energy> h, Temperature t) { return processes::transition<Total>(t, h); }
#else
Entropy melting(Positive<Energy> h, Temperature t) { return processes::transition<Total>(h, t); }
#endif
