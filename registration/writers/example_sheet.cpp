// SPDX-License-Identifier: MPL-2.0
#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "registration/writers/words.h"
#include "registration/writers/writers.h"

#include <pugixml.hpp>

// A flat sheet for the office test: A the call as text, B the call, C what it must give, D whether
// it does. Nothing is cached.

namespace registration::writers {
namespace {

pugi::xml_node cell(pugi::xml_node row) { return row.append_child("table:table-cell"); }

void text_cell(pugi::xml_node row, std::string const& text) {
    pugi::xml_node node = cell(row);
    node.append_attribute("office:value-type") = "string";
    node.append_child("text:p").text() = text.c_str();
}

void formula_cell(pugi::xml_node row, std::string const& formula) {
    cell(row).append_attribute("table:formula") = formula.c_str();
}

void number_cell(pugi::xml_node row, double number) {
    pugi::xml_node node = cell(row);
    node.append_attribute("office:value-type") = "float";
    node.append_attribute("office:value") =
        core::text::write_number(static_cast<long double>(number), 17).c_str();
}

void add_example(pugi::xml_node table, std::size_t number, Example const& example) {
    pugi::xml_node row = table.append_child("table:table-row");
    const std::string at = std::to_string(number);
    text_cell(row, example.formula);
    formula_cell(row, stored_formula(example.formula));
    if (example.text) {
        text_cell(row, example.text);
        formula_cell(row, "of:=IF(EXACT([.B" + at + "];[.C" + at + "]);1;0)");
    } else {
        number_cell(row, example.number);
        formula_cell(row,
                     "of:=IF(ABS([.B" + at + "]-[.C" + at + "])<=1E-13*ABS([.C" + at + "]);1;0)");
    }
}

} // namespace

void write_example_sheet(std::ostream& out) {
    pugi::xml_document document;
    pugi::xml_node declaration = document.append_child(pugi::node_declaration);
    declaration.append_attribute("version") = "1.0";
    declaration.append_attribute("encoding") = "UTF-8";
    pugi::xml_node root = document.append_child("office:document");
    root.append_attribute("xmlns:office") = "urn:oasis:names:tc:opendocument:xmlns:office:1.0";
    root.append_attribute("xmlns:table") = "urn:oasis:names:tc:opendocument:xmlns:table:1.0";
    root.append_attribute("xmlns:text") = "urn:oasis:names:tc:opendocument:xmlns:text:1.0";
    root.append_attribute("xmlns:of") = "urn:oasis:names:tc:opendocument:xmlns:of:1.2";
    root.append_attribute("office:version") = "1.2";
    root.append_attribute("office:mimetype") = "application/vnd.oasis.opendocument.spreadsheet";
    pugi::xml_node table = root.append_child("office:body")
                               .append_child("office:spreadsheet")
                               .append_child("table:table");
    table.append_attribute("table:name") = "Examples";
    std::size_t number = 0;
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries)
            for (Example const& example : entry.examples)
                if (example.formula) add_example(table, ++number, example);
    document.save(out, " ");
}

} // namespace registration::writers
