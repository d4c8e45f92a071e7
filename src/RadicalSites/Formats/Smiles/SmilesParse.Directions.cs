using System;
using RadicalSites.Molecules;
using RadicalSites.Perception;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Smiles;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesParse
{
    // Resolves / and \ to cis/trans elements. Works on lists of double and marked bonds per atom, so the cost is linear
    // in the number of bonds; it runs only when the text has such marks.
    private bool DoubleBonds()
    {
        int count = draft.AtomCount;
        using var rented = new ScratchInts(4 * count);
        Span<int> upper = rented.Span[..count];
        Span<int> lower = rented.Span.Slice(count, count);
        Span<int> partner = rented.Span.Slice(2 * count, count);
        Span<int> secondPartner = rented.Span[(3 * count)..];
        rented.Span.Fill(-1);
        for (int i = 0; i < draft.BondCount; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            if (bond.Order == BondOrder.Double)
            {
                Link(partner, secondPartner, bond.Begin, bond.End);
                Link(partner, secondPartner, bond.End, bond.Begin);
            }
        }

        int[]? ends = null;
        for (int i = 0; i < directionCount; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[directions[i].Bond];
            bool up = directions[i].Up;

            // Begin/End with / : End lies above Begin.
            if (!Place(up ? upper : lower, partner, bond.Begin, bond.End, bond.Position, ref ends)
                || !Place(up ? lower : upper, partner, bond.End, bond.Begin, bond.Position, ref ends))
            {
                return false;
            }
        }

        for (int atom = 0; atom < count; atom++)
        {
            if (partner[atom] < 0 || secondPartner[atom] >= 0 || (upper[atom] < 0 && lower[atom] < 0))
            {
                continue;
            }

            // Along cumulated double bonds; an odd number of them ends in a plane (cis/trans).
            int from = atom;
            int end = partner[atom];
            int doubles = 1;
            while (secondPartner[end] >= 0 && doubles < count)
            {
                int next = partner[end] == from ? secondPartner[end] : partner[end];
                from = end;
                end = next;
                doubles++;
            }

            if (doubles % 2 == 1 && remarks is not null && upper[end] < 0 && lower[end] < 0)
            {
                Remark(Entry.DirectionIncomplete, draft.Atoms[atom].Position, atom);
            }

            if (end > atom && doubles % 2 == 1 && (upper[end] >= 0 || lower[end] >= 0))
            {
                bool beginUp = upper[atom] >= 0;
                bool endUp = upper[end] >= 0;
                draft.AddStereo(new StereoElement(
                    StereoKind.CisTrans, atom, end,
                    [beginUp ? upper[atom] : lower[atom], endUp ? upper[end] : lower[end]], beginUp == endUp ? 2 : 1));
            }
        }

        return true;
    }

    private static void Link(Span<int> partner, Span<int> secondPartner, int atom, int other)
    {
        if (partner[atom] < 0)
        {
            partner[atom] = other;
        }
        else
        {
            secondPartner[atom] = other;
        }
    }

    private bool Place(Span<int> side, Span<int> partner, int atom, int carrier, int position, ref int[]? ends)
    {
        if (partner[atom] < 0)
        {
            return true;
        }

        if (side[atom] >= 0)
        {
            // At a carbonyl both neighbours may carry marks that belong to the double bonds beyond them.
            ends ??= CountEnds();
            return ends[partner[atom]] == 1 || Overlook(Entry.DirectionConflict, position);
        }

        side[atom] = carrier;
        return true;
    }

    private int[] CountEnds()
    {
        int[] counts = new int[draft.AtomCount];
        for (int i = 0; i < draft.BondCount; i++)
        {
            counts[draft.Bonds[i].Begin]++;
            counts[draft.Bonds[i].End]++;
        }

        return counts;
    }
}
