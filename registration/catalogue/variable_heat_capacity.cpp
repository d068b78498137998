// SPDX-License-Identifier: MPL-2.0
#include "core/materials/material_text.h"
#include "core/substances/heating.h"
#include "core/substances/reaction.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/material_arguments.h"
#include "registration/substance_arguments.h"

namespace registration {

/// What the participants of a reaction are present at, one cell each: a pressure, a plain number, or
/// blank for the standard state.
struct Activities {
    std::vector<core::substances::Activity> values;
};
template<>
struct argument<Activities> : Unchecked {
    static constexpr Need need{
        .kind = Need::Kind::cell, .whole = true, .condition = "pressures and activities"};
    struct Rows {
        Rows(Given const& given, int) {
            for (std::size_t row = 0; row < given.cell_count(); ++row)
                activities.values.push_back(read(given.cell(row)));
        }
        Activities operator[](std::size_t) const { return activities; }
        static core::substances::Activity read(Cell const& cell);
        Activities activities;
    };
};

core::substances::Activity argument<Activities>::Rows::read(Cell const& cell) {
    if (cell.kind == Cell::Kind::blank) return {};
    const Numbers numbers = [&] {
        Numbers read;
        read_numbers({&cell, 1, 1}, read);
        return read;
    }();
    if (numbers.dimension == core::Dimension{})
        return {.pressure = std::nullopt, .number = numbers.si[0]};
    if (numbers.dimension == core::dimension<core::Pressure> && numbers.reading == Reading::plain)
        return {.pressure = core::Pressure::from_value(numbers.si[0]), .number = std::nullopt};
    core::refuse_unfit(written({&cell, 1, 1}, 0),
                       "an absolute pressure or a plain number for each participant",
                       "give gases a pressure, condensed phases a number, and leave a cell blank "
                       "for the standard state");
}

namespace catalogue {
namespace {

using namespace core::substances;
using core::Notes, core::Temperature;

core::MolarEnergy gibbs_at_activities(Reaction const& reaction, Temperature temperature,
                                      Activities const& activities, Notes const& notes) {
    return gibbs_of_reaction(reaction, temperature, activities.values, notes);
}

template<class Basis>
core::On<core::Entropy, Basis> own_entropy_of_heating(OwnMaterialOn<Basis> const& own,
                                                      Temperature from, Temperature to,
                                                      Notes const& notes) {
    return core::materials::entropy_of_heating<Basis>(*own.material, from, to, notes);
}
template<class Basis>
core::On<core::Energy, Basis> own_enthalpy_of_heating(OwnMaterialOn<Basis> const& own,
                                                      Temperature from, Temperature to,
                                                      Notes const& notes) {
    return core::materials::enthalpy_of_heating<Basis>(*own.material, from, to, notes);
}
template<class Basis>
core::On<core::HeatCapacity, Basis> own_heat_capacity(OwnMaterialOn<Basis> const& own,
                                                      Temperature temperature, Notes const& notes) {
    return core::materials::heat_capacity<Basis>(*own.material, temperature, notes);
}
std::string material_of(MaterialDescription const& given, std::optional<std::string_view> name,
                        std::optional<core::Positive<core::MolarMass>> molar_mass) {
    core::materials::Description description = given.description;
    if (name) description.name = *name;
    if (molar_mass) {
        std::erase_if(description.columns,
                      [](auto const& column) { return column.heading.starts_with("molar mass"); });
        description.columns.insert(
            description.columns.begin(),
            {.heading = "molar mass / (kg/mol)", .numbers = {molar_mass->value.value()}});
    }
    static_cast<void>(core::materials::made_of(description)); // refuses what is none
    return core::materials::write_material(description);
}

constexpr const char* own_data =
    "the material as described in the sheet; measured tables by the monotone cubic of F. N. "
    "Fritsch, J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300";
constexpr const char* own_valid = "the range of the material; nothing is extrapolated";
constexpr Argument equation{.name = "equation",
                            .symbol = "equation",
                            .says = "balanced reaction equation, states where they matter",
                            .example = "2 Al + 3/2 O2 -> Al2O3"};
constexpr const char* phases_passed =
    "1 bar, the stable phase at each temperature or the state that is written; no decomposition";
constexpr const char* of_equation = "per mole of the equation as written, standard states at 1 bar";

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.HEATING",
         .says = "Entropy of heating a substance with variable heat capacity, every "
                 "transition on the way passed; cooling is the negative.",
         .arguments = {{substance, from_temperature, to_temperature, amount, show}},
         .forms = {form<entropy_of_heating>(
                       "ΔS = Σ ∫cp/T dT + Σ ΔH/T, over the stretches and transitions from T1 to T2",
                       report, phases_passed),
                   form<own_entropy_of_heating<core::Molar>, own_entropy_of_heating<core::Specific>,
                        own_entropy_of_heating<core::Total>>(
                       "ΔS = Σ ∫cp/T dT + Σ ΔH/T, over the rows and transitions from T1 to T2",
                       own_data, own_valid)},
         .examples = {{{"ENTROPY.HEATING(\"N2\"; \"298.15 K\"; \"1000 K\")", 36.56097979501541}}}}),
    describe(
        {.name = "ENTHALPY.HEATING",
         .says = "Heat taken up by a substance with variable heat capacity at constant pressure, "
                 "transitions included.",
         .arguments = {{substance, from_temperature, to_temperature, amount, show}},
         .forms =
             {form<enthalpy_of_heating>(
                  "ΔH = Σ ∫cp dT + Σ ΔH, over the stretches and transitions from T1 to T2", report,
                  phases_passed),
              form<own_enthalpy_of_heating<core::Molar>, own_enthalpy_of_heating<core::Specific>,
                   own_enthalpy_of_heating<core::Total>>(
                  "ΔH = Σ ∫cp dT + Σ ΔH, over the rows and transitions from T1 to T2", own_data,
                  own_valid)},
         .examples = {{{"ENTHALPY.HEATING(\"N2\"; \"298.15 K\"; \"1000 K\"; ; \"kJ/mol\")",
                        21.462274589345895}}}}),
    describe({.name = "HEAT.CAPACITY",
              .says = "Heat capacity at constant pressure of a substance.",
              .arguments = {{substance, temperature, show}},
              .forms = {form<heat_capacity>("cp of the stable phase at T", report, phases_passed),
                        form<own_heat_capacity<core::Molar>, own_heat_capacity<core::Specific>,
                             own_heat_capacity<core::Total>>("cp of the material at T", own_data,
                                                             own_valid)},
              .examples = {{{"HEAT.CAPACITY(\"N2\"; \"400 K\")", 29.24872456918585}}}}),
    describe({.name = "ENTROPY.STANDARD",
              .says = "Absolute entropy of a substance at 1 bar; of a gas at another pressure "
                      "where one is given.",
              .arguments = {{substance,
                             temperature,
                             {.name = "pressure",
                              .symbol = "p",
                              .says = "absolute pressure of a gas; 1 bar if left out",
                              .example = "0.21 bar"},
                             show}},
              .forms = {form<entropy_standard>(
                            "S = S°(T) - R · ln(p / 1 bar), the second term for gases", report,
                            "ideal gas; condensed phases at 1 bar"),
                        form<entropy_standard_of_gas>("S = Σ(x · S°(T)) - R · Σ(x · ln(x)) - R · "
                                                      "ln(p / 1 bar), over the gases of a mixture",
                                                      report, table_gas)},
              .examples = {{{"ENTROPY.STANDARD(\"N2\"; \"298.15 K\")", 191.60971157263504}}}}),
    describe({.name = "ENTROPY.REACTION",
              .says = "Entropy of a reaction in standard states.",
              .arguments = {{equation, temperature, show}},
              .forms = {form<entropy_of_reaction>("ΔS° = Σ(ν · S°), over the participants", report,
                                                  of_equation)},
              .examples = {{{"ENTROPY.REACTION(\"N2 + 3 H2 -> 2 NH3\"; \"298.15 K\")",
                             -198.11217589771962}}}}),
    describe({.name = "ENTHALPY.REACTION",
              .says = "Enthalpy of a reaction in standard states.",
              .arguments = {{equation, temperature, show}},
              .forms = {form<enthalpy_of_reaction>("ΔH° = Σ(ν · H°), over the participants", report,
                                                   of_equation)},
              .examples = {{{"ENTHALPY.REACTION(\"CO + 1/2 O2 -> CO2\"; \"298.15 K\"; \"kJ/mol\")",
                             -282.97480430702836}}}}),
    describe(
        {.name = "GIBBS.REACTION",
         .says =
             "Gibbs energy of a reaction, in standard states or at given pressures and activities.",
         .arguments = {{equation,
                        temperature,
                        {.name = "activities",
                         .symbol = "a",
                         .says = "one cell a species in the order of the equation: pressure, "
                                 "number, or blank for the standard state",
                         .example = "B5:B7"},
                        show}},
         .forms = {form<standard_gibbs_of_reaction>("ΔG° = Σ(ν · G°), over the participants",
                                                    report, of_equation),
                   form<gibbs_at_activities>(
                       "ΔG = ΔG° + R · T · Σ(ν · ln(a)), a = p / 1 bar for gases", report,
                       "ideal gases; activities as given")},
         .examples = {{{"GIBBS.REACTION(\"CO + 1/2 O2 -> CO2\"; \"1000 K\"; ; \"kJ/mol\")",
                        -195.57838240390814}}}}),
    describe({.name = "EQUILIBRIUM.CONSTANT",
              .says = "Equilibrium constant of a reaction, pressures of gases counted in bar.",
              .arguments = {{equation, temperature, show}},
              .forms = {form<equilibrium_constant>("K = exp(-ΔG° / (R · T)), ΔG° from the tables",
                                                   report, of_equation)},
              .examples = {{{"EQUILIBRIUM.CONSTANT(\"CO + H2O(g) -> CO2 + H2\"; \"1000 K\")",
                             1.4339398731218909}}}}),
    describe(
        {.name = "EQUILIBRIUM.TEMPERATURE",
         .says = "Temperature at which the standard Gibbs energy of a reaction is zero.",
         .arguments = {{equation,
                        {.name = "from",
                         .symbol = "T1",
                         .says = "lower end of the search; the range of the data if left out",
                         .example = "500 K"},
                        {.name = "to",
                         .symbol = "T2",
                         .says = "upper end of the search",
                         .example = "1500 K"},
                        show}},
         .forms = {form<equilibrium_temperature>("ΔG°(T) = 0, solved for T", report, of_equation)},
         .examples = {{{"EQUILIBRIUM.TEMPERATURE(\"CaCO3 -> CaO + CO2\")", 1159.0883711190586}}}}),
    describe(
        {.name = "MATERIAL.OF",
         .says =
             "An own material as the text of one cell, to be used where a substance is asked for.",
         .arguments = {{{.name = "block",
                         .symbol = "block",
                         .says = "a measured table or a correlation under headings with units",
                         .example = "B4:C20"},
                        {.name = "name",
                         .symbol = "name",
                         .says = "a name for steps and notes",
                         .example = "steel A"},
                        {.name = "molar_mass",
                         .symbol = "M",
                         .says = "what a mole of it weighs",
                         .example = "55.8 g/mol"}}},
         .forms = {form<material_of>("the block as one text, all digits kept", own_data)},
         .examples = {{{"MATERIAL.OF({\"T / K\";\"cp / (J/(kg·K))\"|300;460|400;480}; \"steel A\")",
                        0, "material \"steel A\" | T / K: 300 400 | cp / (J/(kg·K)): 460 480"}}}}),
};

} // namespace

std::span<const Entry> variable_heat_capacity() { return entries; }

} // namespace catalogue
} // namespace registration
