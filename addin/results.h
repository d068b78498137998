// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/call.h"

#include <com/sun/star/uno/Any.hxx>

#include <initializer_list>

namespace addin {

/// What the office is handed back: a number, a text, or a rectangle of them. Errors are numbers.
css::uno::Any to_office(registration::Answer const&);

/// The answer to a call whose arguments could not even be handed over: an error, or its reason where
/// `show` asks for it. The failure's argument is a position in the call.
css::uno::Any refused(registration::Entry const&, std::initializer_list<css::uno::Any const*>,
                      core::Failure);

} // namespace addin
