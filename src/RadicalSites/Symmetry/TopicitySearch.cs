using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>Splits constitutional orbits by geometry, and relates the hydrogens on one atom.</summary>
internal sealed partial class TopicitySearch
{
    private SymmetryWorkspace workspace = null!;
    private SymmetryGraph graph = null!;
    private Molecule molecule = null!;
    private ColorPartition stereo = null!;
    private int[] constitutional = [];
    private int stated;
    private bool isMirrorRefined;

    /// <summary>Prepares for a graph without frames.</summary>
    internal void BeginPlain(SymmetryWorkspace owner, Molecule subject)
    {
        workspace = owner;
        graph = owner.Graph;
        molecule = subject;
        stereo = owner.Constitution;
    }

    /// <summary>Prepares for a graph with frames whose configurations are all set.</summary>
    /// <param name="owner">The workspace.</param>
    /// <param name="subject">The molecule.</param>
    /// <param name="statedCount">Number of frames, from the first on, that the molecule states.</param>
    /// <param name="orbits">Constitutional orbit by atom, named by its lowest member.</param>
    internal void Begin(SymmetryWorkspace owner, Molecule subject, int statedCount, int[] orbits)
    {
        BeginPlain(owner, subject);
        constitutional = orbits;
        stated = statedCount;
        isMirrorRefined = false;
        if (!owner.Constitution.IsDiscrete)
        {
            stereo = owner.Stereo;
            stereo.CopyFrom(owner.Constitution);
            stereo.SeparateFoci(graph, stated);
            stereo.Refine(graph, graph.Configuration);
        }
    }

    /// <summary>Fills the orbits of proper operations and those of proper and mirroring ones.</summary>
    internal void FindOrbits()
    {
        int n = graph.AtomCount;
        workspace.MirrorOrbits.Start(n);
        workspace.ProperOrbits.Start(n);
        ColorPartition cells = workspace.Constitution;
        if (cells.IsDiscrete)
        {
            return;
        }

        for (int cell = 0; cell < n; cell += cells.Length[cell])
        {
            int end = cell + cells.Length[cell];
            for (int i = cell + 1; i < end; i++)
            {
                Place(cells, cell, i);
            }
        }
    }

    internal static void UnionImages(SymmetryWorkspace workspace, OrbitForest orbits)
    {
        int[] image = workspace.Isomorphism.Image;
        for (int i = 0; i < workspace.Graph.AtomCount; i++)
        {
            if (image[i] >= 0)
            {
                orbits.Union(i, image[i]);
            }
        }
    }

    private void Place(ColorPartition cells, int cell, int index)
    {
        OrbitForest mirror = workspace.MirrorOrbits;
        OrbitForest proper = workspace.ProperOrbits;
        int atom = cells.Members[index];
        for (int i = cell; i < index; i++)
        {
            int other = cells.Members[i];
            if (constitutional[other] != constitutional[atom])
            {
                continue;
            }

            if (proper.Find(other) == proper.Find(atom) || TryProper(other, atom))
            {
                return;
            }
        }

        FlexibleFrames frames = workspace.Flexible;
        MirrorState state = frames.Fragments[graph.FragmentIndexOf(atom)];
        bool reflects = state == MirrorState.Always && frames.Depth[atom] <= 1
            && !frames.HasOpenAxis[graph.FragmentIndexOf(atom)];
        for (int i = cell; i < index; i++)
        {
            int other = cells.Members[i];
            if (constitutional[other] != constitutional[atom])
            {
                continue;
            }

            // Without a rigid frame any automorphism can be made to mirror by turning frames over on the spot; only atoms
            // that two nested frames would move need a closer look.
            if (reflects)
            {
                mirror.Union(other, atom);
                return;
            }

            if (state == MirrorState.Never && graph.FragmentIndexOf(other) == graph.FragmentIndexOf(atom))
            {
                continue;
            }

            if (mirror.Find(other) == mirror.Find(atom) || TryMirror(other, atom))
            {
                return;
            }
        }
    }

    private bool TryProper(int from, int to)
    {
        if (stereo.CellOf[from] != stereo.CellOf[to] || IsHeldPair(from, to))
        {
            return false;
        }

        if (workspace.Probe.TryMap(graph, stereo, from, to))
        {
            for (int i = 0; i < workspace.Probe.AssignedCount; i++)
            {
                int atom = workspace.Probe.Assigned[i];
                workspace.ProperOrbits.Union(atom, workspace.Probe.Image[atom]);
                workspace.MirrorOrbits.Union(atom, workspace.Probe.Image[atom]);
            }

            return true;
        }

        if (!workspace.Isomorphism.TryFind(graph, stereo, stereo, [from], [to], graph.Configuration))
        {
            return false;
        }

        UnionImages(workspace, workspace.ProperOrbits);
        UnionImages(workspace, workspace.MirrorOrbits);
        return true;
    }

    /// <summary>
    /// Whether the two atoms are the only like ligands of a centre that stays in place, so that exchanging them inverts it.
    /// </summary>
    private bool IsHeldPair(int from, int to)
    {
        for (int i = graph.Offset[from]; i < graph.Offset[from + 1]; i++)
        {
            int focus = graph.Adjacent[i];
            int e = graph.CenterAt[focus] - 1;
            if (e < 0 || graph.Kind[e] != SymmetryGraph.Center || stereo.Length[stereo.CellOf[focus]] > 1
                || graph.WeightBetween(focus, to) == 0)
            {
                continue;
            }

            int like = 0;
            int others = -2;
            bool distinct = true;
            for (int c = 4 * e; c < (4 * e) + 4; c++)
            {
                int carrier = graph.Carriers[c];
                int color = carrier < 0 ? -1 : stereo.CellOf[carrier];
                if (color == stereo.CellOf[from])
                {
                    like++;
                }
                else
                {
                    distinct &= color != others;
                    others = color;
                }
            }

            return like == 2 && distinct;
        }

        return false;
    }

    private bool TryMirror(int from, int to)
    {
        RefineMirrored();
        if (stereo.CellOf[from] != workspace.Mirrored.CellOf[to]
            || !workspace.Isomorphism.TryFind(
                graph, stereo, workspace.Mirrored, [from], [to], workspace.MirroredConfiguration))
        {
            return false;
        }

        UnionImages(workspace, workspace.MirrorOrbits);
        return true;
    }

    private void RefineMirrored()
    {
        if (isMirrorRefined)
        {
            return;
        }

        isMirrorRefined = true;
        graph.Mirror(ref workspace.MirroredConfiguration);
        workspace.Mirrored.CopyFrom(workspace.Constitution);
        workspace.Mirrored.SeparateFoci(graph, stated);
        workspace.Mirrored.Refine(graph, workspace.MirroredConfiguration);
    }
}
