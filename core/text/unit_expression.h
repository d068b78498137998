// SPDX-License-Identifier: MPL-2.0
#pragma once

// Reads unit expressions by recursive descent, one function a rule:
//
//   unit    = product [ "/" factor ]            at most one solidus a level, then exactly one
//   factor product = factor { ( "·" | "." | "*" | space ) factor } factor  = ( symbol | "1" | "("
//   unit ")" ) [ power ] power   = [ "^" ] [sign] digits | superscripts      (beyond ±99 refused)
//   symbol  = exact, case-sensitive name in the unit table, else SI prefix + prefixable symbol
//
// A solidus followed by more than one factor (`kJ/kg·K`, `kJ/kg/K`) has no agreed meaning
// (SI Brochure, 5.4.6): it is refused, and the one reading that people mean is put into the repair.

#include "core/text/characters.h"
#include "core/text/unit.h"
#include "core/text/unit_table.h"

#include <array>
#include <string>
#include <string_view>

namespace core::text {

/// A name folded to UTF-8 in a buffer of its own, longer names cut off: no known one is as long.
class FoldedName {
public:
    void push(char32_t c) {
        if (c == degree_celsius || c == degree_fahrenheit) {
            push(degree_sign);
            c = c == degree_celsius ? U'C' : U'F';
        }
        if (size_ + 4 > bytes_.size()) return;
        if (c < 0x80) {
            put(c);
        } else if (c < 0x800) {
            put(0xC0 | c >> 6);
            put(0x80 | (c & 0x3F));
        } else {
            put('?');
        }
    }
    void drop(std::size_t count) { size_ -= count; }
    void raise_second() { bytes_[1] = static_cast<char>(bytes_[1] - 'a' + 'A'); }
    std::string_view view() const { return {bytes_.data(), size_}; }

private:
    void put(char32_t byte) { bytes_[size_++] = static_cast<char>(byte); }

    std::array<char, 36> bytes_{};
    std::size_t size_ = 0;
};

/// The parser: one function a rule of the grammar above.
class UnitExpression {
public:
    /// Reads from the cursor on; what is mended is said in `note`.
    UnitExpression(Cursor& at, std::string& note) : at_(at), note_(note) {}

    /// Reads a unit with the mark of a pressure behind it, and stops at what no unit goes on with.
    /// `unit` is made in place: copying long doubles that were just stored costs more than reading.
    void read(Unit& unit);
    Unit read() {
        Unit unit;
        read(unit);
        return unit;
    }

    /// Whether a unit can begin here.
    static bool starts(Cursor const& at);

private:
    void quotient(Unit& unit);
    void product(Unit& unit);
    void factor(Unit& unit);
    void bracketed(Unit& unit);
    void symbol(Unit& unit);
    Symbol symbol_with_digits(const char* start, const char* base_end, FoldedName& name,
                              int& power);
    bool take_percent(std::string_view name);
    Symbol mended(std::string_view written, FoldedName const& name);
    void read_power_of(Unit& base);
    void raise(Unit& base, int power);
    bool read_power(int& power);
    void read_mark(Unit& unit);

    void make_part(Unit& unit);
    void multiply(Unit& product, Unit const& factor, int exponent) const;

    [[noreturn]] void refuse_second_solidus(const char* first_factor);
    [[noreturn]] void refuse(std::string needed, std::string repair) const;
    [[noreturn]] void refuse_here() const;

    Cursor& at_;
    std::string& note_;
    int depth_ = 0;
    bool fraction_ = false; ///< whether the last unit is %, ppm or mol%, which stand alone
};

/// Refuses what stands where a text should have ended.
[[noreturn]] void refuse_rest(Cursor const& at);

/// What stands in parentheses behind a pressure: `a` for absolute, `g` for gauge, else 0.
char32_t pressure_mark(Cursor at);

} // namespace core::text
