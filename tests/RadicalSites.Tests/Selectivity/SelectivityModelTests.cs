using System;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Selectivity;

/// <summary>Shares, intervals, verdicts and remarks of the model.</summary>
public sealed class SelectivityModelTests
{
    // Morrison & Boyd, Organic Chemistry (from memory): isomer percentages of light-induced halogenation.
    [Theory]
    [InlineData("CCC", "Cl2", 25, 0, 45)]
    [InlineData("CCCC", "Cl2", 25, 0, 28)]
    [InlineData("CC(C)C", "Cl2", 25, 0, 64)]
    [InlineData("CC(C)C", "Br2", 127, 1, 99.4)]
    [InlineData("CCC", "Br2", 127, 1, 97)]
    public void Evaluate_published_distribution_within_five_points(
        string smiles, string reagent, double celsius, int site, double percent) =>
        Assert.InRange(100 * Evaluate(smiles, reagent, celsius).Sites[site].Share!.Value, percent - 5, percent + 5);

    [Theory]
    [InlineData("CCCCC(C)C(=O)OCC", "Cl2", 25)]
    [InlineData("CC(C)c1ccccc1", "Br2", 77)]
    [InlineData("CC(C)CC(C)(C)C", "Br2", -20)]
    [InlineData("C1CC2CCC1C2", "BrCCl3", 100)]
    public void Evaluate_intervals_hold_the_share_and_stay_within_zero_and_one(string smiles, string reagent, double celsius)
    {
        SelectivityResult result = Evaluate(smiles, reagent, celsius);
        Assert.Equal(1, result.Sites.Sum(static site => site.Share!.Value), 12);
        Assert.All(result.Sites, static site => Assert.True(
            site.ShareLow >= 0 && site.ShareLow <= site.Share && site.Share <= site.ShareHigh && site.ShareHigh <= 1));
    }

    // The closed form for one site has to give what the general sum gives: the complement of all other sites.
    [Theory]
    [InlineData("CCCCC(C)C(=O)OCC", "Cl2", 25)]
    [InlineData("CCc1ccc(C(C)C)cc1", "Br2", 40)]
    [InlineData("CC1CCCCC1CCO", "tBuOCl", 40)]
    public void IntervalOf_one_site_is_the_mirror_of_the_others(string smiles, string reagent, double celsius)
    {
        SelectivityResult result = Evaluate(smiles, reagent, celsius);
        foreach (SiteSelectivity site in result.Sites)
        {
            int[] others = [.. result.Sites.Select(static other => other.SiteNumber).Where(number => number != site.SiteNumber)];
            (double low, double high) = result.IntervalOf(others);
            Assert.Equal(site.ShareHigh!.Value, 1 - low, 9);
            Assert.Equal(site.ShareLow!.Value, 1 - high, 9);
        }
    }

    // The class error of two sites of one class cancels between them.
    [Fact]
    public void Evaluate_sites_of_one_class_have_narrower_ratio_than_sites_of_two()
    {
        SelectivityResult pentane = Evaluate("CCCCC", "Br2", 127);
        (double low, double high) = pentane.IntervalOf([2]);
        Assert.True(high - low < 0.25, $"{low} to {high}");
    }

    [Fact]
    public void Evaluate_iodine_is_refused_with_its_enthalpies()
    {
        SelectivityResult result = Evaluate("CCC", "I2", 25);
        Assert.False(result.Propagates);
        Assert.All(result.Sites, static site => Assert.Null(site.Share));
        Diagnostic remark = Assert.Single(result.Diagnostics, static remark => remark.Code == "chain-refused");
        Assert.Contains("kJ/mol", remark.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Evaluate_remarks_name_statistical_mixture_addition_and_temperature()
    {
        Assert.Contains(Evaluate("CCCC", "F2", 0).Diagnostics, static remark => remark.Code == "selectivity-statistical");
        Assert.Contains(Evaluate("CC=CC", "Br2", 25).Diagnostics, static remark => remark.Code == "selectivity-addition");
        Assert.DoesNotContain(Evaluate("CC=CC", "NBS", 77).Diagnostics, static remark => remark.Code == "selectivity-addition");
        Assert.Contains(Evaluate("CCC", "NBS", 300).Diagnostics, static remark => remark.Code == "temperature-outside-range");
    }

    // Wiberg & Slaugh, J. Am. Chem. Soc. 1958, 80, 3033: kH/kD 1.3 for chlorine and 4.9 for bromine at 77 C (from memory).
    [Theory]
    [InlineData("Cl2", 1.3)]
    [InlineData("Br2", 4.9)]
    public void Evaluate_deuterium_competes_by_the_isotope_effect(string reagent, double effect)
    {
        SelectivityResult labelled = Evaluate("[2H]Cc1ccccc1", reagent, 77);
        double ratio = 2 * labelled.DeuteriumShare / (1 - labelled.DeuteriumShare);
        Assert.InRange(ratio, 1 / (1.15 * effect), 1.15 / effect);
        Assert.Equal(0, Evaluate("Cc1ccccc1", reagent, 77).DeuteriumShare);
    }

    [Fact]
    public void Evaluate_carbon_with_deuterium_only_still_competes()
    {
        double share = Evaluate("CC([2H])(C)C", "Br2", 60).DeuteriumShare;
        Assert.True(share > 0.9);
    }

    [Fact]
    public void Evaluate_site_without_enthalpy_is_bounded()
    {
        SelectivityResult result = Evaluate("CCCC[NH3+]", "Cl2", 25);
        Assert.Null(result.Sites[3].Share);
        Assert.Contains(result.Diagnostics, static remark => remark.Code == "share-bound");
        Assert.Equal(1, result.Sites.Take(3).Sum(static site => site.Share!.Value), 12);
    }

    [Fact]
    public void Evaluate_same_input_gives_the_same_bits()
    {
        SelectivityResult first = Evaluate("CCCCC(C)C(=O)OCC", "Cl2", 25);
        SelectivityResult second = Evaluate("CCCCC(C)C(=O)OCC", "Cl2", 25);
        Assert.Equal(first.Sites, second.Sites);
    }

    [Theory]
    [InlineData("PhH@4M", true)]
    [InlineData("phh", true)]
    [InlineData("PhH@", false)]
    [InlineData("PhH@-1M", false)]
    [InlineData("nonsense", false)]
    public void Evaluate_unknown_solvent_is_said(string solvent, bool known)
    {
        SelectivityResult result = Evaluate("CCC", "Cl2", 25, solvent);
        Assert.Equal(!known, result.Diagnostics.Any(static remark => remark.Code == "solvent-not-in-table"));
    }

    internal static SelectivityResult Evaluate(string smiles, string reagent, double celsius, string? solvent = null)
    {
        var conditions = new ReactionConditions(ReagentCatalogue.Get(reagent), Temperature.FromCelsius(celsius), solvent);
        RadicalSites.Sites.SiteAnalysis analysis = RadicalSites.Sites.SiteFinder.Find(SmilesReader.Parse(smiles));
        return new SelectivityModel(conditions).Evaluate(analysis, new BdeAssigner().Assign(analysis));
    }
}
