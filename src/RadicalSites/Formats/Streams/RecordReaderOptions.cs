namespace RadicalSites.Formats.Streams;

/// <summary>Limits for reading a stream of structures.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record RecordReaderOptions
{
    /// <summary>The defaults.</summary>
    public static RecordReaderOptions Default { get; } = new();

    /// <summary>Longest line of SMILES and name [UTF-16 characters], 16 or more; a longer one is a failed record. Default 1,048,576.</summary>
    public int LongestLine { get; init; } = 1 << 20;

    /// <summary>Longest record of a molfile or SDF [UTF-16 characters], 1024 or more; a longer one is a failed record. Default 16,777,216.</summary>
    public int LongestRecord { get; init; } = 1 << 24;
}
