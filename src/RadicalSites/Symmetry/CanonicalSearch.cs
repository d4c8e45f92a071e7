using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>Finds the canonical order of the atoms of one connected graph with its stereo elements.</summary>
/// <remarks>
/// The partition is refined; then the first cell of several atoms is split by giving one of them a place of its own, and
/// so on. Where probes show that the members of the cell are exchanged by automorphisms, any of them gives the same
/// result and there is nothing to search. Otherwise all classes of the cell are tried and the smallest labelled graph
/// wins; automorphisms met on the way prune what is left. Both ways give the same order. Not thread-safe.
/// </remarks>
internal sealed partial class CanonicalSearch
{
    private readonly ColorPartition current = new();
    private readonly AutomorphismProbe probe = new();
    private readonly OrbitForest forest = new();
    private int remaining;

    /// <summary>Receives generators of the automorphism group, as images by atom, when set.</summary>
    internal List<int[]>? Generators;

    /// <summary>Whether the budget ran out, so that the order may depend on the numbering.</summary>
    internal bool IsExhausted { get; private set; }

    /// <summary>Atoms by rank after <see cref="Run"/>.</summary>
    internal ReadOnlySpan<int> Order => current.Members.AsSpan(0, current.Count);

    /// <summary>Rank of an atom after <see cref="Run"/>.</summary>
    internal int RankOf(int atom) => current.Position[atom];

    /// <summary>The graph written down in the order found.</summary>
    internal LabelledGraph LabelledForm(SymmetryGraph graph)
    {
        LabelledGraph form = new();
        form.Fill(graph, current);
        return form;
    }

    /// <summary>Runs the search.</summary>
    /// <param name="graph">Connected graph, stereo elements included.</param>
    /// <param name="budget">Refinements allowed in the part that searches.</param>
    internal void Run(SymmetryGraph graph, int budget)
    {
        remaining = budget;
        IsExhausted = false;
        current.Start(graph);
        current.Refine(graph, graph.Configuration);
        forest.Reserve(graph.AtomCount);
        Descend(graph);
    }

    private void Descend(SymmetryGraph graph)
    {
        int n = graph.AtomCount;
        int cell = 0;
        int symmetricEnd = 0;
        while (current.CellCount < n)
        {
            while (current.Length[cell] == 1)
            {
                cell++;
            }

            if (cell >= symmetricEnd)
            {
                if (!AreExchangeable(graph, current, cell, forest, false, out bool freely))
                {
                    SearchFrom(graph, cell);
                    return;
                }

                // Members that swap in pairs without touching each other stay exchangeable while they are separated.
                symmetricEnd = freely ? cell + current.Length[cell] : 0;
            }

            current.Individualise(current.Members[cell]);
            current.Refine(graph, graph.Configuration);
        }
    }

    /// <summary>Whether probes show that the automorphisms that keep the colours exchange all members of a cell.</summary>
    private bool AreExchangeable(
        SymmetryGraph graph, ColorPartition partition, int cell, OrbitForest classes, bool probeAll, out bool freely)
    {
        int end = cell + partition.Length[cell];
        bool proven = true;
        freely = true;
        for (int i = cell; i < end; i++)
        {
            classes.Reset(partition.Members[i]);
        }

        int first = partition.Members[cell];
        for (int i = cell + 1; i < end; i++)
        {
            int other = partition.Members[i];
            if (classes.Find(first) == classes.Find(other))
            {
                continue;
            }

            if (!probe.TryMap(graph, partition, first, other))
            {
                if (!probeAll)
                {
                    return false;
                }

                proven = false;
                continue;
            }

            RecordProbe(graph);
            for (int j = 0; j < probe.AssignedCount; j++)
            {
                int atom = probe.Assigned[j];
                int image = probe.Image[atom];
                if (atom == image || partition.CellOf[atom] != cell)
                {
                    continue;
                }

                classes.Union(atom, image);
                freely &= (atom == first && image == other) || (atom == other && image == first);
            }
        }

        return proven;
    }

    private void RecordProbe(SymmetryGraph graph)
    {
        if (Generators is null)
        {
            return;
        }

        int[] image = new int[graph.AtomCount];
        for (int i = 0; i < image.Length; i++)
        {
            image[i] = probe.ImageOf(i);
        }

        Generators.Add(image);
    }
}
