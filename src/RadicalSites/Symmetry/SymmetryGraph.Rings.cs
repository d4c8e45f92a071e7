using System;

namespace RadicalSites.Symmetry;

internal sealed partial class SymmetryGraph
{
    private int[] ringDistance = [];
    private int[] ringQueue = [];

    /// <summary>Size of the smallest ring through a bond, or <paramref name="limit"/> when it has that size or more.</summary>
    internal int ShortestRing(int begin, int end, int limit)
    {
        if (ringDistance.Length < AtomCount)
        {
            ringDistance = new int[Key.Length];
            ringQueue = new int[Key.Length];
        }

        int count = 0;
        int found = limit;
        ringQueue[count++] = begin;
        ringDistance[begin] = 1;
        for (int head = 0; head < count && found == limit; head++)
        {
            int atom = ringQueue[head];
            int size = ringDistance[atom] + 1;
            if (size >= limit)
            {
                break;
            }

            for (int i = Offset[atom]; i < Offset[atom + 1]; i++)
            {
                int next = Adjacent[i];
                if (next == end)
                {
                    if (atom != begin)
                    {
                        found = size;
                        break;
                    }
                }
                else if (ringDistance[next] == 0)
                {
                    ringDistance[next] = size;
                    ringQueue[count++] = next;
                }
            }
        }

        for (int i = 0; i < count; i++)
        {
            ringDistance[ringQueue[i]] = 0;
        }

        return found;
    }

    /// <summary>
    /// Whether a three-coordinate atom cannot turn inside out: it lies in a three-membered ring, or is the bridgehead of
    /// small rings that share more than one bond.
    /// </summary>
    internal bool IsHeldByRings(int atom)
    {
        int ringBonds = RingBondsOf(atom);
        if (DegreeOf(atom) < 3 || ringBonds < 2)
        {
            return false;
        }

        for (int i = Offset[atom]; i < Offset[atom + 1]; i++)
        {
            if (InRing[i] && ShortestRing(atom, Adjacent[i], 4) == 3)
            {
                return true;
            }
        }

        return ringBonds == 3 && CagePaths.IsBridgehead(this, atom);
    }
}
