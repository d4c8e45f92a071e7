using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Molfile;

/// <content>Double bonds, cumulenes and allenes.</content>
internal sealed partial class MolfileParse
{
    private const int MostRingSteps = 256;
    private readonly int[] ringQueue = new int[MostRingSteps];
    private readonly int[] ringDepth = new int[MostRingSteps];

    private void AddDoubleBonds(bool solid)
    {
        for (int i = 0; i < draft.BondCount; i++)
        {
            if (draft.Bonds[i].Order != BondOrder.Double)
            {
                continue;
            }

            ref BuilderBond bond = ref draft.Bonds[i];
            int first = IsInnerCumulene(bond.Begin) ? bond.End : bond.Begin;
            if (IsInnerCumulene(first))
            {
                continue;
            }

            WalkCumulene(first, i, solid);
        }
    }

    private bool IsInnerCumulene(int atom)
    {
        ReadOnlySpan<Neighbor> around = NeighborsOf(atom);
        return draft.Atoms[atom].Element == 6 && around.Length == 2
            && draft.Bonds[around[0].Bond].Order == BondOrder.Double && draft.Bonds[around[1].Bond].Order == BondOrder.Double;
    }

    private bool IsCumuleneEnd(int atom)
    {
        foreach (Neighbor neighbor in NeighborsOf(atom))
        {
            if (draft.Bonds[neighbor.Bond].Order == BondOrder.Double && IsInnerCumulene(neighbor.Atom))
            {
                return true;
            }
        }

        return false;
    }

    private void WalkCumulene(int first, int bond, bool solid)
    {
        int from = first;
        int at = draft.Bonds[bond].Begin == first ? draft.Bonds[bond].End : draft.Bonds[bond].Begin;
        int length = 1;
        int afterFirst = at;
        int middle = -1;
        bool either = marks[bond] == BondMark.Either;
        while (IsInnerCumulene(at) && at != first && length <= draft.BondCount)
        {
            ReadOnlySpan<Neighbor> around = NeighborsOf(at);
            Neighbor next = around[0].Atom == from ? around[1] : around[0];
            either |= marks[next.Bond] == BondMark.Either;
            middle = length == 1 ? at : middle;
            from = at;
            at = next.Atom;
            length++;
        }

        bool once = length == 1 || first < at;
        if (!once || either || !IsStereoEnd(first, afterFirst) || !IsStereoEnd(at, from)
            || (length == 1 && SmallestRing(bond, 7) > 0))
        {
            return;
        }

        if (length % 2 == 1)
        {
            AddCisTrans(first, afterFirst, at, from, solid);
        }
        else if (length == 2)
        {
            AddAllene(first, middle, at, solid);
        }
    }

    // An end has one or two different carriers besides the double bond, and no mark that leaves it open.
    private bool IsStereoEnd(int end, int partner)
    {
        ref BuilderAtom atom = ref draft.Atoms[end];
        ReadOnlySpan<Neighbor> around = NeighborsOf(end);
        int carriers = around.Length - 1;
        bool shape = atom.Element switch
        {
            6 or 14 or 32 => carriers is 1 or 2 && carriers + atom.Hydrogens == 2,
            7 => (carriers == 1 && atom.Hydrogens <= 1) || (carriers == 2 && atom.Charge == 1),
            15 or 33 => carriers == 1 && atom.Hydrogens == 0,
            _ => false,
        };
        if (!shape || HasLikeLigands(end, partner))
        {
            return false;
        }

        foreach (Neighbor neighbor in around)
        {
            if (neighbor.Atom != partner && (draft.Bonds[neighbor.Bond].Order is not (BondOrder.Single or BondOrder.Unknown)
                || (marks[neighbor.Bond] == BondMark.Either && draft.Bonds[neighbor.Bond].Begin == end)))
            {
                return false;
            }
        }

        return true;
    }

    private void AddCisTrans(int first, int afterFirst, int last, int beforeLast, bool solid)
    {
        int left = CarrierOf(first, afterFirst, last, solid, out int leftSide);
        int right = CarrierOf(last, beforeLast, first, solid, out int rightSide);
        int configuration = solid
            ? StereoGeometry.OfDoubleBond(points[first], points[last], points[left], points[right])
            : leftSide == 0 || rightSide == 0 ? 0 : leftSide == -rightSide ? 2 : 1;
        if (configuration != 0)
        {
            draft.AddStereo(new StereoElement(StereoKind.CisTrans, first, last, [left, right], configuration));
        }
    }

    // A carrier that is an atom other than hydrogen, if there is one; with the side of the axis it lies on in a drawing.
    private int CarrierOf(int end, int partner, int otherEnd, bool solid, out int side)
    {
        int best = -1;
        side = 0;
        foreach (Neighbor neighbor in NeighborsOf(end))
        {
            if (neighbor.Atom == partner)
            {
                continue;
            }

            int here = solid ? 0 : StereoGeometry.SideInPlane(points[end] with { Z = 0 }, points[otherEnd] with { Z = 0 }, points[neighbor.Atom] with { Z = 0 });
            if (best >= 0 && side != 0 && here == side)
            {
                // Both carriers on one side: the drawing contradicts itself.
                side = 0;
                return best;
            }

            if (best < 0 || IsPlainHydrogen(best) || (side == 0 && here != 0))
            {
                best = neighbor.Atom;
                side = here;
            }
        }

        return best;
    }

    private void AddAllene(int first, int middle, int last, bool solid)
    {
        Span<int> carriers = stackalloc int[4];
        FillCarriers(first, middle, carriers[..2]);
        FillCarriers(last, middle, carriers[2..]);
        Point axis = solid
            ? StereoGeometry.Direction(points[first], points[last])
            : StereoGeometry.Direction(points[first] with { Z = 0 }, points[last] with { Z = 0 });
        Point left;
        Point right;
        if (solid)
        {
            left = Spread(first, carriers[..2], axis);
            right = Spread(last, carriers[2..], axis);
        }
        else
        {
            int leftMark = DrawnDepth(first, carriers[..2]);
            int rightMark = DrawnDepth(last, carriers[2..]);
            if (leftMark == 0 && rightMark == 0)
            {
                return;
            }

            left = leftMark != 0 ? new Point(0, 0, leftMark) : Spread(first, carriers[..2], axis);
            right = leftMark != 0 ? Spread(last, carriers[2..], axis) : new Point(0, 0, rightMark);
        }

        int configuration = StereoGeometry.OfAllene(axis, left, right);
        if (configuration != 0)
        {
            draft.AddStereo(new StereoElement(StereoKind.Allene, middle, middle, carriers.ToArray(), configuration));
        }
    }

    private void FillCarriers(int end, int partner, Span<int> carriers)
    {
        carriers.Fill(-1);
        int filled = 0;
        foreach (Neighbor neighbor in NeighborsOf(end))
        {
            if (neighbor.Atom != partner && filled < 2)
            {
                carriers[filled++] = neighbor.Atom;
            }
        }
    }

    // First minus second carrier, perpendicular to the axis; an implicit second one lies opposite to the first.
    private Point Spread(int end, ReadOnlySpan<int> carriers, Point axis)
    {
        Point first = StereoGeometry.Direction(points[end], points[carriers[0]]);
        Point second = carriers[1] >= 0 ? StereoGeometry.Direction(points[end], points[carriers[1]]) : default;
        Point difference = StereoGeometry.Minus(first, second);
        double along = (difference.X * axis.X) + (difference.Y * axis.Y) + (difference.Z * axis.Z);
        var perpendicular = new Point(difference.X - (along * axis.X), difference.Y - (along * axis.Y), difference.Z - (along * axis.Z));
        return StereoGeometry.Direction(default, perpendicular);
    }

    private int DrawnDepth(int end, ReadOnlySpan<int> carriers)
    {
        int depth = 0;
        foreach (Neighbor neighbor in NeighborsOf(end))
        {
            if (draft.Bonds[neighbor.Bond].Begin == end && marks[neighbor.Bond] is BondMark.Up or BondMark.Down
                && draft.Bonds[neighbor.Bond].Begin == end)
            {
                int sign = marks[neighbor.Bond] == BondMark.Up ? 1 : -1;
                depth += neighbor.Atom == carriers[0] ? sign : neighbor.Atom == carriers[1] ? -sign : 0;
            }
        }

        return Math.Sign(depth);
    }

    // Size of the smallest ring through a bond, up to a limit; 0 when there is none. The search is cut at a fixed size.
    private int SmallestRing(int bond, int limit)
    {
        int target = draft.Bonds[bond].End;
        ringQueue[0] = draft.Bonds[bond].Begin;
        ringDepth[0] = 1;
        int filled = 1;
        for (int head = 0; head < filled; head++)
        {
            int depth = ringDepth[head];
            if (depth >= limit)
            {
                return 0;
            }

            foreach (Neighbor neighbor in NeighborsOf(ringQueue[head]))
            {
                if (neighbor.Bond == bond)
                {
                    continue;
                }

                if (neighbor.Atom == target)
                {
                    return depth + 1;
                }

                if (filled < MostRingSteps && ringQueue.AsSpan(0, filled).IndexOf(neighbor.Atom) < 0)
                {
                    ringQueue[filled] = neighbor.Atom;
                    ringDepth[filled++] = depth + 1;
                }
            }
        }

        return 0;
    }
}
