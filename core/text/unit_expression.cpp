// SPDX-License-Identifier: MPL-2.0
#include "core/text/unit_expression.h"

#include "core/failure.h"
#include "core/quantities.h"
#include "core/text/unit_refusals.h"
#include "core/text/unit_table.h"

#include <array>
#include <cmath>
#include <numeric>

namespace core::text {
namespace {

constexpr int deepest = 8;
constexpr int largest_power = 99;
constexpr std::string_view good_form =
    "write units with `·`, one `/` and parentheses, as in `kJ/(kg·K)`";

constexpr std::array<bool, 128> starts_symbol = [] {
    std::array<bool, 128> table{};
    for (char32_t c = 0; c < 128; ++c) table[c] = is_letter(c) || c == U'%' || c == U'_';
    return table;
}();

bool is_symbol_start(char32_t c) {
    if (c < 128) return starts_symbol[c];
    return c == degree_sign || c == delta || c == micro_sign || c == degree_celsius ||
           c == degree_fahrenheit;
}
/// Other scripts' letters are gathered into the name too, so that the refusal can show it whole.
bool is_foreign_letter(char32_t c) {
    return c >= 0x00C0 && c < 0x2000 && c != 0x00D7 && c != 0x00F7;
}
/// Degree signs begin a name: in `lb°F` a new one, in `Δ°C` the rest of one.
bool goes_on_in_symbol(char32_t c, char32_t previous) {
    if (c < 128) return starts_symbol[c] || is_digit(c);
    bool const begins =
        c == degree_sign || c == delta || c == degree_celsius || c == degree_fahrenheit;
    return begins ? previous == delta : is_symbol_start(c) || is_foreign_letter(c);
}

bool is_coverage(Cursor at) {
    if (!at.take(U'(')) return false;
    at.skip_spaces();
    if (!at.take(U'k')) return false;
    at.skip_spaces();
    return *at == U'=';
}

bool is_operator(char32_t c) { return c == U'/' || c == U'.' || is_product_sign(c); }

/// Whether another factor follows, behind an operator, a hyphen, a space or nothing; passes over
/// what stands before it.
bool take_join(Cursor& at) {
    Cursor ahead = at;
    ahead.skip_spaces();
    if (is_operator(*ahead) || *ahead == U'-') {
        ahead.advance();
        ahead.skip_spaces();
    }
    if (!UnitExpression::starts(ahead)) return false;
    at = ahead;
    return true;
}

bool goes_on(Cursor at) { return take_join(at); }

Cursor after_sign(Cursor at) {
    at.advance();
    at.skip_spaces();
    return at;
}

/// `(K)` as `K`, where nothing but a product stands inside.
std::string_view without_parentheses(std::string_view factor) {
    bool const bare = factor.starts_with('(') && factor.ends_with(')') &&
                      factor.find_first_of("(/", 1) == std::string_view::npos;
    return bare ? factor.substr(1, factor.size() - 2) : factor;
}

std::size_t trailing_digits(std::string_view name) {
    std::size_t count = 0;
    while (count < name.size() && name[name.size() - 1 - count] >= '0' &&
           name[name.size() - 1 - count] <= '9')
        ++count;
    return count;
}

/// The name as it was before the office lowered its second capital: `Mpa` was `MPa`.
Symbol find_respelt(FoldedName& name) {
    std::string_view const text = name.view();
    if (text.size() < 2 || text[0] < 'A' || text[0] > 'Z' || text[1] < 'a' || text[1] > 'z')
        return {};
    name.raise_second();
    return find_symbol(name.view());
}

/// Divides common factors out of two whole numbers, so that products stay exact.
void reduce(long double& a, long double& b) {
    constexpr long double limit = 9223372036854775808.0L; // 2^63
    if (a == 1 || b == 1 || a >= limit || b >= limit) return;
    auto const divisor = static_cast<long double>(
        std::gcd(static_cast<std::uint64_t>(a), static_cast<std::uint64_t>(b)));
    a /= divisor;
    b /= divisor;
}

void scale(Unit& unit, long double numerator, long double denominator) {
    reduce(numerator, unit.denominator);
    reduce(unit.numerator, denominator);
    unit.numerator *= numerator;
    unit.denominator *= denominator;
}

long double power_of_ten(int exponent) {
    long double power = 1;
    for (int e = 0; e < exponent; ++e) power *= 10;
    return power;
}

void apply_prefix(Unit& unit, int exponent) {
    if (exponent > 0) scale(unit, power_of_ten(exponent), 1);
    if (exponent < 0) scale(unit, 1, power_of_ten(-exponent));
}

bool within(int exponent) { return exponent >= -largest_power && exponent <= largest_power; }

bool fits(Dimension a, Dimension b, int exponent) {
    return within(a.length + b.length * exponent) && within(a.mass + b.mass * exponent) &&
           within(a.time + b.time * exponent) && within(a.temperature + b.temperature * exponent) &&
           within(a.amount + b.amount * exponent);
}

} // namespace

char32_t pressure_mark(Cursor at) {
    if (!at.take(U'(')) return 0;
    char32_t const mark = *at;
    if (mark != U'a' && mark != U'g') return 0;
    at.advance();
    return *at == U')' ? mark : 0;
}

bool UnitExpression::starts(Cursor const& at) {
    if (*at == U'1') return !is_digit(at.following());
    if (*at == U'(') return pressure_mark(at) == 0 && !is_coverage(at);
    return is_symbol_start(*at) || is_foreign_letter(*at);
}

void UnitExpression::read(Unit& unit) {
    quotient(unit);
    if (*at_ == U' ' || *at_ == U'(') read_mark(unit);
}

void UnitExpression::read_mark(Unit& unit) {
    Cursor ahead = at_;
    ahead.skip_spaces();
    char32_t const mark = *ahead == U'(' ? pressure_mark(ahead) : 0;
    if (mark == 0) return;
    if (unit.dimension != dimension<Pressure> || unit.reading != Reading::plain)
        refuse("a unit without a mark such as `(g)` behind it",
               "take the mark out of the unit; `(a)` and `(g)` belong to pressures alone");
    for (int character = 0; character < 3; ++character) ahead.advance();
    at_ = ahead;
    if (mark == U'g') unit.reading = Reading::gauge;
}

void UnitExpression::quotient(Unit& unit) {
    product(unit);
    if (*at_ != U'/' && *at_ != U' ') return;
    Cursor ahead = at_;
    ahead.skip_spaces();
    if (!ahead.take(U'/')) return;
    ahead.skip_spaces();
    at_ = ahead;
    make_part(unit);
    const char* const first_factor = at_.position();
    Unit below;
    factor(below);
    make_part(below);
    multiply(unit, below, -1);
    if (!at_.at_end() && goes_on(at_)) refuse_second_solidus(first_factor);
}

void UnitExpression::product(Unit& unit) {
    factor(unit);
    while (*at_ == U' ' || *at_ == U'.' || is_product_sign(*at_)) {
        Cursor ahead = at_;
        bool const spaced = ahead.skip_spaces();
        if (is_product_sign(*ahead) || *ahead == U'.') {
            ahead.advance();
            ahead.skip_spaces();
        } else if (!spaced || !starts(ahead)) {
            return;
        }
        at_ = ahead;
        make_part(unit);
        Unit next;
        factor(next);
        make_part(next);
        multiply(unit, next, 1);
    }
}

void UnitExpression::factor(Unit& unit) {
    if (is_symbol_start(*at_) || is_foreign_letter(*at_)) return symbol(unit);
    fraction_ = false;
    if (*at_ == U'1' && starts(at_)) {
        at_.advance();
        unit = {};
    } else if (*at_ == U'(' && starts(at_)) {
        bracketed(unit);
    } else {
        refuse_here();
    }
    read_power_of(unit);
}

void UnitExpression::bracketed(Unit& unit) {
    if (++depth_ > deepest)
        refuse("a unit with no more than 8 levels of parentheses", std::string(good_form));
    at_.advance();
    at_.skip_spaces();
    quotient(unit);
    at_.skip_spaces();
    if (at_.at_end())
        refuse("a unit whose parentheses are closed", "close the parenthesis with `)`");
    if (!at_.take(U')')) refuse_here();
    --depth_;
}

void UnitExpression::symbol(Unit& unit) {
    const char* const start = at_.position();
    const char* base_end = start;
    FoldedName name;
    for (bool ended = false; !ended;) {
        ended = *at_ == U'%';
        bool const digit = is_digit(*at_);
        char32_t const previous = *at_;
        name.push(previous);
        at_.advance();
        if (!digit) base_end = at_.position();
        ended = ended || !goes_on_in_symbol(*at_, previous);
    }
    if (*at_ == U' ' && take_percent(name.view())) name.push(U'%');

    int power = 1;
    Symbol found = find_symbol(name.view());
    if (!found) found = symbol_with_digits(start, base_end, name, power);
    unit = found.row->unit;
    fraction_ = found.row->fraction;
    apply_prefix(unit, found.exponent);
    if (power != 1) return raise(unit, power);
    read_power_of(unit);
}

/// The symbol of a name that is none as it stands: `m3` is one with a power, where `mmH2O` is a name.
Symbol UnitExpression::symbol_with_digits(const char* start, const char* base_end, FoldedName& name,
                                          int& power) {
    std::string_view const digits =
        name.view().substr(name.view().size() - trailing_digits(name.view()));
    FoldedName base = name;
    base.drop(digits.size());
    Symbol const found = digits.empty() ? Symbol{} : find_symbol(base.view());
    if (!found && !digits.empty() && find_refused_name(name.view()) != nullptr)
        refuse_name(at_.whole(), {start, static_cast<std::size_t>(at_.position() - start)},
                    name.view());
    if (!digits.empty()) power = 0;
    for (char const c : digits) power = std::min(power * 10 + (c - '0'), largest_power + 1);
    if (found) return found;
    return mended({start, static_cast<std::size_t>(base_end - start)}, base);
}

/// Whether `mol`, `vol` or `wt` goes on as `mol %`, which is one symbol.
bool UnitExpression::take_percent(std::string_view name) {
    if (name != "mol" && name != "vol" && name != "wt") return false;
    Cursor ahead = at_;
    ahead.skip_spaces();
    if (!ahead.take(U'%')) return false;
    at_ = ahead;
    return true;
}

/// The symbol that AutoCorrect has respelt, with a note; any other unknown name is refused.
Symbol UnitExpression::mended(std::string_view written, FoldedName const& name) {
    FoldedName cubed = name;
    cubed.push(U'3');
    if (find_refused_name(cubed.view()) != nullptr) { // `Nm³` as `Nm3`
        Cursor const before = at_;
        int power = 1;
        bool const is_cubed = read_power(power) && power == 3;
        std::string_view const with_power(
            written.data(), static_cast<std::size_t>(at_.position() - written.data()));
        if (is_cubed) refuse_name(at_.whole(), with_power, cubed.view());
        at_ = before;
    }
    FoldedName respelt = name;
    Symbol const found =
        find_refused_name(name.view()) == nullptr ? find_respelt(respelt) : Symbol{};
    if (!found) refuse_name(at_.whole(), written, name.view());
    if (!note_.empty()) note_ += "; ";
    note_.append(quoted(written)).append(" was read as ").append(quoted(respelt.view()));
    return found;
}

bool UnitExpression::read_power(int& power) {
    Cursor ahead = at_;
    bool const raised = ahead.take(U'^');
    if (raised && *ahead == U'(')
        refuse("a power without parentheses", "write the power as in `K^-1` or `K⁻¹`");
    char32_t const first = *ahead;
    bool const superscript = is_superscript(first);
    char32_t const zero = superscript ? superscript_zero : U'0';
    bool const negative = first == (superscript ? superscript_minus : U'-');
    if (negative || first == (superscript ? superscript_plus : U'+')) ahead.advance();
    auto const is_power_digit = [&] { return *ahead >= zero && *ahead <= zero + 9; };
    if (!is_power_digit()) {
        if (raised || superscript) refuse_here();
        return false;
    }
    power = 0;
    for (; is_power_digit(); ahead.advance())
        power = std::min(power * 10 + static_cast<int>(*ahead - zero), largest_power + 1);
    if (negative) power = -power;
    at_ = ahead;
    return true;
}

void UnitExpression::read_power_of(Unit& base) {
    char32_t const c = *at_;
    bool const may_be_power =
        c == U'^' || c == U'-' || c == U'+' || is_digit(c) || is_superscript(c);
    int power = 1;
    if (may_be_power && read_power(power)) raise(base, power);
}

void UnitExpression::raise(Unit& base, int power) {
    if (!within(power)) refuse("a power of no more than ±99", std::string(good_form));
    make_part(base);
    Unit const once = base;
    base = {};
    multiply(base, once, power);
}

// In a product °C is a difference: J/(g·°C) is J/(g·K).
void UnitExpression::make_part(Unit& unit) {
    if (fraction_)
        refuse("a fraction such as `%` alone, without another unit",
               "take `%` out of the unit and give the fraction an argument of its own");
    if (unit.reading == Reading::gauge)
        refuse("an absolute pressure inside a product of units",
               "write the pressure without its mark, or as `bar(a)`");
    unit.reading = Reading::plain;
    unit.zero_numerator = 0;
    unit.zero_denominator = 1;
}

void UnitExpression::multiply(Unit& product, Unit const& factor, int exponent) const {
    if (!fits(product.dimension, factor.dimension, exponent))
        refuse("a unit with powers of no more than ±99", std::string(good_form));
    long double const above = exponent < 0 ? factor.denominator : factor.numerator;
    long double const below = exponent < 0 ? factor.numerator : factor.denominator;
    if (above != 1 || below != 1)
        for (int i = 0; i < std::abs(exponent); ++i) scale(product, above, below);
    constexpr long double limit = 1e300L;
    if (!(product.numerator < limit && product.denominator < limit))
        refuse("a unit whose factor to SI units is a number of ordinary size",
               std::string(good_form));
    product.dimension = product.dimension * power(factor.dimension, exponent);
}

void UnitExpression::refuse_second_solidus(const char* first_factor) {
    std::string below(first_factor, at_.position());
    while (take_join(at_)) {
        const char* const start = at_.position();
        Unit ignored;
        factor(ignored);
        below.append("·").append(
            without_parentheses({start, static_cast<std::size_t>(at_.position() - start)}));
    }
    std::string_view const whole = at_.whole();
    std::string repaired(whole.data(), first_factor);
    repaired.append("(").append(below).append(")");
    repaired.append(at_.position(), whole.data() + whole.size());
    refuse(
        "a unit with one solidus and one factor after it; everything below it goes in parentheses",
        write_instead(repaired));
}

void UnitExpression::refuse(std::string needed, std::string repair) const {
    refuse_unfit(shown(at_.whole()), std::move(needed), std::move(repair));
}

void UnitExpression::refuse_here() const { refuse_rest(at_); }

void refuse_rest(Cursor const& at) {
    std::string_view const whole = at.whole();
    std::string const needed = "a unit such as `kJ/(kg·K)`";
    if (at.at_end()) refuse_unfit(shown(whole), needed + " to the end", std::string(good_form));
    std::string_view const rest = at.rest();
    if (*at == U'-' && UnitExpression::starts(after_sign(at)))
        refuse_unfit(shown(whole), needed + "; a hyphen does not multiply",
                     write_instead(std::string(whole.data(), at.position()) + "·" +
                                   std::string(after_sign(at).rest())));
    if (UnitExpression::starts(at))
        refuse_unfit(
            shown(whole), needed + "; a sign of multiplication is missing",
            write_instead(std::string(whole.data(), at.position()) + "·" + std::string(rest)));
    if (is_digit(*at))
        refuse_unfit(shown(whole), needed + "; a number stands inside it at " + quoted(rest),
                     "write one number, then the unit");
    refuse_unfit(shown(whole), needed + "; " + quoted(rest) + " does not go on from there",
                 std::string(good_form));
}

} // namespace core::text
