#!/usr/bin/env bash
# Installs what the tests need, builds, checks the formatting and runs every test.
#   bash tests/run.sh           everything
#   bash tests/run.sh --fast    without the browser
# The last line is "N passed, N failed", with ", N skipped" if any were.
set -uo pipefail

cd "$(dirname "${BASH_SOURCE[0]}")/.." || exit
# shellcheck source=deploy/need.sh
. deploy/need.sh

case $* in
  '') needs=(postgres fonts poppler chromium) ;;
  --fast) needs=(postgres fonts poppler) ;;
  *) die "usage: bash tests/run.sh [--fast]" ;;
esac

passed=0 failed=0 skipped=0 finished=no
log=$(mktemp)
trap finish EXIT

# One step of a run that either works or counts as one failure.
step() {
  local name=$1
  shift
  echo "== $name"
  "$@" && return
  echo "failed $name" | tee -a "$log"
  ((failed += 1))
  return 1
}

# Runs test programs and adds up their summary. A program that crashed, hung or held no test is a failure without a name.
run_tests() {
  local name=$1 output outcome p f s
  shift
  echo "== $name"
  output=$(mktemp)
  dotnet test "$@" --no-ansi --no-progress --timeout 20m 2>&1 | tee "$output"
  outcome=$?
  read -r p f s < <(awk '
    /^Test run summary:/ { summary = 1 }
    summary && /^ *succeeded:/ { p = $2 }
    summary && /^ *failed:/ { f = $2 }
    summary && /^ *error:/ { e = $2 } # programs that ended without a result
    summary && /^ *skipped:/ { s = $2 }
    END { print p + 0, f + e, s + 0 }' "$output")
  if ((outcome != 0 && f == 0)); then f=1; fi
  grep -E '^failed |\.dll .* (failed|Zero tests ran) *\(' "$output" | sed 's/^ *//' | sort -u >>"$log"
  rm -f "$output"
  ((passed += p, failed += f, skipped += s))
}

# The last words, however the run ends, and the one place where its outcome is decided.
finish() {
  local line="$passed passed, $failed failed"
  ((skipped == 0)) || line+=", $skipped skipped"
  if [[ -s $log ]]; then
    echo "== failures"
    cat "$log"
  fi
  rm -f "$log"
  echo "$line"
  if [[ $finished == yes ]] && ((failed == 0 && passed > 0)); then exit 0; fi
  exit 1
}

# Nothing of the caller's language, time zone or databases reaches the tests.
export LC_ALL=C.UTF-8 TZ=UTC DOTNET_CLI_UI_LANGUAGE=en
unset "${!ConnectionStrings__@}" UNITVENT_DATA UNITVENT_URL

need_home
need_dotnet
need "${needs[@]}"

step "build" dotnet build UnitVent.sln -c Release -v quiet || exit
step "formatting" dotnet format UnitVent.sln --verify-no-changes --no-restore
run_tests "tests" --test-modules 'tests/*.Tests/bin/Release/net10.0/*.Tests.dll' --max-parallel-test-modules 2
if [[ ${1:-} != --fast ]]; then
  run_tests "browser" --test-modules 'tests/UnitVent.EndToEnd/bin/Release/net10.0/UnitVent.EndToEnd.dll'
fi
finished=yes
