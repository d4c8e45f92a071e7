namespace RadicalSites.Sites;

/// <summary>Number of carbon neighbours of the carbon that carries the hydrogen.</summary>
public enum SiteDegree : byte
{
    /// <summary>No carbon neighbour (methane, methanol, methylamine).</summary>
    Methyl,

    /// <summary>One carbon neighbour.</summary>
    Primary,

    /// <summary>Two carbon neighbours.</summary>
    Secondary,

    /// <summary>Three carbon neighbours.</summary>
    Tertiary,
}
