// SPDX-License-Identifier: MPL-2.0
#include "core/text/unit.h"

#include "core/failure.h"
#include "core/text/characters.h"
#include "core/text/known_units.h"
#include "core/text/unit_expression.h"

namespace core::text {
namespace {

constexpr std::size_t longest = 256;

void refuse_empty_or_long(std::string_view text, bool blank) {
    if (blank) refuse_unfit("a blank text", "a unit such as `kJ/mol`", "write the unit");
    if (text.size() > longest)
        refuse_unfit(shown(text), "a unit of no more than 256 bytes", "write the unit alone");
}

} // namespace

Unit read_unit(std::string_view text, std::string& note) {
    if (Unit const* known = find_known_unit(text)) return *known;
    refuse_empty_or_long(text, false);
    Cursor at(text);
    at.skip_spaces();
    refuse_empty_or_long(text, at.at_end());
    Unit unit;
    UnitExpression(at, note).read(unit);
    at.skip_spaces();
    if (!at.at_end()) refuse_rest(at);
    return unit;
}

Unit read_unit(std::string_view text) {
    std::string note;
    return read_unit(text, note);
}

} // namespace core::text
