using System;
using System.IO;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Reporting;
using RadicalSites.Thermochemistry;

namespace RadicalSites.Tests.Thermochemistry;

/// <summary>Every site of twenty medicinal molecules: value, sigma, basis and rows as reviewed line by line.</summary>
/// <remarks>
/// The structures are facts of the trade (common practice, no source). A change of a table shows here as a difference to
/// be reviewed; RADICALSITES_APPROVE=1 writes the new text.
/// </remarks>
public sealed class DrugLikeSitesTests
{
    private static readonly string Folder =
        Path.Combine(RepositoryRoot.Path, "tests", "RadicalSites.Tests", "TestData", "DrugLike");

    [Fact]
    public void Sites_of_twenty_medicinal_molecules_are_the_approved_ones()
    {
        string path = Path.Combine(Folder, "sites.approved.txt");
        string received = Received();
        if (Environment.GetEnvironmentVariable("RADICALSITES_APPROVE") == "1")
        {
            File.WriteAllText(path, received);
        }

        Assert.Equal(File.ReadAllText(path).ReplaceLineEndings("\n"), received);
    }

    [Fact]
    public void Every_value_carries_a_sigma_and_rows_that_exist_and_every_blank_a_reason()
    {
        string[] ids =
        [
            .. BdeTable.Default.Entries.Select(static entry => entry.Id), .. BdeTable.Default.ClassEntries.Select(static entry => entry.Id),
        ];
        foreach (string line in Molecules())
        {
            foreach (BdeAssignment bde in Halogenation.FindSites(SmilesReader.Parse(line.Split(' ')[0])).Sites.Select(static site => site.Bde))
            {
                if (bde.KilojoulesPerMole is { } value)
                {
                    Assert.InRange(value, 300, 450);
                    Assert.True(bde.SigmaKilojoulesPerMole > 0);
                    Assert.NotEmpty(bde.Evidence);
                    Assert.All(bde.Evidence, row => Assert.Contains(row.Entry, ids));
                    Assert.All(bde.Evidence, static row => Assert.NotNull(Bibliography.Find(row.Source)));
                }
                else
                {
                    Assert.NotEmpty(bde.Reason!);
                }
            }
        }
    }

    private static string[] Molecules() => [.. File.ReadAllLines(Path.Combine(Folder, "molecules.smi")).Where(static line => line.Length > 0)];

    private static string Received()
    {
        using var writer = new StringWriter { NewLine = "\n" };
        string[] lines = Molecules();
        for (int i = 0; i < lines.Length; i++)
        {
            string[] parts = lines[i].Split(' ', 2);
            TextReport.Write(writer, new RecordSource(i + 1, parts[0], parts[1]), Halogenation.FindSites(SmilesReader.Parse(parts[0])));
            writer.Write("\n");
        }

        return writer.ToString().ReplaceLineEndings("\n");
    }
}
