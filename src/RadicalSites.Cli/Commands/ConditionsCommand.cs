using System.CommandLine;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Quantities;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>conditions</c>: reagents and temperatures ranked for a wanted product.</summary>
internal static class ConditionsCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("conditions", "Reagents and temperatures ranked for a wanted product.");
        var records = new RecordOptions("table", "json", "ndjson");
        var chemistry = new ChemistryOptions();
        var want = new Option<string>("--want") { Description = "SMILES of the wanted product; stereo is ignored.", Required = true };
        records.AddTo(command);
        command.Options.Add(want);
        chemistry.AddMedium(command);
        chemistry.AddData(command);
        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            Temperature? temperature = chemistry.ReadTemperature(parsed);
            string? solvent = chemistry.ReadSolvent(parsed);
            HalogenationOptions analysis = chemistry.ReadOptions(parsed, withStereo: false);
            if (!SmilesReader.TryParse(parsed.GetValue(want), out Molecule? wanted, out FormatProblem? problem))
            {
                throw new ToolException(ExitCode.WrongUsage, "--want: " + problem.Render());
            }

            ConditionRanking Rank(Molecule molecule) => ConditionRanking.Of(molecule, wanted, temperature, solvent, analysis);
            OutputPlan plan = RecordPlans.Of(
                options,
                (writer, source, molecule) => JsonReport.Write(writer, source, Rank(molecule)),
                (writer, source, molecule) => TextReport.Write(writer, source, Rank(molecule)));
            return new RecordRun(host, options, plan, ChemistryOptions.IdentityOf(analysis)).Run();
        });
        return command;
    }
}
