// SPDX-License-Identifier: MPL-2.0
#pragma once

// What make_tables has read and what it will write.

#include "core/substances/table.h"

#include <cstddef>
#include <stdexcept>
#include <string>
#include <vector>

namespace tables {

using namespace core::substances;

struct Phase {
    std::string id, name;
    Aggregation aggregation{};
    std::size_t substance = 0, first_interval = 0, interval_count = 0;
    std::string enthalpy_of_formation, source, note;
    double entropy_u = 0;
};

struct Substance {
    std::string key, formula, name, composition;
    Vapour vapour = Vapour::none;
    std::string reason;
    std::vector<std::size_t> phases;
    std::size_t first_view = 0, view_count = 0;
};

struct NamedView {
    std::string state;
    std::size_t substance, first_rung, rung_count;
};

/// What is written, in the order of writing.
struct Tables {
    std::vector<Interval> intervals;
    std::vector<Phase> phases;
    std::vector<Substance> substances;
    std::vector<NamedView> views;
    std::vector<Rung> rungs;
    std::size_t species_rows = 0, oxide_rows = 0, oxide_rows_beside = 0;
};

[[noreturn]] inline void stop(std::string const& what) { throw std::runtime_error(what); }

} // namespace tables
