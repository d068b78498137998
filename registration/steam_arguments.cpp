// SPDX-License-Identifier: MPL-2.0
#include "registration/steam_arguments.h"

#include "core/quantities.h"

#include <optional>

namespace registration {
namespace {

using Kind = core::steam::Coordinate::Kind;

std::optional<Kind> kind_of(Numbers const& numbers) {
    const core::Dimension d = numbers.dimension;
    if (numbers.reading == Reading::difference || numbers.reading == Reading::gauge) return {};
    if (d == core::dimension<core::TemperatureDifference>) return Kind::temperature;
    if (d == core::dimension<core::Pressure>) return Kind::pressure;
    if (d == core::dimension<core::SpecificEnergy>) return Kind::enthalpy;
    if (d == core::dimension<core::SpecificEntropy>) return Kind::entropy;
    if (d == core::dimension<core::SpecificVolume>) return Kind::volume;
    if (d == core::Dimension{} && numbers.share == Share::none) return Kind::dryness;
    return {};
}

} // namespace

bool is_coordinate(Numbers const& numbers) { return kind_of(numbers).has_value(); }

argument<core::steam::Coordinate>::Rows::Rows(Given const& given, int index)
    : given_(&given), index_(index) {
    if (!is_numeric(need, given)) return;
    si_ = given.si();
    stride_ = given.numbers().listed ? 1 : 0;
    kind_ = *kind_of(given.numbers());
}

core::steam::Coordinate argument<core::steam::Coordinate>::Rows::in_words(std::size_t row) const {
    try {
        return core::steam::read_dryness(given_->cell(row).text);
    } catch (core::Failure& failure) {
        failure.argument = index_;
        throw;
    }
}

} // namespace registration
