// SPDX-License-Identifier: MPL-2.0
#include "core/steam/machine.h"

#include "core/failure.h"
#include "core/written.h"

#include <algorithm>
#include <cmath>
#include <string>

namespace core::steam {
namespace {

constexpr std::size_t most_points = 10'000;
// What the release lets regions differ by where they meet, in entropy.
constexpr double entropy_tolerance = 0.2;

Properties critical_point() {
    Properties at = region_3(critical_density, critical_temperature);
    at.p = critical_pressure;
    return at;
}

SaturationPoint point_at(double t) {
    const double p = t < critical_temperature ? saturation_pressure_at(t) : critical_pressure;
    const SaturatedPair pair = t < critical_temperature
                                   ? saturated_pair(t, p)
                                   : SaturatedPair{critical_point(), critical_point()};
    return {Temperature::kelvin(t),
            Pressure::from_value(p),
            SpecificEnergy::from_value(pair.liquid.h),
            SpecificEnergy::from_value(pair.vapour.h),
            SpecificEntropy::from_value(pair.liquid.s),
            SpecificEntropy::from_value(pair.vapour.s)};
}

} // namespace

SpecificEnergy exergy(State const& state, State const& surroundings, Notes const& notes) {
    const SpecificEnergy enthalpy = state.enthalpy - surroundings.enthalpy;
    const SpecificEntropy entropy = state.entropy - surroundings.entropy;
    notes.step([&] { return "h - h0 = " + written(enthalpy) + ", s - s0 = " + written(entropy); });
    return enthalpy - absolute(surroundings.temperature) * entropy;
}

Dimensionless efficiency_isentropic(State const& begin, State const& end, Notes const& notes) {
    if (begin.pressure == end.pressure)
        refuse_impossible("both pressures " + written(begin.pressure),
                          "an end pressure other than the one at the beginning",
                          "check the pressures; nothing tells a turbine from a pump");
    const bool turbine = end.pressure < begin.pressure;
    const State ideal = at_pressure_and_entropy({end.pressure}, begin.entropy);
    const SpecificEnergy isentropic = ideal.enthalpy - begin.enthalpy,
                         real = end.enthalpy - begin.enthalpy;
    notes.step(
        [&] { return "h2s - h1 = " + written(isentropic) + ", h2 - h1 = " + written(real); });
    if ((end.entropy - begin.entropy).value() < -entropy_tolerance)
        refuse_impossible("s2 - s1 = " + written(end.entropy - begin.entropy),
                          "an end of no less entropy than the beginning (second law)",
                          "check both states, and that no heat was given off");
    if (!(turbine ? real.value() < 0 : real.value() > 0))
        refuse_impossible("h2 - h1 = " + written(real),
                          turbine ? "an enthalpy that falls in a turbine"
                                  : "an enthalpy that rises in a pump or compressor",
                          "check which state comes first");
    return std::min(turbine ? real / isentropic : isentropic / real, Dimensionless(1.0));
}

std::vector<SaturationPoint> saturation_curve(std::size_t points) {
    if (points < 2 || points > most_points)
        refuse_impossible(std::to_string(points) + " points", "from 2 to 10000 points",
                          "choose as many points as the chart needs");
    std::vector<SaturationPoint> curve;
    const double span = critical_temperature - triple_temperature;
    for (std::size_t i = 0; i < points; ++i)
        curve.push_back(point_at(i + 1 == points
                                     ? critical_temperature
                                     : triple_temperature + span * static_cast<double>(i) /
                                                                static_cast<double>(points - 1)));
    return curve;
}

} // namespace core::steam
