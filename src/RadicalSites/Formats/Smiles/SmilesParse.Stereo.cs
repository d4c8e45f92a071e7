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
        mark = new StereoMark { Atom = atom, Kind = kind, Configuration = configuration };
        if (previous >= 0)
        {
            mark.Carriers[mark.Count++] = previous;
        }

        for (int i = 0; i < hydrogens && mark.Count < 7; i++)
        {
            mark.Carriers[mark.Count++] = -1;
        }
    }

    // Marks are few and atoms ascend, so the newest marks are looked at first.
    private int AppendCarrier(int atom, int carrier)
    {
        for (int i = markCount - 1; i >= 0; i--)
        {
            if (marks[i].Atom == atom)
            {
                ref StereoMark mark = ref marks[i];
                if (mark.Count < 8)
                {
                    mark.Carriers[mark.Count] = carrier;
                }

                return mark.Count++;
            }

            if (marks[i].Atom < atom)
            {
                break;
            }
        }

        return -1;
    }

    private void SetCarrier(int atom, int place, int carrier)
    {
        for (int i = markCount - 1; i >= 0; i--)
        {
            if (marks[i].Atom == atom && place < 8)
            {
                marks[i].Carriers[place] = carrier;
                return;
            }
        }
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
            int place = mark.Carriers[0] >= 0 && mark.Carriers[0] < atom && HasBond(atom, mark.Carriers[0], atom) ? 1 : 0;
            for (int i = mark.Count; i > place; i--)
            {
                mark.Carriers[i] = mark.Carriers[i - 1];
            }

            mark.Carriers[place] = -1;
            mark.Count++;
        }

        if (mark.Count != expected)
        {
            return lenient || Fail(
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

    private bool HasBond(int begin, int end, int before)
    {
        for (int i = draft.BondCount - 1; i >= 0; i--)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            if (bond.Begin == end && bond.End == begin)
            {
                return bond.End == before;
            }
        }

        return false;
    }

    private bool IsAllene(int atom)
    {
        int doubles = 0;
        for (int i = 0; i < draft.BondCount; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            doubles += (bond.Begin == atom || bond.End == atom) && bond.Order == BondOrder.Double ? 1 : 0;
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
            return lenient || Fail(Entry.StereoNeighbors, draft.Atoms[mark.Atom].Position, mark.Atom, filled, "@AL");
        }

        draft.AddStereo(new StereoElement(StereoKind.Allene, mark.Atom, mark.Atom, carriers.ToArray(), mark.Configuration));
        return true;
    }

    private int NextInCumulene(int atom, int from)
    {
        for (int i = 0; i < draft.BondCount; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            int other = bond.Begin == atom ? bond.End : bond.End == atom ? bond.Begin : -1;
            if (other >= 0 && other != from && bond.Order == BondOrder.Double)
            {
                return other;
            }
        }

        return -1;
    }

    private int AppendEnds(int atom, int from, Span<int> carriers, int filled)
    {
        int before = filled;
        ref BuilderAtom data = ref draft.Atoms[atom];

        // Reading order at a bracket or organic atom: the atom before it, its hydrogen, then what follows.
        int start = filled;
        for (int i = 0; i < draft.BondCount && filled < 4; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            int other = bond.Begin == atom ? bond.End : bond.End == atom ? bond.Begin : -1;
            if (other >= 0 && other != from)
            {
                carriers[filled++] = other;
            }
        }

        if (filled - before == 1 && filled < 4)
        {
            bool substituentFirst = carriers[start] < atom;
            if (substituentFirst)
            {
                carriers[filled++] = -1;
            }
            else
            {
                carriers[filled++] = carriers[start];
                carriers[start] = -1;
            }
        }

        return filled;
    }
}
