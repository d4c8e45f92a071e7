#!/usr/bin/env bash
# Runs every example and compares its output with the committed text; APPROVE=1 renews the texts.
set -euo pipefail
cd "$(dirname "$0")"
failed=0
check() {
    name=$1
    shift
    printf -- '-- %s\n' "$name"
    if ! "$@" >"/tmp/radicalsites-example.$$" 2>&1; then cat "/tmp/radicalsites-example.$$"; failed=1; return; fi
    if [ "${APPROVE:-0}" = 1 ]; then cp "/tmp/radicalsites-example.$$" "$name/expected.txt"; fi
    diff "$name/expected.txt" "/tmp/radicalsites-example.$$" || failed=1
}
for name in FirstMolecule OwnBondTable IsomerList WebService; do
    dotnet build "$name" -c Release -v q --nologo -clp:NoSummary || exit 1
done
tool="dotnet $PWD/../src/RadicalSites.Cli/bin/Release/net10.0/RadicalSites.Cli.dll"
for name in FirstMolecule OwnBondTable IsomerList; do
    check "$name" dotnet "$name/bin/Release/net10.0/$name.dll"
done
web() {
    dotnet WebService/bin/Release/net10.0/WebService.dll --urls http://127.0.0.1:5187 >/dev/null 2>&1 &
    pid=$!
    for _ in $(seq 1 60); do curl -s -o /dev/null "http://127.0.0.1:5187/predict" && break; sleep 0.5; done
    curl -s "http://127.0.0.1:5187/predict?smiles=CCC" | grep -o '"smiles":"[^"]*"'
    curl -s -o /dev/null -w '%{http_code}\n' "http://127.0.0.1:5187/predict?smiles=C1CC"
    curl -s -o /dev/null -w '%{http_code}\n' "http://127.0.0.1:5187/predict?smiles=$(printf 'C%.0s' $(seq 1 600))"
    kill "$pid"
    wait "$pid" 2>/dev/null || true
}
check WebService web
check PipelineFromPython python3 PipelineFromPython/run.py $tool
check SlurmArray SlurmArray/run.sh
rm -f "/tmp/radicalsites-example.$$"
exit "$failed"
