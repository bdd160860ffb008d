# Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0
# Sourced by the scripts under releng and by the launcher in the checkout: sets MVN to a Maven of at least 3.9, fetching one through
# an older Maven when that is all there is. $root must be the root of the checkout.
maven_version=3.9.16
maven_is_new_enough() {
  v=$("$1" -v 2>/dev/null | sed -n 's/^.*Apache Maven \([0-9]*\)\.\([0-9]*\).*$/\1 \2/p' | head -n 1)
  [ -n "$v" ] || return 1
  set -- $v
  [ "$1" -gt 3 ] || { [ "$1" -eq 3 ] && [ "$2" -ge 9 ]; }
}
cached_mvn="$root/.mvn-cache/apache-maven-$maven_version/bin/mvn"
if [ -x "$cached_mvn" ]; then
  MVN=$cached_mvn
elif command -v mvn >/dev/null 2>&1; then
  if maven_is_new_enough mvn; then
    MVN=mvn
  else
    echo "spanfield: Maven is older than 3.9; fetching Maven $maven_version into .mvn-cache" >&2
    # In an empty folder: without a pom this goal leaves a marker folder behind, and the marker turns a later run into a no-op.
    scratch=$(mktemp -d)
    (cd "$scratch" && mvn -B -q -Dstyle.color=never org.apache.maven.plugins:maven-dependency-plugin:3.8.1:unpack \
      "-Dartifact=org.apache.maven:apache-maven:$maven_version:zip:bin" "-DoutputDirectory=$root/.mvn-cache") >&2
    rm -rf "$scratch"
    MVN=$cached_mvn
    if [ ! -x "$MVN" ]; then
      echo "spanfield: Maven $maven_version could not be fetched; install Maven 3.9 or newer and put it on the PATH" >&2
      exit 3
    fi
  fi
else
  echo "spanfield: Maven was not found; run releng/setup, or install Maven 3.9 or newer and put it on the PATH" >&2
  exit 3
fi
