// SPDX-License-Identifier: MPL-2.0

// The component that the office creates once and calls for every cell. It holds no state: the same
// arguments give the same result, whichever thread recalculates.

#include "addin/arguments.h"
#include "addin/results.h"
#include "registration/catalogue/catalogue.h"

#include <com/sun/star/lang/XServiceInfo.hpp>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <cppuhelper/implbase2.hxx>
#include <cppuhelper/supportsservice.hxx>
#include <entropycells/XFunctions.hpp>

#include <initializer_list>

namespace {

using css::uno::Any, css::uno::Sequence;
using rtl::OUString;

/// Where an entry stands in the catalogue.
struct Place {
    std::size_t section, entry;
};

using Values = std::initializer_list<Any const*>;

/// No exception may leave, whatever happens: the office would show an error without a reason.
Any answer(Place place, Values values) noexcept {
    namespace catalogue = registration::catalogue;
    try {
        auto const& entry = catalogue::sections()[place.section].entries[place.entry];
        try {
            const addin::Arguments arguments(values);
            return addin::to_office(registration::call(entry, arguments.blocks()));
        } catch (core::Failure const& failure) {
            return addin::refused(entry, values, failure);
        }
    } catch (...) {
        return Any(registration::error_number(core::Failure::Kind::unfit));
    }
}

constexpr const char* implementation = "org.entropycells.functions";
constexpr const char* service = "entropycells.Functions";

class Functions : public cppu::WeakImplHelper2<entropycells::XFunctions, css::lang::XServiceInfo> {
public:
    OUString SAL_CALL getImplementationName() override {
        return OUString::createFromAscii(implementation);
    }
    sal_Bool SAL_CALL supportsService(OUString const& name) override {
        return cppu::supportsService(this, name);
    }
    Sequence<OUString> SAL_CALL getSupportedServiceNames() override {
        Sequence<OUString> names(1);
        names.getArray()[0] = OUString::createFromAscii(service);
        return names;
    }

#include "methods.h"
};

#include "methods.inc"

} // namespace

extern "C" SAL_DLLPUBLIC_EXPORT css::uno::XInterface*
entropycells_functions(css::uno::XComponentContext*, Sequence<Any> const&) {
    return cppu::acquire(new Functions);
}
