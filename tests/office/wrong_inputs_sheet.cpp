// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/flat_sheet.h"
#include "registration/writers/words.h"

#include <fstream>
#include <iostream>
#include <sstream>
#include <string>
#include <vector>

// wrong_inputs_sheet TABLE SHEET: turns the table of wrong inputs into a flat sheet. A row of the
// sheet holds the call, what it gives, the error expected, the reason under "why", and the piece
// expected in it. In a call stand
//     SHOW        the show argument
//     SHOW[text]  the show argument where it is itself what is wrong
//     BLANK       a blank cell
//     BLANKS      three blank cells below one another
//     EMPTY       a cell whose formula gives an empty text
//     TYPED[text] a cell into which the text was typed
//     ROWS[n]     two columns of n blank rows

namespace {

using registration::writers::add_formula, registration::writers::add_row,
    registration::writers::add_text, registration::writers::begin_flat_sheet;

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

/// Replaces `word[text]` by what is made of the text.
template<class Make>
std::string replaced_bracket(std::string text, std::string const& word, Make make) {
    for (std::size_t at = text.find(word + "["); at != std::string::npos;
         at = text.find(word + "[", at)) {
        const std::size_t start = at + word.size() + 1, end = text.find(']', start);
        if (end == std::string::npos) throw std::runtime_error("no ] behind " + word);
        const std::string made = make(text.substr(start, end - start));
        text.replace(at, end + 1 - at, made);
        at += made.size();
    }
    return text;
}

std::string quoted(std::string const& text) { return '"' + text + '"'; }

/// What is typed into a cell of its own: F and the columns behind it, of the row.
std::string with_cells(std::string call, std::size_t row, std::vector<std::string>& typed) {
    call = replaced_bracket(std::move(call), "TYPED", [&](std::string const& text) {
        typed.push_back(text);
        return "[." + std::string(1, static_cast<char>('E' + typed.size())) + std::to_string(row) +
               "]";
    });
    call = replaced_bracket(std::move(call), "ROWS",
                            [](std::string const& rows) { return "[.AA1:.AB" + rows + "]"; });
    call = replaced(std::move(call), "BLANKS", "[.Z1:.Z3]");
    call = replaced(std::move(call), "BLANK", "[.Z1]");
    return replaced(std::move(call), "EMPTY", "[.Y1]");
}

/// Such a cell in the first row of the sheet; the columns before it are left blank.
void empty_text_cell(pugi::xml_node row, std::size_t filled) {
    pugi::xml_node gap = row.append_child("table:table-cell");
    gap.append_attribute("table:number-columns-repeated") = static_cast<unsigned>(24 - filled);
    add_formula(row, "of:=\"\"");
}

void add(pugi::xml_node table, WrongInput const& input, std::size_t number) {
    std::vector<std::string> typed;
    const std::string call =
        with_cells(registration::writers::stored_formula(input.call), number, typed);
    const std::string value = replaced_bracket(call, "SHOW", quoted);
    const std::string reason = replaced_bracket(
        call, "SHOW", [](std::string const& show) { return quoted("why in " + show); });
    pugi::xml_node row = add_row(table);
    add_text(row, input.call);
    add_formula(row, replaced(value, "SHOW", ""));
    add_text(row, input.error);
    add_formula(row, replaced(reason, "SHOW", "\"why\""));
    add_text(row, input.piece);
    for (std::string const& text : typed) add_text(row, text);
    if (number == 1) empty_text_cell(row, 5 + typed.size());
}

void write(std::vector<WrongInput> const& inputs, std::ostream& out) {
    pugi::xml_document document;
    const pugi::xml_node table = begin_flat_sheet(document, "Wrong inputs");
    std::size_t number = 0;
    for (WrongInput const& input : inputs) add(table, input, ++number);
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
