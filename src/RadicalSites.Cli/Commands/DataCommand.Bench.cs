using System.CommandLine;
using System.Globalization;
using System.IO;
using RadicalSites.Reporting;
using RadicalSites.Selectivity;

namespace RadicalSites.Cli.Commands;

internal static partial class DataCommand
{
    private static Command Bench()
    {
        var command = new Command("bench", "Published distributions against the predictions: mean error and coverage of the intervals.");
        var file = new Argument<string?>("FILE") { Arity = ArgumentArity.ZeroOrOne, Description = "Measured distributions of your own (the columns of calibrate); the shipped ones when not given." };
        var parity = new Option<bool>("--parity") { Description = "One CSV row for each product: measured, predicted, interval." };
        var calibration = new Option<string?>("--calibration") { Description = "Calibration to judge instead of the shipped fit." };
        command.Arguments.Add(file);
        command.Options.Add(parity);
        command.Options.Add(calibration);
        command.SetAction(parsed =>
        {
            TextWriter writer = parsed.InvocationConfiguration.Output;
            string? own = parsed.GetValue(file);
            BenchReport report = LiteratureBench.Run(
                own is null ? null : CalibrationData.Read(Path.GetFileName(own), ChemistryOptions.ReadText(own)),
                new HalogenationOptions { Calibration = ChemistryOptions.ReadCalibration(parsed.GetValue(calibration)) });
            if (parsed.GetValue(parity))
            {
                writer.Write(report.ToParityCsv());
                return ExitCode.Done;
            }

            var table = new TextTable("group", ">distributions", ">products", ">mean error, points", ">in 90 % interval");
            foreach (BenchSummary one in report.Summaries)
            {
                table.Add(
                    one.Group, Text(one.Entries), Text(one.Products), One(one.MeanAbsoluteError), TextReport.Percent(one.Coverage));
            }

            table.Write(writer);
            foreach (BenchEntry entry in report.Entries)
            {
                if (entry.Problem is { } problem)
                {
                    writer.Write($"{entry.Distribution.Id}: not compared: {problem}\n");
                }
            }

            return ExitCode.Done;
        });
        return command;
    }

    private static void Parameters(TextWriter writer)
    {
        var table = new TextTable("parameter", ">table", ">spread", ">shift", ">sigma");
        foreach (SelectivityParameter one in SelectivityCalibration.Parameters)
        {
            (double shift, double sigma) = SelectivityCalibration.Default.ShiftOf(one.Name);
            table.Add(one.Name, Three(one.TableValue), Three(one.Spread), Three(shift), Three(sigma));
        }

        table.Write(writer);
        writer.Write("The shift is what the shipped fit adds to the value of the table; sigma is its standard deviation.\n");
    }

    private static string Text(int value) => value.ToString(CultureInfo.InvariantCulture);

    private static string Three(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
