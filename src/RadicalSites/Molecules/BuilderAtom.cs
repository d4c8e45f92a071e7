namespace RadicalSites.Molecules;

/// <summary>An atom as a source states it, before it is checked.</summary>
internal struct BuilderAtom
{
    /// <summary>Atomic number; 0 = wildcard.</summary>
    internal byte Element;

    /// <summary>Formal charge.</summary>
    internal sbyte Charge;

    /// <summary>Stated hydrogen count; -1 = by the normal valence.</summary>
    internal sbyte Hydrogens;

    /// <summary>Hydrogen atoms folded into this atom while its own count is still to be implied.</summary>
    internal byte FoldedHydrogens;

    /// <summary>Stated unpaired electrons (molfile RAD); 0 = as the open valence implies.</summary>
    internal byte Unpaired;

    /// <summary>Mass number; 0 = natural.</summary>
    internal ushort Isotope;

    /// <summary>Whether the source marks the atom as aromatic.</summary>
    internal bool IsAromatic;

    /// <summary>Atom class.</summary>
    internal int AtomClass;

    /// <summary>Offset in the text, for messages; -1 = none.</summary>
    internal int Position;
}
