// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/words.h"

#include "registration/catalogue/catalogue.h"

#include <algorithm>
#include <cctype>
#include <stdexcept>
#include <vector>

namespace registration::writers {
namespace {

/// Which input an argument is, counted among the inputs.
std::size_t input_of(Entry const& entry, std::size_t position) {
    return static_cast<std::size_t>(std::count_if(
        entry.arguments.begin(), entry.arguments.begin() + static_cast<std::ptrdiff_t>(position),
        [](Argument const& a) { return a.role == Argument::Role::input; }));
}

std::string joined(std::vector<std::string> const& words) {
    std::string text;
    for (std::size_t i = 0; i < words.size(); ++i)
        text += (i == 0 ? "" : i + 1 == words.size() ? " or " : ", ") + words[i];
    return text;
}

} // namespace

bool may_be_left_out(Entry const& entry, std::size_t position) {
    if (entry.arguments[position].role != Argument::Role::input) return true;
    const std::size_t input = input_of(entry, position);
    for (Form const& form : entry.all_forms())
        for (Overload const& overload : form.overloads)
            if (input >= overload.needs.size() || overload.needs[input].optional) return true;
    return false;
}

std::string accepted(Entry const& entry, std::size_t position) {
    switch (entry.arguments[position].role) {
    case Argument::Role::amount:
        return "an amount of substance, a mass, or either per unit of time";
    case Argument::Role::show:
        return "one cell of text";
    case Argument::Role::input:
        break;
    }
    const std::size_t input = input_of(entry, position);
    std::vector<std::string> words;
    bool whole = false;
    for (Form const& form : entry.all_forms())
        for (Overload const& overload : form.overloads) {
            if (input >= overload.needs.size()) continue;
            whole = whole || overload.needs[input].whole;
            const std::string text = described(overload.needs[input]);
            if (std::ranges::find(words, text) == words.end()) words.push_back(text);
        }
    return (whole ? "a whole column of: " : "") + joined(words);
}

std::string wizard_text(Entry const& entry, std::size_t position) {
    Argument const& argument = entry.arguments[position];
    std::string text = argument.says;
    text.append(may_be_left_out(entry, position) ? ". May be left out" : ". Required");
    text.append("; for example ").append(argument.example);
    return text.append(". Takes ").append(accepted(entry, position)).append(".");
}

std::string call_pattern(Entry const& entry) {
    std::string text = std::string(entry.name) + "(";
    for (std::size_t at = 0; at < entry.argument_count(); ++at) {
        const std::string name = entry.arguments[at].name;
        text.append(at ? "; " : "").append(may_be_left_out(entry, at) ? "[" + name + "]" : name);
    }
    return text + ")";
}

std::string parameter_id(std::string_view name) {
    std::string text;
    for (std::size_t at = 0; at < name.size(); ++at) {
        const bool raised = at > 0 && name[at - 1] == '_';
        if (name[at] != '_')
            text += raised ? static_cast<char>(std::toupper(static_cast<unsigned char>(name[at])))
                           : name[at];
    }
    return text;
}

std::string stored_formula(std::string_view formula) {
    const std::size_t bracket = formula.find('(');
    Entry const* entry = catalogue::find(formula.substr(0, bracket));
    if (!entry)
        throw std::logic_error("an example calls no function of the catalogue: " +
                               std::string(formula));
    std::string id = catalogue::id(*entry);
    std::ranges::transform(id, id.begin(),
                           [](unsigned char c) { return static_cast<char>(std::toupper(c)); });
    return "of:=ENTROPYCELLS.FUNCTIONS." + id + std::string(formula.substr(bracket));
}

} // namespace registration::writers
