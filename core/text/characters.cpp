// SPDX-License-Identifier: MPL-2.0
#include "core/text/characters.h"

#include "core/failure.h"

namespace core::text {
namespace {

constexpr char32_t replacement_character = 0xFFFD;
constexpr char32_t nothing = 0; // folds to no character at all

struct Decoded {
    char32_t code_point;
    std::size_t length; ///< 0 where the bytes are not UTF-8
};

// UTF-8 by RFC 3629, section 4: no overlong forms, no surrogates, nothing above U+10FFFF.
Decoded decode(const char* bytes, std::size_t available) {
    auto const byte = [&](std::size_t i) { return static_cast<unsigned char>(bytes[i]); };
    unsigned const lead = byte(0);
    if (lead < 0x80) return {lead, 1};
    std::size_t const length = lead < 0xC2   ? 0
                               : lead < 0xE0 ? 2
                               : lead < 0xF0 ? 3
                               : lead < 0xF5 ? 4
                                             : 0;
    if (length == 0 || length > available) return {replacement_character, 0};
    char32_t code = lead & (0x7Fu >> length);
    for (std::size_t i = 1; i < length; ++i) {
        if ((byte(i) & 0xC0u) != 0x80u) return {replacement_character, 0};
        code = code << 6 | (byte(i) & 0x3Fu);
    }
    bool const overlong = (length == 3 && code < 0x800) || (length == 4 && code < 0x10000);
    if (overlong || (code >= 0xD800 && code <= 0xDFFF) || code > 0x10FFFF)
        return {replacement_character, 0};
    return {code, length};
}

bool is_zero_width(char32_t c) {
    return c == 0x00AD || (c >= 0x200B && c <= 0x200F) || (c >= 0x202A && c <= 0x202E) ||
           c == 0x2060 || c == 0x2061 || c == 0x2063 || c == 0x2064 ||
           (c >= 0x2066 && c <= 0x2069) || (c >= 0xFE00 && c <= 0xFE0F) || c == 0xFEFF;
}

bool is_space(char32_t c) {
    return c == U'\t' || c == U'\n' || c == U'\r' || c == 0x00A0 || c == 0x1680 ||
           (c >= 0x2000 && c <= 0x200A) || c == 0x2028 || c == 0x2029 || c == 0x202F ||
           c == 0x205F || c == 0x3000;
}

char32_t fold_digits_and_forms(char32_t c) {
    if (c >= 0x2080 && c <= 0x2089) return U'0' + (c - 0x2080);             // subscript digits
    if (c >= 0x2074 && c <= 0x2079) return superscript_zero + (c - 0x2070); // superscript digits
    if (c >= 0xFF01 && c <= 0xFF5E) return c - 0xFF01 + 0x21;               // full-width forms
    return c;
}

// One code point to the character it stands for in the cell language (CELL_LANGUAGE, unit text).
char32_t fold(char32_t c) {
    if (is_space(c)) return U' ';
    if (is_zero_width(c)) return nothing;
    switch (c) {
    case 0x0387:
    case 0x2022:
    case 0x2024:
    case 0x2027:
    case 0x2062:
    case 0x2219:
    case 0x22C5:
    case 0x2E31:
    case 0x30FB:
    case 0xFF65:
    case 0x00D7:
    case 0x2715:
    case 0x2716:
    case 0x2A2F:
    case 0x2217:
    case 0xFF0A:
        return middle_dot;
    case 0x2070:
        return superscript_zero;
    case 0x00B9:
        return superscript_zero + 1;
    case 0x00B2:
        return superscript_zero + 2;
    case 0x00B3:
        return superscript_zero + 3;
    case 0x207A:
        return superscript_plus;
    case 0x207B:
        return superscript_minus;
    case 0x02D7:
    case 0x2010:
    case 0x2011:
    case 0x2012:
    case 0x2013:
    case 0x2014:
    case 0x2015:
    case 0x2212:
    case 0x2796:
    case 0xFE58:
    case 0xFE63:
        return U'-';
    case 0xFE62:
    case 0x2795:
        return U'+';
    case 0x2044:
    case 0x2215:
    case 0x2571:
    case 0x29F8:
        return U'/';
    case 0x2206:
    case 0x1D6AB:
        return delta;
    case 0x00BA:
    case 0x02DA:
    case 0x2218:
        return degree_sign;
    case 0x03BC:
        return micro_sign;
    case 0x212A:
        return U'K';
    case 0x2126:
        return 0x03A9;
    case 0x2113:
        return U'l';
    default:
        return fold_digits_and_forms(c);
    }
}

} // namespace

void Cursor::load_folded() {
    here_ = nothing;
    while (next_ != end_ && here_ == nothing) {
        Decoded const decoded = decode(next_, static_cast<std::size_t>(end_ - next_));
        if (decoded.length == 0)
            refuse_unfit(shown(whole()), "text in UTF-8", "type the text again");
        next_ += decoded.length;
        // 0 marks the end, so a NUL has to be something else.
        here_ = decoded.code_point == 0 ? replacement_character : fold(decoded.code_point);
    }
}

void append(std::string& text, char32_t c) {
    auto const put = [&](char32_t byte) { text.push_back(static_cast<char>(byte)); };
    auto const tail = [&](int shift) { put(0x80 | (c >> shift & 0x3F)); };
    if (c < 0x80) return put(c);
    if (c < 0x800) return put(0xC0 | c >> 6), tail(0);
    if (c < 0x10000) return put(0xE0 | c >> 12), tail(6), tail(0);
    put(0xF0 | c >> 18), tail(12), tail(6), tail(0);
}

std::string shown(std::string_view text, int most_characters) {
    std::string result;
    int characters = 0;
    for (std::size_t at = 0; at < text.size(); ++characters) {
        if (characters == most_characters) return result + "…";
        Decoded const decoded = decode(text.data() + at, text.size() - at);
        bool const printable = decoded.length != 0 && decoded.code_point >= 0x20;
        result.append(printable ? text.substr(at, decoded.length) : "?");
        at += decoded.length == 0 ? 1 : decoded.length;
    }
    return result;
}

std::string quoted(std::string_view text) { return "`" + shown(text) + "`"; }

std::string write_instead(std::string_view repaired) {
    return "write `" + shown(repaired, 300) + "`";
}

} // namespace core::text
