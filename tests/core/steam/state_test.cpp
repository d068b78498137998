// SPDX-License-Identifier: MPL-2.0
#include "core/steam/state.h"

#include "tests/core/expect_refusal.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <iostream>
#include <random>
#include <string>
#include <vector>

namespace {

using namespace core;
using namespace core::steam;

Temperature kelvin(double t) { return Temperature::kelvin(t); }
Positive<Pressure> pascal(double p) { return {Pressure::from_value(p)}; }
double of(Temperature t) { return absolute(t).value(); }

struct Point {
    double t, p;
};

/// Anywhere in the range: temperatures below 900 K in every other state, pressure even or its logarithm.
class Points {
public:
    Point next() {
        for (;;) {
            const double t = between(273.15, coin() ? 900 : 2273.15);
            const double top = t > 1073.15 ? 50e6 : 100e6;
            const double p = coin() ? between(611, top) : std::exp(between(0, std::log(top)));
            if (away_from_saturation(t, p)) return {t, p};
        }
    }

private:
    bool coin() { return (engine_() & 1) == 1; }
    double between(double low, double high) {
        return low + (high - low) * (static_cast<double>(engine_()) / 4294967295.0);
    }
    static bool away_from_saturation(double t, double p) {
        if (p < saturation_pressure_at(273.15) || p > critical_pressure) return true;
        return std::abs(t - saturation_temperature_at(p)) > 0.06;
    }

    std::mt19937 engine_{20261201};
};

/// Whether a state lies so near to where two regions meet that another's equation may give it back.
bool near_a_boundary(Point at) {
    const auto near = [&](double t) { return std::abs(at.t - t) < 0.5; };
    if (near(623.15) || near(1073.15)) return true;
    return at.t > 623.15 && at.t < 863.65 && at.p > 16.5e6 &&
           std::abs(at.t - boundary_temperature_2_3(at.p)) < 0.5;
}

/// Cold water, of which one volume or entropy is had in two states.
bool is_cold(Point at) { return at.t < 283.15; }

struct Worst {
    double temperature = 0, pressure = 0;
    Point at{};
    void take(Point given, State const& back) {
        const double dt = std::abs(of(back.temperature) - given.t) / given.t;
        const double dp = std::abs(back.pressure.value() - given.p) / given.p;
        if (std::max(dt, dp) > std::max(temperature, pressure)) at = given;
        temperature = std::max(temperature, dt);
        pressure = std::max(pressure, dp);
    }
};

std::ostream& operator<<(std::ostream& out, Worst const& worst) {
    return out << "T " << worst.temperature << ", p " << worst.pressure << " at " << worst.at.t
               << " K, " << worst.at.p << " Pa\n";
}

// Bounds of the way back: where the state hardly changes the given quantities, as liquid water its
// entropy with pressure, their last digits decide. h and s together fix liquid water's pressure only
// through v, a difference of large terms.
TEST(SteamStates, ComeBackFromEveryPairThatFixesThem) {
    Points points;
    Worst ph, ps, hs, ts, pv, tv;
    int counted = 0;
    for (int i = 0; i < 100'000; ++i) {
        const Point at = points.next();
        if (near_a_boundary(at)) continue;
        ++counted;
        const State state = at_temperature_and_pressure(kelvin(at.t), pascal(at.p));
        ph.take(at, at_pressure_and_enthalpy(pascal(at.p), state.enthalpy));
        ps.take(at, at_pressure_and_entropy(pascal(at.p), state.entropy));
        tv.take(at, at_temperature_and_volume(kelvin(at.t), {state.volume}));
        if (i % 4 == 0 && !is_cold(at))
            hs.take(at, at_enthalpy_and_entropy(state.enthalpy, state.entropy));
        if (is_cold(at)) continue;
        ts.take(at, at_temperature_and_entropy(kelvin(at.t), state.entropy));
        pv.take(at, at_pressure_and_volume(pascal(at.p), {state.volume}));
    }
    std::cout << counted << " states\np, h: " << ph << "p, s: " << ps << "h, s: " << hs
              << "T, s: " << ts << "p, v: " << pv << "T, v: " << tv;
    EXPECT_LT(ph.temperature, 1e-9);
    EXPECT_LT(ps.temperature, 1e-9);
    EXPECT_LT(pv.temperature, 1e-9);
    EXPECT_LT(tv.pressure, 1e-6);
    EXPECT_LT(ts.pressure, 1e-6);
    EXPECT_LT(hs.temperature, 1e-9);
    EXPECT_LT(hs.pressure, 1e-6);
}

TEST(SteamStates, OfTwoPhasesComeBackFromEveryPair) {
    for (double t = 273.16; t < 647.0; t += 0.377)
        for (const double x : {0.0, 1e-6, 0.13, 0.5, 0.87, 1.0}) {
            if (t < 283 && x < 1e-3) continue; // cold water, of which two states have what it has
            const State wet = at_temperature_and_dryness(kelvin(t), {x});
            for (State const& back : {at_pressure_and_enthalpy({wet.pressure}, wet.enthalpy),
                                      at_pressure_and_entropy({wet.pressure}, wet.entropy),
                                      at_pressure_and_volume({wet.pressure}, {wet.volume}),
                                      at_pressure_and_dryness({wet.pressure}, {x}),
                                      at_temperature_and_volume(kelvin(t), {wet.volume})}) {
                ASSERT_NEAR(of(back.temperature), t, 1e-7) << x;
                ASSERT_NEAR(back.enthalpy.value(), wet.enthalpy.value(), 0.1) << t << ' ' << x;
                ASSERT_NEAR(back.entropy.value(), wet.entropy.value(), 1e-3) << t << ' ' << x;
            }
            const State by_ts = at_temperature_and_entropy(kelvin(t), wet.entropy);
            ASSERT_NEAR(by_ts.enthalpy.value(), wet.enthalpy.value(), 0.1) << t << ' ' << x;
            const State by_hs = at_enthalpy_and_entropy(wet.enthalpy, wet.entropy);
            ASSERT_NEAR(of(by_hs.temperature), t, 1e-4) << x;
        }
}

// The quantities that fix a state are given back by the basic equations to 1e-9.
TEST(SteamStates, SatisfyTheBasicEquationsAroundTheCriticalPoint) {
    for (double p = 21.5e6; p < 23e6; p += 0.0113e6)
        for (double h = 1.9e6; h < 2.4e6; h += 7.7e3) {
            const State state = at_pressure_and_enthalpy(pascal(p), SpecificEnergy::from_value(h));
            ASSERT_NEAR(state.enthalpy.value(), h, 1e-9 * h) << p;
            ASSERT_EQ(state.pressure.value(), p);
            const State by_entropy = at_pressure_and_entropy(pascal(p), state.entropy);
            ASSERT_NEAR(by_entropy.entropy.value(), state.entropy.value(), 1e-9 * 4400)
                << p << ' ' << h;
        }
}

TEST(SteamStates, MeetAtSaturationAndTheCriticalPoint) {
    const auto meets = [](double t, double p) {
        const double above = saturation_temperature_at(p);
        EXPECT_NEAR(above, t, 1e-9 * t);
    };
    for (double t = 273.15; t <= 647.096; t += 0.5) meets(t, saturation_pressure_at(t));
    // R7-97, section 8: the critical point is met exactly.
    EXPECT_NEAR(saturation_pressure_at(critical_temperature), critical_pressure, 20);
    EXPECT_NEAR(region_3(322, 647.096).p, 22.064e6, 1);
}

// R7-97, sections 4, 5, 6 and 9 (from memory) state how far the equations of neighbouring regions may
// part: |Δv| 0.05 %, |Δh| 0.2 kJ/kg, |Δs| 0.2 J/(kg·K) but 0.4 at the boundary of regions 2 and 5.
struct Steps {
    double v = 0, h = 0, s = 0;
    void take(Properties const& a, Properties const& b) {
        v = std::max(v, std::abs(a.v / b.v - 1));
        h = std::max(h, std::abs(a.h - b.h));
        s = std::max(s, std::abs(a.s - b.s));
    }
};

TEST(SteamRegions, PartByNoMoreThanTheReleaseAllows) {
    Steps liquid_dense, vapour_dense, vapour_hot;
    for (double p = 16.53e6; p <= 100e6; p += 0.25e6)
        liquid_dense.take(region_1(623.15, p),
                          region_3(density_3(623.15, p, Side::liquid), 623.15));
    for (double t = 623.15; t <= 863.15; t += 1) {
        const double p = boundary_pressure_2_3(t);
        vapour_dense.take(region_2(t, p), region_3(density_3(t, p, Side::vapour), t));
    }
    for (double p = 0.01e6; p <= 50e6; p += 0.25e6)
        vapour_hot.take(region_2(1073.15, p), region_5(1073.15, p));
    for (Steps const& steps : {liquid_dense, vapour_dense, vapour_hot}) {
        std::cout << "v " << steps.v << ", h " << steps.h << " J/kg, s " << steps.s
                  << " J/(kg·K)\n";
        EXPECT_LT(steps.v, 0.05e-2);
        EXPECT_LT(steps.h, 0.2e3);
    }
    EXPECT_LT(liquid_dense.s, 0.2);
    EXPECT_LT(vapour_dense.s, 0.2);
    EXPECT_LT(vapour_hot.s, 0.4);
}

// dp/dT = Δs/Δv along saturation: by difference quotients of equation 30.
TEST(SteamSaturation, FollowsClausiusAndClapeyron) {
    for (double t = 275; t < 640; t += 5) {
        const double p = saturation_pressure_at(t), step = 1e-3;
        const double slope =
            (saturation_pressure_at(t + step) - saturation_pressure_at(t - step)) / (2 * step);
        const SaturatedPair pair = saturated_pair(t, p);
        const double quotient = (pair.vapour.s - pair.liquid.s) / (pair.vapour.v - pair.liquid.v);
        // Equation 30 and the basic equations are fitted apart: the phases' Gibbs energies meet within
        // the release's tolerance, not exactly.
        EXPECT_NEAR(quotient / slope, 1, t < 623 ? 3e-4 : 2e-3) << t;
        EXPECT_NEAR((pair.vapour.h - pair.liquid.h) / (t * (pair.vapour.s - pair.liquid.s)), 1,
                    t < 623 ? 1e-4 : 1e-3)
            << t;
    }
}

// T·ds = dh - v·dp along T and along p, and the derivatives that the inversions use.
TEST(SteamEquations, AreConsistentWithTheirDerivatives) {
    const auto check = [](auto at, double t, double p) {
        const double dt = t * 1e-6, dp = p * 1e-5;
        const Properties mid = at(t, p), hot = at(t + dt, p), cold = at(t - dt, p),
                         high = at(t, p + dp), low = at(t, p - dp);
        EXPECT_NEAR((hot.h - cold.h) / (2 * dt) / mid.heat_capacity, 1, 1e-5) << t << ' ' << p;
        EXPECT_NEAR(t * (hot.s - cold.s) / (hot.h - cold.h), 1, 1e-5) << t << ' ' << p;
        const double dh = high.h - low.h, vdp = mid.v * 2 * dp;
        EXPECT_NEAR(t * (high.s - low.s), dh - vdp, 1e-4 * (std::abs(dh) + vdp)) << t << ' ' << p;
        EXPECT_NEAR((high.v - low.v) / (2 * dp) / mid.compression, 1, 1e-3) << t << ' ' << p;
        EXPECT_NEAR((hot.v - cold.v) / (2 * dt), mid.expansion,
                    1e-4 * std::abs(mid.expansion) + 1e-11)
            << t << ' ' << p;
    };
    for (const double t : {285.0, 400.0, 550.0, 620.0})
        for (const double p : {20e6, 60e6, 99e6}) check(region_1, t, p);
    for (const double t : {300.0, 500.0, 800.0, 1070.0})
        for (const double p : {1e3, 1e5, 5e5})
            if (p < 3000 || t > 450) check(region_2, t, p);
    for (const double t : {1100.0, 1600.0, 2200.0})
        for (const double p : {1e4, 1e6, 40e6}) check(region_5, t, p);
    for (const double t : {630.0, 650.0, 750.0})
        for (const double p : {30e6, 50e6, 90e6})
            check([](double at_t,
                     double at_p) { return region_3(density_3(at_t, at_p, Side::liquid), at_t); },
                  t, p);
}

TEST(SteamStates, OutsideTheRangeAreRefusedWithTheRange) {
    const auto state = [](double t, double p) {
        return [=] { at_temperature_and_pressure(kelvin(t), pascal(p)); };
    };
    expect_refusal(impossible, "273 K", "273.15 to 2273.15 K", state(273, 1e5));
    expect_refusal(impossible, "2300 K", "273.15 to 2273.15 K", state(2300, 1e5));
    expect_refusal(impossible, "101000000 Pa", "100 MPa", state(500, 101e6));
    expect_refusal(impossible, "1500 K and 60000000 Pa", "2273.15 K up to 50 MPa",
                   state(1500, 60e6));
    expect_refusal(impossible, "700 K", "647.096 K",
                   [] { at_temperature_and_dryness(kelvin(700), {0.5}); });
    expect_refusal(impossible, "23000000 Pa", "22.064 MPa",
                   [] { at_pressure_and_dryness(pascal(23e6), {0.5}); });
    expect_refusal(impossible, "J/kg", "an enthalpy from",
                   [] { at_pressure_and_enthalpy(pascal(1e5), SpecificEnergy::from_value(9e6)); });
    expect_refusal(impossible, "J/(kg·K)", "an entropy from",
                   [] { at_pressure_and_entropy(pascal(1e5), SpecificEntropy::from_value(-100)); });
    expect_refusal(impossible, "m³/kg", "a volume from",
                   [] { at_pressure_and_volume(pascal(1e5), {SpecificVolume::from_value(1e-5)}); });
    expect_refusal(impossible, "", "from", [] {
        at_enthalpy_and_entropy(SpecificEnergy::from_value(4e6), SpecificEntropy::from_value(100));
    });
    EXPECT_NO_THROW(state(273.15, 1e5)());
    EXPECT_NO_THROW(state(2273.15, 50e6)());
    EXPECT_NO_THROW(state(1073.15, 100e6)());
    EXPECT_NO_THROW(state(273.15 * (1 - 1e-15), 100e6 * (1 + 1e-15))());
}

TEST(SteamStates, TellNoPhaseWithinHalfAnInstantOfSaturation) {
    const double t = saturation_temperature_at(1e5);
    expect_refusal(unfit, "within 0.05 K", "liquid from vapour",
                   [&] { at_temperature_and_pressure(kelvin(t + 0.04), pascal(1e5)); });
    std::vector<std::string> remarks;
    const Notes notes(nullptr, &remarks);
    at_temperature_and_pressure(kelvin(t + 0.5), pascal(1e5), notes);
    ASSERT_EQ(remarks.size(), 1u);
    EXPECT_NE(remarks[0].find("taken as vapour"), std::string::npos);
    at_temperature_and_pressure(kelvin(t - 0.5), pascal(1e5), notes);
    EXPECT_NE(remarks.at(1).find("taken as liquid"), std::string::npos);
    at_temperature_and_pressure(kelvin(t + 2), pascal(1e5), notes);
    EXPECT_EQ(remarks.size(), 2u);
}

TEST(SteamStates, OfColdWaterThatAreTwoAreRefused) {
    const double v = region_1(275.15, 1e5).v;
    expect_refusal(unfit, "two states", "one state",
                   [&] { at_pressure_and_volume(pascal(1e5), {SpecificVolume::from_value(v)}); });
    const double s = region_1(273.15, 5e6).s;
    expect_refusal(unfit, "two states", "one state", [&] {
        at_temperature_and_entropy(kelvin(273.15), SpecificEntropy::from_value(s));
    });
}

TEST(SteamStates, TellTheirEquations) {
    std::vector<std::string> steps;
    const Notes notes(&steps, nullptr);
    at_temperature_and_pressure(kelvin(300), pascal(3e6), notes);
    EXPECT_EQ(steps.at(0).substr(0, 35), "region 1, liquid: R7-97 equation 7,");
    EXPECT_NE(steps.at(0).find("τ = 4.62"), std::string::npos) << steps[0];
    at_temperature_and_pressure(kelvin(700), pascal(50e6), notes);
    EXPECT_NE(steps.at(2).find("equation 28"), std::string::npos) << steps[2];
}

TEST(SteamDryness, IsRefusedOutsideTwoPhasesSayingByHowMuch) {
    const double t = saturation_temperature_at(1e5);
    const State vapour = at_temperature_and_pressure(kelvin(t + 25), pascal(1e5));
    expect_refusal(impossible, "25 K above saturation", "two phases", [&] { dryness(vapour); });
    const State dense = at_temperature_and_pressure(kelvin(700), pascal(30e6));
    expect_refusal(impossible, "where there is no saturation", "two phases",
                   [&] { dryness(dense); });
}

} // namespace
