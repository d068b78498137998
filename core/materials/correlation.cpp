// SPDX-License-Identifier: MPL-2.0
#include "core/materials/correlation.h"

#include "core/ratio.h"
#include "core/text/characters.h"

#include <cmath>
#include <string>

namespace core::materials {

namespace {

constexpr std::size_t most_rows = 100, most_terms = 30, longest_phase = 50, most_parts = 4000;
constexpr double largest_exponent = 99;

/// high^(m-1) + high^(m-2)·low + ... + low^(m-1), the divided difference of T^m.
double mixed_powers(int m, double low, double high) {
    double sum = 1, power = 1;
    for (int k = 1; k < m; ++k) {
        power *= low;
        sum = sum * high + power;
    }
    return sum;
}

/// The integral of a whole power over high - low: quicker than by pow, and as accurate.
double mean_of_whole(int q, double low, double high) {
    if (q > 0) return mixed_powers(q, low, high) / q;
    double power = 1;
    for (int k = 0; k < -q; ++k) power *= low * high;
    return mixed_powers(-q, low, high) / (-q * power);
}

/// low^q · (e^(q·ln) - 1) / q with ln = ln(high / low)
double integral(double q, double low, double high, double ln) {
    if (q == 0) return ln;
    if (std::abs(q) <= 5 && q == std::floor(q))
        return (high - low) * mean_of_whole(static_cast<int>(q), low, high);
    const double x = q * ln;
    return std::pow(low, q) * ln * (x == 0 ? 1 : std::expm1(x) / x);
}

/// Σ a · ∫T^(n + raised - 1) dT
double sum_of_integrals(std::span<const Term> terms, double raised, double low, double high) {
    const double ln = ln_ratio(high, low);
    double sum = 0;
    for (Term const& term : terms) {
        const double q = term.exponent + raised;
        sum += term.coefficient * integral(q, low, high, ln);
    }
    return sum;
}

double value(std::span<const Term> terms, double t) {
    double sum = 0;
    for (Term const& term : terms) sum += term.coefficient * std::pow(t, term.exponent);
    return sum;
}

} // namespace

double integral_of_power(double q, double low, double high) {
    return integral(q, low, high, ln_ratio(high, low));
}

double CorrelationPiece::heat_capacity(double t) const { return value(terms_, t); }

double CorrelationPiece::enthalpy(double low, double high) const {
    const double spread = spread_ * ((high - low) / (to_ - from_));
    return sum_of_integrals(terms_, 1, low, high) + spread;
}

double CorrelationPiece::entropy(double low, double high) const {
    const double spread = spread_ * (ln_ratio(high, low) / (to_ - from_));
    return sum_of_integrals(terms_, 0, low, high) + spread;
}

namespace {

/// A bound from below by Taylor's formula about the middle, the remainder of second order at its
/// largest: the terms of a published polynomial may be 1e5 times their sum, so that only what is
/// small of second order can be given away.
double least_value(std::span<const Term> terms, double low, double high) {
    const double middle = low + (high - low) / 2, reach = (high - low) / 2;
    double value = 0, slope = 0, bend = 0;
    for (auto const& [n, a] : terms) {
        const double power = a * std::pow(middle, n);
        value += power;
        slope += n * power / middle;
        bend += std::abs(a * n * (n - 1)) * std::max(std::pow(low, n - 2), std::pow(high, n - 2));
    }
    return value - reach * (std::abs(slope) + reach * bend / 2);
}

} // namespace

bool is_positive(std::span<const Term> terms, double low, double high) {
    struct Part {
        double low, high;
    };
    std::vector<Part> open{{low, high}};
    for (std::size_t tried = 0; !open.empty(); ++tried) {
        const Part part = open.back();
        open.pop_back();
        if (least_value(terms, part.low, part.high) > 0) continue;
        const double middle = part.low + (part.high - part.low) / 2;
        if (tried == most_parts || !(value(terms, middle) > 0) || middle <= part.low ||
            middle >= part.high)
            return false;
        open.push_back({middle, part.high});
        open.push_back({part.low, middle});
    }
    return true;
}

namespace {

std::string name(CorrelationRow const& row) {
    return "the row from " + written(row.from) + " to " + written(row.to) + " K";
}

void check_range(CorrelationRow const& row, std::size_t i) {
    if (std::isnan(row.from) || std::isnan(row.to))
        refuse_unfit("a blank cell in row " + std::to_string(i + 1),
                     "a temperature under `from` and one under `to` in every row", "fill the gap");
    if (!(row.from > 0) || std::isinf(row.to))
        refuse_impossible(name(row), "temperatures above 0 K",
                          "check the sign and the unit of the temperatures");
    if (!is_above(row.to, row.from))
        refuse_unfit(name(row), "rows whose `to` lies above their `from`",
                     "check the temperatures");
}

void check_term(CorrelationRow const& row, Term const& term) {
    if (std::isnan(term.coefficient))
        refuse_unfit("a blank coefficient in " + name(row), "a number for every power in every row",
                     "write 0 where the power has no part in the phase");
    if (std::isinf(term.coefficient) || !(std::abs(term.exponent) <= largest_exponent))
        refuse_unfit("T^" + written(term.exponent) + " with the coefficient " +
                         written(term.coefficient),
                     "exponents from -99 to 99 and finite coefficients", "check the heading");
}

void check_latent(CorrelationRow const& row) {
    for (const double heat : {row.transition, row.spread})
        if (!(heat >= 0) || std::isinf(heat))
            refuse_impossible(written(heat) + " in " + name(row),
                              "an enthalpy of transition that is taken up on heating, 0 or above",
                              "check the sign");
}

void check_phase(CorrelationRow const& row) {
    const bool plain = std::all_of(row.phase.begin(), row.phase.end(), [](char c) {
        return static_cast<unsigned char>(c) >= 0x20 && c != '"';
    });
    if (!plain || row.phase.size() > longest_phase)
        refuse_unfit(text::shown(row.phase), "a phase of no more than 50 bytes, without `\"`",
                     "write `cr`, `l`, `g` or `cr, α`");
}

void check_heat_capacity(CorrelationRow const& row) {
    if (row.terms.empty() || row.terms.size() > most_terms)
        refuse_unfit(std::to_string(row.terms.size()) + " powers of T",
                     "from 1 to 30 powers of T in a heat capacity", "check the headings");
    for (Term const& term : row.terms) check_term(row, term);
    if (!is_positive(row.terms, row.from, row.to))
        refuse_impossible("the heat capacity of " + name(row) + ", " +
                              written(value(row.terms, row.from)) + " to " +
                              written(value(row.terms, row.to)),
                          "a heat capacity above 0 all the way",
                          "check the coefficients and their units; T is in kelvin");
}

/// Rows meet: the end of one is the beginning of the next.
void check_joint(CorrelationRow const& below, CorrelationRow const& above) {
    if (is_same(below.to, above.from)) return;
    const bool gap = above.from > below.to;
    refuse_unfit(name(below) + ", then " + name(above),
                 gap ? "rows without a gap between them" : "rows that rise and do not overlap",
                 gap ? "let each row begin where the one before it ends"
                     : "sort the rows, and let each begin where the one before it ends");
}

void check(std::span<const CorrelationRow> rows) {
    if (rows.empty() || rows.size() > most_rows)
        refuse_unfit(std::to_string(rows.size()) + " rows", "from 1 to 100 rows, one a phase",
                     "check the block");
    for (std::size_t i = 0; i < rows.size(); ++i) {
        check_range(rows[i], i);
        check_latent(rows[i]);
        check_phase(rows[i]);
        check_heat_capacity(rows[i]);
        if (i > 0) check_joint(rows[i - 1], rows[i]);
    }
    if (rows.back().transition != 0)
        refuse_unfit("a transition at " + written(rows.back().to) + " K, where the rows end",
                     "a row for the phase that the transition leads to",
                     "add the row above it, or leave the transition out");
}

} // namespace

Stretches<CorrelationPiece> correlation(std::span<const CorrelationRow> rows) {
    check(rows);
    Stretches<CorrelationPiece> all;
    double from = rows.front().from, transition = 0;
    for (CorrelationRow const& row : rows) {
        all.add(CorrelationPiece(from, row.to, row.terms, row.spread), transition);
        from = row.to;
        transition = row.transition;
    }
    const Change whole = all.heating(all.from(), all.to());
    if (!std::isfinite(whole.enthalpy) || !std::isfinite(whole.entropy))
        refuse_impossible("", "heat capacities whose sum can be written as a number",
                          "check the units of the coefficients");
    return all;
}

} // namespace core::materials
