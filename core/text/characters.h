// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <string>
#include <string_view>

namespace core::text {

/// Superscripts keep their difference from ordinary digits: they fold to codes above Unicode.
inline constexpr char32_t superscript_zero = 0x110000;
inline constexpr char32_t superscript_plus = superscript_zero + 10;
inline constexpr char32_t superscript_minus = superscript_zero + 11;

inline constexpr char32_t middle_dot = 0x00B7;
inline constexpr char32_t degree_sign = 0x00B0;
inline constexpr char32_t micro_sign = 0x00B5;
inline constexpr char32_t plus_minus = 0x00B1;
inline constexpr char32_t delta = 0x0394;
inline constexpr char32_t one_quarter = 0x00BC;
inline constexpr char32_t one_half = 0x00BD;
inline constexpr char32_t three_quarters = 0x00BE;
inline constexpr char32_t degree_celsius = 0x2103;
inline constexpr char32_t degree_fahrenheit = 0x2109;

inline constexpr bool is_digit(char32_t c) { return c >= U'0' && c <= U'9'; }
inline constexpr bool is_letter(char32_t c) {
    return (c >= U'a' && c <= U'z') || (c >= U'A' && c <= U'Z');
}
inline constexpr bool is_superscript(char32_t c) {
    return c >= superscript_zero && c <= superscript_minus;
}
/// A multiplication sign, in a unit or before a power of ten.
inline constexpr bool is_product_sign(char32_t c) { return c == middle_dot || c == U'*'; }

/// Walks over UTF-8 text one folded character at a time, so that nothing is copied: look-alikes
/// become one character, every space an ordinary one, zero-width characters vanish. Where the text
/// is not UTF-8 it throws Failure.
class Cursor {
public:
    explicit Cursor(std::string_view text)
        : begin_(text.data()), end_(text.data() + text.size()), start_(begin_), next_(begin_) {
        load();
    }

    /// The character under the cursor, 0 at the end.
    char32_t operator*() const { return here_; }
    bool at_end() const { return here_ == 0; }
    void advance() {
        start_ = next_;
        load();
    }
    bool take(char32_t c) {
        if (here_ != c) return false;
        advance();
        return true;
    }
    /// Passes spaces and says whether there were any.
    bool skip_spaces() {
        bool const any = here_ == U' ';
        while (here_ == U' ') advance();
        return any;
    }
    /// The character after this one.
    char32_t following() const {
        Cursor ahead = *this;
        ahead.advance();
        return *ahead;
    }

    std::string_view whole() const { return {begin_, static_cast<std::size_t>(end_ - begin_)}; }
    /// Where the character before this one ends and this one starts.
    const char* position() const { return start_; }
    /// From this character on.
    std::string_view rest() const { return {start_, static_cast<std::size_t>(end_ - start_)}; }
    void pass_rest() {
        start_ = next_ = end_;
        here_ = 0;
    }

private:
    void load() {
        if (next_ == end_) {
            here_ = 0;
        } else if (auto const c = static_cast<unsigned char>(*next_); c >= 0x20 && c < 0x80) {
            here_ = c;
            ++next_;
        } else {
            load_folded();
        }
    }
    void load_folded();

    const char* begin_;
    const char* end_;
    const char* start_;
    const char* next_;
    char32_t here_ = 0;
};

/// Appends one code point as UTF-8.
void append(std::string& text, char32_t code_point);

/// A text as it can stand in a message: cut off when long, whatever is not UTF-8 as `?`.
std::string shown(std::string_view text, int most_characters = 60);

/// A text between grave accents, as every message quotes.
std::string quoted(std::string_view text);

/// The repair that gives the whole text anew: "write `25 °C`".
std::string write_instead(std::string_view repaired);

} // namespace core::text
