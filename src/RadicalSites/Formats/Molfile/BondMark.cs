namespace RadicalSites.Formats.Molfile;

/// <summary>Stereo mark of a bond line.</summary>
internal static class BondMark
{
    internal const byte None = 0;
    internal const byte Up = 1;
    internal const byte Down = 2;

    /// <summary>Wavy single bond or crossed double bond.</summary>
    internal const byte Either = 3;
}
