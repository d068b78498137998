// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/fluid.h"

#include "core/failure.h"
#include "core/substances/stoichiometric_text.h"
#include "core/written.h"

#include <cmath>

namespace core::real_gas {
namespace {

CriticalPoint const& critical_of(substances::Substance const& substance) {
    if (!substance.name().empty())
        if (CriticalPoint const* found = find_critical_point(substance.name())) return *found;
    if (CriticalPoint const* found = find_critical_point(substance.formula())) return *found;
    refuse_unfit(substance.written(), "a fluid whose critical constants the project has",
                 "use the ideal-gas functions, which need none");
}

} // namespace

Fluid::Fluid(substances::Gas gas) {
    for (auto const& [substance, fraction] : gas.components())
        parts_.push_back({critical_of(substance), fraction});
    ideal_ = std::move(gas);
}

std::string Fluid::written() const {
    if (ideal_) return ideal_->written();
    std::string text;
    for (auto const& [critical, x] : parts_)
        text += (text.empty() ? "" : " + ") + (parts_.size() > 1 ? core::written(x) + ' ' : "") +
                std::string(critical.name);
    return text;
}

MolarMass Fluid::molar_mass() const {
    if (ideal_) return ideal_->molar_mass();
    double mass = 0;
    for (auto const& [critical, x] : parts_) mass += x * critical.molar_mass;
    return MolarMass::from_value(mass);
}

substances::Gas const& Fluid::ideal_gas() const {
    if (ideal_) return *ideal_;
    refuse_unfit(
        written(), "a fluid whose heat capacity as an ideal gas is tabulated",
        "use ENTROPY.DEPARTURE and ENTHALPY.DEPARTURE, and add the ideal part of your own");
}

Fluid read_fluid(std::string_view text) {
    std::optional<Failure> reason;
    try {
        return Fluid(substances::read_gas(text));
    } catch (Failure& failure) {
        reason = std::move(failure);
    }
    std::vector<Part> parts;
    double sum = 0;
    for (substances::Term const& term : substances::read_terms(text, text)) {
        CriticalPoint const* found = find_critical_point(term.substance);
        if (!found) throw Failure(*reason);
        parts.push_back({*found, term.coefficient});
        sum += term.coefficient;
    }
    if (!(std::abs(sum - 1) <= 1e-6)) throw Failure(*reason);
    return Fluid(std::move(parts));
}

} // namespace core::real_gas
