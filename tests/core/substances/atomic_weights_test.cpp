// SPDX-License-Identifier: MPL-2.0
#include "core/substances/atomic_weights.h"

#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <cmath>

namespace {

using namespace core::substances;

TEST(AtomicWeights, AreThoseOfThePublishedTable) {
    const auto rows =
        published::read_table(PUBLISHED_DIR "/atomic_weights_2021.csv",
                              {"number", "symbol", "name", "value", "uncertainty"}, 118);
    ASSERT_EQ(elements().size(), rows.size());
    for (std::size_t i = 0; i < rows.size(); ++i) {
        EXPECT_EQ(elements()[i].symbol, rows[i].text("symbol"));
        EXPECT_EQ(elements()[i].name, rows[i].text("name"));
        const double weight = rows[i].text("value").empty() ? 0 : rows[i].number("value");
        EXPECT_EQ(elements()[i].ten_thousandths / 1e4, weight) << rows[i].text("symbol");
    }
}

TEST(AtomicWeights, AreFoundByTheirSymbolOnly) {
    for (Element const& element : elements()) EXPECT_EQ(find_element(element.symbol), &element);
    for (auto text : {"", "Xx", "fe", "FE", "Fe2", "Uue", "f", "F ", "[", "Å"})
        EXPECT_EQ(find_element(text), nullptr) << text;
}

} // namespace
