// SPDX-License-Identifier: MPL-2.0
#include "core/balance/stream_exergy.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/material_arguments.h"
#include "registration/substance_arguments.h"

namespace registration::catalogue {
namespace {

using namespace core::balance;
using core::Energy, core::HeatCapacity, core::Molar, core::MolarHeatCapacity, core::Notes, core::On,
    core::Positive, core::Pressure, core::Rate, core::Specific, core::Temperature, core::Total;

template<class Basis>
On<Energy, Basis> incompressible(Positive<On<HeatCapacity, Basis>> heat_capacity,
                                 Temperature temperature, LeftOut, Temperature surroundings,
                                 LeftOut, Notes const& notes) {
    return exergy_of_incompressible<Basis>(heat_capacity, temperature, surroundings, notes);
}

template<class Basis>
On<Energy, Basis> constant_gas(ConstantGasOn<Basis> const& gas, Temperature temperature,
                               Positive<Pressure> pressure, Temperature surroundings,
                               Positive<Pressure> surroundings_pressure, Notes const& notes) {
    return on_basis(gas, exergy_of_ideal_gas(molar_heat_capacity(gas, notes), temperature, pressure,
                                             surroundings, surroundings_pressure, notes));
}

core::MolarEnergy substance_stream(core::substances::Substance const& of, Temperature temperature,
                                   LeftOut, Temperature surroundings, LeftOut, Notes const& notes) {
    return exergy_of_substance(of, temperature, surroundings, notes);
}

template<class Basis>
On<Energy, Basis> own_stream(OwnMaterialOn<Basis> const& own, Temperature temperature, LeftOut,
                             Temperature surroundings, LeftOut, Notes const& notes) {
    return exergy_of_material<Basis>(*own.material, temperature, surroundings, notes);
}

constexpr const char* rant = "e = h - h0 - T0 · (s - s0) (Rant 1956)";

constexpr Entry entries[] = {
    describe(
        {.name = "EXERGY.STREAM",
         .says =
             "Physical exergy of a stream: the work it could give on its way to the temperature "
             "and pressure of the surroundings.",
         .arguments = {{{.name = "substance",
                         .symbol = "cp",
                         .says = "a gas with pressures; without them a substance, an own material, "
                                 "or a heat capacity, W/K for a flow",
                         .example = "air"},
                        {.name = "T",
                         .symbol = "T",
                         .says = "temperature of the stream",
                         .example = "180 °C"},
                        {.name = "p",
                         .symbol = "p",
                         .says = "absolute pressure of a gas; left out for what is incompressible",
                         .example = "7 bar"},
                        {.name = "T0",
                         .symbol = "T0",
                         .says = "temperature of the surroundings",
                         .example = "15 °C"},
                        {.name = "p0",
                         .symbol = "p0",
                         .says = "absolute pressure of the surroundings, beside p",
                         .example = "1.013 bar"},
                        amount,
                        show}},
         .forms = {form<incompressible<Molar>, incompressible<Specific>, incompressible<Total>,
                        incompressible<Rate>>("e = cp · (T - T0 - T0 · ln(T / T0)), cp constant",
                                              rant, "constant heat capacity, incompressible"),
                   form<exergy_of_ideal_gas>(
                       "e = cp · (T - T0 - T0 · ln(T / T0)) + R · T0 · ln(p / p0), cp constant",
                       rant, "ideal gas, cp constant or its mean between the temperatures"),
                   form<constant_gas<Molar>, constant_gas<Specific>>(
                       "e = cp · (T - T0 - T0 · ln(T / T0)) + R · T0 · ln(p / p0), cp as stated",
                       rant, stated_cp),
                   form<exergy_of_gas>(
                       "e = ∫cp dT - T0 · (∫cp/T dT - R · ln(p / p0)), cp of the tables", report,
                       table_gas),
                   form<substance_stream>("e = ΔH - T0 · ΔS, from T0 to T with every transition",
                                          report, "1 bar, the stable phase at each temperature"),
                   form<own_stream<Molar>, own_stream<Specific>, own_stream<Total>>(
                       "e = ΔH - T0 · ΔS, from T0 to T over the rows of the material", rant,
                       "the range of the material; nothing is extrapolated")},
         .examples = {{{"EXERGY.STREAM(\"4 kW/K\"; \"350 K\"; ; \"290 K\"; ; ; \"kW\")",
                        21.85941145659004},
                       {"EXERGY.STREAM(\"29.1 J/(mol·K)\"; \"500 K\"; \"7 bar\"; \"290 K\"; \"1 "
                        "bar\")",
                        6206.014552303296}}}}),
};

} // namespace

std::span<const Entry> streams() { return entries; }

} // namespace registration::catalogue
