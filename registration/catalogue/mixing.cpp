// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/mixing/configurational.h"
#include "core/mixing/ideal_mixing.h"
#include "registration/catalogue/shared_arguments.h"

namespace registration {

/// Mole fractions: plain numbers or mol%. The sum is checked on what is stated, never while one of
/// them is moved.
struct MoleFractions {
    core::Column<core::Dimensionless> values;
};
/// Mass fractions: wt%.
struct MassFractions {
    core::Column<core::Dimensionless> values;
};
/// Fractions that the argument's name alone says to be mass fractions: plain numbers.
struct PlainFractions {
    core::Column<core::Dimensionless> values;
};
/// Site fractions, one column a sublattice.
struct SiteFractions {
    core::Table values;
};

template<class Fractions, Share share>
struct fractions_argument {
    static constexpr Need need{.share = share, .whole = true};
    struct Rows {
        Rows(Given const& given, int index) : column(given, index) {}
        Fractions operator[](std::size_t row) const { return {column[row]}; }
        argument<core::Column<core::Dimensionless>>::Rows column;
    };
    static void check(Given const& given) {
        core::mixing::check_sum_to_one({given.numbers().si.data(), given.numbers().count()});
    }
};
template<>
struct argument<MoleFractions> : fractions_argument<MoleFractions, Share::mole> {};
template<>
struct argument<MassFractions> : fractions_argument<MassFractions, Share::mass> {};
template<>
struct argument<PlainFractions> : fractions_argument<PlainFractions, Share::none> {};
template<>
struct argument<SiteFractions> {
    static constexpr Need need = argument<core::Table>::need;
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        SiteFractions operator[](std::size_t) const { return {given_->table()}; }
        Given const* given_;
    };
    static void check(Given const& given) { core::mixing::check_columns_sum_to_one(given.table()); }
};

namespace catalogue {
namespace {

using namespace core::mixing;
using core::AmountOfSubstance, core::Column, core::Formulas, core::Mass, core::Molar, core::Notes,
    core::On, core::Rate, core::Specific, core::Temperature, core::Total;

core::MolarEntropy mixing_of_fractions(MoleFractions fractions, Notes const& notes) {
    return entropy_of_mixing<Molar>(fractions.values, notes);
}
core::SpecificEntropy mixing_of_mass_fractions(MassFractions fractions, Formulas substances,
                                               Notes const& notes) {
    return entropy_of_mixing_masses<Specific>(fractions.values, substances, notes);
}
core::MolarEnergy separation_of_fractions(MoleFractions fractions, Temperature surroundings,
                                          Notes const& notes) {
    return work_of_separation<Molar>(fractions.values, surroundings, notes);
}
core::SpecificEnergy separation_of_mass_fractions(MassFractions fractions, Temperature surroundings,
                                                  Formulas substances, Notes const& notes) {
    return work_of_separating_masses<Specific>(fractions.values, surroundings, substances, notes);
}
core::MolarEntropy configurational(SiteFractions fractions,
                                   std::optional<Column<core::Dimensionless>> sites,
                                   Notes const& notes) {
    return configurational_entropy(fractions.values, sites, notes);
}
std::vector<double> fractions_of_masses(Column<Mass> masses, Formulas substances,
                                        Notes const& notes) {
    return mole_fractions({masses.si, masses.count}, substances, notes);
}
template<class Fractions>
std::vector<double> fractions_of_mass_fractions(Fractions fractions, Formulas substances,
                                                Notes const& notes) {
    return mole_fractions(fractions.values, substances, notes);
}

constexpr Argument amounts{.name = "amounts",
                           .symbol = "n",
                           .says = "a column of amounts, flows or fractions of the parts",
                           .example = "C5:C8"};
constexpr const char* gibbs = "entropy of ideal mixing (Gibbs 1876), R of CODATA 2018";
constexpr const char* gibbs_valid =
    "ideal mixture of parts that differ, at one temperature and pressure";
constexpr const char* weights = "entropy of ideal mixing (Gibbs 1876), R of CODATA 2018; standard "
                                "atomic weights 2021, abridged (Pure Appl. Chem. 94 (2022) 573)";

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.MIXING",
         .says = "Entropy of ideal mixing of a whole column of amounts, flows or fractions.",
         .arguments = {{amounts, mixed_substances, show}},
         .forms = {form<entropy_of_mixing<Total>, entropy_of_mixing<Rate>>(
                       "ΔS = -R · Σ(n · ln(n / Σ(n)))", gibbs, gibbs_valid),
                   form<mixing_of_fractions>("ΔS = -R · Σ(n · ln(n))", gibbs,
                                             "mole fractions; the result is per mole of mixture"),
                   form<entropy_of_mixing_masses<Total>, entropy_of_mixing_masses<Rate>>(
                       "ΔS = -R · Σ(m / M · ln(x)), x = (m / M) / Σ(m / M)", weights, gibbs_valid),
                   form<mixing_of_mass_fractions>(
                       "ΔS = -R · Σ(w / M · ln(x)), x = (w / M) / Σ(w / M)", weights,
                       "mass fractions; the result is per kilogram of mixture")},
         .examples = {{{"ENTROPY.MIXING({0.79|0.21})", 4.273273525197419},
                       {"ENTROPY.MIXING({\"mol\"|2|3})", 27.978651734647293}}}}),
    describe(
        {.name = "ENTROPY.CONFIGURATIONAL",
         .says = "Configurational entropy of an alloy or compound, per mole of formula units.",
         .arguments = {{{.name = "fractions",
                         .symbol = "x",
                         .says = "site fractions, one column a sublattice, each summing to 1",
                         .example = "C5:D9"},
                        {.name = "sites",
                         .symbol = "a",
                         .says = "how many sites each sublattice has, a row; 1 if left out",
                         .example = "C4:D4"},
                        show}},
         .forms = {form<configurational>(
             "ΔS = -R · Σ(a · Σ(x · ln(x))), x in one column a sublattice",
             "Boltzmann 1877, R of CODATA 2018", "random occupation within each sublattice")},
         .examples = {{{"ENTROPY.CONFIGURATIONAL({0.2|0.2|0.2|0.2|0.2})", 13.381611359171917}}}}),
    describe({.name = "WORK.SEPARATION",
              .says = "Least work that separates an ideal mixture into its parts.",
              .arguments = {{amounts, surroundings, mixed_substances, show}},
              .forms = {form<work_of_separation<Total>, work_of_separation<Rate>>(
                            "W = -T0 · R · Σ(n · ln(n / Σ(n)))", gibbs, gibbs_valid),
                        form<separation_of_fractions>(
                            "W = -T0 · R · Σ(n · ln(n))", gibbs,
                            "mole fractions; the result is per mole of mixture"),
                        form<work_of_separating_masses<Total>, work_of_separating_masses<Rate>>(
                            "W = -T0 · R · Σ(m / M · ln(x)), x = (m / M) / Σ(m / M)", weights,
                            gibbs_valid),
                        form<separation_of_mass_fractions>(
                            "W = -T0 · R · Σ(w / M · ln(x)), x = (w / M) / Σ(w / M)", weights,
                            "mass fractions; the result is per kilogram of mixture")},
              .examples = {{{"WORK.SEPARATION({0.79|0.21}; \"25 °C\")", 1274.0765015376105}}}}),
    describe(
        {.name = "FRACTION.MOLE",
         .says = "Mole fractions from mass fractions or masses: a column.",
         .arguments = {{{.name = "mass_fractions",
                         .symbol = "w",
                         .says = "a column of mass fractions in wt%, or of masses",
                         .example = "C4:C8"},
                        {.name = "substances",
                         .symbol = "substance",
                         .says = "chemical formulas, one beside each fraction",
                         .example = "B5:B8",
                         .beside = "mass_fractions"},
                        show}},
         .forms = {form<fractions_of_mass_fractions<MassFractions>,
                        fractions_of_mass_fractions<PlainFractions>, fractions_of_masses>(
             "x = (w / M) / Σ(w / M), for every row", "definition; standard atomic weights 2021, "
                                                      "abridged (Pure Appl. Chem. 94 (2022) 573)")},
         .examples = {{{"FRACTION.MOLE({\"kg\"|28.014|2.016}; {\"N2\"|\"H2\"})", 0.5}}}}),
};

} // namespace

std::span<const Entry> mixing() { return entries; }

} // namespace catalogue
} // namespace registration
