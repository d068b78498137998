// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Sequence.hxx>
#include <rtl/ustring.hxx>

#include <string>
#include <string_view>
#include <vector>

/// Values as the office makes them.

inline rtl::OUString office_text(std::string const& utf8) {
    return {utf8.data(), static_cast<sal_Int32>(utf8.size()), RTL_TEXTENCODING_UTF8};
}

inline rtl::OUString office_text(std::u16string_view text) {
    const std::vector<sal_Unicode> units(text.begin(), text.end());
    return {units.data(), static_cast<sal_Int32>(units.size())};
}

template<class Element>
css::uno::Any range_of(std::vector<std::vector<Element>> const& rows) {
    css::uno::Sequence<css::uno::Sequence<Element>> range(static_cast<sal_Int32>(rows.size()));
    css::uno::Sequence<Element>* to = range.getArray();
    for (auto const& row : rows)
        *to++ = css::uno::Sequence<Element>(row.data(), static_cast<sal_Int32>(row.size()));
    return css::uno::Any(range);
}
