namespace RadicalSites.Cli.Input;

/// <summary>Formats that the tool reads.</summary>
internal enum RecordFormat
{
    /// <summary>One SMILES a line, white space, optional name.</summary>
    Smiles,

    /// <summary>A molfile, or several separated as in SDF.</summary>
    Molfile,

    /// <summary>Molfiles with data items, each ended by $$$$.</summary>
    Sdf,
}
