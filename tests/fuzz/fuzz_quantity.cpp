// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/text/quantity.h"

#include <cmath>
#include <cstddef>
#include <cstdint>
#include <string>

// Any bytes in the place of a quantity: they are read or refused; what is read is finite, lies in
// the text, and can be written and read again to the same bits.

namespace {

using namespace core::text;

void require(bool condition) {
    if (!condition) __builtin_trap();
}

void read_again(Quantity const& quantity) {
    std::string const unit(quantity.written_unit);
    Quantity const again =
        read_quantity(write_exactly(quantity.si, quantity.u, quantity.unit, unit));
    require(again.si == quantity.si && again.u == quantity.u);
    require(again.unit.dimension == quantity.unit.dimension);
    read_quantity(write_for_people(quantity.si, quantity.u, quantity.unit, unit));
}

void read(std::string_view text) try {
    Quantity const quantity = read_quantity(text);
    require(std::isfinite(quantity.si) && std::isfinite(quantity.u) && quantity.u >= 0);
    read_again(quantity);
} catch (core::Failure const& failure) {
    require(!failure.given.empty() && !failure.needed.empty() && !failure.repair.empty());
    require(failure.given.size() <= 4 * 60 + 3);
}

void read_as_uncertainty(std::string_view text) try {
    double const u = read_uncertainty(text, 300, Unit{});
    require(u >= 0 && std::isfinite(u));
} catch (core::Failure const&) {
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    std::string_view const text(reinterpret_cast<const char*>(data), size);
    read(text);
    read_as_uncertainty(text);
    return 0;
}
