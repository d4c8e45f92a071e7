namespace RadicalSites.Formats.Sdf;

/// <summary>Limits for reading SDF.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record SdfReaderOptions
{
    /// <summary>The defaults.</summary>
    public static SdfReaderOptions Default { get; } = new();

    /// <summary>Longest record [UTF-16 characters], 1024 or more; a longer one is skipped and reported. Default 16,777,216.</summary>
    public int LongestRecord { get; init; } = 1 << 24;
}
