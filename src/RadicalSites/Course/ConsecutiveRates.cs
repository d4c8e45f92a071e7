using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;

namespace RadicalSites.Course;

/// <summary>Published ratios of whole-molecule rates in series such as methane to tetrachloromethane.</summary>
/// <remarks>
/// A ratio measured for the molecule outranks the model: within a series it fixes the total rate, and the model only
/// divides it among the sites. Read once; immutable and safe for use by many threads.
/// </remarks>
internal sealed class ConsecutiveRates
{
    private const string Header =
        "id,carrier,substrate,reference,ratio,relative_sigma,temperature_K,kind,source,locator,checked,note";

    private static readonly Lazy<ConsecutiveRates> Shipped = new(ReadShipped);
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
    /// <param name="reader">The text.</param>
    /// <param name="canonicalise">Brings a SMILES to the canonical form of the library.</param>
    /// <exception cref="InvalidDataException">A header, field count, number or id is wrong; the message names the line.</exception>
    internal static ConsecutiveRates Read(TextReader reader, Func<string, string> canonicalise)
    {
        var rows = new List<Row>();
        var ids = new HashSet<string>(StringComparer.Ordinal);
        bool header = false;
        for (int line = 1; reader.ReadLine() is { } text; line++)
        {
            if (text.Length == 0 || text[0] == '#')
            {
                continue;
            }

            if (!header)
            {
                header = text == Header ? true : throw Wrong(line, "the header row is not the expected one");
                continue;
            }

            string[] fields = text.Split(',', 12);
            if (fields.Length != 12 || !ids.Add(fields[0]))
            {
                throw Wrong(line, "fields are missing or the id occurs twice");
            }

            rows.Add(new Row(
                fields[0], fields[1], canonicalise(fields[2]), canonicalise(fields[3]), Positive(fields[4], line),
                Positive(fields[6], line), fields[8]));
            Positive(fields[5], line);
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

    private static double Positive(string text, int line) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value)
        && value > 0 && double.IsFinite(value)
            ? value
            : throw Wrong(line, $"'{text}' is not a positive number");

    private static InvalidDataException Wrong(int line, string what) =>
        new(string.Create(CultureInfo.InvariantCulture, $"consecutive_rates.csv, line {line}: {what}."));

    private static ConsecutiveRates ReadShipped()
    {
        using Stream stream = typeof(ConsecutiveRates).Assembly
            .GetManifestResourceStream("RadicalSites.Data.consecutive_rates.csv")
            ?? throw new InvalidDataException("The embedded table consecutive_rates.csv is missing.");
        using var reader = new StreamReader(stream);
        return Read(reader, static smiles => Products.ProductIdentity.SmilesOf(Formats.Smiles.SmilesReader.Parse(smiles)));
    }

    private sealed record Row(
        string Id, string Carrier, string Substrate, string Reference, double Ratio, double Kelvin, string Source);
}
