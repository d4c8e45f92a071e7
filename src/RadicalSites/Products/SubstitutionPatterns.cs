using System.Collections.Generic;
using System.Threading;

namespace RadicalSites.Products;

/// <summary>Generates one pattern of halogens per orbit, each the lexicographically largest of its orbit.</summary>
/// <remarks>
/// Orderly generation: a halogen is only ever added at or behind the last one. Taking the last halogen away from a
/// largest pattern leaves a largest pattern, so a branch that is not largest holds nothing and is cut, every orbit
/// appears exactly once, and nothing has to be remembered.
/// </remarks>
internal static class SubstitutionPatterns
{
    /// <summary>Patterns with exactly a given number of halogens, as counts by carbon rank.</summary>
    /// <param name="symmetry">The carbons with their symmetry.</param>
    /// <param name="halogens">Number of halogens, 1 or more.</param>
    /// <param name="cancellation">Ends the enumeration.</param>
    /// <returns>The same array again and again: read it before moving on.</returns>
    internal static IEnumerable<byte[]> Enumerate(
        SubstitutionSymmetry symmetry, int halogens, CancellationToken cancellation)
    {
        int carbons = symmetry.Carbons.Length;
        var pattern = new byte[carbons];
        var placed = new int[halogens];
        var room = new int[carbons + 1];
        for (int rank = carbons - 1; rank >= 0; rank--)
        {
            room[rank] = room[rank + 1] + symmetry.Capacity[rank];
        }

        int depth = 0;
        int rankToTry = 0;
        while (true)
        {
            cancellation.ThrowIfCancellationRequested();
            int remaining = halogens - depth;
            bool descended = false;
            for (; rankToTry < carbons && room[rankToTry] - pattern[rankToTry] >= remaining; rankToTry++)
            {
                if (pattern[rankToTry] == symmetry.Capacity[rankToTry])
                {
                    continue;
                }

                pattern[rankToTry]++;
                if (symmetry.IsLargestAfterChange(pattern, rankToTry))
                {
                    placed[depth++] = rankToTry;
                    descended = true;
                    break;
                }

                pattern[rankToTry]--;
            }

            if (descended && depth < halogens)
            {
                continue;
            }

            if (descended)
            {
                yield return pattern;
            }

            if (depth == 0)
            {
                yield break;
            }

            rankToTry = placed[--depth];
            pattern[rankToTry]--;
            rankToTry++;
        }
    }
}
