using System.Linq;
using System.Text.Json.Nodes;
using Json.Schema;
using RadicalSites.Reporting;

namespace RadicalSites.Cli.Tests;

/// <summary>Every record follows the published schema, and the schema describes every field.</summary>
public sealed class SchemaTests
{
    // The published schema lets fields be added; here each field has to be described.
    private static readonly JsonSchema Strict = JsonSchema.FromText(Tighten(JsonNode.Parse(ReportSchema.Text)!).ToJsonString());

    private static readonly JsonSchema Published = JsonSchema.FromText(ReportSchema.Text);

    [Theory]
    [InlineData("sites")]
    [InlineData("predict", "--reagent", "NBS", "--stereo", "expand")]
    [InlineData("predict", "--reagent", "I2")]
    [InlineData("predict", "--reagent", "tBuOCl", "--solvent", "PhH")]
    [InlineData("isomers", "--times", "2", "--stereo", "expand")]
    [InlineData("isomers", "--most", "1")]
    [InlineData("course", "--reagent", "Cl2", "--points", "5")]
    [InlineData("heat", "--reagent", "SO2Cl2", "--solvent", "CCl4")]
    [InlineData("conditions", "--want", "CC(C)CBr")]
    public void Records_follow_the_schema(params string[] command)
    {
        string input = string.Join('\n', Molecules.Common) + "\nC1CC broken\n*C wild\n[H]C([2H])([H])C marked\n";

        ToolRun run = ToolRun.WithInput(input, [command[0], "-", "--format", "ndjson", .. command[1..]]);

        Assert.Equal(Molecules.Common.Length + 3, run.Lines.Length);
        foreach (string line in run.Lines)
        {
            JsonNode record = JsonNode.Parse(line)!;
            EvaluationResults strict = Strict.Evaluate(record, new EvaluationOptions { OutputFormat = OutputFormat.List });
            Assert.True(strict.IsValid, line + "\n" + string.Join('\n', strict.Details.Where(static d => d.HasErrors)
                .SelectMany(static d => d.Errors!.Select(e => d.InstanceLocation + ": " + e.Value)).Take(5)));
            Assert.True(Published.Evaluate(record).IsValid);
        }
    }

    [Theory]
    [InlineData("""{"schema":"radicalsites/2","record":1,"status":"ok","input":"C","name":null,"canonicalSmiles":"C","dataVersion":"x","diagnostics":[]}""")]
    [InlineData("""{"schema":"radicalsites/1","record":0,"status":"ok","input":"C","name":null,"canonicalSmiles":"C","dataVersion":"x","diagnostics":[]}""")]
    [InlineData("""{"schema":"radicalsites/1","record":1,"status":"error","input":"C","name":null}""")]
    [InlineData("""{"schema":"radicalsites/1","record":1,"status":"ok","input":"C","name":null}""")]
    public void Schema_refuses_what_is_no_record(string text) => Assert.False(Published.Evaluate(JsonNode.Parse(text)).IsValid);

    [Fact]
    public void Data_schema_prints_the_published_schema() =>
        Assert.Equal(ReportSchema.Text, ToolRun.Of("data", "schema").Output);

    private static JsonNode Tighten(JsonNode node)
    {
        if (node is JsonObject entry)
        {
            foreach (JsonNode? member in entry.Select(static pair => pair.Value).ToArray())
            {
                if (member is not null)
                {
                    Tighten(member);
                }
            }

            if (entry["properties"] is JsonObject && (string?)(entry["type"] as JsonValue) == "object")
            {
                entry["additionalProperties"] = false;
            }
        }
        else if (node is JsonArray list)
        {
            foreach (JsonNode? member in list)
            {
                if (member is JsonObject or JsonArray)
                {
                    Tighten(member);
                }
            }
        }

        return node;
    }
}
