// SPDX-License-Identifier: MPL-2.0
#pragma once

// The tables of substances as the build writes them from core/substances/tables: read-only arrays,
// in which one row points to rows of the next array by index.

#include "core/substances/equation.h"

#include <cstddef>
#include <cstdint>
#include <span>
#include <string_view>

namespace core::substances {

enum class Aggregation : std::uint8_t { gas, liquid, crystal };

/// A phase of a substance: a run of intervals.
struct PhaseRow {
    std::string_view id;   ///< as in the table, `Fe(a)#2`; for tests and developers
    std::string_view name; ///< as shown to people: `g`, `l`, `cr`, `cr, α`
    Aggregation aggregation;
    std::uint16_t substance;
    std::uint16_t first_interval, interval_count;
    double enthalpy_of_formation; ///< J/mol at 298.15 K, as printed
    double entropy_u;             ///< standard uncertainty of S°(298.15 K), J/(mol·K); 0: unknown
    std::string_view source;      ///< report and page
    std::string_view note;        ///< an oddity of the source, or empty
};

/// How often an element stands in the formula: atomic number, 0 for deuterium.
struct AtomRow {
    std::uint16_t number;
    double count;
};

/// What the tabulated gas of a substance may stand for (tables/vapours.csv).
enum class Vapour : std::uint8_t { none, gas, condensed, boils, apart };

struct SubstanceRow {
    std::string_view formula, name;
    double molar_mass; ///< kg/mol
    Vapour vapour;
    std::string_view vapour_reason;
    std::uint16_t first_phase, phase_count;
    std::uint16_t first_atom, atom_count;
    std::uint16_t first_view, view_count; ///< the first view is the substance without a state
};

/// A stretch of temperature in one interval of one phase. At `from` the phase or interval before
/// gives way to this one; the jumps are what that adds, rounding steps at joints included.
struct Rung {
    double from, to;
    double enthalpy_jump, entropy_jump;     ///< of entering this rung from the one below
    double enthalpy_across, entropy_across; ///< ∫Cp dT and ∫Cp/T dT from `from` to `to`
    std::uint16_t interval, phase;
    bool gap; ///< no data between the rung below and this one
};

/// The rungs from low to high temperature of a substance, whole or limited to a state.
struct View {
    std::string_view state; ///< empty: the stable phase at each temperature and 1 bar
    std::uint16_t substance;
    std::uint16_t first_rung, rung_count;
};

/// A spelling that names a view; several views where the formula has isomers.
struct Key {
    std::string_view spelling;
    std::uint16_t view;
    bool ambiguous;
};

/// Rows read from the tables, and those left aside because species.csv has the substance as well.
struct TableCounts {
    std::size_t species_rows, oxide_rows, oxide_rows_beside;
};

namespace detail {

// Where the arrays begin, so that a row is reached without a call.
extern Interval const* const interval_data;
extern PhaseRow const* const phase_data;
extern Rung const* const rung_data;

} // namespace detail

TableCounts table_counts();
std::span<const Interval> intervals();
std::span<const PhaseRow> phase_rows();
std::span<const AtomRow> atom_rows();
std::span<const SubstanceRow> substance_rows();
std::span<const View> views();
std::span<const Rung> rungs();
/// Names in small letters, sorted by bytes; formulas as written, sorted by bytes.
std::span<const Key> names();
std::span<const Key> formulas();

} // namespace core::substances
