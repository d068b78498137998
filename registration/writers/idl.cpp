// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"
#include "registration/writers/words.h"
#include "registration/writers/writers.h"

namespace registration::writers {

void write_idl(std::ostream& out) {
    out << "// Written from the catalogue by describe_addin.\n"
           "module entropycells {\n"
           "    interface XFunctions {\n";
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) {
            out << "        any " << catalogue::id(entry) << "(";
            for (std::size_t at = 0; at < entry.argument_count(); ++at)
                out << (at ? ", " : "") << "[in] any " << parameter_id(entry.arguments[at].name);
            out << ");\n";
        }
    out << "    };\n"
           "    service Functions : XFunctions;\n"
           "};\n";
}

void write_ids(std::ostream& out) {
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) out << catalogue::id(entry) << '\n';
}

} // namespace registration::writers
