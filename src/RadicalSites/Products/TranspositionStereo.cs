using System;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>Whether a transposition makes a stereocentre or a stereo double bond, read off the substrate where that is sure.</summary>
/// <remarks>
/// Each answer is yes, no, or null where ligands must be compared inside the product; then the product itself is analysed.
/// </remarks>
internal readonly ref struct TranspositionStereo(SymmetryAnalysis symmetry, int[] path, int halogen)
{
    private readonly Molecule molecule = symmetry.Molecule;

    /// <summary>Whether the end that takes the halogen becomes a centre.</summary>
    internal bool? MakesCentre()
    {
        int end = path[^1];
        if (BondOrderBetween(path[^2], end) == BondOrder.Triple)
        {
            return null;
        }

        int hydrogens = molecule.AtomSpan[end].HydrogenCount;
        Others(end, path[^2], out int first, out int second);
        if (hydrogens > 1 || (hydrogens == 0 && second < 0))
        {
            return false;
        }

        if (IsLeafOf(first, halogen) || IsLeafOf(second, halogen))
        {
            return false;
        }

        bool simple = IsSaturated(first) && (second < 0 || IsSaturated(second));
        return hydrogens == 1 ? (simple ? true : null)
            : AreUnlike(first, second) is { } unlike ? (unlike && simple ? true : unlike ? null : false) : null;
    }

    /// <summary>Whether a double bond that moved can have two configurations.</summary>
    internal bool? MakesDoubleBond()
    {
        bool unsure = false;
        for (int i = 0; i + 1 < path.Length; i += 2)
        {
            if (RingBond(path[i], path[i + 1]))
            {
                unsure |= !InSmallRing(path[i]);
                continue;
            }

            bool? begin = HasUnlikeLigands(path[i], path[i + 1], i == 0 ? 1 : 0);
            bool? end = HasUnlikeLigands(path[i + 1], path[i], 0);
            if (begin == true && end == true)
            {
                return true;
            }

            unsure |= begin is null && end != false || end is null && begin != false;
        }

        return unsure ? null : false;
    }

    private bool? HasUnlikeLigands(int end, int partner, int lostHydrogens)
    {
        int hydrogens = molecule.AtomSpan[end].HydrogenCount - lostHydrogens;
        Others(end, partner, out int first, out int second);
        if (hydrogens > 1)
        {
            return false;
        }

        if (hydrogens == 1)
        {
            return first >= 0;
        }

        return second < 0 ? false : AreUnlike(first, second) is not { } unlike ? null
            : !unlike || (IsSaturated(first) && IsSaturated(second)) ? unlike : null;
    }

    // Different constitution in the substrate stays different; two equal leaves stay equal; the rest needs a look.
    private bool? AreUnlike(int first, int second) =>
        symmetry.OrbitOf(first, EquivalenceLevel.Constitutional) != symmetry.OrbitOf(second, EquivalenceLevel.Constitutional)
            ? true
            : molecule.DegreeOf(first) == 1 ? false : null;

    private void Others(int atom, int except, out int first, out int second)
    {
        first = -1;
        second = -1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (neighbor.Atom != except)
            {
                second = first;
                first = neighbor.Atom;
            }
        }
    }

    private bool IsLeafOf(int atom, int element) =>
        atom >= 0 && molecule.AtomSpan[atom].AtomicNumber == element && molecule.DegreeOf(atom) == 1;

    private bool IsSaturated(int atom)
    {
        if (molecule.AtomSpan[atom].IsAromatic)
        {
            return true;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
            {
                return false;
            }
        }

        return true;
    }

    private bool InSmallRing(int atom) =>
        Perception.RingAnalysis.Perceive(molecule).SmallestRingSize(atom) is > 0 and < 8;

    private bool RingBond(int first, int second)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(first))
        {
            if (neighbor.Atom == second)
            {
                return molecule.BondSpan[neighbor.Bond].IsInRing;
            }
        }

        throw new ArgumentException("Consecutive atoms of a path are bonded.", nameof(second));
    }

    private BondOrder BondOrderBetween(int first, int second)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(first))
        {
            if (neighbor.Atom == second)
            {
                return molecule.BondSpan[neighbor.Bond].Order;
            }
        }

        return BondOrder.Unknown;
    }
}
