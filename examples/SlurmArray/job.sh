#!/bin/bash
#SBATCH --job-name=radicalsites
#SBATCH --output=/dev/null
# One task of a job array: the shard of its number. TOOL, INPUT and OUT come from the environment of the submission.
set -eu
$TOOL predict "$INPUT" --reagent Cl2 --format ndjson --quiet \
    --shard "$SLURM_ARRAY_TASK_ID/$SLURM_ARRAY_TASK_COUNT" --resume --output "$OUT/part-$SLURM_ARRAY_TASK_ID.ndjson" || [ $? -eq 1 ]
