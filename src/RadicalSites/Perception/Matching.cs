using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Augmenting paths in a general graph (blossom method), for the few atoms that greedy pairing leaves over.</summary>
internal static class Matching
{
    private const int Optional = 1;

    /// <summary>Looks for an augmenting path from a free atom and applies it.</summary>
    /// <param name="scratch">Graph and candidate bonds.</param>
    /// <param name="need">2 = has to be matched, 1 = may be, 0 = takes no part.</param>
    /// <param name="mate">Partner of each atom or -1; changed on success.</param>
    /// <param name="count">Number of atoms.</param>
    /// <param name="root">The free atom.</param>
    /// <returns>Whether the atom is matched now.</returns>
    internal static bool Augment(CompletionScratch scratch, int[] need, int[] mate, int count, int root)
    {
        using var rented = new ScratchInts(5 * count);
        Span<int> parent = rented.Span[..count];
        Span<int> origin = rented.Span.Slice(count, count);
        Span<int> queue = rented.Span.Slice(2 * count, count);
        Span<int> outer = rented.Span.Slice(3 * count, count);
        Span<int> mark = rented.Span.Slice(4 * count, count);
        parent.Fill(-1);
        outer.Clear();
        mark.Clear();
        for (int i = 0; i < count; i++)
        {
            origin[i] = i;
        }

        int head = 0;
        int tail = 0;
        int stamp = 0;
        queue[tail++] = root;
        outer[root] = 1;
        while (head < tail)
        {
            int atom = queue[head++];
            foreach (Neighbor neighbor in scratch.NeighborsOf(atom))
            {
                int other = neighbor.Atom;
                if ((scratch.BondFlags[neighbor.Bond] & CompletionScratch.CandidateBit) == 0
                    || origin[atom] == origin[other] || mate[atom] == other)
                {
                    continue;
                }

                if (other == root || (mate[other] >= 0 && parent[mate[other]] >= 0))
                {
                    int ancestor = CommonAncestor(mate, parent, origin, mark, ++stamp, atom, other);
                    Contract(mate, parent, origin, outer, queue, ref tail, atom, ancestor, other);
                    Contract(mate, parent, origin, outer, queue, ref tail, other, ancestor, atom);
                }
                else if (parent[other] < 0)
                {
                    parent[other] = atom;
                    if (mate[other] < 0)
                    {
                        Flip(mate, parent, other);
                        return true;
                    }

                    int next = mate[other];
                    if (need[next] == Optional)
                    {
                        // The optional atom gives up its partner: an even path that ends in an atom allowed to stay free.
                        mate[next] = -1;
                        Flip(mate, parent, other);
                        return true;
                    }

                    if (outer[next] == 0)
                    {
                        outer[next] = 1;
                        queue[tail++] = next;
                    }
                }
            }
        }

        return false;
    }

    private static void Flip(int[] mate, Span<int> parent, int end)
    {
        while (end >= 0)
        {
            int previous = parent[end];
            int next = mate[previous];
            mate[end] = previous;
            mate[previous] = end;
            end = next;
        }
    }

    private static int CommonAncestor(
        int[] mate, Span<int> parent, Span<int> origin, Span<int> mark, int stamp, int left, int right)
    {
        while (true)
        {
            left = origin[left];
            mark[left] = stamp;
            if (mate[left] < 0)
            {
                break;
            }

            left = parent[mate[left]];
        }

        while (true)
        {
            right = origin[right];
            if (mark[right] == stamp)
            {
                return right;
            }

            right = parent[mate[right]];
        }
    }

    private static void Contract(
        int[] mate, Span<int> parent, Span<int> origin, Span<int> outer, Span<int> queue, ref int tail,
        int atom, int ancestor, int child)
    {
        Span<int> all = origin;
        while (all[atom] != ancestor)
        {
            parent[atom] = child;
            int partner = mate[atom];
            int atomOrigin = all[atom];
            int partnerOrigin = all[partner];
            for (int i = 0; i < all.Length; i++)
            {
                if (all[i] == atomOrigin || all[i] == partnerOrigin)
                {
                    all[i] = ancestor;
                    if (outer[i] == 0)
                    {
                        outer[i] = 1;
                        queue[tail++] = i;
                    }
                }
            }

            child = partner;
            atom = parent[partner];
        }
    }
}
