#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# Builds everything with warnings as errors and runs all tests, the real office included.
#     test.sh [BUILD-FOLDER]
set -euo pipefail
source "$(dirname "${BASH_SOURCE[0]}")/office.sh"

folder="${1:-$project/build/tests}"
say "[1/3] Packages"
need "${build_packages[@]}" "${test_packages[@]}"
say "[2/3] Building (some minutes the first time)"
build "$folder" -DENTROPY_CELLS_WERROR=ON
say "[3/3] Testing"
ctest --test-dir "$folder" --output-on-failure --no-tests=error -j "$(nproc)"
