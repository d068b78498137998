// SPDX-License-Identifier: MPL-2.0
#include "core/mixing/configurational.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/mixing/disorder.h"
#include "core/sum.h"
#include "core/written.h"

#include <cmath>
#include <string>
#include <vector>

namespace core::mixing {

namespace {

std::string numbered(std::size_t column) { return "sublattice " + std::to_string(column + 1); }

/// The fractions of one sublattice, without its blank cells.
std::vector<double> sublattice(Table fractions, std::size_t column) {
    std::vector<double> x;
    for (std::size_t row = 0; row < fractions.rows; ++row)
        if (const double value = fractions(row, column); !std::isnan(value)) x.push_back(value);
    if (x.empty())
        refuse_unfit(numbered(column) + " without a fraction", "fractions in every column",
                     "leave empty columns out");
    return x;
}

void check_fractions(std::vector<double> const& x, std::size_t column) {
    double sum = 0;
    for (double value : x) {
        if (value < 0)
            refuse_impossible(written(value) + " in " + numbered(column),
                              "fractions of zero or above", "check the sign of the fraction");
        sum += value;
    }
    if (!(sum > 0))
        refuse_impossible(numbered(column) + " with fractions that are all zero",
                          "at least one fraction above zero", "give the fractions of the sites");
}

double multiplicity(std::optional<Column<Dimensionless>> const& sites, std::size_t column) {
    if (!sites) return 1;
    const double a = (*sites)[column];
    if (!(a > 0))
        refuse_impossible(written(a) + " sites in " + numbered(column),
                          "a number of sites above zero", "check the multiplicities");
    return a;
}

void check_sites(Table fractions, std::optional<Column<Dimensionless>> const& sites) {
    if (!sites || sites->size() == fractions.columns) return;
    refuse_unfit(std::to_string(sites->size()) + " multiplicities and " +
                     std::to_string(fractions.columns) + " columns of fractions",
                 "one multiplicity for each column", "give one for each, or leave them out");
}

} // namespace

void check_columns_sum_to_one(Table fractions) {
    for (std::size_t column = 0; column < fractions.columns; ++column) {
        Sum sum;
        for (double value : sublattice(fractions, column)) sum.add(value);
        check_sum(sum.value(), (numbered(column) + " with fractions that sum to ").c_str());
    }
}

MolarEntropy configurational_entropy(Table fractions, std::optional<Column<Dimensionless>> sites,
                                     Notes const& notes) {
    check_sites(fractions, sites);
    Sum sum;
    for (std::size_t column = 0; column < fractions.columns; ++column) {
        const std::vector<double> x = sublattice(fractions, column);
        check_fractions(x, column);
        const Disorder mixed = disorder(x);
        const double per_site = mixed.n_ln_n / mixed.total;
        const double a = multiplicity(sites, column);
        notes.step([&] {
            return numbered(column) + ": a = " + written(a) +
                   ", -Σ(x · ln(x)) = " + written(per_site);
        });
        sum.add(a * per_site);
    }
    return gas_constant * sum.value();
}

} // namespace core::mixing
