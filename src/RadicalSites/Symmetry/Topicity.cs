namespace RadicalSites.Symmetry;

/// <summary>How two hydrogens (or groups) relate by the replacement principle.</summary>
/// <remarks>Ordered: a later member is the weaker equivalence.</remarks>
public enum Topicity : byte
{
    /// <summary>Replacing either gives the same molecule; also a single hydrogen.</summary>
    Homotopic,

    /// <summary>Replacing one or the other gives mirror images.</summary>
    Enantiotopic,

    /// <summary>Replacing one or the other gives diastereomers.</summary>
    Diastereotopic,

    /// <summary>Replacing one or the other gives constitutional isomers.</summary>
    Constitutional,
}
