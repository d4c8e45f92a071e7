"""Feeds invented molecules to the tool and reads its NDJSON, one record for each molecule, in order."""
import json
import subprocess
import sys

MOLECULES = [("CC(C)C", "isobutane"), ("C1CC", "broken"), ("Cc1ccccc1", "toluene")]

text = "".join(f"{smiles}\t{name}\n" for smiles, name in MOLECULES)
process = subprocess.run(
    sys.argv[1:] + ["predict", "-", "--reagent", "Br2", "--format", "ndjson", "--quiet"],
    input=text, capture_output=True, text=True, check=False,
)
for line in process.stdout.splitlines():
    record = json.loads(line)
    if record["status"] == "ok":
        best = max(record["products"], key=lambda product: product["share"] or 0)
        print(record["name"], best["smiles"], f"{best['share']:.3f}")
    else:
        print(record["name"], record["error"]["code"])
print("exit code", process.returncode)
