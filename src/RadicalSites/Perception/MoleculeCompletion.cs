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
            DropAromaticCisTrans(draft, scratch);
        }

        return Build(draft, scratch, inputIndices);
    }

    // The double bonds of an aromatic ring are not localised, so marks as in C1=N/C=C\C=C1 fix nothing and are not kept.
    private static void DropAromaticCisTrans(StructureDraft draft, CompletionScratch scratch)
    {
        int kept = 0;
        for (int i = 0; i < draft.StereoCount; i++)
        {
            StereoElement element = draft.Stereo[i];
            bool isAromatic = false;
            if (element.Kind == StereoKind.CisTrans)
            {
                foreach (Neighbor neighbor in scratch.NeighborsOf(element.Focus))
                {
                    isAromatic |= neighbor.Atom == element.FocusEnd
                        && (scratch.BondFlags[neighbor.Bond] & CompletionScratch.AromaticBit) != 0;
                }
            }

            if (!isAromatic)
            {
                draft.Stereo[kept++] = element;
            }
        }

        draft.StereoCount = kept;
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
