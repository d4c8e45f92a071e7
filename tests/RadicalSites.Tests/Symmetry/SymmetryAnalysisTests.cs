using System;
using System.Collections.Generic;
using System.Linq;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Symmetry;

/// <summary>
/// Orbits of carbons against the number of carbon-13 signals of named substances (common knowledge of the field: textbook
/// spectra, from memory), and graphs on which refinement alone fails.
/// </summary>
public sealed class SymmetryAnalysisTests
{
    [Theory]
    [InlineData("neopentane", "CC(C)(C)C", 2)]
    [InlineData("adamantane", "C1C2CC3CC1CC(C2)C3", 2)]
    [InlineData("norbornane", "C1CC2CCC1C2", 3)]
    [InlineData("norbornene", "C1CC2C=CC1C2", 4)]
    [InlineData("norbornadiene", "C1=CC2C=CC1C2", 3)]
    [InlineData("cubane", "C12C3C4C1C5C2C3C45", 1)]
    [InlineData("prismane", "C12C3C1C4C2C34", 1)]
    [InlineData("tetrahedrane", "C12C3C1C23", 1)]
    [InlineData("dodecahedrane", "C12C3C4C5C1C6C7C2C8C3C9C4C%10C5C6C%11C7C8C9C%10%11", 1)]
    [InlineData("basketane", "C1CC2C3C4C1C5C2C3C45", 4)]
    [InlineData("twistane", "C1CC2CC3CCC2CC13", 3)]
    [InlineData("diamantane", "C1C2CC3C4CC5CC(C14)C(C2)C3C5", 3)]
    [InlineData("1,4-dimethylcyclohexane", "CC1CCC(C)CC1", 3)]
    [InlineData("trans-1,4-dimethylcyclohexane", "C[C@H]1CC[C@@H](C)CC1", 3)]
    [InlineData("cis-1,2-dimethylcyclohexane", "C[C@H]1CCCC[C@H]1C", 4)]
    [InlineData("cis-decalin", "C1CC[C@H]2CCCC[C@H]2C1", 3)]
    [InlineData("trans-decalin", "C1CC[C@H]2CCCC[C@@H]2C1", 3)]
    [InlineData("para-xylene", "Cc1ccc(C)cc1", 3)]
    [InlineData("para-xylene, Kekule form", "CC1=CC=C(C)C=C1", 3)]
    [InlineData("ortho-xylene", "Cc1ccccc1C", 4)]
    [InlineData("meta-xylene", "Cc1cccc(C)c1", 5)]
    [InlineData("mesitylene", "Cc1cc(C)cc(C)c1", 3)]
    [InlineData("tert-butylbenzene", "CC(C)(C)c1ccccc1", 6)]
    [InlineData("naphthalene", "c1ccc2ccccc2c1", 3)]
    [InlineData("anthracene", "c1ccc2cc3ccccc3cc2c1", 4)]
    [InlineData("phenanthrene", "c1ccc2c(c1)ccc1ccccc12", 7)]
    [InlineData("azulene", "c1ccc2cccc2cc1", 6)]
    [InlineData("cholesterol", "C[C@H](CCCC(C)C)[C@H]1CC[C@@H]2[C@@]1(CC[C@H]3[C@H]2CC=C4[C@@]3(CC[C@@H](C4)O)C)C", 27)]
    [InlineData("camphor", "CC1(C)[C@@H]2CC[C@@]1(C)C(=O)C2", 10)]
    [InlineData("spiro[4.4]nonane", "C1CCC2(C1)CCCC2", 3)]
    [InlineData("cyclooctatetraene", "C1=CC=CC=CC=C1", 1)]
    [InlineData("buckminsterfullerene", "c12c3c4c5c1c6c7c8c2c9c1c3c2c3c4c4c%10c5c5c6c6c7c7c%11c8c9c8c9c1c2c1c2c3c4c3c4c%10c5c5c6c6c7c7c%11c8c8c9c1c1c2c3c2c4c5c6c3c7c8c1c23", 1)]
    [InlineData("meso-2,3-butanediol", "C[C@H](O)[C@H](O)C", 2)]
    [InlineData("(R,R)-2,3-butanediol", "C[C@@H](O)[C@H](O)C", 2)]
    [InlineData("3-ethynyl-2,4-dimethylpentan-3-ol", "CC(C)C(O)(C#C)C(C)C", 6)]
    [InlineData("squalene", "CC(C)=CCC/C(C)=C/CC/C(C)=C/CC/C=C(C)/CC/C=C(C)/CCC=C(C)C", 15)]
    [InlineData("isobutene", "CC(=C)C", 3)]
    [InlineData("2-methyl-2-butene", "CC=C(C)C", 5)]
    [InlineData("tetramethylethylene", "CC(C)=C(C)C", 2)]
    [InlineData("L-valine", "CC(C)[C@H](N)C(=O)O", 5)]
    [InlineData("valine, no mark", "CC(C)C(N)C(=O)O", 5)]
    [InlineData("isopropanol", "CC(C)O", 2)]
    [InlineData("citric acid", "OC(=O)CC(O)(C(=O)O)CC(=O)O", 4)]
    [InlineData("quinuclidine", "C1CN2CCC1CC2", 3)]
    [InlineData("hexamethylenetetramine", "C1N2CN3CN1CN(C2)C3", 1)]
    [InlineData("18-crown-6", "C1COCCOCCOCCOCCOCCO1", 1)]
    [InlineData("triethylamine", "CCN(CC)CC", 2)]
    public void Perceive_carbons_fall_into_as_many_classes_as_there_are_signals(string name, string smiles, int signals)
    {
        Molecule molecule = SmilesReader.Parse(smiles);
        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);

        int classes = Enumerable.Range(0, molecule.AtomCount)
            .Where(atom => molecule.Atoms[atom].AtomicNumber == 6)
            .Select(atom => symmetry.OrbitOf(atom, EquivalenceLevel.Enantiotopic))
            .Distinct().Count();

        Assert.True(signals == classes, $"{name}: {classes}");
        Assert.Empty(symmetry.Diagnostics);
    }

    [Fact]
    public void Perceive_refinement_alone_cannot_part_two_fragments_orbits_do()
    {
        // Decalin and bicyclopentyl have the same equitable partition: two CH, four and four CH2.
        Molecule molecule = SmilesReader.Parse("C1CCC2CCCCC2C1.C1CCCC1C1CCCC1");

        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);

        Assert.Equal(6, symmetry.OrbitCount(EquivalenceLevel.Constitutional));
        for (int atom = 0; atom < 10; atom++)
        {
            Assert.All(symmetry.MembersOf(atom, EquivalenceLevel.Constitutional), member => Assert.True(member < 10));
        }
    }

    [Fact]
    public void Perceive_two_triangles_and_a_hexagon_are_told_apart()
    {
        Molecule molecule = SmilesReader.Parse("C1CC1.C1CC1.C1CCCCC1");

        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);

        Assert.Equal(2, symmetry.OrbitCount(EquivalenceLevel.Constitutional));
        Assert.Equal(6, symmetry.MembersOf(0, EquivalenceLevel.Constitutional).Count);
    }

    [Fact]
    public void Perceive_cubic_graph_of_ten_vertices_splits_into_true_orbits()
    {
        // A regular graph in which refinement puts all atoms together: the 5-prism joined by a twist is vertex-transitive,
        // a ring of ten with five unlike chords is not. Distances from each atom, taken here, must agree within orbits.
        Molecule molecule = SmilesReader.Parse("C12C3C4C1C5C6C4C3C2C56");
        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);

        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            int root = symmetry.OrbitOf(atom, EquivalenceLevel.Constitutional);
            Assert.Equal(RingCounts(molecule, root), RingCounts(molecule, atom));
        }

        int kinds = Enumerable.Range(0, molecule.AtomCount).Select(atom => RingCounts(molecule, atom)).Distinct().Count();
        Assert.True(symmetry.OrbitCount(EquivalenceLevel.Constitutional) >= kinds);
    }

    [Theory]
    [InlineData("C12C3C4C1C5C2C3C45")]
    [InlineData("CC(C)CCO")]
    [InlineData("C[C@H](O)CC")]
    [InlineData("C1CC2CCC1C2")]
    [InlineData("CC(C)=CC")]
    public void Perceive_a_second_copy_doubles_every_class(string smiles)
    {
        Molecule one = SmilesReader.Parse(smiles);
        Molecule two = SmilesReader.Parse(smiles + "." + smiles);
        SymmetryAnalysis single = SymmetryAnalysis.Perceive(one);
        SymmetryAnalysis pair = SymmetryAnalysis.Perceive(two);

        foreach (EquivalenceLevel level in Enum.GetValues<EquivalenceLevel>())
        {
            for (int atom = 0; atom < one.AtomCount; atom++)
            {
                Assert.Equal(2 * single.MembersOf(atom, level).Count, pair.MembersOf(atom, level).Count);
                Assert.Equal(single.HydrogenTopicity(atom), pair.HydrogenTopicity(atom + one.AtomCount));
            }
        }
    }

    [Theory]
    [InlineData("CCC", "[H]C([H])([H])C([H])([H])C([H])([H])[H]")]
    [InlineData("C[C@H](O)CC", "C[C@]([H])(O)CC")]
    [InlineData("C1CC1", "[H]C1([H])CC1")]
    public void Perceive_hydrogens_written_out_change_nothing(string counted, string written)
    {
        SymmetryAnalysis one = SymmetryAnalysis.Perceive(SmilesReader.Parse(counted));
        SymmetryAnalysis two = SymmetryAnalysis.Perceive(SmilesReader.Parse(written));

        foreach (EquivalenceLevel level in Enum.GetValues<EquivalenceLevel>())
        {
            Assert.Equal(one.OrbitCount(level), two.OrbitCount(level));
        }
    }

    [Fact]
    public void Perceive_isotopes_and_charges_part_atoms_classes_do_not()
    {
        Assert.Equal(3, CountOrbits("[13CH3]CC"));
        Assert.Equal(3, CountOrbits("[2H]CC"));
        Assert.Equal(2, CountOrbits("[CH3:1]C[CH3:2]"));
        Assert.Equal(5, CountOrbits("CC(=O)[O-].[Na+]"));
        Assert.Equal(3, CountOrbits("CCC.CCC.CCC") + 1);
    }

    [Fact]
    public void Perceive_long_chain_stays_linear_and_exact()
    {
        // 4,000 carbons: a quadratic step would show in the run time of the suite.
        Molecule molecule = SmilesReader.Parse(new string('C', 4000));

        SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);

        Assert.Equal(2000, symmetry.OrbitCount(EquivalenceLevel.Homotopic));
        Assert.Equal(Topicity.Enantiotopic, symmetry.HydrogenTopicity(17));
    }

    private static int CountOrbits(string smiles) =>
        SymmetryAnalysis.Perceive(SmilesReader.Parse(smiles)).OrbitCount(EquivalenceLevel.Constitutional);

    /// <summary>Closed walks of each length up to 8 through an atom: an invariant counted without the code under test.</summary>
    private static string RingCounts(Molecule molecule, int atom)
    {
        List<long> counts = [];
        long[] walks = new long[molecule.AtomCount];
        walks[atom] = 1;
        for (int step = 1; step <= 8; step++)
        {
            long[] next = new long[walks.Length];
            foreach (Bond bond in molecule.Bonds)
            {
                next[bond.Begin] += walks[bond.End];
                next[bond.End] += walks[bond.Begin];
            }

            walks = next;
            counts.Add(walks[atom]);
        }

        return string.Join(',', counts);
    }
}
