// SPDX-License-Identifier: MPL-2.0
#include "core/substances/formula.h"

#include "tests/core/expect_refusal.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <string>
#include <vector>

namespace {

using namespace core;
using substances::molar_mass;
using substances::read_formula;

/// The composition in one line, `Cu 1, S 1`.
std::string composition(std::string_view formula) {
    std::string text;
    for (auto const& [element, count] : read_formula(formula).parts) {
        if (!text.empty()) text += ", ";
        text += std::string(element->symbol) + ' ' + std::to_string(count);
        text.erase(text.find_last_not_of('0') + 1);
        if (text.back() == '.') text.pop_back();
    }
    return text;
}

TEST(Formula, IsTakenApart) {
    EXPECT_EQ(composition("Fe2O3"), "Fe 2, O 3");
    EXPECT_EQ(composition("CO"), "C 1, O 1");
    EXPECT_EQ(composition("Co"), "Co 1");
    EXPECT_EQ(composition("CH3COOH"), "C 2, H 4, O 2");
    EXPECT_EQ(composition("Fe0.947O"), "Fe 0.947, O 1");
    EXPECT_EQ(composition("YBa2Cu3O6.95"), "Y 1, Ba 2, Cu 3, O 6.95");
    EXPECT_EQ(composition("La1.85Sr0.15CuO4"), "La 1.85, Sr 0.15, Cu 1, O 4");
    EXPECT_EQ(composition("Na2.500Zr2O4"), "Na 2.5, Zr 2, O 4");
    EXPECT_EQ(composition("Fe3.0O4.0"), "Fe 3, O 4");
}

TEST(Formula, HasBracketsInBrackets) {
    EXPECT_EQ(composition("Ca(OH)2"), "Ca 1, O 2, H 2");
    EXPECT_EQ(composition("[Cu(NH3)4]SO4"), "Cu 1, N 4, H 12, S 1, O 4");
    EXPECT_EQ(composition("Ca10(PO4)6(OH)2"), "Ca 10, P 6, O 26, H 2");
    EXPECT_EQ(composition("((((((((Fe2)2)2)2)2)2)2)2)"), "Fe 256");
}

TEST(Formula, MayBeAnAdditionCompound) {
    for (auto text : {"CuSO4·5H2O", "CuSO4*5H2O", "CuSO4•5H2O", "CuSO4⋅5H2O", "CuSO4 · 5 H2O",
                      "CuSO₄·5H₂O", "CuSO4\u00A0·\u00A05H2O"})
        EXPECT_EQ(composition(text), "Cu 1, S 1, O 9, H 10") << text;
    EXPECT_EQ(composition("MgO.SiO2"), "Mg 1, O 3, Si 1");
    EXPECT_EQ(composition("Al2O3·2SiO2·2H2O"), "Al 2, O 9, Si 2, H 4");
    EXPECT_EQ(composition("CaSO4·0.5H2O"), "Ca 1, S 1, O 4.5, H 1");
    EXPECT_EQ(composition("CaSO4·½H2O"), "Ca 1, S 1, O 4.5, H 1");
    EXPECT_EQ(composition("Na2SO3·2.5H2O"), "Na 2, S 1, O 5.5, H 5");
}

TEST(Formula, MayNameAStateOfMatter) {
    for (auto text : {"H2O(g)", "H2O(l)", "H2O (g)", "H2O(cr)", "H2O(s)", "H2O(cr, α)"})
        EXPECT_EQ(composition(text), "H 2, O 1") << text;
}

TEST(Formula, IsMendedWhereAutoCorrectLoweredACapital) {
    EXPECT_EQ(read_formula("Hcl").note, "`Hcl` read as `HCl`");
    EXPECT_EQ(composition("Hcl"), "H 1, Cl 1");
    EXPECT_EQ(composition("Pcl5"), "P 1, Cl 5");
    EXPECT_EQ(composition("Csi"), "C 1, Si 1");
    EXPECT_TRUE(read_formula("Co").note.empty());
    std::vector<std::string> remarks;
    molar_mass("Kbr", Notes(nullptr, &remarks));
    EXPECT_EQ(remarks, std::vector<std::string>{"`Kbr` read as `KBr`"});
}

struct Wrong {
    char const *formula, *needed, *repair;
};

void expect_unfit(Wrong const& wrong) {
    try {
        ADD_FAILURE() << wrong.formula << " read as " << composition(wrong.formula);
    } catch (Failure const& failure) {
        EXPECT_EQ(failure.kind, unfit);
        EXPECT_EQ(failure.given, wrong.formula);
        EXPECT_NE(failure.needed.find(wrong.needed), std::string::npos) << failure.needed;
        EXPECT_NE(failure.repair.find(wrong.repair), std::string::npos) << failure.repair;
    }
}

TEST(Formula, IsRefusedWhereItHasTwoReadings) {
    for (auto text : {"CuSO4.5H2O", "Al2O3.2SiO2", "Ca(OH)2.2H2O", "CaSO4.0.5H2O", "MgCl2.6(H2O)",
                      "Ca2.85Co4O9"})
        expect_unfit({text, "in one way only", "write `·`"});
    expect_unfit({"Fe.947O", "`.` has no place", "CuSO4"});
}

TEST(Formula, IsRefusedWithTheNearestElement) {
    expect_unfit({"Xx2O3", "`Xx` is not", "nearest element is `Xe`"});
    expect_unfit({"NaCL", "`L` is not", "write `Cl`"});
    expect_unfit({"JO2", "`J` is not", "check the spelling"});
    expect_unfit({"iron", "a chemical formula", "write `Fe`"});
    expect_unfit({"Iron", "a chemical formula", "write `Fe`"});
    expect_unfit({"nacl", "begin with a capital", "Fe2O3"});
}

TEST(Formula, IsRefusedWithACharge) {
    for (auto text : {"Na+", "SO4-2", "Fe³⁺", "SO4^2-", "Cl⁻", "Cl−"})
        expect_unfit({text, "without a charge", "leave the charge out"});
}

TEST(Formula, IsRefusedWhereItIsNone) {
    expect_unfit({"", "a complete formula", "complete"});
    expect_unfit({"Ca(OH", "a `)` for each opening bracket", "complete the brackets"});
    expect_unfit({"Ca(OH]2", "a `)` for each opening bracket", "complete the brackets"});
    expect_unfit({"Ca)2", "`)` has no place", "CuSO4"});
    expect_unfit({"Ca()2", "`)` has no place", "CuSO4"});
    expect_unfit({"CuSO4·", "a complete formula", "complete"});
    expect_unfit({"CuSO4··H2O", "`*` has no place", "CuSO4"});
    expect_unfit({"2H2O", "without a number in front", "multiply the result"});
    expect_unfit({"Fe0O", "counts from above 0", "`0`"});
    expect_unfit({"Fe02O", "counts from above 0", "`02`"});
    expect_unfit({"Fe1000001", "counts from above 0", "`1000001`"});
    expect_unfit({"Fe0,947O", "decimal point", "instead of the comma"});
    expect_unfit({"Fe O", "` ` has no place", "CuSO4"});
    expect_unfit({"Fe½", "`½` behind a `·` only", "0.5"});
    expect_unfit({"Fe\xFFO", "a chemical formula", "letters"});
    expect_unfit({"NaCl(aq)", "not a dissolved one", "leave `(aq)` out"});
}

TEST(Formula, IsRefusedBeyondItsBounds) {
    expect_unfit({"(((((((((Fe)))))))))", "8 deep", "simplify"});
    expect_unfit({"((Fe1000)1000)2", "at most 1000000 atoms", "check the counts"});
    for (std::size_t length : {201u, 900u, 1000000u})
        expect_refusal(unfit, "", "at most 200 characters",
                       [&] { read_formula(std::string(length, 'C')); });
    EXPECT_EQ(composition(std::string(200, 'C')), "C 200");
}

TEST(MolarMass, IsExactToTheDigits) {
    EXPECT_EQ(molar_mass("Fe2O3"), MolarMass::from_value(0.159687));
    EXPECT_EQ(molar_mass("H2O"), MolarMass::from_value(0.018015));
    EXPECT_EQ(molar_mass("CuSO4·5H2O"), MolarMass::from_value(0.249677));
    EXPECT_EQ(molar_mass("Fe0.947O"), MolarMass::from_value(0.068884215));
}

TEST(MolarMass, AgreesWithAReportOnThermodynamicFunctions) {
    for (auto const& row :
         published::read_table(PUBLISHED_DIR "/molar_masses.csv",
                               {"formula", "value", "unit", "tolerance", "page"}, 18))
        EXPECT_NEAR(molar_mass(row.text("formula")).value() * 1000, row.number("value"),
                    row.number("tolerance"))
            << row.text("formula");
}

TEST(MolarMass, TellsEachElement) {
    std::vector<std::string> steps;
    molar_mass("Ca(OH)2", Notes(&steps, nullptr));
    EXPECT_EQ(steps, (std::vector<std::string>{"Ca: 1 · 40.078 g/mol", "O: 2 · 15.999 g/mol",
                                               "H: 2 · 1.008 g/mol"}));
}

TEST(MolarMass, IsRefusedWithoutAStandardWeight) {
    expect_refusal(impossible, "TcO2", "technetium has not", [] { molar_mass("TcO2"); });
}

} // namespace
