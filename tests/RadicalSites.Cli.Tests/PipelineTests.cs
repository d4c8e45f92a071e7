using System;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text;
using System.Threading;

namespace RadicalSites.Cli.Tests;

/// <summary>Order, shards, culture and cancellation: the bytes depend on the input alone.</summary>
public sealed class PipelineTests
{
    private static readonly string List = Molecules.List(700);

    [Theory]
    [InlineData("ndjson")]
    [InlineData("csv")]
    [InlineData("table")]
    [InlineData("smi")]
    public void Predict_threads_1_and_8_give_the_same_bytes(string format)
    {
        ToolRun one = ToolRun.WithInput(List, "predict", "-", "--format", format, "--threads", "1");
        ToolRun eight = ToolRun.WithInput(List, "predict", "-", "--format", format, "--threads", "8");

        Assert.Equal(one.OutputBytes, eight.OutputBytes);
        Assert.Equal(one.Error, eight.Error);
        Assert.Equal(1, eight.ExitCode);
    }

    [Theory]
    [InlineData("ndjson", 3)]
    [InlineData("csv", 7)]
    [InlineData("table", 4)]
    [InlineData("smi", 701)]
    public void Shards_in_order_are_the_single_run(string format, int parts)
    {
        using var folder = new TemporaryFolder();
        string file = folder.Write("a.smi", Molecules.List(parts > 100 ? 40 : 300));
        using var joined = new MemoryStream();
        for (int part = 1; part <= Math.Min(parts, 60); part++)
        {
            joined.Write(ToolRun.Of("isomers", file, "--format", format, "--shard", FormattableString.Invariant($"{part}/{Math.Min(parts, 60)}")).OutputBytes);
        }

        Assert.Equal(ToolRun.Of("isomers", file, "--format", format).OutputBytes, joined.ToArray());
    }

    [Fact]
    public void Predict_under_a_culture_with_decimal_comma_gives_the_same_bytes()
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        string[][] commands =
        [
            ["predict", "CC(C)Cc1ccccc1", "--format", "json"], ["predict", "CC(C)Cc1ccccc1", "--format", "csv"],
            ["predict", "CC(C)Cc1ccccc1", "--temperature", "77.5"], ["course", "C", "--reagent", "Cl2"],
            ["heat", "CCC", "--reagent", "Cl2", "--batch", "1.5g"], ["conditions", "CCC", "--want", "CCCBr"], ["data", "bde"], ["predict", "CCC", "--format", "smi"],
        ];
        string[] expected = Array.ConvertAll(commands, static command => ToolRun.Of(command).Output);
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
            Assert.Equal(expected, Array.ConvertAll(commands, static command => ToolRun.Of(command).Output));
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    [Theory]
    [InlineData(1)]
    [InlineData(4)]
    public void Cancellation_ends_with_code_4_and_whole_records(int threads)
    {
        using var cancellation = new CancellationTokenSource();
        using var output = new MemoryStream();
        using var input = new CancellingStream(List, 0.4, cancellation);

        ToolRun run = ToolRun.On(
            input, output, cancellation.Token, "predict", "-", "--format", "ndjson", "--threads", threads.ToString(CultureInfo.InvariantCulture));

        Assert.Equal(4, run.ExitCode);
        Assert.Contains("interrupted after", run.Error, StringComparison.Ordinal);
        string text = Encoding.UTF8.GetString(output.ToArray());
        Assert.True(text.Length == 0 || text[^1] == '\n');
        string expected = ToolRun.WithInput(List, "predict", "-", "--format", "ndjson").Output;
        Assert.StartsWith(text, expected, StringComparison.Ordinal);
        Assert.True(text.Length < expected.Length);
    }

    [Fact]
    public void Line_of_10_megabytes_is_one_failed_record()
    {
        string input = "CC first\nC1" + new string('C', 10_000_000) + "\nCCC last\n";

        ToolRun run = ToolRun.WithInput(input, "convert", "-");

        Assert.Equal(1, run.ExitCode);
        Assert.Equal(["CC\tfirst", "CCC\tlast"], run.Lines);
        Assert.True(run.Error.Length < 2000);
    }
}
