// SPDX-License-Identifier: MPL-2.0
#include "core/steam/machine.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/curve_columns.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/steam_arguments.h"

namespace registration::catalogue {
namespace {

using namespace core::steam;
using core::Notes, core::Positive, core::Pressure, core::Temperature;

/// A quantity of the state that both fix.
template<auto quantity>
auto of_state(Coordinate first, Coordinate second, Notes const& notes) {
    return state_at(first, second, notes).*quantity;
}

core::Dimensionless dryness_of_state(Coordinate first, Coordinate second, Notes const& notes) {
    return dryness(state_at(first, second, notes));
}

core::SpecificEnergy exergy_of_state(Coordinate first, Coordinate second, Temperature surroundings,
                                     Positive<Pressure> pressure, Notes const& notes) {
    const State state = state_at(first, second, notes);
    return exergy(state, at_temperature_and_pressure(surroundings, pressure, notes), notes);
}

core::Dimensionless efficiency_of_steam(Coordinate first, Coordinate second, Coordinate end_first,
                                        Coordinate end_second, Notes const& notes) {
    const State begin = state_at(first, second, notes);
    return efficiency_isentropic(begin, state_at(end_first, end_second, notes), notes);
}

Array curve_saturation(double points, std::optional<CurveHeadings> headings) {
    constexpr core::Dimension energy = core::dimension<core::SpecificEnergy>,
                              entropy = core::dimension<core::SpecificEntropy>;
    CurveColumns columns({{"T", core::Dimension::of_temperature, "a temperature"},
                          {"p", core::dimension<Pressure>, "a pressure"},
                          {"h′", energy, "the enthalpy of the liquid"},
                          {"h″", energy, "the enthalpy of the vapour"},
                          {"s′", entropy, "the entropy of the liquid"},
                          {"s″", entropy, "the entropy of the vapour"}},
                         std::move(headings), core::steam::molar_mass.value());
    for (SaturationPoint const& at : saturation_curve(number_of_points(points)))
        columns.add({absolute(at.temperature).value(), at.pressure.value(),
                     at.liquid_enthalpy.value(), at.vapour_enthalpy.value(),
                     at.liquid_entropy.value(), at.vapour_entropy.value()});
    return columns.made();
}

constexpr const char* release =
    "International Association for the Properties of Water and Steam, R7-97(2012); the search in "
    "region 3 starts by SR3-03(2014)";
constexpr const char* valid =
    "273.15 K to 1073.15 K up to 100 MPa, to 2273.15 K up to 50 MPa; equilibrium, no ice";
constexpr Argument first{.name = "first",
                         .symbol = "first",
                         .says = "temperature, pressure, specific enthalpy, entropy or volume, or "
                                 "dryness: the unit says which",
                         .example = "80 bar"};
constexpr Argument second{.name = "second",
                          .symbol = "second",
                          .says = "another one of them; dryness as number, `saturated liquid` or "
                                  "`saturated vapour`",
                          .example = "500 °C"};

constexpr Entry entries[] = {
    describe(
        {.name = "ENTROPY.STEAM",
         .says = "Specific entropy of water or steam in the state that two quantities fix.",
         .arguments = {{first, second, amount, show}},
         .forms = {form<of_state<&State::entropy>>(
             "s = s(first, second), the industrial formulation", release, valid)},
         // R7-97, table 5: 0.392294792 kJ/(kg·K)
         .examples = {{{"ENTROPY.STEAM(\"300 K\"; \"3 MPa\"; ; \"kJ/(kg·K)\")",
                        0.39229479240262427},
                       {"ENTROPY.STEAM(\"10 kPa\"; \"saturated vapour\")", 8148.893282344276}}}}),
    describe({.name = "ENTHALPY.STEAM",
              .says = "Specific enthalpy of water or steam in the state that two quantities fix.",
              .arguments = {{first, second, amount, show}},
              .forms = {form<of_state<&State::enthalpy>>(
                  "h = h(first, second), the industrial formulation", release, valid)},
              // R7-97, table 15: 3335.68375 kJ/kg
              .examples = {{{"ENTHALPY.STEAM(\"0.0035 MPa\"; \"700 K\"; ; \"kJ/kg\")",
                             3335.683753731224}}}}),
    describe({.name = "VOLUME.STEAM",
              .says = "Specific volume of water or steam in the state that two quantities fix.",
              .arguments = {{first, second, amount, show}},
              .forms = {form<of_state<&State::volume>>(
                  "v = v(first, second), the industrial formulation", release, valid)},
              // R7-97, table 42: 1.38455090 m³/kg
              .examples = {{{"VOLUME.STEAM(\"1500 K\"; \"0.5 MPa\")", 1.38455089878153}}}}),
    describe(
        {.name = "ENERGY.STEAM",
         .says = "Specific internal energy of water or steam in the state that two quantities fix.",
         .arguments = {{first, second, amount, show}},
         .forms = {form<of_state<&State::energy>>("u = h - p · v, the industrial formulation",
                                                  release, valid)},
         // R7-97, table 5: 112.324818 kJ/kg
         .examples = {{{"ENERGY.STEAM(\"300 K\"; \"3 MPa\"; ; \"kJ/kg\")", 112.3248179823783}}}}),
    describe({.name = "TEMPERATURE.STEAM",
              .says = "Temperature of water or steam in the state that two quantities fix.",
              .arguments = {{first, second, show}},
              .forms = {form<of_state<&State::temperature>>(
                  "T = T(first, second), the industrial formulation", release, valid)},
              // R7-97, table 36: 453.035632 K
              .examples = {{{"TEMPERATURE.STEAM(\"1 MPa\"; \"saturated liquid\")",
                             453.0356323914667}}}}),
    describe({.name = "PRESSURE.STEAM",
              .says = "Pressure of water or steam in the state that two quantities fix.",
              .arguments = {{first, second, show}},
              .forms = {form<of_state<&State::pressure>>(
                  "p = p(first, second), the industrial formulation", release, valid)},
              // R7-97, table 35: 2.63889776 MPa
              .examples = {{{"PRESSURE.STEAM(\"500 K\"; \"saturated vapour\"; \"MPa\")",
                             2.638897756273222}}}}),
    describe({.name = "DRYNESS.STEAM",
              .says = "Mass fraction of vapour in wet steam, 0 to 1.",
              .arguments = {{first, second, show}},
              .forms = {form<dryness_of_state>("x = x(first, second), the industrial formulation",
                                               release, valid)},
              .examples = {{{"DRYNESS.STEAM(\"10 kPa\"; \"2100 kJ/kg\")", 0.7977124422953035}}}}),
    describe({.name = "EXERGY.STEAM",
              .says = "Physical exergy of flowing water or steam against the surroundings.",
              .arguments = {{first,
                             second,
                             surroundings,
                             {.name = "surroundings_pressure",
                              .symbol = "p0",
                              .says = "absolute pressure of the surroundings",
                              .example = "1.013 bar"},
                             amount,
                             show}},
              .forms = {form<exergy_of_state>(
                  "e = h - h0 - T0 · (s - s0), the industrial formulation", release, valid)},
              .examples = {{{"EXERGY.STEAM(\"80 bar\"; \"500 °C\"; \"15 °C\"; \"1.01325 bar\"; ; "
                             "\"kJ/kg\")",
                             1462.7643996129184}}}}),
    describe({.name = "EFFICIENCY.STEAM",
              .says = "Isentropic efficiency of an adiabatic steam turbine or pump, told apart by "
                      "the pressures; wet ends included.",
              .arguments = {{first,
                             second,
                             {.name = "end_first",
                              .symbol = "end_first",
                              .says = "a quantity of the state at the end, as `first`",
                              .example = "0.1 bar"},
                             {.name = "end_second",
                              .symbol = "end_second",
                              .says = "another one of them, as `second`",
                              .example = "0.92"},
                             show}},
              .forms = {form<efficiency_of_steam>(
                  "η = (h1 - h2) / (h1 - h2s) of a turbine, (h2s - h1) / (h2 - h1) of a pump",
                  release, valid)},
              .examples = {{{"EFFICIENCY.STEAM(\"80 bar\"; \"500 °C\"; \"0.1 bar\"; 0.9)",
                             0.8309861226741028}}}}),
    describe(
        {.name = "CURVE.SATURATION",
         .says = "The saturation curve of water for a chart: an array of T, p, h′, h″, s′, s″ from "
                 "the triple to the critical point.",
         .arguments = {{{.name = "points",
                         .symbol = "points",
                         .says = "how many equally spaced temperatures, 2 to 10000",
                         .example = "50"},
                        {.name = "units",
                         .symbol = "units",
                         .says = "a row of six headings with the units; K and SI if left out",
                         .example = "B4:G4"}}},
         .forms = {form<curve_saturation>("T, p, h′, h″, s′, s″ at saturation", release,
                                          "273.16 K to 647.096 K")}}),
};

} // namespace

std::span<const Entry> steam() { return entries; }

} // namespace registration::catalogue
