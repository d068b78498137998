// SPDX-License-Identifier: MPL-2.0
#include "registration/need.h"

#include "core/quantities.h"
#include "core/text/quantity.h"
#include "registration/gas_argument.h"
#include "registration/molar_mass.h"
#include "registration/own_material.h"

#include <cctype>

namespace registration {
namespace {

using core::Failure;

bool fits_reading(Reading need, Reading given) {
    return given == need || (given == Reading::plain && need != Reading::gauge);
}

/// Numbers without a unit are mole fractions where mole fractions are asked for; mass fractions
/// must say so.
bool fits_share(Share need, Share given) {
    return given == need || (need == Share::mole && given == Share::none);
}

bool is_filled_text(Given const& given) {
    for (std::size_t row = 0; row < given.cell_count(); ++row)
        if (given.cell(row).kind != Cell::Kind::blank)
            return given.cell(row).kind == Cell::Kind::text;
    return false;
}

/// Substances are told from quantities by how they begin: no number stands in front.
bool begins_with_letter(Given const& given) {
    if (!is_filled_text(given) || means_own_material(given)) return false;
    for (std::size_t row = 0; row < given.cell_count(); ++row)
        if (const std::string_view text = given.cell(row).text; !text.empty())
            return std::isalpha(static_cast<unsigned char>(text[0])) || text[0] == '[' ||
                   text[0] == '(' || (text[0] & '\x80');
    return false;
}

/// A mixture begins with a number as a quantity does, and then adds; or it is a block.
bool is_mixture(Given const& given) {
    if (means_mixture(given)) return true;
    return is_filled_text(given) && given.cell(0).text.find(" + ") != std::string_view::npos;
}

bool states_heat_capacity(Given const& given) {
    for (std::size_t row = 0; row < given.cell_count(); ++row)
        if (const Cell& cell = given.cell(row); cell.kind != Cell::Kind::blank)
            return cell.kind == Cell::Kind::text && means_constant_gas(cell.text);
    return false;
}

/// One that cannot be read is taken at its word, so that its own reason is told.
bool is_constant_gas(core::Dimension heat_capacity, Given const& given) {
    if (!states_heat_capacity(given)) return false;
    if (heat_capacity == core::Dimension{}) return true;
    std::size_t row = 0;
    while (given.cell(row).kind == Cell::Kind::blank) ++row;
    try {
        return read_constant_gas(given, row, core::silent).stated == heat_capacity;
    } catch (Failure const&) {
        return true;
    }
}

/// One that cannot be read is taken at its word, so that its own reason is told.
bool is_material_on(core::Dimension heat_capacity, Given const& given) {
    if (!means_own_material(given)) return false;
    if (heat_capacity == core::Dimension{}) return true;
    try {
        switch (read_own_material(given, core::silent)->basis()) {
        case core::materials::Basis::molar:
            return heat_capacity == core::dimension<core::MolarHeatCapacity>;
        case core::materials::Basis::specific:
            return heat_capacity == core::dimension<core::SpecificHeatCapacity>;
        case core::materials::Basis::total:
            return heat_capacity == core::dimension<core::HeatCapacity>;
        }
    } catch (Failure const&) {
    }
    return true;
}

/// Whether any row is one.
bool has_numbers(Given const& given) {
    Numbers const* numbers = given.if_numbers();
    return numbers && numbers->faults.size() + numbers->blanks.size() < numbers->count();
}

/// Words are told by their first letter; what is wrong with them is told by who reads them.
bool is_coordinate_of_steam(Given const& given) {
    if (has_numbers(given)) return is_coordinate(given.numbers());
    return begins_with_letter(given);
}

bool is_table(Given const& given) {
    bool any = false;
    for (std::size_t row = 0; row < given.cell_count(); ++row) {
        if (given.cell(row).kind == Cell::Kind::text) return false;
        any = any || given.cell(row).kind == Cell::Kind::number;
    }
    return any && !(given.block().single() && given.cell(0).number == 0);
}

bool fits_numbers(Need const& need, Given const& given) {
    Numbers const* numbers = given.if_numbers();
    return numbers && numbers->dimension == need.dimension &&
           fits_reading(need.reading, numbers->reading) && fits_share(need.share, numbers->share);
}

std::string example_with_unit(Given const& given, Need const& need) {
    const std::string unit =
        need.reading == Reading::point ? "K" : core::text::si_unit(need.dimension);
    return written(given.block(), 0) + " " + unit;
}

/// The numbers can be read, but are not of the kind that is needed.
Failure wrong_kind(Need const& need, Given const& given, Numbers const& numbers) {
    if (numbers.blanks.size() == numbers.count())
        return Failure(Failure::Kind::unfit, "blank cells only", described(need), "fill the cells");
    const std::string given_text = written(given.block(), 0);
    const auto unfit = [&](std::string what, std::string repair) {
        return Failure(Failure::Kind::unfit, std::move(what), described(need), std::move(repair));
    };
    if (numbers.bare)
        return unfit(given_text + " without a unit",
                     "write the unit the number is in, for example `" +
                         example_with_unit(given, need) + "`");
    const bool steam = need.kind == Need::Kind::steam;
    if (numbers.dimension == need.dimension || steam) {
        if (numbers.reading == Reading::gauge)
            return unfit(given_text + ", a gauge pressure",
                         "make it absolute with PRESSURE.ABSOLUTE(gauge; atmospheric)");
        if (steam && numbers.share != Share::none)
            return unfit(given_text, "write the dryness as a number from 0 to 1, or in %");
        if (steam && numbers.reading == Reading::difference)
            return unfit(given_text + ", a temperature difference",
                         "write the temperature itself in K or °C");
    }
    if (numbers.dimension == need.dimension && !steam) {
        if (need.reading == Reading::gauge)
            return unfit(given_text + ", an absolute pressure",
                         "mark a gauge pressure with (g), for example `5 bar(g)`");
        if (numbers.reading == Reading::point)
            return unfit(given_text + ", a point on a scale", "write the difference in K or Δ°C");
        if (numbers.reading == Reading::difference)
            return unfit(given_text + ", a temperature difference",
                         "write the temperature itself in K or °C");
        return unfit(given_text, "write a fraction of the kind that is asked for");
    }
    const core::Dimension molar = power(core::Dimension::of_mass / core::Dimension::of_amount, 1);
    if (numbers.dimension * molar == need.dimension || numbers.dimension == need.dimension * molar)
        return unfit(given_text + ", " + core::text::name_of(numbers.dimension),
                     "give it on the other basis, molar and per mass are not the same (MOLAR.MASS "
                     "converts)");
    return unfit(given_text + ", " + core::text::name_of(numbers.dimension),
                 "check which cell the argument refers to, and its unit");
}

} // namespace

bool is_numeric(Need const& need, Given const& given) {
    if (need.kind == Need::Kind::named) return tells_molar_mass(given);
    if (need.kind == Need::Kind::steam) return has_numbers(given);
    return need.kind == Need::Kind::quantity || need.kind == Need::Kind::any_quantity;
}

bool stands_for_all_rows(Need const& need, Given const& given) {
    return given.cell_count() == 1 || need.kind == Need::Kind::material ||
           ((need.kind == Need::Kind::gas || need.kind == Need::Kind::fluid) &&
            means_mixture(given));
}

bool accepts(Need const& need, Given const& given) {
    if (given.missing()) return need.optional;
    switch (need.kind) {
    case Need::Kind::quantity:
        return fits_numbers(need, given);
    case Need::Kind::any_quantity:
        return given.if_numbers() != nullptr;
    case Need::Kind::text:
        return is_filled_text(given);
    case Need::Kind::substance:
        return begins_with_letter(given) && !means_mixture(given);
    case Need::Kind::equation:
        return is_filled_text(given);
    case Need::Kind::steam:
        return is_coordinate_of_steam(given);
    case Need::Kind::steam_word:
        return given.cell_count() == 1 && given.cell(0).kind == Cell::Kind::text &&
               (given.cell(0).text == "steam" || given.cell(0).text == "Steam");
    case Need::Kind::material:
        return is_material_on(need.dimension, given);
    case Need::Kind::gas:
    case Need::Kind::fluid:
        return (begins_with_letter(given) || is_mixture(given)) && !states_heat_capacity(given);
    case Need::Kind::constant_gas:
        return is_constant_gas(need.dimension, given);
    case Need::Kind::named:
        return tells_molar_mass(given) ? fits_numbers(need, given) : is_filled_text(given);
    case Need::Kind::cell:
        return true;
    case Need::Kind::left_out:
        return false;
    case Need::Kind::table:
        return is_table(given);
    }
    return false;
}

core::Failure misfit(Need const& need, Given const& given) {
    if (given.missing())
        return Failure(Failure::Kind::unfit, "nothing", described(need), "fill the argument in");
    if (need.kind == Need::Kind::quantity || need.kind == Need::Kind::any_quantity ||
        need.kind == Need::Kind::steam) {
        if (Numbers const* numbers = given.if_numbers()) return wrong_kind(need, given, *numbers);
        return given.why_not_numbers();
    }
    Cell const& cell = given.cell(0);
    const std::string text =
        cell.kind == Cell::Kind::text ? std::string(cell.text)
        : cell.kind == Cell::Kind::number
            ? "the number " + core::text::write_number(static_cast<long double>(cell.number), 6)
            : "a blank cell";
    const char* repair = need.kind == Need::Kind::table ? "select cells that hold plain numbers"
                         : need.kind == Need::Kind::constant_gas
                             ? "write the gas in front of its heat capacity"
                             : "write it as text";
    return Failure(Failure::Kind::unfit, text, described(need), repair);
}

std::string described(Need const& need) {
    const std::string condition =
        need.condition[0] ? std::string(" ") + need.condition : std::string();
    switch (need.kind) {
    case Need::Kind::any_quantity:
        return "a quantity with its unit";
    case Need::Kind::text:
        return "a text";
    case Need::Kind::named:
        return "a chemical formula, or a molar mass";
    case Need::Kind::substance:
        return "a substance by formula or name";
    case Need::Kind::material:
        return "an own material: a block under headings, or the text of MATERIAL.OF";
    case Need::Kind::gas:
    case Need::Kind::fluid:
        return "a gas such as `N2`, or a mixture such as `0.79 N2 + 0.21 O2` or a block of gases "
               "and fractions";
    case Need::Kind::steam:
        return "a temperature, an absolute pressure, a specific enthalpy, entropy or volume, or a "
               "dryness";
    case Need::Kind::steam_word:
        return "the word `steam`";
    case Need::Kind::constant_gas:
        return "a gas with its heat capacity such as `air, cp = 1.005 kJ/(kg·K)`";
    case Need::Kind::equation:
        return "a reaction equation such as `2 Al + 3/2 O2 -> Al2O3`";
    case Need::Kind::left_out:
        return "nothing";
    case Need::Kind::cell:
        return "a cell";
    case Need::Kind::table:
        return "plain numbers";
    case Need::Kind::quantity:
        break;
    }
    if (need.reading == Reading::gauge) return "a gauge pressure, marked (g)";
    if (need.reading == Reading::difference)
        return "a temperature difference in K or Δ°C" + condition;
    if (need.reading == Reading::point) return "a temperature in K, °C, °F or °R, above 0 K";
    if (need.dimension == core::Dimension{}) {
        if (need.share == Share::mole) return "mole fractions";
        if (need.share == Share::mass) return "mass fractions, in wt%";
        return "a number" + condition;
    }
    return core::text::name_of(need.dimension) + condition + " (" +
           core::text::si_unit(need.dimension) + ")";
}

} // namespace registration
