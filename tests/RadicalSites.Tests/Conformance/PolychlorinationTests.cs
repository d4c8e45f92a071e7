using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;

namespace RadicalSites.Tests.Conformance;

/// <summary>Isomers with 1 to 4 chlorines against a brute force with RDKit 2022.09.3 canonical SMILES.</summary>
public class PolychlorinationTests
{
    public static IEnumerable<object[]> Cases() =>
        ReferenceTable.Read("polychlorination_counts.tsv").Select(static row => new object[] { row[1], string.Join(' ', row[2..]) });

    [Theory]
    [MemberData(nameof(Cases))]
    public void Count_equals_the_brute_force(string smiles, string expected)
    {
        var options = new IsomerOptions { MaximumTimes = 4, Stereo = ProductStereoMode.None };
        IsomerEnumeration isomers = IsomerEnumeration.Of(SmilesReader.Parse(smiles), options);
        string[] counts = [.. isomers.Count(4)!.Skip(1).Select(static count => count.ToString(CultureInfo.InvariantCulture))];

        Assert.Equal(expected, string.Join(' ', counts.Concat(Enumerable.Repeat("0", 4 - counts.Length))));
    }
}
