using System.CommandLine;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Course;
using RadicalSites.Molecules;
using RadicalSites.Reporting;
using RadicalSites.Selectivity;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>course</c>: composition against equivalents.</summary>
internal static class CourseCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("course", "Mono, di and higher halogenation against equivalents, with the best stopping point.");
        var records = new RecordOptions("table", "json", "ndjson");
        var chemistry = new ChemistryOptions();
        var equivalents = new Option<double>("--equivalents") { Description = "Halogen at the end of the curve [mol per mol substrate].", DefaultValueFactory = static _ => 3 };
        var points = new Option<int>("--points") { Description = "Points of the curve, both ends included.", DefaultValueFactory = static _ => 61 };
        var halogens = new Option<int>("--halogens") { Description = "Most halogens per molecule that are followed.", DefaultValueFactory = static _ => 4 };
        records.AddTo(command);
        chemistry.AddReaction(command);
        chemistry.AddTable(command);
        foreach (Option option in (Option[])[equivalents, points, halogens])
        {
            command.Options.Add(option);
        }

        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            ReactionConditions conditions = chemistry.ReadConditions(parsed);
            HalogenationOptions analysis = chemistry.ReadOptions(parsed, withStereo: false);
            var bounds = new CourseOptions
            {
                MaximumEquivalents = Within(parsed.GetValue(equivalents), 1e-6, 1000, "--equivalents"),
                PointCount = (int)Within(parsed.GetValue(points), 2, 10_001, "--points"),
                MaximumHalogens = (int)Within(parsed.GetValue(halogens), 1, 64, "--halogens"),
            };
            HalogenationCourse Follow(Molecule molecule) =>
                CourseCalculator.Follow(molecule, conditions, bounds, analysis.Table, analysis.Calibration, host.Cancellation);
            OutputPlan plan = RecordPlans.Of(
                options,
                (writer, source, molecule) => JsonReport.Write(writer, source, conditions, analysis.DataVersion, Follow(molecule)),
                (writer, source, molecule) => TextReport.Write(writer, source, conditions, analysis.DataVersion, Follow(molecule)));
            return new RecordRun(host, options, plan, ChemistryOptions.IdentityOf(analysis)).Run();
        });
        return command;
    }

    internal static double Within(double value, double least, double most, string option) => value >= least && value <= most
        ? value
        : throw new ToolException(
            ExitCode.WrongUsage, string.Create(System.Globalization.CultureInfo.InvariantCulture, $"{option} takes {least} to {most}."));
}
