// SPDX-License-Identifier: MPL-2.0
#include "registration/prose.h"

#include "core/constants.h"
#include "core/text/quantity.h"
#include "registration/figures.h"
#include "registration/gas_argument.h"
#include "registration/own_material.h"

#include <cctype>

namespace registration {
namespace {

constexpr int digits = 10;
constexpr std::size_t most_rows_listed = 40;

std::string number(double value) {
    return core::text::write_number(static_cast<long double>(value), digits);
}

/// A number with the coherent SI unit of its dimension; within a formula a negative one stands in
/// brackets.
std::string in_si(double value, core::Dimension dimension) {
    if (dimension == core::Dimension{}) return number(value);
    return number(value) + " " + core::text::si_unit(dimension);
}

struct Symbol {
    std::string_view name;
    std::string value; ///< as it stands in the substituted formula
};

bool is_word(char c) {
    return std::isalnum(static_cast<unsigned char>(c)) || (c & '\x80') || c == '_';
}

/// Puts the values in the place of the symbols; `ln`, `exp` and what has no value stay. The signs
/// `·`, `−` and `Σ` are no letters although they lie outside ASCII.
std::string substituted(std::string_view formula, std::vector<Symbol> const& symbols) {
    std::string text;
    for (std::size_t at = 0; at < formula.size();) {
        if (formula.substr(at).starts_with("·") || formula.substr(at).starts_with("Σ")) {
            text += formula.substr(at, 2);
            at += 2;
            continue;
        }
        std::size_t end = at;
        while (end < formula.size() && is_word(formula[end]) &&
               !formula.substr(end).starts_with("·"))
            ++end;
        if (end == at) {
            text += formula[at++];
            continue;
        }
        const std::string_view word = formula.substr(at, end - at);
        std::string_view put = word;
        for (Symbol const& symbol : symbols)
            if (symbol.name == word) put = symbol.value;
        text += put;
        at = end;
    }
    return text;
}

struct Input {
    Given const* given;
    Need const* need;
    Argument const* argument;
};

std::vector<Input> stated_inputs(Evaluation const& evaluation) {
    std::vector<Input> inputs;
    Entry const& entry = evaluation.entry();
    auto const& given = evaluation.arguments().inputs;
    for (std::size_t i = 0; i < evaluation.overload().needs.size(); ++i)
        if (!given[i].missing())
            inputs.push_back({&given[i], &evaluation.overload().needs[i],
                              &entry.arguments[entry.position_of_input(i)]});
    return inputs;
}

bool is_numeric(Input const& input) {
    return input.need->kind != Need::Kind::named && is_numeric(*input.need, *input.given);
}

/// `18.7 kJ/mol = 18700 J/mol, u = 200 J/mol`
std::string as_read(Given const& given, std::size_t row) {
    Numbers const& numbers = given.numbers();
    const std::size_t at = numbers.listed ? row : 0;
    std::string text = written(given.block(), at);
    const std::string si = in_si(numbers.si[at], numbers.dimension);
    if (si != text) text += " = " + si;
    if (numbers.uncertain() && numbers.u[at] > 0)
        text += ", u = " + in_si(numbers.u[at], numbers.dimension);
    return text;
}

std::string cell_text(Cell const& cell) {
    if (cell.kind == Cell::Kind::text) return std::string(cell.text);
    return cell.kind == Cell::Kind::number ? number(cell.number) : std::string("blank");
}

void list_whole(std::string& text, Input const& input) {
    Given const& given = *input.given;
    const std::size_t count = is_numeric(input) ? given.numbers().count() : given.cell_count();
    text.append(input.argument->symbol).append(": ").append(input.argument->says);
    for (std::size_t row = 0; row < count && row < most_rows_listed; ++row) {
        if (is_numeric(input))
            text += "\n  " + in_si(given.numbers().si[row], given.numbers().dimension);
        else
            text += "\n  " + cell_text(given.cell(row));
    }
    if (count > most_rows_listed)
        text += "\n  and " + std::to_string(count - most_rows_listed) + " more rows";
    text += '\n';
}

/// `ΔS` of `ΔS = ΔH / T`; a formula told in words has none.
std::string_view result_symbol(std::string_view formula) {
    const std::size_t end = formula.find(" = ");
    return end == std::string_view::npos ? "result" : formula.substr(0, end);
}

std::string result_text(Results const& results, std::size_t row, Outcome outcome) {
    if (results.failed(row)) return "no result (see \"why\")";
    if (outcome.kind == Outcome::Kind::text) return results.texts[row];
    return in_si(results.numbers[row], outcome.dimension);
}

} // namespace

std::string steps(Evaluation const& evaluation, Results const& results, Results const& per_amount,
                  std::size_t row, std::vector<std::string> const& noted) {
    Entry const& entry = evaluation.entry();
    const std::string_view formula = evaluation.form().formula;
    std::string text =
        std::string(entry.name) + ": " + entry.says + "\n" + std::string(formula) + "\n";
    std::vector<Symbol> symbols{
        {"R", in_si(core::gas_constant.value(), core::dimension<core::MolarEntropy>)}};
    // A formula of several clauses is told, not filled in: the function's own steps do that.
    bool whole = evaluation.outcome().kind == Outcome::Kind::text ||
                 formula.find(" of a ") != std::string_view::npos ||
                 formula.find(", ") != std::string_view::npos;
    for (Input const& input : stated_inputs(evaluation)) {
        whole = whole || (input.need->whole &&
                          formula.find(input.argument->symbol) != std::string_view::npos);
        if (input.need->kind == Need::Kind::material)
            text += std::string(input.argument->name) + ": " +
                    read_own_material(*input.given, core::silent)->written() + "\n";
        else if (stands_for_all_rows(*input.need, *input.given) && means_mixture(*input.given))
            text += std::string(input.argument->name) + ": " +
                    read_gas_argument(*input.given, 0, core::silent).written() + "\n";
        else if (input.need->whole)
            list_whole(text, input);
        else if (!is_numeric(input))
            text +=
                std::string(input.argument->name) + ": " + cell_text(input.given->cell(row)) + "\n";
        else {
            text += std::string(input.argument->symbol) + " = " + as_read(*input.given, row) + "\n";
            const double si = input.given->si()[input.given->numbers().listed ? row : 0];
            std::string value = in_si(si, input.given->numbers().dimension);
            symbols.push_back(
                {input.argument->symbol, si < 0 ? "(" + value + ")" : std::move(value)});
        }
    }
    for (std::string const& step : noted) text += step + "\n";
    const std::string_view symbol = result_symbol(formula);
    if (!whole) text += substituted(formula, symbols) + "\n";
    if (Given const& amount = evaluation.arguments().amount; !amount.missing()) {
        text += std::string(symbol) + " = " +
                result_text(per_amount, row, evaluation.overload().outcome) + "\n";
        text += std::string("n = ") + as_read(amount, row) + "\n";
        if (evaluation.names_substance() && !results.failed(row))
            text +=
                "M = " + in_si(evaluation.molar_masses()(row), core::dimension<core::MolarMass>) +
                "\n";
        text += std::string(symbol) + " · n = " + result_text(results, row, evaluation.outcome());
    } else {
        text += std::string(symbol) + " = " + result_text(results, row, evaluation.outcome());
    }
    return text;
}

std::string source(Evaluation const& evaluation, std::size_t row) {
    Form const& form = evaluation.form();
    std::string text = std::string(form.formula) + "\nSource: " + form.source;
    if (form.valid[0]) text += std::string("\nValid: ") + form.valid;
    for (Input const& input : stated_inputs(evaluation))
        for (std::string const& line : figures_behind(*input.need, *input.given, row))
            text += '\n' + line;
    text += "\nInputs: as given in the sheet";
    return text;
}

std::string why(std::vector<std::string> const& remarks) {
    std::string text = "ok";
    for (std::string const& remark : remarks) text += "\n" + remark;
    return text;
}

std::string why(Entry const& entry, core::Failure const& failure) {
    std::string text = entry.name;
    const auto inputs = static_cast<int>(entry.input_count());
    if (failure.argument >= 0) {
        const std::size_t position =
            failure.argument < inputs
                ? entry.position_of_input(static_cast<std::size_t>(failure.argument))
            : failure.argument == inputs ? entry.position(Argument::Role::amount)
                                         : entry.position(Argument::Role::show);
        text.append(", ").append(entry.arguments[position].name);
    }
    if (!failure.given.empty())
        text.append(": given ").append(failure.given).append("; needed ");
    else
        text.append(": needed ");
    return text.append(failure.needed).append(". To mend it, ").append(failure.repair).append(".");
}

} // namespace registration
