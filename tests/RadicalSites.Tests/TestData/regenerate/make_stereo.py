"""Numbers of stereoisomers, counted as distinct standard InChI, and as RDKit enumerates them.

Every tetrahedral carbon with at most one hydrogen and every open-chain C=C gets both marks in all combinations; the
InChI library (through Open Babel) says which combinations are the same molecule and which marks mean nothing. RDKit's own
count stands beside it: that version misses centres that depend on each other across a ring (1,4-dimethylcyclohexane).
"""
import itertools
import subprocess

from rdkit import Chem
from rdkit.Chem.EnumerateStereoisomers import EnumerateStereoisomers, StereoEnumerationOptions

CASES = """butan-2-ol CCC(C)O|2,3-dibromobutane CC(Br)C(C)Br|tartaric_acid OC(C(O)C(O)=O)C(O)=O|but-2-ene CC=CC
hexa-2,4-diene CC=CC=CC|1,2-dimethylcyclopropane CC1CC1C|1,2-dimethylcyclobutane CC1CCC1C|1,3-dimethylcyclobutane CC1CC(C)C1
1,2-dimethylcyclopentane CC1CCCC1C|1,3-dimethylcyclopentane CC1CCC(C)C1|1,2-dimethylcyclohexane CC1CCCCC1C
1,3-dimethylcyclohexane CC1CCCC(C)C1|1,4-dimethylcyclohexane CC1CCC(C)CC1|1-chloro-2-methylcyclohexane CC1CCCCC1Cl
2,3,4-trichloropentane CC(Cl)C(Cl)C(C)Cl|pentane-2,3,4-triol CC(O)C(O)C(C)O|2,4-dichloropentane CC(Cl)CC(C)Cl
2,3-dichloropentane CCC(Cl)C(C)Cl|3,4-dichlorohexane CCC(Cl)C(Cl)CC|2,5-dichlorohexane CC(Cl)CCC(C)Cl|glucitol OCC(O)C(O)C(O)C(O)CO
glucose OCC1OC(O)C(O)C(O)C1O|menthol CC1CCC(C(C)C)C(O)C1|carvone CC1=CCC(CC1=O)C(C)=C|threonine CC(O)C(N)C(O)=O
isoleucine CCC(C)C(N)C(O)=O|2-chlorobutane CCC(C)Cl|3-chlorohexane CCCC(Cl)CC|1-bromo-1-chloroethane CC(Cl)Br|2-chloropropane CC(C)Cl
chlorocyclohexane ClC1CCCCC1|1,2-dichlorocyclohexane ClC1CCCCC1Cl|1,4-dichlorocyclohexane ClC1CCC(Cl)CC1|decalin C1CCC2CCCCC2C1
hydrindane C1CCC2CCCC2C1|2-methyldecalin CC1CCC2CCCCC2C1|4-methylpent-2-ene CC=CC(C)C|5-chlorohex-2-ene CC=CCC(C)Cl
pent-3-en-2-ol CC=CC(C)O|1,3-dichloropropene ClCC=CCl|cinnamyl_chloride ClCC=Cc1ccccc1|2-chloronorbornane ClC1CC2CCC1C2
1-phenylethyl_chloride CC(Cl)c1ccccc1|1,2-dichloro-1,2-diphenylethane ClC(C(Cl)c1ccccc1)c1ccccc1|alanylalanine CC(N)C(=O)NC(C)C(O)=O
3-methylcyclohexanol CC1CCCC(O)C1|4-methylcyclohexanol CC1CCC(O)CC1|1,3,5-trimethylcyclohexane CC1CC(C)CC(C)C1
1,2,3-trichlorocyclopropane ClC1C(Cl)C1Cl|1,2,3,4-tetrachlorocyclobutane ClC1C(Cl)C(Cl)C1Cl|inositol OC1C(O)C(O)C(O)C(O)C1O
spiro-dichloride ClC1CC2(C1)CC(Cl)C2|2,3-epoxybutane CC1OC1C|1-chloro-1-fluoroethane CC(F)Cl|phenylalanine NC(Cc1ccccc1)C(O)=O
2-bromo-3-chlorobutane CC(Cl)C(C)Br|2,2'-dichlorodiethyl_ether CC(Cl)OC(C)Cl|1,4-dichlorobut-2-ene ClCC=CCCl|linalool CC(C)=CCCC(C)(O)C=C
farnesol CC(C)=CCCC(C)=CCCC(C)=CCO|1,5-dimethyl-bicyclo CC12CCCC(C)(CC1)C2|camphor CC1(C)C2CCC1(C)C(=O)C2|fluorochlorobromomethane FC(Cl)Br"""


# Small bicycles hold their bridgeheads: of the InChI of both, only those that can be built count.
HELD = {"2-chloronorbornane": 4, "camphor": 2, "1,5-dimethyl-bicyclo": 1}

TAGS = (Chem.ChiralType.CHI_TETRAHEDRAL_CW, Chem.ChiralType.CHI_TETRAHEDRAL_CCW)
SIDES = (Chem.BondStereo.STEREOCIS, Chem.BondStereo.STEREOTRANS)


def open_centres(mol):
    return [atom.GetIdx() for atom in mol.GetAtoms() if atom.GetAtomicNum() == 6 and atom.GetTotalNumHs() < 2
            and atom.GetTotalDegree() == 4]


def open_bonds(mol):
    return [bond.GetIdx() for bond in mol.GetBonds() if bond.GetBondType() == Chem.BondType.DOUBLE
            and not bond.IsInRing() and all(end.GetAtomicNum() == 6 and end.GetDegree() > 1
                                            for end in (bond.GetBeginAtom(), bond.GetEndAtom()))]


def marked(smiles):
    mol = Chem.MolFromSmiles(smiles)
    centres, bonds = open_centres(mol), open_bonds(mol)
    for choice in itertools.product((0, 1), repeat=len(centres) + len(bonds)):
        one = Chem.Mol(mol)
        for centre, value in zip(centres, choice):
            one.GetAtomWithIdx(centre).SetChiralTag(TAGS[value])
        for index, value in zip(bonds, choice[len(centres):]):
            bond = one.GetBondWithIdx(index)
            left, right = ([n.GetIdx() for n in end.GetNeighbors() if n.GetIdx() != other.GetIdx()][0] for end, other in (
                (bond.GetBeginAtom(), bond.GetEndAtom()), (bond.GetEndAtom(), bond.GetBeginAtom())))
            bond.SetStereoAtoms(left, right)
            bond.SetStereo(SIDES[value])
        yield Chem.MolToSmiles(one)


def count_inchi(smiles):
    answer = subprocess.run(["obabel", "-ismi", "-oinchi", "-xt"], input="\n".join(set(marked(smiles))),
                            capture_output=True, text=True, check=True).stdout
    return len({line.split("\t")[0].strip() for line in answer.splitlines() if line.strip()})


def count_rdkit(smiles):
    options = StereoEnumerationOptions(unique=True, tryEmbedding=False, onlyUnassigned=False)
    isomers = EnumerateStereoisomers(Chem.MolFromSmiles(smiles), options=options)
    return len({Chem.CanonSmiles(Chem.MolToSmiles(isomer)) for isomer in isomers})


def make(write):
    rows = []
    for entry in (entry for line in CASES.split("\n") for entry in line.split("|")):
        name, smiles = entry.split(" ")
        inchi = count_inchi(smiles)
        rows.append([name, smiles, HELD.get(name, inchi), inchi, count_rdkit(smiles)])
    write("stereoisomer_counts.tsv", ["Numbers of stereoisomers by InChI and by RDKit; README.md."],
          ["name", "smiles", "count", "countByInchi", "countByRdkit"], rows)
