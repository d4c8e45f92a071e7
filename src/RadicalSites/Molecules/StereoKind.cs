namespace RadicalSites.Molecules;

/// <summary>Geometry that a stereo element describes.</summary>
public enum StereoKind : byte
{
    /// <summary>Tetrahedral centre with four carriers (SMILES @, @@, @TH).</summary>
    Tetrahedral,

    /// <summary>Extended tetrahedral axis of an even cumulene (SMILES @AL); the focus is the central atom.</summary>
    Allene,

    /// <summary>Double bond (or odd cumulene) with a carrier at each end (SMILES / and \).</summary>
    CisTrans,

    /// <summary>Square planar centre (SMILES @SP1 to @SP3).</summary>
    SquarePlanar,

    /// <summary>Trigonal bipyramidal centre (SMILES @TB1 to @TB20).</summary>
    TrigonalBipyramidal,

    /// <summary>Octahedral centre (SMILES @OH1 to @OH30).</summary>
    Octahedral,
}
