"""Facts over the NCI file of rdkit-data: formula, hydrogens, aromatic atoms, sites, classes, InChI."""
import shutil
import subprocess

from rdkit import Chem

import facts
from regenerate import NCI_FILE, REFERENCE


def make(write):
    shutil.copyfile(NCI_FILE, REFERENCE / "nci_first_5k.smi")
    rows = []
    for line in NCI_FILE.read_text().splitlines():
        smiles, number = line.split()
        mol = Chem.MolFromSmiles(smiles)
        if mol is None:
            rows.append([number, "error"] + [""] * 8)
            continue
        ranks = facts.classes(mol)
        sites = [atom.GetIdx() for atom in mol.GetAtoms() if facts.is_site_carbon(atom)]
        rows.append([
            number, facts.formula(mol), facts.charge(mol), facts.hydrogens(mol),
            "".join("a" if atom.GetIsAromatic() else "-" for atom in mol.GetAtoms()),
            len(sites), sum(mol.GetAtomWithIdx(i).GetTotalNumHs() for i in sites),
            len(set(ranks)), facts.sizes(ranks), facts.sizes([ranks[i] for i in sites])])
    write("nci_facts.tsv",
          ["Facts over nci_first_5k.smi as RDKit states them; README.md describes the columns."],
          ["number", "formula", "charge", "hydrogens", "aromatic", "siteCarbons", "siteHydrogens", "classCount",
           "classSizes", "siteClassSizes"], rows)
    answers = subprocess.run(["obabel", "-ismi", str(NCI_FILE), "-oinchi", "-xt", "-e"],
                             capture_output=True, text=True, check=True).stdout.splitlines()
    names = dict(reversed(line.split(None, 1)) for line in answers if len(line.split(None, 1)) == 2)
    write("nci_inchi.tsv", ["Standard InChI of nci_first_5k.smi, by the InChI library through Open Babel."],
          ["number", "inchi"], [[row[0], names.get(row[0], "")] for row in rows])
