// SPDX-License-Identifier: MPL-2.0
#pragma once

// Own materials as arguments: a block of cells under headings, or the one-cell text of MATERIAL.OF.

#include "core/materials/own_material.h"
#include "core/notes.h"
#include "registration/argument.h"
#include "registration/own_material.h"

#include <memory>

namespace registration {

/// A material on a basis, shared by all rows of a call.
template<class Basis>
struct OwnMaterialOn {
    std::shared_ptr<const core::materials::OwnMaterial> material;
};

/// A material on whatever basis.
struct AnyOwnMaterial {
    std::shared_ptr<const core::materials::OwnMaterial> material;
};

/// What a sheet says of a material.
struct MaterialDescription {
    core::materials::Description description;
};

template<class Result>
struct material_rows {
    material_rows(Given const& given, int index, core::Notes const& notes) {
        try {
            only.material = read_own_material(given, notes);
        } catch (core::Failure& failure) {
            failure.argument = index;
            throw;
        }
    }
    Result operator[](std::size_t) const { return only; }
    Result only;
};

/// One that cannot be read tells its own reason before anything else is wrong.
struct ReadableMaterial {
    static void check(Given const& given) {
        static_cast<void>(read_own_material(given, core::silent));
    }
};

template<class Basis>
struct argument<OwnMaterialOn<Basis>> : ReadableMaterial {
    static constexpr Need need{.kind = Need::Kind::material,
                               .dimension = core::dimension<core::On<core::HeatCapacity, Basis>>,
                               .whole = true};
    using Rows = material_rows<OwnMaterialOn<Basis>>;
};
template<>
struct argument<AnyOwnMaterial> : ReadableMaterial {
    static constexpr Need need{.kind = Need::Kind::material, .whole = true};
    using Rows = material_rows<AnyOwnMaterial>;
};

template<>
struct argument<MaterialDescription> : Unchecked {
    static constexpr Need need{.kind = Need::Kind::material, .whole = true};
    struct Rows {
        Rows(Given const& given, int index) {
            try {
                only.description = read_description(given);
            } catch (core::Failure& failure) {
                failure.argument = index;
                throw;
            }
        }
        MaterialDescription operator[](std::size_t) const { return only; }
        MaterialDescription only;
    };
};

} // namespace registration
