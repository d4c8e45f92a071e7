using System;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Implied hydrogens, open shells and the check against impossible valences.</summary>
/// <remarks>
/// Organic-subset atoms get hydrogens up to the lowest normal valence that holds their bonds. Atoms with a stated count
/// keep it; electrons missing to the next normal valence are unpaired. Only elements whose octet cannot expand (B, C, N,
/// O, F and their ions) are refused above their highest valence; all others are accepted as written.
/// </remarks>
internal static class ValenceModel
{
    /// <summary>Completes hydrogen counts and unpaired electrons of a localised draft.</summary>
    /// <returns>The problem, or null.</returns>
    internal static FormatProblem? Complete(StructureDraft draft, CompletionScratch scratch)
    {
        for (int i = 0; i < draft.AtomCount; i++)
        {
            ref BuilderAtom atom = ref draft.Atoms[i];
            int bonds = 0;
            foreach (Neighbor neighbor in scratch.NeighborsOf(i))
            {
                bonds += (int)draft.Bonds[neighbor.Bond].Order;
            }

            if (atom.Element == 0)
            {
                atom.Hydrogens = (sbyte)(Math.Max((sbyte)0, atom.Hydrogens) + atom.FoldedHydrogens);
                atom.FoldedHydrogens = 0;
                continue;
            }

            ReadOnlySpan<byte> valences = Valences.Of(atom.Element, atom.Charge);
            if (atom.Hydrogens < 0)
            {
                bonds += atom.FoldedHydrogens;
                int implied = 0;

                // The organic subset knows a single valence of the halogens: I without brackets in ClICl has no hydrogen.
                foreach (byte valence in atom.Element is 17 or 35 or 53 ? valences[..1] : valences)
                {
                    if (valence >= bonds)
                    {
                        implied = valence - bonds;
                        break;
                    }
                }

                atom.Hydrogens = (sbyte)Math.Min(127, implied + atom.FoldedHydrogens);
                bonds += implied;
            }
            else
            {
                bonds += atom.Hydrogens;
            }

            if (valences.Length > 0)
            {
                int highest = valences[^1];
                if (bonds > highest && !draft.AcceptsAnyValence && IsOctetElement(atom.Element) && !IsKnownException(atom, bonds))
                {
                    return TooManyBonds(atom, i, bonds, highest);
                }

                if (atom.Unpaired == 0)
                {
                    atom.Unpaired = (byte)Unpaired(valences, bonds, atom.Element);
                }
            }
        }

        return null;
    }

    private static int Unpaired(ReadOnlySpan<byte> valences, int bonds, int element)
    {
        foreach (byte valence in valences)
        {
            if (valence >= bonds)
            {
                // Bare metal atoms and ions are no radicals in this sense.
                return element is 3 or 4 or 11 or 12 or 19 or 13 or 31 or 49 or 50 or 82 ? 0 : Math.Min(3, valence - bonds);
            }
        }

        return 0;
    }

    private static bool IsOctetElement(int element) => element is (>= 5 and <= 9) or 1;

    // Bridging hydrogen and protonated methane type ions are written on purpose, in brackets.
    private static bool IsKnownException(in BuilderAtom atom, int bonds) =>
        (atom.Element == 1 && bonds <= 2) || (atom is { Element: 6, Charge: > 0 } && bonds <= 5)
        || (atom is { Element: 5 } && bonds <= 6);

    private static FormatProblem TooManyBonds(in BuilderAtom atom, int index, int bonds, int highest) => new()
    {
        Descriptor = ProblemCatalogue.Chemistry.Valence,
        Message = ProblemCatalogue.Chemistry.Valence.Format(index, Elements.SymbolOf(atom.Element), bonds, highest),
        Position = atom.Position,
        Atoms = [index],
    };
}
