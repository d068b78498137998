// SPDX-License-Identifier: MPL-2.0
#include "core/substances/heating_curve.h"

#include "core/failure.h"
#include "core/substances/heating.h"
#include "core/substances/transition.h"
#include "core/written.h"

#include <string>

namespace core::substances {
namespace {

constexpr std::size_t most_points = 10'000;

CurvePoint point_at(Substance const& substance, Temperature from, Temperature t) {
    return {t, substance.heat_capacity(t), enthalpy_of_heating(substance, from, t),
            entropy_of_heating(substance, from, t)};
}

/// The two points of a transition: its own temperature belongs to the phase below.
void add_step(std::vector<CurvePoint>& curve, Substance const& substance, Temperature from,
              Rung const& above) {
    const Temperature t = Temperature::kelvin(above.from);
    CurvePoint point = point_at(substance, from, t);
    curve.push_back(point);
    point.heat_capacity = phase_of(above).heat_capacity(t);
    point.enthalpy += MolarEnergy::from_value(above.enthalpy_jump);
    point.entropy += MolarEntropy::from_value(above.entropy_jump);
    curve.push_back(point);
}

} // namespace

void check_curve(Temperature from, Temperature to, std::size_t points) {
    if (!(to > from))
        refuse_impossible("from " + written(from) + " to " + written(to), "an end above the start",
                          "exchange the two temperatures");
    if (points < 2 || points > most_points)
        refuse_impossible(std::to_string(points) + " points", "from 2 to 10000 points",
                          "choose as many points as the chart needs");
}

std::vector<CurvePoint> heating_curve(Substance const& substance, Temperature from, Temperature to,
                                      std::size_t points) {
    check_curve(from, to, points);
    const std::span<const Rung> rungs = substance.rungs();
    std::size_t next = substance.rung_at(from) + 1;
    const double start = absolute(from).value(), span = (to - from).value();
    std::vector<CurvePoint> curve;
    for (std::size_t i = 0; i < points; ++i) {
        const double share = static_cast<double>(i) / static_cast<double>(points - 1);
        const Temperature t = i + 1 == points ? to : Temperature::kelvin(start + span * share);
        for (; next < rungs.size() && Temperature::kelvin(rungs[next].from) < t; ++next)
            if (is_first_order(rungs[next - 1], rungs[next]))
                add_step(curve, substance, from, rungs[next]);
        curve.push_back(point_at(substance, from, t));
    }
    return curve;
}

} // namespace core::substances
