// SPDX-License-Identifier: MPL-2.0
#pragma once

// The vocabulary of the core: one alias a quantity, each built from the ones above it, so that no
// dimension is ever typed by hand. All values are in coherent SI units; a value in another unit
// exists only in core/text. Boost.Units is included here and nowhere else.

#include "core/dimension.h"

#include <boost/units/get_dimension.hpp>
#include <boost/units/quantity.hpp>
#include <boost/units/systems/si/amount.hpp>
#include <boost/units/systems/si/dimensionless.hpp>
#include <boost/units/systems/si/energy.hpp>
#include <boost/units/systems/si/length.hpp>
#include <boost/units/systems/si/mass.hpp>
#include <boost/units/systems/si/power.hpp>
#include <boost/units/systems/si/pressure.hpp>
#include <boost/units/systems/si/temperature.hpp>
#include <boost/units/systems/si/time.hpp>

namespace core {

namespace si = boost::units::si;

template<class A, class B>
using Per = decltype(A{} / B{});
template<class A, class B>
using Times = decltype(A{} * B{});

using Dimensionless = boost::units::quantity<si::dimensionless>;
using Length = boost::units::quantity<si::length>;
using Mass = boost::units::quantity<si::mass>;
using Time = boost::units::quantity<si::time>;
using AmountOfSubstance = boost::units::quantity<si::amount>;
/// A difference of temperatures. A temperature itself is a point: core/temperature.h.
using TemperatureDifference = boost::units::quantity<si::temperature>;

using Area = Times<Length, Length>;
using Volume = Times<Area, Length>;
using Pressure = boost::units::quantity<si::pressure>;
using Energy = boost::units::quantity<si::energy>;
using Power = boost::units::quantity<si::power>;
using Irradiance = Per<Power, Area>;

using MassFlow = Per<Mass, Time>;
using MolarFlow = Per<AmountOfSubstance, Time>;
using VolumeFlow = Per<Volume, Time>;
using MolarMass = Per<Mass, AmountOfSubstance>;
using MolarVolume = Per<Volume, AmountOfSubstance>;
using SpecificVolume = Per<Volume, Mass>;
using Density = Per<Mass, Volume>;
using MolarEnergy = Per<Energy, AmountOfSubstance>;
using SpecificEnergy = Per<Energy, Mass>;

using Entropy = Per<Energy, TemperatureDifference>;
using EntropyFlow = Per<Power, TemperatureDifference>;
using EntropyFlux = Per<Irradiance, TemperatureDifference>;
using MolarEntropy = Per<MolarEnergy, TemperatureDifference>;
using SpecificEntropy = Per<SpecificEnergy, TemperatureDifference>;
/// Volume expansivity β = (∂V/∂T)_p / V.
using Expansivity = Per<Dimensionless, TemperatureDifference>;

// Heat capacity and entropy share a dimension: no check can tell them apart, so names must.
using HeatCapacity = Entropy;
using HeatCapacityRate = EntropyFlow;
using MolarHeatCapacity = MolarEntropy;
using SpecificHeatCapacity = SpecificEntropy;

/// What an extensive quantity can be counted per: Per<Energy, Basis::Amount>.
struct Molar {
    using Amount = AmountOfSubstance;
};
struct Specific {
    using Amount = Mass;
};
struct Total {
    using Amount = Dimensionless;
};
/// Per unit of time: Per<Energy, Rate::Amount> is a power.
struct Rate {
    using Amount = Time;
};
/// Per unit of time and area: Per<Energy, Flux::Amount> is an irradiance.
struct Flux {
    using Amount = Times<Time, Area>;
};
/// A quantity on a basis: On<Energy, Molar> is a molar energy.
template<class Quantity, class Basis>
using On = Per<Quantity, typename Basis::Amount>;

namespace detail {

template<class List>
struct Exponents;
template<>
struct Exponents<boost::units::dimensionless_type> {
    static constexpr Dimension value{};
};
template<class Base>
struct Axis;
template<>
struct Axis<boost::units::length_base_dimension> {
    static constexpr Dimension value = Dimension::of_length;
};
template<>
struct Axis<boost::units::mass_base_dimension> {
    static constexpr Dimension value = Dimension::of_mass;
};
template<>
struct Axis<boost::units::time_base_dimension> {
    static constexpr Dimension value = Dimension::of_time;
};
template<>
struct Axis<boost::units::temperature_base_dimension> {
    static constexpr Dimension value = Dimension::of_temperature;
};
template<>
struct Axis<boost::units::amount_base_dimension> {
    static constexpr Dimension value = Dimension::of_amount;
};
template<class Base, class Power, class Rest>
struct Exponents<boost::units::list<boost::units::dim<Base, Power>, Rest>> {
    static_assert(Power::Denominator == 1);
    static constexpr Dimension value =
        power(Axis<Base>::value, static_cast<int>(Power::Numerator)) * Exponents<Rest>::value;
};

} // namespace detail

/// The dimension of a quantity type as a run-time value.
template<class Quantity>
inline constexpr Dimension dimension = detail::Exponents<
    typename boost::units::get_dimension<typename Quantity::unit_type>::type>::value;

} // namespace core
