// SPDX-License-Identifier: MPL-2.0
#include "core/mixing/configurational.h"

#include "core/constants.h"
#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

#include <cmath>
#include <limits>
#include <vector>

namespace {

using namespace core;
using namespace core::mixing;

constexpr double blank = std::numeric_limits<double>::quiet_NaN();

using Values = std::vector<double>;

Table table(Values const& values, std::size_t columns) {
    return {values.data(), values.size() / columns, columns};
}

std::optional<Column<Dimensionless>> sites(Values const& values) {
    return Column<Dimensionless>{values.data(), values.size()};
}

double over_gas_constant(Values const& fractions, std::size_t columns,
                         std::optional<Column<Dimensionless>> sites = std::nullopt) {
    return configurational_entropy(table(fractions, columns), sites) / gas_constant;
}

TEST(ConfigurationalEntropy, OfAnEquiatomicAlloyIsTheLogarithmOfItsElements) {
    EXPECT_DOUBLE_EQ(over_gas_constant({0.2, 0.2, 0.2, 0.2, 0.2}, 1), std::log(5.0));
}

// Spinel with half its tetrahedral and a quarter of its octahedral sites exchanged:
// one tetrahedral site {1/2, 1/2} and two octahedral sites {1/4, 3/4}.
TEST(ConfigurationalEntropy, CountsTheSitesOfEachSublattice) {
    const Values fractions{0.5, 0.25, 0.5, 0.75}, multiplicities{1, 2};
    const double octahedral = 0.25 * std::log(4.0) + 0.75 * std::log(4.0 / 3);
    EXPECT_NEAR(over_gas_constant(fractions, 2, sites(multiplicities)),
                std::log(2.0) + 2 * octahedral, 1e-15);
    EXPECT_NEAR(over_gas_constant(fractions, 2), std::log(2.0) + octahedral, 1e-15);
}

TEST(ConfigurationalEntropy, LeavesBlankCellsOut) {
    EXPECT_DOUBLE_EQ(over_gas_constant({0.5, 1, 0.5, blank}, 2), std::log(2.0));
    EXPECT_EQ(over_gas_constant({1, 1, 0, blank}, 2), 0);
}

TEST(ConfigurationalEntropy, NormalisesFractionsThatWereMoved) {
    EXPECT_DOUBLE_EQ(over_gas_constant({0.55, 0.55}, 1), std::log(2.0));
}

TEST(ConfigurationalEntropy, RefusesWhatCannotBe) {
    expect_refusal(impossible, "-0.1 in sublattice 2", "zero or above", [] {
        over_gas_constant({0.5, 1.1, 0.5, -0.1}, 2);
    });
    expect_refusal(impossible, "sublattice 1 with fractions that are all zero", "above zero", [] {
        over_gas_constant({0, 0}, 1);
    });
    expect_refusal(impossible, "0 sites in sublattice 1", "a number of sites above zero", [] {
        over_gas_constant({0.5, 0.5}, 1, sites(Values{0}));
    });
}

TEST(ConfigurationalEntropy, RefusesWhatDoesNotFit) {
    expect_refusal(unfit, "1 multiplicities and 2 columns", "one multiplicity for each column", [] {
        over_gas_constant({0.5, 0.5, 0.5, 0.5}, 2, sites(Values{1}));
    });
    expect_refusal(unfit, "sublattice 2 without a fraction", "fractions in every column", [] {
        over_gas_constant({0.5, blank, 0.5, blank}, 2);
    });
}

TEST(SumOfSiteFractions, IsOneInEveryColumn) {
    EXPECT_NO_THROW(check_columns_sum_to_one(table({0.5, 1, 0.5, blank}, 2)));
    expect_refusal(unfit, "sublattice 2 with fractions that sum to 0.9", "1 within 1e-6", [] {
        check_columns_sum_to_one(table({0.5, 0.4, 0.5, 0.5}, 2));
    });
}

TEST(ConfigurationalEntropy, TellsEachSublattice) {
    std::vector<std::string> steps;
    const Values fractions{0.5, 0.5};
    configurational_entropy(table(fractions, 1), std::nullopt, Notes(&steps, nullptr));
    EXPECT_EQ(steps, std::vector<std::string>{"sublattice 1: a = 1, -Σ(x · ln(x)) = 0.6931471806"});
}

} // namespace
