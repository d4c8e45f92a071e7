using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Finds a smallest ring of aromatic bonds through an atom.</summary>
internal static class AromaticRing
{
    /// <summary>Rings longer than this are not looked for; the atom alone is returned.</summary>
    internal const int Longest = 24;

    // What a breadth-first search of depth 24 over a planar aromatic sheet can reach stays well below this.
    private const int Reach = 256;

    /// <summary>Writes the atoms of a smallest aromatic ring; a ring with a heteroatom wins a tie.</summary>
    /// <param name="molecule">A molecule.</param>
    /// <param name="start">0-based index of an aromatic atom.</param>
    /// <param name="ring">Receives the atoms, <paramref name="start"/> first; at least <see cref="Longest"/> long.</param>
    /// <returns>Number of atoms written; 1 when no ring was found.</returns>
    internal static int Around(Molecule molecule, int start, Span<int> ring)
    {
        Span<int> atoms = stackalloc int[Reach];
        Span<int> parents = stackalloc int[Reach];
        Span<int> depths = stackalloc int[Reach];
        int best = 0;
        bool bestHetero = false;
        foreach (Neighbor first in molecule.NeighborsOf(start))
        {
            if (!molecule.BondSpan[first.Bond].IsAromatic)
            {
                continue;
            }

            int last = Search(molecule, start, first.Atom, best == 0 ? Longest : best, atoms, parents, depths);
            if (last < 0)
            {
                continue;
            }

            bool hetero = molecule.AtomSpan[start].AtomicNumber != 6;
            for (int at = last; at >= 0; at = parents[at])
            {
                hetero |= molecule.AtomSpan[atoms[at]].AtomicNumber != 6;
            }

            if (best == 0 || depths[last] < best || (hetero && !bestHetero))
            {
                best = depths[last];
                bestHetero = hetero;
                ring[0] = start;
                for (int at = last, i = best - 1; at >= 0; at = parents[at], i--)
                {
                    ring[i] = atoms[at];
                }
            }
        }

        if (best == 0)
        {
            ring[0] = start;
            return 1;
        }

        return best;
    }

    // Breadth-first from the second atom until the search comes back to the start; returns the last entry, or -1.
    private static int Search(
        Molecule molecule, int start, int second, int longest, Span<int> atoms, Span<int> parents, Span<int> depths)
    {
        atoms[0] = second;
        parents[0] = -1;
        depths[0] = 2;
        int filled = 1;
        for (int head = 0; head < filled && depths[head] <= longest; head++)
        {
            foreach (Neighbor next in molecule.NeighborsOf(atoms[head]))
            {
                if (!molecule.BondSpan[next.Bond].IsAromatic)
                {
                    continue;
                }

                if (next.Atom == start)
                {
                    if (head > 0)
                    {
                        return head;
                    }
                }
                else if (filled < Reach && atoms[..filled].IndexOf(next.Atom) < 0)
                {
                    atoms[filled] = next.Atom;
                    parents[filled] = head;
                    depths[filled++] = depths[head] + 1;
                }
            }
        }

        return -1;
    }
}
