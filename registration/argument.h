// SPDX-License-Identifier: MPL-2.0
#pragma once

// How the parameter and return types of the core's functions look from a worksheet. One
// specialisation a kind of type; nothing else in the project knows what a type needs.
//
//     argument<T>::need            what the type asks of an argument
//     argument<T>::Rows            (Given, index) -> [row] -> T, with the conditions that stand in
//     T argument<T>::check(Given)    conditions on the stated values as a whole, called once a call
//     outcome_of<R>                what the office gets

#include "core/column.h"
#include "core/conditions.h"
#include "core/quantities.h"
#include "core/temperature.h"
#include "registration/need.h"
#include "registration/results.h"

#include <optional>
#include <string>
#include <string_view>
#include <type_traits>

namespace registration {

/// Throws the failure of a condition that stands in a parameter's type.
[[noreturn]] void refuse_condition(int argument, Given const&, std::size_t row,
                                   const char* condition);

template<class T>
struct argument;

struct Unchecked {
    static void check(Given const&) {}
};

/// The rows of a numeric argument; a single value repeats.
class NumberRows {
public:
    NumberRows(Given const& given, int index)
        : si_(given.si()), stride_(given.numbers().listed ? 1 : 0), given_(&given), index_(index) {}

protected:
    double number(std::size_t row) const { return si_[row * stride_]; }
    [[noreturn]] void refuse(std::size_t row, const char* condition) const {
        refuse_condition(index_, *given_, row * stride_, condition);
    }

private:
    const double* si_;
    std::size_t stride_;
    Given const* given_;
    int index_;
};

template<class Unit>
struct argument<boost::units::quantity<Unit>> : Unchecked {
    using Q = boost::units::quantity<Unit>;
    static constexpr Need need{.dimension = core::dimension<Q>,
                               .reading = std::is_same_v<Q, core::TemperatureDifference>
                                              ? Reading::difference
                                              : Reading::plain};
    struct Rows : NumberRows {
        using NumberRows::NumberRows;
        Q operator[](std::size_t row) const { return Q::from_value(number(row)); }
    };
};

template<>
struct argument<double> : Unchecked {
    static constexpr Need need{};
    struct Rows : NumberRows {
        using NumberRows::NumberRows;
        double operator[](std::size_t row) const { return number(row); }
    };
};

template<>
struct argument<core::Temperature> : Unchecked {
    static constexpr Need need{.dimension = core::Dimension::of_temperature,
                               .reading = Reading::point,
                               .condition = "above 0 K"};
    struct Rows : NumberRows {
        using NumberRows::NumberRows;
        core::Temperature operator[](std::size_t row) const {
            const double kelvin = number(row);
            if (!(kelvin > 0)) refuse(row, need.condition);
            return core::Temperature::kelvin(kelvin);
        }
    };
};

/// A number on which a condition stands: T wraps a Number that the Condition holds for.
template<class T, class Number, class Condition>
struct conditioned : Unchecked {
    static constexpr Need need = [] {
        Need n = argument<Number>::need;
        n.condition = Condition::words;
        return n;
    }();
    struct Rows : NumberRows {
        using NumberRows::NumberRows;
        T operator[](std::size_t row) const {
            const double value = number(row);
            if (!Condition::holds(value)) refuse(row, Condition::words);
            if constexpr (std::is_same_v<Number, double>)
                return {value};
            else
                return {Number::from_value(value)};
        }
    };
};

struct AboveZero {
    static constexpr const char* words = "above 0";
    static bool holds(double value) { return value > 0; }
};
struct ZeroOrMore {
    static constexpr const char* words = "of 0 or more";
    static bool holds(double value) { return value >= 0; }
};
struct FromZeroToOne {
    static constexpr const char* words = "from 0 to 1";
    static bool holds(double value) { return value >= 0 && value <= 1; }
};
struct AboveZeroUpToOne {
    static constexpr const char* words = "above 0 and up to 1";
    static bool holds(double value) { return value > 0 && value <= 1; }
};

template<class Q>
struct argument<core::Positive<Q>> : conditioned<core::Positive<Q>, Q, AboveZero> {};
template<class Q>
struct argument<core::NonNegative<Q>> : conditioned<core::NonNegative<Q>, Q, ZeroOrMore> {};
template<>
struct argument<core::Fraction> : conditioned<core::Fraction, double, FromZeroToOne> {};
template<>
struct argument<core::Efficiency> : conditioned<core::Efficiency, double, AboveZeroUpToOne> {};

template<>
struct argument<core::GaugePressure> : Unchecked {
    static constexpr Need need{.dimension = core::dimension<core::Pressure>,
                               .reading = Reading::gauge};
    struct Rows : NumberRows {
        using NumberRows::NumberRows;
        core::GaugePressure operator[](std::size_t row) const {
            return {core::Pressure::from_value(number(row))};
        }
    };
};

/// What may be left out. Present, it is what it wraps.
template<class T>
struct argument<std::optional<T>> {
    static constexpr Need need = [] {
        Need n = argument<T>::need;
        n.optional = true;
        return n;
    }();
    static void check(Given const& given) {
        if (!given.missing()) argument<T>::check(given);
    }
    class Rows {
    public:
        Rows(Given const& given, int index) {
            if (!given.missing()) rows_.emplace(given, index);
        }
        std::optional<T> operator[](std::size_t row) const {
            if (!rows_) return std::nullopt;
            return (*rows_)[row];
        }

    private:
        std::optional<typename argument<T>::Rows> rows_;
    };
};

template<class T>
struct ElementOf {
    using type = T;
};
template<class Q>
struct ElementOf<core::Uncertain<Q>> {
    using type = Q;
};

/// Every row at once. The conditions of the element's type hold for each of them.
template<class T>
struct argument<core::Column<T>> : Unchecked {
    using Element = typename ElementOf<T>::type;
    static constexpr Need need = [] {
        Need n = argument<Element>::need;
        n.whole = true;
        return n;
    }();
    class Rows {
    public:
        Rows(Given const& given, int index) : given_(&given), index_(index) {}
        core::Column<T> operator[](std::size_t) const {
            const typename argument<Element>::Rows rows(*given_, index_);
            const std::size_t count = given_->numbers().count();
            for (std::size_t row = 0; row < count; ++row) static_cast<void>(rows[row]);
            if constexpr (std::is_same_v<T, Element>)
                return {given_->si(), count};
            else
                return {given_->si(), given_->u(), count};
        }

    private:
        Given const* given_;
        int index_;
    };
};

/// A quantity of whatever dimension; the result takes after it.
struct AnyQuantity {
    double si;
};
template<>
struct argument<AnyQuantity> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::any_quantity};
    struct Rows : NumberRows {
        using NumberRows::NumberRows;
        AnyQuantity operator[](std::size_t row) const { return {number(row)}; }
    };
};

/// Stands where an argument is left out that other forms of a function take.
struct LeftOut {};
template<>
struct argument<LeftOut> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::left_out, .optional = true};
    struct Rows {
        Rows(Given const&, int) {}
        LeftOut operator[](std::size_t) const { return {}; }
    };
};

/// A substance named only for what a mole of it weighs. Functions do not look at it: it serves the
/// amount and the unit of the result (evaluation.h).
struct NamedSubstance {};
template<>
struct argument<NamedSubstance> {
    static constexpr Need need{.kind = Need::Kind::named,
                               .dimension = core::dimension<core::MolarMass>};
    struct Rows {
        Rows(Given const&, int) {}
        NamedSubstance operator[](std::size_t) const { return {}; }
    };
    /// A single substance must be known even where nothing asks for its molar mass; the rows of a
    /// column are looked at one by one (evaluation.cpp).
    static void check(Given const&);
};

template<>
struct argument<core::Table> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::table, .whole = true};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        core::Table operator[](std::size_t) const { return given_->table(); }
        Given const* given_;
    };
};

/// One text a row.
template<>
struct argument<std::string_view> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::text};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        std::string_view operator[](std::size_t row) const { return given_->cell(row).text; }
        Given const* given_;
    };
};

/// All texts at once.
template<>
struct argument<core::Formulas> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::text, .whole = true};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        core::Formulas operator[](std::size_t) const { return given_->texts(); }
        Given const* given_;
    };
};

/// A cell as it stands, for the functions that put quantities together.
template<>
struct argument<Cell> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::cell};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        Cell operator[](std::size_t row) const { return given_->cell(row); }
        Given const* given_;
    };
};

template<class R>
inline constexpr Outcome outcome_of{};
template<class Unit>
inline constexpr Outcome outcome_of<boost::units::quantity<Unit>>{
    .dimension = core::dimension<boost::units::quantity<Unit>>};
template<>
inline constexpr Outcome outcome_of<core::TemperatureDifference>{
    .dimension = core::Dimension::of_temperature, .reading = Reading::difference};
template<>
inline constexpr Outcome outcome_of<core::Temperature>{.dimension = core::Dimension::of_temperature,
                                                       .reading = Reading::point};
template<>
inline constexpr Outcome outcome_of<AnyQuantity>{.follows_first = true};
template<>
inline constexpr Outcome outcome_of<std::string>{.kind = Outcome::Kind::text};
template<>
inline constexpr Outcome outcome_of<Array>{.kind = Outcome::Kind::array};
template<>
inline constexpr Outcome outcome_of<std::vector<double>>{.column = true};

template<class Unit>
void put(Results& results, std::size_t row, boost::units::quantity<Unit> value) {
    results.put(row, value.value());
}
inline void put(Results& results, std::size_t row, core::Temperature value) {
    results.put(row, absolute(value).value());
}
inline void put(Results& results, std::size_t row, AnyQuantity value) {
    results.put(row, value.si);
}
inline void put(Results& results, std::size_t row, double value) { results.put(row, value); }
inline void put(Results& results, std::size_t row, std::string value) {
    results.put(row, std::move(value));
}
inline void put(Results& results, std::size_t, Array array) { results.put(std::move(array)); }
inline void put(Results& results, std::size_t, std::vector<double> const& values) {
    results.put_all(values);
}

} // namespace registration
