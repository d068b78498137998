// SPDX-License-Identifier: MPL-2.0
#pragma once

// Substances of the tables and their phases at 1 bar. Enthalpies are counted so that the one at
// 298.15 K is the enthalpy of formation from the elements there; entropies are absolute.
// Source of the data: core/substances/tables/SOURCES.md; report and page with every phase.

#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/table.h"
#include "core/temperature.h"

#include <algorithm>
#include <span>
#include <string>
#include <string_view>

namespace core::substances {

/// The pressure of the standard state, 1 bar. Source: IUPAC Green Book, 3rd ed. 2007, 2.11.1.
inline constexpr Pressure standard_pressure = Pressure::from_value(1e5);

/// One phase of a substance: its molar functions inside its range of temperature, whose ends count
/// as inside. Outside every function refuses (#NUM!): nothing is extrapolated.
/// Accuracy: that of the report, whose printed values at 298.15 K are reproduced to half a unit of
/// their last digit; tests/core/substances/printed_values_test.cpp.
class Phase {
public:
    explicit Phase(PhaseRow const& row) : row_(&row) {}

    std::string_view name() const { return row_->name; }
    std::string_view source() const { return row_->source; }
    std::string_view note() const { return row_->note; }
    Aggregation aggregation() const { return row_->aggregation; }
    MolarEntropy entropy_uncertainty() const { return MolarEntropy::from_value(row_->entropy_u); }
    MolarMass molar_mass() const;
    Temperature from() const;
    Temperature to() const;

    MolarHeatCapacity heat_capacity(Temperature) const;
    MolarEnergy enthalpy(Temperature) const;
    MolarEntropy entropy(Temperature) const;
    /// Enthalpy - T · entropy.
    MolarEnergy gibbs(Temperature) const;

    friend bool operator==(Phase a, Phase b) { return a.row_ == b.row_; }

private:
    PhaseRow const* row_;
};

/// A substance as a sheet names it. Without a state it is the phase stable at each temperature and
/// 1 bar: the least Gibbs energy among the condensed phases, and the gas where its molecules are
/// those of the formula (tables/vapours.csv). With a state it is the phases of that state alone.
/// A transition lies where the report puts it, or where two Gibbs energies agree; exactly there the
/// phase is the one of lower temperature. Decomposition is not modelled.
class Substance {
public:
    explicit Substance(View const& view) : view_(&view) {}

    std::string_view formula() const { return row().formula; }
    /// The common name, or empty.
    std::string_view name() const { return row().name; }
    /// As shown to people: `Fe`, `H2O(g)`, `SiO2(cr, quartz)`; isomers by name, `isobutane`.
    std::string written() const;
    MolarMass molar_mass() const { return MolarMass::from_value(row().molar_mass); }
    std::span<const AtomRow> atoms() const;
    /// Whether its gas alone is meant or tabulated.
    bool is_gas() const;
    /// Why the tabulated gas takes no part in the search for the stable phase, or empty.
    std::string_view reason_gas_is_apart() const;

    Temperature from() const { return Temperature::kelvin(rungs().front().from); }
    Temperature to() const { return Temperature::kelvin(rungs().back().to); }
    /// The stretches from low to high temperature, one an interval of one phase.
    std::span<const Rung> rungs() const {
        return {detail::rung_data + view_->first_rung, view_->rung_count};
    }
    /// Every phase tabulated for the formula, whatever the state.
    std::span<const PhaseRow> phases() const;

    /// Where on the rungs a temperature lies. Refuses what lies outside them or in a gap (#NUM!).
    std::size_t rung_at(Temperature) const;
    Phase phase_at(Temperature) const;

    /// Molar functions of the phase stable at the temperature.
    MolarHeatCapacity heat_capacity(Temperature) const;
    MolarEnergy enthalpy(Temperature) const;
    MolarEntropy entropy(Temperature) const;
    MolarEnergy gibbs(Temperature) const;
    /// Whether in the open, at 1 bar, it is a gas at this temperature, whatever state is asked for.
    bool is_gas_in_the_open(Temperature) const;
    /// Published standard uncertainty of the absolute entropy at 298.15 K that the one at the
    /// temperature is counted from: of the gas for a gas, of the crystal or liquid stable at
    /// 298.15 K for condensed phases; 0 where none is known.
    MolarEntropy entropy_uncertainty(Temperature) const;

    friend bool operator==(Substance a, Substance b) { return a.view_ == b.view_; }

private:
    SubstanceRow const& row() const { return substance_rows()[view_->substance]; }

    View const* view_;
};

inline Interval const& interval_of(Rung const& rung) {
    return detail::interval_data[rung.interval];
}
inline Phase phase_of(Rung const& rung) { return Phase(detail::phase_data[rung.phase]); }
/// The temperature as it enters an equation of the rung: an end missed by rounding is the end.
inline double inside(Rung const& rung, Temperature t) {
    return std::clamp(absolute(t).value(), rung.from, rung.to);
}

/// The substance a text names: formula or common name, with a state or without: `Fe`, `iron`,
/// `H2O(g)`, `Fe(cr, γ)`, `SiO2(quartz)`. Names are read in any case, formulas as written, but for
/// a second capital that AutoCorrect lowered, which is remarked.
/// Refuses (#VALUE!) unknown texts with the nearest known ones, formulas of several isomers, a
/// substance condensed at 298.15 K of which only the gas is tabulated and not asked for, `steam`.
/// Bounds: 200 characters. The search halves the sorted tables, 9 comparisons.
Substance find_substance(std::string_view text, Notes const& notes = silent);

/// The same where only a gas can be meant: a text without a state is read with `(g)`.
Substance find_gas(std::string_view text, Notes const& notes = silent);

} // namespace core::substances
