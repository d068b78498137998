// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/typed.h"

#include <array>
#include <cstddef>
#include <span>
#include <string_view>

namespace registration {

/// Overloads that share a formula, a source and a range of validity.
struct Form {
    const char* formula = nullptr; ///< `ΔS = ΔH / T`, in the symbols of the arguments
    std::span<const Overload> overloads{};
    const char* source = "";
    const char* valid = "";
};

template<auto... F>
struct overloads_of {
    static constexpr std::array<Overload, sizeof...(F)> value{typed<F>::overload...};
};

template<auto... F>
consteval Form form(const char* formula, const char* source = "", const char* valid = "") {
    return {formula, overloads_of<F...>::value, source, valid};
}

struct Argument {
    enum class Role : std::uint8_t {
        input,  ///< goes to the core's function
        amount, ///< multiplies the result
        show,   ///< chooses what the cell gets
    };

    const char* name = nullptr;
    const char* symbol = "";
    const char* says = "";    ///< for the wizard, a phrase: "enthalpy of fusion"
    const char* example = ""; ///< as it would stand in a cell
    const char* beside = "";  ///< the whole-column argument it is read row by row with
    Role role = Role::input;
};

inline constexpr Argument amount{
    .name = "amount",
    .symbol = "n",
    .says = "amount of the substance; left out, the result stays molar or specific",
    .example = "2.5 kg",
    .role = Argument::Role::amount};
inline constexpr Argument show{.name = "show",
                               .says = "unit or view of the result: a unit or heading, quantity, "
                                       "text, uncertainty, steps, source, why",
                               .example = "kJ/K",
                               .role = Argument::Role::show};

/// A documented call and what it gives: run by the tests in C++ and in the office.
struct Example {
    const char* formula = nullptr; ///< as in a cell, with `;` between arguments
    double number = 0;
    const char* text = nullptr; ///< where the result is a text
};

/// Everything that is said about one function, once. `describe` refuses at compile time what does
/// not fit together.
struct Entry {
    static constexpr std::size_t most_arguments = 8;

    const char* name = nullptr;
    const char* says = "";
    std::array<Argument, most_arguments> arguments{};
    std::array<Form, 6> forms{};
    std::array<Example, 4> examples{};

    constexpr std::size_t argument_count() const {
        std::size_t count = 0;
        while (count < most_arguments && arguments[count].name) ++count;
        return count;
    }
    constexpr std::size_t form_count() const {
        std::size_t count = 0;
        while (count < forms.size() && forms[count].formula) ++count;
        return count;
    }
    constexpr std::span<const Form> all_forms() const { return {forms.data(), form_count()}; }

    /// Where the argument of a role stands, or argument_count().
    constexpr std::size_t position(Argument::Role role) const {
        std::size_t at = 0;
        while (at < argument_count() && arguments[at].role != role) ++at;
        return at;
    }
    /// Where the core function's parameter stands in the call.
    constexpr std::size_t position_of_input(std::size_t parameter) const {
        std::size_t at = 0;
        for (;; ++at)
            if (arguments[at].role == Argument::Role::input && parameter-- == 0) return at;
    }
    constexpr std::size_t input_count() const {
        std::size_t count = 0;
        for (std::size_t at = 0; at < argument_count(); ++at)
            count += arguments[at].role == Argument::Role::input;
        return count;
    }
    /// The input that input `parameter` is read row by row with, or input_count().
    constexpr std::size_t beside(std::size_t parameter) const {
        const std::string_view name = arguments[position_of_input(parameter)].beside;
        for (std::size_t other = 0; other < input_count(); ++other)
            if (!name.empty() && name == arguments[position_of_input(other)].name) return other;
        return input_count();
    }
};

namespace detail {

constexpr bool same_needs(Overload const& a, Overload const& b) {
    if (a.needs.size() != b.needs.size()) return false;
    for (std::size_t i = 0; i < a.needs.size(); ++i)
        if (!same(a.needs[i], b.needs[i])) return false;
    return true;
}

} // namespace detail

/// Lets an entry pass, or does not compile: more parameters than described arguments, two overloads
/// that take the same arguments, an argument nobody reads, `beside` naming nothing.
consteval Entry describe(Entry entry) {
    const std::size_t inputs = entry.input_count();
    std::size_t most = 0;
    for (std::size_t f = 0; f < entry.form_count(); ++f)
        for (std::size_t o = 0; o < entry.forms[f].overloads.size(); ++o) {
            Overload const& overload = entry.forms[f].overloads[o];
            if (overload.needs.size() > inputs) throw "more parameters than described arguments";
            if (overload.needs.size() > most) most = overload.needs.size();
            for (std::size_t f2 = 0; f2 <= f; ++f2)
                for (std::size_t o2 = 0; o2 < (f2 == f ? o : entry.forms[f2].overloads.size());
                     ++o2)
                    if (detail::same_needs(overload, entry.forms[f2].overloads[o2]))
                        throw "two overloads take the same arguments";
        }
    if (most != inputs) throw "an argument that no overload reads";
    for (std::size_t i = 0; i < inputs; ++i)
        if (entry.arguments[entry.position_of_input(i)].beside[0] && entry.beside(i) == inputs)
            throw "beside names no argument";
    return entry;
}

} // namespace registration
