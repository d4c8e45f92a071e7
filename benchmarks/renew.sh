#!/usr/bin/env bash
# Renews everything under benchmarks/results: peers.md, growth.md, cold-start.md, stages.md.
# usage: renew.sh [--quick]      quick: fewer rounds and records, short runs of BenchmarkDotNet in its own process
set -euo pipefail
cd "$(dirname "$0")"
rounds=5
job=(--job Medium)
records=1000000
if [ "${1:-}" = --quick ]; then
  rounds=2
  job=(--inProcess --warmupCount 1 --iterationCount 3 --iterationTime 100)
  records=100000
fi

mkdir -p results
head_of() { # title
  echo "# $1"
  echo
  echo "Machine: $(lscpu | sed -n 's/^Model name: *//p' | head -1), $(nproc) cores, $(free -g | awk '/^Mem/{print $2}') GiB; .NET $(dotnet --version)."
  echo
}

peers/run.sh "$rounds"
dotnet build RadicalSites.Benchmarks -c Release -v q --nologo >/dev/null
program=RadicalSites.Benchmarks/bin/Release/net10.0/RadicalSites.Benchmarks.dll
{ head_of "Growth"; dotnet $program growth "$records"; } >results/growth.md
{ head_of "Cold start"; ./cold-start.sh; } >results/cold-start.md
artifacts=$(mktemp -d)
trap 'rm -rf "$artifacts"' EXIT
dotnet $program --filter '*' "${job[@]}" --join --artifacts "$artifacts" >/dev/null
{
  head_of "Stages"
  grep -h '^|' "$artifacts"/results/*github.md
} >results/stages.md
