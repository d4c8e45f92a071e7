using System.CommandLine;
using System.Globalization;
using RadicalSites.Canonical;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Formats.Smiles;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>convert</c>: reads any supported format and writes another.</summary>
internal static class ConvertCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("convert", "Reads structures and writes them in another form.");
        var records = new RecordOptions("smi");
        var order = new Option<string>("--order") { Description = "canonical or input.", DefaultValueFactory = static _ => "canonical" };
        order.AcceptOnlyFromAmong("canonical", "input");
        records.AddTo(command);
        command.Options.Add(order);
        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            bool canonical = parsed.GetValue(order) == "canonical";
            return RecordOptions.Run(
                host, options,
                record => record.Molecule is null
                    ? Renderer.Failure(record, options)
                    : new Rendered(
                        Renderer.Text(writer => writer.Write(string.Create(
                            CultureInfo.InvariantCulture,
                            $"{(canonical ? CanonicalSmiles.Write(record.Molecule) : SmilesWriter.Write(record.Molecule))}{(record.Source.Name is null ? "" : "\t" + record.Source.Name)}\n"))),
                        record, null),
                "");
        });
        return command;
    }
}
