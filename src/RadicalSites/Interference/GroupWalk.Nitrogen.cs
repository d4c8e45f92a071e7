using RadicalSites.Molecules;
using RadicalSites.Perception;
using static RadicalSites.Perception.LocalPatterns;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

internal sealed partial class GroupWalk
{
    private void Nitrogen(int atom, Atom data)
    {
        if (data.IsAromatic)
        {
            if (data.FormalCharge == 0 && data.HydrogenCount == 0 && molecule.DegreeOf(atom) == 2)
            {
                Add(Entry.BasicHeteroarene, atom);
            }

            return;
        }

        if (IsNitro(molecule, atom, out int[] nitroAtoms))
        {
            Nitro(atom, nitroAtoms);
            return;
        }

        int nitrogenPartner = -1;
        int oxygenPartner = -1;
        int halogenPartner = -1;
        int doubleCarbon = -1;
        bool triple = false;
        BondOrder nitrogenOrder = BondOrder.Single;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int element = ElementOf(neighbor.Atom);
            BondOrder order = OrderOf(neighbor);
            triple |= order == BondOrder.Triple;
            switch (element)
            {
                case 7:
                    nitrogenPartner = neighbor.Atom;
                    nitrogenOrder = order;
                    break;
                case 8:
                    oxygenPartner = neighbor.Atom;
                    break;
                case 9 or 17 or 35 or 53:
                    halogenPartner = neighbor.Atom;
                    break;
                case 6 when order == BondOrder.Double:
                    doubleCarbon = neighbor.Atom;
                    break;
                default:
                    break;
            }
        }

        if (halogenPartner >= 0)
        {
            Add(Entry.ActiveHalogen, atom, halogenPartner);
        }
        else if (IsDiazoLike(atom, data, nitrogenPartner, nitrogenOrder))
        {
            if (nitrogenPartner > atom || !IsDiazoMiddle(nitrogenPartner))
            {
                Add(Entry.Azide, atom, nitrogenPartner);
            }
        }
        else if (nitrogenPartner >= 0 && IsDiazoMiddle(nitrogenPartner))
        {
            // Outer nitrogen of an azide: reported from the middle one.
        }
        else if (nitrogenPartner >= 0 && nitrogenOrder == BondOrder.Double)
        {
            AzoGroup(atom, nitrogenPartner);
        }
        else if (nitrogenPartner >= 0 && IsNitro(molecule, nitrogenPartner, out _))
        {
            Add(Entry.Energetic, atom, nitrogenPartner);
        }
        else if (nitrogenPartner >= 0 || oxygenPartner >= 0)
        {
            NitrogenBondedToHeteroatom(atom, data, nitrogenPartner, oxygenPartner);
        }
        else if (doubleCarbon >= 0)
        {
            if (data.FormalCharge == 0 && molecule.AtomSpan[doubleCarbon] is { IsAromatic: false } && !IsCumulatedCarbon(doubleCarbon))
            {
                Imine(atom, doubleCarbon);
            }
        }
        else if (triple)
        {
            if (data.FormalCharge > 0)
            {
                Add(Entry.Heterocumulene, atom, molecule.NeighborsOf(atom)[0].Atom);
            }
        }
        else
        {
            AmineOrAmide(atom, data);
        }
    }

    private void Nitro(int nitrogen, int[] nitroAtoms)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(nitrogen))
        {
            if (ElementOf(neighbor.Atom) != 6)
            {
                continue;
            }

            int carbon = neighbor.Atom;
            if (IsSaturatedCarbon(carbon) && HydrogensOn(carbon) > 0)
            {
                nitroAlkane = nitroAtoms[0];
            }

            if (IsLowestNitroOfEnergeticGroup(nitrogen, carbon))
            {
                Add(Entry.Energetic, nitrogen, carbon);
            }
        }
    }

    // Two nitro groups on one carbon, or three on one benzene ring.
    private bool IsLowestNitroOfEnergeticGroup(int nitrogen, int carbon)
    {
        int lowest = nitrogen;
        int onCarbon = CountNitro(carbon, ref lowest);
        if (onCarbon >= 2)
        {
            return lowest == nitrogen;
        }

        if (!molecule.AtomSpan[carbon].IsAromatic)
        {
            return false;
        }

        lowest = nitrogen;
        System.Span<int> ring = stackalloc int[AromaticRing.Longest];
        int size = AromaticRing.Around(molecule, carbon, ring);
        int total = 0;
        for (int i = 0; i < size; i++)
        {
            total += CountNitro(ring[i], ref lowest);
        }

        return total >= 3 && lowest == nitrogen;
    }

    private int CountNitro(int carbon, ref int lowest)
    {
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            if (ElementOf(neighbor.Atom) == 7 && IsNitro(molecule, neighbor.Atom, out _))
            {
                count++;
                lowest = System.Math.Min(lowest, neighbor.Atom);
            }
        }

        return count;
    }

    private bool IsDiazoLike(int atom, Atom data, int partner, BondOrder order) =>
        partner >= 0
        && (order == BondOrder.Triple || (IsDiazoMiddle(atom) && data.FormalCharge >= 0 && data.HydrogenCount == 0));

    // Nitrogen with two multiple bonds or a positive charge between N and N or C: [N+] of azide, diazo, diazonium.
    private bool IsDiazoMiddle(int atom)
    {
        if (ElementOf(atom) != 7 || molecule.AtomSpan[atom].IsAromatic)
        {
            return false;
        }

        int multiple = 0;
        bool nitrogen = false;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            multiple += OrderOf(neighbor) - BondOrder.Single;
            nitrogen |= ElementOf(neighbor.Atom) == 7 && OrderOf(neighbor) >= BondOrder.Double;
        }

        return nitrogen && multiple >= 2;
    }

    private void AzoGroup(int atom, int partner)
    {
        if (partner < atom)
        {
            return;
        }

        foreach (int end in (int[])[atom, partner])
        {
            foreach (Neighbor neighbor in molecule.NeighborsOf(end))
            {
                if (IsSaturatedCarbon(neighbor.Atom))
                {
                    Add(Entry.Azo, atom, partner);
                    return;
                }
            }
        }
    }

    private void NitrogenBondedToHeteroatom(int atom, Atom data, int nitrogenPartner, int oxygenPartner)
    {
        if (data.FormalCharge > 0 && oxygenPartner >= 0)
        {
            // Amine N-oxide or nitrone; the N-oxide of an aromatic ring was handled before.
            Add(Entry.OxidisableNitrogen, atom, oxygenPartner);
            return;
        }

        if (nitrogenPartner > atom || nitrogenPartner < 0 || ElementOf(nitrogenPartner) != 7)
        {
            Add(Entry.OxidisableNitrogen, atom, nitrogenPartner >= 0 ? nitrogenPartner : oxygenPartner);
        }
    }

    private bool IsCumulatedCarbon(int carbon)
    {
        int doubles = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            doubles += OrderOf(neighbor) == BondOrder.Double ? 1 : 0;
        }

        return doubles >= 2;
    }

    private void Imine(int nitrogen, int carbon)
    {
        // Amidines, guanidines and imidates are bases rather than oxidisable imines.
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            if (neighbor.Atom != nitrogen && ElementOf(neighbor.Atom) is 7)
            {
                if (HydrogensOn(nitrogen) > 0 || molecule.AtomSpan[neighbor.Atom].HydrogenCount > 0)
                {
                    base1 = nitrogen;
                    Add(Entry.Amine, nitrogen, carbon);
                }

                return;
            }
        }

        Add(Entry.OxidisableNitrogen, nitrogen, carbon);
    }

    private void AmineOrAmide(int atom, Atom data)
    {
        if (data.FormalCharge < 0)
        {
            if (!IsStabilisedAnion(atom))
            {
                base1 = atom;
                Add(Entry.Base, atom);
            }

            return;
        }

        if (data.FormalCharge > 0)
        {
            return;
        }

        int aryl = -1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int other = neighbor.Atom;
            bool withdrawing = IsAcyl(other) || HasTripleBond(molecule, other) || (ElementOf(other) is 15 or 16 && CountOxo(molecule, other) > 0);
            if (withdrawing)
            {
                if (HydrogensOn(atom) > 0)
                {
                    Add(Entry.AmideHydrogen, atom, other);
                }

                return;
            }

            if (ElementOf(other) == 6 && DoubleBondedHeteroatom(molecule, other) >= 0)
            {
                // Amidine, guanidine or imidate nitrogen: reported with its C=N.
                return;
            }

            aryl = molecule.AtomSpan[other].IsAromatic ? other : aryl;
        }

        if (aryl >= 0)
        {
            Add(Entry.Aniline, atom, aryl);
        }
        else if (!OnAlkene(atom))
        {
            base1 = atom;
            Add(Entry.Amine, atom);
        }
    }

    private bool OnAlkene(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (ElementOf(neighbor.Atom) == 6 && !HasOnlySingleBonds(molecule, neighbor.Atom))
            {
                return true;
            }
        }

        return false;
    }

    private bool IsStabilisedAnion(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (IsAcyl(neighbor.Atom) || (ElementOf(neighbor.Atom) is 15 or 16 && CountOxo(molecule, neighbor.Atom) > 0))
            {
                return true;
            }
        }

        return false;
    }
}
