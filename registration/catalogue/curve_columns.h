// SPDX-License-Identifier: MPL-2.0
#pragma once

// Arrays for charts: columns under headings, in the units that a row of headings asks for.

#include "registration/argument.h"

#include <initializer_list>
#include <optional>
#include <string>
#include <vector>

namespace registration {

/// The headings that a curve's columns are asked for with; SI where there are none.
struct CurveHeadings {
    std::vector<std::string> texts;
    std::vector<Unit> units;
};
template<>
struct argument<CurveHeadings> : Unchecked {
    static constexpr Need need{
        .kind = Need::Kind::cell, .whole = true, .condition = "a row of headings"};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        CurveHeadings operator[](std::size_t) const;
        Given const* given_;
    };
};

namespace catalogue {

/// What a column of a curve holds, in SI units.
struct CurveColumn {
    const char* label; ///< of its heading, `ΔH`
    core::Dimension dimension;
    const char* name; ///< `an enthalpy`
};

/// A curve under way: its heading row, then row by row.
class CurveColumns {
public:
    /// `molar_mass` turns molar columns into specific ones and back; 0 where it is not known.
    /// Refuses another number of headings, and units of other dimensions (#VALUE!).
    CurveColumns(std::vector<CurveColumn> columns, std::optional<CurveHeadings> headings,
                 double molar_mass);

    void add(std::initializer_list<double> values);
    Array made() { return std::move(curve_); }

private:
    CurveHeadings in_si() const;
    double in_column(std::size_t column, double si) const;

    std::vector<CurveColumn> columns_;
    CurveHeadings headings_;
    double molar_mass_;
    Array curve_;
};

/// Refuses what is no whole number from 2 to 10,000 (#NUM!).
std::size_t number_of_points(double points);

} // namespace catalogue
} // namespace registration
