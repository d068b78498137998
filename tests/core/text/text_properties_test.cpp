// SPDX-License-Identifier: MPL-2.0
#include "core/failure.h"
#include "core/text/decimal.h"
#include "core/text/quantity.h"
#include "core/text/unit_table.h"
#include "tests/core/text/exact_fraction.h"

#include <gtest/gtest.h>
#include <rapidcheck.h>
#include <rapidcheck/gtest.h>

#include <bit>
#include <cmath>

// Properties of the language of quantities. CTest sets RC_PARAMS, so that every run draws the same.

namespace {

using namespace core;
using namespace core::text;

const std::vector<std::string> units{"K",
                                     "°C",
                                     "°F",
                                     "°R",
                                     "Δ°C",
                                     "Δ°F",
                                     "mK",
                                     "kJ/mol",
                                     "J/(mol·K)",
                                     "kJ/(kg K)",
                                     "cal_th/(mol·K)",
                                     "Btu_IT/(lb·°F)",
                                     "Btu_th/(lbmol·°R)",
                                     "Btu_IT/(h·ft²·°F)",
                                     "bar",
                                     "bar(g)",
                                     "psig",
                                     "mmHg",
                                     "torr",
                                     "kgf/cm²",
                                     "eV",
                                     "qg",
                                     "Qm",
                                     "µmol",
                                     "%",
                                     "mol%",
                                     "1/K",
                                     "m³/h",
                                     "gal_US/min",
                                     "lb/ft³",
                                     "kWh",
                                     "hp",
                                     "TR",
                                     "therm_US",
                                     "s",
                                     "J·s",
                                     "m^9/s^9",
                                     "1"};

std::string unit_text() { return *rc::gen::elementOf(units); }

/// Any finite number above 0.
double positive() {
    auto const bits = *rc::gen::inRange<std::uint64_t>(
        1, std::bit_cast<std::uint64_t>(std::numeric_limits<double>::infinity()));
    return std::bit_cast<double>(bits);
}

/// A number of the size that sheets hold, with all its digits.
double ordinary() {
    double const mantissa =
        static_cast<double>(*rc::gen::inRange<std::int64_t>(1, std::int64_t{1} << 53)) * 0x1p-53;
    return std::ldexp(mantissa, *rc::gen::inRange(-40, 41));
}

double signed_number(double size) { return *rc::gen::arbitrary<bool>() ? size : -size; }

void expect_round_trip(double si, double u, std::string const& unit) {
    std::string const text = write_exactly(si, u, read_unit(unit), unit);
    Quantity const quantity = read_quantity(text);
    RC_LOG() << text << '\n';
    RC_ASSERT(quantity.si == si);
    RC_ASSERT(quantity.u == u);
}

RC_GTEST_PROP(Exactly, EveryOrdinaryQuantityReadsBackToItsBits, ()) {
    bool const has_u = *rc::gen::arbitrary<bool>();
    expect_round_trip(signed_number(ordinary()), has_u ? ordinary() : 0, unit_text());
}

RC_GTEST_PROP(Exactly, EveryFiniteQuantityReadsBackToItsBits, ()) {
    bool const has_u = *rc::gen::arbitrary<bool>();
    expect_round_trip(signed_number(positive()), has_u ? positive() : 0, unit_text());
}

RC_GTEST_PROP(Exactly, TheUnitIsKeptAsWritten, ()) {
    std::string const unit = unit_text();
    std::string const text = write_exactly(1 + ordinary(), 0, read_unit(unit), unit);
    RC_ASSERT(read_quantity(text).written_unit == unit);
}

/// `digits` significant digits at most, as text and exactly.
struct Written {
    std::uint64_t whole =
        *rc::gen::inRange<std::uint64_t>(0, 10'000'000'000'000'000'000u) /
        (*rc::gen::elementOf(std::vector<std::uint64_t>{1, 1'000, 1'000'000, 1'000'000'000,
                                                        1'000'000'000'000, 1'000'000'000'000'000}));
    int exponent = *rc::gen::inRange(-18, 12);
    bool negative = *rc::gen::arbitrary<bool>();

    Decimal decimal() const { return {whole, exponent, negative}; }
    exact::Fraction fraction() const {
        return exact::fraction((negative ? "-" : "") + std::to_string(whole) + "e" +
                               std::to_string(exponent));
    }
    std::string text(int shift = 0) const {
        return (negative ? "-" : "") + std::to_string(whole) + "e" +
               std::to_string(exponent + shift);
    }
};

exact::Fraction exactly(long double numerator, long double denominator) {
    return exact::Fraction(exact::Whole(numerator), exact::Whole(denominator));
}

RC_GTEST_PROP(Conversion, IsTheNearestDouble, ()) {
    Written const number;
    Unit const unit = read_unit(unit_text());
    exact::Fraction const value =
        (number.fraction() + exactly(unit.zero_numerator, unit.zero_denominator)) *
        exactly(unit.numerator, unit.denominator);
    RC_ASSERT(exact::ulps(in_si(number.decimal(), unit), value) <= 0.502);
}

RC_GTEST_PROP(Conversion, OfShortNumbersIsRoundedOnce, ()) {
    Written number;
    number.whole /= 10'000'000'000'000; // six digits
    number.exponent /= 3;
    Unit const unit = read_unit(unit_text());
    exact::Fraction const value =
        (number.fraction() + exactly(unit.zero_numerator, unit.zero_denominator)) *
        exactly(unit.numerator, unit.denominator);
    RC_ASSERT(exact::ulps(in_si(number.decimal(), unit), value) <= 0.5);
}

RC_GTEST_PROP(Conversion, APowerOfTenInTheUnitIsOneInTheNumber, ()) {
    Written const number;
    double const si = read_quantity(number.text() + " K").si;
    RC_ASSERT(read_quantity(number.text(3) + " mK").si == si);
    RC_ASSERT(read_quantity(number.text(-3) + " kK").si == si);
    RC_ASSERT(read_quantity(number.text(-6) + " MK").si == si);
    RC_ASSERT(read_quantity(number.text(9) + " nK").si == si);
}

RC_GTEST_PROP(Conversion, ACellAndItsTextAreTheSame, ()) {
    double const number = signed_number(ordinary());
    std::string const unit = unit_text();
    std::string const text = write_exactly(number, 0, Unit{}, "") + " " + unit;
    RC_ASSERT(read_unit(unit).to_si(number) == read_quantity(text).si);
}

RC_GTEST_PROP(Conversion, ThereAndBackKeepsFifteenDigits, ()) {
    double const number = signed_number(ordinary());
    Unit const unit = read_unit(unit_text());
    double const offset = static_cast<double>(unit.zero_numerator / unit.zero_denominator);
    double const back = unit.from_si(unit.to_si(number));
    RC_ASSERT(std::fabs(back - number) <= 4e-16 * (std::fabs(number) + offset));
}

RC_GTEST_PROP(ForPeople, ReadsBackWithinTheRounding, ()) {
    int const digits = *rc::gen::inRange(1, 16);
    double const si = signed_number(ordinary());
    std::string const unit = unit_text();
    Unit const read = read_unit(unit);
    std::string const text = write_for_people(si, 0, read, unit, digits);
    RC_LOG() << text << '\n';
    double const number = read.from_si(si), again = read.from_si(read_quantity(text).si);
    double const offset = static_cast<double>(read.zero_numerator / read.zero_denominator);
    RC_ASSERT(std::fabs(again - number) <=
              0.5001 * std::pow(10, 1 - digits) * std::fabs(number) + 1e-15 * offset);
}

RC_GTEST_PROP(ForPeople, RoundsTheValueWithItsUncertainty, ()) {
    double const u = ordinary();
    double const si = signed_number(u * *rc::gen::inRange(0, 1'000'000'000) * 1e-3);
    std::string const unit = unit_text();
    std::string const text = write_for_people(si, u, read_unit(unit), unit);
    RC_LOG() << text << '\n';
    Quantity const quantity = read_quantity(text);
    RC_ASSERT(std::fabs(quantity.u - u) <= 0.0501 * u);
    RC_ASSERT(std::fabs(quantity.si - si) <= 0.0501 * u + 1e-13);
}

/// Any bytes, or pieces of the language in any order.
std::string any_text() {
    static const std::vector<std::string> pieces{
        "7.3", "1,234", "½",  " ", "\u00a0", "±",    "+/-", "+-",    "(",   ")",   "(k=2)", "(2)",
        "e3",  "×10",   "³",  "⁻", "^",      "-",    "+",   "/",     "·",   ".",   "*",     "%",
        "kJ",  "mol",   "K",  "°", "°C",     "Δ",    "bar", "(g)",   "(a)", "Mpa", "C",     "Btu",
        "m3",  "1",     "in", "[", "]",      "\xff", "µ",   "x10^2", "kg",  "0"};
    if (*rc::gen::inRange(0, 3) == 0) {
        auto const bytes = *rc::gen::arbitrary<std::vector<char>>();
        return {bytes.begin(), bytes.end()};
    }
    std::string text;
    for (auto const& piece :
         *rc::gen::container<std::vector<std::string>>(rc::gen::elementOf(pieces)))
        text += piece;
    return text;
}

template<class Read>
void expect_read_or_refused(std::string const& text, Read&& read) {
    try {
        read(text);
    } catch (Failure const& failure) {
        RC_ASSERT(failure.kind == Failure::Kind::unfit);
        RC_ASSERT(!failure.given.empty());
        RC_ASSERT(!failure.needed.empty());
        RC_ASSERT(!failure.repair.empty());
    }
}

RC_GTEST_PROP(AnyText, IsReadOrRefused, ()) {
    std::string const text = any_text();
    expect_read_or_refused(text, [](auto const& t) {
        Quantity const quantity = read_quantity(t);
        RC_ASSERT(std::isfinite(quantity.si));
        RC_ASSERT(quantity.u >= 0 && std::isfinite(quantity.u));
        expect_round_trip(quantity.si, quantity.u, "K");
    });
    expect_read_or_refused(text, [](auto const& t) { read_unit(t); });
    expect_read_or_refused(text, [](auto const& t) { read_heading(t); });
    expect_read_or_refused(text, [](auto const& t) { read_uncertainty(t, 300, Unit{}); });
}

} // namespace
