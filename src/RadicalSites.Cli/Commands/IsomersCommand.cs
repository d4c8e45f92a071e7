using System;
using System.CommandLine;
using System.Globalization;
using System.IO;
using RadicalSites.Canonical;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Reporting;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>isomers</c>: the regioisomers only, one line for each.</summary>
internal static class IsomersCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("isomers", "Every distinct product of replacing C(sp3)-H by halogen, without energetics; one line for each.");
        var records = new RecordOptions("table", "json", "ndjson", "csv", "smi");
        var chemistry = new ChemistryOptions();
        var halogen = new Option<string>("--halogen") { Description = "F, Cl, Br or I.", DefaultValueFactory = static _ => "Br" };
        halogen.AcceptOnlyFromAmong("F", "Cl", "Br", "I");
        var times = new Option<int>("--times") { Description = "Replace 1 to this many hydrogens.", DefaultValueFactory = static _ => 1 };
        var exactly = new Option<bool>("--exactly") { Description = "Only products with exactly --times halogens." };
        var most = new Option<long>("--most") { Description = "List at most this many products of a molecule; exit code 4 when there are more.", DefaultValueFactory = static _ => 1_000_000 };
        records.AddTo(command);
        chemistry.AddStereo(command);
        foreach (Option option in (Option[])[halogen, times, exactly, most])
        {
            command.Options.Add(option);
        }

        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            int k = parsed.GetValue(times);
            if (k < 1)
            {
                throw new ToolException(ExitCode.WrongUsage, "--times takes 1 or more.");
            }

            var isomerOptions = new IsomerOptions
            {
                Halogen = Elements.Find(parsed.GetValue(halogen)),
                MinimumTimes = parsed.GetValue(exactly) ? k : 1,
                MaximumTimes = k,
                Stereo = chemistry.ReadStereo(parsed),
            };
            long limit = parsed.GetValue(most);
            OutputPlan plan = Plan(options, molecule => IsomerEnumeration.Of(molecule, isomerOptions, host.Cancellation), limit);
            return new RecordRun(host, options, plan, BdeTable.Default.Version).Run();
        });
        return command;
    }

    private static OutputPlan Plan(PipelineOptions options, Func<Molecule, IsomerEnumeration> enumerate, long limit) => options.Format switch
    {
        OutputFormat.Csv => new OutputPlan(CsvReport.Header(CsvShape.Isomers) + "\n", () => new CsvRecordWriter(
            CsvShape.Isomers,
            (output, source, molecule) =>
                CsvReport.Write(output, source, CanonicalSmiles.Write(molecule), enumerate(molecule), limit))),
        OutputFormat.Table => new OutputPlan("", () => new TextRecordWriter(
            options.IsSingle, (writer, _, molecule) => WriteTable(writer, enumerate(molecule), limit))),
        OutputFormat.Smi => new OutputPlan("", () => new LineRecordWriter(
            (output, source, molecule) => Each(enumerate(molecule), limit, isomer => output.Append(string.Create(
                CultureInfo.InvariantCulture, $"{isomer.CanonicalSmiles}\t{isomer.Degeneracy}\t{source.Name}\n"))))),
        _ => new OutputPlan("", () => new JsonRecordWriter(
            options.IsIndented,
            (writer, source, molecule) => JsonReport.Write(
                writer, source, CanonicalSmiles.Write(molecule), BdeTable.Default.Version, enumerate(molecule), limit))),
    };

    private static bool Each(IsomerEnumeration enumeration, long limit, Action<IsomerProduct> use)
    {
        foreach (IsomerProduct isomer in enumeration.Enumerate())
        {
            if (isomer.Number > limit)
            {
                return false;
            }

            use(isomer);
        }

        return true;
    }

    private static bool WriteTable(TextWriter writer, IsomerEnumeration enumeration, long limit)
    {
        bool complete = Each(enumeration, limit, isomer =>
        {
            writer.Write(string.Create(CultureInfo.InvariantCulture, $"{isomer.CanonicalSmiles}\t{isomer.Degeneracy}\n"));
            if (isomer.Stereoisomers is { } stereoisomers)
            {
                foreach (string stereoisomer in stereoisomers)
                {
                    writer.Write("  " + stereoisomer + "\n");
                }
            }
        });
        TextReport.Remarks(
            writer, complete ? enumeration.Diagnostics : [.. enumeration.Diagnostics, JsonReport.ProductLimit(limit)]);
        return complete;
    }
}
