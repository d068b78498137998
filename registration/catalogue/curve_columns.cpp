// SPDX-License-Identifier: MPL-2.0
#include "registration/catalogue/curve_columns.h"

#include "core/text/quantity.h"

#include <cmath>

namespace registration {

CurveHeadings argument<CurveHeadings>::Rows::operator[](std::size_t) const {
    CurveHeadings headings;
    for (std::size_t at = 0; at < given_->cell_count(); ++at) {
        const std::string_view text = given_->cell(at).text;
        headings.texts.emplace_back(text);
        headings.units.push_back(core::text::read_heading(text).unit);
    }
    return headings;
}

namespace catalogue {
namespace {

/// `J/K`, `(J/mol)` behind a solidus with blanks.
std::string in_heading(std::string const& unit) {
    return unit.find_first_of("/·") == std::string::npos ? unit : "(" + unit + ")";
}

} // namespace

CurveColumns::CurveColumns(std::vector<CurveColumn> columns, std::optional<CurveHeadings> headings,
                           double molar_mass)
    : columns_(std::move(columns)), headings_(headings ? std::move(*headings) : in_si()),
      molar_mass_(molar_mass), curve_(columns_.size()) {
    if (headings_.texts.size() != columns_.size()) {
        std::string labels;
        for (CurveColumn const& column : columns_)
            labels.append(labels.empty() ? "" : ", ").append(column.label);
        core::refuse_unfit(std::to_string(headings_.texts.size()) + " headings",
                           std::to_string(columns_.size()) + " headings: " + labels,
                           "select that many heading cells");
    }
    for (std::string const& text : headings_.texts) curve_.add(text);
}

void CurveColumns::add(std::initializer_list<double> values) {
    std::size_t column = 0;
    for (const double value : values) curve_.add(in_column(column++, value));
}

CurveHeadings CurveColumns::in_si() const {
    CurveHeadings headings;
    for (CurveColumn const& column : columns_) {
        headings.texts.push_back(std::string(column.label) + " / " +
                                 in_heading(core::text::si_unit(column.dimension)));
        headings.units.push_back(core::text::read_heading(headings.texts.back()).unit);
    }
    return headings;
}

double CurveColumns::in_column(std::size_t at, double si) const {
    constexpr core::Dimension molar_mass = core::dimension<core::MolarMass>;
    CurveColumn const& column = columns_[at];
    const Unit& unit = headings_.units[at];
    if (unit.dimension == column.dimension) return unit.from_si(si);
    if (molar_mass_ > 0 && unit.dimension * molar_mass == column.dimension)
        return unit.from_si(si / molar_mass_);
    if (molar_mass_ > 0 && unit.dimension == column.dimension * molar_mass)
        return unit.from_si(si * molar_mass_);
    core::refuse_unfit(
        "the heading of column " + std::to_string(at + 1) + ", `" + headings_.texts[at] + "`",
        std::string(column.name) + ", for example in " + core::text::si_unit(column.dimension),
        "give the headings in the order of the columns");
}

std::size_t number_of_points(double points) {
    if (!(points >= 2 && points <= 10'000 && points == std::floor(points)))
        core::refuse_impossible(
            core::text::write_number(static_cast<long double>(points), 6) + " points",
            "a whole number of points from 2 to 10000", "choose as many points as the chart needs");
    return static_cast<std::size_t>(points);
}

} // namespace catalogue
} // namespace registration
