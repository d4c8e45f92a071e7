using System.Collections.Generic;

namespace RadicalSites.Course;

/// <summary>Species, pools and steps of a course, ready to be solved.</summary>
internal sealed class CourseNetwork
{
    /// <summary>The species in topological order, the substrate first.</summary>
    internal required IReadOnlyList<CourseSpecies> Species { get; init; }

    /// <summary>Halogens of each pool of species that are not followed; the pools come after the species, ascending.</summary>
    internal required IReadOnlyList<int> PoolHalogens { get; init; }

    /// <summary>Steps between species, or to and between pools; rates relative to the substrate.</summary>
    internal required IReadOnlyList<(int From, int To, double Rate)> Steps { get; init; }

    /// <summary>Whether the limit of species stopped the growth.</summary>
    internal required bool LimitReached { get; init; }
}
