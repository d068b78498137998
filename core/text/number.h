// SPDX-License-Identifier: MPL-2.0
#pragma once

//   number   = [sign] digits [ dec digits ] [ "(" digits ")" ] [ exponent ] | vulgar fraction
//   exponent = ("e"|"E") [sign] digits | ("×"|"·"|"x"|"*") "10" ( "^" [sign] digits | superscripts
//   )
//
// The locale is never asked. A point is always decimal; a comma is, except where it could as well
// part thousands (`1,234`); groups of three digits are parted by spaces alone (ISO 80000-1, 7.3.1).

#include "core/text/characters.h"
#include "core/text/decimal.h"

namespace core::text {

/// A number with the uncertainty of its concise form, `7.3(2)`.
struct Number {
    Decimal value;
    Decimal spread;
    bool has_spread = false;
};

/// Whether a number begins here.
bool starts_number(Cursor const& at);

/// Reads a number, which must begin here. Throws Failure where the comma is ambiguous.
Number read_number(Cursor& at);

} // namespace core::text
