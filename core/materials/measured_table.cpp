// SPDX-License-Identifier: MPL-2.0
#include "core/materials/measured_table.h"

#include <cmath>
#include <string>
#include <vector>

namespace core::materials {

namespace {

constexpr std::size_t most_rows = 10'000;

using Values = std::span<const double>;

std::string row(std::size_t i) { return "row " + std::to_string(i + 1); }

void check_count(Values t, Values cp) {
    if (t.size() != cp.size())
        refuse_unfit(std::to_string(t.size()) + " temperatures and " + std::to_string(cp.size()) +
                         " heat capacities",
                     "a heat capacity for every temperature", "select whole rows");
    if (t.size() < 2)
        refuse_unfit(std::to_string(t.size()) + " rows", "a measured table of at least two rows",
                     "give the heat capacity itself where it does not vary");
    if (t.size() > most_rows)
        refuse_unfit(std::to_string(t.size()) + " rows",
                     "a measured table of no more than 10000 rows", "leave rows out");
}

void check_row(double t, double cp, std::size_t i) {
    if (std::isnan(t) || std::isnan(cp))
        refuse_unfit("a blank cell in " + row(i), "a temperature and a heat capacity in every row",
                     "fill the gap, or leave the row out");
    if (!(t > 0) || std::isinf(t))
        refuse_impossible(written(t) + " K in " + row(i), "a temperature above 0 K",
                          "check the sign and the unit of the temperature");
    if (!(cp > 0) || std::isinf(cp))
        refuse_impossible("a heat capacity of " + written(cp) + " in " + row(i),
                          "heat capacities above 0", "check the sign and the measurement");
}

void check_rise(Values t, std::size_t i) {
    if (is_above(t[i - 1], t[i]))
        refuse_unfit(written(t[i - 1]) + " K, then " + written(t[i]) + " K in " + row(i),
                     "temperatures that rise from row to row", "sort the rows");
    if (i >= 2 && is_same(t[i - 2], t[i]))
        refuse_unfit("a third row at " + written(t[i]) + " K",
                     "at most two rows at one temperature, which state a jump",
                     "leave one of them out");
}

void check(Values t, Values cp) {
    check_count(t, cp);
    for (std::size_t i = 0; i < t.size(); ++i) check_row(t[i], cp[i], i);
    for (std::size_t i = 1; i < t.size(); ++i) check_rise(t, i);
}

/// The first row behind `first` that begins another curve, or the number of rows.
std::size_t end_of_curve(Values t, std::size_t first) {
    std::size_t end = first + 1;
    while (end < t.size() && !is_same(t[end - 1], t[end])) ++end;
    if (end - first < 2)
        refuse_unfit("a jump at " + written(t[first]) + " K",
                     "at least two rows on either side of a jump, one of them at it",
                     "add a row, or leave one of the two out");
    return end;
}

struct Chord {
    double width, slope;
};

bool rise_alike(double a, double b) { return (a > 0 && b > 0) || (a < 0 && b < 0); }

/// The harmonic mean, weighted so that the longer chord counts less, or zero at a turn.
double inner_slope(Chord a, Chord b) {
    if (!rise_alike(a.slope, b.slope)) return 0;
    const double share = (a.width + 2 * b.width) / (3 * (a.width + b.width));
    return 1 / (share / a.slope + (1 - share) / b.slope);
}

/// The slope at the outer end of `a` of the parabola through three rows, kept to where the cubic
/// stays between the rows.
double end_slope(Chord a, Chord b) {
    const double slope = a.slope + a.width * (a.slope - b.slope) / (a.width + b.width);
    if (!rise_alike(slope, a.slope)) return 0;
    const bool turns = !rise_alike(a.slope, b.slope);
    return turns && std::abs(slope) > 3 * std::abs(a.slope) ? 3 * a.slope : slope;
}

std::vector<Chord> chords(Values t, Values cp) {
    std::vector<Chord> all;
    for (std::size_t i = 1; i < t.size(); ++i)
        all.push_back({t[i] - t[i - 1], (cp[i] - cp[i - 1]) / (t[i] - t[i - 1])});
    return all;
}

double slope_at(std::vector<Chord> const& all, std::size_t i) {
    const std::size_t last = all.size() - 1;
    if (last == 0) return all[0].slope;
    if (i == 0) return end_slope(all[0], all[1]);
    if (i > last) return end_slope(all[last], all[last - 1]);
    return inner_slope(all[i - 1], all[i]);
}

/// Inside the two ends, which rounding of the slopes could leave by an ulp.
double between(double value, double a, double b) {
    return std::clamp(value, std::min(a, b), std::max(a, b));
}

void add_curve(Stretches<CubicPiece>& curve, Values t, Values cp) {
    const std::vector<Chord> all = chords(t, cp);
    for (std::size_t i = 0; i < all.size(); ++i) {
        const double third = all[i].width / 3, a = cp[i], b = cp[i + 1];
        const CubicPiece::Ordinates ordinates{a, between(a + third * slope_at(all, i), a, b),
                                              between(b - third * slope_at(all, i + 1), a, b), b};
        // A jump's second row may differ from its first by rounding; the curve goes on from there.
        const double from = curve.size() > 0 ? curve.to() : t[i];
        curve.add(CubicPiece(from, t[i + 1], ordinates), 0);
    }
}

} // namespace

Stretches<CubicPiece> measured_table(Values temperatures, Values heat_capacities) {
    check(temperatures, heat_capacities);
    Stretches<CubicPiece> curve;
    for (std::size_t first = 0, end; first < temperatures.size(); first = end) {
        end = end_of_curve(temperatures, first);
        add_curve(curve, temperatures.subspan(first, end - first),
                  heat_capacities.subspan(first, end - first));
    }
    const Change whole = curve.heating(curve.from(), curve.to());
    if (!std::isfinite(whole.enthalpy) || !std::isfinite(whole.entropy))
        refuse_impossible("", "heat capacities whose sum can be written as a number",
                          "check the units of the table");
    return curve;
}

} // namespace core::materials
