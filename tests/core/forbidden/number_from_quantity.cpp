// SPDX-License-Identifier: MPL-2.0

// A quantity becomes a number by value() only, where its SI unit is meant.

#include "core/quantities.h"

using namespace core;

#ifdef FORBIDDEN
double number(Pressure p) { return p; }
#else
double number(Pressure p) { return p.value(); }
#endif
