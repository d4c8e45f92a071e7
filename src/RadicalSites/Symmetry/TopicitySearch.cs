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
            stereo.SplitsTies = true;
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

        for (int cell = 0; cell < n; cell += stereo.Length[cell])
        {
            int end = cell + stereo.Length[cell];
            for (int i = cell + 1; i < end; i++)
            {
                JoinProper(cell, i);
            }
        }

        for (int atom = 0; atom < n; atom++)
        {
            if (workspace.ProperOrbits.Find(atom) == atom && cells.Length[cells.CellOf[atom]] > 1)
            {
                JoinMirror(atom);
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

    /// <summary>Joins the member of a cell with the first earlier member that an operation carries to it.</summary>
    private void JoinProper(int cell, int index)
    {
        OrbitForest proper = workspace.ProperOrbits;
        int atom = stereo.Members[index];
        int tried = -1;
        for (int i = cell; i < index; i++)
        {
            int other = stereo.Members[i];
            int root = proper.Find(other);
            if (root == proper.Find(atom) || (root != tried && TryProper(other, atom)))
            {
                return;
            }

            tried = root;
        }
    }

    /// <summary>Joins a class with its mirror image, when there is one.</summary>
    private void JoinMirror(int atom)
    {
        OrbitForest mirror = workspace.MirrorOrbits;
        FlexibleFrames frames = workspace.Flexible;
        int fragment = graph.FragmentIndexOf(atom);
        MirrorState state = frames.Fragments[fragment];
        if (state == MirrorState.Always && frames.Depth[atom] <= 1 && !frames.HasOpenAxis[fragment])
        {
            // Without a rigid frame any automorphism can be made to mirror by turning frames over on the spot; only atoms
            // that two nested frames would move need a closer look.
            mirror.Union(constitutional[atom], atom);
            return;
        }

        if (state == MirrorState.Never && graph.FragmentCount == 1)
        {
            return;
        }

        RefineMirrored();
        ColorPartition image = workspace.Mirrored;
        int cell = stereo.CellOf[atom];
        if (image.CellOf[image.Members[cell]] != cell)
        {
            return;
        }

        int tried = -1;
        int end = cell + image.Length[cell];
        for (int i = cell; i < end; i++)
        {
            int other = image.Members[i];
            int root = workspace.ProperOrbits.Find(other);
            if (root == atom)
            {
                continue;
            }

            if (mirror.Find(other) == mirror.Find(atom) || (root != tried && TryMirror(atom, other)))
            {
                return;
            }

            tried = root;
        }
    }

    private bool TryProper(int from, int to)
    {
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

    private bool TryMirror(int from, int to)
    {
        if (!workspace.Isomorphism.TryFind(
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
        workspace.Mirrored.SplitsTies = true;
        workspace.Mirrored.SeparateFoci(graph, stated);
        workspace.Mirrored.Refine(graph, workspace.MirroredConfiguration);
    }
}
