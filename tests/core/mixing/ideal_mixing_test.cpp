// SPDX-License-Identifier: MPL-2.0
#include "core/mixing/ideal_mixing.h"

#include "core/constants.h"
#include "core/mixing/disorder.h"
#include "core/substances/formula.h"
#include "tests/core/accuracy.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::mixing;
using accuracy::Exact;

using Values = std::vector<double>;
using Names = std::vector<std::string_view>;

template<class Q>
Column<Q> column(Values const& values) {
    return {values.data(), values.size()};
}

double per_mole(Values const& fractions) {
    return entropy_of_mixing<Molar>(column<Dimensionless>(fractions)).value();
}

Exact exact_per_mole(Values const& amounts) {
    Exact total = 0, sum = 0;
    for (double n : amounts) total += n;
    for (double n : amounts)
        if (n > 0) sum -= n * log(n / total);
    return Exact(gas_constant.value()) * sum / total;
}

TEST(EntropyOfMixing, AgreesWithItsClosedForm) {
    for (auto const& row : published::read_table(PUBLISHED_DIR "/ideal_mixing.csv",
                                                 {"fractions", "value", "unit", "tolerance"}, 5))
        EXPECT_NEAR(per_mole(row.numbers("fractions")), row.number("value"),
                    row.number("tolerance"));
}

TEST(EntropyOfMixing, FollowsTheBasisOfTheAmounts) {
    const double ln4 = std::log(4.0) * 8.31446261815324;
    EXPECT_DOUBLE_EQ(entropy_of_mixing<Total>(column<AmountOfSubstance>({1, 1})).value(), ln4);
    EXPECT_DOUBLE_EQ(entropy_of_mixing<Rate>(column<MolarFlow>({1, 1})).value(), ln4);
}

RC_GTEST_PROP(EntropyOfMixing, KeepsItsDigits, ()) {
    Values amounts;
    const int count = *rc::gen::inRange(1, 8);
    for (int i = 0; i < count; ++i) amounts.push_back(random_states::between(1e-12, 1));
    RC_ASSERT(per_mole(amounts) >= 0);
    RC_ASSERT(count == 1 || accuracy::ulps(per_mole(amounts), exact_per_mole(amounts)) <= 5.0);
}

RC_GTEST_PROP(EntropyOfMixing, KeepsItsDigitsForTraces, ()) {
    const double trace = random_states::between(1e-18, 1e-3);
    RC_ASSERT(accuracy::ulps(per_mole({1, trace}), exact_per_mole({1, trace})) <= 4.0);
}

RC_GTEST_PROP(EntropyOfMixing, IsLargestForEqualAmounts, ()) {
    Values amounts;
    for (int i = 0; i < 5; ++i) amounts.push_back(random_states::between(1e-3, 1));
    RC_ASSERT(per_mole(amounts) <= 8.31446261815324 * std::log(5.0) * (1 + 1e-15));
}

RC_GTEST_PROP(EntropyOfMixing, CanBeDoneInTwoSteps, ()) {
    const double a = random_states::between(0.01, 10), b = random_states::between(0.01, 10),
                 c = random_states::between(0.01, 10);
    const auto mixed = [](Values const& n) {
        return entropy_of_mixing<Total>(column<AmountOfSubstance>(n)).value();
    };
    // First a with b; then that with c, where c is new to both parts of the mixture alike.
    RC_ASSERT(std::abs(mixed({a, b, c}) - mixed({a, b}) - mixed({a + b, c})) <= 1e-12);
}

TEST(EntropyOfMixing, OfOneSubstanceIsZero) {
    EXPECT_EQ(per_mole({1}), 0);
    EXPECT_EQ(per_mole({1, 0, 0}), 0);
}

TEST(EntropyOfMixing, NormalisesFractionsThatWereMoved) {
    EXPECT_NEAR(per_mole({0.5, 0.6}), per_mole({0.5 / 1.1, 0.6 / 1.1}), 1e-14);
}

TEST(EntropyOfMixing, RefusesAmountsThatCannotBe) {
    expect_refusal(impossible, "-1 mol in row 2", "zero or above", [] {
        entropy_of_mixing<Total>(column<AmountOfSubstance>({1, -1}));
    });
    expect_refusal(impossible, "all zero", "above zero", [] {
        entropy_of_mixing<Total>(column<AmountOfSubstance>({0, 0}));
    });
}

TEST(EntropyOfMixing, TellsTheFractions) {
    std::vector<std::string> steps;
    entropy_of_mixing<Total>(column<AmountOfSubstance>({1, 3}), Notes(&steps, nullptr));
    EXPECT_EQ(steps, (std::vector<std::string>{"x1 = 0.25", "x2 = 0.75"}));
}

TEST(EntropyOfMixingMasses, EqualsThatOfTheAmounts) {
    const Names names{"N2", "O2"};
    const double n2 = 0.028014, o2 = 0.031998;
    const double expected =
        entropy_of_mixing<Total>(column<AmountOfSubstance>({0.79, 0.21})).value();
    const Values masses{0.79 * n2, 0.21 * o2};
    EXPECT_NEAR(entropy_of_mixing_masses<Total>(column<Mass>(masses), names).value(), expected,
                1e-14);
    EXPECT_NEAR(entropy_of_mixing_masses<Rate>(column<MassFlow>(masses), names).value(), expected,
                1e-14);
    const double whole = masses[0] + masses[1];
    EXPECT_NEAR(entropy_of_mixing_masses<Specific>(
                    column<Dimensionless>({masses[0] / whole, masses[1] / whole}), names)
                    .value(),
                expected / whole, 1e-12);
}

TEST(EntropyOfMixingMasses, RemarksAFormulaThatStandsTwice) {
    std::vector<std::string> remarks;
    entropy_of_mixing_masses<Total>(column<Mass>({1, 1, 1}), Names{"C2H6O", "H2O", "C2H6O"},
                                    Notes(nullptr, &remarks));
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_NE(remarks[0].find("C2H6O stands in several rows"), std::string::npos);
}

TEST(EntropyOfMixingMasses, RefusesColumnsOfDifferentLength) {
    expect_refusal(unfit, "masses in 2 rows and substances in 1", "one substance for each mass",
                   [] {
                       entropy_of_mixing_masses<Total>(column<Mass>({1, 1}), Names{"H2O"});
                   });
}

TEST(EntropyOfMixingMasses, RefusesWhatIsNoFormula) {
    expect_refusal(unfit, "Xx2", "`Xx` is not", [] {
        entropy_of_mixing_masses<Total>(column<Mass>({1, 1}), Names{"H2O", "Xx2"});
    });
}

TEST(WorkOfSeparation, IsTheEntropyOfMixingAtTheSurroundings) {
    const Temperature t0 = Temperature::kelvin(300);
    EXPECT_DOUBLE_EQ(work_of_separation<Total>(column<AmountOfSubstance>({1, 1}), t0).value(),
                     300 * 8.31446261815324 * std::log(4.0));
    EXPECT_DOUBLE_EQ(work_of_separation<Molar>(column<Dimensionless>({0.5, 0.5}), t0).value(),
                     300 * 8.31446261815324 * std::log(2.0));
    const Names names{"H2O", "NaCl"};
    EXPECT_EQ(work_of_separating_masses<Specific>(column<Dimensionless>({0.965, 0.035}), t0, names),
              absolute(t0) *
                  entropy_of_mixing_masses<Specific>(column<Dimensionless>({0.965, 0.035}), names));
}

TEST(MoleFractions, SumToOneAndGiveTheMassesBack) {
    const Names names{"Fe", "Cr", "Ni"};
    const Values w{0.70, 0.19, 0.11};
    const std::vector<double> x = mole_fractions(column<Dimensionless>(w), names);
    EXPECT_NEAR(x[0] + x[1] + x[2], 1, 1e-15);
    const double m[] = {55.845, 51.996, 58.693};
    const double mean = x[0] * m[0] + x[1] * m[1] + x[2] * m[2];
    for (std::size_t i = 0; i < 3; ++i) EXPECT_NEAR(x[i] * m[i] / mean, w[i], 1e-15);
}

TEST(SumOfFractions, IsOneWithinAMillionth) {
    EXPECT_NO_THROW(check_sum_to_one(column<Dimensionless>({0.333333, 0.333333, 0.333333})));
    EXPECT_NO_THROW(check_sum_to_one(column<Dimensionless>({0.5, 0.500001})));
    expect_refusal(unfit, "fractions that sum to 1.000002", "1 within 1e-6", [] {
        check_sum_to_one(column<Dimensionless>({0.5, 0.500002}));
    });
    expect_refusal(unfit, "fractions that sum to 0.99", "1 within 1e-6", [] {
        check_sum_to_one(column<Dimensionless>({0.33, 0.33, 0.33}));
    });
}

} // namespace
