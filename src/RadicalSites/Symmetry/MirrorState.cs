namespace RadicalSites.Symmetry;

/// <summary>What the frames of a fragment say about operations that mirror it.</summary>
internal enum MirrorState : byte
{
    /// <summary>No frame stands in the way: leaving every atom in place mirrors the fragment.</summary>
    Always,

    /// <summary>To be searched.</summary>
    Open,

    /// <summary>The fragment is chiral.</summary>
    Never,
}
