// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/entry.h"

/// Arguments that many functions describe in the same words.
namespace registration::catalogue {

inline constexpr Argument from_temperature{
    .name = "from", .symbol = "T1", .says = "temperature at the start", .example = "20 °C"};
inline constexpr Argument to_temperature{
    .name = "to", .symbol = "T2", .says = "temperature at the end", .example = "350 °C"};
inline constexpr Argument temperature_1{
    .name = "T1", .symbol = "T1", .says = "temperature before", .example = "20 °C"};
inline constexpr Argument pressure_1{
    .name = "p1", .symbol = "p1", .says = "absolute pressure before", .example = "1.013 bar"};
inline constexpr Argument temperature_2{
    .name = "T2", .symbol = "T2", .says = "temperature after", .example = "247 °C"};
inline constexpr Argument pressure_2{
    .name = "p2", .symbol = "p2", .says = "absolute pressure after", .example = "7 bar"};
inline constexpr Argument surroundings{.name = "surroundings",
                                       .symbol = "T0",
                                       .says = "temperature of the surroundings",
                                       .example = "15 °C"};
inline constexpr Argument constant_cp{.name = "gas",
                                      .symbol = "cp",
                                      .says = "molar heat capacity of the gas at constant pressure",
                                      .example = "29.1 J/(mol·K)"};
inline constexpr Argument mixed_substances{
    .name = "substances",
    .symbol = "substance",
    .says = "chemical formulas, one beside each amount, needed where amounts are masses",
    .example = "B5:B8",
    .beside = "amounts"};

} // namespace registration::catalogue
