using System;
using System.Collections.Generic;
using System.Globalization;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Quantities;

namespace RadicalSites;

/// <summary>Reads a user's measured ratios for a calibration.</summary>
/// <remarks>
/// CSV with the columns smiles (or substrate), reagent, temperature (80C or 353K; or celsius), product (SMILES) or site
/// (1-based, as the list of sites numbers it), and percent or area; optional are experiment (or id), solvent, sigma (in the
/// unit of percent or area) and note. Rows of the same experiment, substrate, reagent, temperature and solvent belong
/// together. One row with a percentage alone is completed by the rest. Files with the columns of the shipped distributions
/// are read as such. Stateless and safe for use by many threads.
/// </remarks>
public static class CalibrationData
{
    private static readonly string[] Columns =
    [
        "experiment", "id", "smiles", "substrate", "temperature", "celsius", "solvent", "product", "site", "percent", "area",
        "sigma", "note", "kind", "split", "source", "locator", "confidence",
    ];

    /// <summary>Reads measured ratios.</summary>
    /// <param name="name">Name for messages.</param>
    /// <param name="text">The text.</param>
    /// <returns>One distribution for each experiment, in order of appearance; may be empty.</returns>
    /// <exception cref="TableFormatException">A column is missing or unknown, or a value cannot be read; with its line.</exception>
    public static IReadOnlyList<MeasuredDistribution> Read(string name, string text)
    {
        ArgumentNullException.ThrowIfNull(name);
        ArgumentNullException.ThrowIfNull(text);
        CsvTable table = CsvTable.Read(name, text, ["reagent"], Columns);
        if (table.Columns.Contains("split"))
        {
            return LiteratureDistributions.Read(name, text);
        }

        NeedOne(table, "smiles", "substrate");
        NeedOne(table, "temperature", "celsius");
        NeedOne(table, "percent", "area");

        var experiments = new List<List<CsvRow>>();
        var places = new Dictionary<string, int>(StringComparer.Ordinal);
        foreach (CsvRow row in table.Rows)
        {
            string key = string.Join('\u001f', Experiment(row), Substrate(row), row.Required("reagent"),
                row.Text("temperature"), row.Text("celsius"), row.Text("solvent"));
            if (!places.TryGetValue(key, out int place))
            {
                places[key] = place = experiments.Count;
                experiments.Add([]);
            }

            experiments[place].Add(row);
        }

        return [.. experiments.Select((rows, index) => Join(rows, index + 1))];
    }

    private static MeasuredDistribution Join(List<CsvRow> rows, int number)
    {
        CsvRow first = rows[0];
        bool byArea = first.Text("percent").Length == 0;
        string unit = byArea ? "area" : "percent";
        foreach (CsvRow row in rows)
        {
            if (row.Text(unit).Length == 0)
            {
                throw row.Error(unit, "percentages and areas are mixed in one experiment.");
            }
        }

        double whole = byArea ? rows.Sum(static row => row.Number("area", 0, 1e15)) : 100;
        double scale = whole > 0 ? 100 / whole : 0;
        var products = rows.ConvertAll(row => Product(row, unit, scale));
        if (!byArea && products.Count == 1 && products[0].Percent is > 0 and < 100)
        {
            products.Add(new MeasuredProduct("*", 100 - products[0].Percent) { SigmaPercent = products[0].SigmaPercent });
        }

        string solvent = first.Text("solvent");
        string experiment = Experiment(first);
        return new MeasuredDistribution
        {
            Id = experiment.Length > 0 ? experiment : number.ToString(CultureInfo.InvariantCulture),
            Substrate = Substrate(first),
            Reagent = first.Required("reagent"),
            Celsius = Celsius(first),
            Solvent = solvent.Length == 0 ? null : solvent,
            Products = products,
            IsMeasured = true,
            IsForFitting = true,
            Source = "user",
            Locator = string.Create(CultureInfo.InvariantCulture, $"{first.Table}, line {first.Line}"),
            Confidence = "medium",
            Note = first.Text("note"),
        };
    }

    private static void NeedOne(CsvTable table, string column, string other)
    {
        if (!table.Columns.Contains(column) && !table.Columns.Contains(other))
        {
            throw new TableFormatException(table.Name, 1, column, $"a column {column} or {other} is needed.");
        }
    }

    private static string Experiment(CsvRow row) => row.Text("experiment") is { Length: > 0 } text ? text : row.Text("id");

    private static string Substrate(CsvRow row) =>
        row.Text("smiles") is { Length: > 0 } text ? text
        : row.Text("substrate") is { Length: > 0 } other ? other
        : throw row.Error("smiles", "the field is empty.");

    private static double Celsius(CsvRow row)
    {
        string text = row.Text("temperature") is { Length: > 0 } given ? given : row.Text("celsius");
        return Temperature.TryParse(text, out Temperature temperature)
            ? temperature.Celsius
            : throw row.Error(
                row.Text("temperature").Length > 0 ? "temperature" : "celsius",
                $"'{text}' is no temperature above absolute zero; write 80C or 353K.");
    }

    private static MeasuredProduct Product(CsvRow row, string unit, double scale)
    {
        string product = row.Text("product");
        string site = row.Text("site");
        if ((product.Length == 0) == (site.Length == 0))
        {
            throw row.Error("product", "either a product or a site has to be named.");
        }

        return new MeasuredProduct(product, scale * row.Number(unit, 0, 1e15))
        {
            Site = site.Length == 0 ? null : row.Integer("site", 1, 100000),
            SigmaPercent = row.Text("sigma").Length == 0 ? null : scale * row.Number("sigma", 0, 1e15),
        };
    }
}
