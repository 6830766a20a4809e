#!/usr/bin/env bash
# usage: docs/look.sh WIDTHxHEIGHT PICTURE.png PATH… [-- KEY…]
# Starts the packaged viewer in a virtual display, presses the keys, saves a picture of the screen.
set -euo pipefail
[ $# -ge 3 ] || { echo "usage: $0 WIDTHxHEIGHT PICTURE.png PATH... [-- KEY...]" >&2; exit 2; }
size=$1 picture=$2
shift 2
paths=() keys=()
while [ $# -gt 0 ] && [ "$1" != -- ]; do paths+=("$1"); shift; done
[ $# -gt 0 ] && { shift; keys=("$@"); }
settings=$(mktemp -d)
display=:$((90 + RANDOM % 400))
Xvfb "$display" -screen 0 "${size}x24" >/dev/null 2>&1 & screen=$!
export DISPLAY=$display
HEMLINE_JAVA_OPTS="-Dprism.order=sw -Dhemline.settings=$settings/viewer.properties" \
  "$(dirname "$0")/../target/hemline/bin/hemline" view "${paths[@]}" & viewer=$!
trap 'kill $viewer $screen 2>/dev/null || true; rm -rf "$settings"' EXIT
for _ in $(seq 120); do
  window=$(xdotool search --name '^Hemline' 2>/dev/null | tail -1) && [ -n "$window" ] && break
  sleep 0.5
done
xdotool windowmove "$window" 0 0 windowsize "$window" "${size%x*}" "${size#*x}"
sleep "${LOOK_SECONDS:-20}"
for key in "${keys[@]}"; do xdotool key "$key"; sleep 0.5; done
sleep 1
import -window root "$picture"
