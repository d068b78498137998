// SPDX-License-Identifier: MPL-2.0
#include "core/text/unit_table.h"

#include "core/quantities.h"

#include <algorithm>
#include <array>

namespace core::text {
namespace {

using enum Definition;

constexpr Dimension none{};
constexpr Dimension energy = dimension<Energy>, power_ = dimension<Power>,
                    pressure = dimension<Pressure>, mass = dimension<Mass>,
                    volume = dimension<Volume>, length = dimension<Length>,
                    force = dimension<Per<Energy, Length>>, time_ = dimension<Time>,
                    amount = dimension<AmountOfSubstance>,
                    temperature = dimension<TemperatureDifference>;

constexpr UnitRow row(std::string_view symbol, std::string_view name, Dimension dimension,
                      long double numerator, long double denominator, Definition source,
                      Prefixes prefixes = Prefixes::none) {
    return {symbol, name,
            Unit{.numerator = numerator, .denominator = denominator, .dimension = dimension},
            source, prefixes};
}
constexpr UnitRow si(std::string_view symbol, std::string_view name, Dimension dimension) {
    return row(symbol, name, dimension, 1, 1, si_brochure, Prefixes::all);
}
constexpr UnitRow gauge(UnitRow row) {
    row.unit.reading = Reading::gauge;
    return row;
}
constexpr UnitRow difference(UnitRow row) {
    row.unit.reading = Reading::difference;
    return row;
}
constexpr UnitRow point(UnitRow row, long double zero_numerator, long double zero_denominator) {
    row.unit.reading = Reading::point;
    row.unit.zero_numerator = zero_numerator;
    row.unit.zero_denominator = zero_denominator;
    return row;
}
// T/K = t/°C + 273.15 (SI Brochure, 2.3.1); T/K = (t/°F + 459.67)/1.8 (SP 811, B.8).
constexpr UnitRow celsius(std::string_view symbol) {
    return point(row(symbol, "degree Celsius", temperature, 1, 1, si_brochure), 5463, 20);
}
constexpr UnitRow fahrenheit(std::string_view symbol) {
    return point(row(symbol, "degree Fahrenheit", temperature, 5, 9, sp811), 45967, 100);
}
constexpr UnitRow rankine(std::string_view symbol, std::string_view name = "degree Rankine") {
    return row(symbol, name, temperature, 5, 9, sp811);
}
constexpr UnitRow fraction(std::string_view symbol, std::string_view name, long double parts,
                           Share share = Share::none) {
    UnitRow result = row(symbol, name, none, 1, parts, si_brochure);
    result.unit.share = share;
    result.fraction = true;
    return result;
}

constexpr auto with_multiples = Prefixes::multiples;
constexpr auto with_prefixes = Prefixes::all;

// Numerators and denominators are whole, so that nothing is rounded before the value is. Btu_IT is
// 2326 J/g times the pound of 453.59237 g; lbf the pound times 9.80665 m/s²; psi lbf/in².
constexpr std::array rows{
    si("J", "joule", energy),
    row("cal_th", "calorie, thermochemical", energy, 523, 125, sp811, with_multiples),
    row("cal_IT", "calorie, International Table", energy, 10467, 2500, sp811, with_multiples),
    row("Btu_IT", "British thermal unit, International Table", energy, 52752792631, 50000000,
        sp811),
    row("Btu_th", "British thermal unit, thermochemical", energy, 23722880951, 22500000, sp811),
    row("kBtu_IT", "thousand Btu_IT", energy, 52752792631, 50000, sp811),
    row("MMBtu_IT", "million Btu_IT", energy, 52752792631, 50, sp811),
    row("erg", "erg", energy, 1, 10000000, sp811),
    row("eV", "electronvolt", energy, 1602176634, 1e28L, si_brochure, with_prefixes),
    row("Wh", "watt hour", energy, 3600, 1, sp811, with_multiples),
    row("therm_EC", "therm (EC)", energy, 105506000, 1, sp811),
    row("therm_US", "therm (US)", energy, 105480400, 1, sp811),

    si("W", "watt", power_),
    row("hp", "horsepower (550 ft·lbf/s)", power_, 37284993579113511, 50000000000000, sp811),
    row("hp_metric", "horsepower, metric (75 kgf·m/s)", power_, 588399, 800, sp811),
    row("hp_electric", "horsepower, electric", power_, 746, 1, sp811),
    row("TR", "ton of refrigeration (12 000 Btu_IT/h)", power_, 52752792631, 15000000, sp811),

    si("Pa", "pascal", pressure),
    row("bar", "bar", pressure, 100000, 1, si_brochure, with_prefixes),
    row("bara", "bar, absolute", pressure, 100000, 1, trade, with_prefixes),
    gauge(row("barg", "bar, gauge", pressure, 100000, 1, trade, with_prefixes)),
    row("atm", "standard atmosphere", pressure, 101325, 1, sp811),
    row("at", "technical atmosphere (kgf/cm²)", pressure, 196133, 2, sp811),
    row("torr", "torr", pressure, 20265, 152, sp811, with_prefixes),
    row("Torr", "torr", pressure, 20265, 152, sp811, with_prefixes),
    row("mmHg", "millimetre of mercury, conventional", pressure, 26664477483, 200000000, sp811),
    row("inHg", "inch of mercury, conventional", pressure, 3386388640341, 1000000000, sp811),
    row("mmH2O", "millimetre of water, conventional", pressure, 196133, 20000, sp811),
    row("inH2O", "inch of water, conventional", pressure, 24908891, 100000, sp811),
    row("ftH2O", "foot of water, conventional", pressure, 74726673, 25000, sp811),
    row("psi", "pound-force per square inch", pressure, 8896443230521, 1290320000, sp811),
    row("psia", "pound-force per square inch, absolute", pressure, 8896443230521, 1290320000,
        sp811),
    gauge(row("psig", "pound-force per square inch, gauge", pressure, 8896443230521, 1290320000,
              sp811)),
    row("ksi", "kip per square inch", pressure, 8896443230521, 1290320, sp811),
    row("psf", "pound-force per square foot", pressure, 8896443230521, 185806080000, sp811),

    si("K", "kelvin", temperature),
    difference(row("ΔK", "kelvin (difference)", temperature, 1, 1, si_brochure)),
    celsius("°C"),
    celsius("degC"),
    difference(row("Δ°C", "degree Celsius (difference)", temperature, 1, 1, si_brochure)),
    difference(row("ΔdegC", "degree Celsius (difference)", temperature, 1, 1, si_brochure)),
    fahrenheit("°F"),
    fahrenheit("degF"),
    difference(row("Δ°F", "degree Fahrenheit (difference)", temperature, 5, 9, sp811)),
    difference(row("ΔdegF", "degree Fahrenheit (difference)", temperature, 5, 9, sp811)),
    rankine("°R"),
    rankine("degR"),
    difference(rankine("Δ°R", "degree Rankine (difference)")),
    difference(rankine("ΔdegR", "degree Rankine (difference)")),

    si("mol", "mole", amount),
    row("lbmol", "pound-mole", amount, 45359237, 100000, sp811),

    row("g", "gram", mass, 1, 1000, si_brochure, with_prefixes),
    row("kg", "kilogram", mass, 1, 1, si_brochure),
    row("t", "tonne", mass, 1000, 1, si_brochure, with_multiples),
    row("lb", "pound", mass, 45359237, 100000000, sp811),
    row("lbm", "pound", mass, 45359237, 100000000, sp811),
    row("oz", "ounce, avoirdupois", mass, 45359237, 1600000000, sp811),
    row("oz_troy", "ounce, troy", mass, 19439673, 625000000, sp811),
    row("ton_short", "ton, short (2000 lb)", mass, 45359237, 50000, sp811),
    row("ton_long", "ton, long (2240 lb)", mass, 317514659, 312500, sp811),

    row("L", "litre", volume, 1, 1000, si_brochure, with_prefixes),
    row("l", "litre", volume, 1, 1000, si_brochure, with_prefixes),
    row("gal_US", "gallon, US liquid", volume, 473176473, 125000000000, sp811),
    row("gal_UK", "gallon, UK", volume, 454609, 100000000, sp811),
    row("qt_US", "quart, US liquid", volume, 473176473, 500000000000, sp811),
    row("bbl", "barrel of petroleum (42 gal_US)", volume, 9936705933, 62500000000, sp811),

    si("m", "metre", length),
    row("in", "inch", length, 127, 5000, sp811),
    row("ft", "foot", length, 381, 1250, sp811),
    row("yd", "yard", length, 1143, 1250, sp811),
    row("mi", "mile", length, 201168, 125, sp811),

    si("N", "newton", force),
    row("dyn", "dyne", force, 1, 100000, sp811),
    row("kgf", "kilogram-force", force, 196133, 20000, sp811),
    row("lbf", "pound-force", force, 8896443230521, 2000000000000, sp811),
    row("kip", "kip (1000 lbf)", force, 8896443230521, 2000000000, sp811),

    si("s", "second", time_),
    row("min", "minute", time_, 60, 1, si_brochure),
    row("h", "hour", time_, 3600, 1, si_brochure),
    row("d", "day", time_, 86400, 1, si_brochure),

    fraction("%", "per cent", 100),
    fraction("ppm", "part per million", 1000000),
    fraction("mol%", "mole per cent", 100, Share::mole),
    fraction("vol%", "volume per cent", 100, Share::volume),
    fraction("wt%", "mass per cent", 100, Share::mass),
    fraction("mass%", "mass per cent", 100, Share::mass),
};

// SI Brochure, 9th edition, table 7, with the four of 2022; `u` is micro where there is no µ.
constexpr std::array<Prefix, 25> si_prefixes{{
    {"k", "kilo", 3},     {"M", "mega", 6},    {"G", "giga", 9},    {"T", "tera", 12},
    {"P", "peta", 15},    {"E", "exa", 18},    {"Z", "zetta", 21},  {"Y", "yotta", 24},
    {"R", "ronna", 27},   {"Q", "quetta", 30}, {"da", "deca", 1},   {"h", "hecto", 2},
    {"d", "deci", -1},    {"c", "centi", -2},  {"m", "milli", -3},  {"µ", "micro", -6},
    {"u", "micro", -6},   {"n", "nano", -9},   {"p", "pico", -12},  {"f", "femto", -15},
    {"a", "atto", -18},   {"z", "zepto", -21}, {"y", "yocto", -24}, {"r", "ronto", -27},
    {"q", "quecto", -30},
}};

constexpr std::uint32_t hash(std::string_view name) {
    std::uint32_t h = 2166136261u; // FNV-1a
    for (char const c : name) h = (h ^ static_cast<unsigned char>(c)) * 16777619u;
    return h ^ h >> 15;
}

constexpr std::size_t slots = 512;
constexpr std::uint8_t vacant = 0xFF;
static_assert(rows.size() < vacant);

// Open addressing; the row's index stands in the first vacant slot from its hash on.
constexpr std::array<std::uint8_t, slots> index = [] {
    std::array<std::uint8_t, slots> table{};
    table.fill(vacant);
    for (std::size_t i = 0; i < rows.size(); ++i) {
        std::size_t slot = hash(rows[i].symbol) % slots;
        while (table[slot] != vacant) {
            if (rows[table[slot]].symbol == rows[i].symbol) throw "a symbol stands twice";
            slot = (slot + 1) % slots;
        }
        table[slot] = static_cast<std::uint8_t>(i);
    }
    return table;
}();

UnitRow const* find_row(std::string_view name) {
    for (std::size_t slot = hash(name) % slots; index[slot] != vacant; slot = (slot + 1) % slots)
        if (rows[index[slot]].symbol == name) return &rows[index[slot]];
    return nullptr;
}

bool takes(UnitRow const& row, Prefix const& prefix) {
    return row.prefixes == Prefixes::all ||
           (row.prefixes == Prefixes::multiples && prefix.exponent >= 3);
}

} // namespace

std::string_view citation(Definition source) {
    switch (source) {
    case si_brochure:
        return "BIPM, SI Brochure, 9th edition (2019)";
    case sp811:
        return "NIST Special Publication 811 (2008), appendix B.8";
    case trade:
        return "usage of the trade";
    }
    return "";
}

std::span<UnitRow const> unit_rows() { return rows; }
std::span<Prefix const> prefixes() { return si_prefixes; }

Symbol find_symbol(std::string_view name) {
    if (UnitRow const* row = find_row(name)) return {row, 0};
    for (Prefix const& prefix : si_prefixes) {
        if (!name.starts_with(prefix.symbol)) continue;
        UnitRow const* row = find_row(name.substr(prefix.symbol.size()));
        if (row != nullptr && takes(*row, prefix)) return {row, prefix.exponent};
    }
    return {};
}

} // namespace core::text
