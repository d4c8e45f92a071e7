using System;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Turns a draft into a molecule: folded hydrogens, implied hydrogens, rings, Kekule form, aromaticity, checks.</summary>
internal static class MoleculeCompletion
{
    [ThreadStatic]
    private static CompletionScratch? scratchOfThread;

    /// <summary>Completes a draft.</summary>
    /// <param name="draft">The graph; it is changed on the way and may be cleared afterwards.</param>
    /// <param name="problem">What is wrong, when the result is null; its position refers to the atom's place in the text.</param>
    /// <returns>The molecule, or null.</returns>
    internal static Molecule? Complete(StructureDraft draft, out FormatProblem? problem)
    {
        CompletionScratch scratch = scratchOfThread ??= new CompletionScratch();
        problem = null;
        int[]? inputIndices = draft.HasHydrogenAtoms ? HydrogenFolding.Fold(draft) : null;
        scratch.Prepare(draft);
        bool rings = draft.BondCount >= draft.AtomCount
            || RingMarker.HasRing(scratch, draft.AtomCount, draft.BondCount);
        if (rings)
        {
            RingMarker.Mark(scratch, draft);
        }

        if (draft.HasAromatic)
        {
            problem = Kekulization.Localise(draft, scratch);
            if (problem is not null)
            {
                return null;
            }
        }

        problem = ValenceModel.Complete(draft, scratch);
        if (problem is not null)
        {
            return null;
        }

        if (rings)
        {
            AromaticityModel.Perceive(draft, scratch);
            DropMeaninglessCisTrans(draft, scratch);
        }

        return Build(draft, scratch, inputIndices);
    }

    // Marks on ring bonds fix nothing, and are not kept, where the double bond is aromatic (C1=N/C=C\C=C1) or where its ring
    // is too small to hold it in another way than cis.
    private static void DropMeaninglessCisTrans(StructureDraft draft, CompletionScratch scratch)
    {
        int kept = 0;
        for (int i = 0; i < draft.StereoCount; i++)
        {
            StereoElement element = draft.Stereo[i];
            bool isMeaningless = false;
            if (element.Kind == StereoKind.CisTrans)
            {
                foreach (Neighbor neighbor in scratch.NeighborsOf(element.Focus))
                {
                    isMeaningless |= neighbor.Atom == element.FocusEnd
                        && ((scratch.BondFlags[neighbor.Bond] & CompletionScratch.AromaticBit) != 0
                            || IsInSmallRing(scratch, draft.AtomCount, element.Focus, neighbor));
                }
            }

            if (!isMeaningless)
            {
                draft.Stereo[kept++] = element;
            }
        }

        draft.StereoCount = kept;
    }

    // Breadth-first from one end to the other without the bond between them, at most six bonds and two hundred atoms far.
    private static bool IsInSmallRing(CompletionScratch scratch, int atomCount, int begin, Neighbor end)
    {
        if ((scratch.BondFlags[end.Bond] & CompletionScratch.RingBit) == 0)
        {
            return false;
        }

        const int LargestSmallRing = 7;
        const int MostAtoms = 200;
        Span<int> queue = stackalloc int[MostAtoms];
        Span<int> depths = stackalloc int[MostAtoms];
        int most = Math.Min(MostAtoms, atomCount);
        queue[0] = begin;
        depths[0] = 1;
        int filled = 1;
        for (int head = 0; head < filled && depths[head] < LargestSmallRing; head++)
        {
            foreach (Neighbor neighbor in scratch.NeighborsOf(queue[head]))
            {
                if (neighbor.Bond == end.Bond)
                {
                    continue;
                }

                if (neighbor.Atom == end.Atom)
                {
                    return true;
                }

                if (filled < most && !queue[..filled].Contains(neighbor.Atom))
                {
                    queue[filled] = neighbor.Atom;
                    depths[filled++] = depths[head] + 1;
                }
            }
        }

        return false;
    }

    private static Molecule Build(StructureDraft draft, CompletionScratch scratch, int[]? inputIndices)
    {
        int atomCount = draft.AtomCount;
        int bondCount = draft.BondCount;
        var atoms = new Atom[atomCount];
        for (int i = 0; i < atomCount; i++)
        {
            ref BuilderAtom atom = ref draft.Atoms[i];
            atoms[i] = new Atom(
                atom.Element, atom.Charge, atom.Isotope, atom.Hydrogens, atom.Unpaired, scratch.AtomFlags[i], atom.AtomClass);
        }

        var bonds = new Bond[bondCount];
        for (int i = 0; i < bondCount; i++)
        {
            ref BuilderBond bond = ref draft.Bonds[i];
            byte flags = scratch.BondFlags[i];
            bonds[i] = new Bond(
                bond.Begin, bond.End, bond.Order, (flags & CompletionScratch.AromaticBit) != 0,
                (flags & CompletionScratch.RingBit) != 0);
        }

        StereoElement[] stereo = draft.StereoCount == 0 ? [] : draft.Stereo.AsSpan(0, draft.StereoCount).ToArray();
        if (stereo.Length > 1)
        {
            Array.Sort(stereo, static (left, right) => left.Focus.CompareTo(right.Focus));
        }

        return new Molecule(
            atoms, bonds, scratch.Offsets.AsSpan(0, atomCount + 1).ToArray(),
            scratch.Neighbors.AsSpan(0, 2 * bondCount).ToArray(), stereo, inputIndices, draft.Coordinates);
    }
}
