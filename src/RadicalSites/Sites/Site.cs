using System.Collections.Generic;
using RadicalSites.Symmetry;

namespace RadicalSites.Sites;

/// <summary>One class of equivalent C(sp3)-H hydrogens of a molecule.</summary>
/// <remarks>
/// Carbons of one site are equivalent by constitution and no worse than enantiotopic with respect to the stereo that
/// the molecule already has. Immutable and safe for use by many threads.
/// </remarks>
public sealed record Site
{
    /// <summary>1-based number; sites are ordered by their lowest carbon index.</summary>
    public required int Number { get; init; }

    /// <summary>0-based indices of the equivalent carbons, ascending; never empty.</summary>
    public required IReadOnlyList<int> Carbons { get; init; }

    /// <summary>Hydrogens (protium) on each of the carbons, 1 to 4.</summary>
    public required int HydrogensPerCarbon { get; init; }

    /// <summary>Deuterium and tritium atoms on each of the carbons, 0 to 3; they are not C-H hydrogens of the site.</summary>
    public int HeavyHydrogensPerCarbon { get; init; }

    /// <summary>Hydrogens of the whole site.</summary>
    public int HydrogenCount => Carbons.Count * HydrogensPerCarbon;

    /// <summary>Methyl, primary, secondary or tertiary, by the number of carbon neighbours.</summary>
    public required SiteDegree Degree { get; init; }

    /// <summary>Neighbouring pi groups of the first carbon, one entry for each; may be empty.</summary>
    public required IReadOnlyList<ConjugatedNeighbor> Conjugation { get; init; }

    /// <summary>Functional groups on the first carbon, one entry for each; may be empty.</summary>
    public required IReadOnlyList<AlphaGroup> AlphaGroups { get; init; }

    /// <summary>Size of the smallest ring through the carbon, or <see langword="null"/> outside rings.</summary>
    public required int? RingSize { get; init; }

    /// <summary>Whether the carbon is a bridgehead: common to rings that share more than one bond.</summary>
    public required bool IsBridgehead { get; init; }

    /// <summary>How the hydrogens of the site relate to each other: homotopic, enantiotopic or diastereotopic.</summary>
    public required Topicity Topicity { get; init; }

    /// <summary>Formal charge of the carbon itself [elementary charges]; 0 for ordinary sites.</summary>
    public int FormalCharge { get; init; }
}
