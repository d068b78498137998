// SPDX-License-Identifier: MPL-2.0
#include "tests/registration/formula_evaluator.h"

#include <charconv>
#include <cmath>
#include <numeric>
#include <stdexcept>

namespace tests {
namespace {

using Values = std::vector<double>;
using Symbols = std::map<std::string, Values, std::less<>>;

template<class Operation>
Values each(Values const& a, Values const& b, Operation operation) {
    const std::size_t count = std::max(a.size(), b.size());
    Values result(count);
    for (std::size_t i = 0; i < count; ++i)
        result[i] = operation(a[a.size() == 1 ? 0 : i], b[b.size() == 1 ? 0 : i]);
    return result;
}

// sum = product { (+|-) product };  product = sign { (·|/) sign };  sign = -sign | power;
// power = atom [ ^ sign ];  atom = number | word | word( sum ) | Σ( sum ) | ( sum )
class Evaluator {
public:
    Evaluator(std::string_view text, Symbols const& symbols) : rest_(text), symbols_(symbols) {}

    double run() {
        const Values values = sum();
        skip();
        if (!rest_.empty() || values.size() != 1) fail();
        return values[0];
    }

private:
    [[noreturn]] void fail() const {
        throw std::logic_error("cannot evaluate at: " + std::string(rest_));
    }
    void skip() {
        while (rest_.starts_with(' ')) rest_.remove_prefix(1);
    }
    bool take(std::string_view token) {
        skip();
        if (!rest_.starts_with(token)) return false;
        rest_.remove_prefix(token.size());
        return true;
    }
    Values bracketed() {
        if (!take("(")) fail();
        Values values = sum();
        if (!take(")")) fail();
        return values;
    }

    Values sum() {
        Values values = product();
        for (;;) {
            if (take("+"))
                values = each(values, product(), std::plus<>());
            else if (take("-"))
                values = each(values, product(), std::minus<>());
            else
                return values;
        }
    }
    Values product() {
        Values values = sign();
        for (;;) {
            if (take("·"))
                values = each(values, sign(), std::multiplies<>());
            else if (take("/"))
                values = each(values, sign(), std::divides<>());
            else
                return values;
        }
    }
    Values sign() {
        if (!take("-")) return power();
        return each(Values{0}, sign(), std::minus<>());
    }
    Values power() {
        Values base = atom();
        if (!take("^")) return base;
        return each(base, sign(), [](double a, double b) { return std::pow(a, b); });
    }
    Values atom() {
        skip();
        if (rest_.starts_with('(')) return bracketed();
        if (take("Σ")) {
            const Values values = bracketed();
            return {std::accumulate(values.begin(), values.end(), 0.0)};
        }
        if (!rest_.empty() && rest_[0] >= '0' && rest_[0] <= '9') return number();
        return word();
    }
    Values number() {
        double value = 0;
        const auto end = std::from_chars(rest_.data(), rest_.data() + rest_.size(), value).ptr;
        rest_.remove_prefix(static_cast<std::size_t>(end - rest_.data()));
        return {value};
    }
    Values word() {
        std::size_t length = 0;
        while (length < rest_.size() &&
               std::string_view(" ()/^+-").find(rest_[length]) == std::string_view::npos)
            ++length;
        const std::string_view name = rest_.substr(0, length);
        rest_.remove_prefix(length);
        if (name == "ln" || name == "exp")
            return each(bracketed(), Values{0},
                        [&](double a, double) { return name == "ln" ? std::log(a) : std::exp(a); });
        const auto found = symbols_.find(name);
        if (found == symbols_.end()) fail();
        return found->second;
    }

    std::string_view rest_;
    Symbols const& symbols_;
};

} // namespace

double evaluate(std::string_view formula, Symbols const& symbols) {
    return Evaluator(formula, symbols).run();
}

} // namespace tests
