using RadicalSites.Molecules;
using static RadicalSites.Perception.LocalPatterns;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

internal sealed partial class GroupWalk
{
    private void Carbon(int atom, Atom data)
    {
        if (data.FormalCharge < 0 && !HasTripleBond(molecule, atom))
        {
            Add(Entry.Base, atom);
        }

        if (data.IsAromatic)
        {
            return;
        }

        int singleOxygens = 0;
        int carbonylOxygen = -1;
        int doubles = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int other = neighbor.Atom;
            BondOrder order = OrderOf(neighbor);
            int element = ElementOf(other);
            if (order == BondOrder.Single)
            {
                singleOxygens += element == 8 ? 1 : 0;
                continue;
            }

            doubles += order == BondOrder.Double ? 1 : 0;
            if (element == 6)
            {
                MultipleBond(atom, other, order);
            }
            else if (element == 8 && order == BondOrder.Double)
            {
                carbonylOxygen = other;
            }
        }

        if (doubles >= 2)
        {
            Heterocumulene(atom);
        }
        else if (carbonylOxygen >= 0)
        {
            Carbonyl(atom, carbonylOxygen);
        }
        else if (doubles == 0 && singleOxygens >= 2)
        {
            Acetal(atom);
        }

        if (doubles == 0)
        {
            Saturated(atom);
        }
    }

    private void MultipleBond(int atom, int other, BondOrder order)
    {
        if (other < atom)
        {
            return;
        }

        if (order == BondOrder.Triple)
        {
            Add(Entry.Alkyne, atom, other);
        }
        else if (IsQuinoneBond(atom, other))
        {
            Add(Entry.Quinone, atom, other);
        }
        else if (DonorOn(atom) is int donor and >= 0 || (donor = DonorOn(other)) >= 0)
        {
            Add(Entry.ElectronRichAlkene, atom, other, donor);
        }
        else if (!IsCumulated(atom, other))
        {
            Add(Entry.Alkene, atom, other);
        }
    }

    // A ketene belongs to the heterocumulenes; an allene stays an alkene.
    private bool IsCumulated(int atom, int other) =>
        DoubleBondedHeteroatom(molecule, atom) >= 0 || DoubleBondedHeteroatom(molecule, other) >= 0;

    /// <summary>A donor heteroatom (O, S or N with a free lone pair) single-bonded to an alkene carbon, or -1.</summary>
    private int DonorOn(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            Atom data = molecule.AtomSpan[neighbor.Atom];
            if (OrderOf(neighbor) != BondOrder.Single || data.FormalCharge > 0)
            {
                continue;
            }

            bool donor = data.AtomicNumber switch
            {
                8 => !OnAcylOrSulfonyl(neighbor.Atom, atom) || data.FormalCharge < 0,
                7 => !data.IsAromatic && HasOnlySingleBonds(molecule, neighbor.Atom) && !IsAcyl(atom),
                16 => CountOxo(molecule, neighbor.Atom) == 0,
                _ => false,
            };
            if (donor)
            {
                return neighbor.Atom;
            }
        }

        return -1;
    }

    private bool OnAcylOrSulfonyl(int heteroatom, int except)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(heteroatom))
        {
            if (neighbor.Atom != except
                && (IsAcyl(neighbor.Atom) || (ElementOf(neighbor.Atom) is 15 or 16 && CountOxo(molecule, neighbor.Atom) > 0)))
            {
                return true;
            }
        }

        return false;
    }

    // Ring C=C whose carbons lead to two carbonyl carbons of the same ring.
    private bool IsQuinoneBond(int atom, int other) =>
        molecule.AtomSpan[atom].IsInRing && molecule.AtomSpan[other].IsInRing
        && RingCarbonylBeside(atom, other) >= 0 && RingCarbonylBeside(other, atom) >= 0 && InRingOfSize(atom, other, 6);

    private int RingCarbonylBeside(int atom, int except)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (neighbor.Atom != except && molecule.BondSpan[neighbor.Bond].IsInRing && ElementOf(neighbor.Atom) == 6
                && DoubleBondedHeteroatom(molecule, neighbor.Atom) is int partner and >= 0 && ElementOf(partner) == 8)
            {
                return neighbor.Atom;
            }
        }

        return -1;
    }

    private void Heterocumulene(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (ElementOf(neighbor.Atom) is 7 or 8 or 16 && molecule.DegreeOf(atom) == 2)
            {
                // CO2 and CS2 as solvents or gases are no substrate groups.
                if (molecule.AtomCount > 3)
                {
                    Add(Entry.Heterocumulene, atom, neighbor.Atom);
                }

                return;
            }
        }
    }

    private void Carbonyl(int atom, int oxygen)
    {
        int hydrogens = HydrogensOn(atom);
        bool onlyCarbon = true;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            onlyCarbon &= neighbor.Atom == oxygen || ElementOf(neighbor.Atom) is 6 or 1;
        }

        if (!onlyCarbon)
        {
            return;
        }

        if (hydrogens > 0)
        {
            Add(Entry.Aldehyde, atom, oxygen);
            return;
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int alpha = neighbor.Atom;
            if (alpha != oxygen && IsSaturatedCarbon(alpha) && HydrogensOn(alpha) > 0)
            {
                Add(Entry.Ketone, atom, oxygen, alpha);
                return;
            }
        }
    }

    private void Acetal(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (ElementOf(neighbor.Atom) == 8
                && (molecule.DegreeOf(neighbor.Atom) != 2 || OnAcylOrSulfonyl(neighbor.Atom, atom)))
            {
                return;
            }
        }

        Add(Entry.Acetal, atom);
    }

    private void Saturated(int atom)
    {
        int carbonylNeighbors = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int other = neighbor.Atom;
            carbonylNeighbors += ElementOf(other) == 6
                && (IsAcyl(other) || (HasTripleBond(molecule, other) && DegreeTwoNitrile(other))) ? 1 : 0;
        }

        if (carbonylNeighbors >= 2 && HydrogensOn(atom) > 0 && HasKetoneOrAldehydeBeside(atom))
        {
            Add(Entry.ActiveMethylene, atom);
        }

        if (molecule.AtomSpan[atom].IsInRing)
        {
            ThreeRing(atom);
        }
    }

    private bool DegreeTwoNitrile(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (OrderOf(neighbor) == BondOrder.Triple)
            {
                return ElementOf(neighbor.Atom) == 7;
            }
        }

        return false;
    }

    // Malonates enolise too little for this; at least one ketone or aldehyde has to be there.
    private bool HasKetoneOrAldehydeBeside(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (!IsAcyl(neighbor.Atom))
            {
                continue;
            }

            bool ketone = true;
            foreach (Neighbor next in molecule.NeighborsOf(neighbor.Atom))
            {
                ketone &= OrderOf(next) == BondOrder.Double || ElementOf(next.Atom) is 6 or 1;
            }

            if (ketone)
            {
                return true;
            }
        }

        return false;
    }

    // Reported once per ring, from its lowest carbon.
    private void ThreeRing(int atom)
    {
        foreach (Neighbor first in molecule.NeighborsOf(atom))
        {
            foreach (Neighbor second in molecule.NeighborsOf(atom))
            {
                int a = first.Atom;
                int b = second.Atom;
                if (a >= b || !AreBonded(a, b))
                {
                    continue;
                }

                bool heteroA = ElementOf(a) != 6;
                bool heteroB = ElementOf(b) != 6;
                if (heteroA && heteroB)
                {
                    Add(Entry.Epoxide, atom, a, b);
                }
                else if (heteroA || heteroB)
                {
                    int partner = heteroA ? b : a;
                    if (partner > atom)
                    {
                        Add(Entry.Epoxide, atom, a, b);
                    }
                }
                else if (atom < a && IsSaturatedCarbon(a) && IsSaturatedCarbon(b))
                {
                    Add(Entry.Cyclopropane, atom, a, b);
                }
            }
        }
    }

    private bool AreBonded(int a, int b)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(a))
        {
            if (neighbor.Atom == b)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Whether a bond lies on a ring of the given size: the shortest way round has size - 1 bonds.</summary>
    private bool InRingOfSize(int start, int end, int size) => ShortestWayRound(start, end, size, 0, start);

    // Depth-limited walk: at most 3^(size-2) steps, and size is 6 at most.
    private bool ShortestWayRound(int start, int target, int size, int depth, int from)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(start))
        {
            if (neighbor.Atom == from || !molecule.BondSpan[neighbor.Bond].IsInRing || (depth == 0 && neighbor.Atom == target))
            {
                continue;
            }

            if (neighbor.Atom == target)
            {
                if (depth == size - 2)
                {
                    return true;
                }
            }
            else if (depth < size - 2 && ShortestWayRound(neighbor.Atom, target, size, depth + 1, start))
            {
                return true;
            }
        }

        return false;
    }
}
