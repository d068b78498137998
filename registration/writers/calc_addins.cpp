// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"
#include "registration/writers/words.h"
#include "registration/writers/writers.h"

#include <pugixml.hpp>

// The office's configuration format for spreadsheet functions: a node a function, a node an
// argument whose name must be that of the IDL.

namespace registration::writers {
namespace {

pugi::xml_node add_node(pugi::xml_node parent, std::string const& name) {
    pugi::xml_node node = parent.append_child("node");
    node.append_attribute("oor:name") = name.c_str();
    node.append_attribute("oor:op") = "replace";
    return node;
}

void add_property(pugi::xml_node node, const char* name, std::string const& value, bool localized) {
    pugi::xml_node property = node.append_child("prop");
    property.append_attribute("oor:name") = name;
    pugi::xml_node text = property.append_child("value");
    if (localized) text.append_attribute("xml:lang") = "en";
    text.text() = value.c_str();
}

void add_function(pugi::xml_node functions, Entry const& entry) {
    pugi::xml_node function = add_node(functions, catalogue::id(entry));
    add_property(function, "DisplayName", entry.name, true);
    add_property(function, "Description", entry.says, true);
    add_property(function, "Category", "Add-In", false);
    pugi::xml_node parameters = function.append_child("node");
    parameters.append_attribute("oor:name") = "Parameters";
    for (std::size_t at = 0; at < entry.argument_count(); ++at) {
        pugi::xml_node parameter = add_node(parameters, parameter_id(entry.arguments[at].name));
        add_property(parameter, "DisplayName", entry.arguments[at].name, true);
        add_property(parameter, "Description", wizard_text(entry, at), true);
    }
}

} // namespace

void write_calc_addins(std::ostream& out) {
    pugi::xml_document document;
    pugi::xml_node declaration = document.append_child(pugi::node_declaration);
    declaration.append_attribute("version") = "1.0";
    declaration.append_attribute("encoding") = "UTF-8";
    pugi::xml_node root = document.append_child("oor:component-data");
    root.append_attribute("xmlns:oor") = "http://openoffice.org/2001/registry";
    root.append_attribute("xmlns:xs") = "http://www.w3.org/2001/XMLSchema";
    root.append_attribute("oor:name") = "CalcAddIns";
    root.append_attribute("oor:package") = "org.openoffice.Office";
    pugi::xml_node infos = root.append_child("node");
    infos.append_attribute("oor:name") = "AddInInfo";
    pugi::xml_node functions = add_node(infos, "entropycells.Functions").append_child("node");
    functions.append_attribute("oor:name") = "AddInFunctions";
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) add_function(functions, entry);
    document.save(out, "  ");
}

} // namespace registration::writers
