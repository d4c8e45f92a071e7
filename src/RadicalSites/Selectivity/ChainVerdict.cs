namespace RadicalSites.Selectivity;

/// <summary>Whether the chain propagates at a site.</summary>
public enum ChainVerdict : byte
{
    /// <summary>Both steps run easily.</summary>
    Propagates,

    /// <summary>Step 1 is endothermic: a slow, selective chain that needs heat or light.</summary>
    Slow,

    /// <summary>Step 1 is so endothermic, or step 2 so unfavourable, that no chain forms.</summary>
    Refused,

    /// <summary>A bond enthalpy is missing.</summary>
    Unknown,
}
