// SPDX-License-Identifier: MPL-2.0
#pragma once

// Conditions on one argument, stated by its type. These are plain aggregates: whoever builds one
// has checked the condition first, where the argument has a name to put into the refusal (#NUM!).

#include "core/quantities.h"
#include "core/temperature.h"

namespace core {

/// Above zero.
template<class Q>
struct Positive {
    Q value;
};

/// Zero or above.
template<class Q>
struct NonNegative {
    Q value;
};

/// From 0 to 1, both ends included.
struct Fraction {
    double value;
};

/// Above 0, up to and including 1.
struct Efficiency {
    double value;
};

/// A pressure read on a gauge: counted from the atmospheric pressure, below it negative.
struct GaugePressure {
    Pressure value;
};

/// A value with its standard uncertainty, for the few relations that judge by it.
template<class Q>
struct Uncertain {
    Q value, u;
};
template<>
struct Uncertain<Temperature> {
    Temperature value;
    TemperatureDifference u;
};

} // namespace core
