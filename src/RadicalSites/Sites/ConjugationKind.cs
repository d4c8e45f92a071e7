namespace RadicalSites.Sites;

/// <summary>Kind of pi system beside the carbon, which delocalises the radical.</summary>
public enum ConjugationKind : byte
{
    /// <summary>An aromatic ring carbon of a benzene-like ring (all ring atoms of its aromatic rings are carbon).</summary>
    Benzylic,

    /// <summary>An aromatic ring atom of a ring system that holds a heteroatom.</summary>
    HeteroBenzylic,

    /// <summary>A carbon of a C=C double bond that is not aromatic.</summary>
    Allylic,

    /// <summary>A carbon of a C-C triple bond.</summary>
    Propargylic,
}
