// SPDX-License-Identifier: MPL-2.0
#include "core/steam/state.h"

#include "core/failure.h"
#include "core/written.h"

#include <cmath>
#include <string>

namespace core::steam {
namespace {

constexpr double undecided = 0.05, near_saturation = 1;
constexpr double end_tolerance = 1e-12;
constexpr const char* range =
    "273.15 K to 1073.15 K from 0.001 Pa to 100 MPa, and to 2273.15 K up to 50 MPa";

double kelvin(Temperature t) { return absolute(t).value(); }
double pascal(Positive<Pressure> p) { return p.value.value(); }

/// An end of a range that was missed by rounding is the end.
double snapped(double value, double low, double high) {
    if (value < low && value >= low * (1 - end_tolerance)) return low;
    if (value > high && value <= high * (1 + end_tolerance)) return high;
    return value;
}

double temperature_in_range(Temperature temperature) {
    const double t = snapped(kelvin(temperature), lowest_temperature, highest_temperature);
    if (t < lowest_temperature || t > highest_temperature)
        refuse_impossible(written(temperature),
                          "a temperature from 273.15 to 2273.15 K, the range of the formulation",
                          t < lowest_temperature ? "stay above freezing; ice is not covered"
                                                 : "stay inside the range");
    return t;
}

double pressure_in_range(Positive<Pressure> pressure) {
    const double p = snapped(pascal(pressure), lowest_pressure, highest_pressure);
    if (p < lowest_pressure || p > highest_pressure)
        refuse_impossible(written(pressure.value),
                          "a pressure from 0.001 Pa to 100 MPa, the range of the formulation",
                          "stay inside the range");
    return p;
}

std::string text_of(const char* name, double value) {
    return std::string(name) + " = " + written(value);
}

std::string equations_of(Found const& at) {
    using namespace reduced;
    switch (at.region) {
    case Region::liquid:
        return "region 1, liquid: R7-97 equation 7, " + text_of("π", pressure_1(at.p)) + ", " +
               text_of("τ", temperature_1(at.t));
    case Region::vapour:
        return "region 2, vapour: R7-97 equations 15 to 17, " + text_of("π", pressure_2(at.p)) +
               ", " + text_of("τ", temperature_2(at.t));
    case Region::dense:
        return "region 3, near and above the critical point: R7-97 equation 28, " +
               text_of("δ", density_3(1 / at.v)) + ", " + text_of("τ", temperature_3(at.t));
    case Region::hot:
        return "region 5, above 1073.15 K: R7-97 equations 32 to 34, " +
               text_of("π", pressure_2(at.p)) + ", " + text_of("τ", temperature_5(at.t));
    case Region::two_phase:
        break;
    }
    return "region 4, two phases: saturation by R7-97 equations 30 and 31, dryness x = " +
           written(*at.dryness);
}

void tell(Found const& at, Notes const& notes) {
    notes.step([&] { return equations_of(at); });
    notes.step([&] {
        return "T = " + written(at.t) + " K, p = " + written(at.p) + " Pa, v = " + written(at.v) +
               " m³/kg, h = " + written(at.h) + " J/kg, s = " + written(at.s) + " J/(kg·K)";
    });
}

State state_of(Found const& at, Notes const& notes) {
    tell(at, notes);
    return {at.region,
            Temperature::kelvin(at.t),
            Pressure::from_value(at.p),
            SpecificVolume::from_value(at.v),
            SpecificEnergy::from_value(at.h - at.p * at.v),
            SpecificEnergy::from_value(at.h),
            SpecificEntropy::from_value(at.s),
            at.dryness};
}

/// By how many kelvin a state is above the saturation at its pressure, or nothing without saturation.
std::optional<double> above_saturation(double t, double p) {
    if (p < saturation_pressure_at(lowest_temperature) || p > critical_pressure) return {};
    return t - saturation_temperature_at(p);
}

void check_phase(double t, double p, Notes const& notes) {
    const auto above = above_saturation(t, p);
    if (!above || std::abs(*above) >= near_saturation) return;
    if (std::abs(*above) < undecided)
        refuse_unfit(written(t) + " K and " + written(p) + " Pa, within 0.05 K of saturation",
                     "a pair that tells liquid from vapour",
                     "give the dryness with the temperature or the pressure, 0 for saturated "
                     "liquid, 1 for saturated vapour");
    notes.remark([&] {
        return written(std::abs(*above)) + " K " +
               (*above < 0 ? "below saturation: taken as liquid"
                           : "above saturation: taken as vapour");
    });
}

Region region_at(double t, double p) {
    if (t > highest_temperature_2) return Region::hot;
    if (t <= boundary_temperature_1_3)
        return p >= saturation_pressure_at(t) ? Region::liquid : Region::vapour;
    if (t <= highest_temperature_3 && p > boundary_pressure_2_3(t)) return Region::dense;
    return Region::vapour;
}

Side side_at(double t, double p) {
    return t >= critical_temperature || p >= saturation_pressure_at(t) ? Side::liquid
                                                                       : Side::vapour;
}

double saturated_temperature(Temperature temperature) {
    const double t = snapped(kelvin(temperature), lowest_temperature, critical_temperature);
    if (t < lowest_temperature || t > critical_temperature)
        refuse_impossible(written(temperature),
                          "a temperature from 273.15 to 647.096 K, at which water and steam can be "
                          "in equilibrium",
                          "give a pair without the dryness");
    return t;
}

double saturated_pressure(Positive<Pressure> pressure) {
    const double low = saturation_pressure_at(lowest_temperature);
    const double p = snapped(pascal(pressure), low, critical_pressure);
    if (p < low || p > critical_pressure)
        refuse_impossible(written(pressure.value),
                          "a pressure from " + written(low) +
                              " Pa to 22.064 MPa, at which water and steam can be in equilibrium",
                          "give a pair without the dryness");
    return p;
}

} // namespace

State at_temperature_and_pressure(Temperature temperature, Positive<Pressure> pressure,
                                  Notes const& notes) {
    const double t = temperature_in_range(temperature), p = pressure_in_range(pressure);
    if (t > highest_temperature_2 && p > highest_pressure_5)
        refuse_impossible(written(temperature) + " and " + written(pressure.value), range,
                          "stay inside the range");
    check_phase(t, p, notes);
    return state_of(at_point(region_at(t, p), t, p, side_at(t, p)), notes);
}

State at_pressure_and_enthalpy(Positive<Pressure> pressure, SpecificEnergy enthalpy,
                               Notes const& notes) {
    return state_of(on_isobar(pressure_in_range(pressure), Quantity::enthalpy, enthalpy.value()),
                    notes);
}

State at_pressure_and_entropy(Positive<Pressure> pressure, SpecificEntropy entropy,
                              Notes const& notes) {
    return state_of(on_isobar(pressure_in_range(pressure), Quantity::entropy, entropy.value()),
                    notes);
}

State at_enthalpy_and_entropy(SpecificEnergy enthalpy, SpecificEntropy entropy,
                              Notes const& notes) {
    return state_of(on_isentrope(entropy.value(), enthalpy.value()), notes);
}

State at_temperature_and_entropy(Temperature temperature, SpecificEntropy entropy,
                                 Notes const& notes) {
    return state_of(
        on_isotherm(temperature_in_range(temperature), Quantity::entropy, entropy.value()), notes);
}

State at_pressure_and_volume(Positive<Pressure> pressure, Positive<SpecificVolume> volume,
                             Notes const& notes) {
    return state_of(on_isobar(pressure_in_range(pressure), Quantity::volume, volume.value.value()),
                    notes);
}

State at_temperature_and_volume(Temperature temperature, Positive<SpecificVolume> volume,
                                Notes const& notes) {
    return state_of(
        on_isotherm(temperature_in_range(temperature), Quantity::volume, volume.value.value()),
        notes);
}

State at_temperature_and_dryness(Temperature temperature, Fraction dryness, Notes const& notes) {
    const double t = saturated_temperature(temperature);
    return state_of(mixed(t, saturation_pressure_at(t), dryness.value), notes);
}

State at_pressure_and_dryness(Positive<Pressure> pressure, Fraction dryness, Notes const& notes) {
    const double p = saturated_pressure(pressure);
    return state_of(mixed(saturation_temperature_at(p), p, dryness.value), notes);
}

SpecificEntropy entropy_of_vaporization(Temperature temperature, Notes const& notes) {
    const double t = saturated_temperature(temperature);
    const double p = saturation_pressure_at(t);
    const SaturatedPair pair = saturated_pair(t, p);
    notes.step([&] { return "saturation: R7-97 equation 30, p = " + written(p) + " Pa"; });
    notes.step([&] {
        return "s' = " + written(pair.liquid.s) + " J/(kg·K), s'' = " + written(pair.vapour.s) +
               " J/(kg·K)";
    });
    return SpecificEntropy::from_value(pair.vapour.s - pair.liquid.s);
}

Dimensionless dryness(State const& state) {
    if (state.dryness) return *state.dryness;
    const double t = kelvin(state.temperature), p = state.pressure.value();
    const auto above = above_saturation(t, p);
    refuse_impossible(written(state.temperature) + " and " + written(state.pressure) +
                          (above ? ", " + written(std::abs(*above)) + " K " +
                                       (*above < 0 ? "below saturation" : "above saturation")
                                 : ", where there is no saturation"),
                      "a state of two phases",
                      "use the temperature, entropy or enthalpy of the state; it is of one phase");
}

} // namespace core::steam
