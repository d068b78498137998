// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/failure.h"
#include "core/quantities.h"

#include <compare>

namespace core {

/// A thermodynamic temperature: a point on the scale, above 0 K by construction. It enters a
/// product or a ratio only through absolute(), and two of them can only be subtracted, so that no
/// Celsius number and no temperature difference can ever stand where a temperature belongs.
class Temperature {
public:
    /// Refuses what is not above 0 K (#NUM!).
    static constexpr Temperature kelvin(double value) {
        if (!(value > 0)) refuse();
        return Temperature(value);
    }

    friend constexpr TemperatureDifference absolute(Temperature t) {
        return TemperatureDifference::from_value(t.kelvin_);
    }
    friend constexpr TemperatureDifference operator-(Temperature a, Temperature b) {
        return TemperatureDifference::from_value(a.kelvin_ - b.kelvin_);
    }
    friend constexpr auto operator<=>(Temperature, Temperature) = default;

    template<class Q>
    friend void operator*(Temperature, Q) = delete;
    template<class Q>
    friend void operator*(Q, Temperature) = delete;
    template<class Q>
    friend void operator/(Temperature, Q) = delete;
    template<class Q>
    friend void operator/(Q, Temperature) = delete;

private:
    explicit constexpr Temperature(double value) : kelvin_(value) {}
    [[noreturn]] static void refuse() {
        refuse_impossible("", "a temperature above 0 K",
                          "check the sign and the unit of the temperature");
    }

    double kelvin_;
};

} // namespace core
