// SPDX-License-Identifier: MPL-2.0
#include "core/processes/phase_change.h"

#include "tests/published/table.h"

#include <gtest/gtest.h>

namespace {

using namespace core;
using processes::transition;

MolarEnergy kilojoules_per_mole(double value) { return MolarEnergy::from_value(value * 1000); }

void expect_published(published::Row const& row) {
    const MolarEntropy entropy = transition<Molar>({kilojoules_per_mole(row.number("enthalpy"))},
                                                   Temperature::kelvin(row.number("temperature")));
    EXPECT_EQ(row.text("unit"), "J/(mol K)");
    EXPECT_NEAR(entropy.value(), row.number("value"), row.number("tolerance"))
        << row.text("substance");
}

TEST(Transition, AgreesWithTheJanafTables) {
    for (auto const& row : published::read_table(PUBLISHED_DIR "/janaf_transitions.csv",
                                                 {"substance", "kind", "enthalpy", "temperature",
                                                  "value", "unit", "tolerance", "table", "rows"},
                                                 24))
        expect_published(row);
}

TEST(Transition, AgreesWithPublishedEnthalpiesAndTemperatures) {
    for (auto const& row : published::read_table(
             PUBLISHED_DIR "/phase_changes.csv",
             {"substance", "enthalpy", "temperature", "value", "unit", "tolerance", "source"}, 6))
        expect_published(row);
}

TEST(Transition, FollowsTheBasisOfTheEnthalpy) {
    const Temperature t = Temperature::kelvin(250);
    EXPECT_EQ(transition<Specific>({SpecificEnergy::from_value(500)}, t),
              SpecificEntropy::from_value(2));
    EXPECT_EQ(transition<Total>({Energy::from_value(500)}, t), Entropy::from_value(2));
}

} // namespace
