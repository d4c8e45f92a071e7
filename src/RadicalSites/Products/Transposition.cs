using System;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;

namespace RadicalSites.Products;

/// <summary>Builds the product of a delocalised radical that takes the halogen at the far end of a path.</summary>
internal static class Transposition
{
    [ThreadStatic]
    private static StructureDraft? draftOfThread;

    /// <summary>Moves every pi bond of the path one place towards the carbon that lost its hydrogen.</summary>
    /// <param name="molecule">The substrate.</param>
    /// <param name="path">Atoms from the carbon that lost its hydrogen to the end that takes the halogen; odd count.</param>
    /// <param name="halogen">Atomic number of the halogen.</param>
    /// <param name="stereo">Stereo elements of the substrate; those on the path are dropped.</param>
    /// <returns>The product with aromaticity perceived anew, since a shift can make or break an aromatic ring.</returns>
    internal static Molecule Build(Molecule molecule, int[] path, int halogen, ReadOnlySpan<StereoElement> stereo)
    {
        StructureDraft draft = draftOfThread ??= new StructureDraft();
        draft.Clear();
        int graphHydrogen = GraphHydrogen(molecule, path[0]);
        for (int i = 0; i < molecule.AtomCount; i++)
        {
            Atom atom = molecule.AtomSpan[i];
            int hydrogens = atom.HydrogenCount - (i == path[0] && graphHydrogen < 0 ? 1 : 0);
            draft.AddAtom() = Describe(atom, i == graphHydrogen ? halogen : atom.AtomicNumber, hydrogens);
        }

        int halogenAtom = graphHydrogen;
        if (graphHydrogen < 0)
        {
            halogenAtom = draft.AtomCount;
            draft.AddAtom() = Describe(default, halogen, 0);
        }
        else
        {
            draft.Atoms[graphHydrogen] = Describe(default, halogen, 0);
        }

        foreach (Bond bond in molecule.BondSpan)
        {
            bool toHydrogen = bond.Begin == graphHydrogen || bond.End == graphHydrogen;
            draft.AddBond() = toHydrogen
                ? new BuilderBond { Begin = path[^1], End = halogenAtom, Order = BondOrder.Single, Position = -1 }
                : new BuilderBond { Begin = bond.Begin, End = bond.End, Order = Shifted(bond, path), Position = -1 };
        }

        if (graphHydrogen < 0)
        {
            draft.AddBond() = new BuilderBond { Begin = path[^1], End = halogenAtom, Order = BondOrder.Single, Position = -1 };
        }

        foreach (StereoElement element in stereo)
        {
            if (!IsTouched(element, path))
            {
                draft.AddStereo(element);
            }
        }

        return MoleculeCompletion.Complete(draft, out FormatProblem? problem)
            ?? throw new InvalidOperationException(problem!.Message);
    }

    /// <summary>An atom for a draft, with its hydrogens stated.</summary>
    internal static BuilderAtom Describe(Atom atom, int element, int hydrogens) => new()
    {
        Element = (byte)element,
        Charge = (sbyte)atom.FormalCharge,
        Hydrogens = (sbyte)hydrogens,
        Unpaired = (byte)atom.UnpairedElectrons,
        Isotope = (ushort)atom.MassNumber,
        AtomClass = atom.AtomClass,
        Position = -1,
    };

    private static int GraphHydrogen(Molecule molecule, int carbon)
    {
        if (molecule.AtomSpan[carbon].HydrogenCount > 0)
        {
            return -1;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            Atom atom = molecule.AtomSpan[neighbor.Atom];
            if (atom.AtomicNumber == 1 && atom.MassNumber <= 1)
            {
                return neighbor.Atom;
            }
        }

        throw new ArgumentException("The carbon carries no hydrogen to replace.", nameof(carbon));
    }

    private static BondOrder Shifted(Bond bond, int[] path)
    {
        for (int i = 0; i + 1 < path.Length; i++)
        {
            if ((bond.Begin == path[i] && bond.End == path[i + 1]) || (bond.End == path[i] && bond.Begin == path[i + 1]))
            {
                return (BondOrder)((int)bond.Order + (i % 2 == 0 ? 1 : -1));
            }
        }

        return bond.Order;
    }

    // A double bond that moved has lost its configuration, and so has the carbon that became trigonal.
    private static bool IsTouched(StereoElement element, int[] path) => element.Kind == StereoKind.CisTrans
        ? Array.IndexOf(path, element.Focus) >= 0 && Array.IndexOf(path, element.FocusEnd) >= 0
        : Array.IndexOf(path, element.Focus) >= 0;
}
