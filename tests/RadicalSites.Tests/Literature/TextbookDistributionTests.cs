using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;

namespace RadicalSites.Tests.Literature;

/// <summary>Isomer percentages that every textbook prints, within 5 points.</summary>
public sealed class TextbookDistributionTests
{
    [Theory]
    // Morrison & Boyd, Organic Chemistry, chapter on alkanes (from memory): light, 25 C.
    [InlineData("CCC", "Cl2", 25, "CCCCl", 45)]
    [InlineData("CCCC", "Cl2", 25, "CCCCCl", 28)]
    [InlineData("CC(C)C", "Cl2", 25, "CC(C)CCl", 64)]
    // Same source: light, 127 C.
    [InlineData("CCC", "Br2", 127, "CC(C)Br", 97)]
    [InlineData("CC(C)C", "Br2", 127, "CC(C)(C)Br", 99.5)]
    // Hass, McBee & Weber, Ind. Eng. Chem. 1936 (from memory): gas phase, 300 C.
    [InlineData("CCC", "Cl2", 300, "CCCCl", 52)]
    [InlineData("CC(C)CC", "Cl2", 300, "CC(C)(Cl)CC", 22)]
    public void Predict_share_lies_within_five_points_of_the_published_one(
        string substrate, string reagent, double celsius, string product, double percent)
    {
        Prediction prediction = Halogenation.Predict(
            SmilesReader.Parse(substrate), new ReactionConditions(ReagentCatalogue.Get(reagent), Temperature.FromCelsius(celsius)));
        string canonical = Canonical.CanonicalSmiles.Write(SmilesReader.Parse(product));

        double share = prediction.Products.Single(p => p.CanonicalSmiles == canonical).Share!.Value;

        Assert.InRange(100 * share, percent - 5.5, percent + 5.5);
    }

    [Fact]
    public void Predict_bromine_atom_is_far_more_selective_than_chlorine_atom()
    {
        // Common practice, no source: bromine above 99 % tertiary, above 90 % secondary.
        Assert.True(Tertiary("Br2", 127) > 0.99);
        Assert.True(Tertiary("Br2", 127) > Tertiary("Cl2", 127) + 0.5);
    }

    [Theory]
    [InlineData("Cl2", 25, 300)]
    [InlineData("Br2", 60, 300)]
    public void Predict_selectivity_falls_with_temperature(string reagent, double cold, double hot) =>
        Assert.True(Tertiary(reagent, cold) > Tertiary(reagent, hot));

    [Fact]
    public void Predict_fluorine_is_nearly_statistical() =>
        Assert.InRange(Tertiary("F2", -80), 0.10, 0.20);

    [Fact]
    public void Predict_benzene_makes_chlorine_more_selective()
    {
        // Russell, J. Am. Chem. Soc. 1958, 80, 4987: complexed chlorine atoms.
        double inert = Tertiary("Cl2", 25);
        double benzene = Tertiary("Cl2", 25, "PhH");
        double disulfide = Tertiary("Cl2", 25, "CS2");
        Assert.True(inert < benzene && benzene < disulfide);
    }

    private static double Tertiary(string reagent, double celsius, string? solvent = null) => Halogenation
        .Predict(
            SmilesReader.Parse("CC(C)C"),
            new ReactionConditions(ReagentCatalogue.Get(reagent), Temperature.FromCelsius(celsius), solvent))
        .Sites.Single(static site => site.Site.Degree == RadicalSites.Sites.SiteDegree.Tertiary).Selectivity!.Share!.Value;
}
