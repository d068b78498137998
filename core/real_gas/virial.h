// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/real_gas/cubic.h"

namespace core::real_gas {

/// The second virial coefficient and its derivative by temperature, m³/mol and m³/(mol·K):
/// B·pc/(R·Tc) = B0 + ω·B1, B0 = 0.083 - 0.422/Tr^1.6, B1 = 0.139 - 0.172/Tr^4.2.
/// Mixtures: ΣΣ x·x·Bij with Tc = √(Tci·Tcj), ω and Zc their means, Vc^(1/3) the mean of the cube roots,
/// pc = Zc·R·Tc/Vc; Zc = 0.291 - 0.080·ω.
/// Source: K. S. Pitzer, R. F. Curl, J. Am. Chem. Soc. 79 (1957) 2369, in the form of M. M. Abbott;
/// combining rules of J. M. Prausnitz; Zc from memory.
struct Virial {
    double b, db_dt;
};
Virial second_virial(Fluid const&, double t);

/// Z = 1 + B·p/(R·T) and what follows. Refuses what is denser than half the critical density (#NUM!).
Departure virial_departure(Fluid const&, double t, double p);

} // namespace core::real_gas
