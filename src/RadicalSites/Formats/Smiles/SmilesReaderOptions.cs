namespace RadicalSites.Formats.Smiles;

/// <summary>How strictly SMILES are read.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record SmilesReaderOptions
{
    /// <summary>The strict options used when none are given.</summary>
    public static SmilesReaderOptions Strict { get; } = new();

    /// <summary>The lenient options for real-world files.</summary>
    public static SmilesReaderOptions Lenient { get; } = new() { IsLenient = true };

    /// <summary>
    /// Whether to read on where the structure stays clear: white space around the SMILES and text after it are ignored,
    /// atoms with more bonds than their valence are taken as written, stereo marks that contradict each other or do not
    /// fit their atom are dropped. Off by default.
    /// </summary>
    public bool IsLenient { get; init; }

    /// <summary>Longest text read, in UTF-16 units; no bound by default.</summary>
    public int LongestText { get; init; } = int.MaxValue;
}
