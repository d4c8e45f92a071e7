"""Constitutional isomers of alkanes with k hydrogens replaced by chlorine, by brute force with RDKit canonical SMILES."""
from rdkit import Chem

SUBSTRATES = """methane C|ethane CC|propane CCC|butane CCCC|isobutane CC(C)C|pentane CCCCC|isopentane CCC(C)C|neopentane CC(C)(C)C
hexane CCCCCC|2,3-dimethylbutane CC(C)C(C)C|cyclopropane C1CC1|cyclobutane C1CCC1|cyclopentane C1CCCC1|cyclohexane C1CCCCC1
methylcyclohexane CC1CCCCC1|norbornane C1CC2CCC1C2|adamantane C1C2CC3CC1CC(C2)C3|cubane C12C3C4C1C5C2C3C45|decalin C1CCC2CCCCC2C1
toluene Cc1ccccc1|ethylbenzene CCc1ccccc1|para-xylene Cc1ccc(C)cc1|diethyl_ether CCOCC|propene CC=C|bicyclobutane C1C2C1C2"""


def substituted(smiles):
    mol = Chem.MolFromSmiles(smiles)
    for atom in mol.GetAtoms():
        if atom.GetAtomicNum() == 6 and atom.GetTotalNumHs() and atom.GetHybridization() == Chem.HybridizationType.SP3:
            changed = Chem.RWMol(mol)
            added = changed.AddAtom(Chem.Atom(17))
            changed.AddBond(atom.GetIdx(), added, Chem.BondType.SINGLE)
            Chem.SanitizeMol(changed)
            yield Chem.MolToSmiles(changed)


def make(write):
    rows = []
    for entry in (entry for line in SUBSTRATES.split("\n") for entry in line.split("|")):
        name, smiles = entry.split(" ")
        level, counts = {Chem.CanonSmiles(smiles)}, []
        for _ in range(4):
            level = {product for one in level for product in substituted(one)}
            counts.append(len(level))
        rows.append([name, smiles] + counts)
    write("polychlorination_counts.tsv", ["Constitutional isomers with 1 to 4 chlorines on C(sp3), by brute force; README.md."],
          ["name", "smiles", "one", "two", "three", "four"], rows)
