using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

internal sealed partial class CanonicalSearch
{
    private readonly List<ColorPartition> saved = [];
    private readonly List<OrbitForest> orbits = [];
    private readonly List<int> path = [];
    private readonly List<ulong> bestTraces = [];
    private readonly LabelledGraph labelled = new();
    private readonly LabelledGraph bestLabelled = new();
    private int[] bestMembers = [];
    private int[] permutation = [];
    private int[] bestPath = [];
    private bool hasBest;

    /// <summary>Full search below the current partition, whose first open cell could not be proven symmetric.</summary>
    private void SearchFrom(SymmetryGraph graph, int cell)
    {
        hasBest = false;
        path.Clear();
        bestTraces.Clear();
        if (bestMembers.Length < graph.AtomCount)
        {
            bestMembers = new int[current.Members.Length];
            permutation = new int[current.Members.Length];
        }

        Search(graph, 0, cell, false);
        Array.Copy(bestMembers, current.Members, graph.AtomCount);
        for (int i = 0; i < graph.AtomCount; i++)
        {
            current.Position[current.Members[i]] = i;
            current.CellOf[current.Members[i]] = i;
        }
    }

    /// <summary>Searches one node; returns the depth to go back to.</summary>
    /// <param name="graph">The graph.</param>
    /// <param name="depth">Depth of the node.</param>
    /// <param name="cell">Position before which all cells are single.</param>
    /// <param name="better">Whether the path already beats the best leaf by its traces.</param>
    private int Search(SymmetryGraph graph, int depth, int cell, bool better)
    {
        if (current.CellCount == graph.AtomCount)
        {
            return VisitLeaf(graph, depth, better);
        }

        while (current.Length[cell] == 1)
        {
            cell++;
        }

        ColorPartition node = At(saved, depth);
        node.CopyFrom(current);
        OrbitForest forestHere = At(orbits, depth);
        forestHere.Start(graph.AtomCount);
        bool uniform = AreExchangeable(graph, node, cell, forestHere, true, out _);
        int end = cell + node.Length[cell];
        int bound = uniform ? cell + 1 : end;
        for (int i = cell; i < bound; i++)
        {
            int atom = node.Members[i];
            if (IsCovered(node, forestHere, cell, i))
            {
                continue;
            }

            if (--remaining < 0)
            {
                IsExhausted = true;
                if (hasBest)
                {
                    return -1;
                }
            }

            current.CopyFrom(node);
            current.Trace = 0;
            current.Individualise(atom);
            current.Refine(graph, graph.Configuration);
            if (path.Count > depth)
            {
                path.RemoveRange(depth, path.Count - depth);
            }

            path.Add(atom);
            int verdict = CompareTrace(depth, better, current.Trace + (ulong)current.CellCount);
            if (verdict > 0)
            {
                continue;
            }

            int back = Search(graph, depth + 1, cell, better || verdict < 0);
            if (back < depth)
            {
                return back;
            }

            // A new best below means that the path to here is a prefix of it: further children compare with it.
            better = false;
        }

        return depth;
    }

    /// <summary>-1 better, 0 equal so far, +1 worse than the best leaf; records the trace when better.</summary>
    private int CompareTrace(int depth, bool better, ulong trace)
    {
        if (!better && hasBest)
        {
            if (depth >= bestTraces.Count)
            {
                return 1;
            }

            int order = trace.CompareTo(bestTraces[depth]);
            if (order >= 0)
            {
                return order;
            }
        }

        if (bestTraces.Count > depth)
        {
            bestTraces.RemoveRange(depth, bestTraces.Count - depth);
        }

        bestTraces.Add(trace);

        return hasBest ? -1 : 0;
    }

    private int VisitLeaf(SymmetryGraph graph, int depth, bool better)
    {
        labelled.Fill(graph, current);
        int order = !hasBest || better ? -1 : labelled.CompareTo(bestLabelled);
        if (order < 0)
        {
            hasBest = true;
            bestLabelled.CopyFrom(labelled);
            Array.Copy(current.Members, bestMembers, graph.AtomCount);
            bestPath = [.. path];
            return depth;
        }

        if (order > 0)
        {
            return depth;
        }

        for (int i = 0; i < graph.AtomCount; i++)
        {
            permutation[bestMembers[i]] = current.Members[i];
        }

        Generators?.Add(permutation.AsSpan(0, graph.AtomCount).ToArray());
        int common = 0;
        while (common < path.Count && common < bestPath.Length && path[common] == bestPath[common])
        {
            common++;
        }

        for (int level = 0; level <= common && level < orbits.Count; level++)
        {
            for (int i = 0; i < graph.AtomCount; i++)
            {
                orbits[level].Union(i, permutation[i]);
            }
        }

        return common;
    }

    private static bool IsCovered(ColorPartition node, OrbitForest orbits, int cell, int index)
    {
        int root = orbits.Find(node.Members[index]);
        for (int i = cell; i < index; i++)
        {
            if (orbits.Find(node.Members[i]) == root)
            {
                return true;
            }
        }

        return false;
    }

    private static T At<T>(List<T> list, int depth)
        where T : new()
    {
        while (list.Count <= depth)
        {
            list.Add(new T());
        }

        return list[depth];
    }
}
