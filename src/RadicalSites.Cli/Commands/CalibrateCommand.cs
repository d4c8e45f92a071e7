using System.Collections.Generic;
using System.CommandLine;
using System.Globalization;
using System.IO;
using System.Text.Json;
using RadicalSites.Cli.Output;
using RadicalSites.Diagnostics;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>calibrate</c>: parameters fitted to measured ratios.</summary>
internal static class CalibrateCommand
{
    private const int ParametersListed = 20;

    internal static Command Build(ToolHost host)
    {
        var command = new Command(
            "calibrate",
            "Parameters of the model fitted to measured ratios, with their uncertainty.");
        var measured = new Argument<string>("MEASURED")
        {
            Description = "CSV file, one row for each product: smiles, reagent, temperature, product (SMILES) or site, percent or area; "
                + "sigma, solvent and experiment where they matter.",
        };
        var output = new Option<string?>("--output") { Description = "Write the fitted parameters here, for --calibration of other commands." };
        var start = new Option<string?>("--calibration") { Description = "Start from this earlier calibration instead of the shipped fit." };
        var format = new Option<string>("--format") { Description = "table, json or csv (the calibration file).", DefaultValueFactory = static _ => "table" };
        var table = new Option<string?>("--bde-table") { Description = "Your own table of bond enthalpies, laid over the shipped one." };
        format.AcceptOnlyFromAmong("table", "json", "csv");
        command.Arguments.Add(measured);
        foreach (Option option in (Option[])[output, start, format, table])
        {
            command.Options.Add(option);
        }

        command.SetAction(parsed =>
        {
            string file = parsed.GetValue(measured)!;
            IReadOnlyList<MeasuredDistribution> data = CalibrationData.Read(Path.GetFileName(file), ChemistryOptions.ReadText(file));
            CalibrationReport report = SelectivityCalibrator.Fit(data, new CalibrationOptions
            {
                Name = Path.GetFileNameWithoutExtension(file),
                Start = ChemistryOptions.ReadCalibration(parsed.GetValue(start)),
                Table = parsed.GetValue(table) is { } own
                    ? ChemistryOptions.ReadTable(own).Overlay(Thermochemistry.BdeTable.Default)
                    : Thermochemistry.BdeTable.Default,
            });
            string text = report.Calibration.ToText($"fitted to {report.Experiments} experiments of {Path.GetFileName(file)}");
            if (parsed.GetValue(output) is { } path)
            {
                using OutputTarget target = FileTarget.Open(path, "calibrate", resume: false);
                target.Write(System.Text.Encoding.UTF8.GetBytes(text), 1, 0);
                target.Complete();
            }

            switch (parsed.GetValue(format))
            {
                case "csv":
                    parsed.InvocationConfiguration.Output.Write(text);
                    break;
                case "json":
                    WriteJson(host, report);
                    break;
                default:
                    WriteTable(parsed.InvocationConfiguration.Output, report);
                    break;
            }

            foreach (CalibrationRefusal refusal in report.Refused)
            {
                host.Error.Write($"{Path.GetFileName(file)}: {refusal.Id}: not used: {refusal.Reason}\n");
            }

            return report.Refused.Count > 0 ? ExitCode.SomeFailed : ExitCode.Done;
        });
        return command;
    }

    private static void WriteTable(TextWriter writer, CalibrationReport report)
    {
        writer.Write(string.Create(
            CultureInfo.InvariantCulture,
            $"{report.Experiments} experiments used, {report.Refused.Count} not used; mean error {report.ErrorBefore:0.0} points before, {report.ErrorAfter:0.0} after.\n"));
        if (report.Parameters.Count > 0)
        {
            writer.Write('\n');
            var table = new TextTable("parameter", ">before", ">sigma", ">after", ">sigma");
            for (int i = 0; i < report.Parameters.Count && i < ParametersListed; i++)
            {
                CalibratedParameter one = report.Parameters[i];
                table.Add(one.Name, Three(one.Before), Three(one.SigmaBefore), Three(one.After), Three(one.SigmaAfter));
            }

            table.Write(writer);
            if (report.Parameters.Count > ParametersListed)
            {
                writer.Write(string.Create(
                    CultureInfo.InvariantCulture, $"and {report.Parameters.Count - ParametersListed} more that move less; --format csv has all.\n"));
            }
        }

        foreach (string outlier in report.Outliers)
        {
            writer.Write($"\nCAUTION: {outlier} stays more than four standard deviations off and was weighted down; look at it again.\n");
        }
    }

    private static void WriteJson(ToolHost host, CalibrationReport report)
    {
        using var writer = new Utf8JsonWriter(host.Output, JsonReport.WriterOptions(indented: true));
        writer.WriteStartObject();
        writer.WriteString("schema", "radicalsites-calibration/1");
        writer.WriteNumber("experiments", report.Experiments);
        writer.WriteNumber("meanErrorBefore", report.ErrorBefore);
        writer.WriteNumber("meanErrorAfter", report.ErrorAfter);
        writer.WriteStartArray("parameters");
        foreach (CalibratedParameter one in report.Parameters)
        {
            writer.WriteStartObject();
            writer.WriteString("name", one.Name);
            writer.WriteNumber("before", one.Before);
            writer.WriteNumber("sigmaBefore", one.SigmaBefore);
            writer.WriteNumber("after", one.After);
            writer.WriteNumber("sigmaAfter", one.SigmaAfter);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        writer.WriteStartArray("refused");
        foreach (CalibrationRefusal refusal in report.Refused)
        {
            writer.WriteStartObject();
            writer.WriteString("id", refusal.Id);
            writer.WriteString("reason", refusal.Reason);
            writer.WriteEndObject();
        }

        writer.WriteEndArray();
        writer.WriteStartArray("outliers");
        foreach (string outlier in report.Outliers)
        {
            writer.WriteStringValue(outlier);
        }

        writer.WriteEndArray();
        writer.WriteEndObject();
        writer.Flush();
        host.Output.Write("\n"u8);
    }

    private static string Three(double value) => value.ToString("0.###", CultureInfo.InvariantCulture);
}
