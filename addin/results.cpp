// SPDX-License-Identifier: MPL-2.0
#include "addin/results.h"

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

/// One cell of an answer. A blank row of the input is an empty text, since an array has no blanks.
Any cell(Answer const& answer, std::size_t at) {
    if (std::ranges::binary_search(answer.blanks, at)) return Any(OUString());
    const auto error = std::ranges::lower_bound(answer.errors, at, {}, &Answer::Error::cell);
    if (error != answer.errors.end() && error->cell == at) return Any(error->number);
    if (answer.kind == Answer::Kind::numbers) return Any(answer.numbers[at]);
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

} // namespace addin
