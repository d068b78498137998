// SPDX-License-Identifier: MPL-2.0
#include "addin/results.h"

#include "registration/prose.h"

#include <com/sun/star/uno/Sequence.hxx>
#include <rtl/ustring.hxx>

#include <algorithm>

namespace addin {
namespace {

using css::uno::Any, css::uno::Sequence;
using registration::Answer;
using rtl::OUString;

OUString to_office(std::string const& text) {
    return OUString(text.data(), static_cast<sal_Int32>(text.size()), RTL_TEXTENCODING_UTF8);
}

/// Whether `show` asks for the reason of an error.
bool asks_why(Any const& show) {
    OUString view;
    return (show >>= view) && view.trim().startsWith("why");
}

/// A position in the call, counted as failures count: the inputs, then amount, then show.
int counted(registration::Entry const& entry, std::size_t position) {
    using Role = registration::Argument::Role;
    const std::size_t inputs = entry.input_count();
    if (position == entry.position(Role::amount)) return static_cast<int>(inputs);
    if (position == entry.position(Role::show)) return static_cast<int>(inputs) + 1;
    std::size_t input = 0;
    while (entry.position_of_input(input) != position) ++input;
    return static_cast<int>(input);
}

/// One cell of an answer. A blank row of the input is an empty text, since an array has no blanks.
Any cell(Answer const& answer, std::size_t at) {
    if (std::ranges::binary_search(answer.blanks, at)) return Any(OUString());
    const auto error = std::ranges::lower_bound(answer.errors, at, {}, &Answer::Error::cell);
    if (error != answer.errors.end() && error->cell == at) return Any(error->number);
    if (answer.kind == Answer::Kind::numbers ||
        (answer.kind == Answer::Kind::cells && answer.texts[at].empty()))
        return Any(answer.numbers[at]);
    return Any(to_office(answer.texts[at]));
}

/// A row is made of its numbers at once: growing an empty one costs half as much again.
Any numbers(Answer const& answer) {
    Sequence<Sequence<double>> rows(static_cast<sal_Int32>(answer.rows));
    Sequence<double>* const row = rows.getArray();
    for (std::size_t i = 0; i < answer.rows; ++i)
        row[i] = Sequence<double>(answer.numbers.data() + i * answer.columns,
                                  static_cast<sal_Int32>(answer.columns));
    return Any(rows);
}

Any cells(Answer const& answer) {
    Sequence<Sequence<Any>> rows(static_cast<sal_Int32>(answer.rows));
    Sequence<Any>* const row = rows.getArray();
    for (std::size_t i = 0; i < answer.rows; ++i) {
        row[i].realloc(static_cast<sal_Int32>(answer.columns));
        Any* const in_row = row[i].getArray();
        for (std::size_t j = 0; j < answer.columns; ++j)
            in_row[j] = cell(answer, i * answer.columns + j);
    }
    return Any(rows);
}

} // namespace

Any to_office(Answer const& answer) {
    if (answer.rows * answer.columns == 1) return cell(answer, 0);
    if (answer.kind == Answer::Kind::numbers && answer.blanks.empty()) return numbers(answer);
    return cells(answer);
}

Any refused(registration::Entry const& entry, std::initializer_list<Any const*> values,
            core::Failure failure) {
    const std::size_t show = entry.position(registration::Argument::Role::show);
    if (show == entry.argument_count() || !asks_why(*values.begin()[show]))
        return Any(registration::error_number(failure.kind));
    failure.argument = counted(entry, static_cast<std::size_t>(failure.argument));
    return Any(to_office(registration::why(entry, failure)));
}

} // namespace addin
