#!/usr/bin/env bash
# SPDX-License-Identifier: GPL-3.0-or-later
# Makes the archive of the sources and the package and tries them: the archive builds without a network; the package
# satisfies Debian's checks; in a clean system that is made for it, it installs with its dependencies, opens a study by
# its type, and goes without a trace.
#   tests/long/package.sh [LOG]     as root; the log is .build/package/package.log where none is named
# The clean system is this one's release, from the mirror that apt has here; SUITE and MIRROR set others. What is
# fetched for it is kept in .build/package/fetched.
set -u
. "$(dirname "${BASH_SOURCE[0]}")/../../app/build.sh"

[ "$(id -u)" -eq 0 ] || { say "This makes a system of its own and enters it, which needs root."; exit 3; }
need_packages "${build_packages[@]}" "${package_packages[@]}" lintian debootstrap desktop-file-utils appstream libxml2-utils ||
  exit 3
# In a world of its own, all mounts and processes end with the script.
if [ -z "${APART-}" ]; then
  unshare --mount --pid --fork true || { say "Mounts and processes cannot be kept apart here: nothing is tried."; exit 3; }
  exec env APART=1 unshare --mount --pid --fork --kill-child --mount-proc "$0" "$@"
fi

trap 'exit 130' INT TERM # which the first process of such a world would not heed by itself

work=$root/.build/package
log=$(realpath -m "${1:-$work/package.log}")
system=$work/system
type=application/x-planewright-study
mkdir -p "$work/fetched"
exec > >(tee "$log") 2>&1

part() { printf '\n=== %s\n' "$*"; }
fail() { printf 'FAILED: %s\n' "$*"; sleep 1; exit 1; }
# must WORDS...: shows the command and what it says; the script ends where it fails.
must() { printf '$ %s\n' "${*//$root\//}"; "$@" || fail "$*"; }
# same WHAT FOUND EXPECTED
same() { printf '%s: %s\n' "$1" "$2"; [ "$2" = "$3" ] || fail "$1 is not $3"; }

part "archive and package, built without a network"
apart=(unshare --net)
"${apart[@]}" true 2>/dev/null || { apart=(); echo "The network cannot be taken away here: that the build needs none is NOT shown."; }
must "${apart[@]}" "$root/app/package"
archive=$(ls "$work"/planewright-*.tar.gz) deb=$(ls "$work"/planewright_*.deb)
source=${archive%.tar.gz}

part "the archive"
held=$(tar -t -f "$archive" | grep -v '/$' | cut -d/ -f2- | LC_ALL=C sort)
echo "$(wc -l <<<"$held") files"
grep -E '(^|/)(\.git|\.build|\.ccache|__pycache__)(/|$)' <<<"$held" && fail "the archive holds what is no source"
if [ -e "$root/.git" ]; then
  diff <(git -C "$root" ls-files | LC_ALL=C sort) - <<<"$held" || fail "the archive is not what is under version control"
  echo "They are those under version control."
fi
must bash "$source/tests/layering/check" "$source"

part "the package"
must dpkg-deb --info "$deb"
must dpkg-deb --contents "$deb"
echo "\$ lintian"
lintian --allow-root --display-info --fail-on error "$deb" || fail lintian
echo "lintian: $(lintian --allow-root "$deb" | grep -c '^E:') errors, $(lintian --allow-root "$deb" | grep -c '^W:') warnings"
rm -rf "$work/unpacked" && dpkg-deb --extract "$deb" "$work/unpacked" || fail "the package does not unpack"
share=$work/unpacked/usr/share program=$work/unpacked/usr/bin/planewright
must desktop-file-validate "$share/applications/planewright.desktop"
must appstreamcli validate --no-net "$share"/metainfo/*.xml
must xmllint --noout "$share/mime/packages/planewright.xml"
readelf --section-headers "$program" | grep -E '\.(debug|symtab)' && fail "the program is not stripped"
grep -c "$root" "$program" | grep -qx 0 || fail "the program holds the folder where it was built"
echo "The program is stripped and does not know where it was built."

part "a clean system"
suite=${SUITE-$(system_word VERSION_CODENAME)}
mirror=${MIRROR-$(apt-get indextargets --format '$(REPO_URI)' "Created-By: Packages" "Codename: $suite" "Component: main" | head -n 1)}
[ -n "$mirror" ] || fail "apt has no mirror of $suite here; set MIRROR"
rm -rf --one-file-system "$system"
echo "\$ debootstrap --variant=minbase $suite, from the mirror of apt"
debootstrap --variant=minbase --cache-dir="$work/fetched" "$suite" "$system" "$mirror" >"$work/debootstrap.log" 2>&1 ||
  { tail "$work/debootstrap.log"; fail debootstrap; }
echo "$(chroot "$system" dpkg-query -W | wc -l) packages"
mount -t proc proc "$system/proc" && mount -t devpts devpts "$system/dev/pts" &&
  mount --bind "$work/fetched" "$system/var/cache/apt/archives" || fail "its mounts"
cp /etc/resolv.conf "$system/etc/resolv.conf"
printf '#!/bin/sh\nexit 101\n' >"$system/usr/sbin/policy-rc.d" && chmod +x "$system/usr/sbin/policy-rc.d"

user=tester
inside() { chroot "$system" env -i PATH=/usr/sbin:/usr/bin:/sbin:/bin HOME=/root LANG=C.UTF-8 DEBIAN_FRONTEND=noninteractive "$@"; }
# as_user [VARIABLE=VALUE...] COMMAND...: in the folder of a user who is not root.
as_user() {
  chroot --userspec=$user "$system" env -i PATH=/usr/bin:/bin HOME=/home/$user USER=$user XDG_RUNTIME_DIR=/run/$user \
    LANG=C.UTF-8 DISPLAY=:97 \
    sh -c 'cd && exec env "$@"' sh "$@"
}
apt_get() { inside apt-get -y -q -o APT::Sandbox::User=root "$@" >"$work/apt.log" 2>&1 || { tail -n 20 "$work/apt.log"; fail "apt-get $*"; }; }

# What a desktop has anyway, so that it does not count as the package's: a display, its tools, and the two that see to
# types and entries.
apt_get update
apt_get install --no-install-recommends xvfb xdotool xdg-utils libglib2.0-bin libfile-mimeinfo-perl desktop-file-utils shared-mime-info
inside useradd --create-home $user && inside install -d -o $user -m 700 /run/$user || fail useradd

# Every file, folder and link with its rights, and the contents of files. Left out: what is not on the disk, the user's
# own folder, and the packages that apt fetched.
listing() {
  local here=(. -xdev '(' -path ./proc -o -path ./dev -o -path ./sys -o -path ./run -o -path ./home
    -o -path ./var/cache/apt/archives ')' -prune -o)
  (
    cd "$system" || exit
    find "${here[@]}" -printf '%p %y %m %U:%G %l\n'
    find "${here[@]}" -type f -print0 | xargs -0 sha256sum | sed -E 's/^([0-9a-f]+)  (.*)/\2 \1/'
  ) | LC_ALL=C sort
}
listing >"$work/before"
echo "$(cut -d' ' -f1 "$work/before" | uniq | wc -l) files, folders and links before"

part "the package is installed"
cp "$deb" "$system/tmp/planewright.deb"
inside apt-get install -s -q --no-install-recommends /tmp/planewright.deb | grep -E '^[0-9]+ upgraded' || fail "its dependencies"
apt_get install --no-install-recommends /tmp/planewright.deb
rm "$system/tmp/planewright.deb"
must inside dpkg-query -W planewright
must inside dpkg --verify planewright
missing=$(inside ldd /usr/bin/planewright | grep 'not found') && fail "$missing"
listing >"$work/installed"
added=$(comm -13 <(cut -d' ' -f1 "$work/before" | uniq) <(cut -d' ' -f1 "$work/installed" | uniq))
echo "$(wc -l <<<"$added") files, folders and links more, of these with its name: $(grep -c planewright <<<"$added")"

part "commands, as a user, without a display"
as_user sh -c 'cp /usr/share/doc/planewright/examples/boat-shed-beam.planewright beam.planewright && mkdir made'
must as_user --unset=DISPLAY planewright --version
as_user --unset=DISPLAY planewright validate >"$work/validated" 2>&1 || fail "planewright validate"
grep '^planewright: All' "$work/validated" || fail "planewright validate"
for kind in svg pdf png; do
  must as_user --unset=DISPLAY planewright figure beam.planewright -o "made/beam.$kind"
done

part "the type of a study"
for desktop in GNOME X-Generic; do # the first asks gio, the second reads the databases by itself
  same "xdg-mime query filetype ($desktop)" "$(as_user XDG_CURRENT_DESKTOP=$desktop xdg-mime query filetype beam.planewright)" $type
  same "xdg-mime query default ($desktop)" "$(as_user XDG_CURRENT_DESKTOP=$desktop xdg-mime query default $type)" planewright.desktop
done
as_user cp beam.planewright made/unnamed
same "gio info, by its beginning" "$(as_user gio info -a standard::content-type made/unnamed | sed -n 's/.*content-type: //p')" $type
must as_user gio info -a standard::content-type,standard::icon beam.planewright
must as_user gio mime $type
as_user gio mime $type | head -n 1 | grep -q planewright.desktop || fail "planewright does not open studies"

part "a study is opened by its type"
as_user Xvfb :97 -screen 0 1400x1000x24 -nolisten tcp >"$work/xvfb.log" 2>&1 &
display=$!
for ((i = 0; i < 100; i++)); do [ -S "$system/tmp/.X11-unix/X97" ] && break; sleep 0.1; done
opened_by() { # COMMAND...: opens the study, sees its window and ends the program
  local window pid i
  printf '$ %s\n' "$*"
  as_user "$@" &
  window=$(as_user timeout 120 xdotool search --sync --onlyvisible --name '^beam – Planewright$' | head -n 1)
  [ -n "$window" ] || fail "no window came"
  same "title of its window" "$(as_user xdotool getwindowname "$window")" "beam – Planewright"
  pid=$(as_user xdotool getwindowpid "$window")
  same "its program" "$(readlink "/proc/$pid/exe" | sed "s,^$system,,")" /usr/bin/planewright
  kill "$pid"
  for ((i = 0; i < 100; i++)); do [ -e "/proc/$pid" ] || return 0; sleep 0.1; done
  fail "it does not end"
}
opened_by XDG_CURRENT_DESKTOP=GNOME gio open beam.planewright
opened_by XDG_CURRENT_DESKTOP=X-Generic xdg-open beam.planewright
kill "$(cat "$system/tmp/.X97-lock")" && wait $display 2>/dev/null
rm -rf "$system"/tmp/.X*

part "the package is purged"
echo "of the user's own, which stays:"
(cd "$system/home/$user" && find . -type f ! -path './.bash*' ! -path ./.profile | LC_ALL=C sort)
apt_get purge planewright
apt_get autoremove --purge
inside dpkg-query -W planewright 2>&1 | grep 'no packages found' || fail "it is still there"
listing >"$work/after"
echo "$(cut -d' ' -f1 "$work/after" | uniq | wc -l) files, folders and links after"
# What dpkg and apt note, and what triggers make anew from what is there.
kept='\./var/(lib/(dpkg|apt)|log/(apt|dpkg\.log|alternatives\.log)|cache/(apt|debconf|ldconfig|fontconfig))(/| |$)'
made='\./(etc/ld\.so\.cache|usr/share/mime/[^p ][^ ]*|usr/share/applications/mimeinfo\.cache) '
changes=$(diff "$work/before" "$work/after" | grep '^[<>]')
echo "changed, of records and caches:"
grep -E "^. ($kept|$made)" <<<"$changes" | cut -d' ' -f2 | LC_ALL=C sort -u | sed 's/^/  /'
traces=$(grep -vE "^. ($kept|$made)" <<<"$changes")
[ -z "$traces" ] || { printf '%s\n' "$traces"; fail "traces are left"; }
named=$(cd "$system" && find etc usr var opt srv root tmp ! -path 'var/lib/dpkg/*' ! -path 'var/cache/apt/archives/*' -iname '*planewright*')
[ -z "$named" ] || { printf '%s\n' "$named"; fail "files of its name are left"; }
told=$(cd "$system" && grep -rIl planewright etc usr var root tmp --exclude-dir=archives 2>/dev/null | LC_ALL=C sort | xargs)
echo "files that still name it: $told"
tr ' ' '\n' <<<"$told" | grep -vE '^(var/(log|lib/(dpkg|apt))/|$)' && fail "what is left names it"
echo "No trace is left but these records and caches."

umount "$system/var/cache/apt/archives" "$system/dev/pts" "$system/proc" && rm -rf --one-file-system "$system" "$work/unpacked"
part "package: all passed"
sleep 1 # until the log is written
