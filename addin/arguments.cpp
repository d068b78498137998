// SPDX-License-Identifier: MPL-2.0
#include "addin/arguments.h"

#include <com/sun/star/uno/Sequence.hxx>
#include <cppu/unotype.hxx>
#include <rtl/ustring.hxx>

#include <cstdint>
#include <stdexcept>

namespace addin {
namespace {

using css::uno::Any, css::uno::Sequence;
using registration::Block, registration::Cell;
using rtl::OUString;

constexpr std::size_t most_cells = 1'048'576;
constexpr sal_Int32 most_characters = 32'767;

template<class Element>
using Range = Sequence<Sequence<Element>>;

template<class Element>
Range<Element> const* as_range(Any const& value) {
    if (value.getValueTypeClass() != css::uno::TypeClass_SEQUENCE) return nullptr;
    if (value.getValueType() != cppu::UnoType<Range<Element>>::get()) return nullptr;
    return static_cast<Range<Element> const*>(value.getValue());
}

/// What a call needs room for, so that nothing moves while blocks point into it.
struct Room {
    std::size_t cells = 0, bytes = 0;

    void text(OUString const& text) {
        if (text.getLength() > most_characters) throw std::length_error("text");
        bytes += 3 * static_cast<std::size_t>(text.getLength()); // UTF-16 unit to UTF-8, at most
    }
    void add(OUString const& value) { text(value); }
    void add(double) {}
    void add(Any const& value) {
        if (value.getValueTypeClass() == css::uno::TypeClass_STRING)
            text(*static_cast<OUString const*>(value.getValue()));
    }
    template<class Element>
    void range(Range<Element> const& rows) {
        std::size_t count = 0;
        for (Sequence<Element> const& row : rows) {
            count += static_cast<std::size_t>(row.getLength());
            if (count > most_cells) throw std::length_error("cells");
            for (Element const& element : row) add(element);
        }
        cells += count;
    }
    void argument(Any const& value) {
        if (auto const* anys = as_range<Any>(value)) return range(*anys);
        if (auto const* numbers = as_range<double>(value)) return range(*numbers);
        if (auto const* texts = as_range<OUString>(value)) return range(*texts);
        ++cells;
        add(value);
    }
};

bool is_space(char c) { return c == ' ' || c == '\t' || c == '\n' || c == '\r'; }

/// UTF-16 to UTF-8; a lone surrogate becomes the replacement character.
char* encode(OUString const& text, char* to) {
    const sal_Unicode* from = text.getStr();
    const sal_Unicode* const end = from + text.getLength();
    const auto put = [&to](std::uint32_t byte) { *to++ = static_cast<char>(byte); };
    while (from != end) {
        std::uint32_t c = *from++;
        if (c < 0x80) {
            put(c);
            continue;
        }
        const bool high = c >= 0xD800 && c < 0xDC00;
        if (high && from != end && *from >= 0xDC00 && *from < 0xE000)
            c = 0x10000 + ((c - 0xD800) << 10) + (*from++ - 0xDC00u);
        else if (c >= 0xD800 && c < 0xE000)
            c = 0xFFFD;
        if (c < 0x800) {
            put(0xC0 | c >> 6);
        } else {
            if (c < 0x10000)
                put(0xE0 | c >> 12);
            else
                put(0xF0 | c >> 18), put(0x80 | (c >> 12 & 0x3F));
            put(0x80 | (c >> 6 & 0x3F));
        }
        put(0x80 | (c & 0x3F));
    }
    return to;
}

} // namespace

Arguments::Arguments(std::initializer_list<Any const*> values) {
    Room room;
    for (Any const* value : values) room.argument(*value);
    cells_.reserve(room.cells);
    characters_.reserve(room.bytes);
    for (Any const* value : values) add(*value);
}

Cell Arguments::cell(double number) { return {Cell::Kind::number, number, {}}; }

Cell Arguments::cell(OUString const& text) {
    const std::size_t start = characters_.size();
    characters_.resize(start + 3 * static_cast<std::size_t>(text.getLength()),
                       boost::container::default_init);
    char* const begin = characters_.data() + start;
    const char* end = encode(text, begin);
    characters_.resize(start + static_cast<std::size_t>(end - begin));
    const char* first = begin;
    while (first != end && is_space(*first)) ++first;
    while (first != end && is_space(end[-1])) --end;
    if (first == end) return {};
    return {Cell::Kind::text, 0, {first, static_cast<std::size_t>(end - first)}};
}

/// Numbers arrive as double; the other numeric classes only from other callers than a cell.
Cell Arguments::cell(Any const& value) {
    switch (value.getValueTypeClass()) {
    case css::uno::TypeClass_DOUBLE:
        return cell(*static_cast<double const*>(value.getValue()));
    case css::uno::TypeClass_STRING:
        return cell(*static_cast<OUString const*>(value.getValue()));
    case css::uno::TypeClass_BOOLEAN:
        return cell(*static_cast<sal_Bool const*>(value.getValue()) ? 1.0 : 0.0);
    default:
        break;
    }
    double number = 0;
    return (value >>= number) ? cell(number) : Cell{};
}

template<class Element>
void Arguments::add_range(Any const& value) {
    Range<Element> const& rows = *static_cast<Range<Element> const*>(value.getValue());
    const auto row_count = static_cast<std::size_t>(rows.getLength());
    const std::size_t columns = row_count ? static_cast<std::size_t>(rows[0].getLength()) : 0;
    Cell const* const start = cells_.data() + cells_.size();
    for (Sequence<Element> const& row : rows) {
        if (static_cast<std::size_t>(row.getLength()) != columns)
            throw std::length_error("ragged range");
        for (Element const& element : row) cells_.push_back(cell(element));
    }
    blocks_.push_back(columns ? Block{start, row_count, columns} : Block{});
}

void Arguments::add(Any const& value) {
    if (!value.hasValue()) return blocks_.push_back(Block{});
    if (as_range<Any>(value)) return add_range<Any>(value);
    if (as_range<double>(value)) return add_range<double>(value);
    if (as_range<OUString>(value)) return add_range<OUString>(value);
    cells_.push_back(cell(value));
    blocks_.push_back({&cells_.back(), 1, 1});
}

} // namespace addin
