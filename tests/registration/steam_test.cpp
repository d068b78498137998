// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <cmath>
#include <string>

// Water and steam as a worksheet asks for them; the states themselves are tested in tests/core/steam.

namespace {

using tests::call, tests::number, tests::text, tests::Range;

double entropy(Range first, Range second) { return number(call("ENTROPY.STEAM", {first, second})); }
void expect_why(const char* function, std::vector<Range> arguments, std::string_view part) {
    arguments.push_back("why");
    const std::string reason = text(call(function, arguments));
    EXPECT_NE(reason.find(part), std::string::npos) << reason;
}

TEST(Steam, StatesAreFixedByPairsInAnyOrderAndUnit) {
    const double s = entropy("300 K", "3 MPa");
    EXPECT_DOUBLE_EQ(entropy("3 MPa", "300 K"), s);
    EXPECT_DOUBLE_EQ(entropy("30 bar", "26.85 °C"), s);
    const std::string h = text(call("ENTHALPY.STEAM", {"300 K", "3 MPa", Range(), "quantity"}));
    const std::string v = text(call("VOLUME.STEAM", {"300 K", "3 MPa", Range(), "quantity"}));
    const std::string as_quantity =
        text(call("ENTROPY.STEAM", {"300 K", "3 MPa", Range(), "quantity"}));
    EXPECT_NEAR(entropy(h.c_str(), "3 MPa"), s, 1e-9);
    EXPECT_NEAR(entropy("3 MPa", v.c_str()), s, 1e-9);
    EXPECT_NEAR(entropy("300 K", v.c_str()), s, 1e-7);
    EXPECT_NEAR(number(call("TEMPERATURE.STEAM", {as_quantity.c_str(), h.c_str()})), 300, 1e-6);
    EXPECT_NEAR(number(call("PRESSURE.STEAM", {as_quantity.c_str(), "300 K", "MPa"})), 3, 1e-6);
}

TEST(Steam, DrynessIsANumberOrAWord) {
    EXPECT_EQ(entropy("1 bar", "saturated vapour"), entropy("1 bar", 1.0));
    EXPECT_EQ(entropy("saturated liquid", "100 °C"), entropy("0", "100 °C"));
    EXPECT_NEAR(number(call("DRYNESS.STEAM", {"1 bar", "50 %"})), 0.5, 1e-12);
    const auto column = call(
        "ENTROPY.STEAM", {"1 bar", Range::column({"saturated liquid", "saturated vapour", "dry"})});
    ASSERT_EQ(column.rows, 3u);
    EXPECT_EQ(column.numbers[1], entropy("1 bar", 1.0));
    EXPECT_NE(column.numbers[2], column.numbers[2]);
}

TEST(Steam, ComesInColumnsAndAmounts) {
    const auto column = call("ENTROPY.STEAM", {Range::column({"T / °C", 150.0, 200.0, 250.0}),
                                               "1 bar", "2 kg/s", "kW/K"});
    ASSERT_EQ(column.rows, 3u);
    EXPECT_NEAR(column.numbers[1], 2 * entropy("200 °C", "1 bar") / 1000, 1e-12);
    // 18.015268 g/mol
    EXPECT_NEAR(number(call("ENTROPY.STEAM", {"200 °C", "1 bar", "1 mol", "J/K"})),
                entropy("200 °C", "1 bar") * 0.018015268, 1e-9);
    EXPECT_NEAR(number(call("ENTROPY.STEAM", {"200 °C", "1 bar", Range(), "J/(mol·K)"})),
                entropy("200 °C", "1 bar") * 0.018015268, 1e-9);
}

TEST(Steam, HasVolumesOfAmounts) {
    const double v = number(call("VOLUME.STEAM", {"20 °C", "1 bar"}));
    EXPECT_NEAR(number(call("VOLUME.STEAM", {"20 °C", "1 bar", "5 kg", "L"})), 5000 * v, 1e-9);
    EXPECT_NEAR(number(call("VOLUME.STEAM", {"20 °C", "1 bar", "5 kg/h", "L/h"})), 5000 * v, 1e-9);
    EXPECT_NEAR(number(call("VOLUME.STEAM", {"20 °C", "1 bar", "1 kmol"})), 18.015268 * v, 1e-12);
}

TEST(Steam, IsReadAsAutoCorrectLeavesIt) {
    EXPECT_EQ(entropy("Saturated vapour", "1 bar"), entropy("saturated vapour", "1 bar"));
    EXPECT_EQ(number(call("ENTROPY.VAPORIZATION", {"Steam", "100 °C"})),
              number(call("ENTROPY.VAPORIZATION", {"steam", "100 °C"})));
}

TEST(Steam, CarriesUncertainties) {
    const double u =
        number(call("ENTHALPY.STEAM", {"500 °C ± 2 K", "80 bar", Range(), "uncertainty in kJ/kg"}));
    const double slope = (number(call("ENTHALPY.STEAM", {"502 °C", "80 bar", Range(), "kJ/kg"})) -
                          number(call("ENTHALPY.STEAM", {"498 °C", "80 bar", Range(), "kJ/kg"}))) /
                         4;
    EXPECT_NEAR(u, 2 * slope, 1e-9);
    // 0.5 K of uncertainty reach over saturation: the other side's difference is taken.
    const double at_saturation = number(
        call("ENTHALPY.STEAM", {"100 °C ± 0.5 K", "1 bar", Range(), "uncertainty in kJ/kg"}));
    EXPECT_GT(at_saturation, 0);
}

TEST(Steam, EvaporatesByTheWordAlone) {
    // s'' - s' at 100 °C from the basic equations, evaluated outside the project.
    EXPECT_NEAR(number(call("ENTROPY.VAPORIZATION", {"steam", "100 °C"})), 6047.062723117065, 1e-8);
    EXPECT_NEAR(number(call("ENTROPY.VAPORIZATION", {"steam", "100 °C", Range(), "J/(mol·K)"})),
                6.047062723117065 * 18.015268, 1e-8);
    expect_why("ENTROPY.VAPORIZATION", {"steam", "700 K", Range()}, "647.096 K");
    expect_why("ENTROPY.HEATING", {"steam", "300 K", "400 K", Range()}, "ENTROPY.STEAM");
    expect_why("ENTROPY.GAS", {"steam", "300 K", "1 bar", "400 K", "1 bar", Range()},
               "ENTROPY.STEAM");
}

TEST(Steam, IsRefusedWithTheReason) {
    const auto expect = [](Range first, Range second, std::string_view part) {
        expect_why("ENTROPY.STEAM", {first, second, Range()}, part);
    };
    expect("300 K", "310 K", "a temperature twice");
    expect("300 K", "100 kJ/kg", "two quantities that fix a state");
    expect("100 kJ/kg", "0.001 m³/kg", "two quantities that fix a state");
    expect("300 K", 30.0, "a dryness from 0 to 1");
    expect("5 bar(g)", "300 K", "PRESSURE.ABSOLUTE");
    expect("20 Δ°C", "1 bar", "difference");
    expect("300 K", "boiling", "saturated liquid");
    expect("99.6 °C", "1 bar", "give the dryness");
    expect("300 K", "200 MPa", "100 MPa");
    expect("100 °C", "18 kJ/mol", "specific enthalpy");
    expect("200 K", "1 bar", "ice is not covered");
    expect_why("DRYNESS.STEAM", {"200 °C", "1 bar"}, "above saturation");
    expect_why("EFFICIENCY.STEAM", {"80 bar", "500 °C", "0.1 bar", "25 °C"}, "second law");
    EXPECT_EQ(text(call("DRYNESS.STEAM", {"200 °C", "1 bar"})), "#NUM!");
    EXPECT_EQ(text(call("ENTROPY.STEAM", {"300 K", "310 K"})), "#VALUE!");
}

TEST(Steam, SaturationIsACurve) {
    const auto curve = call("CURVE.SATURATION", {11.0});
    EXPECT_EQ(curve.rows, 12u);
    EXPECT_EQ(curve.columns, 6u);
    const auto asked = call("CURVE.SATURATION",
                            {11.0, Range::row({"T / °C", "p / bar", "h′ / (kJ/kg)", "h″ / (kJ/kg)",
                                               "s′ / (kJ/(kg·K))", "s″ / (kJ/(kg·K))"})});
    EXPECT_EQ(asked.rows, 12u);
    EXPECT_EQ(text(call("CURVE.SATURATION", {1.0})), "#NUM!");
}

} // namespace
