// SPDX-License-Identifier: MPL-2.0
#include "core/text/quantity.h"
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <array>
#include <bit>
#include <cmath>

// Properties of whole calls. CTest sets RC_PARAMS, so that every run draws the same.

namespace {

using tests::call, tests::number, tests::Range;

double between(double low, double high) {
    return low + (high - low) * static_cast<double>(*rc::gen::inRange(0, 1'000'001)) / 1e6;
}

std::string quantity(double value, const char* unit) {
    return core::text::write_number(static_cast<long double>(value), 17) + " " + unit;
}

RC_GTEST_PROP(Properties, TheUnitOnTheWayInDoesNotMatter, ()) {
    const double kelvin = between(200, 2500), joule = between(1, 1e5);
    const double expected = number(
        call("ENTROPY.FUSION", {quantity(joule, "J/mol").c_str(), quantity(kelvin, "K").c_str()}));
    const std::array<std::pair<double, const char*>, 4> heats{{{joule / 1000, "kJ/mol"},
                                                               {joule / 4.184, "cal_th/mol"},
                                                               {joule / 2.326, "Btu_IT/lbmol"},
                                                               {joule * 1e-6, "GJ/kmol"}}};
    const std::array<std::pair<double, const char*>, 3> points{
        {{kelvin - 273.15, "°C"}, {kelvin * 1.8, "°R"}, {kelvin * 1.8 - 459.67, "°F"}}};
    const auto heat = heats[*rc::gen::inRange<std::size_t>(0, 4)];
    const auto point = points[*rc::gen::inRange<std::size_t>(0, 3)];
    const double got =
        number(call("ENTROPY.FUSION", {quantity(heat.first, heat.second).c_str(),
                                       quantity(point.first, point.second).c_str()}));
    RC_ASSERT(std::fabs(got - expected) <=
              1e-13 * expected); // two roundings on the way into the other unit, near 0 °C more
}

RC_GTEST_PROP(Properties, PathsBetweenTwoStatesAddUp, ()) {
    const auto state = [] {
        return std::pair{quantity(between(250, 1500), "K"), quantity(between(0.1, 100), "bar")};
    };
    const auto a = state(), b = state(), c = state();
    const auto step = [](auto const& from, auto const& to) {
        return number(
            call("ENTROPY.GAS", {"33.5 J/(mol·K)", from.first.c_str(), from.second.c_str(),
                                 to.first.c_str(), to.second.c_str()}));
    };
    RC_ASSERT(std::fabs(step(a, b) + step(b, c) + step(c, a)) <= 1e-12);
}

RC_GTEST_PROP(Properties, TheQuantityViewIsTheSameNumber, ()) {
    const std::string heat = quantity(between(1, 1e5), "J/mol"),
                      temperature = quantity(between(1, 5000), "K");
    const double value = number(call("ENTROPY.FUSION", {heat.c_str(), temperature.c_str()}));
    for (const char* show : {"quantity", "quantity in kJ/(mol·K)", "quantity in cal_th/(mol·K)",
                             "quantity in Btu_IT/(lbmol·°R)"}) {
        const std::string text =
            tests::text(call("ENTROPY.FUSION", {heat.c_str(), temperature.c_str(), Range(), show}));
        RC_ASSERT(std::bit_cast<std::uint64_t>(core::text::read_quantity(text).si) ==
                  std::bit_cast<std::uint64_t>(value));
    }
}

RC_GTEST_PROP(Properties, AColumnIsItsRowsOneByOne, ()) {
    std::vector<Range> temperatures{"°C"};
    std::vector<double> single;
    for (int row = 0; row < 5; ++row) {
        const double celsius = between(-300, 1000);
        temperatures.push_back(celsius);
        const auto answer = call("ENTROPY.HEAT", {"5 kJ", Range::row({celsius, "°C"})});
        single.push_back(answer.numbers[0]);
    }
    const auto column = call("ENTROPY.HEAT", {"5 kJ", Range::column(temperatures)});
    for (std::size_t row = 0; row < 5; ++row)
        RC_ASSERT(std::bit_cast<std::uint64_t>(column.numbers[row]) ==
                  std::bit_cast<std::uint64_t>(single[row]));
}

} // namespace
