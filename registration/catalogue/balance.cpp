// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/balance/available_work.h"
#include "core/balance/second_law.h"
#include "registration/catalogue/shared_arguments.h"

namespace registration::catalogue {
namespace {

using namespace core::balance;
using core::Column, core::Energy, core::Entropy, core::Molar, core::NonNegative, core::Notes,
    core::On, core::Rate, core::Specific, core::Temperature, core::Total, core::Uncertain;

const char* name_of(Verdict verdict) {
    switch (verdict) {
    case Verdict::irreversible:
        return "irreversible";
    case Verdict::reversible_within_the_tolerance:
        return "reversible within the tolerance";
    case Verdict::impossible:
        return "impossible";
    }
    return "";
}

template<class Basis>
std::string verdict(Column<Uncertain<On<Entropy, Basis>>> changes,
                    std::optional<Column<Uncertain<On<Energy, Basis>>>> heats,
                    std::optional<Column<Uncertain<Temperature>>> temperatures,
                    std::optional<NonNegative<On<Entropy, Basis>>> tolerance, Notes const& notes) {
    return name_of(second_law_verdict<Basis>(changes, heats, temperatures, tolerance, notes));
}

constexpr Argument changes{.name = "changes",
                           .symbol = "ΔS",
                           .says = "a column of the entropy changes of everything that takes part",
                           .example = "D5:D12"};
constexpr Argument heats{.name = "heats",
                         .symbol = "Q",
                         .says = "a column of heats, counted into the system",
                         .example = "F5:F8",
                         .beside = "temperatures"};
constexpr Argument temperatures{.name = "temperatures",
                                .symbol = "T",
                                .says = "temperatures of the boundary where each heat crosses",
                                .example = "G5:G8",
                                .beside = "heats"};
constexpr const char* second_law = "second law, Sgen = ΔS - Σ(Q / T) (Clausius 1865)";
constexpr const char* carnot = "Carnot 1824, with thermodynamic temperatures";
constexpr Argument hot{
    .name = "hot", .symbol = "Th", .says = "temperature of the hot reservoir", .example = "550 °C"};
constexpr Argument cold{.name = "cold",
                        .symbol = "Tc",
                        .says = "temperature of the cold reservoir",
                        .example = "20 °C"};

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.GENERATED",
         .says = "Entropy generated in a balance: all changes, less what the heats brought in; the "
                 "signed number always.",
         .arguments = {{changes, heats, temperatures, show}},
         .forms = {form<entropy_generated<Total>, entropy_generated<Rate>, entropy_generated<Molar>,
                        entropy_generated<Specific>>(
             "Sgen = Σ(ΔS) - Σ(Q / T), heats counted into the system", second_law,
             "every change and every heat of the system is in the columns")},
         .examples = {{{"ENTROPY.GENERATED({\"J/K\"|-2|3.3333333333333335})", 1.3333333333333335},
                       {"ENTROPY.GENERATED({\"J/K\"|1.5}; {\"J\"|1000|-600}; {\"K\"|500|300})",
                        1.5}}}}),
    describe(
        {.name = "SECONDLAW.VERDICT",
         .says = "What the second law says of a balance: irreversible, reversible within the "
                 "tolerance, or impossible.",
         .arguments =
             {{changes,
               heats,
               temperatures,
               {.name = "tolerance",
                .symbol = "tolerance",
                .says = "what may still count as zero, beyond rounding and twice the uncertainty",
                .example = "0.1 W/K"},
               show}},
         .forms = {form<verdict<Total>, verdict<Rate>, verdict<Molar>, verdict<Specific>>(
             "Sgen = Σ(ΔS) - Σ(Q / T), judged by 1e-12 of the magnitudes + 2 · u + tolerance",
             second_law,
             "every change and every heat of the system is in the columns; inputs independent")},
         .examples = {{{"SECONDLAW.VERDICT({\"J/K\"|-2|3.3})", 0, "irreversible"},
                       {"SECONDLAW.VERDICT({\"J/K\"|-2|1.9})", 0, "impossible"},
                       {"SECONDLAW.VERDICT({\"J/K\"|-2|1.9}; ; ; \"0.2 J/K\")", 0,
                        "reversible within the tolerance"}}}}),
    describe(
        {.name = "WORK.LOST",
         .says = "Work lost to entropy generated (Gouy and Stodola).",
         .arguments = {{{.name = "generated",
                         .symbol = "Sgen",
                         .says = "entropy generated, 0 or more",
                         .example = "12.5 W/K"},
                        surroundings,
                        show}},
         .forms = {form<lost_work<Total>, lost_work<Rate>, lost_work<Molar>, lost_work<Specific>>(
             "W = T0 · Sgen", "Gouy 1889, Stodola 1905", "surroundings so large that T0 stays")},
         .examples = {{{"WORK.LOST(\"12.5 W/K\"; \"25 °C\")", 3726.875}}}}),
    describe({.name = "EXERGY.HEAT",
              .says = "Exergy of heat: the work it could give against the surroundings.",
              .arguments = {{{.name = "heat",
                              .symbol = "Q",
                              .says = "heat: energy, power, molar or specific",
                              .example = "250 kW"},
                             {.name = "temperature",
                              .symbol = "T",
                              .says = "temperature at which the heat is given or taken",
                              .example = "180 °C"},
                             surroundings,
                             show}},
              .forms = {form<exergy_of_heat<Total>, exergy_of_heat<Rate>, exergy_of_heat<Molar>,
                             exergy_of_heat<Specific>>(
                  "W = Q · (T - T0) / T", "Carnot's theorem between T and T0",
                  "constant T; negative where heat is taken up below T0")},
              .examples = {{{"EXERGY.HEAT(\"1000 J\"; \"500 K\"; \"300 K\")", 400}}}}),
    describe({.name = "CARNOT.EFFICIENCY",
              .says = "Largest efficiency of a heat engine between two reservoirs.",
              .arguments = {{hot, cold, show}},
              .forms = {form<carnot_efficiency>("η = (Th - Tc) / Th", carnot,
                                                "reservoirs of constant temperature")},
              .examples = {{{"CARNOT.EFFICIENCY(\"800 K\"; \"300 K\")", 0.625},
                            {"CARNOT.EFFICIENCY(\"800 K\"; \"300 K\"; \"%\")", 62.5}}}}),
    describe({.name = "CARNOT.COOLING",
              .says = "Largest coefficient of performance of a refrigerating machine.",
              .arguments = {{hot, cold, show}},
              .forms = {form<carnot_cooling>("ε = Tc / (Th - Tc)", carnot,
                                             "reservoirs of constant temperature")},
              .examples = {{{"CARNOT.COOLING(\"308 K\"; \"268 K\")", 6.7}}}}),
    describe({.name = "CARNOT.HEATING",
              .says = "Largest coefficient of performance of a heat pump.",
              .arguments = {{hot, cold, show}},
              .forms = {form<carnot_heating>("ε = Th / (Th - Tc)", carnot,
                                             "reservoirs of constant temperature")},
              .examples = {{{"CARNOT.HEATING(\"308 K\"; \"268 K\")", 7.7}}}}),
};

} // namespace

std::span<const Entry> balance() { return entries; }

} // namespace registration::catalogue
