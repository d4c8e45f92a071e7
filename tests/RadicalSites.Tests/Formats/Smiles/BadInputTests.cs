using System;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Formats.Smiles;

/// <summary>Bad input is a coded problem with a position, never a stack trace.</summary>
public sealed class BadInputTests
{
    [Theory]
    [InlineData("", "smiles-empty", 0)]
    [InlineData("C1CC", "smiles-ring-unclosed", 1)]
    [InlineData("C(C", "smiles-branch-unclosed", 1)]
    [InlineData("CC)C", "smiles-branch-unopened", 2)]
    [InlineData("C()C", "smiles-branch-misplaced", 2)]
    [InlineData("(C)C", "smiles-branch-misplaced", 0)]
    [InlineData("CX", "smiles-unknown-element", 1)]
    [InlineData("[Xx]", "smiles-unknown-element", 1)]
    [InlineData("[C", "smiles-bracket", 0)]
    [InlineData("C=", "smiles-bond-dangling", 1)]
    [InlineData("=C", "smiles-bond-dangling", 0)]
    [InlineData("C==C", "smiles-bond-dangling", 2)]
    [InlineData("C11", "smiles-ring-bond-duplicate", 2)]
    [InlineData("C1C1", "smiles-ring-bond-duplicate", 3)]
    [InlineData("C=1CCCC#1", "smiles-ring-bond-mismatch", 8)]
    [InlineData("C%1CC", "smiles-ring-number", 1)]
    [InlineData("C!", "smiles-unexpected-character", 1)]
    [InlineData("CC name", "smiles-white-space", 2)]
    [InlineData("F/C(\\Cl)=C/F", "smiles-direction-conflict", 4)]
    [InlineData("C[C@](F)Cl", "smiles-stereo-neighbors", 1)]
    [InlineData("C[C@H]Cl", "smiles-stereo-neighbors", 1)]
    [InlineData("C(C)(C)(C)(C)C", "chemistry-valence", 0)]
    [InlineData("[CH5]", "chemistry-valence", 0)]
    [InlineData("cc", "chemistry-aromatic-outside-ring", 0)]
    [InlineData("c1ccccn1c", "chemistry-aromatic-outside-ring", 8)]
    [InlineData("n1cccc1", "chemistry-no-kekule-form", 0)]
    [InlineData("c1cccc1", "chemistry-no-kekule-form", 0)]
    public void TryParse_bad_text_is_coded_with_its_position(string text, string code, int position)
    {
        bool ok = SmilesReader.TryParse(text, out _, out FormatProblem? problem);

        Assert.Equal(code, ok ? "" : problem!.Code);
        if (!ok && code != "chemistry-no-kekule-form")
        {
            Assert.Equal(position, problem!.Position);
        }
    }

    [Fact]
    public void Parse_bad_text_throws_with_a_caret_under_the_place()
    {
        var error = Assert.Throws<SmilesFormatException>(() => SmilesReader.Parse("CC1CC"));

        Assert.Equal("smiles-ring-unclosed", error.Code);
        Assert.Contains("CC1CC\n    ^", error.Message, StringComparison.Ordinal);
        Assert.Contains("remedy:", error.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void TryParse_ten_megabyte_line_ends_quickly_with_a_short_message()
    {
        string chain = new('C', 10_000_000);
        Assert.True(SmilesReader.TryParse(chain, out Molecule? molecule, out _));
        Assert.Equal(10_000_000, molecule.AtomCount);

        Assert.False(SmilesReader.TryParse(chain + "(", out _, out FormatProblem? problem));
        Assert.True(problem.Render().Length < 600);
    }

    [Fact]
    public void TryParse_deep_nesting_needs_no_stack()
    {
        string nested = string.Concat(System.Linq.Enumerable.Repeat("C(", 100_000)) + "C" + new string(')', 100_000);

        Molecule molecule = SmilesReader.Parse(nested);

        Assert.Equal(100_001, molecule.AtomCount);
        Assert.Equal(100_001, SmilesReader.Parse(SmilesWriter.Write(molecule)).AtomCount);
    }

    [Theory]
    [InlineData("[Na+]")]
    [InlineData("c1ccccc1")]
    [InlineData("O")]
    public void FindSites_molecule_without_sp3_hydrogen_is_a_valid_answer(string smiles)
    {
        SiteReport report = Halogenation.FindSites(SmilesReader.Parse(smiles));

        Assert.Empty(report.Sites);
        Assert.Contains(report.Diagnostics, static d => d.Code == "sites-none");
    }
}
