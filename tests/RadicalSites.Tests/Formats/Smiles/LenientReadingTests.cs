using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Formats.Smiles;

/// <summary>Lenient reading passes over slips and reports each.</summary>
public sealed class LenientReadingTests
{
    [Theory]
    [InlineData("C[C@](F)Cl", "smiles-stereo-neighbors", 0)]
    [InlineData("F/C(\\Cl)=C/F", "smiles-direction-conflict", 1)]
    [InlineData("CCO ethanol", "smiles-white-space", 0)]
    public void TryParse_slip_is_left_out_and_reported(string text, string code, int stereo)
    {
        Assert.False(SmilesReader.TryParse(text, SmilesReaderOptions.Strict, out _, out FormatProblem? problem, out _));
        Assert.Equal(code, problem.Code);

        Assert.True(SmilesReader.TryParse(text, SmilesReaderOptions.Lenient, out Molecule? molecule, out _, out IReadOnlyList<FormatProblem> remarks));
        Assert.Equal(code, Assert.Single(remarks).Code);
        Assert.InRange(molecule.StereoElements.Count, 0, stereo);
    }

    [Fact]
    public void TryParse_incomplete_direction_is_reported()
    {
        Assert.True(SmilesReader.TryParse("F/C=CF", SmilesReaderOptions.Strict, out _, out _, out IReadOnlyList<FormatProblem> remarks));
        Assert.Equal("smiles-direction-incomplete", Assert.Single(remarks).Code);
    }

    [Theory]
    [InlineData("C1CC")]
    [InlineData("n1cccc1")]
    public void TryParse_wrong_structure_is_refused(string text) =>
        Assert.False(SmilesReader.TryParse(text, SmilesReaderOptions.Lenient, out _, out _, out _));

    // The ring digit of the last atom stands before its fluorine, so it is the third neighbour.
    [Theory]
    [InlineData("ClC(Br)=[C@]=C1F.C1", "ClC(Br)=[C@]=C(C)F")]
    [InlineData("ClC(Br)=[C@]=C12.F2.C1", "ClC(Br)=[C@@]=C(F)C")]
    public void Parse_ring_digit_at_an_allene_end_keeps_its_place(string text, string plain) =>
        Assert.Equal(
            RadicalSites.Canonical.CanonicalSmiles.Write(SmilesReader.Parse(plain)),
            RadicalSites.Canonical.CanonicalSmiles.Write(SmilesReader.Parse(text)));

    // A centre that starts the text has its lone pair first, also when its first neighbour is a ring bond.
    [Fact]
    public void Parse_lone_pair_of_a_first_atom_comes_first() =>
        Assert.Equal(
            RadicalSites.Canonical.CanonicalSmiles.Write(SmilesReader.Parse("[S@](C)(=O)CC")),
            RadicalSites.Canonical.CanonicalSmiles.Write(SmilesReader.Parse("C1.[S@]1(=O)CC")));
}
