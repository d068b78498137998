// SPDX-License-Identifier: MPL-2.0

// An add-in function that does nothing: what the office itself costs a call.

#include <com/sun/star/lang/XServiceInfo.hpp>
#include <com/sun/star/uno/XComponentContext.hpp>
#include <cppuhelper/implbase2.hxx>
#include <cppuhelper/supportsservice.hxx>
#include <emptycells/XFunctions.hpp>

namespace {

using css::uno::Any, css::uno::Sequence;
using rtl::OUString;

class Functions : public cppu::WeakImplHelper2<emptycells::XFunctions, css::lang::XServiceInfo> {
public:
    OUString SAL_CALL getImplementationName() override {
        return OUString("org.entropycells.empty");
    }
    sal_Bool SAL_CALL supportsService(OUString const& name) override {
        return cppu::supportsService(this, name);
    }
    Sequence<OUString> SAL_CALL getSupportedServiceNames() override {
        Sequence<OUString> names(1);
        names.getArray()[0] = "emptycells.Functions";
        return names;
    }
    Any SAL_CALL empty(Any const&, Any const&, Any const&, Any const&) override { return Any(1.0); }
};

} // namespace

extern "C" SAL_DLLPUBLIC_EXPORT css::uno::XInterface* empty_functions(css::uno::XComponentContext*,
                                                                      Sequence<Any> const&) {
    return cppu::acquire(new Functions);
}
