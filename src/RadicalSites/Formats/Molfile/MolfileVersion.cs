namespace RadicalSites.Formats.Molfile;

/// <summary>Version of a connection table.</summary>
public enum MolfileVersion
{
    /// <summary>Fixed columns, up to 999 atoms and 999 bonds.</summary>
    V2000,

    /// <summary>Keywords, any size.</summary>
    V3000,
}
