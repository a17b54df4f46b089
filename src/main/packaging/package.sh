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
jpackage --type app-image --name perveance --app-version "$version" \
  --description "Design assistant for valve amplifier stages" \
  --input "$work/input" --main-jar perveance.jar --main-class perveance.launch.DesktopMain \
  --add-launcher perveance-cli="$here/cli.properties" \
  --icon "$here/../resources/perveance/desktop/perveance.png" \
  --java-options "-XX:+UseSerialGC" \
  --jlink-options "--strip-debug --no-man-pages --no-header-files --generate-cds-archive" \
  --dest "$work"
jpackage --type deb --name perveance --app-version "$version" \
  --description "Design assistant for valve amplifier stages" \
  --app-image "$work/perveance" \
  --file-associations "$here/chassis-file.properties" --resource-dir "$here/resources" \
  --linux-shortcut --linux-menu-group "Electronics;Education" --linux-app-category electronics \
  --linux-package-deps "libgtk-3-0, libxtst6" \
  --dest "$work"
