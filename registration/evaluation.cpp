// SPDX-License-Identifier: MPL-2.0
#include "registration/evaluation.h"

#include "core/text/quantity.h"
#include "registration/molar_mass.h"
#include "registration/uncertain_places.h"

#include <algorithm>
#include <cmath>

namespace registration {
namespace {

using core::Dimension;
using core::Failure;

constexpr std::size_t most_uncertain_inputs = 1000;
constexpr Dimension molar_mass_dimension = core::dimension<core::MolarMass>;

/// Energy, entropy or volume as such, not per mole and not per kilogram.
bool is_extensive(Dimension d) {
    return (d.mass == 1 && d.amount == 0) || d == core::dimension<core::Volume> ||
           d == core::dimension<core::VolumeFlow>;
}

bool is_amount(Dimension d) {
    return d == core::dimension<core::Mass> || d == core::dimension<core::AmountOfSubstance> ||
           d == core::dimension<core::MassFlow> || d == core::dimension<core::MolarFlow>;
}

/// Whether figures of the tables stand behind an argument.
bool is_of_tables(Need const& need) {
    return need.kind == Need::Kind::substance || need.kind == Need::Kind::gas ||
           need.kind == Need::Kind::equation;
}

std::size_t count_of(Need const& need, Given const& given) {
    if (is_numeric(need, given)) return given.numbers().count();
    return stands_for_all_rows(need, given) ? 1 : given.cell_count();
}

bool across_of(Need const& need, Given const& given) {
    if (is_numeric(need, given)) return given.numbers().across;
    return !stands_for_all_rows(need, given) && given.cells_across();
}

bool is_blank(Need const& need, Given const& given, std::size_t row) {
    if (is_numeric(need, given)) return std::ranges::binary_search(given.numbers().blanks, row);
    return given.cell(row).kind == Cell::Kind::blank;
}

/// Whether no row of a column needs attention; for columns of numbers a look, not a loop.
bool is_clean(Need const& need, Given const& given) {
    if (is_numeric(need, given))
        return given.numbers().faults.empty() && given.numbers().blanks.empty();
    if (need.kind == Need::Kind::named) return false;
    for (std::size_t row = 0; row < given.cell_count(); ++row)
        if (given.cell(row).kind != Cell::Kind::text) return false;
    return true;
}

Block block_of(Entry const& entry, std::span<const Block> blocks, Argument::Role role) {
    const std::size_t at = entry.position(role);
    return at < blocks.size() && at < entry.argument_count() ? blocks[at] : Block{};
}

[[noreturn]] void refuse_lengths(int argument, std::size_t count, std::size_t other) {
    const auto rows = [](std::size_t n) { return std::to_string(n) + (n == 1 ? " row" : " rows"); };
    Failure failure(Failure::Kind::unfit, rows(count), "columns of one length, here " + rows(other),
                    "select the same rows for every column");
    failure.argument = argument;
    throw failure;
}

} // namespace

Arguments::Arguments(Entry const& entry, std::span<const Block> blocks)
    : amount(block_of(entry, blocks, Argument::Role::amount)),
      show(block_of(entry, blocks, Argument::Role::show)) {
    for (std::size_t at = 0; at < entry.argument_count(); ++at)
        if (entry.arguments[at].role == Argument::Role::input)
            inputs.emplace_back(at < blocks.size() ? blocks[at] : Block{});
}

Evaluation::Evaluation(Entry const& entry, Arguments& arguments)
    : entry_(entry), arguments_(arguments), choice_(choose(entry, arguments.given())),
      outcome_(choice_.overload->outcome) {
    align_whole_columns();
    overload().check(arguments_.given());
    measure();
    mark_rows();
    if (outcome_.follows_first) {
        Numbers const& first = arguments_.inputs[0].numbers();
        outcome_.dimension = first.dimension;
        outcome_.reading = first.reading;
        share_ = first.share;
    }
    if (!arguments_.amount.missing()) weigh_amount();
}

/// Blank rows of a whole column are left out, together with the row beside them; a row that is
/// blank in only one of two columns that belong together is refused.
void Evaluation::align_whole_columns() {
    auto& inputs = arguments_.inputs;
    for (std::size_t i = 0; i < overload().needs.size(); ++i) {
        Need const& need = overload().needs[i];
        if (!need.whole || inputs[i].missing()) continue;
        const std::size_t other = entry_.beside(i);
        if (other >= overload().needs.size() || inputs[other].missing()) continue;
        const std::size_t count = count_of(need, inputs[i]);
        const std::size_t other_count = count_of(overload().needs[other], inputs[other]);
        if (count != other_count) refuse_lengths(static_cast<int>(i), count, other_count);
        for (std::size_t row = 0; row < count; ++row) {
            if (is_blank(need, inputs[i], row) ==
                is_blank(overload().needs[other], inputs[other], row))
                continue;
            Failure failure(Failure::Kind::unfit,
                            "row " + std::to_string(row + 1) +
                                " blank in one of two columns that belong together",
                            "both filled or both blank in every row",
                            "fill the row in both columns or clear it in both");
            failure.argument = static_cast<int>(i);
            throw failure;
        }
    }
    for (std::size_t i = 0; i < overload().needs.size(); ++i) {
        Need const& need = overload().needs[i];
        if (!need.whole || inputs[i].missing() || need.kind == Need::Kind::table ||
            need.kind == Need::Kind::material)
            continue;
        if (is_numeric(need, inputs[i]) && !inputs[i].numbers().faults.empty()) {
            RowFault const& fault = inputs[i].numbers().faults.front();
            Failure failure = fault.failure;
            failure.argument = static_cast<int>(i);
            failure.given.append(", row ").append(std::to_string(fault.row + 1));
            throw failure;
        }
        std::vector<std::size_t> blanks;
        const std::size_t count = count_of(need, inputs[i]);
        for (std::size_t row = 0; row < count; ++row)
            if (is_blank(need, inputs[i], row)) blanks.push_back(row);
        if (i == 0) blanks_of_first_ = blanks;
        if (outcome_.column && i == 0) across_ = across_of(need, inputs[i]);
        if (blanks.size() == count) {
            Failure failure(Failure::Kind::unfit, "blank cells only", "at least one value",
                            "fill the column");
            failure.argument = static_cast<int>(i);
            throw failure;
        }
        if (!blanks.empty()) inputs[i].drop(blanks);
    }
}

void Evaluation::measure(Given const& given, std::size_t count, bool across, int position) {
    if (given.missing() || count == 1) return;
    if (rows_ != 1 && count != rows_) refuse_lengths(position, count, rows_);
    if (rows_ != 1 && across != across_) {
        Failure failure(Failure::Kind::unfit, "a row of cells beside columns",
                        "columns only, or rows only, in one call",
                        "lay all of them out the same way");
        failure.argument = position;
        throw failure;
    }
    rows_ = count;
    across_ = across;
}

void Evaluation::measure() {
    for (std::size_t i = 0; i < overload().needs.size(); ++i) {
        Given const& given = arguments_.inputs[i];
        Need const& need = overload().needs[i];
        if (given.missing() || need.whole) continue;
        measure(given, count_of(need, given), across_of(need, given), static_cast<int>(i));
    }
    if (!arguments_.amount.missing()) measure_amount();
}

void Evaluation::measure_amount() {
    Given const& given = arguments_.amount;
    const int position = static_cast<int>(arguments_.inputs.size());
    if (!given.if_numbers()) {
        Failure failure = given.why_not_numbers();
        failure.argument = position;
        throw failure;
    }
    measure(given, given.numbers().count(), given.numbers().across, position);
}

std::vector<Evaluation::Listed> Evaluation::listed_columns() const {
    std::vector<Listed> columns;
    const auto add = [&](Given const& given, Need const& need, std::size_t position) {
        if (!given.missing() && !need.whole && count_of(need, given) > 1)
            columns.push_back({&given, &need, static_cast<int>(position)});
    };
    static constexpr Need amount_need{.kind = Need::Kind::any_quantity};
    for (std::size_t i = 0; i < overload().needs.size(); ++i)
        add(arguments_.inputs[i], overload().needs[i], i);
    add(arguments_.amount, amount_need, arguments_.inputs.size());
    return columns;
}

void Evaluation::spoil(std::size_t row, Failure failure, int position) {
    if (states_[row] == State::bad) return;
    states_[row] = State::bad;
    failure.argument = position;
    faults_.push_back({row, std::move(failure)});
}

/// A text of a column that cannot be used spoils its row alone.
void Evaluation::mark_text(Listed const& column, std::size_t row) {
    Cell const& cell = column.given->cell(row);
    if (cell.kind == Cell::Kind::blank) return;
    try {
        if (cell.kind == Cell::Kind::number)
            core::refuse_unfit("a number", described(*column.need), "write it as text");
        if (column.need->kind == Need::Kind::named)
            static_cast<void>(molar_mass_of(column.need->kind, *column.given, row));
    } catch (Failure& failure) {
        spoil(row, std::move(failure), column.position);
    }
}

/// A row blank in every column is blank; blank in only some, or with a fault, it is bad.
void Evaluation::mark_rows() {
    if (rows_ == 1) return;
    const auto columns = listed_columns();
    if (std::ranges::all_of(columns, [](Listed const& c) { return is_clean(*c.need, *c.given); }))
        return;
    states_.assign(rows_, State::good);
    for (Listed const& column : columns) {
        if (is_numeric(*column.need, *column.given))
            for (RowFault const& fault : column.given->numbers().faults)
                spoil(fault.row, fault.failure, column.position);
        else if (column.need->kind != Need::Kind::cell)
            for (std::size_t row = 0; row < rows_; ++row) mark_text(column, row);
    }
    for (std::size_t row = 0; row < rows_; ++row) {
        const auto blanks = std::ranges::count_if(
            columns, [&](Listed const& c) { return is_blank(*c.need, *c.given, row); });
        if (blanks == std::ssize(columns))
            states_[row] = State::blank;
        else if (blanks > 0)
            spoil(row,
                  Failure(Failure::Kind::unfit,
                          "a row that is blank in some columns and filled in others",
                          "a row filled in every column", "fill the blank cell or clear the row"),
                  -1);
    }
}

bool Evaluation::names_substance() const {
    for (std::size_t i = 0; i < overload().needs.size(); ++i)
        if (!arguments_.inputs[i].missing() &&
            knows_molar_mass(overload().needs[i], arguments_.inputs[i]))
            return true;
    return false;
}

MolarMasses Evaluation::molar_masses() const {
    for (std::size_t i = 0; i < overload().needs.size(); ++i) {
        Need const& need = overload().needs[i];
        Given const& given = arguments_.inputs[i];
        if (given.missing() || !knows_molar_mass(need, given)) continue;
        if (count_of(need, given) > 1) return {0, &given, need.kind};
        try {
            return {molar_mass_of(need.kind, given, 0), nullptr, need.kind};
        } catch (Failure& failure) {
            failure.argument = static_cast<int>(i);
            throw;
        }
    }
    return {};
}

void Evaluation::weigh_amount() {
    Given const& given = arguments_.amount;
    const int position = static_cast<int>(arguments_.inputs.size());
    Numbers const& amount = given.numbers();
    const auto refuse = [&](std::string needed, std::string repair) {
        Failure failure(Failure::Kind::unfit,
                        written(given.block(), 0) + (amount.bare ? " without a unit" : ""),
                        std::move(needed), std::move(repair));
        failure.argument = position;
        throw failure;
    };
    if (!is_amount(amount.dimension) || amount.reading != Reading::plain)
        refuse("an amount: mol, kg, or either per unit of time",
               "give it in a unit such as mol, kmol, kg, mol/s or kg/h");
    if (outcome_.kind == Outcome::Kind::text || is_extensive(outcome_.dimension))
        refuse("no amount, since the other arguments already are of the whole",
               "leave the amount out");
    const Dimension product = outcome_.dimension * amount.dimension;
    if (!is_extensive(product)) {
        if (is_extensive(product / molar_mass_dimension))
            bridge_ = Bridge::over_molar_mass;
        else if (is_extensive(product * molar_mass_dimension))
            bridge_ = Bridge::times_molar_mass;
        const bool known = names_substance();
        if (bridge_ == Bridge::none || !known)
            refuse(outcome_.dimension.amount == -1
                       ? "an amount in mol, since the result is molar"
                       : "an amount in kg, since the result is per kilogram",
                   "give the amount on the basis of the other arguments (MOLAR.MASS converts)");
    }
    outcome_.dimension = bridge_ == Bridge::over_molar_mass    ? product / molar_mass_dimension
                         : bridge_ == Bridge::times_molar_mass ? product * molar_mass_dimension
                                                               : product;
}

/// What a row's result is multiplied by; throws where the amount is below zero.
double Evaluation::amount_factor(std::size_t row, MolarMasses const& masses) const {
    Given const& given = arguments_.amount;
    const std::size_t at = given.numbers().listed ? row : 0;
    const double amount = given.si()[at];
    if (!(amount >= 0)) {
        Failure failure(Failure::Kind::impossible, written(given.block(), at),
                        "an amount of 0 or more",
                        "check the sign, and let the order of the other arguments say which "
                        "way the change goes");
        failure.argument = static_cast<int>(arguments_.inputs.size());
        throw failure;
    }
    switch (bridge_) {
    case Bridge::none:
        break;
    case Bridge::over_molar_mass:
        return amount / masses(row);
    case Bridge::times_molar_mass:
        return amount * masses(row);
    }
    return amount;
}

MolarMasses Evaluation::bridging_masses() const {
    return bridge_ == Bridge::none ? MolarMasses{} : molar_masses();
}

void Evaluation::multiply(Results& results) const {
    const MolarMasses masses = bridging_masses();
    for (std::size_t row = 0; row < results.numbers.size(); ++row) {
        if (results.failed(row) || (!states_.empty() && states_[row] != State::good)) continue;
        try {
            results.put(row, results.numbers[row] * amount_factor(row, masses));
        } catch (Failure& failure) {
            results.fail(row, std::move(failure));
        }
    }
}

Results Evaluation::results(core::Notes const& notes, bool explain) const {
    Results results = results_without_amount(notes, explain);
    if (!arguments_.amount.missing()) multiply(results);
    std::ranges::sort(results.faults, {}, &RowFault::row);
    std::ranges::sort(results.failures_in_texts, {}, &Results::FailedText::row);
    return results;
}

Results Evaluation::results_without_amount(core::Notes const& notes, bool explain) const {
    Results results(outcome_, rows_, explain);
    const auto run = overload().run;
    if (states_.empty()) {
        run(arguments_.given(), 0, rows_, results, notes);
    } else {
        for (std::size_t row = 0; row < rows_;) {
            std::size_t end = row;
            while (end < rows_ && states_[end] == State::good) ++end;
            if (end > row) run(arguments_.given(), row, end, results, notes);
            row = end + 1;
        }
        for (RowFault const& fault : faults_) results.fail(fault.row, fault.failure);
    }
    return results;
}

template<class Move>
void Evaluation::add_variance(Variances& variances, Given& given, Move move) {
    const auto moved = [&](double times) {
        move(given, times);
        Results result = results(core::silent, false);
        given.move_back();
        return result;
    };
    const Results plus = moved(1), minus = moved(-1);
    for (std::size_t row = 0; row < variances.of_rows.size(); ++row) {
        if (variances.nominal.failed(row)) continue;
        const bool up = !plus.failed(row), down = !minus.failed(row);
        const double value = variances.nominal.numbers[row];
        const double half = up && down ? (plus.numbers[row] - minus.numbers[row]) / 2
                            : up       ? plus.numbers[row] - value
                            : down     ? value - minus.numbers[row]
                                       : error_number(Failure::Kind::impossible);
        variances.one_sided = variances.one_sided || up != down;
        double& variance = variances.of_rows[row];
        variance = half == half ? variance + half * half : half;
    }
}

void Evaluation::count_inputs(std::size_t count) {
    if (count > most_uncertain_inputs)
        core::refuse_impossible("more than 1000 inputs with an uncertainty",
                                "at most 1000 of them a result",
                                "balance parts of the plant first");
}

/// Moves a column of numbers: all rows together, or one by one where they are one argument.
void Evaluation::move_numbers(Given& given, bool whole, Variances& variances) {
    if (!given.numbers().uncertain()) return;
    if (!whole) {
        add_variance(variances, given, [](Given& g, double times) { g.move_all(times); });
        return;
    }
    for (std::size_t row = 0; row < given.numbers().u.size(); ++row) {
        if (given.numbers().u[row] == 0) continue;
        count_inputs(++variances.inputs);
        add_variance(variances, given, [row](Given& g, double times) { g.move_one(row, times); });
    }
}

void Evaluation::move_places(Given& given, Need const& need, Variances& variances) {
    for (Place const& place : uncertain_places(need, given)) {
        count_inputs(++variances.inputs);
        add_variance(variances, given, [&](Given& g, double times) { g.move_place(place, times); });
    }
}

/// What published data leave uncertain, told by the relation itself row by row.
void Evaluation::add_uncertainty_of_data(Variances& variances) const {
    if (std::ranges::none_of(overload().needs, [](Need const& need) { return is_of_tables(need); }))
        return;
    const MolarMasses masses = bridging_masses();
    Results scratch(overload().outcome, rows_, false);
    for (std::size_t row = 0; row < variances.of_rows.size() && row < rows_; ++row) {
        if (variances.nominal.failed(row) || (!states_.empty() && states_[row] != State::good))
            continue;
        double variance = 0;
        overload().run(arguments_.given(), row, row + 1, scratch, {nullptr, nullptr, &variance});
        if (variance == 0) continue;
        const double factor = arguments_.amount.missing() ? 1 : amount_factor(row, masses);
        variances.of_rows[row] += variance * factor * factor;
    }
}

std::vector<double> Evaluation::uncertainties(Results const& nominal,
                                              std::vector<std::string>* remarks) {
    Variances variances{nominal, std::vector<double>(nominal.numbers.size(), 0.0)};
    if (outcome_.kind != Outcome::Kind::number) return variances.of_rows;
    for (std::size_t i = 0; i < overload().needs.size(); ++i) {
        Need const& need = overload().needs[i];
        Given& given = arguments_.inputs[i];
        if (given.missing()) continue;
        if (is_numeric(need, given))
            move_numbers(given, need.whole, variances);
        else
            move_places(given, need, variances);
    }
    if (!arguments_.amount.missing()) move_numbers(arguments_.amount, false, variances);
    add_uncertainty_of_data(variances);
    if (variances.one_sided && remarks)
        remarks->push_back("one side of an input's uncertainty is out of range, so the other "
                           "side's difference was taken");
    for (double& v : variances.of_rows) v = v == v ? std::sqrt(v) : v;
    return variances.of_rows;
}

} // namespace registration
