using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Sites;

namespace RadicalSites;

/// <summary>Predicts published distributions and compares.</summary>
/// <remarks>
/// Predicted shares are renormalised to the products that the entry lists, as the published percentages are. Stateless
/// and safe for use by many threads.
/// </remarks>
public static class LiteratureBench
{
    private const string Rest = "*";

    /// <summary>Runs the bench.</summary>
    /// <param name="distributions">The entries; the shipped ones when not given.</param>
    /// <param name="options">Options of the predictions, or <see langword="null"/> for the defaults.</param>
    /// <returns>Every entry with its errors, and the figures by split, carrier and class.</returns>
    public static BenchReport Run(
        IReadOnlyList<MeasuredDistribution>? distributions = null, HalogenationOptions? options = null) =>
        new([.. (distributions ?? LiteratureDistributions.Default).Select(entry => Compare(entry, options))]);

    private static BenchEntry Compare(MeasuredDistribution entry, HalogenationOptions? options)
    {
        if (ReagentCatalogue.Find(entry.Reagent) is not { } reagent)
        {
            return new BenchEntry(entry, "", [], $"there is no reagent '{entry.Reagent}'");
        }

        if (!SmilesReader.TryParse(entry.Substrate, out Molecules.Molecule? substrate, out _))
        {
            return new BenchEntry(entry, reagent.Carrier.Id, [], $"the substrate '{entry.Substrate}' is no SMILES");
        }

        var conditions = new ReactionConditions(reagent, Temperature.FromCelsius(entry.Celsius), entry.Solvent);
        Prediction prediction = Halogenation.Predict(substrate, conditions, options);
        return Match(entry, prediction, out string? problem) is { } matched
            ? new BenchEntry(entry, reagent.Carrier.Id, Products(entry, prediction, matched), null)
            : new BenchEntry(entry, reagent.Carrier.Id, [], problem);
    }

    // The predicted product of each listed one; null for the rest.
    private static HalogenationProduct?[]? Match(MeasuredDistribution entry, Prediction prediction, out string? problem)
    {
        problem = null;
        var matched = new HalogenationProduct?[entry.Products.Count];
        for (int i = 0; i < matched.Length; i++)
        {
            string smiles = entry.Products[i].Smiles;
            if (smiles == Rest)
            {
                continue;
            }

            if (!SmilesReader.TryParse(smiles, out Molecules.Molecule? product, out _))
            {
                problem = $"the product '{smiles}' is no SMILES";
                return null;
            }

            string canonical = CanonicalSmiles.Write(product);
            matched[i] = prediction.Products.FirstOrDefault(candidate => candidate.CanonicalSmiles == canonical);
            if (matched[i]?.Share is null)
            {
                problem = $"'{smiles}' is no rated product of '{entry.Substrate}'";
                return null;
            }
        }

        return matched;
    }

    private static BenchProduct[] Products(
        MeasuredDistribution entry, Prediction prediction, HalogenationProduct?[] matched)
    {
        double listed = matched.Sum(static product => product?.Share ?? 0);
        double whole = matched.Contains(null) ? 1 : listed;
        var products = new BenchProduct[matched.Length];
        for (int i = 0; i < products.Length; i++)
        {
            MeasuredProduct measured = entry.Products[i];
            if (matched[i] is { } product)
            {
                (double low, double high) = Renormalised(product.Share!.Value, product.ShareLow!.Value, product.ShareHigh!.Value, whole);
                products[i] = new BenchProduct(
                    measured.Smiles, measured.Percent, 100 * product.Share.Value / whole, 100 * low, 100 * high,
                    ClassOf(prediction.Sites[product.Sites[0] - 1].Site));
            }
            else
            {
                (double low, double high) = IntervalOfRest(prediction, matched, 1 - listed);
                products[i] = new BenchProduct(
                    measured.Smiles, measured.Percent, 100 * (1 - listed), 100 * low, 100 * high, "rest");
            }
        }

        return products;
    }

    // Leaving products out moves the share; its error on the logit stays what it was.
    private static (double Low, double High) Renormalised(double share, double low, double high, double whole)
    {
        double moved = share / whole;
        if (whole > 1 - 1e-9 || share <= 0 || share >= 1 || moved >= 1 - 1e-12 || low <= 0 || high >= 1)
        {
            return (low, high);
        }

        double shift = Logit(moved) - Logit(share);
        return (Logistic(Logit(low) + shift), Logistic(Logit(high) + shift));
    }

    private static (double Low, double High) IntervalOfRest(
        Prediction prediction, HalogenationProduct?[] matched, double rest)
    {
        int[] sites = [.. matched.OfType<HalogenationProduct>().SelectMany(static product => product.Sites).Distinct()];
        bool wholeSites = matched.OfType<HalogenationProduct>().All(static product => product.Route == ProductRoute.Direct);
        if (!wholeSites || sites.Length == 0)
        {
            return (rest, rest);
        }

        (double low, double high) = prediction.Selectivity.IntervalOf(sites);
        return (1 - high, 1 - low);
    }

    private static string ClassOf(Site site)
    {
        string name = site.Degree.ToString();
        return site.Conjugation.Count > 0 ? $"{site.Conjugation[0].Kind} {name}"
            : site.AlphaGroups.Count > 0 ? $"{name} beside {site.AlphaGroups[0].Kind}"
            : name;
    }

    private static double Logit(double share) => Math.Log(share / (1 - share));

    private static double Logistic(double value) => 1 / (1 + Math.Exp(-value));
}
