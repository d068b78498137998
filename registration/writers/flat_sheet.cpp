// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/flat_sheet.h"

#include "core/text/quantity.h"

namespace registration::writers {
namespace {

pugi::xml_node cell(pugi::xml_node row) { return row.append_child("table:table-cell"); }

} // namespace

pugi::xml_node begin_flat_sheet(pugi::xml_document& document, const char* table_name) {
    pugi::xml_node declaration = document.append_child(pugi::node_declaration);
    declaration.append_attribute("version") = "1.0";
    declaration.append_attribute("encoding") = "UTF-8";
    pugi::xml_node root = document.append_child("office:document");
    constexpr const char* namespaces[][2] = {
        {"xmlns:office", "urn:oasis:names:tc:opendocument:xmlns:office:1.0"},
        {"xmlns:table", "urn:oasis:names:tc:opendocument:xmlns:table:1.0"},
        {"xmlns:text", "urn:oasis:names:tc:opendocument:xmlns:text:1.0"},
        {"xmlns:of", "urn:oasis:names:tc:opendocument:xmlns:of:1.2"},
    };
    for (auto const& [prefix, name] : namespaces) root.append_attribute(prefix) = name;
    root.append_attribute("office:version") = "1.2";
    root.append_attribute("office:mimetype") = "application/vnd.oasis.opendocument.spreadsheet";
    pugi::xml_node table = root.append_child("office:body")
                               .append_child("office:spreadsheet")
                               .append_child("table:table");
    table.append_attribute("table:name") = table_name;
    return table;
}

pugi::xml_node add_row(pugi::xml_node table) { return table.append_child("table:table-row"); }

void add_text(pugi::xml_node row, std::string const& text) {
    pugi::xml_node node = cell(row);
    node.append_attribute("office:value-type") = "string";
    node.append_child("text:p").text() = text.c_str();
}

void add_number(pugi::xml_node row, double number) {
    pugi::xml_node node = cell(row);
    node.append_attribute("office:value-type") = "float";
    node.append_attribute("office:value") =
        core::text::write_number(static_cast<long double>(number), 17).c_str();
}

void add_formula(pugi::xml_node row, std::string const& formula) {
    cell(row).append_attribute("table:formula") = formula.c_str();
}

} // namespace registration::writers
