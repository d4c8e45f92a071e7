using System;
using System.Collections.Generic;
using System.Globalization;
using System.Text.Json;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Selectivity;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Reporting;

/// <summary>Writes reports and predictions as records of the schema <c>radicalsites/1</c>.</summary>
/// <remarks>
/// Numbers are written so that reading them back gives the same value. Atom indices are those of the input, hydrogens
/// written as atoms counted. Stateless and safe for use by many threads.
/// </remarks>
public static partial class JsonReport
{
    /// <summary>Name of the schema.</summary>
    public const string Schema = "radicalsites/1";

    /// <summary>Writes the sites of a molecule without any reaction.</summary>
    /// <param name="writer">Where to write; one object is written.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="report">The report.</param>
    public static void Write(Utf8JsonWriter writer, RecordSource source, SiteReport report)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(report);
        Begin(writer, source, "ok");
        writer.WriteString("canonicalSmiles", report.CanonicalSmiles);
        writer.WriteString("dataVersion", report.DataVersion);
        WriteSites(writer, report.Molecule, report.Sites);
        WriteDiagnostics(writer, report.Molecule, report.Diagnostics);
        writer.WriteEndObject();
    }

    /// <summary>Writes a prediction.</summary>
    /// <param name="writer">Where to write; one object is written.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="prediction">The prediction.</param>
    public static void Write(Utf8JsonWriter writer, RecordSource source, Prediction prediction)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(prediction);
        Begin(writer, source, "ok");
        writer.WriteString("canonicalSmiles", prediction.CanonicalSmiles);
        writer.WriteString("dataVersion", prediction.DataVersion);
        WriteConditions(writer, prediction.Conditions);
        WriteSites(writer, prediction.Molecule, prediction.Sites);
        WriteProducts(writer, prediction.Products);
        WriteDiagnostics(writer, prediction.Molecule, prediction.Diagnostics);
        writer.WriteEndObject();
    }

    /// <summary>Writes a record that could not be read.</summary>
    /// <param name="writer">Where to write; one object is written.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="problem">What is wrong.</param>
    public static void WriteError(Utf8JsonWriter writer, RecordSource source, FormatProblem problem)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(problem);
        Begin(writer, source, "error");
        writer.WriteStartObject("error");
        writer.WriteString("code", problem.Code);
        writer.WriteString("message", problem.Message);
        if (problem.Line > 0)
        {
            writer.WriteNumber("line", problem.Line);
        }
        else if (problem.Position >= 0)
        {
            writer.WriteNumber("position", problem.Position);
        }

        writer.WriteEndObject();
        writer.WriteEndObject();
    }

    /// <summary>Writes the fields that every record starts with; the caller ends the object.</summary>
    internal static void Begin(Utf8JsonWriter writer, RecordSource source, string status)
    {
        writer.WriteStartObject();
        writer.WriteString("schema", Schema);
        writer.WriteNumber("record", source.Number);
        writer.WriteString("status", status);
        writer.WriteString("input", source.Text);
        writer.WriteString("name", source.Name);
    }

    internal static void WriteConditions(Utf8JsonWriter writer, ReactionConditions conditions)
    {
        writer.WriteStartObject("conditions");
        writer.WriteString("reagent", conditions.Reagent.Id);
        writer.WriteString("carrier", conditions.Reagent.Carrier.Name);
        writer.WriteString("halogen", Elements.SymbolOf(conditions.Reagent.Halogen));
        writer.WriteNumber("temperatureKelvin", conditions.Temperature.Kelvin);
        writer.WriteString("solvent", conditions.Solvent);
        writer.WriteEndObject();
    }

    internal static void WriteDiagnostics(Utf8JsonWriter writer, Molecule molecule, IReadOnlyList<Diagnostic> diagnostics)
    {
        writer.WriteStartArray("diagnostics");
        foreach (Diagnostic diagnostic in diagnostics)
        {
            writer.WriteStartObject();
            writer.WriteString("code", diagnostic.Code);
            writer.WriteString("severity", NameOf(diagnostic.Severity));
            writer.WriteString("message", diagnostic.Message);
            WriteAtoms(writer, "atoms", molecule, diagnostic.Atoms);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static string NameOf(Severity severity) => severity switch
    {
        Severity.Info => "info",
        Severity.Caution => "caution",
        Severity.Danger => "danger",
        _ => "error",
    };

    private static void WriteAtoms(Utf8JsonWriter writer, string name, Molecule molecule, IReadOnlyList<int> atoms)
    {
        writer.WriteStartArray(name);
        foreach (int atom in atoms)
        {
            writer.WriteNumberValue(molecule.InputIndexOf(atom));
        }

        writer.WriteEndArray();
    }

    private static void WriteProducts(Utf8JsonWriter writer, IReadOnlyList<HalogenationProduct> products)
    {
        writer.WriteStartArray("products");
        foreach (HalogenationProduct product in products)
        {
            writer.WriteStartObject();
            writer.WriteNumber("product", product.Number);
            writer.WriteString("smiles", product.CanonicalSmiles);
            WriteNumber(writer, "share", product.Share);
            WriteNumber(writer, "shareLow", product.ShareLow);
            WriteNumber(writer, "shareHigh", product.ShareHigh);
            writer.WriteNumber("degeneracy", product.Degeneracy);
            writer.WriteStartArray("sites");
            foreach (int site in product.Sites)
            {
                writer.WriteNumberValue(site);
            }

            writer.WriteEndArray();
            writer.WriteString("route", product.Route == ProductRoute.Direct ? "direct" : "transposed");
            writer.WriteString("stereo", product.Stereo switch
            {
                StereoOutcome.None => "none",
                StereoOutcome.Racemic => "racemic",
                StereoOutcome.Diastereomers => "diastereomers",
                StereoOutcome.Retained => "retained",
                StereoOutcome.Epimerised => "epimerised",
                _ => "lost",
            });
            if (product.Stereoisomers is null)
            {
                writer.WriteNull("stereoisomers");
            }
            else
            {
                writer.WriteStartArray("stereoisomers");
                foreach (string isomer in product.Stereoisomers)
                {
                    writer.WriteStringValue(isomer);
                }

                writer.WriteEndArray();
            }

            writer.WriteEndObject();
        }

        writer.WriteEndArray();
    }

    private static void WriteNumber(Utf8JsonWriter writer, string name, double? value)
    {
        if (value is { } number && double.IsFinite(number))
        {
            writer.WriteNumber(name, number);
        }
        else
        {
            writer.WriteNull(name);
        }
    }
}
