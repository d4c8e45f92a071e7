using System;

namespace RadicalSites.Interference;

/// <summary>Kinds of halogen source, for rules that hold for some of them only.</summary>
[Flags]
public enum HalogenSources
{
    /// <summary>None.</summary>
    None = 0,

    /// <summary>Molecular halogen X2.</summary>
    Molecular = 1,

    /// <summary>N-halo imide, amide or amine.</summary>
    NitrogenHalogen = 2,

    /// <summary>Alkyl hypohalite.</summary>
    OxygenHalogen = 4,

    /// <summary>Sulfuryl chloride.</summary>
    SulfurylHalide = 8,

    /// <summary>Polyhalomethane.</summary>
    Polyhalomethane = 16,

    /// <summary>All of them.</summary>
    All = 31,
}
