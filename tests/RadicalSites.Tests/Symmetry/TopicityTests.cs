using RadicalSites.Formats.Smiles;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Symmetry;

/// <summary>
/// Relations of hydrogens and of carbons by the replacement principle, as textbooks of stereochemistry give them
/// (after the chapter on topicity in Eliel, Wilen: Stereochemistry of Organic Compounds, 1994; examples from memory).
/// </summary>
public sealed class TopicityTests
{
    [Theory]
    // one carbon with two hydrogens: homotopic by a rotation
    [InlineData("C(Cl)Cl", 0, Topicity.Homotopic)]
    [InlineData("CCC", 1, Topicity.Homotopic)]
    [InlineData("C1CCCCC1", 0, Topicity.Homotopic)]
    [InlineData("C1CC1", 0, Topicity.Homotopic)]
    [InlineData("C1CC2(C1)CCC2", 0, Topicity.Homotopic)] // on the axis of rotation
    [InlineData("C1CC2CCC1C2", 6, Topicity.Homotopic)]
    [InlineData("C1C2CC3CC1CC(C2)C3", 0, Topicity.Homotopic)]
    [InlineData("C[C@H](O)C[C@@H](O)C", 3, Topicity.Homotopic)] // the (R,R) or (S,S) pentanediol
    // prochiral CH2
    [InlineData("CCO", 1, Topicity.Enantiotopic)]
    [InlineData("CCCC", 1, Topicity.Enantiotopic)]
    [InlineData("OC(=O)CC", 3, Topicity.Enantiotopic)]
    [InlineData("c1ccccc1CCl", 6, Topicity.Enantiotopic)]
    [InlineData("C1CC11CC1", 0, Topicity.Enantiotopic)]
    [InlineData("C1CC2(C1)CCC2", 1, Topicity.Enantiotopic)]
    [InlineData("C1CC1=O", 0, Topicity.Enantiotopic)]
    [InlineData("[2H]CO", 1, Topicity.Enantiotopic)]
    // next to a stereocentre, stated or not
    [InlineData("C[C@H](O)CC", 3, Topicity.Diastereotopic)]
    [InlineData("CC(O)CC", 3, Topicity.Diastereotopic)]
    [InlineData("C[C@H](O)C[C@H](O)C", 3, Topicity.Diastereotopic)] // the meso pentanediol
    [InlineData("OC(=O)CC(O)(C(=O)O)CC(=O)O", 3, Topicity.Diastereotopic)]
    [InlineData("CCOC(C)OCC", 1, Topicity.Diastereotopic)] // acetal: the classic case without a stereocentre
    [InlineData("CS(=O)CC", 3, Topicity.Diastereotopic)]
    [InlineData("CCS(=O)(=O)C", 1, Topicity.Enantiotopic)]
    [InlineData("C1CC2CCC1C2", 0, Topicity.Diastereotopic)] // exo and endo
    [InlineData("C1CC1C", 0, Topicity.Diastereotopic)] // cis and trans to the methyl
    [InlineData("CC1CCC(C)CC1", 2, Topicity.Diastereotopic)]
    [InlineData("OC1CCCCC1", 2, Topicity.Diastereotopic)] // cis and trans to the hydroxyl, on every carbon of the ring
    [InlineData("OC1CCCCC1", 4, Topicity.Diastereotopic)]
    [InlineData("C1CCCCC1NC1CCCCC1", 2, Topicity.Diastereotopic)]
    [InlineData("O=C1CCCCC1", 4, Topicity.Homotopic)]
    [InlineData("O=C1CCCCC1", 3, Topicity.Enantiotopic)]
    [InlineData("CC1(C)CCCCC1", 5, Topicity.Homotopic)]
    [InlineData("CC1(O)CCCCC1", 5, Topicity.Diastereotopic)]
    [InlineData("C=CC", 0, Topicity.Diastereotopic)]
    [InlineData("C=C(C)C", 0, Topicity.Homotopic)]
    [InlineData("C=C", 0, Topicity.Homotopic)]
    [InlineData("OC1CC(O)C1", 2, Topicity.Diastereotopic)]
    // methyl groups turn, single hydrogens stand alone
    [InlineData("C[C@H](O)CC", 0, Topicity.Homotopic)]
    [InlineData("CC(C)C", 1, Topicity.Homotopic)]
    // axial chirality
    [InlineData("CC=C=CCC", 4, Topicity.Diastereotopic)]
    [InlineData("CCC=C=C(C)C", 1, Topicity.Enantiotopic)]
    [InlineData("CC(C)=CCC", 4, Topicity.Enantiotopic)]
    public void HydrogenTopicity_follows_the_replacement_principle(string smiles, int atom, Topicity expected) =>
        Assert.Equal(expected, SymmetryAnalysis.Perceive(SmilesReader.Parse(smiles)).HydrogenTopicity(atom));

    [Theory]
    [InlineData("CCC", 0, 2, Topicity.Homotopic)]
    [InlineData("CC(C)Cl", 0, 2, Topicity.Enantiotopic)] // isopropyl methyls
    [InlineData("CC(C)CC(=O)O", 0, 2, Topicity.Enantiotopic)]
    [InlineData("CC(C)[C@H](N)C(=O)O", 0, 2, Topicity.Diastereotopic)] // pro-R and pro-S methyl of valine
    [InlineData("CC(C)C(N)C(=O)O", 0, 2, Topicity.Diastereotopic)]
    [InlineData("CC(C)(C)C", 0, 3, Topicity.Homotopic)]
    [InlineData("CC(C)(C)[C@H](N)C(=O)O", 0, 2, Topicity.Homotopic)] // tert-butyl turns
    [InlineData("C[C@H](O)[C@H](O)C", 0, 5, Topicity.Enantiotopic)] // meso
    [InlineData("C[C@H](O)[C@@H](O)C", 0, 5, Topicity.Homotopic)] // one enantiomer, axis of rotation
    [InlineData("C[C@@H](F)C(Cl)[C@H](F)C", 0, 7, Topicity.Diastereotopic)] // like ends, no symmetry left
    [InlineData("C[C@H](F)[C@@H](Cl)[C@@H](F)C", 0, 7, Topicity.Diastereotopic)]
    [InlineData("C[C@H](F)C(Cl)[C@H](F)C", 0, 7, Topicity.Enantiotopic)] // across a pseudoasymmetric centre
    [InlineData("CC(C)=CC", 0, 2, Topicity.Diastereotopic)] // cis and trans methyl
    [InlineData("CC(=C)C", 0, 3, Topicity.Homotopic)]
    [InlineData("C/C=C/C", 0, 3, Topicity.Homotopic)]
    [InlineData("C/C=C\\C=C\\C", 0, 5, Topicity.Diastereotopic)]
    [InlineData("CC=C=CC", 0, 4, Topicity.Homotopic)] // pentadiene-2,3: an axis of rotation
    [InlineData("OC(=O)CC(O)(C(=O)O)CC(=O)O", 3, 9, Topicity.Enantiotopic)] // the arms of citric acid
    [InlineData("C[C@H]1CC[C@@H](C)CC1", 0, 5, Topicity.Homotopic)]
    [InlineData("C[C@H]1CCCC[C@H]1C", 0, 7, Topicity.Enantiotopic)] // cis
    [InlineData("C[C@H]1CCCC[C@@H]1C", 0, 7, Topicity.Homotopic)] // trans
    [InlineData("C1CC2CCC1C2", 0, 1, Topicity.Enantiotopic)]
    [InlineData("C1CC2CCC1C2", 2, 5, Topicity.Homotopic)]
    [InlineData("C[Si](C)(C)CC", 0, 2, Topicity.Homotopic)]
    [InlineData("CC([13CH3])C", 0, 3, Topicity.Enantiotopic)]
    [InlineData("CC([13CH3])C", 0, 2, Topicity.Constitutional)]
    [InlineData("C[C@H](F)O.C[C@@H](F)O", 0, 4, Topicity.Enantiotopic)] // a racemate written as such
    [InlineData("CCO.CCO", 0, 3, Topicity.Homotopic)]
    [InlineData("Cc1ccccc1C", 0, 7, Topicity.Homotopic)]
    [InlineData("CC1(C)CC(O)C1", 0, 2, Topicity.Diastereotopic)] // cis and trans to the hydroxyl
    public void Between_follows_the_replacement_principle(string smiles, int first, int second, Topicity expected)
    {
        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(SmilesReader.Parse(smiles));

        Assert.Equal(expected, symmetry.Between(first, second));
        Assert.Equal(expected, symmetry.Between(second, first));
    }
}
