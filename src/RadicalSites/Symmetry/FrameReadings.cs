using System;
using System.Collections.Generic;

namespace RadicalSites.Symmetry;

/// <summary>
/// Gives configurations to frames that state none, in every way that lets as many symmetries as possible of the
/// constitution act as rotations or reflections. Usually there is one way; equivalent centres whose relation is open,
/// such as the two of 1,3-dimethylcyclobutane, have several.
/// </summary>
internal static class FrameReadings
{
    private const int MostReadings = 8;

    /// <summary>Finds the readings.</summary>
    /// <param name="workspace">Workspace whose graph holds the frames; the stated ones come first.</param>
    /// <param name="stated">Number of frames whose configuration is stated.</param>
    /// <param name="orbits">Constitutional orbit by atom.</param>
    /// <returns>One or more full arrays of configurations, or null when none needs to be chosen.</returns>
    internal static List<sbyte[]>? Find(SymmetryWorkspace workspace, int stated, int[] orbits)
    {
        SymmetryGraph graph = workspace.Graph;
        sbyte[] flexible = workspace.Flexible.State;
        ColorPartition cells = workspace.Constitution;
        bool[]? open = null;
        for (int e = stated; e < graph.ElementCount; e++)
        {
            // Resolved by colours, the frame is read the same way for every numbering; an axis then asks for nothing more.
            int focus = graph.Focus[e];
            int sign = flexible[e] < 0 ? graph.ResolvedSign(e, cells.CellOf, graph.Configuration) : 0;
            graph.Configuration[e] = sign < 0 ? (sbyte)-graph.Configuration[e] : graph.Configuration[e];
            if (flexible[e] < 0 && cells.Length[cells.CellOf[focus]] > 1
                && (sign == 0 || graph.Kind[e] != SymmetryGraph.Axis))
            {
                (open ??= new bool[graph.FragmentCount])[graph.FragmentIndexOf(focus)] = true;
            }
        }

        if (open is null)
        {
            return null;
        }

        sbyte[] basis = graph.Configuration.AsSpan(0, graph.ElementCount).ToArray();
        List<sbyte[]> readings = [basis];

        for (int fragment = 0; fragment < open.Length; fragment++)
        {
            int first = graph.Fragment(fragment)[0];
            if (!open[fragment])
            {
                continue;
            }

            int like = FirstLike(workspace, orbits, first);
            if (graph.FragmentIndexOf(like) != fragment)
            {
                CopyFragment(workspace, stated, like, first, readings);
                continue;
            }

            List<sbyte[]> own = PairReadings(workspace, fragment, stated)
                ?? new FragmentReadings(workspace, fragment, stated).Solve(MostReadings);
            List<sbyte[]> combined = [];
            int count = Math.Max(readings.Count, own.Count);
            for (int r = 0; r < count; r++)
            {
                sbyte[] reading = [.. readings[r % readings.Count]];
                sbyte[] part = own[r % own.Count];
                for (int e = 0; e < reading.Length; e++)
                {
                    if (graph.FragmentIndexOf(graph.Focus[e]) == fragment)
                    {
                        reading[e] = part[e];
                    }
                }

                combined.Add(reading);
            }

            readings = combined;
        }

        return readings;
    }

    /// <summary>
    /// The common case without a search: every rigid frame of the fragment is resolved by colours and none is stated. One
    /// that stays in place makes all operations keep the configuration; otherwise, when one exchange swaps all pairs, the
    /// two of a pair are alike or mirror images.
    /// </summary>
    private static List<sbyte[]>? PairReadings(SymmetryWorkspace workspace, int fragment, int stated)
    {
        SymmetryGraph graph = workspace.Graph;
        ColorPartition cells = workspace.Constitution;
        int count = graph.ElementCount;
        bool hasFixed = false;
        int first = -1;
        for (int e = 0; e < count; e++)
        {
            if (workspace.Flexible.State[e] > 0 || graph.FragmentIndexOf(graph.Focus[e]) != fragment)
            {
                continue;
            }

            int length = cells.Length[cells.CellOf[graph.Focus[e]]];
            if (e < stated || length > 2 || graph.ResolvedSign(e, cells.CellOf, graph.Configuration) == 0)
            {
                return null;
            }

            if (graph.Kind[e] != SymmetryGraph.Axis)
            {
                hasFixed |= length == 1;
                first = first < 0 && length == 2 ? e : first;
            }
        }

        sbyte[] alike = graph.Configuration.AsSpan(0, count).ToArray();
        if (hasFixed)
        {
            return [alike];
        }

        int cell = cells.CellOf[graph.Focus[first]];
        graph.ElementCount = 0;
        bool swaps = workspace.Probe.TryMap(graph, cells, cells.Members[cell], cells.Members[cell + 1]);
        graph.ElementCount = count;
        sbyte[] mirrored = [.. alike];
        for (int e = 0; e < count && swaps; e++)
        {
            int focus = graph.Focus[e];
            if (workspace.Flexible.State[e] > 0 || graph.Kind[e] == SymmetryGraph.Axis
                || graph.FragmentIndexOf(focus) != fragment)
            {
                continue;
            }

            swaps = workspace.Probe.ImageOf(focus) != focus;
            mirrored[e] = focus == cells.Members[cells.CellOf[focus]] ? mirrored[e] : (sbyte)-mirrored[e];
        }

        return swaps ? [alike, mirrored] : null;
    }

    /// <summary>The equivalent atom that lies in the first fragment.</summary>
    private static int FirstLike(SymmetryWorkspace workspace, int[] orbits, int atom)
    {
        SymmetryGraph graph = workspace.Graph;
        ColorPartition cells = workspace.Constitution;
        int cell = cells.CellOf[atom];
        int best = atom;
        for (int i = cell; i < cell + cells.Length[cell]; i++)
        {
            int other = cells.Members[i];
            if (orbits[other] == orbits[atom] && graph.FragmentIndexOf(other) < graph.FragmentIndexOf(best))
            {
                best = other;
            }
        }

        return best;
    }

    /// <summary>Reads a fragment like the first one that is equal to it.</summary>
    private static void CopyFragment(SymmetryWorkspace workspace, int stated, int from, int to, List<sbyte[]> readings)
    {
        SymmetryGraph graph = workspace.Graph;
        int count = graph.ElementCount;
        graph.ElementCount = 0;
        bool found = workspace.Isomorphism.TryFindPlain(graph, workspace.Constitution, from, to);
        graph.ElementCount = count;
        if (!found)
        {
            return;
        }

        int[] image = workspace.Isomorphism.Image;
        sbyte[] saved = graph.Configuration;
        foreach (sbyte[] reading in readings)
        {
            graph.Configuration = reading;
            for (int e = stated; e < count; e++)
            {
                if (graph.FragmentIndexOf(graph.Focus[e]) != graph.FragmentIndexOf(from))
                {
                    continue;
                }

                int there = StereoImage.TargetOf(graph, e, image);
                if (there >= stated)
                {
                    int sign = StereoImage.SignOf(graph, e, image, reading);
                    reading[there] = (sbyte)(sign == 0 ? reading[there] : reading[there] * sign);
                }
            }
        }

        graph.Configuration = saved;
    }
}
