using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Small questions about the bonds around one atom that several rooms ask.</summary>
internal static class LocalPatterns
{
    /// <summary>The heteroatom (O, N, S ...) double-bonded to a carbon, or -1.</summary>
    internal static int DoubleBondedHeteroatom(Molecule molecule, int carbon)
    {
        if (molecule.AtomSpan[carbon].IsAromatic)
        {
            return -1;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            if (molecule.BondSpan[neighbor.Bond].Order == BondOrder.Double
                && molecule.AtomSpan[neighbor.Atom].AtomicNumber is not 6)
            {
                return neighbor.Atom;
            }
        }

        return -1;
    }

    /// <summary>The oxygen or sulfur that makes a carbon an acyl group, or -1.</summary>
    internal static int AcylPartner(Molecule molecule, int carbon)
    {
        int partner = DoubleBondedHeteroatom(molecule, carbon);
        return partner >= 0 && molecule.AtomSpan[partner].AtomicNumber is 8 or 16 or 34 ? partner : -1;
    }

    internal static bool HasTripleBond(Molecule molecule, int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order == BondOrder.Triple)
            {
                return true;
            }
        }

        return false;
    }

    internal static bool HasOnlySingleBonds(Molecule molecule, int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>Terminal oxygens on an atom: double-bonded, or single-bonded with a negative charge.</summary>
    internal static int CountOxo(Molecule molecule, int atom)
    {
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            count += IsOxo(molecule, neighbor) ? 1 : 0;
        }

        return count;
    }

    internal static bool IsOxo(Molecule molecule, Neighbor neighbor)
    {
        Atom data = molecule.AtomSpan[neighbor.Atom];
        return data.AtomicNumber == 8
            && (molecule.BondSpan[neighbor.Bond].Order == BondOrder.Double
                || (data.FormalCharge == -1 && molecule.DegreeOf(neighbor.Atom) == 1));
    }

    internal static bool IsOxide(Molecule molecule, int atom) => CountOxo(molecule, atom) > 0;

    // Both ways of writing the group: [N+](=O)[O-] and N(=O)=O.
    internal static bool IsNitro(Molecule molecule, int nitrogen, out int[] atoms)
    {
        atoms = [];
        if (molecule.DegreeOf(nitrogen) != 3 || CountOxo(molecule, nitrogen) != 2)
        {
            return false;
        }

        atoms = new int[3];
        atoms[0] = nitrogen;
        int filled = 1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(nitrogen))
        {
            if (IsOxo(molecule, neighbor))
            {
                atoms[filled++] = neighbor.Atom;
            }
        }

        return true;
    }
}
