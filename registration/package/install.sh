#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# Builds the package and installs it for the current user, in that user's own office.
set -euo pipefail
source "$(dirname "${BASH_SOURCE[0]}")/office.sh"

pgrep -x soffice.bin -u "$(id -u)" >/dev/null && fail "An office is running. Close it, then run this again: it reads its extensions at start."
say "[1/3] Packages"
need "${build_packages[@]}"
say "[2/3] Building the package (a minute or two the first time)"
build "$project/build/package" -DBUILD_TESTING=OFF
say "[3/3] Installing"
shared=()
[ "$(id -u)" -eq 0 ] && shared=(--shared) # root has no office of its own: for all users
unopkg add "${shared[@]}" -f -v "$project"/build/package/entropy-cells-*.oxt >"$project/build/package/install.log" 2>&1 || { cat "$project/build/package/install.log" >&2; fail "The package could not be installed."; }
say "Done. Open Calc and write  =ADDIN.SELFTEST()  into a cell."
