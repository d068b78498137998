// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"
#include "tests/registration/formula_call.h"

#include <gtest/gtest.h>

#include <cmath>

// Every documented example gives what the documentation says. The numbers were computed outside the
// project from the formula of the entry; the tolerance is that of double arithmetic in two orders.

namespace {

using namespace registration;

TEST(Examples, GiveWhatTheySay) {
    std::size_t run = 0;
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries)
            for (Example const& example : entry.examples) {
                if (!example.formula) continue;
                ++run;
                SCOPED_TRACE(example.formula);
                const Answer answer = tests::call_formula(example.formula);
                if (example.text) {
                    EXPECT_EQ(tests::text(answer), example.text);
                } else {
                    ASSERT_EQ(answer.kind, Answer::Kind::numbers);
                    EXPECT_NEAR(answer.numbers[0], example.number,
                                1e-13 * std::fabs(example.number))
                        << tests::text(answer);
                }
            }
    EXPECT_GE(run, 36u);
}

TEST(Examples, StandInEveryFunctionThatTakesArguments) {
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) {
            // Arrays fill a rectangle; they have tests of their own.
            const bool array = entry.forms[0].overloads[0].outcome.kind == Outcome::Kind::array;
            if (entry.argument_count() > 0 && !array) {
                EXPECT_NE(entry.examples[0].formula, nullptr) << entry.name;
            }
        }
}

TEST(Examples, OfArgumentsCanBeRead) {
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries)
            for (std::size_t at = 0; at < entry.argument_count(); ++at) {
                EXPECT_TRUE(entry.arguments[at].says[0]) << entry.name;
                EXPECT_TRUE(entry.arguments[at].example[0]) << entry.name;
            }
}

} // namespace
