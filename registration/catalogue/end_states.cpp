// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "core/processes/ideal_gas.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/substance_arguments.h"

namespace registration::catalogue {
namespace {

using namespace core::processes;
using core::Efficiency, core::MolarHeatCapacity, core::Notes, core::Positive, core::Pressure,
    core::Temperature;

Temperature ideal_end(Positive<MolarHeatCapacity> heat_capacity, Temperature start,
                      Positive<Pressure> from, Positive<Pressure> to, Notes const& notes) {
    return temperature_adiabatic(heat_capacity, start, from, to, std::nullopt, notes);
}
Temperature real_end(Positive<MolarHeatCapacity> heat_capacity, Temperature start,
                     Positive<Pressure> from, Positive<Pressure> to, Efficiency efficiency,
                     Notes const& notes) {
    return temperature_adiabatic(heat_capacity, start, from, to, efficiency, notes);
}

// A gas named with its heat capacity.
Temperature end_of_constant_gas(ConstantGas const& gas, Temperature start, Positive<Pressure> from,
                                Positive<Pressure> to, std::optional<Efficiency> efficiency,
                                Notes const& notes) {
    return temperature_adiabatic(molar_heat_capacity(gas, notes), start, from, to, efficiency,
                                 notes);
}
core::Dimensionless efficiency_of_constant_gas(ConstantGas const& gas, Temperature t1,
                                               Positive<Pressure> p1, Temperature t2,
                                               Positive<Pressure> p2, Notes const& notes) {
    return efficiency_isentropic(molar_heat_capacity(gas, notes), t1, p1, t2, p2, notes);
}

constexpr const char* isentropic = "T2s = T1 · (p2 / p1)^(R / cp), the step of an ideal gas at "
                                   "constant entropy; definition of isentropic efficiency";
constexpr const char* valid =
    "adiabatic step of an ideal gas, cp constant or its mean between the temperatures";

constexpr Entry entries[] = {
    describe(
        {.name = "TEMPERATURE.ADIABATIC",
         .says = "End temperature of an adiabatic compressor or turbine.",
         .arguments = {{constant_cp,
                        temperature_1,
                        pressure_1,
                        pressure_2,
                        {.name = "efficiency",
                         .symbol = "η",
                         .says = "isentropic efficiency, above 0 and up to 1; 1 if left out",
                         .example = "0.8"},
                        show}},
         .forms = {form<ideal_end>("T2 = T1 · (p2 / p1)^(R / cp)", isentropic, valid),
                   form<real_end>(
                       "T2 = T1 + (T2s - T1) / η of a compressor, T1 - η · (T1 - T2s) of a turbine",
                       isentropic, valid),
                   form<end_of_constant_gas>(
                       "T2 = T1 + (T2s - T1) / η of a compressor, T1 - η · (T1 - T2s) of a "
                       "turbine, T2s = T1 · (p2 / p1)^(R / cp)",
                       isentropic, stated_cp),
                   form<core::substances::temperature_adiabatic>(
                       "T2 = T(h2), h2 - h1 = (h2s - h1) / η of a compressor, (h2s - h1) · η of a "
                       "turbine, ∫cp/T dT from T1 to T2s = R · ln(p2 / p1)",
                       report, table_gas)},
         .examples =
             {{{"TEMPERATURE.ADIABATIC(\"29.10061916353634 J/(mol·K)\"; \"300 K\"; \"1 bar\"; \"10 "
                "bar\")",
                579.2093186649751},
               {"TEMPERATURE.ADIABATIC(\"29.1 J/(mol·K)\"; \"20 °C\"; \"1 bar\"; \"7 bar\"; 0.8)",
                565.6547869560146}}}}),
    describe(
        {.name = "EFFICIENCY.ISENTROPIC",
         .says = "Isentropic efficiency of an adiabatic compressor or turbine, told apart by the "
                 "pressures.",
         .arguments = {{constant_cp, temperature_1, pressure_1, temperature_2, pressure_2, show}},
         .forms =
             {form<efficiency_isentropic>(
                  "η = (T2s - T1) / (T2 - T1) of a compressor, (T1 - T2) / (T1 - T2s) of a turbine",
                  isentropic, valid),
              form<efficiency_of_constant_gas>(
                  "η = (T2s - T1) / (T2 - T1) of a compressor, (T1 - T2) / (T1 - T2s) of a turbine",
                  isentropic, stated_cp),
              form<core::substances::efficiency_isentropic>(
                  "η = (h2s - h1) / (h2 - h1) of a compressor, (h1 - h2) / (h1 - h2s) of a turbine",
                  report, table_gas)},
         .examples = {{{"EFFICIENCY.ISENTROPIC(\"29.1 J/(mol·K)\"; \"20 °C\"; \"1 bar\"; \"545 "
                        "K\"; \"7 bar\")",
                        0.8656098056970883}}}}),
};

} // namespace

std::span<const Entry> end_states() { return entries; }

} // namespace registration::catalogue
