using System.Collections.Generic;

namespace RadicalSites.Course;

/// <summary>Species, steps and sinks of a course, ready to be solved.</summary>
internal sealed class CourseNetwork
{
    /// <summary>The species in topological order, the substrate first.</summary>
    internal required IReadOnlyList<CourseSpecies> Species { get; init; }

    /// <summary>Least number of halogens of what ends in each sink; sinks follow the species.</summary>
    internal required IReadOnlyList<int> SinkHalogens { get; init; }

    /// <summary>Steps between species, or from a species to a sink; rates relative to the substrate.</summary>
    internal required IReadOnlyList<(int From, int To, double Rate)> Steps { get; init; }

    /// <summary>Whether the limit of species stopped the growth.</summary>
    internal required bool LimitReached { get; init; }
}
