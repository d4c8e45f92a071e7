using System;
using System.Collections.Generic;
using RadicalSites.Diagnostics;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

public sealed partial class SymmetryAnalysis
{
    /// <summary>Refinement steps allowed to all exact searches of one molecule.</summary>
    internal const int SearchLimit = 200_000;

    private const int WorkLimit = 20_000_000;

    /// <summary>Finds the equivalent atoms and hydrogens of a molecule.</summary>
    /// <param name="molecule">Any molecule; may be empty or have several fragments.</param>
    /// <returns>The analysis.</returns>
    public static SymmetryAnalysis Perceive(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        int n = molecule.AtomCount;
        SymmetryWorkspace workspace = SymmetryWorkspace.Own;
        SymmetryGraph graph = workspace.Graph;
        workspace.Isomorphism.Begin(LimitFor(n));
        StereoPerception.Prepare(workspace, molecule, false);
        int stated = graph.ElementCount;
        int[] constitutional = ConstitutionalOrbits(workspace, n);
        int[] enantiotopic = constitutional;
        int[] homotopic = constitutional;
        Topicity[] hydrogens = new Topicity[n];
        StereoFrames.AddFree(graph, molecule);
        if (graph.ElementCount == 0)
        {
            workspace.Topicity.BeginPlain(workspace, molecule);
            workspace.Topicity.FindHydrogens(hydrogens, workspace.ConstitutionalOrbits);
        }
        else
        {
            ReadGeometry(workspace, molecule, stated, constitutional, out enantiotopic, out homotopic, hydrogens);
        }

        SymmetryWorkspace.Release(n);
        return new SymmetryAnalysis(
            molecule, constitutional, enantiotopic, homotopic, hydrogens,
            workspace.Isomorphism.IsExhausted
                ? [Diagnostic.Create(ProblemCatalogue.General.LimitReached, [], LimitFor(n), "refinement steps")]
                : []);
    }

    /// <summary>Steps copy whole partitions, so that large molecules get fewer of them.</summary>
    private static int LimitFor(int atoms) => Math.Min(SearchLimit, 1000 + (WorkLimit / Math.Max(1, atoms)));

    /// <summary>Orbits of the constitution, named by their lowest members, of a workspace that is refined.</summary>
    internal static int[] ConstitutionalOrbits(SymmetryWorkspace workspace, int n)
    {
        int stated = workspace.Graph.ElementCount;
        workspace.Graph.ElementCount = 0;
        FindConstitutionalOrbits(workspace);
        workspace.Graph.ElementCount = stated;
        return Roots(workspace.ConstitutionalOrbits, n);
    }

    /// <summary>Splits the orbits by geometry; what holds in every reading of the open configurations counts.</summary>
    private static void ReadGeometry(
        SymmetryWorkspace workspace, Molecule molecule, int stated, int[] constitutional, out int[] enantiotopic,
        out int[] homotopic, Span<Topicity> hydrogens)
    {
        SymmetryGraph graph = workspace.Graph;
        int n = graph.AtomCount;
        workspace.Flexible.Find(workspace, constitutional);
        List<sbyte[]>? readings = FrameReadings.Find(workspace, stated, constitutional);
        TopicitySearch topicity = workspace.Topicity;
        enantiotopic = constitutional;
        homotopic = constitutional;
        for (int r = 0; r < (readings?.Count ?? 1); r++)
        {
            readings?[r].CopyTo(graph.Configuration, 0);
            topicity.Begin(workspace, molecule, stated, constitutional);
            topicity.FindOrbits();
            topicity.FindHydrogens(hydrogens, workspace.MirrorOrbits);
            enantiotopic = Meet(enantiotopic, workspace.MirrorOrbits);
            homotopic = Meet(homotopic, workspace.ProperOrbits);
        }
    }

    /// <summary>Classes of atoms that are together in both; the first is the finer of earlier readings.</summary>
    private static int[] Meet(int[] first, OrbitForest second)
    {
        int n = first.Length;
        bool same = true;
        for (int i = 0; i < n && same; i++)
        {
            same = second.Find(i) == second.Find(first[i]);
        }

        if (same)
        {
            // The second is no finer, as orbits never join what the earlier classes separate.
            return first;
        }

        int[] lowest = new int[n];
        for (int i = 0; i < n; i++)
        {
            int root = i;
            for (int j = Math.Max(first[i], second.Find(i)); j < i; j++)
            {
                if (first[j] == first[i] && second.Find(j) == second.Find(i))
                {
                    root = j;
                    break;
                }
            }

            lowest[i] = root;
        }

        return lowest;
    }

    private static void FindConstitutionalOrbits(SymmetryWorkspace workspace)
    {
        SymmetryGraph graph = workspace.Graph;
        ColorPartition partition = workspace.Constitution;
        OrbitForest orbits = workspace.ConstitutionalOrbits;
        int n = graph.AtomCount;
        orbits.Start(n);
        for (int cell = 0; cell < n; cell += partition.Length[cell])
        {
            int end = cell + partition.Length[cell];
            int first = partition.Members[cell];
            for (int i = cell + 1; i < end; i++)
            {
                int other = partition.Members[i];
                if (orbits.Find(first) != orbits.Find(other) && !Join(workspace, first, other))
                {
                    JoinAny(workspace, cell, i);
                }
            }
        }
    }

    private static bool Join(SymmetryWorkspace workspace, int first, int second)
    {
        SymmetryGraph graph = workspace.Graph;
        if (workspace.Probe.TryMap(graph, workspace.Constitution, first, second))
        {
            for (int i = 0; i < workspace.Probe.AssignedCount; i++)
            {
                int atom = workspace.Probe.Assigned[i];
                workspace.ConstitutionalOrbits.Union(atom, workspace.Probe.Image[atom]);
            }

            return true;
        }

        if (!workspace.Isomorphism.TryFind(
            graph, workspace.Constitution, workspace.Constitution, [first], [second], graph.Configuration))
        {
            return false;
        }

        TopicitySearch.UnionImages(workspace, workspace.ConstitutionalOrbits);
        return true;
    }

    /// <summary>The refined cell holds several orbits: compares with the other classes found so far.</summary>
    private static void JoinAny(SymmetryWorkspace workspace, int cell, int index)
    {
        ColorPartition partition = workspace.Constitution;
        OrbitForest orbits = workspace.ConstitutionalOrbits;
        int atom = partition.Members[index];
        for (int i = cell + 1; i < index; i++)
        {
            int other = partition.Members[i];
            if (orbits.Find(other) == orbits.Find(atom)
                || (orbits.Find(other) != orbits.Find(partition.Members[cell]) && Join(workspace, other, atom)))
            {
                return;
            }
        }
    }

    private static int[] Roots(OrbitForest orbits, int n)
    {
        int[] roots = new int[n];
        for (int i = 0; i < n; i++)
        {
            roots[i] = orbits.Find(i);
        }

        return roots;
    }
}
