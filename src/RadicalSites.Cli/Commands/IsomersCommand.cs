using System;
using System.CommandLine;
using System.Globalization;
using System.IO;
using System.Text.Json;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Products;
using RadicalSites.Reporting;

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
        var most = new Option<long>("--most") { Description = "List at most this many products of a molecule.", DefaultValueFactory = static _ => 1_000_000 };
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
            return RecordOptions.Run(
                host, options, record => Render(record, options, isomerOptions, limit, host),
                options.Format == OutputFormat.Csv ? CsvReport.IsomerHeader + "\n" : "");
        });
        return command;
    }

    private static Rendered Render(
        InputRecord record, PipelineOptions options, IsomerOptions isomerOptions, long limit, ToolHost host)
    {
        if (record.Molecule is null)
        {
            return Renderer.Failure(record, options);
        }

        IsomerEnumeration enumeration = IsomerEnumeration.Of(record.Molecule, isomerOptions, host.Cancellation);
        byte[] bytes = options.Format switch
        {
            OutputFormat.Json or OutputFormat.Ndjson => Renderer.Json(
                Renderer.Indented(options), writer => WriteJson(writer, record, enumeration, limit)),
            OutputFormat.Csv => Renderer.Text(writer => Each(enumeration, limit, isomer => CsvReport.Write(writer, record.Source, isomer))),
            OutputFormat.Smi => Renderer.Text(writer => Each(enumeration, limit, isomer =>
                writer.Write(string.Create(CultureInfo.InvariantCulture, $"{isomer.CanonicalSmiles}\t{isomer.Degeneracy}\t{record.Source.Name}\n")))),
            _ => Renderer.Text(writer => WriteTable(writer, record, enumeration, limit)),
        };
        return new Rendered(bytes, record, null);
    }

    private static long Each(IsomerEnumeration enumeration, long limit, Action<IsomerProduct> use)
    {
        long count = 0;
        foreach (IsomerProduct isomer in enumeration.Enumerate())
        {
            if (count == limit)
            {
                return -1;
            }

            count++;
            use(isomer);
        }

        return count;
    }

    private static void WriteTable(TextWriter writer, InputRecord record, IsomerEnumeration enumeration, long limit)
    {
        Renderer.Separate(writer, record);
        long count = Each(enumeration, limit, isomer =>
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
        if (count < 0)
        {
            writer.Write(ProblemCatalogue.General.LimitReached.Format(limit, "products") + "\n");
        }

        TextReport.Remarks(writer, enumeration.Diagnostics);
    }

    private static void WriteJson(Utf8JsonWriter writer, InputRecord record, IsomerEnumeration enumeration, long limit)
    {
        JsonReport.Begin(writer, record.Source, "ok");
        writer.WriteStartArray("isomers");
        long count = Each(enumeration, limit, isomer =>
        {
            writer.WriteStartObject();
            writer.WriteNumber("isomer", isomer.Number);
            writer.WriteString("smiles", isomer.CanonicalSmiles);
            writer.WriteString("degeneracy", isomer.Degeneracy.ToString(CultureInfo.InvariantCulture));
            writer.WriteStartArray("halogenCarbons");
            foreach (int carbon in isomer.HalogenCarbons)
            {
                writer.WriteNumberValue(record.Molecule!.InputIndexOf(carbon));
            }

            writer.WriteEndArray();
            if (isomer.Stereoisomers is { } stereoisomers)
            {
                writer.WriteStartArray("stereoisomers");
                foreach (string stereoisomer in stereoisomers)
                {
                    writer.WriteStringValue(stereoisomer);
                }

                writer.WriteEndArray();
            }

            writer.WriteEndObject();
        });
        writer.WriteEndArray();
        writer.WriteBoolean("complete", count >= 0);
        JsonReport.WriteDiagnostics(writer, record.Molecule!, enumeration.Diagnostics);
        writer.WriteEndObject();
    }
}
