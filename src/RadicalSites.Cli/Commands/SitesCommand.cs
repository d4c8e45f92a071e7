using System.CommandLine;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>sites</c>: sites and bond enthalpies, no reaction.</summary>
internal static class SitesCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("sites", "Every C(sp3)-H site: class, equivalence, bond dissociation enthalpy with evidence.");
        var records = new RecordOptions("table", "json", "ndjson", "csv");
        var chemistry = new ChemistryOptions();
        records.AddTo(command);
        chemistry.AddData(command);
        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            HalogenationOptions analysis = chemistry.ReadOptions(parsed, withStereo: false);
            return new RecordRun(host, options, Plan(options, analysis), analysis.Table.Version).Run();
        });
        return command;
    }

    private static OutputPlan Plan(PipelineOptions options, HalogenationOptions analysis) => options.Format switch
    {
        OutputFormat.Csv => new OutputPlan(CsvReport.Header(CsvShape.Sites) + "\n", () => new CsvRecordWriter(
            CsvShape.Sites,
            (output, source, molecule) =>
            {
                CsvReport.Write(output, source, Halogenation.FindSites(molecule, analysis));
                return true;
            })),
        OutputFormat.Table => new OutputPlan("", () => new TextRecordWriter(
            options.IsSingle,
            (writer, source, molecule) =>
            {
                TextReport.Write(writer, source, Halogenation.FindSites(molecule, analysis));
                return true;
            })),
        _ => new OutputPlan("", () => new JsonRecordWriter(
            options.IsIndented,
            (writer, source, molecule) =>
            {
                JsonReport.Write(writer, source, Halogenation.FindSites(molecule, analysis));
                return true;
            })),
    };
}
