#!/usr/bin/env bash
# Builds UnitVent and runs it on this machine, with a database of its own and an invented demo unit.
#   bash deploy/try.sh            the demo unit
#   bash deploy/try.sh --empty    no unit yet: prints a secret for the set-up page
# Ctrl+C stops it. Settings, all optional:
#   UNITVENT_URL     where it answers (http://127.0.0.1:5080)
#   UNITVENT_DATA    the data folder
#   ConnectionStrings__Owner, ConnectionStrings__Runtime    a PostgreSQL server of yours instead
set -euo pipefail

root=$(cd "$(dirname "${BASH_SOURCE[0]}")/.." && pwd)
# shellcheck source=deploy/need.sh
. "$root/deploy/need.sh"

case $* in
  '') unit=--demo ;;
  --empty) unit=--empty ;;
  *) die "usage: bash deploy/try.sh [--empty]" ;;
esac

build() {
  cd "$root"
  need_home
  need_dotnet
  if [[ -n ${ConnectionStrings__Owner:-} ]]; then need fonts; else need postgres fonts; fi
  echo "Building ..." >&2
  dotnet build -c Release src/UnitVent.Web -v quiet >&2
}

from=$PWD
build
cd "$from" # so that a relative UNITVENT_DATA means what it says
export UNITVENT_URL="${UNITVENT_URL:-http://127.0.0.1:5080}"
exec dotnet "$root/src/UnitVent.Web/bin/Release/net10.0/unitvent.dll" serve "$unit"
