// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/writers.h"

#include <exception>
#include <filesystem>
#include <fstream>
#include <iostream>

// describe_addin FOLDER: writes everything that follows from the catalogue into a folder.

namespace {

using Writer = void (*)(std::ostream&);

void write(std::filesystem::path const& file, Writer writer) {
    std::ofstream out(file);
    writer(out);
    out.close();
    if (!out) throw std::runtime_error("cannot write " + file.string());
}

} // namespace

int main(int argc, char** argv) {
    using namespace registration::writers;
    if (argc != 2) {
        std::cerr << "usage: describe_addin FOLDER\n";
        return 2;
    }
    try {
        const std::filesystem::path folder = argv[1];
        write(folder / "entropycells.idl", write_idl);
        write(folder / "CalcAddIns.xcu", write_calc_addins);
        write(folder / "methods.h", write_method_declarations);
        write(folder / "methods.inc", write_method_definitions);
        write(folder / "FUNCTIONS.md", write_function_list);
        write(folder / "examples.fods", write_example_sheet);
        write(folder / "ids.txt", write_ids);
    } catch (std::exception const& failure) {
        std::cerr << "describe_addin: " << failure.what() << '\n';
        return 1;
    }
    return 0;
}
