using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Marks ring atoms and ring bonds in linear time: a bond is on a ring unless it is a bridge of the graph.</summary>
internal static class RingMarker
{
    /// <summary>Whether the graph has any ring, by counting fragments.</summary>
    internal static bool HasRing(CompletionScratch scratch, int atomCount, int bondCount)
    {
        if (bondCount == 0)
        {
            return false;
        }

        // A forest has atoms - fragments bonds; fragments are counted with a union-find over the bonds' ends.
        int[] parent = scratch.First;
        for (int i = 0; i < atomCount; i++)
        {
            parent[i] = i;
        }

        for (int atom = 0; atom < atomCount; atom++)
        {
            foreach (Neighbor neighbor in scratch.NeighborsOf(atom))
            {
                if (neighbor.Atom < atom)
                {
                    continue;
                }

                int left = Root(parent, atom);
                int right = Root(parent, neighbor.Atom);
                if (left == right)
                {
                    return true;
                }

                parent[right] = left;
            }
        }

        return false;
    }

    /// <summary>Sets the ring bits of atoms and bonds by one depth-first walk with low links, without recursion.</summary>
    internal static void Mark(CompletionScratch scratch, StructureDraft draft)
    {
        int count = draft.AtomCount;
        Span<int> number = scratch.First.AsSpan(0, count);
        Span<int> low = scratch.Second.AsSpan(0, count);
        Span<int> entry = scratch.Third.AsSpan(0, count);
        Span<int> stack = scratch.Fourth.AsSpan(0, count);
        number.Clear();
        using var bondScratch = new ScratchInts(count);
        Span<int> parentBond = bondScratch.Span;
        int next = 1;
        for (int root = 0; root < count; root++)
        {
            if (number[root] != 0)
            {
                continue;
            }

            int depth = 0;
            stack[0] = root;
            parentBond[root] = -1;
            number[root] = low[root] = next++;
            entry[root] = scratch.Offsets[root];
            while (depth >= 0)
            {
                int atom = stack[depth];
                if (entry[atom] < scratch.Offsets[atom + 1])
                {
                    Neighbor neighbor = scratch.Neighbors[entry[atom]++];
                    if (neighbor.Bond == parentBond[atom])
                    {
                        continue;
                    }

                    if (number[neighbor.Atom] == 0)
                    {
                        number[neighbor.Atom] = low[neighbor.Atom] = next++;
                        parentBond[neighbor.Atom] = neighbor.Bond;
                        entry[neighbor.Atom] = scratch.Offsets[neighbor.Atom];
                        stack[++depth] = neighbor.Atom;
                    }
                    else
                    {
                        low[atom] = Math.Min(low[atom], number[neighbor.Atom]);
                        SetRing(scratch, draft, neighbor.Bond);
                    }
                }
                else
                {
                    depth--;
                    if (depth >= 0)
                    {
                        int parent = stack[depth];
                        low[parent] = Math.Min(low[parent], low[atom]);
                        if (low[atom] <= number[parent])
                        {
                            SetRing(scratch, draft, parentBond[atom]);
                        }
                    }
                }
            }
        }
    }

    private static void SetRing(CompletionScratch scratch, StructureDraft draft, int bond)
    {
        scratch.BondFlags[bond] |= CompletionScratch.RingBit;
        scratch.AtomFlags[draft.Bonds[bond].Begin] |= AtomFlags.Ring;
        scratch.AtomFlags[draft.Bonds[bond].End] |= AtomFlags.Ring;
    }

    private static int Root(int[] parent, int atom)
    {
        while (parent[atom] != atom)
        {
            parent[atom] = parent[parent[atom]];
            atom = parent[atom];
        }

        return atom;
    }
}
