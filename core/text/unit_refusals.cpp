// SPDX-License-Identifier: MPL-2.0
#include "core/text/unit_refusals.h"

#include "core/failure.h"
#include "core/text/characters.h"
#include "core/text/unit_table.h"

#include <algorithm>
#include <array>
#include <bit>
#include <cstdint>
#include <string>

namespace core::text {
namespace {

constexpr std::string_view calories =
    "write `cal_th` (thermochemical, 4.184 J) or `cal_IT` (4.1868 J)";
constexpr std::string_view kilocalories =
    "write `kcal_th` (thermochemical, 4184 J) or `kcal_IT` (4186.8 J)";
constexpr std::string_view british =
    "write `Btu_IT` (International Table) or `Btu_th` (thermochemical)";
constexpr std::string_view thousand_british =
    "write `kBtu_IT` (a thousand) or `MMBtu_IT` (a million)";
constexpr std::string_view gas = "give the gas as an amount of substance through AMOUNT.GAS";
constexpr std::string_view tons =
    "write `t` (1000 kg), `ton_short` (2000 lb), `ton_long` (2240 lb) or `TR` (refrigeration)";
constexpr std::string_view more_than_one = "stands for more than one unit";
constexpr std::string_view volume_of_gas =
    "is a volume at reference conditions that it does not state";
constexpr std::string_view left_out = "is not in the unit table";

constexpr std::array refused{
    RefusedName{"C", "is the coulomb", "°C", ""},
    RefusedName{"F", "is the farad", "°F", ""},
    RefusedName{"R", "is the roentgen", "°R", ""},
    RefusedName{"°", "is an angle", "", "write `°C`, `°F` or `°R` without a space inside"},
    RefusedName{"deg", "is an angle", "", "write `°C`, `°F` or `°R`"},
    RefusedName{"°K", "is the kelvin's name from before 1967", "K", ""},
    RefusedName{"degK", "is the kelvin's name from before 1967", "K", ""},
    RefusedName{"Nm", "reads as nanometre or newton metre", "N·m", ""},
    RefusedName{"Nm3", volume_of_gas, "", gas},
    RefusedName{"Sm3", volume_of_gas, "", gas},
    RefusedName{"Sm", volume_of_gas, "", gas},
    RefusedName{"NL", volume_of_gas, "", gas},
    RefusedName{"Nl", volume_of_gas, "", gas},
    RefusedName{"scf", volume_of_gas, "", gas},
    RefusedName{"SCF", volume_of_gas, "", gas},
    RefusedName{"Mscf", volume_of_gas, "", gas},
    RefusedName{"MMscf", volume_of_gas, "", gas},
    RefusedName{"scfm", volume_of_gas, "", gas},
    RefusedName{"SCFM", volume_of_gas, "", gas},
    RefusedName{"scfh", volume_of_gas, "", gas},
    RefusedName{"sccm", volume_of_gas, "", gas},
    RefusedName{"slpm", volume_of_gas, "", gas},
    RefusedName{"cal", more_than_one, "", calories},
    RefusedName{"Cal", more_than_one, "", kilocalories},
    RefusedName{"kcal", more_than_one, "", kilocalories},
    RefusedName{"Mcal", more_than_one, "", "write `Mcal_th` or `Mcal_IT`"},
    RefusedName{"Gcal", more_than_one, "", "write `Gcal_th` or `Gcal_IT`"},
    RefusedName{"Btu", more_than_one, "", british},
    RefusedName{"BTU", more_than_one, "", british},
    RefusedName{"btu", more_than_one, "", british},
    RefusedName{"BtuIT", "lacks its underscore", "Btu_IT", ""},
    RefusedName{"calIT", "lacks its underscore", "cal_IT", ""},
    RefusedName{"calth", "lacks its underscore", "cal_th", ""},
    RefusedName{"kBtu", more_than_one, "", thousand_british},
    RefusedName{"kBTU", more_than_one, "", thousand_british},
    RefusedName{"MBtu", more_than_one, "", thousand_british},
    RefusedName{"MBTU", more_than_one, "", thousand_british},
    RefusedName{"mmBtu", more_than_one, "", thousand_british},
    RefusedName{"mmBTU", more_than_one, "", thousand_british},
    RefusedName{"MMBtu", more_than_one, "MMBtu_IT", ""},
    RefusedName{"MMBTU", more_than_one, "MMBtu_IT", ""},
    RefusedName{"MBH", more_than_one, "kBtu_IT/h", ""},
    RefusedName{"therm", more_than_one, "", "write `therm_US` or `therm_EC`"},
    RefusedName{"therms", more_than_one, "", "write `therm_US` or `therm_EC`"},
    RefusedName{"e", "is no unit", "", "write `cal_th/(mol·K)` for the entropy unit e.u."},
    RefusedName{"eu", "is the entropy unit of old tables", "cal_th/(mol·K)", ""},
    RefusedName{"ton", more_than_one, "", tons},
    RefusedName{"tons", more_than_one, "", tons},
    RefusedName{"RT", more_than_one, "TR", ""},
    RefusedName{"mt", more_than_one, "t", ""},
    RefusedName{"MT", more_than_one, "t", ""},
    RefusedName{"gal", more_than_one, "", "write `gal_US` or `gal_UK`"},
    RefusedName{"gpm", "is an abbreviation of words", "gal_US/min", ""},
    RefusedName{"qt", more_than_one, "", "write `qt_US`, or the volume in `L`"},
    RefusedName{"cfm", "is an abbreviation of words", "ft³/min", ""},
    RefusedName{"cc", "is an abbreviation of words", "cm³", ""},
    RefusedName{"hr", "is no symbol", "h", ""},
    RefusedName{"hrs", "is no symbol", "h", ""},
    RefusedName{"sec", "is no symbol", "s", ""},
    RefusedName{"yr", more_than_one, "", "write the time in `d` or `h`"},
    RefusedName{"lbs", "is no symbol", "lb", ""},
    RefusedName{"lbmole", "is no symbol", "lbmol", ""},
    RefusedName{"gmol", "is no symbol", "mol", ""},
    RefusedName{"kgmol", "is no symbol", "kmol", ""},
    RefusedName{"HP", "is no symbol", "hp", ""},
    RefusedName{"PS", "is the metric horsepower", "hp_metric", ""},
    RefusedName{"CV", "is the metric horsepower", "hp_metric", ""},
    RefusedName{"kp", "is the kilopond", "kgf", ""},
    RefusedName{"ata", "is the technical atmosphere", "at(a)", ""},
    RefusedName{"atg", "is the technical atmosphere", "at(g)", ""},
    RefusedName{"PSI", "is no symbol", "psi", ""},
    RefusedName{"PSIA", "is no symbol", "psia", ""},
    RefusedName{"PSIG", "is no symbol", "psig", ""},
    RefusedName{"kPag", "hides the mark of a gauge pressure", "kPa(g)", ""},
    RefusedName{"kPaa", "hides the mark of an absolute pressure", "kPa(a)", ""},
    RefusedName{"MPag", "hides the mark of a gauge pressure", "MPa(g)", ""},
    RefusedName{"MPaa", "hides the mark of an absolute pressure", "MPa(a)", ""},
    RefusedName{"abs", "is no unit", "", "mark the pressure as `bar(a)`"},
    RefusedName{"absolute", "is no unit", "", "mark the pressure as `bar(a)`"},
    RefusedName{"gauge", "is no unit", "", "mark the pressure as `bar(g)`"},
    RefusedName{"Hg", "needs its length before it", "", "write `mmHg` or `inHg`"},
    RefusedName{"H2O", "needs its length before it", "", "write `mmH2O` or `inH2O`"},
    RefusedName{"WC", "is a column of water", "", "write `mmH2O` or `inH2O`"},
    RefusedName{"wc", "is a column of water", "", "write `mmH2O` or `inH2O`"},
    RefusedName{"toe", left_out, "", "write the energy in `GJ` (1 toe is 41.868 GJ)"},
    RefusedName{"tTNT", left_out, "", "write the energy in `GJ` (1 tTNT is 4.184 GJ)"},
    RefusedName{"cal_15", left_out, "", calories},
    RefusedName{"Btu_59F", left_out, "", british},
    RefusedName{"slug", left_out, "", "write the mass in `kg` or `lb`"},
    RefusedName{"gr", left_out, "", "write the mass in `mg` (1 grain is 64.79891 mg)"},
};

struct FullName {
    std::string_view name; ///< small letters, singular
    std::string_view symbol;
};

constexpr std::array full_names{
    FullName{"joule", "J"},        FullName{"watt", "W"},          FullName{"pascal", "Pa"},
    FullName{"kelvin", "K"},       FullName{"mole", "mol"},        FullName{"gram", "g"},
    FullName{"gramme", "g"},       FullName{"metre", "m"},         FullName{"meter", "m"},
    FullName{"second", "s"},       FullName{"minute", "min"},      FullName{"hour", "h"},
    FullName{"day", "d"},          FullName{"litre", "L"},         FullName{"liter", "L"},
    FullName{"newton", "N"},       FullName{"celsius", "°C"},      FullName{"centigrade", "°C"},
    FullName{"fahrenheit", "°F"},  FullName{"rankine", "°R"},      FullName{"bar", "bar"},
    FullName{"atmosphere", "atm"}, FullName{"tonne", "t"},         FullName{"pound", "lb"},
    FullName{"ounce", "oz"},       FullName{"inch", "in"},         FullName{"inches", "in"},
    FullName{"foot", "ft"},        FullName{"feet", "ft"},         FullName{"yard", "yd"},
    FullName{"mile", "mi"},        FullName{"horsepower", "hp"},   FullName{"barrel", "bbl"},
    FullName{"dyne", "dyn"},       FullName{"electronvolt", "eV"}, FullName{"percent", "%"},
    FullName{"torr", "torr"},      FullName{"erg", "erg"},
};

// Prefixed symbols near which a misspelling may lie.
constexpr std::array usual_symbols{
    std::string_view("kJ"),      std::string_view("MJ"),   std::string_view("GJ"),
    std::string_view("mJ"),      std::string_view("kW"),   std::string_view("MW"),
    std::string_view("kPa"),     std::string_view("MPa"),  std::string_view("hPa"),
    std::string_view("mbar"),    std::string_view("kmol"), std::string_view("mmol"),
    std::string_view("kWh"),     std::string_view("MWh"),  std::string_view("kcal_th"),
    std::string_view("kcal_IT"), std::string_view("mL"),   std::string_view("mm"),
    std::string_view("cm"),      std::string_view("km"),   std::string_view("mg"),
    std::string_view("mK"),      std::string_view("kN"),   std::string_view("ms"),
};

std::string in_small_letters(std::string_view text) {
    std::string result(text);
    for (char& c : result)
        if (c >= 'A' && c <= 'Z') c = static_cast<char>(c - 'A' + 'a');
    return result;
}

/// The symbol of a name as `joule`, `Kilojoules`; empty where it is none.
std::string symbol_of_full_name(std::string_view name) {
    std::string const small = in_small_letters(name);
    auto const symbol_of = [](std::string_view word) -> std::string_view {
        for (FullName const& full : full_names)
            if (word == full.name ||
                (word.ends_with('s') && word.substr(0, word.size() - 1) == full.name))
                return full.symbol;
        return {};
    };
    if (std::string_view const symbol = symbol_of(small); !symbol.empty())
        return std::string(symbol);
    for (Prefix const& prefix : prefixes()) {
        if (!small.starts_with(prefix.name)) continue;
        std::string_view const symbol =
            symbol_of(std::string_view(small).substr(prefix.name.size()));
        std::string const whole = std::string(prefix.symbol).append(symbol);
        if (!symbol.empty() && find_symbol(whole)) return whole;
    }
    return {};
}

/// Which letters a name contains, case aside: rules out far names before they are compared.
constexpr std::uint32_t letters(std::string_view name) {
    std::uint32_t set = 0;
    for (char const c : name) set |= 1u << (static_cast<unsigned char>(c) & 31u);
    return set;
}

/// Edit distance, an edit or a swap of neighbours counting 3 and a difference in case alone 1.
int distance(std::string_view a, std::string_view b) {
    constexpr std::size_t longest = 16;
    constexpr int edit = 3;
    if (a.size() > longest || b.size() > longest) return 99;
    auto const small = [](char c) { return c >= 'A' && c <= 'Z' ? static_cast<char>(c + 32) : c; };
    auto const differ = [&](char x, char y) {
        return x == y ? 0 : small(x) == small(y) ? 1 : edit;
    };
    std::array<std::array<int, longest + 1>, longest + 1> d{};
    for (std::size_t i = 0; i <= a.size(); ++i) d[i][0] = edit * static_cast<int>(i);
    for (std::size_t j = 0; j <= b.size(); ++j) d[0][j] = edit * static_cast<int>(j);
    for (std::size_t i = 1; i <= a.size(); ++i)
        for (std::size_t j = 1; j <= b.size(); ++j) {
            d[i][j] = std::min({d[i - 1][j] + edit, d[i][j - 1] + edit,
                                d[i - 1][j - 1] + differ(a[i - 1], b[j - 1])});
            if (i > 1 && j > 1 && a[i - 1] == b[j - 2] && a[i - 2] == b[j - 1])
                d[i][j] = std::min(d[i][j], d[i - 2][j - 2] + edit);
        }
    return d[a.size()][b.size()];
}

/// The nearest known spellings, three at most.
class Nearest {
public:
    explicit Nearest(std::string_view name)
        : name_(name), letters_(letters(name)), best_(name.size() < 2   ? 1
                                                      : name.size() < 4 ? 4
                                                                        : 7) {}

    void consider(std::string_view candidate) {
        if (std::popcount(letters_ ^ letters(candidate)) > best_) return;
        int const d = distance(name_, candidate);
        if (d > best_) return;
        if (d < best_) count_ = 0;
        best_ = d;
        if (count_ < found_.size()) found_[count_++] = candidate;
    }
    bool any() const { return count_ != 0; }
    std::string list() const {
        std::string text = quoted(found_[0]);
        for (std::size_t i = 1; i < count_; ++i)
            text += (i + 1 == count_ ? " or " : ", ") + quoted(found_[i]);
        return text;
    }

private:
    std::string_view name_;
    std::uint32_t letters_;
    int best_;
    std::array<std::string_view, 3> found_{};
    std::size_t count_ = 0;
};

Nearest nearest_to(std::string_view name) {
    Nearest nearest(name);
    for (std::string_view const symbol : usual_symbols) nearest.consider(symbol);
    for (UnitRow const& row : unit_rows()) nearest.consider(row.symbol);
    return nearest;
}

std::string replaced(std::string_view whole, std::string_view part, std::string_view by) {
    auto const at = static_cast<std::size_t>(part.data() - whole.data());
    return std::string(whole.substr(0, at)).append(by).append(whole.substr(at + part.size()));
}

} // namespace

RefusedName const* find_refused_name(std::string_view name) {
    auto const found = std::find_if(refused.begin(), refused.end(),
                                    [&](RefusedName const& r) { return r.name == name; });
    return found == refused.end() ? nullptr : &*found;
}

void refuse_name(std::string_view whole, std::string_view name, std::string_view folded) {
    std::string const subject = "a unit by its symbol; " + quoted(name) + " ";
    if (RefusedName const* known = find_refused_name(folded)) {
        std::string repair = known->replacement.empty()
                                 ? std::string(known->repair)
                                 : write_instead(replaced(whole, name, known->replacement));
        refuse_unfit(shown(whole), subject + std::string(known->reason), std::move(repair));
    }
    if (std::string const symbol = symbol_of_full_name(folded); !symbol.empty())
        refuse_unfit(shown(whole), subject + "is a unit's full name",
                     write_instead(replaced(whole, name, symbol)));
    Nearest const nearest = nearest_to(folded);
    refuse_unfit(shown(whole), subject + "is not one that is known",
                 nearest.any() ? "write " + nearest.list() + " if that is meant"
                               : "write the unit with symbols such as `kJ`, `mol`, `K`, `bar`");
}

} // namespace core::text
