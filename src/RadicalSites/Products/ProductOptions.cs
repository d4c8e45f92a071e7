namespace RadicalSites.Products;

/// <summary>What to list as products of mono-halogenation.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record ProductOptions
{
    /// <summary>Options used when none are given.</summary>
    public static ProductOptions Default { get; } = new();

    /// <summary>How stereo is written; <see cref="ProductStereoMode.Mark"/> by default.</summary>
    public ProductStereoMode Stereo { get; init; } = ProductStereoMode.Mark;

    /// <summary>Whether products at the other ends of delocalised radicals are listed; on by default.</summary>
    public bool IncludeTransposed { get; init; } = true;

    /// <summary>Whether an unknown split between the ends of a radical goes to the direct product as a whole.</summary>
    internal bool GivesUnknownSplitToDirect { get; init; }

    /// <summary>
    /// Most atoms of all products together, 1 or more; 4,000,000 by default. It bounds the memory of a very large
    /// molecule, whose products are as large as itself.
    /// </summary>
    public long AtomLimit { get; init; } = 4_000_000;

    /// <summary>Most stereoisomers listed for one product when expanding, 1 or more; 1024 by default.</summary>
    public int StereoisomerLimit { get; init; } = 1024;
}
