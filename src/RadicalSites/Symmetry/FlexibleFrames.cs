using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>
/// Finds frames that can always be turned over on the spot, because two of their ligands are like branches that hold no
/// configuration of their own: isopropyl, gem-dialkyl, sulfonyl. Such a frame never restricts the rest of the molecule.
/// </summary>
/// <remarks>Not thread-safe: one belongs to each workspace.</remarks>
internal sealed class FlexibleFrames
{
    private readonly Stack<int> open = new();
    private readonly List<int> branch = [];
    private SymmetryGraph graph = new();
    private ColorPartition cells = new();
    private int[] orbits = [];
    private int[] seen = [];
    private int mark;

    /// <summary>1 = flexible, -1 = rigid, by element.</summary>
    internal sbyte[] State = [];

    /// <summary>By atom, the number of flexible frames that turn over by moving it; double bonds count twice.</summary>
    internal int[] Depth = [];

    /// <summary>By fragment, what its frames say about mirroring it.</summary>
    internal MirrorState[] Fragments = [];

    /// <summary>By fragment, whether a rigid double bond could be reversed by an automorphism.</summary>
    internal bool[] HasOpenAxis = [];

    /// <summary>Looks at each element of a workspace's graph.</summary>
    /// <param name="workspace">Workspace with the frames added.</param>
    /// <param name="constitutional">Constitutional orbit by atom.</param>
    internal void Find(SymmetryWorkspace workspace, int[] constitutional)
    {
        graph = workspace.Graph;
        cells = workspace.Constitution;
        orbits = constitutional;
        int n = graph.AtomCount;
        if (Depth.Length < n)
        {
            Depth = new int[Math.Max(64, n)];
            seen = new int[Depth.Length];
            mark = 0;
        }

        if (State.Length < graph.ElementCount)
        {
            State = new sbyte[graph.Kind.Length];
        }

        if (Fragments.Length < graph.FragmentCount)
        {
            Fragments = new MirrorState[Math.Max(8, graph.FragmentCount)];
            HasOpenAxis = new bool[Fragments.Length];
        }

        Array.Clear(Depth, 0, n);
        Array.Clear(State, 0, graph.ElementCount);
        Array.Clear(Fragments, 0, graph.FragmentCount);
        Array.Clear(HasOpenAxis, 0, graph.FragmentCount);
        for (int e = 0; e < graph.ElementCount; e++)
        {
            if (!IsFlexible(e))
            {
                Restrict(e);
            }
        }
    }

    /// <summary>
    /// A rigid chiral frame that no operation can move, with ligands all unlike, makes its fragment chiral; a
    /// double bond of that kind is kept by every operation.
    /// </summary>
    private void Restrict(int element)
    {
        int focus = graph.Focus[element];
        ref MirrorState state = ref Fragments[graph.FragmentIndexOf(focus)];
        bool held = cells.Length[cells.CellOf[focus]] == 1 && cells.Length[cells.CellOf[graph.FocusEnd[element]]] == 1
            && graph.ResolvedSign(element, cells.CellOf, graph.Configuration) != 0;
        if (graph.Kind[element] == SymmetryGraph.Axis)
        {
            HasOpenAxis[graph.FragmentIndexOf(focus)] |= !held;
            return;
        }

        state = held ? MirrorState.Never : state == MirrorState.Never ? state : MirrorState.Open;
    }

    private bool IsFlexible(int element)
    {
        if (State[element] == 0)
        {
            // Guards against going round; a frame inside its own branch cannot occur in a tree-like branch.
            State[element] = -1;
            State[element] = HasLikeBranches(element) ? (sbyte)1 : (sbyte)-1;
        }

        return State[element] > 0;
    }

    private bool HasLikeBranches(int element)
    {
        ReadOnlySpan<int> carriers = graph.Carriers.AsSpan(4 * element, 4);
        bool paired = graph.Kind[element] != SymmetryGraph.Center;
        for (int i = 0; i < 4; i++)
        {
            int one = carriers[i];
            for (int j = i + 1; j < 4 && one >= 0; j++)
            {
                int two = carriers[j];
                if (two >= 0 && orbits[one] == orbits[two] && (!paired || i / 2 == j / 2)
                    && MarkBranches(one, StemOf(element, one, two), graph.Kind[element] == SymmetryGraph.Axis ? 2 : 1))
                {
                    return true;
                }
            }
        }

        return false;
    }

    /// <summary>The atom that carries both ligands.</summary>
    private int StemOf(int element, int one, int two)
    {
        if (graph.Kind[element] == SymmetryGraph.Center)
        {
            return graph.Focus[element];
        }

        for (int i = graph.Offset[one]; i < graph.Offset[one + 1]; i++)
        {
            if (graph.WeightBetween(graph.Adjacent[i], two) != 0)
            {
                return graph.Adjacent[i];
            }
        }

        return -1;
    }

    /// <summary>Counts all like branches of a stem as movable when they come back nowhere and hold no rigid frame.</summary>
    private bool MarkBranches(int root, int stem, int weight)
    {
        if (stem < 0 || !WalkBranch(root, stem))
        {
            return false;
        }

        for (int i = graph.Offset[stem]; i < graph.Offset[stem + 1]; i++)
        {
            int other = graph.Adjacent[i];
            if (orbits[other] == orbits[root] && WalkBranch(other, stem))
            {
                foreach (int atom in branch)
                {
                    Depth[atom] += weight;
                }
            }
        }

        return true;
    }

    /// <summary>Collects what hangs on the stem through an atom; fails when it comes back or holds a rigid frame.</summary>
    private bool WalkBranch(int root, int stem)
    {
        branch.Clear();
        branch.Add(root);
        if (graph.DegreeOf(root) == 1)
        {
            return true;
        }

        open.Clear();
        open.Push(root);
        int own = ++mark;
        seen[root] = own;
        while (open.TryPop(out int atom))
        {
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
                else if (seen[next] != own)
                {
                    seen[next] = own;
                    branch.Add(next);
                    open.Push(next);
                }
            }
        }

        return HoldsNoRigidFrame([.. branch]);
    }

    private bool HoldsNoRigidFrame(ReadOnlySpan<int> atoms)
    {
        bool any = false;
        foreach (int atom in atoms)
        {
            int center = graph.CenterAt[atom] - 1;
            int axis = graph.AxisAt[atom] - 1;
            any |= (center >= 0 && !IsFlexible(center)) || (axis >= 0 && !IsFlexible(axis));
        }

        // The frames inside were looked at with the same scratch list.
        branch.Clear();
        foreach (int atom in atoms)
        {
            branch.Add(atom);
        }

        return !any;
    }
}
