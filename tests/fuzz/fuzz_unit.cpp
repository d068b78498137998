// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/text/unit.h"

#include <cmath>
#include <cstddef>
#include <cstdint>
#include <string_view>

// Any bytes in the place of a unit or a heading: they are read or refused; the factor of what is
// read is finite and above 0, and the unit of a heading lies in its text and reads the same alone.

namespace {

using namespace core::text;

void require(bool condition) {
    if (!condition) __builtin_trap();
}

bool same(Unit const& a, Unit const& b) {
    return a.numerator == b.numerator && a.denominator == b.denominator &&
           a.dimension == b.dimension && a.reading == b.reading && a.share == b.share;
}

void read(std::string_view text) try {
    Unit const unit = read_unit(text);
    require(unit.numerator > 0 && unit.denominator > 0);
    require(std::isfinite(unit.numerator) && std::isfinite(unit.denominator));
    if (std::string const si = si_unit(unit.dimension); !si.empty())
        require(read_unit(si).dimension == unit.dimension);
} catch (core::Failure const& failure) {
    require(!failure.given.empty() && !failure.needed.empty() && !failure.repair.empty());
}

void read_as_heading(std::string_view text) try {
    Heading const heading = read_heading(text);
    require(heading.text.data() >= text.data() &&
            heading.text.data() + heading.text.size() <= text.data() + text.size());
    require(same(read_unit(heading.text), heading.unit));
} catch (core::Failure const&) {
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    std::string_view const text(reinterpret_cast<const char*>(data), size);
    read(text);
    read_as_heading(text);
    return 0;
}
