#!/usr/bin/python3
"""Writes toolkit_files.sdf.gz: molfiles by RDKit and Open Babel with the SMILES the same toolkit gives for them.

RDKit reads its own file back for the SMILES, so that a geometry it could not reach does not count as an error.

Needs the Debian packages python3-rdkit, rdkit-data and openbabel. The versions used are recorded in each record.
Molecules: every 25th of NCI/first_5K.smi (package rdkit-data) and the names in stereo.smi (structures from memory).
"""
import gzip
import os
import subprocess
import sys

import rdkit
from rdkit import Chem, RDConfig, RDLogger
from rdkit.Chem import AllChem

RDLogger.DisableLog("rdApp.*")
here = os.path.dirname(os.path.abspath(__file__))
nci = os.path.join(RDConfig.RDDataDir, "NCI", "first_5K.smi")
babel_version = subprocess.run(["obabel", "-V"], capture_output=True, text=True).stdout.split(" -- ")[0].strip()


def record(block, kind, tool, smiles, name):
    lines = block.split("\n")
    end = next(i for i, line in enumerate(lines) if line.startswith("M  END"))
    lines[0] = name
    lines[1] = lines[1][:22]
    body = "\n".join(lines[: end + 1])
    return f"{body}\n> <SMILES>\n{smiles}\n\n> <KIND>\n{kind}\n\n> <TOOL>\n{tool}\n\n$$$$\n"


def reread(block):
    return Chem.MolToSmiles(Chem.MolFromMolBlock(block))


def main():
    entries = []
    with open(os.path.join(here, "stereo.smi"), encoding="utf-8") as source:
        for line in source:
            if line.strip() and not line.startswith("#"):
                smiles, _, name = line.strip().partition(" ")
                entries.append((smiles, name, True))
    with open(nci, encoding="utf-8") as source:
        for number, line in enumerate(source):
            if number % 25 == 0:
                entries.append((line.split()[0], f"NCI line {number + 1}", False))

    out = []
    tool = f"RDKit {rdkit.__version__}"
    for smiles, name, stereo in entries:
        mol = Chem.MolFromSmiles(smiles)
        if mol is None:
            print("not read by RDKit:", smiles, file=sys.stderr)
            continue
        flat = Chem.Mol(mol)
        AllChem.Compute2DCoords(flat)
        block = Chem.MolToMolBlock(flat)
        out.append(record(block, "2D V2000", tool, reread(block), name))
        if stereo:
            block = Chem.MolToMolBlock(flat, forceV3000=True)
            out.append(record(block, "2D V3000", tool, reread(block), name))
            solid = Chem.AddHs(mol)
            if solid.GetNumAtoms() < 90 and AllChem.EmbedMolecule(solid, randomSeed=7, useRandomCoords=True) == 0:
                block = Chem.MolToMolBlock(solid)
                out.append(record(block, "3D with hydrogens", tool, reread(block), name))
        if stereo:
            babel = subprocess.run(
                ["obabel", "-:" + smiles, "--gen2D", "-omol"], capture_output=True, text=True).stdout
            text = subprocess.run(["obabel", "-:" + smiles, "-ocan"], capture_output=True, text=True).stdout.split()
            if "M  END" in babel and text:
                out.append(record(babel, "2D V2000", babel_version, text[0], name))
    with open(os.path.join(here, "toolkit_files.sdf.gz"), "wb") as raw:
        with gzip.GzipFile(fileobj=raw, mode="wb", mtime=0, filename="") as packed:
            packed.write("".join(out).encode("utf-8"))
    print(len(out), "records")


main()
