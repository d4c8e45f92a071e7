using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Symmetry;

namespace RadicalSites.Products;

/// <summary>What the product lists ask about stereo units.</summary>
internal static class StereoUnits
{
    /// <summary>The stated elements that mean something.</summary>
    internal static StereoElement[] Meaningful(Molecule molecule) =>
        molecule.StereoElements.Count == 0 ? [] : StereoPerception.WithoutPhantoms(molecule).StereoSpan.ToArray();

    /// <summary>Whether a saturated carbon is a stereocentre, stated or not.</summary>
    /// <remarks>
    /// Four ligands of different kind make one. Two like ligands in a ring make one too when another ring atom carries two
    /// unlike ligands, so that the two faces of the ring differ (1,4-dimethylcyclohexane); outside rings they do when
    /// stated configurations make them mirror images (pseudoasymmetry).
    /// </remarks>
    internal static bool IsStereocentre(SymmetryAnalysis symmetry, int atom)
    {
        Molecule molecule = symmetry.Molecule;
        Atom data = molecule.AtomSpan[atom];
        ReadOnlySpan<Neighbor> neighbors = molecule.NeighborsOf(atom);
        if (data.AtomicNumber != 6 || data.HydrogenCount > 1 || neighbors.Length + data.HydrogenCount != 4)
        {
            return false;
        }

        for (int i = 0; i < neighbors.Length; i++)
        {
            for (int j = i + 1; j < neighbors.Length; j++)
            {
                Topicity relation = symmetry.Between(neighbors[i].Atom, neighbors[j].Atom);
                if (relation > Topicity.Enantiotopic)
                {
                    continue;
                }

                bool inRing = molecule.BondSpan[neighbors[i].Bond].IsInRing && molecule.BondSpan[neighbors[j].Bond].IsInRing;
                bool apart = inRing
                    ? HasFacePartner(symmetry, atom)
                    : relation == Topicity.Enantiotopic && molecule.StereoElements.Count > 0 && WouldMean(molecule, atom);
                if (!apart)
                {
                    return false;
                }
            }
        }

        return true;
    }

    /// <summary>Stereo units that state nothing.</summary>
    internal static int CountOpen(SymmetryAnalysis symmetry, out int centres)
    {
        Molecule molecule = symmetry.Molecule;
        centres = 0;
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            centres += !IsStated(molecule, atom, atom) && IsStereocentre(symmetry, atom) ? 1 : 0;
        }

        int bonds = 0;
        foreach (Bond bond in molecule.BondSpan)
        {
            if (bond.Order == BondOrder.Double && !bond.IsAromatic && !bond.IsInRing
                && !IsStated(molecule, bond.Begin, bond.End)
                && HasUnlikeLigands(symmetry, bond.Begin, bond.End) && HasUnlikeLigands(symmetry, bond.End, bond.Begin))
            {
                bonds++;
            }
        }

        return centres + bonds;
    }

    /// <summary>Whether a tetrahedral centre or allene axis is stated.</summary>
    internal static bool HasStatedCentre(Molecule molecule)
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind != StereoKind.CisTrans)
            {
                return true;
            }
        }

        return false;
    }

    private static bool HasFacePartner(SymmetryAnalysis symmetry, int atom)
    {
        Molecule molecule = symmetry.Molecule;
        for (int other = 0; other < molecule.AtomCount; other++)
        {
            if (other == atom || !molecule.AtomSpan[other].IsInRing || molecule.AtomSpan[other].HydrogenCount > 1)
            {
                continue;
            }

            int first = -1;
            int outside = molecule.AtomSpan[other].HydrogenCount;
            bool unlike = outside > 0;
            foreach (Neighbor neighbor in molecule.NeighborsOf(other))
            {
                if (molecule.BondSpan[neighbor.Bond].IsInRing || molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
                {
                    continue;
                }

                unlike |= first >= 0 && symmetry.Between(first, neighbor.Atom) > Topicity.Enantiotopic;
                first = neighbor.Atom;
                outside++;
            }

            if (outside == 2 && unlike)
            {
                return true;
            }
        }

        return false;
    }

    // States a configuration and sees whether it makes a difference.
    private static bool WouldMean(Molecule molecule, int atom)
    {
        if (IsStated(molecule, atom, atom))
        {
            return Array.Exists(Meaningful(molecule), element => element.Focus == atom);
        }

        Span<int> carriers = [-1, -1, -1, -1];
        ReadOnlySpan<Neighbor> neighbors = molecule.NeighborsOf(atom);
        for (int i = 0; i < neighbors.Length; i++)
        {
            carriers[i] = neighbors[i].Atom;
        }

        StereoElement[] stated =
            [.. molecule.StereoSpan, new StereoElement(StereoKind.Tetrahedral, atom, atom, carriers.ToArray(), 1)];
        Array.Sort(stated, static (left, right) => left.Focus.CompareTo(right.Focus));
        return Array.Exists(Meaningful(molecule.WithStereo(stated)), element => element.Focus == atom);
    }

    private static bool HasUnlikeLigands(SymmetryAnalysis symmetry, int end, int partner)
    {
        Molecule molecule = symmetry.Molecule;
        int first = -1;
        int count = molecule.AtomSpan[end].HydrogenCount;
        bool unlike = count == 1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(end))
        {
            if (neighbor.Atom == partner)
            {
                continue;
            }

            if (molecule.BondSpan[neighbor.Bond].Order != BondOrder.Single)
            {
                return false;
            }

            unlike |= first >= 0 && symmetry.Between(first, neighbor.Atom) > Topicity.Enantiotopic;
            first = neighbor.Atom;
            count++;
        }

        return count == 2 && first >= 0 && unlike;
    }

    private static bool IsStated(Molecule molecule, int begin, int end)
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if ((element.Focus == begin && element.FocusEnd == end) || (element.Focus == end && element.FocusEnd == begin))
            {
                return true;
            }
        }

        return false;
    }

    internal static IReadOnlyList<string> Expand(Molecule molecule) => throw new NotSupportedException(molecule.ToString());
}
