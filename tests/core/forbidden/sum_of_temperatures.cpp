// SPDX-License-Identifier: MPL-2.0

// Two points have a difference and no sum.

#include "core/temperature.h"

using namespace core;

#ifdef FORBIDDEN
auto sum(Temperature a, Temperature b) { return a + b; }
#else
auto difference(Temperature a, Temperature b) { return a - b; }
#endif
