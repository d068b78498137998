// SPDX-License-Identifier: MPL-2.0
#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "registration/writers/words.h"
#include "registration/writers/writers.h"

namespace registration::writers {
namespace {

void write_arguments(std::ostream& out, Entry const& entry) {
    out << "| argument | symbol | what it is | takes |\n|---|---|---|---|\n";
    for (std::size_t at = 0; at < entry.argument_count(); ++at) {
        Argument const& argument = entry.arguments[at];
        if (argument.role == Argument::Role::show) continue;
        out << "| " << argument.name << (may_be_left_out(entry, at) ? " (optional)" : "") << " | "
            << argument.symbol << " | " << argument.says << " | " << accepted(entry, at)
            << "; for example `" << argument.example << "` |\n";
    }
    out << "\n";
}

void write_example(std::ostream& out, Example const& example) {
    out << "    =" << example.formula << "    ";
    if (example.text)
        out << example.text << "\n";
    else
        out << core::text::write_number(static_cast<long double>(example.number), 12) << "\n";
}

void write_entry(std::ostream& out, Entry const& entry) {
    out << "### " << call_pattern(entry) << "\n\n" << entry.says << "\n\n";
    for (Form const& form : entry.all_forms()) {
        out << "- `" << form.formula << "`. Source: " << form.source << ".";
        if (form.valid[0]) out << " Valid: " << form.valid << ".";
        out << "\n";
    }
    out << "\n";
    if (entry.argument_count() > 0) write_arguments(out, entry);
    bool any = false;
    for (Example const& example : entry.examples)
        if (example.formula) write_example(out, example), any = true;
    if (any) out << "\n";
}

} // namespace

void write_function_list(std::ostream& out) {
    out << "# The functions\n\n"
           "Written from the catalogue by describe_addin; every example is run by the tests, in "
           "C++ and in the office.\n"
           "`show`, the last argument of most functions, and the ways to write a quantity are "
           "described in the README.\n";
    for (auto const& section : catalogue::sections()) {
        out << "\n## " << section.title << "\n\n";
        for (Entry const& entry : section.entries) write_entry(out, entry);
    }
}

} // namespace registration::writers
