// SPDX-License-Identifier: MPL-2.0
#include "core/substances/gas.h"

#include "core/substances/heating.h"
#include "tests/core/expect_refusal.h"
#include "tests/core/random_states.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace {

using namespace core;
using namespace core::substances;

constexpr double gas_constant_of_2019 = 8.31446261815324;

Temperature kelvin(double value) { return Temperature::kelvin(value); }
double kelvin(Temperature t) { return absolute(t).value(); }
Positive<Pressure> pascal(double value) { return {Pressure::from_value(value)}; }

TEST(Gas, IsReadFromText) {
    EXPECT_EQ(read_gas("N2").components().size(), 1u);
    EXPECT_EQ(read_gas("0.79 N2 + 0.21 O2").written(), "0.79 N2(g) + 0.21 O2(g)");
    EXPECT_EQ(read_gas("0.79 nitrogen + 0.21 oxygen").written(), "0.79 N2(g) + 0.21 O2(g)");
    EXPECT_EQ(read_gas("1/2 methanol + ½ H2O").written(), "0.5 CH3OH(g) + 0.5 H2O(g)");
    EXPECT_EQ(read_gas("0.4 1-butene + 0.6 1,3-butadiene").components().size(), 2u);
    EXPECT_NO_THROW(read_gas("0.333333 H2 + 0.666667 N2"));
}

void expect_unfit(std::string_view text, std::string const& needed) {
    expect_refusal(unfit, "", needed, [&] { read_gas(text); });
}

TEST(Gas, IsRefusedWhereItIsNone) {
    expect_unfit("0.79 N2 + 0.2 O2", "sum to 1");
    expect_unfit("0.5 N2", "sum to 1");
    expect_unfit("0.5 N2 + 0.5 N2", "each gas once");
    expect_unfit("0.5 N2 + 0.5 H2O(l)", "gases only");
    expect_unfit("0.5 N2 + 0.5 CaO", "a state that is tabulated");
    expect_unfit("0.5 N2 +", "a substance between");
    expect_unfit("0.79 N2 + 0.21 Xy", "a substance of the tables");
    expect_unfit("", "a substance between");
    expect_unfit(std::string(1001, 'N'), "1000 characters");
}

// 0.79·28.014 + 0.21·31.998 g/mol; -R Σ x ln x of 0.79 and 0.21 is 4.2734 J/(mol K).
TEST(Gas, HasTheMeansOfItsComponents) {
    const Gas air = read_gas("0.79 N2 + 0.21 O2");
    EXPECT_NEAR(air.molar_mass().value(), 0.02885064, 1e-12);
    const Temperature t = kelvin(500);
    const Substance n2 = find_substance("N2"), o2 = find_substance("O2");
    EXPECT_NEAR(air.heat_capacity(t).value(),
                0.79 * n2.heat_capacity(t).value() + 0.21 * o2.heat_capacity(t).value(), 1e-12);
    EXPECT_NEAR(air.enthalpy(t).value(),
                0.79 * n2.enthalpy(t).value() + 0.21 * o2.enthalpy(t).value(), 1e-9);
    const double mixing = -gas_constant_of_2019 * (0.79 * std::log(0.79) + 0.21 * std::log(0.21));
    EXPECT_NEAR(entropy_standard_of_gas(air, t, std::nullopt).value(),
                0.79 * n2.entropy(t).value() + 0.21 * o2.entropy(t).value() + mixing, 1e-11);
    EXPECT_EQ(kelvin(air.from()), 200);
    expect_refusal(impossible, "100 K", "from 200 K to 20000 K",
                   [&] { air.heat_capacity(kelvin(100)); });
}

TEST(Gas, HasTheEntropyOfThePublishedAirTable) {
    const auto rows =
        published::read_table(PUBLISHED_DIR "/air_entropy.csv", {"temperature", "entropy"}, 17);
    const Gas air = read_gas("air");
    const double at_300 = rows[2].number("entropy");
    ASSERT_EQ(rows[2].number("temperature"), 300);
    for (auto const& row : rows) {
        const double s = (entropy_of_gas(air, kelvin(300), pascal(1e5),
                                         kelvin(row.number("temperature")), pascal(1e5)) /
                          air.molar_mass())
                             .value() /
                         1000;
        EXPECT_NEAR(s, row.number("entropy") - at_300, 0.0035) << row.number("temperature");
    }
}

// M. J. Moran, H. N. Shapiro, Fundamentals of Engineering Thermodynamics, 6.5.1: air from 300 K,
// 1 bar to 1000 K, 3 bar, 0.9504 kJ/(kg K) with table A-22. Tolerance as for the table.
TEST(Gas, FollowsAPublishedExample) {
    const Gas air = read_gas("air");
    const auto s = entropy_of_gas(air, kelvin(300), pascal(1e5), kelvin(1000), pascal(3e5));
    EXPECT_NEAR((s / air.molar_mass()).value() / 1000, 0.9504, 0.0035);
}

// The same book, example 6.9: air from 540 °R, 1 atm, isentropic to 1160 °R: 15.28 atm with table
// Tolerance: 0.3 % of ln p over d ln p / d ln T = 3.6, some 1 K.
TEST(AdiabaticTemperature, FollowsAPublishedExample) {
    const double atm = 101325;
    EXPECT_NEAR(kelvin(temperature_adiabatic(read_gas("air"), kelvin(300), pascal(atm),
                                             pascal(15.28 * atm), std::nullopt)),
                1160 / 1.8, 1);
}

TEST(AdiabaticTemperature, OfAMonatomicGasIsTheClosedForm) {
    // cp = 5/2 R of the data set up to 1000 K; the compression term has R of 2019.
    const double exponent = gas_constant_of_2019 / (2.5 * 8.314510);
    EXPECT_NEAR(kelvin(temperature_adiabatic(read_gas("He"), kelvin(300), pascal(1e5), pascal(3e5),
                                             std::nullopt)),
                300 * std::pow(3, exponent), 1e-10);
    EXPECT_NEAR(kelvin(temperature_adiabatic(read_gas("Ar"), kelvin(900), pascal(3e5), pascal(1e5),
                                             Efficiency{0.8})),
                900 - 0.8 * (900 - 900 * std::pow(3, -exponent)), 1e-10);
}

char const* const gases[] = {
    "air", "N2", "CO2", "CH4", "H2O", "0.79 N2 + 0.21 O2", "0.1 CO2 + 0.2 H2O + 0.7 N2", "SF6"};

RC_GTEST_PROP(AdiabaticTemperature, GivesBackItsEfficiency, ()) {
    const Gas gas = read_gas(gases[*rc::gen::inRange(0, 8)]);
    const Temperature t1 = kelvin(random_states::between(400, 1500));
    const double ratio = random_states::between(0.25, 4), eta = random_states::between(0.3, 1);
    RC_PRE(std::abs(ratio - 1) > 0.01);
    const Temperature t2 =
        temperature_adiabatic(gas, t1, pascal(1e5), pascal(1e5 * ratio), Efficiency{eta});
    const double back =
        efficiency_isentropic(gas, t1, pascal(1e5), t2, pascal(1e5 * ratio)).value();
    RC_ASSERT(std::abs(back - eta) <= 1e-9);
    RC_ASSERT(adiabatic_generation(gas, t1, pascal(1e5), t2, pascal(1e5 * ratio)).value() >= -1e-9);
}

RC_GTEST_PROP(Gas, EntropyDoesNotDependOnAStopOnTheWay, ()) {
    const Gas gas = read_gas(gases[*rc::gen::inRange(0, 8)]);
    const Temperature a = kelvin(random_states::between(200, 3000)),
                      b = kelvin(random_states::between(200, 3000)),
                      c = kelvin(random_states::between(200, 3000));
    const auto p = pascal(1e5), q = pascal(3e6), r = pascal(5e3);
    const double whole = entropy_of_gas(gas, a, p, c, r).value();
    const double parts =
        (entropy_of_gas(gas, a, p, b, q) + entropy_of_gas(gas, b, q, c, r)).value();
    RC_ASSERT(std::abs(whole - parts) <= 1e-11);
}

TEST(Polytropic, WithTheIsentropicExponentIsNearlyZero) {
    // He: cp / (cp - R) with cp of the data set and R of 2019, so that nothing is left.
    const double cp = 2.5 * 8.314510, k = cp / (cp - gas_constant_of_2019);
    EXPECT_NEAR(polytropic(read_gas("He"), k, kelvin(300), kelvin(600)).value(), 0, 1e-12);
    expect_refusal(impossible, "exponent = 1", "other than 1",
                   [] { polytropic(read_gas("He"), 1, kelvin(300), kelvin(600)); });
}

TEST(AdiabaticTemperature, IsRefusedOutsideTheTable) {
    expect_refusal(impossible, "an end above 6000 K", "tabulated", [] {
        temperature_adiabatic(read_gas("CH4"), kelvin(5000), pascal(1), pascal(1e9), {});
    });
    expect_refusal(impossible, "an end below 200 K", "tabulated", [] {
        temperature_adiabatic(read_gas("air"), kelvin(300), pascal(1e6), pascal(1e3), {});
    });
    expect_refusal(impossible, "100 K", "from 200 K", [] {
        temperature_adiabatic(read_gas("air"), kelvin(100), pascal(1e5), pascal(2e5), {});
    });
    expect_refusal(impossible, "p1 = p2", "two different", [] {
        efficiency_isentropic(read_gas("air"), kelvin(300), pascal(1e5), kelvin(400), pascal(1e5));
    });
    expect_refusal(impossible, "T2 = 301 K", "at most (second law)", [] {
        efficiency_isentropic(read_gas("air"), kelvin(300), pascal(1e5), kelvin(301), pascal(2e5));
    });
}

TEST(AdiabaticGeneration, RemarksADeficit) {
    std::vector<std::string> remarks;
    const auto s = adiabatic_generation(read_gas("air"), kelvin(300), pascal(1e5), kelvin(301),
                                        pascal(2e5), Notes(nullptr, &remarks));
    EXPECT_LT(s.value(), 0);
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_NE(remarks[0].find("a deficit"), std::string::npos);
}

} // namespace
