using System;
using System.Buffers;
using System.Collections.Generic;
using System.Text.Encodings.Web;
using System.Text.Json;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Reporting;

/// <summary>Writes results as JSON records of the schema <c>radicalsites/1</c>; see <see cref="ReportSchema"/>.</summary>
/// <remarks>
/// Every method writes one complete object. Atom indices are those of the input, hydrogens written as atoms counted.
/// Numbers are written so that reading them back gives the same value; what is not known is null, never NaN. The caller
/// owns the writer, so one writer and one buffer serve any number of records. Stateless and safe for use by many threads.
/// </remarks>
public static partial class JsonReport
{
    /// <summary>Name of the schema.</summary>
    public const string Schema = ReportSchema.Id;

    /// <summary>Writer options for the records: compact, with plain text as far as JSON allows.</summary>
    /// <param name="indented">Whether to write for people, with line feeds and two spaces.</param>
    /// <returns>The options.</returns>
    public static JsonWriterOptions WriterOptions(bool indented = false) => new()
    {
        // The default encoder escapes + and ' for web pages, which makes SMILES unreadable.
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        Indented = indented,
        NewLine = "\n",
        SkipValidation = !indented,
    };

    /// <summary>Writes the record of an input that could not be read.</summary>
    /// <param name="writer">Writer of the caller.</param>
    /// <param name="source">Record number, text and name of the input.</param>
    /// <param name="problem">What is wrong with it.</param>
    public static void WriteError(Utf8JsonWriter writer, RecordSource source, FormatProblem problem)
    {
        ArgumentNullException.ThrowIfNull(writer);
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(problem);
        Begin(writer, source, isOk: false);
        writer.WriteStartObject("error"u8);
        writer.WriteString("code"u8, problem.Code);
        writer.WriteString("message"u8, problem.Message);
        if (problem.Line > 0)
        {
            writer.WriteNumber("line"u8, problem.Line);
        }

        if (problem.Position >= 0)
        {
            writer.WriteNumber("position"u8, problem.Position);
        }

        if (problem.SecondPosition >= 0)
        {
            writer.WriteNumber("secondPosition"u8, problem.SecondPosition);
        }

        writer.WriteString("cause"u8, problem.Descriptor.Cause);
        writer.WriteString("remedy"u8, problem.Descriptor.Remedy);
        writer.WriteEndObject();
        writer.WriteEndObject();
    }

    private static void Begin(Utf8JsonWriter writer, RecordSource source, bool isOk)
    {
        writer.WriteStartObject();
        writer.WriteString("schema"u8, ReportSchema.IdUtf8);
        writer.WriteNumber("record"u8, source.Number);
        writer.WriteString("status"u8, isOk ? "ok"u8 : "error"u8);
        writer.WriteString("input"u8, source.Text);
        writer.WriteString("name"u8, source.Name);
    }

    private static void End(
        Utf8JsonWriter writer, RecordSource source, Molecule molecule, IReadOnlyList<Diagnostic> diagnostics)
    {
        writer.WriteStartArray("diagnostics"u8);
        Remarks(writer, molecule, source.Remarks);
        Remarks(writer, molecule, diagnostics);
        writer.WriteEndArray();
        writer.WriteEndObject();
    }

    private static void Remarks(Utf8JsonWriter writer, Molecule molecule, IReadOnlyList<Diagnostic> diagnostics)
    {
        for (int i = 0; i < diagnostics.Count; i++)
        {
            Diagnostic diagnostic = diagnostics[i];
            writer.WriteStartObject();
            writer.WriteString("code"u8, diagnostic.Code);
            writer.WriteString("severity"u8, SiteWords.Encoded(diagnostic.Severity));
            writer.WriteString("message"u8, diagnostic.Message);
            Atoms(writer, "atoms"u8, molecule, diagnostic.Atoms);
            writer.WriteEndObject();
        }
    }

    private static void Atoms(
        Utf8JsonWriter writer, ReadOnlySpan<byte> name, Molecule molecule, IReadOnlyList<int> atoms)
    {
        writer.WriteStartArray(name);
        for (int i = 0; i < atoms.Count; i++)
        {
            writer.WriteNumberValue(atoms[i] < 0 ? atoms[i] : molecule.InputIndexOf(atoms[i]));
        }

        writer.WriteEndArray();
    }

    private static void Numbers(Utf8JsonWriter writer, ReadOnlySpan<byte> name, IReadOnlyList<int> numbers)
    {
        writer.WriteStartArray(name);
        for (int i = 0; i < numbers.Count; i++)
        {
            writer.WriteNumberValue(numbers[i]);
        }

        writer.WriteEndArray();
    }

    private static void Strings(Utf8JsonWriter writer, ReadOnlySpan<byte> name, IReadOnlyList<string>? texts)
    {
        if (texts is null)
        {
            writer.WriteNull(name);
            return;
        }

        writer.WriteStartArray(name);
        for (int i = 0; i < texts.Count; i++)
        {
            writer.WriteStringValue(texts[i]);
        }

        writer.WriteEndArray();
    }

    // An overflown rate has no decimal form; null says that there is no number.
    private static void Number(Utf8JsonWriter writer, ReadOnlySpan<byte> name, double? value)
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
