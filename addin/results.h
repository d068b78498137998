// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/call.h"

#include <com/sun/star/uno/Any.hxx>

namespace addin {

/// What the office is handed back: a number, a text, or a rectangle of them. Errors are numbers.
css::uno::Any to_office(registration::Answer const&);

} // namespace addin
