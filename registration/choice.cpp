// SPDX-License-Identifier: MPL-2.0
#include "registration/choice.h"

#include <algorithm>
#include <optional>
#include <string>
#include <vector>

namespace registration {
namespace {

using core::Failure;

/// Arguments beyond the parameters of an overload must be left out.
bool fits(Overload const& overload, std::span<const Given> inputs, std::size_t input) {
    if (input >= overload.needs.size()) return inputs[input].missing();
    return accepts(overload.needs[input], inputs[input]);
}

bool fits(Overload const& overload, std::span<const Given> inputs) {
    for (std::size_t input = 0; input < inputs.size(); ++input)
        if (!fits(overload, inputs, input)) return false;
    return true;
}

/// How far an argument is from what an overload takes: missing, or of the right dimension but read
/// otherwise; of another kind; or one too many, which can only be left out.
std::size_t distance(Overload const& overload, std::span<const Given> inputs, std::size_t input) {
    if (fits(overload, inputs, input)) return 0;
    if (input >= overload.needs.size()) return 4;
    if (inputs[input].missing()) return 1;
    Numbers const* numbers = inputs[input].if_numbers();
    return numbers && !numbers->bare && numbers->dimension == overload.needs[input].dimension ? 1
                                                                                              : 2;
}

struct Misfits {
    std::size_t distance = 0, first = 0;
};
Misfits misfits(Overload const& overload, std::span<const Given> inputs) {
    Misfits found;
    for (std::size_t input = inputs.size(); input-- > 0;)
        if (const std::size_t far = distance(overload, inputs, input))
            found = {found.distance + far, input};
    return found;
}

/// Nearer; among equals the earlier arguments are taken at their word.
bool better(Misfits a, Misfits b) {
    return a.distance != b.distance ? a.distance < b.distance : a.first > b.first;
}

std::string joined(std::vector<std::string> const& words) {
    std::string text;
    for (std::size_t i = 0; i < words.size(); ++i) {
        if (i > 0) text += i + 1 == words.size() ? " or " : ", ";
        text += words[i];
    }
    return text;
}

/// An argument that cannot be read in any language is told before one that merely does not fit.
std::optional<Failure> unreadable(Entry const& entry, std::span<const Given> inputs) {
    for (std::size_t input = 0; input < inputs.size(); ++input) {
        if (inputs[input].missing() || inputs[input].if_numbers()) continue;
        bool only_numbers = true;
        for (Form const& form : entry.all_forms())
            for (Overload const& overload : form.overloads)
                only_numbers =
                    only_numbers && (input >= overload.needs.size() ||
                                     overload.needs[input].kind == Need::Kind::quantity ||
                                     overload.needs[input].kind == Need::Kind::any_quantity);
        if (!only_numbers) continue;
        Failure failure = inputs[input].why_not_numbers();
        failure.argument = static_cast<int>(input);
        return failure;
    }
    return std::nullopt;
}

/// "Which one argument, changed, would fit?"
[[noreturn]] void refuse_all(Entry const& entry, std::span<const Given> inputs) {
    if (auto failure = unreadable(entry, inputs)) throw *failure;
    Overload const* best = nullptr;
    Misfits fewest;
    for (Form const& form : entry.all_forms())
        for (Overload const& overload : form.overloads)
            if (const Misfits found = misfits(overload, inputs); !best || better(found, fewest)) {
                best = &overload;
                fewest = found;
            }
    const std::size_t at = fewest.first;
    Failure failure = at < best->needs.size()
                          ? misfit(best->needs[at], inputs[at])
                          : Failure(Failure::Kind::unfit, "a value",
                                    "nothing here with the other arguments as they are",
                                    "leave the argument out");
    // A text that cannot be read has told its own need already.
    const bool told = at < best->needs.size() && !inputs[at].missing() &&
                      !inputs[at].if_numbers() && best->needs[at].kind == Need::Kind::quantity;
    std::vector<std::string> needs;
    for (Form const& form : entry.all_forms())
        for (Overload const& overload : form.overloads) {
            const Misfits found = misfits(overload, inputs);
            if (found.distance != fewest.distance || found.first != at ||
                at >= overload.needs.size())
                continue;
            const std::string text = described(overload.needs[at]);
            if (std::ranges::find(needs, text) == needs.end()) needs.push_back(text);
        }
    if (!needs.empty() && !told) failure.needed = joined(needs);
    failure.argument = static_cast<int>(at);
    throw failure;
}

} // namespace

Choice choose(Entry const& entry, std::span<const Given> inputs) {
    for (Form const& form : entry.all_forms())
        for (Overload const& overload : form.overloads)
            if (fits(overload, inputs)) return {&form, &overload};
    refuse_all(entry, inputs);
}

} // namespace registration
