// SPDX-License-Identifier: MPL-2.0
#include "core/substances/atomic_weights.h"

#include <array>
#include <cstddef>

namespace core::substances {

namespace {

// Table 1 of the source, abridged values in 1e-4, row n for atomic number n + 1.
constexpr std::array<Element, 118> table{{
    // clang-format off
    {"H", "hydrogen", 10080},
    {"He", "helium", 40026},
    {"Li", "lithium", 69400},
    {"Be", "beryllium", 90122},
    {"B", "boron", 108100},
    {"C", "carbon", 120110},
    {"N", "nitrogen", 140070},
    {"O", "oxygen", 159990},
    {"F", "fluorine", 189980},
    {"Ne", "neon", 201800},
    {"Na", "sodium", 229900},
    {"Mg", "magnesium", 243050},
    {"Al", "aluminium", 269820},
    {"Si", "silicon", 280850},
    {"P", "phosphorus", 309740},
    {"S", "sulfur", 320600},
    {"Cl", "chlorine", 354500},
    {"Ar", "argon", 399500},
    {"K", "potassium", 390980},
    {"Ca", "calcium", 400780},
    {"Sc", "scandium", 449560},
    {"Ti", "titanium", 478670},
    {"V", "vanadium", 509420},
    {"Cr", "chromium", 519960},
    {"Mn", "manganese", 549380},
    {"Fe", "iron", 558450},
    {"Co", "cobalt", 589330},
    {"Ni", "nickel", 586930},
    {"Cu", "copper", 635460},
    {"Zn", "zinc", 653800},
    {"Ga", "gallium", 697230},
    {"Ge", "germanium", 726300},
    {"As", "arsenic", 749220},
    {"Se", "selenium", 789710},
    {"Br", "bromine", 799040},
    {"Kr", "krypton", 837980},
    {"Rb", "rubidium", 854680},
    {"Sr", "strontium", 876200},
    {"Y", "yttrium", 889060},
    {"Zr", "zirconium", 912240},
    {"Nb", "niobium", 929060},
    {"Mo", "molybdenum", 959500},
    {"Tc", "technetium", 0},
    {"Ru", "ruthenium", 1010700},
    {"Rh", "rhodium", 1029100},
    {"Pd", "palladium", 1064200},
    {"Ag", "silver", 1078700},
    {"Cd", "cadmium", 1124100},
    {"In", "indium", 1148200},
    {"Sn", "tin", 1187100},
    {"Sb", "antimony", 1217600},
    {"Te", "tellurium", 1276000},
    {"I", "iodine", 1269000},
    {"Xe", "xenon", 1312900},
    {"Cs", "caesium", 1329100},
    {"Ba", "barium", 1373300},
    {"La", "lanthanum", 1389100},
    {"Ce", "cerium", 1401200},
    {"Pr", "praseodymium", 1409100},
    {"Nd", "neodymium", 1442400},
    {"Pm", "promethium", 0},
    {"Sm", "samarium", 1503600},
    {"Eu", "europium", 1519600},
    {"Gd", "gadolinium", 1572500},
    {"Tb", "terbium", 1589300},
    {"Dy", "dysprosium", 1625000},
    {"Ho", "holmium", 1649300},
    {"Er", "erbium", 1672600},
    {"Tm", "thulium", 1689300},
    {"Yb", "ytterbium", 1730500},
    {"Lu", "lutetium", 1749700},
    {"Hf", "hafnium", 1784900},
    {"Ta", "tantalum", 1809500},
    {"W", "tungsten", 1838400},
    {"Re", "rhenium", 1862100},
    {"Os", "osmium", 1902300},
    {"Ir", "iridium", 1922200},
    {"Pt", "platinum", 1950800},
    {"Au", "gold", 1969700},
    {"Hg", "mercury", 2005900},
    {"Tl", "thallium", 2043800},
    {"Pb", "lead", 2072000},
    {"Bi", "bismuth", 2089800},
    {"Po", "polonium", 0},
    {"At", "astatine", 0},
    {"Rn", "radon", 0},
    {"Fr", "francium", 0},
    {"Ra", "radium", 0},
    {"Ac", "actinium", 0},
    {"Th", "thorium", 2320400},
    {"Pa", "protactinium", 2310400},
    {"U", "uranium", 2380300},
    {"Np", "neptunium", 0},
    {"Pu", "plutonium", 0},
    {"Am", "americium", 0},
    {"Cm", "curium", 0},
    {"Bk", "berkelium", 0},
    {"Cf", "californium", 0},
    {"Es", "einsteinium", 0},
    {"Fm", "fermium", 0},
    {"Md", "mendelevium", 0},
    {"No", "nobelium", 0},
    {"Lr", "lawrencium", 0},
    {"Rf", "rutherfordium", 0},
    {"Db", "dubnium", 0},
    {"Sg", "seaborgium", 0},
    {"Bh", "bohrium", 0},
    {"Hs", "hassium", 0},
    {"Mt", "meitnerium", 0},
    {"Ds", "darmstadtium", 0},
    {"Rg", "roentgenium", 0},
    {"Cn", "copernicium", 0},
    {"Nh", "nihonium", 0},
    {"Fl", "flerovium", 0},
    {"Mc", "moscovium", 0},
    {"Lv", "livermorium", 0},
    {"Ts", "tennesine", 0},
    {"Og", "organesson", 0},
    // clang-format on
}};

constexpr std::size_t letters = 26;

/// A place for each symbol: its capital, then its small letter or none.
constexpr std::size_t place_of(std::string_view symbol) {
    const auto first = static_cast<std::size_t>(symbol[0] - 'A');
    return first * (letters + 1) +
           (symbol.size() == 1 ? letters : static_cast<std::size_t>(symbol[1] - 'a'));
}

/// Atomic numbers by place, 0 where no element has the symbol.
constexpr auto by_symbol = [] {
    std::array<std::uint8_t, letters*(letters + 1)> numbers{};
    for (std::size_t row = 0; row < table.size(); ++row)
        numbers[place_of(table[row].symbol)] = static_cast<std::uint8_t>(row + 1);
    return numbers;
}();

constexpr bool spells_symbol(std::string_view text) {
    return (text.size() == 1 || (text.size() == 2 && text[1] >= 'a' && text[1] <= 'z')) &&
           text[0] >= 'A' && text[0] <= 'Z';
}

} // namespace

std::span<const Element> elements() { return table; }

Element const* find_element(std::string_view symbol) {
    if (!spells_symbol(symbol)) return nullptr;
    const std::size_t number = by_symbol[place_of(symbol)];
    return number == 0 ? nullptr : &table[number - 1];
}

} // namespace core::substances
