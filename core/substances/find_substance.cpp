// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/substances/formula.h"
#include "core/substances/formula_text.h"
#include "core/substances/substance.h"
#include "core/text/characters.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <numeric>
#include <string>
#include <vector>

// substance = name-or-formula { blank } [ "(" state ")" ]
// state     = "g" | "l" | "cr" | "s" | "cr" "," crystal | crystal       "s" is read as "cr"
// crystal   = "α" | "alpha" | "II" | "quartz" | ...                     as SUBSTANCE.PHASES shows it

namespace core::substances {

namespace {

constexpr std::size_t longest = 200;

std::string_view trimmed(std::string_view text) {
    while (!text.empty() && text.front() == ' ') text.remove_prefix(1);
    while (!text.empty() && text.back() == ' ') text.remove_suffix(1);
    return text;
}

struct Request {
    std::string_view base, state;
};

/// Parts the state from what stands before it; brackets of a formula begin with a capital.
Request parted(std::string_view text) {
    text = trimmed(text);
    if (!text.ends_with(')')) return {text, {}};
    const std::size_t open = text.rfind('(');
    if (open == std::string_view::npos || open == 0) return {text, {}};
    const std::string_view inner = trimmed(text.substr(open + 1, text.size() - open - 2));
    if (inner.empty() || (inner[0] >= 'A' && inner[0] <= 'Z')) return {text, {}};
    return {trimmed(text.substr(0, open)), inner};
}

struct Letter {
    std::string_view spelled, greek;
};
constexpr std::array<Letter, 5> letters{
    {{"alpha", "α"}, {"beta", "β"}, {"gamma", "γ"}, {"delta", "δ"}, {"'", "′"}}};

void replace_all(std::string& text, std::string_view from, std::string_view to) {
    for (std::size_t at = text.find(from); at != std::string::npos;
         at = text.find(from, at + to.size()))
        text.replace(at, from.size(), to);
}

/// As a view spells it: Greek letters, one blank behind a comma.
std::string normal_state(std::string_view written) {
    if (written == "s") return "cr";
    const std::size_t comma = written.find(',');
    std::string state(trimmed(written.substr(0, comma)));
    if (comma != std::string_view::npos)
        state += ", " + std::string(trimmed(written.substr(comma + 1)));
    for (auto [spelled, greek] : letters) replace_all(state, spelled, greek);
    return state;
}

Key const* find(std::span<const Key> keys, std::string_view spelling) {
    const auto at =
        std::lower_bound(keys.begin(), keys.end(), spelling,
                         [](Key const& k, std::string_view s) { return k.spelling < s; });
    return at == keys.end() || at->spelling != spelling ? nullptr : &*at;
}

std::string in_small_letters(std::string_view text) {
    std::string small(text);
    std::transform(small.begin(), small.end(), small.begin(), to_small);
    replace_all(small, "Ü", "ü");
    return small;
}

// --- what to say about an unknown text -------------------------------------------------------

/// The number of letters to insert, leave out or change (V. I. Levenshtein, 1966).
std::size_t distance(std::string_view a, std::string_view b) {
    std::vector<std::size_t> row(b.size() + 1);
    std::iota(row.begin(), row.end(), std::size_t{0});
    for (std::size_t i = 0; i < a.size(); ++i) {
        std::size_t diagonal = row[0]++;
        for (std::size_t j = 0; j < b.size(); ++j) {
            const std::size_t changed = diagonal + (to_small(a[i]) != to_small(b[j]));
            diagonal = row[j + 1];
            row[j + 1] = std::min({row[j] + 1, diagonal + 1, changed});
        }
    }
    return row.back();
}

struct Near {
    std::size_t distance;
    std::string_view spelling;
};

void collect(std::vector<Near>& near, std::span<const Key> keys, std::string_view text) {
    const std::size_t most = std::max<std::size_t>(1, text.size() / 3);
    for (Key const& key : keys) {
        const std::size_t longer = std::max(text.size(), key.spelling.size());
        if (longer - std::min(text.size(), key.spelling.size()) > most) continue;
        const std::size_t d = distance(text, key.spelling);
        if (d <= most) near.push_back({d, key.spelling});
    }
}

/// Substances of the same composition, which a text names that is written in another way.
void collect_same_atoms(std::vector<Near>& near, std::string_view text) {
    try {
        const std::vector<Part> parts = read_formula(text).parts;
        for (SubstanceRow const& row : substance_rows()) {
            const auto atoms = atom_rows().subspan(row.first_atom, row.atom_count);
            const bool same =
                atoms.size() == parts.size() &&
                std::all_of(parts.begin(), parts.end(), [&](Part const& part) {
                    return std::any_of(atoms.begin(), atoms.end(), [&](AtomRow const& atom) {
                        return atom.number == part.element - elements().data() + 1 &&
                               std::abs(atom.count - part.count) < 1e-9;
                    });
                });
            if (same) near.push_back({0, row.name.empty() ? row.formula : row.name});
        }
    } catch (Failure const&) {
    }
}

[[noreturn]] void refuse_unknown(std::string_view text, std::string_view base) {
    std::vector<Near> near;
    collect_same_atoms(near, base);
    collect(near, names(), base.substr(0, 40));
    collect(near, formulas(), base.substr(0, 40));
    std::stable_sort(near.begin(), near.end(),
                     [](Near const& a, Near const& b) { return a.distance < b.distance; });
    std::string repair = "check the spelling, or describe it as a material of its own";
    for (std::size_t i = 0; i < std::min<std::size_t>(near.size(), 3); ++i)
        repair += (i == 0 ? "; the nearest are `" : ", `") + std::string(near[i].spelling) + '`';
    refuse_unfit(text::shown(text), "a substance of the tables, see SUBSTANCE.LIST", repair);
}

[[noreturn]] void refuse_isomers(std::string_view text, std::string_view formula) {
    std::string isomers;
    for (SubstanceRow const& row : substance_rows())
        if (row.formula == formula)
            isomers += (isomers.empty() ? "`" : " or `") + std::string(row.name) + '`';
    refuse_unfit(std::string(text), "one substance, where this formula has isomers",
                 "write " + isomers);
}

[[noreturn]] void refuse_state(std::string_view text, SubstanceRow const& row) {
    std::string states;
    for (View const& view : views().subspan(row.first_view + 1u, row.view_count - 1u))
        states += (states.empty() ? "" : ", ") + ('`' + std::string(view.state) + '`');
    refuse_unfit(text::shown(text), "a state that is tabulated: " + states,
                 "write one of them in brackets behind the substance, or leave the state out");
}

void refuse_steam(std::string_view small) {
    if (small != "steam") return;
    refuse_unfit("steam", "a substance of the tables",
                 "use ENTROPY.STEAM, ENTHALPY.STEAM or ENTROPY.VAPORIZATION(\"steam\"; "
                 "temperature) for steam by "
                 "IAPWS, or write `water` or `H2O(g)` for the table");
}

// --- the search ------------------------------------------------------------------------------

Key const* find_formula(std::string_view base, Notes const& notes) {
    std::string folded = fold_formula(base);
    if (Key const* key = find(formulas(), folded)) return key;
    if (folded.size() < 2 || folded[1] < 'a' || folded[1] > 'z') return nullptr;
    folded[1] = static_cast<char>(folded[1] - 'a' + 'A');
    Key const* key = find(formulas(), folded);
    if (key != nullptr)
        notes.remark([&] { return '`' + std::string(base) + "` read as `" + folded + '`'; });
    return key;
}

View const& with_state(View const& view, std::string_view state, std::string_view text) {
    if (state.empty()) return view;
    SubstanceRow const& row = substance_rows()[view.substance];
    const std::string wanted = normal_state(state), crystal = "cr, " + wanted;
    for (View const& each : views().subspan(row.first_view, row.view_count))
        if (each.state == wanted || each.state == crystal) return each;
    refuse_state(text, row);
}

void refuse_unstated(View const& view, std::string_view text) {
    if (view.rung_count > 0) return;
    SubstanceRow const& row = substance_rows()[view.substance];
    refuse_unfit(std::string(text),
                 "a state, as only the gas is tabulated of what is condensed at 298.15 K (" +
                     std::string(row.vapour_reason) + ')',
                 "write `" + std::string(text) + "(g)` where its gas is meant");
}

Substance find_with(std::string_view text, std::string_view state_left_out, Notes const& notes) {
    if (text.size() > 4 * longest)
        refuse_unfit({}, "a substance of at most 200 characters", "shorten it");
    const auto [base, state] = parted(text);
    const std::string small = in_small_letters(base);
    refuse_steam(small);
    Key const* key = find(formulas(), base); // before the names: TiN is not tin
    if (key == nullptr) key = find(names(), small);
    if (key == nullptr) key = find_formula(base, notes);
    if (key == nullptr) refuse_unknown(text, base);
    if (key->ambiguous) refuse_isomers(text, key->spelling);
    View const& view = with_state(views()[key->view], state.empty() ? state_left_out : state, text);
    refuse_unstated(view, base);
    return Substance(view);
}

} // namespace

Substance find_substance(std::string_view text, Notes const& notes) {
    return find_with(text, {}, notes);
}

Substance find_gas(std::string_view text, Notes const& notes) {
    return find_with(text, "g", notes);
}

} // namespace core::substances
