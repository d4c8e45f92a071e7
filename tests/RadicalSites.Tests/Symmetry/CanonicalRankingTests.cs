using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;
using RadicalSites.Tests.Properties;

namespace RadicalSites.Tests.Symmetry;

/// <summary>Canonical order on graphs that are hard for refinement, and on large or repetitive molecules.</summary>
public sealed class CanonicalRankingTests
{
    /// <summary>Two strongly regular graphs srg(16, 6, 2, 2), known from the literature: alike to refinement, not isomorphic.</summary>
    public static TheoryData<bool> StronglyRegular => [true, false];

    [Theory]
    [MemberData(nameof(StronglyRegular))]
    public void Rank_strongly_regular_graph_has_one_form_for_every_order(bool shrikhande)
    {
        Molecule graph = LatticeGraph(shrikhande);
        Random random = new(5);
        List<(int, int)> form = Edges(graph);

        Assert.NotEqual(form, Edges(LatticeGraph(!shrikhande)));
        for (int i = 0; i < 20; i++)
        {
            Assert.Equal(form, Edges(MoleculeRenumbering.Random(graph, random).Molecule));
        }

        Assert.Equal(1, SymmetryAnalysis.Perceive(graph).OrbitCount(EquivalenceLevel.Constitutional));
    }

    [Fact]
    public void Rank_two_strongly_regular_graphs_side_by_side_are_two_orbits()
    {
        Molecule both = Union(LatticeGraph(true), LatticeGraph(false));
        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(both);

        Assert.Equal(2, symmetry.OrbitCount(EquivalenceLevel.Constitutional));
        Assert.Equal(16, symmetry.MembersOf(0, EquivalenceLevel.Constitutional).Count);
    }

    [Fact]
    public void Rank_petersen_graph_and_complete_graph_are_canonical()
    {
        List<(int, int)> petersen = [];
        for (int i = 0; i < 5; i++)
        {
            petersen.AddRange([(i, (i + 1) % 5), (i, i + 5), (5 + i, 5 + ((i + 2) % 5))]);
        }

        List<(int, int)> complete = [];
        for (int i = 0; i < 12; i++)
        {
            for (int j = 0; j < i; j++)
            {
                complete.Add((j, i));
            }
        }

        foreach ((int size, List<(int, int)> edges) in new[] { (10, petersen), (12, complete) })
        {
            Molecule graph = Graph(size, edges);
            List<(int, int)> form = Edges(graph);
            Random random = new(6);
            for (int i = 0; i < 10; i++)
            {
                Assert.Equal(form, Edges(MoleculeRenumbering.Random(graph, random).Molecule));
            }

            Assert.Equal(1, SymmetryAnalysis.Perceive(graph).OrbitCount(EquivalenceLevel.Constitutional));
        }
    }

    [Theory]
    [InlineData("C1CCC2CCCCC2C1", "C1CCCC1C1CCCC1")]
    [InlineData("C12C3C1C4C2C34", "C1=CC=CC=C1")]
    [InlineData("C[C@H](O)CC", "C[C@@H](O)CC")]
    [InlineData("C[C@H]1CC[C@H](C)CC1", "C[C@H]1CC[C@@H](C)CC1")]
    [InlineData("C/C=C/C", "C/C=C\\C")]
    [InlineData("CC=[C@]=CC", "CC=[C@@]=CC")]
    [InlineData("[CH3:1]C", "[CH3:2]C")]
    public void Write_different_molecules_have_different_texts(string one, string two) =>
        Assert.NotEqual(CanonicalSmiles.Write(SmilesReader.Parse(one)), CanonicalSmiles.Write(SmilesReader.Parse(two)));

    [Theory]
    [InlineData("Cc1ccccc1C", "CC1=C(C)C=CC=C1")]
    [InlineData("CC1=CC=CC=C1C", "CC1=C(C)C=CC=C1")]
    [InlineData("OCC", "C(C)O")]
    [InlineData("[CH3][CH2][OH]", "CCO")]
    [InlineData("[Na+].[Cl-]", "[Cl-].[Na+]")]
    [InlineData("F[C@](Cl)(Br)I", "Cl[C@](F)(I)Br")]
    public void Write_spellings_of_one_molecule_have_one_text(string one, string two) =>
        Assert.Equal(CanonicalSmiles.Write(SmilesReader.Parse(one)), CanonicalSmiles.Write(SmilesReader.Parse(two)));

    [Theory]
    [InlineData("Cl[Pt@SP1](Cl)(N)N", "N[Pt@SP1](Cl)(Cl)N", true)] // cisplatin
    [InlineData("Cl[Pt@SP1](Cl)(N)N", "Cl[Pt@SP2](Cl)(N)N", false)] // and transplatin
    [InlineData("S[As@TB1](F)(Cl)(Br)N", "S[As@TB5](F)(N)(Cl)Br", true)] // the two of the OpenSMILES specification
    [InlineData("S[As@TB1](F)(Cl)(Br)N", "S[As@TB2](F)(Cl)(Br)N", false)]
    [InlineData("N[Co@OH1](N)(N)(Cl)(Cl)Cl", "Cl[Co@OH1](N)(N)(N)(Cl)Cl", false)] // mer and fac
    [InlineData("F[Co@OH1](Cl)(Br)(I)(N)O", "F[Co@OH2](Cl)(Br)(I)(N)O", false)]
    [InlineData("C1CN[Co@OH5]23(N1)(NCCN2)NCCN3", "C1CN[Co@OH15]23(N1)(NCCN2)NCCN3", false)]
    public void Write_coordination_bodies_are_respected(string one, string two, bool same)
    {
        Molecule first = SmilesReader.Parse(one);
        string text = CanonicalSmiles.Write(first);
        Random random = new(8);

        Assert.Equal(same, text == CanonicalSmiles.Write(SmilesReader.Parse(two)));
        for (int i = 0; i < 20; i++)
        {
            int[] ranks = [.. Enumerable.Range(0, first.AtomCount)];
            random.Shuffle(ranks);
            Assert.Equal(text, CanonicalSmiles.Write(SmilesReader.Parse(SmilesWriter.Write(first, ranks))));
        }
    }

    [Fact]
    public void Rank_sixty_equal_fragments_and_a_long_chain_take_no_search()
    {
        string fragments = string.Join('.', Enumerable.Repeat("CC(C)(C)c1ccccc1", 60));
        string chain = new('C', 3000);
        CanonicalRankingOptions noSearch = new() { SearchLimit = 1 };

        Assert.True(CanonicalRanking.Rank(SmilesReader.Parse(fragments), noSearch).IsComplete);
        Assert.True(CanonicalRanking.Rank(SmilesReader.Parse(chain), noSearch).IsComplete);
    }

    [Fact]
    public void Write_options_leave_out_stereo_and_classes()
    {
        Molecule molecule = SmilesReader.Parse("C[C@H]([OH:7])CC");
        CanonicalRankingOptions plain = new() { IncludeStereo = false, IncludeAtomClasses = false };

        Assert.Equal(
            CanonicalSmiles.Write(SmilesReader.Parse("CCC(C)O")), CanonicalSmiles.Write(molecule, plain, out var none));
        Assert.Null(none);
        CanonicalSmiles.Write(LatticeGraph(true), plain with { SearchLimit = 1 }, out var limit);
        Assert.Equal("limit-reached", limit?.Code);
    }

    [Fact]
    public void Rank_is_a_permutation_and_the_limit_is_reported()
    {
        CanonicalRanking full = CanonicalRanking.Rank(LatticeGraph(true));
        CanonicalRanking cut = CanonicalRanking.Rank(LatticeGraph(true), new CanonicalRankingOptions { SearchLimit = 1 });

        Assert.True(full.IsComplete);
        Assert.Equal(Enumerable.Range(0, 16), full.Ranks.Order());
        Assert.Equal(Enumerable.Range(0, 16), cut.Ranks.Order());
        Assert.Equal("limit-reached", Assert.Single(cut.Diagnostics).Code);
    }

    /// <summary>Cayley graph of Z4 x Z4: the Shrikhande graph, or the rook's graph of a 4 x 4 board.</summary>
    private static Molecule LatticeGraph(bool shrikhande)
    {
        List<(int, int)> edges = [];
        for (int a = 0; a < 16; a++)
        {
            for (int b = 0; b < a; b++)
            {
                int x = ((a / 4) - (b / 4) + 4) % 4;
                int y = ((a % 4) - (b % 4) + 4) % 4;
                bool joined = shrikhande
                    ? (x, y) is (0, 1) or (0, 3) or (1, 0) or (3, 0) or (1, 1) or (3, 3)
                    : x == 0 || y == 0;
                if (joined)
                {
                    edges.Add((b, a));
                }
            }
        }

        return Graph(16, edges);
    }

    private static Molecule Graph(int size, List<(int First, int Second)> edges) => MoleculeRenumbering.Connect(
        [.. Enumerable.Range(0, size).Select(static _ => new Atom(0, 0, 0, 0, 0, AtomFlags.Ring, 0))],
        [.. edges.Select(static edge => new Bond(edge.First, edge.Second, BondOrder.Single, false, true))], []);

    private static Molecule Union(Molecule one, Molecule two) => MoleculeRenumbering.Connect(
        [.. one.Atoms, .. two.Atoms],
        [.. one.Bonds, .. two.Bonds.Select(bond => new Bond(
            bond.Begin + one.AtomCount, bond.End + one.AtomCount, bond.Order, bond.IsAromatic, bond.IsInRing))],
        []);

    private static List<(int, int)> Edges(Molecule graph)
    {
        IReadOnlyList<int> ranks = CanonicalRanking.Rank(graph).Ranks;
        return [.. graph.Bonds
            .Select(bond => (Math.Min(ranks[bond.Begin], ranks[bond.End]), Math.Max(ranks[bond.Begin], ranks[bond.End])))
            .Order()];
    }
}
