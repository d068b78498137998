// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <ostream>

/// Everything that is written from the catalogue at build time.
namespace registration::writers {

/// The interface in UNO's own language.
void write_idl(std::ostream&);
/// Names, descriptions and arguments for the office's function wizard, CalcAddIns.xcu.
void write_calc_addins(std::ostream&);
/// Declarations of the component's methods, one a function.
void write_method_declarations(std::ostream&);
/// Their bodies, which hand over to one function.
void write_method_definitions(std::ostream&);
/// FUNCTIONS.md.
void write_function_list(std::ostream&);
/// A flat sheet of all documented calls: formula, expected, agrees.
void write_example_sheet(std::ostream&);
/// The method ids, one a line.
void write_ids(std::ostream&);

} // namespace registration::writers
