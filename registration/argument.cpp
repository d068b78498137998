// SPDX-License-Identifier: MPL-2.0
#include "registration/argument.h"

#include "registration/molar_mass.h"

namespace registration {

void refuse_condition(int argument, Given const& given, std::size_t row, const char* condition) {
    core::Failure failure(core::Failure::Kind::impossible, written(given.block(), row),
                          std::string("a value ") + condition,
                          "check the sign and the unit of the number");
    failure.argument = argument;
    throw failure;
}

void argument<NamedSubstance>::check(Given const& given) {
    if (given.cell_count() == 1) static_cast<void>(molar_mass_of(need.kind, given, 0));
}

} // namespace registration
