// SPDX-License-Identifier: MPL-2.0
#include "core/mixing/ideal_mixing.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/mixing/disorder.h"
#include "core/substances/formula.h"
#include "core/sum.h"
#include "core/written.h"

#include <algorithm>
#include <cstddef>
#include <string>
#include <type_traits>

namespace core::mixing {

namespace {

template<class Q>
void check_amounts(Column<Q> amounts) {
    bool any = false;
    for (std::size_t row = 0; row < amounts.size(); ++row) {
        if (!(amounts[row] >= Q{}))
            refuse_impossible(written(amounts[row]) + " in row " + std::to_string(row + 1),
                              "amounts of zero or above", "check the sign of the amount");
        any = any || amounts[row] > Q{};
    }
    if (!any)
        refuse_impossible("amounts that are all zero", "at least one amount above zero",
                          "give the amounts of what is mixed");
}

template<class Q>
std::span<const double> numbers(Column<Q> column) {
    return {column.si, column.count};
}

void note_fractions(std::span<const double> amounts, double total, Notes const& notes) {
    for (std::size_t row = 0; row < amounts.size(); ++row)
        notes.step(
            [&] { return 'x' + std::to_string(row + 1) + " = " + written(amounts[row] / total); });
}

void note_same_formula(Formulas substances, Notes const& notes) {
    std::vector<std::string_view> sorted(substances.begin(), substances.end());
    std::sort(sorted.begin(), sorted.end());
    const auto twice = std::adjacent_find(sorted.begin(), sorted.end());
    if (twice == sorted.end()) return;
    notes.remark([&] {
        return std::string(*twice) + " stands in several rows, which are taken as substances that "
                                     "differ, such as isomers; one substance mixed with itself "
                                     "gains no entropy";
    });
}

/// n = m / M, row by row.
template<class Q>
std::vector<double> moles(Column<Q> masses, Formulas substances, Notes const& notes) {
    if (masses.size() != substances.size())
        refuse_unfit("masses in " + std::to_string(masses.size()) + " rows and substances in " +
                         std::to_string(substances.size()),
                     "one substance for each mass", "give both columns with the same rows");
    check_amounts(masses);
    note_same_formula(substances, notes);
    std::vector<double> n(masses.size());
    for (std::size_t row = 0; row < masses.size(); ++row) {
        const MolarMass molar_mass = substances::molar_mass(substances[row]);
        n[row] = (masses[row] / molar_mass).value();
        notes.step(
            [&] { return "M(" + std::string(substances[row]) + ") = " + written(molar_mass); });
    }
    return n;
}

double sum_of(std::span<const double> values) {
    Sum sum;
    for (double value : values) sum.add(value);
    return sum.value();
}

/// The mixture that an entropy per mole or per kilogram belongs to, 1 for a whole amount.
template<class Basis>
double whole(double total) {
    constexpr bool fractions = std::is_same_v<Basis, Molar> || std::is_same_v<Basis, Specific>;
    return fractions ? total : 1;
}

} // namespace

void check_sum_to_one(Column<Dimensionless> fractions) {
    check_sum(sum_of(numbers(fractions)), "fractions that sum to ");
}

template<class Basis>
On<Entropy, Basis> entropy_of_mixing(Column<On<AmountOfSubstance, Basis>> amounts,
                                     Notes const& notes) {
    check_amounts(amounts);
    const Disorder mixed = disorder(numbers(amounts));
    note_fractions(numbers(amounts), mixed.total, notes);
    return gas_constant *
           On<AmountOfSubstance, Basis>::from_value(mixed.n_ln_n / whole<Basis>(mixed.total));
}

template<class Basis>
On<Entropy, Basis> entropy_of_mixing_masses(Column<On<Mass, Basis>> masses, Formulas substances,
                                            Notes const& notes) {
    const std::vector<double> n = moles(masses, substances, notes);
    const Disorder mixed = disorder(n);
    note_fractions(n, mixed.total, notes);
    return gas_constant * On<AmountOfSubstance, Basis>::from_value(
                              mixed.n_ln_n / whole<Basis>(sum_of(numbers(masses))));
}

template<class Basis>
On<Energy, Basis> work_of_separation(Column<On<AmountOfSubstance, Basis>> amounts,
                                     Temperature surroundings, Notes const& notes) {
    const On<Entropy, Basis> mixing = entropy_of_mixing<Basis>(amounts, notes);
    notes.step([&] { return "ΔS = -R · Σ(n · ln(x)) = " + written(mixing); });
    return absolute(surroundings) * mixing;
}

template<class Basis>
On<Energy, Basis> work_of_separating_masses(Column<On<Mass, Basis>> masses,
                                            Temperature surroundings, Formulas substances,
                                            Notes const& notes) {
    const On<Entropy, Basis> mixing = entropy_of_mixing_masses<Basis>(masses, substances, notes);
    notes.step([&] { return "ΔS = -R · Σ(n · ln(x)) = " + written(mixing); });
    return absolute(surroundings) * mixing;
}

std::vector<double> mole_fractions(Column<Dimensionless> mass_fractions, Formulas substances,
                                   Notes const& notes) {
    std::vector<double> x = moles(mass_fractions, substances, notes);
    const double total = sum_of(x);
    for (double& value : x) value /= total;
    return x;
}

template On<Entropy, Total> entropy_of_mixing<Total>(Column<AmountOfSubstance>, Notes const&);
template On<Entropy, Rate> entropy_of_mixing<Rate>(Column<MolarFlow>, Notes const&);
template On<Entropy, Molar> entropy_of_mixing<Molar>(Column<Dimensionless>, Notes const&);

template On<Entropy, Total> entropy_of_mixing_masses<Total>(Column<Mass>, Formulas, Notes const&);
template On<Entropy, Rate> entropy_of_mixing_masses<Rate>(Column<MassFlow>, Formulas, Notes const&);
template On<Entropy, Specific> entropy_of_mixing_masses<Specific>(Column<Dimensionless>, Formulas,
                                                                  Notes const&);

template On<Energy, Total> work_of_separation<Total>(Column<AmountOfSubstance>, Temperature,
                                                     Notes const&);
template On<Energy, Rate> work_of_separation<Rate>(Column<MolarFlow>, Temperature, Notes const&);
template On<Energy, Molar> work_of_separation<Molar>(Column<Dimensionless>, Temperature,
                                                     Notes const&);

template On<Energy, Total> work_of_separating_masses<Total>(Column<Mass>, Temperature, Formulas,
                                                            Notes const&);
template On<Energy, Rate> work_of_separating_masses<Rate>(Column<MassFlow>, Temperature, Formulas,
                                                          Notes const&);
template On<Energy, Specific>
work_of_separating_masses<Specific>(Column<Dimensionless>, Temperature, Formulas, Notes const&);

} // namespace core::mixing
