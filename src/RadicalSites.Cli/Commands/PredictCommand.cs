using System.CommandLine;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>predict</c>: shares and products for one reagent and temperature.</summary>
internal static class PredictCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("predict", "Shares of the sites with 90 % intervals, products, remarks, for one reagent and temperature.");
        var records = new RecordOptions("table", "json", "ndjson", "csv");
        var chemistry = new ChemistryOptions();
        records.AddTo(command);
        chemistry.AddReaction(command);
        chemistry.AddStereo(command);
        chemistry.AddData(command);
        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            var predictor = new HalogenationPredictor(
                chemistry.ReadConditions(parsed), chemistry.ReadOptions(parsed, withStereo: true));
            return RecordOptions.Run(
                host, options, record => Render(record, options, predictor),
                options.Format == OutputFormat.Csv ? CsvReport.SiteHeader + "\n" : "");
        });
        return command;
    }

    private static Rendered Render(InputRecord record, PipelineOptions options, HalogenationPredictor predictor)
    {
        if (record.Molecule is null)
        {
            return Renderer.Failure(record, options);
        }

        Prediction prediction = predictor.Predict(record.Molecule);
        byte[] bytes = options.Format switch
        {
            OutputFormat.Json or OutputFormat.Ndjson => Renderer.Json(
                Renderer.Indented(options), writer => JsonReport.Write(writer, record.Source, prediction)),
            OutputFormat.Csv => Renderer.Text(writer => CsvReport.Write(writer, record.Source, prediction)),
            _ => Renderer.Text(writer =>
            {
                Renderer.Separate(writer, record);
                TextReport.Write(writer, record.Source, prediction);
            }),
        };
        return new Rendered(bytes, record, null);
    }
}
