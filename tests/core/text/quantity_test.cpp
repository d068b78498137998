// SPDX-License-Identifier: MPL-2.0
#include "core/text/quantity.h"

#include "core/failure.h"
#include "core/quantities.h"
#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

#include <bit>

namespace {

using namespace core;
using namespace core::text;

void expect_reads(std::string_view text, double si, double u = 0) {
    SCOPED_TRACE(text);
    try {
        Quantity const quantity = read_quantity(text);
        EXPECT_EQ(quantity.si, si);
        EXPECT_EQ(quantity.u, u);
    } catch (Failure const& failure) {
        ADD_FAILURE() << failure.needed << ": " << failure.repair;
    }
}

TEST(Quantity, TenSpellingsOfOneTemperatureAreOneDouble) {
    std::uint64_t const bits = std::bit_cast<std::uint64_t>(298.15);
    for (std::string_view const text :
         {"298.15 K", "25 °C", "77 °F", "536.67 °R", "298150 mK", "0.29815 kK", "2.9815e2 K",
          "29815e-2 K", "25 degC", "298,15 K", "25℃", "0.29815×10^3 K", "298 150 mK", "25.00 ºC",
          "2.9815·10² K", "0.000 298 150 MK", "298.150000000000000000000 K", "7.7e1 degF"})
        EXPECT_EQ(std::bit_cast<std::uint64_t>(read_quantity(text).si), bits) << text;
}

TEST(Quantity, ReadsNumbersInEveryForm) {
    expect_reads("7.3 kJ/mol", 7300);
    expect_reads("7,3 kJ/mol", 7300);
    expect_reads("+7.3kJ/mol", 7300);
    expect_reads("-7.3 kJ/mol", -7300);
    expect_reads("−7.3 kJ/mol", -7300);
    expect_reads(".5 K", 0.5);
    expect_reads(",5 K", 0.5);
    expect_reads("5. K", 5);
    expect_reads("5.K", 5);
    expect_reads("007 K", 7);
    expect_reads("5 kJ / mol", 5000);
    expect_reads("7.3e3 J/mol", 7300);
    expect_reads("7.3E+3 J/mol", 7300);
    expect_reads("7.3e-3 J", 0.0073);
    expect_reads("7.3 × 10^3 J", 7300);
    expect_reads("7.3·10³ J", 7300);
    expect_reads("7.3 x 10^-3 J", 0.0073);
    expect_reads("7.3*10⁻³J", 0.0073);
    expect_reads("5 eV", 5 * 1.602176634e-19);
    expect_reads("5eV", 5 * 1.602176634e-19);
    expect_reads("5E3 J", 5000);
    expect_reads("12 %", 0.12);
    expect_reads("12%", 0.12);
    expect_reads("250 ppm", 0.00025);
    expect_reads("5 1/K", 5);
    expect_reads("\u200b 7.3\u00a0kJ/mol \n", 7300);
    expect_reads("０．５ Ｋ", 0.5);
}

TEST(Quantity, ReadsVulgarFractions) {
    expect_reads("½", 0.5);
    expect_reads("¼ K", 0.25);
    expect_reads("¾K", 0.75);
    expect_reads("1½ K", 1.5);
    expect_reads("-2¾ K", -2.75);
    expect_refusal(unfit, "1 ½ K", "does not go on", [] { read_quantity("1 ½ K"); });
    expect_refusal(unfit, "1.5½ K", "", [] { read_quantity("1.5½ K"); });
}

TEST(Quantity, GroupsDigitsByThreesWithSpacesAlone) {
    expect_reads("1 234.5 kJ", 1234500);
    expect_reads("1\u202f234,567 kJ", 1234567);
    expect_reads("12 345 678 J", 12345678);
    expect_reads("8.314 462 618 J/(mol·K)", 8.314462618);
    expect_reads("5 100 J", 5100);
    for (std::string_view const text : {"12 34 kJ", "1 2345 kJ", "1234 567 kJ", "0 123 kJ",
                                        "1  234 kJ", "9.806 65 m/s²", "1'234 kJ", "1_234 kJ"})
        EXPECT_THROW(read_quantity(text), Failure) << text;
}

TEST(Quantity, ReadsASingleSeparatorAsDecimalUnlessItCouldGroup) {
    expect_reads("7,3 kJ/mol", 7300);
    expect_reads("0,125 kJ", 125);
    expect_reads("1234,567 kJ", 1234567);
    expect_reads("1,2345 kJ", 1234.5);
    expect_reads("1.234 kJ", 1234);
    expect_reads("12,34 K", 12.34);
    expect_reads("1 234,567 K", 1234.567);
}

TEST(Quantity, RefusesWhatCouldGroupThousands) {
    struct {
        const char *text, *repair;
    } const cases[]{
        {"1,234 kJ", "write `1.234 kJ` or `1234 kJ`"},
        {"-12,345", "write `-12.345` or `-12345`"},
        {"1,234e3 J", "write `1.234e3 J` or `1234e3 J`"},
        {"1.234,5 kJ", "write `1234.5 kJ`"},
        {"1,234.5 kJ", "write `1234.5 kJ`"},
        {"1,234,567 kJ", "write `1234567 kJ`"},
        {"1.234.567 kJ", "write `1234567 kJ`"},
        {"1.234.567,8 kJ", "write `1234567.8 kJ`"},
        {"(1,234 ± 1) kJ", "write `(1.234 ± 1) kJ` or `(1234 ± 1) kJ`"},
    };
    for (auto const& c : cases) try {
            read_quantity(c.text);
            ADD_FAILURE() << c.text << " was read";
        } catch (Failure const& failure) {
            EXPECT_EQ(failure.given, c.text);
            EXPECT_EQ(failure.repair, c.repair);
        }
}

TEST(Quantity, NeverReadsWordsForNumbers) {
    for (std::string_view const text :
         {"nan",   "NaN K", "inf", "infinity K", "0x10",  "0x1p3",  "1e",     "e5",
          "--5 K", "+-5 K", ".",   ",",          "-",     "+",      "5..5 K", "#N/A",
          "TRUE",  "=5",    "'5",  "5,",         "1e5e5", "1e5.5 K"})
        EXPECT_THROW(read_quantity(text), Failure) << text;
}

TEST(Quantity, RefusesWhatNoDoubleHolds) {
    for (std::string_view const text : {"1e400 K", "1e308 kJ", "1e999999999999 K", "1e-400 K",
                                        "9e307 MJ", "-1e309", "1 J ± 1e400"})
        expect_refusal(unfit, "", "between", [&] { read_quantity(text); });
    expect_reads("0e999999 K", 0);
    expect_reads("1e308", 1e308);
    expect_reads("1e305 kJ", 1e308);
    expect_reads("4.9e-324", 4.9e-324);
    expect_reads("1" + std::string(300, '0') + "e-300 K", 1);
}

TEST(Quantity, KeepsNineteenDigits) {
    expect_reads("0.1000000000000000055511151231257827 K", 0.1);
    expect_reads("9999999999999999999 J", 1e19);
    expect_reads("12345678901234567890123 J", 12345678901234567890123.0);
}

TEST(Quantity, ReadsStandardUncertainties) {
    expect_reads("7.3(2) kJ/mol", 7300, 200);
    expect_reads("7.30(12) kJ/mol", 7300, 120);
    expect_reads("73(2)e2 J", 7300, 200);
    expect_reads("7.3(2)×10³ J", 7300, 200);
    expect_reads("(10.57 ± 0.10) J/(mol·K)", 10.57, 0.10);
    expect_reads("(10.57±0.10)J/(mol·K)", 10.57, 0.10);
    expect_reads("10.57 ± 0.10 J/(mol·K)", 10.57, 0.10);
    expect_reads("10.57 J/(mol·K) ± 0.10 J/(mol·K)", 10.57, 0.10);
    expect_reads("7.3 kJ ± 200 J", 7300, 200);
    expect_reads("7.3 +/- 0.2 kJ", 7300, 200);
    expect_reads("7.3 +- 0.2 kJ", 7300, 200);
    expect_reads("7.3 kJ/mol ± 0.2", 7300, 200);
    expect_reads("7.3 kJ/mol ± 1 %", 7300, 73);
    expect_reads("7.3 ± 1 % kJ/mol", 7300, 73);
    expect_reads("-7.3 kJ/mol ± 1 %", -7300, 73);
    expect_reads("0.79 ± 0.02", 0.79, 0.02);
    expect_reads("(0.79 ± 0.02)", 0.79, 0.02);
    expect_reads("(12 ± 1) %", 0.12, 0.01);
    expect_reads("12 mol% ± 1 mol%", 0.12, 0.01);
    expect_reads("5 J ± 0", 5, 0);
}

TEST(Quantity, DividesByTheCoverageFactor) {
    expect_reads("7.3 kJ ± 0.4 kJ (k=2)", 7300, 200);
    expect_reads("(7.3 ± 0.4) kJ (k = 2)", 7300, 200);
    expect_reads("7.3(4) kJ (k=2)", 7300, 200);
    expect_reads("7.3 kJ ± 2 % (k=2)", 7300, 73);
    expect_reads("0.79 ± 0.02 (k=2)", 0.79, 0.01);
    for (std::string_view const text :
         {"7 ± 1 kJ (k=0)", "7 ± 1 kJ (k=-2)", "7 ± 1 kJ (k=)", "7 ± 1 kJ (k=2", "7 ± 1 kJ (k)",
          "7 ± 1 kJ (k=1e-400)", "7 ± 1 kJ (k=1e400)", "7 ± 1 kJ (K=2)"})
        EXPECT_THROW(read_quantity(text), Failure) << text;
    expect_refusal(unfit, "7 kJ (k=2)", "belongs to", [] { read_quantity("7 kJ (k=2)"); });
    expect_refusal(unfit, "(k=0)", "above 0", [] { read_quantity("7 ± 1 kJ (k=0)"); });
}

TEST(Quantity, AnUncertaintyOfATemperatureIsADifference) {
    expect_reads("25 °C ± 0.5 K", 298.15, 0.5);
    expect_reads("25 ± 0.5 °C", 298.15, 0.5);
    expect_reads("25 °C ± 0.5 °C", 298.15, 0.5);
    expect_reads("25 °C ± 0.5 Δ°C", 298.15, 0.5);
    expect_reads("25 °C ± 0.9 °F", 298.15, 0.5);
    expect_reads("77 °F ± 0.9", 298.15, 0.5);
    expect_reads("25.0(5) °C", 298.15, 0.5);
    expect_reads("300 K ± 1 %", 300, 3);
    for (std::string_view const text : {"25 °C ± 2 %", "77 °F ± 2 %", "25 ± 2 % °C"})
        expect_refusal(unfit, std::string(text), "in kelvin", [&] { read_quantity(text); });
}

TEST(Quantity, RefusesUncertaintiesOfTwoReadings) {
    for (std::string_view const text :
         {"12 ± 1 %", "12 % ± 1 %", "0.79 ± 2 %", "12 mol% ± 1 %", "(12 ± 1 %)", "(12 ± 1 %) %"})
        expect_refusal(unfit, std::string(text), "one way", [&] { read_quantity(text); });
    expect_refusal(unfit, "", "one uncertainty", [] { read_quantity("7.3(2) kJ ± 0.2 kJ"); });
    expect_refusal(unfit, "", "one uncertainty", [] { read_quantity("7.3 ± 0.2 kJ ± 0.2"); });
    expect_refusal(unfit, "", "of its own", [] { read_quantity("7.3 ± 0.2(1) kJ"); });
    expect_refusal(unfit, "", "not negative", [] { read_quantity("7.3 ± -0.2 kJ"); });
    expect_refusal(unfit, "", "quantity itself", [] { read_quantity("7.3 kJ ± 0.2 K"); });
    expect_refusal(unfit, "", "quantity itself", [] { read_quantity("12 mol% ± 1 vol%"); });
    expect_refusal(unfit, "", "behind ±", [] { read_quantity("7.3 kJ ±"); });
    expect_refusal(unfit, "", "parentheses", [] { read_quantity("(7.3 ± 0.2 kJ"); });
    expect_refusal(unfit, "", "inside the parentheses", [] { read_quantity("(7.3) kJ"); });
}

TEST(Quantity, SaysWhatUnitAndReadingItHad) {
    std::string_view const text = "  5 bar (g)  ";
    Quantity const gauge = read_quantity(text);
    EXPECT_EQ(gauge.unit.reading, Reading::gauge);
    EXPECT_EQ(gauge.si, 500000);
    EXPECT_EQ(gauge.written_unit, "bar (g)");
    EXPECT_EQ(gauge.written_unit.data(), text.data() + 4);
    EXPECT_EQ(read_quantity("5 barg").unit.reading, Reading::gauge);
    EXPECT_EQ(read_quantity("60 psig").unit.reading, Reading::gauge);
    EXPECT_EQ(read_quantity("5 bara").unit.reading, Reading::plain);
    EXPECT_EQ(read_quantity("25 Δ°C").unit.reading, Reading::difference);
    EXPECT_EQ(read_quantity("25 °C").unit.reading, Reading::point);
    EXPECT_EQ(read_quantity("12 wt%").unit.share, Share::mass);
    EXPECT_EQ(read_quantity("(7.3 ± 0.2) kJ/mol").written_unit, "kJ/mol");
    EXPECT_EQ(read_quantity("7.3 kJ/mol ± 0.2 kJ/mol").written_unit, "kJ/mol");
    EXPECT_TRUE(read_quantity("0.79").bare);
    EXPECT_TRUE(read_quantity("½ ± 0.1").bare);
    EXPECT_FALSE(read_quantity("12 %").bare);
    EXPECT_EQ(read_quantity("5 Mpa").note, "`Mpa` was read as `MPa`");
    EXPECT_EQ(read_quantity("5 MPa").note, "");
}

TEST(Quantity, BelowZeroKelvinIsReadable) { // what is impossible is judged by the argument
    expect_reads("-300 °C", -26.85);
    expect_reads("-273.15 °C", 0);
    expect_reads("-459.67 °F", 0);
}

TEST(Quantity, RefusalsGiveTheWholeTextAnew) {
    struct {
        const char *text, *repair;
    } const cases[]{
        {"25 C", "write `25 °C`"},
        {"5 kJ/kg·K", "write `5 kJ/(kg·K)`"},
        {"5 kJ/kg K ± 2 %", "write `5 kJ/(kg·K) ± 2 %`"},
        {"5 Btu_IT/lb-°R", "write `5 Btu_IT/(lb·°R)`"},
        {"5/K", "write `5 1/K`"},
        {"5 / K", "write `5 1/K`"},
        {"5 · K", "write `5 K`"},
        {"5*kJ", "write `5 kJ`"},
        {"1/2 K", "write the fraction as a decimal number, such as `0.5`"},
        {"kJ/mol", "begin with the number"},
        {"abc", "begin with the number"},
        {"5 Nm³", "give the gas as an amount of substance through AMOUNT.GAS"},
        {"5 joule", "write `5 J`"},
    };
    for (auto const& c : cases) try {
            read_quantity(c.text);
            ADD_FAILURE() << c.text << " was read";
        } catch (Failure const& failure) {
            EXPECT_EQ(failure.kind, Failure::Kind::unfit);
            EXPECT_EQ(failure.given, c.text);
            EXPECT_EQ(failure.repair, c.repair);
        }
}

TEST(Quantity, IsBounded) {
    expect_refusal(unfit, "1", "1024 bytes", [] { read_quantity("1" + std::string(1024, ' ')); });
    for (std::string const blank : {"", " ", "\u200b", "\t\n"})
        expect_refusal(unfit, "a blank text", "a number with its unit",
                       [&] { read_quantity(blank); });
    EXPECT_THROW(read_quantity(std::string(1024, '(')), Failure);
    EXPECT_THROW(read_quantity("5 " + std::string(1000, '(')), Failure);
    EXPECT_THROW(read_quantity(std::string("5\0K", 3)), Failure);
    EXPECT_THROW(read_quantity("5 \xff"), Failure);
}

TEST(Uncertainty, ReadsACellOfItsColumn) {
    Unit const kilojoule = read_unit("kJ/mol");
    EXPECT_EQ(read_uncertainty("0.2", 7300, kilojoule), 200);
    EXPECT_EQ(read_uncertainty("± 0.2", 7300, kilojoule), 200);
    EXPECT_EQ(read_uncertainty("200 J/mol", 7300, kilojoule), 200);
    EXPECT_EQ(read_uncertainty("2 %", -7300, kilojoule), 146);
    EXPECT_EQ(read_uncertainty("0.4 (k=2)", 7300, kilojoule), 200);
    EXPECT_EQ(read_uncertainty("2 % (k=2)", 7300, kilojoule), 73);
    EXPECT_EQ(read_uncertainty("", 7300, kilojoule), 0);
    EXPECT_EQ(read_uncertainty("  ", 7300, kilojoule), 0);
    EXPECT_EQ(read_uncertainty("0", 7300, kilojoule), 0);
    EXPECT_EQ(read_uncertainty("0.5", 298.15, read_unit("°C")), 0.5);
    EXPECT_EQ(read_uncertainty("0.9", 298.15, read_unit("°F")), 0.5);
    EXPECT_EQ(read_uncertainty("0.5 K", 298.15, read_unit("°C")), 0.5);
    EXPECT_EQ(read_uncertainty("1", 0.12, read_unit("%")), 0.01);
}

TEST(Uncertainty, RefusesWhatDoesNotFitTheValue) {
    Unit const kilojoule = read_unit("kJ/mol");
    expect_refusal(unfit, "0.2 K", "quantity itself",
                   [&] { read_uncertainty("0.2 K", 7300, kilojoule); });
    expect_refusal(unfit, "-0.2", "not negative",
                   [&] { read_uncertainty("-0.2", 7300, kilojoule); });
    expect_refusal(unfit, "2 %", "in kelvin",
                   [] { read_uncertainty("2 %", 298.15, read_unit("°C")); });
    expect_refusal(unfit, "1 %", "one way", [] { read_uncertainty("1 %", 0.12, read_unit("%")); });
    expect_refusal(unfit, "0.4 (k=0)", "above 0",
                   [&] { read_uncertainty("0.4 (k=0)", 7300, kilojoule); });
    for (std::string_view const text :
         {"abc", "0.2 0.3", "0.2(1)", "± ± 1", "1,234", "(k=2)", "nan"})
        EXPECT_THROW(read_uncertainty(text, 7300, kilojoule), Failure) << text;
    EXPECT_THROW(read_uncertainty(std::string(2000, ' '), 1, kilojoule), Failure);
}

} // namespace
