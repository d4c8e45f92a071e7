using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Smallest rings through two bonds of an atom; rents its working arrays.</summary>
internal readonly ref struct RingSearch
{
    private readonly Molecule molecule;
    private readonly ScratchInts scratch;

    internal RingSearch(Molecule molecule)
    {
        this.molecule = molecule;
        scratch = new ScratchInts(4 * molecule.AtomCount);
        scratch.Span[..molecule.AtomCount].Clear();
    }

    private Span<int> Seen => scratch.Span[..molecule.AtomCount];

    private Span<int> Queue => scratch.Span.Slice(molecule.AtomCount, molecule.AtomCount);

    private Span<int> Parents => scratch.Span.Slice(2 * molecule.AtomCount, molecule.AtomCount);

    private Span<int> Depths => scratch.Span.Slice(3 * molecule.AtomCount, molecule.AtomCount);

    /// <summary>Size of the smallest ring through left - atom - right that is smaller than a bound, or 0.</summary>
    internal int Through(int atom, int left, int right, int bound)
    {
        int last = Search(atom, left, right, bound, out int filled);
        int size = last < 0 ? 0 : Depths[last] + 1;
        Forget(filled, atom);
        return size;
    }

    /// <summary>Atoms of that ring, the atom first and the right arm last; empty when there is none.</summary>
    internal int[] RingThrough(int atom, int left, int right)
    {
        int last = Search(atom, left, right, int.MaxValue, out int filled);
        int[] ring = [];
        if (last >= 0)
        {
            ring = new int[Depths[last] + 1];
            ring[0] = atom;
            ring[^1] = right;
            for (int at = last, i = ring.Length - 2; at >= 0; at = Parents[at], i--)
            {
                ring[i] = Queue[at];
            }
        }

        Forget(filled, atom);
        return ring;
    }

    /// <summary>Gives the arrays back.</summary>
    public void Dispose() => scratch.Dispose();

    private int Search(int atom, int left, int right, int bound, out int filled)
    {
        Span<int> seen = Seen;
        Span<int> queue = Queue;
        Span<int> parents = Parents;
        Span<int> depths = Depths;
        seen[atom] = 1;
        seen[left] = 1;
        queue[0] = left;
        parents[0] = -1;
        depths[0] = 2;
        filled = 1;
        for (int head = 0; head < filled && depths[head] + 1 < bound; head++)
        {
            foreach (Neighbor neighbor in molecule.NeighborsOf(queue[head]))
            {
                if (!molecule.BondSpan[neighbor.Bond].IsInRing || seen[neighbor.Atom] != 0)
                {
                    continue;
                }

                if (neighbor.Atom == right)
                {
                    return head;
                }

                seen[neighbor.Atom] = 1;
                queue[filled] = neighbor.Atom;
                parents[filled] = head;
                depths[filled++] = depths[head] + 1;
            }
        }

        return -1;
    }

    private void Forget(int filled, int atom)
    {
        Seen[atom] = 0;
        foreach (int member in Queue[..filled])
        {
            Seen[member] = 0;
        }
    }
}
