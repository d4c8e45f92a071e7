using System;
using System.Collections.Generic;
using System.Numerics;
using System.Threading;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>The substitutable carbons of a molecule with the symmetry that acts on them.</summary>
/// <remarks>
/// Carbons are ranked by the order given; the group is split into direct factors that move disjoint carbons, so that
/// a molecule with many independent small symmetries (isopropyl, tert-butyl, ...) costs the sum of the factor orders
/// and not their product. Immutable.
/// </remarks>
internal sealed class SubstitutionSymmetry
{
    private const long FactorLimit = 1L << 24;
    private readonly SubstitutionFactor?[] factorOfRank;
    private readonly SubstitutionFactor[] factors;

    private SubstitutionSymmetry(int[] carbons, byte[] capacity, SubstitutionFactor[] factors)
    {
        Carbons = carbons;
        Capacity = capacity;
        this.factors = factors;
        factorOfRank = new SubstitutionFactor?[carbons.Length];
        foreach (SubstitutionFactor factor in factors)
        {
            foreach (int point in factor.Points)
            {
                factorOfRank[point] = factor;
            }
        }
    }

    /// <summary>0-based atom index by carbon rank.</summary>
    internal int[] Carbons { get; }

    /// <summary>Hydrogens by carbon rank.</summary>
    internal byte[] Capacity { get; }

    /// <summary>Finds the symmetry.</summary>
    /// <param name="molecule">The substrate.</param>
    /// <param name="carbons">Substitutable carbons, in the order of their rank.</param>
    /// <param name="stereo">Stereo that an automorphism must keep to count; <see langword="null"/> = all count.</param>
    /// <param name="cancellation">Ends the search.</param>
    /// <returns>The symmetry, or <see langword="null"/> when a factor is too large to list.</returns>
    internal static SubstitutionSymmetry? Find(
        Molecule molecule, int[] carbons, StereoPermutations? stereo, CancellationToken cancellation)
    {
        int atomCount = molecule.AtomCount;
        var rankOfAtom = new int[atomCount];
        Array.Fill(rankOfAtom, -1);
        var baseOrder = new int[atomCount];
        var capacity = new byte[carbons.Length];
        for (int rank = 0; rank < carbons.Length; rank++)
        {
            rankOfAtom[carbons[rank]] = rank;
            baseOrder[rank] = carbons[rank];
            capacity[rank] = (byte)molecule.AtomSpan[carbons[rank]].HydrogenCount;
        }

        int next = carbons.Length;
        for (int atom = 0; atom < atomCount; atom++)
        {
            if (rankOfAtom[atom] < 0)
            {
                baseOrder[next++] = atom;
            }
        }

        AutomorphismGroup group = AutomorphismGroup.Find(molecule, baseOrder, cancellation);
        var factors = new List<SubstitutionFactor>();
        foreach ((int[] points, List<int[][]> levels) in Split(group.Levels, rankOfAtom, stereo))
        {
            SubstitutionFactor? factor = SubstitutionFactor.List(
                points, levels, rankOfAtom, carbons, stereo is null ? null : stereo.Keeps, FactorLimit, cancellation);
            if (factor is null)
            {
                return null;
            }

            if (factor.Order > 1)
            {
                factors.Add(factor);
            }
        }

        return new SubstitutionSymmetry(carbons, capacity, [.. factors]);
    }

    /// <summary>Number of symmetry operations that differ in what they do to the carbons.</summary>
    internal BigInteger Order
    {
        get
        {
            BigInteger order = BigInteger.One;
            foreach (SubstitutionFactor factor in factors)
            {
                order *= factor.Order;
            }

            return order;
        }
    }

    /// <summary>Exact number of distinct patterns with 0, 1, 2, ... halogens.</summary>
    internal BigInteger[] Count(int degree)
    {
        BigInteger[] product = CountingPolynomial.One(degree);
        for (int rank = 0; rank < Carbons.Length; rank++)
        {
            if (factorOfRank[rank] is null)
            {
                product = CountingPolynomial.TimesGeometric(product, 1, Capacity[rank]);
            }
        }

        foreach (SubstitutionFactor factor in factors)
        {
            product = CountingPolynomial.Times(product, factor.Count(Capacity, degree));
        }

        return product;
    }

    /// <summary>Whether a pattern is the largest of its orbit, judged after a change at one carbon.</summary>
    internal bool IsLargestAfterChange(ReadOnlySpan<byte> pattern, int changedRank) =>
        factorOfRank[changedRank] is not { } factor || factor.IsLargest(pattern, out _);

    /// <summary>Number of ways to pick the hydrogens that lead to the orbit of a pattern.</summary>
    internal BigInteger Degeneracy(ReadOnlySpan<byte> pattern)
    {
        BigInteger ways = BigInteger.One;
        for (int rank = 0; rank < pattern.Length; rank++)
        {
            ways *= Choose(Capacity[rank], pattern[rank]);
        }

        foreach (SubstitutionFactor factor in factors)
        {
            factor.IsLargest(pattern, out int stabiliser);
            ways *= factor.Order / stabiliser;
        }

        return ways;
    }

    private static int Choose(int total, int picked)
    {
        int ways = 1;
        for (int i = 1; i <= picked; i++)
        {
            ways = ways * (total - picked + i) / i;
        }

        return ways;
    }

    // Levels that move a common atom, or act on a common stereo element, belong together; the others are independent
    // factors. Nodes beyond the atoms stand for the elements.
    private static IEnumerable<(int[] Points, List<int[][]> Levels)> Split(
        List<int[][]> levels, int[] rankOfAtom, StereoPermutations? stereo)
    {
        int atomCount = rankOfAtom.Length;
        var parent = new int[atomCount + (stereo?.ElementCount ?? 0)];
        for (int i = 0; i < parent.Length; i++)
        {
            parent[i] = i;
        }

        var firstMoved = new int[levels.Count];
        for (int level = 0; level < levels.Count; level++)
        {
            firstMoved[level] = -1;
            foreach (int[] map in levels[level])
            {
                for (int atom = 0; atom < atomCount; atom++)
                {
                    if (map[atom] == atom)
                    {
                        continue;
                    }

                    if (firstMoved[level] < 0)
                    {
                        firstMoved[level] = atom;
                    }

                    parent[Root(atom)] = Root(firstMoved[level]);
                }

                foreach (int element in stereo?.Touched(map) ?? [])
                {
                    parent[Root(atomCount + element)] = Root(firstMoved[level]);
                }
            }
        }

        for (int root = 0; root < parent.Length; root++)
        {
            if (Root(root) != root)
            {
                continue;
            }

            var points = new List<int>();
            for (int atom = 0; atom < atomCount; atom++)
            {
                if (rankOfAtom[atom] >= 0 && Root(atom) == root)
                {
                    points.Add(rankOfAtom[atom]);
                }
            }

            var own = new List<int[][]>();
            for (int level = 0; level < levels.Count; level++)
            {
                if (Root(firstMoved[level]) == root)
                {
                    own.Add(levels[level]);
                }
            }

            if (points.Count > 0 && own.Count > 0)
            {
                points.Sort();
                yield return ([.. points], own);
            }
        }

        int Root(int atom)
        {
            while (parent[atom] != atom)
            {
                parent[atom] = parent[parent[atom]];
                atom = parent[atom];
            }

            return atom;
        }
    }
}
