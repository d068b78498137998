// SPDX-License-Identifier: MPL-2.0
#include "core/substances/reaction.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/substances/heating.h"
#include "core/written.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>
#include <cstdint>

namespace core::substances {

namespace {

constexpr double grid = 10;
constexpr std::uintmax_t most_steps = 100;

double kelvin(Temperature t) { return absolute(t).value(); }

/// Refuses a temperature outside the range of any participant, naming the common range.
void check_range(Reaction const& reaction, Temperature t) {
    for (auto const& [substance, number] : reaction.participants) try {
            substance.rung_at(t);
        } catch (Failure const& failure) {
            refuse_impossible(written(t),
                              failure.needed + " (all of the reaction: " +
                                  written(reaction.from()) + " to " + written(reaction.to()) + ')',
                              failure.repair);
        }
}

/// Σ ν X of a molar function of each participant, told as it goes.
template<class Molar>
auto sum(Reaction const& reaction, Temperature t, char const* symbol, Molar molar,
         Notes const& notes) {
    check_range(reaction, t);
    decltype(molar(reaction.participants.front().substance)) total{};
    for (auto const& [substance, number] : reaction.participants) {
        const auto value = molar(substance);
        total += number * value;
        notes.step([&, n = number, &s = substance] {
            return s.written() + ", " + std::string(s.phase_at(t).name()) + ": " + written(n) +
                   " · " + symbol + ", " + symbol + " = " + written(value);
        });
        remark_state(substance, t, notes);
    }
    return total;
}

double standard_gibbs(Reaction const& reaction, double t) {
    double total = 0;
    for (auto const& [substance, number] : reaction.participants)
        total += number * substance.gibbs(Temperature::kelvin(t)).value();
    return total;
}

double ln_activity(Participant const& participant, Phase phase, Activity const& activity) {
    const bool gas = phase.aggregation() == Aggregation::gas;
    const std::string name = participant.substance.written();
    if (gas ? activity.number.has_value() : activity.pressure.has_value())
        refuse_unfit(name + (gas ? " with a number" : " with a pressure"),
                     gas ? "the pressure of " + name + ", a gas here"
                         : "an activity of " + name + ", a condensed phase here, as a number",
                     "leave it blank for the standard state");
    const double a = activity.pressure ? activity.pressure->value() / standard_pressure.value()
                     : activity.number ? *activity.number
                                       : 1;
    if (!(a > 0) || !std::isfinite(a))
        refuse_impossible(name + " at " + written(a), "pressures and activities above 0",
                          "check them; a blank one is the standard state");
    return std::log(a);
}

/// Temperatures to look for sign changes at: every transition, and in between steps of the grid.
std::vector<double> samples(Reaction const& reaction, double from, double to) {
    std::vector<double> at{from, to};
    for (auto const& participant : reaction.participants)
        for (Rung const& rung : participant.substance.rungs())
            if (rung.from > from && rung.from < to) at.push_back(rung.from);
    std::sort(at.begin(), at.end());
    std::vector<double> all;
    for (std::size_t i = 0; i + 1 < at.size(); ++i) {
        const int parts = static_cast<int>(std::ceil((at[i + 1] - at[i]) / grid));
        for (int part = 0; part < parts; ++part)
            all.push_back(at[i] + (at[i + 1] - at[i]) * part / parts);
    }
    all.push_back(at.back());
    return all;
}

double root_between(Reaction const& reaction, double low, double high, double at_low,
                    double at_high) {
    std::uintmax_t steps = most_steps;
    const auto bracket = boost::math::tools::toms748_solve(
        [&](double t) { return standard_gibbs(reaction, t); }, low, high, at_low, at_high,
        boost::math::tools::eps_tolerance<double>(50), steps);
    if (steps >= most_steps)
        throw Failure(Failure::Kind::unconverged, reaction.text,
                      "an iteration that converges in 100 steps", "narrow the range down");
    return (bracket.first + bracket.second) / 2;
}

std::vector<double> roots(Reaction const& reaction, double from, double to) {
    std::vector<double> found;
    const std::vector<double> at = samples(reaction, from, to);
    double before = standard_gibbs(reaction, at.front());
    if (before == 0) found.push_back(at.front());
    for (std::size_t i = 1; i < at.size(); ++i) {
        const double here = standard_gibbs(reaction, at[i]);
        if (here == 0)
            found.push_back(at[i]);
        else if (before != 0 && std::signbit(before) != std::signbit(here))
            found.push_back(root_between(reaction, at[i - 1], at[i], before, here));
        before = here;
    }
    return found;
}

std::string listed(std::vector<double> const& roots) {
    std::string text;
    for (double root : roots) text += (text.empty() ? "" : ", ") + written(root) + " K";
    return text;
}

} // namespace

Temperature Reaction::from() const {
    Temperature most = participants.front().substance.from();
    for (auto const& participant : participants)
        most = std::max(most, participant.substance.from());
    return most;
}

Temperature Reaction::to() const {
    Temperature least = participants.front().substance.to();
    for (auto const& participant : participants)
        least = std::min(least, participant.substance.to());
    return least;
}

MolarEntropy entropy_of_reaction(Reaction const& reaction, Temperature temperature,
                                 Notes const& notes) {
    for (Participant const& each : reaction.participants) {
        tell_uncertainty(each.substance, temperature, notes);
        notes.uncertainty(
            [&] { return each.number * each.substance.entropy_uncertainty(temperature).value(); });
    }
    return sum(
        reaction, temperature, "S°", [&](Substance const& s) { return s.entropy(temperature); },
        notes);
}

MolarEnergy enthalpy_of_reaction(Reaction const& reaction, Temperature temperature,
                                 Notes const& notes) {
    return sum(
        reaction, temperature, "H°", [&](Substance const& s) { return s.enthalpy(temperature); },
        notes);
}

MolarEnergy standard_gibbs_of_reaction(Reaction const& reaction, Temperature temperature,
                                       Notes const& notes) {
    return sum(
        reaction, temperature, "G°", [&](Substance const& s) { return s.gibbs(temperature); },
        notes);
}

MolarEnergy gibbs_of_reaction(Reaction const& reaction, Temperature temperature,
                              std::span<const Activity> activities, Notes const& notes) {
    const MolarEnergy standard = standard_gibbs_of_reaction(reaction, temperature, notes);
    notes.step([&] { return "ΔG° = " + written(standard); });
    if (activities.empty()) return standard;
    if (activities.size() != reaction.participants.size())
        refuse_unfit(std::to_string(activities.size()) + " activities",
                     std::to_string(reaction.participants.size()) +
                         ", one a substance in the order of the equation",
                     "leave a cell blank for the standard state");
    double sum = 0;
    for (std::size_t i = 0; i < activities.size(); ++i) {
        Participant const& p = reaction.participants[i];
        sum += p.number * ln_activity(p, p.substance.phase_at(temperature), activities[i]);
    }
    const MolarEnergy term = gas_constant * absolute(temperature) * sum;
    notes.step([&] { return "R · T · Σ ν · ln a = " + written(term); });
    return standard + term;
}

Dimensionless equilibrium_constant(Reaction const& reaction, Temperature temperature,
                                   Notes const& notes) {
    const MolarEnergy standard = standard_gibbs_of_reaction(reaction, temperature, notes);
    const double exponent = -standard / (gas_constant * absolute(temperature));
    notes.step([&] { return "ΔG° = " + written(standard); });
    notes.step([&] { return "log10 K = " + written(exponent / std::log(10.0)); });
    const double k = std::exp(exponent);
    if (!std::isnormal(k))
        refuse_impossible("log10 K = " + written(exponent / std::log(10.0)),
                          "a constant between 1e-307 and 1e308",
                          "use GIBBS.REACTION, which says the same");
    return k;
}

Temperature equilibrium_temperature(Reaction const& reaction, std::optional<Temperature> from,
                                    std::optional<Temperature> to, Notes const& notes) {
    const Temperature low = from.value_or(reaction.from()), high = to.value_or(reaction.to());
    if (!(low < high))
        refuse_impossible(written(low) + " to " + written(high),
                          "a range of temperature that all substances share, from low to high",
                          "check the two temperatures and the states");
    check_range(reaction, low);
    check_range(reaction, high);
    const std::vector<double> found = roots(reaction, kelvin(low), kelvin(high));
    const std::string range = " between " + written(low) + " and " + written(high);
    if (found.empty())
        refuse_impossible(reaction.text,
                          "a reaction whose ΔG° passes through zero" + range + ", where it is " +
                              (standard_gibbs(reaction, kelvin(low)) < 0 ? "below zero throughout"
                                                                         : "above zero throughout"),
                          "check the states, or ask for ENTROPY and GIBBS.REACTION");
    if (found.size() > 1)
        refuse_impossible(reaction.text,
                          "one temperature of equilibrium" + range + ", where there are " +
                              listed(found),
                          "give `from` and `to` around the one meant");
    const Temperature t = Temperature::kelvin(found.front());
    notes.step([&] { return "ΔG° = 0 at " + written(t); });
    for (auto const& participant : reaction.participants)
        remark_state(participant.substance, t, notes);
    return t;
}

} // namespace core::substances
