// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/substances/formula.h"

namespace registration::catalogue {
namespace {

constexpr Entry entries[] = {
    describe({.name = "MOLAR.MASS",
              .says = "Molar mass of a chemical formula, with brackets and hydrates.",
              .arguments = {{{.name = "formula",
                              .symbol = "formula",
                              .says = "chemical formula",
                              .example = "CuSO4·5H2O"},
                             show}},
              .forms = {form<core::substances::molar_mass>(
                  "M = Σ(count · atomic weight), over the elements of the formula",
                  "standard atomic weights 2021, abridged: T. Prohaska et al., Pure Appl. Chem. 94 "
                  "(2022) 573, Table 1",
                  "material of ordinary terrestrial origin")},
              .examples = {{{"MOLAR.MASS(\"H2O\"; \"g/mol\")", 18.015},
                            {"MOLAR.MASS(\"CuSO4·5H2O\"; \"g/mol\")", 249.677}}}}),
};

} // namespace

std::span<const Entry> formulas() { return entries; }

} // namespace registration::catalogue
