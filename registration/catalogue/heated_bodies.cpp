// SPDX-License-Identifier: MPL-2.0
#include "core/materials/material_text.h"
#include "core/substances/end_states.h"
#include "core/text/quantity.h"
#include "registration/catalogue/catalogue.h"
#include "registration/catalogue/shared_arguments.h"
#include "registration/material_arguments.h"
#include "registration/substance_arguments.h"

#include <memory>
#include <vector>

namespace registration {

/// What bodies are made of, one text each, with a number inside one of them moved or not.
struct BodyMaterials {
    core::Formulas texts;
    std::optional<MovedPlace> moved;
};
template<>
struct argument<BodyMaterials> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::text, .whole = true};
    struct Rows {
        Rows(Given const& given, int) : given_(&given) {}
        BodyMaterials operator[](std::size_t) const {
            return {given_->texts(), given_->moved_place()};
        }
        Given const* given_;
    };
};

namespace catalogue {
namespace {

using namespace core::substances;
using core::AmountOfSubstance, core::Column, core::Energy, core::Formulas, core::Mass,
    core::MassFlow, core::MolarEnergy, core::MolarFlow, core::Notes, core::Positive, core::Power,
    core::SpecificEnergy, core::Temperature;

// Heat per mole, from whatever the sheet gives it per.
MolarEnergy per_mole(Substance const&, MolarEnergy heat, LeftOut) { return heat; }
MolarEnergy per_mole(Substance const& substance, SpecificEnergy heat, LeftOut) {
    return heat * substance.molar_mass();
}
MolarEnergy per_mole(Substance const&, Energy heat, Positive<AmountOfSubstance> amount) {
    return heat / amount.value;
}
MolarEnergy per_mole(Substance const&, Power heat, Positive<MolarFlow> amount) {
    return heat / amount.value;
}
MolarEnergy per_mole(Substance const& substance, Energy heat, Positive<Mass> amount) {
    return heat * substance.molar_mass() / amount.value;
}
MolarEnergy per_mole(Substance const& substance, Power heat, Positive<MassFlow> amount) {
    return heat * substance.molar_mass() / amount.value;
}

template<class Heat, class Amount>
Temperature heated(Substance const& substance, Temperature from, Heat heat, Amount amount,
                   Notes const& notes) {
    return temperature_heated(substance, from, per_mole(substance, heat, amount), notes);
}
template<class Heat, class Amount>
core::Dimensionless share_of_phase(Substance const& substance, Temperature from, Heat heat,
                                   Amount amount, std::string_view phase, Notes const& notes) {
    return fraction_of_phase(substance, from, per_mole(substance, heat, amount), phase, notes);
}

template<class Basis>
Temperature own_heated(OwnMaterialOn<Basis> const& own, Temperature from,
                       core::On<Energy, Basis> heat, LeftOut, Notes const& notes) {
    return core::materials::temperature_heated<Basis>(*own.material, from, heat, notes);
}
template<class Basis>
Temperature own_heated_amount(OwnMaterialOn<Basis> const& own, Temperature from, Energy heat,
                              Positive<typename Basis::Amount> amount, Notes const& notes) {
    return core::materials::temperature_heated<Basis>(*own.material, from, heat / amount.value,
                                                      notes);
}

template<class Basis>
core::Dimensionless own_share(OwnMaterialOn<Basis> const& own, Temperature from,
                              core::On<Energy, Basis> heat, LeftOut, std::string_view phase,
                              Notes const& notes) {
    return core::materials::fraction_of_phase<Basis>(*own.material, from, heat, phase, notes);
}
template<class Basis>
core::Dimensionless own_share_of_amount(OwnMaterialOn<Basis> const& own, Temperature from,
                                        Energy heat, Positive<typename Basis::Amount> amount,
                                        std::string_view phase, Notes const& notes) {
    return core::materials::fraction_of_phase<Basis>(*own.material, from, heat / amount.value,
                                                     phase, notes);
}

/// Bodies whose materials stand as text: a substance, an own material, or a constant heat capacity,
/// the latter two on the basis the amounts are given on.
class Bodies {
public:
    template<class Amount>
    Bodies(BodyMaterials const& given, Column<Amount> amounts, Column<Temperature> temperatures)
        : moved_(given.moved) {
        Formulas const& materials = given.texts;
        if (materials.size() != amounts.size() || amounts.size() != temperatures.size())
            core::refuse_unfit(
                std::to_string(materials.size()) + " materials, " + std::to_string(amounts.size()) +
                    " amounts and " + std::to_string(temperatures.size()) + " temperatures",
                "one of each for every body", "select the same rows for all three columns");
        for (std::size_t row = 0; row < materials.size(); ++row)
            add(row, materials[row], amounts[row], temperatures[row]);
    }
    std::span<const Body> bodies() const { return bodies_; }

private:
    template<class Amount>
    void add(std::size_t row, std::string_view text, Amount amount, Temperature temperature) {
        if (!(amount.value() > 0))
            core::refuse_impossible(
                "an amount of " +
                    core::text::write_number(static_cast<long double>(amount.value()), 6),
                "amounts above 0", "leave out the bodies that are not there");
        double count = amount.value();
        if (text[0] >= '0' && text[0] <= '9') {
            materials_.push_back(constant<Amount>(row, text));
        } else if (core::materials::is_material_text(text)) {
            materials_.push_back(own<Amount>(row, text));
        } else {
            const Substance substance = find_substance(text);
            if constexpr (std::is_same_v<Amount, Mass>)
                count = (amount / substance.molar_mass()).value();
            materials_.push_back(std::make_unique<SubstanceMaterial>(substance, temperature));
        }
        bodies_.push_back({materials_.back().get(), count, temperature});
    }

    template<class Amount>
    std::unique_ptr<Material> constant(std::size_t row, std::string_view text) const {
        auto heat_capacity = core::text::read_quantity(text);
        if (moved_ && moved_->place.cell == row)
            heat_capacity.si += moved_->times * moved_->place.u;
        const core::Dimension needed =
            core::dimension<core::HeatCapacity> / core::dimension<Amount>;
        if (heat_capacity.unit.dimension != needed || !(heat_capacity.si > 0))
            core::refuse_unfit(std::string(text),
                               core::text::name_of(needed) +
                                   " above 0, on the basis of the amounts",
                               "give heat capacity and amount both per mole or both per mass");
        return std::make_unique<ConstantMaterial>(heat_capacity.si);
    }

    template<class Amount>
    std::unique_ptr<Material> own(std::size_t row, std::string_view text) const {
        auto description = core::materials::read_description(text);
        move(description, moved_, row);
        auto material =
            std::make_unique<core::materials::OwnMaterial>(core::materials::made_of(description));
        core::materials::require(*material, std::is_same_v<Amount, Mass>
                                                ? core::materials::Basis::specific
                                                : core::materials::Basis::molar);
        return material;
    }

    std::optional<MovedPlace> moved_;
    std::vector<std::unique_ptr<Material>> materials_;
    std::vector<Body> bodies_;
};

template<class Amount>
Temperature equalized(BodyMaterials const& materials, Column<Amount> amounts,
                      Column<Temperature> temperatures, Notes const& notes) {
    return temperature_equalized(Bodies(materials, amounts, temperatures).bodies(), notes);
}
template<class Amount>
core::Entropy equalizing(BodyMaterials const& materials, Column<Amount> amounts,
                         Column<Temperature> temperatures, Notes const& notes) {
    return entropy_of_equalizing(Bodies(materials, amounts, temperatures).bodies(), notes);
}

constexpr Argument start{
    .name = "from", .symbol = "T1", .says = "temperature at the start", .example = "20 °C"};
constexpr Argument heat_taken_up{
    .name = "heat",
    .symbol = "Q",
    .says = "heat taken up, below 0 where it is given off: energy, power, molar or specific",
    .example = "250 MJ"};
constexpr Argument amount_heated{
    .name = "amount",
    .symbol = "n",
    .says = "how much is heated; left out where the heat is molar or specific",
    .example = "500 kg"};
constexpr Argument materials{
    .name = "materials",
    .symbol = "material",
    .says = "a column of substances, of texts of MATERIAL.OF, or of heat capacities "
            "as text",
    .example = "B5:B7"};
constexpr Argument amounts_of_bodies{.name = "amounts",
                                     .symbol = "n",
                                     .says = "a column of masses or of amounts of substance",
                                     .example = "C4:C7",
                                     .beside = "temperatures"};
constexpr Argument temperatures_of_bodies{.name = "temperatures",
                                          .symbol = "T",
                                          .says = "a column of temperatures at the start",
                                          .example = "D4:D7",
                                          .beside = "amounts"};
constexpr const char* at_one_bar =
    "1 bar, transitions of the tables included; no reaction, no mixing";

constexpr Entry entries[] = {
    describe(
        {.name = "TEMPERATURE.HEATED",
         .says = "Temperature at which a substance ends that takes up heat, or gives it off.",
         .arguments = {{substance, start, heat_taken_up, amount_heated, show}},
         .forms =
             {form<heated<MolarEnergy, LeftOut>, heated<SpecificEnergy, LeftOut>,
                   heated<Energy, Positive<AmountOfSubstance>>, heated<Energy, Positive<Mass>>,
                   heated<Power, Positive<MolarFlow>>, heated<Power, Positive<MassFlow>>>(
                  "Q / n = Σ ∫cp dT + Σ ΔH from T1 to T2, solved for T2", report, at_one_bar),
              form<own_heated<core::Molar>, own_heated<core::Specific>, own_heated<core::Total>,
                   own_heated_amount<core::Molar>, own_heated_amount<core::Specific>>(
                  "Q / n = Σ ∫cp dT + Σ ΔH from T1 to T2, solved for T2",
                  "the material as described in the sheet",
                  "the range of the material; nothing is extrapolated")},
         .examples = {{{"TEMPERATURE.HEATED(\"Al\"; \"25 °C\"; \"25 kJ/mol\"; ; \"K\")",
                        933.61}}}}),
    describe(
        {.name = "FRACTION.PHASE",
         .says = "Share of a phase, 0 to 1, at the end of heating or cooling.",
         .arguments = {{substance,
                        start,
                        heat_taken_up,
                        amount_heated,
                        {.name = "phase",
                         .symbol = "phase",
                         .says = "l, g, cr for all crystals, or one crystal such as cr, α",
                         .example = "l"},
                        show}},
         .forms =
             {form<share_of_phase<MolarEnergy, LeftOut>, share_of_phase<SpecificEnergy, LeftOut>,
                   share_of_phase<Energy, Positive<AmountOfSubstance>>,
                   share_of_phase<Energy, Positive<Mass>>,
                   share_of_phase<Power, Positive<MolarFlow>>,
                   share_of_phase<Power, Positive<MassFlow>>>(
                  "share of the transition at which Q / n ends, 0 or 1 elsewhere", report,
                  at_one_bar),
              form<own_share<core::Molar>, own_share<core::Specific>, own_share<core::Total>,
                   own_share_of_amount<core::Molar>, own_share_of_amount<core::Specific>>(
                  "share of the transition at which Q / n ends, by the phases the rows name",
                  "the material as described in the sheet",
                  "the range of the material; nothing is extrapolated")},
         .examples = {{{"FRACTION.PHASE(\"Al\"; \"25 °C\"; \"5 kJ/mol\"; ; \"l\")", 0}}}}),
    describe({.name = "TEMPERATURE.EQUALIZED",
              .says = "Common temperature of bodies that exchange heat with each other alone: "
                      "quenching, blending, storage.",
              .arguments = {{materials, amounts_of_bodies, temperatures_of_bodies, show}},
              .forms = {form<equalized<Mass>, equalized<AmountOfSubstance>>(
                  "Σ(n · ΔH) = 0, solved for the common T", report, at_one_bar)},
              .examples = {{{"TEMPERATURE.EQUALIZED({\"4.184 kJ/(kg·K)\"|\"4.184 kJ/(kg·K)\"}; "
                             "{\"kg\"|1|1}; {\"K\"|353.15|293.15})",
                             323.15}}}}),
    describe(
        {.name = "ENTROPY.EQUALIZING",
         .says =
             "Entropy generated while bodies come to a common temperature with each other alone.",
         .arguments = {{materials, amounts_of_bodies, temperatures_of_bodies, show}},
         .forms = {form<equalizing<Mass>, equalizing<AmountOfSubstance>>(
             "Sgen = Σ(n · ΔS), to the common T", report, at_one_bar)},
         .examples = {{{"ENTROPY.EQUALIZING({\"4.184 kJ/(kg·K)\"|\"4.184 kJ/(kg·K)\"}; "
                        "{\"kg\"|1|1}; {\"K\"|353.15|293.15})",
                        36.21630297470233}}}}),
};

} // namespace

std::span<const Entry> heated_bodies() { return entries; }

} // namespace catalogue
} // namespace registration
