using System;
using RadicalSites.Molecules;

namespace RadicalSites.Thermochemistry;

/// <summary>A molecule without stereo and atom classes: bond energies are tabulated without them.</summary>
internal static class PlainGraph
{
    internal static Molecule Of(Molecule molecule)
    {
        bool labelled = molecule.StereoSpan.Length > 0;
        foreach (Atom atom in molecule.AtomSpan)
        {
            labelled |= atom.AtomClass != 0;
        }

        if (!labelled)
        {
            return molecule;
        }

        Atom[] atoms = molecule.AtomSpan.ToArray();
        for (int i = 0; i < atoms.Length; i++)
        {
            atoms[i] = atoms[i].WithAtomClass(0);
        }

        return new Molecule(
            atoms, molecule.BondSpan.ToArray(), molecule.NeighborOffsets.ToArray(), molecule.NeighborSpan.ToArray(), []);
    }
}
