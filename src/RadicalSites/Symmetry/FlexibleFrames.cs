using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>
/// Finds frames that can always be turned over on the spot, because two of their ligands are like branches that hold no
/// configuration of their own: isopropyl, gem-dialkyl, sulfonyl; or
/// because a ring that holds none turns over with it: cyclohexyl. Such a frame never restricts the rest of the molecule.
/// </summary>
/// <remarks>Not thread-safe: one belongs to each workspace.</remarks>
internal sealed partial class FlexibleFrames
{
    private readonly List<int> branch = [];
    private SymmetryWorkspace workspace = null!;
    private SymmetryGraph graph = new();
    private ColorPartition cells = new();
    private int[] orbits = [];
    private int[] seen = [];
    private int mark;

    /// <summary>State of a frame that restricts nothing and is taken out of the graph.</summary>
    private const sbyte Idle = 2;

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
        this.workspace = workspace;
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

        RemoveIdle();
    }

    private void RemoveIdle()
    {
        int kept = 0;
        for (int e = 0; e < graph.ElementCount; e++)
        {
            if (State[e] != Idle)
            {
                State[kept++] = State[e];
            }
            else
            {
                graph.CenterAt[graph.Focus[e]] = 0;
            }
        }

        if (kept < graph.ElementCount)
        {
            graph.Compact();
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
            // Frames of one ring that depend on each other stay rigid: the one looked at first stands in the way.
            State[element] = -1;
            bool flexible = HasLikeBranches(element);
            State[element] = !flexible ? (sbyte)-1 : State[element] == Idle ? Idle : (sbyte)1;
        }

        return State[element] > 0;
    }
}
