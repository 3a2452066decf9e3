# SPDX-License-Identifier: GPL-3.0-or-later
# shellcheck shell=bash
# Sourced by app/run, tests/run and the checks: what the program is built from, and the one way to build it.
# Says what it does on standard error, so that standard output belongs to what is run.

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)

build_packages=(ninja-build cmake g++ qt6-base-dev qt6-charts-dev libqt6opengl6-dev qt6-tools-dev
  qt6-l10n-tools qt6-translations-l10n libeigen3-dev nlohmann-json3-dev libexpected-dev nettle-dev fonts-liberation2)
test_packages=(libgtest-dev libgmock-dev librapidcheck-dev poppler-utils librsvg2-bin locales
  python3-pyatspi at-spi2-core dbus xvfb desktop-file-utils appstream shared-mime-info libxml2-utils libglib2.0-bin
  mandoc man-db)
package_packages=(dpkg-dev file)
check_packages=(clang-16 clang-tidy-16 clang-format libclang-rt-16-dev)

say() { printf '%s\n' "$*" >&2; }

# One word of /etc/os-release; empty where there is none.
system_word() {
  [ -r /etc/os-release ] || return 0
  ( . /etc/os-release; printf '%s' "${!1-}" )
}

installed() {
  local state version
  state=$(dpkg-query -W -f '${db:Status-Status}' "$1" 2>/dev/null)
  [ "$state" = installed ] && return 0
  # Later systems ship version 2 of the fonts under the older name.
  [ "$1" = fonts-liberation2 ] || return 1
  version=$(dpkg-query -W -f '${db:Status-Status} ${Version}' fonts-liberation 2>/dev/null)
  [[ $version == "installed "*:2* || $version == "installed 2"* ]]
}

# The name under which this system's package lists know a package.
known_name() {
  if [ "$1" = fonts-liberation2 ] && ! apt-cache show "$1" >/dev/null 2>&1; then
    echo fonts-liberation
  else
    echo "$1"
  fi
}

# install_packages NAME...: with apt-get, as root or by sudo.
install_packages() {
  local as_root=() names=() name
  if [ "$(id -u)" -ne 0 ]; then
    if ! command -v sudo >/dev/null; then
      say "These packages are missing: $*"
      say "Installing them needs root, and sudo is not here. As root: apt-get install --no-install-recommends $*"
      return 1
    fi
    as_root=(sudo)
  fi
  say "Installing packages that are missing: $*"
  "${as_root[@]}" env DEBIAN_FRONTEND=noninteractive apt-get update -q >&2 || return 1
  for name; do names+=("$(known_name "$name")"); done
  "${as_root[@]}" env DEBIAN_FRONTEND=noninteractive apt-get install -y -q --no-install-recommends "${names[@]}" >&2
}

# need_packages NAME...: nothing when all are there; else installs them, or says why it cannot.
need_packages() {
  local missing=() name
  if [ "$(system_word UBUNTU_CODENAME)" = jammy ]; then
    say "Ubuntu 22.04 (and what is built on it) has Qt 6.2; Planewright needs Qt 6.4 or later."
    say "Use Debian 12, Ubuntu 24.04 or later."
    return 1
  fi
  if ! command -v dpkg-query >/dev/null || ! command -v apt-get >/dev/null; then
    [ -e "$root/.build/release/build.ninja" ] && return 0
    say "This system has no apt-get: nothing is installed. Needed are, by their names in Debian 12:"
    say "  $*"
    return 0
  fi
  for name; do installed "$name" || missing+=("$name"); done
  [ ${#missing[@]} -eq 0 ] || install_packages "${missing[@]}"
}

# configure FOLDER OPTION...: a Ninja build of the repository in .build/FOLDER; once is enough, later changes
# of the build's description are seen by ninja. FOLDER is configured anew when the options change.
configure() {
  local folder=$root/.build/$1 asked launcher=()
  shift
  asked="$*"
  [ -e "$folder/build.ninja" ] && [ "$(cat "$folder/asked" 2>/dev/null)" = "$asked" ] && return 0
  command -v ccache >/dev/null && launcher=(-DCMAKE_CXX_COMPILER_LAUNCHER=ccache)
  cmake -S "$root" -B "$folder" -G Ninja "${launcher[@]}" "$@" >&2 || return 1
  printf '%s' "$asked" >"$folder/asked"
}

# build FOLDER TARGET...: with a line of progress for those who watch.
build() {
  local folder=$root/.build/$1 quiet=(--quiet)
  shift
  [ -t 2 ] && quiet=()
  ninja -C "$folder" "${quiet[@]}" "$@" >&2
}

# The release build serves program and tests alike. It learns of the tests when they are first asked for, so
# that running the program needs none of their packages.
configure_release() {
  if [ "${1-}" = tests ] || [ "$(cat "$root/.build/release/asked" 2>/dev/null)" = -DPLANEWRIGHT_TESTS=ON ]; then
    configure release -DPLANEWRIGHT_TESTS=ON
  else
    configure release -DPLANEWRIGHT_TESTS=OFF
  fi
}

# run_ctest FOLDER OPTION...: runs all tests of .build/FOLDER without a display and closes with the line
# "N passed, N failed", counted from what ctest recorded; fails when a test failed, did not run, or none exists.
run_ctest() {
  local folder=$root/.build/$1 record passed failed skipped outcome=0
  shift
  record=$folder/tests.xml
  rm -f "$record"
  QT_QPA_PLATFORM=offscreen DBUS_SESSION_BUS_ADDRESS=disabled: ctest --test-dir "$folder" --output-on-failure \
    --no-tests=error -j "$(nproc)" --output-junit "$record" "$@" || outcome=1
  passed=$(grep -c '<testcase .*status="run"' "$record" 2>/dev/null)
  skipped=$(grep -c '<skipped message="SKIP_' "$record" 2>/dev/null)
  failed=$(($(grep -c '<testcase ' "$record" 2>/dev/null) - passed - skipped))
  [ "$failed" -eq 0 ] && [ "$passed" -gt 0 ] || outcome=1
  if [ "$skipped" -gt 0 ]; then
    echo "$passed passed, $failed failed, $skipped skipped"
  else
    echo "$passed passed, $failed failed"
  fi
  return $outcome
}
