#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# committed_lists.sh DESCRIBE_ADDIN FOLDER: what the writer does with lists that are not up to date,
# tried on copies.
set -euo pipefail
writer=$1
copy="$(mktemp -d)"
trap 'rm -rf "$copy"' EXIT
fresh_copy() { cp "$2/ids.txt" "$2/FUNCTIONS.md" "$copy/"; }
refused() { # refused MODE PIECE-OF-THE-REASON
  local said
  if said=$("$writer" "$1" "$copy" 2>&1); then echo "$1 was not refused"; exit 1; fi
  [[ $said == *"$2"* ]] || { echo "$1 said: $said"; exit 1; }
}

# An id that sheets hold and the catalogue has not: neither passes nor is renewed away.
fresh_copy "$@"
echo functionOfOldSheets >>"$copy/ids.txt"
cp "$copy/ids.txt" "$copy/before"
refused --check functionOfOldSheets
refused --renew functionOfOldSheets
cmp "$copy/before" "$copy/ids.txt"

# A new id is asked for and appended, where it stays last.
fresh_copy "$@"
first=$(head -n 1 "$copy/ids.txt")
sed -i 1d "$copy/ids.txt"
refused --check "$first"
"$writer" --renew "$copy"
[ "$(tail -n 1 "$copy/ids.txt")" = "$first" ]
"$writer" --check "$copy"

# A stale list of functions is found by its line, and renewed.
fresh_copy "$@"
sed -i '3s/$/ /' "$copy/FUNCTIONS.md"
refused --check "line 3"
sed -i '$d' "$copy/FUNCTIONS.md"
refused --check stale
"$writer" --renew "$copy"
cmp "$copy/FUNCTIONS.md" "$2/FUNCTIONS.md"
