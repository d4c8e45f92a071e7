using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>Builds the product of a delocalised radical that takes the halogen at the far end of a path.</summary>
internal static class Transposition
{
    /// <summary>Moves every pi bond of the path one place towards the carbon that lost its hydrogen.</summary>
    /// <param name="molecule">The substrate.</param>
    /// <param name="path">Atoms from the carbon that lost its hydrogen to the end that takes the halogen; odd count.</param>
    /// <param name="halogen">Atomic number of the halogen.</param>
    /// <param name="stereo">Stereo elements of the substrate; those on the path are dropped.</param>
    internal static Molecule Build(Molecule molecule, int[] path, int halogen, ReadOnlySpan<StereoElement> stereo)
    {
        int carbon = path[0];
        int end = path[^1];
        bool fromGraph = molecule.AtomSpan[carbon].HydrogenCount == 0;
        Molecule stripped = fromGraph
            ? HydrogenReplacement.ReplaceGraphHydrogen(molecule, carbon, halogen, [])
            : HydrogenReplacement.Replace(molecule, [carbon], halogen, []);
        int halogenAtom = HalogenOf(molecule, stripped, carbon);
        Atom[] atoms = stripped.AtomSpan.ToArray();
        Bond[] bonds = stripped.BondSpan.ToArray();
        bool inRing = false;
        for (int i = 0; i + 1 < path.Length; i++)
        {
            int index = BondBetween(molecule, path[i], path[i + 1]);
            Bond bond = bonds[index];
            BondOrder order = (BondOrder)((int)bond.Order + (i % 2 == 0 ? 1 : -1));
            bonds[index] = new Bond(bond.Begin, bond.End, order, false, bond.IsInRing);
            inRing |= bond.IsInRing;
        }

        for (int i = 0; i < bonds.Length; i++)
        {
            if ((bonds[i].Begin == carbon && bonds[i].End == halogenAtom)
                || (bonds[i].End == carbon && bonds[i].Begin == halogenAtom))
            {
                bonds[i] = new Bond(end, halogenAtom, BondOrder.Single, false, false);
            }
        }

        return MoleculeAssembly.Assemble(atoms, bonds, Keep(stereo, path), perceiveAromaticity: inRing);
    }

    private static int HalogenOf(Molecule molecule, Molecule product, int carbon)
    {
        foreach (Neighbor neighbor in product.NeighborsOf(carbon))
        {
            if (neighbor.Atom >= molecule.AtomCount
                || product.AtomSpan[neighbor.Atom].AtomicNumber != molecule.AtomSpan[neighbor.Atom].AtomicNumber)
            {
                return neighbor.Atom;
            }
        }

        throw new InvalidOperationException("The halogen is a neighbour of the carbon it was put on.");
    }

    private static int BondBetween(Molecule molecule, int first, int second)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(first))
        {
            if (neighbor.Atom == second)
            {
                return neighbor.Bond;
            }
        }

        throw new ArgumentException("Consecutive atoms of a path are bonded.", nameof(second));
    }

    // A double bond that moved has lost its configuration, and so has the carbon that became trigonal.
    private static StereoElement[] Keep(ReadOnlySpan<StereoElement> stereo, int[] path)
    {
        var kept = new List<StereoElement>();
        foreach (StereoElement element in stereo)
        {
            bool touched = element.Kind == StereoKind.CisTrans
                ? Array.IndexOf(path, element.Focus) >= 0 && Array.IndexOf(path, element.FocusEnd) >= 0
                : Array.IndexOf(path, element.Focus) >= 0;
            if (!touched)
            {
                kept.Add(element);
            }
        }

        return [.. kept];
    }
}
