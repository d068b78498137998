// SPDX-License-Identifier: MPL-2.0
#include "core/steam/pair.h"

#include "core/failure.h"
#include "core/written.h"

#include <algorithm>
#include <cctype>
#include <string>
#include <utility>

namespace core::steam {
namespace {

using Kind = Coordinate::Kind;

constexpr const char* names[] = {"a temperature", "a pressure", "an enthalpy",
                                 "an entropy",    "a volume",   "a dryness"};

std::string name(Kind kind) { return names[static_cast<std::size_t>(kind)]; }

[[noreturn]] void refuse_pair(Kind first, Kind second) {
    refuse_unfit(first == second ? name(first) + " twice" : name(first) + " and " + name(second),
                 "two quantities that fix a state: temperature and pressure; either of them with "
                 "entropy, volume or dryness; pressure or entropy with enthalpy",
                 "give one of these pairs, in any order");
}

Temperature temperature(Coordinate c) { return Temperature::kelvin(c.si); }

template<class Q>
Positive<Q> positive(Coordinate c) {
    if (!(c.si > 0))
        refuse_impossible(written(Q::from_value(c.si)), name(c.kind) + " above 0",
                          "check the sign and the unit");
    return {Q::from_value(c.si)};
}
Positive<Pressure> pressure(Coordinate c) { return positive<Pressure>(c); }

Fraction fraction(Coordinate c) {
    if (!(c.si >= 0 && c.si <= 1))
        refuse_impossible(written(c.si), "a dryness from 0 to 1, or another quantity with its unit",
                          "write the unit behind the number, or correct the dryness");
    return {c.si};
}

SpecificEnergy enthalpy(Coordinate c) { return SpecificEnergy::from_value(c.si); }
SpecificEntropy entropy(Coordinate c) { return SpecificEntropy::from_value(c.si); }

} // namespace

Coordinate read_dryness(std::string_view words) {
    std::string small(words.substr(0, 60));
    std::ranges::transform(small, small.begin(),
                           [](unsigned char c) { return static_cast<char>(std::tolower(c)); });
    if (small == "saturated liquid") return {Kind::dryness, 0};
    if (small == "saturated vapour" || small == "saturated vapor") return {Kind::dryness, 1};
    refuse_unfit(std::string(words.substr(0, 60)),
                 "a quantity with its unit, `saturated liquid` or `saturated vapour`",
                 "write one of the two, or a number from 0 to 1");
}

State state_at(Coordinate a, Coordinate b, Notes const& notes) {
    if (a.kind > b.kind) std::swap(a, b);
    const auto is = [&](Kind first, Kind second) { return a.kind == first && b.kind == second; };
    if (is(Kind::temperature, Kind::pressure))
        return at_temperature_and_pressure(temperature(a), pressure(b), notes);
    if (is(Kind::temperature, Kind::entropy))
        return at_temperature_and_entropy(temperature(a), entropy(b), notes);
    if (is(Kind::temperature, Kind::volume))
        return at_temperature_and_volume(temperature(a), positive<SpecificVolume>(b), notes);
    if (is(Kind::temperature, Kind::dryness))
        return at_temperature_and_dryness(temperature(a), fraction(b), notes);
    if (is(Kind::pressure, Kind::enthalpy))
        return at_pressure_and_enthalpy(pressure(a), enthalpy(b), notes);
    if (is(Kind::pressure, Kind::entropy))
        return at_pressure_and_entropy(pressure(a), entropy(b), notes);
    if (is(Kind::pressure, Kind::volume))
        return at_pressure_and_volume(pressure(a), positive<SpecificVolume>(b), notes);
    if (is(Kind::pressure, Kind::dryness))
        return at_pressure_and_dryness(pressure(a), fraction(b), notes);
    if (is(Kind::enthalpy, Kind::entropy))
        return at_enthalpy_and_entropy(enthalpy(a), entropy(b), notes);
    refuse_pair(a.kind, b.kind);
}

} // namespace core::steam
