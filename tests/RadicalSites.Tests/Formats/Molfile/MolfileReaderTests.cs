using System;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Molfile;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Formats.Molfile;

/// <summary>Clauses of the CTfile format (BIOVIA, "CTfile Formats"), each on a small table made here.</summary>
public sealed class MolfileReaderTests
{
    [Theory]
    [InlineData("C   0  0", "C")]
    [InlineData("C   0  3", "[CH3+]")]
    [InlineData("C   0  5", "[CH3-]")]
    [InlineData("C   0  4", "[CH3]")]
    [InlineData("N   0  3", "[NH4+]")]
    [InlineData("Fe  0  1", "[Fe+3]")]
    [InlineData("C   1  0", "[13CH4]")]
    [InlineData("Cl  2  0", "[37ClH]")]
    [InlineData("D   0  0", "[2H]")]
    [InlineData("S   0  0  0  0  0  4", "[SH4]")]
    [InlineData("C   0  0  0  0  0 15", "[C]")]
    [InlineData("C   0  0  0  0  0  3", "[CH3]")]
    [InlineData("Na  0  0  0  0  0 15", "[Na]")]
    [InlineData("O   0  0  0  0  0  0  0  0  0  7  0  0", "[OH2:7]")]
    public void Atom_line_fields_give_charge_isotope_valence_and_map(string atom, string smiles) =>
        AssertSame(smiles, Drawings.Atoms([atom]));

    [Theory]
    [InlineData("M  CHG  1   1   1", "[CH3+].C")]
    [InlineData("M  CHG  2   1   1   2  -1", "[CH3+].[CH3-]")]
    [InlineData("M  RAD  1   2   2", "C.[CH3]")]
    [InlineData("M  RAD  1   1   3", "[CH2].C")]
    [InlineData("M  ISO  1   1  14", "[14CH4].C")]
    public void Property_lines_state_charge_radical_and_isotope(string line, string smiles) =>
        AssertSame(smiles, Drawings.Atoms(["C   0  0", "C   0  0"], line));

    [Fact]
    public void Property_line_CHG_supersedes_the_charges_of_the_atom_block() =>
        AssertSame("[CH3-].C", Drawings.Atoms(["C   0  0", "C   0  3"], "M  CHG  1   1  -1"));

    [Fact]
    public void Property_line_ISO_supersedes_the_mass_differences() =>
        AssertSame("[14CH4].C", Drawings.Atoms(["C   0  0", "C   1  0"], "M  ISO  1   1  14"));

    [Theory]
    [InlineData("A   0  0", "molfile-query-atom")]
    [InlineData("Q   0  0", "molfile-query-atom")]
    [InlineData("*   0  0", "molfile-query-atom")]
    [InlineData("R#  0  0", "molfile-query-atom")]
    [InlineData("R1  0  0", "molfile-query-atom")]
    [InlineData("L   0  0", "molfile-query-atom")]
    [InlineData("Qq  0  0", "molfile-atom-symbol")]
    [InlineData("C   0  0  0  2", "molfile-query-property")]
    public void Atom_line_of_a_query_or_unknown_symbol_is_refused(string atom, string code) =>
        AssertRefused(code, 5, Drawings.Atoms([atom]));

    [Theory]
    [InlineData("  1  2  5  0", "molfile-query-bond")]
    [InlineData("  1  2  8  0", "molfile-query-bond")]
    [InlineData("  1  2  1  0  0  1", "molfile-query-bond")]
    [InlineData("  1  2  9  0", "molfile-bond-type")]
    [InlineData("  1  2 10  0", "molfile-bond-type")]
    [InlineData("  1  3  1  0", "molfile-atom-number")]
    [InlineData("  0  2  1  0", "molfile-atom-number")]
    [InlineData("  1  1  1  0", "molfile-bond-duplicate")]
    [InlineData("  1  2 42  0", "molfile-field")]
    [InlineData("  1  x  1  0", "molfile-field")]
    public void Bond_line_that_is_no_bond_of_a_molecule_is_refused(string bond, string code) =>
        AssertRefused(code, 7, Drawings.Table(["C   0  0", "C   0  0"], [bond]));

    [Theory]
    [InlineData("M  ALS   1  2 F C   N", "molfile-query-property")]
    [InlineData("M  RGP  1   1   1", "molfile-query-property")]
    [InlineData("M  SUB  1   1   2", "molfile-query-property")]
    [InlineData("M  STY  1   1 SRU", "molfile-polymer")]
    [InlineData("M  ZBO  1   1   0", "molfile-bond-type")]
    [InlineData("M  CHG  1   9   1", "molfile-atom-number")]
    [InlineData("M  CHG  2   1   1", "molfile-property-line")]
    [InlineData("M  CHG  1   1  99", "molfile-property-line")]
    [InlineData("  1  2  1  0", "molfile-property-line")]
    public void Property_line_of_a_query_or_malformed_is_refused(string line, string code) =>
        AssertRefused(code, 6, Drawings.Atoms(["C   0  0"], line));

    [Fact]
    public void Bond_given_twice_is_refused_at_its_line() =>
        AssertRefused("molfile-bond-duplicate", 8, Drawings.Table(["C   0  0", "C   0  0"], ["  1  2  1  0", "  2  1  1  0"]));

    [Fact]
    public void Bond_type_4_is_localised()
    {
        string[] ring = [.. Enumerable.Range(1, 6).Select(static i => $"{i,3}{(i % 6) + 1,3}  4  0")];
        AssertSame("c1ccccc1", Drawings.Table([.. Enumerable.Repeat("C   0  0", 6)], ring));
        AssertSame("c1ccncc1", Drawings.Table(["N   0  0", .. Enumerable.Repeat("C   0  0", 5)], ring));
    }

    [Fact]
    public void Bond_type_4_places_the_only_possible_hydrogen_and_refuses_a_choice()
    {
        string[] ring = [.. Enumerable.Range(1, 5).Select(static i => $"{i,3}{(i % 5) + 1,3}  4  0")];
        string pyrrole = Drawings.Table(["N   0  0", "C   0  0", "C   0  0", "C   0  0", "C   0  0"], ring);
        Assert.True(MolfileReader.TryRead(pyrrole, out MolfileDocument? document, out _));
        Assert.Equal("molfile-hydrogen-placed", document.Remarks.Single().Code);
        AssertSame("c1cc[nH]c1", pyrrole);
        string pyrazole = Drawings.Table(["N   0  0", "N   0  0", "C   0  0", "C   0  0", "C   0  0"], ring);
        AssertRefused("molfile-aromatic-hydrogen", 5, pyrazole);
        string withHydrogen = Drawings.Table(
            ["N   0  0", "N   0  0", "C   0  0", "C   0  0", "C   0  0", "H   0  0"], [.. ring, "  1  6  1  0"]);
        AssertSame("c1cc[nH]n1", withHydrogen);
        string open = Drawings.Table([.. Enumerable.Repeat("C   0  0", 5)], ring);
        AssertRefused("chemistry-no-kekule-form", null, open);
    }

    [Fact]
    public void Wedge_up_to_nitrogen_gives_one_enantiomer_and_down_the_other()
    {
        // The hydrogen points away from the viewer, who sees N, CH3, COOH anticlockwise; so from the hydrogen they run
        // clockwise, and from N the hydrogen, CH3, COOH anticlockwise.
        AssertSame("N[C@H](C)C(=O)O", Drawings.Alanine);
        AssertSame("N[C@@H](C)C(=O)O", Drawings.Alanine.Replace("  1  3  1  1", "  1  3  1  6", StringComparison.Ordinal));
        AssertSame("NC(C)C(=O)O", Drawings.Alanine.Replace("  1  3  1  1", "  1  3  1  4", StringComparison.Ordinal));
        AssertSame("NC(C)C(=O)O", Drawings.Alanine.Replace("  1  3  1  1", "  3  1  1  1", StringComparison.Ordinal));
    }

    [Fact]
    public void Parity_counts_when_there_are_no_coordinates()
    {
        // Source: CTfile Formats, "atom stereo parity": 1 = clockwise ascending with the highest number away.
        string[] bonds = ["  1  2  1  0", "  1  3  1  0", "  1  4  1  0", "  1  5  1  0"];
        string[] atoms = ["C   0  0  1", "F   0  0", "Cl  0  0", "Br  0  0", "I   0  0"];
        AssertSame("F[C@@](Cl)(Br)I", Drawings.Table(atoms, bonds));
        atoms[0] = "C   0  0  2";
        AssertSame("F[C@](Cl)(Br)I", Drawings.Table(atoms, bonds));
        atoms[0] = "C   0  0  3";
        AssertSame("FC(Cl)(Br)I", Drawings.Table(atoms, bonds));
        AssertSame(
            "F[C@@](Cl)(Br)[H]",
            Drawings.Table(["C   0  0  1", "F   0  0", "Cl  0  0", "Br  0  0"], bonds[..3]));
    }

    [Theory]
    [InlineData("\r\n")]
    [InlineData("\r")]
    public void Line_ends_of_any_kind_are_read(string end) =>
        AssertSame("N[C@H](C)C(=O)O", Drawings.Alanine.ReplaceLineEndings(end));

    [Fact]
    public void End_line_missing_and_blank_lines_are_read_with_a_remark()
    {
        string text = Drawings.Alanine.Replace("M  END", "\n", StringComparison.Ordinal);
        Assert.True(MolfileReader.TryRead(text, out MolfileDocument? document, out _));
        Assert.Equal("molfile-missing-end", document.Remarks.Single().Code);
    }

    [Fact]
    public void Columns_shifted_are_read_with_a_remark()
    {
        string text = "x\n\n\n  2  1  0  0  0  0  0  0  0  0999 V2000\n0.0 0.0 0.0 C 0 0\n100000.0000 12345.0000 0.0 O 0 0\n1 2 1 0\nM  END\n";
        Assert.True(MolfileReader.TryRead(text, out MolfileDocument? document, out FormatProblem? problem), problem?.Render());
        Assert.Contains(document.Remarks, static remark => remark.Code == "molfile-misaligned");
        Assert.Equal("CO", CanonicalSmiles.Write(document.Molecule));
    }

    [Theory]
    [InlineData("", "molfile-empty")]
    [InlineData("a\nb\nc\n", "molfile-empty")]
    [InlineData("a\nb\nc\n\n", "molfile-counts-line")]
    [InlineData("a\nb\nc\nhello\n", "molfile-counts-line")]
    [InlineData("a\nb\nc\n  1  0  0  0  0  0  0  0  0  0999 V4000\n", "molfile-version")]
    [InlineData("a\nb\nc\n  1  0  1  0  0  0  0  0  0  0999 V2000\n", "molfile-query-atom")]
    [InlineData("a\nb\nc\n  1  0  0  0  0  0  0  0  0  0999 V2000\nM  END\n", "molfile-truncated")]
    [InlineData("a\nb\nc\n  1  0  0  0  0  0  0  0  0  0999 V2000\n    0,0000    0.0000    0.0000 C   0\nM  END\n", "molfile-field")]
    [InlineData("$RXN\n\n\n\n", "molfile-reaction")]
    [InlineData("a\nb\nc\n  0  0  0     0  0            999 V3000\nM  V30 BEGIN CTAB\nM  V30 COUNTS 1 0 0 0 0\nM  END\n", "molfile-truncated")]
    [InlineData("a\nb\nc\n  0  0  0     0  0            999 V3000\nM  V30 HELLO\nM  END\n", "molfile-v3000-syntax")]
    public void Text_that_is_no_molfile_is_refused(string text, string code) => AssertRefused(code, null, text);

    [Fact]
    public void Extended_table_with_continued_lines_and_free_numbers_is_read()
    {
        string text = string.Join(
            '\n', "x", "", "", "  0  0  0     0  0            999 V3000", "M  V30 BEGIN CTAB", "M  V30 COUNTS 3 2 0 0 0",
            "M  V30 BEGIN ATOM", "M  V30 10 C 0 0 0 0 MASS=-", "M  V30 13", "M  V30 20 N 0 0 0 0 CHG=1", "M  V30 7 C 0 0 0 5", "M  V30 END ATOM",
            "M  V30 BEGIN BOND", "M  V30 1 1 10 20", "M  V30 2 1 20 7", "M  V30 END BOND", "M  V30 END CTAB", "M  END");
        AssertSame("[13CH3][NH2+][CH3:5]", text);
        AssertRefused("molfile-query-atom", 8, text.Replace("10 C 0", "10 [C,N] 0", StringComparison.Ordinal));
        AssertRefused("molfile-query-property", 11, text.Replace("0 5", "0 5 SUBST=2", StringComparison.Ordinal));
        AssertRefused("molfile-atom-number", 15, text.Replace("20 7", "20 8", StringComparison.Ordinal));
    }

    private static void AssertSame(string smiles, string text)
    {
        Assert.True(MolfileReader.TryParse(text, out Molecule? molecule, out FormatProblem? problem), problem?.Render());
        Assert.Equal(CanonicalSmiles.Write(SmilesReader.Parse(smiles)), CanonicalSmiles.Write(molecule));
    }

    private static void AssertRefused(string code, int? line, string text)
    {
        var refusal = Assert.Throws<MolfileFormatException>(() => MolfileReader.Parse(text));
        Assert.Equal(code, refusal.Code);
        Assert.Equal(line ?? refusal.Line, refusal.Line);
    }
}
