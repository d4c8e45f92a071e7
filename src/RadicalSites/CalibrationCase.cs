using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Products;
using RadicalSites.Quantities;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites;

/// <summary>One measured distribution made ready for fitting: which sites lead to which product.</summary>
internal sealed class CalibrationCase
{
    private const double SumTolerance = 5;

    private readonly ReactionConditions conditions;
    private readonly SiteAnalysis analysis;
    private readonly IReadOnlyList<BdeAssignment> bdes;
    private readonly int[][] sites;
    private readonly BdeTable table;

    private CalibrationCase(
        MeasuredDistribution data, ReactionConditions conditions, SiteAnalysis analysis,
        IReadOnlyList<BdeAssignment> bdes, int[][] sites, BdeTable table)
    {
        Data = data;
        this.conditions = conditions;
        this.analysis = analysis;
        this.bdes = bdes;
        this.sites = sites;
        this.table = table;
        double sum = data.Products.Sum(static product => product.Percent);
        Measured = [.. data.Products.Select(product => product.Percent / sum)];
    }

    internal MeasuredDistribution Data { get; }

    internal string Carrier => conditions.Reagent.Carrier.Id;

    /// <summary>Measured parts, summing to 1.</summary>
    internal double[] Measured { get; }

    /// <summary>Predicted parts, renormalised to the products listed.</summary>
    internal double[] Predict(SelectivityCalibration calibration)
    {
        double[] shares = new SelectivityModel(conditions, table, calibration).Shares(analysis, bdes);
        var parts = new double[sites.Length];
        double sum = 0;
        for (int i = 0; i < parts.Length; i++)
        {
            foreach (int site in sites[i])
            {
                parts[i] += shares[site - 1];
            }

            sum += parts[i];
        }

        for (int i = 0; i < parts.Length; i++)
        {
            parts[i] /= sum;
        }

        return parts;
    }

    /// <summary>Prepares a distribution; null with a reason when it cannot be used.</summary>
    internal static CalibrationCase? Prepare(MeasuredDistribution data, BdeTable table, out string? reason)
    {
        reason = Nonsense(data);
        if (reason is not null)
        {
            return null;
        }

        Reagent reagent = ReagentCatalogue.Get(data.Reagent);
        if (!SmilesReader.TryParse(data.Substrate, out Molecules.Molecule? substrate, out _))
        {
            reason = $"the substrate '{data.Substrate}' is no valid SMILES";
            return null;
        }

        var conditions = new ReactionConditions(reagent, Temperature.FromCelsius(data.Celsius), data.Solvent);
        SiteAnalysis analysis = SiteFinder.Find(substrate);
        IReadOnlyList<BdeAssignment> bdes = new BdeAssigner(table).Assign(analysis);
        if (analysis.Sites.Count > 0 && !new SelectivityModel(conditions, table).Evaluate(analysis, bdes).Propagates)
        {
            reason = $"with {reagent.Id} the chain does not propagate, so no distribution can come from it";
            return null;
        }

        return Assign(data, analysis, bdes, reagent, out reason) is { } sites
            ? new CalibrationCase(data, conditions, analysis, bdes, sites, table)
            : null;
    }

    private static string? Nonsense(MeasuredDistribution data)
    {
        if (ReagentCatalogue.Find(data.Reagent) is not { } reagent)
        {
            return $"there is no reagent '{data.Reagent}'";
        }

        if (data.Celsius < reagent.Minimum.Celsius - 100 || data.Celsius > reagent.Maximum.Celsius + 150)
        {
            return $"{data.Celsius} C is far outside the range of {reagent.Id}";
        }

        if (data.Products.Count < 2)
        {
            return "one product alone says nothing about a ratio";
        }

        double sum = data.Products.Sum(static product => product.Percent);
        return data.Products.Any(static product => !double.IsFinite(product.Percent) || product.Percent < 0)
            ? "a percentage is negative or no number"
            : sum <= 0 ? "all percentages are zero"
            : Math.Abs(sum - 100) > SumTolerance ? FormattableString.Invariant($"the percentages sum to {sum:0.#}, not to 100")
            : data.Products.Any(static product => product.SigmaPercent is <= 0 or > 50)
                ? "a standard deviation is not above 0 and below 50 points"
            : null;
    }

    private static int[][]? Assign(
        MeasuredDistribution data, SiteAnalysis analysis, IReadOnlyList<BdeAssignment> bdes, Reagent reagent, out string? reason)
    {
        IReadOnlyList<HalogenationProduct> products = ProductEnumerator.Enumerate(analysis, reagent.Halogen).Products;
        var taken = new bool[analysis.Sites.Count];
        var sites = new int[data.Products.Count][];
        for (int i = 0; i < sites.Length; i++)
        {
            MeasuredProduct measured = data.Products[i];
            if (measured.Smiles == "*")
            {
                continue;
            }

            sites[i] = measured.Site is { } number ? [number] : SitesOf(measured.Smiles, products, out reason) ?? [];
            foreach (int site in sites[i])
            {
                if (site < 1 || site > taken.Length)
                {
                    reason = $"'{data.Substrate}' has no site {site}";
                    return null;
                }

                if (bdes[site - 1].KilojoulesPerMole is null)
                {
                    reason = $"site {site} has no bond enthalpy and therefore no share";
                    return null;
                }

                if (taken[site - 1])
                {
                    reason = $"site {site} is named twice";
                    return null;
                }

                taken[site - 1] = true;
            }

            if (sites[i].Length == 0)
            {
                reason = $"'{measured.Smiles}' is not a product of direct mono-halogenation of '{data.Substrate}' with {reagent.Id}";
                return null;
            }
        }

        reason = null;
        int[] rest = [.. Enumerable.Range(1, taken.Length).Where(site => !taken[site - 1] && bdes[site - 1].KilojoulesPerMole is not null)];
        for (int i = 0; i < sites.Length; i++)
        {
            sites[i] ??= rest;
        }

        if (sites.Any(static list => list.Length == 0))
        {
            reason = "no site is left for the products not listed";
            return null;
        }

        return sites;
    }

    // A product counts when all of its sites give it directly and nothing else: then its share is that of the sites.
    private static int[]? SitesOf(string smiles, IReadOnlyList<HalogenationProduct> products, out string? reason)
    {
        reason = null;
        if (!SmilesReader.TryParse(smiles, out Molecules.Molecule? molecule, out _))
        {
            return null;
        }

        string canonical = CanonicalSmiles.Write(molecule);
        HalogenationProduct? found = products.FirstOrDefault(product => product.CanonicalSmiles == canonical);
        return found is { Route: ProductRoute.Direct }
            && products.All(product => product == found || !product.Sites.Intersect(found.Sites).Any())
            ? [.. found.Sites]
            : null;
    }
}
