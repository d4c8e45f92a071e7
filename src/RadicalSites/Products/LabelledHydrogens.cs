using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;
using RadicalSites.Perception;

namespace RadicalSites.Products;

/// <summary>Takes protium that is an atom of the graph (isotope 1 or atom class) into the count of its carbon.</summary>
/// <remarks>The label of such a hydrogen is lost; for counting isomers protium is protium.</remarks>
internal static class LabelledHydrogens
{
    /// <summary>Folds them.</summary>
    /// <param name="molecule">A molecule.</param>
    /// <param name="origins">For each atom of the result its index before; <see langword="null"/> when nothing changed.</param>
    /// <returns>The molecule itself when there are none.</returns>
    internal static Molecule Fold(Molecule molecule, out int[]? origins)
    {
        origins = null;
        int[] places = new int[molecule.AtomCount];
        var kept = new List<int>();
        for (int atom = 0; atom < molecule.AtomCount; atom++)
        {
            bool folds = IsProtiumOnCarbon(molecule, atom);
            places[atom] = folds ? -1 : kept.Count;
            if (!folds)
            {
                kept.Add(atom);
            }
        }

        if (kept.Count == molecule.AtomCount)
        {
            return molecule;
        }

        origins = [.. kept];
        return Rebuild(molecule, places, kept);
    }

    private static bool IsProtiumOnCarbon(Molecule molecule, int atom)
    {
        Atom data = molecule.AtomSpan[atom];
        return data.AtomicNumber == 1 && data.MassNumber <= 1 && data.FormalCharge == 0 && molecule.DegreeOf(atom) == 1
            && molecule.AtomSpan[molecule.NeighborsOf(atom)[0].Atom].AtomicNumber == 6;
    }

    private static Molecule Rebuild(Molecule molecule, int[] places, List<int> kept)
    {
        var draft = new StructureDraft();
        foreach (int atom in kept)
        {
            Atom data = molecule.AtomSpan[atom];
            int hydrogens = data.HydrogenCount;
            foreach (Neighbor neighbor in molecule.NeighborsOf(atom))
            {
                hydrogens += places[neighbor.Atom] < 0 ? 1 : 0;
            }

            draft.AddAtom() = Transposition.Describe(data, data.AtomicNumber, hydrogens);
        }

        foreach (Bond bond in molecule.BondSpan)
        {
            if (places[bond.Begin] >= 0 && places[bond.End] >= 0)
            {
                draft.AddBond() = new BuilderBond
                {
                    Begin = places[bond.Begin], End = places[bond.End], Order = bond.Order, Position = -1,
                };
            }
        }

        foreach (StereoElement element in molecule.StereoSpan)
        {
            int[] carriers = element.CarrierSpan.ToArray();
            for (int i = 0; i < carriers.Length; i++)
            {
                carriers[i] = carriers[i] < 0 ? -1 : places[carriers[i]];
            }

            draft.AddStereo(new StereoElement(
                element.Kind, places[element.Focus], places[element.FocusEnd], carriers, element.Configuration));
        }

        return MoleculeCompletion.Complete(draft, out FormatProblem? problem)
            ?? throw new InvalidOperationException(problem!.Message);
    }
}
