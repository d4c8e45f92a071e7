using System;
using System.IO;
using System.Linq;
using System.Text;
using System.Threading;

namespace RadicalSites.Cli.Tests;

/// <summary>Output files appear whole, and an interrupted run goes on to the same bytes.</summary>
public sealed class OutputFileTests : IDisposable
{
    private static readonly string Input = Molecules.List(1500);

    private readonly TemporaryFolder folder = new();

    public void Dispose() => folder.Dispose();

    [Theory]
    [InlineData("ndjson")]
    [InlineData("csv")]
    [InlineData("smi")]
    [InlineData("table")]
    public void Resume_after_any_truncation_gives_the_same_bytes(string format)
    {
        byte[] expected = ToolRun.WithInput(Input, "isomers", "-", "--format", format).OutputBytes;
        var random = new Random(20260101);
        for (int trial = 0; trial < 12; trial++)
        {
            string output = folder[$"out-{format}-{trial}"];
            Interrupt(output, format, random.NextDouble());
            Damage(output, random, trial);

            ToolRun run = ToolRun.WithInput(Input, "isomers", "-", "--format", format, "--output", output, "--resume");

            Assert.Equal(1, run.ExitCode);
            Assert.Contains("of 1500 records failed", run.Error, StringComparison.Ordinal);
            Assert.Equal(expected, File.ReadAllBytes(output));
            Assert.False(File.Exists(output + ".part"));
            Assert.False(File.Exists(output + ".journal"));
        }
    }

    [Fact]
    public void Resume_with_other_options_is_refused()
    {
        string output = folder["out"];
        Interrupt(output, "ndjson");

        ToolRun run = ToolRun.WithInput(Input, "isomers", "-", "--format", "ndjson", "--halogen", "Cl", "--output", output, "--resume");

        Assert.Equal(3, run.ExitCode);
        Assert.Contains("other inputs, options or data", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Output_is_not_there_before_it_is_whole_and_an_older_one_stays()
    {
        string output = folder.Write("out", "older");

        Interrupt(output, "ndjson");

        Assert.Equal("older", File.ReadAllText(output));
        Assert.True(File.Exists(output + ".part"));
        Assert.Equal(1, ToolRun.WithInput(Input, "isomers", "-", "--format", "ndjson", "--output", output).ExitCode);
        Assert.Equal(1500, File.ReadLines(output).Count());
    }

    [Fact]
    public void Output_ending_decides_the_format()
    {
        ToolRun.Of("sites", "CCC", "--output", folder["x.csv"]);

        Assert.StartsWith("record,", File.ReadAllText(folder["x.csv"]), StringComparison.Ordinal);
    }

    [Fact]
    public void Output_stream_that_fails_is_exit_code_3()
    {
        using var output = new FullStream();
        using var text = new MemoryStream(Encoding.UTF8.GetBytes(Molecules.List(50)));

        ToolRun run = ToolRun.On(text, output, CancellationToken.None, "isomers", "-");

        Assert.Equal(3, run.ExitCode);
        Assert.Contains("No space left", run.Error, StringComparison.Ordinal);
    }

    private static void Interrupt(string output, string format, double part = 0.5)
    {
        using var cancellation = new CancellationTokenSource();
        using var input = new CancellingStream(Input, part, cancellation);
        ToolRun run = ToolRun.On(
            input, Stream.Null, cancellation.Token, "isomers", "-", "--format", format, "--output", output);
        Assert.Equal(4, run.ExitCode);
        Assert.Contains("--resume", run.Error, StringComparison.Ordinal);
    }

    // What a kill or a power cut leaves: files that end anywhere, or that were extended and never filled.
    private static void Damage(string output, Random random, int trial)
    {
        using FileStream part = new(output + ".part", FileMode.Open);
        using FileStream journal = new(output + ".journal", FileMode.Open);
        switch (trial % 4)
        {
            case 0:
                part.SetLength(random.NextInt64(part.Length + 1));
                break;
            case 1:
                journal.SetLength(random.NextInt64(journal.Length + 1));
                break;
            case 2:
                long whole = part.Length;
                part.SetLength(random.NextInt64(part.Length + 1));
                part.SetLength(whole);
                break;
            default:
                part.SetLength(part.Length + 5000);
                journal.Position = journal.Length;
                journal.Write("77 0 9"u8);
                break;
        }
    }

    private sealed class FullStream : MemoryStream
    {
        public override void Write(ReadOnlySpan<byte> buffer) => throw new IOException("No space left on device");

        public override void Write(byte[] buffer, int offset, int count) => throw new IOException("No space left on device");
    }
}
