// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/choice.h"
#include "registration/molar_mass.h"

#include <boost/container/static_vector.hpp>

#include <optional>
#include <string>
#include <vector>

namespace registration {

/// The arguments of one call, sorted by what they are for.
struct Arguments {
    Arguments(Entry const&, std::span<const Block>);

    Given amount, show;
    boost::container::static_vector<Given, Entry::most_arguments> inputs;

    std::span<const Given> given() const { return {inputs.data(), inputs.size()}; }
};

/// What a mole weighs, in every row. A row whose substance is not known throws its Failure: rows that
/// have failed already are not asked.
struct MolarMasses {
    double only = 0;
    Given const* given = nullptr; ///< a column of substances, or null where one stands for all
    Need::Kind kind = Need::Kind::named;
    double operator()(std::size_t row) const {
        return given ? molar_mass_of(kind, *given, row) : only;
    }
};

/// One call under way: the overload chosen, the rows there are, and what the amount does to the
/// result. It can be computed again and again while inputs are moved.
class Evaluation {
public:
    /// Chooses and checks; throws the Failure that ends the call as a whole.
    Evaluation(Entry const&, Arguments&);

    Results results(core::Notes const&, bool explain) const;
    /// The same before the amount multiplies it.
    Results results_without_amount(core::Notes const&, bool explain) const;

    /// Combined standard uncertainty of each row by JCGM 100:2008, 5.1.3 note 2: each input moved
    /// by plus and minus its own, half the difference, root sum of squares, inputs independent;
    /// published uncertainties of the tables come in as the relations tell them.
    /// Where one side is refused the other side's difference is taken; where both are, the row is
    /// an error. `remarks` hears of it.
    std::vector<double> uncertainties(Results const& nominal, std::vector<std::string>* remarks);

    Form const& form() const { return *choice_.form; }
    Overload const& overload() const { return *choice_.overload; }
    Outcome outcome() const { return outcome_; } ///< after the amount
    Share share() const { return share_; }
    std::size_t rows() const { return rows_; }
    bool across() const { return across_; }
    bool has_blanks() const { return !states_.empty(); }
    bool blank(std::size_t row) const { return !states_.empty() && states_[row] == State::blank; }
    std::vector<std::size_t> const& blanks_of_first() const { return blanks_of_first_; }
    /// Whether the call names a substance, gas or mixture, whose mole then has a mass.
    bool names_substance() const;
    /// What a mole weighs in every row; a substance that stands for all of them is looked up once.
    MolarMasses molar_masses() const;
    Entry const& entry() const { return entry_; }
    Arguments const& arguments() const { return arguments_; }

private:
    enum class State : std::uint8_t { good, blank, bad };
    enum class Bridge : std::uint8_t { none, times_molar_mass, over_molar_mass };

    /// A row-by-row argument that is a column.
    struct Listed {
        Given const* given;
        Need const* need;
        int position;
    };

    void align_whole_columns();
    std::vector<Listed> listed_columns() const;
    void mark_text(Listed const&, std::size_t row);
    void spoil(std::size_t row, core::Failure, int position);
    void measure();
    void measure_amount();
    void measure(Given const&, std::size_t count, bool across, int position);
    void mark_rows();
    void weigh_amount();
    void multiply(Results&) const;
    double amount_factor(std::size_t row, MolarMasses const&) const;
    MolarMasses bridging_masses() const;

    /// The sums of squares as inputs are moved one after the other.
    struct Variances {
        Results const& nominal;
        std::vector<double> of_rows;
        std::size_t inputs = 0;
        bool one_sided = false;
    };
    static void count_inputs(std::size_t count);
    template<class Move>
    void add_variance(Variances&, Given&, Move);
    void move_numbers(Given&, bool whole, Variances&);
    void move_places(Given&, Need const&, Variances&);
    void add_uncertainty_of_data(Variances&) const;

    Entry const& entry_;
    Arguments& arguments_;
    Choice choice_;
    Outcome outcome_;
    Share share_ = Share::none;
    std::size_t rows_ = 1;
    bool across_ = false;
    Bridge bridge_ = Bridge::none;
    std::vector<State> states_;    ///< empty where every row is good
    std::vector<RowFault> faults_; ///< of the bad rows
    std::vector<std::size_t> blanks_of_first_;
};

} // namespace registration
