using System;
using System.Collections.Generic;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Course;

/// <summary>Published ratios of whole-molecule rates in series such as methane to tetrachloromethane.</summary>
/// <remarks>
/// A ratio measured for the molecule outranks the model: within a series it fixes the total rate, and the model only
/// divides it among the sites. Read once; immutable and safe for use by many threads.
/// </remarks>
internal sealed class ConsecutiveRates
{
    private static readonly string[] Columns =
    [
        "id", "carrier", "substrate", "reference", "ratio", "relative_sigma", "temperature_K", "kind", "source",
        "locator", "checked", "note",
    ];

    private static readonly Lazy<ConsecutiveRates> Shipped = new(static () => Read(CsvTable.EmbeddedText("consecutive_rates.csv")));
    private readonly List<Row> rows;

    private ConsecutiveRates(List<Row> rows) => this.rows = rows;

    /// <summary>The table that comes with the library.</summary>
    internal static ConsecutiveRates Default => Shipped.Value;

    /// <summary>Number of rows.</summary>
    internal int Count => rows.Count;

    /// <summary>Source keys in use.</summary>
    internal IEnumerable<string> Sources
    {
        get
        {
            foreach (Row row in rows)
            {
                yield return row.Source;
            }
        }
    }

    /// <summary>Reads a table strictly.</summary>
    /// <param name="text">The text of the table.</param>
    /// <exception cref="TableFormatException">A column, number, id or SMILES is wrong; the message names the place.</exception>
    internal static ConsecutiveRates Read(string text)
    {
        var rows = new List<Row>();
        var ids = new HashSet<string>(StringComparer.Ordinal);
        foreach (CsvRow row in CsvTable.Read("consecutive_rates.csv", text, Columns, []).Rows)
        {
            if (!ids.Add(row.Required("id")))
            {
                throw row.Error("id", "the id occurs twice.");
            }

            row.Number("relative_sigma", 0.001, 2);
            rows.Add(new Row(
                row.Required("id"), row.Required("carrier"), Canonical(row, "substrate"), Canonical(row, "reference"),
                row.Number("ratio", 1e-9, 1e9), row.Number("temperature_K", 100, 2000), row.Required("source")));
        }

        return new ConsecutiveRates(rows);
    }

    /// <summary>A rate for a species when it and an earlier species of the network belong to one published series.</summary>
    /// <param name="carrier">Symbol of the chain carrier, for example <c>Cl</c>.</param>
    /// <param name="smiles">Canonical SMILES of the species.</param>
    /// <param name="kelvin">Temperature [K].</param>
    /// <param name="known">Rates of the earlier species by canonical SMILES.</param>
    internal MeasuredRate? Find(string carrier, string smiles, double kelvin, IReadOnlyDictionary<string, double> known)
    {
        foreach (Row row in rows)
        {
            if (row.Carrier != carrier || row.Substrate != smiles)
            {
                continue;
            }

            var evidence = new List<string>();
            double ratio = RatioAt(carrier, smiles, row.Reference, kelvin, evidence);
            foreach ((string other, double rate) in known)
            {
                double otherRatio = other == row.Reference ? 1 : RatioAt(carrier, other, row.Reference, kelvin, evidence);
                if (otherRatio > 0 && rate > 0)
                {
                    return new MeasuredRate(rate * ratio / otherRatio, evidence);
                }
            }

            return null;
        }

        return null;
    }

    // Linear in 1/T between the rows around the temperature, the outer segments extended; 0 when the pair is unknown.
    private double RatioAt(string carrier, string substrate, string reference, double kelvin, List<string> evidence)
    {
        List<Row> series = rows.FindAll(
            row => row.Carrier == carrier && row.Substrate == substrate && row.Reference == reference);
        if (series.Count == 0)
        {
            return 0;
        }

        series.Sort(static (left, right) => left.Kelvin.CompareTo(right.Kelvin));
        evidence.Add(series[0].Id);
        if (series.Count == 1)
        {
            return series[0].Ratio;
        }

        int upper = 1;
        while (upper < series.Count - 1 && series[upper].Kelvin < kelvin)
        {
            upper++;
        }

        Row cold = series[upper - 1];
        Row hot = series[upper];
        evidence[^1] = cold.Id;
        evidence.Add(hot.Id);
        double slope = Math.Log(hot.Ratio / cold.Ratio) / ((1 / hot.Kelvin) - (1 / cold.Kelvin));
        return cold.Ratio * Math.Exp(slope * ((1 / kelvin) - (1 / cold.Kelvin)));
    }

    private static string Canonical(CsvRow row, string column) =>
        SmilesReader.TryParse(row.Required(column), out Molecule? molecule, out FormatProblem? problem)
            ? CanonicalSmiles.Write(molecule)
            : throw row.Error(column, problem.Message);

    private sealed record Row(
        string Id, string Carrier, string Substrate, string Reference, double Ratio, double Kelvin, string Source);
}
