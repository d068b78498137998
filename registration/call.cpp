// SPDX-License-Identifier: MPL-2.0
#include "registration/call.h"

#include "core/text/quantity.h"
#include "registration/prose.h"
#include "registration/show.h"

#include <algorithm>

namespace registration {
namespace {

using core::Failure;
using View = Show::View;

[[noreturn]] void refuse_show(Entry const& entry, std::string given, std::string needed,
                              std::string repair) {
    Failure failure(Failure::Kind::unfit, std::move(given), std::move(needed), std::move(repair));
    failure.argument = static_cast<int>(entry.input_count()) + 1;
    throw failure;
}

/// What turns results into the unit that was asked for: nothing, or a molar mass where the basis
/// differs and the substance is known.
enum class Basis : std::uint8_t { same, per_mole_from_mass, per_mass_from_mole };

Basis agree_with_unit(Evaluation const& evaluation, Show const& show) {
    const Outcome outcome = evaluation.outcome();
    const Unit& unit = show.unit;
    const std::string asked(show.unit_text);
    if (outcome.kind == Outcome::Kind::text)
        refuse_show(evaluation.entry(), "the unit " + asked, "no unit, since the result is a text",
                    "leave the unit out");
    Basis basis = Basis::same;
    if (unit.dimension != outcome.dimension) {
        const core::Dimension molar_mass = core::dimension<core::MolarMass>;
        const bool known = evaluation.names_substance();
        if (known && outcome.dimension == unit.dimension * molar_mass)
            basis = Basis::per_mass_from_mole;
        else if (known && outcome.dimension * molar_mass == unit.dimension)
            basis = Basis::per_mole_from_mass;
        else
            refuse_show(evaluation.entry(), "the unit " + asked,
                        "a unit of " + core::text::name_of(outcome.dimension) + ", such as " +
                            core::text::si_unit(outcome.dimension),
                        "ask for a unit of the result's dimension");
    }
    const bool reading_fits = unit.reading == outcome.reading || unit.reading == Reading::plain ||
                              (outcome.reading == Reading::plain && outcome.follows_first &&
                               unit.reading != Reading::gauge);
    if (!reading_fits || (outcome.reading == Reading::gauge && unit.reading != Reading::gauge))
        refuse_show(
            evaluation.entry(), "the unit " + asked,
            outcome.reading == Reading::difference ? "a unit of a temperature difference, K or Δ°C"
            : outcome.reading == Reading::point    ? "a unit of a temperature, K or °C"
            : outcome.reading == Reading::gauge    ? "a gauge unit such as bar(g)"
                                                   : "a unit of an absolute pressure",
            outcome.reading == Reading::gauge ? "make the pressure absolute with PRESSURE.ABSOLUTE"
                                              : "ask for a unit of that kind");
    if (unit.share != Share::none && unit.share != evaluation.share())
        refuse_show(evaluation.entry(), "the unit " + asked,
                    "a unit of the kind of fraction that was given", "ask for `1` or `%`");
    return basis;
}

/// Unit and unit text of the result: as asked for, or coherent SI.
struct Target {
    Unit unit;
    std::string text;
    Basis basis = Basis::same;
};

Target target_of(Evaluation const& evaluation, Show const& show) {
    if (show.has_unit())
        return {show.unit, std::string(show.unit_text), agree_with_unit(evaluation, show)};
    const Outcome outcome = evaluation.outcome();
    Target target;
    target.unit.dimension = outcome.dimension;
    const bool named = show.view != View::number && outcome.kind == Outcome::Kind::number;
    if (named && outcome.dimension != core::Dimension{}) {
        target.text = core::text::si_unit(outcome.dimension);
        if (outcome.reading == Reading::difference) target.text = "Δ" + target.text;
        if (outcome.reading == Reading::gauge) target.text += "(g)";
        target.unit = core::text::read_unit(target.text);
    }
    return target;
}

/// One call from its blocks to its answer.
class Call {
public:
    Call(Entry const& entry, Arguments& arguments, Show const& show)
        : entry_(entry), show_(show), evaluation_(entry, arguments),
          target_(target_of(evaluation_, show)),
          molar_masses_(target_.basis == Basis::same ? MolarMasses{} : evaluation_.molar_masses()) {
    }

    Answer answer() {
        if (show_.is_prose()) return prose();
        if (evaluation_.outcome().kind == Outcome::Kind::text) return texts_as_they_are();
        if (evaluation_.outcome().kind == Outcome::Kind::array) return array();
        Results results = evaluation_.results(core::silent, false);
        if (show_.view == View::number) return numbers(std::move(results));
        return with_uncertainty(results);
    }

private:
    Answer shaped(std::size_t count, Answer::Kind kind) const {
        Answer answer;
        answer.kind = kind;
        (evaluation_.across() ? answer.columns : answer.rows) = count;
        if (kind == Answer::Kind::numbers)
            answer.numbers.resize(count);
        else
            answer.texts.resize(count);
        for (std::size_t row = 0; evaluation_.has_blanks() && row < count; ++row)
            if (evaluation_.blank(row)) answer.blanks.push_back(row);
        return answer;
    }

    /// A value of a row that has neither failed nor is blank, on the basis that was asked for.
    double on_basis(double value, std::size_t row) const {
        switch (target_.basis) {
        case Basis::same:
            return value;
        case Basis::per_mass_from_mole:
            return value / molar_masses_(row);
        case Basis::per_mole_from_mass:
            return value * molar_masses_(row);
        }
        return value;
    }

    Answer numbers(Results results) {
        Answer answer = shaped(results.count(), Answer::Kind::numbers);
        if (target_.unit.is_coherent() && target_.basis == Basis::same) {
            answer.numbers = std::move(results.numbers);
            return spread(std::move(answer));
        }
        for (std::size_t row = 0; row < results.count(); ++row) {
            if (evaluation_.blank(row)) continue;
            const double si = results.numbers[row];
            answer.numbers[row] =
                results.failed(row) ? si : target_.unit.from_si(on_basis(si, row));
        }
        return spread(std::move(answer));
    }

    Answer with_uncertainty(Results const& results) {
        const std::vector<double> u = evaluation_.uncertainties(results, nullptr);
        const bool number = show_.view == View::uncertainty;
        Answer answer =
            shaped(results.count(), number ? Answer::Kind::numbers : Answer::Kind::texts);
        for (std::size_t row = 0; row < results.count(); ++row) {
            if (evaluation_.blank(row)) continue;
            const double bad = results.failed(row) ? results.numbers[row] : u[row];
            if (bad != bad) { // an error, of the result or of its uncertainty
                if (number)
                    answer.numbers[row] = bad;
                else
                    answer.errors.push_back({row, bad});
                continue;
            }
            const double si = on_basis(results.numbers[row], row);
            const double spread = on_basis(u[row], row);
            if (number)
                answer.numbers[row] = target_.unit.span_from_si(spread);
            else
                answer.texts[row] =
                    show_.view == View::quantity
                        ? core::text::write_exactly(si, spread, target_.unit, target_.text)
                        : core::text::write_for_people(si, spread, target_.unit, target_.text);
        }
        return spread(std::move(answer));
    }

    Answer texts_as_they_are() {
        if (show_.view == View::quantity || show_.view == View::uncertainty)
            refuse_show(entry_, "a quantity or an uncertainty",
                        "the text itself, since the result is a text", "leave `show` out");
        Results results = evaluation_.results(core::silent, false);
        Answer answer = shaped(results.count(), Answer::Kind::texts);
        answer.texts = std::move(results.texts);
        for (auto const& failed : results.failures_in_texts)
            answer.errors.push_back({failed.row, error_number(failed.kind)});
        return answer;
    }

    Answer array() {
        if (evaluation_.rows() != 1)
            core::refuse_unfit("a column",
                               "one value for each argument, since the result is an array",
                               "call the function once a row");
        Results results = evaluation_.results(core::silent, true);
        if (Failure const* fault = results.fault(0)) throw Failure(*fault);
        Array& made = results.arrays.at(0);
        Answer answer;
        answer.kind = Answer::Kind::cells;
        answer.rows = made.rows();
        answer.columns = made.columns();
        answer.numbers.assign(made.numbers.begin(), made.numbers.end());
        answer.texts = std::move(made.texts);
        for (std::size_t at = 0; at < made.blanks.size(); ++at)
            if (made.blanks[at]) answer.blanks.push_back(at);
        return answer;
    }

    Answer prose() {
        std::vector<std::string> noted, remarks;
        const bool one = evaluation_.rows() == 1;
        const core::Notes notes = one ? core::Notes(&noted, &remarks) : core::Notes();
        const Results results = evaluation_.results(notes, true);
        const Results per_amount = evaluation_.results_without_amount(core::silent, false);
        Answer answer = shaped(results.count(), Answer::Kind::texts);
        for (std::size_t row = 0; row < answer.texts.size(); ++row)
            if (!evaluation_.blank(row))
                answer.texts[row] = prose(results, per_amount, row, noted, remarks);
        return spread(std::move(answer));
    }

    std::string prose(Results const& results, Results const& per_amount, std::size_t row,
                      std::vector<std::string> const& noted, std::vector<std::string>& remarks) {
        if (show_.view == View::source) return source(evaluation_, row);
        if (show_.view == View::steps) return steps(evaluation_, results, per_amount, row, noted);
        if (Failure const* fault = results.fault(row)) return why(entry_, *fault);
        std::vector<std::string> all = remarks;
        for (Given const& given : evaluation_.arguments().inputs)
            if (Numbers const* numbers = given.missing() ? nullptr : given.if_numbers())
                all.insert(all.end(), numbers->notes.begin(), numbers->notes.end());
        if (evaluation_.rows() == 1) static_cast<void>(evaluation_.uncertainties(results, &all));
        return why(all);
    }

    /// A column made of a whole column keeps the blank rows of the column it came from.
    Answer spread(Answer answer) const {
        if (!evaluation_.outcome().column || evaluation_.blanks_of_first().empty()) return answer;
        for (const std::size_t row : evaluation_.blanks_of_first()) {
            const auto at = static_cast<std::ptrdiff_t>(row);
            if (answer.kind == Answer::Kind::numbers)
                answer.numbers.insert(answer.numbers.begin() + at, 0.0);
            else
                answer.texts.insert(answer.texts.begin() + at, std::string());
            answer.blanks.push_back(row);
        }
        (evaluation_.across() ? answer.columns : answer.rows) +=
            evaluation_.blanks_of_first().size();
        return answer;
    }

    Entry const& entry_;
    Show const& show_;
    Evaluation evaluation_;
    Target target_;
    MolarMasses molar_masses_; ///< where the target is on another basis
};

Answer failed(Entry const& entry, Failure const& failure, bool explain) {
    Answer answer;
    if (explain) {
        answer.kind = Answer::Kind::texts;
        answer.texts.push_back(why(entry, failure));
    } else {
        answer.numbers.push_back(error_number(failure.kind));
    }
    return answer;
}

} // namespace

Answer call(Entry const& entry, std::span<const Block> blocks) {
    Show show;
    try {
        Arguments arguments(entry, blocks);
        try {
            read_show(arguments.show, show);
        } catch (Failure& failure) {
            failure.argument = static_cast<int>(entry.input_count()) + 1;
            throw;
        }
        return Call(entry, arguments, show).answer();
    } catch (Failure const& failure) {
        return failed(entry, failure, show.view == View::why);
    }
}

} // namespace registration
