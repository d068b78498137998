#!/usr/bin/env bash
# SPDX-License-Identifier: MPL-2.0
# office_speed.sh PACKAGE EMPTY-PACKAGE PROGRAM: starts an office with both packages in a throw-away
# profile and lets the program measure.
set -euo pipefail
source "$(dirname "${BASH_SOURCE[0]}")/../../../registration/package/office.sh"
own_folder
own_office "$2"
own_office "$1"
pipe="entropy_cells_speed_$$"
soffice --headless --norestore "${profile[@]}" "--accept=pipe,name=$pipe;urp;" >"$workspace/soffice.log" 2>&1 &
server=$!
trap 'kill "$server" 2>/dev/null || true; wait "$server" 2>/dev/null || true; rm -rf "$workspace"' EXIT
program="$(dirname "$(readlink -f "$(command -v soffice)")")"
export LD_LIBRARY_PATH="$program" URE_BOOTSTRAP="vnd.sun.star.pathname:$program/fundamentalrc"
for _ in $(seq 20); do
  sleep 0.5
  if timeout 300 "$3" "$pipe" 2>"$workspace/error"; then exit 0; fi
  grep -q connect "$workspace/error" || { cat "$workspace/error" >&2; exit 1; }
done
cat "$workspace/error" >&2
exit 1
