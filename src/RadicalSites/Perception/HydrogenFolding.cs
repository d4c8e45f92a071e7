using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Turns plain hydrogens that are written as atoms into counts of their neighbour.</summary>
internal static class HydrogenFolding
{
    // Above any known coordination number; keeps the counts far from the limit of their type.
    private const int MostPartners = 20;

    /// <summary>Folds and compacts the draft.</summary>
    /// <param name="draft">The draft, changed in place.</param>
    /// <returns>Input index of each remaining atom, or null when nothing was folded.</returns>
    internal static int[]? Fold(StructureDraft draft)
    {
        int count = draft.AtomCount;
        using var scratch = new ScratchInts(3 * count);
        Span<int> degree = scratch.Span[..count];
        Span<int> partner = scratch.Span.Slice(count, count);
        Span<int> newIndex = scratch.Span[(2 * count)..];
        degree.Clear();
        ReadOnlySpan<BuilderBond> bonds = draft.Bonds.AsSpan(0, draft.BondCount);
        foreach (ref readonly BuilderBond bond in bonds)
        {
            degree[bond.Begin]++;
            degree[bond.End]++;
            partner[bond.Begin] = bond.End;
            partner[bond.End] = bond.Begin;
        }

        int kept = 0;
        for (int i = 0; i < count; i++)
        {
            newIndex[i] = IsFoldable(draft, i, degree, partner) ? -1 : kept++;
        }

        if (kept == count)
        {
            return null;
        }

        // A bond that is not single, or a partner whose count is full, keeps its hydrogen.
        foreach (ref readonly BuilderBond bond in bonds)
        {
            int hydrogen = newIndex[bond.Begin] < 0 ? bond.Begin : newIndex[bond.End] < 0 ? bond.End : -1;
            if (hydrogen >= 0)
            {
                ref BuilderAtom heavy = ref draft.Atoms[partner[hydrogen]];
                if (heavy.Hydrogens < 0)
                {
                    heavy.FoldedHydrogens++;
                }
                else
                {
                    heavy.Hydrogens++;
                }
            }
        }

        var inputIndices = new int[kept];
        Compact(draft, newIndex, inputIndices);
        return inputIndices;
    }

    private static bool IsFoldable(StructureDraft draft, int index, ReadOnlySpan<int> degree, ReadOnlySpan<int> partner)
    {
        ref BuilderAtom atom = ref draft.Atoms[index];
        return atom is { Element: 1, Charge: 0, Isotope: 0, AtomClass: 0, Hydrogens: <= 0, Unpaired: 0 }
            && degree[index] == 1
            && draft.Atoms[partner[index]].Element > 1
            && degree[partner[index]] <= MostPartners;
    }

    private static void Compact(StructureDraft draft, ReadOnlySpan<int> newIndex, Span<int> inputIndices)
    {
        for (int i = 0; i < newIndex.Length; i++)
        {
            int target = newIndex[i];
            if (target >= 0)
            {
                draft.Atoms[target] = draft.Atoms[i];
                inputIndices[target] = i;
                if (draft.Coordinates is not null)
                {
                    draft.Coordinates[target] = draft.Coordinates[i];
                }
            }
        }

        draft.AtomCount = inputIndices.Length;
        if (draft.Coordinates is not null)
        {
            Array.Resize(ref draft.Coordinates, inputIndices.Length);
        }

        int filled = 0;
        for (int i = 0; i < draft.BondCount; i++)
        {
            BuilderBond bond = draft.Bonds[i];
            bond.Begin = newIndex[bond.Begin];
            bond.End = newIndex[bond.End];
            if (bond.Begin >= 0 && bond.End >= 0)
            {
                draft.Bonds[filled++] = bond;
            }
        }

        draft.BondCount = filled;
        for (int i = 0; i < draft.StereoCount; i++)
        {
            draft.Stereo[i] = Renumber(draft.Stereo[i], newIndex);
        }
    }

    private static StereoElement Renumber(StereoElement element, ReadOnlySpan<int> newIndex)
    {
        var carriers = new int[element.Carriers.Count];
        for (int i = 0; i < carriers.Length; i++)
        {
            int carrier = element.CarrierSpan[i];
            carriers[i] = carrier < 0 ? -1 : newIndex[carrier];
        }

        return new StereoElement(
            element.Kind, newIndex[element.Focus], newIndex[element.FocusEnd], carriers, element.Configuration);
    }
}
