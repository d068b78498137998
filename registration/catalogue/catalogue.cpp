// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include <cctype>

namespace registration::catalogue {

std::span<const Section> sections() {
    static const Section all[] = {
        {"Phase change", phase_change()},
        {"Heat crossing a boundary", heat()},
        {"Simple processes", simple_processes()},
        {"Variable heat capacity and tables", variable_heat_capacity()},
        {"Tables and curves", tables()},
        {"Water and steam", steam()},
        {"Real gases", real_gas()},
        {"Mixing", mixing()},
        {"Balances and the second law", balance()},
        {"Streams", streams()},
        {"End states", end_states()},
        {"Heated bodies", heated_bodies()},
        {"Where data are missing", missing_data()},
        {"Chemical formulas", formulas()},
        {"Quantities", quantities()},
        {"About", about()},
    };
    return all;
}

std::string id(Entry const& entry) {
    std::string text;
    bool upper = false;
    for (const char* c = entry.name; *c; ++c) {
        if (*c == '.')
            upper = true;
        else {
            const auto letter = static_cast<unsigned char>(*c);
            text += static_cast<char>(upper ? std::toupper(letter) : std::tolower(letter));
            upper = false;
        }
    }
    return text;
}

Entry const* find(std::string_view name) {
    for (Section const& section : sections())
        for (Entry const& entry : section.entries)
            if (name == entry.name) return &entry;
    return nullptr;
}

} // namespace registration::catalogue
