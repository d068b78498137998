// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/entry.h"

#include <span>
#include <string>
#include <string_view>

/// Every function of the add-in, once, a file a subject. The sections are named here one by one:
/// nothing registers itself, so nothing can be dropped by a linker.
namespace registration::catalogue {

std::span<const Entry> phase_change();
std::span<const Entry> heat();
std::span<const Entry> simple_processes();
std::span<const Entry> variable_heat_capacity();
std::span<const Entry> tables();
std::span<const Entry> steam();
std::span<const Entry> real_gas();
std::span<const Entry> mixing();
std::span<const Entry> balance();
std::span<const Entry> streams();
std::span<const Entry> end_states();
std::span<const Entry> heated_bodies();
std::span<const Entry> missing_data();
std::span<const Entry> quantities();
std::span<const Entry> formulas();
std::span<const Entry> about();

struct Section {
    const char* title;
    std::span<const Entry> entries;
};
/// All sections in the order in which people read them.
std::span<const Section> sections();

/// The entry of a display name, or null.
Entry const* find(std::string_view name);

/// The method id of a function, `ENTROPY.FUSION` → `entropyFusion`. Ids are a file format.
std::string id(Entry const&);

} // namespace registration::catalogue
