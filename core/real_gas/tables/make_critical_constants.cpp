// SPDX-License-Identifier: MPL-2.0

// Writes the critical constants of this folder as a C++ array for core/real_gas:
//
//   make_critical_constants FOLDER OUTPUT
//
// It stops at a figure that is no number and at a fluid without a reference.

#include "core/tables/rows.h"

#include <cstdio>
#include <exception>
#include <fstream>
#include <stdexcept>
#include <string>

namespace {

using tables::Fields;

std::string quoted(std::string const& text) {
    if (text.empty() || text.find_first_of("\"\\") != std::string::npos)
        throw std::runtime_error("a text that cannot be written: " + text);
    return '"' + text + '"';
}

/// A figure as it is printed.
std::string figure(std::string const& field) {
    static_cast<void>(tables::number(field));
    return field;
}

void write(std::ofstream& out, std::string const& folder) {
    const Fields columns{"name",
                         "formula",
                         "CAS",
                         "molar_mass_kg_per_mol",
                         "Tc_K",
                         "pc_Pa",
                         "acentric_factor",
                         "primary_reference",
                         "other_published_values",
                         "obtained_how"};
    const auto rows = tables::read_rows(folder + "/critical_constants.csv", columns);
    out << "// Written by make_critical_constants from core/real_gas/tables.\n"
        << "constexpr std::array<CriticalPoint, " << rows.size() << "> critical_table{{\n";
    for (Fields const& f : rows)
        out << "    {" << quoted(f[0]) << ", " << quoted(f[1]) << ", " << figure(f[3]) << ", "
            << figure(f[4]) << ", " << figure(f[5]) << ", " << figure(f[6]) << ", " << quoted(f[7])
            << "},\n";
    out << "}};\n";
}

} // namespace

int main(int argc, char** argv) {
    if (argc != 3) {
        std::fputs("make_critical_constants FOLDER OUTPUT\n", stderr);
        return 2;
    }
    try {
        std::ofstream out(argv[2]);
        write(out, argv[1]);
        out.close();
        if (!out) throw std::runtime_error("cannot write");
    } catch (std::exception const& problem) {
        std::fprintf(stderr, "make_critical_constants: %s\n", problem.what());
        return 1;
    }
    return 0;
}
