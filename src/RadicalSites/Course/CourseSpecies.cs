using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Course;

/// <summary>One compound of the course: the substrate or a halogenated product.</summary>
/// <remarks>Immutable and safe for use by many threads.</remarks>
public sealed record CourseSpecies
{
    /// <summary>1-based number; 1 is the substrate, then by halogens, then by the amount that can pass through.</summary>
    public required int Number { get; init; }

    /// <summary>Canonical SMILES; new stereo units are left open, so a species stands for all its stereoisomers.</summary>
    public required string CanonicalSmiles { get; init; }

    /// <summary>The compound.</summary>
    public required Molecule Molecule { get; init; }

    /// <summary>Halogens added to the substrate, 0 for the substrate.</summary>
    public required int HalogenCount { get; init; }

    /// <summary>Rate of abstraction from the whole molecule relative to the substrate [1]; 0 when nothing is left to abstract.</summary>
    public required double RelativeRate { get; init; }

    /// <summary>Part of the substrate that passes through this species at unlimited halogen, 0 to 1.</summary>
    public required double Passage { get; init; }

    /// <summary>What the relative rate rests on.</summary>
    public required CourseRateBasis RateBasis { get; init; }

    /// <summary>Ids of the table rows behind a measured ratio, otherwise empty.</summary>
    public IReadOnlyList<string> Evidence { get; init; } = [];
}
