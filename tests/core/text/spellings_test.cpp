// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/quantities.h"
#include "core/text/unit.h"
#include "tests/core/text/exact_fraction.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <map>

// The ways in which ordinary documents write units of entropy: each is read right or refused with a
// repair, and none is read wrongly.

namespace {

using namespace core;
using namespace core::text;

std::vector<published::Row> spellings() {
    return published::read_table(PUBLISHED_DIR "/entropy_unit_spellings.csv",
                                 {"spelling", "dimension", "style", "factor", "repair"}, 299);
}

Dimension named(std::string const& dimension_name) {
    static const std::map<std::string, Dimension> dimensions{
        {"molar entropy", dimension<MolarEntropy>},
        {"specific entropy", dimension<SpecificEntropy>},
        {"entropy", dimension<Entropy>},
        {"entropy per time", dimension<EntropyFlow>},
        {"entropy flux", dimension<EntropyFlux>}};
    return dimensions.at(dimension_name);
}

void expect_read(std::string const& text, published::Row const& row) {
    SCOPED_TRACE(row.text("spelling"));
    try {
        Unit const unit = read_unit(text);
        EXPECT_EQ(unit.dimension, named(row.text("dimension")));
        EXPECT_LE(exact::ulps(unit.to_si(1), exact::fraction(row.text("factor"))), 0.5);
    } catch (Failure const& failure) {
        ADD_FAILURE() << text << ": " << failure.needed << ": " << failure.repair;
    }
}

void expect_refused(published::Row const& row) {
    try {
        read_unit(row.text("spelling"));
        ADD_FAILURE() << row.text("spelling") << " was read";
    } catch (Failure const& failure) {
        EXPECT_EQ(failure.kind, Failure::Kind::unfit);
        EXPECT_NE(failure.repair.find(row.text("repair")), std::string::npos)
            << row.text("spelling") << ": " << failure.repair;
    }
}

TEST(Spellings, AreReadRightOrRefusedWithTheRepair) {
    int read = 0;
    for (auto const& row : spellings()) {
        bool const refused = !row.text("repair").empty();
        refused ? expect_refused(row) : expect_read(row.text("spelling"), row);
        if (refused && !row.text("factor").empty()) expect_read(row.text("repair"), row);
        read += !refused;
    }
    EXPECT_EQ(read, 195);
}

} // namespace
