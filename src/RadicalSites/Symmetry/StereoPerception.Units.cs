using System;
using System.Collections.Generic;
using RadicalSites.Molecules;

namespace RadicalSites.Symmetry;

public static partial class StereoPerception
{
    /// <summary>Combinations of configurations looked at to decide on places that depend on each other.</summary>
    private const int MostTried = 2048;

    /// <summary>Finds the places whose configuration matters, stated or not.</summary>
    /// <param name="molecule">Any molecule.</param>
    /// <returns>One unit for each place, by focus; may be empty. Phantoms are left out.</returns>
    public static IReadOnlyList<StereoUnit> FindUnits(Molecule molecule)
    {
        ArgumentNullException.ThrowIfNull(molecule);
        List<StereoElement[]> choices = FindChoices(molecule, out Molecule real);
        SymmetryWorkspace workspace = SymmetryWorkspace.Own;
        SortedDictionary<(int, int), StereoUnit> units = [];
        List<StereoElement> open = [];
        SymmetryGraph graph = workspace.Graph;
        foreach (StereoElement element in real.StereoSpan)
        {
            units[(element.Focus, element.FocusEnd)] = new StereoUnit(
                element.Kind, element.Focus, element.FocusEnd, true, IsDependent(workspace, element));
        }

        foreach (StereoElement[] choice in choices)
        {
            foreach (StereoElement element in choice)
            {
                if (choice.Length > 1 || IsDependent(workspace, element))
                {
                    open.Add(element);
                }
                else
                {
                    units[(element.Focus, element.FocusEnd)] = new StereoUnit(
                        element.Kind, element.Focus, element.FocusEnd, false, false);
                }
            }
        }

        if (open.Count > 0)
        {
            AddProven(real, choices, open, units);
        }

        return [.. units.Values];
    }

    /// <summary>
    /// The open places in groups that a cage ties together, each with one of its two ways; and the molecule without phantoms.
    /// The workspace's graph holds the frames afterwards.
    /// </summary>
    internal static List<StereoElement[]> FindChoices(Molecule molecule, out Molecule real)
    {
        SymmetryWorkspace workspace = SymmetryWorkspace.Own;
        SymmetryGraph graph = workspace.Graph;
        workspace.Isomorphism.Begin(SymmetryAnalysis.SearchLimit);
        real = Prepare(workspace, molecule, true);
        int stated = graph.ElementCount;
        int[] orbits = SymmetryAnalysis.ConstitutionalOrbits(workspace, molecule.AtomCount);
        StereoFrames.AddFree(graph, molecule);
        workspace.Flexible.Find(workspace, orbits);
        sbyte[] flexible = workspace.Flexible.State;
        SignedForest ties = new(graph.ElementCount + 1);
        for (int e = 0; e < graph.ElementCount; e++)
        {
            if (flexible[e] > 0 || graph.Kind[e] != SymmetryGraph.Center)
            {
                continue;
            }

            if (e < stated)
            {
                ties.TryJoin(e, graph.ElementCount, 1);
            }

            for (int f = Math.Max(e + 1, stated); f < graph.ElementCount; f++)
            {
                if (flexible[f] < 0 && graph.Kind[f] == SymmetryGraph.Center
                    && CagePaths.Relation(graph, graph.Focus[e], graph.Focus[f]) is int relation && relation != 0)
                {
                    ties.TryJoin(e, f, relation * graph.Configuration[e] * graph.Configuration[f]);
                }
            }
        }

        return Group(graph, stated, flexible, ties, ref real);
    }

    private static List<StereoElement[]> Group(
        SymmetryGraph graph, int stated, sbyte[] flexible, SignedForest ties, ref Molecule real)
    {
        Dictionary<int, List<StereoElement>> groups = [];
        List<StereoElement[]> result = [];
        List<StereoElement> forced = [];
        int constant = ties.Root(graph.ElementCount, out _);
        for (int e = stated; e < graph.ElementCount; e++)
        {
            if (flexible[e] > 0)
            {
                continue;
            }

            int root = ties.Root(e, out int sign);
            StereoElement element = ToElement(graph, e, sign * graph.Configuration[e]);
            if (root == constant)
            {
                forced.Add(element);
                continue;
            }

            if (!groups.TryGetValue(root, out List<StereoElement>? group))
            {
                groups.Add(root, group = []);
            }

            group.Add(element);
        }

        foreach (List<StereoElement> group in groups.Values)
        {
            result.Add([.. group]);
        }

        if (forced.Count > 0)
        {
            real = real.WithStereo([.. real.StereoSpan, .. forced]);
        }

        return result;
    }

    private static StereoElement ToElement(SymmetryGraph graph, int e, int sign)
    {
        int configuration = sign > 0 ? 2 : 1;
        int[] carriers = graph.Carriers.AsSpan(4 * e, 4).ToArray();
        return graph.Kind[e] switch
        {
            SymmetryGraph.Axis => new StereoElement(
                StereoKind.CisTrans, graph.Focus[e], graph.FocusEnd[e], [carriers[0], carriers[2]], configuration),
            SymmetryGraph.Allene => new StereoElement(
                StereoKind.Allene, graph.Focus[e], graph.Focus[e], carriers, configuration),
            _ => new StereoElement(StereoKind.Tetrahedral, graph.Focus[e], graph.Focus[e], carriers, configuration),
        };
    }

    private static bool IsDependent(SymmetryWorkspace workspace, StereoElement element)
    {
        SymmetryGraph graph = workspace.Graph;
        int e = (element.Kind == StereoKind.CisTrans ? graph.AxisAt[element.Focus] : graph.CenterAt[element.Focus]) - 1;
        return e >= 0 && graph.ResolvedSign(e, workspace.Constitution.CellOf, graph.Configuration) == 0;
    }

    /// <summary>Adds the dependent places that keep their mark in at least one combination of configurations.</summary>
    /// <remarks>Ends as soon as every place is proven, mostly with the first combinations.</remarks>
    private static void AddProven(
        Molecule real, List<StereoElement[]> choices, List<StereoElement> open,
        SortedDictionary<(int, int), StereoUnit> units)
    {
        int[] digits = new int[choices.Count];
        int missing = open.Count;
        int trials = 0;
        do
        {
            foreach (StereoElement element in WithoutPhantoms(
                StereoisomerEnumeration.Assign(real, choices, digits)).StereoSpan)
            {
                (int, int) place = (element.Focus, element.FocusEnd);
                if (!units.ContainsKey(place) && IsAmong(open, place))
                {
                    units.Add(place, new StereoUnit(element.Kind, element.Focus, element.FocusEnd, false, true));
                    missing--;
                }
            }
        }
        while (missing > 0 && ++trials < MostTried && StereoisomerEnumeration.Advance(digits, choices));
    }

    private static bool IsAmong(List<StereoElement> open, (int, int) place)
    {
        foreach (StereoElement candidate in open)
        {
            if ((candidate.Focus, candidate.FocusEnd) == place)
            {
                return true;
            }
        }

        return false;
    }
}
