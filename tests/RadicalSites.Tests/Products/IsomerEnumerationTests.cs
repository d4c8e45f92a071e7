using System;
using System.Collections.Generic;
using System.Linq;
using System.Numerics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using RadicalSites.Products;
using RadicalSites.Sites;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Products;

/// <summary>Isomer lists against published counts and against brute force.</summary>
public class IsomerEnumerationTests
{
    // Chlorinated alkanes: textbook counts of constitutional isomers (common practice): CnH2n+2-mClm for m = 1, 2, 3 ...
    [Theory]
    [InlineData("CC", "1 2 2 2 1 1")]
    [InlineData("CCC", "2 4 5 6 5 4 2 1")]
    [InlineData("CC(C)C", "2 3 5")]
    [InlineData("CCCC", "2 6 9")]
    [InlineData("C1CCCCC1", "1 4 6")]
    [InlineData("C12C3C4C1C5C2C3C45", "1 3 3 6 3 3 1 1")]
    [InlineData("C1C2CC3CC1CC(C2)C3", "2 6")]
    public void Count_and_list_equal_the_textbook_numbers(string smiles, string expected)
    {
        string[] counts = expected.Split(' ');
        IsomerEnumeration isomers = IsomerEnumeration.Of(
            SmilesReader.Parse(smiles),
            new IsomerOptions { MaximumTimes = counts.Length, Stereo = ProductStereoMode.None });

        Assert.Equal(expected, string.Join(' ', isomers.Count(counts.Length)!.Skip(1)));
        Assert.Equal(
            expected,
            string.Join(' ', isomers.Enumerate().CountBy(static product => product.HalogenCarbons.Count)
                .Select(static group => group.Value)));
    }

    [Theory]
    [InlineData("CCCC", 3)]
    [InlineData("CC(C)C", 4)]
    [InlineData("CC1CCCCC1", 3)]
    [InlineData("CCOC(=O)CN", 3)]
    [InlineData("Cc1ccc(C)cc1", 4)]
    [InlineData("C1CC2CCC1C2", 3)]
    [InlineData("CN(C)C.CCO", 3)]
    [InlineData("CC(C)(C)C(C)(C)C", 3)]
    public void Enumerate_equals_brute_force_over_all_sets_of_hydrogens(string smiles, int times)
    {
        Molecule molecule = SmilesReader.Parse(smiles);
        List<int> hydrogens = [];
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            if (SiteFinder.IsSiteCarbon(molecule, atom))
            {
                hydrogens.AddRange(Enumerable.Repeat(atom, molecule.Atoms[atom].HydrogenCount));
            }
        }

        var ways = new SortedDictionary<string, BigInteger>(StringComparer.Ordinal);
        foreach (int[] picked in Combinations(hydrogens.Count, times))
        {
            int[] carbons = [.. picked.Select(i => hydrogens[i])];
            string product = ProductIdentity.SmilesOf(HydrogenReplacement.Replace(molecule, carbons, 17, []));
            ways[product] = ways.GetValueOrDefault(product) + 1;
        }

        IsomerProduct[] listed =
        [
            .. IsomerEnumeration.Of(molecule, new IsomerOptions
            {
                MinimumTimes = times, MaximumTimes = times, Stereo = ProductStereoMode.None,
            }).Enumerate(),
        ];

        Assert.Equal(
            ways.Select(static pair => $"{pair.Key} {pair.Value}"),
            listed.Select(static one => $"{one.CanonicalSmiles} {one.Degeneracy}").Order(StringComparer.Ordinal));
    }

    [Theory]
    [InlineData("C[C@H](Cl)[C@H](Cl)C")]
    [InlineData("C[C@H](O)C(O)[C@@H](O)C")]
    [InlineData("C[C@H]1CC[C@@H](C)CC1")]
    [InlineData("C[C@H]1C[C@@H](C)C1")]
    [InlineData("C[C@H]1C[C@H](C)C1")]
    [InlineData("C/C=C/C=C\\C")]
    [InlineData("CC=[C@]=CC")]
    [InlineData("O[C@H]1[C@H](O)[C@@H](O)[C@H](O)[C@H](O)[C@@H]1O")]
    [InlineData("C1C[C@@H]2CC[C@H]1C2")]
    [InlineData("C[C@H](O)CC[C@H](O)C.C[C@H](O)CC[C@@H](O)C")]
    [InlineData("CC(C)[C@H](F)C(C)(C)C")]
    public void Enumerate_with_stereo_equals_brute_force_without_doubles(string smiles)
    {
        Molecule molecule = StereoPerception.WithoutPhantoms(SmilesReader.Parse(smiles));
        int[] carbons = [.. Enumerable.Range(0, molecule.AtomCount).Where(atom => SiteFinder.IsSiteCarbon(molecule, atom))];
        RingAnalysis rings = RingAnalysis.Perceive(molecule);
        int[] rigid = [.. carbons.Where(atom => molecule.Atoms[atom].IsInRing && RingStrain.HoldsShape(rings, atom))];
        for (int times = 1; times <= 2; times++)
        {
            var expected = new SortedSet<string>(StringComparer.Ordinal);
            foreach (int first in carbons)
            {
                foreach (int second in times == 1 ? [-1] : carbons)
                {
                    if (first != second || molecule.Atoms[first].HydrogenCount > 1)
                    {
                        int[] picked = second < 0 ? [first] : [first, second];
                        expected.Add(ProductIdentity.SmilesOf(
                            HydrogenReplacement.Replace(molecule, picked, 17, molecule.StereoSpan, rigid)));
                    }
                }
            }

            string[] listed =
            [
                .. IsomerEnumeration.Of(molecule, new IsomerOptions { MinimumTimes = times, MaximumTimes = times }).Enumerate()
                    .Select(static one => one.CanonicalSmiles).Order(StringComparer.Ordinal),
            ];
            Assert.Equal(expected, listed);
        }
    }

    [Theory]
    [InlineData("CC(C)CC(C)C(=O)O")]
    [InlineData("C[C@@H]1CC[C@H](C)CC1")]
    [InlineData("C[C@H](O)[C@@H](O)C")]
    public void Enumerate_any_numbering_gives_the_same_text_in_the_same_order(string smiles)
    {
        Molecule molecule = SmilesReader.Parse(smiles);
        var options = new IsomerOptions { MaximumTimes = 2 };
        string[] expected = [.. Lines(molecule, options)];
        var random = new Random(7);
        for (int round = 0; round < 10; round++)
        {
            int[] ranks = [.. Enumerable.Range(0, molecule.AtomCount)];
            random.Shuffle(ranks);

            Assert.Equal(
                expected.Order(StringComparer.Ordinal),
                Lines(SmilesReader.Parse(SmilesWriter.Write(molecule, ranks)), options).Order(StringComparer.Ordinal));
        }
    }

    [Fact]
    public void Enumerate_is_lazy_and_can_be_cancelled()
    {
        // Hexacontane with ten chlorines has far more isomers than any list could hold.
        Molecule molecule = SmilesReader.Parse(new string('C', 60));
        IsomerEnumeration isomers = IsomerEnumeration.Of(
            molecule, new IsomerOptions { MinimumTimes = 10, MaximumTimes = 10, Stereo = ProductStereoMode.None });

        Assert.Equal(5, isomers.Enumerate().Take(5).Select(static one => one.CanonicalSmiles).Distinct().Count());
        Assert.True(isomers.Count(10)![10] > BigInteger.Pow(10, 9));
        using var source = new System.Threading.CancellationTokenSource();
        source.Cancel();
        Assert.Throws<OperationCanceledException>(() => isomers.Enumerate(source.Token).First());
    }

    [Fact]
    public void Enumerate_stated_stereo_is_kept_and_separates_positions()
    {
        // (2R,3R)-butane-2,3-diol keeps its twofold axis: the methyls are one class, and both centres stay as they are.
        IsomerProduct[] products =
        [
            .. IsomerEnumeration.Of(SmilesReader.Parse("C[C@@H](O)[C@H](O)C"), new IsomerOptions()).Enumerate(),
        ];

        Assert.Equal(2, products.Length);
        Assert.Contains(ProductIdentity.SmilesOf(SmilesReader.Parse("ClC[C@@H](O)[C@H](O)C")), products.Select(static one => one.CanonicalSmiles));
    }

    [Theory]
    [InlineData("C([1H])([1H])([1H])C")]
    [InlineData("[CH2]([H:3])C")]
    public void Enumerate_labelled_protium_counts_as_hydrogen(string smiles)
    {
        IsomerProduct product = IsomerEnumeration.Of(SmilesReader.Parse(smiles), new IsomerOptions()).Enumerate().Single();

        Assert.Equal(ProductIdentity.SmilesOf(SmilesReader.Parse("CCCl")), product.CanonicalSmiles);
        Assert.Equal(6, product.Degeneracy);
        Assert.Contains(product.HalogenCarbons.Single(), product.SubstrateAtoms);
    }

    [Fact]
    public void Of_no_site_says_so()
    {
        IsomerEnumeration isomers = IsomerEnumeration.Of(SmilesReader.Parse("c1ccccc1"), new IsomerOptions());

        Assert.Empty(isomers.Enumerate());
        Assert.Equal("sites-none", isomers.Diagnostics.Single().Code);
    }

    [Fact]
    public void Of_too_large_a_molecule_says_so()
    {
        IsomerEnumeration isomers = IsomerEnumeration.Of(SmilesReader.Parse(new string('C', 2001)), new IsomerOptions());

        Assert.Empty(isomers.Enumerate());
        Assert.Null(isomers.Count(1));
        Assert.Equal("isomers-molecule-too-large", isomers.Diagnostics.Single().Code);
    }

    private static IEnumerable<string> Lines(Molecule molecule, IsomerOptions options) =>
        IsomerEnumeration.Of(molecule, options).Enumerate().Select(static one => $"{one.CanonicalSmiles} {one.Degeneracy}");

    private static IEnumerable<int[]> Combinations(int count, int picked)
    {
        int[] chosen = [.. Enumerable.Range(0, picked)];
        while (true)
        {
            yield return chosen;
            int place = picked - 1;
            while (place >= 0 && chosen[place] == count - picked + place)
            {
                place--;
            }

            if (place < 0)
            {
                yield break;
            }

            chosen[place]++;
            for (int i = place + 1; i < picked; i++)
            {
                chosen[i] = chosen[i - 1] + 1;
            }
        }
    }
}
