using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Products;

/// <summary>Stereoisomers of the products, counted by hand (common practice, no source).</summary>
public class StereoExpansionTests
{
    // Substrate, number of stereoisomers of all mono-chlorinated products, both lists must agree.
    [Theory]
    [InlineData("CCCC", 3)] // 1-chloro; (R) and (S) 2-chloro
    [InlineData("CC1CCCCC1", 12)] // CH2Cl, C1; C2 and C3: cis and trans, each a pair; C4: cis, trans
    [InlineData("CC1CC(C)C1", 8)] // CH2Cl: cis, trans; C1: 2; C2: cis gives 2 meso, trans gives a pair
    [InlineData("C[C@@H](O)CC", 6)] // C1; C2: pair; C3: 2; C4
    [InlineData("C[C@H](Cl)[C@H](Cl)C", 4)] // meso: a pair from the methyls, a pair from the centres
    [InlineData("C[C@H](Cl)[C@@H](Cl)C", 2)] // one enantiomer: one product from the methyls, one from the centres
    [InlineData("OC1C(O)C(O)C(O)C(O)C1O", 32)] // 2^6 arrangements over the twofold axis through C1
    [InlineData("C1C2CC3CC1CC(C2)C3", 2)]
    [InlineData("C1CC2CCC1C2", 6)] // bridgehead; exo and endo pairs at C2; C7
    [InlineData("CC=CC", 2)] // 1-chlorobut-2-ene cis, trans (3-chlorobut-1-ene is transposed)
    public void Expand_lists_the_stereoisomers_counted_by_hand(string smiles, int expected)
    {
        var options = new ProductOptions { Stereo = ProductStereoMode.Expand, IncludeTransposed = false };
        string[] isomers =
        [
            .. ProductEnumerator.Enumerate(SiteFinder.Find(SmilesReader.Parse(smiles)), 17, options).Products
                .SelectMany(static product => product.Stereoisomers!),
        ];
        string[] listed =
        [
            .. IsomerEnumeration.Of(SmilesReader.Parse(smiles), new IsomerOptions { Stereo = ProductStereoMode.Expand })
                .Enumerate().SelectMany(static product => product.Stereoisomers!),
        ];

        Assert.Equal(expected, isomers.Length);
        Assert.Equal(isomers.Order(StringComparer.Ordinal), listed.Order(StringComparer.Ordinal));
        Assert.Equal(isomers.Length, isomers.Distinct().Count());
        Assert.All(isomers, static text => Assert.Equal(text, ProductIdentity.SmilesOf(SmilesReader.Parse(text))));
    }

    [Fact]
    public void Expand_hexachlorocyclohexanes_are_the_nine_known_stereoisomers()
    {
        // 1,2,3,4,5,6-hexachlorocyclohexane: eight diastereomers, the alpha one as a pair of mirror images: textbook count
        // (common practice).
        IsomerProduct product = IsomerEnumeration.Of(
            SmilesReader.Parse("C1CCCCC1"),
            new IsomerOptions { MinimumTimes = 6, MaximumTimes = 6, Stereo = ProductStereoMode.Expand }).Enumerate()
            .Single(static one => one.HalogenCarbons.Distinct().Count() == 6);

        Assert.Equal(9, product.Stereoisomers!.Count);
    }

    [Fact]
    public void Expand_dichlorocyclohexanes_are_the_nine_known_stereoisomers()
    {
        // 1,1; 1,2: cis and a trans pair; 1,3: cis and a trans pair; 1,4: cis and trans: textbook count (common practice).
        List<string> all =
        [
            .. IsomerEnumeration.Of(
                SmilesReader.Parse("C1CCCCC1"),
                new IsomerOptions { MinimumTimes = 2, MaximumTimes = 2, Stereo = ProductStereoMode.Expand }).Enumerate()
                .SelectMany(static one => one.Stereoisomers!),
        ];

        Assert.Equal(9, all.Count);
        Assert.Equal(9, all.Distinct().Count());
    }

    // Cubane under its 24 rotations: 1, 1, 3, 3, 7, 3, 3, 1, 1 (Polya 1937, in every textbook on the theorem).
    // Adamantane under its 12 rotations, by hand from the cycle index (x1^16 + 8 x1 x3^5 + 3 x2^8) / 12: 2, 12, 50.
    // Norbornane under its two rotations, x1^12 and x2^6: 6, (66 + 6) / 2 = 36.
    // Cyclopropane under its six rotations, (x1^6 + 2 x3^2 + 3 x2^3) / 6: 1, 4, 4.
    [Theory]
    [InlineData("C12C3C4C1C5C2C3C45", "1 3 3 7 3 3 1 1")]
    [InlineData("C1C2CC3CC1CC(C2)C3", "2 12 50")]
    [InlineData("C1CC2CCC1C2", "6 36")]
    [InlineData("C1CC1", "1 4 4 4 1 1")]
    public void Expand_rigid_cages_have_the_counts_of_their_rotations(string smiles, string expected)
    {
        string[] counts = expected.Split(' ');
        IEnumerable<int> actual = IsomerEnumeration.Of(
            SmilesReader.Parse(smiles),
            new IsomerOptions { MaximumTimes = counts.Length, Stereo = ProductStereoMode.Expand }).Enumerate()
            .GroupBy(static one => one.HalogenCarbons.Count)
            .Select(static group => group.SelectMany(static one => one.Stereoisomers!).Distinct().Count());

        Assert.Equal(expected, string.Join(' ', actual));
    }
}
