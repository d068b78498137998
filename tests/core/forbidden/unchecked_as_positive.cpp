// SPDX-License-Identifier: MPL-2.0

// A quantity becomes a positive one in sight, where it has been checked.

#include "core/conditions.h"

using namespace core;

#ifdef FORBIDDEN
Positive<Pressure> positive(Pressure p) { return p; }
#else
Positive<Pressure> positive(Pressure p) { return {p}; }
#endif
