// SPDX-License-Identifier: MPL-2.0
#include "core/materials/cubic_piece.h"

#include "core/ratio.h"

namespace core::materials {

namespace {

/// A point of the interval by its distances from both ends, each exact where it is small.
struct Place {
    double behind, ahead;
};

/// The polar form of the cubic at three places; the cubic itself where they agree.
double blossom(CubicPiece::Ordinates b, Place u, Place v, Place w) {
    const std::array<Place, 3> places{u, v, w};
    std::size_t count = 3;
    for (Place const& p : places) {
        for (std::size_t i = 0; i < count; ++i) b[i] = p.ahead * b[i] + p.behind * b[i + 1];
        --count;
    }
    return b[0];
}

/// σ(z²) = 1/5 + z²/7 + z⁴/9 + ... = (artanh(z)/z - 1 - z²/3) / z⁴, which enters times z².
double tail_of_artanh(double z, double artanh) {
    const double square = z * z;
    if (z > 0.3) return (artanh / z - 1 - square / 3) / (square * square);
    double sum = 0;
    // From the last term that counts, 0.09^16 = 2e-17, inwards.
    for (int odd = 37; odd >= 5; odd -= 2) sum = sum * square + 1.0 / odd;
    return sum;
}

} // namespace

double CubicPiece::heat_capacity(double t) const {
    const double width = to_ - from_;
    const Place place{(t - from_) / width, (to_ - t) / width};
    return blossom(ordinates_, place, place, place);
}

CubicPiece::Ordinates CubicPiece::part(double low, double high) const {
    if (low == from_ && high == to_) return ordinates_;
    const double width = to_ - from_;
    const Place l{(low - from_) / width, (to_ - low) / width};
    const Place h{(high - from_) / width, (to_ - high) / width};
    return {blossom(ordinates_, l, l, l), blossom(ordinates_, l, l, h),
            blossom(ordinates_, l, h, h), blossom(ordinates_, h, h, h)};
}

double CubicPiece::enthalpy(double low, double high) const {
    const Ordinates b = part(low, high);
    return (high - low) * ((b[0] + b[3]) + (b[1] + b[2])) / 4;
}

// With T = Tm·(1 + z·t), t from -1 to 1, the part is a0 + a1·t + a2·t² + a3·t³, and
// ∫cp/T dT = Σ a_k·A_k with A_k = ∫ z·t^k / (1 + z·t) dt; A_0 = ln(high / low), and from
// A_k = ∫t^(k-1) dt - A_(k-1) / z the others follow, here with what cancels taken out.
double CubicPiece::entropy(double low, double high) const {
    const Ordinates b = part(low, high);
    const double z = (high - low) / (low + high);
    const double ln = ln_ratio(high, low);
    const double fifth = tail_of_artanh(z, ln / 2), third = 1.0 / 3 + z * z * fifth;
    const double outer = b[0] + b[3], inner = 3 * (b[1] + b[2]);
    const double outer_rise = b[3] - b[0], inner_rise = 3 * (b[2] - b[1]);
    const double a0 = outer + inner, a1 = 3 * outer_rise + inner_rise;
    const double a2 = 3 * outer - inner, a3 = outer_rise - inner_rise;
    return (a0 * ln + 2 * z * (a2 * third - z * (a1 * third + a3 * fifth))) / 8;
}

} // namespace core::materials
