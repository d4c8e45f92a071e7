using System;
using RadicalSites.Molecules;

namespace RadicalSites.Formats.Smiles;

internal sealed partial class SmilesOutput
{
    private static readonly string[] SquarePlanarMarks = ["@SP1", "@SP2", "@SP3"];

    private int[] stereoOfAtom = [];
    private int[] bondDirection = [];
    private bool hasDirections;

    // Directions are kept per bond as seen from Begin to End: 1 = End above Begin (/), 2 = below (\).
    private void PrepareStereo()
    {
        stereoOfAtom.AsSpan(0, molecule.AtomCount).Fill(-1);
        hasDirections = false;
        ReadOnlySpan<StereoElement> elements = molecule.StereoSpan;
        for (int i = 0; i < elements.Length; i++)
        {
            if (elements[i].Kind == StereoKind.CisTrans)
            {
                hasDirections = true;
            }
            else
            {
                stereoOfAtom[elements[i].Focus] = i;
            }
        }

        if (hasDirections)
        {
            if (bondDirection.Length < molecule.BondCount)
            {
                bondDirection = new int[2 * molecule.BondCount];
            }

            bondDirection.AsSpan(0, molecule.BondCount).Clear();
        }
    }

    // Chooses the marks of all cis/trans elements once the tree is known. Elements that share a single bond (dienes)
    // are chained: the bond marked by one decides the other. An element with free bonds starts with "/" on the bond
    // that is printed first, which makes the marks canonical.
    private void ChooseDirections()
    {
        ReadOnlySpan<StereoElement> elements = molecule.StereoSpan;
        Span<int> pending = elements.Length <= 256 ? stackalloc int[elements.Length] : new int[elements.Length];
        int count = 0;
        for (int i = 0; i < elements.Length; i++)
        {
            if (elements[i].Kind == StereoKind.CisTrans && IsInTree(elements[i].Focus))
            {
                pending[count++] = i;
            }
        }

        // In the order of printing, so that the result depends on the tree alone.
        Span<int> keys = count <= 256 ? stackalloc int[count] : new int[count];
        for (int i = 0; i < count; i++)
        {
            keys[i] = Math.Min(visited[elements[pending[i]].Focus], visited[elements[pending[i]].FocusEnd]);
        }

        keys.Sort(pending[..count]);
        for (int done = 0; done < count;)
        {
            // First an element that is bound to marks already set; otherwise the next free one.
            int chosen = -1;
            for (int i = 0; i < count; i++)
            {
                if (pending[i] >= 0)
                {
                    if (HasMark(elements[pending[i]]))
                    {
                        chosen = i;
                        break;
                    }

                    chosen = chosen < 0 ? i : chosen;
                }
            }

            MarkElement(elements[pending[chosen]]);
            pending[chosen] = -1;
            done++;
        }
    }

    private int treeStart;

    private bool IsInTree(int atom) => visited[atom] >= treeStart;

    private bool HasMark(StereoElement element) => MarkedSide(element.Focus, out _) != 0 || MarkedSide(element.FocusEnd, out _) != 0;

    /// <summary>Side (1 above, 2 below) of a marked substituent of a double-bond end, and which one it is.</summary>
    private int MarkedSide(int atom, out int substituent)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int direction = bondDirection[neighbor.Bond];
            if (direction != 0)
            {
                substituent = neighbor.Atom;
                return molecule.BondSpan[neighbor.Bond].Begin == atom ? direction : 3 - direction;
            }
        }

        substituent = -1;
        return 0;
    }

    private void MarkElement(StereoElement element)
    {
        int first = visited[element.Focus] <= visited[element.FocusEnd] ? element.Focus : element.FocusEnd;
        int last = first == element.Focus ? element.FocusEnd : element.Focus;
        int firstCarrier = first == element.Focus ? element.CarrierSpan[0] : element.CarrierSpan[1];
        int lastCarrier = first == element.Focus ? element.CarrierSpan[1] : element.CarrierSpan[0];
        bool sameSide = element.Configuration == 2;
        int firstSide = SideOf(first, firstCarrier);
        int lastSide = SideOf(last, lastCarrier);
        if (firstSide == 0 && lastSide == 0)
        {
            firstSide = Start(first, firstCarrier);
        }

        if (firstSide == 0)
        {
            firstSide = sameSide ? lastSide : 3 - lastSide;
            SetSide(first, firstCarrier, firstSide);
        }
        else if (lastSide == 0)
        {
            lastSide = sameSide ? firstSide : 3 - firstSide;
            SetSide(last, lastCarrier, lastSide);
        }
    }

    // The substituent printed first at this end gets "/" as printed; returns the side of the carrier.
    private int Start(int atom, int carrier)
    {
        int chosen = PrintedFirst(atom);
        if (chosen < 0)
        {
            // Only a hydrogen: it is written out by the bracket printer.
            return 1;
        }

        // A substituent before the atom is written "X/A": A above X, so X lies below A.
        int side = PrintedBefore(chosen, atom) ? 2 : 1;
        MarkBond(atom, chosen, side);
        return chosen == carrier ? side : 3 - side;
    }

    private bool PrintedBefore(int other, int atom) => visited[other] < visited[atom];

    // Aromatic bonds carry the mark only where an end has no other single bond: the ring side of c=N or c=C.
    private int PrintedFirst(int atom)
    {
        int best = PrintedFirst(atom, aromatic: false);
        return best >= 0 ? best : PrintedFirst(atom, aromatic: true);
    }

    private int PrintedFirst(int atom, bool aromatic)
    {
        int best = -1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            Bond bond = molecule.BondSpan[neighbor.Bond];
            if (bond.IsAromatic == aromatic && (aromatic || bond.Order == BondOrder.Single)
                && (best < 0 || visited[neighbor.Atom] < visited[best]))
            {
                best = neighbor.Atom;
            }
        }

        return best;
    }

    private int SideOf(int atom, int carrier)
    {
        int side = MarkedSide(atom, out int substituent);
        return side == 0 ? 0 : substituent == carrier ? side : 3 - side;
    }

    private void SetSide(int atom, int carrier, int side)
    {
        int chosen = PrintedFirst(atom);
        if (chosen < 0)
        {
            return;
        }

        MarkBond(atom, chosen, chosen == carrier ? side : 3 - side);
    }

    private void MarkBond(int atom, int substituent, int side)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (neighbor.Atom == substituent)
            {
                bondDirection[neighbor.Bond] = molecule.BondSpan[neighbor.Bond].Begin == atom ? side : 3 - side;
                return;
            }
        }
    }

    private char DirectionOf(int from, int bond, int to)
    {
        if (!hasDirections || bondDirection[bond] == 0)
        {
            return '\0';
        }

        bool up = bondDirection[bond] == 1;
        if (molecule.BondSpan[bond].Begin != from)
        {
            up = !up;
        }

        return up ? '/' : '\\';
    }

    /// <summary>1 when the only carrier at this end of a marked double bond is its hydrogen.</summary>
    private int HydrogenToWrite(int atom)
    {
        if (!hasDirections || molecule.AtomSpan[atom].HydrogenCount == 0)
        {
            return 0;
        }

        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind == StereoKind.CisTrans && (element.Focus == atom || element.FocusEnd == atom)
                && PrintedFirst(atom) < 0)
            {
                return 1;
            }
        }

        return 0;
    }

    private char DirectionToHydrogen(int atom)
    {
        foreach (StereoElement element in molecule.StereoSpan)
        {
            if (element.Kind != StereoKind.CisTrans || (element.Focus != atom && element.FocusEnd != atom))
            {
                continue;
            }

            bool isFocus = element.Focus == atom;
            int other = isFocus ? element.FocusEnd : element.Focus;
            int otherCarrier = element.CarrierSpan[isFocus ? 1 : 0];
            int otherSide = SideOf(other, otherCarrier);
            if (otherSide == 0)
            {
                // Both ends carry hydrogen only: the end printed first is "above" by convention.
                otherSide = 1;
                return visited[atom] < visited[other] || element.Configuration == 2 ? '/' : '\\';
            }

            int side = element.Configuration == 2 ? otherSide : 3 - otherSide;
            return side == 1 ? '/' : '\\';
        }

        return '/';
    }

    private string MarkOf(StereoElement element, int atom)
    {
        int carrierCount = element.Carriers.Count;
        Span<int> order = stackalloc int[8];
        int filled = element.Kind == StereoKind.Allene
            ? carrierCount
            : PrintedOrder(atom, element, order);
        if (filled != carrierCount)
        {
            return "";
        }

        switch (element.Kind)
        {
            case StereoKind.Tetrahedral:
                bool odd = IsOdd(element.CarrierSpan, order[..filled]);
                return (element.Configuration == 1) != odd ? "@" : "@@";
            case StereoKind.Allene:
                // Which end is printed first does not matter: exchanging the ends is an even permutation.
                bool turned = IsEndTurned(element, 0) != IsEndTurned(element, 2);
                return (element.Configuration == 1) != turned ? "@" : "@@";
            case StereoKind.SquarePlanar:
                return SquarePlanarMarks[CoordinationCodes.Reorder(element, order[..filled]) - 1];
            case StereoKind.TrigonalBipyramidal:
                return "@TB" + CoordinationCodes.Reorder(element, order[..filled]).ToString(System.Globalization.CultureInfo.InvariantCulture);
            default:
                return "@OH" + CoordinationCodes.Reorder(element, order[..filled]).ToString(System.Globalization.CultureInfo.InvariantCulture);
        }
    }

    // Carriers as the text will show them: atom before, hydrogen or lone pair, ring bonds, branches.
    private int PrintedOrder(int atom, StereoElement element, Span<int> order)
    {
        int filled = 0;
        int before = parentBond[atom];
        if (before >= 0)
        {
            order[filled++] = molecule.BondSpan[before].Other(atom);
        }

        foreach (int carrier in element.CarrierSpan)
        {
            if (carrier < 0 && filled < order.Length)
            {
                order[filled++] = -1;
            }
        }

        for (int at = ringHead[atom]; at >= 0 && filled < order.Length; at = closureNext[at])
        {
            order[filled++] = molecule.BondSpan[closureBond[at]].Other(atom);
        }

        int end = molecule.NeighborOffsets[atom + 1];
        for (int i = molecule.NeighborOffsets[atom]; i < end && filled < order.Length; i++)
        {
            Neighbor neighbor = molecule.NeighborSpan[sorted[i]];
            if (parentBond[neighbor.Atom] == neighbor.Bond && neighbor.Bond != before)
            {
                order[filled++] = neighbor.Atom;
            }
        }

        return filled;
    }

    private int EndOf(StereoElement element, int slot)
    {
        int carrier = element.CarrierSpan[slot] >= 0 ? element.CarrierSpan[slot] : element.CarrierSpan[slot + 1];
        foreach (Neighbor neighbor in molecule.NeighborsOf(carrier))
        {
            foreach (Neighbor next in molecule.NeighborsOf(neighbor.Atom))
            {
                if (molecule.BondSpan[next.Bond].Order == BondOrder.Double && LeadsTo(next.Atom, neighbor.Atom, element.Focus))
                {
                    return neighbor.Atom;
                }
            }
        }

        return element.Focus;
    }

    private bool LeadsTo(int atom, int from, int target)
    {
        for (int steps = 0; steps <= molecule.AtomCount; steps++)
        {
            if (atom == target)
            {
                return true;
            }

            int next = -1;
            foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
            {
                if (neighbor.Atom != from && molecule.BondSpan[neighbor.Bond].Order == BondOrder.Double)
                {
                    next = neighbor.Atom;
                }
            }

            if (next < 0)
            {
                return false;
            }

            from = atom;
            atom = next;
        }

        return false;
    }

    // Whether the text shows the two ligands of an end (atom before, hydrogen, ring bonds, branches) the other way round.
    private bool IsEndTurned(StereoElement element, int slot)
    {
        int end = EndOf(element, slot);
        return PlaceAt(end, element.CarrierSpan[slot + 1]) < PlaceAt(end, element.CarrierSpan[slot]);
    }

    private int PlaceAt(int end, int carrier)
    {
        if (parentBond[end] >= 0 && molecule.BondSpan[parentBond[end]].Other(end) == carrier)
        {
            return -3;
        }

        if (carrier < 0)
        {
            return -2;
        }

        int place = 0;
        for (int at = ringHead[end]; at >= 0; at = closureNext[at], place++)
        {
            if (molecule.BondSpan[closureBond[at]].Other(end) == carrier)
            {
                return place;
            }
        }

        return 1000 + visited[carrier];
    }

    private static bool IsOdd(ReadOnlySpan<int> from, ReadOnlySpan<int> to)
    {
        Span<int> places = stackalloc int[from.Length];
        for (int i = 0; i < to.Length; i++)
        {
            places[i] = from.IndexOf(to[i]);
        }

        bool odd = false;
        for (int i = 0; i < places.Length; i++)
        {
            for (int j = i + 1; j < places.Length; j++)
            {
                odd ^= places[j] < places[i];
            }
        }

        return odd;
    }
}
