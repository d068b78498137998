// SPDX-License-Identifier: MPL-2.0

// An isothermal change between volumes takes no pressures.

#include "core/processes/ideal_gas.h"

using namespace core;

#ifdef FORBIDDEN
MolarEntropy change(Positive<Pressure> a, Positive<Pressure> b) {
    return processes::isothermal_by_volume<Total>(a, b);
}
#else
MolarEntropy change(Positive<Pressure> a, Positive<Pressure> b) {
    return processes::isothermal_by_pressure(a, b);
}
#endif
