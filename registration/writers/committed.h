// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <filesystem>

/// The two files written from the catalogue that are committed: FUNCTIONS.md and ids.txt. Saved
/// sheets hold the ids, so that list only grows.
namespace registration::writers {

/// Throws std::runtime_error, with what differs, where a committed file is not what the catalogue
/// says.
void check_committed(std::filesystem::path const& folder);

/// Writes FUNCTIONS.md anew and appends ids that are new. Throws std::runtime_error, and writes
/// nothing, where the catalogue has lost an id.
void renew_committed(std::filesystem::path const& folder);

} // namespace registration::writers
