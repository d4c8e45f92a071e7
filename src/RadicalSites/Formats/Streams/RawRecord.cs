using RadicalSites.Diagnostics;

namespace RadicalSites.Formats.Streams;

/// <summary>Text of one record, cut out of a stream but not yet read as a molecule.</summary>
/// <remarks>Immutable and safe for use by many threads, so records may be parsed in parallel.</remarks>
public sealed record RawRecord
{
    /// <summary>1-based number of the record in its stream.</summary>
    public required long Number { get; init; }

    /// <summary>1-based first line.</summary>
    public required long FirstLine { get; init; }

    /// <summary>1-based last line, a terminator included.</summary>
    public required long LastLine { get; init; }

    /// <summary>Format of <see cref="Text"/>.</summary>
    public required InputFormat Format { get; init; }

    /// <summary>The SMILES, or the molfile with its data items.</summary>
    public required string Text { get; init; }

    /// <summary>Name of the record, or <see langword="null"/>.</summary>
    public string? Name { get; init; }

    /// <summary>Set when the record passed a limit; its text is cut then.</summary>
    public FormatProblem? Problem { get; init; }
}
