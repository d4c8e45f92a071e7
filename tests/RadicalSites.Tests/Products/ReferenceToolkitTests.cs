using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Products;

/// <summary>Products against lists made with RDKit 2022.09.3; the files say how.</summary>
public class ReferenceToolkitTests
{
    [Fact]
    public void Enumerate_real_molecules_equal_the_reference_replacement_of_one_hydrogen()
    {
        var options = new ProductOptions { Stereo = ProductStereoMode.None, IncludeTransposed = false };
        var isomerOptions = new IsomerOptions { Stereo = ProductStereoMode.None };
        int molecules = 0;
        foreach (string[] fields in Rows("replace_one_hydrogen.tsv"))
        {
            Molecule molecule = SmilesReader.Parse(fields[0]);
            string expected = Join(fields[1].Split(' ').Select(static one => one.Split('|'))
                .Select(static one => (
                    CanonicalSmiles.Write(SmilesReader.Parse(one[0])), int.Parse(one[1], CultureInfo.InvariantCulture))));

            Assert.Equal(expected, Join(ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 17, options).Products
                .Select(static product => (product.CanonicalSmiles, product.Degeneracy))));
            Assert.Equal(expected, Join(IsomerEnumeration.Of(molecule, isomerOptions).Enumerate()
                .Select(static product => (product.CanonicalSmiles, (int)product.Degeneracy))));
            molecules++;
        }

        Assert.True(molecules >= 500);
    }

    [Fact]
    public void Enumerate_stereo_of_real_molecules_equals_the_reference()
    {
        var options = new ProductOptions { IncludeTransposed = false };
        foreach (string[] fields in Rows("replace_one_hydrogen_stereo.tsv"))
        {
            Molecule molecule = SmilesReader.Parse(fields[0]);
            string expected = string.Join('\n', fields[1].Split(' ', StringSplitOptions.RemoveEmptyEntries)
                .Select(static one => CanonicalSmiles.Write(SmilesReader.Parse(one))).Distinct().Order(StringComparer.Ordinal));

            Assert.Equal(expected, string.Join('\n', ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 17, options).Products
                .Select(static product => product.CanonicalSmiles).Order(StringComparer.Ordinal)));
            Assert.Equal(expected, string.Join('\n', IsomerEnumeration.Of(molecule, new IsomerOptions()).Enumerate()
                .Select(static product => product.CanonicalSmiles).Order(StringComparer.Ordinal)));
        }
    }

    [Theory]
    [InlineData("CC1(C)[C@@H]2CC[C@@]1(C)C(=O)C2", "CC1(C)[C@]2(Cl)CC[C@@]1(C)C(=O)C2")]
    [InlineData("O=C1C[C@@H]2CC[C@H]1C2", "O=C1C[C@]2(Cl)CC[C@H]1C2")]
    public void Enumerate_bridgehead_of_a_small_cage_keeps_its_configuration(string substrate, string product)
    {
        // A bridgehead radical cannot turn inside out (common practice, no source).
        string expected = CanonicalSmiles.Write(SmilesReader.Parse(product));

        Assert.Contains(ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse(substrate)), 17).Products,
            one => one.CanonicalSmiles == expected && one.Stereo == StereoOutcome.Retained);
    }

    [Fact]
    public void Enumerate_real_molecules_renumbered_give_the_same_products_and_degeneracies()
    {
        var random = new Random(1905);
        foreach (string[] fields in Rows("replace_one_hydrogen_stereo.tsv").Concat(Rows("replace_one_hydrogen.tsv").Take(150)))
        {
            Molecule molecule = SmilesReader.Parse(fields[0]);
            int[] ranks = [.. Enumerable.Range(0, molecule.AtomCount)];
            random.Shuffle(ranks);

            Assert.Equal(Describe(molecule), Describe(SmilesReader.Parse(SmilesWriter.Write(molecule, ranks))));
        }
    }

    private static string Describe(Molecule molecule) => string.Join(
        '\n', ProductEnumerator.Enumerate(SiteFinder.Find(molecule), 35).Products
            .Select(static one => $"{one.CanonicalSmiles} {one.Degeneracy} {one.Route} {one.Stereo}")
            .Order(StringComparer.Ordinal));

    [Fact]
    public void Count_equals_the_reference_brute_force_for_one_two_and_three_halogens()
    {
        foreach (string[] fields in Rows("replace_many_hydrogens.tsv"))
        {
            IsomerEnumeration isomers = IsomerEnumeration.Of(
                SmilesReader.Parse(fields[0]), new IsomerOptions { MaximumTimes = 3, Stereo = ProductStereoMode.None });
            string expected = string.Join(' ', fields.Skip(1).Where(static count => count != "0"));

            Assert.Equal(
                (fields[0], expected), (fields[0], string.Join(' ', isomers.Count(3)!.Skip(1).Where(static count => !count.IsZero))));
            Assert.Equal((fields[0], expected), (fields[0], string.Join(' ', isomers.Enumerate()
                .CountBy(static product => product.HalogenCarbons.Count).Select(static group => group.Value))));
        }
    }

    private static string Join(IEnumerable<(string Smiles, int Hydrogens)> products) => string.Join(
        '\n', products.OrderBy(static product => product.Smiles, StringComparer.Ordinal)
            .Select(static product => $"{product.Smiles} {product.Hydrogens}"));

    private static IEnumerable<string[]> Rows(string file) =>
        File.ReadLines(Path.Combine(AppContext.BaseDirectory, "TestData", "Products", file))
            .Where(static line => line[0] != '#')
            .Select(static line => line.Split('\t'));
}
