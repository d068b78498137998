// SPDX-License-Identifier: MPL-2.0
#include "core/substances/material.h"

#include "core/ratio.h"
#include "core/substances/heating.h"

namespace core::substances {

namespace {

/// The rungs without a gap around one of them.
std::span<const Rung> without_gaps(std::span<const Rung> all, std::size_t around) {
    std::size_t first = around, last = around;
    while (first > 0 && !all[first].gap) --first;
    while (last + 1 < all.size() && !all[last + 1].gap) ++last;
    return all.subspan(first, last - first + 1);
}

} // namespace

SubstanceMaterial::SubstanceMaterial(Substance const& substance, Temperature around)
    : substance_(substance), rungs_(without_gaps(substance.rungs(), substance.rung_at(around))) {}

double SubstanceMaterial::from() const { return rungs_.front().from; }
double SubstanceMaterial::to() const { return rungs_.back().to; }

Material::Change SubstanceMaterial::heating(double from, double to) const {
    const Temperature low = Temperature::kelvin(from), high = Temperature::kelvin(to);
    return {enthalpy_of_heating(substance_, low, high).value(),
            entropy_of_heating(substance_, low, high).value()};
}

Material::Change SubstanceMaterial::transition(double at) const {
    Change sum;
    for (std::size_t i = 1; i < rungs_.size(); ++i)
        if (rungs_[i].from == at && rungs_[i].phase != rungs_[i - 1].phase) {
            sum.enthalpy += rungs_[i].enthalpy_jump;
            sum.entropy += rungs_[i].entropy_jump;
        }
    return sum;
}

std::vector<double> SubstanceMaterial::breakpoints() const {
    std::vector<double> all;
    for (Rung const& rung : rungs_.subspan(1)) all.push_back(rung.from);
    return all;
}

Material::Change ConstantMaterial::heating(double from, double to) const {
    return {heat_capacity_ * (to - from), heat_capacity_ * ln_ratio(to, from)};
}

} // namespace core::substances
