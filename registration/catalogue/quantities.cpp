// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/absolute_pressure.h"
#include "core/processes/amount_of_gas.h"
#include "core/text/quantity.h"

#include <cmath>

namespace registration {
namespace {

std::string plain(double value) {
    return core::text::write_number(static_cast<long double>(value), 15);
}

} // namespace

/// The number of a value cell; a single blank one, which is sent as 0, is refused.
struct ValueCell {
    double value, u;
};
template<>
struct argument<ValueCell> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::cell, .condition = "a number"};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        ValueCell operator[](std::size_t row) const {
            Cell const& cell = given_->cell(row);
            if (cell.kind == Cell::Kind::number) {
                if (cell.number == 0 && given_->block().single())
                    core::refuse_unfit(
                        "a blank cell, or the bare number 0", "a value that is seen to be meant",
                        "fill the cell, or write a zero that is meant as the text \"0\"");
                return {cell.number, 0};
            }
            if (cell.kind == Cell::Kind::blank)
                core::refuse_unfit("a blank cell", "a number", "fill the cell");
            const auto read = core::text::read_quantity(cell.text);
            if (!read.bare)
                core::refuse_unfit(std::string(cell.text),
                                   "a number alone, since its unit is the next argument",
                                   "write the number without a unit");
            return {read.si, read.u};
        }
        Given const* given_;
    };
};

/// A unit as a cell or heading holds it.
struct UnitCell {
    Unit unit;
    std::string_view text;
};
template<>
struct argument<UnitCell> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::text, .condition = "a unit"};
    class Rows {
    public:
        Rows(Given const& given, int) : given_(&given) {
            if (given.block().single()) only_ = read(given.cell(0));
        }
        UnitCell operator[](std::size_t row) const {
            return only_ ? *only_ : read(given_->cell(row));
        }

    private:
        static UnitCell read(Cell const& cell) {
            const auto heading = core::text::read_heading(cell.text);
            return {heading.unit, heading.text};
        }
        Given const* given_;
        std::optional<UnitCell> only_;
    };
};

/// The cell of a `u` column.
struct UncertaintyCell {
    Cell cell;
};
template<>
struct argument<UncertaintyCell> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::cell, .condition = "an uncertainty"};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        UncertaintyCell operator[](std::size_t row) const { return {given_->cell(row)}; }
        Given const* given_;
    };
};

/// A quantity with the unit it is written in.
struct WrittenQuantity {
    double si, u;
    Unit unit;
    std::string_view unit_text;
};
template<>
struct argument<WrittenQuantity> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::any_quantity};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        WrittenQuantity operator[](std::size_t row) const {
            Numbers const& numbers = given_->numbers();
            const std::size_t at = numbers.listed ? row : 0;
            const std::string_view text = written_unit(given_->block(), at);
            return {numbers.si[at], numbers.uncertain() ? numbers.u[at] : 0,
                    text.empty() ? Unit{} : core::text::read_unit(text), text};
        }
        Given const* given_;
    };
};

namespace catalogue {
namespace {

using core::Rate, core::Total;

double standard_uncertainty(UncertaintyCell const& u, double si, Unit const& unit) {
    if (u.cell.kind == Cell::Kind::text) return core::text::read_uncertainty(u.cell.text, si, unit);
    if (!(u.cell.number >= 0))
        core::refuse_unfit("u = " + plain(u.cell.number), "a standard uncertainty of 0 or more",
                           "give u as a positive number in the unit of the value");
    return unit.span_to_si(u.cell.number);
}

std::string quantity_of(ValueCell value, UnitCell unit, std::optional<UncertaintyCell> u) {
    const double si = unit.unit.to_si(value.value);
    if (!std::isfinite(si))
        core::refuse_impossible(plain(value.value), "a number that can be held in SI units",
                                "check the magnitude and the unit");
    const double spread =
        u ? standard_uncertainty(*u, si, unit.unit) : unit.unit.span_to_si(value.u);
    return core::text::write_exactly(si, spread, unit.unit, unit.text);
}

AnyQuantity convert(AnyQuantity quantity, std::optional<NamedSubstance>) { return quantity; }

bool same_kind(Unit const& from, Unit const& to) {
    return from.dimension == to.dimension && (from.share == to.share || to.share == Share::none) &&
           (from.reading == to.reading ||
            (from.reading == Reading::plain && to.reading != Reading::gauge) ||
            (to.reading == Reading::plain && from.reading != Reading::gauge));
}

std::string quantity_text(WrittenQuantity quantity, std::optional<UnitCell> unit,
                          std::optional<double> digits) {
    if (unit && !same_kind(quantity.unit, unit->unit))
        core::refuse_unfit("the unit " + std::string(unit->text),
                           "a unit of " + core::text::name_of(quantity.unit.dimension),
                           "give a unit of the quantity's own dimension");
    if (digits && !(*digits >= 1 && *digits <= 17 && *digits == std::floor(*digits)))
        core::refuse_impossible(plain(*digits) + " digits", "a whole number of digits from 1 to 17",
                                "leave `digits` out for four");
    Unit const& target = unit ? unit->unit : quantity.unit;
    return core::text::write_for_people(quantity.si, digits ? 0 : quantity.u, target,
                                        unit ? unit->text : quantity.unit_text,
                                        digits ? static_cast<int>(*digits) : 4);
}

constexpr const char* formats = "ISO 80000-1:2009 and the SI Brochure, 9th ed., for the writing of "
                                "quantities; JCGM 100:2008 for uncertainties";
constexpr const char* factors =
    "exact factors of the SI Brochure, 9th ed. (2019), and NIST SP 811 (2008), App. B";

constexpr Entry entries[] = {
    describe(
        {.name = "QUANTITY.OF",
         .says = "A number and a unit as one text with all digits, to be used as an argument.",
         .arguments =
             {{{.name = "value",
                .symbol = "value",
                .says = "number; a zero that is meant is written as the text \"0\"",
                .example = "B20"},
               {.name = "unit",
                .symbol = "unit",
                .says = "unit, or a labelled heading that holds it",
                .example = "B$4"},
               {.name = "u",
                .symbol = "u",
                .says = "standard uncertainty in the same unit, or text such as 2 % or 0.4 (k=2)",
                .example = "C20"}}},
         .forms = {form<quantity_of>("value and unit as one text, all digits kept", formats)},
         .examples = {{{"QUANTITY.OF(7.3; \"ΔH / (kJ/mol)\")", 0, "7.3 kJ/mol"},
                       {"QUANTITY.OF(7.3; \"kJ/mol\"; 0.2)", 0, "(7.3 ± 0.2) kJ/mol"}}}}),
    describe(
        {.name = "QUANTITY.CONVERT",
         .says = "A quantity as a number in another unit; between kg and mol with a substance.",
         .arguments = {{{.name = "quantity",
                         .symbol = "x",
                         .says = "any quantity with its unit",
                         .example = "77 °F"},
                        show,
                        {.name = "substance",
                         .symbol = "substance",
                         .says = "formula or molar mass, where kg and mol are exchanged",
                         .example = "H2O"}}},
         .forms = {form<convert>("x", factors,
                                 "units of one dimension; °C and °F are points, Δ°C a difference")},
         .examples = {{{"QUANTITY.CONVERT(\"300 K\"; \"°C\")", 26.85},
                       {"QUANTITY.CONVERT(\"1 Btu_IT/(lb·°F)\"; \"kJ/(kg·K)\")", 4.1868},
                       {"QUANTITY.CONVERT(\"75.3 J/(mol·K)\"; \"kJ/(kg·K)\"; \"H2O\")",
                        4.179850124895921}}}}),
    describe({.name = "QUANTITY.TEXT",
              .says = "A quantity as a text for people, four significant digits unless told or an "
                      "uncertainty decides.",
              .arguments = {{{.name = "quantity",
                              .symbol = "x",
                              .says = "any quantity with its unit",
                              .example = "B5:D5"},
                             {.name = "unit",
                              .symbol = "unit",
                              .says = "unit to write it in; the given one if left out",
                              .example = "kJ/mol"},
                             {.name = "digits",
                              .symbol = "digits",
                              .says = "significant digits, 1 to 17",
                              .example = "5"}}},
              .forms = {form<quantity_text>("x as a text", formats)},
              .examples = {{{"QUANTITY.TEXT(\"8314.46 J/(kmol·K)\"; \"J/(mol·K)\")", 0,
                             "8.314 J/(mol·K)"},
                            {"QUANTITY.TEXT(\"10.57 kJ/mol ± 0.1 kJ/mol\")", 0,
                             "(10.57 ± 0.10) kJ/mol"}}}}),
    describe({.name = "PRESSURE.ABSOLUTE",
              .says = "Absolute pressure of a gauge reading: the only door for gauge pressures.",
              .arguments = {{{.name = "gauge",
                              .symbol = "pg",
                              .says = "pressure above atmospheric, marked (g)",
                              .example = "5 bar(g)"},
                             {.name = "atmospheric",
                              .symbol = "pa",
                              .says = "absolute pressure of the atmosphere there and then",
                              .example = "0.98 bar"},
                             show}},
              .forms = {form<core::processes::absolute_pressure>(
                  "p = pg + pa", "definition of gauge pressure",
                  "atmospheric pressure of the place, not a standard value")},
              .examples = {{{"PRESSURE.ABSOLUTE(\"5 bar(g)\"; \"0.98 bar\"; \"bar\")", 5.98}}}}),
    describe(
        {.name = "AMOUNT.GAS",
         .says = "Amount of an ideal gas in a volume at a stated temperature and pressure: the "
                 "only door for normal and standard volumes.",
         .arguments = {{{.name = "volume",
                         .symbol = "V",
                         .says = "volume or volume flow",
                         .example = "1200 m³/h"},
                        {.name = "temperature",
                         .symbol = "T",
                         .says = "temperature the volume is counted at",
                         .example = "0 °C"},
                        {.name = "pressure",
                         .symbol = "p",
                         .says = "absolute pressure the volume is counted at",
                         .example = "1 atm"},
                        show}},
         .forms =
             {form<core::processes::amount_of_gas<Total>, core::processes::amount_of_gas<Rate>>(
                 "n = p · V / (R · T)", "ideal gas, R of CODATA 2018",
                 "reference conditions of the volume, which differ by trade and country")},
         .examples = {{{"AMOUNT.GAS(\"1 m³\"; \"0 °C\"; \"1 atm\")", 44.61503340547032}}}}),
};

} // namespace

std::span<const Entry> quantities() { return entries; }

} // namespace catalogue
} // namespace registration
