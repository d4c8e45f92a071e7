using System;
using System.Globalization;
using System.Linq;
using System.Text;
using RadicalSites.Diagnostics;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Formats.Smiles;

/// <summary>Texts made to hurt a reader: each would take minutes with a quadratic step and ends at once without.</summary>
public sealed class AdversarialTests
{
    private const int Many = 100_000;

    [Fact]
    public void Parse_hundred_thousand_ring_bonds_open_at_one_atom_closed_in_order()
    {
        string text = "*" + Numbers(Many) + string.Concat(Enumerable.Range(1, Many).Select(static n => Invariant($".C%({n})")));

        Assert.Equal(Many, SmilesReader.Parse(text).BondCount);
    }

    [Fact]
    public void Parse_hundred_thousand_ring_bonds_closed_at_one_atom()
    {
        string text = string.Concat(Enumerable.Range(1, Many).Select(static n => Invariant($"C%({n})."))) + "*" + Numbers(Many);

        Assert.Equal(Many, SmilesReader.Parse(text).BondCount);
    }

    [Fact]
    public void TryParse_duplicate_bond_far_back_at_one_atom_names_both_places()
    {
        string text = "C%(500)%(501)." + string.Concat(Enumerable.Range(1, 100).Select(static n => Invariant($"C%({n}).")))
            + "*%(500)" + Numbers(100) + "%(501)";

        Assert.False(SmilesReader.TryParse(text, out _, out FormatProblem? problem));
        Assert.Equal("smiles-ring-bond-duplicate", problem.Code);
        Assert.Equal(text.LastIndexOf("%(501)", StringComparison.Ordinal), problem.Position);
        Assert.Equal(text.IndexOf("%(501)", StringComparison.Ordinal), problem.SecondPosition);
        Assert.Contains("501", problem.Message, StringComparison.Ordinal);
    }

    [Fact]
    public void Parse_hundred_thousand_nested_stereo_marks()
    {
        string text = string.Concat(Enumerable.Repeat("[C@](F)(Cl)(", Many)) + "C" + new string(')', Many);

        Assert.Equal((3 * Many) + 2, SmilesReader.Parse("C" + text).AtomCount);
    }

    [Fact]
    public void Parse_hundred_thousand_sulfoxides_and_allenes()
    {
        string sulfoxides = "C" + string.Concat(Enumerable.Repeat("[S@](=O)", Many)) + "C";
        string allenes = "C" + string.Concat(Enumerable.Repeat("C(F)=[C@]=C(Cl)", Many)) + "C";

        Assert.Equal(Many, SmilesReader.Parse(sulfoxides).StereoElements.Count);
        Assert.Equal(Many, SmilesReader.Parse(allenes).StereoElements.Count);
    }

    [Fact]
    public void Parse_hundreds_of_written_hydrogens_at_one_atom_lose_none()
    {
        Molecule molecule = SmilesReader.Parse("*" + string.Concat(Enumerable.Repeat("([H])", 300)));

        Assert.Equal(300, molecule.Atoms.Count(static atom => atom.AtomicNumber == 1) + molecule.Atoms[0].HydrogenCount);
    }

    [Fact]
    public void Parse_clique_of_wildcards()
    {
        var text = new StringBuilder();
        int size = 40;
        for (int i = 0; i < size; i++)
        {
            text.Append(i == 0 ? "*" : ".*");
            for (int j = 0; j < size; j++)
            {
                if (i != j)
                {
                    text.Append(CultureInfo.InvariantCulture, $"%({(Math.Min(i, j) * size) + Math.Max(i, j)})");
                }
            }
        }

        Molecule molecule = SmilesReader.Parse(text.ToString());

        Assert.Equal(size * (size - 1) / 2, molecule.BondCount);
        Assert.Equal(molecule.BondCount, SmilesReader.Parse(SmilesWriter.Write(molecule)).BondCount);
    }

    private static string Numbers(int count) =>
        string.Concat(Enumerable.Range(1, count).Select(static n => Invariant($"%({n})")));

    private static string Invariant(FormattableString text) => text.ToString(CultureInfo.InvariantCulture);
}
