#!/usr/bin/env bash
# Runs a job array of four tasks over shards of one input, joins the parts in order, and compares with a single run.
# With SLURM=1 it sets up a one-node Slurm from the Debian package slurm-wlm; otherwise, and where Slurm cannot start, it
# runs the same job script once for each task by itself and says so.
set -euo pipefail
here=$(cd "$(dirname "$0")" && pwd)
TOOL=${TOOL:-dotnet "$here/../../src/RadicalSites.Cli/bin/Release/net10.0/RadicalSites.Cli.dll"}
OUT=$(mktemp -d)
INPUT=$OUT/molecules.smi
export TOOL INPUT OUT
trap 'rm -rf "$OUT"' EXIT
for n in $(seq 1 101); do printf '%s\tinvented-%d\n' "$(printf 'C%.0s' $(seq 1 $((n % 9 + 1))))OC" "$n"; done >"$INPUT"

start_slurm() {
    command -v slurmctld >/dev/null || { apt-get update -qq && apt-get install -y -qq slurm-wlm munge >/dev/null 2>&1; } || return 1
    mkdir -p /etc/slurm /var/spool/slurmctld /var/spool/slurmd /run/munge
    chown munge /run/munge 2>/dev/null || true
    cat >/etc/slurm/slurm.conf <<X
ClusterName=local
SlurmctldHost=$(hostname -s)
AuthType=auth/munge
ProctrackType=proctrack/linuxproc
TaskPlugin=task/none
SelectType=select/cons_tres
SlurmctldPidFile=/run/slurmctld.pid
SlurmdPidFile=/run/slurmd.pid
StateSaveLocation=/var/spool/slurmctld
SlurmdSpoolDir=/var/spool/slurmd
SlurmUser=root
ReturnToService=2
NodeName=$(hostname -s) CPUs=$(nproc) State=UNKNOWN
PartitionName=all Nodes=ALL Default=YES MaxTime=60 State=UP
X
    pgrep munged >/dev/null || runuser -u munge -- munged 2>/dev/null || return 1
    pgrep slurmctld >/dev/null || slurmctld || return 1
    pgrep slurmd >/dev/null || slurmd || return 1
    for _ in $(seq 1 20); do sinfo -h -o %T 2>/dev/null | grep -q idle && return 0; sleep 1; done
    return 1
}

if [ "${SLURM:-0}" = 1 ] && start_slurm; then
    echo "job array on Slurm"
    sbatch --wait --array=1-4 --export=ALL,TOOL="$TOOL",INPUT="$INPUT",OUT="$OUT" "$here/job.sh" >/dev/null
else
    [ "${SLURM:-0}" = 0 ] || echo "Slurm did not start here; the tasks run one after the other" >&2
    echo "job script run once for each task"
    for task in 1 2 3 4; do SLURM_ARRAY_TASK_ID=$task SLURM_ARRAY_TASK_COUNT=4 bash "$here/job.sh"; done
fi
cat "$OUT"/part-{1,2,3,4}.ndjson >"$OUT/joined.ndjson"
$TOOL predict "$INPUT" --reagent Cl2 --format ndjson --quiet >"$OUT/single.ndjson"
cmp "$OUT/joined.ndjson" "$OUT/single.ndjson"
echo "$(wc -l <"$OUT/joined.ndjson") records, joined parts equal the single run"
