using System;
using System.Buffers;
using System.Collections.Generic;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

/// <summary>Writes results as CSV in long form: one row for each site, or for each product.</summary>
/// <remarks>
/// RFC 4180 with line feeds, UTF-8 without byte order mark, decimal points, numbers that read back to the same value.
/// Lists stand in one field with semicolons between their members. A record without any site or product, and a failed
/// record, has one row, so no record is lost. Stateless and safe for use by many threads.
/// </remarks>
public static class CsvReport
{
    private const string SiteColumns =
        "site,carbons,hydrogen_count,degree,conjugation,alpha,ring_size,bridgehead,topicity," +
        "bde_kilojoules_per_mole,bde_sigma,bde_basis,bde_entries,bde_sources";

    private const string RateColumns =
        "abstraction_kilojoules_per_mole,transfer_kilojoules_per_mole,verdict,relative_rate_per_hydrogen," +
        "share,share_low,share_high,products";

    private const string ConditionColumns = "reagent,temperature_kelvin,solvent";

    private const string ProductColumns =
        "product,product_smiles,share,share_low,share_high,degeneracy,sites,route,stereo,stereoisomers";

    private const string IsomerColumns = "product,product_smiles,degeneracy,halogen_carbons,stereoisomers";

    /// <summary>Column names of a shape, separated by commas, without line end.</summary>
    /// <param name="shape">The shape.</param>
    /// <returns>The header row.</returns>
    public static string Header(CsvShape shape) =>
        "record,name,input,status,canonical_smiles," + Columns(shape) + ",diagnostics,error_code,error_message";

    /// <summary>Writes the rows of a report of sites.</summary>
    /// <param name="output">Buffer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="report">The report.</param>
    public static void Write(IBufferWriter<byte> output, RecordSource source, SiteReport report)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(report);
        var row = new CsvFields(output);
        foreach (SitePrediction site in report.Sites)
        {
            Begin(ref row, source, report.CanonicalSmiles);
            Site(ref row, report.Molecule, site);
            End(ref row, source, report.Diagnostics);
        }

        Empty(ref row, source, report.CanonicalSmiles, report.Sites.Count, CsvShape.Sites, report.Diagnostics);
    }

    /// <summary>Writes the rows of a prediction, one for each site or one for each product.</summary>
    /// <param name="output">Buffer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction.</param>
    /// <param name="shape"><see cref="CsvShape.PredictedSites"/> or <see cref="CsvShape.Products"/>.</param>
    public static void Write(
        IBufferWriter<byte> output, RecordSource source, Prediction prediction, CsvShape shape)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        var row = new CsvFields(output);
        if (shape == CsvShape.Products)
        {
            foreach (HalogenationProduct product in prediction.Products)
            {
                Begin(ref row, source, prediction.CanonicalSmiles);
                Conditions(ref row, prediction);
                Product(ref row, product);
                End(ref row, source, prediction.Diagnostics);
            }

            Empty(ref row, source, prediction.CanonicalSmiles, prediction.Products.Count, shape, prediction.Diagnostics);
            return;
        }

        foreach (SitePrediction site in prediction.Sites)
        {
            Begin(ref row, source, prediction.CanonicalSmiles);
            Conditions(ref row, prediction);
            Site(ref row, prediction.Molecule, site);
            Rate(ref row, site);
            End(ref row, source, prediction.Diagnostics);
        }

        Empty(ref row, source, prediction.CanonicalSmiles, prediction.Sites.Count, shape, prediction.Diagnostics);
    }

    /// <summary>Writes the rows of an enumeration of isomers.</summary>
    /// <param name="output">Buffer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="canonicalSmiles">Canonical SMILES of the substrate.</param>
    /// <param name="enumeration">The enumeration; its products are listed lazily while they are written.</param>
    /// <param name="limit">Most products to list, 0 or more.</param>
    /// <returns>Whether all products were listed.</returns>
    public static bool Write(
        IBufferWriter<byte> output, RecordSource source, string canonicalSmiles, IsomerEnumeration enumeration,
        long limit)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(enumeration);
        var row = new CsvFields(output);
        int count = 0;
        bool complete = true;
        foreach (IsomerProduct product in enumeration.Enumerate())
        {
            if (product.Number > limit)
            {
                complete = false;
                break;
            }

            count++;
            Begin(ref row, source, canonicalSmiles);
            row.Number(product.Number);
            row.Text(product.CanonicalSmiles);
            row.Text(product.Degeneracy.ToString(System.Globalization.CultureInfo.InvariantCulture));
            row.Atoms(enumeration.Molecule, product.HalogenCarbons);
            row.List(product.Stereoisomers ?? [], static text => text);
            End(ref row, source, enumeration.Diagnostics);
        }

        IReadOnlyList<Diagnostic> remarks =
            complete ? enumeration.Diagnostics : [.. enumeration.Diagnostics, JsonReport.ProductLimit(limit)];
        Empty(ref row, source, canonicalSmiles, complete ? count : 0, CsvShape.Isomers, remarks);
        return complete;
    }

    /// <summary>Writes the row of an input that could not be read.</summary>
    /// <param name="output">Buffer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="problem">What is wrong with it.</param>
    /// <param name="shape">The shape of the other rows.</param>
    public static void WriteError(
        IBufferWriter<byte> output, RecordSource source, FormatProblem problem, CsvShape shape)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(problem);
        var row = new CsvFields(output);
        row.Number(source.Number);
        row.Text(source.Name);
        row.Text(source.Text);
        row.Text("error");
        row.Skip(Count(Columns(shape)) + 2);
        row.Text(problem.Code);
        row.Text(problem.Message);
        row.EndRow();
    }

    private static string Columns(CsvShape shape) => shape switch
    {
        CsvShape.Sites => SiteColumns,
        CsvShape.PredictedSites => ConditionColumns + "," + SiteColumns + "," + RateColumns,
        CsvShape.Products => ConditionColumns + "," + ProductColumns,
        _ => IsomerColumns,
    };

    private static int Count(string columns) => columns.AsSpan().Count(',') + 1;

    private static void Begin(ref CsvFields row, RecordSource source, string canonicalSmiles)
    {
        row.Number(source.Number);
        row.Text(source.Name);
        row.Text(source.Text);
        row.Text("ok");
        row.Text(canonicalSmiles);
    }

    private static void End(ref CsvFields row, RecordSource source, IReadOnlyList<Diagnostic> diagnostics)
    {
        row.List(source.Remarks.Count == 0 ? diagnostics : [.. source.Remarks, .. diagnostics], static diagnostic => diagnostic.Code);
        row.Skip(2);
        row.EndRow();
    }

    private static void Empty(
        ref CsvFields row, RecordSource source, string canonicalSmiles, int rows, CsvShape shape,
        IReadOnlyList<Diagnostic> diagnostics)
    {
        if (rows == 0)
        {
            Begin(ref row, source, canonicalSmiles);
            row.Skip(Count(Columns(shape)));
            End(ref row, source, diagnostics);
        }
    }

    private static void Conditions(ref CsvFields row, Prediction prediction)
    {
        row.Text(prediction.Conditions.Reagent.Id);
        row.Number(prediction.Conditions.Temperature.Kelvin);
        row.Text(prediction.Conditions.Solvent);
    }

    private static void Site(ref CsvFields row, Molecule molecule, SitePrediction prediction)
    {
        Site site = prediction.Site;
        row.Number(site.Number);
        row.Atoms(molecule, site.Carbons);
        row.Number(site.HydrogenCount);
        row.Text(SiteWords.Of(site.Degree));
        row.List(site.Conjugation, static neighbor => SiteWords.Of(neighbor.Kind));
        row.List(site.AlphaGroups, static group => SiteWords.Of(group.Kind));
        row.Number((long?)site.RingSize);
        row.Flag(site.IsBridgehead);
        row.Text(SiteWords.Of(site.Topicity));
        BdeAssignment bde = prediction.Bde;
        row.Number(bde.KilojoulesPerMole);
        row.Number(bde.SigmaKilojoulesPerMole);
        row.Text(SiteWords.Of(bde.Basis));
        row.List(bde.Evidence, static evidence => evidence.Entry);
        row.List(bde.Evidence, static evidence => evidence.Source);
    }

    private static void Rate(ref CsvFields row, SitePrediction prediction)
    {
        Selectivity.SiteSelectivity? rate = prediction.Selectivity;
        row.Number(rate?.Steps.AbstractionKilojoulesPerMole);
        row.Number(rate?.Steps.TransferKilojoulesPerMole);
        row.Text(rate is null ? "" : SiteWords.Of(rate.Steps.Verdict));
        row.Number(rate?.RelativeRatePerHydrogen);
        row.Number(rate?.Share);
        row.Number(rate?.ShareLow);
        row.Number(rate?.ShareHigh);
        row.List(prediction.Products);
    }

    private static void Product(ref CsvFields row, HalogenationProduct product)
    {
        row.Number((long)product.Number);
        row.Text(product.CanonicalSmiles);
        row.Number(product.Share);
        row.Number(product.ShareLow);
        row.Number(product.ShareHigh);
        row.Number((long)product.Degeneracy);
        row.List(product.Sites);
        row.Text(SiteWords.Of(product.Route));
        row.Text(SiteWords.Of(product.Stereo));
        row.List(product.Stereoisomers ?? [], static text => text);
    }
}
