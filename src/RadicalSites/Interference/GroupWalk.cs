using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using static RadicalSites.Perception.LocalPatterns;
using Entry = RadicalSites.Diagnostics.ProblemCatalogue.Interference;

namespace RadicalSites.Interference;

/// <summary>One pass over the atoms of a molecule that collects the hits; belongs to one call.</summary>
internal sealed partial class GroupWalk(Molecule molecule, HalogenSources sources)
{
    private int nitroAlkane = -1;
    private int base1 = -1;

    internal List<InterferenceHit>? Hits { get; private set; }

    internal void Run()
    {
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            Atom data = molecule.AtomSpan[atom];
            if (data.UnpairedElectrons > 0 && !IsMetal(data.AtomicNumber))
            {
                Add(Entry.Inhibitor, atom);
            }

            switch (data.AtomicNumber)
            {
                case 0:
                case 1:
                    break;
                case 6:
                    Carbon(atom, data);
                    break;
                case 7:
                    Nitrogen(atom, data);
                    break;
                case 8:
                    Oxygen(atom, data);
                    break;
                case 16 or 34 or 52:
                    Chalcogen(atom, data);
                    break;
                case 15 or 33 or 51:
                    Pnictogen(atom, data);
                    break;
                case 5 or 14 or 32:
                    Metalloid(atom, data);
                    break;
                case 9 or 17 or 35 or 53:
                    HalogenAtom(atom, data);
                    break;
                default:
                    OtherElement(atom, data);
                    break;
            }
        }

        ActivatedRings();
        if (nitroAlkane >= 0 && base1 >= 0)
        {
            Add(Entry.NitroWithBase, nitroAlkane, base1);
        }
    }

    private void Add(ProblemDescriptor problem, params int[] atoms)
    {
        InterferenceRule rule = InterferenceRules.Of(problem);
        if ((rule.Sources & sources) != 0)
        {
            (Hits ??= []).Add(new InterferenceHit(problem, atoms, rule.Source, rule.Locator));
        }
    }

    private int ElementOf(int atom) => molecule.AtomSpan[atom].AtomicNumber;

    private BondOrder OrderOf(Neighbor neighbor) => molecule.BondSpan[neighbor.Bond].Order;

    private bool IsSaturatedCarbon(int atom) =>
        ElementOf(atom) == 6 && !molecule.AtomSpan[atom].IsAromatic && HasOnlySingleBonds(molecule, atom);

    private int HydrogensOn(int atom)
    {
        int count = molecule.AtomSpan[atom].HydrogenCount;
        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            count += ElementOf(neighbor.Atom) == 1 ? 1 : 0;
        }

        return count;
    }

    /// <summary>Whether a carbon is doubly bonded to oxygen, sulfur or selenium.</summary>
    private bool IsAcyl(int atom) => ElementOf(atom) == 6 && AcylPartner(molecule, atom) >= 0;

    private static bool IsMetal(int element) =>
        element is (>= 3 and <= 4) or (>= 11 and <= 13) or (>= 19 and <= 31) or (>= 37 and <= 50) or (>= 55 and <= 84)
            or (>= 87 and <= 116);
}
