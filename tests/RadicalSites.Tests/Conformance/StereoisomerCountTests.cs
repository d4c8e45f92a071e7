using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Conformance;

/// <summary>Stereoisomers against distinct standard InChI (1.03, through Open Babel 3.1.1); cages that cannot be built left out.</summary>
public class StereoisomerCountTests
{
    public static IEnumerable<object[]> Cases() =>
        ReferenceTable.Read("stereoisomer_counts.tsv").Select(static row => new object[] { row[0], row[1], row[2] });

    [Theory]
    [MemberData(nameof(Cases))]
    public void Enumerate_open_centres_gives_as_many_isomers_as_there_are_InChI(string name, string smiles, string expected)
    {
        StereoisomerSet set = StereoisomerEnumeration.Enumerate(SmilesReader.Parse(smiles));

        Assert.Equal((name, expected), (name, set.Stereoisomers.Count.ToString(CultureInfo.InvariantCulture)));
        Assert.Equal(
            set.Stereoisomers.Count,
            set.Stereoisomers.Select(static isomer => CanonicalSmiles.Write(isomer.Molecule)).Distinct().Count());
    }
}
