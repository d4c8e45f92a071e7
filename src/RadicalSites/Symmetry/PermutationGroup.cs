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

    /// <summary>
    /// The coarsest partition finer than the given one that every permutation maps to itself; classes are named by their
    /// lowest member.
    /// </summary>
    internal static int[] Invariant(int[] classes, List<int[]> generators)
    {
        int[] current = classes;
        for (bool changed = true; changed;)
        {
            changed = false;
            foreach (int[] image in generators)
            {
                // Members of one class stay together only when their images are together.
                Dictionary<(int Class, int ImageClass), int> lowest = [];
                int[] next = new int[current.Length];
                for (int i = 0; i < current.Length; i++)
                {
                    (int, int) key = (current[i], current[image[i]]);
                    if (!lowest.TryGetValue(key, out int root))
                    {
                        root = i;
                        lowest.Add(key, i);
                    }

                    next[i] = root;
                    changed |= root != current[i];
                }

                current = next;
            }
        }

        return current;
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
