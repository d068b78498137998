// SPDX-License-Identifier: MPL-2.0
#include "addin/arguments.h"

#include "core/failure.h"
#include "tests/addin/office_values.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

// What the office hands over (measured: a blank single cell is the number 0, a blank cell inside a
// range an empty text, what is left out has no value, a range is a sequence of rows).

namespace {

using addin::Arguments;
using css::uno::Any;
using registration::Block, registration::Cell;

Cell only_cell(Any const& value) {
    const Arguments arguments({&value});
    const Block block = arguments.blocks()[0];
    EXPECT_TRUE(block.single());
    return {block.cells[0].kind, block.cells[0].number, {}};
}

std::string only_text(std::u16string_view text) {
    const Any value(office_text(text));
    const Arguments arguments({&value});
    return std::string(arguments.blocks()[0].cells[0].text);
}

TEST(Arguments, TakesNumbersAsTheyAre) {
    EXPECT_EQ(only_cell(Any(7.3)).kind, Cell::Kind::number);
    EXPECT_EQ(only_cell(Any(7.3)).number, 7.3);
    EXPECT_EQ(only_cell(Any(sal_Int32{-5})).number, -5);
    EXPECT_EQ(only_cell(Any(true)).number, 1);
    EXPECT_EQ(only_cell(Any(false)).number, 0);
}

TEST(Arguments, TellsLeftOutFromBlank) {
    const Any nothing, empty{rtl::OUString()};
    const Arguments arguments({&nothing, &empty});
    EXPECT_TRUE(arguments.blocks()[0].missing());
    ASSERT_FALSE(arguments.blocks()[1].missing());
    EXPECT_EQ(arguments.blocks()[1].cells[0].kind, Cell::Kind::blank);
}

TEST(Arguments, CutsSpacesAtTheEndsOnly) {
    EXPECT_EQ(only_text(u"  25 °C \t\n"), "25 °C");
    EXPECT_EQ(only_cell(Any(office_text(u" \n "))).kind, Cell::Kind::blank);
}

TEST(Arguments, WritesUnicodeOfEveryLength) {
    EXPECT_EQ(only_text(u"kJ"), "kJ");
    EXPECT_EQ(only_text(u"m³·Δ"), "m\xC2\xB3\xC2\xB7\xCE\x94");
    EXPECT_EQ(only_text(u"℃→"), "\xE2\x84\x83\xE2\x86\x92");
    EXPECT_EQ(only_text(u"\U0001F525\U0010FFFF"), "\xF0\x9F\x94\xA5\xF4\x8F\xBF\xBF");
}

TEST(Arguments, ReplacesLoneSurrogates) {
    const std::u16string high{u'a', 0xD83D, u'b'}, low{0xDD25, u'b'}, last{u'a', 0xD83D},
        before_a_pair{0xD83D, 0xD83D, 0xDD25};
    const std::string replacement = "\xEF\xBF\xBD";
    EXPECT_EQ(only_text(high), "a" + replacement + "b");
    EXPECT_EQ(only_text(low), replacement + "b");
    EXPECT_EQ(only_text(last), "a" + replacement);
    EXPECT_EQ(only_text(before_a_pair), replacement + "\xF0\x9F\x94\xA5");
}

/// Texts and blocks stay where they are while later arguments are added.
TEST(Arguments, KeepsWhatManyTextsPointAt) {
    std::vector<std::vector<Any>> rows;
    for (int row = 0; row < 2000; ++row)
        rows.push_back({Any(office_text(std::to_string(row) + " kJ/mol")), Any(0.5 * row)});
    const Any range = range_of<Any>(rows), single{rtl::OUString("300 K")};
    const Arguments arguments({&range, &single});
    const Block block = arguments.blocks()[0];
    ASSERT_EQ(block.rows, 2000u);
    ASSERT_EQ(block.columns, 2u);
    for (std::size_t row = 0; row < block.rows; ++row) {
        EXPECT_EQ(block.at(row, 0).text, std::to_string(row) + " kJ/mol");
        EXPECT_EQ(block.at(row, 1).number, 0.5 * static_cast<double>(row));
    }
    EXPECT_EQ(arguments.blocks()[1].cells[0].text, "300 K");
}

TEST(Arguments, TakesRangesOfOneKind) {
    const Any numbers = range_of<double>({{1, 2, 3}, {4, 5, 6}});
    const Any texts = range_of<rtl::OUString>({{rtl::OUString("a")}, {rtl::OUString()}});
    const Arguments arguments({&numbers, &texts});
    EXPECT_EQ(arguments.blocks()[0].at(1, 2).number, 6);
    EXPECT_EQ(arguments.blocks()[1].at(0, 0).text, "a");
    EXPECT_EQ(arguments.blocks()[1].at(1, 0).kind, Cell::Kind::blank);
}

TEST(Arguments, TakesAnEmptyRangeAsLeftOut) {
    const Any no_rows = range_of<Any>({}), no_columns = range_of<Any>({{}, {}});
    const Arguments arguments({&no_rows, &no_columns});
    EXPECT_TRUE(arguments.blocks()[0].missing());
    EXPECT_TRUE(arguments.blocks()[1].missing());
}

TEST(Arguments, TakesWhatNoCellHoldsAsBlank) {
    EXPECT_EQ(only_cell(Any(css::uno::Sequence<double>(3))).kind, Cell::Kind::blank);
    EXPECT_EQ(only_cell(Any(cppu::UnoType<double>::get())).kind, Cell::Kind::blank);
}

void expect_refused(Any const& value) {
    const Any fine(1.0);
    try {
        const Arguments arguments({&fine, &fine, &value});
        ADD_FAILURE() << "not refused";
    } catch (core::Failure const& failure) {
        EXPECT_EQ(failure.kind, core::Failure::Kind::unfit);
        EXPECT_EQ(failure.argument, 2);
    }
}

TEST(Arguments, RefusesRowsOfUnequalLength) {
    expect_refused(range_of<double>({{1, 2}, {3}}));
    expect_refused(range_of<double>({{}, {3}}));
}

TEST(Arguments, RefusesMoreCellsThanASheetHasRows) {
    const std::vector<double> row(1024);
    const Any most = range_of<double>(std::vector(1024, row));
    const Arguments arguments({&most});
    EXPECT_EQ(arguments.blocks()[0].size(), 1'048'576u);
    expect_refused(range_of<double>(std::vector(1025, row)));
}

TEST(Arguments, CutsTextsThatNoReaderTakes) {
    EXPECT_EQ(only_text(std::u16string(40'000, u'a')), std::string(32'767, 'a'));
    const std::u16string cut_in_a_pair = std::u16string(32'766, u'a') + u"\U0001F525";
    EXPECT_EQ(only_text(cut_in_a_pair), std::string(32'766, 'a') + "\xEF\xBF\xBD");
}

} // namespace
