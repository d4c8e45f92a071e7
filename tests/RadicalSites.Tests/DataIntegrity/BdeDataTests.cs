using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Sites;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.DataIntegrity;

/// <summary>The tables of bond enthalpies: keys, ranges, order, checksum, Hess's law.</summary>
public sealed class BdeDataTests
{
    // A changed value changes this text: write the change to Data/CHANGES.md, raise the number, then renew it here.
    private const string PinnedVersion = "2026.1-92d6d7f6e0f1";

    private const double Hydrogen = 217.998;

    [Fact]
    public void Version_is_the_pinned_one_and_has_an_entry_among_the_changes()
    {
        Assert.Equal(PinnedVersion, BdeTable.Default.Version);
        string changes = File.ReadAllText(Path.Combine(RepositoryRoot.Path, "src", "RadicalSites", "Data", "CHANGES.md"));
        Assert.Contains("## " + BdeTable.ShippedNumber, changes, StringComparison.Ordinal);
    }

    [Fact]
    public void Sources_every_key_of_a_row_resolves()
    {
        IEnumerable<string> keys = BdeTable.Default.Entries.Select(static e => e.Source)
            .Concat(BdeTable.Default.ClassEntries.Select(static e => e.Source))
            .Concat(BdeTable.Default.BondEntries.Select(static e => e.Source));

        Assert.All(keys.Distinct(), static key => Assert.NotNull(Bibliography.Find(key)));
    }

    [Fact]
    public void Sources_every_publication_is_cited_by_a_table_or_a_comment()
    {
        string data = string.Concat(new[] { "src/RadicalSites", "tests/RadicalSites.Tests" }
            .SelectMany(static folder => Directory.EnumerateFiles(Path.Combine(RepositoryRoot.Path, folder), "*.*", SearchOption.AllDirectories))
            .Where(static file => (file.EndsWith(".csv", StringComparison.Ordinal) || file.EndsWith(".cs", StringComparison.Ordinal))
                && !file.Contains("/obj/", StringComparison.Ordinal) && !file.Contains("/bin/", StringComparison.Ordinal))
            .Select(File.ReadAllText));

        Assert.All(Bibliography.All, entry => Assert.Contains(entry.Key, data, StringComparison.Ordinal));
    }

    [Fact]
    public void Rows_there_are_at_least_150_bonds_and_one_preferred_row_for_each()
    {
        BdeTable table = BdeTable.Default;
        Assert.True(table.Entries.Count >= 150);
        Assert.All(
            table.Entries.GroupBy(static e => e.Smiles),
            static group => Assert.Single(group, static e => e.IsPreferred));
        Assert.All(table.Entries, static e => Assert.InRange(e.KilojoulesPerMole, 310, 570));
        Assert.All(table.Entries, static e => Assert.InRange(e.SigmaKilojoulesPerMole, 0.05, 20));
    }

    [Fact]
    public void Rows_classes_fall_from_methyl_to_doubly_benzylic()
    {
        double[] values =
        [
            Value("C", SiteDegree.Methyl), Value("CC", SiteDegree.Primary), Value("CCC", SiteDegree.Secondary),
            Value("CC(C)C", SiteDegree.Tertiary), Value("Cc1ccccc1", SiteDegree.Primary),
            Value("c1ccc(Cc2ccccc2)cc1", SiteDegree.Secondary),
        ];

        Assert.Equal(values.OrderDescending(), values);
    }

    [Fact]
    public void Hess_formation_enthalpies_give_the_preferred_values()
    {
        CsvTable table = CsvTable.ReadEmbedded(
            "formation_enthalpies.csv", "id", "row", "smiles", "radical", "radical_kilojoules", "radical_sigma", "parent",
            "parent_kilojoules", "parent_sigma", "source", "explanation");
        Assert.True(table.Rows.Count >= 30);
        foreach (CsvRow row in table.Rows)
        {
            double hess = row.Number("radical_kilojoules", -2000, 2000) + Hydrogen - row.Number("parent_kilojoules", -2000, 2000);
            BdeEntry preferred = BdeTable.Default.Entries.Single(e => e.IsPreferred && e.Smiles == row.Text("smiles"));
            Assert.NotNull(Bibliography.Find(row.Required("source")));
            Assert.True(
                Math.Abs(hess - preferred.KilojoulesPerMole) <= 4 || row.Text("explanation").Length > 0,
                $"{row.Text("id")}: {hess:F1} against {preferred.Id} {preferred.KilojoulesPerMole:F1} without an explanation");
        }
    }

    [Fact]
    public void Increments_shipped_coefficients_are_those_of_the_fit()
    {
        IncrementFit fit = IncrementRegression.Fit();
        CsvTable table = CsvTable.ReadEmbedded("increments.csv", "name", "kilojoules_per_mole", "standard_error", "rows");

        Assert.Equal(fit.Coefficients.Select(static c => c.Name), table.Rows.Select(static r => r.Text("name")));
        foreach ((IncrementCoefficient coefficient, CsvRow row) in fit.Coefficients.Zip(table.Rows))
        {
            Assert.Equal(coefficient.KilojoulesPerMole, row.Number("kilojoules_per_mole", -200, 600), 0.02);
            Assert.Equal(coefficient.StandardErrorKilojoulesPerMole, row.Number("standard_error", 0, 100), 0.02);
        }

        // The scatter of the literature rows bounds what any increments can do.
        Assert.InRange(fit.LeaveOneOutError, 0, 10);
    }

    private static double Value(string smiles, SiteDegree degree) => Halogenation.FindSites(SmilesReader.Parse(smiles))
        .Sites.First(site => site.Site.Degree == degree).Bde.KilojoulesPerMole!.Value;
}
