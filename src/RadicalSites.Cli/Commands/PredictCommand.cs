using System.CommandLine;
using RadicalSites.Cli.Pipeline;
using RadicalSites.Products;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Commands;

/// <summary>The command <c>predict</c>: shares and products for one reagent and temperature.</summary>
internal static class PredictCommand
{
    internal static Command Build(ToolHost host)
    {
        var command = new Command("predict", "Shares of the sites with 90 % intervals, products, remarks, for one reagent and temperature.");
        var records = new RecordOptions("table", "json", "ndjson", "csv", "smi");
        var chemistry = new ChemistryOptions();
        var rows = new Option<string>("--rows")
        {
            Description = "Rows of CSV: sites or products.",
            DefaultValueFactory = static _ => "sites",
        };
        rows.AcceptOnlyFromAmong("sites", "products");
        records.AddTo(command);
        chemistry.AddReaction(command);
        chemistry.AddStereo(command);
        chemistry.AddData(command);
        command.Options.Add(rows);
        command.SetAction(parsed =>
        {
            PipelineOptions options = records.Read(parsed, host);
            var predictor = new HalogenationPredictor(
                chemistry.ReadConditions(parsed), chemistry.ReadOptions(parsed, withStereo: true));
            CsvShape shape = parsed.GetValue(rows) == "sites" ? CsvShape.PredictedSites : CsvShape.Products;
            return new RecordRun(host, options, Plan(options, predictor, shape), ChemistryOptions.IdentityOf(predictor.Options)).Run();
        });
        return command;
    }

    private static OutputPlan Plan(PipelineOptions options, HalogenationPredictor predictor, CsvShape shape) => options.Format switch
    {
        OutputFormat.Csv => new OutputPlan(CsvReport.Header(shape) + "\n", () => new CsvRecordWriter(
            shape,
            (output, source, molecule) =>
            {
                CsvReport.Write(output, source, predictor.Predict(molecule), shape);
                return true;
            })),
        OutputFormat.Table => new OutputPlan("", () => new TextRecordWriter(
            options.IsSingle,
            (writer, source, molecule) =>
            {
                TextReport.Write(writer, source, predictor.Predict(molecule));
                return true;
            })),
        OutputFormat.Smi => new OutputPlan("", () => new LineRecordWriter(
            (output, source, molecule) =>
            {
                foreach (HalogenationProduct product in predictor.Predict(molecule).Products)
                {
                    output.AppendLine(product.CanonicalSmiles, product.Share, source.Name);
                }

                return true;
            })),
        _ => new OutputPlan("", () => new JsonRecordWriter(
            options.IsIndented,
            (writer, source, molecule) =>
            {
                JsonReport.Write(writer, source, predictor.Predict(molecule));
                return true;
            })),
    };
}
