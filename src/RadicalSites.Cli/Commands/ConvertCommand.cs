using System.CommandLine;
using RadicalSites.Canonical;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Formats.Molfile;
using RadicalSites.Formats.Smiles;
using RadicalSites.Symmetry;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>convert</c>: reads any supported format and writes another.</summary>
internal static class ConvertCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("convert", "Reads structures and writes them in another form.");
        var records = new RecordOptions("smi", "mol", "sdf");
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
                if (options.Format == OutputFormat.Smi)
                {
                    output.Append(canonical ? CanonicalSmiles.Write(molecule) : SmilesWriter.Write(molecule));
                    output.Append(source.Name is null ? "" : "\t" + source.Name);
                    output.Append((byte)'\n');
                    return true;
                }

                // Several molfiles are separated as in SDF, so that any reader can tell them apart.
                string text = MolfileWriter.Write(
                    StereoPerception.WithoutPhantoms(molecule), new MolfileWriterOptions { Name = source.Name ?? "" });
                output.Append(text);
                output.Append(options.Format == OutputFormat.Sdf || !options.IsSingle ? "$$$$\n" : "");
                return true;
            }));
            return new RecordRun(host, options, plan, BdeTable.Default.Version).Run();
        });
        return command;
    }
}
