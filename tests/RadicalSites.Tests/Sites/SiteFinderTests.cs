using System.Globalization;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Sites;

namespace RadicalSites.Tests.Sites;

/// <summary>Degree, conjugation, alpha groups, rings of C(sp3)-H carbons (definitions of the field: common practice, no source).</summary>
public sealed class SiteFinderTests
{
    [Theory]
    // degree and hydrogen counts
    [InlineData("C", "Methyl:4")]
    [InlineData("CC", "Primary:6")]
    [InlineData("CCC", "Primary:6 Secondary:2")]
    [InlineData("CC(C)C", "Primary:9 Tertiary:1")]
    [InlineData("CC(C)(C)C", "Primary:12")]
    [InlineData("CO", "Methyl:3")]
    [InlineData("C1CCCCC1", "Secondary:12")]
    [InlineData("C1C2CC3CC1CC(C2)C3", "Secondary:12 Tertiary:4")]
    [InlineData("[H]C([H])([H])C([H])([H])[H]", "Primary:6")]
    // conjugation
    [InlineData("Cc1ccccc1", "Primary:3[Benzylic]")]
    [InlineData("CCc1ccccc1", "Primary:3 Secondary:2[Benzylic]")]
    [InlineData("c1ccc(Cc2ccccc2)cc1", "Secondary:2[Benzylic,Benzylic]")]
    [InlineData("Cc1ccncc1", "Primary:3[HeteroBenzylic]")]
    [InlineData("Cc1ccc2ccccc2c1", "Primary:3[Benzylic]")]
    [InlineData("CC=C", "Primary:3[Allylic]")]
    [InlineData("C=CCC=C", "Secondary:2[Allylic,Allylic]")]
    [InlineData("CC#C", "Primary:3[Propargylic]")]
    [InlineData("C1C=C1", "Secondary:2[Allylic]")]
    [InlineData("C1C=CC=C1", "Secondary:2[Allylic,Allylic]")]
    [InlineData("C=CCc1ccccc1", "Secondary:2[Allylic,Benzylic]")]
    // no C(sp3)-H at all
    [InlineData("c1ccccc1", "")]
    [InlineData("C=C", "")]
    [InlineData("ClC(Cl)(Cl)Cl", "")]
    [InlineData("[Na+]", "")]
    // open shells are no sp3 C-H
    [InlineData("[CH3]", "")]
    [InlineData("[CH3+]", "")]
    public void Find_known_molecule_gives_its_sites(string smiles, string expected)
    {
        string actual = string.Join(' ', SiteFinder.Find(SmilesReader.Parse(smiles)).Sites.Select(static site =>
            string.Create(CultureInfo.InvariantCulture, $"{site.Degree}:{site.HydrogenCount}")
            + (site.Conjugation.Count == 0 ? "" : "[" + string.Join(',', site.Conjugation.Select(static c => c.Kind.ToString()).Order()) + "]")));

        Assert.Equal(expected, actual);
    }

    [Theory]
    [InlineData("CO", "Hydroxyl")]
    [InlineData("COC", "Ether")]
    [InlineData("COC(C)=O", "EsterOxygen|Ester")]
    [InlineData("CN", "Amine")]
    [InlineData("CNC(=O)c1ccccc1", "AmideNitrogen")]
    [InlineData("C[NH3+]", "Ammonium")]
    [InlineData("Cn1cccc1", "AromaticNitrogen")]
    [InlineData("C[N+](=O)[O-]", "Nitro")]
    [InlineData("CN(=O)=O", "Nitro")]
    [InlineData("CN=C=O", "OtherNitrogen")]
    [InlineData("CS", "Sulfide")]
    [InlineData("CS(=O)C", "Sulfoxide")]
    [InlineData("CS(=O)(=O)C", "Sulfonyl")]
    [InlineData("CC=O", "Aldehyde")]
    [InlineData("CC(C)=O", "Ketone")]
    [InlineData("CC(=O)O", "CarboxylicAcid")]
    [InlineData("CC(=O)[O-]", "Carboxylate")]
    [InlineData("CC(=O)N", "Amide")]
    [InlineData("CC(=O)Cl", "AcylHalide")]
    [InlineData("CC#N", "Nitrile")]
    [InlineData("CF", "Fluorine")]
    [InlineData("CC(F)(F)F", "Trifluoromethyl")]
    [InlineData("C[Si](C)(C)C", "Silicon")]
    [InlineData("CB(O)O", "Boron")]
    [InlineData("CP(=O)(OC)OC", "Phosphorus|OtherOxygen")]
    [InlineData("COO", "PeroxideOxygen")]
    [InlineData("CS(=O)(=O)OC", "Sulfonyl|OtherOxygen")]
    public void Find_group_beside_the_carbon_is_named(string smiles, string expected)
    {
        string actual = string.Join('|', SiteFinder.Find(SmilesReader.Parse(smiles)).Sites
            .Select(static site => string.Join(',', site.AlphaGroups.Select(static group => group.Kind.ToString())))
            .Distinct());

        Assert.Equal(expected, actual);
    }

    [Fact]
    public void Find_every_hydrogen_bearing_carbon_belongs_to_exactly_one_site()
    {
        SiteAnalysis analysis = SiteFinder.Find(SmilesReader.Parse("CC(C)CCCC(C)C1CCC2C1(CCC3C2CC=C4C3(CCC(C4)O)C)C"));

        int[] carbons = analysis.Sites.SelectMany(static site => site.Carbons).ToArray();
        Assert.Equal(carbons.Length, carbons.Distinct().Count());
        Assert.All(analysis.Sites, site => Assert.All(site.Carbons, carbon => Assert.Same(site, analysis.SiteOf(carbon))));
    }
}
