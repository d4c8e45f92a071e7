using System;
using System.Collections.Generic;
using System.Linq;
using System.Text.RegularExpressions;
using RadicalSites.Diagnostics;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.DataIntegrity;

/// <summary>Hess's law over the C-H table: radical + hydrogen atom - parent from tabulated enthalpies of formation.</summary>
/// <remarks>Rows derived from the same enthalpies check the arithmetic; rows of other sources are an outside check.</remarks>
public sealed partial class HessTests
{
    private const double Allowed = 4;

    [Fact]
    public void Bond_enthalpies_agree_with_formation_enthalpies_or_are_explained()
    {
        var explained = CsvTable.ReadEmbedded("hess_differences.csv", "row", "difference", "explanation").Rows
            .ToDictionary(static row => row.Required("row"), static row => (row.Number("difference", -60, 60), row.Required("explanation")));
        Dictionary<BdeEntry, double> differences = Differences();

        foreach ((BdeEntry entry, double difference) in differences)
        {
            if (Math.Abs(difference) > Allowed)
            {
                Assert.True(explained.ContainsKey(entry.Id), $"{entry.Id} {entry.Substance} differs by {difference:F1} kJ/mol");
                Assert.Equal(difference, explained[entry.Id].Item1, 0.06);
            }
        }

        Assert.All(explained.Keys, id => Assert.Contains(differences, pair => pair.Key.Id == id && Math.Abs(pair.Value) > Allowed));
    }

    [Fact]
    public void Check_covers_more_than_thirty_rows_and_most_of_other_sources_agree()
    {
        Dictionary<BdeEntry, double> differences = Differences();
        double[] outside = [.. differences.Where(static pair => !pair.Key.Locator.StartsWith("derived", StringComparison.Ordinal)).Select(static pair => Math.Abs(pair.Value))];

        Assert.True(differences.Count >= 100);
        Assert.True(outside.Length >= 30);
        Assert.True(outside.Count(static difference => difference <= Allowed) > outside.Length / 2);
    }

    [Fact]
    public void Preferred_rows_differ_within_three_sigma()
    {
        foreach ((BdeEntry entry, double difference) in Differences().Where(static pair => pair.Key.IsPreferred))
        {
            Assert.True(Math.Abs(difference) <= Math.Max(1, 3 * entry.SigmaKilojoulesPerMole), entry.Id);
        }
    }

    private static Dictionary<BdeEntry, double> Differences()
    {
        var enthalpies = CsvTable.ReadEmbedded(
            "formation_enthalpies.csv", "id", "role", "substance", "smiles", "kilojoules_per_mole", "sigma", "source", "locator").Rows
            .ToDictionary(static row => row.Required("smiles"), static row => row.Number("kilojoules_per_mole", -1000, 1000));
        double hydrogen = enthalpies["[H]"];
        var differences = new Dictionary<BdeEntry, double>();
        foreach (BdeEntry entry in BdeTable.Default.Entries)
        {
            Match carbon = Marked().Match(entry.Smiles);
            int left = (carbon.Groups[2].Length == 0 ? 1 : int.Parse(carbon.Groups[2].Value, System.Globalization.CultureInfo.InvariantCulture)) - 1;
            string hydrogens = left == 0 ? "" : left == 1 ? "H" : "H" + left.ToString(System.Globalization.CultureInfo.InvariantCulture);
            string parent = Marked().Replace(entry.Smiles, carbon.Groups[1].Value);
            string radical = Marked().Replace(entry.Smiles, "[" + carbon.Groups[1].Value + hydrogens + "]");
            if (enthalpies.TryGetValue(parent, out double whole) && enthalpies.TryGetValue(radical, out double part))
            {
                differences.Add(entry, entry.KilojoulesPerMole - (part + hydrogen - whole));
            }
        }

        return differences;
    }

    [GeneratedRegex(@"\[([Cc])H(\d?):1\]")]
    private static partial Regex Marked();
}
