// SPDX-License-Identifier: MPL-2.0
#include "core/text/characters.h"

#include <gtest/gtest.h>

#include <vector>

namespace {

using namespace core::text;

std::vector<char32_t> folded(std::string_view text) {
    std::vector<char32_t> characters;
    for (Cursor at(text); !at.at_end(); at.advance()) characters.push_back(*at);
    return characters;
}

void expect_folds(std::initializer_list<const char*> looks, char32_t to) {
    for (const char* look : looks) EXPECT_EQ(folded(look), std::vector<char32_t>{to}) << look;
}

TEST(Characters, LookAlikesBecomeOne) {
    expect_folds({"µ", "μ"}, micro_sign);
    expect_folds({"K", "\u212a", "Ｋ"}, U'K');
    expect_folds({"Ω", "\u2126"}, 0x03A9);
    expect_folds({"·", "⋅", "•", "∙", "‧", "・", "×", "✕", "∗", "\u0387"}, middle_dot);
    expect_folds({"-", "−", "–", "—", "‐", "‑", "‒", "―", "－", "﹣"}, U'-');
    expect_folds({"/", "⁄", "∕", "／", "⧸"}, U'/');
    expect_folds({"Δ", "∆"}, delta);
    expect_folds({"°", "º", "˚", "∘"}, degree_sign);
    expect_folds({" ", "\t", "\n", "\u00a0", "\u2009", "\u202f", "\u2003", "\u3000"}, U' ');
    expect_folds({"％"}, U'%');
    expect_folds({"₂"}, U'2');
}

TEST(Characters, SuperscriptsStayApartFromDigits) {
    expect_folds({"²"}, superscript_zero + 2);
    expect_folds({"⁰"}, superscript_zero);
    expect_folds({"⁹"}, superscript_zero + 9);
    expect_folds({"⁻"}, superscript_minus);
    expect_folds({"⁺"}, superscript_plus);
}

TEST(Characters, ZeroWidthOnesVanish) {
    EXPECT_EQ(folded("\u200bJ\u2060/\ufeffK\u00ad\u200d"),
              (std::vector<char32_t>{U'J', U'/', U'K'}));
    EXPECT_TRUE(folded("\u200b\u200c").empty());
}

TEST(Characters, PositionsLieInTheText) {
    std::string_view const text = "a²\u200b°";
    Cursor at(text);
    at.advance();
    EXPECT_EQ(at.position(), text.data() + 1);
    at.advance();
    EXPECT_EQ(at.position(), text.data() + 3);
    at.advance();
    EXPECT_TRUE(at.at_end());
    EXPECT_EQ(at.position(), text.data() + text.size());
    EXPECT_EQ(at.whole().data(), text.data());
}

TEST(Characters, MessagesShowWhatTheyCan) {
    EXPECT_EQ(shown("25 °C"), "25 °C");
    EXPECT_EQ(shown("a\xff"
                    "b\n"),
              "a?b?");
    EXPECT_EQ(shown(std::string(61, 'x')), std::string(60, 'x') + "…");
    EXPECT_EQ(shown(std::string(60, 'x')), std::string(60, 'x'));
    EXPECT_EQ(quoted("K"), "`K`");
}

} // namespace
