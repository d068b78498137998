// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/column.h"
#include "registration/numbers.h"

#include <cstddef>
#include <memory>
#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace core::materials {
class OwnMaterial;
}

namespace registration {

/// An uncertain number inside an argument that is no column of numbers: a row of a mixture or of a
/// material, a quantity within a text.
struct Place {
    std::size_t cell = 0, column = 0, row = 0;
    double u = 0; ///< standard uncertainty in the unit the number is in
};

/// One such number, moved by `times` its uncertainty.
struct MovedPlace {
    Place place;
    double times;
};

/// A material that was read, and what its reader remarked.
struct KeptMaterial {
    std::shared_ptr<const core::materials::OwnMaterial> material;
    std::vector<std::string> remarks;
};

/// One argument of one call. It is read only when an overload asks, in the language that overload
/// speaks: the same text may be a quantity to one and a mixture to another. What was read is kept
/// for the rest of the call.
class Given {
public:
    Given() = default;
    explicit Given(Block block) : block_(block) {}

    bool missing() const { return block_.missing(); }
    Block block() const { return block_; }

    /// Read as quantities; throws Failure where that cannot be done.
    Numbers const& numbers() const;
    /// The same without the throw: null where it cannot be read.
    Numbers const* if_numbers() const;
    core::Failure const& why_not_numbers() const { return *unreadable_; }

    /// Rows as texts and cells, for arguments that are no quantities. A column of one repeats.
    std::size_t cell_count() const { return block_.size(); }
    bool cells_across() const { return block_.rows == 1 && block_.columns > 1; }
    Cell const& cell(std::size_t row) const { return block_.cells[block_.single() ? 0 : row]; }

    /// The rectangle as plain numbers, NaN for a blank cell.
    core::Table table() const;
    /// All rows as texts.
    core::Formulas texts() const;
    /// The own material that was read from this argument, if it was.
    KeptMaterial& kept_material() const { return kept_material_; }
    /// Whether a row has no content; valid for every kind of argument.
    bool blank(std::size_t row) const;
    /// Leaves rows out of a whole column: rising indices.
    void drop(std::span<const std::size_t> rows);

    // Moving an input to see what it does to the result (JCGM 100, 5.1.3 note 2). What is moved is
    // a copy of this call's own; the sheet never sees it.
    /// Moves every row by `times` its own standard uncertainty.
    void move_all(double times);
    /// Moves one row only, for functions of a whole column.
    void move_one(std::size_t row, double times);
    /// Moves one number inside an argument of another kind.
    void move_place(Place const& place, double times) { moved_place_ = {place, times}; }
    std::optional<MovedPlace> const& moved_place() const { return moved_place_; }
    void move_back() {
        moved_.clear();
        moved_place_.reset();
    }

    /// SI values as a function gets them: moved where they are.
    const double* si() const { return moved_.empty() ? numbers().si.data() : moved_.data(); }
    const double* u() const { return numbers().uncertain() ? numbers().u.data() : nullptr; }

private:
    void read() const;

    Block block_{};
    mutable bool asked_ = false;
    mutable Numbers numbers_;
    mutable std::optional<core::Failure> unreadable_;
    mutable std::vector<double> table_;
    mutable std::vector<std::string_view> texts_;
    mutable KeptMaterial kept_material_;
    std::vector<std::size_t> dropped_;
    boost::container::small_vector<double, 1> moved_;
    std::optional<MovedPlace> moved_place_;
};

} // namespace registration
