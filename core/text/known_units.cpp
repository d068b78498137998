// SPDX-License-Identifier: MPL-2.0
#include "core/text/known_units.h"

#include "core/text/characters.h"
#include "core/text/unit_expression.h"

#include <array>
#include <cstdint>
#include <string>

namespace core::text {
namespace {

constexpr std::string_view expressions[] = {"K",
                                            "°C",
                                            "°F",
                                            "°R",
                                            "Δ°C",
                                            "Pa",
                                            "kPa",
                                            "MPa",
                                            "bar",
                                            "mbar",
                                            "atm",
                                            "psi",
                                            "bar(g)",
                                            "bar(a)",
                                            "J",
                                            "kJ",
                                            "MJ",
                                            "GJ",
                                            "kWh",
                                            "MWh",
                                            "W",
                                            "kW",
                                            "MW",
                                            "J/mol",
                                            "kJ/mol",
                                            "kJ/kmol",
                                            "MJ/kmol",
                                            "J/kg",
                                            "J/g",
                                            "kJ/kg",
                                            "MJ/kg",
                                            "Btu_IT/lb",
                                            "cal_th/mol",
                                            "kcal_th/mol",
                                            "kcal_th/kg",
                                            "J/K",
                                            "kJ/K",
                                            "MJ/K",
                                            "W/K",
                                            "kW/K",
                                            "kJ/(h·K)",
                                            "J/(mol·K)",
                                            "kJ/(mol·K)",
                                            "kJ/(kmol·K)",
                                            "J/(kg·K)",
                                            "J/(g·K)",
                                            "kJ/(kg·K)",
                                            "J/(mol K)",
                                            "kJ/(kg K)",
                                            "J/(kg K)",
                                            "cal_th/(mol·K)",
                                            "Btu_IT/(lb·°F)",
                                            "Btu_IT/(lb·°R)",
                                            "mol",
                                            "kmol",
                                            "kg",
                                            "g",
                                            "t",
                                            "lb",
                                            "lbmol",
                                            "mol/s",
                                            "kmol/h",
                                            "kg/s",
                                            "kg/h",
                                            "t/h",
                                            "g/mol",
                                            "kg/mol",
                                            "kg/kmol",
                                            "m³",
                                            "L",
                                            "m³/h",
                                            "m³/s",
                                            "L/min",
                                            "m³/kg",
                                            "m³/mol",
                                            "cm³/mol",
                                            "1/K",
                                            "W/m²",
                                            "kW/m²",
                                            "%",
                                            "mol%",
                                            "wt%",
                                            "1",
                                            "s",
                                            "min",
                                            "h"};

constexpr std::uint32_t hash(std::string_view text) {
    std::uint32_t value = 2166136261u; // FNV-1a
    for (const char c : text) value = (value ^ static_cast<unsigned char>(c)) * 16777619u;
    return value ^ value >> 15;
}

/// Open addressing, four slots an entry; filled once and never changed.
class Table {
public:
    Table() {
        for (std::string_view const text : expressions) {
            std::size_t at = hash(text) % slots_.size();
            while (!slots_[at].text.empty()) at = (at + 1) % slots_.size();
            std::string note;
            Cursor cursor(text);
            slots_[at] = {text, UnitExpression(cursor, note).read()};
        }
    }
    Unit const* find(std::string_view text) const {
        for (std::size_t at = hash(text) % slots_.size(); !slots_[at].text.empty();
             at = (at + 1) % slots_.size())
            if (slots_[at].text == text) return &slots_[at].unit;
        return nullptr;
    }

private:
    struct Slot {
        std::string_view text;
        Unit unit;
    };
    std::array<Slot, 512> slots_{};
};
static_assert(std::size(expressions) * 4 <= 512);

} // namespace

Unit const* find_known_unit(std::string_view text) {
    static const Table table;
    return text.size() <= 20 ? table.find(text) : nullptr;
}

std::span<const std::string_view> known_units() { return expressions; }

} // namespace core::text
