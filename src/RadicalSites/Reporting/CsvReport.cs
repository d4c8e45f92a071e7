using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Products;
using RadicalSites.Sites;

namespace RadicalSites.Reporting;

/// <summary>Writes reports as CSV (RFC 4180) in long form: one row for each site or product.</summary>
/// <remarks>
/// The decimal sign is a point, lists are joined by semicolons, numbers read back to the same value. Stateless and safe
/// for use by many threads.
/// </remarks>
public static class CsvReport
{
    /// <summary>Column row of site tables.</summary>
    public const string SiteHeader =
        "record,name,canonical_smiles,status,reagent,temperature_kelvin,site,carbons,hydrogen_count,degree,conjugation,alpha,ring_size,bridgehead,topicity,bde_kilojoules_per_mole,bde_sigma,bde_basis,bde_entries,abstraction_kilojoules_per_mole,transfer_kilojoules_per_mole,relative_rate_per_hydrogen,share,share_low,share_high,products";

    /// <summary>Column row of isomer tables.</summary>
    public const string IsomerHeader = "record,name,product,smiles,degeneracy,halogen_carbons";

    /// <summary>Writes one row for each site; a record without sites or with an error still has one row.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="report">The report.</param>
    public static void Write(TextWriter writer, RecordSource source, SiteReport report)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(report);
        Rows(writer, source, report.CanonicalSmiles, "", "", report.Sites, report.Analysis);
    }

    /// <summary>Writes one row for each site of a prediction.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction.</param>
    public static void Write(TextWriter writer, RecordSource source, Prediction prediction)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        Rows(
            writer, source, prediction.CanonicalSmiles, prediction.Conditions.Reagent.Id,
            Number(prediction.Conditions.Temperature.Kelvin), prediction.Sites, prediction.Analysis);
    }

    /// <summary>Writes the row of a record that could not be read.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="code">Code of the problem, which stands in the column status.</param>
    public static void WriteError(TextWriter writer, RecordSource source, string code)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        WriteRow(writer, [Number(source.Number), source.Name ?? "", "", code, .. Enumerable.Repeat("", 22)]);
    }

    /// <summary>Writes one isomer.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="isomer">The isomer.</param>
    public static void Write(TextWriter writer, RecordSource source, IsomerProduct isomer)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(isomer);
        WriteRow(writer,
        [
            Number(source.Number), source.Name ?? "", Number(isomer.Number), isomer.CanonicalSmiles,
            isomer.Degeneracy.ToString(CultureInfo.InvariantCulture), Join(isomer.HalogenCarbons.Select(static c => Number(c))),
        ]);
    }

    private static void Rows(
        TextWriter writer, RecordSource source, string smiles, string reagent, string kelvin,
        IReadOnlyList<SitePrediction> sites, SiteAnalysis analysis)
    {
        if (sites.Count == 0)
        {
            WriteRow(writer, [Number(source.Number), source.Name ?? "", smiles, "ok", reagent, kelvin, .. Enumerable.Repeat("", 20)]);
        }

        foreach (SitePrediction entry in sites)
        {
            Site site = entry.Site;
            WriteRow(writer,
            [
                Number(source.Number), source.Name ?? "", smiles, "ok", reagent, kelvin, Number(site.Number),
                Join(site.Carbons.Select(carbon => Number(analysis.Molecule.InputIndexOf(carbon)))), Number(site.HydrogenCount),
                SiteWords.Of(site.Degree), Join(site.Conjugation.Select(static c => SiteWords.Of(c.Kind))),
                Join(site.AlphaGroups.Select(static g => SiteWords.Of(g.Kind))), site.RingSize is { } size ? Number(size) : "",
                site.IsBridgehead ? "true" : "false", site.Topicity.ToString().ToLowerInvariant(),
                Number(entry.Bde.KilojoulesPerMole), Number(entry.Bde.SigmaKilojoulesPerMole), SiteWords.Of(entry.Bde.Basis),
                Join(entry.Bde.Evidence.Select(static e => e.Entry)),
                Number(entry.Selectivity?.Steps.AbstractionKilojoulesPerMole),
                Number(entry.Selectivity?.Steps.TransferKilojoulesPerMole), Number(entry.Selectivity?.RelativeRatePerHydrogen),
                Number(entry.Selectivity?.Share), Number(entry.Selectivity?.ShareLow), Number(entry.Selectivity?.ShareHigh),
                Join(entry.Products.Select(static p => Number(p))),
            ]);
        }
    }

    private static string Number(double? value) => value?.ToString("R", CultureInfo.InvariantCulture) ?? "";

    private static string Join(IEnumerable<string> parts) => string.Join(';', parts);

    private static void WriteRow(TextWriter writer, IEnumerable<string> fields)
    {
        bool first = true;
        foreach (string field in fields)
        {
            if (!first)
            {
                writer.Write(',');
            }

            first = false;
            if (field.AsSpan().IndexOfAny(",\"\n\r") >= 0)
            {
                writer.Write('"');
                writer.Write(field.Replace("\"", "\"\"", StringComparison.Ordinal));
                writer.Write('"');
            }
            else
            {
                writer.Write(field);
            }
        }

        writer.Write('\n');
    }
}
