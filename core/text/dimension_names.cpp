// SPDX-License-Identifier: MPL-2.0
#include "core/quantities.h"
#include "core/text/unit.h"

#include <algorithm>
#include <array>
#include <cstdlib>
#include <string>

namespace core::text {
namespace {

struct NamedDimension {
    Dimension dimension;
    std::string_view unit;
    std::string_view name;
};

// Names of ISO 80000-5 and 80000-9. Where quantities share a dimension the one that comes first in
// this subject stands first.
constexpr std::array named{
    NamedDimension{dimension<Dimensionless>, "", "a number without a unit"},
    NamedDimension{dimension<TemperatureDifference>, "K", "a temperature"},
    NamedDimension{dimension<Pressure>, "Pa", "a pressure"},
    NamedDimension{dimension<Energy>, "J", "an energy"},
    NamedDimension{dimension<Power>, "W", "a power"},
    NamedDimension{dimension<Entropy>, "J/K", "an entropy or heat capacity"},
    NamedDimension{dimension<MolarEntropy>, "J/(mol·K)", "a molar entropy or molar heat capacity"},
    NamedDimension{dimension<SpecificEntropy>, "J/(kg·K)",
                   "a specific entropy or specific heat capacity"},
    NamedDimension{dimension<EntropyFlow>, "W/K", "an entropy per time or heat capacity rate"},
    NamedDimension{dimension<EntropyFlux>, "W/(m²·K)",
                   "an entropy flux or heat transfer coefficient"},
    NamedDimension{dimension<MolarEnergy>, "J/mol", "a molar energy"},
    NamedDimension{dimension<SpecificEnergy>, "J/kg", "a specific energy"},
    NamedDimension{dimension<Irradiance>, "W/m²", "an irradiance or heat flux"},
    NamedDimension{dimension<AmountOfSubstance>, "mol", "an amount of substance"},
    NamedDimension{dimension<Mass>, "kg", "a mass"},
    NamedDimension{dimension<Time>, "s", "a time"},
    NamedDimension{dimension<Length>, "m", "a length"},
    NamedDimension{dimension<Area>, "m²", "an area"},
    NamedDimension{dimension<Volume>, "m³", "a volume"},
    NamedDimension{dimension<Density>, "kg/m³", "a density"},
    NamedDimension{dimension<SpecificVolume>, "m³/kg", "a specific volume"},
    NamedDimension{dimension<MolarVolume>, "m³/mol", "a molar volume"},
    NamedDimension{dimension<MolarMass>, "kg/mol", "a molar mass"},
    NamedDimension{dimension<MassFlow>, "kg/s", "a mass flow"},
    NamedDimension{dimension<MolarFlow>, "mol/s", "a molar flow"},
    NamedDimension{dimension<VolumeFlow>, "m³/s", "a volume flow"},
    NamedDimension{dimension<Expansivity>, "1/K", "an expansivity"},
    NamedDimension{dimension<Per<Energy, Length>>, "N", "a force"},
    NamedDimension{dimension<Per<Length, Time>>, "m/s", "a velocity"},
    NamedDimension{dimension<Per<Dimensionless, Time>>, "1/s", "a frequency"},
    NamedDimension{dimension<Per<Dimensionless, Pressure>>, "1/Pa", "a compressibility"},
    NamedDimension{dimension<Per<TemperatureDifference, Pressure>>, "K/Pa",
                   "a Joule-Thomson coefficient"},
    NamedDimension{dimension<Per<TemperatureDifference, Time>>, "K/s",
                   "a rate of temperature change"},
    NamedDimension{dimension<Per<AmountOfSubstance, Volume>>, "mol/m³", "an amount concentration"},
    NamedDimension{dimension<Per<AmountOfSubstance, Mass>>, "mol/kg", "a molality"},
    NamedDimension{dimension<Per<EntropyFlow, Volume>>, "W/(m³·K)",
                   "an entropy per time and volume"},
    NamedDimension{dimension<Per<EntropyFlow, Length>>, "W/(m·K)", "a thermal conductivity"},
    NamedDimension{dimension<Per<Entropy, Volume>>, "J/(m³·K)", "an entropy per volume"},
};

NamedDimension const* find(Dimension dimension) {
    auto const at = std::find_if(named.begin(), named.end(),
                                 [&](NamedDimension const& n) { return n.dimension == dimension; });
    return at == named.end() ? nullptr : &*at;
}

std::string superscript(int exponent) {
    constexpr std::array<std::string_view, 10> digits{"⁰", "¹", "²", "³", "⁴",
                                                      "⁵", "⁶", "⁷", "⁸", "⁹"};
    std::string text = exponent < 0 ? "⁻" : "";
    for (char const c : std::to_string(std::abs(exponent)))
        text += digits[static_cast<std::size_t>(c - '0')];
    return text;
}

std::string in_base_units(Dimension d) {
    std::string text;
    auto const put = [&](std::string_view symbol, int exponent) {
        if (exponent == 0) return;
        if (!text.empty()) text += "·";
        text += symbol;
        if (exponent != 1) text += superscript(exponent);
    };
    put("kg", d.mass);
    put("m", d.length);
    put("s", d.time);
    put("K", d.temperature);
    put("mol", d.amount);
    return text;
}

} // namespace

std::string si_unit(Dimension dimension) {
    NamedDimension const* const known = find(dimension);
    return known != nullptr ? std::string(known->unit) : in_base_units(dimension);
}

std::string name_of(Dimension dimension) {
    NamedDimension const* const known = find(dimension);
    return known != nullptr ? std::string(known->name)
                            : "a quantity in " + in_base_units(dimension);
}

} // namespace core::text
