using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>Puts halogen atoms in the place of hydrogens by extending the arrays of the substrate.</summary>
/// <remarks>
/// Nothing is perceived again: a hydrogen on an sp3 carbon belongs to no ring and no pi system, so ring and aromatic
/// flags of the substrate hold in the product. Atom indices of the substrate are kept and the halogens follow.
/// </remarks>
internal static class HydrogenReplacement
{
    /// <summary>Replaces one hydrogen on each carbon listed; a carbon may be listed several times.</summary>
    /// <param name="molecule">The substrate.</param>
    /// <param name="carbons">0-based indices of carbons; each has as many counted hydrogens as it is listed.</param>
    /// <param name="halogen">Atomic number of the halogen.</param>
    /// <param name="stereo">Stereo elements of the substrate to keep; those at a listed carbon are dropped unless rigid.</param>
    /// <param name="rigid">Listed carbons that a cage holds in shape, so that the halogen takes the place of the hydrogen.</param>
    /// <returns>The product.</returns>
    internal static Molecule Replace(
        Molecule molecule, ReadOnlySpan<int> carbons, int halogen, ReadOnlySpan<StereoElement> stereo,
        ReadOnlySpan<int> rigid = default)
    {
        int atomCount = molecule.AtomCount;
        int bondCount = molecule.BondCount;
        int added = carbons.Length;
        var atoms = new Atom[atomCount + added];
        molecule.AtomSpan.CopyTo(atoms);
        var bonds = new Bond[bondCount + added];
        molecule.BondSpan.CopyTo(bonds);
        var halogenAtom = new Atom(halogen, 0, 0, 0, 0, AtomFlags.None, 0);
        for (int i = 0; i < added; i++)
        {
            int carbon = carbons[i];
            atoms[carbon] = atoms[carbon].WithHydrogens(atoms[carbon].HydrogenCount - 1, 0);
            atoms[atomCount + i] = halogenAtom;
            bonds[bondCount + i] = new Bond(carbon, atomCount + i, BondOrder.Single, isAromatic: false, isInRing: false);
        }

        var offsets = new int[atomCount + added + 1];
        var neighbors = new Neighbor[2 * (bondCount + added)];
        if (added == 1)
        {
            ExtendByOne(molecule, carbons[0], offsets, neighbors);
        }
        else
        {
            ExtendByMany(molecule, carbons, offsets, neighbors);
        }

        return new Molecule(atoms, bonds, offsets, neighbors, Keep(stereo, carbons, rigid, atomCount));
    }

    /// <summary>Replaces a hydrogen that is an atom of the graph (isotope 1 or atom class) by a halogen in its place.</summary>
    internal static Molecule ReplaceGraphHydrogen(
        Molecule molecule, int carbon, int halogen, ReadOnlySpan<StereoElement> stereo)
    {
        Atom[] atoms = molecule.AtomSpan.ToArray();
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            if (atoms[neighbor.Atom].AtomicNumber == 1 && atoms[neighbor.Atom].MassNumber <= 1)
            {
                atoms[neighbor.Atom] = new Atom(halogen, 0, 0, 0, 0, AtomFlags.None, 0);
                return new Molecule(
                    atoms, molecule.BondSpan.ToArray(), molecule.NeighborOffsets.ToArray(),
                    molecule.NeighborSpan.ToArray(), Keep(stereo, [carbon], default, 0));
            }
        }

        throw new ArgumentException("The carbon carries no hydrogen to replace.", nameof(carbon));
    }

    // The common case in three block copies.
    private static void ExtendByOne(Molecule molecule, int carbon, int[] offsets, Neighbor[] neighbors)
    {
        ReadOnlySpan<int> oldOffsets = molecule.NeighborOffsets;
        ReadOnlySpan<Neighbor> old = molecule.NeighborSpan;
        int atomCount = molecule.AtomCount;
        int split = oldOffsets[carbon + 1];
        old[..split].CopyTo(neighbors);
        neighbors[split] = new Neighbor(atomCount, molecule.BondCount);
        old[split..].CopyTo(neighbors.AsSpan(split + 1));
        oldOffsets[..(carbon + 1)].CopyTo(offsets);
        for (int atom = carbon + 1; atom <= atomCount; atom++)
        {
            offsets[atom] = oldOffsets[atom] + 1;
        }

        neighbors[^1] = new Neighbor(carbon, molecule.BondCount);
        offsets[atomCount + 1] = neighbors.Length;
    }

    private static void ExtendByMany(Molecule molecule, ReadOnlySpan<int> carbons, int[] offsets, Neighbor[] neighbors)
    {
        int atomCount = molecule.AtomCount;
        int position = 0;
        for (int atom = 0; atom < atomCount; atom++)
        {
            offsets[atom] = position;
            ReadOnlySpan<Neighbor> old = molecule.NeighborsOf(atom);
            old.CopyTo(neighbors.AsSpan(position));
            position += old.Length;
            for (int i = 0; i < carbons.Length; i++)
            {
                if (carbons[i] == atom)
                {
                    neighbors[position++] = new Neighbor(atomCount + i, molecule.BondCount + i);
                }
            }
        }

        for (int i = 0; i < carbons.Length; i++)
        {
            offsets[atomCount + i] = position;
            neighbors[position++] = new Neighbor(carbons[i], molecule.BondCount + i);
        }

        offsets[atomCount + carbons.Length] = position;
    }

    private static StereoElement[] Keep(
        ReadOnlySpan<StereoElement> stereo, ReadOnlySpan<int> carbons, ReadOnlySpan<int> rigid, int firstHalogen)
    {
        int dropped = 0;
        foreach (StereoElement element in stereo)
        {
            dropped += carbons.Contains(element.Focus) && !rigid.Contains(element.Focus) ? 1 : 0;
        }

        if (stereo.Length == dropped)
        {
            return [];
        }

        var kept = new StereoElement[stereo.Length - dropped];
        int count = 0;
        foreach (StereoElement element in stereo)
        {
            int place = carbons.IndexOf(element.Focus);
            if (place < 0)
            {
                kept[count++] = element;
            }
            else if (rigid.Contains(element.Focus))
            {
                int[] carriers = element.CarrierSpan.ToArray();
                carriers.AsSpan().Replace(-1, firstHalogen + place);
                kept[count++] = new StereoElement(
                    element.Kind, element.Focus, element.FocusEnd, carriers, element.Configuration);
            }
        }

        return kept;
    }
}
