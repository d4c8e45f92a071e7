using System;
using System.Collections.Generic;
using System.Linq;
using System.Threading.Tasks;
using RadicalSites.Canonical;
using RadicalSites.Formats.Smiles;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Tests.Properties;

/// <summary>
/// A molecule has one canonical SMILES and one symmetry, whatever the order of its atoms, bonds and stereo carriers.
/// </summary>
public sealed class RenumberingTests
{
    /// <summary>Molecules chosen for their symmetry or stereo; names of substances where they have one.</summary>
    private static readonly string[] Chosen =
    [
        "C1C2CC3CC1CC(C2)C3", "C12C3C4C1C5C2C3C45", "C1CC2CCC1C2", "C[C@H]1CC[C@@H](C)CC1", "C[C@H]1CC[C@H](C)CC1",
        "CC1CCC2(CC1)CCC(C)CC2", "CC1CC(C)C1", "C[C@H](O)[C@H](O)C", "C[C@H](O)[C@@H](O)C", "CC(O)C(O)C",
        "C[C@H](F)[C@@H](Cl)[C@H](F)C", "C/C=C\\C=C\\C", "CC=[C@]=CC", "C1CCC2CCCCC2C1.C1CCCC1C1CCCC1",
        "CC(C)C(C(C)C)C(C)C", "CC(C)C(O)(C#C)C(C)C", "CCOC(OCC)OCC", "S=P(NC1CCCCC1)(NC2CCCCC2)NC3CCCCC3",
        "O[C@H]1[C@H](O)[C@@H](O)[C@H](O)[C@H](O)[C@@H]1O", "CC(C)C1CCC(O)CC1.CC(C)C2CCC(O)CC2",
        "C[C@H](F)O.C[C@@H](F)O", "FC(F)C(F)F", "C1CN2CCC1CC2", "C[S@](=O)CC", "CC1(C)[C@@H]2CC[C@@]1(C)C(=O)C2",
        "C[C@H](CCCC(C)C)[C@H]1CC[C@@H]2[C@@]1(CC[C@H]3[C@H]2CC=C4[C@@]3(CC[C@@H](C4)O)C)C",
        "c1ccccc1.c1ccccc1.c1ccccc1", "[O-]C(=O)C(=O)[O-].[Na+].[Na+]", "[CH3:1]C[CH3:2]", "[13CH3]CC([2H])C",
        "C12C3C4C5C1C6C7C2C8C3C9C4C%10C5C6C%11C7C8C9C%10%11", "CC(C)=CCC/C(C)=C/CC/C(C)=C/CC/C=C(C)/CC/C=C(C)/CCC=C(C)C",
    ];

    [Fact]
    public void Canonical_smiles_is_the_same_for_every_order_of_chosen_molecules() =>
        CheckCanonical(Chosen.Select(static text => SmilesReader.Parse(text)), 12);

    [Fact]
    public void Canonical_smiles_is_the_same_for_every_order_of_random_molecules() => CheckCanonical(Invented(1000), 3);

    [Fact]
    public void Symmetry_is_the_same_for_every_order_of_chosen_molecules() =>
        CheckSymmetry(Chosen.Select(static text => SmilesReader.Parse(text)), 8);

    [Fact]
    public void Symmetry_is_the_same_for_every_order_of_random_molecules() => CheckSymmetry(Invented(1000), 2);

    [Fact]
    public void Canonical_smiles_and_symmetry_are_the_same_on_every_thread()
    {
        Molecule[] molecules = [.. Chosen.Select(static text => SmilesReader.Parse(text)), .. Invented(300)];
        string[] alone = Array.ConvertAll(molecules, Describe);
        string[] together = new string[molecules.Length];

        Parallel.For(0, molecules.Length, new ParallelOptions { MaxDegreeOfParallelism = 8 }, i => together[i] = Describe(molecules[i]));

        Assert.Equal(alone, together);

        static string Describe(Molecule molecule)
        {
            SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);
            return CanonicalSmiles.Write(molecule) + " " + string.Join(
                ' ', Enumerable.Range(0, molecule.AtomCount).Select(
                    atom => (symmetry.OrbitOf(atom, EquivalenceLevel.Homotopic), symmetry.HydrogenTopicity(atom))));
        }
    }

    private static IEnumerable<Molecule> Invented(int count)
    {
        Random random = new(20240229);
        for (int i = 0; i < count; i++)
        {
            yield return RandomMolecules.Next(random);
        }
    }

    private static void CheckCanonical(IEnumerable<Molecule> molecules, int orders)
    {
        Random random = new(11);
        foreach (Molecule molecule in molecules)
        {
            string text = CanonicalSmiles.Write(molecule);
            Assert.Equal(text, CanonicalSmiles.Write(SmilesReader.Parse(text)));
            for (int i = 0; i < orders; i++)
            {
                Molecule other = MoleculeRenumbering.Random(molecule, random).Molecule;
                Assert.Equal(text, CanonicalSmiles.Write(other));

                // By way of another spelling of the same molecule.
                Assert.Equal(text, CanonicalSmiles.Write(SmilesReader.Parse(SmilesWriter.Write(other))));
            }
        }
    }

    private static void CheckSymmetry(IEnumerable<Molecule> molecules, int orders)
    {
        Random random = new(12);
        foreach (Molecule molecule in molecules)
        {
            SymmetryAnalysis symmetry = SymmetryAnalysis.Perceive(molecule);
            string name = SmilesWriter.Write(molecule);
            for (int i = 0; i < orders; i++)
            {
                MoleculeRenumbering other = MoleculeRenumbering.Random(molecule, random);
                SymmetryAnalysis again = SymmetryAnalysis.Perceive(other.Molecule);
                for (int atom = 0; atom < molecule.AtomCount; atom++)
                {
                    int place = other.PlaceOf[atom];
                    int root = other.PlaceOf[symmetry.OrbitOf(atom, EquivalenceLevel.Constitutional)];
                    Assert.True(
                        again.OrbitOf(root, EquivalenceLevel.Constitutional)
                            == again.OrbitOf(place, EquivalenceLevel.Constitutional), name);
                    Assert.True(symmetry.HydrogenTopicity(atom) == again.HydrogenTopicity(place), name);
                }

                // Which like ligands of different places pair up is a matter of naming; how many do is not.
                foreach (EquivalenceLevel level in Enum.GetValues<EquivalenceLevel>())
                {
                    Assert.Equal(Sizes(symmetry, level, null), Sizes(again, level, other.PlaceOf));
                }
            }
        }

        // For each constitutional orbit, named by its lowest atom in the first order, the sizes of the classes of its atoms.
        string Sizes(SymmetryAnalysis symmetry, EquivalenceLevel level, int[]? placeOf)
        {
            int n = symmetry.Molecule.AtomCount;
            List<string> sizes = [];
            for (int atom = 0; atom < n; atom++)
            {
                sizes.Add(FormattableString.Invariant(
                    $"{First(symmetry, atom, placeOf)}:{symmetry.MembersOf(placeOf?[atom] ?? atom, level).Count}"));
            }

            sizes.Sort(StringComparer.Ordinal);
            return string.Join(' ', sizes);
        }

        int First(SymmetryAnalysis symmetry, int atom, int[]? placeOf)
        {
            int orbit = symmetry.OrbitOf(placeOf?[atom] ?? atom, EquivalenceLevel.Constitutional);
            for (int i = 0; ; i++)
            {
                if (symmetry.OrbitOf(placeOf?[i] ?? i, EquivalenceLevel.Constitutional) == orbit)
                {
                    return i;
                }
            }
        }
    }
}
