// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/substances/atomic_weights.h"
#include "core/substances/reaction.h"
#include "core/substances/stoichiometric_text.h"
#include "core/text/characters.h"
#include "core/written.h"

#include <algorithm>
#include <array>
#include <cmath>

// equation  = side arrow side
// arrow     = "->" | "→" | "="
// side      = term { " + " term }
// term      = [ coefficient ] substance             see stoichiometric_text.h

namespace core::substances {

namespace {

constexpr std::size_t longest = 1000, most_participants = 20;
/// What decimals of a coefficient may leave: 0.333 for 1/3 of a thousandth is not enough.
constexpr double balanced = 1e-9;

[[noreturn]] void refuse(std::string_view text, std::string needed, std::string repair) {
    refuse_unfit(text::shown(text), std::move(needed), std::move(repair));
}

struct Sides {
    std::string_view left, right;
};

constexpr std::array<std::string_view, 4> arrows{"->", "→", "⟶", "="};

Sides parted(std::string_view equation) {
    for (std::string_view arrow : arrows) {
        const std::size_t at = equation.find(arrow);
        if (at == std::string_view::npos) continue;
        const Sides sides{equation.substr(0, at), equation.substr(at + arrow.size())};
        for (std::string_view other : arrows)
            if (sides.left.find(other) != std::string_view::npos ||
                sides.right.find(other) != std::string_view::npos)
                refuse(equation, "one arrow", "leave one of the arrows out");
        return sides;
    }
    refuse(equation, "an arrow between the two sides", "write it as in `2 Al + 3/2 O2 -> Al2O3`");
}

void add_side(Reaction& reaction, std::string_view side, double sign, Notes const& notes) {
    for (Term const& term : read_terms(side, reaction.text)) {
        if (reaction.participants.size() == most_participants)
            refuse(reaction.text, "at most 20 substances", "part the equation");
        const Substance substance = find_substance(term.substance, notes);
        for (Participant const& other : reaction.participants)
            if (other.substance == substance)
                refuse(reaction.text,
                       "each substance once, where `" + substance.written() + "` stands twice",
                       "put its coefficients together");
        reaction.participants.push_back({substance, sign * term.coefficient});
    }
}

std::string symbol(std::size_t number) {
    return number == 0 ? "D" : std::string(elements()[number - 1].symbol);
}

/// Refuses with the elements of which the sides hold different amounts.
void check_balance(Reaction const& reaction) {
    std::array<double, 119> surplus{}, total{};
    for (auto const& [substance, number] : reaction.participants)
        for (AtomRow const& atom : substance.atoms()) {
            surplus[atom.number] += number * atom.count;
            total[atom.number] += std::abs(number) * atom.count;
        }
    std::string faults;
    for (std::size_t e = 0; e < surplus.size(); ++e)
        if (std::abs(surplus[e]) > balanced * total[e])
            faults += (faults.empty() ? "" : ", ") + symbol(e) + ": " +
                      written(std::abs(surplus[e])) + " more on the " +
                      (surplus[e] > 0 ? "right" : "left");
    if (faults.empty()) return;
    refuse(reaction.text, "as many atoms of each element on both sides (" + faults + ')',
           "balance the equation; write thirds as fractions, 1/3");
}

} // namespace

Reaction read_reaction(std::string_view equation, Notes const& notes) {
    if (equation.size() > longest)
        refuse({}, "an equation of at most 1000 characters", "shorten it");
    const auto [left, right] = parted(equation);
    Reaction reaction{std::string(equation), {}};
    add_side(reaction, left, -1, notes);
    add_side(reaction, right, 1, notes);
    check_balance(reaction);
    return reaction;
}

} // namespace core::substances
