namespace RadicalSites.Molecules;

/// <summary>Bond order of a localised (Kekule) structure.</summary>
public enum BondOrder : byte
{
    /// <summary>Not yet known; occurs only inside a builder, never in a finished molecule.</summary>
    Unknown = 0,

    /// <summary>Single bond.</summary>
    Single = 1,

    /// <summary>Double bond.</summary>
    Double = 2,

    /// <summary>Triple bond.</summary>
    Triple = 3,

    /// <summary>Quadruple bond.</summary>
    Quadruple = 4,
}
