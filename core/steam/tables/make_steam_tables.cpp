// SPDX-License-Identifier: MPL-2.0

// Writes the coefficients of this folder as C++ arrays for core/steam:
//
//   make_steam_tables FOLDER OUTPUT
//
// Digits go over as they are printed. It stops at a table it does not know and at one that is missing.

#include "core/tables/rows.h"

#include <array>
#include <cstdio>
#include <exception>
#include <fstream>
#include <map>
#include <stdexcept>
#include <string>
#include <vector>

namespace {

using tables::Fields;

struct Name {
    const char *table, *array;
};

// Tables of R7-97 by their number; 10m are the two coefficients of table 10 that differ for the
// metastable vapour, with those that do not.
constexpr std::array<Name, 20> names{{{"1", "boundary_2_3"},       {"2", "region_1"},
                                      {"6", "temperature_1_ph"},   {"8", "temperature_1_ps"},
                                      {"10", "region_2_ideal"},    {"11", "region_2_residual"},
                                      {"10m", "metastable_ideal"}, {"16", "metastable_residual"},
                                      {"19", "boundary_2b_2c"},    {"20", "temperature_2a_ph"},
                                      {"21", "temperature_2b_ph"}, {"22", "temperature_2c_ph"},
                                      {"25", "temperature_2a_ps"}, {"26", "temperature_2b_ps"},
                                      {"27", "temperature_2c_ps"}, {"30", "region_3"},
                                      {"34", "saturation"},        {"37", "region_5_ideal"},
                                      {"38", "region_5_residual"}, {nullptr, nullptr}}};

// Equations of SR3-03 by what they give.
constexpr std::array<Name, 9> backward_names{{{"3a T(p,h)", "temperature_3a_ph"},
                                              {"3b T(p,h)", "temperature_3b_ph"},
                                              {"3a v(p,h)", "volume_3a_ph"},
                                              {"3b v(p,h)", "volume_3b_ph"},
                                              {"3a T(p,s)", "temperature_3a_ps"},
                                              {"3b T(p,s)", "temperature_3b_ps"},
                                              {"3a v(p,s)", "volume_3a_ps"},
                                              {"3b v(p,s)", "volume_3b_ps"},
                                              {nullptr, nullptr}}};

/// An exponent, 0 where the table has none. Those of pressure in table 25 are quarters: its variable is
/// the fourth root.
std::string exponent(std::string const& field, int times = 1) {
    if (field.empty()) return "0";
    const double value = times * tables::number(field);
    const int whole = static_cast<int>(value);
    if (whole != value) throw std::runtime_error("an exponent that is not whole: " + field);
    return std::to_string(whole);
}

using Rows = std::map<std::string, std::vector<std::string>>;

template<class Names>
void write(std::ofstream& out, Names const& all, Rows rows) {
    for (Name const& name : all) {
        if (!name.table) break;
        const auto found = rows.find(name.table);
        if (found == rows.end()) throw std::runtime_error(std::string("no table ") + name.table);
        out << "inline constexpr std::array<Term, " << found->second.size() << "> " << name.array
            << "{{\n";
        for (std::string const& row : found->second) out << "    {" << row << "},\n";
        out << "}};\n";
        rows.erase(found);
    }
    if (!rows.empty()) throw std::runtime_error("unknown table " + rows.begin()->first);
}

Rows coefficients(std::string const& folder) {
    Rows rows;
    for (Fields const& f : tables::read_rows(folder + "/coefficients.csv",
                                             {"table", "equation", "content", "i", "I", "J", "n"}))
        rows[f[0]].push_back(exponent(f[4], f[0] == "25" ? 4 : 1) + ", " + exponent(f[5]) + ", " +
                             f[6]);
    return rows;
}

Rows backward(std::string const& folder) {
    Rows rows;
    for (Fields const& f : tables::read_rows(folder + "/region_3_backward.csv",
                                             {"equation", "result_scale", "p_star_MPa", "x_star",
                                              "x_kind", "pi_shift", "x_shift", "i", "I", "J", "n"}))
        rows[f[0]].push_back(exponent(f[8]) + ", " + exponent(f[9]) + ", " + f[10]);
    return rows;
}

} // namespace

int main(int argc, char** argv) {
    if (argc != 3) {
        std::fputs("make_steam_tables FOLDER OUTPUT\n", stderr);
        return 2;
    }
    try {
        std::ofstream out(argv[2]);
        out << "// Written by make_steam_tables from core/steam/tables.\n";
        write(out, names, coefficients(argv[1]));
        write(out, backward_names, backward(argv[1]));
        out.close();
        if (!out) throw std::runtime_error("cannot write");
    } catch (std::exception const& problem) {
        std::fprintf(stderr, "make_steam_tables: %s\n", problem.what());
        return 1;
    }
    return 0;
}
