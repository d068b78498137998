// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/quantities.h"
#include "core/text/unit.h"
#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

namespace {

using namespace core;
using core::text::Heading, core::text::read_heading, core::text::Reading;

void expect_heading(std::string_view text, std::string_view label, std::string_view unit) {
    SCOPED_TRACE(text);
    Heading const heading = read_heading(text);
    EXPECT_EQ(heading.label, label);
    EXPECT_EQ(heading.text, unit);
    EXPECT_EQ(heading.unit.dimension, core::text::read_unit(unit).dimension);
    if (!heading.text.empty()) {
        EXPECT_GE(heading.text.data(), text.data());
        EXPECT_LE(heading.text.data() + heading.text.size(), text.data() + text.size());
    }
}

TEST(Heading, ReadsEveryForm) {
    expect_heading("T / °C", "T", "°C");
    expect_heading("p in bar", "p", "bar");
    expect_heading("[kJ/mol]", "", "kJ/mol");
    expect_heading("Heat (kJ)", "Heat", "kJ");
    expect_heading("h / (kJ/kg)", "h", "kJ/kg");
    expect_heading("kJ/(kg·K)", "", "kJ/(kg·K)");
    expect_heading("ΔH [kJ/mol]", "ΔH", "kJ/mol");
    expect_heading("  T(K)  ", "T", "K");
    expect_heading("cp/T ratio / (J/(kg·K))", "cp/T ratio", "J/(kg·K)");
    expect_heading("Heat of the first batch in kJ", "Heat of the first batch", "kJ");
    expect_heading("in", "", "in");
    expect_heading("L in in", "L", "in");
    expect_heading("x / 1", "x", "1");
    expect_heading("T\u00a0∕\u00a0°C", "T", "°C");
}

TEST(Heading, ASolidusBetweenSpacesAlwaysSeparates) {
    EXPECT_EQ(read_heading("kJ / mol").unit.dimension, dimension<AmountOfSubstance>);
    EXPECT_EQ(read_heading("kJ/mol").unit.dimension, dimension<MolarEnergy>);
    EXPECT_EQ(read_heading("q [kJ / mol]").unit.dimension, dimension<MolarEnergy>);
    expect_refusal(unfit, "T / kJ / mol", "one solidus between spaces",
                   [] { read_heading("T / kJ / mol"); });
}

TEST(Heading, ALabelThatIsASymbolTooIsALabel) {
    EXPECT_EQ(read_heading("m (kg)").unit.dimension, dimension<Mass>);
    EXPECT_EQ(read_heading("h (kJ/kg)").unit.dimension, dimension<SpecificEnergy>);
    EXPECT_EQ(read_heading("s (kJ/(kg·K))").unit.dimension, dimension<SpecificEntropy>);
    EXPECT_EQ(read_heading("t (°C)").unit.reading, Reading::point);
    EXPECT_EQ(read_heading("m (g)").unit.dimension, dimension<Mass>);
}

TEST(Heading, AMarkBelongsToItsPressure) {
    for (std::string_view const text :
         {"bar(g)", "bar (g)", "p / bar(g)", "p (bar(g))", "p [bar (g)]", "p in kPa (g)"}) {
        EXPECT_EQ(read_heading(text).unit.reading, Reading::gauge) << text;
        EXPECT_EQ(read_heading(text).unit.dimension, dimension<Pressure>) << text;
    }
    EXPECT_EQ(read_heading("bar (a)").unit.reading, Reading::plain);
    EXPECT_THROW(read_heading("Pressure bar (g)"), Failure); // not `Pressure bar` in grams
    EXPECT_THROW(read_heading("m(g)"), Failure);
}

TEST(Heading, SaysHowToSetALabelApart) {
    try {
        read_heading("Heat kJ/kg");
        FAIL();
    } catch (Failure const& failure) {
        EXPECT_EQ(failure.repair, "write `Heat / (kJ/kg)`");
    }
    expect_refusal(unfit, "Heat kJ", "set apart", [] { read_heading("Heat kJ"); });
}

TEST(Heading, KeepsTheRefusalsOfTheUnit) {
    expect_refusal(unfit, "kJ/kg·K", "one solidus", [] { read_heading("s / kJ/kg·K"); });
    expect_refusal(unfit, "kJ/kg (K)", "one solidus", [] { read_heading("kJ/kg (K)"); });
    expect_refusal(unfit, "C", "coulomb", [] { read_heading("T / C"); });
    expect_refusal(unfit, "Temperature", "not one that is known",
                   [] { read_heading("Temperature"); });
    for (std::string_view const blank : {"", "  ", "[]", "T / ", "T []", "[ ]"})
        expect_refusal(unfit, "", "", [&] { read_heading(blank); });
}

TEST(Heading, SaysWhatWasMended) {
    EXPECT_EQ(read_heading("p / Mpa").note, "`Mpa` was read as `MPa`");
    EXPECT_EQ(read_heading("p / MPa").note, "");
}

TEST(Heading, IsBounded) {
    expect_refusal(unfit, "x", "256 bytes", [] { read_heading(std::string(300, 'x')); });
    for (std::string_view const text : {"((((", "))))", "[(])", "(", ")", "[", "]", "/ / /"})
        EXPECT_THROW(read_heading(text), Failure) << text;
}

} // namespace
