using System;
using System.IO;
using System.Linq;
using System.Text.Json;

namespace RadicalSites.Cli.Tests;

/// <summary>Molfile and SDF as input. The connection tables are written by hand after the CTfile format description.</summary>
public sealed class StructureFileTests
{
    private const string Propane = """
        propane
          hand

          3  2  0  0  0  0  0  0  0  0999 V2000
            0.0000    0.0000    0.0000 C   0  0
            1.3000    0.7500    0.0000 C   0  0
            2.6000    0.0000    0.0000 C   0  0
          1  2  1  0
          2  3  1  0
        M  END

        """;

    private static readonly string Broken = Propane.Replace("  2  3  1  0", "  2  9  1  0", StringComparison.Ordinal);

    [Theory]
    [InlineData("mol")]
    [InlineData("sdf")]
    public void Sites_of_a_structure_file_are_those_of_the_smiles(string format)
    {
        using var folder = new TemporaryFolder();
        string file = folder.Write("a." + format, format == "sdf" ? Propane + "> <boiling_point>\n-42\n\n$$$$\n" : Propane);
        string[] expected = Sites("CCC");

        Assert.Equal(expected, Sites(file));
        Assert.Equal(expected, Sites("-", "--input-format", format));

        string[] Sites(params string[] input)
        {
            ToolRun run = ToolRun.WithInput(File.ReadAllText(file), ["sites", .. input, "--format", "ndjson"]);
            Assert.Equal(0, run.ExitCode);
            using JsonDocument document = JsonDocument.Parse(run.Output);
            return [.. document.RootElement.GetProperty("sites").EnumerateArray().Select(static site => site.GetRawText())];
        }
    }

    [Fact]
    public void Sdf_with_a_broken_record_reports_its_line_and_goes_on()
    {
        string text = Propane + "$$$$\n" + Broken + "$$$$\n" + Propane + "$$$$\n";

        ToolRun run = ToolRun.WithInput(text, "sites", "-", "--input-format", "sdf", "--format", "ndjson");

        Assert.Equal(1, run.ExitCode);
        JsonElement[] records = [.. run.Lines.Select(static line => JsonDocument.Parse(line).RootElement)];
        Assert.Equal(["ok", "error", "ok"], records.Select(static record => record.GetProperty("status").GetString()));
        Assert.Equal([1, 2, 3], records.Select(static record => record.GetProperty("record").GetInt32()));
        Assert.All(records, static record => Assert.Equal("propane", record.GetProperty("name").GetString()));

        // Eleven lines of the first record, then the second bond line is line 9 of the second.
        Assert.Equal(20, records[1].GetProperty("error").GetProperty("line").GetInt32());
        Assert.Contains("record 2, line 20", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Sdf_shards_and_threads_give_the_bytes_of_the_single_run()
    {
        using var folder = new TemporaryFolder();
        string file = folder.Write("a.sdf", string.Concat(Enumerable.Range(1, 90).Select(static n => (n % 7 == 0 ? Broken : Propane) + "$$$$\n")));
        byte[] expected = ToolRun.Of("predict", file, "--format", "csv", "--threads", "1").OutputBytes;

        Assert.Equal(expected, ToolRun.Of("predict", file, "--format", "csv", "--threads", "5").OutputBytes);
        Assert.Equal(expected, Enumerable.Range(1, 4).SelectMany(part =>
            ToolRun.Of("predict", file, "--format", "csv", "--shard", FormattableString.Invariant($"{part}/4")).OutputBytes));
    }

    [Fact]
    public void Convert_sdf_gives_canonical_smiles_with_the_name() =>
        Assert.Equal(["CCC\tpropane"], ToolRun.WithInput(Propane, "convert", "-", "--input-format", "mol").Lines);
}
