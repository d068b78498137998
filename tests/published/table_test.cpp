// SPDX-License-Identifier: MPL-2.0
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <sstream>
#include <stdexcept>

namespace {

using published::read_table;

constexpr char good[] = "# Source: a book\nname,value\n\"one, two\",1.5\n";

TEST(PublishedTable, ReadsRows) {
    std::istringstream in(good);
    const auto rows = read_table(in, {"name", "value"}, 1);
    EXPECT_EQ(rows[0].text("name"), "one, two");
    EXPECT_EQ(rows[0].number("value"), 1.5);
}

TEST(PublishedTable, ReadsNumbersInOneField) {
    std::istringstream in("# Source: a book\nx\n0.5 2 1e3\n");
    EXPECT_EQ(read_table(in, {"x"}, 1)[0].numbers("x"), (std::vector<double>{0.5, 2, 1000}));
}

void expect_refused(std::string const& text, std::vector<std::string> const& columns,
                    std::size_t rows) {
    std::istringstream in(text);
    EXPECT_THROW(read_table(in, columns, rows), std::runtime_error) << text;
}

TEST(PublishedTable, RefusesWhatItDoesNotExpect) {
    expect_refused(good, {"name", "valeu"}, 1);
    expect_refused(good, {"name"}, 1);
    expect_refused(good, {"name", "value"}, 2);
    expect_refused("name,value\none,1\n", {"name", "value"}, 1);
    expect_refused("# Source: a book\nname,value\none\n", {"name", "value"}, 1);
    expect_refused("# Source: a book\nname,value\n\"one,1\n", {"name", "value"}, 1);
}

TEST(PublishedTable, RefusesWhatIsNoNumber) {
    std::istringstream in("# Source: a book\nname,value\none,1.5x\n");
    const auto rows = read_table(in, {"name", "value"}, 1);
    EXPECT_THROW(rows[0].number("value"), std::runtime_error);
    EXPECT_THROW(rows[0].number("colour"), std::runtime_error);
}

} // namespace
