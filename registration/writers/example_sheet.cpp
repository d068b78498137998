// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"
#include "registration/writers/flat_sheet.h"
#include "registration/writers/words.h"
#include "registration/writers/writers.h"

// A flat sheet for the office test: A the call as text, B the call, C what it must give, D whether
// it does. Nothing is cached.

namespace registration::writers {
namespace {

void add_example(pugi::xml_node table, std::size_t number, Example const& example) {
    pugi::xml_node row = add_row(table);
    const std::string at = std::to_string(number);
    add_text(row, example.formula);
    add_formula(row, stored_formula(example.formula));
    if (example.text) {
        add_text(row, example.text);
        add_formula(row, "of:=IF(EXACT([.B" + at + "];[.C" + at + "]);1;0)");
    } else {
        add_number(row, example.number);
        add_formula(row,
                    "of:=IF(ABS([.B" + at + "]-[.C" + at + "])<=1E-13*ABS([.C" + at + "]);1;0)");
    }
}

} // namespace

void write_example_sheet(std::ostream& out) {
    pugi::xml_document document;
    const pugi::xml_node table = begin_flat_sheet(document, "Examples");
    std::size_t number = 0;
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries)
            for (Example const& example : entry.examples)
                if (example.formula) add_example(table, ++number, example);
    document.save(out, " ");
}

} // namespace registration::writers
