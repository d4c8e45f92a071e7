namespace RadicalSites.Course;

/// <summary>How far and how finely the course of over-halogenation is followed.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record CourseOptions
{
    /// <summary>Halogen consumed per mole of substrate at the last point of the curve, above 0 and at most 1000; 3 by default.</summary>
    public double MaximumEquivalents { get; init; } = 3;

    /// <summary>Number of points of the curve, both ends included, 2 to 10 001; 61 by default.</summary>
    public int PointCount { get; init; } = 61;

    /// <summary>
    /// Most halogens per molecule that are followed, 1 to 64; by default two more than the equivalents, rounded up.
    /// </summary>
    public int? MaximumHalogens { get; init; }

    internal int HalogensFollowed => MaximumHalogens ?? (int)System.Math.Min(64, System.Math.Ceiling(MaximumEquivalents) + 2);

    /// <summary>Most species that are followed, 2 to 1000; 300 by default. Time grows with the cube, memory with the square.</summary>
    public int SpeciesLimit { get; init; } = 300;

    /// <summary>
    /// Part of the substrate that must pass through a species, at unlimited halogen, for it to be followed, 0 to 0.1;
    /// 0.00001 by default. What is not followed appears as truncated.
    /// </summary>
    public double FollowThreshold { get; init; } = 1e-5;

    /// <summary>Amount per mole of substrate above which a species is listed as a by-product, 0 to 1; 0.01 by default.</summary>
    public double ByProductThreshold { get; init; } = 0.01;
}
