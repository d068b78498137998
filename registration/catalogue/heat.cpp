// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/heat.h"

namespace registration::catalogue {
namespace {

using namespace core::processes;
using core::Flux, core::Molar, core::Rate, core::Specific, core::Total;

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.HEAT",
         .says = "Entropy that heat carries across a boundary at the temperature of the boundary.",
         .arguments = {{{.name = "heat",
                         .symbol = "Q",
                         .says = "heat crossing the boundary: energy, power, molar or specific",
                         .example = "2.5 MJ"},
                        {.name = "temperature",
                         .symbol = "T1",
                         .says = "temperature of the boundary, or its first one",
                         .example = "350 °C"},
                        {.name = "end_temperature",
                         .symbol = "T2",
                         .says = "last temperature of a gliding boundary",
                         .example = "40 °C"},
                        show}},
         .forms = {form<heat_transfer<Total>, heat_transfer<Rate>, heat_transfer<Molar>,
                        heat_transfer<Specific>>(
                       "ΔS = Q / T1", "definition of entropy, dS = δQ / T (Clausius 1865)",
                       "T1 is the temperature where the heat crosses"),
                   form<gliding_heat_transfer<Total>, gliding_heat_transfer<Rate>,
                        gliding_heat_transfer<Molar>, gliding_heat_transfer<Specific>>(
                       "ΔS = Q · ln(T2 / T1) / (T2 - T1)",
                       "integral of dS = δQ / T with δQ = Q · dT / (T2 - T1)",
                       "equal parts of the heat cross at equal steps of temperature")},
         .examples = {{{"ENTROPY.HEAT(\"2.5 MJ\"; \"350 °C\")", 4011.8751504453185},
                       {"ENTROPY.HEAT(\"-100 kW\"; \"90 °C\"; \"40 °C\")", -296.26732616151054}}}}),
    describe({.name = "ENTROPY.BLACKBODY",
              .says = "Entropy of all radiation that leaves a black surface one way; not for net "
                      "exchange, where the body changes by Q / T.",
              .arguments = {{{.name = "emitted",
                              .symbol = "E",
                              .says = "energy, power or power per area emitted by the surface",
                              .example = "5 kW"},
                             {.name = "temperature",
                              .symbol = "T",
                              .says = "temperature of the surface",
                              .example = "1200 K"},
                             show}},
              .forms = {form<blackbody_radiation<Total>, blackbody_radiation<Rate>,
                             blackbody_radiation<Flux>>(
                  "S = 4 · E / (3 · T)", "M. Planck, Theorie der Wärmestrahlung (1906)",
                  "black surface, all directions, one way")},
              .examples = {{{"ENTROPY.BLACKBODY(\"5 kW\"; \"1200 K\")", 5.555555555555555}}}}),
};

} // namespace

std::span<const Entry> heat() { return entries; }

} // namespace registration::catalogue
