// SPDX-License-Identifier: MPL-2.0
#pragma once

// Where heating, cooling and the meeting of bodies end. Heat taken up grows with temperature, in
// steps at transitions, so that every balance has one end: a temperature, or a share of a transition
// at its temperature.

#include "core/notes.h"
#include "core/quantities.h"
#include "core/substances/material.h"
#include "core/substances/substance.h"
#include "core/temperature.h"

#include <span>
#include <string_view>

namespace core::substances {

/// An amount of a material at a temperature; the amount in the unit the material is counted in.
struct Body {
    Material const* material;
    double amount;
    Temperature temperature;
};

/// Where it ends: at a transition, the share of it that is made, else 0.
struct EndState {
    Temperature temperature;
    double share = 0;
};

/// The end of bodies that take up this heat together at 1 bar, at one temperature: in joules, below
/// zero where they give it off. With no heat they come to equilibrium among themselves.
/// Method: the breakpoints are halved; the last stretch is closed in by the bracketing method of
/// Alefeld, Potra and Shi (TOMS 748), 100 steps, to 1e-15 of the temperature.
/// Refuses an end outside the range that all materials share (#NUM!).
EndState end_of_heating(std::span<const Body> bodies, double heat);

/// Where a substance ends that takes up this heat per mole from a temperature.
Temperature temperature_heated(Substance const& substance, Temperature from, MolarEnergy heat,
                               Notes const& notes = silent);

/// The share that is then of a phase: `l`, `g`, `cr` for all crystals, or one of them, `cr, α`.
/// Refuses a phase that the substance has not (#VALUE!).
Dimensionless fraction_of_phase(Substance const& substance, Temperature from, MolarEnergy heat,
                                std::string_view phase, Notes const& notes = silent);

/// The common temperature of bodies that exchange heat with each other alone.
/// Valid: constant pressure of 1 bar, no reaction, no mixing of what they are made of.
Temperature temperature_equalized(std::span<const Body> bodies, Notes const& notes = silent);

/// The entropy generated on the way: Σ n·ΔS, zero only where nothing had to flow.
Entropy entropy_of_equalizing(std::span<const Body> bodies, Notes const& notes = silent);

} // namespace core::substances
