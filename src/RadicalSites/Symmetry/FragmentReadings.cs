using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>Solves for the open configurations of one fragment, one automorphism after the other.</summary>
/// <remarks>
/// Each automorphism either keeps or inverts all chiral frames. Either way it ties the configurations of the frames that it
/// moves; a union-find with parity holds the ties, and a contradiction discards the way. Not thread-safe.
/// </remarks>
internal sealed class FragmentReadings
{
    private const int LargestGroup = 192;
    private const int MostSteps = 1000;

    private readonly SymmetryGraph graph;
    private readonly SymmetryWorkspace workspace;
    private readonly int stated;
    private readonly sbyte[] flexible;
    private readonly int fragment;
    private readonly List<int> rigid = [];
    private readonly List<int[]> generators = [];
    private readonly List<sbyte[]> found = [];
    private int mostAccepted = -1;
    private int mostReadings;
    private int steps;

    internal FragmentReadings(SymmetryWorkspace workspace, int fragment, int stated)
    {
        this.workspace = workspace;
        this.fragment = fragment;
        this.stated = stated;
        flexible = workspace.Flexible.State;
        graph = workspace.Graph;
    }

    /// <summary>Solves.</summary>
    /// <param name="most">Most readings to return.</param>
    /// <returns>One or more arrays of configurations, of which those of this fragment count.</returns>
    internal List<sbyte[]> Solve(int most)
    {
        mostReadings = most;
        for (int e = 0; e < graph.ElementCount; e++)
        {
            if (flexible[e] < 0 && graph.FragmentIndexOf(graph.Focus[e]) == fragment)
            {
                rigid.Add(e);
            }
        }

        CollectGenerators();
        SignedForest start = new(graph.ElementCount + 1);
        for (int i = 0; i < rigid.Count; i++)
        {
            // The last node is the constant +1; a stated configuration is tied to it.
            if (rigid[i] < stated)
            {
                start.TryJoin(rigid[i], graph.ElementCount, 1);
            }
        }

        JoinCages(start);
        Try(0, 0, start);
        return found;
    }

    private void JoinCages(SignedForest forest)
    {
        for (int i = 0; i < rigid.Count; i++)
        {
            for (int j = i + 1; j < rigid.Count; j++)
            {
                if (Math.Max(rigid[i], rigid[j]) < stated
                    || graph.Kind[rigid[i]] != SymmetryGraph.Center || graph.Kind[rigid[j]] != SymmetryGraph.Center)
                {
                    continue;
                }

                int relation = CagePaths.Relation(graph, graph.Focus[rigid[i]], graph.Focus[rigid[j]]);
                if (relation != 0)
                {
                    forest.TryJoin(
                        rigid[i], rigid[j], relation * graph.Configuration[rigid[i]] * graph.Configuration[rigid[j]]);
                }
            }
        }
    }

    private void Try(int index, int accepted, SignedForest forest)
    {
        int possible = accepted + generators.Count - index;
        if (found.Count > 0 && (possible < mostAccepted || ++steps > MostSteps
            || (possible == mostAccepted && found.Count >= mostReadings)))
        {
            return;
        }

        if (index == generators.Count)
        {
            if (accepted > mostAccepted)
            {
                found.Clear();
                mostAccepted = accepted;
            }

            sbyte[] reading = graph.Configuration.AsSpan(0, graph.ElementCount).ToArray();
            foreach (int e in rigid)
            {
                reading[e] = (sbyte)(reading[e] * forest.SignAgainst(e, graph.ElementCount));
            }

            found.Add(reading);
            return;
        }

        SignedForest proper = new(forest);
        bool keeps = Accept(generators[index], 1, proper);
        SignedForest mirror = new(forest);
        bool inverts = Accept(generators[index], -1, mirror);
        if (keeps)
        {
            Try(index + 1, accepted + 1, proper);
        }

        if (inverts && !(keeps && proper.Equals(mirror)))
        {
            Try(index + 1, accepted + 1, mirror);
        }

        if ((!keeps && !inverts) || possible - 1 > mostAccepted)
        {
            Try(index + 1, accepted, forest);
        }
    }

    private bool Accept(int[] image, int sign, SignedForest forest)
    {
        foreach (int e in rigid)
        {
            int there = StereoImage.TargetOf(graph, e, image);
            if (there < 0 || flexible[there] > 0)
            {
                return false;
            }

            int local = StereoImage.SignOf(graph, e, image, graph.Configuration);
            int wanted = graph.Kind[e] == SymmetryGraph.Axis ? 1 : sign;
            if (local == 0 || (e < stated) != (there < stated) || !forest.TryJoin(e, there, local * wanted))
            {
                return false;
            }
        }

        return true;
    }

    private void CollectGenerators()
    {
        SymmetryGraph own = workspace.FragmentGraph;
        int[] places = workspace.PlacesFor(graph.AtomCount);
        own.LoadFragment(graph, fragment, places);
        own.ElementCount = 0;
        List<int[]> local = [];
        workspace.Canonical.Generators = local;
        workspace.Canonical.Run(own, SymmetryAnalysis.SearchLimit);
        workspace.Canonical.Generators = null;
        ReadOnlySpan<int> atoms = graph.Fragment(fragment);
        local.RemoveAll(image => !MovesRigid(image, places));
        foreach (int[] image in PermutationGroup.Elements(local, LargestGroup))
        {
            int[] whole = new int[graph.AtomCount];
            Array.Fill(whole, -1);
            for (int i = 0; i < atoms.Length; i++)
            {
                whole[atoms[i]] = atoms[image[i]];
            }

            generators.Add(whole);
        }
    }

    private bool MovesRigid(int[] image, int[] places)
    {
        foreach (int e in rigid)
        {
            if (image[places[graph.Focus[e]]] != places[graph.Focus[e]])
            {
                return true;
            }

            for (int i = 4 * e; i < (4 * e) + 4; i++)
            {
                int carrier = graph.Carriers[i];
                if (carrier >= 0 && image[places[carrier]] != places[carrier])
                {
                    return true;
                }
            }
        }

        return false;
    }
}
