// SPDX-License-Identifier: MPL-2.0
#include "core/real_gas/real_gas.h"

#include "core/failure.h"
#include "core/real_gas/virial.h"
#include "core/written.h"

#include <algorithm>
#include <array>
#include <cctype>
#include <cmath>
#include <string>

namespace core::real_gas {
namespace {

constexpr double least_temperature = 1, greatest_temperature = 10'000, greatest_pressure = 1e9;

double kelvin(Temperature t) { return absolute(t).value(); }

void check_range(double t, double p) {
    if (t < least_temperature || t > greatest_temperature || p > greatest_pressure)
        refuse_impossible(written(t) + " K and " + written(p) + " Pa",
                          "1 K to 10000 K and up to 1 GPa", "check the units");
}

constexpr std::array<std::string_view, 4> quantum_gases{"He", "H2", "D2", "Ne"};
constexpr std::array<std::string_view, 14> polar_fluids{"H2O", "D2O",   "NH3",   "HF",    "HCl",
                                                        "HBr", "CH4O",  "C2H6O", "C3H8O", "C2H4O2",
                                                        "HCN", "C2H3N", "C6H6O", "N2H4"};

bool is_one_of(std::span<const std::string_view> formulas, CriticalPoint const& critical) {
    return std::ranges::find(formulas, critical.formula) != formulas.end();
}

void remark_part(CriticalPoint const& critical, Notes const& notes) {
    const std::string name(critical.name);
    if (is_one_of(quantum_gases, critical))
        notes.remark([&] {
            return name + " is a quantum gas: its acentric factor is a fit, departures are rough";
        });
    if (is_one_of(polar_fluids, critical))
        notes.remark([&] {
            return name + " is polar or associates: departures are good to some ten per cent";
        });
}

void remark_fluid(Fluid const& fluid, double t, double p, Notes const& notes) {
    for (Part const& part : fluid.parts()) remark_part(part.critical, notes);
    if (fluid.parts().size() > 1) {
        notes.remark([] { return std::string("mixture with interaction parameters of zero"); });
        return;
    }
    CriticalPoint const& critical = fluid.parts().front().critical;
    if (std::abs(t / critical.temperature - 1) < 0.03 && std::abs(p / critical.pressure - 1) < 0.3)
        notes.remark(
            [] { return std::string("near the critical point, where the equation is rough"); });
}

std::string told(Part const& part, bool mixed, double t, double p) {
    CriticalPoint const& c = part.critical;
    return std::string(c.name) + (mixed ? ", x = " + written(part.fraction) : "") +
           ": Tc = " + written(c.temperature) + " K, pc = " + written(c.pressure) +
           " Pa, ω = " + written(c.acentric_factor) + " (" + std::string(c.reference) +
           "), Tr = " + written(t / c.temperature) + ", pr = " + written(p / c.pressure);
}

void tell_fluid(Fluid const& fluid, double t, double p, Notes const& notes) {
    for (Part const& part : fluid.parts())
        notes.step([&] { return told(part, fluid.parts().size() > 1, t, p); });
}

CubicForm const& form_of(Equation equation) {
    return equation == Equation::soave ? soave() : peng_robinson();
}

void tell_equation(Fluid const& fluid, double t, Equation equation, Notes const& notes) {
    if (equation == Equation::virial)
        notes.step([&] {
            const Virial of = second_virial(fluid, t);
            return "B = " + written(of.b) + " m³/mol, dB/dT = " + written(of.db_dt) + " m³/(mol·K)";
        });
    else
        notes.step([&] {
            const Attraction of = attraction(form_of(equation), fluid, t);
            return "a = " + written(of.a) + " Pa·m⁶/mol², da/dT = " + written(of.da_dt) +
                   " Pa·m⁶/(mol²·K), b = " + written(of.b) + " m³/mol";
        });
}

Departure departure_at(Fluid const& fluid, Temperature temperature, Positive<Pressure> pressure,
                       Equation equation, Notes const& notes) {
    const double t = kelvin(temperature), p = pressure.value.value();
    check_range(t, p);
    const Departure at = equation == Equation::virial ? virial_departure(fluid, t, p)
                                                      : departure(form_of(equation), fluid, t, p);
    if (notes.hears_steps()) {
        tell_fluid(fluid, t, p, notes);
        tell_equation(fluid, t, equation, notes);
        notes.step([&] {
            return "Z = " + written(at.z) + ", H - H(ideal) = " + written(at.enthalpy) +
                   " J/mol, S - S(ideal) = " + written(at.entropy) + " J/(mol·K)";
        });
    }
    if (notes.hears_remarks()) {
        remark_fluid(fluid, t, p, notes);
        if (at.liquid)
            notes.remark([&] {
                return "at " + written(t) + " K and " + written(p) +
                       " Pa the liquid is the stable phase";
            });
    }
    return at;
}

} // namespace

Equation read_equation(std::string_view text) {
    std::string letters;
    for (const char c : text)
        if (std::isalpha(static_cast<unsigned char>(c)))
            letters += static_cast<char>(std::tolower(static_cast<unsigned char>(c)));
    if (letters == "pengrobinson") return Equation::peng_robinson;
    if (letters == "soave") return Equation::soave;
    if (letters == "virial") return Equation::virial;
    refuse_unfit(std::string(text.substr(0, 60)), "`Peng-Robinson`, `Soave` or `virial`",
                 "write one of the three, or leave it out for Peng-Robinson");
}

MolarEntropy entropy_departure(Fluid const& fluid, Temperature temperature,
                               Positive<Pressure> pressure, Equation equation, Notes const& notes) {
    return MolarEntropy::from_value(
        departure_at(fluid, temperature, pressure, equation, notes).entropy);
}

MolarEnergy enthalpy_departure(Fluid const& fluid, Temperature temperature,
                               Positive<Pressure> pressure, Equation equation, Notes const& notes) {
    return MolarEnergy::from_value(
        departure_at(fluid, temperature, pressure, equation, notes).enthalpy);
}

Dimensionless compressibility_factor(Fluid const& fluid, Temperature temperature,
                                     Positive<Pressure> pressure, Equation equation,
                                     Notes const& notes) {
    return departure_at(fluid, temperature, pressure, equation, notes).z;
}

MolarEntropy entropy_between(Fluid const& fluid, Temperature temperature_1,
                             Positive<Pressure> pressure_1, Temperature temperature_2,
                             Positive<Pressure> pressure_2, Equation equation, Notes const& notes) {
    const MolarEntropy ideal = substances::entropy_of_gas(
        fluid.ideal_gas(), temperature_1, pressure_1, temperature_2, pressure_2, notes);
    const Departure before = departure_at(fluid, temperature_1, pressure_1, equation, notes),
                    after = departure_at(fluid, temperature_2, pressure_2, equation, notes);
    return ideal + MolarEntropy::from_value(after.entropy - before.entropy);
}

MolarEnergy enthalpy_between(Fluid const& fluid, Temperature temperature_1,
                             Positive<Pressure> pressure_1, Temperature temperature_2,
                             Positive<Pressure> pressure_2, Equation equation, Notes const& notes) {
    const MolarEnergy ideal = fluid.ideal_gas().enthalpy_between(temperature_1, temperature_2);
    notes.step([&] { return "∫cp dT = " + written(ideal); });
    const Departure before = departure_at(fluid, temperature_1, pressure_1, equation, notes),
                    after = departure_at(fluid, temperature_2, pressure_2, equation, notes);
    return ideal + MolarEnergy::from_value(after.enthalpy - before.enthalpy);
}

} // namespace core::real_gas
