// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/ideal_gas.h"
#include "core/processes/pressurizing.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/substance_arguments.h"

namespace registration::catalogue {
namespace {

using namespace core::processes;
using core::Temperature, core::Molar, core::Pressure, core::Rate, core::Specific, core::Total,
    core::Volume;

// The gas of an isothermal change matters only for the basis of the result.
template<class Basis>
core::MolarEntropy isothermal_between_volumes(core::Positive<core::On<Volume, Basis>> from,
                                              core::Positive<core::On<Volume, Basis>> to,
                                              std::optional<NamedSubstance>) {
    return isothermal_by_volume<Basis>(from, to);
}
core::MolarEntropy isothermal_between_pressures(core::Positive<Pressure> from,
                                                core::Positive<Pressure> to,
                                                std::optional<NamedSubstance>) {
    return isothermal_by_pressure(from, to);
}

// A gas named with its heat capacity: the relation for a molar one, on the basis it is stated on.
template<class Basis>
core::On<core::Entropy, Basis> entropy_of_constant_gas(ConstantGasOn<Basis> const& gas,
                                                       Temperature t1, core::Positive<Pressure> p1,
                                                       Temperature t2, core::Positive<Pressure> p2,
                                                       core::Notes const& notes) {
    return on_basis(gas, entropy_of_gas(molar_heat_capacity(gas, notes), t1, p1, t2, p2));
}
template<class Basis>
core::On<core::Energy, Basis> enthalpy_of_constant_gas(ConstantGasOn<Basis> const& gas,
                                                       Temperature t1, core::Positive<Pressure> p1,
                                                       Temperature t2, core::Positive<Pressure> p2,
                                                       core::Notes const& notes) {
    return on_basis(gas, enthalpy_of_gas(molar_heat_capacity(gas, notes), t1, p1, t2, p2));
}
template<class Basis>
core::On<core::Entropy, Basis>
adiabatic_of_constant_gas(ConstantGasOn<Basis> const& gas, Temperature t1,
                          core::Positive<Pressure> p1, Temperature t2, core::Positive<Pressure> p2,
                          core::Notes const& notes) {
    return on_basis(gas,
                    adiabatic_generation(molar_heat_capacity(gas, notes), t1, p1, t2, p2, notes));
}
template<class Basis>
core::On<core::Entropy, Basis>
polytropic_of_constant_gas(ConstantGasOn<Basis> const& gas, double exponent, Temperature from,
                           Temperature to, core::Notes const& notes) {
    return on_basis(gas, polytropic(molar_heat_capacity(gas, notes), exponent, from, to));
}

constexpr const char* ideal_gas = "dS = cp · dT / T - R · dp / p of an ideal gas, R of CODATA 2018";
constexpr const char* ideal_gas_valid =
    "ideal gas, cp constant or its mean between the temperatures";

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.ISOTHERMAL",
         .says = "Entropy of an ideal gas at constant temperature, between two volumes or two "
                 "pressures: the units say which.",
         .arguments = {{{.name = "from",
                         .symbol = "x1",
                         .says = "volume or absolute pressure at the start",
                         .example = "7 bar"},
                        {.name = "to",
                         .symbol = "x2",
                         .says = "volume or absolute pressure at the end",
                         .example = "1.013 bar"},
                        amount,
                        {.name = "gas",
                         .symbol = "gas",
                         .says = "formula or molar mass, needed only where a mass comes in",
                         .example = "N2"},
                        show}},
         .forms = {form<isothermal_between_volumes<Total>, isothermal_between_volumes<Molar>,
                        isothermal_between_volumes<Specific>, isothermal_between_volumes<Rate>>(
                       "ΔS = R · ln(x2 / x1)", ideal_gas, "ideal gas at constant temperature"),
                   form<isothermal_between_pressures>("ΔS = R · ln(x1 / x2)", ideal_gas,
                                                      "ideal gas at constant temperature")},
         .examples = {{{"ENTROPY.ISOTHERMAL(\"1 L\"; \"2 L\")", 5.763146321643979},
                       {"ENTROPY.ISOTHERMAL(\"1 bar\"; \"7 bar\"; \"5 mol\")",
                        -80.895985963027}}}}),
    describe(
        {.name = "ENTROPY.ISOCHORIC",
         .says = "Entropy of heating at constant volume with constant heat capacity.",
         .arguments =
             {{{.name = "heat_capacity",
                .symbol = "cv",
                .says =
                    "heat capacity at constant volume: molar, specific, of the whole or of a flow",
                .example = "20.8 J/(mol·K)"},
               from_temperature,
               to_temperature,
               amount,
               show}},
         .forms = {form<isochoric<Molar>, isochoric<Specific>, isochoric<Total>, isochoric<Rate>>(
             "ΔS = cv · ln(T2 / T1)", "dS = cv · dT / T",
             "cv constant or its mean, no phase change on the way")},
         .examples = {{{"ENTROPY.ISOCHORIC(\"20.8 J/(mol·K)\"; \"300 K\"; \"600 K\")",
                        14.417461355646862}}}}),
    describe({.name = "ENTROPY.ISOBARIC",
              .says = "Entropy of heating at constant pressure with constant heat capacity; "
                      "liquids and solids too.",
              .arguments = {{{.name = "heat_capacity",
                              .symbol = "cp",
                              .says = "heat capacity at constant pressure: molar, specific, of the "
                                      "whole or of a flow",
                              .example = "4.18 kJ/(kg·K)"},
                             from_temperature,
                             to_temperature,
                             amount,
                             show}},
              .forms = {form<isobaric<Molar>, isobaric<Specific>, isobaric<Total>, isobaric<Rate>>(
                  "ΔS = cp · ln(T2 / T1)", "dS = cp · dT / T",
                  "cp constant or its mean, no phase change on the way")},
              .examples = {{{"ENTROPY.ISOBARIC(\"4184 J/(kg·K)\"; \"20 °C\"; \"100 °C\"; \"1 kg\")",
                             1009.582715739449}}}}),
    describe(
        {.name = "ENTROPY.POLYTROPIC",
         .says = "Entropy of an ideal gas along p · V^k = const, from one temperature to another.",
         .arguments = {{constant_cp,
                        {.name = "exponent",
                         .symbol = "k",
                         .says = "polytropic exponent, not 1",
                         .example = "1.3"},
                        from_temperature,
                        to_temperature,
                        amount,
                        show}},
         .forms = {form<polytropic>("ΔS = (cp - R · k / (k - 1)) · ln(T2 / T1)", ideal_gas,
                                    ideal_gas_valid),
                   form<polytropic_of_constant_gas<Molar>, polytropic_of_constant_gas<Specific>>(
                       "ΔS = (cp - R · k / (k - 1)) · ln(T2 / T1), cp as stated", ideal_gas,
                       stated_cp),
                   form<core::substances::polytropic>(
                       "ΔS = ∫cp/T dT - R · k / (k - 1) · ln(T2 / T1), cp of the tables", report,
                       table_gas)},
         .examples = {{{"ENTROPY.POLYTROPIC(\"29.1 J/(mol·K)\"; 1.3; \"20 °C\"; \"420 K\")",
                        -2.4915840637029576}}}}),
    describe(
        {.name = "ENTROPY.GAS",
         .says = "Entropy of a gas between two states of temperature and pressure.",
         .arguments = {{constant_cp, temperature_1, pressure_1, temperature_2, pressure_2, amount,
                        show}},
         .forms = {form<entropy_of_gas>("ΔS = cp · ln(T2 / T1) - R · ln(p2 / p1)", ideal_gas,
                                        ideal_gas_valid),
                   form<entropy_of_constant_gas<Molar>, entropy_of_constant_gas<Specific>>(
                       "ΔS = cp · ln(T2 / T1) - R · ln(p2 / p1), cp as stated", ideal_gas,
                       stated_cp),
                   form<core::substances::entropy_of_gas>(
                       "ΔS = ∫cp/T dT - R · ln(p2 / p1), cp of the tables", report, table_gas)},
         .examples = {{{"ENTROPY.GAS(\"29.10061916353634 J/(mol·K)\"; \"300 K\"; \"1 bar\"; "
                        "\"600 K\"; \"5 bar\")",
                        6.789400766582013}}}}),
    describe({.name = "ENTHALPY.GAS",
              .says = "Enthalpy of an ideal gas between two states; the pressures do not matter, "
                      "they stand for the same rows as in ENTROPY.GAS.",
              .arguments = {{constant_cp, temperature_1, pressure_1, temperature_2, pressure_2,
                             amount, show}},
              .forms = {form<enthalpy_of_gas>("ΔH = cp · (T2 - T1)", "dh = cp · dT of an ideal gas",
                                              ideal_gas_valid),
                        form<enthalpy_of_constant_gas<Molar>, enthalpy_of_constant_gas<Specific>>(
                            "ΔH = cp · (T2 - T1), cp as stated", "dh = cp · dT of an ideal gas",
                            stated_cp),
                        form<core::substances::enthalpy_of_gas>("ΔH = ∫cp dT, cp of the tables",
                                                                report, table_gas)},
              .examples =
                  {{{"ENTHALPY.GAS(\"29.1 J/(mol·K)\"; \"300 K\"; \"1 bar\"; \"450 K\"; \"7 bar\")",
                     4365}}}}),
    describe(
        {.name = "ENTROPY.ADIABATIC",
         .says = "Entropy generated by an adiabatic step of a gas, 0 if reversible; below 0 no "
                 "adiabatic step leads there.",
         .arguments = {{constant_cp, temperature_1, pressure_1, temperature_2, pressure_2, amount,
                        show}},
         .forms = {form<adiabatic_generation>(
                       "Sgen = cp · ln(T2 / T1) - R · ln(p2 / p1)", ideal_gas,
                       "no heat crosses the boundary; ideal gas, cp constant or its mean"),
                   form<adiabatic_of_constant_gas<Molar>, adiabatic_of_constant_gas<Specific>>(
                       "Sgen = cp · ln(T2 / T1) - R · ln(p2 / p1), cp as stated", ideal_gas,
                       stated_cp),
                   form<core::substances::adiabatic_generation>(
                       "Sgen = ∫cp/T dT - R · ln(p2 / p1), cp of the tables", report, table_gas)},
         .examples =
             {{{"ENTROPY.ADIABATIC(\"29.1 J/(mol·K)\"; \"20 °C\"; \"1 bar\"; \"520 K\"; \"7 bar\")",
                0.49930450300334783}}}}),
    describe(
        {.name = "ENTROPY.PRESSURIZING",
         .says = "Entropy of a liquid or solid pressed at constant temperature.",
         .arguments = {{{.name = "volume",
                         .symbol = "V",
                         .says = "volume of the whole, molar or specific",
                         .example = "1.2 L"},
                        {.name = "expansivity",
                         .symbol = "β",
                         .says = "volume expansivity",
                         .example = "2.07e-4 1/K"},
                        {.name = "p1",
                         .symbol = "p1",
                         .says = "absolute pressure before",
                         .example = "1 bar"},
                        {.name = "p2",
                         .symbol = "p2",
                         .says = "absolute pressure after",
                         .example = "200 bar"},
                        show}},
         .forms = {form<pressurizing<Total>, pressurizing<Molar>, pressurizing<Specific>>(
             "ΔS = -V · β · (p2 - p1)", "Maxwell relation (∂S/∂p)T = -(∂V/∂T)p",
             "V and β nearly constant between the pressures")},
         .examples = {{{"ENTROPY.PRESSURIZING(\"1.2 L\"; \"2.07e-4 1/K\"; \"1 bar\"; \"200 bar\")",
                        -4.94316}}}}),
};

} // namespace

std::span<const Entry> simple_processes() { return entries; }

} // namespace registration::catalogue
