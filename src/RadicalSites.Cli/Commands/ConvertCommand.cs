using System.CommandLine;
using RadicalSites.Canonical;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Formats.Smiles;
using RadicalSites.Thermochemistry;

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
            var plan = new OutputPlan("", () => new LineRecordWriter((output, source, molecule) =>
            {
                output.Append(canonical ? CanonicalSmiles.Write(molecule) : SmilesWriter.Write(molecule));
                output.Append(source.Name is null ? "" : "\t" + source.Name);
                output.Append((byte)'\n');
                return true;
            }));
            return new RecordRun(host, options, plan, BdeTable.Default.Version).Run();
        });
        return command;
    }
}
