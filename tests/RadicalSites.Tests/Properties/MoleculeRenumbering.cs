using System;
using RadicalSites.Molecules;

namespace RadicalSites.Tests.Properties;

/// <summary>The same molecule with its atoms, bonds and stereo carriers in a random order.</summary>
internal sealed class MoleculeRenumbering
{
    private MoleculeRenumbering(Molecule molecule, int[] placeOf)
    {
        Molecule = molecule;
        PlaceOf = placeOf;
    }

    /// <summary>The renumbered molecule.</summary>
    internal Molecule Molecule { get; }

    /// <summary>New index by old index.</summary>
    internal int[] PlaceOf { get; }

    internal static MoleculeRenumbering Random(Molecule molecule, Random random)
    {
        int n = molecule.AtomCount;
        int[] placeOf = new int[n];
        for (int i = 0; i < n; i++)
        {
            placeOf[i] = i;
        }

        random.Shuffle(placeOf);
        Atom[] atoms = new Atom[n];
        for (int i = 0; i < n; i++)
        {
            atoms[placeOf[i]] = molecule.AtomSpan[i];
        }

        Bond[] bonds = new Bond[molecule.BondCount];
        for (int i = 0; i < bonds.Length; i++)
        {
            Bond bond = molecule.BondSpan[i];
            int begin = placeOf[bond.Begin];
            int end = placeOf[bond.End];
            bonds[i] = random.Next(2) == 0
                ? new Bond(begin, end, bond.Order, bond.IsAromatic, bond.IsInRing)
                : new Bond(end, begin, bond.Order, bond.IsAromatic, bond.IsInRing);
        }

        random.Shuffle(bonds);
        StereoElement[] stereo = new StereoElement[molecule.StereoSpan.Length];
        for (int i = 0; i < stereo.Length; i++)
        {
            stereo[i] = Renumber(molecule.StereoSpan[i], placeOf, random);
        }

        random.Shuffle(stereo);
        return new MoleculeRenumbering(Connect(atoms, bonds, stereo), placeOf);
    }

    /// <summary>Builds the neighbour lists in the order of the bonds.</summary>
    internal static Molecule Connect(Atom[] atoms, Bond[] bonds, StereoElement[] stereo)
    {
        int[] offsets = new int[atoms.Length + 1];
        foreach (Bond bond in bonds)
        {
            offsets[bond.Begin + 1]++;
            offsets[bond.End + 1]++;
        }

        for (int i = 0; i < atoms.Length; i++)
        {
            offsets[i + 1] += offsets[i];
        }

        int[] next = offsets.AsSpan(0, atoms.Length).ToArray();
        Neighbor[] neighbors = new Neighbor[2 * bonds.Length];
        for (int i = 0; i < bonds.Length; i++)
        {
            neighbors[next[bonds[i].Begin]++] = new Neighbor(bonds[i].End, i);
            neighbors[next[bonds[i].End]++] = new Neighbor(bonds[i].Begin, i);
        }

        return new Molecule(atoms, bonds, offsets, neighbors, stereo);
    }

    private static StereoElement Renumber(StereoElement element, int[] placeOf, Random random)
    {
        int[] carriers = new int[element.Carriers.Count];
        for (int i = 0; i < carriers.Length; i++)
        {
            carriers[i] = element.Carriers[i] < 0 ? element.Carriers[i] : placeOf[element.Carriers[i]];
        }

        int configuration = element.Configuration;
        int focus = placeOf[element.Focus];
        int focusEnd = placeOf[element.FocusEnd];
        switch (element.Kind)
        {
            case StereoKind.Tetrahedral:
                for (int i = 0; i < 3; i++)
                {
                    int a = random.Next(4);
                    int b = random.Next(4);
                    configuration = a == b ? configuration : 3 - configuration;
                    (carriers[a], carriers[b]) = (carriers[b], carriers[a]);
                }

                break;
            case StereoKind.Allene when random.Next(2) == 0:
                (carriers[0], carriers[1]) = (carriers[1], carriers[0]);
                configuration = 3 - configuration;
                break;
            case StereoKind.CisTrans when random.Next(2) == 0:
                (focus, focusEnd) = (focusEnd, focus);
                (carriers[0], carriers[1]) = (carriers[1], carriers[0]);
                break;
        }

        return new StereoElement(element.Kind, focus, focusEnd, carriers, configuration);
    }
}
