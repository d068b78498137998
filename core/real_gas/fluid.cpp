// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/fluid.h"

#include "core/failure.h"
#include "core/text/characters.h"
#include "core/written.h"

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
    return std::string(parts_.front().critical.name);
}

MolarMass Fluid::molar_mass() const {
    if (ideal_) return ideal_->molar_mass();
    return MolarMass::from_value(parts_.front().critical.molar_mass);
}

substances::Gas const& Fluid::ideal_gas() const {
    if (ideal_) return *ideal_;
    refuse_unfit(
        written(), "a fluid whose heat capacity as an ideal gas is tabulated",
        "use ENTROPY.DEPARTURE and ENTHALPY.DEPARTURE, and add the ideal part of your own");
}

Fluid read_fluid(std::string_view text, Notes const& notes) {
    try {
        return Fluid(substances::read_gas(text, notes));
    } catch (Failure const&) {
        if (CriticalPoint const* found = find_critical_point(text)) return Fluid(*found);
        throw;
    }
}

} // namespace core::real_gas
