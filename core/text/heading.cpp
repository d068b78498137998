// SPDX-License-Identifier: MPL-2.0

// Headings of tables and axes: the label and its unit as `T / °C` (ISO 80000-1, 7.1.4), and the
// other forms that people write. A solidus between spaces separates label and unit, always.

#include "core/failure.h"
#include "core/quantities.h"
#include "core/text/characters.h"
#include "core/text/known_units.h"
#include "core/text/unit.h"
#include "core/text/unit_expression.h"
#include "core/text/unit_refusals.h"

#include <optional>

namespace core::text {
namespace {

constexpr std::size_t longest = 256;

std::string_view between(const char* from, const char* to) {
    return {from, static_cast<std::size_t>(to - from)};
}

/// Without the spaces at both ends, of whatever kind.
std::string_view trimmed(std::string_view text) {
    Cursor at(text);
    at.skip_spaces();
    const char* const from = at.position();
    const char* to = from;
    while (!at.at_end()) {
        bool const space = *at == U' ';
        at.advance();
        if (!space) to = at.position();
    }
    return between(from, to);
}

struct Parts {
    std::string_view label, unit;
};

/// The text before the cursor, and the text from `after` on.
Parts parts(Cursor const& before, Cursor const& after) {
    std::string_view const whole = before.whole();
    return {trimmed(between(whole.data(), before.position())),
            trimmed(between(after.position(), whole.data() + whole.size()))};
}

/// Follows how deep in parentheses and brackets a cursor stands.
class Depth {
public:
    void see(char32_t c) {
        if (c == U'(' || c == U'[') ++depth_;
        if ((c == U')' || c == U']') && depth_ > 0) --depth_;
    }
    bool outside() const { return depth_ == 0; }

private:
    int depth_ = 0;
};

/// `T / °C`
std::optional<Parts> at_solidus(std::string_view text) {
    std::optional<Parts> found;
    Depth depth;
    char32_t previous = 0;
    for (Cursor at(text); !at.at_end(); previous = *at, at.advance()) {
        depth.see(*at);
        if (*at != U'/' || previous != U' ' || !depth.outside()) continue;
        Cursor after = at;
        after.advance();
        if (*after != U' ') continue;
        if (found)
            refuse_unfit(
                shown(text),
                "a heading with one solidus between spaces, which separates label and unit",
                "write the unit without spaces around its solidus, as in `h / (kJ/kg)`");
        found = parts(at, after);
    }
    return found;
}

/// `p in bar`
std::optional<Parts> at_in(std::string_view text) {
    std::optional<Parts> found;
    Depth depth;
    for (Cursor at(text); !at.at_end(); at.advance()) {
        depth.see(*at);
        Cursor after = at;
        if (depth.outside() && after.take(U' ') && after.take(U'i') && after.take(U'n') &&
            *after == U' ')
            if (Parts const split = parts(at, after); !split.label.empty() && !split.unit.empty())
                found = split;
    }
    return found;
}

bool reads_as_unit(std::string_view text) {
    try {
        read_unit(text);
        return true;
    } catch (Failure const&) {
        return false;
    }
}

bool reads_as_pressure(std::string_view text) {
    try {
        return read_unit(text).dimension == dimension<Pressure>;
    } catch (Failure const&) {
        return false;
    }
}

/// From the last space on.
std::string_view last_word(std::string_view text) {
    const char* from = text.data();
    for (Cursor at(text); !at.at_end(); at.advance())
        if (*at == U' ') from = at.position();
    return trimmed(between(from, text.data() + text.size()));
}

bool has_operator(std::string_view text) {
    for (Cursor at(text); !at.at_end(); at.advance())
        if (*at == U'/' || *at == U'^' || is_product_sign(*at) || is_superscript(*at)) return true;
    return false;
}

/// Whether parentheses at the end belong to the unit: `kJ/(kg·K)`, `bar (g)`, and `kJ/kg (K)`,
/// which the unit's own grammar refuses with its repair.
bool belongs_to_unit(std::string_view label, Cursor const& open, bool spaced) {
    if (label.empty()) return true;
    char const last = label.back();
    if (last == '/' || last == '.' || last == '*' || label.ends_with("·") || label.ends_with("⋅"))
        return true;
    if (pressure_mark(open) != 0 && (!spaced || reads_as_pressure(last_word(label)))) return true;
    return has_operator(label) && reads_as_unit(label);
}

/// `[kJ/mol]`, `Heat (kJ)`, `T(K)`
std::optional<Parts> at_brackets(std::string_view text) {
    std::optional<Cursor> open;
    Depth depth;
    bool spaced = false, open_spaced = false;
    char32_t last = 0;
    for (Cursor at(text); !at.at_end(); at.advance()) {
        if ((*at == U'(' || *at == U'[') && depth.outside()) open = at, open_spaced = spaced;
        depth.see(*at);
        spaced = *at == U' ';
        if (!spaced) last = *at;
    }
    if (!open || !depth.outside() || last != (**open == U'(' ? U')' : U']')) return {};
    Cursor inside = *open;
    inside.advance();
    Parts split = parts(*open, inside);
    Cursor end(split.unit);
    const char* close = end.position();
    for (; !end.at_end(); end.advance()) close = end.position();
    split.unit = trimmed(between(split.unit.data(), close));
    if (**open == U'(' && belongs_to_unit(split.label, *open, open_spaced)) return {};
    return split;
}

/// `Heat kJ`: a label and a unit with nothing that separates them.
[[noreturn]] void refuse_heading(std::string_view text, Failure const& failure) {
    std::string_view const unit = last_word(text);
    std::string_view const label = trimmed(between(text.data(), unit.data()));
    bool const is_label = !label.empty() && is_letter(static_cast<unsigned char>(label.front())) &&
                          !has_operator(label) && find_refused_name(label) == nullptr;
    if (is_label && reads_as_unit(unit) && !reads_as_unit(label))
        refuse_unfit(shown(text), "a label that is set apart from its unit",
                     write_instead(
                         std::string(label) + " / " +
                         (has_operator(unit) ? "(" + std::string(unit) + ")" : std::string(unit))));
    throw failure;
}

/// `kJ/kg` of `(kJ/kg)`, which a solidus in the unit calls for behind a label.
std::string_view unwrapped(std::string_view unit) {
    if (unit.size() < 2 || unit.front() != '(' || unit.back() != ')') return unit;
    int depth = 0;
    for (std::size_t at = 0; at + 1 < unit.size(); ++at) {
        depth += unit[at] == '(' ? 1 : unit[at] == ')' ? -1 : 0;
        if (depth == 0) return unit;
    }
    return trimmed(unit.substr(1, unit.size() - 2));
}

Heading read(Parts const& split) {
    Heading heading{split.label, unwrapped(split.unit), {}};
    heading.unit = read_unit(heading.text, heading.note);
    return heading;
}

} // namespace

Heading read_heading(std::string_view text) {
    if (Unit const* known = find_known_unit(text)) return {{}, text, *known, {}};
    if (text.size() > longest)
        refuse_unfit(shown(text), "a heading of no more than 256 bytes", "shorten the heading");
    if (auto const split = at_solidus(text)) return read(*split);
    if (auto const split = at_brackets(text)) return read(*split);
    if (auto const split = at_in(text)) return read(*split);
    try {
        return read({{}, trimmed(text)});
    } catch (Failure const& failure) {
        refuse_heading(text, failure);
    }
}

} // namespace core::text
