// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/materials/material_text.h"
#include "core/substances/gas.h"
#include "core/substances/heating.h"
#include "core/substances/reaction.h"
#include "core/substances/substance.h"

#include <cmath>
#include <cstddef>
#include <cstdint>
#include <string_view>

// Any bytes in the place of a substance, a gas, a reaction or a material: they are read or refused
// with a reason; what is read can be heated and cooled back to where it began.

namespace {

using namespace core;
using namespace core::substances;

void require(bool condition) {
    if (!condition) __builtin_trap();
}

void check(Failure const& failure) {
    require(!failure.needed.empty() && !failure.repair.empty());
}

/// A temperature between the ends of a range, from one byte.
Temperature between(Temperature from, Temperature to, std::uint8_t byte) {
    const double share = byte / 255.0;
    return Temperature::kelvin(absolute(from).value() * (1 - share) + absolute(to).value() * share);
}

void substance(std::string_view text, std::uint8_t a, std::uint8_t b) try {
    const Substance s = find_substance(text);
    const Temperature from = between(s.from(), s.to(), a), to = between(s.from(), s.to(), b);
    const double there = entropy_of_heating(s, from, to).value();
    require(std::isfinite(there) && there + entropy_of_heating(s, to, from).value() == 0);
    require(std::isfinite(enthalpy_of_heating(s, from, to).value()));
} catch (Failure const& failure) {
    check(failure);
}

void gas(std::string_view text, std::uint8_t a, std::uint8_t b) try {
    const Gas g = read_gas(text);
    if (g.from() > g.to()) return;
    const Temperature from = between(g.from(), g.to(), a), to = between(g.from(), g.to(), b);
    require(std::isfinite(g.entropy_between(from, to).value()));
    require(g.molar_mass().value() > 0);
} catch (Failure const& failure) {
    check(failure);
}

void reaction(std::string_view text, std::uint8_t a) try {
    const Reaction r = read_reaction(text);
    require(r.participants.size() >= 2);
    if (r.from() > r.to()) return;
    require(std::isfinite(entropy_of_reaction(r, between(r.from(), r.to(), a)).value()));
} catch (Failure const& failure) {
    check(failure);
}

void material(std::string_view text, std::uint8_t a, std::uint8_t b) try {
    const materials::OwnMaterial m = materials::read_material(text);
    const auto at = [&](std::uint8_t byte) {
        return m.from() + (m.to() - m.from()) * (byte / 255.0);
    };
    const auto there = m.heating(at(a), at(b)), back = m.heating(at(b), at(a));
    require(there.entropy + back.entropy == 0 && there.enthalpy + back.enthalpy == 0);
} catch (Failure const& failure) {
    check(failure);
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    if (size < 2) return 0;
    const std::string_view text(reinterpret_cast<const char*>(data) + 2, size - 2);
    substance(text, data[0], data[1]);
    gas(text, data[0], data[1]);
    reaction(text, data[0]);
    material(text, data[0], data[1]);
    material("material " + std::string(text), data[0], data[1]);
    return 0;
}
