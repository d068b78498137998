#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# one_symbol.sh LIBRARY: the library defines one symbol for others, the component's constructor.
set -euo pipefail
symbols=$(nm -D --defined-only "$1" | awk '{ print $3 }')
echo "$symbols"
[ "$symbols" = entropycells_functions ]
