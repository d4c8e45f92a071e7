using System.CommandLine;
using System.Linq;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Diagnostics;
using RadicalSites.Heat;
using RadicalSites.Molecules;
using RadicalSites.Quantities;
using RadicalSites.Reporting;
using RadicalSites.Selectivity;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>heat</c>: heat, gas and materials of a batch.</summary>
internal static class HeatCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("heat", "Reaction enthalpy, adiabatic rise, gas and materials of a batch, with cautions.");
        var records = new RecordOptions("table", "json", "ndjson");
        var chemistry = new ChemistryOptions();
        var batch = new Option<string>("--batch") { Description = "Substrate: 10g, 250mg, 2kg, 10mmol, 0.5mol.", DefaultValueFactory = static _ => "1mol" };
        var equivalents = new Option<double>("--equivalents") { Description = "Halogen source per substrate.", DefaultValueFactory = static _ => 1 };
        var milliliters = new Option<double?>("--solvent-volume") { Description = "Volume of the solvent [mL]; 5 mL per gram of substrate when not given." };
        var capacity = new Option<double?>("--heat-capacity") { Description = "Measured heat capacity of the mixture [J/(g K)]." };
        records.AddTo(command);
        chemistry.AddReaction(command);
        chemistry.AddTable(command);
        foreach (Option option in (Option[])[batch, equivalents, milliliters, capacity])
        {
            command.Options.Add(option);
        }

        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            ReactionConditions conditions = chemistry.ReadConditions(parsed);
            var predictor = new HalogenationPredictor(conditions, chemistry.ReadOptions(parsed, withStereo: false));
            if (HeatTables.FindReagent(conditions.Reagent.Id) is null)
            {
                throw new ToolException(
                    ExitCode.WrongUsage,
                    $"there are no batch properties of {conditions.Reagent.Id}; known are {string.Join(", ", HeatTables.Reagents.Select(static r => r.Id))}.");
            }

            HeatOptions heat = new()
            {
                Batch = Amount.TryParse(parsed.GetValue(batch), out Amount amount)
                    ? amount
                    : throw new ToolException(ExitCode.WrongUsage, $"--batch takes an amount such as 10g or 50mmol, not '{parsed.GetValue(batch)}'."),
                Equivalents = CourseCommand.Within(parsed.GetValue(equivalents), 1e-6, 1000, "--equivalents"),
                Solvent = conditions.Solvent is { } id ? HeatTables.FindSolvent(id.Split('@')[0]) : null,
                SolventMilliliters = parsed.GetValue(milliliters) is { } volume ? CourseCommand.Within(volume, 1e-9, 1e9, "--solvent-volume") : null,
                MixtureJoulesPerGramKelvin = parsed.GetValue(capacity) is { } value ? CourseCommand.Within(value, 0.1, 10, "--heat-capacity") : null,
                Start = conditions.Temperature,
            };
            (Prediction Prediction, HeatReport Report) Reckon(Molecule molecule)
            {
                if (MolecularFormula.Of(molecule).GramsPerMole is not > 0)
                {
                    throw new MoleculeFormatException(new FormatProblem
                    {
                        Descriptor = ProblemCatalogue.Heat.NoMolarMass,
                        Message = ProblemCatalogue.Heat.NoMolarMass.Format(),
                    });
                }

                Prediction prediction = predictor.Predict(molecule);
                return (prediction, HalogenationHeat.Reckon(prediction, heat, predictor.Options.Table));
            }

            OutputPlan plan = RecordPlans.Of(
                options,
                (writer, source, molecule) =>
                {
                    (Prediction prediction, HeatReport report) = Reckon(molecule);
                    JsonReport.Write(writer, source, prediction, report);
                },
                (writer, source, molecule) =>
                {
                    (Prediction prediction, HeatReport report) = Reckon(molecule);
                    TextReport.Write(writer, source, prediction, report);
                });
            return new RecordRun(host, options, plan, ChemistryOptions.IdentityOf(predictor.Options)).Run();
        });
        return command;
    }
}
