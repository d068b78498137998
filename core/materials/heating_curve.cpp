// SPDX-License-Identifier: MPL-2.0
#include "core/materials/heating_curve.h"

#include "core/substances/heating_curve.h"

#include <cmath>
#include <limits>

namespace core::materials {
namespace {

CurvePoint point_at(OwnMaterial const& material, double from, double t) {
    const auto change = material.heating(from, t);
    return {t, material.heat_capacity(t), change.enthalpy, change.entropy};
}

/// The two points of a joint: its own temperature belongs to the row below.
void add_step(std::vector<CurvePoint>& curve, OwnMaterial const& material, double from, double t) {
    CurvePoint point = point_at(material, from, t);
    curve.push_back(point);
    point.heat_capacity =
        material.heat_capacity(std::nextafter(t, std::numeric_limits<double>::infinity()));
    const auto transition = material.transition(t);
    point.enthalpy += transition.enthalpy;
    point.entropy += transition.entropy;
    curve.push_back(point);
}

} // namespace

std::vector<CurvePoint> heating_curve(OwnMaterial const& material, Temperature from, Temperature to,
                                      std::size_t points) {
    substances::check_curve(from, to, points);
    const double start = absolute(from).value(), end = absolute(to).value();
    auto joint = material.joints().begin();
    while (joint != material.joints().end() && *joint <= start) ++joint;
    std::vector<CurvePoint> curve;
    for (std::size_t i = 0; i < points; ++i) {
        const double share = static_cast<double>(i) / static_cast<double>(points - 1);
        const double t = i + 1 == points ? end : start + (end - start) * share;
        for (; joint != material.joints().end() && *joint < t; ++joint)
            add_step(curve, material, start, *joint);
        curve.push_back(point_at(material, start, t));
    }
    return curve;
}

} // namespace core::materials
