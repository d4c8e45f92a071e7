namespace RadicalSites.Cli.Input;

/// <summary>Formats that the tool reads.</summary>
internal enum RecordFormat
{
    /// <summary>One SMILES a line, white space, optional name.</summary>
    Smiles,
}
