using System.CommandLine;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>sites</c>: every C(sp3)-H site with its bond enthalpy, no reaction.</summary>
internal static class SitesCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("sites", "C(sp3)-H sites: class, equivalence, bond dissociation enthalpy with evidence.");
        var records = new RecordOptions("table", "json", "ndjson", "csv");
        var chemistry = new ChemistryOptions();
        records.AddTo(command);
        chemistry.AddData(command);
        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            HalogenationOptions halogenation = chemistry.ReadOptions(parsed, withStereo: false);
            return RecordOptions.Run(
                host, options, record => Render(record, options, halogenation),
                options.Format == OutputFormat.Csv ? CsvReport.SiteHeader + "\n" : "");
        });
        return command;
    }

    private static Rendered Render(InputRecord record, PipelineOptions options, HalogenationOptions halogenation)
    {
        if (record.Molecule is null)
        {
            return Renderer.Failure(record, options);
        }

        SiteReport report = Halogenation.FindSites(record.Molecule, halogenation);
        byte[] bytes = options.Format switch
        {
            OutputFormat.Json or OutputFormat.Ndjson => Renderer.Json(
                Renderer.Indented(options), writer => JsonReport.Write(writer, record.Source, report)),
            OutputFormat.Csv => Renderer.Text(writer => CsvReport.Write(writer, record.Source, report)),
            _ => Renderer.Text(writer =>
            {
                Renderer.Separate(writer, record);
                TextReport.Write(writer, record.Source, report);
            }),
        };
        return new Rendered(bytes, record, null);
    }
}
