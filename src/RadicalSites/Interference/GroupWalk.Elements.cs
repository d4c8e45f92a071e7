using RadicalSites.Molecules;
using static RadicalSites.Perception.LocalPatterns;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

internal sealed partial class GroupWalk
{
    private void Chalcogen(int atom, Atom data)
    {
        if (data.IsAromatic)
        {
            return;
        }

        int oxo = CountOxo(molecule, atom);
        int degree = molecule.DegreeOf(atom) - ExplicitHydrogens(atom);
        if (degree == 0)
        {
            if (data.FormalCharge < 0 || HydrogensOn(atom) > 0)
            {
                Add(Entry.Thiol, atom);
            }

            return;
        }

        if (oxo == 0 && data.FormalCharge <= 0 && (HydrogensOn(atom) > 0 || data.FormalCharge < 0))
        {
            Add(Entry.Thiol, atom, HeavyNeighbor(atom));
        }
        else if (oxo == 0 && data.FormalCharge == 0 && degree == 2 && HasOnlySingleBonds(molecule, atom))
        {
            DivalentSulfur(atom);
        }
        else if (oxo == 0 && data.FormalCharge == 0 && degree == 1)
        {
            // C=S; carbon disulfide itself is a solvent here.
            if (molecule.AtomCount > 3)
            {
                Add(Entry.OxidisableSulfur, atom, HeavyNeighbor(atom));
            }
        }
        else if (oxo == 1 && degree == 3)
        {
            Add(Entry.OxidisableSulfur, atom);
        }
    }

    private void DivalentSulfur(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (ElementOf(neighbor.Atom) is 17 or 35 or 9 or 53)
            {
                Add(Entry.ActiveHalogen, atom, neighbor.Atom);
                return;
            }

            if (ElementOf(neighbor.Atom) is 16 or 34 or 52 && neighbor.Atom < atom)
            {
                return;
            }
        }

        Add(Entry.Sulfide, atom);
    }

    private void Pnictogen(int atom, Atom data)
    {
        if (HydrogensOn(atom) > 0)
        {
            Add(Entry.Hydride, atom);
        }
        else if (data.FormalCharge == 0 && !data.IsAromatic && molecule.DegreeOf(atom) == 3
            && HasOnlySingleBonds(molecule, atom) && HasCarbonOrOxygenArm(atom))
        {
            Add(Entry.TrivalentPhosphorus, atom);
        }
    }

    private bool HasCarbonOrOxygenArm(int atom)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (ElementOf(neighbor.Atom) is 6 or 7 or 8)
            {
                return true;
            }
        }

        return false;
    }

    private void Metalloid(int atom, Atom data)
    {
        if (HydrogensOn(atom) > 0)
        {
            Add(data.FormalCharge < 0 ? Entry.Base : Entry.Hydride, atom);
        }
        else if (data.AtomicNumber == 5 && data.FormalCharge == 0 && CarbonNeighbors(atom) == 3)
        {
            Add(Entry.Organometallic, atom, molecule.NeighborsOf(atom)[0].Atom);
        }
    }

    private void HalogenAtom(int atom, Atom data)
    {
        int degree = molecule.DegreeOf(atom);
        if (degree == 0)
        {
            if (data.AtomicNumber is 35 or 53 && data.FormalCharge == -1)
            {
                Add(Entry.HalideIon, atom);
            }

            return;
        }

        if (data.AtomicNumber != 53)
        {
            return;
        }

        int partner = molecule.NeighborsOf(atom)[0].Atom;
        if (ElementOf(partner) == 6)
        {
            Add(Entry.Iodide, atom, partner);
        }
        else if (ElementOf(partner) == 53 && atom < partner)
        {
            Add(Entry.Inhibitor, atom, partner);
        }
    }

    private void OtherElement(int atom, Atom data)
    {
        if (HydrogensOn(atom) > 0 && data.AtomicNumber is 50 or 82)
        {
            Add(Entry.Hydride, atom);
        }

        if (IsMetal(data.AtomicNumber) && CarbonNeighbors(atom) > 0)
        {
            Add(Entry.Organometallic, atom, HeavyNeighbor(atom));
        }

        // Alkali and alkaline-earth cations are spectators; carbon-metal bonds are reported from their carbon.
        bool spectator = data.AtomicNumber is 3 or 4 or 11 or 12 or 19 or 20 or 37 or 38 or 55 or 56 or 13 or 30;
        if (IsMetal(data.AtomicNumber) && !spectator && data.AtomicNumber is not (50 or 82))
        {
            Add(Entry.MetalIon, atom);
        }
    }
}
