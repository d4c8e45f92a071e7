namespace RadicalSites.Molecules;

/// <summary>A bond as a source states it, before it is checked.</summary>
internal struct BuilderBond
{
    /// <summary>First atom.</summary>
    internal int Begin;

    /// <summary>Second atom.</summary>
    internal int End;

    /// <summary>Order; unknown for an aromatic bond.</summary>
    internal BondOrder Order;

    /// <summary>Whether the source marks the bond as aromatic.</summary>
    internal bool IsAromatic;

    /// <summary>Offset in the text, for messages; -1 = none.</summary>
    internal int Position;
}
