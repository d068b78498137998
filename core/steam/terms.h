// SPDX-License-Identifier: MPL-2.0
#pragma once

// Sums of n·x^I·y^J with their derivatives, the form of all equations of the formulation. Exponents
// are known when the program is built, so that every sum is written out as multiplications and powers
// that several terms or derivatives need are worked out once.

#include <array>
#include <cstddef>
#include <utility>

namespace core::steam {

/// A row of a table of coefficients, digits as printed.
struct Term {
    int i, j;
    double n;
};

/// The coefficients, arrays of Term named after what they give (tables/make_steam_tables.cpp).
namespace tables {
#include "steam_tables.inc"
}

/// A variable with its inverse, for powers of either sign.
struct Base {
    explicit Base(double x) : value(x), inverse(1 / x) {}
    double value, inverse;
};

template<int n>
double raised(double x) {
    if constexpr (n == 0) {
        return 1;
    } else if constexpr (n == 1) {
        return x;
    } else {
        const double half = raised<n / 2>(x);
        if constexpr (n % 2 == 0)
            return half * half;
        else
            return half * half * x;
    }
}
template<int n>
double raised(Base const& x) {
    if constexpr (n < 0)
        return raised<-n>(x.inverse);
    else
        return raised<n>(x.value);
}

/// A sum and its derivatives.
struct Partials {
    double value = 0, x = 0, y = 0, xx = 0, xy = 0, yy = 0;
};

/// How far derivatives are wanted.
enum class Order { value, first, second };

namespace detail {

template<int i, int j>
double product(double n, Base const& x, Base const& y) {
    return n * raised<i>(x) * raised<j>(y);
}

template<auto const& table, std::size_t k, Order order>
void add_term(Partials& sum, Base const& x, Base const& y) {
    constexpr int i = table[k].i, j = table[k].j;
    constexpr double n = table[k].n;
    sum.value += product<i, j>(n, x, y);
    if constexpr (order != Order::value) {
        if constexpr (i != 0) sum.x += product<i - 1, j>(n * i, x, y);
        if constexpr (j != 0) sum.y += product<i, j - 1>(n * j, x, y);
    }
    if constexpr (order == Order::second) {
        if constexpr (i * (i - 1) != 0) sum.xx += product<i - 2, j>(n * i * (i - 1), x, y);
        if constexpr (i * j != 0) sum.xy += product<i - 1, j - 1>(n * i * j, x, y);
        if constexpr (j * (j - 1) != 0) sum.yy += product<i, j - 2>(n * j * (j - 1), x, y);
    }
}

template<auto const& table, Order order, std::size_t first, std::size_t... k>
Partials sum_of(Base const& x, Base const& y, std::index_sequence<k...>) {
    Partials sum;
    (add_term<table, first + k, order>(sum, x, y), ...);
    return sum;
}

} // namespace detail

/// Σ n·x^I·y^J over the rows of a table from `first` on.
template<auto const& table, Order order, std::size_t first = 0>
Partials sum_of(double x, double y) {
    return detail::sum_of<table, order, first>(Base(x), Base(y),
                                               std::make_index_sequence<table.size() - first>{});
}

} // namespace core::steam
