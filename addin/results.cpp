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

template<class Element, class Value>
Any rectangle(Answer const& answer, Value value) {
    Sequence<Sequence<Element>> rows(static_cast<sal_Int32>(answer.rows));
    Sequence<Element>* const row = rows.getArray();
    for (std::size_t i = 0; i < answer.rows; ++i) {
        row[i].realloc(static_cast<sal_Int32>(answer.columns));
        Element* const cells = row[i].getArray();
        for (std::size_t j = 0; j < answer.columns; ++j) cells[j] = value(i * answer.columns + j);
    }
    return Any(rows);
}

} // namespace

Any to_office(Answer const& answer) {
    if (answer.rows * answer.columns == 1) return cell(answer, 0);
    if (answer.kind == Answer::Kind::numbers && answer.blanks.empty())
        return rectangle<double>(answer, [&](std::size_t at) { return answer.numbers[at]; });
    return rectangle<Any>(answer, [&](std::size_t at) { return cell(answer, at); });
}

} // namespace addin
