using System;
using System.Collections.Generic;
using System.Numerics;

namespace RadicalSites.Symmetry;

/// <summary>
/// Relative configurations that small cages force: two bridgeheads joined by three short bridges both point outwards.
/// </summary>
/// <remarks>
/// Bicyclo[a.b.c] with a + b + c of 8 or less and no zero bridge has no in,out isomer (the smallest isolated ones, such as
/// in,out-bicyclo[4.4.1]undecane, have 9); a fused pair [a.b.0] with a + b of 4 or less is cis (trans-bicyclo[3.2.0]heptane
/// and larger are known). Common practice, no source, for the exact border.
/// </remarks>
internal static class CagePaths
{
    private const int LongestBridge = 6;
    private const int LargestBridged = 8;
    private const int LargestFused = 4;
    private const int MostPaths = 400;

    [ThreadStatic]
    private static List<int>? lastNear;

    [ThreadStatic]
    private static SymmetryGraph? lastGraph;

    [ThreadStatic]
    private static int lastAtom;

    [ThreadStatic]
    private static int lastLoad;

    private readonly record struct Bridge(UInt128 Atoms, int First, int Last, int Length);

    /// <summary>Whether an atom of three ring bonds is joined to another atom by three short bridges.</summary>
    internal static bool IsBridgehead(SymmetryGraph graph, int atom)
    {
        // A path of at most four steps reaches the other bridgehead of every small cage.
        List<int> near = Ball(graph, atom, 4);
        foreach (int other in near)
        {
            if (other != atom && graph.RingBondsOf(other) >= 3 && graph.WeightBetween(atom, other) == 0
                && TryFind(graph, near, atom, other, out _, out _))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>
    /// Product of the configurations of two centres that their cage forces, or 0 when it leaves them free.
    /// </summary>
    internal static int Relation(SymmetryGraph graph, int first, int second)
    {
        // Spiro atoms and the like have four ring bonds and no outward ligand.
        if (graph.RingBondsOf(first) != 3 || graph.RingBondsOf(second) != 3)
        {
            return 0;
        }

        int one = graph.CenterAt[first] - 1;
        int two = graph.CenterAt[second] - 1;
        List<int> near = NearOf(graph, first);
        if (!near.Contains(second) || !TryFind(graph, near, first, second, out int[] from, out int[] to))
        {
            return 0;
        }

        return -SignOf(graph, one, from) * SignOf(graph, two, to);
    }

    /// <summary>Parity of the three bridges and the outward ligand against the carriers of a centre.</summary>
    private static int SignOf(SymmetryGraph graph, int element, ReadOnlySpan<int> bridges)
    {
        Span<int> places = stackalloc int[4];
        int used = 0;
        for (int i = 0; i < 3; i++)
        {
            for (int j = 0; j < 4; j++)
            {
                if (graph.Carriers[(4 * element) + j] == bridges[i])
                {
                    places[i] = j;
                    used |= 1 << j;
                }
            }
        }

        places[3] = BitOperations.TrailingZeroCount(~used);
        int sign = 1;
        for (int i = 0; i < 4; i++)
        {
            for (int j = i + 1; j < 4; j++)
            {
                sign = places[i] > places[j] ? -sign : sign;
            }
        }

        return sign;
    }

    /// <summary>Atoms in reach of an atom; kept for the next call, as callers go over the partners of one atom.</summary>
    private static List<int> NearOf(SymmetryGraph graph, int atom)
    {
        if (lastNear is null || !ReferenceEquals(lastGraph, graph) || lastAtom != atom || lastLoad != graph.Generation)
        {
            lastNear = Ball(graph, atom, LongestBridge);
            lastGraph = graph;
            lastAtom = atom;
            lastLoad = graph.Generation;
        }

        return lastNear;
    }

    private static List<int> Ball(SymmetryGraph graph, int atom, int radius)
    {
        List<int> ball = [atom];
        int done = 0;
        for (int step = 0; step < radius && ball.Count < 100; step++)
        {
            int end = ball.Count;
            for (; done < end; done++)
            {
                for (int i = graph.Offset[ball[done]]; i < graph.Offset[ball[done] + 1]; i++)
                {
                    int next = graph.Adjacent[i];
                    if (graph.DegreeOf(next) > 1 && !ball.Contains(next))
                    {
                        ball.Add(next);
                    }
                }
            }
        }

        return ball;
    }

    /// <summary>Finds the three disjoint bridges with the smallest sum, when that is small enough to force.</summary>
    private static bool TryFind(
        SymmetryGraph graph, List<int> near, int first, int second, out int[] from, out int[] to)
    {
        from = [];
        to = [];
        List<Bridge> bridges = [];
        bool fused = graph.WeightBetween(first, second) != 0;
        if (near.Count > 120)
        {
            return false;
        }

        Walk(graph, near, first, second, new Bridge(0, -1, -1, 0), bridges, fused ? LargestFused - 1 : LongestBridge);
        int limit = fused ? LargestFused : LargestBridged;
        bridges.Sort(static (a, b) => a.Length.CompareTo(b.Length));
        for (int i = 0; i < bridges.Count; i++)
        {
            Bridge a = bridges[i];
            for (int j = i + 1; j < bridges.Count && a.Length + bridges[j].Length <= limit; j++)
            {
                Bridge b = bridges[j];
                if ((a.Atoms & b.Atoms) != 0)
                {
                    continue;
                }

                for (int k = j + 1; k < bridges.Count && a.Length + b.Length + bridges[k].Length <= limit; k++)
                {
                    Bridge c = bridges[k];
                    if (((a.Atoms | b.Atoms) & c.Atoms) == 0)
                    {
                        from = [a.First, b.First, c.First];
                        to = [a.Last, b.Last, c.Last];
                        return true;
                    }
                }
            }
        }

        return false;
    }

    private static void Walk(
        SymmetryGraph graph, List<int> near, int atom, int goal, Bridge path, List<Bridge> found, int longest)
    {
        for (int i = graph.Offset[atom]; i < graph.Offset[atom + 1] && found.Count < MostPaths; i++)
        {
            int next = graph.Adjacent[i];
            int first = path.First < 0 ? next : path.First;
            if (next == goal)
            {
                found.Add(path with { First = first, Last = path.First < 0 ? near[0] : atom });
                continue;
            }

            int place = near.IndexOf(next);
            UInt128 bit = place <= 0 ? 0 : UInt128.One << place;
            if (bit == 0 || (path.Atoms & bit) != 0 || path.Length == longest)
            {
                continue;
            }

            Walk(graph, near, next, goal, new Bridge(path.Atoms | bit, first, -1, path.Length + 1), found, longest);
        }
    }
}
