using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Symmetry;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

/// <summary>Writes reports as plain text for people: job line, tables, remarks.</summary>
/// <remarks>Values are rounded for reading; the machine formats keep all digits. Stateless and safe for use by many threads.</remarks>
public static partial class TextReport
{
    /// <summary>Writes the sites of a molecule.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="report">The report.</param>
    public static void Write(TextWriter writer, RecordSource source, SiteReport report)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(report);
        Head(writer, source, report.CanonicalSmiles, report.Molecule);
        writer.Write($"C-H sites, bond dissociation enthalpies at 298 K (data {report.DataVersion})\n\n");
        var table = new TextTable("site", ">H", "class", "hydrogens", ">C-H kJ/mol", "basis", "rows");
        foreach (SitePrediction entry in report.Sites)
        {
            table.Add(
                Label(report.Molecule, entry.Site), Count(entry.Site.HydrogenCount), SiteWords.Describe(entry.Site),
                entry.Site.Topicity.ToString().ToLowerInvariant(),
                Bde(entry.Bde), SiteWords.Of(entry.Bde.Basis), Rows(entry.Bde));
        }

        table.Write(writer);
        Remarks(writer, [.. source.Remarks, .. report.Diagnostics]);
    }

    /// <summary>Writes a prediction.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction.</param>
    public static void Write(TextWriter writer, RecordSource source, Prediction prediction)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        ReactionConditions conditions = prediction.Conditions;
        Head(writer, source, prediction.CanonicalSmiles, prediction.Molecule);
        Job(writer, conditions, prediction.DataVersion);
        var table = new TextTable("site", ">H", "class", ">C-H kJ/mol", ">step 1", ">step 2", ">rate/H", ">share", ">90 %");
        foreach (SitePrediction entry in prediction.Sites)
        {
            SiteSelectivity selectivity = entry.Selectivity!;
            table.Add(
                Label(prediction.Molecule, entry.Site), Count(entry.Site.HydrogenCount), SiteWords.Describe(entry.Site),
                Bde(entry.Bde), Whole(selectivity.Steps.AbstractionKilojoulesPerMole),
                Whole(selectivity.Steps.TransferKilojoulesPerMole), Rate(selectivity.RelativeRatePerHydrogen),
                Percent(selectivity.Share), Interval(selectivity.ShareLow, selectivity.ShareHigh));
        }

        table.Write(writer);
        if (prediction.Products.Count > 0)
        {
            writer.Write('\n');
            var products = new TextTable(">no.", "product", ">share", ">90 %", ">from H", "sites", "route", "stereo");
            foreach (HalogenationProduct product in prediction.Products)
            {
                products.Add(
                    Count(product.Number), product.CanonicalSmiles, Percent(product.Share),
                    Interval(product.ShareLow, product.ShareHigh), Count(product.Degeneracy),
                    string.Join(", ", product.Sites.Select(Count)), product.Route.ToString().ToLowerInvariant(),
                    product.Stereo.ToString().ToLowerInvariant());
            }

            products.Write(writer);
        }

        Remarks(writer, [.. source.Remarks, .. prediction.Diagnostics]);
    }

    /// <summary>Writes remarks with severity and code.</summary>
    /// <param name="writer">Where to write.</param>
    /// <param name="diagnostics">The remarks; nothing is written when there are none.</param>
    public static void Remarks(TextWriter writer, IReadOnlyList<Diagnostic> diagnostics)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(diagnostics);
        if (diagnostics.Count == 0)
        {
            return;
        }

        writer.Write('\n');
        foreach (Diagnostic diagnostic in diagnostics)
        {
            string mark = diagnostic.Severity switch
            {
                Severity.Info => "note",
                Severity.Caution => "CAUTION",
                Severity.Danger => "DANGER",
                _ => "ERROR",
            };
            writer.Write($"{mark}: {diagnostic.Message} [{diagnostic.Code}]\n");
        }
    }

    /// <summary>A share in percent for reading: one decimal, two below 1 %, never a false 0 or 100.</summary>
    /// <param name="share">A share, 0 to 1.</param>
    /// <returns>For example <c>64.7 %</c>, <c>&lt; 0.01 %</c>, or <c>-</c> without a value.</returns>
    public static string Percent(double? share) => share is not { } value
        ? "-"
        : value switch
        {
            > 0 and < 0.0001 => "< 0.01 %",
            > 0.9999 and < 1 => "> 99.99 %",
            < 0.01 or > 0.995 and < 1 => string.Create(CultureInfo.InvariantCulture, $"{100 * value:F2} %"),
            _ => string.Create(CultureInfo.InvariantCulture, $"{100 * value:F1} %"),
        };

    private static void Head(TextWriter writer, RecordSource source, string canonical, Molecule molecule)
    {
        string name = source.Name is { Length: > 0 } given ? given + "  " : "";
        writer.Write($"{name}{canonical}  {MolecularFormula.Of(molecule)}\n");
    }

    // Site number with the input indices of its carbons, shortened when there are many.
    private static string Label(Molecule molecule, Site site)
    {
        string[] carbons = [.. site.Carbons.Take(4).Select(carbon => "C" + Count(molecule.InputIndexOf(carbon)))];
        return Count(site.Number) + " (" + string.Join(' ', carbons) + (site.Carbons.Count > 4 ? " ..." : "") + ")";
    }

    private static string Count(int value) => value.ToString(CultureInfo.InvariantCulture);

    private static string Bde(BdeAssignment bde) => bde.KilojoulesPerMole is { } value
        ? string.Create(CultureInfo.InvariantCulture, $"{value:F1} +- {bde.SigmaKilojoulesPerMole:F1}")
        : "none";

    private static string Rows(BdeAssignment bde) => string.Join(' ', bde.Evidence.Select(static evidence => evidence.Entry));

    private static string Whole(double? value) => value is { } number
        ? string.Create(CultureInfo.InvariantCulture, $"{number:+0;-0;0}")
        : "-";

    private static string Rate(double? value) => value is not { } number
        ? "-"
        : number is >= 0.1 and < 10000
            ? string.Create(CultureInfo.InvariantCulture, $"{number:G3}")
            : string.Create(CultureInfo.InvariantCulture, $"{number:0.0E+0}");

    private static string Interval(double? low, double? high) => low is null || high is null
        ? "-"
        : Percent(low).Replace(" %", "", StringComparison.Ordinal) + " to " + Percent(high).Replace(" %", "", StringComparison.Ordinal);
}
