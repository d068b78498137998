// SPDX-License-Identifier: MPL-2.0
#include "registration/figures.h"

#include "core/substances/reaction.h"
#include "registration/gas_argument.h"

#include <algorithm>

namespace registration {
namespace {

using core::substances::Substance;

/// `Fe, cr, α: NASA/TP-2002-211556, App. D, p. 123 (J 3/78)`, every phase of the state that is meant.
void add(std::vector<std::string>& lines, Substance const& substance) {
    for (auto const& rung : substance.rungs()) {
        const auto phase = core::substances::phase_of(rung);
        std::string line = std::string(substance.formula()) + ", " + std::string(phase.name()) +
                           ": " + std::string(phase.source());
        if (std::ranges::find(lines, line) == lines.end()) lines.push_back(std::move(line));
    }
}

void add(std::vector<std::string>& lines, core::substances::Gas const& gas) {
    for (auto const& component : gas.components()) add(lines, component.substance);
}

void add(std::vector<std::string>& lines, core::real_gas::Fluid const& fluid) {
    for (auto const& part : fluid.parts())
        lines.push_back(std::string(part.critical.name) +
                        ", critical constants: " + std::string(part.critical.reference));
}

std::vector<std::string> read(Need const& need, Given const& given, std::size_t row) {
    std::vector<std::string> lines;
    switch (need.kind) {
    case Need::Kind::substance:
        add(lines, core::substances::find_substance(given.cell(row).text));
        break;
    case Need::Kind::gas:
        add(lines, read_gas_argument(given, row, core::silent));
        break;
    case Need::Kind::equation:
        for (auto const& each : core::substances::read_reaction(given.cell(row).text).participants)
            add(lines, each.substance);
        break;
    case Need::Kind::fluid:
        add(lines, read_fluid_argument(given, row, core::silent));
        break;
    default:
        break;
    }
    return lines;
}

} // namespace

std::vector<std::string> figures_behind(Need const& need, Given const& given, std::size_t row) {
    try {
        return read(need, given, row);
    } catch (core::Failure const&) {
        return {}; // "why" tells the reason
    }
}

} // namespace registration
