// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <pugixml.hpp>

#include <string>

/// A flat OpenDocument spreadsheet of one table, without cached results.
namespace registration::writers {

/// Begins the document and returns its table, to which rows are appended.
pugi::xml_node begin_flat_sheet(pugi::xml_document&, const char* table_name);
pugi::xml_node add_row(pugi::xml_node table);

void add_text(pugi::xml_node row, std::string const&);
void add_number(pugi::xml_node row, double);
void add_formula(pugi::xml_node row, std::string const&);

} // namespace registration::writers
