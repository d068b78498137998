// SPDX-License-Identifier: MPL-2.0
#pragma once

// Views of what stands in several cells. They own nothing.

#include "core/conditions.h"
#include "core/quantities.h"
#include "core/temperature.h"

#include <cstddef>
#include <span>
#include <string_view>

namespace core {

/// SI numbers read as one quantity each.
template<class Q>
struct Column {
    const double* si = nullptr;
    std::size_t count = 0;

    std::size_t size() const { return count; }
    Q operator[](std::size_t row) const { return Q::from_value(si[row]); }
};

/// Kelvin numbers; reading one that is not above 0 K refuses.
template<>
struct Column<Temperature> {
    const double* si = nullptr;
    std::size_t count = 0;

    std::size_t size() const { return count; }
    Temperature operator[](std::size_t row) const { return Temperature::kelvin(si[row]); }
};

/// SI numbers, each with its standard uncertainty; no second pointer means that none states one.
template<class Q>
struct Column<Uncertain<Q>> {
    const double* si = nullptr;
    const double* u = nullptr;
    std::size_t count = 0;

    std::size_t size() const { return count; }
    Uncertain<Q> operator[](std::size_t row) const {
        return {Column<Q>{si, count}[row], spread(row)};
    }

private:
    auto spread(std::size_t row) const {
        return decltype(Uncertain<Q>::u)::from_value(u == nullptr ? 0 : u[row]);
    }
};

/// A rectangle of numbers, row by row; NaN stands for a blank cell.
struct Table {
    const double* values = nullptr;
    std::size_t rows = 0, columns = 0;

    double operator()(std::size_t row, std::size_t column) const {
        return values[row * columns + column];
    }
};

/// Chemical formulas as written, one a row.
using Formulas = std::span<const std::string_view>;

} // namespace core
