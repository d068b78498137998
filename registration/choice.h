// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/entry.h"

#include <span>

namespace registration {

/// The overload that the given arguments fit, and the form it belongs to.
struct Choice {
    Form const* form;
    Overload const* overload;
};

/// Chooses by dimension, once a call. Where nothing fits, throws the Failure of the argument that,
/// changed alone, would make one fit.
Choice choose(Entry const&, std::span<const Given> inputs);

} // namespace registration
