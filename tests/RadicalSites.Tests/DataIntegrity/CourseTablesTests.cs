using System.Collections.Generic;
using System.Linq;
using System.Text.Json;
using RadicalSites.Canonical;
using RadicalSites.Course;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.DataIntegrity;

/// <summary>The tables of consecutive rates and of radical ends: keys, counts, strictness.</summary>
public class CourseTablesTests
{
    private const string Header =
        "id,carrier,substrate,reference,ratio,relative_sigma,temperature_K,kind,source,locator,checked,note\n";

    [Theory]
    [InlineData("consecutive_rates.csv", 14)]
    [InlineData("radical_ends.csv", 1)]
    public void Tables_have_their_rows_and_every_key_resolves(string file, int rows)
    {
        string[] lines = [.. CsvTable.EmbeddedText(file).Split('\n').Where(static line => line.Length > 0 && line[0] != '#')];
        string[] columns = lines[0].Split(',');
        HashSet<string> keys = [.. Keys()];

        Assert.Equal(rows, lines.Length - 1);
        foreach (string line in lines.Skip(1))
        {
            Assert.Contains(line.Split(',')[System.Array.IndexOf(columns, "source")], keys);
        }
    }

    [Fact]
    public void Consecutive_rates_fall_along_each_series_and_with_temperature()
    {
        // Chloromethanes per molecule: CH3Cl > CH2Cl2 > CHCl3, and the ratios to methane shrink as it gets hotter.
        foreach (double kelvin in new[] { 300.0, 400, 500, 700 })
        {
            double[] ratios = [.. new[] { "CCl", "ClCCl", "ClC(Cl)Cl" }.Select(smiles => Ratio(smiles, "C", kelvin))];
            double[] hotter = [.. new[] { "CCl", "ClCCl", "ClC(Cl)Cl" }.Select(smiles => Ratio(smiles, "C", kelvin + 10))];
            Assert.True(ratios[0] > ratios[1] && ratios[1] > ratios[2]);
            Assert.All(Enumerable.Range(0, 3), i => Assert.True(hotter[i] < ratios[i]));
        }
    }

    [Theory]
    [InlineData(298.15, 4.72)]
    [InlineData(373.15, 3.88)]
    [InlineData(713.15, 1.81)]
    public void Consecutive_rates_at_a_row_are_the_row(double kelvin, double expected) =>
        Assert.Equal(expected, Ratio("CCl", "C", kelvin), 9);

    [Fact]
    public void Consecutive_rates_lead_between_members_of_a_series() =>
        Assert.Equal(3.23 / 4.72, Ratio("ClCCl", "CCl", 298.15), 9);

    [Theory]
    [InlineData("X1,Cl,CCl,C,4.7,0.1,298,measured,A,B,no,\nX1,Cl,CCl,C,4.7,0.1,398,measured,A,B,no,")]
    [InlineData("X1,Cl,CCl,C,-4.7,0.1,298,measured,A,B,no,")]
    [InlineData("X1,Cl,C(Cl,C,4.7,0.1,298,measured,A,B,no,")]
    [InlineData("X1,Cl,CCl,C,4.7,0.1,298,measured,,B,no,")]
    [InlineData("X1,Cl,CCl,C,4.7,0.1,298")]
    public void Read_faulty_row_is_refused_with_its_place(string rows)
    {
        TableFormatException exception = Assert.Throws<TableFormatException>(() => ConsecutiveRates.Read(Header + rows));

        Assert.True(exception.Line >= 2);
    }

    private static double Ratio(string substrate, string reference, double kelvin) => ConsecutiveRates.Default.Find(
        "Cl", Plain(substrate), kelvin, new Dictionary<string, double> { [Plain(reference)] = 1 })!.Rate;

    private static string Plain(string smiles) =>
        CanonicalSmiles.Write(SmilesReader.Parse(smiles));

    private static IEnumerable<string> Keys() =>
        typeof(Molecule).Assembly.GetManifestResourceNames()
            .Where(static name => name.Contains("bibliography", System.StringComparison.Ordinal))
            .SelectMany(static name => JsonDocument.Parse(
                CsvTable.EmbeddedText(name["RadicalSites.Data.".Length..])).RootElement.EnumerateArray())
            .Select(static entry => entry.GetProperty("key").GetString()!);
}
