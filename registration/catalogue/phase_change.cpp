// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/phase_change.h"

namespace registration::catalogue {
namespace {

using namespace core::processes;
using core::Molar, core::Specific, core::Total;

constexpr const char* clausius =
    "equal Gibbs energies at equilibrium, ΔH - T · ΔS = 0 (Gibbs 1876)";
constexpr Form equilibrium = form<transition<Molar>, transition<Specific>, transition<Total>>(
    "ΔS = ΔH / T", clausius, "at the equilibrium temperature of the pressure that ΔH belongs to");

constexpr Entry entries[] = {
    describe({.name = "ENTROPY.FUSION",
              .says = "Entropy of fusion: enthalpy of fusion over the melting temperature.",
              .arguments = {{{.name = "what",
                              .symbol = "ΔH",
                              .says = "enthalpy of fusion, molar, specific or of the whole",
                              .example = "13.81 kJ/mol"},
                             {.name = "temperature",
                              .symbol = "T",
                              .says = "melting temperature",
                              .example = "1538 °C"},
                             amount,
                             show}},
              .forms = {equilibrium},
              .examples = {{{"ENTROPY.FUSION(\"18.7 kJ/mol\"; \"1668 °C\")", 9.63346469876104},
                            {"ENTROPY.FUSION(\"397 kJ/kg\"; \"660.3 °C\"; \"2 t\"; \"kJ/K\")",
                             850.6079597193209}}}}),
    describe(
        {.name = "ENTROPY.VAPORIZATION",
         .says = "Entropy of vaporization: enthalpy of vaporization over the boiling temperature.",
         .arguments = {{{.name = "what",
                         .symbol = "ΔH",
                         .says = "enthalpy of vaporization, molar, specific or of the whole",
                         .example = "40.65 kJ/mol"},
                        {.name = "temperature",
                         .symbol = "T",
                         .says = "boiling temperature at the pressure of the enthalpy",
                         .example = "99.97 °C"},
                        amount,
                        show}},
         .forms = {equilibrium},
         .examples = {{{"ENTROPY.VAPORIZATION(\"40.651 kJ/mol\"; \"373.124 K\")",
                        108.947695672216}}}}),
    describe(
        {.name = "ENTROPY.TRANSITION",
         .says = "Entropy of any first-order transition: its enthalpy over its temperature, above "
                 "zero.",
         .arguments = {{{.name = "what",
                         .symbol = "ΔH",
                         .says = "enthalpy of the transition in the heating direction",
                         .example = "0.9 kJ/mol"},
                        {.name = "temperature",
                         .symbol = "T",
                         .says = "temperature of the transition",
                         .example = "912 °C"},
                        amount,
                        show}},
         .forms = {equilibrium},
         .examples = {{{"ENTROPY.TRANSITION(\"0.9 kJ/mol\"; \"912 °C\")", 0.759397544614606}}}}),
};

} // namespace

std::span<const Entry> phase_change() { return entries; }

} // namespace registration::catalogue
