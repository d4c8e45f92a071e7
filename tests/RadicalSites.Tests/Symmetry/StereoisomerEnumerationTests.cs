using System.Collections.Generic;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Symmetry;

/// <summary>
/// Numbers of stereoisomers known from textbooks (aldohexoses 16, tartaric acid 3, inositol 9 with one pair of
/// enantiomers, cholesterol 256, menthol 8; from memory), and small cases counted by hand.
/// </summary>
public sealed class StereoisomerEnumerationTests
{
    [Theory]
    [InlineData("glucose, open chain", "OCC(O)C(O)C(O)C(O)C=O", 16, 16)]
    [InlineData("tartaric acid", "OC(=O)C(O)C(O)C(=O)O", 3, 2)]
    [InlineData("inositol", "OC1C(O)C(O)C(O)C(O)C1O", 9, 2)]
    [InlineData("cholesterol", "CC(C)CCCC(C)C1CCC2C1(CCC3C2CC=C4C3(CCC(C4)O)C)C", 256, 256)]
    [InlineData("menthol", "CC(C)C1CCC(C)CC1O", 8, 8)]
    [InlineData("butan-2-ol", "CC(O)CC", 2, 2)]
    [InlineData("pentane-2,3,4-triol", "CC(O)C(O)C(O)C", 4, 2)]
    [InlineData("1,4-dimethylcyclohexane", "CC1CCC(C)CC1", 2, 0)]
    [InlineData("1,2-dimethylcyclopropane", "CC1CC1C", 3, 2)]
    [InlineData("1,3-dimethylcyclobutane", "CC1CC(C)C1", 2, 0)]
    [InlineData("1,2,3,4-tetramethylcyclobutane", "CC1C(C)C(C)C1C", 4, 0)]
    [InlineData("decalin", "C1CCC2CCCCC2C1", 2, 0)]
    [InlineData("2,4-hexadiene", "CC=CC=CC", 3, 0)]
    [InlineData("2,3-pentadiene", "CC=C=CC", 2, 2)]
    [InlineData("hexa-2,3,4-triene", "CC=C=C=CC", 1, 0)]
    [InlineData("4-methylhepta-2,5-diene", "CC=CC(C)C=CC", 4, 2)]
    [InlineData("cyclooctene", "C1CCCCCC=C1", 2, 0)]
    [InlineData("cyclohexene", "C1CCCC=C1", 1, 0)]
    [InlineData("ethyl methyl sulfoxide", "CS(=O)CC", 2, 2)]
    [InlineData("ethyl methyl sulfone", "CS(=O)(=O)CC", 1, 0)]
    [InlineData("an amine inverts", "CN(CC)C(C)C", 1, 0)]
    [InlineData("a quaternary ammonium ion does not", "C[N+](CC)(CCC)CCCC", 2, 2)]
    [InlineData("phosphinic acid", "CP(=O)(O)CC", 1, 0)]
    [InlineData("camphor", "CC1(C)C2CCC1(C)C(=O)C2", 2, 2)]
    [InlineData("norbornane", "C1CC2CCC1C2", 1, 0)]
    [InlineData("2-norbornanol", "OC1CC2CCC1C2", 4, 4)]
    [InlineData("adamantane", "C1C2CC3CC1CC(C2)C3", 1, 0)]
    [InlineData("cubane", "C12C3C4C1C5C2C3C45", 1, 0)]
    [InlineData("quinuclidine", "C1CN2CCC1CC2", 1, 0)]
    [InlineData("3,9-dimethylspiro[5.5]undecane", "CC1CCC2(CC1)CCC(C)CC2", 2, 2)]
    [InlineData("isobutane", "CC(C)C", 1, 0)]
    [InlineData("methane", "C", 1, 0)]
    public void Enumerate_counts_each_stereoisomer_once(string name, string smiles, int isomers, int chiral)
    {
        StereoisomerSet set = StereoisomerEnumeration.Enumerate(SmilesReader.Parse(smiles));

        List<string> texts = set.Stereoisomers.Select(isomer => CanonicalSmiles.Write(isomer.Molecule)).ToList();
        Assert.True(isomers == texts.Count, $"{name}: {string.Join(' ', texts)}");
        Assert.Equal(isomers, texts.Distinct().Count());
        Assert.Equal(chiral, set.Stereoisomers.Count(isomer => isomer.IsChiral));
        Assert.True(set.IsComplete);
        for (int i = 0; i < isomers; i++)
        {
            int mirror = Assert.NotNull(set.Stereoisomers[i].Enantiomer);
            Assert.Equal(set.Stereoisomers[i].IsChiral, mirror != i);
            Assert.Equal(i, set.Stereoisomers[mirror].Enantiomer);
        }
    }

    [Fact]
    public void Enumerate_stated_centres_stay_unless_all_are_asked_for()
    {
        Molecule molecule = SmilesReader.Parse("C[C@H](O)C(F)CC");

        Assert.Equal(2, StereoisomerEnumeration.Enumerate(molecule).Stereoisomers.Count);
        Assert.Equal(4, StereoisomerEnumeration.Enumerate(molecule, onlyUnspecified: false).Stereoisomers.Count);
        Assert.Null(StereoisomerEnumeration.Enumerate(molecule).Stereoisomers[0].Enantiomer);
    }

    [Fact]
    public void Enumerate_limit_is_kept_and_reported()
    {
        StereoisomerSet set = StereoisomerEnumeration.Enumerate(
            SmilesReader.Parse("OCC(O)C(O)C(O)C(O)C(O)C(O)C(O)C=O"), limit: 10);

        Assert.Equal(10, set.Stereoisomers.Count);
        Assert.Equal("limit-reached", Assert.Single(set.Diagnostics).Code);
    }

    [Theory]
    [InlineData("C[C@H](C)O", "CC(C)O")]
    [InlineData("C[C@H]1CCC(C)CC1", "CC1CCC(C)CC1")]
    [InlineData("C/C=C(/C)C", "CC=C(C)C")]
    [InlineData("C[N@](CC)CCC", "CN(CC)CCC")]
    [InlineData("C1C[C@@H]2CC[C@H]1C2", "C1CC2CCC1C2")]
    [InlineData("C1CCC/C=C\\1", "C1CCCC=C1")]
    [InlineData("CC(C)(C)[C@](C)(C)C", "CC(C)(C)C(C)(C)C")]
    [InlineData("F[C@](F)(Cl)Br", "FC(F)(Cl)Br")]
    [InlineData("C[C@H](F)[C@@H](Cl)[C@@H](F)C", "C[C@H](F)C(Cl)[C@@H](F)C")] // like ends
    public void WithoutPhantoms_marks_without_meaning_go(string marked, string plain) =>
        Assert.Equal(
            CanonicalSmiles.Write(SmilesReader.Parse(plain)), CanonicalSmiles.Write(SmilesReader.Parse(marked)));

    [Theory]
    [InlineData("C[C@H](O)CC")]
    [InlineData("C[C@H]1CC[C@H](C)CC1")]
    [InlineData("C[C@H](F)[C@@H](Cl)[C@H](F)C")] // pseudoasymmetric
    [InlineData("C/C=C/C")]
    [InlineData("C1CCCCC/C=C/1")]
    [InlineData("CC=[C@]=CC")]
    [InlineData("C[S@](=O)CC")]
    public void WithoutPhantoms_real_marks_stay(string smiles)
    {
        Molecule molecule = SmilesReader.Parse(smiles);

        Assert.Same(molecule, StereoPerception.WithoutPhantoms(molecule));
    }

    [Fact]
    public void FindUnits_dependent_places_are_named()
    {
        IReadOnlyList<StereoUnit> units = StereoPerception.FindUnits(SmilesReader.Parse("CC(O)C(O)[C@H](O)C"));

        Assert.Equal([(1, false, false), (3, false, true), (5, true, false)],
            units.Select(unit => (unit.Focus, unit.IsStated, unit.IsDependent)));
        Assert.All(StereoPerception.FindUnits(SmilesReader.Parse("CC1CCC(C)CC1")), unit => Assert.True(unit.IsDependent));
        Assert.Empty(StereoPerception.FindUnits(SmilesReader.Parse("C1CC2CCC1C2")));
        Assert.Empty(StereoPerception.FindUnits(SmilesReader.Parse("CC1(O)CCCC1")));
    }
}
