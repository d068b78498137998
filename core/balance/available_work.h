// SPDX-License-Identifier: MPL-2.0
#pragma once

// What the second law leaves of heat as work.
// Notation: T0 temperature of the surroundings; Th, Tc hot and cold reservoir.

#include "core/conditions.h"
#include "core/quantities.h"
#include "core/temperature.h"

namespace core::balance {

/// Exergy of heat: Q · (1 - T0 / T).
/// Source: Carnot's theorem between T and T0.
/// Valid: any sign; negative for heat taken up below T0, where work is needed instead of given.
/// Method: (T - T0) / T, which keeps its digits near T0.
template<class Basis>
On<Energy, Basis> exergy_of_heat(On<Energy, Basis> heat, Temperature temperature,
                                 Temperature surroundings) {
    return heat * ((temperature - surroundings) / absolute(temperature));
}

/// Work lost to entropy generated: T0 · Sgen.
/// Source: Gouy 1889, Stodola 1905.
template<class Basis>
On<Energy, Basis> lost_work(NonNegative<On<Entropy, Basis>> generated, Temperature surroundings) {
    return absolute(surroundings) * generated.value;
}

/// Largest efficiency of an engine between two reservoirs: 1 - Tc / Th.
/// Source: Carnot 1824. Refuses a hot reservoir below the cold one; 0 at equal temperatures.
/// Method: (Th - Tc) / Th, which keeps its digits where the two are near.
Dimensionless carnot_efficiency(Temperature hot, Temperature cold);

/// Largest coefficient of performance of a refrigerator: Tc / (Th - Tc).
/// Source: Carnot 1824. Refuses hot not above cold.
Dimensionless carnot_cooling(Temperature hot, Temperature cold);

/// Largest coefficient of performance of a heat pump: Th / (Th - Tc).
/// Source: Carnot 1824. Refuses hot not above cold.
Dimensionless carnot_heating(Temperature hot, Temperature cold);

} // namespace core::balance
