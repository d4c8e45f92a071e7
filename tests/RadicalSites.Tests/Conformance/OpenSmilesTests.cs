using System;
using System.Collections.Generic;
using System.Globalization;
using System.IO;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Conformance;

/// <summary>Examples of the OpenSMILES specification 1.0 (2016), by clause: what is read, what is equal, what differs.</summary>
public sealed class OpenSmilesTests
{
    public static TheoryData<string, string, string, string> Valid()
    {
        var data = new TheoryData<string, string, string, string>();
        foreach (string[] row in Rows("valid.tsv"))
        {
            data.Add(row[0], row[1], row[2], row[3]);
        }

        return data;
    }

    public static TheoryData<string, string, string> Equal() => Pairs("equal.tsv");

    public static TheoryData<string, string, string> Different() => Pairs("different.tsv");

    [Theory]
    [MemberData(nameof(Valid))]
    public void Parse_example_has_the_formula_and_hydrogens(string clause, string smiles, string formula, string hydrogens)
    {
        Molecule molecule = SmilesReader.Parse(smiles);

        Assert.Equal(
            $"{clause}: {formula} {hydrogens}",
            $"{clause}: {MolecularFormula.Of(molecule)} {string.Join(' ', molecule.Atoms.Select(static a => a.HydrogenCount.ToString(CultureInfo.InvariantCulture)))}");
        Assert.Equal(CanonicalSmiles.Write(molecule), CanonicalSmiles.Write(SmilesReader.Parse(SmilesWriter.Write(molecule))));
        Assert.Equal(CanonicalSmiles.Write(molecule), CanonicalSmiles.Write(SmilesReader.Parse(CanonicalSmiles.Write(molecule))));
    }

    [Theory]
    [MemberData(nameof(Equal))]
    public void Parse_two_spellings_give_one_canonical_text(string clause, string left, string right) =>
        Assert.Equal(clause + " " + Canonical(left), clause + " " + Canonical(right));

    [Theory]
    [MemberData(nameof(Different))]
    public void Parse_different_molecules_give_different_texts(string clause, string left, string right) =>
        Assert.NotEqual(clause + " " + Canonical(left), clause + " " + Canonical(right));

    [Fact]
    public void Write_every_order_of_carriers_keeps_the_coordination_geometry()
    {
        // All codes of both geometries, written from every starting atom: one canonical text each.
        var random = new Random(1);
        foreach (string smiles in Enumerable.Range(1, 20).Select(static n => $"S[As@TB{n}](F)(Cl)(Br)N")
            .Concat(Enumerable.Range(1, 30).Select(static n => $"C[Co@OH{n}](F)(Cl)(Br)(I)S")))
        {
            Molecule molecule = SmilesReader.Parse(smiles);
            string expected = CanonicalSmiles.Write(molecule);
            for (int round = 0; round < 10; round++)
            {
                int[] ranks = [.. Enumerable.Range(0, molecule.AtomCount)];
                random.Shuffle(ranks);
                Assert.Equal(expected, Canonical(SmilesWriter.Write(molecule, ranks)));
            }
        }
    }

    [Fact]
    public void Parse_codes_of_the_geometries_are_as_many_as_there_are_stereoisomers()
    {
        // Five different ligands: 20 trigonal bipyramids; six: 30 octahedra (Cotton, Advanced Inorganic Chemistry).
        Assert.Equal(20, Enumerable.Range(1, 20).Select(static n => Canonical($"S[As@TB{n}](F)(Cl)(Br)N")).Distinct().Count());
        Assert.Equal(30, Enumerable.Range(1, 30).Select(static n => Canonical($"C[Co@OH{n}](F)(Cl)(Br)(I)S")).Distinct().Count());
    }

    [Fact]
    public void Parse_lenient_reads_what_strict_refuses()
    {
        Assert.Equal(2, SmilesReader.Parse("  CC some name", SmilesReaderOptions.Lenient).AtomCount);
        Assert.Equal(6, SmilesReader.Parse("C(C)(C)(C)(C)C", SmilesReaderOptions.Lenient).AtomCount);
        Assert.Empty(SmilesReader.Parse("F/C(\\Cl)=C", SmilesReaderOptions.Lenient).StereoElements);
        Assert.False(SmilesReader.TryParse("C1CC", SmilesReaderOptions.Lenient, out _, out _));
        Assert.False(SmilesReader.TryParse("CCCC", new SmilesReaderOptions { LongestText = 3 }, out _, out var problem));
        Assert.Equal("smiles-too-long", problem.Code);
    }

    private static string Canonical(string smiles) => CanonicalSmiles.Write(SmilesReader.Parse(smiles));

    private static TheoryData<string, string, string> Pairs(string file)
    {
        var data = new TheoryData<string, string, string>();
        foreach (string[] row in Rows(file))
        {
            data.Add(row[0], row[1], row[2]);
        }

        return data;
    }

    private static IEnumerable<string[]> Rows(string file) =>
        File.ReadLines(Path.Combine(AppContext.BaseDirectory, "TestData", "OpenSmiles", file))
            .Where(static line => line.Length > 0 && line[0] != '#')
            .Select(static line => line.Split('\t'));
}
