// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/text/unit.h"

#include <gtest/gtest.h>

#include <string>

// What is said of a unit that is not read, and what to write instead.

namespace {

using core::Failure;
using core::text::read_unit;

struct Refusal {
    const char* text;
    const char* needed;
    const char* repair;
};

class UnitRefusal : public testing::TestWithParam<Refusal> {};

TEST_P(UnitRefusal, SaysWhatIsNeededAndOneRepair) {
    Refusal const& expected = GetParam();
    try {
        read_unit(expected.text);
        FAIL() << expected.text << " was read";
    } catch (Failure const& failure) {
        EXPECT_EQ(failure.kind, Failure::Kind::unfit);
        EXPECT_EQ(failure.given, expected.text);
        EXPECT_EQ(failure.needed, expected.needed);
        EXPECT_EQ(failure.repair, expected.repair);
    }
}

constexpr const char* form = "write units with `·`, one `/` and parentheses, as in `kJ/(kg·K)`";
constexpr const char* solidus =
    "a unit with one solidus and one factor after it; everything below it goes in parentheses";

INSTANTIATE_TEST_SUITE_P(
    Ambiguous, UnitRefusal,
    testing::Values(
        Refusal{"C", "a unit by its symbol; `C` is the coulomb", "write `°C`"},
        Refusal{"J/(g·C)", "a unit by its symbol; `C` is the coulomb", "write `J/(g·°C)`"},
        Refusal{"F", "a unit by its symbol; `F` is the farad", "write `°F`"},
        Refusal{"R", "a unit by its symbol; `R` is the roentgen", "write `°R`"},
        Refusal{"°K", "a unit by its symbol; `°K` is the kelvin's name from before 1967",
                "write `K`"},
        Refusal{"° C", "a unit by its symbol; `°` is an angle",
                "write `°C`, `°F` or `°R` without a space inside"},
        Refusal{"Nm3",
                "a unit by its symbol; `Nm3` is a volume at reference conditions that it does not "
                "state",
                "give the gas as an amount of substance through AMOUNT.GAS"},
        Refusal{"Nm³/h",
                "a unit by its symbol; `Nm³` is a volume at reference conditions that it does not "
                "state",
                "give the gas as an amount of substance through AMOUNT.GAS"},
        Refusal{"Nm", "a unit by its symbol; `Nm` reads as nanometre or newton metre",
                "write `N·m`"},
        Refusal{"cal/g", "a unit by its symbol; `cal` stands for more than one unit",
                "write `cal_th` (thermochemical, 4.184 J) or `cal_IT` (4.1868 J)"},
        Refusal{"Btu", "a unit by its symbol; `Btu` stands for more than one unit",
                "write `Btu_IT` (International Table) or `Btu_th` (thermochemical)"},
        Refusal{"ton", "a unit by its symbol; `ton` stands for more than one unit",
                "write `t` (1000 kg), `ton_short` (2000 lb), `ton_long` (2240 lb) or `TR` "
                "(refrigeration)"},
        Refusal{"gal/h", "a unit by its symbol; `gal` stands for more than one unit",
                "write `gal_US` or `gal_UK`"},
        Refusal{"kPag", "a unit by its symbol; `kPag` hides the mark of a gauge pressure",
                "write `kPa(g)`"},
        Refusal{"mm Hg", "a unit by its symbol; `Hg` needs its length before it",
                "write `mmHg` or `inHg`"},
        Refusal{"toe", "a unit by its symbol; `toe` is not in the unit table",
                "write the energy in `GJ` (1 toe is 41.868 GJ)"}));

INSTANTIATE_TEST_SUITE_P(
    Names, UnitRefusal,
    testing::Values(
        Refusal{"joule", "a unit by its symbol; `joule` is a unit's full name", "write `J`"},
        Refusal{"Kelvin", "a unit by its symbol; `Kelvin` is a unit's full name", "write `K`"},
        Refusal{"bars", "a unit by its symbol; `bars` is a unit's full name", "write `bar`"},
        Refusal{"Megapascals", "a unit by its symbol; `Megapascals` is a unit's full name",
                "write `MPa`"},
        Refusal{"kilogram/second", "a unit by its symbol; `kilogram` is a unit's full name",
                "write `kg/second`"},
        Refusal{"kj", "a unit by its symbol; `kj` is not one that is known",
                "write `kJ` if that is meant"},
        Refusal{"BAR", "a unit by its symbol; `BAR` is a unit's full name", "write `bar`"},
        Refusal{"ATM", "a unit by its symbol; `ATM` is not one that is known",
                "write `atm` if that is meant"},
        Refusal{"barr", "a unit by its symbol; `barr` is not one that is known",
                "write `bar`, `bara` or `barg` if that is meant"},
        Refusal{"mlo", "a unit by its symbol; `mlo` is not one that is known",
                "write `mol` if that is meant"},
        Refusal{"banana", "a unit by its symbol; `banana` is not one that is known",
                "write the unit with symbols such as `kJ`, `mol`, `K`, `bar`"},
        Refusal{"кДж", "a unit by its symbol; `кДж` is not one that is known",
                "write the unit with symbols such as `kJ`, `mol`, `K`, `bar`"}));

INSTANTIATE_TEST_SUITE_P(
    Forms, UnitRefusal,
    testing::Values(
        Refusal{"kJ/kg·K", solidus, "write `kJ/(kg·K)`"},
        Refusal{"kJ/kg/K", solidus, "write `kJ/(kg·K)`"},
        Refusal{"kJ/kg K", solidus, "write `kJ/(kg·K)`"},
        Refusal{"W/m²·K/s", solidus, "write `W/(m²·K·s)`"},
        Refusal{"J·(1/kg/K)", solidus, "write `J·(1/(kg·K))`"},
        Refusal{"ft-lbf", "a unit such as `kJ/(kg·K)`; a hyphen does not multiply",
                "write `ft·lbf`"},
        Refusal{"ft – lbf", "a unit such as `kJ/(kg·K)`; a hyphen does not multiply",
                "write `ft ·lbf`"},
        Refusal{"ft(lbf)", "a unit such as `kJ/(kg·K)`; a sign of multiplication is missing",
                "write `ft·(lbf)`"},
        Refusal{"K^(-1)", "a power without parentheses", "write the power as in `K^-1` or `K⁻¹`"},
        Refusal{"K^", "a unit such as `kJ/(kg·K)`; `^` does not go on from there", form},
        Refusal{"K⁻", "a unit such as `kJ/(kg·K)`; `⁻` does not go on from there", form},
        Refusal{"J/", "a unit such as `kJ/(kg·K)` to the end", form},
        Refusal{"/K", "a unit such as `kJ/(kg·K)`; `/K` does not go on from there", form},
        Refusal{"J·", "a unit such as `kJ/(kg·K)` to the end", form},
        Refusal{"J..K", "a unit such as `kJ/(kg·K)`; `.K` does not go on from there", form},
        Refusal{"()", "a unit such as `kJ/(kg·K)`; `)` does not go on from there", form},
        Refusal{"J)", "a unit such as `kJ/(kg·K)`; `)` does not go on from there", form},
        Refusal{"J/(mol·K", "a unit whose parentheses are closed",
                "close the parenthesis with `)`"},
        Refusal{"10 kJ", "a unit such as `kJ/(kg·K)`; a number stands inside it at `10 kJ`",
                "write one number, then the unit"},
        Refusal{"kJ 5", "a unit such as `kJ/(kg·K)`; a number stands inside it at `5`",
                "write one number, then the unit"},
        Refusal{"kJ;", "a unit such as `kJ/(kg·K)`; `;` does not go on from there", form}));

TEST(UnitRefusals, SayOfABlankThatItIsBlank) {
    for (std::string const text : {"", "   ", "\u00a0", "\u200b"}) try {
            read_unit(text);
            FAIL();
        } catch (Failure const& failure) {
            EXPECT_EQ(failure.given, "a blank text");
            EXPECT_EQ(failure.repair, "write the unit");
        }
}

TEST(UnitRefusals, ShortenWhatIsLong) {
    try {
        read_unit(std::string(200, 'x'));
        FAIL();
    } catch (Failure const& failure) {
        EXPECT_EQ(failure.given, std::string(60, 'x') + "…");
    }
}

TEST(UnitRefusals, RefuseWhatIsNotUtf8) {
    for (std::string const text :
         {"\xff", "K\xc2", "K\xc0\x80", "\xed\xa0\x80", "J/\xf4\x90\x80\x80", "\x80", "K\xe2\x84"})
        try {
            read_unit(text);
            FAIL() << "read";
        } catch (Failure const& failure) {
            EXPECT_EQ(failure.needed, "text in UTF-8");
            EXPECT_NE(failure.given.find('?'), std::string::npos);
        }
    EXPECT_THROW(read_unit(std::string("K\0", 2)), Failure);
    EXPECT_THROW(read_unit(std::string("\0K", 2)), Failure);
}

} // namespace
