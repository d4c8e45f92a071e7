using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>Follows a carbon radical through carbon-carbon pi bonds to the other positions that carry the odd electron.</summary>
/// <remarks>
/// One step moves the radical from r over a neighbour a to b where r-a is single and a=b (or a#b) is a localised
/// carbon-carbon pi bond; repeated steps give pentadienyl and longer radicals. Not followed, and reported instead:
/// aromatic ring positions (the product would lose aromaticity), heteroatom ends (an O-X or N-X bond is no
/// C-halogen product), and double bonds that a small ring cannot hold.
/// </remarks>
internal static class DelocalisationWalk
{
    /// <summary>Longest walk, in atoms; a carotenoid stays below it.</summary>
    private const int LongestPath = 64;

    /// <summary>Most canonical forms followed; acyclic and ordinary cyclic polyenes stay far below it.</summary>
    private const int MostPaths = 512;

    /// <summary>Finds all ends.</summary>
    /// <param name="molecule">The substrate.</param>
    /// <param name="carbon">0-based index of the carbon that lost its hydrogen.</param>
    /// <param name="ends">
    /// Receives for each canonical form the path from the carbon to its end, both included; one end may be reached by
    /// several paths, which leave the pi bonds in different places.
    /// </param>
    /// <returns>What was met and not followed.</returns>
    internal static DelocalisationBarriers Find(Molecule molecule, int carbon, List<int[]> ends)
    {
        var barriers = DelocalisationBarriers.None;
        var queue = new Queue<int[]>();
        queue.Enqueue([carbon]);
        while (queue.TryDequeue(out int[]? path))
        {
            int radical = path[^1];
            foreach (Neighbor first in molecule.NeighborsOf(radical))
            {
                if (molecule.BondSpan[first.Bond].Order != BondOrder.Single || Array.IndexOf(path, first.Atom) >= 0
                    || molecule.AtomSpan[first.Atom].AtomicNumber != 6)
                {
                    continue;
                }

                barriers |= Step(molecule, path, first, queue, ends);
            }
        }

        return barriers;
    }

    private static DelocalisationBarriers Step(
        Molecule molecule, int[] path, Neighbor first, Queue<int[]> queue, List<int[]> ends)
    {
        var barriers = DelocalisationBarriers.None;
        foreach (Neighbor second in molecule.NeighborsOf(first.Atom))
        {
            Bond pi = molecule.BondSpan[second.Bond];
            if (pi.Order is not (BondOrder.Double or BondOrder.Triple) || Array.IndexOf(path, second.Atom) >= 0)
            {
                continue;
            }

            if (pi.IsAromatic)
            {
                barriers |= DelocalisationBarriers.AromaticRing;
            }
            else if (molecule.AtomSpan[second.Atom].AtomicNumber != 6)
            {
                barriers |= DelocalisationBarriers.Heteroatom;
            }
            else if (RingStrain.Forbids(molecule, path[^1], first, pi))
            {
                barriers |= DelocalisationBarriers.SmallRing;
            }
            else if (path.Length + 2 <= LongestPath && ends.Count < MostPaths)
            {
                int[] longer = [.. path, first.Atom, second.Atom];
                ends.Add(longer);
                queue.Enqueue(longer);
            }
        }

        return barriers;
    }
}
