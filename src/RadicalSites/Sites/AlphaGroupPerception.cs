using System.Collections.Generic;
using RadicalSites.Molecules;
using static RadicalSites.Perception.LocalPatterns;

namespace RadicalSites.Sites;

/// <summary>Names the functional groups attached directly to a saturated carbon.</summary>
internal static partial class AlphaGroupPerception
{
    internal static IReadOnlyList<AlphaGroup> Find(Molecule molecule, int carbon)
    {
        AlphaGroup? first = null;
        List<AlphaGroup>? all = null;
        foreach (Neighbor neighbor in molecule.NeighborsOf(carbon))
        {
            AlphaGroup? found = Classify(molecule, carbon, neighbor.Atom);
            if (found is null)
            {
                continue;
            }

            if (first is null)
            {
                first = found;
            }
            else
            {
                all ??= [first];
                all.Add(found);
            }
        }

        return all is not null ? all.ToArray() : first is not null ? [first] : [];
    }

    /// <summary>Kind of the group that an atom is for a carbon it is bonded to; null for hydrogen and plain carbon.</summary>
    internal static AlphaGroupKind? KindOf(Molecule molecule, int carbon, int atom) => Classify(molecule, carbon, atom)?.Kind;

    private static AlphaGroup? Classify(Molecule molecule, int carbon, int atom) =>
        molecule.AtomSpan[atom].AtomicNumber switch
        {
            1 => null,
            6 => ClassifyCarbon(molecule, carbon, atom),
            7 => ClassifyNitrogen(molecule, carbon, atom),
            8 => ClassifyOxygen(molecule, carbon, atom),
            16 => ClassifySulfur(molecule, atom),
            9 => new AlphaGroup(AlphaGroupKind.Fluorine, atom, [atom]),
            17 => new AlphaGroup(AlphaGroupKind.Chlorine, atom, [atom]),
            35 => new AlphaGroup(AlphaGroupKind.Bromine, atom, [atom]),
            53 => new AlphaGroup(AlphaGroupKind.Iodine, atom, [atom]),
            14 or 32 or 50 or 82 => new AlphaGroup(AlphaGroupKind.Silicon, atom, [atom]),
            15 or 33 or 51 => new AlphaGroup(AlphaGroupKind.Phosphorus, atom, [atom]),
            5 => new AlphaGroup(AlphaGroupKind.Boron, atom, [atom]),
            34 or 52 => new AlphaGroup(AlphaGroupKind.OtherChalcogen, atom, [atom]),
            0 or 2 or 10 or 18 or 36 or 54 or 86 or 85 => new AlphaGroup(AlphaGroupKind.Other, atom, [atom]),
            _ => new AlphaGroup(AlphaGroupKind.Metal, atom, [atom]),
        };

    private static AlphaGroup ClassifyOxygen(Molecule molecule, int carbon, int oxygen)
    {
        Atom data = molecule.AtomSpan[oxygen];
        if (data.FormalCharge != 0 || data.UnpairedElectrons != 0)
        {
            return new AlphaGroup(AlphaGroupKind.OtherOxygen, oxygen, [oxygen]);
        }

        if (data.HydrogenCount > 0)
        {
            return new AlphaGroup(AlphaGroupKind.Hydroxyl, oxygen, [oxygen]);
        }

        foreach (Neighbor neighbor in molecule.NeighborsOf(oxygen))
        {
            int other = neighbor.Atom;
            if (other == carbon)
            {
                continue;
            }

            return molecule.AtomSpan[other].AtomicNumber switch
            {
                1 => new AlphaGroup(AlphaGroupKind.Hydroxyl, oxygen, [oxygen, other]),
                6 when DoubleBondedHeteroatom(molecule, other) is int partner and >= 0 =>
                    new AlphaGroup(AlphaGroupKind.EsterOxygen, oxygen, [oxygen, other, partner]),
                6 => new AlphaGroup(AlphaGroupKind.Ether, oxygen, [oxygen, other]),
                8 => new AlphaGroup(AlphaGroupKind.PeroxideOxygen, oxygen, [oxygen, other]),
                _ => new AlphaGroup(AlphaGroupKind.OtherOxygen, oxygen, [oxygen, other]),
            };
        }

        return new AlphaGroup(AlphaGroupKind.OtherOxygen, oxygen, [oxygen]);
    }

    private static AlphaGroup ClassifyNitrogen(Molecule molecule, int carbon, int nitrogen)
    {
        Atom data = molecule.AtomSpan[nitrogen];
        if (data.IsAromatic)
        {
            return new AlphaGroup(AlphaGroupKind.AromaticNitrogen, nitrogen, [nitrogen]);
        }

        if (IsNitro(molecule, nitrogen, out int[] nitroAtoms))
        {
            return new AlphaGroup(AlphaGroupKind.Nitro, nitrogen, nitroAtoms);
        }

        int partners = data.HydrogenCount + molecule.DegreeOf(nitrogen);
        if (data.FormalCharge == 1 && partners == 4)
        {
            return new AlphaGroup(IsOxide(molecule, nitrogen) ? AlphaGroupKind.OtherNitrogen : AlphaGroupKind.Ammonium, nitrogen, [nitrogen]);
        }

        if (data.FormalCharge != 0 || data.UnpairedElectrons != 0 || partners != 3 || !HasOnlySingleBonds(molecule, nitrogen))
        {
            return new AlphaGroup(AlphaGroupKind.OtherNitrogen, nitrogen, [nitrogen]);
        }

        var kind = AlphaGroupKind.Amine;
        int[] atoms = [nitrogen];
        foreach (Neighbor neighbor in molecule.NeighborsOf(nitrogen))
        {
            int other = neighbor.Atom;
            if (other == carbon)
            {
                continue;
            }

            switch (molecule.AtomSpan[other].AtomicNumber)
            {
                case 1:
                    break;
                case 6 when AcylPartner(molecule, other) is int partner and >= 0:
                    return new AlphaGroup(AlphaGroupKind.AmideNitrogen, nitrogen, [nitrogen, other, partner]);
                case 16 when CountOxo(molecule, other) >= 1:
                    return new AlphaGroup(AlphaGroupKind.AmideNitrogen, nitrogen, [nitrogen, other]);
                case 15 when CountOxo(molecule, other) >= 1:
                    return new AlphaGroup(AlphaGroupKind.AmideNitrogen, nitrogen, [nitrogen, other]);
                case 6 when DoubleBondedHeteroatom(molecule, other) < 0 && !HasTripleBond(molecule, other):
                    break;
                default:
                    // Hydrazine, hydroxylamine, N-halogen, amidine, cyanamide, nitrosamine: lone pair tied up otherwise.
                    kind = AlphaGroupKind.OtherNitrogen;
                    atoms = [nitrogen, other];
                    break;
            }
        }

        return new AlphaGroup(kind, nitrogen, atoms);
    }

    private static AlphaGroup ClassifySulfur(Molecule molecule, int sulfur)
    {
        Atom data = molecule.AtomSpan[sulfur];
        int oxo = CountOxo(molecule, sulfur);
        int partners = data.HydrogenCount + molecule.DegreeOf(sulfur);
        AlphaGroupKind kind = oxo switch
        {
            >= 2 => AlphaGroupKind.Sulfonyl,
            1 when partners == 3 => AlphaGroupKind.Sulfoxide,
            0 when partners == 2 && data.FormalCharge == 0 && data.UnpairedElectrons == 0 => AlphaGroupKind.Sulfide,
            _ => AlphaGroupKind.OtherChalcogen,
        };
        return new AlphaGroup(kind, sulfur, [sulfur]);
    }
}
