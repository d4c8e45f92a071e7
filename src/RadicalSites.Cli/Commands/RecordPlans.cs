using System;
using System.IO;
using System.Text.Json;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Molecules;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>Plans of the commands that write JSON and text only.</summary>
internal static class RecordPlans
{
    internal static OutputPlan Of(
        PipelineOptions options, Action<Utf8JsonWriter, RecordSource, Molecule> json,
        Action<TextWriter, RecordSource, Molecule> text) => options.Format == OutputFormat.Table
        ? new OutputPlan("", () => new TextRecordWriter(options.IsSingle, (writer, source, molecule) =>
        {
            text(writer, source, molecule);
            return true;
        }))
        : new OutputPlan("", () => new JsonRecordWriter(options.IsIndented, (writer, source, molecule) =>
        {
            json(writer, source, molecule);
            return true;
        }));
}
