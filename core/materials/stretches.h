// SPDX-License-Identifier: MPL-2.0
#pragma once

// Pieces of a heat capacity one above the other, with the transitions between them. What heating
// takes up is a difference of running sums, held in twice the digits of a double, so that two
// temperatures far above the first piece keep theirs: the search for their pieces is all it costs.

#include "core/failure.h"
#include "core/substances/end_states.h"
#include "core/substances/material.h"
#include "core/temperature.h"
#include "core/written.h"

#include <algorithm>
#include <cmath>
#include <string>
#include <vector>

namespace core::materials {

using Change = substances::Material::Change;
using EndState = substances::EndState;

/// Two temperatures that differ by rounding alone are one.
inline constexpr double rounding_of_temperature = 1e-12;
inline bool is_above(double a, double b) { return a - b > rounding_of_temperature * b; }
inline bool is_same(double a, double b) { return !is_above(a, b) && !is_above(b, a); }

[[noreturn]] inline void refuse_outside(double t, double from, double to) {
    refuse_impossible(written(t) + " K",
                      "a temperature from " + written(from) + " to " + written(to) +
                          " K, the range of the material",
                      "stay inside the range; nothing is extrapolated");
}

/// A sum that grows, in two doubles that do not overlap.
/// Source: T. J. Dekker, Numer. Math. 18 (1971) 224, and D. E. Knuth's sum of two doubles.
class RunningSum {
public:
    void add(double term) {
        const double sum = high_ + term;
        const double taken = sum - high_;
        low_ += (high_ - (sum - taken)) + (term - taken);
        high_ = sum + low_;
        low_ -= high_ - sum;
    }
    double minus(RunningSum const& other) const {
        return (high_ - other.high_) + (low_ - other.low_);
    }

private:
    double high_ = 0, low_ = 0;
};

/// The root of a rising function, `value(t)` with the derivative `slope(t)`, between two bounds.
/// Method: Newton's, and halving where it would leave the bracket or gain less than halving.
/// Accuracy: a rounding of the temperature. Bounds: 200 steps.
template<class Value, class Slope>
double rising_root(double low, double high, Value&& value, Slope&& slope) {
    double t = low + (high - low) / 2, last = high - low;
    for (int step = 0; step < 200; ++step) {
        const double missing = value(t);
        if (missing == 0) return t;
        (missing < 0 ? low : high) = t;
        const double newton = t - missing / slope(t);
        if (std::abs(newton - t) <= 2e-16 * t) return std::clamp(newton, low, high);
        const bool gains = newton > low && newton < high && std::abs(newton - t) < last / 2;
        const double next = gains ? newton : low + (high - low) / 2;
        last = std::abs(next - t);
        if (next <= low || next >= high) return next;
        t = next;
    }
    throw Failure(Failure::Kind::unconverged, "", "an iteration that converges in 200 steps",
                  "check the heat capacity of the material");
}

/// A piece has from(), to(), heat_capacity(t), slope(t), enthalpy(low, high), entropy(low, high).
/// At a temperature where two meet, the lower one holds: a transition there is not made yet.
template<class Piece>
class Stretches {
public:
    /// Puts a piece on top, entered with a transition of this enthalpy, zero for none.
    void add(Piece piece, double transition) {
        const double enthalpy = piece.enthalpy(piece.from(), piece.to());
        const double entropy = piece.entropy(piece.from(), piece.to());
        const Change entered{transition, transition / piece.from()};
        Joint joint{entered, {}, {}};
        if (!joints_.empty()) joint = {entered, joints_.back().enthalpy, joints_.back().entropy};
        joint.enthalpy.add(entered.enthalpy);
        joint.entropy.add(entered.entropy);
        joint.enthalpy.add(enthalpy);
        joint.entropy.add(entropy);
        joints_.push_back(joint);
        pieces_.push_back(std::move(piece));
    }

    std::size_t size() const { return pieces_.size(); }
    Piece const& operator[](std::size_t i) const { return pieces_[i]; }
    /// Of entering piece i from the one below.
    Change transition_below(std::size_t i) const { return joints_[i].entered; }
    double from() const { return pieces_.front().from(); }
    double to() const { return pieces_.back().to(); }

    /// An end missed by rounding is the end. Refuses what lies outside the range (#NUM!).
    double inside(double t) const {
        if (is_above(from(), t) || is_above(t, to()) || !(t > 0)) refuse_outside(t, from(), to());
        return std::clamp(t, from(), to());
    }

    std::size_t index_of(double t) const {
        const auto found = std::partition_point(pieces_.begin(), pieces_.end() - 1,
                                                [&](Piece const& piece) { return piece.to() < t; });
        return static_cast<std::size_t>(found - pieces_.begin());
    }

    double heat_capacity(double t) const {
        t = inside(t);
        return pieces_[index_of(t)].heat_capacity(t);
    }

    /// ∫cp dT and ∫cp/T dT with the transitions on the way; cooling is exactly the negative.
    double enthalpy(double from, double to) const {
        return taken_up<&Piece::enthalpy, &Joint::enthalpy, &Change::enthalpy>(from, to);
    }
    double entropy(double from, double to) const {
        return taken_up<&Piece::entropy, &Joint::entropy, &Change::entropy>(from, to);
    }
    Change heating(double from, double to) const { return {enthalpy(from, to), entropy(from, to)}; }

    Change transition(double at) const {
        const std::size_t i = index_of(at);
        if (i + 1 == size() || pieces_[i].to() != at) return {};
        return transition_below(i + 1);
    }

    /// Where heating ends that takes up this heat: exact on the step of a transition.
    /// Refuses an end outside the range (#NUM!).
    EndState end_of_heating(double from, double heat) const {
        from = inside(from);
        if (!std::isfinite(heat)) refuse_impossible("", "a finite heat", "check the heat");
        if (heat == 0) return {Temperature::kelvin(from), 0};
        const double below = enthalpy(from, this->from());
        if (heat <= below) return at_limit(this->from(), heat, below);
        const std::size_t i = first_reaching(from, heat);
        if (i == size()) return at_limit(to(), heat, enthalpy(from, to()));
        return end_in(i, heat - enthalpy(from, pieces_[i].from()));
    }

private:
    /// A piece with the sums up to its upper end, that of entering it included.
    struct Joint {
        Change entered;
        RunningSum enthalpy, entropy;
    };

    template<auto integral, auto sum, auto jump>
    double taken_up(double from, double to) const {
        from = inside(from);
        to = inside(to);
        return from <= to ? rise<integral, sum, jump>(from, to)
                          : -rise<integral, sum, jump>(to, from);
    }

    template<auto integral, auto sum, auto jump>
    double rise(double from, double to) const {
        const std::size_t i = index_of(from), j = index_of(to);
        Piece const &first = pieces_[i], &last = pieces_[j];
        if (i == j) return (first.*integral)(from, to);
        return (first.*integral)(from, first.to()) + (joints_[j - 1].*sum).minus(joints_[i].*sum) +
               joints_[j].entered.*jump + (last.*integral)(last.from(), to);
    }

    /// The first piece at whose upper end the heat is taken up.
    std::size_t first_reaching(double from, double heat) const {
        const auto found =
            std::partition_point(pieces_.begin(), pieces_.end(), [&](Piece const& piece) {
                return enthalpy(from, piece.to()) < heat;
            });
        return static_cast<std::size_t>(found - pieces_.begin());
    }

    EndState end_in(std::size_t i, double heat) const {
        Piece const& piece = pieces_[i];
        const double latent = joints_[i].entered.enthalpy;
        const double rest = heat - latent;
        if (rest <= 0)
            return {Temperature::kelvin(piece.from()),
                    latent > 0 ? std::clamp(heat / latent, 0.0, 1.0) : 0};
        if (rest >= piece.enthalpy(piece.from(), piece.to()))
            return {Temperature::kelvin(piece.to()), 0};
        const double t = rising_root(
            piece.from(), piece.to(),
            [&](double at) { return piece.enthalpy(piece.from(), at) - rest; },
            [&](double at) { return piece.slope(at); });
        return {Temperature::kelvin(t), 0};
    }

    /// An end that lies beyond a limit of the range by rounding alone is the limit.
    EndState at_limit(double limit, double heat, double most) const {
        if (std::abs(heat - most) > 1e-12 * std::abs(most))
            refuse_impossible("an end " + std::string(limit == to() ? "above " : "below ") +
                                  written(limit) + " K",
                              "an end inside the range of the material, " + written(from()) +
                                  " to " + written(to()) + " K",
                              "check the heat and the amount; nothing is extrapolated");
        return {Temperature::kelvin(limit), 0};
    }

    std::vector<Piece> pieces_;
    std::vector<Joint> joints_;
};

} // namespace core::materials
