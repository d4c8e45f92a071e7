using System;
using System.Collections.Generic;
using System.Threading;
using RadicalSites.Molecules;

namespace RadicalSites.Products;

/// <summary>The automorphism group of a constitution as a chain of stabilisers with coset representatives.</summary>
/// <remarks>
/// Level i holds, for every image of base atom i under the automorphisms that fix the base atoms before it, one
/// automorphism. Each automorphism of the molecule is exactly one product of one representative from every level, so
/// the order is the product of the level sizes. Maps are found by individualisation and refinement and checked bond by
/// bond; the identity is tried first, which keeps the moved atoms of each representative few.
/// </remarks>
internal sealed class AutomorphismGroup
{
    private readonly Molecule molecule;
    private readonly ColorRefinement refinement;
    private readonly CancellationToken cancellation;

    private AutomorphismGroup(Molecule molecule, CancellationToken cancellation)
    {
        this.molecule = molecule;
        this.cancellation = cancellation;
        refinement = new ColorRefinement(molecule);
    }

    /// <summary>Coset representatives of every level that has more than one, each an image per atom.</summary>
    internal List<int[][]> Levels { get; } = [];

    /// <summary>Finds the group.</summary>
    /// <param name="molecule">The molecule; stereo is ignored.</param>
    /// <param name="baseOrder">Atoms in the order in which they become base atoms.</param>
    /// <param name="cancellation">Ends the search.</param>
    internal static AutomorphismGroup Find(
        Molecule molecule, ReadOnlySpan<int> baseOrder, CancellationToken cancellation)
    {
        var group = new AutomorphismGroup(molecule, cancellation);
        if (molecule.AtomCount > 0)
        {
            group.Build(baseOrder);
        }

        return group;
    }

    private void Build(ReadOnlySpan<int> baseOrder)
    {
        int atomCount = molecule.AtomCount;
        var states = new List<int[]>();
        var basePoints = new List<int>();
        int[] colors = refinement.Start.ToArray();
        foreach (int atom in baseOrder)
        {
            if (CellSize(colors, atom) == 1)
            {
                continue;
            }

            states.Add((int[])colors.Clone());
            basePoints.Add(atom);
            refinement.Individualise(colors, atom, atom);
        }

        var generators = new List<int[]>();
        for (int level = basePoints.Count - 1; level >= 0; level--)
        {
            int point = basePoints[level];
            int[] state = states[level];
            var images = new int[]?[atomCount];
            SpanOrbit(point, generators, images);
            var refused = new bool[atomCount];
            for (int image = 0; image < atomCount; image++)
            {
                if (state[atomCount + image] != state[point] || images[image] is not null || refused[image])
                {
                    continue;
                }

                cancellation.ThrowIfCancellationRequested();
                int[] trial = (int[])state.Clone();
                int[]? map = refinement.Individualise(trial, point, image) ? Search(trial) : null;
                if (map is null)
                {
                    RefuseOrbit(image, generators, refused);
                    continue;
                }

                generators.Add(map);
                SpanOrbit(point, generators, images);
            }

            int[][] representatives = Array.FindAll(images, static map => map is not null)!;
            if (representatives.Length > 1)
            {
                Levels.Add(representatives);
            }
        }
    }

    private static void SpanOrbit(int point, List<int[]> generators, int[]?[] images)
    {
        Array.Clear(images);
        images[point] = Identity(images.Length);
        var queue = new Queue<int>();
        queue.Enqueue(point);
        while (queue.TryDequeue(out int atom))
        {
            foreach (int[] generator in generators)
            {
                int next = generator[atom];
                if (images[next] is null)
                {
                    images[next] = Compose(generator, images[atom]!);
                    queue.Enqueue(next);
                }
            }
        }
    }

    // Whatever the stabiliser maps onto an impossible image is impossible as well.
    private static void RefuseOrbit(int image, List<int[]> generators, bool[] refused)
    {
        var queue = new Queue<int>();
        queue.Enqueue(image);
        refused[image] = true;
        while (queue.TryDequeue(out int atom))
        {
            foreach (int[] generator in generators)
            {
                if (!refused[generator[atom]])
                {
                    refused[generator[atom]] = true;
                    queue.Enqueue(generator[atom]);
                }
            }
        }
    }

    private int[]? Search(int[] colors)
    {
        int atomCount = molecule.AtomCount;
        int atom = FirstOpenAtom(colors);
        if (atom < 0)
        {
            return ReadMap(colors);
        }

        for (int attempt = -1; attempt < atomCount; attempt++)
        {
            int image = attempt < 0 ? atom : attempt;
            if ((attempt == atom && attempt >= 0) || colors[atomCount + image] != colors[atom])
            {
                continue;
            }

            cancellation.ThrowIfCancellationRequested();
            int[] trial = (int[])colors.Clone();
            if (refinement.Individualise(trial, atom, image) && Search(trial) is { } map)
            {
                return map;
            }
        }

        return null;
    }

    private int FirstOpenAtom(int[] colors)
    {
        int atomCount = molecule.AtomCount;
        Span<int> sizes = atomCount <= 512 ? stackalloc int[2 * atomCount] : new int[2 * atomCount];
        sizes.Clear();
        for (int i = 0; i < atomCount; i++)
        {
            sizes[colors[i]]++;
        }

        for (int i = 0; i < atomCount; i++)
        {
            if (sizes[colors[i]] > 1)
            {
                return i;
            }
        }

        return -1;
    }

    private int[]? ReadMap(int[] colors)
    {
        int atomCount = molecule.AtomCount;
        var imageOfColor = new int[2 * atomCount];
        for (int i = 0; i < atomCount; i++)
        {
            imageOfColor[colors[atomCount + i]] = i;
        }

        var map = new int[atomCount];
        for (int i = 0; i < atomCount; i++)
        {
            map[i] = imageOfColor[colors[i]];
        }

        foreach (Bond bond in molecule.BondSpan)
        {
            if (!HasBond(map[bond.Begin], map[bond.End], ColorRefinement.BondCode(bond)))
            {
                return null;
            }
        }

        return map;
    }

    private bool HasBond(int begin, int end, int code)
    {
        foreach (Neighbor neighbor in molecule.NeighborsOf(begin))
        {
            if (neighbor.Atom == end)
            {
                return ColorRefinement.BondCode(molecule.BondSpan[neighbor.Bond]) == code;
            }
        }

        return false;
    }

    private static int CellSize(int[] colors, int atom)
    {
        int half = colors.Length / 2;
        return colors.AsSpan(0, half).Count(colors[atom]);
    }

    private static int[] Identity(int count)
    {
        var map = new int[count];
        for (int i = 0; i < count; i++)
        {
            map[i] = i;
        }

        return map;
    }

    private static int[] Compose(int[] outer, int[] inner)
    {
        var map = new int[inner.Length];
        for (int i = 0; i < map.Length; i++)
        {
            map[i] = outer[inner[i]];
        }

        return map;
    }
}
