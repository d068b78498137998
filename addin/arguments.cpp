// SPDX-License-Identifier: MPL-2.0
#include "addin/arguments.h"

#include "core/failure.h"

#include <com/sun/star/uno/Sequence.hxx>
#include <cppu/unotype.hxx>
#include <rtl/ustring.hxx>

#include <algorithm>
#include <cstdint>
#include <string>

namespace addin {
namespace {

using css::uno::Any, css::uno::Sequence;
using registration::Block, registration::Cell;
using rtl::OUString;

constexpr std::size_t most_cells = 1'048'576; // the rows of a sheet
constexpr sal_Int32 most_characters = 32'767;

template<class Element>
using Range = Sequence<Sequence<Element>>;

/// Hands a value to `use` as the range it is, or as it stands. Only a sequence has its type looked
/// at closely, which costs more than reading a single value.
template<class Use>
void as_what_it_is(Any const& value, Use use) {
    if (value.getValueTypeClass() == css::uno::TypeClass_SEQUENCE) {
        const css::uno::Type type = value.getValueType();
        if (type == cppu::UnoType<Range<Any>>::get())
            return use(*static_cast<Range<Any> const*>(value.getValue()));
        if (type == cppu::UnoType<Range<double>>::get())
            return use(*static_cast<Range<double> const*>(value.getValue()));
        if (type == cppu::UnoType<Range<OUString>>::get())
            return use(*static_cast<Range<OUString> const*>(value.getValue()));
    }
    use(value);
}

/// No reader takes a text this long: what is cut off changes nothing but the cost of refusing it.
sal_Int32 bounded_length(OUString const& text) {
    return std::min(text.getLength(), most_characters);
}

[[noreturn]] void refuse_cells() {
    core::refuse_unfit("a range of more than " + std::to_string(most_cells) + " cells",
                       "at most as many cells as a sheet has rows",
                       "give only the rows that hold values");
}

[[noreturn]] void refuse_shape() {
    core::refuse_unfit("rows of unequal length", "a rectangle of cells", "give a range of cells");
}

/// What a call needs room for, so that nothing moves while blocks point into it.
struct Room {
    std::size_t cells = 0, bytes = 0;

    void add(OUString const& text) {
        bytes += 3 * static_cast<std::size_t>(bounded_length(text)); // of a UTF-16 unit, at most
    }
    void add(double) {}
    void add(Any const& value) {
        if (value.getValueTypeClass() == css::uno::TypeClass_STRING)
            add(*static_cast<OUString const*>(value.getValue()));
    }

    void operator()(Any const& value) {
        ++cells;
        add(value);
    }
    template<class Element>
    void operator()(Range<Element> const& rows) {
        const sal_Int32 columns = rows.hasElements() ? rows[0].getLength() : 0;
        const auto count =
            static_cast<std::size_t>(rows.getLength()) * static_cast<std::size_t>(columns);
        if (count > most_cells) refuse_cells();
        for (Sequence<Element> const& row : rows) {
            if (row.getLength() != columns) refuse_shape();
            for (Element const& element : row) add(element);
        }
        cells += count;
    }
};

bool is_space(char c) { return c == ' ' || c == '\t' || c == '\n' || c == '\r'; }

/// UTF-16 to UTF-8; a lone surrogate becomes the replacement character.
char* encode(OUString const& text, char* to) {
    const sal_Unicode* from = text.getStr();
    const sal_Unicode* const end = from + bounded_length(text);
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
    int position = 0;
    try {
        for (Any const* value : values) {
            as_what_it_is(*value, [&room](auto const& what) { room(what); });
            ++position;
        }
    } catch (core::Failure& failure) {
        failure.argument = position;
        throw;
    }
    cells_.reserve(room.cells);
    characters_.reserve(room.bytes);
    for (Any const* value : values) as_what_it_is(*value, [this](auto const& what) { add(what); });
}

Cell Arguments::cell(double number) { return {Cell::Kind::number, number, {}}; }

Cell Arguments::cell(OUString const& text) {
    const std::size_t start = characters_.size();
    characters_.resize(start + 3 * static_cast<std::size_t>(bounded_length(text)),
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
void Arguments::add(Range<Element> const& rows) {
    const auto row_count = static_cast<std::size_t>(rows.getLength());
    const std::size_t columns =
        rows.hasElements() ? static_cast<std::size_t>(rows[0].getLength()) : 0;
    Cell const* const start = cells_.data() + cells_.size();
    for (Sequence<Element> const& row : rows)
        for (Element const& element : row) cells_.push_back(cell(element));
    blocks_.push_back(columns ? Block{start, row_count, columns} : Block{});
}

void Arguments::add(Any const& value) {
    if (!value.hasValue()) return blocks_.push_back(Block{});
    cells_.push_back(cell(value));
    blocks_.push_back({&cells_.back(), 1, 1});
}

} // namespace addin
