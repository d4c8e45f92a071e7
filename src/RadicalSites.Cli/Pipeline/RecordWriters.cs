using System;
using System.IO;
using System.Text.Json;
using RadicalSites.Cli.Output;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Pipeline;

/// <summary>Writes a record as one JSON object.</summary>
/// <param name="indented">Whether a person reads it.</param>
/// <param name="write">Writes the object; says whether it is complete.</param>
internal sealed class JsonRecordWriter(bool indented, Func<Utf8JsonWriter, RecordSource, Molecule, bool> write)
    : RecordWriter
{
    private Utf8JsonWriter? json;

    internal override void Write(RecordSource source, Molecule molecule, PooledBuffer output)
    {
        Utf8JsonWriter writer = On(output);
        ReachedLimit |= !write(writer, source, molecule);
        End(writer, output);
    }

    internal override void WriteProblem(RecordSource source, FormatProblem problem, PooledBuffer output)
    {
        Utf8JsonWriter writer = On(output);
        JsonReport.WriteError(writer, source, problem);
        End(writer, output);
    }

    protected override void Dispose(bool disposing)
    {
        json?.Dispose();
        base.Dispose(disposing);
    }

    private Utf8JsonWriter On(PooledBuffer output)
    {
        if (json is null)
        {
            json = new Utf8JsonWriter(output, JsonReport.WriterOptions(indented));
        }
        else
        {
            json.Reset(output);
        }

        return json;
    }

    private static void End(Utf8JsonWriter writer, PooledBuffer output)
    {
        writer.Flush();
        output.Append((byte)'\n');
    }
}

/// <summary>Writes a record as rows of a table.</summary>
internal sealed class CsvRecordWriter(CsvShape shape, Func<PooledBuffer, RecordSource, Molecule, bool> write)
    : RecordWriter
{
    internal override void Write(RecordSource source, Molecule molecule, PooledBuffer output) =>
        ReachedLimit |= !write(output, source, molecule);

    internal override void WriteProblem(RecordSource source, FormatProblem problem, PooledBuffer output) =>
        CsvReport.WriteError(output, source, problem, shape);
}

/// <summary>Writes a record as text for people, with a blank line between records.</summary>
internal sealed class TextRecordWriter(bool isSingle, Func<TextWriter, RecordSource, Molecule, bool> write)
    : RecordWriter
{
    private readonly StringWriter text = new(System.Globalization.CultureInfo.InvariantCulture) { NewLine = "\n" };

    internal override void Write(RecordSource source, Molecule molecule, PooledBuffer output)
    {
        text.GetStringBuilder().Clear();
        ReachedLimit |= !write(text, source, molecule);
        Separate(source, output);
        foreach (ReadOnlyMemory<char> chunk in text.GetStringBuilder().GetChunks())
        {
            output.Append(chunk.Span);
        }
    }

    internal override void WriteProblem(RecordSource source, FormatProblem problem, PooledBuffer output)
    {
        // A person who typed one molecule reads the message on standard error.
        if (!isSingle)
        {
            Separate(source, output);
            output.Append($"record {source.Number}{(source.Name is null ? "" : " " + source.Name)}: not read: {problem.Code}: {problem.Message}\n");
        }
    }

    protected override void Dispose(bool disposing)
    {
        text.Dispose();
        base.Dispose(disposing);
    }

    private static void Separate(RecordSource source, PooledBuffer output)
    {
        if (source.Number > 1)
        {
            output.Append((byte)'\n');
        }
    }
}

/// <summary>Writes lines of SMILES; a record that could not be read has none.</summary>
internal sealed class LineRecordWriter(Func<PooledBuffer, RecordSource, Molecule, bool> write) : RecordWriter
{
    internal override void Write(RecordSource source, Molecule molecule, PooledBuffer output) =>
        ReachedLimit |= !write(output, source, molecule);

    internal override void WriteProblem(RecordSource source, FormatProblem problem, PooledBuffer output)
    {
    }
}
