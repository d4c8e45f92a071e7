using System;
using RadicalSites.Molecules;

namespace RadicalSites.Perception;

/// <summary>A graph under construction: plain arrays that a reader fills and that are used again for the next molecule.</summary>
/// <remarks>Belongs to one thread.</remarks>
internal sealed class StructureDraft
{
    internal BuilderAtom[] Atoms = new BuilderAtom[64];
    internal BuilderBond[] Bonds = new BuilderBond[72];
    internal StereoElement[] Stereo = new StereoElement[8];
    internal Point[]? Coordinates;
    internal int AtomCount;
    internal int BondCount;
    internal int StereoCount;

    /// <summary>Set by a reader that saw an aromatic atom or bond.</summary>
    internal bool HasAromatic;

    /// <summary>Set by a reader that saw an uncharged hydrogen atom that may be folded.</summary>
    internal bool HasHydrogenAtoms;

    /// <summary>Whether atoms with more bonds than their valence are taken as written.</summary>
    internal bool AcceptsAnyValence;

    internal void Clear()
    {
        AcceptsAnyValence = false;
        AtomCount = 0;
        BondCount = 0;
        StereoCount = 0;
        HasAromatic = false;
        HasHydrogenAtoms = false;
        Coordinates = null;
        Array.Clear(Stereo);
    }

    internal ref BuilderAtom AddAtom()
    {
        if (AtomCount == Atoms.Length)
        {
            Array.Resize(ref Atoms, 2 * AtomCount);
        }

        ref BuilderAtom atom = ref Atoms[AtomCount++];
        atom = default;
        return ref atom;
    }

    internal ref BuilderBond AddBond()
    {
        if (BondCount == Bonds.Length)
        {
            Array.Resize(ref Bonds, 2 * BondCount);
        }

        ref BuilderBond bond = ref Bonds[BondCount++];
        bond = default;
        return ref bond;
    }

    internal void AddStereo(StereoElement element)
    {
        if (StereoCount == Stereo.Length)
        {
            Array.Resize(ref Stereo, 2 * StereoCount);
        }

        Stereo[StereoCount++] = element;
    }
}
