using System;
using System.Collections.Generic;
using System.Numerics;
using System.Threading;

namespace RadicalSites.Products;

/// <summary>One direct factor of the symmetry group of the substitutable carbons, listed element by element.</summary>
/// <remarks>
/// The whole group is the direct product of factors that move disjoint carbons, so a pattern is the largest of its
/// orbit exactly when it is so under each factor, and cycle indices multiply. Immutable.
/// </remarks>
internal sealed class SubstitutionFactor
{
    private readonly int[] points;
    private readonly ushort[][] elements;

    /// <summary>Lists a factor.</summary>
    /// <param name="points">Ranks of the carbons that the factor moves, ascending.</param>
    /// <param name="elements">For every element the image of each point, as indices into <paramref name="points"/>.</param>
    private SubstitutionFactor(int[] points, ushort[][] elements)
    {
        this.points = points;
        this.elements = elements;
    }

    /// <summary>Number of elements.</summary>
    internal int Order => elements.Length;

    /// <summary>Ranks of the carbons moved, ascending.</summary>
    internal ReadOnlySpan<int> Points => points;

    /// <summary>Multiplies out the coset representatives of a factor.</summary>
    /// <param name="points">Ranks of the carbons moved, ascending.</param>
    /// <param name="levels">For every level its representatives, images over all atoms.</param>
    /// <param name="rankOfAtom">Carbon rank by atom index, -1 for other atoms.</param>
    /// <param name="atomOfRank">Atom index by carbon rank.</param>
    /// <param name="accept">Whether an element (over all atoms) belongs; used to keep only maps that respect stereo.</param>
    /// <param name="limit">Largest number of elements times points to list.</param>
    /// <param name="cancellation">Ends the listing.</param>
    /// <returns>The factor, or <see langword="null"/> beyond the limit.</returns>
    internal static SubstitutionFactor? List(
        int[] points, IReadOnlyList<int[][]> levels, int[] rankOfAtom, int[] atomOfRank,
        Func<int[], bool>? accept, long limit, CancellationToken cancellation)
    {
        double size = points.Length;
        foreach (int[][] level in levels)
        {
            size *= level.Length;
        }

        if (size > limit)
        {
            return null;
        }

        var local = new int[atomOfRank.Length];
        for (int i = 0; i < points.Length; i++)
        {
            local[points[i]] = i;
        }

        var found = new HashSet<ushort[]>(PermutationComparer.Instance);
        int atomCount = rankOfAtom.Length;
        var identity = new int[atomCount];
        for (int i = 0; i < atomCount; i++)
        {
            identity[i] = i;
        }

        Walk(0, identity);
        return new SubstitutionFactor(points, [.. found]);

        void Walk(int depth, int[] product)
        {
            if (depth == levels.Count)
            {
                if (accept is not null && !accept(product))
                {
                    return;
                }

                var element = new ushort[points.Length];
                for (int i = 0; i < points.Length; i++)
                {
                    element[i] = (ushort)local[rankOfAtom[product[atomOfRank[points[i]]]]];
                }

                // Maps that differ only on atoms that carry no hydrogen give the same element.
                found.Add(element);
                return;
            }

            cancellation.ThrowIfCancellationRequested();
            foreach (int[] representative in levels[depth])
            {
                var next = new int[atomCount];
                for (int i = 0; i < atomCount; i++)
                {
                    next[i] = representative[product[i]];
                }

                Walk(depth + 1, next);
            }
        }
    }

    /// <summary>Whether a pattern is the lexicographically largest of its orbit under this factor.</summary>
    /// <param name="pattern">Number of halogens by carbon rank.</param>
    /// <param name="stabiliser">Number of elements that leave the pattern unchanged, when it is the largest.</param>
    internal bool IsLargest(ReadOnlySpan<byte> pattern, out int stabiliser)
    {
        stabiliser = 0;
        foreach (ushort[] element in elements)
        {
            int comparison = 0;
            for (int i = 0; i < points.Length && comparison == 0; i++)
            {
                comparison = pattern[points[element[i]]] - pattern[points[i]];
            }

            if (comparison > 0)
            {
                return false;
            }

            stabiliser += comparison == 0 ? 1 : 0;
        }

        return true;
    }

    /// <summary>Number of patterns with 0, 1, 2, ... halogens on the moved carbons that the group tells apart.</summary>
    /// <param name="capacity">Hydrogens by carbon rank.</param>
    /// <param name="degree">Highest number of halogens counted.</param>
    internal BigInteger[] Count(ReadOnlySpan<byte> capacity, int degree)
    {
        // Elements of one cycle type contribute alike; there are few types.
        var types = new Dictionary<string, (List<(int Length, int Capacity)> Cycles, int Times)>(StringComparer.Ordinal);
        var seen = new bool[points.Length];
        foreach (ushort[] element in elements)
        {
            Array.Clear(seen);
            var cycles = new List<(int Length, int Capacity)>();
            for (int i = 0; i < points.Length; i++)
            {
                int length = 0;
                for (int j = i; !seen[j]; j = element[j])
                {
                    seen[j] = true;
                    length++;
                }

                if (length > 0)
                {
                    cycles.Add((length, capacity[points[i]]));
                }
            }

            cycles.Sort();
            string key = string.Join(';', cycles);
            types[key] = (cycles, types.TryGetValue(key, out var known) ? known.Times + 1 : 1);
        }

        var sum = new BigInteger[degree + 1];
        foreach ((List<(int Length, int Capacity)> cycles, int times) in types.Values)
        {
            BigInteger[] product = CountingPolynomial.One(degree);
            foreach ((int length, int bound) in cycles)
            {
                product = CountingPolynomial.TimesGeometric(product, length, bound);
            }

            for (int i = 0; i <= degree; i++)
            {
                sum[i] += product[i] * times;
            }
        }

        for (int i = 0; i <= degree; i++)
        {
            sum[i] /= elements.Length;
        }

        return sum;
    }
}
