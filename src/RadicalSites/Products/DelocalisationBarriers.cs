using System;

namespace RadicalSites.Products;

/// <summary>Why a delocalised radical has fewer halogenated ends than canonical forms.</summary>
[Flags]
internal enum DelocalisationBarriers
{
    None = 0,

    /// <summary>A position on an aromatic ring.</summary>
    AromaticRing = 1,

    /// <summary>An oxygen, nitrogen or other heteroatom.</summary>
    Heteroatom = 2,

    /// <summary>The shifted double bond would stand at a bridgehead or cumulated in a small ring.</summary>
    SmallRing = 4,
}
