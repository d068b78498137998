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
inline constexpr Argument constant_cp{
    .name = "gas",
    .symbol = "cp",
    .says = "a gas, a mixture as text or block, a molar heat capacity, or both: `air, cp = 1.005 "
            "kJ/(kg·K)`",
    .example = "29.1 J/(mol·K)"};
inline constexpr const char* stated_cp =
    "ideal gas, cp constant or its mean between the temperatures; molar mass of the tables";
inline constexpr Argument substance{
    .name = "substance",
    .symbol = "substance",
    .says =
        "formula or common name, with or without a state; some functions take own materials too",
    .example = "Fe"};
inline constexpr Argument temperature{
    .name = "temperature", .symbol = "T", .says = "temperature", .example = "600 °C"};
/// The published tables that functions of substances draw on.
inline constexpr const char* report =
    "B. J. McBride, M. J. Zehe, S. Gordon, NASA/TP-2002-211556 (2002), with its gas constant "
    "8.314510 J/(mol·K); "
    "oxides it lacks: R. A. Robie, B. S. Hemingway, USGS Bulletin 2131 (1995)";
inline constexpr const char* table_gas =
    "ideal gas or mixture, in the range of temperature that its components share";
inline constexpr Argument mixed_substances{
    .name = "substances",
    .symbol = "substance",
    .says = "chemical formulas, one beside each amount, needed where amounts are masses",
    .example = "B5:B8",
    .beside = "amounts"};

} // namespace registration::catalogue
