using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using System.Text;

namespace RadicalSites;

/// <summary>Outcome of the literature bench.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed class BenchReport
{
    internal BenchReport(IReadOnlyList<BenchEntry> entries)
    {
        Entries = entries;
        var summaries = new List<BenchSummary>();
        foreach (bool fit in (bool[])[false, true])
        {
            string split = fit ? "fit" : "test";
            BenchEntry[] part = [.. entries.Where(entry => entry.Problem is null && entry.Distribution.IsForFitting == fit)];
            Add(summaries, split, part, static _ => true);
            Add(summaries, $"{split}, measured", [.. part.Where(static entry => entry.Distribution.IsMeasured)], static _ => true);
            foreach (string carrier in part.Select(static entry => entry.Carrier).Distinct().Order(StringComparer.Ordinal))
            {
                Add(summaries, $"{split}, carrier {carrier}", [.. part.Where(entry => entry.Carrier == carrier)], static _ => true);
            }

            foreach (string name in part.SelectMany(static entry => entry.Products).Select(static product => product.SiteClass)
                .Distinct().Order(StringComparer.Ordinal))
            {
                Add(summaries, $"{split}, class {name}", part, product => product.SiteClass == name);
            }
        }

        Summaries = summaries;
    }

    /// <summary>All entries in table order.</summary>
    public IReadOnlyList<BenchEntry> Entries { get; }

    /// <summary>Figures over the test set, the fit set, and each by carrier and by class of site.</summary>
    public IReadOnlyList<BenchSummary> Summaries { get; }

    /// <summary>Finds a summary.</summary>
    /// <param name="group">Name of the group.</param>
    /// <returns>The summary, or <see langword="null"/> when there is no such group.</returns>
    public BenchSummary? Find(string group) => Summaries.FirstOrDefault(summary => summary.Group == group);

    /// <summary>Data of a parity plot: one CSV row for each product.</summary>
    /// <returns>The text with a column row, lines ended by line feed.</returns>
    public string ToParityCsv()
    {
        var text = new StringBuilder("id,split,kind,carrier,celsius,class,product,measured,predicted,low,high,covered\n");
        foreach (BenchEntry entry in Entries)
        {
            MeasuredDistribution data = entry.Distribution;
            foreach (BenchProduct product in entry.Products)
            {
                text.Append(CultureInfo.InvariantCulture, $"{data.Id},{(data.IsForFitting ? "fit" : "test")},");
                text.Append(CultureInfo.InvariantCulture, $"{(data.IsMeasured ? "measured" : "derived")},{entry.Carrier},{data.Celsius},");
                text.Append(CultureInfo.InvariantCulture, $"{product.SiteClass},{product.Smiles},{product.Measured:0.##},");
                text.Append(CultureInfo.InvariantCulture, $"{product.Predicted:0.##},{product.Low:0.##},{product.High:0.##},");
                text.Append(product.IsCovered ? "true\n" : "false\n");
            }
        }

        return text.ToString();
    }

    private static void Add(
        List<BenchSummary> summaries, string group, BenchEntry[] entries, Func<BenchProduct, bool> belongs)
    {
        BenchProduct[] products = [.. entries.SelectMany(static entry => entry.Products).Where(belongs)];
        if (products.Length > 0)
        {
            summaries.Add(new BenchSummary(
                group, entries.Count(entry => entry.Products.Any(belongs)), products.Length,
                products.Average(static product => Math.Abs(product.Error)),
                products.Average(static product => product.IsCovered ? 1.0 : 0.0)));
        }
    }
}
