namespace RadicalSites.Formats.Molfile;

/// <summary>How a molfile is written.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record MolfileWriterOptions
{
    /// <summary>The defaults.</summary>
    public static MolfileWriterOptions Default { get; } = new();

    /// <summary>Version; <see langword="null"/> = V2000 up to 999 atoms and bonds, otherwise V3000. Default <see langword="null"/>.</summary>
    public MolfileVersion? Version { get; init; }

    /// <summary>Whether stereo that no molfile can hold is left out (a wildcard and a quadruple bond never are). Default false: it is refused.</summary>
    public bool AllowStereoLoss { get; init; }

    /// <summary>Name for the first header line. Default empty.</summary>
    public string Name { get; init; } = "";

    /// <summary>Text for the comment line. Default empty.</summary>
    public string Comment { get; init; } = "";
}
