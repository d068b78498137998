// SPDX-License-Identifier: MPL-2.0
#pragma once

// Arguments that name substances: read from text, once a column where one text stands for all rows.

#include "core/notes.h"
#include "core/real_gas/fluid.h"
#include "core/substances/gas.h"
#include "core/substances/reaction.h"
#include "core/substances/substance.h"
#include "core/written.h"
#include "registration/argument.h"
#include "registration/gas_argument.h"

#include <optional>

namespace registration {

/// A parameter that `read` makes of a row.
template<class T, auto read, Need::Kind kind_of_need>
struct read_argument : Unchecked {
    static constexpr Need need{.kind = kind_of_need};

    class Rows {
    public:
        Rows(Given const& given, int index, core::Notes const& notes)
            : given_(&given), index_(index) {
            if (stands_for_all_rows(need, given)) only_ = made(0, notes);
        }
        /// Good until the next row: a gas that stands for all of them is not copied for each.
        T const& operator[](std::size_t row) const {
            return only_ ? *only_ : current_.emplace(made(row, core::silent));
        }

    private:
        T made(std::size_t row, core::Notes const& notes) const {
            try {
                return read(*given_, row, notes);
            } catch (core::Failure& failure) {
                failure.argument = index_;
                throw;
            }
        }
        Given const* given_;
        int index_;
        std::optional<T> only_;
        mutable std::optional<T> current_;
    };
};

inline core::substances::Substance substance_in(Given const& given, std::size_t row,
                                                core::Notes const& notes) {
    return core::substances::find_substance(given.cell(row).text, notes);
}
inline core::substances::Reaction reaction_in(Given const& given, std::size_t row,
                                              core::Notes const& notes) {
    return core::substances::read_reaction(given.cell(row).text, notes);
}

template<>
struct argument<core::substances::Substance>
    : read_argument<core::substances::Substance, substance_in, Need::Kind::substance> {};
template<>
struct argument<core::substances::Gas>
    : read_argument<core::substances::Gas, read_gas_argument, Need::Kind::gas> {};
template<>
struct argument<core::real_gas::Fluid>
    : read_argument<core::real_gas::Fluid, read_fluid_argument, Need::Kind::fluid> {};
template<>
struct argument<core::substances::Reaction>
    : read_argument<core::substances::Reaction, reaction_in, Need::Kind::equation> {};
template<>
struct argument<ConstantGas>
    : read_argument<ConstantGas, read_constant_gas, Need::Kind::constant_gas> {};

/// A gas whose constant heat capacity is stated on this basis, which the result then has.
template<class Basis>
struct ConstantGasOn : ConstantGas {};
template<class Basis>
struct argument<ConstantGasOn<Basis>> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::constant_gas,
                               .dimension = core::dimension<core::On<core::HeatCapacity, Basis>>};
    struct Rows : argument<ConstantGas>::Rows {
        using argument<ConstantGas>::Rows::Rows;
        ConstantGasOn<Basis> operator[](std::size_t row) const {
            return {argument<ConstantGas>::Rows::operator[](row)};
        }
    };
};

/// A molar result on the basis the heat capacity is stated on.
template<class Basis, class MolarQuantity>
core::On<core::Times<MolarQuantity, core::AmountOfSubstance>, Basis>
on_basis(ConstantGasOn<Basis> const& gas, MolarQuantity molar) {
    if constexpr (std::is_same_v<Basis, core::Molar>)
        return molar;
    else
        return molar / gas.gas.molar_mass();
}

/// The heat capacity for the relations, told where somebody reads along.
inline core::Positive<core::MolarHeatCapacity> molar_heat_capacity(ConstantGas const& gas,
                                                                   core::Notes const& notes) {
    notes.step([&] {
        return "M = " + core::written(gas.gas.molar_mass()) +
               ", cp = " + core::written(gas.heat_capacity);
    });
    return {gas.heat_capacity};
}

} // namespace registration
