// SPDX-License-Identifier: MPL-2.0
#include "core/materials/own_material.h"

#include "core/text/characters.h"

#include <cmath>

namespace core::materials {

namespace {

constexpr std::size_t longest_name = 100;
constexpr double near_transition = 1;

double kelvin(Temperature t) { return absolute(t).value(); }

} // namespace

std::string described(Basis basis) {
    switch (basis) {
    case Basis::molar:
        return "molar, J/(mol·K)";
    case Basis::specific:
        return "specific, J/(kg·K)";
    case Basis::total:
        break;
    }
    return "of the whole, J/K";
}

OwnMaterial OwnMaterial::measured(Basis basis, std::vector<double> temperatures,
                                  std::vector<double> heat_capacities) {
    OwnMaterial made(basis, measured_table(temperatures, heat_capacities));
    made.temperatures_ = std::move(temperatures);
    made.heat_capacities_ = std::move(heat_capacities);
    made.find_joints();
    return made;
}

OwnMaterial OwnMaterial::correlated(Basis basis, std::vector<CorrelationRow> rows) {
    OwnMaterial made(basis, correlation(rows));
    made.rows_ = std::move(rows);
    made.find_joints();
    return made;
}

void OwnMaterial::set_name(std::string_view name) {
    const bool plain = std::all_of(name.begin(), name.end(), [](char c) {
        return static_cast<unsigned char>(c) >= 0x20 && c != '"';
    });
    if (name.size() > longest_name || !plain)
        refuse_unfit(text::shown(name),
                     "a name of no more than 100 bytes in one line, without `\"`",
                     "shorten the name");
    name_ = name;
}

void OwnMaterial::set_molar_mass(MolarMass mass) {
    if (!(mass.value() > 0) || std::isinf(mass.value()))
        refuse_impossible(core::written(mass), "a molar mass above 0", "check the molar mass");
    molar_mass_ = mass;
}

double OwnMaterial::from() const {
    return std::visit([](auto const& curve) { return curve.from(); }, curve_);
}

double OwnMaterial::to() const {
    return std::visit([](auto const& curve) { return curve.to(); }, curve_);
}

Change OwnMaterial::heating(double from, double to) const {
    return std::visit([&](auto const& curve) { return curve.heating(from, to); }, curve_);
}

Change OwnMaterial::transition(double at) const {
    return std::visit([&](auto const& curve) { return curve.transition(at); }, curve_);
}

std::vector<double> OwnMaterial::breakpoints() const {
    return std::visit(
        [](auto const& curve) {
            std::vector<double> all;
            for (std::size_t i = 1; i < curve.size(); ++i) all.push_back(curve[i].from());
            return all;
        },
        curve_);
}

std::string OwnMaterial::written() const {
    return name_.empty()
               ? "the material from " + core::written(from()) + " to " + core::written(to()) + " K"
               : name_;
}

double OwnMaterial::enthalpy(double from, double to) const {
    return std::visit([&](auto const& curve) { return curve.enthalpy(from, to); }, curve_);
}

double OwnMaterial::entropy(double from, double to) const {
    return std::visit([&](auto const& curve) { return curve.entropy(from, to); }, curve_);
}

double OwnMaterial::heat_capacity(double t) const {
    return std::visit([&](auto const& curve) { return curve.heat_capacity(t); }, curve_);
}

EndState OwnMaterial::end_of_heating(double from, double heat) const {
    return std::visit([&](auto const& curve) { return curve.end_of_heating(from, heat); }, curve_);
}

void OwnMaterial::find_joints() {
    joints_ = {from()};
    for (std::size_t i = 1; i < temperatures_.size(); ++i)
        if (is_same(temperatures_[i - 1], temperatures_[i]))
            joints_.push_back(temperatures_[i - 1]);
    for (std::size_t i = 1; i < rows_.size(); ++i) joints_.push_back(rows_[i - 1].to);
    joints_.push_back(to());
}

namespace {

/// The row at a temperature; at a joint the lower one.
std::size_t row_at(std::span<const CorrelationRow> rows, double t) {
    std::size_t i = 0;
    while (i + 1 < rows.size() && t > rows[i].to) ++i;
    return i;
}

bool is_of(std::string_view name, std::string_view wanted) {
    return name == wanted || (wanted == "cr" && name.starts_with("cr,"));
}

void check_phase(std::span<const CorrelationRow> rows, std::string_view wanted) {
    std::string names;
    for (CorrelationRow const& row : rows) {
        if (is_of(row.phase, wanted)) return;
        const std::string name = text::quoted(row.phase);
        if (!row.phase.empty() && names.find(name) == std::string::npos)
            names += (names.empty() ? "" : ", ") + name;
    }
    refuse_unfit(text::shown(wanted),
                 names.empty() ? "a material whose rows name their phases"
                               : "a phase of the material: " + names,
                 names.empty() ? "add a column headed `phase`" : "write one of them");
}

/// The phases a change leads from and to, which a row with a spread stands between.
void check_named(std::span<const CorrelationRow> rows, std::size_t i) {
    const bool named =
        i > 0 && i + 1 < rows.size() && !rows[i - 1].phase.empty() && !rows[i + 1].phase.empty();
    if (!named)
        refuse_unfit("the row from " + written(rows[i].from) + " K",
                     "named phases in the rows below and above a spread",
                     "name the phases in the column headed `phase`");
}

double share_in_row(std::span<const CorrelationRow> rows, std::size_t i, double t,
                    std::string_view wanted) {
    CorrelationRow const& row = rows[i];
    if (!row.phase.empty()) return is_of(row.phase, wanted) ? 1 : 0;
    check_named(rows, i);
    const double made = std::clamp((t - row.from) / (row.to - row.from), 0.0, 1.0);
    return (is_of(rows[i - 1].phase, wanted) ? 1 - made : 0) +
           (is_of(rows[i + 1].phase, wanted) ? made : 0);
}

} // namespace

double OwnMaterial::fraction_of_phase(std::string_view phase, EndState end) const {
    check_phase(rows_, phase);
    const double t = kelvin(end.temperature);
    const std::size_t i = row_at(rows_, t);
    const double below = share_in_row(rows_, i, t, phase);
    if (end.share == 0) return below;
    return (1 - end.share) * below + end.share * share_in_row(rows_, i + 1, t, phase);
}

double OwnMaterial::spread_at(double t) const {
    return rows_.empty() ? 0 : rows_[row_at(rows_, t)].spread;
}

void require(OwnMaterial const& material, Basis basis) {
    if (material.basis() == basis) return;
    refuse_unfit(material.written() + ": " + described(material.basis()),
                 "a heat capacity that is " + described(basis), "state it on that basis");
}

namespace {

/// What is summed up on the way.
struct Heat {
    static constexpr const char* integral = "∫cp dT = ";
    static double of(OwnMaterial const& m, double a, double b) { return m.enthalpy(a, b); }
    static double jump(Change change) { return change.enthalpy; }
    static constexpr const char* units[] = {" J/mol", " J/kg", " J"};
};
struct EntropyTakenUp {
    static constexpr const char* integral = "∫cp/T dT = ";
    static double of(OwnMaterial const& m, double a, double b) { return m.entropy(a, b); }
    static double jump(Change change) { return change.entropy; }
    static constexpr const char* units[] = {" J/(mol·K)", " J/(kg·K)", " J/K"};
};

template<class Taken>
std::string valued(OwnMaterial const& material, double value) {
    return written(value) + Taken::units[static_cast<std::size_t>(material.basis())];
}

std::string place(double from, double to) {
    return "from " + written(from) + " to " + written(to) + " K";
}

/// A stretch that does not begin with a transition.
template<class Taken>
void tell_stretch(OwnMaterial const& material, double from, double to, Notes const& notes) {
    notes.step([&] {
        const double entered = Taken::jump(material.transition(from));
        const double all = Taken::of(material, from, to);
        const double spread = material.spread_at(to);
        return place(from, to) + ": " + Taken::integral + valued<Taken>(material, all - entered) +
               (spread > 0 ? ", with its part of the latent heat of the row, " +
                                 valued<Heat>(material, spread)
                           : "");
    });
}

void tell_transition(OwnMaterial const& material, double at, Notes const& notes) {
    const Change change = material.transition(at);
    if (change.enthalpy == 0) return;
    notes.step([&] {
        return "transition at " + written(at) +
               " K: ΔH = " + valued<Heat>(material, change.enthalpy) +
               ", ΔS = ΔH / T = " + valued<EntropyTakenUp>(material, change.entropy);
    });
}

/// The joints from a temperature on.
std::span<const double> joints_from(OwnMaterial const& material, double t) {
    const auto all = material.joints();
    const auto first = std::lower_bound(all.begin(), all.end(), t);
    return all.subspan(static_cast<std::size_t>(first - all.begin()));
}

void remark_near(OwnMaterial const& material, double t, Notes const& notes) {
    for (const double at : joints_from(material, t - near_transition)) {
        if (at > t + near_transition) break;
        if (material.transition(at).enthalpy == 0) continue;
        notes.remark([&] {
            return written(t) + " K is within 1 K of the transition at " + written(at) +
                   " K; taken as the phase " + (t > at ? "above" : "below");
        });
    }
}

template<class Taken>
void tell_way(OwnMaterial const& material, double low, double high, Notes const& notes) {
    double begin = low;
    for (const double at : joints_from(material, low)) {
        if (at >= high) break;
        if (at > begin) tell_stretch<Taken>(material, begin, at, notes);
        tell_transition(material, at, notes);
        begin = at;
    }
    tell_stretch<Taken>(material, begin, high, notes);
}

template<class Taken>
double taken_up(OwnMaterial const& material, Temperature from, Temperature to, Notes const& notes) {
    const double a = kelvin(from), b = kelvin(to);
    const double sum = Taken::of(material, a, b);
    tell_way<Taken>(material, std::min(a, b), std::max(a, b), notes);
    notes.step([&] {
        return (b < a ? "sum, negative for cooling: " : "sum: ") + valued<Taken>(material, sum);
    });
    remark_near(material, a, notes);
    if (a != b) remark_near(material, b, notes);
    return sum;
}

} // namespace

double heat_taken_up(OwnMaterial const& material, Temperature from, Temperature to,
                     Notes const& notes) {
    return taken_up<Heat>(material, from, to, notes);
}

double entropy_taken_up(OwnMaterial const& material, Temperature from, Temperature to,
                        Notes const& notes) {
    return taken_up<EntropyTakenUp>(material, from, to, notes);
}

double heat_capacity_at(OwnMaterial const& material, Temperature t, Notes const& notes) {
    const double cp = material.heat_capacity(kelvin(t));
    if (const double spread = material.spread_at(kelvin(t)); spread > 0)
        notes.remark([&] {
            return "without the latent heat of the row, " + valued<Heat>(material, spread) +
                   ", which is taken up evenly on its way";
        });
    remark_near(material, kelvin(t), notes);
    return cp;
}

EndState end_of_heating(OwnMaterial const& material, Temperature from, double heat,
                        Notes const& notes) {
    const EndState end = material.end_of_heating(kelvin(from), heat);
    if (end.share > 0)
        notes.remark([&] {
            return "ends in the transition at " + written(end.temperature) +
                   ", of which the share " + written(end.share) + " is made";
        });
    return end;
}

} // namespace core::materials
