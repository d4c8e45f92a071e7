namespace RadicalSites.Formats.Streams;

/// <summary>Formats of a stream of structures.</summary>
public enum InputFormat
{
    /// <summary>One SMILES a line, then white space and an optional name.</summary>
    Smiles,

    /// <summary>A molfile; further records after <c>$$$$</c> are read as well.</summary>
    Molfile,

    /// <summary>Molfiles with data items, each ended by <c>$$$$</c>.</summary>
    Sdf,
}
