using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Selectivity;

namespace RadicalSites.Tests.FrontDoor;

/// <summary>The same molecule in any atom order gives the same sites, shares and product strings.</summary>
public sealed class InvarianceTests
{
    public static TheoryData<string> Molecules() =>
    [
        "CC(C)CCCC(C)C1CCC2C1(CCC3C2CC=C4C3(CCC(C4)O)C)C",
        "C[C@@H]1CC[C@H]2C(C)(C)[C@@H]3C[C@]12CC[C@]3(C)O",
        "C1C2CC3CC1CC(C2)C3",
        "CC1CCC(C)CC1",
        "C12C3C4C1C5C2C3C45",
        "CC(C)Cc1ccc(cc1)C(C)C(=O)O",
        "CN1C2CCC1CC(C2)OC(=O)C(CO)c1ccccc1",
        "CC(=O)OC1C=CC2C3Cc4ccc(OC)c5c4C2(CCN3C)C1O5",
        "CC(C)C(NC(=O)C(C)N)C(=O)NCC(=O)O",
        "C/C=C/CC(C)C.CCCl.[Na+].[Cl-]",
        "OCC1OC(O)C(O)C(O)C1O",
        "CC1(C)SC2C(NC(=O)Cc3ccccc3)C(=O)N2C1C(=O)O",
        "C1CC2CCC1C2",
        "CCN(CC)CC",
        "FC(F)(F)CCc1ccc(cc1)[N+](=O)[O-]",
        "[2H]C([2H])C(C)C",
        "C[Si](C)(C)CC#CC",
        "O=C1CCCCCCCCCCCCCC1C",
    ];

    [Theory]
    [MemberData(nameof(Molecules))]
    public void Predict_renumbered_molecule_gives_the_same_result(string smiles)
    {
        Molecule molecule = SmilesReader.Parse(smiles);
        var predictor = new HalogenationPredictor(new ReactionConditions(ReagentCatalogue.Get("Cl2")));
        string[] expected = Summary(predictor.Predict(molecule));
        var random = new Random(20261201);
        for (int round = 0; round < 12; round++)
        {
            int[] ranks = [.. Enumerable.Range(0, molecule.AtomCount)];
            random.Shuffle(ranks);
            string renumbered = SmilesWriter.Write(molecule, ranks);

            Assert.Equal(expected, Summary(predictor.Predict(SmilesReader.Parse(renumbered))));
        }
    }

    [Theory]
    [MemberData(nameof(Molecules))]
    public void Predict_shares_sum_to_one_over_sites_and_products(string smiles)
    {
        Prediction prediction = Halogenation.Predict(
            SmilesReader.Parse(smiles), new ReactionConditions(ReagentCatalogue.Get("Cl2")));

        Assert.Equal(1, prediction.Sites.Sum(static site => site.Selectivity!.Share ?? 0), 1e-9);
        Assert.All(prediction.Sites.Where(static site => site.Selectivity!.Share is not null), static site =>
        {
            SiteSelectivity s = site.Selectivity!;
            Assert.True(s.ShareLow <= s.Share && s.Share <= s.ShareHigh);
        });
    }

    [Fact]
    public void Predict_written_hydrogens_change_nothing()
    {
        var conditions = new ReactionConditions(ReagentCatalogue.Get("Br2"));
        string[] expected = Summary(Halogenation.Predict(SmilesReader.Parse("CC(C)C"), conditions));
        string[] written = Summary(Halogenation.Predict(
            SmilesReader.Parse("[H]C([H])([H])C([H])(C([H])([H])[H])C([H])([H])[H]"), conditions));

        Assert.Equal(expected, written);
    }

    [Fact]
    public void Predict_comma_culture_changes_nothing()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            string[] expected = Summary(Halogenation.Predict(SmilesReader.Parse("CCCC"), new ReactionConditions(ReagentCatalogue.Get("Cl2"))));
            CultureInfo.CurrentCulture = new CultureInfo("de-DE");
            Assert.Equal(expected, Summary(Halogenation.Predict(SmilesReader.Parse("CCCC"), new ReactionConditions(ReagentCatalogue.Get("Cl2")))));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    // Shares to 12 digits: sums over sites are added in site order, which follows the atom order.
    private static string[] Summary(Prediction prediction)
    {
        IEnumerable<string> sites = prediction.Sites.Select(static site => string.Create(
            CultureInfo.InvariantCulture,
            $"{site.Site.Degree} {site.Site.HydrogenCount} {site.Site.RingSize} {site.Site.IsBridgehead} {site.Site.Topicity} {string.Join('+', site.Site.Conjugation.Select(static c => c.Kind).Order())} {string.Join('+', site.Site.AlphaGroups.Select(static a => a.Kind).Order())} {site.Bde.KilojoulesPerMole} {site.Selectivity!.Share:G12}"));
        IEnumerable<string> products = prediction.Products.Select(static product => string.Create(
            CultureInfo.InvariantCulture, $"{product.CanonicalSmiles} {product.Degeneracy} {product.Route} {product.Stereo} {product.Share:G12}"));
        return [prediction.CanonicalSmiles, .. sites.Order(StringComparer.Ordinal), .. products.Order(StringComparer.Ordinal)];
    }
}
