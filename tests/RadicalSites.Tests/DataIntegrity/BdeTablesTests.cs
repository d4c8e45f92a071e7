using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using System.Text.RegularExpressions;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.DataIntegrity;

/// <summary>The thermochemical tables: keys both ways, ranges, duplicates, known orders, checksum and changes.</summary>
public sealed partial class BdeTablesTests
{
    private static readonly string[] Tables =
        ["bde.csv", "bde_classes.csv", "bonds.csv", "formation_enthalpies.csv", "hydrogen_bond_increments.csv"];

    [Fact]
    public void Tables_have_their_rows()
    {
        BdeTable table = BdeTable.Default;

        Assert.Equal(187, table.Entries.Count);
        Assert.True(table.Entries.Select(static entry => entry.Smiles).Distinct().Count() >= 110);
        Assert.True(table.BondEntries.Count >= 110);
    }

    [Fact]
    public void Version_is_pinned_and_stands_in_the_changes()
    {
        // A changed value changes the checksum; the new one needs a line in CHANGES.md.
        Assert.Contains(BdeTable.Default.Version.Split('-')[1], CsvTable.EmbeddedText("CHANGES.md"), StringComparison.Ordinal);
        Assert.Contains("## " + BdeTable.ShippedNumber, CsvTable.EmbeddedText("CHANGES.md"), StringComparison.Ordinal);
    }

    [Fact]
    public void Sources_resolve_both_ways()
    {
        string[] cited = [.. Tables.SelectMany(static file => Column(file, "source")).Distinct()];

        Assert.All(cited, static key => Assert.NotNull(Bibliography.Find(key)));
        using var document = System.Text.Json.JsonDocument.Parse(CsvTable.EmbeddedText("bibliography.json"));
        Assert.All(
            document.RootElement.EnumerateArray().Select(static entry => entry.GetProperty("key").GetString()!),
            key => Assert.Contains(key, cited));
    }

    [Fact]
    public void Every_publication_is_cited_by_a_table_or_a_comment()
    {
        string data = string.Concat(new[] { "src/RadicalSites", "tests/RadicalSites.Tests" }
            .SelectMany(static folder => Directory.EnumerateFiles(Path.Combine(RepositoryRoot.Path, folder), "*.*", SearchOption.AllDirectories))
            .Where(static file => (file.EndsWith(".csv", StringComparison.Ordinal) || file.EndsWith(".cs", StringComparison.Ordinal))
                && !file.Contains("/obj/", StringComparison.Ordinal) && !file.Contains("/bin/", StringComparison.Ordinal))
            .Select(File.ReadAllText));

        Assert.All(Bibliography.All, entry => Assert.Contains(entry.Key, data, StringComparison.Ordinal));
    }

    [Fact]
    public void Every_row_names_its_place_and_a_fair_uncertainty()
    {
        Assert.All(BdeTable.Default.Entries, static entry =>
        {
            Assert.NotEmpty(entry.Locator);
            Assert.InRange(entry.SigmaKilojoulesPerMole, 0.05, 17);
            Assert.InRange(entry.KilojoulesPerMole, 310, 560);
        });
    }

    [Fact]
    public void Every_bond_has_exactly_one_preferred_row_and_the_readings_of_it_are_listed()
    {
        foreach (IGrouping<string, BdeEntry> bond in BdeTable.Default.Entries.GroupBy(static entry => entry.Smiles))
        {
            BdeEntry[] rows = [.. bond];
            Assert.True(rows.Count(static row => row.IsPreferred) == 1, bond.Key);
            Assert.All(rows, row => Assert.All(rows.Where(other => other.Id != row.Id), other => Assert.Contains(other.Id, row.Checked, StringComparison.Ordinal)));
            Assert.All(rows.Where(row => row.IsPreferred && rows.Length > 1), static row => Assert.StartsWith("preferred:", row.Note, StringComparison.Ordinal));
        }
    }

    [Fact]
    public void Second_readings_give_the_difference_of_the_two_values()
    {
        var byId = BdeTable.Default.Entries.ToDictionary(static entry => entry.Id);
        foreach (BdeEntry entry in BdeTable.Default.Entries.Where(static entry => entry.Checked != "none"))
        {
            foreach (Match reading in Reading().Matches(entry.Checked))
            {
                double difference = double.Parse(reading.Groups[2].Value, CultureInfo.InvariantCulture);
                Assert.Equal(byId[reading.Groups[1].Value].KilojoulesPerMole - entry.KilojoulesPerMole, difference, 0.051);
            }
        }
    }

    [Fact]
    public void Sp3_rows_are_found_by_their_own_molecule()
    {
        int found = 0;
        foreach (BdeEntry entry in BdeTable.Default.Entries)
        {
            SiteAnalysis analysis = SiteFinder.Find(SmilesReader.Parse(entry.Smiles));
            if (analysis.SiteOf(entry.Carbon) is { } site)
            {
                BdeEntry[] rows = [.. BdeTable.Default.FindEntries(analysis, site)];
                Assert.Contains(rows, row => row.Id == entry.Id);
                Assert.True(rows[0].IsPreferred);
                found++;
            }
        }

        Assert.True(found > 150);
    }

    [Fact]
    public void Class_members_exist_and_agree_with_their_class()
    {
        var byId = BdeTable.Default.Entries.ToDictionary(static entry => entry.Id);
        foreach (BdeClassEntry entry in BdeTable.Default.ClassEntries)
        {
            string[] members = [.. RowId().Matches(entry.Locator).Select(static match => match.Value)];
            Assert.NotEmpty(members);
            Assert.All(members, id => Assert.Contains(id, byId.Keys));
            if (!entry.IsAnalogy && entry.Kind is ("base" or "group"))
            {
                double mean = members.Average(id => byId[id].KilojoulesPerMole);
                Assert.True(
                    Math.Abs(mean - entry.KilojoulesPerMole) <= (2 * entry.SigmaKilojoulesPerMole) + 3,
                    $"{entry.Id}: members average {mean:F1}, class {entry.KilojoulesPerMole:F1}");
            }
        }
    }

    [Fact]
    public void Classes_follow_the_known_order()
    {
        // Order of C-H strengths; common practice, no source.
        double[] falling =
        [
            .. new[] { "base-methyl", "base-primary", "base-secondary", "base-tertiary", "benzylic-primary", "benzylic-benzylic-secondary" }
                .Select(static id => BdeTable.Default.ClassEntries.Single(entry => entry.Id == id).KilojoulesPerMole),
        ];

        Assert.Equal(falling.OrderDescending(), falling);
        Assert.Equal(6, falling.Distinct().Count());
    }

    [Theory]
    [InlineData("H-Cl", "H-Br")]
    [InlineData("H-F", "H-Cl")]
    [InlineData("H-Br", "H-I")]
    [InlineData("Cl-Cl", "Br-Br")]
    [InlineData("CH3-Cl", "CH3-Br")]
    [InlineData("iPr-Br", "iPr-I")]
    public void Halogen_bonds_weaken_down_the_group(string stronger, string weaker) =>
        Assert.True(BdeTable.Default.FindBond(stronger)!.KilojoulesPerMole > BdeTable.Default.FindBond(weaker)!.KilojoulesPerMole);

    private static IEnumerable<string> Column(string file, string column)
    {
        string[] lines = CsvTable.EmbeddedText(file).Split('\n');
        string header = lines.First(static line => line.Length > 0 && line[0] != '#').Trim('\r');
        return CsvTable.Read(file, CsvTable.EmbeddedText(file), header.Split(','), []).Rows.Select(row => row.Required(column));
    }

    [GeneratedRegex(@"(CH\d+) ([+-][\d.]+)")]
    private static partial Regex Reading();

    [GeneratedRegex(@"CH\d{3}")]
    private static partial Regex RowId();
}
