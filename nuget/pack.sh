#!/usr/bin/env bash
# Packs the packages to a folder (default: artifacts/packages).
set -euo pipefail
cd "$(dirname "$0")/.."
out=${1:-$PWD/artifacts/packages}
mkdir -p "$out"
for project in src/RadicalSites src/RadicalSites.Cli; do
    dotnet pack "$project" -c Release -v q --nologo -p:ContinuousIntegrationBuild=true -o "$out"
done
ls -l "$out" | awk '{ if ($9) print $5, $9 }'
