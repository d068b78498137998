// SPDX-License-Identifier: MPL-2.0
#include "core/materials/headed_columns.h"

#include "core/text/characters.h"
#include "core/text/number.h"
#include "core/text/unit.h"
#include "core/written.h"

#include <algorithm>
#include <cmath>
#include <optional>
#include <string>

namespace core::materials {

namespace {

using text::Cursor;
using text::Reading;
using text::Unit;

constexpr std::size_t most_columns = 40;

enum class Role : std::uint8_t {
    temperature,
    heat_capacity,
    from,
    to,
    power,
    transition,
    spread,
    phase,
    molar_mass,
};

/// A column with what its heading says.
struct Known {
    HeadedColumn const* column;
    Role role;
    std::optional<Unit> unit = {};
    double exponent = 0;

    std::string heading() const { return text::shown(column->heading); }
    double si(std::size_t row) const { return unit->to_si(column->numbers[row]); }
};

std::string_view without_blanks(std::string_view text) {
    while (!text.empty() && text.front() == ' ') text.remove_prefix(1);
    while (!text.empty() && text.back() == ' ') text.remove_suffix(1);
    return text;
}

/// `-2` of `⁻²`.
double read_superscript(Cursor& at) {
    const bool negative = *at == text::superscript_minus;
    if (negative || *at == text::superscript_plus) at.advance();
    double number = 0;
    for (; text::is_superscript(*at) && *at < text::superscript_plus && number < 1000; at.advance())
        number = number * 10 + (*at - text::superscript_zero);
    return negative ? -number : number;
}

/// `-0.5` of `^-0.5` or `^(-0.5)`.
double read_exponent(Cursor& at) {
    at.advance();
    const bool bracket = at.take(U'(');
    if (!text::starts_number(at))
        refuse_unfit(text::shown(at.whole()), "a number behind `T^`", "write `T^0`, `T^-2` ...");
    const double number = text::nearest_double(text::read_number(at).value);
    if (bracket && !at.take(U')'))
        refuse_unfit(text::shown(at.whole()), "a closing parenthesis behind the exponent",
                     "write `T^-0.5`");
    return number;
}

/// `T^-0.5`, `T⁻²`, with a unit behind it or not; nothing where the heading is no power.
std::optional<Known> as_power(HeadedColumn const& column) {
    Cursor at(without_blanks(column.heading));
    if (!at.take(U'T') || (*at != U'^' && !text::is_superscript(*at))) return {};
    Known known{&column, Role::power};
    known.exponent = *at == U'^' ? read_exponent(at) : read_superscript(at);
    const std::string_view rest = at.rest();
    if (!without_blanks(rest).empty())
        known.unit = text::read_heading("power" + std::string(rest)).unit;
    return known;
}

[[noreturn]] void refuse_heading(HeadedColumn const& column) {
    refuse_unfit(text::shown(column.heading),
                 "headings of a measured table, `T / °C` and `cp / (J/(kg·K))`, or of a "
                 "correlation, `from / K`, `to / K`, `T^0 / (J/(mol·K))`, `T^1` ..., `transition / "
                 "(kJ/mol)`, `spread / (kJ/mol)`, `phase`",
                 "correct the heading, or leave the column out");
}

std::optional<Basis> basis_of_heat_capacity(Dimension d) {
    if (d == dimension<MolarHeatCapacity>) return Basis::molar;
    if (d == dimension<SpecificHeatCapacity>) return Basis::specific;
    if (d == dimension<HeatCapacity>) return Basis::total;
    return {};
}

Dimension dimension_of_energy(Basis basis) {
    switch (basis) {
    case Basis::molar:
        return dimension<MolarEnergy>;
    case Basis::specific:
        return dimension<SpecificEnergy>;
    case Basis::total:
        break;
    }
    return dimension<Energy>;
}

struct Label {
    std::string_view text;
    Role role;
};
constexpr Label labels[] = {{"from", Role::from},
                            {"to", Role::to},
                            {"transition", Role::transition},
                            {"spread", Role::spread},
                            {"molar mass", Role::molar_mass}};

Known recognised(HeadedColumn const& column, Notes const& notes) {
    if (without_blanks(column.heading) == "phase") return {&column, Role::phase};
    if (auto power = as_power(column)) return *power;
    const text::Heading heading = text::read_heading(column.heading);
    if (!heading.note.empty()) notes.remark([&] { return heading.note; });
    for (Label const& label : labels)
        if (heading.label == label.text) return {&column, label.role, heading.unit};
    const Dimension d = heading.unit.dimension;
    if (d == dimension<TemperatureDifference>) return {&column, Role::temperature, heading.unit};
    if (basis_of_heat_capacity(d)) return {&column, Role::heat_capacity, heading.unit};
    refuse_heading(column);
}

void check_uncertainties(std::span<const HeadedColumn> columns, std::size_t at) {
    HeadedColumn const& u = columns[at];
    if (at == 0 || holds_uncertainties(columns[at - 1]) ||
        columns[at - 1].numbers.size() != u.numbers.size())
        refuse_unfit("a column headed `u`", "numbers of the same rows in the column before it",
                     "set `u` to the right of the numbers it belongs to");
    for (const double number : u.numbers)
        if (number < 0)
            refuse_unfit("u = " + written(number), "standard uncertainties of 0 or more",
                         "give u as a positive number in the unit of its value");
}

/// All columns, each known.
class Columns {
public:
    Columns(std::span<const HeadedColumn> columns, Notes const& notes) {
        if (columns.size() > most_columns)
            refuse_unfit(std::to_string(columns.size()) + " columns",
                         "a material of no more than 40 columns", "select the block anew");
        for (std::size_t at = 0; at < columns.size(); ++at)
            if (holds_uncertainties(columns[at]))
                check_uncertainties(columns, at);
            else
                add(recognised(columns[at], notes));
        for (Known const& known : known_)
            if (known.role != Role::molar_mass) check_length(known);
        find_rows();
    }

    std::vector<Known> const& all() const { return known_; }
    /// The rows that are not blank throughout.
    std::vector<std::size_t> const& rows() const { return rows_; }

    Known const* find(Role role) const {
        const auto found = std::find_if(known_.begin(), known_.end(),
                                        [&](Known const& k) { return k.role == role; });
        return found == known_.end() ? nullptr : &*found;
    }
    Known const& need(Role role, const char* heading) const {
        if (Known const* found = find(role)) return *found;
        refuse_unfit("no column headed " + std::string(heading),
                     "a measured table, `T / °C` and `cp / (J/(kg·K))`, or a correlation, `from / "
                     "K`, `to / K`, `T^0 / (J/(mol·K))` ...",
                     "add the column");
    }

private:
    void add(Known known) {
        for (Known const& other : known_)
            if (other.role == known.role &&
                (known.role != Role::power || other.exponent == known.exponent))
                refuse_unfit(known.heading(), "every column of a material once",
                             "leave one of them out");
        known_.push_back(known);
    }

    static std::size_t length(Known const& known) {
        return known.role == Role::phase ? known.column->words.size()
                                         : known.column->numbers.size();
    }

    void check_length(Known const& known) {
        if (known.role == Role::phase ? !known.column->numbers.empty()
                                      : !known.column->words.empty())
            refuse_unfit(known.heading(), "texts under `phase` and numbers under all else",
                         "check the column");
        if (length(known) != count())
            refuse_unfit(known.heading() + " with " + std::to_string(length(known)) + " rows",
                         "columns of one length, here " + std::to_string(count()),
                         "select whole rows");
    }

    std::size_t count() const {
        for (Known const& known : known_)
            if (known.role != Role::molar_mass) return length(known);
        return 0;
    }

    void find_rows() {
        for (std::size_t row = 0; row < count(); ++row)
            if (std::any_of(known_.begin(), known_.end(), [&](Known const& known) {
                    if (known.role == Role::molar_mass) return false;
                    return known.role == Role::phase ? !known.column->words[row].empty()
                                                     : !std::isnan(known.column->numbers[row]);
                }))
                rows_.push_back(row);
    }

    std::vector<Known> known_;
    std::vector<std::size_t> rows_;
};

void require_dimension(Known const& known, Dimension needed) {
    if (known.unit->dimension != needed)
        refuse_unfit(known.heading(),
                     text::name_of(needed) + " under `" +
                         text::shown(known.column->heading.substr(0, 10)) + "`",
                     "correct the unit");
}

void require_temperature(Known const& known) {
    require_dimension(known, dimension<TemperatureDifference>);
    if (known.unit->reading == Reading::difference)
        refuse_unfit(known.heading(), "temperatures, not differences",
                     "write the unit as `°C`, `°F` or `K`");
}

std::vector<double> values(Columns const& columns, Known const& known) {
    std::vector<double> all;
    for (const std::size_t row : columns.rows()) all.push_back(known.si(row));
    return all;
}

/// A heading that has no place in a measured table.
void refuse_others(Columns const& columns) {
    for (Known const& known : columns.all())
        if (known.role != Role::temperature && known.role != Role::heat_capacity &&
            known.role != Role::molar_mass)
            refuse_unfit(known.heading() + " beside a measured table",
                         "a table with one column of temperatures and one of heat capacities",
                         "leave the column out; two rows at one temperature state a jump");
}

OwnMaterial measured(Columns const& columns) {
    refuse_others(columns);
    Known const& t = columns.need(Role::temperature, "`T / °C`");
    Known const& cp = columns.need(Role::heat_capacity, "`cp / (J/(kg·K))`");
    require_temperature(t);
    return OwnMaterial::measured(*basis_of_heat_capacity(cp.unit->dimension), values(columns, t),
                                 values(columns, cp));
}

/// The basis of a power: of a heat capacity, or of one over the n-th power of kelvin.
std::optional<Basis> basis_of_power(Known const& known) {
    const Dimension d = known.unit->dimension;
    if (const auto basis = basis_of_heat_capacity(d)) return basis;
    const double n = known.exponent;
    if (n != std::round(n) || std::abs(n) > 99) return {};
    return basis_of_heat_capacity(d * power(Dimension::of_temperature, static_cast<int>(n)));
}

/// The columns of a correlation, units filled in and checked.
class Correlation {
public:
    explicit Correlation(Columns const& columns)
        : columns_(columns), from_(columns.need(Role::from, "`from / K`")),
          to_(columns.need(Role::to, "`to / K`")), transition_(columns.find(Role::transition)),
          spread_(columns.find(Role::spread)), phase_(columns.find(Role::phase)) {
        require_temperature(from_);
        require_temperature(to_);
        for (Known const& known : columns.all()) check_role(known);
        fill_in_units();
        for (Known const* latent : {transition_, spread_})
            if (latent != nullptr) require_dimension(*latent, dimension_of_energy(basis_));
    }

    OwnMaterial made() const {
        std::vector<CorrelationRow> rows;
        for (const std::size_t i : columns_.rows()) rows.push_back(row(i));
        return OwnMaterial::correlated(basis_, std::move(rows));
    }

private:
    void check_role(Known const& known) {
        if (known.role == Role::power) powers_.push_back(known);
        if (known.role == Role::temperature || known.role == Role::heat_capacity)
            refuse_heading(*known.column);
    }

    /// A unit per power of kelvin belongs to its own power alone.
    static bool states_heat_capacity(Known const& power) {
        return power.unit && basis_of_heat_capacity(power.unit->dimension);
    }

    void fill_in_units() {
        const auto first = std::find_if(powers_.begin(), powers_.end(), states_heat_capacity);
        if (first == powers_.end())
            refuse_unfit("no power of T in the unit of a heat capacity",
                         "that unit in the heading of the first power",
                         "write `T^0 / (J/(mol·K))`");
        const Unit unit = *first->unit;
        for (Known& power : powers_)
            if (!power.unit) power.unit = unit;
        for (Known const& power : powers_) check_basis(power);
    }

    void check_basis(Known const& power) {
        const auto basis = basis_of_power(power);
        if (!basis)
            refuse_unfit(power.heading(), "the unit of a heat capacity", "write `J/(mol·K)`");
        if (&power == &powers_.front()) basis_ = *basis;
        if (*basis != basis_)
            refuse_unfit(power.heading(), "powers that are all " + described(basis_),
                         "state them in one unit");
    }

    CorrelationRow row(std::size_t i) const {
        CorrelationRow made{from_.si(i), to_.si(i), terms(i), latent(transition_, i),
                            latent(spread_, i)};
        if (phase_ != nullptr) made.phase = without_blanks(phase_->column->words[i]);
        return made;
    }

    static double latent(Known const* column, std::size_t i) {
        if (column == nullptr || std::isnan(column->column->numbers[i])) return 0;
        return column->si(i);
    }

    /// Those that are not zero, or one that is, which then is refused as a heat capacity.
    std::vector<Term> terms(std::size_t i) const {
        std::vector<Term> all;
        for (Known const& power : powers_)
            if (const double a = power.si(i); a != 0) all.push_back({power.exponent, a});
        if (all.empty()) all.push_back({powers_.front().exponent, 0});
        return all;
    }

    Columns const& columns_;
    Known const &from_, &to_;
    Known const *transition_, *spread_, *phase_;
    std::vector<Known> powers_;
    Basis basis_ = Basis::molar;
};

void set_molar_mass(OwnMaterial& material, Columns const& columns) {
    Known const* mass = columns.find(Role::molar_mass);
    if (mass == nullptr) return;
    require_dimension(*mass, dimension<MolarMass>);
    if (mass->column->numbers.size() != 1)
        refuse_unfit(mass->heading(), "one molar mass", "leave the others out");
    material.set_molar_mass(MolarMass::from_value(mass->si(0)));
}

} // namespace

bool holds_uncertainties(HeadedColumn const& column) {
    return without_blanks(column.heading) == "u";
}

OwnMaterial read_columns(std::span<const HeadedColumn> given, Notes const& notes) {
    const Columns columns(given, notes);
    const bool is_correlation =
        std::any_of(columns.all().begin(), columns.all().end(), [](Known const& known) {
            return known.role == Role::from || known.role == Role::to || known.role == Role::power;
        });
    OwnMaterial material = is_correlation ? Correlation(columns).made() : measured(columns);
    set_molar_mass(material, columns);
    return material;
}

} // namespace core::materials
