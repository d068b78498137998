// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/entry.h"

#include <string>
#include <string_view>

/// Sentences about arguments that several writers use, all drawn from the entry and the types of its
/// overloads.
namespace registration::writers {

/// Whether some overload does without the argument.
bool may_be_left_out(Entry const&, std::size_t position);

/// What kinds of values the argument takes: `a molar energy such as `1 J/mol` or …`.
std::string accepted(Entry const&, std::size_t position);

/// The wizard's text of an argument: what it is, whether it is required, an example, and last, since
/// the wizard cuts long texts, what it takes.
std::string wizard_text(Entry const&, std::size_t position);

/// `ENTROPY.FUSION(what; temperature; [amount]; [show])`
std::string call_pattern(Entry const&);

/// An argument's name as UNO's own language allows it, without underscores: `endTemperature`.
std::string parameter_id(std::string_view name);

/// A documented call as a saved sheet holds it: `of:=ENTROPYCELLS.FUNCTIONS.ENTROPYFUSION(…)`.
std::string stored_formula(std::string_view formula);

} // namespace registration::writers
