// SPDX-License-Identifier: MPL-2.0

//   quantity = number [ spread ] [ unit ] [ spread ] [ coverage ]
//            | "(" number spread ")" unit [ coverage ]
//   spread   = ( "±" | "+/-" | "+-" ) number [ unit | "%" ]    without unit: the quantity's own
//   coverage = "(k=" number ")"
//
// number stands in number.h, unit in unit_expression.h. What could be read in two ways is refused:
// `12 % ± 1 %` may mean percentage points or one hundredth of twelve.

#include "core/text/quantity.h"

#include "core/failure.h"
#include "core/text/characters.h"
#include "core/text/decimal.h"
#include "core/text/known_units.h"
#include "core/text/number.h"
#include "core/text/unit_expression.h"

#include <cmath>

namespace core::text {
namespace {

constexpr std::size_t longest = 1024;

/// An uncertainty as it is stated.
struct Spread {
    enum class Kind : std::uint8_t { absent, in_own_unit, in_unit, relative };
    Kind kind = Kind::absent;
    Decimal number;
    Unit unit{};
    double coverage = 1;
};

class Reader {
public:
    explicit Reader(std::string_view text) : at_(text) {}

    Quantity quantity();
    Spread uncertainty();
    double standard_uncertainty(Spread const& spread, double value_si, Unit const& unit) const;
    double finite(Decimal number, double si) const;
    void refuse_blank_or_long();

private:
    Decimal number_of_spread();
    Decimal value();
    bool bracketed_value();
    bool take_plus_minus();
    void spread_before_unit();
    void spread_behind_unit();
    bool unit(Quantity& result);
    void coverage();
    void end();

    [[noreturn]] void refuse(std::string needed, std::string repair) const {
        refuse_unfit(shown(at_.whole()), std::move(needed), std::move(repair));
    }
    [[noreturn]] void refuse_after_number() const;
    [[noreturn]] void refuse_percent_of_both() const;

    Cursor at_;
    Decimal value_;
    Spread spread_;
    std::string note_;
};

void Reader::refuse_blank_or_long() {
    if (at_.whole().size() > longest)
        refuse("a quantity in no more than 1024 bytes", "write the number and its unit alone");
    at_.skip_spaces();
    if (at_.at_end())
        refuse_unfit("a blank text", "a number with its unit, such as `7.3 kJ/mol`",
                     "write the number and its unit");
}

Decimal Reader::value() {
    if (!starts_number(at_))
        refuse("a number with its unit, such as `7.3 kJ/mol`", "begin with the number");
    Number const number = read_number(at_);
    if (number.has_spread) {
        spread_.kind = Spread::Kind::in_own_unit;
        spread_.number = number.spread;
    }
    return number.value;
}

Decimal Reader::number_of_spread() {
    if (spread_.kind != Spread::Kind::absent)
        refuse("one uncertainty", "state the uncertainty once, as in `(7.3 ± 0.2) kJ/mol`");
    at_.skip_spaces();
    if (!starts_number(at_))
        refuse("a number behind ±", "write the uncertainty as in `(7.3 ± 0.2) kJ/mol`");
    Number const number = read_number(at_);
    if (number.has_spread)
        refuse("an uncertainty without an uncertainty of its own",
               "write the uncertainty as one number");
    if (number.value.negative && number.value.significand != 0)
        refuse("an uncertainty that is not negative", "write the uncertainty without its sign");
    at_.skip_spaces();
    return number.value;
}

bool Reader::take_plus_minus() {
    if (*at_ != plus_minus && *at_ != U'+') return false;
    Cursor ahead = at_;
    bool const found =
        ahead.take(plus_minus) ||
        (ahead.take(U'+') && (ahead.take(U'-') || (ahead.take(U'/') && ahead.take(U'-'))));
    if (found) at_ = ahead;
    return found;
}

/// `(7.3 ± 0.2)`
bool Reader::bracketed_value() {
    if (!at_.take(U'(')) return false;
    at_.skip_spaces();
    value_ = value();
    at_.skip_spaces();
    if (!take_plus_minus())
        refuse("a number with its uncertainty inside the parentheses",
               "write it as in `(7.3 ± 0.2) kJ/mol`");
    spread_behind_unit();
    at_.skip_spaces();
    if (!at_.take(U')'))
        refuse("parentheses around a number and its uncertainty",
               "write it as in `(7.3 ± 0.2) kJ/mol`");
    return true;
}

/// `± 0.2` or `± 2 %` between the number and the unit.
void Reader::spread_before_unit() {
    spread_.number = number_of_spread();
    spread_.kind = Spread::Kind::in_own_unit;
    if (!at_.take(U'%')) return;
    spread_.kind = Spread::Kind::relative;
    at_.skip_spaces();
    if (UnitExpression::starts(at_)) return;
    refuse_percent_of_both();
}

void Reader::refuse_percent_of_both() const {
    refuse("an uncertainty that can be read in one way; `%` may belong to both numbers",
           "write `(12 ± 1) %` for percentages, or the uncertainty as a number");
}

void Reader::spread_behind_unit() {
    spread_.number = number_of_spread();
    spread_.kind = Spread::Kind::in_own_unit;
    if (at_.take(U'%')) {
        spread_.kind = Spread::Kind::relative;
    } else if (UnitExpression::starts(at_)) {
        UnitExpression(at_, note_).read(spread_.unit);
        spread_.kind = Spread::Kind::in_unit;
    }
}

bool Reader::unit(Quantity& result) {
    std::string_view const rest = at_.rest();
    if (Unit const* known = find_known_unit(rest)) {
        result.unit = *known;
        result.written_unit = rest;
        at_.pass_rest();
        return true;
    }
    if (!UnitExpression::starts(at_)) return false;
    const char* const start = at_.position();
    UnitExpression(at_, note_).read(result.unit);
    result.written_unit = {start, static_cast<std::size_t>(at_.position() - start)};
    at_.skip_spaces();
    return true;
}

void Reader::coverage() {
    if (!at_.take(U'(')) return;
    at_.skip_spaces();
    bool const k = at_.take(U'k');
    at_.skip_spaces();
    bool const equals = k && at_.take(U'=');
    at_.skip_spaces();
    if (!equals || !starts_number(at_))
        refuse("a coverage factor such as `(k=2)`", "write the coverage factor as `(k=2)`");
    Number const number = read_number(at_);
    at_.skip_spaces();
    if (number.has_spread || !at_.take(U')'))
        refuse("a coverage factor such as `(k=2)`", "write the coverage factor as `(k=2)`");
    spread_.coverage = nearest_double(number.value);
    if (!(spread_.coverage > 0) || !std::isfinite(spread_.coverage))
        refuse("a coverage factor above 0", "write the coverage factor as `(k=2)`");
    if (spread_.kind == Spread::Kind::absent)
        refuse("an uncertainty that the coverage factor belongs to",
               "state the uncertainty, as in `(7.3 ± 0.4) kJ/mol (k=2)`");
}

void Reader::end() {
    at_.skip_spaces();
    if (!at_.at_end()) refuse_rest(at_);
}

void Reader::refuse_after_number() const {
    std::string_view const whole = at_.whole();
    Cursor ahead = at_;
    std::string number(whole.data(), at_.position());
    while (number.ends_with(' ')) number.pop_back();
    bool const solidus = ahead.take(U'/');
    if (!solidus) ahead.advance();
    ahead.skip_spaces();
    std::string_view const rest =
        whole.substr(static_cast<std::size_t>(ahead.position() - whole.data()));
    if (solidus && is_digit(*ahead))
        refuse("a decimal number", "write the fraction as a decimal number, such as `0.5`");
    if (UnitExpression::starts(ahead))
        refuse("a number, a space and a unit",
               write_instead(number + (solidus ? " 1/" : " ") + std::string(rest)));
    refuse_rest(at_);
}

Quantity Reader::quantity() {
    refuse_blank_or_long();
    Quantity result;
    if (!bracketed_value()) {
        value_ = value();
        if (*at_ == U'/' || is_product_sign(*at_)) refuse_after_number();
        at_.skip_spaces();
        if (take_plus_minus()) spread_before_unit();
    }
    at_.skip_spaces();
    result.bare = !unit(result);
    if (result.bare && spread_.kind == Spread::Kind::relative) refuse_percent_of_both();
    if (take_plus_minus()) spread_behind_unit();
    at_.skip_spaces();
    if (*at_ == U'/' || is_product_sign(*at_)) refuse_after_number();
    coverage();
    end();
    result.si = finite(value_, in_si(value_, result.unit));
    result.u = standard_uncertainty(spread_, result.si, result.unit);
    result.note = std::move(note_);
    return result;
}

Spread Reader::uncertainty() {
    at_.skip_spaces();
    if (at_.at_end()) return {};
    take_plus_minus();
    spread_behind_unit();
    at_.skip_spaces();
    coverage();
    end();
    return spread_;
}

double Reader::finite(Decimal number, double si) const {
    bool const vanished = si == 0 && number.significand != 0 && number.exponent < -300;
    if (!std::isfinite(si) || vanished)
        refuse("a number between 1e-307 and 1e307 in SI units", "check the exponent of the number");
    return si;
}

bool is_fraction(Unit const& unit) {
    return unit.dimension == Dimension{} &&
           (unit.share != Share::none || unit.denominator != unit.numerator);
}

double Reader::standard_uncertainty(Spread const& spread, double value_si, Unit const& unit) const {
    switch (spread.kind) {
    case Spread::Kind::absent:
        return 0;
    case Spread::Kind::in_own_unit:
        return finite(spread.number, span_in_si(spread.number, unit)) / spread.coverage;
    case Spread::Kind::in_unit:
        if (spread.unit.dimension != unit.dimension || spread.unit.share != unit.share)
            refuse("an uncertainty in a unit of the quantity itself",
                   "state the uncertainty in the unit of the value, or in per cent");
        return finite(spread.number, span_in_si(spread.number, spread.unit)) / spread.coverage;
    case Spread::Kind::relative:
        break;
    }
    if (unit.reading == Reading::point)
        refuse("an uncertainty in kelvin; a share of a temperature in °C or °F has no meaning",
               "state the uncertainty as in `25 °C ± 0.5 K`");
    if (is_fraction(unit))
        refuse(
            "an uncertainty that can be read in one way; `%` may mean a share or percentage points",
            "write `(12 ± 1) %`, which is in percentage points");
    double const share = nearest_double(spread.number) / 100;
    return finite(spread.number, std::fabs(value_si) * share) / spread.coverage;
}

} // namespace

Quantity read_quantity(std::string_view text) { return Reader(text).quantity(); }

double read_uncertainty(std::string_view text, double value_si, Unit const& unit) {
    Reader reader(text);
    if (text.size() > longest) reader.refuse_blank_or_long();
    Spread const spread = reader.uncertainty();
    return reader.standard_uncertainty(spread, value_si, unit);
}

} // namespace core::text
