// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/words.h"

#include <pugixml.hpp>

#include <fstream>
#include <iostream>
#include <sstream>
#include <string>
#include <vector>

// wrong_inputs_sheet TABLE SHEET: turns the table of wrong inputs into a flat sheet. In a call, SHOW
// stands for the show argument and BLANK for a blank cell. A row of the sheet holds the call, what it
// gives, the error expected, the reason under "why", and the piece expected in it.

namespace {

struct WrongInput {
    std::string call, error, piece;
};

std::vector<WrongInput> read(std::istream& table) {
    std::vector<WrongInput> inputs;
    for (std::string line; std::getline(table, line);) {
        if (line.empty() || line[0] == '#') continue;
        std::istringstream fields(line);
        WrongInput input;
        if (!std::getline(fields, input.call, '\t') || !std::getline(fields, input.error, '\t') ||
            !std::getline(fields, input.piece, '\t') ||
            input.call.find("SHOW") == std::string::npos)
            throw std::runtime_error("cannot read the row: " + line);
        inputs.push_back(std::move(input));
    }
    return inputs;
}

std::string replaced(std::string text, std::string_view what, std::string_view with) {
    for (std::size_t at = text.find(what); at != std::string::npos;
         at = text.find(what, at + with.size()))
        text.replace(at, what.size(), with);
    return text;
}

pugi::xml_node cell(pugi::xml_node row) { return row.append_child("table:table-cell"); }
void text_cell(pugi::xml_node row, std::string const& text) {
    pugi::xml_node node = cell(row);
    node.append_attribute("office:value-type") = "string";
    node.append_child("text:p").text() = text.c_str();
}
void formula_cell(pugi::xml_node row, std::string const& formula) {
    cell(row).append_attribute("table:formula") = formula.c_str();
}

void add(pugi::xml_node table, WrongInput const& input) {
    const std::string call =
        replaced(registration::writers::stored_formula(input.call), "BLANK", "[.$Z$1]");
    pugi::xml_node row = table.append_child("table:table-row");
    text_cell(row, input.call);
    formula_cell(row, replaced(call, "SHOW", ""));
    text_cell(row, input.error);
    formula_cell(row, replaced(call, "SHOW", "\"why\""));
    text_cell(row, input.piece);
}

void write(std::vector<WrongInput> const& inputs, std::ostream& out) {
    pugi::xml_document document;
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
    table.append_attribute("table:name") = "Wrong inputs";
    for (WrongInput const& input : inputs) add(table, input);
    document.save(out, " ");
}

} // namespace

int main(int argc, char** argv) {
    if (argc != 3) {
        std::cerr << "usage: wrong_inputs_sheet TABLE SHEET\n";
        return 2;
    }
    try {
        std::ifstream table(argv[1]);
        std::ofstream sheet(argv[2]);
        write(read(table), sheet);
        return sheet ? 0 : 1;
    } catch (std::exception const& failure) {
        std::cerr << "wrong_inputs_sheet: " << failure.what() << '\n';
        return 1;
    }
}
