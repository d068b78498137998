# SPDX-License-Identifier: MPL-2.0
# What the scripts of this project share: packages, the build, and an office with a profile of its
# own. Sourced, not run.

project="$(cd "$(dirname "${BASH_SOURCE[0]}")/../.." && pwd)"

say() { printf '%s\n' "$*" >&2; }
fail() { say "$*"; exit 1; }

# need PACKAGE...: installs Debian packages that are missing; only root can.
need() {
  local missing=() package
  for package in "$@"; do
    dpkg-query -W -f='${Status}' "$package" 2>/dev/null | grep -q 'ok installed' || missing+=("$package")
  done
  [ ${#missing[@]} -eq 0 ] && return
  command -v apt-get >/dev/null || fail "These packages are missing, and this is no Debian system: ${missing[*]}"
  [ "$(id -u)" -eq 0 ] || fail "These packages are missing; install them as root: apt-get install ${missing[*]}"
  say "    installing ${missing[*]}"
  export DEBIAN_FRONTEND=noninteractive
  local log
  log="$(mktemp)"
  { apt-get update -qq && apt-get install -y -qq --no-install-recommends "${missing[@]}"; } >"$log" 2>&1 ||
    { cat "$log" >&2; fail "The packages could not be installed."; }
  rm -f "$log"
}

build_packages=(g++ cmake ninja-build pkg-config libboost-dev libpugixml-dev libreoffice-calc libreoffice-dev)
test_packages=(libgtest-dev librapidcheck-dev libbenchmark-dev units)

# build FOLDER CMAKE-ARGUMENT...: configures and builds, with a line of progress a step.
build() {
  local folder=$1
  shift
  mkdir -p "$folder"
  cmake -S "$project" -B "$folder" -G Ninja "$@" >"$folder/configure.log" 2>&1 || { cat "$folder/configure.log" >&2; fail "The configuration failed."; }
  NINJA_STATUS="    [%f/%t] " cmake --build "$folder" >&2 || fail "The build failed."
}

# A folder of this run's own, gone when the script ends.
own_folder() {
  workspace="$(mktemp -d)"
  trap 'rm -rf "$workspace"' EXIT
}

# own_office PACKAGE: an office in a throw-away profile with the package in it. Then `office ...`.
own_office() {
  local shared=()
  profile=("-env:UserInstallation=file://$workspace/profile" "-env:UNO_SHARED_PACKAGES_CACHE=file://$workspace/shared")
  [ "$(id -u)" -eq 0 ] && shared=(--shared)
  unopkg add "${shared[@]}" -v "${profile[@]}" "$1" >"$workspace/unopkg.log" 2>&1 || { cat "$workspace/unopkg.log" >&2; fail "The package could not be installed."; }
}
office() { timeout 300 soffice --headless --norestore "${profile[@]}" "$@" >"$workspace/soffice.log" 2>&1 || { cat "$workspace/soffice.log" >&2; fail "The office failed."; }; }

# Text of a sheet: tab between cells, values in full or as shown.
full_text='csv:Text - txt - csv (StarCalc):9,0,76,1,,0,false,false,false,false'
shown_text='csv:Text - txt - csv (StarCalc):9,0,76,1,,0,false,true,true,false'
quoted_csv='csv:Text - txt - csv (StarCalc):44,34,76,1,,0,false,true,false,false'
