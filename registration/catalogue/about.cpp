// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/catalogue.h"

#include "registration/call.h"

#include <array>
#include <cmath>

namespace registration::catalogue {
namespace {

/// A published value and the call that must reproduce it.
struct Published {
    const char* function;
    std::array<const char*, 5> arguments;
    double value, tolerance; ///< tolerance: half a unit of the last printed digit
    const char* source;
};

constexpr Published published[] = {
    {"ENTROPY.ISOTHERMAL", {"1 L", "2 L"}, 5.763146322, 5e-10, "closed form R ln 2"},
    {"ENTROPY.FUSION",
     {"9.87 kJ/mol", "278.64 K"},
     35.42,
     5e-3,
     "benzene, Domalski & Hearing 1996"},
    {"ENTROPY.FUSION",
     {"7.03 kJ/mol", "505.08 K"},
     13.92,
     5e-3,
     "tin, A. T. Dinsdale, CALPHAD 15 (1991) 317"},
    {"QUANTITY.CONVERT",
     {"1 Btu_IT/(lb·°R)", "J/(kg·K)"},
     4186.8,
     1e-9,
     "NIST SP 811 (2008), App. B, exact"},
    {"QUANTITY.CONVERT", {"1 psi", "Pa"}, 6894.757, 5e-4, "NIST SP 811 (2008), App. B"},
    {"QUANTITY.CONVERT", {"1 torr", "Pa"}, 133.3224, 5e-5, "NIST SP 811 (2008), App. B"},
    {"QUANTITY.CONVERT", {"77 °F", "K"}, 298.15, 1e-12, "NIST SP 811 (2008), App. B, exact"},
    {"AMOUNT.GAS", {"22.41396954 L", "273.15 K", "1 atm"}, 1, 5e-10, "molar volume, CODATA 2018"},
    {"AMOUNT.GAS", {"22.71095464 L", "273.15 K", "1 bar"}, 1, 5e-10, "molar volume, CODATA 2018"},
    {"MOLAR.MASS", {"H2O", "g/mol"}, 18.015, 5e-4, "Pure Appl. Chem. 94 (2022) 573"},
    {"ENTROPY.GAS",
     {"29.10061916353634 J/(mol·K)", "300 K", "1 bar", "600 K", "5 bar"},
     6.789400767,
     5e-10,
     "closed form"},
    {"CARNOT.EFFICIENCY", {"800 K", "300 K"}, 0.625, 1e-15, "closed form"},
};

bool agrees(Published const& check) {
    std::array<Cell, 5> cells{};
    std::array<Block, 5> blocks{};
    for (std::size_t i = 0; i < cells.size(); ++i)
        if (check.arguments[i]) {
            cells[i] = {Cell::Kind::text, 0, check.arguments[i]};
            blocks[i] = {&cells[i], 1, 1};
        }
    Entry const* entry = find(check.function);
    if (!entry) return false;
    const Answer answer = call(*entry, blocks);
    return answer.kind == Answer::Kind::numbers &&
           std::fabs(answer.numbers[0] - check.value) <= check.tolerance;
}

std::string version() { return "Entropy Cells " ENTROPY_CELLS_VERSION; }

std::string selftest() {
    std::size_t good = 0;
    std::string bad;
    for (Published const& check : published) {
        if (agrees(check))
            ++good;
        else
            bad.append("; ").append(check.function).append(" departs from ").append(check.source);
    }
    return std::to_string(good) + " of " + std::to_string(std::size(published)) +
           " published values agree" + bad;
}

constexpr Entry entries[] = {
    describe({.name = "ADDIN.VERSION",
              .says = "The version of the add-in that computes this sheet.",
              .forms = {form<version>("version", "the package")}}),
    describe({.name = "ADDIN.SELFTEST",
              .says = "Recomputes published values here and now, and says how many agree.",
              .forms = {form<selftest>(
                  "published values against computed ones",
                  "NIST SP 811, CODATA 2018, standard atomic weights 2021, closed forms")},
              .examples = {{{"ADDIN.SELFTEST()", 0, "12 of 12 published values agree"}}}}),
};

} // namespace

std::span<const Entry> about() { return entries; }

} // namespace registration::catalogue
