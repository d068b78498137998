// SPDX-License-Identifier: MPL-2.0
#include "registration/gas_argument.h"

#include "core/text/characters.h"
#include "core/text/number.h"
#include "core/text/quantity.h"
#include "core/written.h"

#include <cmath>
#include <optional>

namespace registration {
namespace {

using core::substances::Component;
using core::substances::Gas;

constexpr std::size_t most_components = 50;
constexpr double fractions_tolerance = 1e-6;

bool is_text(Cell const& cell) { return cell.kind == Cell::Kind::text; }

bool is_rest(Cell const& cell) {
    return is_text(cell) && (cell.text == "rest" || cell.text == "Rest"); // AutoCorrect
}

/// `21 mol%`, `(21 ± 1) mol%`; neither a substance nor a unit begins so.
bool begins_with_number(std::string_view text) {
    core::text::Cursor at(text);
    at.take(U'(');
    return core::text::starts_number(at);
}

bool is_name(Cell const& cell) {
    return is_text(cell) && !begins_with_number(cell.text) && !is_rest(cell);
}

/// What stands beside a substance: a number, a quantity, `rest`.
bool is_share(Cell const& cell) {
    return cell.kind == Cell::Kind::number || is_rest(cell) || (is_text(cell) && !is_name(cell));
}

/// The last row of a mixture has a name and a share side by side.
bool is_mixture(Grid const& grid) {
    if (grid.columns() < 2 || grid.columns() > 3 || grid.rows() < 1) return false;
    std::size_t last = grid.rows() - 1;
    while (last > 0 && grid.at(last, 0).kind == Cell::Kind::blank) --last;
    return is_name(grid.at(last, 0)) && is_share(grid.at(last, 1));
}

std::optional<Grid> mixture_in(Given const& given) {
    if (given.missing() || given.block().single()) return std::nullopt;
    for (const bool across : {false, true})
        if (const Grid grid{given.block(), across}; is_mixture(grid)) return grid;
    return std::nullopt;
}

enum class Kind : std::uint8_t { mole_fractions, mass_fractions, moles, masses };

Kind kind_of(Unit const& unit, std::string_view text) {
    if (unit.dimension == core::Dimension{})
        return unit.share == Share::mass ? Kind::mass_fractions : Kind::mole_fractions;
    if (unit.dimension == core::dimension<core::AmountOfSubstance> ||
        unit.dimension == core::dimension<core::MolarFlow>)
        return Kind::moles;
    if (unit.dimension == core::dimension<core::Mass> ||
        unit.dimension == core::dimension<core::MassFlow>)
        return Kind::masses;
    core::refuse_unfit(std::string(text), "fractions or amounts beside the gases of a mixture",
                       "give them in mol%, vol%, wt%, mol, kg, mol/s or kg/h");
}

/// One row of a mixture as it stands.
struct Part {
    core::substances::Substance gas;
    double share = 0; ///< SI
    double u = 0;     ///< SI
    bool rest = false;
};

/// Reads the block: the unit of its heading, or of each row.
class Mixture {
public:
    Mixture(Grid const& grid, core::Notes const& notes) : grid_(grid) {
        std::size_t row = 0;
        if (is_text(grid.at(0, 1)) && !is_share(grid.at(0, 1))) read_headings(row++);
        for (; row < grid.rows(); ++row)
            if (grid.at(row, 0).kind != Cell::Kind::blank ||
                grid.at(row, 1).kind != Cell::Kind::blank)
                read_row(row, notes);
        if (parts_.empty())
            core::refuse_unfit("a block without gases", "gases beside their fractions",
                               "fill the block");
        if (parts_.size() > most_components)
            core::refuse_unfit(std::to_string(parts_.size()) + " gases", "at most 50 of them",
                               "leave the traces out");
    }

    std::vector<Part> const& parts() const { return parts_; }

    void move(std::optional<MovedPlace> const& moved) {
        if (moved) parts_[moved->place.row].share += moved->times * moved->place.u;
        moved_ = moved.has_value();
    }

    Gas made() {
        fill_rest();
        double sum = 0;
        for (Part const& part : parts_) {
            if (!(part.share >= 0))
                core::refuse_impossible(core::written(part.share) + " of " + part.gas.written(),
                                        "fractions and amounts of 0 or more", "check the signs");
            sum += part.share;
        }
        check_sum(sum);
        std::vector<Component> components;
        double moles = 0;
        for (Part const& part : parts_) {
            const double n = is_of_mass() ? part.share / part.gas.molar_mass().value() : part.share;
            components.push_back({part.gas, n});
            moles += n;
        }
        for (Component& each : components) each.fraction /= moles;
        core::substances::check_each_once(components);
        return Gas(std::move(components));
    }

private:
    bool is_of_mass() const { return kind_ == Kind::mass_fractions || kind_ == Kind::masses; }
    bool is_fractions() const {
        return kind_ == Kind::mole_fractions || kind_ == Kind::mass_fractions;
    }

    void read_headings(std::size_t row) {
        Cell const& cell = grid_.at(row, 1);
        if (grid_.columns() == 3 && grid_.at(row, 2).text != "u")
            core::refuse_unfit("a third column headed `" + std::string(grid_.at(row, 2).text) + "`",
                               "standard uncertainties under `u`, or two columns",
                               "select the gases and their fractions or amounts alone");
        unit_ = core::text::read_heading(cell.text).unit;
        kind_ = kind_of(*unit_, cell.text);
    }

    void read_row(std::size_t row, core::Notes const& notes) {
        Cell const& name = grid_.at(row, 0);
        if (!is_text(name))
            core::refuse_unfit("row " + std::to_string(row + 1) + " without a gas",
                               "a gas in every row", "write the gas, or clear the row");
        Part part{core::substances::read_component(name.text, notes)};
        Cell const& share = grid_.at(row, 1);
        if (share.kind == Cell::Kind::blank)
            core::refuse_unfit(std::string(name.text) + " without a fraction or amount",
                               "one beside every gas", "fill the cell in, or clear the row");
        if (is_rest(share))
            part.rest = true;
        else if (share.kind == Cell::Kind::number)
            part.share = unit_ ? unit_->to_si(share.number) : share.number;
        else
            read_quantity(share, part);
        if (grid_.columns() == 3) read_uncertainty(grid_.at(row, 2), part);
        parts_.push_back(part);
    }

    void read_quantity(Cell const& cell, Part& part) {
        const auto read = core::text::read_quantity(cell.text);
        if (unit_) {
            if (!read.bare)
                core::refuse_unfit(std::string(cell.text), "a number in the unit of the heading",
                                   "write the number without a unit");
            part.share = unit_->to_si(read.si);
            part.u = unit_->span_to_si(read.u);
            return;
        }
        const Kind kind = kind_of(read.unit, cell.text);
        for (Part const& other : parts_)
            if (kind != kind_ && !other.rest)
                core::refuse_unfit(std::string(cell.text),
                                   "fractions or amounts of one kind in all rows",
                                   "give all of them in one unit");
        kind_ = kind;
        part.share = read.si;
        part.u = read.u;
    }

    void read_uncertainty(Cell const& cell, Part& part) const {
        const Unit unit = unit_.value_or(Unit{});
        if (is_text(cell))
            part.u = core::text::read_uncertainty(cell.text, part.share, unit);
        else if (cell.kind == Cell::Kind::number)
            part.u = unit.span_to_si(cell.number);
        if (!(part.u >= 0) || (part.u > 0 && part.rest))
            core::refuse_unfit(part.rest ? "u of the rest" : "u below 0",
                               "standard uncertainties of 0 or more; the rest takes up the others'",
                               "correct the column `u`");
    }

    void fill_rest() {
        Part* rest = nullptr;
        double others = 0;
        for (Part& part : parts_) {
            if (part.rest && rest)
                core::refuse_unfit("`rest` twice", "one rest at most", "write the other as number");
            if (part.rest)
                rest = &part;
            else
                others += part.share;
        }
        if (!rest) return;
        if (!is_fractions())
            core::refuse_unfit("`rest` among amounts", "an amount in every row",
                               "write the amount, or give fractions");
        has_rest_ = true;
        if (others > 1 + fractions_tolerance && !moved_)
            core::refuse_unfit("other fractions that sum to " + core::written(others),
                               "a sum of 1 at most beside `rest`",
                               "head percentages with their unit, such as `mol%` or `wt%`");
        rest->share = 1 - others;
    }

    /// A moved fraction moves the sum; the others then take it up together.
    void check_sum(double sum) const {
        if (!(sum > 0))
            core::refuse_impossible("a sum of " + core::written(sum), "a mixture of something",
                                    "check the amounts");
        if (is_fractions() && !has_rest_ && !moved_ && std::abs(sum - 1) > fractions_tolerance)
            core::refuse_unfit(
                "a sum of " + core::written(sum), "fractions that sum to 1 within 1e-6",
                "check the fractions; percentages need a heading such as `mol%`, and one "
                "fraction may be the word `rest`");
    }

    Grid grid_;
    std::optional<Unit> unit_;
    Kind kind_ = Kind::mole_fractions;
    bool has_rest_ = false, moved_ = false;
    std::vector<Part> parts_;
};

std::string_view trimmed(std::string_view text) {
    while (text.starts_with(' ')) text.remove_prefix(1);
    while (text.ends_with(' ')) text.remove_suffix(1);
    return text;
}

/// The parts of `air, cp = 1.005 kJ/(kg·K)`.
struct Split {
    std::string_view gas, symbol, heat_capacity;
};
std::optional<Split> split(std::string_view text) {
    const std::size_t equals = text.find('=');
    if (equals == std::string_view::npos) return std::nullopt;
    const std::size_t comma = text.substr(0, equals).rfind(',');
    if (comma == std::string_view::npos) return std::nullopt;
    return Split{text.substr(0, comma), trimmed(text.substr(comma + 1, equals - comma - 1)),
                 trimmed(text.substr(equals + 1))};
}

} // namespace

bool means_mixture(Given const& given) { return mixture_in(given).has_value(); }

Gas read_gas_argument(Given const& given, std::size_t row, core::Notes const& notes) {
    const auto grid = mixture_in(given);
    if (!grid) return core::substances::read_gas(given.cell(row).text, notes);
    Mixture mixture(*grid, notes);
    mixture.move(given.moved_place());
    return mixture.made();
}

core::real_gas::Fluid read_fluid_argument(Given const& given, std::size_t row,
                                          core::Notes const& notes) {
    if (means_mixture(given)) return core::real_gas::Fluid(read_gas_argument(given, row, notes));
    return core::real_gas::read_fluid(given.cell(row).text);
}

bool means_constant_gas(std::string_view text) { return split(text).has_value(); }

ConstantGas read_constant_gas(Given const& given, std::size_t row, core::Notes const& notes) {
    const std::string_view text = given.cell(row).text;
    const auto parts = split(text);
    if (!parts || parts->symbol != "cp")
        core::refuse_unfit(std::string(text), "a gas with its heat capacity at constant pressure",
                           "write it as `air, cp = 1.005 kJ/(kg·K)`");
    const Gas gas = core::substances::read_gas(parts->gas, notes);
    auto read = core::text::read_quantity(parts->heat_capacity);
    if (auto const& moved = given.moved_place(); moved && moved->place.cell == row)
        read.si += moved->times * moved->place.u;
    if (!read.note.empty()) notes.remark([&] { return read.note; });
    const bool specific = read.unit.dimension == core::dimension<core::SpecificHeatCapacity>;
    if (!specific && read.unit.dimension != core::dimension<core::MolarHeatCapacity>)
        core::refuse_unfit(std::string(parts->heat_capacity),
                           "a molar or specific heat capacity behind `cp =`",
                           "write it as `air, cp = 1.005 kJ/(kg·K)`");
    if (!(read.si > 0))
        core::refuse_impossible(std::string(parts->heat_capacity), "a heat capacity above 0",
                                "check the sign");
    const double molar = specific ? read.si * gas.molar_mass().value() : read.si;
    return {gas, core::MolarHeatCapacity::from_value(molar), read.unit.dimension};
}

std::vector<Place> uncertain_places_of_gas(Given const& given) {
    std::vector<Place> places;
    if (const auto grid = mixture_in(given)) {
        const Mixture mixture(*grid, core::silent);
        for (std::size_t row = 0; row < mixture.parts().size(); ++row)
            if (const double u = mixture.parts()[row].u; u > 0) places.push_back({0, 0, row, u});
        return places;
    }
    for (std::size_t row = 0; row < given.cell_count(); ++row)
        if (const auto parts = split(given.cell(row).text)) {
            const double u = core::text::read_quantity(parts->heat_capacity).u;
            if (u > 0) places.push_back({row, 0, 0, u});
        }
    return places;
}

} // namespace registration
