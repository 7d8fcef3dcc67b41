#!/usr/bin/env bash
# Builds everything and runs every test. As root on Debian it installs what the tests need first; elsewhere it names what is
# missing, and the tests that need it are skipped with the reason. The last line is "N passed, N failed, N skipped".
set -uo pipefail
cd "$(dirname "$0")/.."

export DOTNET_CLI_TELEMETRY_OPTOUT=1 DOTNET_NOLOGO=1 DEBIAN_FRONTEND=noninteractive

needs() { # command package
    command -v "$1" >/dev/null 2>&1 && return
    missing+=("$2")
}

missing=()
needs chromium chromium
needs ngspice ngspice
ldconfig -p 2>/dev/null | grep -q 'libicuuc\.so' || missing+=(libicu72)

if [ "${#missing[@]}" -gt 0 ]; then
    if [ "$(id -u)" = 0 ] && command -v apt-get >/dev/null 2>&1; then
        echo "Installing: ${missing[*]}"
        apt-get update -qq && apt-get install -y -qq --no-install-recommends "${missing[@]}" >/dev/null \
            || echo "Could not install ${missing[*]}; the tests that need them will be skipped."
    else
        echo "Missing: ${missing[*]}. Install them to run every test; without them the tests that need them are skipped."
    fi
fi

dotnet build Selector.sln -c Release --nologo -v quiet || { echo "0 passed, 1 failed, 0 skipped"; exit 1; }

results=$(mktemp -d)
trap 'rm -rf "$results"' EXIT
failed_projects=()

# One after the other: two cores, and the browser tests measure.
for project in tests/*/*.csproj; do
    name=$(basename "$project" .csproj)
    [ "$name" = Selector.Benchmarks ] && continue
    echo "== $name"
    dotnet test "$project" -c Release --no-build --nologo -v quiet \
        --logger "trx;LogFileName=$name.trx" --results-directory "$results" || failed_projects+=("$name")
done

passed=0 failed=0 skipped=0
for trx in "$results"/*.trx; do
    [ -e "$trx" ] || continue
    counters=$(grep -o '<Counters [^>]*>' "$trx" | head -n 1)
    count() { printf '%s' "$counters" | sed -n "s/.* $1=\"\([0-9]*\)\".*/\1/p"; }
    total=$(count total) ok=$(count passed) bad=$(count failed)
    passed=$((passed + ok)) failed=$((failed + bad)) skipped=$((skipped + total - ok - bad))
done

# A project that ended badly without a failed test has crashed: that is a failure too.
for name in ${failed_projects[@]+"${failed_projects[@]}"}; do
    if [ ! -e "$results/$name.trx" ] || ! grep -q 'outcome="Failed"' "$results/$name.trx"; then
        echo "$name did not finish."
        failed=$((failed + 1))
    fi
done

echo "$passed passed, $failed failed, $skipped skipped"
[ "$failed" -eq 0 ] && [ "$passed" -gt 0 ]
