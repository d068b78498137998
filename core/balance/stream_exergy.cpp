// SPDX-License-Identifier: MPL-2.0
#include "core/balance/stream_exergy.h"

#include "core/constants.h"
#include "core/failure.h"
#include "core/ratio.h"
#include "core/substances/heating.h"
#include "core/written.h"

#include <boost/math/special_functions/log1p.hpp>

#include <cmath>

namespace core::balance {
namespace {

void tell(MolarEnergy enthalpy, MolarEntropy entropy, Notes const& notes) {
    notes.step([&] { return "h - h0 = " + written(enthalpy) + ", s - s0 = " + written(entropy); });
}

void check_gas_in_surroundings(substances::Gas const& gas, Temperature surroundings) {
    if (gas.components().size() > 1 ||
        gas.components().front().substance.is_gas_in_the_open(surroundings))
        return;
    refuse_impossible(
        gas.written() + " in surroundings of " + written(surroundings),
        "a gas that is one there too",
        "leave the pressures out for the liquid or solid; for steam use EXERGY.STEAM");
}

} // namespace

double exergy_share(Temperature temperature, Temperature surroundings) {
    const double d = (temperature - surroundings) / absolute(surroundings);
    if (std::abs(d) < 0.5) return -boost::math::log1pmx(d);
    return d - ln_ratio(temperature, surroundings);
}

MolarEnergy exergy_of_ideal_gas(Positive<MolarHeatCapacity> heat_capacity, Temperature temperature,
                                Positive<Pressure> pressure, Temperature surroundings,
                                Positive<Pressure> surroundings_pressure, Notes const& notes) {
    const MolarEnergy thermal =
        exergy_of_incompressible<Molar>(heat_capacity, temperature, surroundings);
    const MolarEnergy mechanical = gas_constant * absolute(surroundings) *
                                   ln_ratio(pressure.value, surroundings_pressure.value);
    notes.step([&] {
        return "cp · (T - T0 - T0 · ln(T / T0)) = " + written(thermal) +
               ", R · T0 · ln(p / p0) = " + written(mechanical);
    });
    return thermal + mechanical;
}

MolarEnergy exergy_of_gas(substances::Gas const& gas, Temperature temperature,
                          Positive<Pressure> pressure, Temperature surroundings,
                          Positive<Pressure> surroundings_pressure, Notes const& notes) {
    check_gas_in_surroundings(gas, surroundings);
    const MolarEnergy enthalpy = gas.enthalpy_between(surroundings, temperature);
    const MolarEntropy entropy = substances::entropy_of_gas(
        gas, surroundings, surroundings_pressure, temperature, pressure, notes);
    tell(enthalpy, entropy, notes);
    return enthalpy - absolute(surroundings) * entropy;
}

MolarEnergy exergy_of_substance(substances::Substance const& substance, Temperature temperature,
                                Temperature surroundings, Notes const& notes) {
    const MolarEnergy enthalpy =
        substances::enthalpy_of_heating(substance, surroundings, temperature);
    const MolarEntropy entropy =
        substances::entropy_of_heating(substance, surroundings, temperature, notes);
    tell(enthalpy, entropy, notes);
    return enthalpy - absolute(surroundings) * entropy;
}

} // namespace core::balance
