using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

internal static partial class AromaticityModel
{
    // More rings than this in one fused system are not joined; sheets that large are aromatic ring by ring or not at all.
    private const int MostRingsJoined = 64;

    /// <summary>Tests envelopes of fused rings: symmetric differences of rings that share bonds.</summary>
    private static void JoinRings(
        CompletionScratch scratch, ReadOnlySpan<int> electrons, Span<int> stamps, int stamp, List<int[]> open, int count)
    {
        // A ring all of whose bonds are aromatic already (the rim of fused aromatic rings) can add nothing.
        for (int i = open.Count - 1; i >= 0; i--)
        {
            if (IsWhollyAromatic(scratch, open[i]))
            {
                open.RemoveAt(i);
            }
        }

        if (open.Count == 0)
        {
            return;
        }

        // Rings that are aromatic already may be part of an envelope with those that are not.
        var rings = new List<int[]>(open);
        Span<int> ring = stackalloc int[LongestRing];
        for (int atom = 0; atom < count && rings.Count <= MostRingsJoined; atom++)
        {
            if ((scratch.AtomFlags[atom] & AtomFlags.Aromatic) == 0)
            {
                continue;
            }

            ReadOnlySpan<Neighbor> neighbors = scratch.NeighborsOf(atom);
            for (int i = 0; i < neighbors.Length; i++)
            {
                for (int j = i + 1; j < neighbors.Length; j++)
                {
                    if (IsAromaticBond(scratch, neighbors[i]) && IsAromaticBond(scratch, neighbors[j]))
                    {
                        int size = RingThrough(scratch, electrons, stamps, ++stamp, atom, neighbors[i].Atom, neighbors[j].Atom, ring);
                        if (size >= 3 && Satisfies(electrons, ring[..size]) && !Holds(rings, ring[..size]))
                        {
                            rings.Add(ring[..size].ToArray());
                        }
                    }
                }
            }
        }

        if (rings.Count > MostRingsJoined || rings.Count < 2)
        {
            return;
        }

        var bonds = new HashSet<(int, int)>[rings.Count];
        for (int i = 0; i < rings.Count; i++)
        {
            bonds[i] = BondsOf(rings[i]);
        }

        var chosen = new List<int>();
        for (int first = 0; first < open.Count; first++)
        {
            chosen.Clear();
            chosen.Add(first);
            Extend(scratch, electrons, bonds, chosen, new HashSet<(int, int)>(bonds[first]));
        }
    }

    private static bool IsWhollyAromatic(CompletionScratch scratch, int[] ring)
    {
        for (int i = 0; i < ring.Length; i++)
        {
            int next = ring[i + 1 == ring.Length ? 0 : i + 1];
            foreach (Neighbor neighbor in scratch.NeighborsOf(ring[i]))
            {
                if (neighbor.Atom == next && !IsAromaticBond(scratch, neighbor))
                {
                    return false;
                }
            }
        }

        return true;
    }

    private static bool IsAromaticBond(CompletionScratch scratch, Neighbor neighbor) =>
        (scratch.BondFlags[neighbor.Bond] & CompletionScratch.AromaticBit) != 0;

    private static HashSet<(int Low, int High)> BondsOf(int[] ring)
    {
        var bonds = new HashSet<(int, int)>();
        for (int i = 0; i < ring.Length; i++)
        {
            int next = ring[(i + 1) % ring.Length];
            bonds.Add((Math.Min(ring[i], next), Math.Max(ring[i], next)));
        }

        return bonds;
    }

    private static void Extend(
        CompletionScratch scratch, ReadOnlySpan<int> electrons, HashSet<(int, int)>[] bonds, List<int> chosen,
        HashSet<(int, int)> envelope)
    {
        if (chosen.Count == LargestUnion)
        {
            return;
        }

        for (int next = 0; next < bonds.Length; next++)
        {
            if (chosen.Contains(next) || !bonds[next].Overlaps(envelope))
            {
                continue;
            }

            var joined = new HashSet<(int, int)>(envelope);
            joined.SymmetricExceptWith(bonds[next]);
            chosen.Add(next);
            int[]? cycle = joined.Count <= LongestRing ? AsCycle(joined) : null;
            if (cycle is not null && Satisfies(electrons, cycle))
            {
                MarkRing(scratch, cycle, [], 0);
            }

            Extend(scratch, electrons, bonds, chosen, joined);
            chosen.RemoveAt(chosen.Count - 1);
        }
    }

    private static int[]? AsCycle(HashSet<(int Low, int High)> bonds)
    {
        if (bonds.Count == 0)
        {
            return null;
        }

        var next = new Dictionary<int, (int A, int B)>();
        foreach ((int low, int high) in bonds)
        {
            if (!Link(next, low, high) || !Link(next, high, low))
            {
                return null;
            }
        }

        var cycle = new List<int>(bonds.Count);
        int start = -1;
        foreach (int atom in next.Keys)
        {
            start = atom;
            break;
        }

        int previous = -1;
        for (int atom = start; cycle.Count <= bonds.Count;)
        {
            cycle.Add(atom);
            (int a, int b) = next[atom];
            if (a < 0 || b < 0)
            {
                return null;
            }

            int following = a == previous ? b : a;
            previous = atom;
            atom = following;
            if (atom == start)
            {
                break;
            }
        }

        return cycle.Count == bonds.Count ? cycle.ToArray() : null;
    }

    private static bool Link(Dictionary<int, (int A, int B)> next, int from, int to)
    {
        if (!next.TryGetValue(from, out (int A, int B) ends))
        {
            next[from] = (to, -1);
            return true;
        }

        if (ends.B >= 0)
        {
            return false;
        }

        next[from] = (ends.A, to);
        return true;
    }
}
