using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>Lists the elements that a few permutations generate.</summary>
internal static class PermutationGroup
{
    /// <summary>Products of the generators, the identity left out.</summary>
    /// <param name="generators">Permutations as images by index.</param>
    /// <param name="most">Most elements to list; a larger group is listed in part, generators first.</param>
    internal static List<int[]> Elements(List<int[]> generators, int most)
    {
        if (generators.Count == 0)
        {
            return [];
        }

        int n = generators[0].Length;
        int[] identity = new int[n];
        for (int i = 0; i < n; i++)
        {
            identity[i] = i;
        }

        HashSet<int[]> seen = new(new ByContent()) { identity };
        List<int[]> elements = [identity];
        for (int done = 0; done < elements.Count && elements.Count <= most; done++)
        {
            foreach (int[] generator in generators)
            {
                int[] product = new int[n];
                for (int i = 0; i < n; i++)
                {
                    product[i] = generator[elements[done][i]];
                }

                if (seen.Add(product))
                {
                    elements.Add(product);
                }
            }
        }

        elements.RemoveAt(0);
        return elements;
    }

    private sealed class ByContent : IEqualityComparer<int[]>
    {
        public bool Equals(int[]? x, int[]? y) => x.AsSpan().SequenceEqual(y);

        public int GetHashCode(int[] values)
        {
            HashCode hash = default;
            foreach (int value in values)
            {
                hash.Add(value);
            }

            return hash.ToHashCode();
        }
    }
}
