// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/committed.h"
#include "registration/writers/writers.h"

#include <exception>
#include <fstream>
#include <iostream>
#include <sstream>
#include <stdexcept>
#include <string_view>

// describe_addin FOLDER          writes everything that the build takes from the catalogue
// describe_addin --check FOLDER  compares the committed files with the catalogue
// describe_addin --renew FOLDER  renews them

namespace {

using namespace registration::writers;
using Writer = void (*)(std::ostream&);

/// A file that would not change keeps its time, and nothing is built again because of it.
void write(std::filesystem::path const& file, Writer writer) {
    std::ostringstream fresh, have;
    writer(fresh);
    if (std::ifstream in(file); in && (have << in.rdbuf()) && have.view() == fresh.view()) return;
    std::ofstream out(file);
    out << fresh.view();
    out.close();
    if (!out) throw std::runtime_error("cannot write " + file.string());
}

void write_all(std::filesystem::path const& folder) {
    write(folder / "entropycells.idl", write_idl);
    write(folder / "CalcAddIns.xcu", write_calc_addins);
    write(folder / "methods.h", write_method_declarations);
    write(folder / "methods.inc", write_method_definitions);
    write(folder / "examples.fods", write_example_sheet);
}

} // namespace

int main(int argc, char** argv) {
    const std::string_view mode = argc == 3 ? argv[1] : "";
    if (argc != 2 && mode != "--check" && mode != "--renew") {
        std::cerr << "usage: describe_addin [--check | --renew] FOLDER\n";
        return 2;
    }
    try {
        if (mode == "--check")
            check_committed(argv[2]);
        else if (mode == "--renew")
            renew_committed(argv[2]);
        else
            write_all(argv[1]);
    } catch (std::exception const& failure) {
        std::cerr << "describe_addin: " << failure.what() << '\n';
        return 1;
    }
    return 0;
}
