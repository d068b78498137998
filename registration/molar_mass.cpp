// SPDX-License-Identifier: MPL-2.0
#include "registration/molar_mass.h"

#include "core/substances/formula.h"

namespace registration {

bool tells_molar_mass(Given const& given) {
    for (std::size_t row = 0; row < given.cell_count() && row < 3; ++row) {
        Cell const& cell = given.cell(row);
        if (cell.kind == Cell::Kind::number) return true;
        if (cell.kind == Cell::Kind::text && cell.text[0] >= '0' && cell.text[0] <= '9')
            return true;
    }
    return false;
}

double molar_mass_of(Given const& given, std::size_t row) {
    if (tells_molar_mass(given)) return given.si()[given.numbers().listed ? row : 0];
    return core::substances::molar_mass(given.cell(row).text).value();
}

} // namespace registration
