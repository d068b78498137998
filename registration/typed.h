// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/notes.h"
#include "registration/argument.h"

#include <array>
#include <span>
#include <tuple>
#include <utility>

namespace registration {

/// One way to call a function: what each parameter needs, what comes back, and the loop over rows.
struct Overload {
    std::span<const Need> needs;
    Outcome outcome;
    void (*check)(std::span<const Given>);
    void (*run)(std::span<const Given>, std::size_t first, std::size_t last, Results&,
                core::Notes const&);
};

/// The overload that a core function is. Choosing happens once a call; the loop inside run() knows
/// the types, so that a row costs what the formula costs.
template<auto F, class Signature = decltype(F)>
struct typed;

template<auto F, class R, class... A>
struct typed<F, R (*)(A...) noexcept> : typed<F, R (*)(A...)> {};

template<auto F, class R, class... A>
struct typed<F, R (*)(A...)> {
private:
    using All = std::tuple<A...>;
    static constexpr bool takes_notes = (std::is_same_v<A, core::Notes const&> || ...);
    static constexpr std::size_t count = sizeof...(A) - (takes_notes ? 1 : 0);
    template<std::size_t I>
    using Parameter = std::remove_cvref_t<std::tuple_element_t<I, All>>;

    template<std::size_t... I>
    static constexpr std::array<Need, count> needs(std::index_sequence<I...>) {
        return {argument<Parameter<I>>::need...};
    }

    template<std::size_t I>
    static void check_one(Given const& given) {
        try {
            argument<Parameter<I>>::check(given);
        } catch (core::Failure& failure) {
            failure.argument = static_cast<int>(I);
            throw;
        }
    }
    template<std::size_t... I>
    static void check([[maybe_unused]] std::span<const Given> given, std::index_sequence<I...>) {
        (check_one<I>(given[I]), ...);
    }
    static void check(std::span<const Given> given) {
        check(given, std::make_index_sequence<count>{});
    }

    /// Arguments that are read on the way may have something to remark.
    template<std::size_t I>
    static auto make_rows(Given const& given, [[maybe_unused]] core::Notes const& notes) {
        using Rows = typename argument<Parameter<I>>::Rows;
        if constexpr (std::is_constructible_v<Rows, Given const&, int, core::Notes const&>)
            return Rows(given, static_cast<int>(I), notes);
        else
            return Rows(given, static_cast<int>(I));
    }

    template<std::size_t... I>
    static void run([[maybe_unused]] std::span<const Given> given, std::size_t first,
                    std::size_t last, Results& results, core::Notes const& notes,
                    std::index_sequence<I...>) {
        [[maybe_unused]] const std::tuple<typename argument<Parameter<I>>::Rows...> rows{
            make_rows<I>(given[I], notes)...};
        for (std::size_t row = first; row < last; ++row) {
            try {
                if constexpr (takes_notes)
                    put(results, row, F(std::get<I>(rows)[row]..., notes));
                else
                    put(results, row, F(std::get<I>(rows)[row]...));
            } catch (core::Failure& failure) {
                results.fail(row, std::move(failure));
            }
        }
    }
    static void run([[maybe_unused]] std::span<const Given> given, std::size_t first,
                    std::size_t last, Results& results, core::Notes const& notes) {
        run(given, first, last, results, notes, std::make_index_sequence<count>{});
    }

    static constexpr std::array<Need, count> needs_ = needs(std::make_index_sequence<count>{});

public:
    static constexpr Overload overload{needs_, outcome_of<R>, check, run};
};

} // namespace registration
