// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include <gtest/gtest.h>

#include <set>
#include <string>

// Names, ids and argument order are the contract that sheets are saved against.

namespace {

using namespace registration;

std::string signature(Entry const& entry) {
    std::string text = std::string(entry.name) + "(";
    for (std::size_t at = 0; at < entry.argument_count(); ++at)
        text.append(at ? "; " : "").append(entry.arguments[at].name);
    return text + ")";
}

constexpr const char* contract[] = {
    "ENTROPY.FUSION(what; temperature; amount; show)",
    "ENTROPY.VAPORIZATION(what; temperature; amount; show)",
    "ENTROPY.TRANSITION(what; temperature; amount; show)",
    "ENTROPY.HEAT(heat; temperature; end_temperature; show)",
    "ENTROPY.BLACKBODY(emitted; temperature; show)",
    "ENTROPY.ISOTHERMAL(from; to; amount; gas; show)",
    "ENTROPY.ISOCHORIC(heat_capacity; from; to; amount; show)",
    "ENTROPY.ISOBARIC(heat_capacity; from; to; amount; show)",
    "ENTROPY.POLYTROPIC(gas; exponent; from; to; amount; show)",
    "ENTROPY.ADIABATIC(gas; T1; p1; T2; p2; amount; show)",
    "ENTROPY.GAS(gas; T1; p1; T2; p2; amount; show)",
    "ENTHALPY.GAS(gas; T1; p1; T2; p2; amount; show)",
    "ENTROPY.PRESSURIZING(volume; expansivity; p1; p2; show)",
    "ENTROPY.MIXING(amounts; substances; show)",
    "ENTROPY.CONFIGURATIONAL(fractions; sites; show)",
    "WORK.SEPARATION(amounts; surroundings; substances; show)",
    "FRACTION.MOLE(mass_fractions; substances; show)",
    "ENTROPY.GENERATED(changes; heats; temperatures; show)",
    "SECONDLAW.VERDICT(changes; heats; temperatures; tolerance; show)",
    "WORK.LOST(generated; surroundings; show)",
    "EXERGY.HEAT(heat; temperature; surroundings; show)",
    "CARNOT.EFFICIENCY(hot; cold; show)",
    "CARNOT.COOLING(hot; cold; show)",
    "CARNOT.HEATING(hot; cold; show)",
    "TEMPERATURE.ADIABATIC(gas; T1; p1; p2; efficiency; show)",
    "EFFICIENCY.ISENTROPIC(gas; T1; p1; T2; p2; show)",
    "ENTROPY.DEBYE(debye_temperature; temperature; show)",
    "ENTROPY.HEATING(substance; from; to; amount; show)",
    "ENTHALPY.HEATING(substance; from; to; amount; show)",
    "HEAT.CAPACITY(substance; temperature; show)",
    "ENTROPY.STANDARD(substance; temperature; pressure; show)",
    "ENTROPY.REACTION(equation; temperature; show)",
    "ENTHALPY.REACTION(equation; temperature; show)",
    "GIBBS.REACTION(equation; temperature; activities; show)",
    "EQUILIBRIUM.CONSTANT(equation; temperature; show)",
    "EQUILIBRIUM.TEMPERATURE(equation; from; to; show)",
    "MATERIAL.OF(block; name; molar_mass)",
    "SUBSTANCE.LIST(words)",
    "SUBSTANCE.PHASES(substance)",
    "CURVE.HEATING(substance; from; to; points; units)",
    "ENTROPY.STEAM(first; second; amount; show)",
    "ENTHALPY.STEAM(first; second; amount; show)",
    "VOLUME.STEAM(first; second; amount; show)",
    "ENERGY.STEAM(first; second; amount; show)",
    "TEMPERATURE.STEAM(first; second; show)",
    "PRESSURE.STEAM(first; second; show)",
    "DRYNESS.STEAM(first; second; show)",
    "EXERGY.STEAM(first; second; surroundings; surroundings_pressure; amount; show)",
    "EFFICIENCY.STEAM(first; second; end_first; end_second; show)",
    "CURVE.SATURATION(points; units)",
    "ENTROPY.DEPARTURE(gas; temperature; pressure; equation; show)",
    "ENTHALPY.DEPARTURE(gas; temperature; pressure; equation; show)",
    "ENTROPY.REALGAS(gas; T1; p1; T2; p2; amount; equation; show)",
    "ENTHALPY.REALGAS(gas; T1; p1; T2; p2; amount; equation; show)",
    "COMPRESSIBILITY.FACTOR(gas; temperature; pressure; equation; show)",
    "EXERGY.STREAM(substance; T; p; T0; p0; amount; show)",
    "TEMPERATURE.HEATED(substance; from; heat; amount; show)",
    "FRACTION.PHASE(substance; from; heat; amount; phase; show)",
    "TEMPERATURE.EQUALIZED(materials; amounts; temperatures; show)",
    "ENTROPY.EQUALIZING(materials; amounts; temperatures; show)",
    "MOLAR.MASS(formula; show)",
    "QUANTITY.OF(value; unit; u)",
    "QUANTITY.CONVERT(quantity; show; substance)",
    "QUANTITY.TEXT(quantity; unit; digits)",
    "PRESSURE.ABSOLUTE(gauge; atmospheric; show)",
    "AMOUNT.GAS(volume; temperature; pressure; show)",
    "ADDIN.VERSION()",
    "ADDIN.SELFTEST()",
};

TEST(Catalogue, KeepsTheContract) {
    std::set<std::string> have;
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) have.insert(signature(entry));
    for (const char* expected : contract) EXPECT_TRUE(have.contains(expected)) << expected;
    EXPECT_EQ(have.size(), std::size(contract));
}

TEST(Catalogue, MakesIdsOfNames) {
    EXPECT_EQ(catalogue::id(*catalogue::find("ENTROPY.FUSION")), "entropyFusion");
    EXPECT_EQ(catalogue::id(*catalogue::find("SECONDLAW.VERDICT")), "secondlawVerdict");
    std::set<std::string> ids;
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries)
            EXPECT_TRUE(ids.insert(catalogue::id(entry)).second) << entry.name;
}

TEST(Catalogue, SaysSomethingOfEverything) {
    for (auto const& section : catalogue::sections())
        for (Entry const& entry : section.entries) {
            const std::string_view says = entry.says;
            EXPECT_TRUE(says.ends_with('.')) << entry.name;
            for (Form const& form : entry.all_forms()) EXPECT_TRUE(form.source[0]) << entry.name;
        }
}

} // namespace
