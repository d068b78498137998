// SPDX-License-Identifier: MPL-2.0
#include "core/steam/backward.h"
#include "core/steam/equations.h"
#include "core/steam/saturation.h"
#include "tests/published/table.h"

#include <gtest/gtest.h>

#include <cmath>
#include <map>
#include <sstream>
#include <string>

// Every value that the releases print to verify a program, to the last digit printed.

namespace {

using namespace core::steam;
using published::Row;

/// `p_MPa=3;T_K=300` in SI units, by the symbol before the unit.
class Inputs {
public:
    explicit Inputs(std::string const& text) {
        std::istringstream in(text);
        for (std::string part; std::getline(in, part, ';');) {
            const std::string name = part.substr(0, part.find('='));
            values_[name.substr(0, name.find('_'))] =
                std::stod(part.substr(part.find('=') + 1)) * factor(name);
        }
    }
    double operator[](char const* symbol) const { return values_.at(symbol); }

private:
    static double factor(std::string const& name) {
        if (name == "p_MPa") return 1e6;
        if (name == "h_kJ_per_kg" || name == "s_kJ_per_kgK") return 1e3;
        if (name == "T_K" || name == "rho_kg_per_m3") return 1;
        throw std::runtime_error("unknown input " + name);
    }
    std::map<std::string, double> values_;
};

/// w² = -v² / ((∂v/∂p) + T·(∂v/∂T)² / cp)
double speed_of_sound(Properties const& at) {
    return std::sqrt(-at.v * at.v /
                     (at.compression + at.t * at.expansion * at.expansion / at.heat_capacity));
}

double quantity_of(Properties const& at, std::string const& name) {
    if (name == "v") return at.v;
    if (name == "h") return at.h / 1e3;
    if (name == "u") return (at.h - at.p * at.v) / 1e3;
    if (name == "s") return at.s / 1e3;
    if (name == "cp") return at.heat_capacity / 1e3;
    if (name == "w") return speed_of_sound(at);
    if (name == "p") return at.p / 1e6;
    throw std::runtime_error("unknown quantity " + name);
}

double computed(std::string const& table, Inputs const& in, std::string const& quantity) {
    if (table == "5") return quantity_of(region_1(in["T"], in["p"]), quantity);
    if (table == "7") return backward::temperature_1_ph(in["p"], in["h"]);
    if (table == "9") return backward::temperature_1_ps(in["p"], in["s"]);
    if (table == "15") return quantity_of(region_2(in["T"], in["p"]), quantity);
    if (table == "18") return quantity_of(metastable_vapour(in["T"], in["p"]), quantity);
    if (table.starts_with("24")) return backward::temperature_2_ph(in["p"], in["h"]);
    if (table.starts_with("29")) return backward::temperature_2_ps(in["p"], in["s"]);
    if (table == "33") return quantity_of(region_3(in["rho"], in["T"]), quantity);
    if (table == "35") return saturation_pressure_at(in["T"]) / 1e6;
    if (table == "36") return saturation_temperature_at(in["p"]);
    if (table == "42") return quantity_of(region_5(in["T"], in["p"]), quantity);
    if (table == "Eq. (10)") return region_1(in["T"], in["p"]).h / 1e3;
    if (table.ends_with("(Eq. 5)")) return boundary_pressure_2_3(in["T"]) / 1e6;
    if (table.ends_with("(Eq. 6)")) return boundary_temperature_2_3(in["p"]);
    if (table.ends_with("(Eq. 20)")) return backward::boundary_pressure_2b_2c(in["h"]) / 1e6;
    if (table.ends_with("(Eq. 21)")) return backward::boundary_enthalpy_2b_2c(in["p"]) / 1e3;
    throw std::runtime_error("unknown table " + table);
}

std::vector<Row> release_rows() {
    return published::read_table(PUBLISHED_DIR "/if97_verification.csv",
                                 {"id", "table", "inputs", "quantity", "expected", "unit",
                                  "half_unit_of_last_printed_digit", "printed_significant_digits",
                                  "printed_as"},
                                 125);
}

class Release : public testing::TestWithParam<Row> {};

TEST_P(Release, PrintsThisValue) {
    Row const& row = GetParam();
    EXPECT_NEAR(computed(row.text("table"), Inputs(row.text("inputs")), row.text("quantity")),
                row.number("expected"), row.number("half_unit_of_last_printed_digit") * 1.000001);
}

std::string name_of_row(testing::TestParamInfo<Row> const& info) {
    std::string name = info.param.text("id");
    std::erase_if(name, [](char c) { return !std::isalnum(static_cast<unsigned char>(c)); });
    return name;
}

INSTANTIATE_TEST_SUITE_P(R7_97, Release, testing::ValuesIn(release_rows()), name_of_row);

double backward_3(std::string const& equation, double p, double x) {
    const bool by_enthalpy = equation.ends_with("(p,h)");
    if (equation[3] == 'T')
        return by_enthalpy ? backward::temperature_3_ph(p, x * 1e3)
                           : backward::temperature_3_ps(p, x * 1e3);
    return by_enthalpy ? backward::volume_3_ph(p, x * 1e3) : backward::volume_3_ps(p, x * 1e3);
}

class Backward3 : public testing::TestWithParam<Row> {};

TEST_P(Backward3, PrintsThisValue) {
    Row const& row = GetParam();
    const double result = backward_3(row.text("equation"), row.number("p_MPa") * 1e6,
                                     row.number("h_kJ_per_kg_or_s_kJ_per_kgK"));
    // Ten digits are printed.
    const double unit = std::pow(10, std::floor(std::log10(row.number("expected"))) - 9);
    EXPECT_NEAR(result, row.number("expected"), unit / 2 * 1.000001) << row.text("equation");
}

std::string index_of_row(testing::TestParamInfo<Row> const& info) {
    return "Row" + std::to_string(info.index + 1);
}

INSTANTIATE_TEST_SUITE_P(
    SR3_03, Backward3,
    testing::ValuesIn(published::read_table(
        PUBLISHED_DIR "/if97_region_3_backward.csv",
        {"equation", "p_MPa", "h_kJ_per_kg_or_s_kJ_per_kgK", "expected", "unit", "source"}, 24)),
    index_of_row);

} // namespace
