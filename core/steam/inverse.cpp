// SPDX-License-Identifier: MPL-2.0
#include "core/steam/inverse.h"

#include "core/steam/backward.h"
#include "core/steam/solve.h"
#include "core/written.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <string>

namespace core::steam {
namespace {

// Ends of the range count as inside after a change of units.
constexpr double end_tolerance = 1e-9;
// Water does not reach its least entropy at 273.15 K at every pressure: isentropes are followed a little
// below, where region 1 goes on smoothly.
constexpr double below_lowest_temperature = 270;

/// A stretch of one region: temperatures on an isobar, pressures on an isotherm, rising.
struct Stretch {
    Region region;
    double low, high;
    Side side = Side::liquid;
};

class Stretches {
public:
    void add(Stretch stretch) {
        if (stretch.high >= stretch.low) all_[count_++] = stretch;
    }
    Stretch const* begin() const { return all_.data(); }
    Stretch const* end() const { return all_.data() + count_; }
    Stretch const& back() const { return all_[count_ - 1]; }

private:
    std::array<Stretch, 6> all_{};
    std::size_t count_ = 0;
};

const double pressure_at_lowest = saturation_pressure_at(lowest_temperature);
const double pressure_1_3 = saturation_pressure_at(boundary_temperature_1_3);

void add_vapour(Stretches& stretches, double from, double p) {
    stretches.add({Region::vapour, from, highest_temperature_2});
    if (p <= highest_pressure_5)
        stretches.add({Region::hot, highest_temperature_2, highest_temperature});
}

void add_dense(Stretches& stretches, double p) {
    const double end = boundary_temperature_2_3(p);
    if (p < critical_pressure) {
        const double saturation = saturation_temperature_at(p);
        stretches.add({Region::dense, boundary_temperature_1_3, saturation, Side::liquid});
        stretches.add({Region::two_phase, saturation, saturation});
        stretches.add({Region::dense, saturation, end, Side::vapour});
    } else {
        stretches.add({Region::dense, boundary_temperature_1_3, end});
    }
    add_vapour(stretches, end, p);
}

Stretches isobar(double p, double lowest) {
    Stretches stretches;
    if (p < pressure_at_lowest) {
        add_vapour(stretches, lowest_temperature, p);
    } else if (p <= pressure_1_3) {
        const double saturation = saturation_temperature_at(p);
        stretches.add({Region::liquid, lowest, saturation});
        stretches.add({Region::two_phase, saturation, saturation});
        add_vapour(stretches, saturation, p);
    } else {
        stretches.add({Region::liquid, lowest, boundary_temperature_1_3});
        add_dense(stretches, p);
    }
    return stretches;
}

Stretches isotherm(double t) {
    Stretches stretches;
    if (t > highest_temperature_2) {
        stretches.add({Region::hot, lowest_pressure, highest_pressure_5});
    } else if (t > highest_temperature_3) {
        stretches.add({Region::vapour, lowest_pressure, highest_pressure});
    } else if (t > boundary_temperature_1_3) {
        const double boundary = boundary_pressure_2_3(t);
        stretches.add({Region::vapour, lowest_pressure, boundary});
        if (t < critical_temperature) {
            const double saturation = saturation_pressure_at(t);
            stretches.add({Region::dense, boundary, saturation, Side::vapour});
            stretches.add({Region::two_phase, saturation, saturation});
            stretches.add({Region::dense, saturation, highest_pressure, Side::liquid});
        } else {
            stretches.add({Region::dense, boundary, highest_pressure});
        }
    } else {
        const double saturation = saturation_pressure_at(t);
        stretches.add({Region::vapour, lowest_pressure, saturation});
        stretches.add({Region::two_phase, saturation, saturation});
        stretches.add({Region::liquid, saturation, highest_pressure});
    }
    return stretches;
}

Properties properties(Region region, double t, double p, Side side) {
    switch (region) {
    case Region::liquid:
        return region_1(t, p);
    case Region::vapour:
        return region_2(t, p);
    case Region::hot:
        return region_5(t, p);
    case Region::dense:
    case Region::two_phase:
        break;
    }
    Properties at = region_3(density_3(t, p, side), t);
    at.p = p;
    return at;
}

double value(Quantity quantity, Properties const& at) {
    return quantity == Quantity::enthalpy ? at.h : quantity == Quantity::entropy ? at.s : at.v;
}

/// By temperature at constant pressure.
double slope(Quantity quantity, Properties const& at) {
    return quantity == Quantity::enthalpy  ? at.heat_capacity
           : quantity == Quantity::entropy ? at.heat_capacity / at.t
                                           : at.expansion;
}

/// By the logarithm of pressure at constant temperature; of entropy by Maxwell's relation.
double slope_by_ln_p(Quantity quantity, Properties const& at) {
    return at.p * (quantity == Quantity::entropy ? -at.expansion : at.compression);
}

Found of_phase(Region region, Properties const& at) {
    return {region, at.t, at.p, at.v, at.h, at.s};
}

Found mixed(SaturatedPair const& pair, double x) {
    Properties const &a = pair.liquid, &b = pair.vapour;
    const auto between = [x](double liquid, double vapour) {
        return liquid + x * (vapour - liquid);
    };
    return {Region::two_phase, a.t, a.p, between(a.v, b.v), between(a.h, b.h),
            between(a.s, b.s), x};
}

Found mixed_to(Quantity quantity, double target, SaturatedPair const& pair) {
    const double liquid = value(quantity, pair.liquid), vapour = value(quantity, pair.vapour);
    if (vapour == liquid) return mixed(pair, 0);
    return mixed(pair, std::clamp((target - liquid) / (vapour - liquid), 0.0, 1.0));
}

[[noreturn]] void refuse_outside(Quantity quantity, double target, double low, double high,
                                 std::string const& where) {
    constexpr const char* names[] = {"an enthalpy", "an entropy", "a volume"};
    constexpr const char* units[] = {" J/kg", " J/(kg·K)", " m³/kg"};
    const auto at = static_cast<std::size_t>(quantity);
    refuse_impossible(written(target) + units[at],
                      std::string(names[at]) + " from " + written(std::min(low, high)) + " to " +
                          written(std::max(low, high)) + units[at] + where +
                          ", the range of the formulation",
                      "check both quantities and their units");
}

double start_on_isobar(Stretch const& stretch, double p, Quantity quantity, double target) {
    if (quantity == Quantity::volume) return (stretch.low + stretch.high) / 2;
    const bool by_enthalpy = quantity == Quantity::enthalpy;
    switch (stretch.region) {
    case Region::liquid:
        return by_enthalpy ? backward::temperature_1_ph(p, target)
                           : backward::temperature_1_ps(p, target);
    case Region::vapour:
        return by_enthalpy ? backward::temperature_2_ph(p, target)
                           : backward::temperature_2_ps(p, target);
    case Region::dense:
        return by_enthalpy ? backward::temperature_3_ph(p, target)
                           : backward::temperature_3_ps(p, target);
    case Region::hot:
    case Region::two_phase:
        break;
    }
    return (stretch.low + stretch.high) / 2;
}

Found within_isobar(Stretch const& stretch, double p, Quantity quantity, double target) {
    const auto miss = [&](double t) {
        const Properties at = properties(stretch.region, t, p, stretch.side);
        return ValueAndSlope{value(quantity, at) - target, slope(quantity, at)};
    };
    const double t = solve(miss, Goes::up, stretch.low, stretch.high,
                           start_on_isobar(stretch, p, quantity, target));
    return of_phase(stretch.region, properties(stretch.region, t, p, stretch.side));
}

Found within_isotherm(Stretch const& stretch, double t, Quantity quantity, double target) {
    const auto miss = [&](double ln_p) {
        const Properties at = properties(stretch.region, t, std::exp(ln_p), stretch.side);
        return ValueAndSlope{value(quantity, at) - target, slope_by_ln_p(quantity, at)};
    };
    const double low = std::log(stretch.low), high = std::log(stretch.high);
    const double p = std::exp(solve(miss, Goes::down, low, high, (low + high) / 2));
    return of_phase(stretch.region, properties(stretch.region, t, p, stretch.side));
}

/// Where the expansion of cold water changes its sign between two ends, by halves.
template<class Expansion>
double turning(double negative, double positive, Expansion expansion) {
    for (int step = 0; step < 60; ++step) {
        const double middle = (negative + positive) / 2;
        (expansion(middle) < 0 ? negative : positive) = middle;
    }
    return positive;
}

[[noreturn]] void refuse_two(std::string given) {
    refuse_unfit(std::move(given) + ", which cold water has in two states, below and above its "
                                    "greatest density",
                 "a pair that fixes one state", "give temperature and pressure");
}

/// Volume of water has a least value near 277 K; from there on it rises with temperature. Gives the part
/// of the stretch on which it does.
Stretch rising_volume(Stretch stretch, double p, double target) {
    const auto expansion = [&](double t) { return region_1(t, p).expansion; };
    if (!(expansion(stretch.low) < 0)) return stretch;
    const double coldest = region_1(stretch.low, p).v;
    stretch.low = turning(stretch.low, std::min(stretch.high, 283.15), expansion);
    if (target >= region_1(stretch.low, p).v && target <= coldest)
        refuse_two("v = " + written(target) + " m³/kg");
    return stretch;
}

/// Entropy of water below 277 K first rises with pressure. Gives the part of the stretch on which it falls.
Stretch falling_entropy(Stretch stretch, double t, double target) {
    const auto expansion = [&](double p) { return region_1(t, p).expansion; };
    if (!(expansion(stretch.low) < 0)) return stretch;
    const double saturated = region_1(t, stretch.low).s;
    stretch.low = turning(stretch.low, stretch.high, expansion);
    if (target >= saturated && target <= region_1(t, stretch.low).s)
        refuse_two("s = " + written(target) + " J/(kg·K)");
    return stretch;
}

double tolerance(double value) { return end_tolerance * std::abs(value) + 1e-9; }

/// A quantity alone; entropy is had faster than with all else.
double value_at(Quantity quantity, Stretch const& stretch, double t, double p) {
    if (quantity == Quantity::entropy) {
        if (stretch.region == Region::liquid) return entropy_1(t, p);
        if (stretch.region == Region::vapour) return entropy_2(t, p);
        if (stretch.region == Region::hot) return entropy_5(t, p);
    }
    return value(quantity, properties(stretch.region, t, p, stretch.side));
}

/// Values of a quantity at both ends of a stretch, rising with temperature or falling with pressure.
struct Ends {
    double low, high;
};

Ends ends_on_isobar(Stretch const& stretch, double p, Quantity quantity) {
    if (stretch.region == Region::two_phase) {
        const SaturatedPair pair = saturated_pair(stretch.low, p);
        return {value(quantity, pair.liquid), value(quantity, pair.vapour)};
    }
    const auto at = [&](double t) { return value_at(quantity, stretch, t, p); };
    return {at(stretch.low), at(stretch.high)};
}

Ends ends_on_isotherm(Stretch const& stretch, double t, Quantity quantity) {
    if (stretch.region == Region::two_phase) {
        const SaturatedPair pair = saturated_pair(t, stretch.low);
        return {value(quantity, pair.vapour), value(quantity, pair.liquid)};
    }
    const auto at = [&](double p) { return value_at(quantity, stretch, t, p); };
    return {at(stretch.low), at(stretch.high)};
}

Found on_isobar_from(double lowest, double p, Quantity quantity, double target) {
    const Stretches stretches = isobar(p, lowest);
    double least = 0;
    for (Stretch stretch : stretches) {
        if (quantity == Quantity::volume && stretch.region == Region::liquid)
            stretch = rising_volume(stretch, p, target);
        const Ends ends = ends_on_isobar(stretch, p, quantity);
        const bool first = stretch.region == stretches.begin()->region;
        const bool last = stretch.high == stretches.back().high;
        if (first) least = ends.low;
        if (first && target < ends.low - tolerance(ends.low)) break;
        if (target > ends.high + (last ? tolerance(ends.high) : 0)) continue;
        // Between two regions, which meet within the release's tolerance, the end of one is taken.
        const double inside = std::clamp(target, ends.low, ends.high);
        if (stretch.region == Region::two_phase)
            return mixed_to(quantity, inside, saturated_pair(stretch.low, p));
        return within_isobar(stretch, p, quantity, inside);
    }
    refuse_outside(quantity, target, least, ends_on_isobar(stretches.back(), p, quantity).high,
                   " at " + written(Pressure::from_value(p)));
}

/// The pressures between which an isentrope runs.
Ends pressures_of(double s) {
    const auto on = [&](double t) { return on_isotherm(t, Quantity::entropy, s).p; };
    double high = highest_pressure;
    if (s > entropy_5(highest_temperature, highest_pressure_5))
        high = on(highest_temperature);
    else if (s > entropy_2(highest_temperature_2, highest_pressure_5))
        high = highest_pressure_5;
    else if (s > entropy_2(highest_temperature_2, highest_pressure))
        high = on(highest_temperature_2);
    double low = pressure_at_lowest;
    if (s > entropy_2(lowest_temperature, lowest_pressure))
        low = lowest_pressure;
    else if (s > entropy_2(lowest_temperature, pressure_at_lowest))
        low = on(lowest_temperature);
    return {low, high};
}

} // namespace

Found at_point(Region region, double t, double p, Side side) {
    return of_phase(region, properties(region, t, p, side));
}

Found mixed(double t, double p, double dryness) { return mixed(saturated_pair(t, p), dryness); }

Found on_isobar(double p, Quantity quantity, double target) {
    return on_isobar_from(lowest_temperature, p, quantity, target);
}

Found on_isotherm(double t, Quantity quantity, double target) {
    const Stretches stretches = isotherm(t);
    if (quantity == Quantity::entropy && stretches.back().region == Region::liquid)
        static_cast<void>(falling_entropy(stretches.back(), t, target)); // wet steam has it too
    double greatest = 0;
    for (Stretch stretch : stretches) {
        if (quantity == Quantity::entropy && stretch.region == Region::liquid)
            stretch = falling_entropy(stretch, t, target);
        const Ends ends = ends_on_isotherm(stretch, t, quantity);
        const bool first = stretch.region == stretches.begin()->region;
        const bool last = stretch.high == stretches.back().high;
        if (first) greatest = ends.low;
        if (first && target > ends.low + tolerance(ends.low)) break;
        if (target < ends.high - (last ? tolerance(ends.high) : 0)) continue;
        const double inside = std::clamp(target, ends.high, ends.low);
        if (stretch.region == Region::two_phase)
            return mixed_to(quantity, inside, saturated_pair(t, stretch.low));
        return within_isotherm(stretch, t, quantity, inside);
    }
    refuse_outside(quantity, target, ends_on_isotherm(stretches.back(), t, quantity).high, greatest,
                   " at " + written(t) + " K");
}

Found on_isentrope(double s, double enthalpy) {
    const double coldest = entropy_1(lowest_temperature, highest_pressure);
    if (s < coldest - tolerance(coldest))
        refuse_outside(Quantity::entropy, s, coldest,
                       entropy_5(highest_temperature, lowest_pressure), "");
    const Ends pressures = pressures_of(s);
    const auto at = [&](double p) {
        return on_isobar_from(below_lowest_temperature, p, Quantity::entropy, s);
    };
    const double least = at(pressures.low).h, greatest = at(pressures.high).h;
    if (enthalpy < least - tolerance(least) || enthalpy > greatest + tolerance(greatest))
        refuse_outside(Quantity::enthalpy, enthalpy, least, greatest,
                       " at " + written(s) + " J/(kg·K)");
    const auto miss = [&](double ln_p) {
        const double p = std::exp(ln_p);
        const Found found = at(p);
        return ValueAndSlope{found.h - enthalpy, found.v * p}; // (∂h/∂p) at constant s is v
    };
    if (enthalpy <= least) return at(pressures.low);
    if (enthalpy >= greatest) return at(pressures.high);
    const double low = std::log(pressures.low), high = std::log(pressures.high);
    return at(std::exp(solve(miss, Goes::up, low, high, (low + high) / 2)));
}

} // namespace core::steam
