// SPDX-License-Identifier: MPL-2.0
#include "core/substances/end_states.h"

#include "core/failure.h"
#include "core/sum.h"
#include "core/text/characters.h"
#include "core/written.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>
#include <cstdint>
#include <limits>
#include <string>
#include <vector>

namespace core::substances {

namespace {

constexpr std::uintmax_t most_steps = 100;

double kelvin(Temperature t) { return absolute(t).value(); }

Material::Change scaled(Material::Change change, double amount) {
    return {amount * change.enthalpy, amount * change.entropy};
}

/// Σ over the bodies of what heating each to a temperature takes up.
Material::Change heating(std::span<const Body> bodies, double t) {
    Sum enthalpy, entropy;
    for (Body const& body : bodies) {
        const auto part = scaled(body.material->heating(kelvin(body.temperature), t), body.amount);
        enthalpy.add(part.enthalpy);
        entropy.add(part.entropy);
    }
    return {enthalpy.value(), entropy.value()};
}

Material::Change transition(std::span<const Body> bodies, double t) {
    Material::Change sum;
    for (Body const& body : bodies) {
        const auto part = scaled(body.material->transition(t), body.amount);
        sum.enthalpy += part.enthalpy;
        sum.entropy += part.entropy;
    }
    return sum;
}

/// The range all materials share, its ends and every breakpoint inside, from low to high.
std::vector<double> nodes(std::span<const Body> bodies) {
    double low = 0, high = std::numeric_limits<double>::infinity();
    for (Body const& body : bodies) {
        low = std::max(low, body.material->from());
        high = std::min(high, body.material->to());
    }
    std::vector<double> all{low, high};
    for (Body const& body : bodies)
        for (double t : body.material->breakpoints())
            if (t > low && t < high) all.push_back(t);
    std::sort(all.begin(), all.end());
    all.erase(std::unique(all.begin(), all.end()), all.end());
    if (low >= high)
        refuse_impossible("", "materials whose tables share a range of temperature",
                          "check the materials and their states");
    return all;
}

[[noreturn]] void refuse_end(bool above, double limit) {
    refuse_impossible(above ? "an end above " + written(limit) + " K"
                            : "an end below " + written(limit) + " K",
                      "an end where all materials are tabulated",
                      "check the heat and the amounts; nothing is extrapolated");
}

double root(std::span<const Body> bodies, double heat, double low, double high) {
    const auto missing = [&](double t) { return heating(bodies, t).enthalpy - heat; };
    const double at_low = missing(low), at_high = missing(high);
    // Not below zero where the heat falls into the step of a joint, 1e-3 J/mol.
    if (at_low >= 0) return low;
    if (at_high <= 0) return high;
    std::uintmax_t steps = most_steps;
    const auto bracket = boost::math::tools::toms748_solve(
        missing, low, high, at_low, at_high, boost::math::tools::eps_tolerance<double>(50), steps);
    if (steps >= most_steps)
        throw Failure(Failure::Kind::unconverged, "", "an iteration that converges in 100 steps",
                      "check the materials");
    return (bracket.first + bracket.second) / 2;
}

/// The first node whose low side takes up the heat or more.
std::size_t node_at_or_above(std::vector<double> const& at, std::span<const Body> bodies,
                             double heat) {
    const auto found = std::partition_point(
        at.begin(), at.end(), [&](double t) { return heating(bodies, t).enthalpy < heat; });
    return static_cast<std::size_t>(found - at.begin());
}

bool agrees(double a, double b) {
    return std::abs(a - b) <= 1e-12 * std::max(std::abs(a), std::abs(b));
}

/// Heat that ends beyond the last node by rounding alone ends at it.
EndState at_end(std::span<const Body> bodies, double heat, double limit, bool above) {
    if (!agrees(heating(bodies, limit).enthalpy, heat)) refuse_end(above, limit);
    return {Temperature::kelvin(limit), 0};
}

void check(std::span<const Body> bodies) {
    if (bodies.empty()) refuse_unfit("", "at least one body", "give a material");
    for (Body const& body : bodies)
        if (!(body.amount > 0) || !std::isfinite(body.amount))
            refuse_impossible(body.material->written() + ": " + written(body.amount),
                              "amounts above 0", "check the amounts");
}

EndState closed_in(std::span<const Body> bodies, double heat, double low, double high) {
    // What is missing may lie in the transition at the lower node.
    const double lacking = heat - heating(bodies, low).enthalpy;
    const double latent = transition(bodies, low).enthalpy;
    if (lacking <= latent)
        return {Temperature::kelvin(low), latent > 0 ? std::clamp(lacking / latent, 0.0, 1.0) : 0};
    // Just above the node the transition is made; the low side of it would lie on the wrong side.
    return {Temperature::kelvin(root(bodies, heat, std::nextafter(low, high), high)), 0};
}

} // namespace

EndState end_of_heating(std::span<const Body> bodies, double heat) {
    check(bodies);
    const std::vector<double> at = nodes(bodies);
    const std::size_t node = node_at_or_above(at, bodies, heat);
    if (node == at.size()) return at_end(bodies, heat, at.back(), true);
    if (heating(bodies, at[node]).enthalpy == heat) return {Temperature::kelvin(at[node]), 0};
    if (node == 0) return at_end(bodies, heat, at.front(), false);
    return closed_in(bodies, heat, at[node - 1], at[node]);
}

namespace {

/// Both phases at a transition, or one phase twice.
struct Shares {
    Phase below, above;
    EndState end;

    double of(Phase phase) const {
        return (phase == below ? 1 - end.share : 0) + (phase == above ? end.share : 0);
    }
};

Shares shares(Substance const& substance, Temperature from, MolarEnergy heat) {
    const SubstanceMaterial material(substance, from);
    const Body body{&material, 1, from};
    const EndState end = end_of_heating({&body, 1}, heat.value());
    const auto rungs = substance.rungs();
    const std::size_t low = substance.rung_at(end.temperature);
    std::size_t high = low;
    if (end.share > 0)
        while (high + 1 < rungs.size() && rungs[high + 1].from == kelvin(end.temperature)) ++high;
    return {phase_of(rungs[low]), phase_of(rungs[high]), end};
}

void tell(Shares const& s, Notes const& notes) {
    notes.step([&] {
        return "T = " + written(s.end.temperature) + ", " + std::string(s.below.name()) + ": " +
               written(s.of(s.below)) +
               (s.above == s.below
                    ? ""
                    : ", " + std::string(s.above.name()) + ": " + written(s.of(s.above)));
    });
}

bool is_of(Phase phase, std::string_view wanted) {
    return phase.name() == wanted ||
           (wanted == "cr" && phase.aggregation() == Aggregation::crystal);
}

void check_phase(Substance const& substance, std::string_view wanted) {
    std::string names;
    for (PhaseRow const& row : substance.phases()) {
        if (is_of(Phase(row), wanted)) return;
        const std::string name = '`' + std::string(row.name) + '`';
        if (names.find(name) == std::string::npos) names += (names.empty() ? "" : ", ") + name;
    }
    refuse_unfit(text::shown(wanted), "a phase of " + substance.written() + ": " + names,
                 "write one of them, or `cr` for all crystals");
}

} // namespace

Temperature temperature_heated(Substance const& substance, Temperature from, MolarEnergy heat,
                               Notes const& notes) {
    const Shares s = shares(substance, from, heat);
    tell(s, notes);
    return s.end.temperature;
}

Dimensionless fraction_of_phase(Substance const& substance, Temperature from, MolarEnergy heat,
                                std::string_view phase, Notes const& notes) {
    check_phase(substance, phase);
    const Shares s = shares(substance, from, heat);
    tell(s, notes);
    double fraction = is_of(s.below, phase) ? 1 - s.end.share : 0;
    if (is_of(s.above, phase)) fraction += s.end.share;
    return fraction;
}

Temperature temperature_equalized(std::span<const Body> bodies, Notes const& notes) {
    const EndState end = end_of_heating(bodies, 0);
    if (end.share > 0)
        notes.remark([&] {
            return "ends in a transition at " + written(end.temperature) + ", of which the share " +
                   written(end.share) + " is made";
        });
    for (Body const& body : bodies)
        notes.step([&] {
            return body.material->written() + " from " + written(body.temperature) + ": ΔH = " +
                   written(Energy::from_value(
                       body.amount *
                       (body.material->heating(kelvin(body.temperature), kelvin(end.temperature))
                            .enthalpy +
                        end.share * body.material->transition(kelvin(end.temperature)).enthalpy)));
        });
    return end.temperature;
}

Entropy entropy_of_equalizing(std::span<const Body> bodies, Notes const& notes) {
    const EndState end = end_of_heating(bodies, 0);
    const double t = kelvin(end.temperature);
    notes.step([&] { return "end: " + written(end.temperature); });
    Sum sum;
    for (Body const& body : bodies) {
        const double part =
            body.amount * (body.material->heating(kelvin(body.temperature), t).entropy +
                           end.share * body.material->transition(t).entropy);
        sum.add(part);
        notes.step([&] {
            return body.material->written() + " from " + written(body.temperature) +
                   ": ΔS = " + written(Entropy::from_value(part));
        });
    }
    return Entropy::from_value(sum.value());
}

} // namespace core::substances
