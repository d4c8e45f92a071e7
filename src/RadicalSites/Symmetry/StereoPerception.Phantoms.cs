using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

public static partial class StereoPerception
{
    /// <summary>Finds the stated elements that turn over, alone or with their cage, without changing the molecule.</summary>
    private static void FindSymmetryPhantoms(
        SymmetryWorkspace workspace, Molecule molecule, ReadOnlySpan<StereoElement> stated, ref bool[]? phantom)
    {
        SymmetryGraph graph = workspace.Graph;
        ColorPartition cells = workspace.Constitution;
        bool refined = false;
        List<(int Element, int Index)>? symmetric = null;
        int e = -1;
        for (int i = 0; i < stated.Length; i++)
        {
            if ((phantom is not null && phantom[i]) || !SymmetryGraph.IsHandled(stated[i]))
            {
                continue;
            }

            e++;
            if (IsCagedNitrogen(workspace, molecule, e))
            {
                (phantom ??= new bool[stated.Length])[i] = true;
                continue;
            }

            bool resolved = graph.ResolvedSign(e, cells.CellOf, graph.Configuration) != 0;
            if (resolved && cells.Length[cells.CellOf[graph.Focus[e]]] == 1)
            {
                continue;
            }

            if (!refined)
            {
                refined = true;
                RefineStated(workspace, workspace.Stereo, graph.Configuration);
            }

            if (!resolved && graph.ResolvedSign(e, workspace.Stereo.CellOf, graph.Configuration) == 0
                && TurnsOver(workspace, [e]))
            {
                (phantom ??= new bool[stated.Length])[i] = true;
            }
            else if (graph.Kind[e] == SymmetryGraph.Center && graph.DegreeOf(graph.Focus[e]) >= 3)
            {
                (symmetric ??= []).Add((e, i));
            }
        }

        if (symmetric is { Count: > 1 })
        {
            FindCagePhantoms(workspace, symmetric, stated.Length, ref phantom);
        }
    }

    /// <summary>
    /// Whether an element sits on a bridgehead nitrogen whose cage sets it by a stated centre of another element, so that
    /// its mark adds nothing.
    /// </summary>
    private static bool IsCagedNitrogen(SymmetryWorkspace workspace, Molecule molecule, int element)
    {
        SymmetryGraph graph = workspace.Graph;
        int focus = graph.Focus[element];
        if (graph.Kind[element] != SymmetryGraph.Center || graph.DegreeOf(focus) != 3
            || molecule.AtomSpan[focus].AtomicNumber != 7)
        {
            return false;
        }

        for (int other = 0; other < graph.ElementCount; other++)
        {
            if (graph.Kind[other] == SymmetryGraph.Center && molecule.AtomSpan[graph.Focus[other]].AtomicNumber != 7
                && CagePaths.Relation(graph, focus, graph.Focus[other]) != 0)
            {
                return true;
            }
        }

        return false;
    }

    private static void FindCagePhantoms(
        SymmetryWorkspace workspace, List<(int Element, int Index)> symmetric, int statedCount, ref bool[]? phantom)
    {
        SymmetryGraph graph = workspace.Graph;
        SignedForest ties = new(graph.ElementCount);
        for (int i = 0; i < symmetric.Count; i++)
        {
            for (int j = i + 1; j < symmetric.Count; j++)
            {
                int one = symmetric[i].Element;
                int two = symmetric[j].Element;
                if (CagePaths.Relation(graph, graph.Focus[one], graph.Focus[two])
                    == graph.Configuration[one] * graph.Configuration[two])
                {
                    ties.TryJoin(one, two, 1);
                }
            }
        }

        bool[] done = new bool[graph.ElementCount];
        foreach ((int element, int _) in symmetric)
        {
            int root = ties.Root(element, out int _);
            if (done[root])
            {
                continue;
            }

            done[root] = true;
            List<(int Element, int Index)> group = symmetric.FindAll(other => ties.Root(other.Element, out int _) == root);
            if (group.Count > 1 && TurnsOver(workspace, group.ConvertAll(static member => member.Element)))
            {
                foreach ((int _, int index) in group)
                {
                    (phantom ??= new bool[statedCount])[index] = true;
                }
            }
        }
    }

    private static void RefineStated(SymmetryWorkspace workspace, ColorPartition partition, sbyte[] configuration)
    {
        partition.CopyFrom(workspace.Constitution);
        partition.SeparateFoci(workspace.Graph, workspace.Graph.ElementCount);
        partition.Refine(workspace.Graph, configuration);
    }

    /// <summary>Whether the molecule with the given elements turned over is the same molecule.</summary>
    private static bool TurnsOver(SymmetryWorkspace workspace, List<int> elements)
    {
        SymmetryGraph graph = workspace.Graph;
        sbyte[] turned = (sbyte[])graph.Configuration.Clone();
        foreach (int element in elements)
        {
            turned[element] = (sbyte)-turned[element];
        }

        RefineStated(workspace, workspace.Mirrored, turned);
        int focus = graph.Focus[elements[0]];
        ColorPartition stereo = workspace.Stereo;
        ColorPartition other = workspace.Mirrored;
        int cell = stereo.CellOf[focus];
        if (other.CellOf[other.Members[cell]] != cell)
        {
            return false;
        }

        for (int i = cell; i < cell + other.Length[cell]; i++)
        {
            if (workspace.Isomorphism.TryFind(graph, stereo, other, [focus], [other.Members[i]], turned))
            {
                return true;
            }
        }

        return false;
    }
}
