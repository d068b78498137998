// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/phase_change.h"
#include "core/steam/state.h"
#include "core/substances/transition.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/steam_arguments.h"
#include "registration/substance_arguments.h"

namespace registration::catalogue {
namespace {

using namespace core::processes;
using core::Molar, core::Specific, core::Total;

constexpr const char* clausius =
    "equal Gibbs energies at equilibrium, ΔH - T · ΔS = 0 (Gibbs 1876)";
constexpr Form equilibrium = form<transition<Molar>, transition<Specific>, transition<Total>>(
    "ΔS = ΔH / T", clausius, "at the equilibrium temperature of the pressure that ΔH belongs to");

core::MolarEntropy fusion_of(core::substances::Substance const& substance,
                             core::Notes const& notes) {
    return core::substances::fusion(substance, notes).entropy;
}
core::MolarEntropy vaporization_of(core::substances::Substance const& substance,
                                   core::Notes const& notes) {
    return core::substances::vaporization(substance, notes).entropy;
}
/// The tables know one boiling point, at 1 bar.
core::MolarEntropy vaporization_elsewhere(core::substances::Substance const& substance,
                                          core::Temperature) {
    core::refuse_unfit(substance.written() + " with a temperature",
                       "a substance alone, which boils where the tables say at 1 bar",
                       "leave the temperature out, or write `steam` for water at a temperature");
}
core::MolarEntropy transition_of(core::substances::Substance const& substance,
                                 core::Temperature near, core::Notes const& notes) {
    return core::substances::transition_near(substance, near, notes).entropy;
}

core::SpecificEntropy vaporization_of_steam(SteamWord, core::Temperature temperature,
                                            core::Notes const& notes) {
    return core::steam::entropy_of_vaporization(temperature, notes);
}

constexpr const char* at_one_bar = "at 1 bar; ΔS is the difference of the entropies of both phases";

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.FUSION",
         .says = "Entropy of fusion: enthalpy of fusion over the melting temperature.",
         .arguments =
             {{{.name = "what",
                .symbol = "ΔH",
                .says = "enthalpy of fusion, molar, specific or of the whole; or a substance alone",
                .example = "13.81 kJ/mol"},
               {.name = "temperature",
                .symbol = "T",
                .says = "melting temperature",
                .example = "1538 °C"},
               amount,
               show}},
         .forms = {equilibrium,
                   form<fusion_of>("ΔS = S(l) - S(cr), at the melting temperature of the tables",
                                   report, at_one_bar)},
         .examples = {{{"ENTROPY.FUSION(\"18.7 kJ/mol\"; \"1668 °C\")", 9.63346469876104},
                       {"ENTROPY.FUSION(\"Al\")", 11.460887949580531},
                       {"ENTROPY.FUSION(\"397 kJ/kg\"; \"660.3 °C\"; \"2 t\"; \"kJ/K\")",
                        850.6079597193209}}}}),
    describe(
        {.name = "ENTROPY.VAPORIZATION",
         .says = "Entropy of vaporization: enthalpy of vaporization over the boiling temperature.",
         .arguments = {{{.name = "what",
                         .symbol = "ΔH",
                         .says = "enthalpy of vaporization, molar, specific or of the whole; a "
                                 "substance alone, at 1 bar; or `steam`",
                         .example = "40.65 kJ/mol"},
                        {.name = "temperature",
                         .symbol = "T",
                         .says = "boiling temperature at the pressure of the enthalpy",
                         .example = "99.97 °C"},
                        amount,
                        show}},
         .forms = {equilibrium,
                   form<vaporization_of_steam>(
                       "Δs = s″ - s′, of water at the temperature",
                       "International Association for the Properties of Water and Steam, "
                       "R7-97(2012)",
                       "273.15 K to 647.096 K"),
                   form<vaporization_of, vaporization_elsewhere>(
                       "ΔS = S(g) - S(l), at the boiling temperature of the tables", report,
                       at_one_bar)},
         .examples = {{{"ENTROPY.VAPORIZATION(\"40.651 kJ/mol\"; \"373.124 K\")",
                        108.947695672216}}}}),
    describe(
        {.name = "ENTROPY.TRANSITION",
         .says = "Entropy of any first-order transition: its enthalpy over its temperature, above "
                 "zero.",
         .arguments = {{{.name = "what",
                         .symbol = "ΔH",
                         .says =
                             "enthalpy of the transition in the heating direction; or a substance",
                         .example = "0.9 kJ/mol"},
                        {.name = "temperature",
                         .symbol = "T",
                         .says = "temperature of the transition",
                         .example = "912 °C"},
                        amount,
                        show}},
         .forms = {equilibrium,
                   form<transition_of>(
                       "ΔS = S(above) - S(below), at the transition of the tables nearest to T",
                       report, at_one_bar)},
         .examples = {{{"ENTROPY.TRANSITION(\"iron\"; \"900 °C\"; ; \"text\")", 0,
                        "0.7602 J/(mol·K)"},
                       {"ENTROPY.TRANSITION(\"0.9 kJ/mol\"; \"912 °C\")", 0.759397544614606}}}}),
};

} // namespace

std::span<const Entry> phase_change() { return entries; }

} // namespace registration::catalogue
