// SPDX-License-Identifier: MPL-2.0
#include "core/constants.h"
#include "core/text/unit.h"
#include "registration/catalogue/catalogue.h"
#include "tests/registration/formula_call.h"
#include "tests/registration/formula_evaluator.h"

#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <random>

// The formula that people read under "steps" is evaluated with random inputs and compared with the
// function, for every overload: prose and code cannot part.

namespace {

using namespace registration;
using tests::Range;

/// A plausible value of a dimension, so that no condition between arguments stands in the way.
double plausible(Need const& need, std::string_view symbol, std::mt19937& random) {
    const auto between = [&](double low, double high) {
        return std::uniform_real_distribution<>(low, high)(random);
    };
    if (need.dimension == core::Dimension::of_temperature)
        return symbol == "Th" ? between(900, 1500) : between(280, 850);
    if (need.dimension == core::dimension<core::MolarHeatCapacity>) return between(20, 60);
    if (need.dimension == core::Dimension{}) return between(1.1, 1.7);
    return between(1, 100);
}

std::string unit_of(Need const& need) {
    std::string unit =
        need.dimension == core::Dimension{} ? "" : core::text::si_unit(need.dimension);
    if (need.reading == Reading::gauge) unit += "(g)";
    return unit;
}

bool is_one_line(std::string_view formula) {
    return formula.find(" = ") != formula.npos && formula.find(", ") == formula.npos &&
           formula.find(" of a ") == formula.npos;
}

void compare(Entry const& entry, Form const& form, Overload const& overload, std::mt19937& random) {
    std::map<std::string, std::vector<double>, std::less<>> symbols{
        {"R", {core::gas_constant.value()}}};
    std::vector<Range> arguments(entry.argument_count());
    for (std::size_t i = 0; i < overload.needs.size(); ++i) {
        Need const& need = overload.needs[i];
        if (need.kind != Need::Kind::quantity) continue;
        const std::size_t position = entry.position_of_input(i);
        std::vector<double>& values = symbols[entry.arguments[position].symbol];
        values.resize(need.whole ? 3 : 1);
        for (double& value : values)
            value = plausible(need, entry.arguments[position].symbol, random);
        if (need.whole && need.share != Share::none) {
            const double sum = values[0] + values[1] + values[2];
            for (double& value : values) value /= sum;
        }
        const std::string unit = unit_of(need);
        std::vector<Range> cells;
        if (!unit.empty()) cells.push_back(Range(unit.c_str()));
        for (const double value : values) cells.push_back(Range(value));
        arguments[position] = Range::column(std::move(cells));
    }
    const double expected = tests::evaluate(
        std::string_view(form.formula).substr(std::string_view(form.formula).find(" = ") + 3),
        symbols);
    const double got = tests::number(tests::call(entry.name, arguments));
    // 1e-12: the function may take a route that keeps digits where the formula as written loses
    // some
    EXPECT_NEAR(got, expected, 1e-12 * std::fabs(expected)) << entry.name << ": " << form.formula;
}

TEST(Formulas, AreWhatTheFunctionsCompute) {
    std::mt19937 random(20261201);
    int compared = 0;
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries)
            for (Form const& form : entry.all_forms()) {
                if (!is_one_line(form.formula)) continue;
                for (Overload const& overload : form.overloads)
                    for (int i = 0; i < 50; ++i) {
                        compare(entry, form, overload, random);
                        ++compared;
                    }
            }
    EXPECT_GE(compared, 50 * 45);
}

TEST(FormulaEvaluator, FollowsTheUsualRules) {
    const std::map<std::string, std::vector<double>, std::less<>> symbols{
        {"n", {1, 3}}, {"T2", {600}}, {"T1", {300}}};
    EXPECT_DOUBLE_EQ(tests::evaluate("2 · (T2 - T1) / T1 ^ 2", symbols), 2 * 300 / 90000.0);
    EXPECT_DOUBLE_EQ(tests::evaluate("-Σ(n · ln(n / Σ(n)))", symbols),
                     -(std::log(0.25) + 3 * std::log(0.75)));
    EXPECT_THROW(tests::evaluate("T3 + 1", symbols), std::logic_error);
    EXPECT_THROW(tests::evaluate("T1 +", symbols), std::logic_error);
}

} // namespace
