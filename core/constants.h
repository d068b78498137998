// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/quantities.h"

namespace core {

/// The molar gas constant R = N_A · k.
/// Source: CODATA 2018 and 2022 (identical); exact since the SI of 2019, SI Brochure 9th ed., 2.2:
/// 6.022 140 76e23 /mol · 1.380 649e-23 J/K, all digits.
inline constexpr MolarEntropy gas_constant = MolarEntropy::from_value(8.31446261815324);

} // namespace core
