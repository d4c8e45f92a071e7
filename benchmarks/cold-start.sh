#!/usr/bin/env bash
# Time from the start of the tool to its first answer for one molecule: plain, ReadyToRun and, where the tool chain is
# there, NativeAOT. Best and median of some runs; prints Markdown. usage: cold-start.sh [RUNS]
set -euo pipefail
cd "$(dirname "$0")/.."
runs=${1:-15}
built=$(mktemp -d)
trap 'rm -rf "$built"' EXIT
project=src/RadicalSites.Cli/RadicalSites.Cli.csproj

measure() { # label program...
  local label=$1 times
  shift
  times=$(for _ in $(seq "$runs"); do
    local start end
    start=$(date +%s%N)
    "$@" predict "CC(C)Cc1ccc(cc1)C(C)C(=O)O" --reagent NBS --temperature 80C --format json >/dev/null
    end=$(date +%s%N)
    echo $(((end - start) / 10000))
  done | sort -n)
  echo "$times" | awk -v label="$label" '{ t[NR] = $1 / 100 } END { printf "| %s | %.0f | %.0f |\n", label, t[1], t[int((NR + 1) / 2)] }'
}

echo "## First answer of the tool"
echo
echo "One molecule, \`predict\` to JSON, $runs starts of the process."
echo
echo "| build | best, ms | median, ms |"
echo "|---|---:|---:|"
dotnet publish $project -c Release -o "$built/plain" -v q --nologo -p:PackAsTool=false >/dev/null
measure plain dotnet "$built/plain/RadicalSites.Cli.dll"
if dotnet publish $project -c Release -r linux-x64 --self-contained false -p:PublishReadyToRun=true -p:PackAsTool=false \
  -o "$built/r2r" -v q --nologo >"$built/r2r.log" 2>&1; then
  measure ReadyToRun dotnet "$built/r2r/RadicalSites.Cli.dll"
else
  echo "| ReadyToRun | not built here | |"
fi
if dotnet publish $project -c Release -r linux-x64 -p:PublishAot=true -p:PackAsTool=false \
  -o "$built/aot" -v q --nologo >"$built/aot.log" 2>&1; then
  measure NativeAOT "$(find "$built/aot" -maxdepth 1 -type f -executable ! -name '*.dbg' ! -name '*.so' | head -1)"
else
  echo "| NativeAOT | not built here: $(grep -m1 -oE 'error [A-Z0-9]+: .{0,90}' "$built/aot.log" || echo 'see the log') | |"
fi
