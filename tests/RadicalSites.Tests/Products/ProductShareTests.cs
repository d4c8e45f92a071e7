using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Products;

/// <summary>Shares of products: sums, merged sites, splits between the ends of a radical.</summary>
public class ProductShareTests
{
    [Theory]
    [InlineData("CCCC", "Cl2")]
    [InlineData("CC(C)Cc1ccc(cc1)C(C)C(=O)O", "NBS")]
    [InlineData("OC(=O)[C@@H](N)C(C)C", "Cl2")]
    [InlineData("C1=CCCCC1", "NBS")]
    [InlineData("C=CCCCC", "NBS")]
    public void Enumerate_shares_sum_to_one_and_lie_in_their_intervals(string smiles, string reagent)
    {
        ProductSet set = Enumerate(smiles, reagent, mergeDiastereotopic: false);

        Assert.Equal(1, set.Products.Sum(static product => product.Share!.Value), 12);
        Assert.All(set.Products, static product => Assert.InRange(
            product.Share!.Value, product.ShareLow!.Value - 1e-12, product.ShareHigh!.Value + 1e-12));
    }

    [Fact]
    public void Enumerate_octene_divides_the_radical_by_the_published_ratio()
    {
        // 1-octene and N-bromosuccinimide: 17 % 3-bromo-1-octene, 83 % 1-bromo-2-octene (McMurry, Organic Chemistry).
        ProductSet set = Enumerate("CCCCCCC=C", "NBS", mergeDiastereotopic: false);

        HalogenationProduct transposed = set.Products[0];
        HalogenationProduct direct = set.Products[1];
        Assert.Equal(ProductRoute.Transposed, transposed.Route);
        Assert.Equal(ProductRoute.Direct, direct.Route);
        Assert.Equal(17.0 / 83, direct.Share!.Value / transposed.Share!.Value, 6);
        Assert.Contains(set.Diagnostics, static diagnostic => diagnostic.Code == "product-end-split-analogue");
    }

    [Fact]
    public void Enumerate_unknown_split_is_bounded_by_the_share_of_the_site()
    {
        ProductSet set = Enumerate("CC=CCC", "Cl2", mergeDiastereotopic: false);

        HalogenationProduct[] open = [.. set.Products.Where(static product => product.Share is null)];
        Assert.Equal(2, open.Length);
        Assert.All(open, static product => Assert.Equal(0, product.ShareLow));
        Assert.Equal(open[0].ShareHigh, open[1].ShareHigh);
        Assert.True(open[0].ShareHigh >= 1 - set.Products.Sum(static product => product.Share ?? 0) - 1e-12);
        Assert.Contains(set.Diagnostics, static diagnostic => diagnostic.Code == "product-end-split-unknown");
    }

    [Theory]
    [InlineData("OC(=O)[C@@H](N)C(C)C")]
    [InlineData("C[C@H]1CC[C@@H](C(C)C)[C@H](O)C1")]
    [InlineData("CC1(C)[C@@H]2CC[C@@]1(C)C(=O)C2")]
    public void Enumerate_merged_diastereotopic_sites_give_the_same_products(string smiles)
    {
        ProductSet apart = Enumerate(smiles, "Cl2", mergeDiastereotopic: false);
        ProductSet merged = Enumerate(smiles, "Cl2", mergeDiastereotopic: true);

        Assert.Equal(
            apart.Products.Select(static one => $"{one.CanonicalSmiles} {one.Degeneracy} {one.Stereo} {one.Share:F9}").Order(),
            merged.Products.Select(static one => $"{one.CanonicalSmiles} {one.Degeneracy} {one.Stereo} {one.Share:F9}").Order());
    }

    private static ProductSet Enumerate(string smiles, string reagent, bool mergeDiastereotopic)
    {
        SiteAnalysis sites = SiteFinder.Find(SmilesReader.Parse(smiles), mergeDiastereotopic);
        Reagent source = ReagentCatalogue.Get(reagent);
        SelectivityResult selectivity = new SelectivityModel(new ReactionConditions(source, Temperature.FromCelsius(77)))
            .Evaluate(sites, new BdeAssigner().Assign(sites));
        return ProductEnumerator.Enumerate(sites, source.Halogen, selectivity);
    }
}
