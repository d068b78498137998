// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/text/unit.h"
#include "registration/given.h"

#include <cstdint>
#include <string_view>

namespace registration {

/// What the cell is to get: the last argument of most functions.
struct Show {
    enum class View : std::uint8_t { number, quantity, text, uncertainty, steps, source, why };

    View view = View::number;
    std::string_view unit_text{}; ///< as written; empty where no unit was asked for
    core::text::Unit unit{};

    bool has_unit() const { return !unit_text.empty(); }
    bool needs_uncertainty() const {
        return view == View::quantity || view == View::text || view == View::uncertainty;
    }
    bool is_prose() const { return view >= View::steps; }
};

/// Reads `show`: a unit, a heading or unit cell with it, a view, or a view `in` a unit. A left-out
/// one is the number in the coherent SI unit; a blank cell and anything else is refused. The view
/// is set before the unit is read, so that `why in kJ/kg·K` can tell what is wrong with the unit.
void read_show(Given const&, Show&);

} // namespace registration
