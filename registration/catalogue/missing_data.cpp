// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/debye.h"

namespace registration::catalogue {
namespace {

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.DEBYE",
         .says =
             "Entropy of a Debye crystal, per mole of atoms, for solids without tabulated data.",
         .arguments =
             {{{.name = "debye_temperature",
                .symbol = "θ",
                .says = "Debye temperature of the solid",
                .example = "428 K"},
               {.name = "temperature", .symbol = "T", .says = "temperature", .example = "25 °C"},
               show}},
         .forms = {form<core::processes::debye_entropy>(
             "S = R · (4 · D(θ / T) - 3 · ln(1 - exp(-θ / T))), D the third Debye function",
             "P. Debye, Ann. Phys. 344 (1912) 789; R of CODATA 2018",
             "lattice vibrations only: no electrons, magnetism or expansion")},
         .examples = {{{"ENTROPY.DEBYE(\"400 K\"; \"298.15 K\")", 27.015397596354934}}}}),
};

} // namespace

std::span<const Entry> missing_data() { return entries; }

} // namespace registration::catalogue
