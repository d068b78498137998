// SPDX-License-Identifier: MPL-2.0

// Values of closed forms from one file for relations of several folders.

#include "core/balance/available_work.h"
#include "core/balance/second_law.h"
#include "core/processes/ideal_gas.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <functional>
#include <map>
#include <string>

namespace {

using namespace core;
using Inputs = std::vector<double> const&;

Temperature kelvin(double value) { return Temperature::kelvin(value); }
Positive<Pressure> pascal(double value) { return {Pressure::from_value(value)}; }
Positive<MolarHeatCapacity> times_gas_constant(double factor) { return {gas_constant * factor}; }
Positive<HeatCapacity> heat_capacity(double value) { return {HeatCapacity::from_value(value)}; }

/// One heat that leaves a body at T1 and enters one at T2; both together exchange nothing.
double heat_between(double heat, double from, double to) {
    const double changes[] = {-heat / from, heat / to};
    return balance::entropy_generated<Total>({changes, 2}, std::nullopt, std::nullopt).value();
}

/// Two equal bodies that share their heat.
double thermal_mixing(double capacity, double hot, double cold) {
    const Temperature end = kelvin((hot + cold) / 2);
    return (processes::isobaric<Total>(heat_capacity(capacity), kelvin(hot), end) +
            processes::isobaric<Total>(heat_capacity(capacity), kelvin(cold), end))
        .value();
}

const std::map<std::string, std::function<double(Inputs)>> relations{
    {"isothermal_by_volume",
     [](Inputs x) {
         return processes::isothermal_by_volume<Total>({Volume::from_value(x.at(0))},
                                                       {Volume::from_value(x.at(1))})
             .value();
     }},
    {"isothermal_by_pressure",
     [](Inputs x) {
         return processes::isothermal_by_pressure(pascal(x.at(0)), pascal(x.at(1))).value();
     }},
    {"entropy_of_gas",
     [](Inputs x) {
         return processes::entropy_of_gas(times_gas_constant(x.at(0)), kelvin(x.at(1)),
                                          pascal(x.at(2)), kelvin(x.at(3)), pascal(x.at(4)))
             .value();
     }},
    {"temperature_adiabatic",
     [](Inputs x) {
         return absolute(processes::temperature_adiabatic(times_gas_constant(x.at(0)),
                                                          kelvin(x.at(1)), pascal(x.at(2)),
                                                          pascal(x.at(3)), std::nullopt))
             .value();
     }},
    {"isobaric",
     [](Inputs x) {
         return processes::isobaric<Total>(heat_capacity(x.at(0)), kelvin(x.at(1)), kelvin(x.at(2)))
             .value();
     }},
    {"thermal_mixing", [](Inputs x) { return thermal_mixing(x.at(0), x.at(1), x.at(2)); }},
    {"heat_between", [](Inputs x) { return heat_between(x.at(0), x.at(1), x.at(2)); }},
    {"exergy_of_heat",
     [](Inputs x) {
         return balance::exergy_of_heat<Total>(Energy::from_value(x.at(0)), kelvin(x.at(1)),
                                               kelvin(x.at(2)))
             .value();
     }},
    {"lost_work",
     [](Inputs x) {
         return balance::lost_work<Total>({Entropy::from_value(x.at(0))}, kelvin(x.at(1))).value();
     }},
};

TEST(ClosedForms, AgreeWithTheirValues) {
    for (auto const& row :
         published::read_table(PUBLISHED_DIR "/closed_forms.csv",
                               {"relation", "inputs", "value", "unit", "tolerance"}, 10)) {
        const double value = row.number("value");
        EXPECT_NEAR(relations.at(row.text("relation"))(row.numbers("inputs")), value,
                    std::abs(value) * row.number("tolerance"))
            << row.text("relation");
    }
}

} // namespace
