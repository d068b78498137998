// SPDX-License-Identifier: MPL-2.0
#include "addin/results.h"

#include "registration/catalogue/catalogue.h"
#include "tests/addin/office_values.h"

#include <gtest/gtest.h>

#include <array>
#include <bit>
#include <cstdint>
#include <string>

// What the office is handed: doubles and texts, alone or in sequences of rows of one length. An
// error is a NaN whose low word is the office's error code.

namespace {

using addin::to_office;
using css::uno::Any, css::uno::Sequence;
using registration::Answer;

std::string utf8(rtl::OUString const& text) {
    return rtl::OUStringToOString(text, RTL_TEXTENCODING_UTF8).getStr();
}

std::uint32_t error_code(Any const& value) {
    double number = 0;
    EXPECT_TRUE(value >>= number);
    EXPECT_NE(number, number);
    return static_cast<std::uint32_t>(std::bit_cast<std::uint64_t>(number));
}

Answer numbers(std::initializer_list<double> values, std::size_t rows, std::size_t columns) {
    Answer answer;
    answer.numbers.assign(values);
    answer.rows = rows, answer.columns = columns;
    return answer;
}

TEST(Results, HandsOverOneNumber) { EXPECT_EQ(to_office(numbers({9.63}, 1, 1)), Any(9.63)); }

TEST(Results, HandsOverOneText) {
    Answer answer;
    answer.kind = Answer::Kind::texts;
    answer.texts = {"9,63 J/(mol·K) \xF0\x9F\x94\xA5"};
    rtl::OUString text;
    ASSERT_TRUE(to_office(answer) >>= text);
    EXPECT_EQ(utf8(text), answer.texts[0]);
}

TEST(Results, KeepsTheErrorCode) {
    using Kind = core::Failure::Kind;
    const auto code = [](Kind kind) {
        return error_code(to_office(numbers({registration::error_number(kind)}, 1, 1)));
    };
    EXPECT_EQ(code(Kind::unfit), 519u);
    EXPECT_EQ(code(Kind::impossible), 503u);
    EXPECT_EQ(code(Kind::unconverged), 523u);
}

TEST(Results, HandsOverColumnsRowsAndRectangles) {
    const std::array shapes{std::array{6, 1}, std::array{1, 6}, std::array{2, 3}};
    for (auto const& [rows, columns] : shapes) {
        Sequence<Sequence<double>> range;
        ASSERT_TRUE(to_office(numbers({1, 2, 3, 4, 5, 6}, static_cast<std::size_t>(rows),
                                      static_cast<std::size_t>(columns))) >>= range);
        ASSERT_EQ(range.getLength(), rows);
        double expected = 1;
        for (Sequence<double> const& row : range) {
            ASSERT_EQ(row.getLength(), columns);
            for (const double value : row) EXPECT_EQ(value, expected++);
        }
    }
}

TEST(Results, LeavesBlankRowsEmpty) {
    Answer answer = numbers({1, 0, 3}, 3, 1);
    answer.blanks = {1};
    Sequence<Sequence<Any>> range;
    ASSERT_TRUE(to_office(answer) >>= range);
    EXPECT_EQ(range[0][0], Any(1.0));
    EXPECT_EQ(range[1][0], Any(rtl::OUString()));
    EXPECT_EQ(range[2][0], Any(3.0));
}

TEST(Results, ShowsErrorsAmongTexts) {
    Answer answer;
    answer.kind = Answer::Kind::texts;
    answer.rows = 3;
    answer.texts = {"a", "", "c"};
    answer.errors = {{1, registration::error_number(core::Failure::Kind::impossible)}};
    Sequence<Sequence<Any>> range;
    ASSERT_TRUE(to_office(answer) >>= range);
    EXPECT_EQ(range[0][0], Any(rtl::OUString("a")));
    EXPECT_EQ(error_code(range[1][0]), 503u);
    EXPECT_EQ(range[2][0], Any(rtl::OUString("c")));
}

/// A call whose argument at a position could not be handed over, with and without the question why.
std::string reason(const char* function, int position, std::size_t show, const char* view) {
    std::array<Any, 4> values;
    values[show] = Any(office_text(view));
    core::Failure failure(core::Failure::Kind::unfit, "a lot", "less", "give less");
    failure.argument = position;
    const Any answer =
        addin::refused(*registration::catalogue::find(function),
                       {&values[0], &values[1], &values[2], &values[3]}, std::move(failure));
    rtl::OUString text;
    return (answer >>= text) ? utf8(text) : std::to_string(error_code(answer));
}

TEST(Results, TellsWhyAnArgumentCouldNotBeHandedOver) {
    EXPECT_EQ(reason("ENTROPY.FUSION", 0, 3, "why"),
              "ENTROPY.FUSION, what: given a lot; needed less. To mend it, give less.");
    EXPECT_EQ(reason("ENTROPY.FUSION", 1, 3, " why in J/K").substr(0, 27),
              "ENTROPY.FUSION, temperature");
    EXPECT_EQ(reason("ENTROPY.FUSION", 2, 3, "why").substr(0, 22), "ENTROPY.FUSION, amount");
    EXPECT_EQ(reason("QUANTITY.CONVERT", 2, 1, "why").substr(0, 27), "QUANTITY.CONVERT, substance");
    EXPECT_EQ(reason("ENTROPY.FUSION", 0, 3, "text"), "519");
    EXPECT_EQ(reason("QUANTITY.OF", 0, 3, "why"), "519");
}

} // namespace
