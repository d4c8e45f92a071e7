using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;

namespace RadicalSites;

/// <summary>Reads tables of measured distributions; holds the shipped one.</summary>
/// <remarks>Stateless and safe for use by many threads.</remarks>
public static class LiteratureDistributions
{
    private static readonly string[] Columns = ["id", "substrate", "reagent", "celsius", "product", "percent"];

    private static readonly string[] Optional =
        ["solvent", "kind", "split", "source", "locator", "confidence", "note"];

    /// <summary>The shipped distributions from the literature, in table order.</summary>
    public static IReadOnlyList<MeasuredDistribution> Default => Holder.Entries;

    /// <summary>Reads a table: CSV, one row for each product, rows of one id together.</summary>
    /// <remarks>
    /// Columns: id, substrate, reagent, celsius, product, percent; and where wanted solvent, kind (measured, derived), split
    /// (fit, test), source, locator, confidence, note. Without them a row is measured, for fitting, and its source is the
    /// table itself.
    /// </remarks>
    /// <param name="name">Name for messages.</param>
    /// <param name="text">The text.</param>
    /// <returns>The entries in table order; may be empty.</returns>
    /// <exception cref="TableFormatException">A column or a value is not as it has to be, with its line.</exception>
    public static IReadOnlyList<MeasuredDistribution> Read(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(text);
        var entries = new List<MeasuredDistribution>();
        var products = new List<MeasuredProduct>();
        var seen = new HashSet<string>(StringComparer.Ordinal);
        CsvRow? first = null;
        foreach (CsvRow row in CsvTable.Read(name, text, Columns, Optional).Rows)
        {
            string id = row.Required("id");
            if (first is null || first.Text("id") != id)
            {
                Close(entries, products, first);
                first = row;
                if (!seen.Add(id))
                {
                    throw row.Error("id", $"the rows of '{id}' do not stand together.");
                }
            }
            else if (first.Text("substrate") != row.Text("substrate") || first.Text("split") != row.Text("split"))
            {
                throw row.Error("substrate", $"the rows of '{id}' differ in substrate or split.");
            }

            products.Add(new MeasuredProduct(row.Required("product"), row.Number("percent", 0, 100)));
        }

        Close(entries, products, first);
        return entries;
    }

    private static void Close(List<MeasuredDistribution> entries, List<MeasuredProduct> products, CsvRow? row)
    {
        if (row is null)
        {
            return;
        }

        string solvent = row.Text("solvent");
        entries.Add(new MeasuredDistribution
        {
            Id = row.Required("id"),
            Substrate = row.Required("substrate"),
            Reagent = row.Required("reagent"),
            Celsius = row.Number("celsius", -200, 1000),
            Solvent = solvent.Length == 0 ? null : solvent,
            Products = products.ToArray(),
            IsMeasured = OneOf(row, "kind", "measured", "derived"),
            IsForFitting = OneOf(row, "split", "fit", "test"),
            Source = row.Text("source") is { Length: > 0 } source ? source : row.Table,
            Locator = row.Text("locator") is { Length: > 0 } locator ? locator : $"line {row.Line}",
            Confidence = row.Text("confidence") is { Length: > 0 } confidence ? confidence : "high",
            Note = row.Text("note"),
        });
        products.Clear();
    }

    private static bool OneOf(CsvRow row, string column, string yes, string no)
    {
        string value = row.Text(column);
        return value.Length == 0 || value == yes || (value == no ? false : throw row.Error(column, $"'{value}' is neither {yes} nor {no}."));
    }

    private static class Holder
    {
        internal static readonly IReadOnlyList<MeasuredDistribution> Entries =
            Read("distributions.csv", CsvTable.EmbeddedText("distributions.csv"));
    }
}
