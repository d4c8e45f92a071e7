using System;
using System.IO;
using System.IO.Compression;
using System.Linq;
using System.Text;
using System.Text.Json;
using RadicalSites.Diagnostics;

namespace RadicalSites.Cli.Tests;

/// <summary>Commands, formats and exit codes that scripts rely on.</summary>
public sealed class ContractTests
{
    [Fact]
    public void Predict_json_of_one_molecule_is_one_document_with_shares_that_sum_to_one()
    {
        ToolRun run = ToolRun.Of("predict", "CCC", "--reagent", "Br2", "--temperature", "127C", "--format", "json");

        Assert.Equal(0, run.ExitCode);
        Assert.Equal("", run.Error);
        using JsonDocument document = JsonDocument.Parse(run.Output);
        JsonElement root = document.RootElement;
        Assert.Equal("radicalsites/1", root.GetProperty("schema").GetString());
        Assert.Equal("bromine atom", root.GetProperty("conditions").GetProperty("carrier").GetString());
        Assert.Equal(400.15, root.GetProperty("conditions").GetProperty("temperatureKelvin").GetDouble());
        Assert.Equal(1, root.GetProperty("sites").EnumerateArray().Sum(static site => site.GetProperty("share").GetDouble()), 9);
        Assert.Equal(1, root.GetProperty("products").EnumerateArray().Sum(static product => product.GetProperty("share").GetDouble()), 9);
    }

    [Fact]
    public void Sites_json_has_no_reaction()
    {
        ToolRun run = ToolRun.Of("sites", "CCC", "--format", "json");

        using JsonDocument document = JsonDocument.Parse(run.Output);
        Assert.False(document.RootElement.TryGetProperty("conditions", out _));
        Assert.False(document.RootElement.TryGetProperty("products", out _));
        Assert.False(document.RootElement.GetProperty("sites")[0].TryGetProperty("share", out _));
        Assert.Equal("[0,2]", document.RootElement.GetProperty("sites")[0].GetProperty("carbons").GetRawText().Replace(" ", "", StringComparison.Ordinal).ReplaceLineEndings(""));
    }

    [Fact]
    public void Isomers_smi_is_smiles_degeneracy_name()
    {
        // Butane has two kinds of hydrogen: 6 primary, 4 secondary (common practice, no source).
        ToolRun run = ToolRun.WithInput("CCCC butane\n", "isomers", "-", "--halogen", "Cl", "--format", "smi");

        Assert.Equal(["4\tbutane", "6\tbutane"], run.Lines.Select(static line => line[(line.IndexOf('\t', StringComparison.Ordinal) + 1)..]).Order(StringComparer.Ordinal));
        Assert.Contains("CCCCCl\t6\tbutane", run.Lines);
    }

    [Theory]
    [InlineData("sites")]
    [InlineData("predict")]
    [InlineData("isomers")]
    public void Csv_has_a_header_and_a_row_of_equal_length_for_every_record(string command)
    {
        ToolRun run = ToolRun.WithInput("CCC propane\nC1CC bad\nClC(Cl)(Cl)Cl \"no, site\"\n", command, "-", "--format", "csv");

        Assert.Equal(1, run.ExitCode);
        string[] lines = run.Lines;
        Assert.StartsWith("record,name,input,status,canonical_smiles,", lines[0], StringComparison.Ordinal);
        Assert.Equal(["1", "2", "3"], lines.Skip(1).Select(static line => line.Split(',')[0]).Distinct());
        int fields = lines[0].Split(',').Length;
        Assert.All(lines, line => Assert.Equal(fields, CountFields(line)));
        Assert.Contains("smiles-ring-unclosed", lines.Single(static line => line.StartsWith("2,", StringComparison.Ordinal)), StringComparison.Ordinal);
        Assert.Contains("sites-none", lines[^1], StringComparison.Ordinal);
    }

    [Fact]
    public void Predict_csv_rows_of_products_hold_their_shares()
    {
        ToolRun run = ToolRun.Of("predict", "CC(C)C", "--reagent", "Br2", "--format", "csv", "--rows", "products");

        string[] header = run.Lines[0].Split(',');
        string[] first = run.Lines[1].Split(',');
        Assert.Equal("CC(C)(C)Br", first[Array.IndexOf(header, "product_smiles")]);
        Assert.True(double.Parse(first[Array.IndexOf(header, "share")], System.Globalization.CultureInfo.InvariantCulture) > 0.99);
    }

    [Fact]
    public void Records_bad_ones_are_reported_counted_and_do_not_stop_the_rest()
    {
        ToolRun run = ToolRun.WithInput("CCC a\nC(C b\n\nCC c\n", "predict", "-", "--format", "ndjson");

        Assert.Equal(1, run.ExitCode);
        Assert.Equal(["ok", "error", "ok"], run.Lines.Select(static line => JsonDocument.Parse(line).RootElement.GetProperty("status").GetString()));
        Assert.Contains("record 2, line 2", run.Error, StringComparison.Ordinal);
        Assert.Contains("smiles-branch-unclosed", run.Error, StringComparison.Ordinal);
        Assert.Contains("1 of 3 records failed", run.Error, StringComparison.Ordinal);
    }

    [Fact]
    public void Records_stop_on_error_ends_after_the_bad_one()
    {
        ToolRun run = ToolRun.WithInput("CCC\nC(C\nCC\n", "predict", "-", "--format", "ndjson", "--on-error", "stop");

        Assert.Equal(1, run.ExitCode);
        Assert.Equal(2, run.Lines.Length);
    }

    [Fact]
    public void Limit_with_more_input_is_exit_code_4_and_without_0()
    {
        Assert.Equal(4, ToolRun.WithInput("C\nCC\nCCC\n", "sites", "-", "--format", "ndjson", "--limit", "2").ExitCode);
        Assert.Equal(0, ToolRun.WithInput("C\nCC\n", "sites", "-", "--format", "ndjson", "--limit", "2").ExitCode);
        Assert.Equal(4, ToolRun.Of("isomers", "CCCC", "--most", "1").ExitCode);
    }

    [Theory]
    [InlineData(2)]
    [InlineData(2, "nonsense")]
    [InlineData(2, "predict", "CCC", "--reagent", "Zz9")]
    [InlineData(2, "predict", "CCC", "--temperature", "-400C")]
    [InlineData(2, "predict", "CCC", "--reagnt", "Br2")]
    [InlineData(2, "predict", "CCC", "--format", "pdf")]
    [InlineData(2, "predict", "CCC", "--shard", "3/2")]
    [InlineData(2, "predict", "-", "--shard", "1/2")]
    [InlineData(2, "predict", "CCC", "--resume")]
    [InlineData(2, "predict", "CCC", "--threads", "-1")]
    [InlineData(2, "conditions", "CCC")]
    [InlineData(2, "conditions", "CCC", "--want", "C1CC")]
    [InlineData(2, "heat", "CCC", "--batch", "many")]
    [InlineData(2, "explain", "no-such-code")]
    [InlineData(2, "data", "sources", "NOSUCH")]
    [InlineData(3, "predict", "no-such-file.smi")]
    [InlineData(3, "predict", "CCC", "--bde-table", "no-such-file.csv")]
    [InlineData(3, "predict", "CCC", "--output", "no-such-folder/x.json")]
    [InlineData(1, "predict", "")]
    [InlineData(1, "sites", "C1CC")]
    [InlineData(1, "heat", "*C")]
    [InlineData(0, "predict", "ClC(Cl)(Cl)Cl")]
    [InlineData(0, "predict", "[Na+]")]
    [InlineData(0, "--help")]
    [InlineData(0, "--version")]
    [InlineData(0, "data", "reagents")]
    [InlineData(0, "data", "bde", "CC(C)C")]
    [InlineData(0, "data", "solvents")]
    [InlineData(0, "data", "parameters")]
    [InlineData(0, "convert", "OCC")]
    [InlineData(0, "course", "C", "--reagent", "Cl2")]
    [InlineData(0, "heat", "CCC", "--reagent", "SO2Cl2")]
    [InlineData(0, "conditions", "CCC", "--want", "CCCBr")]
    [InlineData(0, "explain", "sites-none")]
    public void Run_ends_with_the_exit_code_of_the_contract(int code, params string[] arguments)
    {
        ToolRun run = ToolRun.Of(arguments);

        Assert.Equal(code, run.ExitCode);
        Assert.True(code == 0 || run.Error.Length > 0, "A failure says why.");
        Assert.DoesNotContain("   at ", run.Error, StringComparison.Ordinal);
        Assert.True(code is 0 or 1 || run.Output.Length == 0, "Standard output holds data only.");
    }

    [Fact]
    public void Explain_knows_every_code_of_the_catalogue()
    {
        foreach (ProblemDescriptor entry in ProblemCatalogue.All)
        {
            ToolRun run = ToolRun.Of("explain", entry.Code);
            Assert.Equal(0, run.ExitCode);
            Assert.Contains(entry.Remedy, run.Output, StringComparison.Ordinal);
        }
    }

    [Fact]
    public void Input_file_gz_and_standard_input_give_the_same_bytes()
    {
        using var folder = new TemporaryFolder();
        string text = Molecules.List(60);
        string plain = folder.Write("a.smi", text);
        string packed = folder["b.smi.gz"];
        using (var gzip = new GZipStream(File.Create(packed), CompressionLevel.Fastest))
        {
            gzip.Write(Encoding.UTF8.GetBytes(text));
        }

        byte[] expected = ToolRun.Of("predict", plain, "--format", "ndjson").OutputBytes;

        Assert.Equal(expected, ToolRun.Of("predict", packed, "--format", "ndjson").OutputBytes);
        Assert.Equal(expected, ToolRun.WithInput(text, "predict", "-", "--format", "ndjson").OutputBytes);
        Assert.Equal(expected, ToolRun.WithInput("\uFEFF" + text.ReplaceLineEndings("\r\n"), "predict", "--format", "ndjson").OutputBytes);
        Assert.NotEqual(0xEF, expected[0]);
        Assert.DoesNotContain((byte)'\r', expected);
    }

    [Fact]
    public void Input_name_in_latin_1_is_kept()
    {
        using var output = new MemoryStream();
        using var input = new MemoryStream([.. "CCC n"u8, 0xE4, .. "me\n"u8]);

        ToolRun.On(input, output, default, "sites", "-", "--format", "ndjson");

        using JsonDocument document = JsonDocument.Parse(output.ToArray());
        Assert.Equal("n\u00E4me", document.RootElement.GetProperty("name").GetString());
    }

    [Fact]
    public void Reagent_of_a_user_table_reaches_the_result()
    {
        using var folder = new TemporaryFolder();
        string table = folder.Write("own.csv", "id,bond,structure,kilojoules_per_mole,sigma,source,locator\na1,C-H,C[CH2:1]C,400,1,OWN,page 1\n");

        Assert.Equal(0, ToolRun.Of("data", "check", table).ExitCode);
        Assert.Contains("\"kilojoulesPerMole\": 400,", ToolRun.Of("predict", "CCC", "--bde-table", table, "--format", "json").Output, StringComparison.Ordinal);
        File.AppendAllText(table, "a1,C-H,C[CH3:1],many,1,OWN,page 1\n");
        ToolRun refused = ToolRun.Of("data", "check", table);
        Assert.Equal(3, refused.ExitCode);
        Assert.Contains("line 3", refused.Error, StringComparison.Ordinal);
    }

    private static int CountFields(string line)
    {
        int count = 1;
        bool quoted = false;
        foreach (char c in line)
        {
            quoted ^= c == '"';
            count += c == ',' && !quoted ? 1 : 0;
        }

        return count;
    }
}
