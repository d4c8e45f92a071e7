using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>
/// Exact search for an automorphism with given images of some atoms, proper or with every chiral element inverted,
/// by individualisation and refinement in parallel on both sides with backtracking.
/// </summary>
/// <remarks>
/// Only the fragment of the first atom is searched; the others stay as they are. Not thread-safe.
/// The number of refinements is bounded by the budget; running out is remembered in <see cref="IsExhausted"/>.
/// </remarks>
internal sealed class IsomorphismSearch
{
    private readonly List<ColorPartition> left = [];
    private readonly List<ColorPartition> right = [];
    private int remaining;
    private sbyte[] configurationOfImage = [];

    /// <summary>Image of each atom of the fragment after success, -1 elsewhere.</summary>
    internal int[] Image = [];

    /// <summary>Whether a search was given up for want of budget since <see cref="Begin"/>.</summary>
    internal bool IsExhausted { get; private set; }

    /// <summary>Sets the budget for the following searches together.</summary>
    internal void Begin(int refinements)
    {
        remaining = refinements;
        IsExhausted = false;
    }

    /// <summary>Tries to find the automorphism.</summary>
    /// <param name="graph">Graph with its stereo elements and fragments.</param>
    /// <param name="start">Refined partition of the graph.</param>
    /// <param name="startOfImage">Partition of the graph refined by <paramref name="configurationOfImage"/>.</param>
    /// <param name="from">Atoms, all of one fragment.</param>
    /// <param name="to">Their images, in the same order, all of one fragment.</param>
    /// <param name="configurationOfImage">
    /// Configurations that the images of the stereo elements must have: those of the graph for a proper operation, the
    /// mirrored ones for an operation that mirrors.
    /// </param>
    internal bool TryFind(
        SymmetryGraph graph, ColorPartition start, ColorPartition startOfImage, ReadOnlySpan<int> from,
        ReadOnlySpan<int> to, sbyte[] configurationOfImage)
    {
        this.configurationOfImage = configurationOfImage;
        if (Image.Length < graph.AtomCount)
        {
            Image = new int[Math.Max(64, graph.AtomCount)];
        }

        ColorPartition one = At(left, 0);
        ColorPartition two = At(right, 0);
        one.CopyFrom(start);
        two.CopyFrom(startOfImage);
        one.Trace = 0;
        two.Trace = 0;
        for (int i = 0; i < from.Length; i++)
        {
            if (!Separate(graph, one, two, from[i], to[i]))
            {
                return false;
            }
        }

        return Descend(graph, 0, from[0], to[0]);
    }

    /// <summary>Tries to find an automorphism of a graph that has no stereo elements at the moment.</summary>
    internal bool TryFindPlain(SymmetryGraph graph, ColorPartition start, int from, int to) =>
        TryFind(graph, start, start, [from], [to], graph.Configuration);

    private bool Descend(SymmetryGraph graph, int depth, int source, int target)
    {
        ColorPartition one = left[depth];
        ColorPartition two = right[depth];
        int cell = TargetCell(graph, one, source);
        if (cell < 0)
        {
            return IsLeafValid(graph, one, two, source, target);
        }

        ColorPartition nextOne = At(left, depth + 1);
        ColorPartition nextTwo = At(right, depth + 1);
        int atom = one.Members[cell];
        int end = cell + one.Length[cell];
        for (int i = cell; i < end; i++)
        {
            nextOne.CopyFrom(one);
            nextTwo.CopyFrom(two);
            if (Separate(graph, nextOne, nextTwo, atom, two.Members[i])
                && Descend(graph, depth + 1, source, target))
            {
                return true;
            }

            if (IsExhausted)
            {
                return false;
            }
        }

        return false;
    }

    private bool Separate(SymmetryGraph graph, ColorPartition one, ColorPartition two, int atom, int image)
    {
        if (--remaining < 0)
        {
            IsExhausted = true;
            return false;
        }

        if (one.CellOf[atom] != two.CellOf[image])
        {
            return false;
        }

        one.Individualise(atom);
        one.Refine(graph, graph.Configuration);
        two.Individualise(image);
        two.Refine(graph, configurationOfImage);
        return one.CellCount == two.CellCount && one.Trace == two.Trace
            && StereoSignature(graph, one, atom, graph.Configuration)
                == StereoSignature(graph, two, image, configurationOfImage);
    }

    private static int TargetCell(SymmetryGraph graph, ColorPartition partition, int source)
    {
        ReadOnlySpan<int> fragment = graph.FragmentOf(source);
        foreach (int atom in fragment)
        {
            int cell = partition.CellOf[atom];
            if (partition.Length[cell] > 1)
            {
                return cell;
            }
        }

        return -1;
    }

    private bool IsLeafValid(SymmetryGraph graph, ColorPartition one, ColorPartition two, int source, int target)
    {
        Array.Fill(Image, -1, 0, graph.AtomCount);
        bool exchange = graph.FragmentIndexOf(source) != graph.FragmentIndexOf(target);
        ReadOnlySpan<int> fragment = graph.FragmentOf(source);
        foreach (int atom in fragment)
        {
            int image = two.Members[one.CellOf[atom]];
            Image[atom] = image;
            if (exchange)
            {
                Image[image] = atom;
            }
        }

        foreach (int atom in fragment)
        {
            int image = Image[atom];
            for (int j = graph.Offset[atom]; j < graph.Offset[atom + 1]; j++)
            {
                if (graph.WeightBetween(image, Image[graph.Adjacent[j]]) != graph.Weight[j])
                {
                    return false;
                }
            }

            // Elements with an index beyond the count are set aside at the moment.
            int center = graph.CenterAt[atom] - 1;
            if (center >= 0 && center < graph.ElementCount
                && StereoImage.SignOfCenter(graph, center, Image, configurationOfImage) != 1)
            {
                return false;
            }

            int axis = graph.AxisAt[atom] - 1;
            if (axis >= 0 && axis < graph.ElementCount
                && StereoImage.SignOfAxis(graph, axis, Image, configurationOfImage) != 1)
            {
                return false;
            }
        }

        return true;
    }

    private static ulong StereoSignature(SymmetryGraph graph, ColorPartition partition, int atom, sbyte[] configuration)
    {
        ulong sum = 0;
        int fragment = graph.FragmentIndexOf(atom);
        for (int e = 0; e < graph.ElementCount; e++)
        {
            if (graph.FragmentIndexOf(graph.Focus[e]) != fragment)
            {
                continue;
            }

            int sign = graph.ResolvedSign(e, partition.CellOf, configuration);
            int low = Math.Min(partition.CellOf[graph.Focus[e]], partition.CellOf[graph.FocusEnd[e]]);
            sum += ((ulong)(low + 1) * 0x9E3779B97F4A7C15UL) ^ ((ulong)(sign + 2) * 0xD6E8FEB86659FD93UL);
        }

        return sum;
    }

    private static ColorPartition At(List<ColorPartition> list, int depth)
    {
        while (list.Count <= depth)
        {
            list.Add(new ColorPartition());
        }

        return list[depth];
    }
}
