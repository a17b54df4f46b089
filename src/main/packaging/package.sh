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
  --jlink-options "--strip-debug --no-man-pages --no-header-files --generate-cds-archive" \
  --dest "$work"
jpackage --type deb --name perveance --app-version "$version" \
  --vendor "Perveance" --linux-deb-maintainer "perveance@localhost" \
  --description "Design assistant for valve amplifier stages" \
  --app-image "$work/perveance" \
  --file-associations "$here/chassis-file.properties" --resource-dir "$here/resources" \
  --linux-shortcut --linux-menu-group "Electronics;Education" --linux-app-category electronics \
  --license-file "$here/../../../LICENSE" \
  --linux-package-deps "libgtk-3-0, libxtst6" \
  --dest "$work"
