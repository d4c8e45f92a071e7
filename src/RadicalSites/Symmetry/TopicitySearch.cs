using System;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

/// <summary>Splits constitutional orbits by geometry, and relates the hydrogens on one atom.</summary>
internal readonly struct TopicitySearch
{
    private readonly SymmetryWorkspace workspace;
    private readonly SymmetryGraph graph;
    private readonly Molecule molecule;

    internal TopicitySearch(SymmetryWorkspace workspace, Molecule molecule, int stated)
    {
        this.workspace = workspace;
        this.molecule = molecule;
        graph = workspace.Graph;
        workspace.Stereo.CopyFrom(workspace.Constitution);
        workspace.Mirrored.CopyFrom(workspace.Constitution);
        workspace.Stereo.SeparateFoci(graph, stated);
        workspace.Mirrored.SeparateFoci(graph, stated);
        workspace.Stereo.Refine(graph, graph.Configuration);
        graph.Mirror(ref workspace.MirroredConfiguration);
        workspace.Mirrored.Refine(graph, workspace.MirroredConfiguration);
    }

    /// <summary>Fills the orbits of proper operations and those of proper and mirroring ones.</summary>
    /// <param name="constitutional">Constitutional orbit by atom, named by its lowest member.</param>
    internal void FindOrbits(ReadOnlySpan<int> constitutional)
    {
        int n = constitutional.Length;
        workspace.MirrorOrbits.Start(n);
        workspace.ProperOrbits.Start(n);
        ColorPartition cells = workspace.Constitution;
        for (int cell = 0; cell < n; cell += cells.Length[cell])
        {
            int end = cell + cells.Length[cell];
            for (int i = cell + 1; i < end; i++)
            {
                Place(cells, cell, i, constitutional);
            }
        }
    }

    /// <summary>Relates the hydrogens on each atom; a weaker relation found before stays.</summary>
    internal void FindHydrogens(Span<Topicity> hydrogens)
    {
        ReadOnlySpan<Atom> atoms = molecule.AtomSpan;
        for (int i = 0; i < atoms.Length; i++)
        {
            Topicity found = atoms[i].HydrogenCount == 2 && graph.DegreeOf(i) == 2 ? OfMethylene(i)
                : atoms[i].HydrogenCount == 2 && graph.DegreeOf(i) == 1 ? OfTerminal(i)
                : Topicity.Homotopic;
            hydrogens[i] = found > hydrogens[i] ? found : hydrogens[i];
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

    private void Place(ColorPartition cells, int cell, int index, ReadOnlySpan<int> constitutional)
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

        for (int i = cell; i < index; i++)
        {
            int other = cells.Members[i];
            if (constitutional[other] == constitutional[atom]
                && (mirror.Find(other) == mirror.Find(atom) || TryMirror(other, atom)))
            {
                return;
            }
        }
    }

    private bool TryProper(int from, int to)
    {
        if (workspace.Stereo.CellOf[from] != workspace.Stereo.CellOf[to])
        {
            return false;
        }

        if (workspace.Probe.TryMap(graph, workspace.Stereo, from, to))
        {
            for (int i = 0; i < workspace.Probe.AssignedCount; i++)
            {
                int atom = workspace.Probe.Assigned[i];
                workspace.ProperOrbits.Union(atom, workspace.Probe.Image[atom]);
                workspace.MirrorOrbits.Union(atom, workspace.Probe.Image[atom]);
            }

            return true;
        }

        if (!workspace.Isomorphism.TryFind(graph, workspace.Stereo, workspace.Stereo, [from], [to], graph.Configuration))
        {
            return false;
        }

        UnionImages(workspace, workspace.ProperOrbits);
        UnionImages(workspace, workspace.MirrorOrbits);
        return true;
    }

    private bool TryMirror(int from, int to)
    {
        if (workspace.Stereo.CellOf[from] != workspace.Mirrored.CellOf[to]
            || !workspace.Isomorphism.TryFind(graph, workspace.Stereo, workspace.Mirrored, [from], [to], workspace.MirroredConfiguration))
        {
            return false;
        }

        UnionImages(workspace, workspace.MirrorOrbits);
        return true;
    }

    private Topicity OfMethylene(int atom)
    {
        int at = graph.Offset[atom];
        int first = graph.Adjacent[at];
        int second = graph.Adjacent[at + 1];
        int[] cellOf = workspace.Stereo.CellOf;
        if (cellOf[first] == cellOf[second]
            && workspace.Isomorphism.TryFind(
                graph, workspace.Stereo, workspace.Stereo, [atom, first, second], [atom, second, first], graph.Configuration))
        {
            return Topicity.Homotopic;
        }

        return graph.ElementCount == 0 || workspace.Isomorphism.TryFind(
            graph, workspace.Stereo, workspace.Mirrored, [atom, first, second], [atom, first, second], workspace.MirroredConfiguration)
            ? Topicity.Enantiotopic
            : Topicity.Diastereotopic;
    }

    /// <summary>A terminal CH2: free to turn on a single bond, else related through the two ligands of its partner.</summary>
    private Topicity OfTerminal(int atom)
    {
        int at = graph.Offset[atom];
        if (graph.Weight[at] == SymmetryGraph.SingleWeight)
        {
            return Topicity.Homotopic;
        }

        int partner = graph.Adjacent[at];
        int end = graph.Offset[partner + 1];
        int first = -1;
        int second = -1;
        for (int i = graph.Offset[partner]; i < end; i++)
        {
            int ligand = graph.Adjacent[i];
            if (ligand != atom)
            {
                second = first;
                first = ligand;
            }
        }

        if (first < 0)
        {
            return Topicity.Homotopic;
        }

        return second >= 0 && workspace.Stereo.CellOf[first] == workspace.Stereo.CellOf[second]
            && workspace.Isomorphism.TryFind(
                graph, workspace.Stereo, workspace.Stereo, [atom, first, second], [atom, second, first], graph.Configuration)
            ? Topicity.Homotopic
            : Topicity.Diastereotopic;
    }
}
