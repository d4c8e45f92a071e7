"""Facts about SMILES of the OpenSMILES specification and of public test suites: charge, hydrogens, formula, or refusal.

A string stays in the table when Beam and RDKit agree on all of it; the others are counted and left out.
"""
import subprocess
import tempfile
from pathlib import Path

from rdkit import Chem

import facts

HERE = Path(__file__).resolve().parent / "strings"


def by_rdkit(smiles):
    options = Chem.SmilesParserParams()
    options.removeHs = False
    mol = Chem.MolFromSmiles(smiles, options)
    if mol is None or mol.GetNumAtoms() == 0:
        return "error", "", ""
    return str(facts.charge(mol)), facts.hydrogens(mol), facts.formula(mol)


def by_beam(strings):
    jar = "/usr/share/java/beam-core.jar"
    with tempfile.TemporaryDirectory() as folder:
        listed = Path(folder) / "strings"
        listed.write_text("\n".join(strings) + "\n")
        subprocess.run(["javac", "-d", folder, "-cp", jar, str(HERE / "BeamFacts.java")], check=True)
        answer = subprocess.run(["java", "-cp", f"{folder}:{jar}", "BeamFacts", str(listed)],
                                capture_output=True, text=True, check=True).stdout
    return [tuple(line.split("\t")) for line in answer.splitlines()]


def make(write):
    cases = [line.split("\t") for line in (HERE / "strings.tsv").read_text().splitlines() if line[0] != "#"]
    rows, apart = [], 0
    for (smiles, source), beam in zip(cases, by_beam([case[0] for case in cases])):
        charge, hydrogens, formula = by_rdkit(smiles)
        if (charge, hydrogens) == beam:
            rows.append([smiles, charge, hydrogens, formula, source])
        else:
            apart += 1
    write("smiles_facts.tsv", [f"SMILES on which Beam and RDKit agree ({apart} on which they do not are left out); README.md."],
          ["smiles", "charge", "hydrogens", "formula", "source"], rows)
