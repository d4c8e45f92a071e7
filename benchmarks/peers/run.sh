#!/usr/bin/env bash
# Builds the peer programs, runs them alternately with ours on the same file, one thread each, and writes
# results/peers.md. usage: run.sh [ROUNDS] [FILE]      (Debian; installs the toolkits by package name when missing)
set -euo pipefail
cd "$(dirname "$0")/.."
rounds=${1:-5}
file=${2:-/usr/share/RDKit/Data/NCI/first_5K.smi}
packages="librdkit-dev rdkit-data libboost-dev libopenbabel-dev libbeam-java libopenchemlib-java default-jdk-headless g++"
if ! dpkg-query -W $packages >/dev/null 2>&1; then
  sudo=$(command -v sudo || true)
  $sudo apt-get update -qq && $sudo apt-get install -y -qq $packages >/dev/null
fi

built=$(mktemp -d)
trap 'rm -rf "$built"' EXIT
beam=/usr/share/java/beam-core.jar
openchemlib=/usr/share/java/openchemlib.jar
g++ -O3 -std=c++17 -I/usr/include/rdkit peers/RdkitPeer.cpp -o "$built/rdkit" -lRDKitSmilesParse -lRDKitGraphMol -lRDKitRDGeneral
g++ -O3 -std=c++17 -isystem /usr/include/openbabel3 peers/OpenBabelPeer.cpp -o "$built/openbabel" -lopenbabel
javac -d "$built" -cp $beam:$openchemlib peers/*.java
dotnet build RadicalSites.Peers -c Release -v q --nologo >/dev/null

run() { # peer mode -> microseconds, check number, bytes
  case $1 in
    ours) dotnet RadicalSites.Peers/bin/Release/net10.0/RadicalSites.Peers.dll "$2" "$file" "$3" ;;
    rdkit) "$built/rdkit" "$2" "$file" "$4" ;;
    openbabel) "$built/openbabel" "$2" "$file" "$4" ;;
    beam) java -XX:+UseSerialGC -cp "$built:$beam" BeamPeer "$2" "$file" "$3" ;;
    openchemlib) java -XX:+UseSerialGC -cp "$built:$openchemlib" OpenChemLibPeer "$2" "$file" "$4" ;;
  esac
}

: >"$built/times"
for round in $(seq "$rounds"); do
  for mode in parse sites canonical write predict; do
    for peer in ours beam rdkit openbabel openchemlib; do
      case $peer-$mode in
        beam-parse) fast=60 ;;
        beam-* | openbabel-write | openbabel-predict | openchemlib-write | openchemlib-predict) continue ;;
        ours-predict) fast=8 ;;
        *) fast=40 ;;
      esac
      slow=1; [ "$peer" = openchemlib ] && slow=8
      echo "$peer $mode $(run "$peer" "$mode" "$fast" "$slow")" >>"$built/times"
    done
  done
done
mkdir -p results
{
  echo "# Beside the peers"
  echo
  echo "One thread, $(wc -l <"$file") molecules of $(basename "$file") (NCI open database), best pass of $rounds alternating rounds"
  echo "[microseconds of processor time per molecule, so that other work on the machine counts little]. The ratio is the peer's time by ours. Renew with \`benchmarks/peers/run.sh\`."
  echo
  echo "Machine: $(lscpu | sed -n 's/^Model name: *//p' | head -1), $(nproc) cores, $(free -g | awk '/^Mem/{print $2}') GiB; .NET $(dotnet --version), $(java -version 2>&1 | head -1 | tr -d '\"')."
  echo "Versions: $(dpkg-query -W -f '${Package} ${Version}; ' librdkit1 libopenbabel7 libbeam-java libopenchemlib-java)"
  echo
  echo "| work | toolkit | time | ratio | ours, bytes allocated |"
  echo "|---|---|---:|---:|---:|"
  awk '{ key = $2 " " $1; if (!(key in best) || $3 < best[key]) best[key] = $3; if ($1 == "ours") bytes[$2] = $5 }
    END { split("parse sites canonical write predict", modes); split("ours beam rdkit openbabel openchemlib", peers)
      for (m = 1; m <= 5; m++) for (p = 1; p <= 5; p++) { key = modes[m] " " peers[p]
        if (key in best) printf "| %s | %s | %.2f | %.1f | %s |\n", modes[m], peers[p], best[key],
          best[key] / best[modes[m] " ours"], peers[p] == "ours" ? bytes[modes[m]] : "" } }' "$built/times"
  echo
  echo "parse: SMILES to molecule with hydrogen counts and a Kekule form (RDKit: with its default sanitization)."
  echo "sites: parse, equivalence classes, C(sp3)-H carbons. Ours has exact orbits that respect stereo, topicity and the"
  echo "kind of each site; the peers rank atoms. canonical: parse and canonical isomeric SMILES. write: canonical isomeric"
  echo "SMILES of molecules already read. predict: RDKit parses, ranks, replaces one hydrogen of each class by chlorine and"
  echo "writes distinct canonical SMILES; ours does that and also bond enthalpies, rates, shares with intervals, stereo"
  echo "outcome and remarks."
} | tee results/peers.md
