using System.Globalization;
using System.Linq;
using RadicalSites.Formats.Smiles;

namespace RadicalSites.Tests.FrontDoor;

/// <summary>
/// Number of C(sp3)-H sites and hydrogens of each. Symmetry of the molecules: point groups in Cotton, Chemical
/// Applications of Group Theory, and counts of NMR signals (common practice, no source).
/// </summary>
public sealed class NamedEquivalenceTests
{
    [Theory]
    [InlineData("neopentane", "CC(C)(C)C", "12")]
    [InlineData("adamantane", "C1C2CC3CC1CC(C2)C3", "4 12")]
    [InlineData("norbornane", "C1CC2CCC1C2", "2 2 8")]
    [InlineData("cubane", "C12C3C4C1C5C2C3C45", "8")]
    [InlineData("1,4-dimethylcyclohexane", "CC1CCC(C)CC1", "2 6 8")]
    [InlineData("para-xylene", "Cc1ccc(C)cc1", "6")]
    [InlineData("cyclohexane", "C1CCCCC1", "12")]
    [InlineData("dodecahedrane", "C12C3C4C5C1C6C7C2C8C3C9C4C1C5C6C2C7C8C9C12", "20")]
    [InlineData("bicyclo[2.2.2]octane", "C1CC2CCC1CC2", "2 12")]
    [InlineData("decalin", "C1CCC2CCCCC2C1", "2 8 8")]
    [InlineData("spiro[4.4]nonane", "C1CCC2(C1)CCCC2", "8 8")]
    [InlineData("mesitylene", "Cc1cc(C)cc(C)c1", "9")]
    [InlineData("hexamethylbenzene", "Cc1c(C)c(C)c(C)c(C)c1C", "18")]
    [InlineData("diethyl ether", "CCOCC", "4 6")]
    [InlineData("tetramethylsilane", "C[Si](C)(C)C", "12")]
    [InlineData("[2.2]paracyclophane", "C1Cc2ccc(cc2)CCc2ccc1cc2", "8")]
    [InlineData("triptycene", "C12c3ccccc3C(c3ccccc13)c1ccccc21", "2")]
    [InlineData("2,3-dimethylbutane", "CC(C)C(C)C", "2 12")]
    [InlineData("isooctane", "CC(C)CC(C)(C)C", "1 2 6 9")]
    [InlineData("cyclododecane", "C1CCCCCCCCCCC1", "24")]
    [InlineData("prismane", "C12C3C1C1C2C31", "6")]
    [InlineData("bicyclo[3.3.1]nonane", "C1CC2CCCC(C1)C2", "2 2 4 8")]
    [InlineData("ortho-xylene", "Cc1ccccc1C", "6")]
    [InlineData("18-crown-6", "C1COCCOCCOCCOCCOCCO1", "24")]
    [InlineData("trimethylamine", "CN(C)C", "9")]
    [InlineData("bicyclo[1.1.1]pentane", "C1C2CC1C2", "2 6")]
    public void FindSites_known_symmetry_gives_the_known_sites(string name, string smiles, string expected)
    {
        int[] hydrogens = [.. Halogenation.FindSites(SmilesReader.Parse(smiles)).Sites.Select(static s => s.Site.HydrogenCount).Order()];

        Assert.Equal(name + ": " + expected, name + ": " + string.Join(' ', hydrogens.Select(static h => h.ToString(CultureInfo.InvariantCulture))));
    }

    [Fact]
    public void FindSites_cholesterol_has_no_equivalent_carbons_but_its_isopropyl_end()
    {
        // 24 carbons carry sp3 hydrogen; the two methyl groups of the isopropyl end are diastereotopic beside C20.
        SiteReport report = Halogenation.FindSites(SmilesReader.Parse(
            "CC(C)CCC[C@@H](C)[C@H]1CC[C@@H]2[C@@]1(CC[C@H]3[C@H]2CC=C4[C@@]3(CC[C@@H](C4)O)C)C"));
        SiteReport merged = Halogenation.FindSites(report.Molecule, new HalogenationOptions { MergeDiastereotopic = true });

        int carbons = report.Sites.Sum(static site => site.Site.Carbons.Count);
        Assert.Equal(carbons, report.Sites.Count);
        Assert.Equal(carbons - 1, merged.Sites.Count);
    }
}
