#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# session.sh PACKAGE DESCRIPTION WRONG-INPUTS-TOOL FOLDER: recalculates every sheet of the tests in a
# real office with the packed add-in, and leaves their text in FOLDER, tab between cells.
set -euo pipefail
here="$(cd "$(dirname "${BASH_SOURCE[0]}")" && pwd)"
source "$here/../../registration/package/office.sh"

package=$1 description=$2 tool=$3 folder=$4
own_folder
sheets="$workspace/sheets"
mkdir -p "$sheets"
cp "$description/examples.fods" "$sheets/"
cp "$here/saved_ids.fods" "$sheets/"
"$tool" "$here/wrong_inputs.tsv" "$sheets/wrong_inputs.fods"
for sheet in "$project"/example-sheets/*.fods; do
  [ ! -f "$sheet" ] || cp "$sheet" "$sheets/example-$(basename "$sheet")"
done

own_office "$package"
office --convert-to "$full_text" --outdir "$workspace/texts" "$sheets"/*.fods
rm -rf "$folder"
mv "$workspace/texts" "$folder"
ls "$folder"
