using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Interference;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Interference;

/// <summary>
/// Groups that spoil the reaction, and molecules without one. Which groups matter: March's Advanced Organic Chemistry,
/// ch. 11, 12, 14, 15, 19, and common practice, no source.
/// </summary>
public sealed class InterferenceFinderTests
{
    public static TheoryData<string, string, string> Hits()
    {
        var data = new TheoryData<string, string, string>();
        foreach (string[] row in Rows("hits.tsv"))
        {
            data.Add(row[0], row[1], row[2]);
        }

        return data;
    }

    public static TheoryData<string> Clean()
    {
        var data = new TheoryData<string>();
        foreach (string[] row in Rows("clean.tsv"))
        {
            data.Add(row[0]);
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Hits))]
    public void Find_spoiling_group_is_reported_with_its_atoms(string smiles, string expected, string reagent)
    {
        Molecule molecule = SmilesReader.Parse(smiles);
        HalogenSources sources = reagent switch
        {
            "NBS" => HalogenSources.NitrogenHalogen,
            "Cl2" => HalogenSources.Molecular,
            _ => HalogenSources.All,
        };

        IReadOnlyList<InterferenceHit> hits = InterferenceFinder.Find(molecule, sources);

        Assert.Equal(expected, Codes(hits));
        Assert.All(hits, hit => Assert.All(hit.Atoms, atom => Assert.InRange(atom, 0, molecule.AtomCount - 1)));
    }

    [Theory]
    [MemberData(nameof(Clean))]
    public void Find_clean_molecule_gives_no_caution(string smiles) =>
        Assert.Equal("", Codes(InterferenceFinder.Find(SmilesReader.Parse(smiles))));

    [Fact]
    public void Cases_cover_at_least_forty_of_each_kind()
    {
        Assert.True(Rows("hits.tsv").Count() >= 40);
        Assert.True(Rows("clean.tsv").Count() >= 40);
    }

    [Fact]
    public void Rules_every_catalogue_entry_has_a_rule_and_a_case()
    {
        string[] rules = InterferenceRules.All.Select(static rule => rule.Problem.Code).ToArray();
        string[] entries = ProblemCatalogue.All.Select(static entry => entry.Code)
            .Where(static code => code.StartsWith("interference-", StringComparison.Ordinal)).ToArray();
        Assert.Equal(entries.Order(StringComparer.Ordinal), rules.Order(StringComparer.Ordinal));
    }

    [Theory]
    [InlineData("CC(C)(C)O", "interference-tertiary-alcohol")]
    [InlineData("CCC(=O)O", "interference-carboxylic-acid")]
    [InlineData("Cc1ccncc1", "interference-basic-heteroarene")]
    [InlineData("Cc1ccc2ccccc2c1", "interference-polycyclic-arene")]
    [InlineData("Cc1cc(C)cc(C)c1", "interference-polycyclic-arene")]
    [InlineData("[Fe+3].CCC", "interference-metal")]
    public void Find_remark_is_reported(string smiles, string code) =>
        Assert.Contains(InterferenceFinder.Find(SmilesReader.Parse(smiles)), hit => hit.Problem.Code == code);

    private static string Codes(IReadOnlyList<InterferenceHit> hits) =>
        string.Join(',', hits.Where(static hit => hit.Problem.Severity != Severity.Info)
            .Select(static hit => hit.Problem.Code["interference-".Length..])
            .Order(StringComparer.Ordinal));

    private static IEnumerable<string[]> Rows(string file) =>
        File.ReadLines(Path.Combine(AppContext.BaseDirectory, "TestData", "Interference", file))
            .Where(static line => line.Length > 0 && line[0] != '#')
            .Select(static line => line.Split('\t'));
}
