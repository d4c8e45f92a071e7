using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>Copies a builder into a draft and completes it.</summary>
internal static class DraftFiller
{
    /// <summary>Completes the graph of a builder.</summary>
    /// <param name="builder">The builder; not changed.</param>
    /// <param name="problem">What is wrong, when the result is null.</param>
    /// <returns>The molecule, or null.</returns>
    internal static Molecule? Complete(MoleculeBuilder builder, out FormatProblem? problem)
    {
        var draft = new StructureDraft();
        foreach (BuilderAtom atom in builder.Atoms)
        {
            draft.AddAtom() = atom;
            draft.HasAromatic |= atom.IsAromatic;
            draft.HasHydrogenAtoms |= atom.Element == 1;
        }

        foreach (BuilderBond bond in builder.Bonds)
        {
            draft.AddBond() = bond;
            if (bond.Order == BondOrder.Unknown)
            {
                draft.HasAromatic = true;
                draft.Atoms[bond.Begin].IsAromatic = true;
                draft.Atoms[bond.End].IsAromatic = true;
            }
        }

        foreach (StereoElement element in builder.Stereo)
        {
            draft.AddStereo(element);
        }

        if (builder.Coordinates is { } coordinates)
        {
            draft.Coordinates = new Point[draft.AtomCount];
            for (int i = 0; i < coordinates.Count && i < draft.AtomCount; i++)
            {
                draft.Coordinates[i] = coordinates[i];
            }
        }

        return MoleculeCompletion.Complete(draft, out problem);
    }
}
