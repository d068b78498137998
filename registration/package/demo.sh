#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# Runs the main job: builds the package, recalculates an example sheet in a real office without a
# window, prints its key results, leaves PDF and CSV in a folder.
#     demo.sh [FOLDER] [SHEET]
set -euo pipefail
export LC_ALL=C.UTF-8
source "$(dirname "${BASH_SOURCE[0]}")/office.sh"

results="$(mkdir -p "${1:-$project/build/demo}" && cd "${1:-$project/build/demo}" && pwd)"
sheet="${2:-$project/example-sheets/melt-and-solidification.fods}"
name="$(basename "$sheet" .fods)"
[ -f "$sheet" ] || fail "There is no sheet $sheet"

say "[1/4] Packages"
need "${build_packages[@]}" fonts-dejavu-core
say "[2/4] Building the package (a minute or two the first time)"
build "$project/build/package" -DBUILD_TESTING=OFF
say "[3/4] Installing it into a throw-away profile"
own_folder
own_office "$project"/build/package/entropy-cells-*.oxt
say "[4/4] Recalculating $name"
cp "$sheet" "$workspace/"
office --convert-to "$shown_text" --outdir "$workspace" "$workspace/$name.fods"
mv "$workspace/$name.csv" "$workspace/$name.txt"
office --convert-to "$quoted_csv" --outdir "$results" "$workspace/$name.fods"
office --convert-to pdf --outdir "$results" "$workspace/$name.fods"

# Column A holds a letter: R a result, V a check. B label, D value, E unit, I agrees.
pad() { printf '%s%*s' "$1" $(($2 > ${#1} ? $2 - ${#1} : 0)) ''; }
checks=0 good=0
printf '\n%s%s%s\n' "$(pad "$name" 66)" "$(pad value 30)" unit
while IFS=$'\x1f' read -r letter label symbol value unit u note expected agrees _; do
  case "$letter" in
    R) printf '%s%s%s\n' "$(pad "$label" 66)" "$(pad "$value" 30)" "$unit" ;;
    V) printf '%s%s%s\n' "$(pad "check: $label" 66)" "$(pad "$value" 30)" "$unit" ;;
    *) ;;
  esac
  case "$letter" in [A-Z]) [ -z "$expected" ] || { checks=$((checks + 1)); [ "$agrees" != 1 ] || good=$((good + 1)); } ;; esac
done < <(tr '\t' '\037' <"$workspace/$name.txt") # a tab would swallow empty cells
printf '\n%s of %s values agree with those computed elsewhere.\n%s\n%s\n' "$good" "$checks" "$results/$name.pdf" "$results/$name.csv"
[ "$good" -eq "$checks" ] && [ "$checks" -gt 0 ]
