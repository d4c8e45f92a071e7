using RadicalSites.Molecules;
using static RadicalSites.Perception.LocalPatterns;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

internal sealed partial class GroupWalk
{
    private void Oxygen(int atom, Atom data)
    {
        int degree = molecule.DegreeOf(atom);
        if (degree == 0)
        {
            if (data.FormalCharge < 0)
            {
                base1 = atom;
                Add(Entry.Base, atom);
            }

            return;
        }

        int first = molecule.NeighborsOf(atom)[0].Atom;
        int second = degree > 1 ? molecule.NeighborsOf(atom)[1].Atom : -1;
        if (PeroxideOrHypohalite(atom, first) || (second >= 0 && PeroxideOrHypohalite(atom, second)))
        {
            return;
        }

        if (data.FormalCharge != 0)
        {
            if (data.FormalCharge < 0 && degree == 1 && IsSaturatedCarbon(first))
            {
                base1 = atom;
                Add(Entry.Base, atom, first);
            }

            return;
        }

        if (HydrogensOn(atom) > 0 && degree - ExplicitHydrogens(atom) == 1)
        {
            Hydroxyl(atom, HeavyNeighbor(atom));
        }
        else if (degree == 2 && !data.IsAromatic)
        {
            Ether(atom, first, second);
        }
    }

    private bool PeroxideOrHypohalite(int oxygen, int other)
    {
        switch (ElementOf(other))
        {
            case 8:
                if (oxygen < other)
                {
                    if (molecule.DegreeOf(oxygen) == 1 && molecule.DegreeOf(other) == 1 && HydrogensOn(oxygen) == 0 && HydrogensOn(other) == 0)
                    {
                        Add(Entry.Inhibitor, oxygen, other);
                    }
                    else
                    {
                        Add(Entry.Peroxide, oxygen, other);
                    }
                }

                return true;
            case 17 or 35 or 53 when molecule.DegreeOf(other) == 1:
                Add(Entry.ActiveHalogen, oxygen, other);
                return true;
            case 7 when IsNitro(molecule, other, out _) && OrderOf(BondTo(oxygen, other)) == BondOrder.Single
                && molecule.AtomSpan[oxygen].FormalCharge == 0:
                Add(Entry.Energetic, oxygen, other);
                return true;
            default:
                return false;
        }
    }

    private Neighbor BondTo(int atom, int other)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (neighbor.Atom == other)
            {
                return neighbor;
            }
        }

        return default;
    }

    private int ExplicitHydrogens(int atom) => HydrogensOn(atom) - molecule.AtomSpan[atom].HydrogenCount;

    private int HeavyNeighbor(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (ElementOf(neighbor.Atom) != 1)
            {
                return neighbor.Atom;
            }
        }

        return -1;
    }

    private void Hydroxyl(int oxygen, int carbon)
    {
        if (carbon < 0 || ElementOf(carbon) != 6)
        {
            return;
        }

        if (molecule.AtomSpan[carbon].IsAromatic)
        {
            Add(Entry.Phenol, oxygen, carbon);
        }
        else if (IsAcyl(carbon))
        {
            Add(Entry.CarboxylicAcid, carbon, oxygen);
        }
        else if (IsSaturatedCarbon(carbon))
        {
            if (HydrogensOn(carbon) > 0)
            {
                Add(Entry.Alcohol, oxygen, carbon);
            }
            else
            {
                Add(Entry.TertiaryAlcohol, oxygen, carbon);
            }
        }
    }

    private void Ether(int oxygen, int first, int second)
    {
        int silicon = ElementOf(first) == 14 ? first : ElementOf(second) == 14 ? second : -1;
        if (silicon >= 0)
        {
            int partner = silicon == first ? second : first;
            if (ElementOf(partner) == 6)
            {
                Add(Entry.AcidLabile, oxygen, silicon, partner);
            }

            return;
        }

        if (IsAcyl(first) || IsAcyl(second))
        {
            int alkyl = IsAcyl(first) ? second : first;
            if (IsSaturatedCarbon(alkyl) && StabilisesCation(alkyl))
            {
                Add(Entry.AcidLabile, alkyl, oxygen);
            }

            return;
        }

        if (!IsEtherCarbon(first) || !IsEtherCarbon(second) || InThreeRing(first, second) || IsAcetalCarbon(first) || IsAcetalCarbon(second))
        {
            return;
        }

        if (IsTrityl(first) || IsTrityl(second))
        {
            Add(Entry.AcidLabile, IsTrityl(first) ? first : second, oxygen);
        }

        bool alphaHydrogen = (IsSaturatedCarbon(first) && HydrogensOn(first) > 0) || (IsSaturatedCarbon(second) && HydrogensOn(second) > 0);
        bool dialkyl = IsSaturatedCarbon(first) && IsSaturatedCarbon(second);
        if (alphaHydrogen && dialkyl)
        {
            Add(Entry.Ether, oxygen, first, second);
        }
    }

    private bool IsEtherCarbon(int atom) => ElementOf(atom) == 6 && DoubleBondedHeteroatom(molecule, atom) < 0;

    private bool InThreeRing(int first, int second) => AreBonded(first, second);

    private bool IsAcetalCarbon(int atom)
    {
        if (!IsSaturatedCarbon(atom))
        {
            return false;
        }

        int oxygens = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            oxygens += ElementOf(neighbor.Atom) == 8 ? 1 : 0;
        }

        return oxygens >= 2;
    }

    // tert-Butyl and trityl esters and carbamates lose the alkyl group as a cation in acid.
    private bool StabilisesCation(int carbon) => IsTrityl(carbon) || (HydrogensOn(carbon) == 0 && CarbonNeighbors(carbon) == 3 && !molecule.AtomSpan[carbon].IsInRing && MethylNeighbors(carbon) == 3);

    private bool IsTrityl(int carbon)
    {
        if (!IsSaturatedCarbon(carbon))
        {
            return false;
        }

        int aryl = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            aryl += molecule.AtomSpan[neighbor.Atom].IsAromatic ? 1 : 0;
        }

        return aryl == 3;
    }

    private int CarbonNeighbors(int atom)
    {
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            count += ElementOf(neighbor.Atom) == 6 ? 1 : 0;
        }

        return count;
    }

    private int MethylNeighbors(int atom)
    {
        int count = 0;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            count += ElementOf(neighbor.Atom) == 6 && molecule.DegreeOf(neighbor.Atom) == 1
                && IsSaturatedCarbon(neighbor.Atom) ? 1 : 0;
        }

        return count;
    }
}
