// SPDX-License-Identifier: MPL-2.0
#include "registration/show.h"

#include <array>
#include <utility>

namespace registration {
namespace {

using View = Show::View;

constexpr std::array<std::pair<std::string_view, View>, 6> views{
    {{"quantity", View::quantity},
     {"text", View::text},
     {"uncertainty", View::uncertainty},
     {"steps", View::steps},
     {"source", View::source},
     {"why", View::why}}};

void read_unit_part(Show& show, std::string_view text) {
    const auto heading = core::text::read_heading(text);
    show.unit = heading.unit;
    show.unit_text = heading.text;
}

/// `text in kJ/K`, `quantity`; false where the text names no view.
bool read_view(Show& show, std::string_view text) {
    for (auto const& [word, view] : views) {
        if (!text.starts_with(word)) continue;
        std::string_view rest = text.substr(word.size());
        if (rest.empty()) {
            show.view = view;
            return true;
        }
        if (rest.starts_with(" in ") && (view <= View::uncertainty || view == View::why)) {
            show.view = view;
            rest.remove_prefix(4);
            while (rest.starts_with(' ')) rest.remove_prefix(1);
            read_unit_part(show, rest);
            return true;
        }
    }
    return false;
}

} // namespace

void read_show(Given const& given, Show& show) {
    if (given.missing()) return;
    if (!given.block().single() || given.cell(0).kind != Cell::Kind::text)
        core::refuse_unfit(
            given.block().single() ? "a blank cell or a number" : "a range",
            "one cell with a unit or a view",
            "leave the argument out, or write a unit such as `kJ/K`, or `text`, `quantity`, "
            "`uncertainty`, `steps`, `source`, `why`");
    const std::string_view text = given.cell(0).text;
    if (!read_view(show, text)) read_unit_part(show, text);
}

} // namespace registration
