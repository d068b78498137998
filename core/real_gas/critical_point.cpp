// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/critical_point.h"

#include <algorithm>
#include <array>
#include <cctype>

namespace core::real_gas {
namespace {

#include "critical_constants.inc"

bool is_part_of_name(unsigned char c) { return std::isalnum(c) || c == ',' || c >= 0x80; }

/// Walks through a name past what does not count: blanks, hyphens, `n-` before a chain, capitals.
class Letters {
public:
    explicit Letters(std::string_view text) : rest_(text.substr(text.starts_with("n-") ? 2 : 0)) {}

    /// The next letter in small, or 0 at the end.
    int next() {
        while (!rest_.empty()) {
            const auto letter = static_cast<unsigned char>(rest_.front());
            rest_.remove_prefix(1);
            if (is_part_of_name(letter)) return std::tolower(letter);
        }
        return 0;
    }

private:
    std::string_view rest_;
};

/// `n-Butane`, `butane` and `Butane` are one name.
bool same_name(std::string_view a, std::string_view b) {
    Letters left(a), right(b);
    for (;;) {
        const int letter = left.next();
        if (letter != right.next()) return false;
        if (letter == 0) return true;
    }
}

CriticalPoint const* by_formula(std::string_view formula) {
    CriticalPoint const* found = nullptr;
    for (CriticalPoint const& each : critical_table) {
        if (each.formula != formula) continue;
        if (found) return nullptr; // isomers
        found = &each;
    }
    return found;
}

} // namespace

std::span<const CriticalPoint> critical_points() { return critical_table; }

CriticalPoint const* find_critical_point(std::string_view text) {
    const auto named = std::ranges::find_if(
        critical_table, [&](CriticalPoint const& each) { return same_name(each.name, text); });
    return named != critical_table.end() ? &*named : by_formula(text);
}

} // namespace core::real_gas
