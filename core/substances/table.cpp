// SPDX-License-Identifier: MPL-2.0
#include "core/substances/table.h"

#include <array>

namespace core::substances {

namespace {

#include "substance_tables.inc"

static_assert(count_table.species_rows == 993 && count_table.oxide_rows == 11);

} // namespace

namespace detail {

Interval const* const interval_data = interval_table.data();
PhaseRow const* const phase_data = phase_table.data();
Rung const* const rung_data = rung_table.data();

} // namespace detail

TableCounts table_counts() { return count_table; }
std::span<const Interval> intervals() { return interval_table; }
std::span<const PhaseRow> phase_rows() { return phase_table; }
std::span<const AtomRow> atom_rows() { return atom_table; }
std::span<const SubstanceRow> substance_rows() { return substance_table; }
std::span<const View> views() { return view_table; }
std::span<const Rung> rungs() { return rung_table; }
std::span<const Key> names() { return name_table; }
std::span<const Key> formulas() { return formula_table; }

} // namespace core::substances
