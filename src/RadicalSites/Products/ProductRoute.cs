namespace RadicalSites.Products;

/// <summary>Where the halogen ends relative to the carbon that lost its hydrogen.</summary>
public enum ProductRoute : byte
{
    /// <summary>On the carbon that lost the hydrogen.</summary>
    Direct,

    /// <summary>On the other end of a delocalised (allylic, propargylic, pentadienyl) radical.</summary>
    Transposed,
}
