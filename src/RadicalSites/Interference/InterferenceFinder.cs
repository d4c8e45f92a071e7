using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Interference;

/// <summary>Finds the groups of a molecule that spoil or endanger a radical halogenation.</summary>
/// <remarks>
/// Works on the perceived graph, so the spelling of the input does not matter. Finding nothing is no statement that the
/// reaction is safe. Stateless and safe for use by many threads.
/// </remarks>
public static class InterferenceFinder
{
    /// <summary>Finds all hits.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <param name="sources">Kinds of halogen source planned; all by default.</param>
    /// <returns>Hits ordered by falling severity, then code, then first atom; may be empty.</returns>
    public static IReadOnlyList<InterferenceHit> Find(Molecule molecule, HalogenSources sources = HalogenSources.All)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        var walk = new GroupWalk(molecule, sources);
        walk.Run();
        List<InterferenceHit>? hits = walk.Hits;
        if (hits is null)
        {
            return [];
        }

        hits.Sort(static (left, right) =>
        {
            int bySeverity = right.Problem.Severity.CompareTo(left.Problem.Severity);
            int byCode = bySeverity != 0 ? bySeverity : string.CompareOrdinal(left.Problem.Code, right.Problem.Code);
            return byCode != 0 ? byCode : left.Atoms[0].CompareTo(right.Atoms[0]);
        });
        return hits.AsReadOnly();
    }
}
