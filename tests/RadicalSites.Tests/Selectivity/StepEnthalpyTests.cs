using System;
using System.IO;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Selectivity;

/// <summary>Enthalpies of the propagation steps at a secondary C-H (common practice, no source).</summary>
public sealed class StepEnthalpyTests
{
    [Theory]
    [InlineData("F2", -171, -280)]
    [InlineData("Cl2", -34, -97)]
    [InlineData("Br2", 31, -92)]
    public void Steps_from_a_rounded_handbook_table_of_the_user_are_the_known_ones(string reagent, double abstraction, double transfer)
    {
        StepEnthalpies steps = SecondarySteps(reagent, Handbook());

        Assert.Equal(abstraction, steps.AbstractionKilojoulesPerMole!.Value, 1.0);
        Assert.Equal(transfer, steps.TransferKilojoulesPerMole!.Value, 1.0);
        Assert.NotEqual(ChainVerdict.Refused, steps.Verdict);
    }

    [Fact]
    public void Steps_of_iodine_from_the_handbook_table_are_refused()
    {
        StepEnthalpies steps = SecondarySteps("I2", Handbook());

        Assert.Equal(100, steps.AbstractionKilojoulesPerMole!.Value, 1.0);
        Assert.Equal(ChainVerdict.Refused, steps.Verdict);
    }

    [Fact]
    public void Steps_with_the_shipped_table_have_the_same_signs_order_and_verdicts()
    {
        StepEnthalpies[] steps = [.. new[] { "F2", "Cl2", "Br2", "I2" }.Select(id => SecondarySteps(id, BdeTable.Default))];
        double[] abstraction = [.. steps.Select(static s => s.AbstractionKilojoulesPerMole!.Value)];

        Assert.Equal(abstraction.Order(), abstraction);
        Assert.True(abstraction[1] < 0 && abstraction[2] > 0);
        Assert.All(steps, static s => Assert.True(s.TransferKilojoulesPerMole < 0));
        Assert.Equal(
            [ChainVerdict.Propagates, ChainVerdict.Propagates, ChainVerdict.Slow, ChainVerdict.Refused],
            steps.Select(static s => s.Verdict));
    }

    [Fact]
    public void Predict_iodine_gives_products_without_shares_and_says_why()
    {
        Prediction prediction = Halogenation.Predict(
            SmilesReader.Parse("CC(C)C"), new ReactionConditions(ReagentCatalogue.Get("I2")));

        Assert.All(prediction.Sites, static site => Assert.Null(site.Selectivity!.Share));
        Assert.Contains(prediction.Diagnostics, static d => d.Code == "chain-refused");
    }

    private static BdeTable Handbook() => BdeTable.Parse(
        "rounded-handbook.csv",
        File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "TestData", "Tables", "rounded-handbook.csv")));

    private static StepEnthalpies SecondarySteps(string reagent, BdeTable table) => Halogenation
        .Predict(
            SmilesReader.Parse("CCCCC"), new ReactionConditions(ReagentCatalogue.Get(reagent)),
            new HalogenationOptions { Table = table })
        .Sites.First(static site => site.Site.Degree == RadicalSites.Sites.SiteDegree.Secondary).Selectivity!.Steps;
}
