// SPDX-License-Identifier: MPL-2.0
#include "registration/molar_mass.h"

#include "core/steam/state.h"
#include "core/substances/formula.h"
#include "core/substances/substance.h"
#include "registration/gas_argument.h"
#include "registration/own_material.h"

#include <optional>

namespace registration {

namespace {

/// Of an own material; what is wrong with one that cannot be read is told where it is used.
std::optional<core::MolarMass> stated_molar_mass(Given const& given) {
    try {
        return read_own_material(given, core::silent)->molar_mass();
    } catch (core::Failure const&) {
        return std::nullopt;
    }
}

} // namespace

bool tells_molar_mass(Given const& given) {
    for (std::size_t row = 0; row < given.cell_count() && row < 3; ++row) {
        Cell const& cell = given.cell(row);
        if (cell.kind == Cell::Kind::number) return true;
        if (cell.kind == Cell::Kind::text && cell.text[0] >= '0' && cell.text[0] <= '9')
            return true;
    }
    return false;
}

bool knows_molar_mass(Need const& need, Given const& given) {
    switch (need.kind) {
    case Need::Kind::named:
    case Need::Kind::substance:
    case Need::Kind::gas:
    case Need::Kind::fluid:
    case Need::Kind::constant_gas:
    case Need::Kind::steam:
    case Need::Kind::steam_word:
        return true;
    case Need::Kind::material:
        return stated_molar_mass(given).has_value();
    default:
        return false;
    }
}

namespace {

/// A formula, or else a name of the tables. What is neither is told as a formula; `steam` as what it is.
double of_named(std::string_view text) {
    if (text == "steam") return core::substances::find_substance(text).molar_mass().value();
    try {
        return core::substances::molar_mass(text).value();
    } catch (core::Failure const&) {
        try {
            return core::substances::find_substance(text).molar_mass().value();
        } catch (core::Failure const&) {
        }
        throw;
    }
}

} // namespace

double molar_mass_of(Need::Kind kind, Given const& given, std::size_t row) {
    if (kind == Need::Kind::gas)
        return read_gas_argument(given, row, core::silent).molar_mass().value();
    if (kind == Need::Kind::fluid)
        return read_fluid_argument(given, row, core::silent).molar_mass().value();
    if (kind == Need::Kind::constant_gas)
        return read_constant_gas(given, row, core::silent).gas.molar_mass().value();
    if (kind == Need::Kind::steam || kind == Need::Kind::steam_word)
        return core::steam::molar_mass.value();
    if (kind == Need::Kind::material) return stated_molar_mass(given).value().value();
    const std::string_view text = given.cell(row).text;
    if (kind == Need::Kind::substance)
        return core::substances::find_substance(text).molar_mass().value();
    if (tells_molar_mass(given)) return given.si()[given.numbers().listed ? row : 0];
    return of_named(text);
}

} // namespace registration
