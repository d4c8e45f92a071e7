using RadicalSites.Molecules;
using static RadicalSites.Perception.LocalPatterns;

namespace RadicalSites.Sites;

internal static partial class AlphaGroupPerception
{
    private static AlphaGroup? ClassifyCarbon(Molecule molecule, int carbon, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        if (data.IsAromatic)
        {
            return null;
        }

        int fluorines = 0;
        int heteroPartner = -1;
        BondOrder heteroOrder = BondOrder.Single;
        bool carbonDouble = false;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            int element = molecule.AtomSpan[neighbor.Atom].AtomicNumber;
            BondOrder order = molecule.BondSpan[neighbor.Bond].Order;
            fluorines += element == 9 ? 1 : 0;
            if (order == BondOrder.Single)
            {
                continue;
            }

            if (element == 6)
            {
                carbonDouble = true;
            }
            else
            {
                heteroPartner = neighbor.Atom;
                heteroOrder = order;
            }
        }

        if (heteroPartner < 0)
        {
            return fluorines == 3 && !carbonDouble
                ? new AlphaGroup(AlphaGroupKind.Trifluoromethyl, atom, FluorineAtoms(molecule, atom))
                : null;
        }

        if (carbonDouble)
        {
            // A ketene carbon: the C=C makes the carbon beside it allylic, which Conjugation reports.
            return null;
        }

        int partnerElement = molecule.AtomSpan[heteroPartner].AtomicNumber;
        if (heteroOrder == BondOrder.Triple)
        {
            return new AlphaGroup(
                partnerElement == 7 ? AlphaGroupKind.Nitrile : AlphaGroupKind.OtherUnsaturatedCarbon, atom,
                [atom, heteroPartner]);
        }

        return partnerElement == 8
            ? ClassifyCarbonyl(molecule, carbon, atom, heteroPartner)
            : new AlphaGroup(AlphaGroupKind.OtherUnsaturatedCarbon, atom, [atom, heteroPartner]);
    }

    private static AlphaGroup ClassifyCarbonyl(Molecule molecule, int carbon, int carbonyl, int oxygen)
    {
        if (molecule.AtomSpan[carbonyl].HydrogenCount > 0)
        {
            return new AlphaGroup(AlphaGroupKind.Aldehyde, carbonyl, [carbonyl, oxygen]);
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(carbonyl))
        {
            int other = neighbor.Atom;
            if (other == carbon || other == oxygen)
            {
                continue;
            }

            Atom data = molecule.AtomSpan[other];
            AlphaGroupKind kind = data.AtomicNumber switch
            {
                1 => AlphaGroupKind.Aldehyde,
                6 => AlphaGroupKind.Ketone,
                7 => AlphaGroupKind.Amide,
                8 when data.FormalCharge < 0 => AlphaGroupKind.Carboxylate,
                8 when data.HydrogenCount > 0 => AlphaGroupKind.CarboxylicAcid,
                8 or 16 => AlphaGroupKind.Ester,
                9 or 17 or 35 or 53 => AlphaGroupKind.AcylHalide,
                _ => AlphaGroupKind.OtherUnsaturatedCarbon,
            };
            return new AlphaGroup(kind, carbonyl, [carbonyl, oxygen, other]);
        }

        // Two single bonds to the same ring carbon cannot occur; what is left is an acyl cation or radical.
        return new AlphaGroup(AlphaGroupKind.OtherUnsaturatedCarbon, carbonyl, [carbonyl, oxygen]);
    }

    private static int[] FluorineAtoms(Molecule molecule, int atom)
    {
        var atoms = new int[4];
        atoms[0] = atom;
        int filled = 1;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.AtomSpan[neighbor.Atom].AtomicNumber == 9)
            {
                atoms[filled++] = neighbor.Atom;
            }
        }

        return atoms;
    }
}
