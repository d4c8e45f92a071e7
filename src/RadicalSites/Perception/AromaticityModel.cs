using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Marks aromatic atoms and bonds by Hueckel's 4n+2 rule on the Kekule form.</summary>
/// <remarks>
/// <para>Pi electrons that an atom brings: 1 with a double bond on a ring; 0 with a double bond out of the ring to an
/// element more electronegative than carbon, for a carbocation or a boron without double bond; 2 for N, P, As with three
/// single bonds, O, S, Se, Te with two, a carbanion, and N- with two. Atoms with sp3 character, wildcards, atoms with an exocyclic C=C, or
/// S and P with exocyclic oxygen do not take part.</para>
/// <para>Tested are the smallest rings through each angle, then envelopes of up to <see cref="LargestUnion"/> fused rings
/// (azulene); only the bonds of the ring or envelope that satisfies the rule become aromatic. The result does not depend
/// on which Kekule form was written.</para>
/// </remarks>
internal static partial class AromaticityModel
{
    /// <summary>Most rings joined into one envelope.</summary>
    internal const int LargestUnion = 4;

    /// <summary>Longest ring or envelope that is tested.</summary>
    internal const int LongestRing = 24;

    // Rings up to this size are taken whichever of several equal ones is met first.
    private const int SmallRing = 8;

    private const int None = -1;

    /// <summary>Sets the aromatic bits of the scratch flags.</summary>
    internal static void Perceive(StructureDraft draft, CompletionScratch scratch)
    {
        int count = draft.AtomCount;
        Span<int> electrons = scratch.First.AsSpan(0, count);
        int candidates = 0;
        for (int i = 0; i < count; i++)
        {
            electrons[i] = (scratch.AtomFlags[i] & AtomFlags.Ring) == 0 ? None : ElectronsOf(draft, scratch, i);
            candidates += electrons[i] >= 0 ? 1 : 0;
        }

        if (candidates < 3 || (candidates -= Prune(draft, scratch, electrons)) < 3)
        {
            return;
        }

        List<int[]>? open = null;
        using var rented = new ScratchInts(count + draft.BondCount);
        Span<int> stamps = rented.Span[..count];
        Span<int> done = rented.Span[count..];
        stamps.Clear();
        done.Clear();
        int stamp = 0;
        int found = 0;
        Span<int> ring = stackalloc int[LongestRing];
        for (int atom = 0; atom < count; atom++)
        {
            if (electrons[atom] < 0)
            {
                continue;
            }

            ReadOnlySpan<Neighbor> neighbors = scratch.NeighborsOf(atom);
            for (int i = 0; i < neighbors.Length; i++)
            {
                for (int j = i + 1; j < neighbors.Length; j++)
                {
                    if (!IsPath(scratch, electrons, neighbors[i]) || !IsPath(scratch, electrons, neighbors[j])
                        || SharesFoundRing(done, neighbors[i].Bond, neighbors[j].Bond))
                    {
                        continue;
                    }

                    int size = RingThrough(scratch, electrons, stamps, ++stamp, atom, neighbors[i].Atom, neighbors[j].Atom, ring);
                    if (size < 3)
                    {
                        continue;
                    }

                    if (Satisfies(electrons, ring[..size]))
                    {
                        MarkRing(scratch, ring[..size], done, ++found);
                    }
                    else if (!Holds(open ??= [], ring[..size]))
                    {
                        open.Add(ring[..size].ToArray());
                    }
                }
            }
        }

        if (open is not null)
        {
            JoinRings(scratch, electrons, stamps, stamp, open, count);
        }
    }

    // Takes out candidates that lie on no ring of candidates, and with them the atoms whose double bond led there: such
    // a double bond leaves the conjugated ring (ortho-quinoid rings). Returns how many were taken out.
    private static int Prune(StructureDraft draft, CompletionScratch scratch, Span<int> electrons)
    {
        Span<int> degree = scratch.Second.AsSpan(0, electrons.Length);
        Span<int> queue = scratch.Third.AsSpan(0, electrons.Length);
        int queued = 0;
        for (int atom = 0; atom < electrons.Length; atom++)
        {
            if (electrons[atom] < 0)
            {
                continue;
            }

            degree[atom] = 0;
            foreach (Neighbor neighbor in scratch.NeighborsOf(atom))
            {
                degree[atom] += IsPath(scratch, electrons, neighbor) ? 1 : 0;
            }
        }

        for (int atom = 0; atom < electrons.Length; atom++)
        {
            if (electrons[atom] >= 0 && degree[atom] < 2)
            {
                electrons[atom] = None;
                queue[queued++] = atom;
            }
        }

        for (int head = 0; head < queued; head++)
        {
            foreach (Neighbor neighbor in scratch.NeighborsOf(queue[head]))
            {
                int other = neighbor.Atom;
                if (electrons[other] < 0 || (scratch.BondFlags[neighbor.Bond] & CompletionScratch.RingBit) == 0)
                {
                    continue;
                }

                if (--degree[other] < 2 || draft.Bonds[neighbor.Bond].Order == BondOrder.Double)
                {
                    electrons[other] = None;
                    queue[queued++] = other;
                }
            }
        }

        return queued;
    }

    private static bool IsPath(CompletionScratch scratch, ReadOnlySpan<int> electrons, Neighbor neighbor) =>
        electrons[neighbor.Atom] >= 0 && (scratch.BondFlags[neighbor.Bond] & CompletionScratch.RingBit) != 0;

    // Each aromatic ring found writes its number on its bonds; two bonds with the same number share that ring.
    private static bool SharesFoundRing(ReadOnlySpan<int> done, int left, int right) => done[left] != 0 && done[left] == done[right];

    // A ring that does not satisfy the rule is seen from each of its angles.
    private static bool Holds(List<int[]> rings, ReadOnlySpan<int> ring)
    {
        foreach (int[] known in rings)
        {
            bool same = known.Length == ring.Length;
            for (int i = 0; same && i < ring.Length; i++)
            {
                same = known.AsSpan().Contains(ring[i]);
            }

            if (same)
            {
                return true;
            }
        }

        return false;
    }

    private static bool Satisfies(ReadOnlySpan<int> electrons, ReadOnlySpan<int> ring)
    {
        int sum = 0;
        foreach (int atom in ring)
        {
            sum += electrons[atom];
        }

        return sum % 4 == 2;
    }

    private static void MarkRing(CompletionScratch scratch, ReadOnlySpan<int> ring, Span<int> done, int number)
    {
        for (int i = 0; i < ring.Length; i++)
        {
            int atom = ring[i];
            int next = ring[i + 1 == ring.Length ? 0 : i + 1];
            scratch.AtomFlags[atom] |= AtomFlags.Aromatic;
            foreach (Neighbor neighbor in scratch.NeighborsOf(atom))
            {
                if (neighbor.Atom == next)
                {
                    scratch.BondFlags[neighbor.Bond] |= CompletionScratch.AromaticBit;
                    if (!done.IsEmpty)
                    {
                        done[neighbor.Bond] = number;
                    }

                    break;
                }
            }
        }
    }

    private static int ElectronsOf(StructureDraft draft, CompletionScratch scratch, int index)
    {
        ref BuilderAtom atom = ref draft.Atoms[index];
        int ringDoubles = 0;
        int outerPartner = -1;
        int outerDoubles = 0;
        foreach (Neighbor neighbor in scratch.NeighborsOf(index))
        {
            BondOrder order = draft.Bonds[neighbor.Bond].Order;
            if (order == BondOrder.Single)
            {
                continue;
            }

            if (order != BondOrder.Double)
            {
                return None;
            }

            if ((scratch.BondFlags[neighbor.Bond] & CompletionScratch.RingBit) != 0)
            {
                ringDoubles++;
            }
            else
            {
                outerDoubles++;
                outerPartner = neighbor.Atom;
            }
        }

        int partners = scratch.NeighborsOf(index).Length + atom.Hydrogens;
        if (ringDoubles + outerDoubles > 1)
        {
            // Only pyridine N-oxides and the like written with a pentavalent nitrogen.
            return atom is { Element: 7, Charge: 0 } && ringDoubles == 1 && outerDoubles == 1 ? 1 : None;
        }

        if (ringDoubles == 1)
        {
            // An atom that lower case would be read without a double bond (hypervalent nitrogen, odd charges) stays Kekule.
            return atom.Element is 5 or 6 or 7 or 8 or 15 or 16 or 33 or 34 or 52 && partners <= 3
                && Kekulization.TakesDouble(Valences.Of(atom.Element, atom.Charge), partners, atom.Element, atom.Charge)
                ? 1
                : None;
        }

        if (outerDoubles == 1)
        {
            int element = draft.Atoms[outerPartner].Element;
            return atom.Element == 6 && element is 7 or 8 or 9 or 16 or 34 or 52 ? 0 : None;
        }

        return (atom.Element, atom.Charge) switch
        {
            (6, -1) when partners == 3 => 2,
            (6, 1) when partners == 3 => 0,
            (5, 0) when partners == 3 => 0,
            (7 or 15 or 33, 0) when partners == 3 => 2,
            (7, -1) when partners == 2 => 2,
            (8 or 16 or 34 or 52, 0) when partners == 2 => 2,
            _ => None,
        };
    }

    // Smallest ring through the path left - atom - right, by breadth-first search between the two ends. A macrocycle that
    // is not the only one of its size (porphyrin) is left out: which one is found would depend on the atom order.
    private static int RingThrough(
        CompletionScratch scratch, ReadOnlySpan<int> electrons, Span<int> stamps, int stamp, int atom, int left,
        int right, Span<int> ring)
    {
        Span<int> queue = scratch.Second;
        Span<int> parents = scratch.Third;
        Span<int> depths = scratch.Fourth;
        stamps[atom] = stamp;
        stamps[left] = stamp;
        queue[0] = left;
        parents[0] = -1;
        depths[0] = 2;
        int filled = 1;
        int last = -1;
        bool several = false;
        for (int head = 0; head < filled && depths[head] < LongestRing && (last < 0 || depths[head] == depths[last]); head++)
        {
            foreach (Neighbor neighbor in scratch.NeighborsOf(queue[head]))
            {
                int other = neighbor.Atom;
                if (!IsPath(scratch, electrons, neighbor))
                {
                    continue;
                }

                if (other == right)
                {
                    several |= last >= 0;
                    last = last < 0 ? head : last;
                }
                else if (stamps[other] != stamp)
                {
                    stamps[other] = stamp;
                    queue[filled] = other;
                    parents[filled] = head;
                    depths[filled++] = depths[head] + 1;
                }
                else if (depths[head] + 1 > SmallRing && other != atom)
                {
                    // Two ways of equal length to one atom.
                    several |= IsNextLevel(queue[..filled], depths, other, depths[head] + 1);
                }
            }
        }

        int size = last < 0 ? 0 : depths[last] + 1;
        if (size == 0 || (several && size > SmallRing))
        {
            return 0;
        }

        ring[0] = atom;
        ring[size - 1] = right;
        for (int at = last, i = size - 2; at >= 0; at = parents[at], i--)
        {
            ring[i] = queue[at];
        }

        return size;
    }

    private static bool IsNextLevel(ReadOnlySpan<int> queue, ReadOnlySpan<int> depths, int atom, int depth)
    {
        int place = queue.LastIndexOf(atom);
        return place >= 0 && depths[place] == depth;
    }
}
