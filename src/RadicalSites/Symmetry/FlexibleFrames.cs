using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>
/// Finds frames that can always be turned over on the spot, because two of their ligands are like branches that hold no
/// configuration of their own: isopropyl, gem-dialkyl, sulfonyl. Such a frame never restricts the rest of the molecule.
/// </summary>
internal readonly ref struct FlexibleFrames
{
    private readonly SymmetryGraph graph;
    private readonly ReadOnlySpan<int> orbits;
    private readonly sbyte[] state;

    private FlexibleFrames(SymmetryGraph graph, ReadOnlySpan<int> orbits, sbyte[] state)
    {
        this.graph = graph;
        this.orbits = orbits;
        this.state = state;
    }

    /// <summary>Marks each element of the graph.</summary>
    /// <param name="graph">Graph with its frames.</param>
    /// <param name="orbits">Constitutional orbit by atom.</param>
    /// <returns>1 = flexible, -1 = rigid, by element.</returns>
    internal static sbyte[] Find(SymmetryGraph graph, ReadOnlySpan<int> orbits)
    {
        sbyte[] state = new sbyte[graph.ElementCount];
        FlexibleFrames finder = new(graph, orbits, state);
        for (int e = 0; e < state.Length; e++)
        {
            finder.IsFlexible(e);
        }

        return state;
    }

    private bool IsFlexible(int element)
    {
        if (state[element] == 0)
        {
            // Guards against going round; a frame inside its own branch cannot occur in a tree-like branch.
            state[element] = -1;
            state[element] = HasLikeBranches(element) ? (sbyte)1 : (sbyte)-1;
        }

        return state[element] > 0;
    }

    private bool HasLikeBranches(int element)
    {
        ReadOnlySpan<int> carriers = graph.Carriers.AsSpan(4 * element, 4);
        bool paired = graph.Kind[element] != SymmetryGraph.Center;
        for (int i = 0; i < 4; i++)
        {
            for (int j = i + 1; j < 4; j++)
            {
                int one = carriers[i];
                int two = carriers[j];
                if (one < 0 || two < 0 || orbits[one] != orbits[two] || (paired && (i / 2 != j / 2)))
                {
                    continue;
                }

                int stem = !paired ? graph.Focus[element]
                    : graph.WeightBetween(one, graph.Focus[element]) == SymmetryGraph.SingleWeight ? graph.Focus[element]
                    : StemOf(one, two);
                if (stem >= 0 && IsFreeBranch(one, stem))
                {
                    return true;
                }
            }
        }

        return false;
    }

    private int StemOf(int one, int two)
    {
        for (int i = graph.Offset[one]; i < graph.Offset[one + 1]; i++)
        {
            if (graph.WeightBetween(graph.Adjacent[i], two) != 0)
            {
                return graph.Adjacent[i];
            }
        }

        return -1;
    }

    /// <summary>Whether what hangs on the stem through an atom comes back nowhere and holds no rigid frame.</summary>
    private bool IsFreeBranch(int root, int stem)
    {
        if (graph.DegreeOf(root) == 1)
        {
            return true;
        }

        HashSet<int> seen = [root];
        Stack<int> open = new([root]);
        while (open.TryPop(out int atom))
        {
            int center = graph.CenterAt[atom] - 1;
            int axis = graph.AxisAt[atom] - 1;
            if ((center >= 0 && !IsFlexible(center)) || (axis >= 0 && !IsFlexible(axis)))
            {
                return false;
            }

            for (int i = graph.Offset[atom]; i < graph.Offset[atom + 1]; i++)
            {
                int next = graph.Adjacent[i];
                if (next == stem)
                {
                    if (atom != root)
                    {
                        return false;
                    }
                }
                else if (seen.Add(next))
                {
                    open.Push(next);
                }
            }
        }

        return true;
    }
}
