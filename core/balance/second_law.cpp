// SPDX-License-Identifier: MPL-2.0
#include "core/balance/second_law.h"

#include "core/failure.h"
#include "core/sum.h"
#include "core/written.h"

#include <cmath>
#include <string>

namespace core::balance {

namespace {

template<class Basis>
using Changes = Column<Uncertain<On<Entropy, Basis>>>;
template<class Basis>
using Heats = Column<Uncertain<On<Energy, Basis>>>;
using Temperatures = Column<Uncertain<Temperature>>;

constexpr double rounding = 1e-12;

/// A sum of entropies as SI numbers, with what judging it needs.
struct Balance {
    Sum generated;
    double magnitude = 0, variance = 0;

    void add(double term, double u) {
        generated.add(term);
        magnitude += std::abs(term);
        variance += u * u;
    }
    double margin() const { return rounding * magnitude + 2 * std::sqrt(variance); }
};

std::string numbered(char const* symbol, std::size_t row) {
    return symbol + std::to_string(row + 1);
}

template<class Basis>
void add_changes(Balance& balance, Changes<Basis> changes, Notes const& notes) {
    Sum sum;
    for (std::size_t row = 0; row < changes.size(); ++row) {
        const auto [change, u] = changes[row];
        balance.add(change.value(), u.value());
        sum.add(change.value());
        notes.step([&, c = change] { return numbered("ΔS", row) + " = " + written(c); });
    }
    notes.step([&] { return "Σ(ΔS) = " + written(On<Entropy, Basis>::from_value(sum.value())); });
}

template<class Basis>
void add_heats(Balance& balance, Heats<Basis> heats, Temperatures temperatures,
               Notes const& notes) {
    Sum sum;
    for (std::size_t row = 0; row < heats.size(); ++row) {
        const Uncertain<On<Energy, Basis>> heat = heats[row];
        const Uncertain<Temperature> boundary = temperatures[row];
        const On<Entropy, Basis> carried = heat.value / absolute(boundary.value);
        const double of_heat = (heat.u / absolute(boundary.value)).value();
        const double of_temperature = (carried * (boundary.u / absolute(boundary.value))).value();
        balance.add(-carried.value(), std::hypot(of_heat, of_temperature));
        sum.add(carried.value());
        notes.step([&] {
            return numbered("Q", row) + " / " + numbered("T", row) + " = " + written(heat.value) +
                   " / " + written(boundary.value) + " = " + written(carried);
        });
    }
    notes.step(
        [&] { return "Σ(Q / T) = " + written(On<Entropy, Basis>::from_value(sum.value())); });
}

std::string counted(std::size_t count, char const* noun) {
    return std::to_string(count) + ' ' + noun + (count == 1 ? "" : "s");
}

template<class Heats, class Temperatures>
void check_pairs(std::optional<Heats> const& heats,
                 std::optional<Temperatures> const& temperatures) {
    const std::size_t heat_count = heats ? heats->size() : 0;
    const std::size_t temperature_count = temperatures ? temperatures->size() : 0;
    if (heat_count == temperature_count) return;
    refuse_unfit(counted(heat_count, "heat") + " and " + counted(temperature_count, "temperature"),
                 "one temperature of the boundary for each heat that crosses it",
                 "give both columns with the same number of rows, or leave both out");
}

template<class Basis>
Balance balance_of(Changes<Basis> changes, std::optional<Heats<Basis>> const& heats,
                   std::optional<Temperatures> const& temperatures, Notes const& notes) {
    check_pairs(heats, temperatures);
    Balance balance;
    add_changes<Basis>(balance, changes, notes);
    if (heats) add_heats<Basis>(balance, *heats, *temperatures, notes);
    return balance;
}

/// The same column with no uncertainties stated.
template<class Q>
Column<Uncertain<Q>> certain(Column<Q> column) {
    return {column.si, nullptr, column.count};
}
template<class Q>
std::optional<Column<Uncertain<Q>>> certain(std::optional<Column<Q>> const& column) {
    if (!column) return std::nullopt;
    return certain(*column);
}

} // namespace

template<class Basis>
On<Entropy, Basis> entropy_generated(Column<On<Entropy, Basis>> changes,
                                     std::optional<Column<On<Energy, Basis>>> heats,
                                     std::optional<Column<Temperature>> temperatures,
                                     Notes const& notes) {
    const Balance balance =
        balance_of<Basis>(certain(changes), certain(heats), certain(temperatures), notes);
    const double generated = balance.generated.value();
    if (generated < -balance.margin())
        notes.remark([] {
            return std::string("a deficit: entropy cannot vanish (second law); a heat or a change "
                               "is missing, or a figure is wrong");
        });
    return On<Entropy, Basis>::from_value(generated);
}

template<class Basis>
Verdict second_law_verdict(Column<Uncertain<On<Entropy, Basis>>> changes,
                           std::optional<Column<Uncertain<On<Energy, Basis>>>> heats,
                           std::optional<Column<Uncertain<Temperature>>> temperatures,
                           std::optional<NonNegative<On<Entropy, Basis>>> tolerance,
                           Notes const& notes) {
    using S = On<Entropy, Basis>;
    const Balance balance = balance_of<Basis>(changes, heats, temperatures, notes);
    const S generated = S::from_value(balance.generated.value());
    const S allowed = tolerance ? tolerance->value : S{};
    const S margin = S::from_value(balance.margin()) + allowed;
    notes.step([&] { return "Sgen = Σ(ΔS) - Σ(Q / T) = " + written(generated); });
    notes.step([&] {
        return "u(Sgen) = " + written(S::from_value(std::sqrt(balance.variance))) +
               ", combined standard uncertainty";
    });
    notes.step(
        [&] { return "margin = 1e-12 · Σ|terms| + 2 · u(Sgen) + tolerance = " + written(margin); });
    if (generated > margin) return Verdict::irreversible;
    return generated < -margin ? Verdict::impossible : Verdict::reversible_within_the_tolerance;
}

#define CORE_BALANCE_ON(Basis)                                                                     \
    template On<Entropy, Basis> entropy_generated<Basis>(                                          \
        Column<On<Entropy, Basis>>, std::optional<Column<On<Energy, Basis>>>,                      \
        std::optional<Column<Temperature>>, Notes const&);                                         \
    template Verdict second_law_verdict<Basis>(                                                    \
        Column<Uncertain<On<Entropy, Basis>>>,                                                     \
        std::optional<Column<Uncertain<On<Energy, Basis>>>>,                                       \
        std::optional<Column<Uncertain<Temperature>>>,                                             \
        std::optional<NonNegative<On<Entropy, Basis>>>, Notes const&);
CORE_BALANCE_ON(Total)
CORE_BALANCE_ON(Rate)
CORE_BALANCE_ON(Molar)
CORE_BALANCE_ON(Specific)
#undef CORE_BALANCE_ON

} // namespace core::balance
