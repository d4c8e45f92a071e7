using System;
using System.Collections.Generic;
using RadicalSites.Molecules;
using RadicalSites.Perception;

namespace RadicalSites.Sites;

/// <summary>Finds the pi groups beside a saturated carbon.</summary>
/// <remarks>
/// Each pi group counts once: the two ends of one C=C on the same carbon (cyclopropene) make one allylic entry, two
/// phenyl rings (diphenylmethane) make two benzylic ones.
/// </remarks>
internal static class ConjugationPerception
{
    internal static IReadOnlyList<ConjugatedNeighbor> Find(Molecule molecule, int carbon)
    {
        ConjugatedNeighbor? first = null;
        List<ConjugatedNeighbor>? all = null;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            ConjugatedNeighbor? found = Classify(molecule, neighbor.Atom);
            if (found is null)
            {
                continue;
            }

            if (first is null)
            {
                first = found;
                continue;
            }

            all ??= [first];
            if (!ContainsGroup(all, found))
            {
                all.Add(found);
            }
        }

        return all is not null ? all.ToArray() : first is not null ? [first] : [];
    }

    private static ConjugatedNeighbor? Classify(Molecule molecule, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        if (data.AtomicNumber != 6)
        {
            return null;
        }

        if (data.IsAromatic)
        {
            int[] ring = SmallestAromaticRing(molecule, atom);
            return new ConjugatedNeighbor(
                HasHeteroatom(molecule, ring) ? ConjugationKind.HeteroBenzylic : ConjugationKind.Benzylic, atom, ring);
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
        {
            if (molecule.AtomSpan[neighbor.Atom].AtomicNumber != 6)
            {
                continue;
            }

            switch (molecule.BondSpan[neighbor.Bond].Order)
            {
                case BondOrder.Double:
                    return new ConjugatedNeighbor(ConjugationKind.Allylic, atom, [atom, neighbor.Atom]);
                case BondOrder.Triple:
                    return new ConjugatedNeighbor(ConjugationKind.Propargylic, atom, [atom, neighbor.Atom]);
                default:
                    break;
            }
        }

        return null;
    }

    private static bool HasHeteroatom(Molecule molecule, int[] ring)
    {
        foreach (int atom in ring)
        {
            if (molecule.AtomSpan[atom].AtomicNumber != 6)
            {
                return true;
            }
        }

        return false;
    }

    private static bool ContainsGroup(List<ConjugatedNeighbor> groups, ConjugatedNeighbor candidate)
    {
        foreach (ConjugatedNeighbor group in groups)
        {
            if (group.PiAtoms.Count == candidate.PiAtoms.Count && SameAtoms(group.PiAtoms, candidate.PiAtoms))
            {
                return true;
            }
        }

        return false;
    }

    private static bool SameAtoms(IReadOnlyList<int> left, IReadOnlyList<int> right)
    {
        foreach (int atom in left)
        {
            bool found = false;
            foreach (int other in right)
            {
                found |= atom == other;
            }

            if (!found)
            {
                return false;
            }
        }

        return true;
    }

    private static int[] SmallestAromaticRing(Molecule molecule, int start)
    {
        Span<int> ring = stackalloc int[AromaticRing.Longest];
        return ring[..AromaticRing.Around(molecule, start, ring)].ToArray();
    }
}
