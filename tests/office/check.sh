#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# check.sh WHAT FOLDER: looks at the texts that session.sh left.
# The least numbers of rows keep a sheet that lost its rows from passing.
set -euo pipefail
here="$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd)"
folder=$2

# count FILE CONDITION: rows for which an awk condition holds.
count() { awk -F'\t' "$2 { n++ } END { print n + 0 }" "$1"; }
# all FILE ROWS GOOD LEAST: every row that counts is good, and there are enough of them.
all() {
  local rows good
  rows=$(count "$1" "$2") good=$(count "$1" "$2 && $3")
  echo "$(basename "$1"): $good of $rows"
  awk -F'\t' "$2 && !($3)" "$1"
  [ "$rows" -eq "$good" ] && [ "$rows" -ge "$4" ]
}

case $1 in
  # call | value | expected | agrees
  examples) all "$folder/examples.csv" '1' '$4 == 1' 48 ;;
  saved_ids)
    all "$folder/saved_ids.csv" '1' '$4 == 1' 65
    # Every id is called from a cell, in the form that documents store.
    while read -r id; do
      grep -q "ENTROPYCELLS.FUNCTIONS.${id^^}(" "$here/saved_ids.fods" || { echo "saved_ids.fods lacks $id"; exit 1; }
    done <"$here/../../registration/ids.txt" ;;
  # call | value | expected error | reason | expected piece
  wrong_inputs) all "$folder/wrong_inputs.csv" '1' '$2 == $3 && index($4, $5) && index($4, "To mend it, ")' 143 ;;
  # letter | label | symbol | value | unit | u | note | expected | agrees
  example_sheets)
    for sheet in "$folder"/example-*.csv; do
      all "$sheet" '($9 == 0 || $9 == 1 || $9 ~ /#/) && $9 != ""' '$9 == 1' 10
      if grep -nE '(^|	)(Err:[0-9]+|#(VALUE|NUM|NAME|REF|N\/A|DIV)[^	]*)(	|$)' "$sheet"; then exit 1; fi
    done ;;
esac
