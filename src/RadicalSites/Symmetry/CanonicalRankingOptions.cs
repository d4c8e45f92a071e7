namespace RadicalSites.Symmetry;

/// <summary>What a canonical order of atoms respects, and how long the search for it may take.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record CanonicalRankingOptions
{
    /// <summary>Options used when none are given.</summary>
    public static CanonicalRankingOptions Default { get; } = new();

    /// <summary>Whether stereo elements take part; <see langword="true"/> by default.</summary>
    public bool IncludeStereo { get; init; } = true;

    /// <summary>Whether atom classes tell atoms apart; <see langword="true"/> by default.</summary>
    public bool IncludeAtomClasses { get; init; } = true;

    /// <summary>
    /// Refinement steps allowed to the search for each fragment, 1 or more; 200,000 by default. Graphs whose symmetry is
    /// found directly, which is nearly all of them, take none of it.
    /// </summary>
    public int SearchLimit { get; init; } = 200_000;
}
