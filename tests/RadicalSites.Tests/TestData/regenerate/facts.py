"""Facts that RDKit states about a molecule, in the form that the tables use."""
from collections import Counter

from rdkit import Chem, RDLogger


RDLogger.DisableLog("rdApp.*")


def formula(mol):
    """Formula in Hill order without charge."""
    counts = Counter()
    for atom in mol.GetAtoms():
        counts[atom.GetSymbol()] += 1
        counts["H"] += atom.GetTotalNumHs()
    counts.pop("*", None)
    order = sorted(k for k in counts if counts[k])
    if "C" in order:
        order = ["C"] + (["H"] if "H" in order else []) + [k for k in order if k not in ("C", "H")]
    return "".join(k + (str(counts[k]) if counts[k] > 1 else "") for k in order)


def hydrogens(mol):
    """Hydrogens on each atom, separated by blanks."""
    return " ".join(str(atom.GetTotalNumHs()) for atom in mol.GetAtoms())


def is_site_carbon(atom):
    """A carbon with hydrogen, single bonds only, and a full octet."""
    return (atom.GetAtomicNum() == 6 and atom.GetTotalNumHs() > 0 and not atom.GetIsAromatic()
            and atom.GetNumRadicalElectrons() == 0 and atom.GetTotalDegree() == 4 + min(atom.GetFormalCharge(), 0)
            and all(bond.GetBondType() == Chem.BondType.SINGLE for bond in atom.GetBonds()))


def classes(mol):
    """Constitutional classes: stereo removed, ties kept."""
    plain = Chem.Mol(mol)
    Chem.RemoveStereochemistry(plain)
    return list(Chem.CanonicalRankAtoms(plain, breakTies=False, includeChirality=False))


def sizes(ranks):
    """Sizes of classes, ascending, as size*count."""
    counted = Counter(Counter(ranks).values())
    return " ".join(f"{size}*{counted[size]}" for size in sorted(counted))


def charge(mol):
    return Chem.GetFormalCharge(mol)
