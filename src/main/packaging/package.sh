#!/bin/sh
# Builds the application image and the Debian package from the jar and its libraries.
# Arguments: the build folder, the version.
set -eu
target=$1
version=$(printf '%s' "$2" | sed 's/-.*//')
here=$(dirname "$0")
work=$target/package-app
rm -rf "$work"
mkdir -p "$work/input"
cp "$target/perveance.jar" "$work/input/"
cp -r "$target/lib" "$work/input/lib"
# The window opens a second earlier when the second compiler does not compete with it, and hours of
# edits stay below 400 MB with this heap.
jpackage --type app-image --name perveance --app-version "$version" \
  --vendor "Perveance" \
  --description "Design assistant for valve amplifier stages" \
  --input "$work/input" --main-jar perveance.jar --main-class perveance.launch.DesktopMain \
  --add-launcher perveance-cli="$here/cli.properties" \
  --icon "$here/../resources/perveance/desktop/perveance.png" \
  --java-options "-XX:+UseSerialGC -XX:TieredStopAtLevel=1 -Xmx256m" \
  --java-options '-XX:SharedArchiveFile=$APPDIR/perveance.jsa' \
  --jlink-options "--strip-debug --no-man-pages --no-header-files --generate-cds-archive" \
  --dest "$work"
# Which classes the first window needs is found by opening it once. The installation prepares an
# archive of them (resources/postinst), with which it opens a third sooner; without a display here
# that is left out.
classes=$work/perveance/lib/app/classes.lst
display=
if [ -z "${DISPLAY:-}" ] && command -v xvfb-run > /dev/null; then
  display="xvfb-run -a"
fi
if [ -n "${DISPLAY:-}$display" ]; then
  mkdir -p "$work/home"
  HOME="$work/home" JAVA_TOOL_OPTIONS="-XX:DumpLoadedClassList=$classes -Duser.home=$work/home" \
    timeout -s TERM 20 $display "$work/perveance/bin/perveance" > "$work/window.log" 2>&1 || true
fi
jpackage --type deb --name perveance --app-version "$version" \
  --vendor "Perveance" --linux-deb-maintainer "perveance@localhost" \
  --description "Design assistant for valve amplifier stages" \
  --app-image "$work/perveance" \
  --file-associations "$here/chassis-file.properties" --resource-dir "$here/resources" \
  --linux-shortcut --linux-menu-group "Electronics;Education" --linux-app-category electronics \
  --license-file "$here/../../../LICENSE" \
  --linux-package-deps "libgtk-3-0, libxtst6" \
  --dest "$work"
