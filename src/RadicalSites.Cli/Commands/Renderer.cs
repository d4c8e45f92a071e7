using System;
using System.Buffers;
using System.IO;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>Renders records to bytes in one of the output formats.</summary>
internal static class Renderer
{
    /// <summary>Renders JSON: indented when a person asked for a single molecule, one line otherwise.</summary>
    internal static byte[] Json(bool indented, Action<Utf8JsonWriter> write)
    {
        var buffer = new ArrayBufferWriter<byte>(2048);
        using (var writer = new Utf8JsonWriter(buffer, new JsonWriterOptions
        {
            Indented = indented,
            NewLine = "\n",
            Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
        }))
        {
            write(writer);
        }

        buffer.GetSpan(1)[0] = (byte)'\n';
        buffer.Advance(1);
        return buffer.WrittenSpan.ToArray();
    }

    /// <summary>Renders text.</summary>
    internal static byte[] Text(Action<TextWriter> write)
    {
        using var writer = new StringWriter(System.Globalization.CultureInfo.InvariantCulture) { NewLine = "\n" };
        write(writer);
        return Encoding.UTF8.GetBytes(writer.ToString());
    }

    /// <summary>Renders a record that could not be read.</summary>
    internal static Rendered Failure(InputRecord record, PipelineOptions options) => new(
        options.Format switch
        {
            OutputFormat.Json or OutputFormat.Ndjson => Json(
                Indented(options), writer => JsonReport.WriteError(writer, record.Source, record.Problem!)),
            OutputFormat.Csv => Text(writer => CsvReport.WriteError(writer, record.Source, record.Problem!.Code)),
            _ => [],
        },
        record, record.Problem);

    internal static bool Indented(PipelineOptions options) =>
        options.Format == OutputFormat.Json && RecordInput.IsSingleArgument(options.Inputs);

    /// <summary>A blank line between the tables of several records.</summary>
    internal static void Separate(TextWriter writer, InputRecord record)
    {
        if (record.Source.Number > 1)
        {
            writer.Write('\n');
        }
    }
}
