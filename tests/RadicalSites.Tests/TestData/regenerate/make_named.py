"""Exact classes of atoms of named molecules and of regular graphs: orbits of all automorphisms, listed by backtracking.

The orbits come from the automorphisms, not from a ranking, so that they are exact where refinement merges too
much (cuneane, pairs of rings, random cubic hydrocarbons).
"""
import random

from rdkit import Chem

import facts

NAMED = """methane C|ethane CC|propane CCC|isobutane CC(C)C|neopentane CC(C)(C)C|2,2,3,3-tetramethylbutane CC(C)(C)C(C)(C)C
2,3-dimethylbutane CC(C)C(C)C|isooctane CC(C)CC(C)(C)C|cyclohexane C1CCCCC1|methylcyclohexane CC1CCCCC1
1,4-dimethylcyclohexane CC1CCC(C)CC1|1,3,5-trimethylcyclohexane CC1CC(C)CC(C)C1|decalin C1CCC2CCCCC2C1
adamantane C1C2CC3CC1CC(C2)C3|diamantane C1C2CC3C4CC5CC(C14)C(C2)C3C5|twistane C1CC2CC3CCC2CC13
norbornane C1CC2CCC1C2|bicyclo[2.2.2]octane C1CC2CCC1CC2|[1.1.1]propellane C1C23CC12C3|spiro[5.5]undecane C1CCC2(CC1)CCCCC2
cubane C12C3C4C1C5C2C3C45|prismane C12C3C1C4C2C34|tetrahedrane C12C3C1C23|cuneane C12C3C4C5C1C5C2C34
basketane C1CC2C3C4C2C2C1C3C42
para-xylene Cc1ccc(C)cc1|mesitylene Cc1cc(C)cc(C)c1|durene Cc1cc(C)c(C)cc1C|hexamethylbenzene Cc1c(C)c(C)c(C)c(C)c1C
ethylbenzene CCc1ccccc1|indane C1CCc2ccccc21|tetralin C1CCc2ccccc2C1|diphenylmethane C(c1ccccc1)c1ccccc1
biphenyl c1ccc(cc1)-c1ccccc1|toluene Cc1ccccc1|pyrene c1cc2ccc3cccc4ccc(c1)c2c34|coronene c1cc2ccc3ccc4ccc5ccc6ccc1c1c2c3c4c5c61
p-cymene Cc1ccc(C(C)C)cc1|triptycene C12c3ccccc3C(c3ccccc31)c1ccccc12|[2.2]paracyclophane C1Cc2ccc(cc2)CCc2ccc1cc2
limonene CC1=CCC(CC1)C(C)=C|alpha-pinene CC1=CCC2CC1C2(C)C|camphor CC1(C)C2CCC1(C)C(=O)C2|menthane CC1CCC(CC1)C(C)C
squalane CC(C)CCCC(C)CCCC(C)CCCCC(C)CCCC(C)CCCC(C)C|cholesterol CC(C)CCCC(C)C1CCC2C3CC=C4CC(O)CCC4(C)C3CCC12C
ibuprofen CC(C)Cc1ccc(cc1)C(C)C(=O)O|tetraethylammonium CC[N+](CC)(CC)CC|18-crown-6 C1COCCOCCOCCOCCOCCO1
cyclohexane_and_cyclopropanes C1CCCCC1.C1CC1.C1CC1|three_ethanes CC.CC.CC|two_rings C1CCCCC1.C1CCC1
tetramethylsilane C[Si](C)(C)C|hexamethyldisiloxane C[Si](C)(C)O[Si](C)(C)C|pentaerythritol OCC(CO)(CO)CO
trimethoxyborane COB(OC)OC|permethylcyclopentasilane C[Si]1(C)[Si](C)(C)[Si](C)(C)[Si](C)(C)[Si]1(C)C|urotropine C1N2CN3CN1CN(C2)C3"""


def cubic(size, seed):
    """A connected cubic hydrocarbon (CH)n without multiple edges, from a fixed seed; chemistry only in name."""
    source = random.Random(seed)
    while True:
        ends = [atom for atom in range(size) for _ in range(3)]
        source.shuffle(ends)
        pairs = {tuple(sorted(ends[i:i + 2])) for i in range(0, len(ends), 2)}
        if len(pairs) == size * 3 // 2 and all(a != b for a, b in pairs):
            editable = Chem.RWMol()
            for _ in range(size):
                editable.AddAtom(Chem.Atom(6))
            for a, b in sorted(pairs):
                editable.AddBond(a, b, Chem.BondType.SINGLE)
            mol = editable.GetMol()
            Chem.SanitizeMol(mol)
            if len(Chem.GetMolFrags(mol)) == 1:
                return Chem.MolToSmiles(mol)


def petersen(n, step):
    """The cubic hydrocarbon on a generalised Petersen graph; (10, 2) is dodecahedrane, (n, 1) a prismane."""
    editable = Chem.RWMol()
    for _ in range(2 * n):
        editable.AddAtom(Chem.Atom(6))
    for i in range(n):
        editable.AddBond(i, (i + 1) % n, Chem.BondType.SINGLE)
        editable.AddBond(i, n + i, Chem.BondType.SINGLE)
        editable.AddBond(n + i, n + (i + step) % n, Chem.BondType.SINGLE)
    return Chem.MolToSmiles(editable.GetMol())


def orbits(mol):
    """Orbits and number of all automorphisms, by plain backtracking over atoms in order."""
    atoms = list(mol.GetAtoms())
    kind = [(a.GetAtomicNum(), a.GetFormalCharge(), a.GetTotalNumHs(), a.GetDegree()) for a in atoms]
    bonds = [{(b.GetOtherAtomIdx(a.GetIdx())): b.GetBondType() for b in a.GetBonds()} for a in atoms]
    image, used, found, count = [-1] * len(atoms), [False] * len(atoms), [set() for _ in atoms], 0

    def place(atom):
        nonlocal count
        if atom == len(atoms):
            count += 1
            for one, other in enumerate(image):
                found[one].add(other)
            return
        before = [other for other in bonds[atom] if other < atom]
        for other in range(len(atoms)):
            if (not used[other] and kind[other] == kind[atom]
                    and all(bonds[other].get(image[b]) == bonds[atom][b] for b in before)
                    and sum(used[n] for n in bonds[other]) == len(before)):
                image[atom], used[other] = other, True
                place(atom + 1)
                used[other] = False

    place(0)
    return [min(images) for images in found], count


def make(write):
    cases = [entry.split(" ") for line in NAMED.split("\n") for entry in line.split("|")]
    cases += [[f"cubic-{size}-{seed}", cubic(size, seed)] for size in (8, 10, 12, 16, 20) for seed in range(6)]
    cases += [["dodecahedrane", petersen(10, 2)]]
    cases += [[f"petersen-{n}-{step}", petersen(n, step)] for n, step in ((5, 1), (5, 2), (7, 2), (8, 3), (9, 2), (12, 5))]
    rows = []
    for name, smiles in cases:
        mol = Chem.MolFromSmiles(smiles)
        found, count = orbits(mol)
        ranks = facts.classes(mol)
        sites = [atom.GetIdx() for atom in mol.GetAtoms() if facts.is_site_carbon(atom)]
        rows.append([name, smiles, count, len(set(found)), facts.sizes(found), facts.sizes([found[i] for i in sites]),
                     sum(mol.GetAtomWithIdx(i).GetTotalNumHs() for i in sites), len(set(ranks))])
    write("named_orbits.tsv", ["Exact constitutional classes from all automorphisms (graphs by RDKit, backtracking search); README.md."],
          ["name", "smiles", "automorphisms", "classCount", "classSizes", "siteClassSizes", "siteHydrogens",
           "classCountByRanking"], rows)
