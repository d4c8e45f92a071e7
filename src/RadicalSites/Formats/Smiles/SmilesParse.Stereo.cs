using System;
using RadicalSites.Molecules;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Smiles;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesParse
{
    private void OpenMark(int atom, StereoKind kind, int configuration, int hydrogens)
    {
        if (markCount == marks.Length)
        {
            Array.Resize(ref marks, 2 * markCount);
        }

        ref StereoMark mark = ref marks[markCount++];
        mark = new StereoMark { Atom = atom, Kind = kind, Configuration = configuration, HasPrevious = previous >= 0 };
        if (previous >= 0)
        {
            mark.Carriers[mark.Count++] = previous;
        }

        for (int i = 0; i < hydrogens && mark.Count < 7; i++)
        {
            mark.Carriers[mark.Count++] = -1;
        }
    }

    private int AppendCarrier(int atom, int carrier)
    {
        int found = MarkOf(atom);
        if (found < 0)
        {
            return -1;
        }

        ref StereoMark mark = ref marks[found];
        if (mark.Count < 8)
        {
            mark.Carriers[mark.Count] = carrier;
        }

        return mark.Count++;
    }

    private void SetCarrier(int atom, int place, int carrier)
    {
        int found = place < 8 ? MarkOf(atom) : -1;
        if (found >= 0)
        {
            marks[found].Carriers[place] = carrier;
        }
    }

    // Marks stand in the order of their atoms; most often the newest one is meant.
    private int MarkOf(int atom)
    {
        int low = 0;
        int high = markCount - 1;
        int middle = high;
        while (low <= high)
        {
            int difference = marks[middle].Atom - atom;
            if (difference == 0)
            {
                return middle;
            }

            if (difference < 0)
            {
                low = middle + 1;
            }
            else
            {
                high = middle - 1;
            }

            middle = (low + high) >>> 1;
        }

        return -1;
    }

    private bool CompleteStereo()
    {
        for (int i = 0; i < markCount; i++)
        {
            if (!CompleteMark(ref marks[i]))
            {
                return false;
            }
        }

        return directionCount == 0 || DoubleBonds();
    }

    private bool CompleteMark(ref StereoMark mark)
    {
        int atom = mark.Atom;
        if (mark.Kind == StereoKind.Tetrahedral && mark.Count == 2 && IsAllene(atom))
        {
            mark.Kind = StereoKind.Allene;
        }

        if (mark.Kind == StereoKind.Allene)
        {
            return CompleteAllene(ref mark);
        }

        // The short forms @ and @@ follow the number of neighbours: @TB1, @TB2 with five, @OH1, @OH2 with six.
        if (mark.Kind == StereoKind.Tetrahedral && mark.Count > 4)
        {
            mark.Kind = mark.Count switch
            {
                5 => StereoKind.TrigonalBipyramidal,
                6 => StereoKind.Octahedral,
                _ => mark.Kind,
            };
        }

        int expected = mark.Kind switch
        {
            StereoKind.TrigonalBipyramidal => 5,
            StereoKind.Octahedral => 6,
            _ => 4,
        };
        if (mark.Count == expected - 1 && mark.Count >= 3 && MayHaveLonePair(draft.Atoms[atom]))
        {
            // A lone pair takes the place of an implicit hydrogen: right after the atom before the centre.
            int place = mark.HasPrevious ? 1 : 0;
            for (int i = mark.Count; i > place; i--)
            {
                mark.Carriers[i] = mark.Carriers[i - 1];
            }

            mark.Carriers[place] = -1;
            mark.Count++;
        }

        if (mark.Count != expected)
        {
            return Overlook(
                Entry.StereoNeighbors, draft.Atoms[atom].Position, atom, mark.Count,
                mark.Configuration == 1 ? "@" : mark.Kind == StereoKind.Tetrahedral ? "@@" : mark.Kind.ToString());
        }

        var carriers = new int[expected];
        int implicitCount = 0;
        for (int i = 0; i < expected; i++)
        {
            carriers[i] = mark.Carriers[i];
            implicitCount += carriers[i] < 0 ? 1 : 0;
        }

        // Two hydrogens at a tetrahedral centre make it no stereocentre; the mark says nothing.
        if (implicitCount < 2 || mark.Kind != StereoKind.Tetrahedral)
        {
            draft.AddStereo(new StereoElement(mark.Kind, atom, atom, carriers, mark.Configuration));
        }

        return true;
    }

    private static bool MayHaveLonePair(in BuilderAtom atom) =>
        atom.Element is 7 or 15 or 16 or 33 or 34 or 51 or 52 || atom.Charge < 0 || atom.Element > 18;

    private bool IsAllene(int atom)
    {
        int doubles = 0;
        foreach (int bond in BondsOf(atom))
        {
            doubles += draft.Bonds[bond].Order == BondOrder.Double ? 1 : 0;
        }

        return doubles == 2;
    }

    // Walks both arms of the cumulene; the carriers are the substituents of its ends in reading order.
    private bool CompleteAllene(ref StereoMark mark)
    {
        Span<int> carriers = stackalloc int[4];
        int filled = 0;
        for (int arm = 0; arm < 2 && arm < mark.Count; arm++)
        {
            int from = mark.Atom;
            int at = mark.Carriers[arm];
            while (at >= 0 && NextInCumulene(at, from) is int next and >= 0)
            {
                from = at;
                at = next;
            }

            filled = AppendEnds(at, from, carriers, filled);
        }

        if (filled != 4)
        {
            return Overlook(Entry.StereoNeighbors, draft.Atoms[mark.Atom].Position, mark.Atom, filled, "@AL");
        }

        draft.AddStereo(new StereoElement(StereoKind.Allene, mark.Atom, mark.Atom, carriers.ToArray(), mark.Configuration));
        return true;
    }

    private int NextInCumulene(int atom, int from)
    {
        foreach (int bond in BondsOf(atom))
        {
            int other = draft.Bonds[bond].Begin ^ draft.Bonds[bond].End ^ atom;
            if (other != from && draft.Bonds[bond].Order == BondOrder.Double)
            {
                return other;
            }
        }

        return -1;
    }

    // Reading order at an end: the atom before it, its hydrogen, its ring digits, then what follows.
    private int AppendEnds(int atom, int from, Span<int> carriers, int filled)
    {
        int before = filled;
        long lastKey = 0;
        bool hasPrevious = false;
        foreach (int bond in BondsOf(atom))
        {
            int other = draft.Bonds[bond].Begin ^ draft.Bonds[bond].End ^ atom;
            if (other == from || filled == 4)
            {
                continue;
            }

            long key = ReadingOrder(bond, atom, other);
            hasPrevious |= key == 0;
            if (filled - before == 1 && key < lastKey)
            {
                carriers[filled++] = carriers[before];
                carriers[before] = other;
            }
            else
            {
                carriers[filled++] = other;
                lastKey = key;
            }
        }

        if (filled - before == 1 && filled < 4)
        {
            int place = hasPrevious ? before + 1 : before;
            carriers[filled++] = carriers[before];
            carriers[place] = -1;
        }

        return filled;
    }

    // 0 for the atom before; then ring digits by their place in the text; then atoms that follow.
    private long ReadingOrder(int bond, int atom, int other)
    {
        int low = 0;
        int high = ringCount - 1;
        while (low <= high)
        {
            int middle = (low + high) / 2;
            ref RingEnds ends = ref ringEnds[middle];
            if (ends.Bond == bond)
            {
                return 1 + (draft.Bonds[bond].Begin == atom ? ends.Opening : ends.Closing);
            }

            if (ends.Bond < bond)
            {
                low = middle + 1;
            }
            else
            {
                high = middle - 1;
            }
        }

        return other < atom ? 0 : int.MaxValue + (long)other;
    }
}
