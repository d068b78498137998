// SPDX-License-Identifier: MPL-2.0
#include "core/processes/machine.h"

#include "core/failure.h"
#include "core/written.h"

namespace core::processes {

void check_machine(Temperature t1, Positive<Pressure> p1, Temperature t2, Positive<Pressure> p2) {
    if (p1.value == p2.value)
        refuse_impossible("p1 = p2 = " + written(p1.value),
                          "two different pressures, which tell a compressor from a turbine",
                          "give the pressures before and after the machine");
    const bool compressor = p2.value > p1.value;
    if (compressor ? t2 > t1 : t2 < t1) return;
    refuse_impossible("T1 = " + written(t1) + " and T2 = " + written(t2) +
                          (compressor ? " where the pressure rises" : " where the pressure falls"),
                      compressor ? "an end temperature above the first, as compression heats a gas"
                                 : "an end temperature below the first, as a turbine cools a gas",
                      "check which state is the one before the machine");
}

} // namespace core::processes
