// SPDX-License-Identifier: MPL-2.0
#include "core/substances/substance.h"

#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <map>

namespace {

using namespace core;
using namespace core::substances;

constexpr double half_a_digit = 0.000505;
const Temperature reference = Temperature::kelvin(298.15);

Phase phase(std::string const& id) {
    const auto all = phase_rows();
    return Phase(*std::find_if(all.begin(), all.end(), [&](auto& p) { return p.id == id; }));
}

TEST(PrintedValues, AreReproducedAt298K) {
    for (auto const& row : published::read_table(
             PUBLISHED_DIR "/standard_values.csv",
             {"phase", "entropy", "heat_capacity", "enthalpy_of_formation", "table", "page"},
             361)) {
        const Phase p = phase(row.text("phase"));
        EXPECT_NEAR(p.entropy(reference).value(), row.number("entropy"), half_a_digit)
            << row.text("phase");
        EXPECT_NEAR(p.heat_capacity(reference).value(), row.number("heat_capacity"), half_a_digit)
            << row.text("phase");
        EXPECT_NEAR(p.enthalpy(reference).value() / 1000, row.number("enthalpy_of_formation"),
                    half_a_digit)
            << row.text("phase");
    }
}

double quantity(std::string const& name, Substance const& s, Temperature t) {
    if (name == "entropy") return s.entropy(t).value();
    if (name == "heat capacity") return s.heat_capacity(t).value();
    return (s.enthalpy(t) - s.enthalpy(reference)).value() / 1000;
}

TEST(OtherEvaluations, AgreeButForTheListedDepartures) {
    std::map<std::string, double> largest;
    for (auto const& row : published::read_table(PUBLISHED_DIR "/substances_janaf_usgs.csv",
                                                 {"quantity", "substance", "temperature", "value",
                                                  "unit", "tolerance", "departure", "source"},
                                                 399)) {
        const Temperature t = Temperature::kelvin(row.number("temperature"));
        const double difference =
            quantity(row.text("quantity"), find_substance(row.text("substance")), t) -
            row.number("value");
        EXPECT_NEAR(difference, row.number("departure"), row.number("tolerance"))
            << row.text("substance") << ' ' << row.text("quantity") << ' '
            << row.text("temperature") << ' ' << row.text("source");
        double& most = largest[row.text("substance") + ", " + row.text("quantity")];
        if (std::abs(difference) > std::abs(most)) most = difference;
    }
    std::string list;
    for (auto const& [what, most] : largest)
        if (std::abs(most) > 0.1) list += what + ' ' + std::to_string(most) + "; ";
    RecordProperty("largest_departures", list);
}

} // namespace
