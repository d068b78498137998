// SPDX-License-Identifier: MPL-2.0
#pragma once

// A quantity that with another fixes a state of water: which it is follows from its dimension. Dryness
// may be given in words.

#include "core/steam/pair.h"
#include "registration/argument.h"

namespace registration {

template<>
struct argument<core::steam::Coordinate> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::steam};

    class Rows {
    public:
        Rows(Given const& given, int index);
        core::steam::Coordinate operator[](std::size_t row) const {
            return si_ ? core::steam::Coordinate{kind_, si_[row * stride_]} : in_words(row);
        }

    private:
        core::steam::Coordinate in_words(std::size_t row) const;

        Given const* given_;
        int index_;
        const double* si_ = nullptr; ///< null where the rows are words
        std::size_t stride_ = 0;
        core::steam::Coordinate::Kind kind_{};
    };
};

/// The word `steam` alone, where the industrial formulation is meant and not the tables.
struct SteamWord {};
template<>
struct argument<SteamWord> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::steam_word};
    struct Rows {
        Rows(Given const&, int) {}
        SteamWord operator[](std::size_t) const { return {}; }
    };
};

} // namespace registration
