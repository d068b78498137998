// SPDX-License-Identifier: MPL-2.0
#pragma once

// How a relation of the core writes a value into a step, a remark or a refusal.

#include "core/quantities.h"
#include "core/temperature.h"
#include "core/text/unit.h"

#include <charconv>
#include <string>

namespace core {

/// Up to ten significant digits with a decimal point, no trailing zeros: `579.2093187`.
inline std::string written(double value) {
    char text[32];
    const auto end = std::to_chars(text, text + sizeof text, value, std::chars_format::general, 10);
    return std::string(text, end.ptr);
}

/// Number and coherent SI unit: `300 K`.
template<class Unit>
std::string written(boost::units::quantity<Unit> value) {
    constexpr Dimension d = dimension<boost::units::quantity<Unit>>;
    if constexpr (d == Dimension{})
        return written(value.value());
    else
        return written(value.value()) + ' ' + text::si_unit(d);
}

inline std::string written(Temperature t) { return written(absolute(t)); }

} // namespace core
