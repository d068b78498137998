// SPDX-License-Identifier: MPL-2.0
#include "core/balance/available_work.h"

#include "core/failure.h"
#include "core/written.h"

namespace core::balance {

namespace {

[[noreturn]] void refuse_reservoirs(Temperature hot, Temperature cold, char const* needed) {
    refuse_impossible("hot = " + written(hot) + " and cold = " + written(cold), needed,
                      hot < cold ? "exchange the two temperatures"
                                 : "give two temperatures that differ");
}

void check_apart(Temperature hot, Temperature cold) {
    if (!(hot > cold))
        refuse_reservoirs(hot, cold, "a hot reservoir above the cold one, as a coefficient needs");
}

} // namespace

Dimensionless carnot_efficiency(Temperature hot, Temperature cold) {
    if (hot < cold) refuse_reservoirs(hot, cold, "a hot reservoir not below the cold one");
    return (hot - cold) / absolute(hot);
}

Dimensionless carnot_cooling(Temperature hot, Temperature cold) {
    check_apart(hot, cold);
    return absolute(cold) / (hot - cold);
}

Dimensionless carnot_heating(Temperature hot, Temperature cold) {
    check_apart(hot, cold);
    return absolute(hot) / (hot - cold);
}

} // namespace core::balance
