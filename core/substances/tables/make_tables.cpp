// SPDX-License-Identifier: MPL-2.0

// Writes the tables of this folder as C++ arrays for core/substances/table.cpp:
//
//   make_tables FOLDER OUTPUT
//
// and with them what follows from the tables alone: the phase that is stable at each temperature,
// where one gives way to the next, and by how much enthalpy and entropy then jump. It stops at
// whatever it does not understand, and at a row it would not use.

#include "core/substances/atomic_weights.h"
#include "core/substances/equation.h"
#include "core/substances/table.h"
#include "core/substances/tables/ladder.h"
#include "core/substances/tables/model.h"
#include "core/tables/rows.h"

#include <algorithm>
#include <array>
#include <cstdio>
#include <exception>
#include <map>
#include <sstream>
#include <string>
#include <vector>

namespace {

using namespace tables;

// Crystal labels of the report and how they are shown; Greek letters after the report's a, b, c, d.
constexpr std::array<std::array<std::string_view, 2>, 22> labels{{
    {"g", "g"},
    {"L", "l"},
    {"cr", "cr"},
    {"gr", "cr, graphite"},
    {"a", "cr, α"},
    {"a'", "cr, α′"},
    {"b", "cr, β"},
    {"c", "cr, γ"},
    {"d", "cr, δ"},
    {"I", "cr, I"},
    {"I'", "cr, I′"},
    {"II", "cr, II"},
    {"III", "cr, III"},
    {"III,II", "cr, III–II"},
    {"IV", "cr, IV"},
    {"V", "cr, V"},
    {"an", "cr, andalusite"},
    {"II-r", "cr, red"},
    {"I-y", "cr, yellow"},
    {"a-qz", "cr, α-quartz"},
    {"b-qz", "cr, β-quartz"},
    {"b-crt", "cr, β-cristobalite"},
}};

std::string shown_label(std::string const& label) {
    for (auto const& [report, shown] : labels)
        if (report == label) return std::string(shown);
    stop("unknown phase label " + label);
}

Aggregation aggregation(std::string const& kind) {
    if (kind == "gas") return Aggregation::gas;
    if (kind == "liquid") return Aggregation::liquid;
    if (kind == "solid") return Aggregation::crystal;
    stop("unknown kind of phase " + kind);
}

/// `C4H10,isobutane` is C4H10, `Fe.947O` is Fe0.947O.
std::string formula_of(std::string key) {
    key = key.substr(0, key.find(','));
    const std::size_t point = key.find('.');
    if (point != std::string::npos && (key[point - 1] < '0' || key[point - 1] > '9'))
        key.insert(point, "0");
    return key;
}

Substance& substance(Tables& t, std::string const& key, std::string const& composition) {
    for (Substance& s : t.substances)
        if (s.key == key) {
            if (s.composition != composition) stop(key + ": two compositions");
            return s;
        }
    t.substances.push_back({});
    t.substances.back().key = key;
    t.substances.back().formula = formula_of(key);
    t.substances.back().composition = composition;
    return t.substances.back();
}

void begin_phase(Tables& t, Substance& s, Phase phase) {
    phase.substance = static_cast<std::size_t>(&s - t.substances.data());
    phase.first_interval = t.intervals.size();
    s.phases.push_back(t.phases.size());
    t.phases.push_back(std::move(phase));
}

void add_interval(Tables& t, Interval const& interval) {
    Phase& phase = t.phases.back();
    if (!(interval.from < interval.to)) stop(phase.id + ": an interval without a width");
    if (phase.interval_count > 0 && t.intervals.back().to != interval.from)
        stop(phase.id + ": intervals that do not meet");
    t.intervals.push_back(interval);
    ++phase.interval_count;
}

void read_species(Tables& t, std::string const& folder) {
    const Fields columns{"phase_id",
                         "substance",
                         "phase_label",
                         "phase_kind",
                         "composition",
                         "dHf298_J_per_mol",
                         "interval_index",
                         "interval_count",
                         "T_low_K",
                         "T_high_K",
                         "a1",
                         "a2",
                         "a3",
                         "a4",
                         "a5",
                         "a6",
                         "a7",
                         "b1",
                         "b2",
                         "report_page",
                         "reference_code",
                         "note"};
    std::size_t left = 0;
    for (Fields const& f : tables::read_rows(folder + "/species.csv", columns)) {
        if (left == 0) {
            left = static_cast<std::size_t>(number(f[7]));
            begin_phase(t, substance(t, f[1], f[4]),
                        {f[0], shown_label(f[2]), aggregation(f[3]), 0, 0, 0, f[5],
                         "NASA/TP-2002-211556, App. D, p. " + f[19] + " (" + f[20] + ")", f[21]});
        }
        if (t.phases.back().id != f[0]) stop(f[0] + ": intervals missing before it");
        add_interval(t, {number(f[8]), number(f[9]), 8.314510, number(f[10]), number(f[11]), 0,
                         number(f[12]), number(f[13]), number(f[14]), number(f[15]), number(f[16]),
                         number(f[17]), number(f[18])});
        --left;
        ++t.species_rows;
    }
    if (left != 0) stop("the last phase lacks intervals");
}

/// Sets b1 and b2 so that the interval has this enthalpy and entropy at `at`.
void anchor(Interval& i, long double at, long double enthalpy, long double entropy) {
    i.b1 = static_cast<double>(enthalpy - enthalpy_of<long double>(i, at));
    i.b2 = static_cast<double>(entropy - entropy_of<long double>(i, at));
}

void read_oxides(Tables& t, std::string const& folder) {
    const Fields columns{"phase",
                         "formula",
                         "composition",
                         "dHf298_J_per_mol",
                         "S298_J_per_molK",
                         "T_low_K",
                         "T_high_K",
                         "A1_J_per_molK",
                         "A2_J_per_molK2",
                         "A3_J_K_per_mol",
                         "A4_J_per_molK05",
                         "A5_J_per_molK3",
                         "Cp298_J_per_molK",
                         "page"};
    const std::size_t species = t.substances.size();
    for (Fields const& f : tables::read_rows(folder + "/oxides.csv", columns)) {
        ++t.oxide_rows;
        const auto end = t.substances.begin() + static_cast<std::ptrdiff_t>(species);
        if (std::any_of(t.substances.begin(), end, [&](auto& s) { return s.formula == f[1]; })) {
            ++t.oxide_rows_beside; // the report has it too, with its liquid
            continue;
        }
        Interval i{number(f[5]),
                   number(f[6]),
                   1,
                   number(f[9]),
                   0,
                   number(f[10]),
                   number(f[7]),
                   number(f[8]),
                   number(f[11]),
                   0,
                   0,
                   0,
                   0};
        const bool goes_on = t.phases.back().id == f[1] + "(cr)";
        if (goes_on)
            anchor(i, i.from, enthalpy_of<long double>(t.intervals.back(), i.from),
                   entropy_of<long double>(t.intervals.back(), i.from));
        else
            anchor(i, 298.15L, number(f[3]), number(f[4]));
        if (!goes_on)
            begin_phase(t, substance(t, f[1], f[2]),
                        {f[1] + "(cr)", "cr", Aggregation::crystal, 0, 0, 0, f[3],
                         "USGS Bulletin 2131" + (f[13].empty() ? "" : ", p. " + f[13]), ""});
        add_interval(t, i);
    }
}

void read_vapours(Tables& t, std::string const& folder) {
    for (Fields const& f :
         tables::read_rows(folder + "/vapours.csv", {"substance", "role", "reason"})) {
        auto s = std::find_if(t.substances.begin(), t.substances.end(),
                              [&](auto& each) { return each.key == f[0]; });
        if (s == t.substances.end() || s->vapour != Vapour::none) stop("vapour of " + f[0]);
        s->vapour = f[1] == "gas"         ? Vapour::gas
                    : f[1] == "condensed" ? Vapour::condensed
                    : f[1] == "boils"     ? Vapour::boils
                    : f[1] == "apart"     ? Vapour::apart
                                          : Vapour::none;
        s->reason = f[2];
        if (s->vapour == Vapour::none) stop("unknown role " + f[1]);
    }
}

void read_entropy_uncertainties(Tables& t, std::string const& folder) {
    const Fields columns{"phase_id", "S298_J_per_molK", "printed_uncertainty_J_per_molK",
                         "obtained_how"};
    for (Fields const& f : tables::read_rows(folder + "/entropy_uncertainties.csv", columns)) {
        const auto phase = std::find_if(t.phases.begin(), t.phases.end(),
                                        [&](Phase const& each) { return each.id == f[0]; });
        if (phase == t.phases.end() || phase->entropy_u != 0) stop("entropy of " + f[0]);
        phase->entropy_u = number(f[2]) / 2; // printed for 95 %
    }
}

/// Puts the phases of each substance side by side; species.csv has all gases first.
void gather_phases(Tables& t) {
    std::stable_sort(t.phases.begin(), t.phases.end(),
                     [](auto& a, auto& b) { return a.substance < b.substance; });
    for (Substance& s : t.substances) s.phases.clear();
    for (std::size_t i = 0; i < t.phases.size(); ++i)
        t.substances[t.phases[i].substance].phases.push_back(i);
}

// --- views ----------------------------------------------------------------------------------

bool matches(std::string const& name, std::string const& state) {
    if (name == state) return true;
    const std::string kind = "-" + state.substr(std::min(state.size(), std::size_t{4}));
    return state.starts_with("cr, ") && name.size() > kind.size() && name.ends_with(kind);
}

void add_view(Tables& t, std::size_t substance, std::string state, std::vector<Rung> rungs) {
    t.views.push_back({std::move(state), substance, t.rungs.size(), rungs.size()});
    t.rungs.insert(t.rungs.end(), rungs.begin(), rungs.end());
    ++t.substances[substance].view_count;
}

template<class Test>
std::vector<std::size_t> phases_of(Tables const& t, Substance const& s, Test test) {
    std::vector<std::size_t> some;
    for (std::size_t p : s.phases)
        if (test(t.phases[p])) some.push_back(p);
    return some;
}

std::vector<Rung> stable_rungs(Tables const& t, Substance const& s) {
    const auto gas = phases_of(t, s, [](auto& p) { return p.aggregation == Aggregation::gas; });
    const auto rest = phases_of(t, s, [](auto& p) { return p.aggregation != Aggregation::gas; });
    if (gas.size() > 1) stop(s.key + ": two gases");
    if (gas.empty() != (s.vapour == Vapour::none)) stop(s.key + ": no row of vapours.csv");
    const bool needs_condensed = s.vapour == Vapour::boils || s.vapour == Vapour::apart;
    if (!gas.empty() && rest.empty() == needs_condensed) stop(s.key + ": role of its vapour");
    if (s.vapour == Vapour::condensed) return {};
    if (s.vapour == Vapour::gas) return ladder(t, gas);
    return s.vapour == Vapour::boils ? with_boiling(t, ladder(t, rest), gas[0], s.key)
                                     : ladder(t, rest);
}

void add_views(Tables& t, std::size_t index, std::vector<std::string> const& more) {
    Substance& s = t.substances[index];
    s.first_view = t.views.size();
    add_view(t, index, "", stable_rungs(t, s));
    std::vector<std::string> states{"g", "l", "cr"};
    for (std::size_t p : s.phases) states.push_back(t.phases[p].name);
    states.insert(states.end(), more.begin(), more.end());
    for (std::size_t i = 0; i < states.size(); ++i) {
        if (std::find(states.begin(), states.begin() + static_cast<std::ptrdiff_t>(i), states[i]) !=
            states.begin() + static_cast<std::ptrdiff_t>(i))
            continue;
        const auto some = phases_of(t, s, [&](auto& p) {
            return states[i] == "cr" ? p.aggregation == Aggregation::crystal
                                     : matches(p.name, states[i]);
        });
        if (!some.empty()) add_view(t, index, states[i], ladder(t, some));
    }
}

// --- writing ---------------------------------------------------------------------------------

std::string digits(double value) {
    std::array<char, 40> text{};
    std::snprintf(text.data(), text.size(), "%.17g", value);
    return text.data();
}

std::string quoted(std::string const& text) {
    if (text.find_first_of("\"\\") != std::string::npos) stop("a quote in " + text);
    return '"' + text + '"';
}

class Writer {
public:
    explicit Writer(std::string const& file) : out_(file) {}

    template<class Rows, class Write>
    void array(char const* type, char const* name, Rows const& rows, Write write) {
        out_ << "constexpr std::array<" << type << ", " << rows.size() << "> " << name << "{{\n";
        for (auto const& row : rows) {
            out_ << "    {";
            write(row);
            out_ << "},\n";
        }
        out_ << "}};\n";
    }
    template<class... Items>
    void items(Items const&... items) {
        const char* mark = "";
        ((out_ << mark << items, mark = ", "), ...);
    }
    void line(std::string const& text) { out_ << text << '\n'; }
    void close() {
        out_.close();
        if (!out_) stop("cannot write");
    }

private:
    std::ofstream out_;
};

struct Atom {
    unsigned weight_row;
    double count;
};

// NIST, Atomic Weights and Isotopic Compositions: relative atomic mass of deuterium 2.014 101 778.
constexpr long double deuterium_ten_thousandths = 20141.01778L;

std::vector<Atom> atoms_of(std::string const& composition) {
    std::vector<Atom> atoms;
    std::istringstream in(composition);
    for (std::string part; std::getline(in, part, ';');) {
        const std::string symbol = part.substr(0, part.find(':'));
        Element const* element = find_element(symbol);
        if (element == nullptr && symbol != "D") stop("unknown element in " + composition);
        atoms.push_back(
            {element == nullptr ? 0 : static_cast<unsigned>(element - elements().data()) + 1,
             number(part.substr(symbol.size() + 1))});
    }
    return atoms;
}

double molar_mass(std::vector<Atom> const& atoms) {
    long double sum = 0;
    for (auto [row, count] : atoms)
        sum += static_cast<long double>(count) *
               (row == 0 ? deuterium_ten_thousandths
                         : static_cast<long double>(elements()[row - 1].ten_thousandths));
    return static_cast<double>(sum / 1e7L);
}

char const* const aggregations[] = {"Aggregation::gas", "Aggregation::liquid",
                                    "Aggregation::crystal"};
char const* const vapours[] = {"Vapour::none", "Vapour::gas", "Vapour::condensed", "Vapour::boils",
                               "Vapour::apart"};

template<class Integral>
double across(Interval const& i, long double from, long double to, Integral integral) {
    return static_cast<double>(integral(i, from, to));
}

void write_rows(Writer& w, Tables const& t) {
    w.array("Interval", "interval_table", t.intervals, [&](Interval const& i) {
        w.items(digits(i.from), digits(i.to), digits(i.gas_constant), digits(i.a1), digits(i.a2),
                digits(i.root), digits(i.a3), digits(i.a4), digits(i.a5), digits(i.a6),
                digits(i.a7), digits(i.b1), digits(i.b2));
    });
    w.array("PhaseRow", "phase_table", t.phases, [&](Phase const& p) {
        w.items(quoted(p.id), quoted(p.name), aggregations[static_cast<int>(p.aggregation)],
                p.substance, p.first_interval, p.interval_count,
                digits(number(p.enthalpy_of_formation)), digits(p.entropy_u), quoted(p.source),
                quoted(p.note));
    });
    w.array("View", "view_table", t.views, [&](NamedView const& v) {
        w.items(quoted(v.state), v.substance, v.first_rung, v.rung_count);
    });
    w.array("Rung", "rung_table", t.rungs, [&](Rung const& r) {
        Interval const& i = t.intervals[r.interval];
        w.items(digits(r.from), digits(r.to), digits(r.enthalpy_jump), digits(r.entropy_jump),
                digits(across(i, r.from, r.to, enthalpy_between<long double>)),
                digits(across(i, r.from, r.to, entropy_between<long double>)), r.interval, r.phase,
                r.gap ? "true" : "false");
    });
}

void write_substances(Writer& w, Tables const& t) {
    std::vector<Atom> atoms;
    w.array("SubstanceRow", "substance_table", t.substances, [&](Substance const& s) {
        const std::vector<Atom> own = atoms_of(s.composition);
        w.items(quoted(s.formula), quoted(s.name), digits(molar_mass(own)),
                vapours[static_cast<int>(s.vapour)], quoted(s.reason), s.phases.front(),
                s.phases.size(), atoms.size(), own.size(), s.first_view, s.view_count);
        atoms.insert(atoms.end(), own.begin(), own.end());
    });
    w.array("AtomRow", "atom_table", atoms,
            [&](Atom const& a) { w.items(a.weight_row, digits(a.count)); });
}

/// The view of a substance in a state, as Key rows name it.
std::size_t view_of(Tables const& t, Substance const& s, std::string const& state) {
    for (std::size_t v = s.first_view; v < s.first_view + s.view_count; ++v)
        if (t.views[v].state == state) return v;
    stop(s.key + " has no state " + state);
}

using Keys = std::map<std::string, std::pair<std::size_t, bool>>;

void write_keys(Writer& w, char const* name, Keys const& keys) {
    w.array("Key", name, keys, [&](auto const& key) {
        w.items(quoted(key.first), key.second.first, key.second.second ? "true" : "false");
    });
}

Keys name_keys(Tables const& t, std::vector<Fields> const& names) {
    Keys keys;
    for (Fields const& f : names) {
        auto s = std::find_if(t.substances.begin(), t.substances.end(),
                              [&](auto& each) { return each.key == f[1]; });
        if (s == t.substances.end()) stop("a name of nothing: " + f[0]);
        if (!keys.insert({f[0], {view_of(t, *s, f[2]), false}}).second) stop("twice: " + f[0]);
    }
    return keys;
}

Keys formula_keys(Tables const& t) {
    Keys keys;
    for (Substance const& s : t.substances) {
        auto const& [key, fresh] = keys.insert({s.formula, {s.first_view, false}});
        if (!fresh) key->second.second = true;
    }
    return keys;
}

void make(std::string const& folder, std::string const& output) {
    Tables t;
    read_species(t, folder);
    read_oxides(t, folder);
    read_vapours(t, folder);
    read_entropy_uncertainties(t, folder);
    gather_phases(t);
    const auto names = tables::read_rows(folder + "/names.csv", {"name", "substance", "state"});
    std::map<std::string, std::vector<std::string>> states;
    for (Fields const& f : names) {
        if (!f[2].empty()) states[f[1]].push_back(f[2]);
        for (Substance& s : t.substances)
            if (s.key == f[1] && s.name.empty() && f[2].empty()) s.name = f[0];
    }
    for (std::size_t i = 0; i < t.substances.size(); ++i)
        add_views(t, i, states[t.substances[i].key]);
    Writer w(output);
    w.line("// Written by make_tables from core/substances/tables.");
    write_rows(w, t);
    write_substances(w, t);
    write_keys(w, "name_table", name_keys(t, names));
    write_keys(w, "formula_table", formula_keys(t));
    const std::size_t used = t.species_rows + t.oxide_rows - t.oxide_rows_beside;
    w.line("static_assert(interval_table.size() == " + std::to_string(used) + ");");
    w.line("constexpr TableCounts count_table{" + std::to_string(t.species_rows) + ", " +
           std::to_string(t.oxide_rows) + ", " + std::to_string(t.oxide_rows_beside) + "};");
    w.close();
}

} // namespace

int main(int argc, char** argv) {
    if (argc != 3) {
        std::fputs("make_tables FOLDER OUTPUT\n", stderr);
        return 2;
    }
    try {
        make(argv[1], argv[2]);
    } catch (std::exception const& problem) {
        std::fprintf(stderr, "make_tables: %s\n", problem.what());
        return 1;
    }
    return 0;
}
