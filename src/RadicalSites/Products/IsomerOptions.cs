namespace RadicalSites.Products;

/// <summary>What to enumerate: how many hydrogens are replaced by which halogen, and how stereo is treated.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record IsomerOptions
{
    /// <summary>Atomic number of the halogen: 9, 17, 35 or 53; 17 by default.</summary>
    public int Halogen { get; init; } = 17;

    /// <summary>Fewest hydrogens replaced, 1 or more; 1 by default.</summary>
    public int MinimumTimes { get; init; } = 1;

    /// <summary>Most hydrogens replaced, at least <see cref="MinimumTimes"/>; 1 by default.</summary>
    public int MaximumTimes { get; init; } = 1;

    /// <summary>How stereo is treated; <see cref="ProductStereoMode.Mark"/> by default.</summary>
    public ProductStereoMode Stereo { get; init; } = ProductStereoMode.Mark;

    /// <summary>Most stereoisomers listed for one product when expanding, 1 or more; 1024 by default.</summary>
    public int StereoisomerLimit { get; init; } = 1024;
}
