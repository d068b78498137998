// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/real_gas.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/substance_arguments.h"

#include <optional>
#include <string_view>

namespace registration::catalogue {
namespace {

using namespace core::real_gas;
using core::Notes, core::Positive, core::Pressure, core::Temperature;
using Word = std::optional<std::string_view>;

Equation chosen(Word word) { return word ? read_equation(*word) : Equation::peng_robinson; }

/// A relation with the word for its equation last.
template<auto relation>
auto at_state(Fluid const& fluid, Temperature temperature, Positive<Pressure> pressure, Word word,
              Notes const& notes) {
    return relation(fluid, temperature, pressure, chosen(word), notes);
}
template<auto relation>
auto between_states(Fluid const& fluid, Temperature t1, Positive<Pressure> p1, Temperature t2,
                    Positive<Pressure> p2, Word word, Notes const& notes) {
    return relation(fluid, t1, p1, t2, p2, chosen(word), notes);
}

constexpr Argument fluid{.name = "gas",
                         .symbol = "gas",
                         .says = "a fluid by formula or name, or a mixture as text or block, with "
                                 "critical constants in the project's table",
                         .example = "CO2"};
constexpr Argument pressure{
    .name = "pressure", .symbol = "p", .says = "absolute pressure", .example = "60 bar"};
constexpr Argument equation_of_state{
    .name = "equation",
    .symbol = "equation",
    .says = "Peng-Robinson if left out, Soave, or virial for moderate pressures",
    .example = "Soave"};
constexpr const char* equations =
    "D. Y. Peng, D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59; G. Soave, Chem. Eng. Sci. "
    "27 (1972) 1197; Pitzer's correlation of the second virial coefficient in Abbott's form; "
    "critical constants with their primary reference in the steps";
constexpr const char* valid = "fluids that are not strongly polar, away from the critical point; "
                              "mixtures with interaction parameters of zero";

constexpr Entry entries[] = {
    describe({.name = "ENTROPY.DEPARTURE",
              .says =
                  "Entropy of a real gas less that of the ideal gas at the same temperature and "
                  "pressure.",
              .arguments = {{fluid, temperature, pressure, equation_of_state, show}},
              .forms = {form<at_state<entropy_departure>>(
                  "ΔS = S - S(ideal), from the equation of state", equations, valid)},
              .examples = {{{"ENTROPY.DEPARTURE(\"CO2\"; \"350 K\"; \"60 bar\")",
                             -4.501852428286278}}}}),
    describe({.name = "ENTHALPY.DEPARTURE",
              .says = "Enthalpy of a real gas less that of the ideal gas at the same temperature "
                      "and pressure.",
              .arguments = {{fluid, temperature, pressure, equation_of_state, show}},
              .forms = {form<at_state<enthalpy_departure>>(
                  "ΔH = H - H(ideal), from the equation of state", equations, valid)},
              .examples = {{{"ENTHALPY.DEPARTURE(\"CO2\"; \"350 K\"; \"60 bar\"; \"Soave\"; "
                             "\"kJ/mol\")",
                             -2.079058219778648}}}}),
    describe(
        {.name = "ENTROPY.REALGAS",
         .says = "Entropy of a real gas between two states of temperature and pressure.",
         .arguments = {{fluid, temperature_1, pressure_1, temperature_2, pressure_2, amount,
                        equation_of_state, show}},
         .forms = {form<between_states<core::real_gas::entropy_between>>(
             "ΔS = ∫cp/T dT - R · ln(p2 / p1) + departure at 2 - departure at 1, cp of the tables",
             equations, valid)},
         .examples = {{{"ENTROPY.REALGAS(\"CO2\"; \"300 K\"; \"1 bar\"; \"350 K\"; \"60 bar\")",
                        -32.54960532193764}}}}),
    describe(
        {.name = "ENTHALPY.REALGAS",
         .says = "Enthalpy of a real gas between two states of temperature and pressure.",
         .arguments = {{fluid, temperature_1, pressure_1, temperature_2, pressure_2, amount,
                        equation_of_state, show}},
         .forms = {form<between_states<core::real_gas::enthalpy_between>>(
             "ΔH = ∫cp dT + departure at 2 - departure at 1, cp of the tables", equations, valid)},
         .examples = {{{"ENTHALPY.REALGAS(\"CO2\"; \"300 K\"; \"1 bar\"; \"350 K\"; \"60 bar\"; ; "
                        "\"virial\")",
                        162.13756074591876}}}}),
    describe({.name = "COMPRESSIBILITY.FACTOR",
              .says = "Compressibility factor Z of the stable phase.",
              .arguments = {{fluid, temperature, pressure, equation_of_state, show}},
              .forms = {form<at_state<compressibility_factor>>(
                  "Z = p · V / (R · T), from the equation of state", equations, valid)},
              .examples = {{{"COMPRESSIBILITY.FACTOR(\"n-butane\"; \"500 K\"; \"50 bar\")",
                             0.690950908191242}}}}),
};

} // namespace

std::span<const Entry> real_gas() { return entries; }

} // namespace registration::catalogue
