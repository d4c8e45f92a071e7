using System;
using System.Collections.Generic;
using System.IO;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Molfile;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Formats.Molfile;

/// <summary>read(write(m)) = m by canonical SMILES, both versions.</summary>
public sealed class MolfileRoundTripTests
{
    [Theory]
    [InlineData(MolfileVersion.V2000)]
    [InlineData(MolfileVersion.V3000)]
    public void Write_molecules_with_stereo_reads_back_the_same(MolfileVersion version)
    {
        string[] lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "TestData", "Molfile", "stereo.smi"));
        Assert.Empty(Differences(lines.Where(static line => !line.StartsWith('#')), version));
    }

    [Fact]
    public void Write_molecules_of_the_NCI_file_reads_back_the_same()
    {
        string[] lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "TestData", "Reference", "nci_first_5k.smi"));
        Assert.Empty(Differences(lines, null));
    }

    [Theory]
    [InlineData("[CH3]")]
    [InlineData("[CH2]")]
    [InlineData("[CH]")]
    [InlineData("[Na]")]
    [InlineData("[Na+].[Cl-]")]
    [InlineData("[NaH]")]
    [InlineData("[C]")]
    [InlineData("[13CH3][N+](C)(C)C")]
    [InlineData("[2H]C([3H])O[H]")]
    [InlineData("C[SH](C)C")]
    [InlineData("CS(C)(=O)=O")]
    [InlineData("[CH3:7][OH:12]")]
    [InlineData("[CH3:1234]C")]
    [InlineData("[H][H].[H+]")]
    [InlineData("c1cc[nH]c1")]
    [InlineData("[Fe+3].[O-]Cl(=O)(=O)=O")]
    [InlineData("CC=[C@]=CC")]
    [InlineData("CC=[C@@]=CC")]
    [InlineData("CC(Cl)=[C@]=C(F)C")]
    [InlineData("C/C=C=C=C/C")]
    [InlineData("C/C=C=C=C\\C")]
    [InlineData("C/C=N/[H]")]
    [InlineData("[H]/N=C/C")]
    [InlineData("F/C=C/F.F/C=C\\F")]
    [InlineData("B1=NB=NB=N1")]
    [InlineData("[CH2-][CH2+]")]
    [InlineData("O=[N+]([O-])c1ccccc1")]
    public void Write_special_atoms_and_bonds_reads_back_the_same(string smiles) =>
        Assert.Empty(Differences([smiles], null));

    [Theory]
    [InlineData("*C", "molfile-write-wildcard")]
    [InlineData("[Cr]$[Cr]", "molfile-write-quadruple")]
    [InlineData("F[Pt@SP1](Cl)(Br)I", "molfile-write-stereo")]
    public void Write_what_the_format_cannot_hold_is_refused(string smiles, string code)
    {
        var refusal = Assert.Throws<MolfileFormatException>(() => MolfileWriter.Write(SmilesReader.Parse(smiles)));
        Assert.Equal(code, refusal.Code);
    }

    [Fact]
    public void Write_more_than_999_atoms_uses_V3000()
    {
        Molecule chain = SmilesReader.Parse(new string('C', 1200));
        string text = MolfileWriter.Write(chain);
        Assert.Contains("V3000", text, StringComparison.Ordinal);
        Assert.Equal(1200, MolfileReader.Parse(text).AtomCount);
        Assert.Throws<ArgumentException>(() => MolfileWriter.Write(chain, new MolfileWriterOptions { Version = MolfileVersion.V2000 }));
    }

    [Fact]
    public void Write_keeps_the_coordinates_of_a_drawing()
    {
        Molecule drawn = MolfileReader.Parse(Drawings.Alanine);
        Molecule back = MolfileReader.Parse(MolfileWriter.Write(drawn));
        Assert.Equal(drawn.Coordinates!, back.Coordinates!);
        Assert.Equal(CanonicalSmiles.Write(drawn), CanonicalSmiles.Write(back));
    }

    private static List<string> Differences(IEnumerable<string> lines, MolfileVersion? version)
    {
        List<string> different = [];
        foreach (string line in lines)
        {
            string smiles = line.Split(' ', '\t')[0];
            if (smiles.Length == 0 || !SmilesReader.TryParse(smiles, out Molecule? molecule, out _))
            {
                continue;
            }

            molecule = StereoPerception.WithoutPhantoms(molecule);
            if (!MolfileWriter.TryWrite(molecule, new MolfileWriterOptions { Version = version }, out string? text, out var losses))
            {
                different.Add($"{smiles}: {losses[0].Message}");
                continue;
            }

            string expected = CanonicalSmiles.Write(molecule);
            string actual = MolfileReader.TryParse(text, out Molecule? back, out FormatProblem? problem)
                ? CanonicalSmiles.Write(back)
                : problem.Render();
            if (expected != actual)
            {
                different.Add($"{smiles}: {actual} is not {expected}");
            }
        }

        return different;
    }
}
