// SPDX-License-Identifier: MPL-2.0

// A number without a unit is no quantity.

#include "core/quantities.h"

using namespace core;

#ifdef FORBIDDEN
Pressure standard() { return 100000.0; }
#else
Pressure standard() { return Pressure::from_value(100000.0); }
#endif
