// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"
#include "registration/writers/writers.h"

namespace registration::writers {
namespace {

constexpr const char* any = "css::uno::Any";

void write_parameters(std::ostream& out, Entry const& entry) {
    for (std::size_t at = 0; at < entry.argument_count(); ++at)
        out << (at ? ", " : "") << any << " const& a" << at;
}

} // namespace

void write_method_declarations(std::ostream& out) {
    out << "// Written from the catalogue by describe_addin.\n";
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) {
            out << any << " SAL_CALL " << catalogue::id(entry) << "(";
            write_parameters(out, entry);
            out << ") override;\n";
        }
}

void write_method_definitions(std::ostream& out) {
    out << "// Written from the catalogue by describe_addin.\n";
    std::size_t section_number = 0;
    for (auto const& section : catalogue::sections()) {
        std::size_t number = 0;
        for (Entry const& entry : section.entries) {
            out << any << " Functions::" << catalogue::id(entry) << "(";
            write_parameters(out, entry);
            out << ") { return answer({" << section_number << ", " << number++ << "}, {";
            for (std::size_t at = 0; at < entry.argument_count(); ++at)
                out << (at ? ", " : "") << "&a" << at;
            out << "}); }\n";
        }
        ++section_number;
    }
}

} // namespace registration::writers
