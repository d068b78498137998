// SPDX-License-Identifier: MPL-2.0
#pragma once

// Reaction equations and what follows from the tables for them, per mole of the equation as written.
// Notation: ν stoichiometric number, below zero for what is used up; ° standard state, 1 bar.
// R: 8.314510 J/(mol K) belongs to the coefficients of the tables, the constant of 2019 stands in
// R·T·ln a and in exp(-ΔG°/(R·T)).

#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/substance.h"
#include "core/temperature.h"

#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace core::substances {

/// A substance of a reaction and its stoichiometric number.
struct Participant {
    Substance substance;
    double number;
};

/// A balanced reaction, its participants in the order written.
struct Reaction {
    std::string text; ///< as written
    std::vector<Participant> participants;

    /// The range of temperature that all participants are tabulated in.
    Temperature from() const;
    Temperature to() const;
};

/// Reads `2 Al + 3/2 O2 -> Al2O3`: arrows `->`, `→`, `=`; coefficients integers, decimals,
/// fractions; substances as find_substance reads them. The grammar stands in reaction_text.cpp.
/// Refuses (#VALUE!) what is not balanced, naming the element and by how much; charges; a substance
/// that stands twice in the same state.
/// Bounds: 1000 characters, 20 substances, coefficients from above 0 to 1e6.
Reaction read_reaction(std::string_view equation, Notes const& notes = silent);

/// Σ ν S°, Σ ν H°, Σ ν G° of the phases stable at the temperature or named by a state.
/// Refuses temperatures outside the common range (#NUM!).
MolarEntropy entropy_of_reaction(Reaction const& reaction, Temperature temperature,
                                 Notes const& notes = silent);
MolarEnergy enthalpy_of_reaction(Reaction const& reaction, Temperature temperature,
                                 Notes const& notes = silent);
MolarEnergy standard_gibbs_of_reaction(Reaction const& reaction, Temperature temperature,
                                       Notes const& notes = silent);

/// What one participant is present at: a pressure for a gas, an activity for a condensed phase,
/// nothing for its standard state.
struct Activity {
    std::optional<Pressure> pressure;
    std::optional<double> number;
};

/// ΔG = ΔG° + R·T·Σ ν ln a with a = p / 1 bar for gases; one activity a participant, in order.
/// Refuses another count of activities, a number for a gas, a pressure for a condensed phase
/// (#VALUE!), activities not above 0 (#NUM!).
MolarEnergy gibbs_of_reaction(Reaction const& reaction, Temperature temperature,
                              std::span<const Activity> activities, Notes const& notes = silent);

/// K = exp(-ΔG° / (R·T)). Refuses what no number can hold (#NUM!), with log10 K in the message.
Dimensionless equilibrium_constant(Reaction const& reaction, Temperature temperature,
                                   Notes const& notes = silent);

/// The temperature at which ΔG° = 0, between `from` and `to` or in the common range.
/// Method: sign changes are looked for on a grid of 10 K or less that has every transition on it;
/// each is closed in by the bracketing method of Alefeld, Potra and Shi (TOMS 748), 100 steps.
/// Refuses no root and several roots, which it names (#NUM!).
Temperature equilibrium_temperature(Reaction const& reaction, std::optional<Temperature> from,
                                    std::optional<Temperature> to, Notes const& notes = silent);

} // namespace core::substances
