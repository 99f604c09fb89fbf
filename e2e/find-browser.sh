#!/bin/sh
# Writes the path of a Chromium into the file named by $1. Left empty, the browser library fetches its own.
set -u
out=$1
mkdir -p "$(dirname "$out")"
found=${SPANWRIGHT_BROWSER:-}
look() {
  for name in chromium chromium-browser google-chrome; do
    [ -n "$found" ] || found=$(command -v "$name" 2>/dev/null || true)
  done
}
look
if [ -z "$found" ] && [ "$(id -u)" = 0 ] && command -v apt-get >/dev/null 2>&1; then
  install="apt-get -o DPkg::Lock::Timeout=120 install -y --no-install-recommends chromium"
  $install >/dev/null 2>&1 || { apt-get -o DPkg::Lock::Timeout=120 update >/dev/null 2>&1 && $install >/dev/null 2>&1; }
  look
fi
printf '%s' "$found" > "$out"
