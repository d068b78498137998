// SPDX-License-Identifier: MPL-2.0
#include "registration/uncertain_places.h"

#include "core/text/quantity.h"
#include "registration/gas_argument.h"
#include "registration/own_material.h"

namespace registration {
namespace {

/// Of a text that may be a material, a quantity, or something else that carries no uncertainty.
void add(std::vector<Place>& places, std::string_view text, std::size_t cell) {
    try {
        if (core::materials::is_material_text(text)) {
            const auto description = core::materials::read_description(text);
            const auto found = uncertain_places(description, cell);
            places.insert(places.end(), found.begin(), found.end());
        } else if (const double u = core::text::read_quantity(text).u; u > 0) {
            places.push_back({cell, 0, 0, u});
        }
    } catch (core::Failure const&) {
    }
}

std::vector<Place> of_texts(core::Formulas const& texts) {
    std::vector<Place> places;
    for (std::size_t at = 0; at < texts.size(); ++at) add(places, texts[at], at);
    return places;
}

std::vector<Place> of_cells(Given const& given) {
    std::vector<Place> places;
    for (std::size_t at = 0; at < given.cell_count(); ++at)
        if (given.cell(at).kind == Cell::Kind::text) add(places, given.cell(at).text, at);
    return places;
}

} // namespace

std::vector<Place> uncertain_places(Need const& need, Given const& given) {
    switch (need.kind) {
    case Need::Kind::material:
        return uncertain_places(read_description(given));
    case Need::Kind::gas:
    case Need::Kind::fluid:
    case Need::Kind::constant_gas:
        return uncertain_places_of_gas(given);
    case Need::Kind::text:
        return need.whole ? of_texts(given.texts()) : std::vector<Place>{};
    case Need::Kind::cell:
        return need.whole ? of_cells(given) : std::vector<Place>{};
    default:
        return {};
    }
}

} // namespace registration
